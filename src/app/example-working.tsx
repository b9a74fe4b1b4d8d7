import { findCalculator, runCalculator } from "#shared/calculators/registry.ts";
import type { UnitPreference } from "#shared/contracts/people.ts";
import { WorkingPanel } from "#src/features/workings/components/working-panel.tsx";

export interface ExampleWorkingProps {
  calculator: string;
  title: string;
  units: UnitPreference;
}

/** A calculator at work on its own example: nobody's working, to be tried. */
export function ExampleWorking({ calculator, title, units }: ExampleWorkingProps) {
  const example = findCalculator(calculator)?.example;
  const run = runCalculator(calculator, example);
  if (!run.ok) throw new Error(`The example of ${calculator} does not work: ${run.issue.message}`);
  const { version, inputs } = run.value;
  const results = { ...run.value.results };
  return (
    <WorkingPanel
      working={{ id: `example-${calculator}`, number: null, title, calculator, version, inputs, results }}
      mode="read"
      level={2}
      units={units}
    />
  );
}

import { useEffect, useMemo, useState } from "react";
import { useLocation } from "react-router";
import type { CalculatorDefinition } from "#shared/calculators/definition.ts";
import { runCalculator } from "#shared/calculators/registry.ts";
import { WorkingPanel } from "#src/features/workings/components/working-panel.tsx";
import { keepRecentSum } from "#src/features/workings/recent-sums.ts";
import { workTyped } from "#src/features/workings/sum.ts";
import { readSumQuery, sumQuery } from "#src/features/workings/sum-link.ts";
import { useUnits } from "#src/lib/page-settings.ts";
import { paths } from "#src/lib/paths.ts";

/** How long a sum rests before it is written into the address, ms: browsers refuse an address that changes at every key. */
const rest = 500;

/** A calculator on the bench, with the numbers of the link that led here; the address follows what is worked. */
export function BenchWorking({ definition }: { definition: CalculatorDefinition }) {
  const { search, key: visit } = useLocation();
  const ownUnits = useUnits();
  const start = useMemo(() => startOf(definition, search), [definition, search]);
  const [inputs, setInputs] = useState<Record<string, unknown> | null>(null);
  useEffect(() => {
    if (!inputs) return;
    const timer = setTimeout(() => {
      const query = sumQuery(inputs);
      window.history.replaceState(window.history.state, "", paths.calculator(definition.id, query));
      keepRecentSum({ calculator: definition.id, query });
    }, rest);
    return () => clearTimeout(timer);
  }, [inputs, definition.id]);
  const { fault } = start;
  return (
    <WorkingPanel
      // Each visit starts anew, even when the router saw no change: the address is rewritten past it.
      key={visit}
      working={start.working}
      mode="read"
      level={2}
      aside=""
      units={fault?.units ?? ownUnits}
      {...(fault && { typed: fault.typed })}
      formAction={paths.calculator(definition.id)}
      putBackLabel="Put back the first numbers"
      onInputsChange={setInputs}
    />
  );
}

/** The sum of the link; the worked example when there is none, or when what it says does not work. */
function startOf(definition: CalculatorDefinition, search: string) {
  const link = readSumQuery(definition, new URLSearchParams(search));
  const linked = link && workTyped(definition, link.typed, link.units, {});
  const run = linked?.ok ? linked : runCalculator(definition.id, definition.example);
  if (!run.ok) throw new Error(`The example of ${definition.id} does not work: ${run.issue.message}`);
  const { calculator, version, inputs, results } = run.value;
  return {
    working: {
      id: `bench-${calculator}`,
      number: null,
      title: definition.name,
      calculator,
      version,
      inputs,
      results: { ...results },
    },
    fault: link && !linked?.ok ? link : null,
  };
}

import type { CalculatorDefinition } from "#shared/calculators/definition.ts";
import { runCalculator } from "#shared/calculators/registry.ts";
import type { LengthUnits } from "#shared/units/length.ts";
import { Notice } from "#src/components/notice.tsx";
import { resultDifferences } from "../differences.ts";
import { DifferenceTable } from "./difference-table.tsx";

interface OtherVersionProps {
  definition: CalculatorDefinition;
  working: { version: number; inputs: Record<string, unknown>; results: object };
  units: LengthUnits;
}

/** Both answers of a working that an earlier version of the sum worked, when the present one answers otherwise. */
export function OtherVersion({ definition, working, units }: OtherVersionProps) {
  if (working.version === definition.version) return null;
  const now = runCalculator(definition.id, working.inputs);
  if (!now.ok) {
    return (
      <Notice kind="attention">
        {`This was worked by version ${working.version} of the sum. Version ${definition.version} does not take these numbers: ${now.issue.message}`}
      </Notice>
    );
  }
  const rows = resultDifferences(definition.resultFields, working.results, now.value.results, units);
  if (rows.length === 0) return null;
  return (
    <div className="flex flex-col gap-3">
      <Notice kind="attention">
        {`This was worked by version ${working.version} of the sum. Version ${definition.version} gives another answer.`}
      </Notice>
      <DifferenceTable
        caption="The two answers"
        first={`Version ${working.version}`}
        second={`Version ${definition.version}`}
        rows={rows}
      />
    </div>
  );
}

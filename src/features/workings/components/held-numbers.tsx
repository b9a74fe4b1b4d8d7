import { type ComponentType, useState } from "react";
import type { CalculatorDefinition } from "#shared/calculators/definition.ts";
import type { LengthUnits } from "#shared/units/length.ts";
import { Button } from "#src/components/button.tsx";
import { inputDifferences, type Numbers, resultDifferences } from "../differences.ts";
import type { DrawingProps } from "../drawing-props.ts";
import { DifferenceTable } from "./difference-table.tsx";

interface HeldNumbersProps extends Numbers {
  definition: CalculatorDefinition;
  drawing: ComponentType<DrawingProps> | undefined;
  units: LengthUnits;
}

/** A second set of numbers: the present ones are held while the form goes on to others. */
export function HeldNumbers({ definition, drawing: Drawing, inputs, results, units }: HeldNumbersProps) {
  const [held, setHeld] = useState<Numbers | null>(null);
  if (!held) {
    return (
      <div className="no-print">
        <Button onClick={() => setHeld({ inputs, results })}>Hold these numbers to compare</Button>
      </div>
    );
  }
  const now = { inputs, results };
  const rows = [
    ...inputDifferences(definition, held, now, units),
    ...resultDifferences(definition.resultFields, held.results, results, units),
  ];
  return (
    <section
      aria-label="Comparison"
      className="flex min-w-0 basis-full flex-col gap-3 border-y border-hairline py-3"
    >
      {rows.length > 0 ? (
        <>
          {Drawing ? (
            <figure className="min-w-0">
              <figcaption className="text-xs font-semibold">The numbers held</figcaption>
              <div className="-mx-3 sm:-mx-4">
                <Drawing {...held} units={units} />
              </div>
            </figure>
          ) : null}
          <DifferenceTable caption="What differs" first="Held" second="Now" rows={rows} />
        </>
      ) : (
        <p>Change a number above: what differs from the numbers held is shown here.</p>
      )}
      <div className="no-print">
        <Button onClick={() => setHeld(null)}>Let go of the numbers held</Button>
      </div>
    </section>
  );
}

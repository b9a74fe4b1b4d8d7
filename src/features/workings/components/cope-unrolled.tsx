import { distanceFromAxis, joint, type SaddleCopeResults } from "#shared/calculators/saddle-cope/formula.ts";
import type { SaddleCopeInputs } from "#shared/calculators/saddle-cope/inputs.ts";
import type { LengthUnits } from "#shared/units/length.ts";
import { UnrolledCut } from "./unrolled-cut.tsx";

interface UnrolledProps {
  inputs: SaddleCopeInputs;
  results: SaddleCopeResults;
  units: LengthUnits;
  show: (millimetres: number) => string;
}

/** The branch's end rolled out flat. */
export function CopeUnrolled({ inputs, results, units, show }: UnrolledProps) {
  const tube = joint(inputs);
  const depth = (radius: number) => (around: number) =>
    distanceFromAxis(tube, radius, around) - results.tipFromAxis;
  return (
    <UnrolledCut
      outside={depth(tube.r)}
      bore={depth(tube.bore)}
      deepest={results.deepest}
      around={results.templateWidth}
      units={units}
      show={show}
    />
  );
}

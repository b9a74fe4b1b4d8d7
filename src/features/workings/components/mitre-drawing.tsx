import type { MitreResults } from "#shared/calculators/mitre/formula.ts";
import { mitreFromAxis } from "#shared/calculators/mitre/formula.ts";
import type { MitreInputs } from "#shared/calculators/mitre/inputs.ts";
import { lengthFigure } from "#shared/units/length.ts";
import type { DrawingProps } from "../drawing-props.ts";
import { MitreSideView } from "./mitre-side-view.tsx";
import { UnrolledCut } from "./unrolled-cut.tsx";

/** The corner from the side, and the cut rolled out. */
export function MitreDrawing({ inputs, results, units }: DrawingProps<MitreInputs, MitreResults>) {
  const show = (length: number) => lengthFigure(length, units, 1);
  const { od, wall, turn } = inputs;
  const depth = (radius: number) => (around: number) =>
    mitreFromAxis(turn, radius, around) - results.tipFromAxis;
  return (
    <div className="grid grid-cols-[minmax(0,1fr)]">
      <div className="plate-drawing mb-0!">
        <div className="mx-auto max-w-lg">
          <MitreSideView inputs={inputs} results={results} show={show} />
        </div>
      </div>
      <figure className="plate-drawing">
        <UnrolledCut
          outside={depth(od / 2)}
          bore={depth(od / 2 - wall)}
          deepest={results.deepest}
          around={results.templateWidth}
          units={units}
          show={show}
        />
        <figcaption className="px-1 pt-1 text-xs text-chalk-soft">
          The end rolled out, print outward: both tubes alike. Solid: outside. Dashed: bore.
        </figcaption>
      </figure>
    </div>
  );
}

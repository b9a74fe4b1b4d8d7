import type { TubePieceResults } from "#shared/calculators/tube-piece/formula.ts";
import type { TubePieceInputs } from "#shared/calculators/tube-piece/inputs.ts";
import { lengthFigure } from "#shared/units/length.ts";
import type { DrawingProps } from "../drawing-props.ts";
import { TubeEndView } from "./tube-end-view.tsx";
import { TubeSideView } from "./tube-side-view.tsx";
import { TubeStrip } from "./tube-strip.tsx";

/** The piece from the side and from its end, and both its cuts on one strip. */
export function TubePieceDrawing({
  inputs,
  results,
  units,
}: DrawingProps<TubePieceInputs, TubePieceResults>) {
  const show = (length: number) => lengthFigure(length, units, 1);
  const parts = { inputs, results, show };
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] @lg:grid-cols-[minmax(0,4fr)_minmax(0,3fr)]">
      <div className="plate-drawing mb-0! @lg:mr-0!">
        <TubeSideView {...parts} />
      </div>
      <div className="plate-drawing mb-0! *:max-h-60 @lg:*:max-h-none">
        <TubeEndView {...parts} />
      </div>
      <figure className="plate-drawing @lg:col-span-2">
        <TubeStrip {...parts} />
        <figcaption className="px-1 pt-1 text-xs text-chalk-soft">
          The tube rolled out, print outward, A up; both cuts from the one datum, A's heel. Solid: outside.
          Dashed: bore.
        </figcaption>
      </figure>
    </div>
  );
}

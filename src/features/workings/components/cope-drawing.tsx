import type { SaddleCopeResults } from "#shared/calculators/saddle-cope/formula.ts";
import type { SaddleCopeInputs } from "#shared/calculators/saddle-cope/inputs.ts";
import { lengthFigure } from "#shared/units/length.ts";
import type { DrawingProps } from "../drawing-props.ts";
import { CopeEndView } from "./cope-end-view.tsx";
import { CopeSideView } from "./cope-side-view.tsx";
import { CopeUnrolled } from "./cope-unrolled.tsx";

/** The joint from the side and along the header, and the cut rolled out. Lengths in the person's unit. */
export function CopeDrawing({ inputs, results, units }: DrawingProps<SaddleCopeInputs, SaddleCopeResults>) {
  const show = (length: number) => lengthFigure(length, units, 1);
  const parts = { inputs, results, show };
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] @lg:grid-cols-[minmax(0,4fr)_minmax(0,3fr)]">
      <div className="plate-drawing mb-0! @lg:mr-0!">
        <CopeSideView {...parts} />
      </div>
      <div className="plate-drawing mb-0! *:max-h-60 @lg:*:max-h-none">
        <CopeEndView {...parts} />
      </div>
      <figure className="plate-drawing @lg:col-span-2">
        <CopeUnrolled {...parts} units={units} />
        <figcaption className="px-1 pt-1 text-xs text-chalk-soft">
          The end rolled out, print outward. Solid: outside. Dashed: bore. Depths from the squared end.
        </figcaption>
      </figure>
    </div>
  );
}

import { useId } from "react";
import type { FilletWeldResults } from "#shared/calculators/fillet-weld/formula.ts";
import type { FilletWeldInputs } from "#shared/calculators/fillet-weld/inputs.ts";
import { lengthFigure } from "#shared/units/length.ts";
import type { DrawingProps } from "../drawing-props.ts";
import { Dimension, Figure, linePath, type Spot, stroke } from "./drawing-parts.tsx";
import { arcSpots, breakLine, DrawingPair, DrawingSheet, grouped, Hatched } from "./drawing-sheet.tsx";

const size = { width: 360, height: 310 };

interface WeldProps {
  inputs: FilletWeldInputs;
  results: FilletWeldResults;
  show: (millimetres: number) => string;
}

/** The weld cut across, and from above with its load. */
export function FilletWeldDrawing({
  inputs,
  results,
  units,
}: DrawingProps<FilletWeldInputs, FilletWeldResults>) {
  const parts = { inputs, results, show: (length: number) => lengthFigure(length, units, 1) };
  return <DrawingPair left={<AcrossWeld {...parts} />} right={<AlongWeld {...parts} />} />;
}

/** The weld fills its room whatever its size: legs are equal, so only the plates are not to its scale. */
function AcrossWeld({ results, show }: WeldProps) {
  const id = useId();
  const leg = 112;
  const root: Spot = [120, 212];
  const [x, y] = root;
  const plate = 34;
  const low = y + plate + 28;
  const right = x + leg + 46;
  const face: Spot = [x + leg / 2, y - leg / 2];
  return (
    <DrawingSheet
      {...size}
      title="The weld cut across"
      description={`Fillet weld with equal legs of ${show(results.leg)} and a throat of ${show(results.throat)}.`}
    >
      <path
        className="line-outline"
        d={
          stroke(x - plate, 26, x - plate, y) +
          stroke(x, y - leg, x, 26) +
          stroke(20, y, x, y) +
          stroke(x + leg, y, 320, y) +
          stroke(20, y + plate, 320, y + plate) +
          breakLine([20, y], [20, y + plate]) +
          breakLine([320, y], [320, y + plate]) +
          breakLine([x - plate, 26], [x, 26])
        }
      />
      <path className="line-hidden" d={linePath([[x, y - leg], root, [x + leg, y]])} />
      <Hatched id={id} d={`${linePath([root, [x, y - leg], [x + leg, y]])}Z`} />
      <path
        className="line-dimension"
        d={
          stroke(x, y + 4, x, low + 6) +
          stroke(x + leg, y + 4, x + leg, low + 6) +
          stroke(x + 6, y - leg, right + 6, y - leg) +
          linePath([face, [x + 128, 66], [350, 66]])
        }
      />
      <Dimension
        from={[x, low]}
        to={[x + leg, low]}
        text={`leg ${show(results.leg)}`}
        at={[x + leg + 16, low + 5]}
        anchor="start"
      />
      <Dimension
        from={[right, y - leg]}
        to={[right, y]}
        text={show(results.leg)}
        at={[right + 8, y - leg / 2 + 5]}
        anchor="start"
      />
      <Dimension from={root} to={face} text={`throat ${show(results.throat)}`} at={[352, 58]} anchor="end" />
      <Figure at={[size.width / 2, size.height - 6]} anchor="middle" soft>
        Plates not to scale
      </Figure>
    </DrawingSheet>
  );
}

function AlongWeld({ inputs, results, show }: WeldProps) {
  const id = useId();
  const [from, to, y] = [40, 320, 176];
  const middle: Spot = [180, y];
  const angle = inputs.loadAngle;
  const radians = (angle * Math.PI) / 180;
  const tip = (reach: number): Spot => [middle[0] + reach * Math.cos(radians), y - reach * Math.sin(radians)];
  const [ux, uy] = [Math.cos(radians), -Math.sin(radians)];
  const head = tip(104);
  const used = inputs.method === "directional";
  return (
    <DrawingSheet
      {...size}
      title="The weld from above, with its load"
      description={`${show(inputs.length)} of weld, load at ${angle} degrees to it. Resistance ${grouped(results.resistancePerMm)} newtons a millimetre, ${grouped(results.resistance)} newtons in all.`}
    >
      <Hatched
        id={id}
        d={`${linePath([
          [from, y - 13],
          [to, y - 13],
          [to, y + 13],
          [from, y + 13],
        ])}Z`}
      />
      <path
        className="line-outline"
        d={stroke(from, y + 13, from - 26, y + 13) + stroke(to, y + 13, to + 26, y + 13)}
      />
      <path className="line-centre" d={stroke(from - 20, y, to + 20, y)} />
      <path
        className="line-outline"
        stroke="var(--color-straw)"
        d={linePath([middle, tip(94)])}
        style={{ stroke: "var(--color-straw)" }}
      />
      <path
        fill="var(--color-straw)"
        d={`${linePath([head, [head[0] - ux * 15 + uy * 6, head[1] - uy * 15 - ux * 6], [head[0] - ux * 15 - uy * 6, head[1] - uy * 15 + ux * 6]])}Z`}
      />
      {angle > 0 ? <path className="line-dimension" d={linePath(arcSpots(middle, 70, 0, angle))} /> : null}
      <Figure at={[4, 22]}>{`load ${angle}° to the weld`}</Figure>
      <Figure at={[4, 42]} soft>
        {used ? `credits ×${results.angleFactor.toFixed(3)}` : "method looks past it"}
      </Figure>
      <path
        className="line-dimension"
        d={stroke(from, y + 17, from, y + 50) + stroke(to, y + 17, to, y + 50)}
      />
      <Dimension from={[from, y + 44]} to={[to, y + 44]} text={show(inputs.length)} at={[180, y + 64]} />
      <Figure at={[180, 272]} anchor="middle">{`${grouped(results.resistance / 1000, 1)} kN`}</Figure>
      <Figure at={[180, 296]} anchor="middle" soft>
        {`${grouped(results.resistancePerMm)} N/mm of weld`}
      </Figure>
    </DrawingSheet>
  );
}

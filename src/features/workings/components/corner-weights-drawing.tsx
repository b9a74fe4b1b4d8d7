import type { CornerWeightsResults } from "#shared/calculators/corner-weights/formula.ts";
import type { CornerWeightsInputs } from "#shared/calculators/corner-weights/inputs.ts";
import { lengthFigure } from "#shared/units/length.ts";
import type { DrawingProps } from "../drawing-props.ts";
import { Dimension, Figure, linePath, type Spot, stroke } from "./drawing-parts.tsx";
import { DrawingSheet, fitted, grouped } from "./drawing-sheet.tsx";

const size = { width: 360, height: 420 };
/** A wheel on the sheet: drawn at one size, whatever the car. */
const wheel = { width: 18, height: 44 };

/** The car from above, front up: what each wheel carries and where the centre of gravity lies. */
export function CornerWeightsDrawing({
  inputs,
  results,
  units,
}: DrawingProps<CornerWeightsInputs, CornerWeightsResults>) {
  const show = (length: number) => lengthFigure(length, units, 0);
  const unit = units === "mm" ? "mm" : "in";
  const { wheelbase, frontTrack, rearTrack } = inputs;
  const corners = cornersOf(inputs);
  const { at } = fitted(
    corners.map(({ spot }) => spot),
    { left: 72, top: 100, width: 190, height: 216 },
  );
  const cg = at(-results.cgFromCentre, -results.cgFromFront);
  const [frontMiddle, rearMiddle] = [at(0, 0), at(0, -wheelbase)];
  const side = 304;
  const behind = `${show(results.cgFromFront)}`;
  return (
    <div className="plate-drawing">
      <div className="mx-auto max-w-md">
        <DrawingSheet
          {...size}
          title="The car from above"
          description={`${corners.map(({ name, mass }) => `${name} ${mass.toFixed(1)} kg`).join(", ")}. Centre of gravity ${show(results.cgFromFront)} ${unit} behind the front axle, ${sideways(results, show, unit)}.`}
        >
          <path
            className="line-outline"
            d={
              linePath([at(-frontTrack / 2, 0), at(frontTrack / 2, 0)]) +
              linePath([at(-rearTrack / 2, -wheelbase), at(rearTrack / 2, -wheelbase)])
            }
          />
          <path
            className="line-centre"
            d={stroke(frontMiddle[0], frontMiddle[1] - 36, rearMiddle[0], rearMiddle[1] + 36)}
          />
          {corners.map(({ name, spot, mass, up }) => (
            <Wheel key={name} spot={at(...spot)} middle={frontMiddle[0]} text={grouped(mass, 1)} up={up} />
          ))}
          <path
            className="line-dimension"
            d={
              stroke(frontMiddle[0], frontMiddle[1], side + 6, frontMiddle[1]) +
              stroke(cg[0], cg[1], side + 6, cg[1])
            }
          />
          <Dimension
            from={[side, frontMiddle[1]]}
            to={[side, cg[1]]}
            text={behind}
            at={[size.width - 4, (frontMiddle[1] + cg[1]) / 2 + 5]}
            anchor="end"
          />
          <GravityMark spot={cg} />
          <Figure at={[8, 20]}>{`front ${results.frontPercent.toFixed(1)} %`}</Figure>
          <Figure at={[size.width - 8, 20]} anchor="end">
            {`cross ${results.crossPercent.toFixed(1)} %`}
          </Figure>
          <Figure at={[8, 42]}>{`left ${results.leftPercent.toFixed(1)} %`}</Figure>
          <Figure at={[size.width - 8, 42]} anchor="end">{`total ${grouped(results.total, 1)} kg`}</Figure>
          <Figure at={[size.width / 2, size.height - 30]} anchor="middle" soft>
            {`cg ${sideways(results, show, unit)}`}
          </Figure>
          <Figure at={[size.width / 2, size.height - 8]} anchor="middle" soft>
            {`front up; kg and ${unit}`}
          </Figure>
        </DrawingSheet>
      </div>
    </div>
  );
}

/** Each wheel with its place in mm, right and forward of the middle of the front axle. */
function cornersOf({ lf, rf, lr, rr, wheelbase, frontTrack, rearTrack }: CornerWeightsInputs) {
  return [
    { name: "left front", spot: [-frontTrack / 2, 0] as Spot, mass: lf, up: true },
    { name: "right front", spot: [frontTrack / 2, 0] as Spot, mass: rf, up: true },
    { name: "left rear", spot: [-rearTrack / 2, -wheelbase] as Spot, mass: lr, up: false },
    { name: "right rear", spot: [rearTrack / 2, -wheelbase] as Spot, mass: rr, up: false },
  ];
}

function sideways({ cgFromCentre }: CornerWeightsResults, show: (length: number) => string, unit: string) {
  if (Math.abs(cgFromCentre) < 0.5) return "on the centreline";
  return `${show(Math.abs(cgFromCentre))} ${unit} ${cgFromCentre > 0 ? "left" : "right"} of the centreline`;
}

interface WheelProps {
  spot: Spot;
  /** The car's centreline on the sheet. */
  middle: number;
  text: string;
  up: boolean;
}

/** A wheel from above, its weight before the front axle or behind the rear one. */
function Wheel({ spot: [x, y], middle, text, up }: WheelProps) {
  const left = x < middle;
  // Words of the two sides keep to their own side, however narrow the track.
  const edge = left ? Math.min(x + wheel.width / 2, middle - 5) : Math.max(x - wheel.width / 2, middle + 5);
  return (
    <>
      <rect
        x={(x - wheel.width / 2).toFixed(2)}
        y={(y - wheel.height / 2).toFixed(2)}
        width={wheel.width}
        height={wheel.height}
        rx="3"
        className="line-outline"
        style={{ fill: "var(--color-grey-wash)" }}
      />
      <Figure
        at={[edge, up ? y - wheel.height / 2 - 8 : y + wheel.height / 2 + 18]}
        anchor={left ? "end" : "start"}
      >
        {text}
      </Figure>
    </>
  );
}

/** The usual mark of a centre of gravity: a ring with two quarters filled. */
function GravityMark({ spot: [x, y] }: { spot: Spot }) {
  const quarter = (turn: number) =>
    `M${x.toFixed(2)} ${y.toFixed(2)}h${9 * turn}a9 9 0 0 1 ${-9 * turn} ${9 * turn}z`;
  return (
    <>
      <circle
        cx={x.toFixed(2)}
        cy={y.toFixed(2)}
        r="9"
        fill="var(--color-plate)"
        stroke="var(--color-straw)"
        strokeWidth="2.5"
      />
      <path d={quarter(1) + quarter(-1)} fill="var(--color-straw)" />
    </>
  );
}

import { type LengthUnits, toInches } from "#shared/units/length.ts";
import { niceTicks } from "./chart-scale.ts";
import { linePath, type Spot, stroke } from "./drawing-parts.tsx";
import { DrawingSheet } from "./drawing-sheet.tsx";

const left = 78;
const right = 24;
const top = 46;
const width = 640;

interface UnrolledCutProps {
  /** Depth from the squared end at a place round the tube, in mm and degrees from the heel. */
  outside(around: number): number;
  bore(around: number): number;
  deepest: number;
  /** Once round the tube, mm. */
  around: number;
  units: LengthUnits;
  show: (millimetres: number) => string;
}

const quarters = [
  [0, "heel"],
  [90, "90°"],
  [180, "toe"],
  [270, "270°"],
  [360, "heel"],
] as const;

/** A tube's end rolled out flat: solid is the outside line, dashed the bore, both from the squared end. */
export function UnrolledCut({ outside, bore, deepest, around, units, show }: UnrolledCutProps) {
  const span = width - left - right;
  const tall = Math.min(300, Math.max(110, (span * deepest) / around));
  const height = top + tall + 62;
  const at = (place: number, depth: number): Spot => [
    left + (span * place) / 360,
    top + (tall * depth) / (deepest || 1),
  ];
  const line = (depth: (place: number) => number) =>
    linePath(Array.from({ length: 181 }, (_, step) => at(step * 2, depth(step * 2))));
  const words = quarters.slice(0, 4).map(([place, name]) => `${name} ${show(outside(place))}`);
  // Figures this long would run into each other: those of the sides stand in the description.
  const crowded = show(outside(0)).length > 5;
  return (
    <DrawingSheet
      width={width}
      height={height}
      className="text-[26px] @lg:text-[17px]"
      title="The cut unrolled"
      description={`The cut unrolled, depth from the squared end: ${words.join(", ")}; deepest ${show(deepest)}.`}
    >
      <DepthLines deepest={deepest} units={units} at={at} />
      <text className="drawing-figure fill-chalk-soft" x={left - 10} y={height - 22} textAnchor="end">
        {units === "mm" ? "mm" : "in"}
      </text>
      {quarters.map(([place, name], index) => (
        <g key={place}>
          <path className="line-centre" d={linePath([at(place, 0), [at(place, 0)[0], top + tall + 14]])} />
          <text className="drawing-figure" x={at(place, 0)[0]} y={height - 22} textAnchor={anchorOf(index)}>
            {name}
          </text>
          <text
            className="drawing-figure fill-chalk-soft"
            x={at(place, 0)[0]}
            y={top - 14}
            textAnchor={anchorOf(index)}
          >
            {index === 4 || (crowded && index % 2 === 1) ? "" : show(outside(place))}
          </text>
        </g>
      ))}
      <path className="line-outline opacity-60" d={linePath([at(0, 0), at(360, 0)])} strokeDasharray="3 3" />
      <path className="line-hidden" d={line(bore)} />
      <path className="line-outline" d={line(outside)} />
    </DrawingSheet>
  );
}

function anchorOf(index: number): "start" | "middle" | "end" {
  return index === 0 ? "start" : index === 4 ? "end" : "middle";
}

interface DepthLinesProps {
  deepest: number;
  units: LengthUnits;
  at(around: number, depth: number): Spot;
}

/** Round depths in the person's own unit. */
function DepthLines({ deepest, units, at }: DepthLinesProps) {
  const whole = units === "mm" ? deepest : toInches(deepest);
  return (
    <>
      {niceTicks(whole || 1, 4).map(({ value, label }) => {
        const [x, y] = at(0, (value * deepest) / (whole || 1));
        return (
          <g key={label}>
            <path className="line-dimension opacity-40" d={stroke(x, y, width - right, y)} />
            <text className="drawing-figure fill-chalk-soft" x={left - 10} y={y + 6} textAnchor="end">
              {label.length > 4 ? label.replace(/^0\./, ".") : label}
            </text>
          </g>
        );
      })}
    </>
  );
}

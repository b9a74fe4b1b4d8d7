import { type CurvePoint, ticksBetween } from "./chart-scale.ts";
import { Figure, linePath, type Spot } from "./drawing-parts.tsx";
import { DrawingSheet } from "./drawing-sheet.tsx";

const [width, height] = [360, 220];
const field = { left: 66, right: 346, top: 34, bottom: 174 };

/** Values further off than this are left out: the curve runs out of the field there. */
const furthest = 5000;

interface TravelChartProps {
  title: string;
  description: string;
  /** Name and unit, over the field. */
  up: string;
  /** Unit of the travel. */
  unit: string;
  /** The quantity against travel; null where there is none. */
  points: readonly { x: number; y: number | null }[];
  /** Difference in the quantity that fills the field at least. */
  least: number;
}

/** One quantity of a corner through its travel, with its value at rest ringed. */
export function TravelChart({ title, description, up, unit, points, least }: TravelChartProps) {
  const runs = runsOf(points);
  const all = runs.flat();
  const [left, right] = spread(
    points.map(({ x }) => x),
    1,
    0,
  );
  const ys = all.map(({ y }) => y);
  const [low, high] = spread(ys.length > 0 ? ys : [0], Math.max(least, 0.02 * Math.abs(ys[0] ?? 0)), 0.06);
  const at = (x: number, y: number): Spot => [
    field.left + ((field.right - field.left) * (x - left)) / (right - left),
    field.bottom - ((field.bottom - field.top) * (y - low)) / (high - low),
  ];
  const rest = all.find(({ x }) => x === 0);
  const ring = rest && at(rest.x, rest.y);
  return (
    <DrawingSheet width={width} height={height} title={title} description={description}>
      {ticksBetween(low, high).map(({ value, label }) => (
        <g key={label}>
          <path className="line-dimension opacity-40" d={linePath([at(left, value), at(right, value)])} />
          <Figure at={[field.left - 8, at(left, value)[1] + 5]} anchor="end" soft>
            {label}
          </Figure>
        </g>
      ))}
      {ticksBetween(left, right).map(({ value, label }) => (
        <g key={label}>
          <path className="line-dimension opacity-40" d={linePath([at(value, low), at(value, high)])} />
          <Figure
            at={[Math.min(at(value, low)[0], width - 4 - label.length * 4.5), field.bottom + 18]}
            anchor="middle"
            soft
          >
            {label}
          </Figure>
        </g>
      ))}
      <path className="line-centre" d={linePath([at(0, low), at(0, high)])} />
      <path
        className="line-outline"
        d={runs.map((run) => linePath(run.map(({ x, y }) => at(x, y)))).join("")}
      />
      {ring ? (
        <circle
          cx={ring[0].toFixed(2)}
          cy={ring[1].toFixed(2)}
          r="5"
          fill="var(--color-plate)"
          stroke="var(--color-straw)"
          strokeWidth="3"
        />
      ) : null}
      <Figure at={[4, 18]}>{up}</Figure>
      <Figure at={[width - 4, height - 8]} anchor="end" soft>
        {`rebound − travel, ${unit} + bump`}
      </Figure>
    </DrawingSheet>
  );
}

/** The curve in pieces, broken where the quantity does not exist or is far away. */
function runsOf(points: TravelChartProps["points"]): CurvePoint[][] {
  const runs: CurvePoint[][] = [[]];
  for (const { x, y } of points) {
    if (y !== null && Math.abs(y) <= furthest) runs.at(-1)?.push({ x, y });
    else runs.push([]);
  }
  return runs.filter((run) => run.length > 0);
}

/** How far an axis reaches: over all values, with a margin, and never less than `least`. */
function spread(values: readonly number[], least: number, margin: number): [number, number] {
  const [low, high] = [Math.min(...values), Math.max(...values)];
  const more = Math.max(0, least - (high - low)) / 2 + margin * (high - low);
  return [low - more, high + more];
}

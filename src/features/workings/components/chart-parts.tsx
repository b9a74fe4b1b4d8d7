import { type CurvePoint, clippedBelow, niceTicks } from "./chart-scale.ts";
import { Figure, linePath, type Spot } from "./drawing-parts.tsx";

/** Where a chart's field lies on its sheet. */
const field = { left: 52, right: 14, top: 34, bottom: 46 };

export interface ChartPlan {
  width: number;
  height: number;
  mostX: number;
  mostY: number;
  at(x: number, y: number): Spot;
}

/** A chart whose axes both begin at 0, on a sheet of this size. */
export function planChart(width: number, height: number, mostX: number, mostY: number): ChartPlan {
  const [across, tall] = [width - field.left - field.right, height - field.top - field.bottom];
  return {
    width,
    height,
    mostX,
    mostY,
    at: (x, y) => [field.left + (across * x) / mostX, field.top + tall * (1 - y / mostY)],
  };
}

interface AxesProps {
  plan: ChartPlan;
  /** Name and unit, under the field and over it. */
  along: string;
  up: string;
}

/** Grid, axes and their figures. */
export function ChartAxes({ plan, along, up }: AxesProps) {
  const { at, mostX, mostY, width, height } = plan;
  return (
    <>
      {niceTicks(mostY).map(({ value, label }) => (
        <g key={label}>
          <path className="line-dimension opacity-40" d={linePath([at(0, value), at(mostX, value)])} />
          <Figure at={[field.left - 8, at(0, value)[1] + 5]} anchor="end" soft>
            {label}
          </Figure>
        </g>
      ))}
      {niceTicks(mostX, 4).map(({ value, label }) => (
        <g key={label}>
          <path className="line-dimension opacity-40" d={linePath([at(value, 0), at(value, mostY)])} />
          <Figure
            at={[Math.min(at(value, 0)[0], width - 4 - label.length * 4.5), at(0, 0)[1] + 18]}
            anchor="middle"
            soft
          >
            {label}
          </Figure>
        </g>
      ))}
      <path className="line-dimension" d={linePath([at(0, mostY), at(0, 0), at(mostX, 0)])} />
      <Figure at={[width - 4, height - 8]} anchor="end">
        {along}
      </Figure>
      <Figure at={[4, 18]}>{up}</Figure>
    </>
  );
}

interface CurveProps {
  plan: ChartPlan;
  points: readonly CurvePoint[];
  className?: string;
}

/** A curve, cut off where it leaves the field over the top. */
export function ChartCurve({ plan, points, className = "line-outline" }: CurveProps) {
  const runs = clippedBelow(points, plan.mostY);
  return (
    <path
      className={className}
      d={runs.map((run) => linePath(run.map(({ x, y }) => plan.at(x, y)))).join("")}
    />
  );
}

/** The present numbers: a ring with lines to both axes. */
export function ChartPoint({ plan, x, y }: { plan: ChartPlan; x: number; y: number }) {
  const [cx, cy] = plan.at(x, y);
  return (
    <>
      <path
        className="line-dimension"
        strokeDasharray="3 3"
        d={linePath([plan.at(0, y), [cx, cy], plan.at(x, 0)])}
      />
      <circle
        cx={cx.toFixed(2)}
        cy={cy.toFixed(2)}
        r="5.5"
        fill="var(--color-plate)"
        stroke="var(--color-straw)"
        strokeWidth="3"
      />
    </>
  );
}

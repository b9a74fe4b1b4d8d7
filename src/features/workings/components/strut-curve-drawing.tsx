import { reductionFactor, type StrutCurveResults } from "#shared/calculators/strut-curve/formula.ts";
import type { BucklingCurve, StrutCurveInputs } from "#shared/calculators/strut-curve/inputs.ts";
import type { DrawingProps } from "../drawing-props.ts";
import { ChartAxes, ChartCurve, ChartPoint, planChart } from "./chart-parts.tsx";
import { stepsBetween } from "./chart-scale.ts";
import { Figure, type Spot } from "./drawing-parts.tsx";
import { DrawingSheet } from "./drawing-sheet.tsx";

/** Each with a slenderness where its name stands clear of the other curves. */
const names: readonly (readonly [BucklingCurve, number])[] = [
  ["a0", 0.74],
  ["a", 0.82],
  ["b", 0.9],
  ["c", 0.97],
  ["d", 1.05],
];
const size = { width: 360, height: 330 };

/** The five curves, the strut's own drawn full, with its place on it. */
export function StrutCurveDrawing({ inputs, results }: DrawingProps<StrutCurveInputs, StrutCurveResults>) {
  const { curve, slenderness } = inputs;
  const most = Math.max(3, slenderness * 1.15);
  const plan = planChart(size.width, size.height, most, 1.08);
  const ring = plan.at(slenderness, results.chi);
  const line = (value: (at: number) => number, from = 0) =>
    stepsBetween(from, most, 150).map((x) => ({ x, y: value(x) }));
  return (
    <div className="plate-drawing">
      <div className="mx-auto max-w-md">
        <DrawingSheet
          {...size}
          title="The five buckling curves"
          description={`Reduction against relative slenderness. On curve ${curve}, at ${slenderness}, it is ${results.chi.toFixed(3)}.`}
        >
          <ChartAxes plan={plan} along="relative slenderness" up="reduction χ" />
          <ChartCurve plan={plan} points={line((x) => 1 / x ** 2, 0.5)} className="line-hidden" />
          {names
            .filter(([name]) => name !== curve)
            .map(([name]) => (
              <ChartCurve
                key={name}
                plan={plan}
                points={line((x) => reductionFactor(name, x))}
                className="line-dimension"
              />
            ))}
          <ChartCurve plan={plan} points={line((x) => reductionFactor(curve, x))} />
          {names.map(([name, place]) => {
            // A name gives way to the ring of the present numbers.
            const near = Math.hypot(...difference(plan.at(place, reductionFactor(name, place)), ring)) < 18;
            const [x, y] = plan.at(
              place + (near ? 0.45 : 0),
              reductionFactor(name, place + (near ? 0.45 : 0)),
            );
            return (
              <Figure key={name} at={[x, y + 5]} anchor="middle" soft={name !== curve}>
                {name}
              </Figure>
            );
          })}
          <ChartPoint plan={plan} x={slenderness} y={results.chi} />
          <Figure
            at={[size.width - 16, 62]}
            anchor="end"
          >{`curve ${curve}: χ ${results.chi.toFixed(3)}`}</Figure>
          <Figure at={[size.width - 16, 84]} anchor="end" soft>
            dashed: perfect
          </Figure>
        </DrawingSheet>
      </div>
    </div>
  );
}

const difference = ([x1, y1]: Spot, [x2, y2]: Spot): [number, number] => [x1 - x2, y1 - y2];

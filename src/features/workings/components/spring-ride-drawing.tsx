import { type SpringRideResults, springRide } from "#shared/calculators/spring-ride/formula.ts";
import type { SpringRideInputs } from "#shared/calculators/spring-ride/inputs.ts";
import type { DrawingProps } from "../drawing-props.ts";
import { ChartAxes, ChartCurve, ChartPoint, planChart } from "./chart-parts.tsx";
import { stepsBetween } from "./chart-scale.ts";
import { Figure, linePath } from "./drawing-parts.tsx";
import { DrawingSheet } from "./drawing-sheet.tsx";

const size = { width: 360, height: 340 };

/** Ride frequency against spring rate, with the present spring ringed and the target where one is set. */
export function SpringRideDrawing({ inputs, results }: DrawingProps<SpringRideInputs, SpringRideResults>) {
  const { springRate, targetFrequency } = inputs;
  const { rideFrequency, springRateForTarget: wanted } = results;
  // A target far beyond the present spring would squeeze it into the corner: then the words alone tell it.
  const shownTarget =
    wanted !== null && targetFrequency !== undefined && wanted < 6 * springRate ? wanted : null;
  const most = Math.max(2 * springRate, 1.2 * (shownTarget ?? 0));
  const plan = planChart(size.width, size.height, most, 1.25 * frequencyAt(inputs, most));
  const target = shownTarget === null ? null : plan.at(shownTarget, targetFrequency ?? 0);
  return (
    <div className="plate-drawing">
      <div className="mx-auto max-w-md">
        <DrawingSheet
          {...size}
          title="Ride frequency against spring rate"
          description={`With a spring of ${springRate} N/mm the corner rides at ${rideFrequency.toFixed(2)} Hz.${wanted === null ? "" : ` The target of ${targetFrequency} Hz wants ${wanted.toFixed(2)} N/mm.`}`}
        >
          <ChartAxes plan={plan} along="spring rate, N/mm" up="ride frequency, Hz" />
          <ChartCurve
            plan={plan}
            points={stepsBetween(0, most, 120).map((rate) => ({
              x: rate,
              y: rate === 0 ? 0 : frequencyAt(inputs, rate),
            }))}
          />
          {target ? (
            <path
              className="line-hidden"
              d={linePath([plan.at(0, targetFrequency ?? 0), target, plan.at(shownTarget ?? 0, 0)])}
            />
          ) : null}
          <ChartPoint plan={plan} x={springRate} y={rideFrequency} />
          <Figure at={[size.width - 16, 252]} anchor="end">
            {`now ${rideFrequency.toFixed(2)} Hz`}
          </Figure>
          {wanted === null ? null : (
            <Figure at={[size.width - 16, 274]} anchor="end" soft>
              {`target wants ${wanted.toFixed(1)} N/mm`}
            </Figure>
          )}
        </DrawingSheet>
      </div>
    </div>
  );
}

/** The frequency with another spring, all else as it is. */
function frequencyAt(inputs: SpringRideInputs, springRate: number): number {
  const run = springRide({ ...inputs, springRate, targetFrequency: undefined, coil: undefined });
  return run.ok ? run.value.rideFrequency : 0;
}

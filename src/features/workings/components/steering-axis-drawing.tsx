import type { SteeringAxisResults } from "#shared/calculators/steering-axis/formula.ts";
import type { SteeringAxisInputs } from "#shared/calculators/steering-axis/inputs.ts";
import { lengthFigure } from "#shared/units/length.ts";
import type { DrawingProps } from "../drawing-props.ts";
import { DrawingPair } from "./drawing-sheet.tsx";
import { SteeringAxisView } from "./steering-axis-view.tsx";

/** The steering axis from the front and from the side, the other way up in thin line. */
export function SteeringAxisDrawing({
  inputs,
  results,
  units,
}: DrawingProps<SteeringAxisInputs, SteeringAxisResults>) {
  const show = (length: number) => lengthFigure(length, units, 1).replace("-", "−");
  const degrees = (angle: number) => `${angle.toFixed(2).replace("-", "−")}°`;
  const other = results.otherWayUp;
  return (
    <DrawingPair
      left={
        <SteeringAxisView
          inputs={inputs}
          title="The steering axis from the front"
          across={({ out }) => out}
          lean={90 + results.kpi}
          angle={`kpi ${degrees(results.kpi)}`}
          thin={`other way up ${degrees(other.kpi)}`}
          ground={`scrub radius ${show(results.scrubRadius)}`}
          hub={`spindle ${show(results.spindleLength)}`}
          caption="left wheel from the front"
        />
      }
      right={
        <SteeringAxisView
          inputs={inputs}
          title="The steering axis from the side"
          across={({ fore }) => -fore}
          lean={90 - results.caster}
          angle={`caster ${degrees(results.caster)}`}
          thin={`other way up ${degrees(other.caster)}`}
          ground={`trail ${show(results.trail)}`}
          caption="from outside, front to the left"
          round
        />
      }
    />
  );
}

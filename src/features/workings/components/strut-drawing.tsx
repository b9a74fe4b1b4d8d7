import type { StrutResults } from "#shared/calculators/strut/formula.ts";
import type { StrutInputs } from "#shared/calculators/strut/inputs.ts";
import { reductionFactor } from "#shared/calculators/strut-curve/formula.ts";
import { type LengthUnits, lengthFigure, toInches } from "#shared/units/length.ts";
import type { DrawingProps } from "../drawing-props.ts";
import { ChartAxes, ChartCurve, ChartPoint, planChart } from "./chart-parts.tsx";
import { stepsBetween } from "./chart-scale.ts";
import { Figure } from "./drawing-parts.tsx";
import { DrawingPair, DrawingSheet } from "./drawing-sheet.tsx";
import { StrutBow } from "./strut-bow.tsx";

/** The strut as it would bow, and its resistance at other lengths. */
export function StrutDrawing({ inputs, results, units }: DrawingProps<StrutInputs, StrutResults>) {
  const show = (length: number) => lengthFigure(length, units, 0);
  return (
    <DrawingPair
      left={<StrutBow inputs={inputs} results={results} show={show} />}
      right={<StrutChart inputs={inputs} results={results} units={units} />}
    />
  );
}

/** Resistance against length, under the lines that no strut passes: squash load and Euler load. */
function StrutChart({
  inputs,
  results,
  units,
}: {
  inputs: StrutInputs;
  results: StrutResults;
  units: LengthUnits;
}) {
  const { length, curve, gammaM1 } = inputs;
  const { squashLoad, eulerLoad, relativeSlenderness, resistance } = results;
  const shown = (millimetres: number) => (units === "mm" ? millimetres : toInches(millimetres));
  // Far enough to see the curve come down, however stocky the strut is now.
  const most = length * Math.max(2, 2 / relativeSlenderness);
  const plan = planChart(360, 330, shown(most), (squashLoad * 1.12) / 1000);
  const line = (load: (at: number) => number, from = 0) =>
    stepsBetween(from, most, 200).map((at) => ({ x: shown(at), y: load(at) / 1000 }));
  const held = (at: number) =>
    (reductionFactor(curve, (relativeSlenderness * at) / length) * squashLoad) / gammaM1;
  const squash = plan.at(shown(most), squashLoad / 1000);
  const eulerAt = 1.3 / relativeSlenderness;
  const euler = plan.at(shown(length * eulerAt), eulerLoad / eulerAt ** 2 / 1000);
  return (
    <DrawingSheet
      width={360}
      height={330}
      title="Resistance against length"
      description={`At ${lengthFigure(length, units, 0)} ${units === "mm" ? "mm" : "in"} the resistance is ${(resistance / 1000).toFixed(1)} kN; squash load ${(squashLoad / 1000).toFixed(1)} kN, Euler load ${(eulerLoad / 1000).toFixed(1)} kN.`}
    >
      <ChartAxes plan={plan} along={`length, ${units === "mm" ? "mm" : "in"}`} up="kN" />
      <ChartCurve plan={plan} points={line(() => squashLoad)} className="line-hidden" />
      <ChartCurve
        plan={plan}
        points={line((at) => eulerLoad * (length / at) ** 2, most / 400)}
        className="line-hidden"
      />
      <ChartCurve plan={plan} points={line(held)} />
      <ChartPoint plan={plan} x={shown(length)} y={resistance / 1000} />
      <Figure at={[squash[0] - 4, squash[1] + 18]} anchor="end" soft>
        squash
      </Figure>
      <Figure at={[euler[0] + 10, euler[1] - 4]} soft>
        Euler
      </Figure>
      <Figure
        at={[356, 18]}
        anchor="end"
      >{`resistance ${(resistance / 1000).toFixed(resistance < 10_000 ? 2 : 1)}`}</Figure>
    </DrawingSheet>
  );
}

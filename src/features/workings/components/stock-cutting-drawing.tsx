import type { CuttingPlan, StockCuttingResults } from "#shared/calculators/stock-cutting/formula.ts";
import type { StockCuttingInputs } from "#shared/calculators/stock-cutting/inputs.ts";
import { lengthFigure } from "#shared/units/length.ts";
import type { DrawingProps } from "../drawing-props.ts";
import { Figure } from "./drawing-parts.tsx";
import { DrawingSheet } from "./drawing-sheet.tsx";
import { barSheet, placedBar, StockBar } from "./stock-bar.tsx";

/** Ways of cutting beyond this many stand in the results alone. */
const most = 24;

/** Each way of cutting a bar, the pieces in order; the longest bar fills the sheet. */
export function StockCuttingDrawing({
  inputs,
  results,
  units,
}: DrawingProps<StockCuttingInputs, StockCuttingResults>) {
  const show = (length: number) => lengthFigure(length, units, length % 1 === 0 ? 0 : 1);
  const unit = units === "mm" ? "mm" : "in";
  const plans = results.plans.slice(0, most);
  const more = results.plans.length - plans.length;
  const scale = barSheet.long / Math.max(...plans.map(({ stock }) => stock));
  const bars = plans.map((plan) => placedBar(inputs, plan, scale, show));
  const tops = bars.map((_, index) => bars.slice(0, index).reduce((sum, { height }) => sum + height, 4));
  const end = bars.reduce((sum, { height }) => sum + height, 4);
  const height = end + (more > 0 ? 50 : 28);
  return (
    <div className="plate-drawing">
      <div className="mx-auto max-w-xl">
        <DrawingSheet
          width={barSheet.width}
          height={height}
          title="The cutting plan"
          description={plans.map((plan) => planTold(plan, show, unit)).join(" ")}
        >
          {bars.map((bar, index) => (
            <StockBar
              key={JSON.stringify([bar.plan.stock, bar.plan.cuts])}
              id={`offcut-${index}`}
              bar={bar}
              top={tops[index] ?? 0}
              scale={scale}
              kerf={inputs.kerf}
              show={show}
            />
          ))}
          {more > 0 ? (
            <Figure at={[barSheet.left, end + 16]}>{`and ${more} more ways of cutting`}</Figure>
          ) : null}
          <Figure at={[barSheet.width / 2, height - 8]} anchor="middle" soft>
            {`${unit}; kerf ${lengthFigure(inputs.kerf, units, 1)}; offcut hatched`}
          </Figure>
        </DrawingSheet>
      </div>
    </div>
  );
}

function planTold(plan: CuttingPlan, show: (length: number) => string, unit: string): string {
  const cuts = plan.cuts.map(({ label, length, count }) =>
    `${count} × ${show(length)} ${unit} ${label}`.trim(),
  );
  return `${plan.count} × bar of ${show(plan.stock)} ${unit}: ${cuts.join(", ")}; offcut ${show(plan.offcut)} ${unit}.`;
}

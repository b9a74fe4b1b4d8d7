import type { TravelRow, WishboneTravelResults } from "#shared/calculators/wishbone-travel/formula.ts";
import type { WishboneTravelInputs } from "#shared/calculators/wishbone-travel/inputs.ts";
import { lengthFigure, toInches } from "#shared/units/length.ts";
import type { DrawingProps } from "../drawing-props.ts";
import { DrawingPair } from "./drawing-sheet.tsx";
import { TravelChart } from "./travel-chart.tsx";
import { WishboneFrontView } from "./wishbone-front-view.tsx";

/** The corner from the front through its travel, and what the wheel does on the way. */
export function WishboneTravelDrawing({
  inputs,
  results,
  units,
}: DrawingProps<WishboneTravelInputs, WishboneTravelResults>) {
  const show = (length: number) => lengthFigure(length, units, 1);
  const shown = (millimetres: number) => (units === "mm" ? millimetres : toInches(millimetres));
  const unit = units === "mm" ? "mm" : "in";
  const chart = (name: string, unitOf: string, least: number, value: (row: TravelRow) => number | null) => (
    <TravelChart
      title={`${name} against travel`}
      description={described(results.rows, name, unitOf, value, (travel) => `${show(travel)} ${unit}`)}
      up={`${name}, ${unitOf}`}
      unit={unit}
      points={results.rows.map((row) => ({ x: shown(row.travel), y: value(row) }))}
      least={least}
    />
  );
  const leastLength = units === "mm" ? 2 : 0.1;
  return (
    <>
      <DrawingPair
        left={<WishboneFrontView inputs={inputs} results={results} show={show} unit={unit} />}
        right={
          <>
            {chart("camber", "°", 0.2, ({ camber }) => camber)}
            {chart("toe", "°", 0.2, ({ toe }) => toe)}
          </>
        }
      />
      <DrawingPair
        left={chart("roll centre", unit, leastLength, ({ rollCentre }) =>
          rollCentre === null ? null : shown(rollCentre),
        )}
        right={chart("track change", unit, leastLength, ({ trackChange }) => shown(trackChange))}
      />
    </>
  );
}

/** The values at both ends of the travel and at rest, in words. */
function described(
  rows: readonly TravelRow[],
  name: string,
  unit: string,
  value: (row: TravelRow) => number | null,
  travelText: (travel: number) => string,
): string {
  const told = [rows[0], rows.find(({ travel }) => travel === 0), rows.at(-1)].flatMap((row) => {
    if (!row) return [];
    const figure = value(row);
    return [
      `${figure === null ? "none" : `${figure.toFixed(2)} ${unit}`} at ${travelText(row.travel)} of travel`,
    ];
  });
  return `The ${name}: ${told.join(", ")}.`;
}

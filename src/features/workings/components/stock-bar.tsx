import type { CuttingPlan } from "#shared/calculators/stock-cutting/formula.ts";
import type { StockCuttingInputs } from "#shared/calculators/stock-cutting/inputs.ts";
import { Figure, stroke } from "./drawing-parts.tsx";
import { Hatched } from "./drawing-sheet.tsx";
import { staggered } from "./staggered.ts";

export const barSheet = { width: 360, left: 8, long: 344 };
const barHeight = 30;

/** Pieces narrower than this on the sheet are drawn as one block. */
const narrowest = 3;

interface PlacedCut {
  text: string;
  /** Where the pieces of this mark begin and end, mm from the bar's end. */
  from: number;
  to: number;
  length: number;
  count: number;
  /** The middle of the words, and their row under the bar. */
  middle: number;
  row: number;
}

export interface PlacedBar {
  plan: CuttingPlan;
  cuts: PlacedCut[];
  /** Where the offcut begins, mm. */
  offcutFrom: number;
  height: number;
}

/** Where the pieces of a bar lie, half the trim at each end, and where their words go. */
export function placedBar(
  { kerf, trim }: StockCuttingInputs,
  plan: CuttingPlan,
  scale: number,
  show: (length: number) => string,
): PlacedBar {
  let from = trim / 2;
  const cuts = plan.cuts.map(({ label, length, count }) => {
    const start = from;
    from += count * (length + kerf);
    const text = `${count} × ${show(length)}${label ? ` ${shortened(label)}` : ""}`;
    const to = from - kerf;
    const half = (text.length * 9) / 2 + 4;
    const wanted = barSheet.left + ((start + to) / 2) * scale;
    const middle = Math.min(barSheet.width - half - 4, Math.max(half + 4, wanted));
    return { text, from: start, to, length, count, middle, half };
  });
  const rows = staggered(cuts.map(({ middle, half }) => ({ from: middle - half, to: middle + half })));
  return {
    plan,
    cuts: cuts.map((cut, index) => ({ ...cut, row: rows[index] ?? 0 })),
    offcutFrom: from,
    height: 24 + barHeight + 14 + 20 * (Math.max(0, ...rows) + 1) + 14,
  };
}

const shortened = (label: string) => (label.length > 18 ? `${label.slice(0, 17)}…` : label);

interface StockBarProps {
  id: string;
  bar: PlacedBar;
  top: number;
  /** From mm to the sheet. */
  scale: number;
  kerf: number;
  show: (length: number) => string;
}

/** One way of cutting a bar: how many are cut so, the pieces with their words, the offcut. */
export function StockBar({ id, bar: { plan, cuts, offcutFrom }, top, scale, kerf, show }: StockBarProps) {
  const y = top + 24;
  const low = y + barHeight;
  const x = (along: number) => barSheet.left + along * scale;
  const box = (from: number, to: number) =>
    `${stroke(x(from), y, x(to), y)}L${x(to).toFixed(2)} ${low}L${x(from).toFixed(2)} ${low}Z`;
  const offcutTo = Math.min(plan.stock, offcutFrom + plan.offcut);
  return (
    <>
      <Figure at={[barSheet.left, y - 8]}>{`${plan.count} × bar ${show(plan.stock)}`}</Figure>
      <Figure at={[barSheet.width - 8, y - 8]} anchor="end" soft>
        {`offcut ${show(plan.offcut)}`}
      </Figure>
      <path className="line-dimension" d={box(0, plan.stock)} />
      {plan.offcut > 0 ? <Hatched id={id} d={box(offcutFrom, offcutTo)} /> : null}
      <path
        className="line-outline"
        style={{ fill: "var(--color-grey-wash)" }}
        d={cuts.map((cut) => piecePaths(cut, kerf, scale, box)).join("")}
      />
      <path
        className="line-dimension"
        d={cuts
          .map(({ from, to, row }) =>
            stroke(x((from + to) / 2), low + 3, x((from + to) / 2), low + 8 + 20 * row),
          )
          .join("")}
      />
      {cuts.map(({ text, from, middle, row }) => (
        <Figure key={from} at={[middle, low + 21 + 20 * row]} anchor="middle">
          {text}
        </Figure>
      ))}
    </>
  );
}

function piecePaths(
  { from, to, length, count }: PlacedCut,
  kerf: number,
  scale: number,
  box: (from: number, to: number) => string,
): string {
  if (length * scale < narrowest) return box(from, to);
  return Array.from({ length: count }, (_, index) => {
    const start = from + index * (length + kerf);
    return box(start, start + length);
  }).join("");
}

import { fail, ok, type Result } from "#shared/result.ts";
import type { CalculatorIssue } from "../definition.ts";
import type { StockCuttingInputs } from "./inputs.ts";
import type { Pattern } from "./master.ts";
import { solve } from "./plan.ts";
import { type Measure, problemFrom, type Sized } from "./sizes.ts";

/** Pieces of one mark out of one bar. */
export interface BarCut {
  label: string;
  length: number;
  count: number;
}

/** Bars that are cut alike. */
export interface CuttingPlan {
  /** Length of the bar. */
  stock: number;
  cuts: BarCut[];
  /** What is left at the end, after the last cut. */
  offcut: number;
  count: number;
}

/** Results of `stock-cutting`; mm. */
export interface StockCuttingResults {
  bars: number;
  plans: CuttingPlan[];
  /** Percent of the bars' length that becomes pieces. */
  utilisation: number;
  /** What is made least: the number of bars, with several lengths their length in mm, with prices the cost. */
  measure: Measure;
  /** No plan needs less, in that measure. */
  lowerBound: number;
  /** What this plan needs more than the lower bound: 0 when proven. */
  overBound: number;
  /** True when no better plan exists. */
  proven: boolean;
  /** Price of all bars; null without prices. */
  cost: number | null;
  stockLength: number;
  pieceLength: number;
}

const MOST_PIECES = 2000;

/**
 * Pieces into bars, with as few bars as possible (or as little length, or as little money).
 *
 * An integer programme over cutting patterns. Its relaxed form gives the lower bound; rounding and a search by
 * losses bring plan and bound together. Work is counted in steps, so that the answer is the same everywhere.
 *
 * @param inputs parsed by `stockCuttingInputs`
 * @returns fails on `pieces.n.length` for a piece longer than the longest bar leaves, on `trim`, on `stock.n.price`
 * when only some bars have one, on `pieces` for too many, and on `stock` when the bars do not hold all pieces
 * @see P. C. Gilmore and R. E. Gomory, Operations Research 9 (1961), for the relaxed form
 */
export function stockCutting(inputs: StockCuttingInputs): Result<StockCuttingResults, CalculatorIssue> {
  const misfit = misfitOf(inputs);
  if (misfit) return fail(misfit);
  const sized = problemFrom(inputs);
  const { plan, bound, proven } = solve(sized.problem);
  if (!plan) return fail({ field: "stock", message: proven ? TOO_LITTLE : NOT_FOUND });
  const plans = plansFrom(inputs, sized, plan.bars);
  const stockLength = plans.reduce((sum, { stock, count }) => sum + stock * count, 0);
  const pieceLength = inputs.pieces.reduce((sum, { length, count }) => sum + length * count, 0);
  return ok({
    bars: plan.bars.length,
    plans,
    utilisation: (100 * pieceLength) / stockLength,
    measure: sized.measure,
    lowerBound: bound * sized.costUnit,
    overBound: (plan.cost - bound) * sized.costUnit,
    proven,
    cost: costOf(inputs, plan.bars, sized),
    stockLength,
    pieceLength,
  });
}

const TOO_LITTLE =
  "The stock does not hold all the pieces: add bars, or leave out the count of a length you can buy.";
const NOT_FOUND =
  "No way was found to cut all the pieces from this stock, though its length might just do: add a bar.";

function misfitOf({ pieces, stock, trim }: StockCuttingInputs): CalculatorIssue | undefined {
  const longest = Math.max(...stock.map((bar) => (bar.count === 0 ? 0 : bar.length)));
  if (longest === 0) return { field: "stock", message: "There are no bars: give at least 1 of one length." };
  if (trim >= longest) {
    return { field: "trim", message: `The trim takes the whole bar: keep it below ${longest} mm.` };
  }
  const usable = longest - trim;
  const long = pieces.findIndex(({ length }) => length > usable + 1e-9);
  if (long >= 0) {
    const message = `This piece is longer than the longest bar, which leaves ${Number(usable.toFixed(1))} mm after trimming. Shorten it, join it of two, or add a longer bar.`;
    return { field: `pieces.${long}.length`, message };
  }
  const count = pieces.reduce((sum, piece) => sum + piece.count, 0);
  if (count > MOST_PIECES) {
    return {
      field: "pieces",
      message: `${count} pieces are too many for one plan: give at most ${MOST_PIECES}, and cut the rest from another lot.`,
    };
  }
  const priced = stock.filter(({ price }) => price !== undefined).length;
  if (priced > 0 && priced < stock.length) {
    const bare = stock.findIndex(({ price }) => price === undefined);
    return { field: `stock.${bare}.price`, message: "Give a price for every bar length, or for none." };
  }
  return undefined;
}

function costOf({ stock }: StockCuttingInputs, bars: readonly Pattern[], { barOf }: Sized): number | null {
  if (stock.some(({ price }) => price === undefined)) return null;
  const cents = bars.reduce(
    (sum, { bar }) => sum + Math.round(100 * (stock[barOf[bar] ?? 0]?.price ?? 0)),
    0,
  );
  return cents / 100;
}

/** Gives the pieces their marks again, and puts bars together that are cut alike. */
function plansFrom(inputs: StockCuttingInputs, sized: Sized, bars: readonly Pattern[]): CuttingPlan[] {
  const open = sized.piecesOf.map((pieces) =>
    pieces.map((piece) => ({ piece, left: inputs.pieces[piece]?.count ?? 0 })),
  );
  const plans = new Map<string, CuttingPlan>();
  for (const { bar, cuts } of bars) {
    const stock = inputs.stock[sized.barOf[bar] ?? 0]?.length ?? 0;
    const marked = cuts.flatMap((count, type) => marksFor(inputs, open[type] ?? [], count));
    const key = JSON.stringify([stock, marked]);
    const known = plans.get(key);
    if (known) known.count += 1;
    else plans.set(key, { stock, cuts: marked, offcut: offcutOf(inputs, stock, marked), count: 1 });
  }
  return [...plans.values()].sort((a, b) => b.stock - a.stock || b.count - a.count || a.offcut - b.offcut);
}

function marksFor(
  { pieces }: StockCuttingInputs,
  open: { piece: number; left: number }[],
  count: number,
): BarCut[] {
  const cuts: BarCut[] = [];
  let needed = count;
  for (const entry of open) {
    const taken = Math.min(needed, entry.left);
    const piece = pieces[entry.piece];
    if (taken === 0 || !piece) continue;
    entry.left -= taken;
    needed -= taken;
    cuts.push({ label: piece.label, length: piece.length, count: taken });
  }
  return cuts;
}

function offcutOf({ kerf, trim }: StockCuttingInputs, stock: number, cuts: readonly BarCut[]): number {
  const used = cuts.reduce((sum, { length, count }) => sum + count * (length + kerf), 0);
  return Math.max(0, stock - trim - used);
}

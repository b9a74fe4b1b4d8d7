import { bestCuts, type Cuts, type Worth, worthOf } from "./knapsack.ts";

/** A cutting problem in whole units: lengths include one kerf each, as do the bars. */
export interface Problem {
  /** Longest first. */
  sizes: readonly number[];
  wanted: readonly number[];
  bars: readonly Bar[];
}

export interface Bar {
  capacity: number;
  /** In whole units of what is to be least. */
  cost: number;
  /** How many there are. */
  available: number;
}

export interface Pattern {
  bar: number;
  cuts: Cuts;
}

/** The relaxed problem solved: pieces of bars allowed. */
export interface Relaxed {
  /** No plan costs less than this. */
  bound: number;
  /** What one more piece of each type adds to the cost. */
  pieceValues: number[];
  /** What one more bar of each kind would save; 0 or above. */
  barValues: number[];
  patterns: { pattern: Pattern; times: number }[];
  /** Pieces for which there is no bar: above 0, the stock is too small for certain. */
  missing: number;
  worth: Worth;
}

interface Column {
  cost: number;
  /** Coefficients in the rows: a piece of each type, then a bar of each kind. */
  entries: readonly number[];
  pattern?: Pattern;
  missing?: boolean;
}

/** More than any list has needed; ends a walk in circles. */
const MOST_STEPS = 2000;

/**
 * Linear programme over all cutting patterns, by the simplex method with generated columns: a pattern is made, as the
 * best filling of a bar, only when it would make the plan cheaper.
 *
 * Rows: each type cut at least as often as wanted; each kind of bar used at most as often as there are.
 *
 * @see P. C. Gilmore and R. E. Gomory, A linear programming approach to the cutting-stock problem, Operations
 * Research 9 (1961)
 */
export function relax(problem: Problem): Relaxed {
  const { sizes, wanted, bars } = problem;
  const dearest = Math.max(1, ...bars.map((bar) => bar.cost));
  const rows = sizes.length + bars.length;
  const unitEntries = (row: number, sign: number) =>
    Array.from({ length: rows }, (_, each) => (each === row ? sign : 0));
  // A missing piece costs more than any bar, so that it is only left out when it cannot be cut.
  const basis: Column[] = Array.from({ length: rows }, (_, row) =>
    row < sizes.length
      ? { cost: 1000 * dearest, entries: unitEntries(row, 1), missing: true }
      : { cost: 0, entries: unitEntries(row, 1) },
  );
  const inverse = basis.map((_, row) => Float64Array.from(unitEntries(row, 1)));
  const amounts = Float64Array.from([...wanted, ...bars.map((bar) => bar.available)]);
  const capacity = Math.max(...bars.map((bar) => bar.capacity));
  const tolerance = 1e-9 * dearest;
  for (let steps = 1; ; steps += 1) {
    const prices = pricesOf(basis, inverse);
    const worth = worthOf(sizes, prices.slice(0, sizes.length), wanted, capacity);
    const entering = cheapest(problem, prices, worth, tolerance, unitEntries);
    if (!entering || steps > MOST_STEPS || !exchange(basis, inverse, amounts, entering)) {
      return finished(problem, basis, amounts, prices, worth);
    }
  }
}

function pricesOf(basis: readonly Column[], inverse: readonly Float64Array[]): number[] {
  const prices = new Array<number>(basis.length).fill(0);
  for (const [row, column] of basis.entries()) {
    if (column.cost === 0) continue;
    for (const [each, entry] of (inverse[row] ?? []).entries())
      prices[each] = (prices[each] ?? 0) + column.cost * entry;
  }
  return prices;
}

/** The column that saves most, or none. */
function cheapest(
  { sizes, wanted, bars }: Problem,
  prices: readonly number[],
  worth: Worth,
  tolerance: number,
  unitEntries: (row: number, sign: number) => number[],
): Column | undefined {
  let best: Column | undefined;
  let saving = tolerance;
  for (const [row, price] of prices.entries()) {
    // Cutting one too many must not pay, nor leaving a bar on the rack.
    const surplus = row < sizes.length ? -1 : 1;
    if (surplus * price > saving) {
      saving = surplus * price;
      best = { cost: 0, entries: unitEntries(row, surplus) };
    }
  }
  for (const [bar, { capacity, cost }] of bars.entries()) {
    const gain = (worth.from[0]?.[capacity] ?? 0) + (prices[sizes.length + bar] ?? 0) - cost;
    if (gain <= saving) continue;
    saving = gain;
    const cuts = bestCuts(worth, wanted, capacity);
    best = {
      cost,
      entries: [...cuts, ...bars.map((_, each) => (each === bar ? 1 : 0))],
      pattern: { bar, cuts },
    };
  }
  return best;
}

/** One step of the simplex method; false when no row limits the column, which rounding alone can bring about. */
function exchange(
  basis: Column[],
  inverse: Float64Array[],
  amounts: Float64Array,
  entering: Column,
): boolean {
  const direction = inverse.map((row) =>
    row.reduce((sum, entry, each) => sum + entry * (entering.entries[each] ?? 0), 0),
  );
  let leaving = -1;
  let least = Number.POSITIVE_INFINITY;
  for (const [row, slope] of direction.entries()) {
    if (slope <= 1e-9) continue;
    const ratio = Math.max(0, amounts[row] ?? 0) / slope;
    const first = ratio < least - 1e-12;
    // Among equals the steepest row leaves: it keeps the numbers sound.
    if (first || (ratio <= least + 1e-12 && slope > (direction[leaving] ?? 0)))
      [least, leaving] = [ratio, row];
  }
  const pivot = inverse[leaving];
  if (!pivot) return false;
  const slope = direction[leaving] ?? 1;
  for (let each = 0; each < pivot.length; each += 1) pivot[each] = (pivot[each] ?? 0) / slope;
  amounts[leaving] = (amounts[leaving] ?? 0) / slope;
  for (const [row, factor] of direction.entries()) {
    const target = inverse[row];
    if (row === leaving || !target || factor === 0) continue;
    for (let each = 0; each < target.length; each += 1)
      target[each] = (target[each] ?? 0) - factor * (pivot[each] ?? 0);
    amounts[row] = (amounts[row] ?? 0) - factor * (amounts[leaving] ?? 0);
  }
  basis[leaving] = entering;
  return true;
}

function finished(
  { sizes, wanted, bars }: Problem,
  basis: readonly Column[],
  amounts: Float64Array,
  prices: readonly number[],
  worth: Worth,
): Relaxed {
  const pieceValues = prices.slice(0, sizes.length).map((price) => Math.max(0, price));
  // What the best filling of a bar is worth beyond its cost. Set so, the bound holds even if the steps ended early.
  const barValues = bars.map(({ capacity, cost }) => Math.max(0, (worth.from[0]?.[capacity] ?? 0) - cost));
  const bound =
    wanted.reduce((sum, count, type) => sum + count * (pieceValues[type] ?? 0), 0) -
    bars.reduce((sum, { available }, bar) => sum + available * (barValues[bar] ?? 0), 0);
  const patterns = basis.flatMap(({ pattern }, row) =>
    pattern ? [{ pattern, times: amounts[row] ?? 0 }] : [],
  );
  const missing = basis.reduce((sum, column, row) => sum + (column.missing ? (amounts[row] ?? 0) : 0), 0);
  return { bound, pieceValues, barValues, patterns, missing, worth };
}

import type { StockCuttingInputs } from "./inputs.ts";
import type { Problem } from "./master.ts";

/** What a plan should have least of. */
export type Measure = "bars" | "length" | "cost";

/** The problem in whole units, and the way back to the inputs. */
export interface Sized {
  problem: Problem;
  measure: Measure;
  /** One unit of cost in the measure: 1 bar, 0.1 mm, or 0.01 of the currency. */
  costUnit: number;
  /** For each size, the places in `pieces` that have it; for each bar, its place in `stock`. */
  piecesOf: number[][];
  barOf: number[];
}

/** Forgives binary rounding of a tenth of a millimetre. */
const SLACK = 1e-6;

/**
 * Lengths as whole tenths of a millimetre, of as many tenths as keep a bar under 65,000 units; pieces are rounded up and
 * bars down, so that every plan can be cut. A piece and its cut count as one length, and the bar gets one kerf more, since
 * its last piece needs no cut of its own when nothing is left over.
 */
export function problemFrom(inputs: StockCuttingInputs): Sized {
  const { pieces, stock, kerf, trim } = inputs;
  const barOf = stock.flatMap(({ length, count }, index) => (count !== 0 && length > trim ? [index] : []));
  const rooms = barOf.map((index) => (stock[index]?.length ?? 0) - trim + kerf);
  const unit = Math.ceil(Math.max(...rooms) / 6500) / 10;
  const capacities = rooms.map((room) => Math.floor(room / unit + SLACK));
  const sizeOf = (length: number) => {
    const size = Math.max(1, Math.ceil((length + kerf) / unit - SLACK));
    // What truly fits a bar must not be kept out of it by rounding.
    const fits = capacities.filter(
      (capacity, bar) => capacity < size && length + kerf <= (rooms[bar] ?? 0) + 1e-9,
    );
    return Math.min(size, ...fits);
  };
  const bySize = new Map<number, number[]>();
  for (const [index, { length }] of pieces.entries()) {
    const size = sizeOf(length);
    bySize.set(size, [...(bySize.get(size) ?? []), index]);
  }
  const sizes = [...bySize.keys()].sort((a, b) => b - a);
  const piecesOf = sizes.map((size) => bySize.get(size) ?? []);
  const wanted = piecesOf.map((places) =>
    places.reduce((sum, place) => sum + (pieces[place]?.count ?? 0), 0),
  );
  const all = wanted.reduce((sum, count) => sum + count, 0);
  const common = [...sizes, ...capacities].reduce(divisor, 0);
  const { measure, costUnit, costs } = costsOf(inputs, barOf);
  const bars = barOf.map((index, bar) => ({
    capacity: (capacities[bar] ?? 0) / common,
    cost: costs[bar] ?? 1,
    available: Math.min(all, stock[index]?.count ?? all),
  }));
  return {
    problem: { sizes: sizes.map((size) => size / common), wanted, bars },
    measure,
    costUnit,
    piecesOf,
    barOf,
  };
}

function costsOf({ stock }: StockCuttingInputs, barOf: readonly number[]) {
  if (barOf.length === 1) return { measure: "bars" as const, costUnit: 1, costs: [1] };
  const chosen = barOf.map((index) => stock[index]);
  if (chosen.every((bar) => bar?.price !== undefined)) {
    return {
      measure: "cost" as const,
      costUnit: 0.01,
      costs: chosen.map((bar) => Math.round(100 * (bar?.price ?? 0))),
    };
  }
  return {
    measure: "length" as const,
    costUnit: 0.1,
    costs: chosen.map((bar) => Math.round(10 * (bar?.length ?? 0))),
  };
}

/** Greatest common divisor of two whole numbers. */
export function divisor(a: number, b: number): number {
  return b === 0 ? a : divisor(b, a % b);
}

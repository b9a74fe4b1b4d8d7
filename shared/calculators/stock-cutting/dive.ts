import { type Pattern, type Problem, relax } from "./master.ts";
import { costOf, type Plan, restAfter, wholeBars } from "./rest.ts";

/** How many relaxed problems may still be solved. */
export interface Dives {
  left: number;
}

/** How many patterns of a relaxed plan without a whole bar are tried in turn. */
const BREADTH = 3;

/**
 * Looks for a plan that costs no more than `most` by rounding: takes over the whole bars of the relaxed plan, relaxes
 * what is left, and so on; where there is no whole bar, the one used most, then the next. Finds most plans, proves nothing.
 *
 * @param start bars that are settled beforehand
 */
export function dive(
  problem: Problem,
  start: readonly Pattern[],
  most: number,
  dives: Dives,
): Plan | undefined {
  const rest = restAfter(problem, start);
  const spent = costOf(problem, start);
  if (rest.pieces === 0) return spent <= most ? { bars: [...start], cost: spent } : undefined;
  if (dives.left <= 0) return undefined;
  dives.left -= 1;
  const types = rest.wanted.flatMap((count, type) => (count > 0 ? [type] : []));
  const remaining: Problem = {
    sizes: types.map((type) => problem.sizes[type] ?? 0),
    wanted: types.map((type) => rest.wanted[type] ?? 0),
    bars: problem.bars.map((bar, index) => ({ ...bar, available: rest.available[index] ?? 0 })),
  };
  const relaxed = relax(remaining);
  if (relaxed.missing > 1e-6 || spent + relaxed.bound > most + 1e-7 * Math.max(1, most)) return undefined;
  const inFull = ({ bar, cuts }: Pattern): Pattern => ({
    bar,
    cuts: problem.sizes.map((_, type) => cuts[types.indexOf(type)] ?? 0),
  });
  const whole = wholeBars(remaining, relaxed.patterns, 1);
  if (whole.length > 0) return dive(problem, [...start, ...whole.map(inFull)], most, dives);
  const likely = relaxed.patterns.toSorted((a, b) => b.times - a.times).slice(0, BREADTH);
  for (const { pattern } of likely) {
    const plan = dive(problem, [...start, inFull(pattern)], most, dives);
    if (plan) return plan;
  }
  return undefined;
}

import type { Pattern, Problem } from "./master.ts";

/** Bars to cut, one pattern for each bar, and what they cost together. */
export interface Plan {
  bars: Pattern[];
  cost: number;
}

/** What is still to be cut, and of which bars. */
export interface Rest {
  wanted: number[];
  available: number[];
  pieces: number;
}

export function restAfter({ wanted, bars }: Problem, start: readonly Pattern[]): Rest {
  const rest = {
    wanted: [...wanted],
    available: bars.map(({ available }) => available),
    pieces: wanted.reduce((sum, count) => sum + count, 0),
  };
  for (const pattern of start) take(rest, pattern, 1);
  return rest;
}

/** Cuts a bar, or with −1 puts it back. */
export function take(rest: Rest, { bar, cuts }: Pattern, times: number) {
  rest.available[bar] = (rest.available[bar] ?? 0) - times;
  for (const [type, count] of cuts.entries()) {
    rest.wanted[type] = (rest.wanted[type] ?? 0) - times * count;
    rest.pieces -= times * count;
  }
}

/**
 * The whole bars of a relaxed plan, each with no more pieces than are still wanted.
 *
 * @param part how much of them to take over, 0 to 1
 */
export function wholeBars(
  problem: Problem,
  plan: readonly { pattern: Pattern; times: number }[],
  part: number,
): Pattern[] {
  const rest = restAfter(problem, []);
  const bars: Pattern[] = [];
  for (const { pattern, times } of plan) {
    for (let count = Math.floor(part * Math.floor(times + 1e-6)); count > 0; count -= 1) {
      const cuts = pattern.cuts.map((each, type) => Math.min(each, rest.wanted[type] ?? 0));
      if (!cuts.some((each) => each > 0) || (rest.available[pattern.bar] ?? 0) <= 0) break;
      const bar = { bar: pattern.bar, cuts };
      take(rest, bar, 1);
      bars.push(bar);
    }
  }
  return bars;
}

export function costOf({ bars }: Problem, cut: readonly Pattern[]): number {
  return cut.reduce((sum, { bar }) => sum + (bars[bar]?.cost ?? 0), 0);
}

import { listCuts } from "./knapsack.ts";
import type { Pattern, Problem, Relaxed } from "./master.ts";
import { costOf, type Plan, type Rest, restAfter, take } from "./rest.ts";

/** Work that may still be done: steps, counted the same on every machine. */
export interface Effort {
  left: number;
}

interface Option extends Pattern {
  /** What this bar costs more than its pieces are worth. */
  loss: number;
}

/** `none`: there is no such plan for certain. */
export type Outcome = Plan | "none" | "unfinished";

/**
 * Looks for a plan that costs no more than `most`, bar by bar: the next bar takes at least one of the longest pieces left.
 *
 * With the values of the relaxed problem a plan costs the bound and the losses of its bars, none below 0. So a bar
 * may only lose what is left of `most` − bound, which leaves few ways to cut it. A bar that has room for a piece still
 * wanted may be passed over: that piece can be moved there. What was left when a search failed is remembered.
 *
 * @param start bars that are settled beforehand
 */
export function findPlan(
  problem: Problem,
  relaxed: Relaxed,
  start: readonly Pattern[],
  most: number,
  effort: Effort,
): Outcome {
  const failed = new Map<string, number>();
  const chosen: Pattern[] = [...start];
  const rest = restAfter(problem, start);
  let complete = true;

  const search = (spare: number): boolean => {
    if (rest.pieces === 0) return true;
    if (effort.left <= 0) {
      complete = false;
      return false;
    }
    const key = `${rest.wanted.join()}|${rest.available.join()}`;
    if ((failed.get(key) ?? Number.NEGATIVE_INFINITY) >= spare - 1e-9) return false;
    effort.left -= NODE;
    const { options, all } = optionsFor(problem, relaxed, rest, spare, effort);
    complete &&= all;
    for (const option of options) {
      take(rest, option, 1);
      chosen.push(option);
      if (search(spare - option.loss)) return true;
      chosen.pop();
      take(rest, option, -1);
    }
    failed.set(key, spare);
    return false;
  };

  const tolerance = 1e-7 * Math.max(1, most);
  const lost = start.reduce((sum, pattern) => sum + lossOf(problem, relaxed, pattern), 0);
  if (search(most - relaxed.bound - lost + tolerance)) {
    return { bars: chosen, cost: costOf(problem, chosen) };
  }
  return complete ? "none" : "unfinished";
}

function lossOf({ bars }: Problem, { pieceValues, barValues }: Relaxed, { bar, cuts }: Pattern): number {
  const worth = cuts.reduce((sum, count, type) => sum + count * (pieceValues[type] ?? 0), 0);
  return (bars[bar]?.cost ?? 0) + (barValues[bar] ?? 0) - worth;
}

/** Steps that a bar, or a way to cut it, costs beside the listing. */
const NODE = 10;

/** The most ways of cutting one bar that are looked at before the list is called too long. */
const MANY = 4000;

function optionsFor(problem: Problem, relaxed: Relaxed, rest: Rest, spare: number, effort: Effort) {
  const first = rest.wanted.findIndex((count) => count > 0);
  const options: Option[] = [];
  let all = true;
  for (const [bar, { capacity, cost }] of problem.bars.entries()) {
    if ((rest.available[bar] ?? 0) <= 0 || capacity < (problem.sizes[first] ?? 0)) continue;
    const price = cost + (relaxed.barValues[bar] ?? 0);
    const before = options.length;
    const spend = () => {
      effort.left -= 1;
      return effort.left > 0 && options.length - before < MANY;
    };
    const finished = listCuts(
      relaxed.worth,
      rest.wanted,
      first,
      capacity,
      price - spare,
      spend,
      (cuts, value) => {
        effort.left -= NODE;
        options.push({ bar, cuts, loss: price - value });
      },
    );
    all &&= finished;
  }
  options.sort((a, b) => a.loss - b.loss);
  return { options, all };
}

/**
 * A plan made longest piece first, each bar filled as long as something fits; the bar that wastes least for its
 * cost is taken. Quick, and seldom far off.
 *
 * @returns undefined when the stock runs out on the way
 */
export function quickPlan(problem: Problem, relaxed: Relaxed, start: readonly Pattern[]): Plan | undefined {
  const rest = restAfter(problem, start);
  const bars = [...start];
  while (rest.pieces > 0) {
    const filled = problem.bars.flatMap((_, bar) => {
      const pattern = (rest.available[bar] ?? 0) > 0 && fillBar(problem, rest, bar);
      return pattern ? [{ ...pattern, loss: lossOf(problem, relaxed, pattern) }] : [];
    });
    const [next] = filled.sort((a, b) => a.loss - b.loss);
    if (!next) return undefined;
    take(rest, next, 1);
    bars.push(next);
  }
  return { bars, cost: costOf(problem, bars) };
}

function fillBar({ sizes, bars }: Problem, { wanted }: Rest, bar: number): Pattern | undefined {
  let room = bars[bar]?.capacity ?? 0;
  const longest = wanted.findIndex((count) => count > 0);
  if ((sizes[longest] ?? 0) > room) return undefined;
  const cuts = sizes.map((size, type) => {
    const count = Math.min(wanted[type] ?? 0, Math.floor(room / size));
    room -= count * size;
    return count;
  });
  return { bar, cuts };
}

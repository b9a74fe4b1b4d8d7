import { dive } from "./dive.ts";
import { type Problem, type Relaxed, relax } from "./master.ts";
import { type Plan, wholeBars } from "./rest.ts";
import { type Effort, findPlan, quickPlan } from "./search.ts";
import { divisor } from "./sizes.ts";

/** The best plan found, and how good it can be at all. */
export interface Solved {
  plan: Plan | undefined;
  /** No plan costs less. */
  bound: number;
  /** True when no better plan exists, or, without a plan, when none exists at all. */
  proven: boolean;
}

/** Steps of work before a search is given up: about a second, and the same answer on every machine. */
const EFFORT = 1_500_000;

/** What a search with bars settled beforehand may take of it. */
const PER_PART = EFFORT / 40;

/** Part of what is left that the search with everything open may take. */
const SHARE = 4;

/** Relaxed problems in one rounding, and what that counts as work. */
const DIVES = 20;
const DIVE = EFFORT / 24;

/** Which part of the relaxed plan is taken over before the rest is searched; the last leaves everything open. */
const SETTLED = [1, 0.5, 0];

/** The cheapest way to cut everything, by integer programming over cutting patterns. */
export function solve(problem: Problem): Solved {
  const relaxed = relax(problem);
  const step = problem.bars.reduce((common, { cost }) => divisor(common, cost), 0) || 1;
  const bound = step * Math.max(0, Math.ceil(relaxed.bound / step - 1e-6));
  if (relaxed.missing > 1e-6) return { plan: undefined, bound, proven: true };
  const search = { problem, relaxed, step, effort: { left: EFFORT } };
  return closeIn(search, quickest(problem, relaxed), bound);
}

interface Search {
  problem: Problem;
  relaxed: Relaxed;
  /** Plans differ in cost by whole multiples of this. */
  step: number;
  effort: Effort;
}

/**
 * Brings plan and bound together: asks for a plan at the bound first, where there are fewest ways to go, then further up.
 * A plan lowers the best cost, a certain no raises the bound.
 */
function closeIn(
  { problem, relaxed, step, effort }: Search,
  quick: Plan | undefined,
  relaxedBound: number,
): Solved {
  let [plan, bound, asked] = [quick, relaxedBound, relaxedBound];
  while ((!plan || plan.cost > bound) && effort.left > 0) {
    const outcome = improve(problem, relaxed, asked, effort);
    if (typeof outcome !== "string") plan = outcome;
    else if (outcome === "none") bound = asked + step;
    const most = plan ? plan.cost - step : dearest(problem);
    if (typeof outcome !== "string" || outcome === "none") {
      if (bound > most) return { plan, bound: plan?.cost ?? bound, proven: true };
      asked = bound + step * Math.floor((most - bound) / 2 / step);
    } else {
      // Higher up there are more ways to go; at the top it is tried again, with what work is left.
      asked = most - step * Math.floor((most - asked) / 2 / step);
    }
  }
  return { plan, bound, proven: plan !== undefined && plan.cost <= bound };
}

/** What every bar that could be of use would cost. */
function dearest({ wanted, bars }: Problem): number {
  const pieces = wanted.reduce((sum, count) => sum + count, 0);
  return bars.reduce((sum, { cost, available }) => sum + cost * Math.min(available, pieces), 0);
}

function quickest(problem: Problem, relaxed: Relaxed): Plan | undefined {
  const plans = SETTLED.map((part) =>
    quickPlan(problem, relaxed, wholeBars(problem, relaxed.patterns, part)),
  ).filter((plan) => plan !== undefined);
  return plans.sort((a, b) => a.cost - b.cost)[0];
}

/** Rounds first, then searches with less and less settled; only with everything open is a no for certain. */
function improve(problem: Problem, relaxed: Relaxed, most: number, effort: Effort) {
  const rounded = dive(problem, wholeBars(problem, relaxed.patterns, 1), most, { left: DIVES });
  effort.left -= DIVE;
  if (rounded) return rounded;
  for (const part of SETTLED) {
    const allowed = Math.min(effort.left, part === 0 ? effort.left / SHARE : PER_PART);
    const own = { left: allowed };
    const outcome = findPlan(problem, relaxed, wholeBars(problem, relaxed.patterns, part), most, own);
    effort.left -= allowed - own.left;
    if (typeof outcome !== "string") return outcome;
    if (part === 0) return outcome;
  }
  return "unfinished";
}

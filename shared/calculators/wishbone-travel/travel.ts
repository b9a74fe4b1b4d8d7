import { fail, ok, type Result } from "#shared/result.ts";
import type { CalculatorIssue } from "../definition.ts";
import { type Linkage, type Lock, type Pose, poseAt } from "./linkage.ts";

/** How far the wheel can go one way before something binds. */
export interface Limit {
  /** Swing of the lower arm there, radians from rest. */
  swing: number;
  /** Rise of the wheel centre there, mm; negative in rebound. */
  travel: number;
  lock: Lock;
}

const MARCH = (3 * Math.PI) / 180;

/** The pose at a swing, or what has stopped it; past its highest and lowest point the wheel counts as stopped. */
function reached(linkage: Linkage, swing: number): Pose | Lock {
  const pose = poseAt(linkage, swing);
  return typeof pose === "string" || pose.rise > 0 ? pose : "arms";
}

/**
 * Swings the lower arm from rest until the corner locks, and closes in on that place by halving.
 *
 * @param way 1 into bump, −1 into rebound
 */
export function limitOf(linkage: Linkage, way: 1 | -1): Limit {
  let good = 0;
  let bad = way * Math.PI;
  let lock: Lock = "arms";
  for (let swing = way * MARCH; Math.abs(swing) < Math.PI; swing += way * MARCH) {
    const pose = reached(linkage, swing);
    if (typeof pose !== "string") {
      good = swing;
      continue;
    }
    bad = swing;
    lock = pose;
    break;
  }
  for (let halving = 0; halving < 36; halving += 1) {
    const middle = (good + bad) / 2;
    const pose = reached(linkage, middle);
    if (typeof pose !== "string") good = middle;
    else {
      bad = middle;
      lock = pose;
    }
  }
  const last = poseAt(linkage, good);
  const travel = typeof last === "string" ? 0 : last.wheelCentre[2] - linkage.restHeight;
  return { swing: good, travel, lock };
}

/** A linkage with both ends of its travel. */
export interface Range {
  linkage: Linkage;
  bump: Limit;
  rebound: Limit;
}

export function rangeOf(linkage: Linkage): Range {
  return { linkage, bump: limitOf(linkage, 1), rebound: limitOf(linkage, -1) };
}

/**
 * The corner with its wheel centre raised by `travel` mm, to 1e-10 mm.
 *
 * Newton's method on the swing of the lower arm, kept between rest and the limit by halving.
 *
 * @param start a swing to begin from, such as that of the row before; radians
 * @returns fails on `bump` or `rebound` with the travel at which it locks
 */
export function poseAtTravel(range: Range, travel: number, start: number): Result<Pose, CalculatorIssue> {
  const { linkage } = range;
  const limit = travel < 0 ? range.rebound : range.bump;
  if (Math.abs(travel) > Math.abs(limit.travel) - 1e-6) return fail(locked(travel, limit));
  let low = Math.min(0, limit.swing);
  let high = Math.max(0, limit.swing);
  let swing = Math.min(high, Math.max(low, start));
  for (let round = 0; round < 100; round += 1) {
    const pose = poseAt(linkage, swing);
    if (typeof pose === "string") return fail(locked(travel, limit));
    const miss = pose.wheelCentre[2] - linkage.restHeight - travel;
    if (Math.abs(miss) < 1e-10 || high - low < 1e-15) return ok(pose);
    if (miss < 0) low = swing;
    else high = swing;
    const next = swing - miss / pose.rise;
    swing = next > low && next < high ? next : (low + high) / 2;
  }
  return fail(locked(travel, limit));
}

function locked(travel: number, { travel: limit, lock }: Limit): CalculatorIssue {
  const what = lock === "rod" ? "The rod locks" : "The arms lock";
  const field = travel < 0 ? "rebound" : "bump";
  const reach = Math.abs(limit);
  const at = `${travel < 0 ? "−" : "+"}${Math.floor(reach)}`;
  const least = Math.max(0, Math.ceil(reach) - 1);
  return {
    field,
    message: `${what} at ${at} mm of ${field}: keep ${field} at ${least} mm or less, or move the points.`,
  };
}

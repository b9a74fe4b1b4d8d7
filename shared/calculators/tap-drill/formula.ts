import { fail, ok, type Result } from "#shared/result.ts";
import type { CalculatorIssue } from "../definition.ts";
import { nearestDrill } from "../tables/drills.ts";
import { minorDiameter } from "../tables/screw-thread.ts";
import type { ClearanceHoles } from "../tables/unified-threads.ts";
import { findThread, type TappedThread } from "./designation.ts";
import type { TapDrillInputs } from "./inputs.ts";

/** Results of `tap-drill`; lengths in mm, area in mm², engagement in percent. */
export interface TapDrillResults {
  /** The thread as the tables write it. */
  designation: string;
  diameter: number;
  pitch: number;
  /** The hole that gives exactly the engagement asked for. */
  drill: number;
  /** A drill that can be bought, and what its packet says. */
  standardDrill: number;
  standardDrillName: string;
  standardDrillEngagement: number;
  /** Basic minor diameter of the nut thread. */
  minor: number;
  clearance: ClearanceHoles;
  /** Of the screw that goes in. */
  stressArea: number;
}

/** Twice the height of a full 60° thread's engagement, 0.6495·2·P at 100 %, put as the shop rule has it. */
const FULL_THREAD = 76.98;

/** A standard's own tapping drill is taken when it comes this near to the engagement asked for, in percent points. */
const NEAR_ENOUGH = 5;

/**
 * Engagement that a hole of this diameter leaves: (D − hole)·76.98 / P.
 *
 * @returns percent
 */
export function engagementOf({ diameter, pitch }: TappedThread, hole: number): number {
  return ((diameter - hole) * FULL_THREAD) / pitch;
}

/**
 * The hole to drill before tapping: D − P·engagement / 76.98.
 *
 * @param inputs parsed by `tapDrillInputs`
 * @returns fails on `thread` when the tables do not have it
 * @see Machinery's Handbook, "Tapping", for the rule; ISO 2306 for the metric drills
 */
export function tapDrill({
  thread: written,
  engagement,
}: TapDrillInputs): Result<TapDrillResults, CalculatorIssue> {
  const thread = findThread(written);
  if (!thread) return fail({ field: "thread", message: unknownThread(written) });
  const drill = thread.diameter - (thread.pitch * engagement) / FULL_THREAD;
  const bought = boughtDrill(thread, drill, engagement);
  return ok({
    designation: thread.designation,
    diameter: thread.diameter,
    pitch: thread.pitch,
    drill,
    standardDrill: bought.diameter,
    standardDrillName: bought.name,
    standardDrillEngagement: engagementOf(thread, bought.diameter),
    minor: minorDiameter(thread),
    clearance: thread.clearance,
    stressArea: thread.stressArea,
  });
}

function boughtDrill(thread: TappedThread, drill: number, engagement: number) {
  const { tappingDrill } = thread;
  if (tappingDrill && Math.abs(engagementOf(thread, tappingDrill) - engagement) <= NEAR_ENOUGH) {
    return { diameter: tappingDrill, name: `${tappingDrill} mm` };
  }
  return nearestDrill(thread.drills, drill);
}

function unknownThread(written: string): string {
  return `"${written}" is not in the tables: they hold ISO metric M1.6 to M36 coarse and fine, and UNC and UNF #2 to 1 in. Write it as M10, M10x1.25 or 1/4-20 UNC.`;
}

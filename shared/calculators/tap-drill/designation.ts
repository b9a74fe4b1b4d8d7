import { metricClearance } from "../tables/clearance-holes.ts";
import { type Drill, inchDrills, metricDrills } from "../tables/drills.ts";
import { metricDesignation, metricThreads } from "../tables/metric-threads.ts";
import { metricStressArea, type ScrewThread, unifiedStressArea } from "../tables/screw-thread.ts";
import { type ClearanceHoles, unifiedThreads } from "../tables/unified-threads.ts";

/** A thread that can be tapped, with what its standard says of it. Lengths in mm, area in mm². */
export interface TappedThread extends ScrewThread {
  designation: string;
  stressArea: number;
  clearance: ClearanceHoles;
  drills: readonly Drill[];
  /** The drill its standard names; unified threads have none. */
  tappingDrill?: number;
}

/** Every thread of the tables: ISO metric coarse and fine, UNC, UNF. */
export const tappedThreads: readonly TappedThread[] = [
  ...metricThreads.map((thread) => ({
    ...thread,
    designation: metricDesignation(thread),
    stressArea: metricStressArea(thread),
    clearance: metricClearance(thread.diameter),
    drills: metricDrills,
  })),
  ...unifiedThreads.map((thread) => ({
    ...thread,
    stressArea: unifiedStressArea(thread),
    drills: inchDrills,
  })),
];

/** A key that spellings of the same thread share: "M10 × 1.5", "m10x1.50" and "M10" become one. */
function keyOf(written: string): string {
  const plain = written
    .toUpperCase()
    .replace(/NO\.?|№/g, "#")
    .replace(/[\s"″]|IN(?=-)/g, "")
    .replace(/[×*]/g, "X")
    .replace(",", ".");
  const metric = /^M(\d+(?:\.\d+)?)(?:X(\d*\.?\d+))?$/.exec(plain);
  return metric ? `M${Number(metric[1])}${metric[2] ? `X${Number(metric[2])}` : ""}` : plain;
}

const byKey = new Map<string, TappedThread>();
for (const thread of tappedThreads) {
  const key = keyOf(thread.designation);
  byKey.set(key, thread);
  if (key.startsWith("M")) byKey.set(`M${thread.diameter}X${thread.pitch}`, thread);
  else {
    const short = key.replace(/UN[CF]$/, "");
    byKey.set(short, thread);
    byKey.set(key.replace("#", ""), thread);
    byKey.set(short.replace("#", ""), thread);
  }
}

/**
 * Finds a thread by what is written on the tap: "M10", "M10x1.25", "1/4-20 UNC", "#10-32".
 *
 * @returns `undefined` when the tables do not have it
 */
export function findThread(written: string): TappedThread | undefined {
  return byKey.get(keyOf(written));
}

import { fail, ok, type Result } from "#shared/result.ts";
import type { CalculatorIssue } from "../definition.ts";
import { type MetricThread, metricThreads } from "../tables/metric-threads.ts";
import { metricStressArea } from "../tables/screw-thread.ts";
import { type BoltGrade, boltGrades } from "./grades.ts";
import type { BoltInputs } from "./inputs.ts";

/** Results of `bolt`: mm², N, torque in N·m. */
export interface BoltResults {
  diameter: number;
  pitch: number;
  stressArea: number;
  proofLoad: number;
  /** Ft,Rd of one bolt. */
  tensionResistance: number;
  /** Fv,Rd of one bolt across one shear plane. */
  shearResistance: number;
  preload: number;
  /** N·m */
  torque: number;
  /** What the reader of these numbers has to know about this bolt. */
  notes: string[];
}

/**
 * Proof load, resistances and tightening of one steel bolt.
 *
 * proof load = Sp·As; Ft,Rd = 0.9·fub·As / γM2; Fv,Rd = αv·fub·A / γM2; torque = K·d·F.
 *
 * @param inputs parsed by `boltInputs`
 * @returns fails on `pitch` when the size is not made with it
 * @see ISO 898-1:2013; ISO 724; EN 1993-1-8:2005, table 3.4, k2 = 0.9 (not countersunk)
 */
export function bolt(inputs: BoltInputs): Result<BoltResults, CalculatorIssue> {
  const diameter = Number(inputs.size.slice(1));
  const made = metricThreads.filter((thread) => thread.diameter === diameter);
  const thread = made.find(({ pitch, coarse }) =>
    inputs.pitch === undefined ? coarse : pitch === inputs.pitch,
  );
  if (!thread) return fail({ field: "pitch", message: noSuchPitch(inputs.size, made) });
  const grade: BoltGrade | undefined = boltGrades.find((row) => row.grade === inputs.grade);
  if (!grade) return fail({ field: "grade", message: `Grade ${inputs.grade} is not in the table.` });
  const stressArea = metricStressArea(thread);
  const proofLoad = stressArea * (diameter > 16 ? grade.proofAboveM16 : grade.proof);
  const preload = inputs.preloadFraction * proofLoad;
  return ok({
    diameter,
    pitch: thread.pitch,
    stressArea,
    proofLoad,
    tensionResistance: (0.9 * grade.ultimate * stressArea) / inputs.gammaM2,
    shearResistance: (shearStrength(grade, inputs, stressArea) * grade.ultimate) / inputs.gammaM2,
    preload,
    torque: (inputs.frictionFactor * diameter * preload) / 1000,
    notes: notes(inputs, diameter),
  });
}

/** αv·A: the thread's stress area, or the whole shank where no thread lies in the plane. */
function shearStrength(grade: BoltGrade, inputs: BoltInputs, stressArea: number): number {
  if (inputs.threadsInShear) return grade.shearFactor * stressArea;
  return 0.6 * (Math.PI / 4) * Number(inputs.size.slice(1)) ** 2;
}

function noSuchPitch(size: string, made: readonly MetricThread[]): string {
  const pitches = made.map(({ pitch, coarse }) => (coarse ? `${pitch} mm (coarse)` : `${pitch} mm`));
  return `${size} is made with a pitch of ${pitches.join(", ")}: pick one of these, or leave the pitch out.`;
}

function notes({ grade }: BoltInputs, diameter: number): string[] {
  const said: string[] = [];
  if (grade === "12.9") {
    said.push(
      "EN 1993-1-8 stops at class 10.9: for 12.9 the two resistances are its formulas carried further.",
    );
  }
  if (diameter < 12) {
    said.push("EN 1090-2 keeps bolts under M12 out of structural steelwork unless the design says so.");
  }
  if (diameter === 12 || diameter === 14) {
    said.push(
      "In holes with 2 mm clearance EN 1993-1-8, 3.6.1(5), takes 0.85 of the shear resistance at this size.",
    );
  }
  return said;
}

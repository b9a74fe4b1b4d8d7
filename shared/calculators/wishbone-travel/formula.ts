import { fail, ok, type Result } from "#shared/result.ts";
import type { CalculatorIssue } from "../definition.ts";
import { distance, size, type Vector } from "../vectors.ts";
import { type Corner, cornerFrom, springAt } from "./corner.ts";
import type { WishboneTravelInputs } from "./inputs.ts";
import { type JointTilt, jointTilt } from "./joint-tilt.ts";
import type { Pose } from "./linkage.ts";
import {
  centres,
  contactPoint,
  type InstantCentre,
  steeringAxis,
  wheelAngleRates,
  wheelAngles,
} from "./measures.ts";
import { poseAtTravel, type Range } from "./travel.ts";

/** One line of the table: mm and degrees. */
export interface TravelRow {
  /** Rise of the wheel centre from rest; positive in bump. */
  travel: number;
  /** Positive: top leans out. */
  camber: number;
  /** Positive: toe-in. */
  toe: number;
  caster: number;
  kpi: number;
  /** How far the contact point of this wheel has moved out since rest. */
  trackChange: number;
  /** Height above the contact point; null when its line stands upright. */
  rollCentre: number | null;
  /** Null with parallel arms. */
  instantCentre: InstantCentre | null;
  scrubRadius: number;
  trail: number;
  /** Swing of each arm since rest; positive in bump. */
  lowerSwing: number;
  upperSwing: number;
  /** Null without a spring. */
  springLength: number | null;
  /** Spring travel for each mm of wheel travel; positive when bump shortens the spring. */
  motionRatio: number | null;
}

/** Heights above the jig table: what to pack under each. */
export interface JigHeights {
  hubCentre: number;
  lowerJoint: number;
  upperJoint: number;
}

/** Results of `wishbone-travel`: mm and degrees. */
export interface WishboneTravelResults {
  /** From full rebound up to full bump. */
  rows: TravelRow[];
  /** Change for 25 mm of bump, from the slope at rest. */
  gains: { camber: number; toe: number };
  /** How far the wheel could go before the linkage binds, both positive. */
  lockBump: number;
  lockRebound: number;
  jig: { rest: JigHeights; bump: JigHeights };
  jointTilt: { lower: JointTilt; upper: JointTilt };
  /** Height of the contact point above the drawing's ground level at rest; 0 when the drawing is at its ride height. */
  contactHeight: number;
  notes: string[];
}

/** 0, −rebound, bump and every multiple of the step between, lowest first. */
export function travelsOf({ bump, rebound, step }: WishboneTravelInputs): number[] {
  const travels = new Set([-rebound, bump]);
  for (let count = -Math.floor(rebound / step); count <= Math.floor(bump / step); count += 1) {
    travels.add(count * step);
  }
  return [...travels].map((travel) => travel + 0).sort((a, b) => a - b);
}

/** Poses for all travels, each begun from its neighbour on the side of rest. */
function posesAt(range: Range, travels: readonly number[]): Result<Pose[], CalculatorIssue> {
  const rest = travels.indexOf(0);
  const poses: Pose[] = new Array(travels.length);
  for (const way of [1, -1]) {
    let [start, from, perMm] = [0, 0, 0];
    for (let index = rest; index >= 0 && index < travels.length; index += way) {
      const travel = travels[index] ?? 0;
      const pose = poseAtTravel(range, travel, start + (travel - from) * perMm);
      if (!pose.ok) return pose;
      poses[index] = pose.value;
      [start, from, perMm] = [pose.value.lowerSwing, travel, 1 / pose.value.rise];
    }
  }
  return ok(poses);
}

const degrees = (radians: number) => (radians * 180) / Math.PI;

function rowAt(corner: Corner, travel: number, pose: Pose, contactAtRest: Vector): TravelRow {
  const { lower, upper } = corner.range.linkage;
  const contact = contactPoint(pose.wheelCentre, pose.spindle, corner.inputs.loadedRadius);
  return {
    travel,
    ...wheelAngles(pose.spindle),
    ...steeringAxis(pose.lower, pose.upper, contact),
    trackChange: contact[1] - contactAtRest[1],
    ...centres(lower, upper, pose, contact),
    lowerSwing: degrees(pose.lowerSwing),
    upperSwing: degrees(pose.upperSwing),
    ...springAt(corner, pose),
  };
}

/**
 * A double wishbone corner through bump and rebound, in space.
 *
 * The wishbones' joints run on circles about their pivot lines, the upright is rigid, the rod keeps its length and its
 * inner end stays where it is. Each travel of the wheel centre is solved to 1e-9 mm.
 *
 * @param inputs parsed by `wishboneTravelInputs`
 * @returns fails as `linkageFrom` does; on `bump` or `rebound` with the travel at which the linkage locks; on
 * `spring.moving` when the spring has no length; on a housing axis without direction; on `tableUp` when the table
 * stands above a joint
 * @see ISO 8855:2011 for the axes and signs
 */
export function wishboneTravel(inputs: WishboneTravelInputs): Result<WishboneTravelResults, CalculatorIssue> {
  const made = cornerFrom(inputs);
  if (!made.ok) return made;
  const corner = made.value;
  const travels = travelsOf(inputs);
  const solved = posesAt(corner.range, travels);
  if (!solved.ok) return solved;
  const poses = solved.value;
  const rest = poses[travels.indexOf(0)];
  const full = poses.at(-1);
  if (!rest || !full) throw new Error("The travels always hold 0 and full bump");
  const misfit = misfitOf(inputs);
  if (misfit) return fail(misfit);
  const contact = contactPoint(rest.wheelCentre, rest.spindle, inputs.loadedRadius);
  const rows = poses.map((pose, index) => rowAt(corner, travels[index] ?? 0, pose, contact));
  const short = rows.find(({ springLength }) => springLength !== null && springLength < 1);
  if (short)
    return fail({
      field: "spring.moving",
      message: `The ends of the spring meet at ${short.travel} mm of travel: move one of them.`,
    });
  const rates = wheelAngleRates(rest);
  const { bump, rebound } = corner.range;
  return ok({
    rows,
    gains: { camber: 25 * rates.camber, toe: 25 * rates.toe },
    lockBump: bump.travel,
    lockRebound: -rebound.travel,
    jig: { rest: heights(rest, inputs), bump: heights(full, inputs) },
    jointTilt: tilts(corner, poses),
    contactHeight: contact[2],
    notes: notesOn(contact[2]),
  });
}

function heights({ wheelCentre, lower, upper }: Pose, { tableUp = 0 }: WishboneTravelInputs): JigHeights {
  return {
    hubCentre: wheelCentre[2] - tableUp,
    lowerJoint: lower[2] - tableUp,
    upperJoint: upper[2] - tableUp,
  };
}

function tilts({ inputs, range }: Corner, poses: readonly Pose[]) {
  const { lower, upper } = range.linkage;
  const { lowerJoint, upperJoint, lowerHousingAxis, upperHousingAxis, jointSwing } = inputs;
  const atLower = poses.map(({ frame, lowerSwing }) => ({ stud: frame[0], swing: lowerSwing }));
  const atUpper = poses.map(({ frame, upperSwing }) => ({ stud: frame[0], swing: upperSwing }));
  return {
    lower: jointTilt(lower, lowerJoint, lowerHousingAxis, atLower, jointSwing),
    upper: jointTilt(upper, upperJoint, upperHousingAxis, atUpper, jointSwing),
  };
}

/** What can be wrong beside the linkage. */
function misfitOf(inputs: WishboneTravelInputs): CalculatorIssue | undefined {
  for (const field of ["lowerHousingAxis", "upperHousingAxis"] as const) {
    const axis = inputs[field];
    if (axis && size(axis) < 0.001) {
      return { field, message: "The housing axis has no direction: give at least one number that is not 0." };
    }
  }
  const { spring, tableUp, lowerJoint, wheelCentre } = inputs;
  if (spring && distance(spring.chassis, spring.moving) < 1) {
    return { field: "spring.moving", message: "The spring has no length: set its ends at least 1 mm apart." };
  }
  const lowest = Math.min(lowerJoint[2], wheelCentre[2]);
  if (tableUp !== undefined && tableUp > lowest) {
    const message = `The jig table stands above what it should carry: set it at ${lowest} mm or lower.`;
    return { field: "tableUp", message };
  }
  return undefined;
}

function notesOn(contactHeight: number): string[] {
  if (Math.abs(contactHeight) < 1) return [];
  const where = contactHeight > 0 ? "above" : "below";
  return [
    `The tyre's contact point is ${Math.abs(contactHeight).toFixed(1)} mm ${where} the drawing's ground level. Check the loaded radius and the height of the wheel centre.`,
  ];
}

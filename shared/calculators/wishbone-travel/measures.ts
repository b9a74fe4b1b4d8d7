import { along, cross, dot, subtract, unit, type Vector } from "../vectors.ts";
import type { Arm } from "./arm.ts";
import type { Pose } from "./linkage.ts";

const degrees = (radians: number) => (radians * 180) / Math.PI;

/** Camber and toe of a wheel from the outward unit direction of its axis; degrees. */
export function wheelAngles(spindle: Vector) {
  return { camber: -degrees(Math.asin(spindle[2])), toe: degrees(Math.atan2(spindle[0], spindle[1])) };
}

/** How fast camber and toe change, degrees for each mm the wheel centre rises. */
export function wheelAngleRates({ spindle, spin, rise }: Pose) {
  const change = cross(spin, spindle);
  const level = spindle[0] ** 2 + spindle[1] ** 2;
  return {
    camber: -degrees(change[2] / Math.sqrt(level)) / rise,
    toe: degrees((change[0] * spindle[1] - change[1] * spindle[0]) / level) / rise,
  };
}

/** The lowest point of the wheel's middle plane at the loaded radius: where the tyre meets the ground. */
export function contactPoint(wheelCentre: Vector, spindle: Vector, loadedRadius: number): Vector {
  const down = unit(along([0, 0, -1], spindle, spindle[2]));
  return along(wheelCentre, down, loadedRadius);
}

/**
 * Steering axis through two joints: kingpin inclination and caster in degrees, scrub radius and trail in mm at the
 * height of the contact point. Signs: leaning inboard, leaning rearward, contact outboard, contact behind: positive.
 *
 * @see ISO 8855:2011 for the axes and terms; the signs of caster and kingpin inclination are common practice
 */
export function steeringAxis(lower: Vector, upper: Vector, contact: Vector) {
  const joints = subtract(upper, lower);
  const onGround = along(lower, joints, (contact[2] - lower[2]) / joints[2]);
  return {
    kpi: degrees(Math.atan2(-joints[1], joints[2])),
    caster: degrees(Math.atan2(-joints[0], joints[2])),
    scrubRadius: contact[1] - onGround[1],
    trail: onGround[0] - contact[0],
  };
}

/** A point of the upright plane across the car, mm from the centreline and above ground level. */
export interface InstantCentre {
  out: number;
  up: number;
}

/** The line in which an arm's plane cuts the upright plane across the car: a·out + b·up = c from `origin`, a² + b² = 1. */
function cutLine(arm: Arm, joint: Vector, origin: Vector): Vector | undefined {
  const normal = cross(arm.axis, unit(subtract(joint, arm.centre)));
  const size = Math.hypot(normal[1], normal[2]);
  if (size < 1e-6) return undefined;
  return [normal[1] / size, normal[2] / size, dot(normal, subtract(joint, origin)) / size];
}

/**
 * Instant centre of the wheel in the upright plane across the car through its centre, and the roll centre.
 *
 * The roll centre is where the line from the contact point through the instant centre meets the centreline. The
 * crossing is kept in homogeneous form, so that parallel arms simply give their slope.
 *
 * @returns the roll centre's height above the contact point, mm; null for a centre that does not exist: the instant
 * centre of parallel arms, the roll centre when that line stands upright
 */
export function centres(lower: Arm, upper: Arm, pose: Pose, contact: Vector) {
  const origin = pose.wheelCentre;
  const first = cutLine(lower, pose.lower, origin);
  const second = cutLine(upper, pose.upper, origin);
  if (!first || !second) return { rollCentre: null, instantCentre: null };
  const [x, y, w] = [
    second[1] * first[2] - first[1] * second[2],
    first[0] * second[2] - second[0] * first[2],
    first[0] * second[1] - second[0] * first[1],
  ];
  const outward = x - (contact[1] - origin[1]) * w;
  const upward = y - (contact[2] - origin[2]) * w;
  const apart = Math.hypot(x, y, w);
  const rollCentre = Math.abs(outward) > 1e-9 * apart ? (-contact[1] * upward) / outward : null;
  const instantCentre: InstantCentre | null =
    Math.abs(w) > 1e-9 ? { out: origin[1] + x / w, up: origin[2] + y / w } : null;
  return { rollCentre, instantCentre };
}

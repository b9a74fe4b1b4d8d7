import { fail, ok, type Result } from "#shared/result.ts";
import type { CalculatorIssue } from "../definition.ts";
import { add, along, cross, distance, dot, scale, subtract, unit, type Vector } from "../vectors.ts";
import {
  type Arm,
  angleOf,
  armFrom,
  carriedBy,
  jointAt,
  type Meeting,
  pointAtReach,
  sideOf,
  turnedAbout,
} from "./arm.ts";
import type { WishboneTravelInputs } from "./inputs.ts";

/** The corner as a mechanism of one freedom: the swing of its lower arm. */
export interface Linkage {
  lower: Arm;
  upper: Arm;
  rodInner: Vector;
  /** Distance between the two joints; from the lower joint along that line, and out from it, to the rod's outer end. */
  spread: number;
  rodAlong: number;
  rodAside: number;
  rodLength: number;
  /** The upper joint's circle, and on which side of it the joint stands. */
  onUpper: Meeting;
  rodSide: number;
  /** In the upright's own axes from the lower joint. */
  wheelCentre: Vector;
  spindle: Vector;
  restHeight: number;
}

/** The corner at one swing of the lower arm. Velocities are for one radian of that swing. */
export interface Pose {
  lowerSwing: number;
  upperSwing: number;
  lower: Vector;
  upper: Vector;
  rod: Vector;
  /** The upright's axes: along the joints, toward the rod's end, and square to both. */
  frame: Frame;
  wheelCentre: Vector;
  /** Unit, outward. */
  spindle: Vector;
  lowerVelocity: Vector;
  upperRate: number;
  spin: Vector;
  /** Rise of the wheel centre, mm/rad. */
  rise: number;
}

type Frame = readonly [Vector, Vector, Vector];

/** What stops the travel. */
export type Lock = "arms" | "rod";

function frameOf(lower: Vector, upper: Vector, rod: Vector): Frame {
  const steering = unit(subtract(upper, lower));
  const aside = subtract(rod, lower);
  const lever = unit(along(aside, steering, -dot(aside, steering)));
  return [steering, lever, cross(steering, lever)];
}

const intoFrame = (frame: Frame, vector: Vector): Vector => [
  dot(frame[0], vector),
  dot(frame[1], vector),
  dot(frame[2], vector),
];

/** A direction or an arm given in the upright's axes, in those of the car. */
export function outOfFrame(frame: Frame, local: Vector): Vector {
  return along(along(scale(frame[0], local[0]), frame[1], local[1]), frame[2], local[2]);
}

/** A point of the upright, given at rest, in the upright's own axes from the lower joint. */
export function fixedToUpright(inputs: WishboneTravelInputs, atRest: Vector): Vector {
  const frame = frameOf(inputs.lowerJoint, inputs.upperJoint, inputs.rodOuter);
  return intoFrame(frame, subtract(atRest, inputs.lowerJoint));
}

/** Outward unit direction of the wheel's axis; camber and toe in degrees. */
export function spindleDirection(camber: number, toe: number): Vector {
  const lean = (camber * Math.PI) / 180;
  const turned = (toe * Math.PI) / 180;
  return [Math.sin(turned) * Math.cos(lean), Math.cos(turned) * Math.cos(lean), -Math.sin(lean)];
}

/**
 * The corner at a swing of the lower arm, radians from rest.
 *
 * The upper joint is the point of its circle that is a spread away from the lower joint; the rod's outer end is
 * the point of its circle about the steering axis that is a rod away from the rod's inner end.
 *
 * @returns what stops it when there is no such point, or when the upright would lie flat
 */
export function poseAt(linkage: Linkage, lowerSwing: number): Pose | Lock {
  const lower = jointAt(linkage.lower, lowerSwing);
  const upper = pointAtReach(linkage.onUpper, lower, linkage.spread);
  if (!upper || upper[2] - lower[2] < 1) return "arms";
  const joints = subtract(upper, lower);
  const steering = scale(joints, 1 / linkage.spread);
  const centre = along(lower, steering, linkage.rodAlong);
  const aboutSteering = { centre, axis: steering, radius: linkage.rodAside, side: linkage.rodSide };
  const rod = pointAtReach(aboutSteering, linkage.rodInner, linkage.rodLength);
  if (!rod) return "rod";
  const lever = scale(subtract(rod, centre), 1 / linkage.rodAside);
  const frame: Frame = [steering, lever, cross(steering, lever)];
  const wheelArm = outOfFrame(frame, linkage.wheelCentre);
  const motion = motionOf(linkage, lower, upper, rod);
  return {
    lowerSwing,
    upperSwing: angleOf(linkage.upper, upper),
    lower,
    upper,
    rod,
    frame,
    wheelCentre: add(lower, wheelArm),
    spindle: outOfFrame(frame, linkage.spindle),
    ...motion,
    rise: motion.lowerVelocity[2] + cross(motion.spin, wheelArm)[2],
  };
}

/** First-order motion: the spread and the rod keep their lengths. */
function motionOf(
  { lower: lowerArm, upper: upperArm, rodInner }: Linkage,
  lower: Vector,
  upper: Vector,
  rod: Vector,
) {
  const joints = subtract(upper, lower);
  const lowerVelocity = carriedBy(lowerArm, lower);
  const upperDirection = carriedBy(upperArm, upper);
  const upperRate = dot(joints, lowerVelocity) / dot(joints, upperDirection);
  const closing = subtract(scale(upperDirection, upperRate), lowerVelocity);
  const tilting = scale(cross(joints, closing), 1 / dot(joints, joints));
  const arm = subtract(rod, lower);
  const rodLine = subtract(rod, rodInner);
  const drift = dot(rodLine, add(lowerVelocity, cross(tilting, arm)));
  const steer = -drift / dot(rodLine, cross(joints, arm));
  return { lowerVelocity, upperRate, spin: along(tilting, joints, steer) };
}

const fault = (field: string, message: string) => fail({ field, message });

/**
 * Makes the mechanism of the points at rest.
 *
 * @param inputs parsed by `wishboneTravelInputs`
 * @returns fails on the point that makes it no mechanism: an arm without length, joints upside down, a rod that
 * cannot hold the wheel, arms that are locked as drawn
 */
export function linkageFrom(inputs: WishboneTravelInputs): Result<Linkage, CalculatorIssue> {
  const { lowerJoint, upperJoint, rodInner, rodOuter } = inputs;
  const lower = armFrom(inputs.lowerFront, inputs.lowerRear, lowerJoint);
  if (!lower) return fault("lowerJoint", noArm("lower"));
  const upper = armFrom(inputs.upperFront, inputs.upperRear, upperJoint);
  if (!upper) return fault("upperJoint", noArm("upper"));
  if (upperJoint[2] - lowerJoint[2] < 10) {
    return fault(
      "upperJoint",
      `The upper joint must stand above the lower one: set it above ${lowerJoint[2] + 10} mm.`,
    );
  }
  const spread = distance(lowerJoint, upperJoint);
  const steering = scale(subtract(upperJoint, lowerJoint), 1 / spread);
  const rodAlong = dot(subtract(rodOuter, lowerJoint), steering);
  const rodCentre = along(lowerJoint, steering, rodAlong);
  const rodAside = distance(rodOuter, rodCentre);
  if (rodAside < 1) {
    return fault(
      "rodOuter",
      "The rod's outer end lies on the steering axis, where it cannot hold the wheel: set it at least 1 mm off the line between the joints.",
    );
  }
  const rodLength = distance(rodInner, rodOuter);
  if (rodLength < 1)
    return fault("rodInner", "The rod has no length: set its inner end at least 1 mm from its outer end.");
  const rest = {
    lower,
    upper,
    rodInner,
    spread,
    rodAlong,
    rodAside,
    rodLength,
    onUpper: { ...upper, side: sideOf(upper.centre, upper.axis, lowerJoint, upperJoint) },
    rodSide: sideOf(rodCentre, steering, rodInner, rodOuter),
    wheelCentre: fixedToUpright(inputs, inputs.wheelCentre),
    spindle: fixedToUpright(inputs, add(lowerJoint, spindleDirection(inputs.camber, inputs.toe))),
    restHeight: inputs.wheelCentre[2],
  };
  return upwards(rest, inputs);
}

const noArm = (which: string) =>
  `The ${which} arm cannot swing: its pivots must be at least 1 mm apart, and its joint at least 1 mm off the line through them.`;

/** Counts the swing so that positive lifts the wheel; fails when the mechanism is stuck as drawn. */
function upwards(rest: Linkage, inputs: WishboneTravelInputs): Result<Linkage, CalculatorIssue> {
  const { lowerJoint, upperJoint, rodInner, rodOuter } = inputs;
  const steering = unit(subtract(upperJoint, lowerJoint));
  const hold = dot(steering, unit(carriedBy(rest.upper, upperJoint)));
  if (Math.abs(hold) < 0.01) {
    return fault(
      "upperJoint",
      "As drawn, the upper arm is locked: it lies in line with the two joints. Move the upper joint or its pivots.",
    );
  }
  const rodLine = unit(subtract(rodOuter, rodInner));
  const lever = unit(cross(steering, subtract(rodOuter, lowerJoint)));
  if (Math.abs(dot(rodLine, lever)) < 0.01) {
    return fault(
      "rodInner",
      "As drawn, the rod points at the steering axis and cannot hold the wheel. Move its inner or its outer end.",
    );
  }
  const pose = poseAt(rest, 0);
  if (typeof pose === "string" || Math.abs(pose.rise) < 0.01 * rest.lower.radius) {
    return fault(
      "wheelCentre",
      "As drawn, swinging the lower arm does not lift the wheel. Check the pivots: front and rear lie along the car.",
    );
  }
  const lower = pose.rise > 0 ? rest.lower : turnedAbout(rest.lower);
  const upper = pose.upperRate * pose.rise < 0 ? turnedAbout(rest.upper) : rest.upper;
  return ok({ ...rest, lower, upper });
}

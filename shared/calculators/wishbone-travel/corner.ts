import { ok, type Result } from "#shared/result.ts";
import type { CalculatorIssue } from "../definition.ts";
import { add, cross, dot, scale, size, subtract, type Vector } from "../vectors.ts";
import { carriedBy, movedBy } from "./arm.ts";
import type { WishboneTravelInputs } from "./inputs.ts";
import { fixedToUpright, linkageFrom, outOfFrame, type Pose } from "./linkage.ts";
import { contactPoint } from "./measures.ts";
import { poseAtTravel, type Range, rangeOf } from "./travel.ts";

/** A corner ready to be moved. Made once; asked as often as a drawing needs. */
export interface Corner {
  inputs: WishboneTravelInputs;
  range: Range;
  /** The spring's moving end in the upright's axes, when it stands there. */
  springOnUpright: Vector;
}

/** Every point that moves, for drawings: [fore, out, up] in mm. */
export interface CornerPoints {
  lowerJoint: Vector;
  upperJoint: Vector;
  rodOuter: Vector;
  wheelCentre: Vector;
  contact: Vector;
  /** Outward unit direction of the wheel's axis. */
  spindle: Vector;
  /** The spring's moving end, when there is a spring. */
  springMoving: Vector | undefined;
}

/**
 * Makes the mechanism and finds both ends of its travel.
 *
 * @returns fails as `linkageFrom` does
 */
export function cornerFrom(inputs: WishboneTravelInputs): Result<Corner, CalculatorIssue> {
  const linkage = linkageFrom(inputs);
  if (!linkage.ok) return linkage;
  const springOnUpright = fixedToUpright(inputs, inputs.spring?.moving ?? inputs.wheelCentre);
  return ok({ inputs, range: rangeOf(linkage.value), springOnUpright });
}

/**
 * Where everything stands with the wheel centre raised by `travel` mm.
 *
 * @returns fails on `bump` or `rebound` with the travel at which the linkage locks
 */
export function cornerPointsAt(corner: Corner, travel: number): Result<CornerPoints, CalculatorIssue> {
  const pose = poseAtTravel(corner.range, travel, 0);
  if (!pose.ok) return pose;
  const { lower, upper, rod, wheelCentre, spindle } = pose.value;
  return ok({
    lowerJoint: lower,
    upperJoint: upper,
    rodOuter: rod,
    wheelCentre,
    contact: contactPoint(wheelCentre, spindle, corner.inputs.loadedRadius),
    spindle,
    springMoving: corner.inputs.spring && springEnd(corner, corner.inputs.spring, pose.value).place,
  });
}

type Spring = NonNullable<WishboneTravelInputs["spring"]>;

/** The spring's moving end and its velocity for one radian of the lower arm. */
function springEnd({ range, springOnUpright }: Corner, spring: Spring, pose: Pose) {
  const { lower, upper } = range.linkage;
  if (spring.on === "lower") {
    const place = movedBy(lower, spring.moving, pose.lowerSwing);
    return { place, velocity: carriedBy(lower, place) };
  }
  if (spring.on === "upper") {
    const place = movedBy(upper, spring.moving, pose.upperSwing);
    return { place, velocity: scale(carriedBy(upper, place), pose.upperRate) };
  }
  const arm = outOfFrame(pose.frame, springOnUpright);
  return { place: add(pose.lower, arm), velocity: add(pose.lowerVelocity, cross(pose.spin, arm)) };
}

/** Length of the spring in mm and spring travel per wheel travel; nulls without a spring. */
export function springAt(corner: Corner, pose: Pose) {
  const { spring } = corner.inputs;
  if (!spring) return { springLength: null, motionRatio: null };
  const { place, velocity } = springEnd(corner, spring, pose);
  const line = subtract(place, spring.chassis);
  const springLength = size(line);
  return { springLength, motionRatio: -dot(line, velocity) / springLength / pose.rise };
}

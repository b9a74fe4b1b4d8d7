import { add, along, cross, dot, size, subtract, turn, unit, type Vector } from "../vectors.ts";

/** A wishbone: its joint runs on a circle about the line of its two pivots. Angles in radians, 0 at rest. */
export interface Arm {
  /** Middle of the circle, on the pivot line. */
  centre: Vector;
  /** Unit direction of the pivot line: a positive angle turns right-handed about it. */
  axis: Vector;
  radius: number;
  /** Unit directions from the middle to the joint at rest, and a quarter turn on. */
  out: Vector;
  ahead: Vector;
}

/** @returns undefined when the pivots are one point or the joint lies on their line, to within a millimetre */
export function armFrom(front: Vector, rear: Vector, joint: Vector): Arm | undefined {
  const line = subtract(front, rear);
  if (size(line) < 1) return undefined;
  const axis = unit(line);
  const centre = along(rear, axis, dot(subtract(joint, rear), axis));
  const spoke = subtract(joint, centre);
  const radius = size(spoke);
  if (radius < 1) return undefined;
  const out = unit(spoke);
  return { centre, axis, radius, out, ahead: cross(axis, out) };
}

/** The same arm, its angle counted the other way. */
export function turnedAbout(arm: Arm): Arm {
  const axis: Vector = [-arm.axis[0], -arm.axis[1], -arm.axis[2]];
  return { ...arm, axis, ahead: cross(axis, arm.out) };
}

export function jointAt(arm: Arm, angle: number): Vector {
  const outward = along(arm.centre, arm.out, arm.radius * Math.cos(angle));
  return along(outward, arm.ahead, arm.radius * Math.sin(angle));
}

/** The angle at which the joint is where it is; −π to π. */
export function angleOf(arm: Arm, joint: Vector): number {
  const spoke = subtract(joint, arm.centre);
  return Math.atan2(dot(spoke, arm.ahead), dot(spoke, arm.out));
}

/** Velocity of a point carried by the arm, for one radian in unit time; mm/rad. */
export function carriedBy(arm: Arm, point: Vector): Vector {
  return cross(arm.axis, subtract(point, arm.centre));
}

/** Where a point that is fixed to the arm has gone. */
export function movedBy(arm: Arm, atRest: Vector, angle: number): Vector {
  return add(arm.centre, turn(subtract(atRest, arm.centre), arm.axis, angle));
}

/** A direction fixed to the arm, brought back to where it was at rest. */
export function broughtBack(arm: Arm, direction: Vector, angle: number): Vector {
  return turn(direction, arm.axis, -angle);
}

/** A circle in space and which of the two points on it is meant: 1 or −1. */
export interface Meeting {
  centre: Vector;
  axis: Vector;
  radius: number;
  side: number;
}

/**
 * The point of a circle that is `reach` away from `from`.
 *
 * With ρ the distance of `from` to the circle's axis and h its height above the circle's plane, the point stands
 * at the angle ψ from `from`: cos ψ = (h² + ρ² + r² − reach²) / 2ρr. The two signs of ψ are told apart by `side`.
 *
 * @returns undefined when the circle is nowhere so near or so far
 */
export function pointAtReach(
  { centre, axis, radius, side }: Meeting,
  from: Vector,
  reach: number,
): Vector | undefined {
  const arm = subtract(from, centre);
  const height = dot(arm, axis);
  const level = along(arm, axis, -height);
  const levelSize = size(level);
  const cosine =
    (height * height + levelSize * levelSize + radius * radius - reach * reach) / (2 * levelSize * radius);
  if (!(Math.abs(cosine) < 1)) return undefined;
  const toward: Vector = [level[0] / levelSize, level[1] / levelSize, level[2] / levelSize];
  const point = along(centre, toward, radius * cosine);
  return along(point, cross(axis, toward), side * radius * Math.sqrt(1 - cosine * cosine));
}

/** On which side of the plane through the circle's axis and `from` a point of the circle stands. */
export function sideOf(centre: Vector, axis: Vector, from: Vector, point: Vector): number {
  return Math.sign(dot(subtract(point, centre), cross(axis, subtract(from, centre))));
}

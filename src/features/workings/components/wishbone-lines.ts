import type { Vector } from "#shared/calculators/vectors.ts";
import type { CornerPoints } from "#shared/calculators/wishbone-travel/corner.ts";
import type { WishboneTravelInputs } from "#shared/calculators/wishbone-travel/inputs.ts";
import type { InstantCentre } from "#shared/calculators/wishbone-travel/measures.ts";
import { linePath, type Spot } from "./drawing-parts.tsx";

/** From mm, out and up, to the sheet. */
export type Place = (x: number, y: number) => Spot;

const flat = ([, out, up]: Vector): Spot => [out, up];

/** Both ends of the wheel's middle plane: contact and top. */
export function wheelEnds({ wheelCentre, contact }: CornerPoints): [Spot, Spot] {
  const [top, foot] = [flat(wheelCentre), flat(contact)];
  return [foot, [2 * top[0] - foot[0], 2 * top[1] - foot[1]]];
}

/** Every place that the sheet must hold, in mm. */
export function bodyOf(
  inputs: WishboneTravelInputs,
  poses: readonly CornerPoints[],
  table: number | undefined,
): Spot[] {
  const { lowerFront, lowerRear, upperFront, upperRear, rodInner, spring } = inputs;
  const fixed = [lowerFront, lowerRear, upperFront, upperRear, rodInner, ...(spring ? [spring.chassis] : [])];
  const moving = poses.flatMap((pose) => [
    ...[pose.lowerJoint, pose.upperJoint, pose.rodOuter, pose.wheelCentre].map(flat),
    ...(pose.springMoving ? [flat(pose.springMoving)] : []),
    ...wheelEnds(pose),
  ]);
  return [...fixed.map(flat), ...moving, [0, table ?? poses[0]?.contact[2] ?? 0]];
}

/** The instant centre, if the drawing has room for it. */
export function reachOf(body: readonly Spot[], centre: InstantCentre | null): Spot[] {
  if (!centre) return [];
  const { left, right, low, high } = boundsOf(body);
  const [wide, tall] = [right - left, high - low];
  const fits =
    centre.out > left - 0.6 * wide &&
    centre.out < right + 0.6 * wide &&
    centre.up > low - 0.4 * tall &&
    centre.up < high + 0.4 * tall;
  return fits ? [[centre.out, centre.up]] : [];
}

interface Bounds {
  left: number;
  right: number;
  low: number;
  high: number;
}

export function boundsOf(spots: readonly Spot[]): Bounds {
  const xs = spots.map(([x]) => x);
  const ys = spots.map(([, y]) => y);
  return { left: Math.min(...xs), right: Math.max(...xs), low: Math.min(...ys), high: Math.max(...ys) };
}

export const inside = ([x, y]: Spot, { left, right, low, high }: Bounds) =>
  x >= left && x <= right && y >= low && y <= high;

/** Arms, upright, rod and spring of one pose. */
export function movingParts(inputs: WishboneTravelInputs, pose: CornerPoints, at: Place): string {
  const spot = (point: Vector) => at(...flat(point));
  const { lowerJoint, upperJoint, rodOuter, wheelCentre, springMoving } = pose;
  const runs: Vector[][] = [
    [inputs.lowerFront, lowerJoint, inputs.lowerRear],
    [inputs.upperFront, upperJoint, inputs.upperRear],
    [lowerJoint, wheelCentre, upperJoint, lowerJoint],
    [inputs.rodInner, rodOuter],
    ...(inputs.spring && springMoving ? [[inputs.spring.chassis, springMoving]] : []),
  ];
  return runs.map((run) => linePath(run.map(spot))).join("");
}

/** From both arms and the contact point to the instant centre, cut off where the sheet ends. */
export function sightLines(
  inputs: WishboneTravelInputs,
  { lowerJoint, upperJoint, wheelCentre, contact }: CornerPoints,
  centre: InstantCentre,
  at: Place,
  box: Bounds,
): string {
  const starts = [
    inWheelPlane(lowerJoint, inputs.lowerFront, inputs.lowerRear, wheelCentre[0]),
    inWheelPlane(upperJoint, inputs.upperFront, inputs.upperRear, wheelCentre[0]),
    flat(contact),
  ];
  return starts
    .filter((start) => inside(start, box))
    .map((start) => linePath([at(...start), at(...cutAt(start, [centre.out, centre.up], box))]))
    .join("");
}

/** Where an arm's plane, followed from its joint along its pivots, meets the plane across the car at `fore`. */
function inWheelPlane(joint: Vector, front: Vector, rear: Vector, fore: number): Spot {
  const run = front[0] - rear[0];
  if (Math.abs(run) < 1e-6) return flat(joint);
  const part = (fore - joint[0]) / run;
  return [joint[1] + part * (front[1] - rear[1]), joint[2] + part * (front[2] - rear[2])];
}

/** The end of a line, or where it leaves the box on its way there. */
function cutAt([x1, y1]: Spot, [x2, y2]: Spot, { left, right, low, high }: Bounds): Spot {
  const share = (from: number, to: number, least: number, most: number) =>
    to > most ? (most - from) / (to - from) : to < least ? (least - from) / (to - from) : 1;
  const part = Math.min(share(x1, x2, left, right), share(y1, y2, low, high));
  return [x1 + part * (x2 - x1), y1 + part * (y2 - y1)];
}

/**
 * A wishbone corner worked out from its points, for checking figures that the demo quotes. Written apart from the
 * product: arms turn about their pivot lines, the upright is rigid, the rod keeps its length.
 */
export type Point = readonly [fore: number, out: number, up: number];

export interface Corner {
  lowerFront: Point;
  lowerRear: Point;
  lowerJoint: Point;
  upperFront: Point;
  upperRear: Point;
  upperJoint: Point;
  rodInner: Point;
  rodOuter: Point;
  wheelCentre: Point;
}

const add = (a: Point, b: Point): Point => [a[0] + b[0], a[1] + b[1], a[2] + b[2]];
const times = (a: Point, k: number): Point => [a[0] * k, a[1] * k, a[2] * k];
const from = (a: Point, b: Point): Point => add(b, times(a, -1));
const dot = (a: Point, b: Point) => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
const cross = (a: Point, b: Point): Point => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];
const size = (a: Point) => Math.hypot(...a);
const unit = (a: Point) => times(a, 1 / size(a));
const distance = (a: Point, b: Point) => size(from(a, b));

/** Rodrigues' rotation of a point about the line through `rear` and `front`. */
function swing(point: Point, front: Point, rear: Point, angle: number): Point {
  const axis = unit(from(rear, front));
  const arm = from(rear, point);
  const turned = add(times(arm, Math.cos(angle)), times(cross(axis, arm), Math.sin(angle)));
  return add(rear, add(turned, times(axis, dot(axis, arm) * (1 - Math.cos(angle)))));
}

function bisect(falls: (x: number) => number, low: number, high: number): number {
  const sign = Math.sign(falls(high));
  let [a, b] = [low, high];
  for (let step = 0; step < 60; step += 1) {
    const middle = (a + b) / 2;
    if (Math.sign(falls(middle)) === sign) b = middle;
    else a = middle;
  }
  return (a + b) / 2;
}

/** Three unit axes fixed in the upright. */
function axes(lower: Point, upper: Point, rod: Point): readonly [Point, Point, Point] {
  const along = unit(from(lower, upper));
  const side = unit(cross(along, from(lower, rod)));
  return [along, side, cross(side, along)];
}

/** Toe in degrees (positive: toe-in) with the wheel centre raised by `travel` mm; straight ahead at rest. */
export function toeAt(corner: Corner, travel: number): number {
  const spread = distance(corner.lowerJoint, corner.upperJoint);
  const rod = distance(corner.rodInner, corner.rodOuter);
  const atRest = axes(corner.lowerJoint, corner.upperJoint, corner.rodOuter);
  const local = (vector: Point): Point => [
    dot(atRest[0], vector),
    dot(atRest[1], vector),
    dot(atRest[2], vector),
  ];
  const arm = local(from(corner.lowerJoint, corner.rodOuter));
  const wheel = local(from(corner.lowerJoint, corner.wheelCentre));
  const spindle = local([0, 1, 0]);

  const pose = (lowerSwing: number) => {
    const lower = swing(corner.lowerJoint, corner.lowerFront, corner.lowerRear, lowerSwing);
    const raised = (upperSwing: number) =>
      swing(corner.upperJoint, corner.upperFront, corner.upperRear, upperSwing);
    const upper = raised(bisect((s) => distance(lower, raised(s)) - spread, -0.5, 0.5));
    const along = unit(from(lower, upper));
    const fore = unit(from(times(along, along[0]), [1, 0, 0]));
    const frame = (steer: number): readonly [Point, Point, Point] => {
      const side = add(times(fore, Math.cos(steer)), times(cross(along, fore), Math.sin(steer)));
      return [along, side, cross(side, along)];
    };
    const world = (steer: number, v: Point): Point => {
      const [x, y, z] = frame(steer);
      return add(add(times(x, v[0]), times(y, v[1])), times(z, v[2]));
    };
    const start = steerAtRest(atRest, along, fore);
    const steer = bisect(
      (s) => distance(corner.rodInner, add(lower, world(s, arm))) - rod,
      start - 0.3,
      start + 0.3,
    );
    return { centre: add(lower, world(steer, wheel)), spindle: world(steer, spindle) };
  };
  const height = (s: number) => pose(s).centre[2] - corner.wheelCentre[2] - travel;
  const axle = pose(bisect(height, -0.3, 0.3)).spindle;
  return (Math.atan2(axle[0], axle[1]) * 180) / Math.PI;
}

/** Where the resting upright's second axis lies, as an angle about the present steering axis. */
function steerAtRest(atRest: readonly [Point, Point, Point], along: Point, fore: Point): number {
  return Math.atan2(dot(atRest[1], cross(along, fore)), dot(atRest[1], fore));
}

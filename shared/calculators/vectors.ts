/** A point or a direction in space: three numbers in whatever axes the caller works in. */
export type Vector = readonly [number, number, number];

export const add = (a: Vector, b: Vector): Vector => [a[0] + b[0], a[1] + b[1], a[2] + b[2]];

/** From `b` to `a`. */
export const subtract = (a: Vector, b: Vector): Vector => [a[0] - b[0], a[1] - b[1], a[2] - b[2]];

export const scale = (a: Vector, by: number): Vector => [a[0] * by, a[1] * by, a[2] * by];

/** `a` + `by`·`b`. */
export const along = (a: Vector, b: Vector, by: number): Vector => [
  a[0] + by * b[0],
  a[1] + by * b[1],
  a[2] + by * b[2],
];

export const dot = (a: Vector, b: Vector): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];

/** Right-handed. */
export const cross = (a: Vector, b: Vector): Vector => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];

export const size = (a: Vector): number => Math.sqrt(dot(a, a));

export const distance = (a: Vector, b: Vector): number => size(subtract(a, b));

/** The direction of a vector that is not zero: the caller makes sure of that. */
export const unit = (a: Vector): Vector => scale(a, 1 / size(a));

/** Turns a vector about a unit axis by an angle in radians, right-handed (Rodrigues' formula). */
export function turn(a: Vector, axis: Vector, angle: number): Vector {
  const cos = Math.cos(angle);
  const swept = along(scale(a, cos), cross(axis, a), Math.sin(angle));
  return along(swept, axis, dot(axis, a) * (1 - cos));
}

/** Angle between two unit vectors, radians, 0 to π; exact for small ones, where an arc cosine is not. */
export function angleBetween(a: Vector, b: Vector): number {
  return Math.atan2(size(cross(a, b)), dot(a, b));
}

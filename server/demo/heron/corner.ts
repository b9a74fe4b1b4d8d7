import { slope } from "../sums.ts";

type Point = readonly [fore: number, out: number, up: number];

/**
 * Heron's left front corner as drawn, in mm: fore, out from the centreline, up from the ground, car standing at
 * its ride height. The tables in the entries are filled from here, so that they cannot part from each other.
 */
export const corner = {
  lowerFront: [236, 223, 172],
  lowerRear: [-24, 223, 172],
  lowerJoint: [6, 583, 172],
  upperFront: [156, 283, 386],
  upperRear: [-34, 283, 386],
  upperJoint: [-14, 553, 416],
  rodInner: [96, 230, 208],
  rodOuter: [96, 571, 215],
  wheelCentre: [0, 620, 268],
} as const satisfies Record<string, Point>;

/** The joints as measured on the bench: out from the mounting face, up and fore from the hub centre. */
export const upright = {
  lower: { out: -62, up: -96, fore: 6 },
  upper: { out: -92, up: 148, fore: -14 },
  wheelOffset: 25,
  loadedRadius: 268,
} as const;

/** The inner rod joints after the rack was bolted to the tray. */
export const rackOnTray: Point = [96, 230, 230];

const spread = upright.upper.up - upright.lower.up;

export const kingpinInclination = () => slope(upright.lower.out - upright.upper.out, spread);
export const caster = () => slope(upright.lower.fore - upright.upper.fore, spread);

/** Where the steering axis meets the ground, against where the tyre does. */
const groundFromLower = upright.loadedRadius + upright.lower.up;
export const trail = () =>
  upright.lower.fore + ((upright.lower.fore - upright.upper.fore) * groundFromLower) / spread;
export const scrubRadius = () => {
  const axis = upright.lower.out + ((upright.lower.out - upright.upper.out) * groundFromLower) / spread;
  return -upright.wheelOffset - axis;
};

/** A point as a row of a table. */
export const row = (label: string, point: Point): string[] => [label, ...point.map((mm) => `${mm} mm`)];

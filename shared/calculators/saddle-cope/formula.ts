import { fail, ok, type Result } from "#shared/result.ts";
import type { CalculatorIssue } from "../definition.ts";
import { handMarks, roughCutNote } from "./hand-marks.ts";
import type { SaddleCopeInputs } from "./inputs.ts";

/** One place round the branch. Angles in degrees, depths in mm from the squared end. */
export interface CopePoint {
  /** 0 at the heel, 90 on the side a positive offset moves to, 180 at the toe. */
  around: number;
  /** Depth of the cut on the outside of the tube. */
  depth: number;
  /** Depth of the cut on the bore, from the same squared end. */
  innerDepth: number;
  /** Angle between the two outside surfaces in the weld: small is a tight corner, large an open one. */
  dihedral: number;
}

/** Results of `saddle-cope`; lengths in mm, angles in degrees. */
export interface SaddleCopeResults {
  /** From 0 to 360, both ends given, so that it closes on a sheet. */
  curve: CopePoint[];
  deepest: number;
  deepestAround: number;
  heelDepth: number;
  toeDepth: number;
  sideDepth: { at90: number; at270: number };
  /** From the header axis to the longest point of the branch, along the branch axis. */
  tipFromAxis: number;
  /** Length of a sheet that goes round the branch once. */
  templateWidth: number;
  /** `fromTip` is along the branch axis from the squared end: negative lies beyond the end. */
  holeSaw: { diameter: number; fromTip: number; angle: number; sideways: number };
  /** Length of the outside line in space. */
  weldLength: number;
  /** The most by which the bore is cut deeper than the outside at the same place. */
  insideRelief: number;
  roughCut: string;
  handMarks: string[];
}

const RADIANS = Math.PI / 180;

/** Steps of the fine searches, which do not depend on `samples`; a multiple of four meets the sides exactly. */
const FINE_STEPS = 3600;

/** Steps of the walk before a golden-section search, which brings the rest. */
const SEARCH_STEPS = 720;

/**
 * Slack for decimal fractions that binary numbers cannot hold (12.7 + 6.35 against 19.05), in mm.
 * Far below anything a marker or a saw can show.
 */
const SLACK = 1e-9;

/** The joint in the formula's own letters: R header, r branch outside, bore branch inside, e offset, all in mm. */
export interface Joint {
  R: number;
  r: number;
  bore: number;
  e: number;
  cos: number;
  sin: number;
}

/** Takes the inputs into the formula's letters. */
export function joint(
  inputs: Pick<SaddleCopeInputs, "headerOd" | "branchOd" | "branchWall" | "angle" | "offset">,
): Joint {
  const radians = inputs.angle * RADIANS;
  return {
    R: inputs.headerOd / 2,
    r: inputs.branchOd / 2,
    bore: inputs.branchOd / 2 - inputs.branchWall,
    e: inputs.offset,
    // The cosine of 90° comes out as 6e-17, which would tilt a square joint by that much.
    cos: inputs.angle === 90 ? 0 : Math.cos(radians),
    sin: Math.sin(radians),
  };
}

/** Half the chord of the header at the height of this place on a branch of the given radius, mm. */
function halfChord({ R, e }: Joint, radius: number, sinAround: number): number {
  const side = radius * sinAround + e;
  // `checkJoint` has kept |side| within R; what rounding leaves below zero is zero.
  return Math.sqrt(Math.max(0, (R - side) * (R + side)));
}

/**
 * Distance along the branch from the header axis to the cut, for a line of the branch at the given radius.
 *
 * s(φ) = (r cosφ cosθ + √(R² − (r sinφ + e)²)) / sinθ
 *
 * @param around φ in degrees, 0 at the heel
 * @returns mm
 * @see the header as a cylinder about its axis, met by a line parallel to the branch axis (analytic geometry)
 */
export function distanceFromAxis(tube: Joint, radius: number, around: number): number {
  const { cos, sin } = trig(around);
  return (radius * cos * tube.cos + halfChord(tube, radius, sin)) / tube.sin;
}

/**
 * Angle in the weld between the outside of the branch and the outside of the header: 180° less the angle between
 * the outward normals. At no offset it is θ at the heel and 180° − θ at the toe.
 *
 * @returns degrees
 */
export function dihedralAt(tube: Joint, around: number): number {
  const { cos, sin } = trig(around);
  const up = halfChord(tube, tube.r, sin);
  const dot = (-cos * tube.cos * up + sin * (tube.r * sin + tube.e)) / tube.R;
  return 180 - Math.acos(Math.min(1, Math.max(-1, dot))) / RADIANS;
}

/** Sine and cosine of an angle in degrees, exact on the four quarter lines, where people measure. */
export function trig(around: number): { cos: number; sin: number } {
  const quarter = around / 90;
  if (Number.isInteger(quarter)) {
    const turn = ((quarter % 4) + 4) % 4;
    return { cos: [1, 0, -1, 0][turn] ?? 0, sin: [0, 1, 0, -1][turn] ?? 0 };
  }
  return { cos: Math.cos(around * RADIANS), sin: Math.sin(around * RADIANS) };
}

/**
 * Cope of a round branch on a round header.
 *
 * @param inputs parsed by `saddleCopeInputs`: mm and degrees
 * @returns fails on `branchWall` when the wall leaves no bore, on `branchOd` when the branch is wider than the
 * header, and on `offset` when it runs past the header
 * @see the formula in `distanceFromAxis`; compared with a solid kernel in tests/reference
 */
export function saddleCope(inputs: SaddleCopeInputs): Result<SaddleCopeResults, CalculatorIssue> {
  const issue = checkJoint(inputs);
  if (issue) return fail(issue);
  const tube = joint(inputs);
  const outside = (around: number) => distanceFromAxis(tube, tube.r, around);
  const bore = (around: number) => distanceFromAxis(tube, tube.bore, around);
  const tip = lowest(outside, SEARCH_STEPS).value;
  const deep = lowest((around) => -outside(around), SEARCH_STEPS);
  const numbers = {
    curve: Array.from({ length: inputs.samples + 1 }, (_, step) => {
      const around = (360 * step) / inputs.samples;
      return {
        around,
        depth: outside(around) - tip,
        innerDepth: bore(around) - tip,
        dihedral: dihedralAt(tube, around),
      };
    }),
    deepest: -deep.value - tip,
    deepestAround: deep.around,
    heelDepth: outside(0) - tip,
    toeDepth: outside(180) - tip,
    sideDepth: { at90: outside(90) - tip, at270: outside(270) - tip },
    tipFromAxis: tip,
    templateWidth: Math.PI * (inputs.branchOd + inputs.paperThickness),
    holeSaw: { diameter: inputs.headerOd, fromTip: 0 - tip, angle: inputs.angle, sideways: inputs.offset },
    weldLength: lengthInSpace(outside, tube.r),
    insideRelief: -lowest((around) => outside(around) - bore(around), SEARCH_STEPS).value,
    roughCut: roughCutNote(inputs),
  };
  return ok({ ...numbers, handMarks: handMarks(inputs, numbers) });
}

/** Says why no such joint can be cut; `undefined` when it can. Lengths in mm. */
export function checkJoint({
  headerOd,
  branchOd,
  branchWall,
  offset,
}: Pick<SaddleCopeInputs, "headerOd" | "branchOd" | "branchWall" | "offset">): CalculatorIssue | undefined {
  const show = (value: number) => `${Number(value.toFixed(3))} mm`;
  if (branchWall >= branchOd / 2) {
    const message = `Branch wall leaves no bore: it must be less than half the branch diameter (${show(branchOd / 2)}).`;
    return { field: "branchWall", message };
  }
  const room = (headerOd - branchOd) / 2;
  if (room < -SLACK) {
    const message = `The branch is wider than the header: make it ${show(headerOd)} or less, or cope the other tube.`;
    return { field: "branchOd", message };
  }
  if (Math.abs(offset) > room + SLACK) {
    const limit =
      room > SLACK ? `keep the offset within ${show(room)} either way` : "equal tubes take no offset";
    const message = `At this offset the branch runs past the header: ${limit}.`;
    return { field: "offset", message };
  }
  return undefined;
}

/**
 * Least value of a line round the tube: a walk, then a golden-section search between the neighbours.
 *
 * @param steps of the walk: a multiple of four, so that it meets the kinks on the sides
 * @returns place in degrees and value
 */
export function lowest(
  line: (around: number) => number,
  steps = FINE_STEPS,
): { around: number; value: number } {
  const step = 360 / steps;
  let best = { around: 0, value: line(0) };
  for (let index = 1; index < steps; index += 1) {
    const around = (360 * index) / steps;
    const value = line(around);
    if (value < best.value - SLACK) best = { around, value };
  }
  const refined = goldenSection(line, best.around - step, best.around + step);
  return refined.value < best.value - SLACK ? refined : best;
}

function goldenSection(line: (around: number) => number, from: number, to: number) {
  const ratio = (Math.sqrt(5) - 1) / 2;
  let low = from;
  let high = to;
  while (high - low > 1e-7) {
    const left = high - ratio * (high - low);
    const right = low + ratio * (high - low);
    if (line(left) < line(right)) high = right;
    else low = left;
  }
  const around = (low + high) / 2;
  return { around, value: line(around) };
}

/** Length of the line in space, by chords: dL² = ds² + (r dφ)². Kinks can only lie on the sides, which are steps. */
function lengthInSpace(line: (around: number) => number, radius: number): number {
  const arc = 2 * radius * Math.sin(Math.PI / FINE_STEPS);
  let length = 0;
  let previous = line(0);
  for (let index = 1; index <= FINE_STEPS; index += 1) {
    const next = line((360 * index) / FINE_STEPS);
    // Math.hypot takes several times as long, and guards against sizes that do not come up here.
    length += Math.sqrt((next - previous) ** 2 + arc * arc);
    previous = next;
  }
  return length;
}

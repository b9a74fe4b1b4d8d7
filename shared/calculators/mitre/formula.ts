import { fail, ok, type Result } from "#shared/result.ts";
import type { CalculatorIssue } from "../definition.ts";
import { trig } from "../saddle-cope/formula.ts";
import type { MitreInputs } from "./inputs.ts";

/** One place round the tube. Angles in degrees, depths in mm from the squared end. */
export interface MitrePoint {
  /** 0 at the heel, on the inside of the corner, where the cut is deepest; 180 at the toe. */
  around: number;
  depth: number;
  innerDepth: number;
  /** Angle between the two outside surfaces in the weld: least at the heel, past 180 at the toe. */
  dihedral: number;
}

/** Results of `mitre`; lengths in mm, angles in degrees. */
export interface MitreResults {
  /** From 0 to 360, both ends given, so that it closes on a sheet. */
  curve: MitrePoint[];
  /** Saw setting from a square cut. */
  cutAngle: number;
  deepest: number;
  heelDepth: number;
  toeDepth: number;
  sideDepth: { at90: number; at270: number };
  /** From where the axes cross to the longest point of the tube, along it: negative, for the toe reaches past. */
  tipFromAxis: number;
  templateWidth: number;
  /** Once round the cut, an ellipse. */
  weldLength: number;
}

/**
 * Distance along the tube from the crossing of the axes to the plane cut, for a line at the given radius.
 *
 * s(φ) = radius·cosφ·tan(turn/2)
 *
 * @param around φ in degrees, 0 on the inside of the corner
 * @returns mm, positive toward the tube
 */
export function mitreFromAxis(turn: number, radius: number, around: number): number {
  return radius * trig(around).cos * Math.tan((turn * Math.PI) / 360);
}

/**
 * Mitre of two equal tubes: depth(φ) = r·(1 + cosφ)·tan(turn/2).
 *
 * @param inputs parsed by `mitreInputs`
 * @returns fails on `wall` when it leaves no bore
 * @see plane cut of a cylinder (analytic geometry); compared with a solid kernel in tests/reference
 */
export function mitre(inputs: MitreInputs): Result<MitreResults, CalculatorIssue> {
  const { od, wall, turn, samples } = inputs;
  const r = od / 2;
  if (wall >= r) {
    const message = `The wall leaves no bore: it must be less than half the outside diameter (${Number(r.toFixed(3))} mm).`;
    return fail({ field: "wall", message });
  }
  const tipFromAxis = mitreFromAxis(turn, r, 180);
  const depth = (around: number) => mitreFromAxis(turn, r, around) - tipFromAxis;
  return ok({
    curve: Array.from({ length: samples + 1 }, (_, step) => {
      const around = (360 * step) / samples;
      return {
        around,
        depth: depth(around),
        innerDepth: mitreFromAxis(turn, r - wall, around) - tipFromAxis,
        dihedral: dihedralAt(turn, around),
      };
    }),
    cutAngle: turn / 2,
    deepest: depth(0),
    heelDepth: depth(0),
    toeDepth: 0,
    sideDepth: { at90: depth(90), at270: depth(270) },
    tipFromAxis,
    templateWidth: Math.PI * (od + inputs.paperThickness),
    weldLength: ellipsePerimeter(r / Math.cos((turn * Math.PI) / 360), r),
  });
}

/** 180 − 2·asin(cosφ·sin(turn/2)): both surfaces lean alike off the plane of the cut. */
function dihedralAt(turn: number, around: number): number {
  const lean = Math.asin(trig(around).cos * Math.sin((turn * Math.PI) / 360));
  return 180 - (360 / Math.PI) * lean;
}

/** Perimeter of an ellipse by the arithmetic-geometric mean: Abramowitz and Stegun, 17.6. */
function ellipsePerimeter(major: number, minor: number): number {
  let [a, b] = [major, minor];
  let sum = (a * a - b * b) / 2;
  for (let power = 1; a - b > 1e-14 * a; power *= 2) {
    const c = (a - b) / 2;
    [a, b] = [(a + b) / 2, Math.sqrt(a * b)];
    sum += power * c * c;
  }
  return (2 * Math.PI * (major * major - sum)) / a;
}

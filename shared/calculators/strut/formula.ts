import { fail, ok, type Result } from "#shared/result.ts";
import type { CalculatorIssue } from "../definition.ts";
import { reductionFactor } from "../strut-curve/formula.ts";
import { sectionProperties } from "../tube-section/formula.ts";
import { sectionShape } from "../tube-section/shape.ts";
import type { StrutInputs } from "./inputs.ts";
import { type WallSlenderness, wallSlenderness } from "./section-class.ts";

/** Results of `strut`: mm, mm², N. */
export interface StrutResults {
  area: number;
  /** The least one: about the axis it buckles about. */
  radiusOfGyration: number;
  effectiveLength: number;
  sectionClass: number;
  /** Effective length over the least radius of gyration. */
  slenderness: number;
  /** λ̄, the root of squash load over Euler load. */
  relativeSlenderness: number;
  chi: number;
  eulerLoad: number;
  squashLoad: number;
  /** Nb,Rd: design value. */
  resistance: number;
  /** What ends it: bowing sideways, or yielding all over when it is too short to bow. */
  governs: "buckling" | "squash";
}

/**
 * Resistance of a straight tube pushed end to end.
 *
 * Nb,Rd = χ·A·fy / γM1, with χ from the buckling curve at λ̄ = √(A·fy / Ncr) and Ncr = π²·E·I / (k·L)².
 *
 * @param inputs parsed by `strutInputs`
 * @returns fails as `sectionShape` does, and on `wall` when the section is past class 3
 * @see EN 1993-1-1:2005, 6.3.1 and table 5.2
 */
export function strut(inputs: StrutInputs): Result<StrutResults, CalculatorIssue> {
  const shape = sectionShape(inputs);
  if (!shape.ok) return shape;
  const wall = wallSlenderness(shape.value, inputs.yield);
  if (wall.sectionClass === 4) return fail({ field: "wall", message: tooThin(wall) });
  const { area, iMinor, radiusOfGyrationMinor } = sectionProperties(shape.value);
  const effectiveLength = inputs.effectiveLengthFactor * inputs.length;
  const eulerLoad = (Math.PI ** 2 * inputs.modulus * iMinor) / effectiveLength ** 2;
  const squashLoad = area * inputs.yield;
  const relativeSlenderness = Math.sqrt(squashLoad / eulerLoad);
  const chi = reductionFactor(inputs.curve, relativeSlenderness);
  return ok({
    area,
    radiusOfGyration: radiusOfGyrationMinor,
    effectiveLength,
    sectionClass: wall.sectionClass,
    slenderness: effectiveLength / radiusOfGyrationMinor,
    relativeSlenderness,
    chi,
    eulerLoad,
    squashLoad,
    resistance: (chi * squashLoad) / inputs.gammaM1,
    governs: chi < 1 ? "buckling" : "squash",
  });
}

function tooThin({ name, ratio, limit, thinnest }: WallSlenderness): string {
  const needed = Math.ceil(thinnest * 100) / 100;
  return `The wall would buckle locally first (past class 3): ${name} is ${ratio.toFixed(1)}, and this sum holds to ${limit.toFixed(1)}. Make the wall at least ${needed} mm, or the tube smaller.`;
}

import { ok, type Result } from "#shared/result.ts";
import type { CalculatorIssue } from "../definition.ts";
import type { BucklingCurve, StrutCurveInputs } from "./inputs.ts";

/** Results of `strut-curve`. */
export interface StrutCurveResults {
  /** What part of the squash load is left, 0 to 1. */
  chi: number;
  /** Imperfection factor of the curve. */
  alpha: number;
}

/** EN 1993-1-1:2005, table 6.1. */
const imperfection: Readonly<Record<BucklingCurve, number>> = {
  a0: 0.13,
  a: 0.21,
  b: 0.34,
  c: 0.49,
  d: 0.76,
};

/** Up to here no strut buckles: EN 1993-1-1, 6.3.1.2(4). */
const PLATEAU = 0.2;

/**
 * Reduction for flexural buckling.
 *
 * χ = 1 / (Φ + √(Φ² − λ̄²)), Φ = 0.5·(1 + α·(λ̄ − 0.2) + λ̄²); 1 up to λ̄ = 0.2.
 *
 * @param slenderness λ̄, 0 or more
 * @returns 0 to 1
 * @see EN 1993-1-1:2005, 6.3.1.2
 */
export function reductionFactor(curve: BucklingCurve, slenderness: number): number {
  if (slenderness <= PLATEAU) return 1;
  const phi = 0.5 * (1 + imperfection[curve] * (slenderness - PLATEAU) + slenderness ** 2);
  return 1 / (phi + Math.sqrt(phi ** 2 - slenderness ** 2));
}

/**
 * The reduction alone, for a strut of any section.
 *
 * @param inputs parsed by `strutCurveInputs`; none of these can fail
 */
export function strutCurve({
  curve,
  slenderness,
}: StrutCurveInputs): Result<StrutCurveResults, CalculatorIssue> {
  return ok({ chi: reductionFactor(curve, slenderness), alpha: imperfection[curve] });
}

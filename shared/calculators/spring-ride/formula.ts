import { fail, ok, type Result } from "#shared/result.ts";
import type { CalculatorIssue } from "../definition.ts";
import type { SpringRideInputs } from "./inputs.ts";

/** Standard gravity, m/s² (ISO 80000-3). */
const GRAVITY = 9.80665;

/** Results of `spring-ride`: N/mm, Hz, mm, N, N·s/m. */
export interface SpringRideResults {
  /** Spring rate as felt at the wheel. */
  wheelRate: number;
  /** Wheel rate and tyre in series: as felt between body and ground. */
  rideRate: number;
  rideFrequency: number;
  /** How far body and ground come together under the corner's weight, spring and tyre both. */
  staticDeflection: number;
  /** Force in the spring with the car standing. */
  springLoad: number;
  /** How far that force shortens the spring. */
  springDeflection: number;
  /** Damping at the wheel that just stops a swing of the body on its spring. */
  criticalDamping: number;
  /** Spring rate that gives the target frequency; null without a target. */
  springRateForTarget: number | null;
  /** Rate of the measured coil, and mean diameter over wire; null without a coil. */
  coilRate: number | null;
  springIndex: number | null;
}

/**
 * Ride of one corner on its spring and tyre.
 *
 * wheel rate = k·MR²; ride rate = kw·kt / (kw + kt); f = (1/2π)·√(1000·ride rate / m).
 *
 * @param inputs parsed by `springRideInputs`
 * @returns fails on `targetFrequency` when the tyre alone is too soft for it, and on `coil.meanDiameter` when the
 * coil is tighter than its wire
 * @see T. D. Gillespie, Fundamentals of Vehicle Dynamics, chapter 5 (ride rate, frequency, damping)
 */
export function springRide(inputs: SpringRideInputs): Result<SpringRideResults, CalculatorIssue> {
  const { cornerMass, springRate, motionRatio, tyreRate, targetFrequency, coil } = inputs;
  const wheelRate = springRate * motionRatio ** 2;
  const rideRate = inSeries(wheelRate, tyreRate);
  const target = targetFrequency === undefined ? ok(null) : rateFor(targetFrequency, inputs);
  if (!target.ok) return target;
  if (coil && coil.meanDiameter < 2 * coil.wire) {
    const message = `The coil is wound tighter than its wire allows: the mean diameter must be at least twice the wire, ${2 * coil.wire} mm.`;
    return fail({ field: "coil.meanDiameter", message });
  }
  const weight = cornerMass * GRAVITY;
  return ok({
    wheelRate,
    rideRate,
    rideFrequency: Math.sqrt((1000 * rideRate) / cornerMass) / (2 * Math.PI),
    staticDeflection: weight / rideRate,
    springLoad: weight / motionRatio,
    springDeflection: weight / motionRatio / springRate,
    criticalDamping: 2 * Math.sqrt(1000 * wheelRate * cornerMass),
    springRateForTarget: target.value,
    coilRate: coil ? coilRate(coil) : null,
    springIndex: coil ? coil.meanDiameter / coil.wire : null,
  });
}

/** Two springs one on top of the other, N/mm. */
const inSeries = (one: number, other: number) => (one * other) / (one + other);

/**
 * Rate of a round-wire helical spring, N/mm: G·d⁴ / (8·D³·n).
 *
 * @see EN 13906-1
 */
export function coilRate({
  wire,
  meanDiameter,
  activeCoils,
  shearModulus,
}: NonNullable<SpringRideInputs["coil"]>) {
  return (shearModulus * wire ** 4) / (8 * meanDiameter ** 3 * activeCoils);
}

function rateFor(
  frequency: number,
  { cornerMass, motionRatio, tyreRate }: SpringRideInputs,
): Result<number, CalculatorIssue> {
  const rideRate = (cornerMass * (2 * Math.PI * frequency) ** 2) / 1000;
  if (rideRate >= 0.999 * tyreRate) {
    const most = Math.sqrt((0.999 * 1000 * tyreRate) / cornerMass) / (2 * Math.PI);
    const limit = Math.floor(most * 100) / 100;
    const message = `The tyre alone is too soft for this frequency: no spring gets this corner past ${limit} Hz. Keep the target below that, or take a stiffer tyre.`;
    return fail({ field: "targetFrequency", message });
  }
  const wheelRate = (rideRate * tyreRate) / (tyreRate - rideRate);
  return ok(wheelRate / motionRatio ** 2);
}

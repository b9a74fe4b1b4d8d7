import { defineCalculator, type ResultField } from "../definition.ts";
import { springRide as compute } from "./formula.ts";
import { springRideInputs } from "./inputs.ts";

const field = (
  name: string,
  label: string,
  unit: string,
  decimals: number,
  meaning: string,
): ResultField => ({
  name,
  label,
  unit,
  decimals,
  meaning,
});

/** Ride frequency of one corner, and the spring for it. */
export const springRideCalculator = defineCalculator({
  id: "spring-ride",
  version: 1,
  name: "Spring and ride",
  purpose: "Find how a corner rides on its spring and tyre, and which spring gives the frequency you want.",
  group: "Corner and steering",
  words: [
    "wheel rate",
    "ride rate",
    "natural frequency",
    "coil spring",
    "coilover",
    "shock",
    "damper",
    "critical damping",
    "motion ratio",
    "suspension",
  ],
  inputs: springRideInputs,
  example: {
    cornerMass: 140,
    springRate: 38,
    motionRatio: 0.59,
    tyreRate: 180,
    targetFrequency: 1.6,
    coil: { wire: 10, meanDiameter: 70, activeCoils: 7 },
  },
  compute,
  resultFields: [
    field("wheelRate", "Wheel rate", "N/mm", 2, "The spring as felt at the wheel."),
    field("rideRate", "Ride rate", "N/mm", 2, "Spring and tyre together, as felt between body and ground."),
    field("rideFrequency", "Ride frequency", "Hz", 2, "How often the body would bounce in a second."),
    field(
      "staticDeflection",
      "Static deflection",
      "mm",
      1,
      "Spring and tyre together, under the corner's weight.",
    ),
    field("springLoad", "Spring load", "N", 0, "Force in the spring, car standing."),
    field("springDeflection", "Spring deflection", "mm", 1, "How far that force shortens the spring."),
    field("criticalDamping", "Critical damping", "N·s/m", 0, "At the wheel, body on its spring."),
    field("springRateForTarget", "Spring for the target", "N/mm", 2, "Rate that gives the target frequency."),
    field("coilRate", "Rate of the coil", "N/mm", 2, "From its wire, diameter and coils."),
    field(
      "springIndex",
      "Spring index",
      "",
      1,
      "Mean diameter over wire. 4 to 12 is usual: common practice.",
    ),
  ],
  cautions: [
    "This is a sum, not an approval. Springs and dampers decide whether a wheel stays on the road: have an engineer judge the design.",
    "A compressed spring holds enough to kill. Use spring compressors, and never stand in line with it.",
    "The sum says nothing of stress in the wire, of coil bind or of buckling. Ask the spring's maker.",
    "Weigh the corner and measure the rate where you can: springs and tyres are often a tenth off their label.",
  ],
  method: {
    formula: [
      "wheel rate kw = k·MR²",
      "ride rate kr = kw·kt / (kw + kt)",
      "f = (1/2π)·√(1000·kr / m)",
      "static deflection = m·g / kr,  spring load = m·g / MR",
      "critical damping = 2·√(1000·kw·m)",
      "target: kr = m·(2π·f)² / 1000,  k = kr·kt / (kt − kr) / MR²",
      "coil: G·d⁴ / (8·D³·n)",
    ],
    explanation:
      "MR is spring travel over wheel travel, so the rate at the wheel goes with its square and the load with its inverse. The damper works beside the spring and not the tyre: critical damping is taken on the wheel rate. g is 9.80665 m/s².",
    sources: [
      "T. D. Gillespie, Fundamentals of Vehicle Dynamics, chapter 5: ride rate, frequency and damping.",
      "EN 13906-1: rate of helical compression springs of round wire.",
    ],
  },
});

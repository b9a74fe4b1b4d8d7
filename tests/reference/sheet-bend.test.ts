import { describe, expect, it } from "vitest";
import type { SheetBendResults } from "#shared/calculators/sheet-bend/formula.ts";
import { resultsOf } from "#tests/setup/calculator.ts";

const bend = (inputs: object) =>
  resultsOf<SheetBendResults>("sheet-bend", { flanges: [100, 100], angles: [90], ...inputs });

/**
 * Machinery's Handbook, "Lengths of straight stock required for bending": for a right angle the bend takes
 * 0.55·T + 1.57·R in soft brass and copper, 0.64·T + 1.57·R in half-hard copper, brass and soft steel, 0.71·T + 1.57·R
 * in bronze and hard steel. From memory. As K-factors these are 0.55, 0.64 and 0.71 over π/2.
 */
const handbook = [
  ["soft brass", 0.55],
  ["soft steel", 0.64],
  ["hard steel", 0.71],
] as const;

describe("sheet-bend against a handbook's bend allowances", () => {
  it.each(handbook)("takes what the handbook's formula for %s takes", (_, factor) => {
    for (const [thickness, insideRadius] of [
      [1, 1],
      [2, 3],
      [3.175, 6.35],
    ] as const) {
      const { bends } = bend({ thickness, insideRadius, kFactor: (2 * factor) / Math.PI });
      const printed = factor * thickness + 1.57 * insideRadius;
      // 1.57 is π/2 rounded: 0.0008 of each millimetre of radius.
      expect(Math.abs((bends[0]?.allowance ?? 0) - printed)).toBeLessThan(0.001 * insideRadius + 1e-9);
    }
  });

  // A published worked example (trade calculator page, read in a stored copy): 90°, T = R = 0.125 in, K = 0.44:
  // neutral radius 0.180 in, allowance 0.2827 in.
  it("gives 0.2827 in for 0.125 in sheet at 0.125 in radius, K = 0.44", () => {
    const { bends } = bend({ thickness: 3.175, insideRadius: 3.175, kFactor: 0.44 });
    expect((bends[0]?.allowance ?? 0) / 25.4).toBeCloseTo(0.2827, 4);
    expect((bends[0]?.setback ?? 0) / 25.4).toBeCloseTo(0.25, 9);
    expect((bends[0]?.deduction ?? 0) / 25.4).toBeCloseTo(0.5 - 0.2827, 4);
  });
});

import { describe, expect, it } from "vitest";
import type { TapDrillResults } from "#shared/calculators/tap-drill/formula.ts";
import { resultsOf } from "#tests/setup/calculator.ts";

const tap = (thread: string, engagement?: number) =>
  resultsOf<TapDrillResults>("tap-drill", engagement === undefined ? { thread } : { thread, engagement });

describe("tap-drill against metric tables", () => {
  /**
   * Basic minor diameters, ISO 724 (read in a tap maker's printed tables), and tapping drills, ISO 2306 (those of M6,
   * M10 and above read in a printed trainees' handbook; M3 to M5, M8 and M12 from memory).
   */
  it.each([
    ["M3", 2.459, 2.5],
    ["M4", 3.242, 3.3],
    ["M5", 4.134, 4.2],
    ["M6", 4.917, 5],
    ["M8", 6.647, 6.8],
    ["M8x1", 6.917, 7],
    ["M10", 8.376, 8.5],
    ["M10x1.25", 8.647, 8.8],
    ["M10x1", 8.917, 9],
    ["M12", 10.106, 10.2],
    ["M12x1.25", 10.647, 10.8],
    ["M14", 11.835, 12],
    ["M16", 13.835, 14],
    ["M18", 15.294, 15.5],
    ["M20", 17.294, 17.5],
    ["M22", 19.294, 19.5],
    ["M24", 20.752, 21],
    ["M24x2", 21.835, 22],
  ])("gives %s a minor diameter of %d mm and a drill of %d mm", (thread, minor, drill) => {
    const results = tap(thread);
    expect(results.minor).toBeCloseTo(minor, 3);
    expect(results.standardDrill).toBe(drill);
  });

  // ISO 273, fine, medium and coarse, read in a public copy to M16; M20 and M24 from memory.
  it.each([
    ["M3", 3.2, 3.4, 3.6],
    ["M4", 4.3, 4.5, 4.8],
    ["M5", 5.3, 5.5, 5.8],
    ["M6", 6.4, 6.6, 7],
    ["M8", 8.4, 9, 10],
    ["M10", 10.5, 11, 12],
    ["M12", 13, 13.5, 14.5],
    ["M16", 17, 17.5, 18.5],
    ["M20", 21, 22, 24],
    ["M24", 25, 26, 28],
  ])("clears %s with %d, %d and %d mm", (thread, close, medium, free) => {
    expect(tap(thread).clearance).toEqual({ close, medium, free });
  });
});

/**
 * ASME B1.1: minor diameter of the nut in inches and tensile stress area in square inches, read in public copies of the
 * table. Drills: the usual ones for about 75 %, from memory of workshop charts.
 */
const unified = [
  ["#4-40 UNC", 0.0849, 0.00604, "No. 43"],
  ["#8-32 UNC", 0.1302, 0.014, "No. 29"],
  ["#10-24 UNC", 0.1449, 0.0175, "No. 25"],
  ["#10-32 UNF", 0.1562, 0.02, "No. 21"],
  ["1/4-20 UNC", 0.1959, 0.0318, "No. 7"],
  ["1/4-28 UNF", 0.2113, 0.0364, "No. 3"],
  ["5/16-18 UNC", 0.2524, 0.0524, "letter F"],
  ["5/16-24 UNF", 0.2674, 0.058, "letter I"],
  ["3/8-16 UNC", 0.3073, 0.0775, "5/16 in"],
  ["3/8-24 UNF", 0.3299, 0.0878, "letter Q"],
  ["7/16-14 UNC", 0.3602, 0.1063, "letter U"],
  ["1/2-13 UNC", 0.4167, 0.1419, "27/64 in"],
  ["1/2-20 UNF", 0.4459, 0.1599, "29/64 in"],
  ["5/8-11 UNC", 0.5266, 0.226, "17/32 in"],
  ["3/4-10 UNC", 0.6417, 0.334, "21/32 in"],
  ["1-8 UNC", 0.8647, 0.606, "7/8 in"],
  ["1-12 UNF", 0.9098, 0.663, "59/64 in"],
] as const;

describe("tap-drill against ASME B1.1", () => {
  it.each(unified)(
    "gives %s a minor diameter of %d in, an area of %d in² and %s",
    (thread, minor, area, drill) => {
      const results = tap(thread);
      expect(results.minor / 25.4).toBeCloseTo(minor, 3.9);
      expect(Math.abs(results.stressArea / 25.4 ** 2 / area - 1)).toBeLessThan(0.006);
      expect(results.standardDrillName).toBe(drill);
    },
  );

  /**
   * Machinery's Handbook, "Tap drill sizes and percentage of thread (unified)", read in a stored public page: the hole
   * in inches and the percentage printed beside it.
   */
  it.each([
    ["#2-56", 0.073, 56],
    ["#2-56", 0.0709, 65],
    ["#2-56", 0.07, 69],
    ["#2-64", 0.0748, 55],
    ["#2-64", 0.07, 79],
    ["#4-40", 0.0945, 54],
    ["#4-40", 0.0935, 57],
    ["#4-40", 0.0905, 66],
  ])(
    "makes the hole of %s %d in for the %d percent that the handbook prints beside it",
    (thread, hole, percent) => {
      // The handbook prints whole percents: half a percent either way.
      const half = (0.51 * tap(thread).pitch) / 76.98;
      expect(Math.abs(tap(thread, percent).drill - hole * 25.4)).toBeLessThan(half);
    },
  );
});

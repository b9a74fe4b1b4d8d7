import { describe, expect, it } from "vitest";
import type { StrutCurveResults } from "#shared/calculators/strut-curve/formula.ts";
import { anyInputs, runMany } from "#tests/setup/any-inputs.ts";
import { issueOf, missingResultFields, resultsOf } from "#tests/setup/calculator.ts";

const chi = (curve: string, slenderness: number) =>
  resultsOf<StrutCurveResults>("strut-curve", { curve, slenderness }).chi;

describe("strut-curve", () => {
  it("lists only result fields that it gives as numbers", () => {
    expect(missingResultFields("strut-curve")).toEqual([]);
  });

  it.each(["a0", "a", "b", "c", "d"])(
    "leaves all of it on curve %s up to 0.2, and joins on without a step",
    (curve) => {
      expect(chi(curve, 0)).toBe(1);
      expect(chi(curve, 0.2)).toBe(1);
      expect(chi(curve, 0.2 + 1e-9)).toBeCloseTo(1, 6);
    },
  );

  it.each(["a0", "a", "b", "c", "d"])(
    "falls with slenderness on curve %s, and stays under Euler's 1/λ̄²",
    (curve) => {
      let before = 1;
      for (let slenderness = 0.25; slenderness <= 10; slenderness += 0.05) {
        const now = chi(curve, slenderness);
        expect(now).toBeLessThan(before);
        expect(now).toBeLessThan(1 / slenderness ** 2);
        before = now;
      }
    },
  );

  it("comes to Euler's load for a very slender strut", () => {
    expect(chi("a0", 10) * 100).toBeGreaterThan(0.98);
  });

  it("orders the curves a0, a, b, c, d", () => {
    const curves = ["a0", "a", "b", "c", "d"].map((curve) => chi(curve, 0.9));
    expect(curves).toEqual([...curves].sort((a, b) => b - a));
  });

  it.each([
    ["curve", { curve: "e", slenderness: 1 }, /a0, a, b, c, d/],
    ["slenderness", { curve: "a", slenderness: -0.1 }, /between 0 and 10/],
    ["slenderness", { curve: "a" }, /Give relative slenderness/],
  ])("names %s and what would be right", (field, inputs, message) => {
    expect(issueOf("strut-curve", inputs)).toEqual({ field, message: expect.stringMatching(message) });
  });

  it("gives finite numbers for any input", () => {
    const { worked, faults } = runMany("strut-curve", anyInputs("strut-curve"));
    expect(worked).toBe(10_000);
    expect(faults.size).toBe(0);
  });
});

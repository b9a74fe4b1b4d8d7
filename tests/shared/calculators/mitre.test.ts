import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { MitreResults } from "#shared/calculators/mitre/formula.ts";
import { anyInputs, inRange, runMany } from "#tests/setup/any-inputs.ts";
import { issueOf, missingResultFields, resultsOf } from "#tests/setup/calculator.ts";

const example = { od: 40, wall: 2, turn: 60 };
const mitre = (inputs: object) => resultsOf<MitreResults>("mitre", inputs);

describe("mitre", () => {
  it("lists only result fields that it gives as numbers", () => {
    expect(missingResultFields("mitre")).toEqual([]);
  });

  it("comes near a square cut as the turn grows small", () => {
    const { deepest, weldLength } = mitre({ ...example, turn: 1 });
    expect(deepest).toBeCloseTo(40 * Math.tan(Math.PI / 360), 9);
    expect(weldLength).toBeCloseTo(Math.PI * 40, 2);
  });

  it("is deepest at the heel, half that at the sides, nothing at the toe", () => {
    const { heelDepth, deepest, sideDepth, toeDepth, curve } = mitre(example);
    expect(heelDepth).toBe(deepest);
    expect(sideDepth.at90).toBeCloseTo(deepest / 2, 12);
    expect(sideDepth.at270).toBeCloseTo(deepest / 2, 12);
    expect(toeDepth).toBe(0);
    expect(curve[36]?.depth).toBeCloseTo(0, 12);
  });

  it("opens from the corner's own angle at the heel to past flat at the toe", () => {
    const { curve } = mitre(example);
    expect(curve[0]?.dihedral).toBeCloseTo(120, 9);
    expect(curve[18]?.dihedral).toBeCloseTo(180, 9);
    expect(curve[36]?.dihedral).toBeCloseTo(240, 9);
  });

  it("scales every length with the tube", () => {
    const single = mitre({ ...example, paperThickness: 0 });
    const triple = mitre({ ...example, od: 120, wall: 6, paperThickness: 0 });
    for (const name of ["deepest", "tipFromAxis", "templateWidth", "weldLength"] as const) {
      expect(triple[name]).toBeCloseTo(3 * single[name], 9);
    }
    expect(triple.cutAngle).toBe(single.cutAngle);
  });

  it("is the same on both sides of the heel", () => {
    const { curve } = mitre(example);
    expect([...curve].reverse().map(({ depth }) => depth)).toEqual(
      curve.map(({ depth }) => expect.closeTo(depth, 9)),
    );
  });

  it("cuts deeper the further it turns", () => {
    const depths = [10, 45, 90, 120, 150].map((turn) => mitre({ ...example, turn }).deepest);
    expect(depths).toEqual([...depths].sort((a, b) => a - b));
  });

  it("names the wall when it leaves no bore", () => {
    expect(issueOf("mitre", { ...example, wall: 20 })).toMatchObject({
      field: "wall",
      message: /less than half.*20 mm/,
    });
  });

  it.each([
    ["turn", 0.5, /Turn must be between 1 and 150/],
    ["turn", 151, /Turn must be between 1 and 150/],
    ["od", 0, /Outside diameter must be between 3 and 2000 mm/],
    ["wall", -1, /Wall must be between 0.2 and 200 mm/],
  ])("names %s and its limits at %d", (field, value, message) => {
    expect(issueOf("mitre", { ...example, [field]: value })).toEqual({
      field,
      message: expect.stringMatching(message),
    });
  });

  it("gives finite numbers or one named fault for any input", () => {
    const inputs = fc
      .tuple(anyInputs("mitre"), inRange(0.02, 0.52), fc.integer({ min: 8, max: 12 }))
      .map(([any, part, samples]) => ({ ...any, samples, wall: Math.max(0.2, Number(any.od) * part) }));
    const { worked, faults } = runMany("mitre", inputs);
    expect(worked).toBeGreaterThan(1000);
    expect([...faults.keys()]).toEqual(["wall"]);
  });
});

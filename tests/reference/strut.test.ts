import { describe, expect, it } from "vitest";
import type { StrutResults } from "#shared/calculators/strut/formula.ts";
import { resultsOf } from "#tests/setup/calculator.ts";

describe("strut against published worked examples", () => {
  // "Designers' Guide to EN 1993-1-1", example 6.7, as a public verification set repeats it: hot-finished CHS
  // 244.5 × 10, S355, 4 m pinned at both ends, γM1 = 1: class 1, squash load 7370 mm²·355 MPa, χ = 0.8778, curve a.
  it("gives χ = 0.878 and 2297 kN for CHS 244.5 × 10 in S355, 4 m", () => {
    const results = resultsOf<StrutResults>("strut", {
      shape: "round",
      od: 244.5,
      wall: 10,
      length: 4000,
      yield: 355,
      curve: "a",
    });
    expect(results.sectionClass).toBe(1);
    expect(results.squashLoad / 1000).toBeCloseTo(2616, -1);
    expect(results.chi).toBeCloseTo(0.8778, 3);
    expect(results.resistance / 1000).toBeCloseTo(2297, -1);
  });

  // λ1 = 93.9·ε, EN 1993-1-1, 6.3.1.3: at slenderness 93.9 a strut of S235 has λ̄ = 1.
  it("puts λ̄ = 1 at a slenderness of 93.9 for S235", () => {
    const section = { shape: "round", od: 48.3, wall: 3, yield: 235, curve: "a" };
    const { radiusOfGyration } = resultsOf<StrutResults>("strut", { ...section, length: 1000 });
    const { relativeSlenderness, chi } = resultsOf<StrutResults>("strut", {
      ...section,
      length: 93.9 * radiusOfGyration,
    });
    expect(relativeSlenderness).toBeCloseTo(1, 3);
    expect(chi).toBeCloseTo(0.6656, 3);
  });

  // EN 1993-1-1, table 5.2, sheet 3: class 1 to 50ε², 2 to 70ε², 3 to 90ε²; ε = 1 for 235 MPa.
  it.each([
    [100 / 50, 1],
    [100 / 69.9, 2],
    [100 / 89.9, 3],
  ])("puts a round tube of 100 mm with a wall of %d mm in class %d", (wall, sectionClass) => {
    const inputs = { shape: "round", od: 100, wall, length: 1000, yield: 235, curve: "c" };
    expect(resultsOf("strut", inputs)).toMatchObject({ sectionClass });
  });
});

import { describe, expect, it } from "vitest";
import type { FilletWeldResults } from "#shared/calculators/fillet-weld/formula.ts";
import { anyInputs, runMany } from "#tests/setup/any-inputs.ts";
import { issueOf, missingResultFields, resultsOf } from "#tests/setup/calculator.ts";

const example = { throat: 4, length: 100, ultimate: 470, correlation: 0.9 };
const weld = (inputs: object) => resultsOf<FilletWeldResults>("fillet-weld", { ...example, ...inputs });
const issue = (inputs: object) => issueOf("fillet-weld", { ...example, ...inputs });

describe("fillet-weld", () => {
  it("lists only result fields that it gives as numbers", () => {
    expect(missingResultFields("fillet-weld")).toEqual([]);
  });

  it("turns leg into throat and back", () => {
    const byLeg = weld({ throat: undefined, leg: 4 * Math.SQRT2 });
    expect(byLeg.throat).toBeCloseTo(4, 12);
    expect(byLeg.resistance).toBeCloseTo(weld({}).resistance, 6);
    expect(weld({}).leg).toBeCloseTo(4 * Math.SQRT2, 12);
  });

  it("gives both methods the same along the weld, and √1.5 across it to the directional one", () => {
    expect(weld({ method: "directional", loadAngle: 0 }).resistance).toBe(weld({}).resistance);
    const across = weld({ method: "directional", loadAngle: 90 });
    expect(across.resistance / weld({ loadAngle: 90 }).resistance).toBeCloseTo(Math.sqrt(1.5), 12);
  });

  it("meets the standard's condition of stresses just so, at any angle", () => {
    for (const loadAngle of [0, 15, 30, 45, 60, 90]) {
      const { resistancePerMm, throat } = weld({ method: "directional", loadAngle });
      const angle = (loadAngle * Math.PI) / 180;
      const across = (resistancePerMm * Math.sin(angle)) / (Math.SQRT2 * throat);
      const along = (resistancePerMm * Math.cos(angle)) / throat;
      // EN 1993-1-8, 4.5.3.2: √(σ⊥² + 3(τ⊥² + τ∥²)) ≤ fu/(βw·γM2), σ⊥ ≤ 0.9·fu/γM2; across the throat σ⊥ = τ⊥.
      expect(Math.sqrt(4 * across ** 2 + 3 * along ** 2)).toBeCloseTo(470 / (0.9 * 1.25), 9);
      expect(across).toBeLessThan((0.9 * 470) / 1.25);
    }
  });

  it("is in proportion to throat, length and strength, and against both factors", () => {
    const { resistance } = weld({});
    expect(weld({ throat: 8 }).resistance).toBeCloseTo(2 * resistance, 6);
    expect(weld({ length: 300 }).resistance).toBeCloseTo(3 * resistance, 6);
    expect(weld({ ultimate: 235 }).resistance).toBeCloseTo(resistance / 2, 6);
    expect(weld({ gammaM2: 1.5 }).resistance).toBeCloseTo((resistance * 1.25) / 1.5, 6);
    expect(weld({ correlation: 1 }).resistance).toBeCloseTo(resistance * 0.9, 6);
  });

  it("holds more the further the load turns across it", () => {
    const held = [0, 20, 45, 70, 90].map(
      (loadAngle) => weld({ method: "directional", loadAngle }).resistance,
    );
    expect(held).toEqual([...held].sort((a, b) => a - b));
  });

  it("notes a throat under 3 mm and a very long weld", () => {
    expect(weld({}).notes).toEqual([]);
    expect(weld({ throat: 2.1 }).notes.join(" ")).toContain("below 3 mm");
    expect(weld({ length: 601 }).notes.join(" ")).toContain("150 throats");
  });

  it("says the least length of a weld that carries load", () => {
    expect(issue({ length: 29 })).toMatchObject({ field: "length", message: /at least 30 mm/ });
    expect(issue({ throat: 10, length: 59 })).toMatchObject({ field: "length", message: /at least 60 mm/ });
    expect(issue({ throat: 10, length: 60 })).toBeUndefined();
  });

  it.each([
    ["leg", { throat: undefined }, /leg or its throat/],
    ["throat", { leg: 6 }, /not both/],
    ["ultimate", { ultimate: 0 }, /between 200 and 800 MPa/],
    ["correlation", { correlation: 0.5 }, /between 0.8 and 1/],
    ["loadAngle", { loadAngle: 91 }, /between 0 and 90/],
    ["method", { method: "guess" }, /simplified, directional/],
  ])("names %s and what would be right", (field, inputs, message) => {
    expect(issue(inputs)).toEqual({ field, message: expect.stringMatching(message) });
  });

  it("gives finite numbers or one named fault for any input", () => {
    const { worked, faults } = runMany("fillet-weld", anyInputs("fillet-weld"));
    expect(worked).toBeGreaterThan(1000);
    expect([...faults.keys()].sort()).toEqual(["leg", "length", "throat"]);
  });
});

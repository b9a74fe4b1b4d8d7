import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { BoltResults } from "#shared/calculators/bolt/formula.ts";
import { boltSizes } from "#shared/calculators/bolt/grades.ts";
import { anyInputs, runMany } from "#tests/setup/any-inputs.ts";
import { issueOf, missingResultFields, resultsOf } from "#tests/setup/calculator.ts";

const bolt = (inputs: object) => resultsOf<BoltResults>("bolt", { size: "M12", grade: "8.8", ...inputs });
const issue = (inputs: object) => issueOf("bolt", { size: "M12", grade: "8.8", ...inputs });

describe("bolt", () => {
  it("lists only result fields that it gives as numbers", () => {
    expect(missingResultFields("bolt")).toEqual([]);
  });

  it.each(boltSizes)("knows the coarse pitch of %s, and takes it when named", (size) => {
    const coarse = bolt({ size });
    expect(bolt({ size, pitch: coarse.pitch })).toEqual(coarse);
    expect(coarse.diameter).toBe(Number(size.slice(1)));
  });

  it("has more metal with a finer pitch", () => {
    const areas = [1.75, 1.5, 1.25, 1].map((pitch) => bolt({ pitch }).stressArea);
    expect(areas).toEqual([...areas].sort((a, b) => a - b));
    expect(areas.at(-1)).toBeLessThan((Math.PI / 4) * 144);
  });

  it("raises the proof stress of 8.8 above M16", () => {
    const stress = (size: string) => bolt({ size }).proofLoad / bolt({ size }).stressArea;
    expect(stress("M16")).toBeCloseTo(580, 9);
    expect(stress("M18")).toBeCloseTo(600, 9);
  });

  it("tightens in proportion to K, and to the part of the proof load", () => {
    const { torque, preload } = bolt({});
    expect(bolt({ frictionFactor: 0.1 }).torque).toBeCloseTo(torque / 2, 9);
    expect(bolt({ preloadFraction: 0.375 }).preload).toBeCloseTo(preload / 2, 9);
    expect(bolt({ preloadFraction: 0.375 }).torque).toBeCloseTo(torque / 2, 9);
  });

  it("gains shear resistance when the shank fills the hole, and nothing else", () => {
    const { shearResistance: shank, ...others } = bolt({ threadsInShear: false });
    const { shearResistance: threads, ...same } = bolt({});
    expect(shank / threads).toBeCloseTo(((Math.PI / 4) * 144) / same.stressArea, 9);
    expect(others).toEqual(same);
  });

  it("holds more with size", () => {
    for (const name of ["tensionResistance", "shearResistance", "proofLoad", "torque"] as const) {
      const values = boltSizes.map((size) => bolt({ size })[name]);
      expect(values).toEqual([...values].sort((a, b) => a - b));
    }
  });

  it("notes what the standards say of small and of very hard bolts", () => {
    expect(bolt({ size: "M16" }).notes).toEqual([]);
    expect(bolt({ size: "M8" }).notes.join(" ")).toContain("under M12");
    expect(bolt({ size: "M16", grade: "12.9" }).notes.join(" ")).toContain("stops at class 10.9");
  });

  it("lists the pitches a size is made with", () => {
    expect(issue({ size: "M10", pitch: 2 })).toEqual({
      field: "pitch",
      message:
        "M10 is made with a pitch of 1.5 mm (coarse), 1.25 mm, 1 mm, 0.75 mm: pick one of these, or leave the pitch out.",
    });
  });

  it.each([
    ["size", { size: "M3" }, /M4, M5/],
    ["grade", { grade: "9.9" }, /4.6, .*12.9/],
    ["threadsInShear", { threadsInShear: "yes" }, /true or false/],
    ["frictionFactor", { frictionFactor: 1 }, /between 0.08 and 0.4/],
    ["preloadFraction", { preloadFraction: 1 }, /between 0.1 and 0.9/],
  ])("names %s and what would be right", (field, inputs, message) => {
    expect(issue(inputs)).toEqual({ field, message: expect.stringMatching(message) });
  });

  it("gives finite numbers or one named fault for any input", () => {
    const pitch = fc.option(fc.constantFrom(0.5, 0.7, 0.8, 1, 1.25, 1.5, 1.75, 2, 2.5, 3), {
      nil: undefined,
    });
    const inputs = fc.tuple(anyInputs("bolt"), pitch).map(([any, each]) => ({ ...any, pitch: each }));
    const { worked, faults } = runMany("bolt", inputs);
    expect(worked).toBeGreaterThan(1000);
    expect([...faults.keys()]).toEqual(["pitch"]);
  });
});

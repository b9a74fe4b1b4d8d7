import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { StrutResults } from "#shared/calculators/strut/formula.ts";
import { anyInputs, inRange, runMany } from "#tests/setup/any-inputs.ts";
import { issueOf, missingResultFields, resultsOf } from "#tests/setup/calculator.ts";

const example = { shape: "round", od: 48.3, wall: 3, length: 1500, yield: 235, curve: "c" };
const strut = (inputs: object) => resultsOf<StrutResults>("strut", { ...example, ...inputs });
const issue = (inputs: object) => issueOf("strut", { ...example, ...inputs });

describe("strut", () => {
  it("lists only result fields that it gives as numbers", () => {
    expect(missingResultFields("strut")).toEqual([]);
  });

  it("squashes when it is very short", () => {
    const { chi, governs, resistance, squashLoad } = strut({ length: 100 });
    expect(chi).toBe(1);
    expect(governs).toBe("squash");
    expect(resistance).toBe(squashLoad);
  });

  it("comes near Euler's load when it is very long, and never over it", () => {
    const { resistance, eulerLoad, governs } = strut({ length: 15_000, curve: "a0" });
    expect(governs).toBe("buckling");
    expect(resistance / eulerLoad).toBeGreaterThan(0.98);
    expect(resistance / eulerLoad).toBeLessThan(1);
  });

  it("takes the effective length for the length", () => {
    const long = strut({ length: 3000 });
    const fixed = strut({ effectiveLengthFactor: 2 });
    expect(fixed).toEqual(long);
    expect(fixed.effectiveLength).toBe(3000);
  });

  it("keeps its slenderness and scales its loads with the square of its size", () => {
    const [one, two] = [strut({}), strut({ od: 96.6, wall: 6, length: 3000 })];
    expect(two.relativeSlenderness).toBeCloseTo(one.relativeSlenderness, 9);
    expect(two.resistance / one.resistance).toBeCloseTo(4, 9);
  });

  it("buckles about the weak axis, whichever way the rectangle lies", () => {
    const box = { shape: "rectangle", wall: 3, od: undefined };
    const standing = strut({ ...box, width: 30, height: 60 });
    expect(strut({ ...box, width: 60, height: 30 })).toEqual(standing);
    const square = strut({ shape: "square", side: 30, wall: 3 });
    expect(standing.slenderness).toBeLessThan(square.slenderness);
  });

  it("holds less the longer it is, and more the thicker its wall", () => {
    const lengths = [200, 500, 1000, 2000, 4000].map((length) => strut({ length }).resistance);
    expect(lengths).toEqual([...lengths].sort((a, b) => b - a));
    const walls = [1.5, 2, 3, 4].map((wall) => strut({ wall }).resistance);
    expect(walls).toEqual([...walls].sort((a, b) => a - b));
  });

  it("divides by γM1 and by nothing else", () => {
    expect(strut({ gammaM1: 1.1 }).resistance * 1.1).toBeCloseTo(strut({}).resistance, 6);
  });
});

describe("strut, failures", () => {
  it("says how thick the wall must be past class 3, round", () => {
    // 90·235/355 = 59.6 of diameter over wall: 100 mm needs 1.68 mm.
    const found = issue({ od: 100, wall: 1.6, yield: 355 });
    expect(found).toMatchObject({
      field: "wall",
      message: /d\/t is 62\.5, and this sum holds to 59\.6.*at least 1\.68 mm/,
    });
    expect(issue({ od: 100, wall: 1.68, yield: 355 })).toBeUndefined();
  });

  it("says how thick the wall must be past class 3, square", () => {
    // (side − 3t)/t ≤ 42 for S235: 100 mm needs 100/45 = 2.23 mm.
    const thin = { shape: "square", side: 100, yield: 235 };
    expect(issue({ ...thin, wall: 2 })).toMatchObject({
      field: "wall",
      message: /c\/t is 47\.0.*42\.0.*at least 2\.23 mm/,
    });
    expect(issue({ ...thin, wall: 2.23 })).toBeUndefined();
  });

  it.each([
    ["od", { od: undefined }, /outside diameter/],
    ["wall", { wall: 24.15 }, /no bore/],
    ["length", { length: 0 }, /between 1 and 30000 mm/],
    ["yield", { yield: 5 }, /between 100 and 700 MPa/],
    ["modulus", { modulus: 70_000 }, /between 180000 and 220000 MPa/],
    ["curve", { curve: undefined }, /a0, a, b, c, d/],
    ["effectiveLengthFactor", { effectiveLengthFactor: 0 }, /between 0.5 and 3/],
  ])("names %s and what would be right", (field, inputs, message) => {
    expect(issue(inputs)).toEqual({ field, message: expect.stringMatching(message) });
  });

  it("gives finite numbers or one named fault for any input", () => {
    const inputs = fc.tuple(anyInputs("strut"), inRange(0.005, 0.6)).map(([any, part]) => {
      const across = Number(any.od ?? any.side ?? any.width ?? 50);
      return { ...any, wall: Math.min(100, Math.max(0.2, across * part)) };
    });
    const { worked, faults } = runMany("strut", inputs);
    expect(worked).toBeGreaterThan(500);
    expect([...faults.keys()].sort()).toEqual(["height", "od", "side", "wall", "width"]);
  });
});

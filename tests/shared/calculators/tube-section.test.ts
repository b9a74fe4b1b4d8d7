import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { TubeSectionResults } from "#shared/calculators/tube-section/formula.ts";
import { anyInputs, inRange, runMany } from "#tests/setup/any-inputs.ts";
import { issueOf, missingResultFields, resultsOf } from "#tests/setup/calculator.ts";

const section = (inputs: object) => resultsOf<TubeSectionResults>("tube-section", inputs);
const issue = (inputs: object) => issueOf("tube-section", inputs);

describe("tube-section", () => {
  it("lists only result fields that it gives as numbers", () => {
    expect(missingResultFields("tube-section")).toEqual([]);
  });

  it("comes to a thin ring's π·D·t and π/8·D³·t as the wall grows thin", () => {
    const { area, i } = section({ shape: "round", od: 1000, wall: 0.2 });
    expect(area).toBeCloseTo(Math.PI * 999.8 * 0.2, 6);
    expect(i / ((Math.PI / 8) * 999.8 ** 3 * 0.2)).toBeCloseTo(1, 6);
  });

  it("comes to two plain rectangles with sharp corners", () => {
    const { area, i, iMinor, wpl, perimeter } = section({
      shape: "rectangle",
      width: 40,
      height: 60,
      wall: 3,
      corners: "sharp",
    });
    expect(area).toBeCloseTo(40 * 60 - 34 * 54, 9);
    expect(i).toBeCloseTo((40 * 60 ** 3 - 34 * 54 ** 3) / 12, 6);
    expect(iMinor).toBeCloseTo((60 * 40 ** 3 - 54 * 34 ** 3) / 12, 6);
    expect(wpl).toBeCloseTo((40 * 60 ** 2 - 34 * 54 ** 2) / 4, 6);
    expect(perimeter).toBe(200);
  });

  it("takes a square for a rectangle of equal sides, and lying for standing", () => {
    expect(section({ shape: "square", side: 50, wall: 3 })).toEqual(
      section({ shape: "rectangle", width: 50, height: 50, wall: 3 }),
    );
    expect(section({ shape: "rectangle", width: 30, height: 60, wall: 2 })).toEqual(
      section({ shape: "rectangle", width: 60, height: 30, wall: 2 }),
    );
  });

  it("has its corner areas as the integral over the outline says", () => {
    // Second moment by strips: an independent way to the corner formulas.
    const { i, outsideRadius, insideRadius } = section({ shape: "square", side: 60, wall: 4 });
    const halfWidth = (half: number, radius: number, y: number) => {
      const into = Math.max(0, y - (half - radius));
      return half - radius + Math.sqrt(radius ** 2 - into ** 2);
    };
    const strips = (half: number, radius: number) => {
      const count = 20_000;
      let sum = 0;
      for (let strip = 0; strip < count; strip += 1) {
        const y = (half * (strip + 0.5)) / count;
        sum += 4 * halfWidth(half, radius, y) * y ** 2 * (half / count);
      }
      return sum;
    };
    expect(i / (strips(30, outsideRadius) - strips(26, insideRadius))).toBeCloseTo(1, 5);
  });

  it("scales area by the square, I by the fourth and W by the third power", () => {
    const [one, two] = [1, 2].map((k) =>
      section({ shape: "rectangle", width: 40 * k, height: 60 * k, wall: 2 * k }),
    );
    if (!one || !two) throw new Error("no sections");
    expect(two.area / one.area).toBeCloseTo(4, 9);
    expect(two.i / one.i).toBeCloseTo(16, 9);
    expect(two.torsion / one.torsion).toBeCloseTo(16, 9);
    expect(two.w / one.w).toBeCloseTo(8, 9);
    expect(two.wpl / one.wpl).toBeCloseTo(8, 9);
    expect(two.radiusOfGyration / one.radiusOfGyration).toBeCloseTo(2, 9);
  });

  it("is stiffer and heavier with a thicker wall", () => {
    const walls = [1, 1.5, 2, 3, 4, 5].map((wall) => section({ shape: "square", side: 40, wall }));
    for (const name of ["area", "i", "w", "wpl", "massPerMetre"] as const) {
      const values = walls.map((each) => each[name]);
      expect(values).toEqual([...values].sort((a, b) => a - b));
    }
  });

  it("weighs by the density", () => {
    const steel = section({ shape: "round", od: 50, wall: 2 });
    const aluminium = section({ shape: "round", od: 50, wall: 2, density: 2700 });
    expect(aluminium.massPerMetre / steel.massPerMetre).toBeCloseTo(2700 / 7850, 12);
  });
});

describe("tube-section, failures", () => {
  it.each([
    [
      "a round tube without a diameter",
      { shape: "round", side: 50, wall: 2 },
      "od",
      /outside diameter in mm/,
    ],
    ["a square tube without a side", { shape: "square", wall: 2 }, "side", /side in mm/],
    ["a rectangle without a width", { shape: "rectangle", height: 50, wall: 2 }, "width", /width in mm/],
    ["a rectangle without a height", { shape: "rectangle", width: 50, wall: 2 }, "height", /height in mm/],
    [
      "a wall of half the diameter",
      { shape: "round", od: 50, wall: 25 },
      "wall",
      /less than half of 50 mm \(25 mm\)/,
    ],
    [
      "a wall of half the narrow side",
      { shape: "rectangle", width: 20, height: 60, wall: 10, corners: "sharp" },
      "wall",
      /half of 20 mm/,
    ],
    ["no shape", { od: 50, wall: 2 }, "shape", /round, square, rectangle/],
    [
      "corners of another kind",
      { shape: "square", side: 50, wall: 2, corners: "soft" },
      "corners",
      /cold-formed, hot-finished, sharp/,
    ],
  ])("names the field for %s", (_, inputs, field, message) => {
    expect(issue(inputs)).toEqual({ field, message: expect.stringMatching(message) });
  });

  it.each([
    [20, "cold-formed", 5],
    [26, "cold-formed", 6],
    [45, "cold-formed", 9],
    [55, "cold-formed", 10],
    [120, "cold-formed", 20],
    [40, "hot-finished", 10],
  ])("gives the thickest wall whose corners still fit in %d mm, %s: %d mm", (side, corners, thickest) => {
    const found = issue({ shape: "square", side, wall: side / 2.1, corners });
    expect(found?.message).toContain(`make it ${thickest} mm or less`);
    expect(issue({ shape: "square", side, wall: thickest, corners })).toBeUndefined();
    expect(issue({ shape: "square", side, wall: thickest + 0.02, corners })).toMatchObject({ field: "wall" });
  });

  it("gives finite numbers or one named fault for any input", () => {
    const inputs = fc.tuple(anyInputs("tube-section"), inRange(0.005, 0.6)).map(([any, part]) => {
      const across = Number(any.od ?? any.side ?? any.width ?? 50);
      return { ...any, wall: Math.min(100, Math.max(0.2, across * part)) };
    });
    const { worked, faults } = runMany("tube-section", inputs);
    expect(worked).toBeGreaterThan(1000);
    expect([...faults.keys()].sort()).toEqual(["height", "od", "side", "wall", "width"]);
  });
});

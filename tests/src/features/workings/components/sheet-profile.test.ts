import { describe, expect, it } from "vitest";
import { sheetBend } from "#shared/calculators/sheet-bend/formula.ts";
import { sheetProfile } from "#src/features/workings/components/sheet-profile.ts";

function profileOf(flanges: number[], angles: number[]) {
  const inputs = { flanges, angles, thickness: 2, insideRadius: 3, kFactor: 0.42 };
  const results = sheetBend(inputs);
  if (!results.ok) throw new Error(results.issue.message);
  return sheetProfile(inputs, results.value);
}

const reach = (values: number[]) => Math.max(...values) - Math.min(...values);

/** Area of a closed run of places, by the trapezium rule. */
function area(outline: readonly (readonly [number, number])[]): number {
  return Math.abs(
    outline.reduce((sum, [x, y], index) => {
      const [nextX, nextY] = outline[(index + 1) % outline.length] ?? [x, y];
      return sum + (x * nextY - nextX * y) / 2;
    }, 0),
  );
}

describe("sheetProfile", () => {
  // A flange's outside length is measured to where the outside faces would meet: the U is exactly that wide and high.
  it("makes a U as wide and as high as its outside lengths", () => {
    const { outline } = profileOf([40, 60, 40], [90, 90]);
    expect(reach(outline.map(([x]) => x))).toBeCloseTo(40, 6);
    expect(reach(outline.map(([, y]) => y))).toBeCloseTo(60, 6);
  });

  it("brings a Z back to its first heading", () => {
    const { outline } = profileOf([30, 30, 30], [90, -90]);
    const [first, second] = outline;
    const flat = outline.length / 2;
    const [before, last] = [outline[flat - 2], outline[flat - 1]];
    expect(second?.[1]).toBeCloseTo(first?.[1] ?? Number.NaN, 9);
    expect(last?.[1]).toBeCloseTo(before?.[1] ?? Number.NaN, 9);
    expect((last?.[0] ?? 0) - (before?.[0] ?? 0)).toBeGreaterThan(0);
  });

  // Straight parts are rectangles and a bend is a part of a ring: (A/2)·((R + T)² − R²).
  it.each([[90], [-90], [135], [-30]])(
    "has the section of its flats and a ring part at a bend of %s°",
    (angle) => {
      const inputs = { flanges: [50, 50], angles: [angle], thickness: 2, insideRadius: 3, kFactor: 0.42 };
      const results = sheetBend(inputs);
      if (!results.ok) throw new Error(results.issue.message);
      const ring = ((Math.abs(angle) * Math.PI) / 360) * (5 ** 2 - 3 ** 2);
      const expected = 2 * (results.value.flats[0] ?? 0) + 2 * (results.value.flats[1] ?? 0) + ring;
      expect(area(sheetProfile(inputs, results.value).outline)).toBeCloseTo(expected, 0);
    },
  );
});

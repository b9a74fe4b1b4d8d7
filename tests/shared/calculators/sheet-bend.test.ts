import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { SheetBendResults } from "#shared/calculators/sheet-bend/formula.ts";
import { inRange, runMany } from "#tests/setup/any-inputs.ts";
import { issueOf, missingResultFields, resultsOf } from "#tests/setup/calculator.ts";

const example = { flanges: [40, 60, 50], angles: [90, 60], thickness: 2, insideRadius: 3, kFactor: 0.42 };
const bend = (inputs: object) => resultsOf<SheetBendResults>("sheet-bend", { ...example, ...inputs });
const issue = (inputs: object) => issueOf("sheet-bend", { ...example, ...inputs });

describe("sheet-bend", () => {
  it("lists only result fields that it gives as numbers", () => {
    expect(missingResultFields("sheet-bend")).toEqual([]);
  });

  it("adds up: flats and allowances make the flat length, flanges less deductions too", () => {
    const { flats, bends, flatLength } = bend({});
    const sum = (values: number[]) => values.reduce((total, value) => total + value, 0);
    expect(sum(flats) + sum(bends.map(({ allowance }) => allowance))).toBeCloseTo(flatLength, 9);
    expect(150 - sum(bends.map(({ deduction }) => deduction))).toBeCloseTo(flatLength, 9);
  });

  it("marks each bend in the middle of its allowance", () => {
    const { flats, bends, bendLines } = bend({});
    const [first = 0, second = 0] = flats;
    const [one = 0, two = 0] = bends.map(({ allowance }) => allowance);
    expect(bendLines[0]).toBeCloseTo(first + one / 2, 9);
    expect(bendLines[1]).toBeCloseTo(first + one + second + two / 2, 9);
  });

  it("keeps nearly the whole length at a slight bend in thin sheet", () => {
    const { flatLength } = bend({ flanges: [100, 100], angles: [1], thickness: 0.2, insideRadius: 0 });
    expect(flatLength).toBeCloseTo(200, 2);
  });

  it("bends up and down alike", () => {
    expect(bend({ angles: [90, -60] })).toEqual(bend({}));
  });

  it("mirrors its bend lines when the strip is turned end for end", () => {
    const there = bend({});
    const back = bend({ flanges: [50, 60, 40], angles: [60, 90] });
    expect(back.flatLength).toBeCloseTo(there.flatLength, 9);
    expect([...back.bendLines].reverse().map((line) => back.flatLength - line)).toEqual(
      there.bendLines.map((line) => expect.closeTo(line, 9)),
    );
  });

  it("scales with the piece", () => {
    const twice = bend({ flanges: [80, 120, 100], thickness: 4, insideRadius: 6 });
    expect(twice.flatLength).toBeCloseTo(2 * bend({}).flatLength, 9);
  });

  it("takes more sheet with a larger K-factor and a larger angle", () => {
    const lengths = [0.3, 0.4, 0.5].map((kFactor) => bend({ kFactor }).flatLength);
    expect(lengths).toEqual([...lengths].sort((a, b) => a - b));
    const allowances = [10, 45, 90, 150].map(
      (angle) => bend({ flanges: [100, 100], angles: [angle] }).bends[0]?.allowance ?? 0,
    );
    expect(allowances).toEqual([...allowances].sort((a, b) => a - b));
  });

  it("says how long a flange between two bends must be at least", () => {
    // Setbacks of 5·tan 45° and 5·tan 30°: 7.89 mm.
    const found = issue({ flanges: [40, 7, 50] });
    expect(found).toMatchObject({ field: "flanges.1", message: /Flange 2 .* at least 7\.9 mm/ });
    expect(issue({ flanges: [40, 7.9, 50] })).toBeUndefined();
  });

  it.each([
    ["angles", { angles: [90] }, /3 flanges meet in 2 bends, but 1 angles were given: give 2/],
    ["angles.0", { angles: [0, 60] }, /at least 1°/],
    ["angles.1", { angles: [90, 160] }, /between -150 and 150/],
    ["angles", { angles: 90 }, /list in degrees/],
    ["flanges", { flanges: [40] }, /at least 2/],
    ["flanges", { flanges: "40, 60" }, /list of outside lengths/],
    ["flanges.1", { flanges: [40, -60, 50] }, /Flange must be between/],
    ["kFactor", { kFactor: 0.6 }, /between 0.2 and 0.5/],
    ["thickness", { thickness: undefined }, /Give thickness as a number in mm/],
  ])("names %s and what would be right", (field, inputs, message) => {
    expect(issue(inputs)).toEqual({ field, message: expect.stringMatching(message) });
  });

  it("gives finite numbers or one named fault for any input", () => {
    const inputs = fc.integer({ min: 1, max: 6 }).chain((bends) =>
      fc.record({
        flanges: fc.array(inRange(0.5, 10_000), { minLength: bends + 1, maxLength: bends + 1 }),
        angles: fc.array(inRange(-150, 150), { minLength: bends, maxLength: bends }),
        thickness: inRange(0.2, 40),
        insideRadius: inRange(0, 50),
        kFactor: inRange(0.2, 0.5),
      }),
    );
    const { worked, faults } = runMany("sheet-bend", inputs);
    expect(worked).toBeGreaterThan(1000);
    expect([...faults.keys()].every((field) => /^flanges\.\d$/.test(field))).toBe(true);
  });
});

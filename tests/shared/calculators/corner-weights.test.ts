import { describe, expect, it } from "vitest";
import type { CornerWeightsResults } from "#shared/calculators/corner-weights/formula.ts";
import { anyInputs, runMany } from "#tests/setup/any-inputs.ts";
import { issueOf, missingResultFields, resultsOf } from "#tests/setup/calculator.ts";

const example = { lf: 118, rf: 112, lr: 149, rr: 141, wheelbase: 2300, frontTrack: 1290, rearTrack: 1270 };
const lifted = { height: 400, frontMass: 236, loadedRadius: 268 };
const weigh = (inputs: object) =>
  resultsOf<CornerWeightsResults>("corner-weights", { ...example, ...inputs });

describe("corner-weights, limit cases", () => {
  it("puts the centre of gravity on the front axle when the rear carries nothing", () => {
    expect(weigh({ lr: 0, rr: 0 })).toMatchObject({ frontPercent: 100, cgFromFront: 0 });
  });

  it("puts it half a track out when one side carries everything", () => {
    expect(weigh({ rf: 0, rr: 0, frontTrack: 1200, rearTrack: 1200 })).toMatchObject({
      leftPercent: 100,
      cgFromCentre: 600,
    });
  });

  it("puts it at hub height when nothing moves forward", () => {
    expect(weigh({ lifted: { ...lifted, frontMass: 230 } })).toMatchObject({ cgHeight: 268, massMoved: 0 });
  });

  it("puts it below the hubs when load moves backward", () => {
    expect(weigh({ lifted: { ...lifted, frontMass: 229 } }).cgHeight).toBeLessThan(268);
  });
});

describe("corner-weights, invariances", () => {
  it("keeps places and shares when every reading doubles", () => {
    const { total, crossDifference, massMoved, ...places } = weigh({ lifted });
    const double = weigh({ lf: 236, rf: 224, lr: 298, rr: 282, lifted: { ...lifted, frontMass: 472 } });
    expect(double).toMatchObject(places);
    expect(double.total).toBe(2 * total);
  });

  it("mirrors left and right", () => {
    const plain = weigh({});
    const mirrored = weigh({ lf: 112, rf: 118, lr: 141, rr: 149 });
    expect(mirrored.cgFromCentre).toBeCloseTo(-plain.cgFromCentre, 12);
    expect(mirrored.leftPercent).toBeCloseTo(100 - plain.leftPercent, 12);
    expect(mirrored.crossPercent).toBeCloseTo(100 - plain.crossPercent, 12);
    expect(mirrored.cgFromFront).toBeCloseTo(plain.cgFromFront, 12);
  });

  it("finds a higher centre of gravity when more moves forward", () => {
    const height = (frontMass: number) => weigh({ lifted: { ...lifted, frontMass } }).cgHeight ?? 0;
    expect(height(237)).toBeGreaterThan(height(236));
  });
});

describe("corner-weights, failures", () => {
  it.each([
    ["empty scales", { lf: 0, rf: 0, lr: 0, rr: 0 }, "lf", /at least 1 kg/],
    [
      "a rear raised past the wheelbase",
      { lifted: { ...lifted, height: 2400 } },
      "lifted.height",
      /within 1840 mm/,
    ],
    [
      "front scales that carry the whole car",
      { lifted: { ...lifted, frontMass: 520 } },
      "lifted.frontMass",
      /less than 520 kg/,
    ],
    [
      "a centre of gravity below the ground",
      { lifted: { ...lifted, frontMass: 215 } },
      "lifted.frontMass",
      /more than 219.3 kg/,
    ],
    ["a second weighing that is none", { lifted: 3 }, "lifted", /or leave it out/],
    ["a negative reading", { rr: -1 }, "rr", /between 0 and 20000 kg/],
  ])("names the field for %s", (_, inputs, field, message) => {
    expect(issueOf("corner-weights", { ...example, ...inputs })).toEqual({
      field,
      message: expect.stringMatching(message),
    });
  });
});

describe("corner-weights, any input the schema lets through", () => {
  it("has every listed result as a number", () => {
    expect(missingResultFields("corner-weights")).toEqual([]);
  });

  it("gives finite numbers or one named fault, never NaN", () => {
    const { worked, faults } = runMany("corner-weights", anyInputs("corner-weights"));
    expect(worked).toBeGreaterThan(1000);
    expect([...faults.keys()].sort()).toEqual(["lifted.frontMass", "lifted.height"]);
  });
});

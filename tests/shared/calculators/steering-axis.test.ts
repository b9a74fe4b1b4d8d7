import { describe, expect, it } from "vitest";
import { axisPoints, type SteeringAxisResults } from "#shared/calculators/steering-axis/formula.ts";
import { steeringAxisInputs } from "#shared/calculators/steering-axis/inputs.ts";
import { anyInputs, runMany } from "#tests/setup/any-inputs.ts";
import { issueOf, missingResultFields, resultsOf } from "#tests/setup/calculator.ts";

const example = {
  lower: { out: -62, up: -96, fore: 6 },
  upper: { out: -92, up: 148, fore: -14 },
  wheelOffset: 25,
  loadedRadius: 268,
  camber: -1,
};
const axis = (inputs: object) => resultsOf<SteeringAxisResults>("steering-axis", { ...example, ...inputs });

describe("steering-axis, limit cases", () => {
  it("gives nothing for an upright axis through the wheel centre", () => {
    const results = axis({
      lower: { out: 0, up: -90, fore: 0 },
      upper: { out: 0, up: 90, fore: 0 },
      wheelOffset: 0,
      camber: 0,
    });
    for (const name of ["kpi", "caster", "scrubRadius", "trail", "spindleLength", "includedAngle"] as const) {
      expect(results[name]).toBeCloseTo(0, 12);
    }
    for (const camber of Object.values(results.camberAtSteer)) expect(camber).toBeCloseTo(0, 12);
  });

  it("lists camber at −30 to 30 by 5, with the camber itself straight ahead", () => {
    const { camberAtSteer } = axis({});
    const listed = Object.keys(camberAtSteer).map(Number);
    expect(listed.sort((a, b) => a - b)).toEqual([-30, -25, -20, -15, -10, -5, 0, 5, 10, 15, 20, 25, 30]);
    expect(camberAtSteer["0"]).toBeCloseTo(-1, 12);
  });

  it("gives camber for a millimetre, and the slot for a degree, from the spread of the joints", () => {
    const { camberPerMm, slotFor1deg, pivotSpread } = axis({});
    expect(pivotSpread).toBe(244);
    expect(Math.tan((camberPerMm * Math.PI) / 180)).toBeCloseTo(-1 / 244, 12);
    expect(slotFor1deg).toBeCloseTo(8.518, 3);
  });
});

describe("steering-axis, invariances", () => {
  it("comes back to itself when turned over twice", () => {
    const { otherWayUp, ...asIs } = axis({});
    const { otherWayUp: back, ...over } = axis({ turnedOver: true });
    expect(over).toEqual(otherWayUp);
    expect(back).toEqual(asIs);
  });

  it("turns over like an upright measured that way round", () => {
    const { otherWayUp } = axis({});
    const { otherWayUp: _, ...measured } = axis({
      lower: { out: -92, up: -148, fore: 14 },
      upper: { out: -62, up: 96, fore: -6 },
    });
    expect(measured).toEqual(otherWayUp);
  });

  it("keeps angles and scales lengths when everything is twice as large", () => {
    const single = axis({});
    const double = axis({
      lower: { out: -124, up: -192, fore: 12 },
      upper: { out: -184, up: 296, fore: -28 },
      wheelOffset: 50,
      loadedRadius: 536,
    });
    expect(double.kpi).toBeCloseTo(single.kpi, 12);
    expect(double.camberAtSteer["20"]).toBeCloseTo(single.camberAtSteer["20"] ?? 0, 12);
    for (const name of ["scrubRadius", "trail", "spindleLength", "slotFor1deg"] as const) {
      expect(double[name]).toBeCloseTo(2 * single[name], 9);
    }
  });

  it("swaps left and right lock, and turns caster and trail round, when mirrored fore and aft", () => {
    const plain = axis({});
    const mirrored = axis({ lower: { ...example.lower, fore: -6 }, upper: { ...example.upper, fore: 14 } });
    expect(mirrored.caster).toBeCloseTo(-plain.caster, 12);
    expect(mirrored.trail).toBeCloseTo(-plain.trail, 12);
    expect(mirrored.camberAtSteer["20"]).toBeCloseTo(plain.camberAtSteer["-20"] ?? 0, 12);
  });
});

describe("axisPoints", () => {
  it("puts the axis on the ground a scrub radius inboard of the contact point and a trail ahead of it", () => {
    const { scrubRadius, trail } = axis({});
    const { contact, axisAtGround } = axisPoints(steeringAxisInputs.parse(example));
    expect(contact.out - axisAtGround.out).toBeCloseTo(scrubRadius, 12);
    expect(axisAtGround.fore - contact.fore).toBeCloseTo(trail, 12);
    expect(axisAtGround.up).toBe(contact.up);
  });
});

describe("steering-axis, failures", () => {
  it("names the upper joint and the least height when it is not above the lower", () => {
    expect(issueOf("steering-axis", { ...example, upper: { ...example.upper, up: -90 } })).toEqual({
      field: "upper.up",
      message:
        "The upper joint must stand at least 20 mm above the lower one: set it at -76 mm or more, or swap the joints.",
    });
  });

  it.each([
    ["a joint left out", { ...example, lower: undefined }, "lower", /out, up and fore/],
    ["part of a joint left out", { ...example, lower: { out: 1, up: 2 } }, "lower.fore", /as a number in mm/],
    ["a loaded radius of 0", { ...example, loadedRadius: 0 }, "loadedRadius", /between 50 and 1000 mm/],
    ["words for a switch", { ...example, turnedOver: "yes" }, "turnedOver", /true or false/],
  ])("names the field for %s", (_, inputs, field, message) => {
    expect(issueOf("steering-axis", inputs)).toEqual({ field, message: expect.stringMatching(message) });
  });
});

describe("steering-axis, any input the schema lets through", () => {
  it("has every listed result as a number", () => {
    expect(missingResultFields("steering-axis")).toEqual([]);
  });

  it("gives finite numbers or one named fault, never NaN", () => {
    const { worked, faults } = runMany("steering-axis", anyInputs("steering-axis"), 5000);
    expect(worked).toBeGreaterThan(1000);
    expect([...faults.keys()]).toEqual(["upper.up"]);
  });
});

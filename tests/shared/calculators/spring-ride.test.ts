import { describe, expect, it } from "vitest";
import type { SpringRideResults } from "#shared/calculators/spring-ride/formula.ts";
import { anyInputs, runMany } from "#tests/setup/any-inputs.ts";
import { issueOf, missingResultFields, resultsOf } from "#tests/setup/calculator.ts";

const example = { cornerMass: 140, springRate: 38, motionRatio: 0.6, tyreRate: 180 };
const ride = (inputs: object) => resultsOf<SpringRideResults>("spring-ride", { ...example, ...inputs });

describe("spring-ride, limit cases", () => {
  it("rides on the spring alone when the tyre is all but rigid", () => {
    const { rideRate, wheelRate } = ride({ springRate: 1, tyreRate: 10_000 });
    expect(rideRate / wheelRate).toBeCloseTo(1, 4);
  });

  it("leaves target and coil empty when they are not asked for", () => {
    expect(ride({})).toMatchObject({ springRateForTarget: null, coilRate: null, springIndex: null });
  });

  it("gives back the spring when the target is the frequency it has", () => {
    const { rideFrequency } = ride({});
    expect(ride({ targetFrequency: rideFrequency }).springRateForTarget).toBeCloseTo(38, 9);
  });

  it("takes a coil of twice its wire", () => {
    expect(ride({ coil: { wire: 10, meanDiameter: 20, activeCoils: 5 } }).springIndex).toBe(2);
  });
});

describe("spring-ride, invariances", () => {
  it("keeps the frequency when mass and rates double", () => {
    const double = ride({ cornerMass: 280, springRate: 76, tyreRate: 360 });
    expect(double.rideFrequency).toBeCloseTo(ride({}).rideFrequency, 12);
    expect(double.staticDeflection).toBeCloseTo(ride({}).staticDeflection, 9);
  });

  it("carries the same weight through spring and wheel: load times motion ratio", () => {
    for (const motionRatio of [0.4, 0.6, 1, 1.3]) {
      expect(ride({ motionRatio }).springLoad * motionRatio).toBeCloseTo(140 * 9.80665, 9);
    }
  });

  it("ties frequency and static deflection together: f = √(g/δ)/2π", () => {
    const { rideFrequency, staticDeflection } = ride({});
    expect(rideFrequency).toBeCloseTo(Math.sqrt(9806.65 / staticDeflection) / (2 * Math.PI), 12);
  });

  it("rides quicker on a stiffer spring and slower under more mass", () => {
    const frequency = (inputs: object) => ride(inputs).rideFrequency;
    expect(frequency({ springRate: 39 })).toBeGreaterThan(frequency({}));
    expect(frequency({ cornerMass: 141 })).toBeLessThan(frequency({}));
  });
});

describe("spring-ride, failures", () => {
  it("names the target and the most the tyre allows", () => {
    expect(issueOf("spring-ride", { ...example, targetFrequency: 6 })).toEqual({
      field: "targetFrequency",
      message:
        "The tyre alone is too soft for this frequency: no spring gets this corner past 5.7 Hz. Keep the target below that, or take a stiffer tyre.",
    });
  });

  it("names the coil that is tighter than its wire", () => {
    const coil = { wire: 10, meanDiameter: 19, activeCoils: 5 };
    expect(issueOf("spring-ride", { ...example, coil })).toMatchObject({
      field: "coil.meanDiameter",
      message: /at least twice the wire, 20 mm/,
    });
  });

  it.each([
    ["a motion ratio of 0", { ...example, motionRatio: 0 }, "motionRatio", /between 0.05 and 2/],
    ["a missing mass", { ...example, cornerMass: undefined }, "cornerMass", /as a number in kg/],
    ["a coil that is no coil", { ...example, coil: 8 }, "coil", /or leave it out/],
  ])("names the field for %s", (_, inputs, field, message) => {
    expect(issueOf("spring-ride", inputs)).toEqual({ field, message: expect.stringMatching(message) });
  });
});

describe("spring-ride, any input the schema lets through", () => {
  it("has every listed result as a number", () => {
    expect(missingResultFields("spring-ride")).toEqual([]);
  });

  it("gives finite numbers or one named fault, never NaN", () => {
    const { worked, faults } = runMany("spring-ride", anyInputs("spring-ride"));
    expect(worked).toBeGreaterThan(1000);
    expect([...faults.keys()].sort()).toEqual(["coil.meanDiameter", "targetFrequency"]);
  });
});

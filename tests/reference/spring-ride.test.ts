import { describe, expect, it } from "vitest";
import { coilRate, type SpringRideResults } from "#shared/calculators/spring-ride/formula.ts";
import { resultsOf } from "#tests/setup/calculator.ts";

const POUND_PER_INCH = 0.17512684;

describe("spring-ride, helical spring rates", () => {
  /**
   * Budynas and Nisbett, Shigley's Mechanical Engineering Design, example 10-1 (from memory): music wire of 0.037 in,
   * outside diameter 7/16 in (mean 0.400 in as rounded there), 12.5 total coils with squared ends (10.5 active), G = 11.85 Mpsi: 4.13 lbf/in.
   */
  it("gives 4.13 lbf/in for the worked example of Shigley 10-1", () => {
    const rate = coilRate({
      wire: 0.037 * 25.4,
      meanDiameter: 0.4 * 25.4,
      activeCoils: 10.5,
      shearModulus: 11.85e6 * 0.006894757,
    });
    expect(rate / POUND_PER_INCH).toBeCloseTo(4.13, 2);
  });

  it("is 1 N/mm where G·d⁴ equals 8·D³·n: wire 2, mean 20, G 80000 and 20 coils", () => {
    expect(coilRate({ wire: 2, meanDiameter: 20, activeCoils: 20, shearModulus: 80_000 })).toBeCloseTo(1, 12);
  });
});

describe("spring-ride, ride frequency", () => {
  const ride = (inputs: object) =>
    resultsOf<SpringRideResults>("spring-ride", {
      cornerMass: 300,
      springRate: 25,
      motionRatio: 1,
      tyreRate: 200,
      ...inputs,
    });

  /**
   * T. D. Gillespie, Fundamentals of Vehicle Dynamics, chapter 5 (from memory): 1 Hz asks for about 10 inches (254 mm) of
   * static deflection. It is a round number: g/(2π)² is 9.8 in.
   */
  it("has a static deflection of about 10 inches at 1 Hz (Gillespie, chapter 5)", () => {
    const rate = (300 * (2 * Math.PI) ** 2) / 1000;
    const { rideFrequency, staticDeflection } = ride({ springRate: rate, tyreRate: 10_000 });
    expect(rideFrequency).toBeCloseTo(1, 2);
    expect(staticDeflection / 25.4).toBeCloseTo(9.8, 1);
  });

  it("puts spring and tyre in series: 25 and 200 N/mm make 22.22 N/mm (Gillespie, chapter 5: Ks·Kt/(Ks + Kt))", () => {
    expect(ride({}).rideRate).toBeCloseTo(22.2222, 4);
  });

  it("damps critically at 2·√(k·m): 25 N/mm and 300 kg give 5477 N·s/m", () => {
    expect(ride({}).criticalDamping).toBeCloseTo(5477.2, 1);
  });

  it("lowers the wheel rate with the square of the motion ratio (common practice)", () => {
    expect(ride({ motionRatio: 0.5 }).wheelRate).toBeCloseTo(6.25, 12);
  });
});

import { describe, expect, it } from "vitest";
import type { CornerWeightsResults } from "#shared/calculators/corner-weights/formula.ts";
import { resultsOf } from "#tests/setup/calculator.ts";

/** A car as point masses, so that the scales can be read off by moments and the centre of gravity is known. */
const car = { wheelbase: 2400, frontTrack: 1400, rearTrack: 1400, loadedRadius: 300 };
const mass = 800;
const cg = { fromFront: 1250, left: 25, height: 460 };

/** Vertical wheel loads of a rigid car, by moments about the axles and the centreline. */
function scales() {
  const rear = (mass * cg.fromFront) / car.wheelbase;
  const front = mass - rear;
  const left = 0.5 + cg.left / car.frontTrack;
  return { lf: front * left, rf: front * (1 - left), lr: rear * left, rr: rear * (1 - left) };
}

/** Front load with the rear lifted: moments about the rear contact point of a car turned nose down by θ. */
function frontWhenLifted(lift: number) {
  const angle = Math.asin(lift / car.wheelbase);
  const behindHub = car.wheelbase - cg.fromFront;
  const overHub = cg.height - car.loadedRadius;
  // Both wheels turn on their hubs, so that the contact points stay below them.
  const lever = behindHub * Math.cos(angle) + overHub * Math.sin(angle);
  return (mass * lever) / (car.wheelbase * Math.cos(angle));
}

describe("corner-weights against the moments of a rigid body", () => {
  const lift = 500;
  const { wheelbase, frontTrack, rearTrack, loadedRadius } = car;
  const results = resultsOf<CornerWeightsResults>("corner-weights", {
    ...scales(),
    wheelbase,
    frontTrack,
    rearTrack,
    lifted: { height: lift, frontMass: frontWhenLifted(lift), loadedRadius },
  });

  it("finds the centre of gravity in plan", () => {
    expect(results.cgFromFront).toBeCloseTo(cg.fromFront, 9);
    expect(results.cgFromCentre).toBeCloseTo(cg.left, 9);
  });

  it("finds its height from the second weighing", () => {
    expect(results.cgHeight).toBeCloseTo(cg.height, 6);
  });
});

describe("corner-weights, common practice, no source", () => {
  const weigh = (lf: number, rf: number, lr: number, rr: number) =>
    resultsOf<CornerWeightsResults>("corner-weights", {
      lf,
      rf,
      lr,
      rr,
      wheelbase: 2400,
      frontTrack: 1400,
      rearTrack: 1400,
    });

  it("calls a car of four equal corners 50 / 50 / 50, its centre of gravity in the middle", () => {
    expect(weigh(200, 200, 200, 200)).toMatchObject({
      total: 800,
      frontPercent: 50,
      leftPercent: 50,
      crossPercent: 50,
      cgFromFront: 1200,
      cgFromCentre: 0,
      cgHeight: null,
    });
  });

  it("raises cross weight, and nothing else, when load goes from one diagonal to the other", () => {
    const even = weigh(200, 200, 200, 200);
    const wedged = weigh(190, 210, 210, 190);
    expect(wedged.crossPercent).toBe(52.5);
    expect({ ...wedged, crossPercent: 50, crossDifference: 0 }).toEqual(even);
  });
});

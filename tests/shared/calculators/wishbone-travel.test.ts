import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { findCalculator } from "#shared/calculators/registry.ts";
import { distance, type Vector } from "#shared/calculators/vectors.ts";
import { cornerFrom, cornerPointsAt } from "#shared/calculators/wishbone-travel/corner.ts";
import type { TravelRow, WishboneTravelResults } from "#shared/calculators/wishbone-travel/formula.ts";
import { wishboneTravelInputs } from "#shared/calculators/wishbone-travel/inputs.ts";
import { inRange, runMany } from "#tests/setup/any-inputs.ts";
import { issueOf, missingResultFields, resultsOf } from "#tests/setup/calculator.ts";

type Point = [number, number, number];

const points = {
  lowerFront: [236, 223, 172] as Point,
  lowerRear: [-24, 223, 172] as Point,
  lowerJoint: [6, 583, 172] as Point,
  upperFront: [156, 283, 386] as Point,
  upperRear: [-34, 283, 386] as Point,
  upperJoint: [-14, 553, 416] as Point,
  rodInner: [96, 230, 208] as Point,
  rodOuter: [96, 571, 215] as Point,
  wheelCentre: [0, 620, 268] as Point,
};
const spring = { chassis: [30, 300, 470] as Point, moving: [30, 470, 178] as Point, on: "lower" };
const example = { ...points, camber: -1, toe: 0.1, loadedRadius: 268, bump: 50, rebound: 40 };

const travel = (inputs: object) =>
  resultsOf<WishboneTravelResults>("wishbone-travel", { ...example, ...inputs });
const fault = (inputs: object) => issueOf("wishbone-travel", { ...example, ...inputs });
const at = ({ rows }: WishboneTravelResults, rise: number): TravelRow => {
  const row = rows.find((each) => each.travel === rise);
  if (!row) throw new Error(`no row at ${rise}`);
  return row;
};
const changed = (change: (point: Point) => Point) =>
  Object.fromEntries(Object.entries(points).map(([name, point]) => [name, change(point)]));

describe("wishbone-travel rows", () => {
  it("hold 0, −rebound, bump and every multiple of the step, lowest first", () => {
    const { rows } = travel({ bump: 12, rebound: 7, step: 5 });
    expect(rows.map((row) => row.travel)).toEqual([-7, -5, 0, 5, 10, 12]);
  });

  it("are one row at rest when nothing moves", () => {
    expect(travel({ bump: 0, rebound: 0 }).rows.map((row) => row.travel)).toEqual([0]);
  });

  it("show at rest what was put in", () => {
    const rest = at(travel({}), 0);
    expect(rest).toMatchObject({
      camber: expect.closeTo(-1, 9),
      toe: expect.closeTo(0.1, 9),
      trackChange: expect.closeTo(0, 9),
      lowerSwing: expect.closeTo(0, 9),
      upperSwing: expect.closeTo(0, 9),
      springLength: null,
      motionRatio: null,
    });
  });

  it("do not depend on the step", () => {
    const [fine, coarse] = [travel({ step: 1 }), travel({ step: 10 })];
    for (const row of coarse.rows) {
      const same = at(fine, row.travel);
      expect(same.camber).toBeCloseTo(row.camber, 9);
      expect(same.toe).toBeCloseTo(row.toe, 9);
    }
  });
});

describe("cornerPointsAt", () => {
  const corner = cornerFrom(wishboneTravelInputs.parse({ ...example, spring }));

  it("raises the wheel centre by the travel to 1e-9 mm and keeps every rigid length", () => {
    if (!corner.ok) throw new Error(corner.issue.message);
    for (const rise of [-40, -13.7, 0, 0.001, 29, 50]) {
      const moved = cornerPointsAt(corner.value, rise);
      if (!moved.ok) throw new Error(moved.issue.message);
      const { lowerJoint, upperJoint, rodOuter, wheelCentre, springMoving } = moved.value;
      expect(Math.abs(wheelCentre[2] - 268 - rise)).toBeLessThan(1e-9);
      const pairs: [Vector, Vector, Vector, Vector][] = [
        [lowerJoint, points.lowerFront, points.lowerJoint, points.lowerFront],
        [lowerJoint, points.lowerRear, points.lowerJoint, points.lowerRear],
        [upperJoint, points.upperFront, points.upperJoint, points.upperFront],
        [rodOuter, points.rodInner, points.rodOuter, points.rodInner],
        [lowerJoint, upperJoint, points.lowerJoint, points.upperJoint],
        [rodOuter, upperJoint, points.rodOuter, points.upperJoint],
        [wheelCentre, lowerJoint, points.wheelCentre, points.lowerJoint],
        [wheelCentre, rodOuter, points.wheelCentre, points.rodOuter],
        [springMoving ?? [0, 0, 0], lowerJoint, spring.moving, points.lowerJoint],
      ];
      for (const [a, b, a0, b0] of pairs) expect(distance(a, b)).toBeCloseTo(distance(a0, b0), 9);
    }
  });

  it("says where it locks", () => {
    if (!corner.ok) throw new Error(corner.issue.message);
    expect(cornerPointsAt(corner.value, -390)).toMatchObject({ ok: false, issue: { field: "rebound" } });
  });
});

describe("wishbone-travel gains, spring and jig", () => {
  it("gives gains that the rows next to rest confirm", () => {
    const { gains, rows } = travel({ bump: 1, rebound: 1, step: 1 });
    const [below, , above] = rows;
    expect(gains.camber).toBeCloseTo((((above?.camber ?? 0) - (below?.camber ?? 0)) / 2) * 25, 3);
    expect(gains.toe).toBeCloseTo((((above?.toe ?? 0) - (below?.toe ?? 0)) / 2) * 25, 3);
  });

  it.each(["lower", "upper", "upright"])(
    "gives a motion ratio that the spring's lengths confirm, on the %s",
    (on) => {
      const { rows } = travel({ spring: { ...spring, on }, bump: 10, rebound: 10, step: 1 });
      for (const [index, row] of rows.entries()) {
        const [below, above] = [rows[index - 1], rows[index + 1]];
        if (!below || !above) continue;
        const slope = ((below.springLength ?? 0) - (above.springLength ?? 0)) / 2;
        expect(row.motionRatio).toBeCloseTo(slope, 4);
      }
    },
  );

  it("packs the joints a table's height lower, and the hub the bump higher", () => {
    const { jig } = travel({ tableUp: 100 });
    expect(jig.rest).toEqual({
      hubCentre: 168,
      lowerJoint: expect.closeTo(72, 9),
      upperJoint: expect.closeTo(316, 9),
    });
    expect(jig.bump.hubCentre).toBeCloseTo(218, 9);
  });

  it("needs the swing of the whole range, halved, once the housing is tilted", () => {
    const { jointTilt } = travel({ jointSwing: 15 });
    for (const { swing, swingAsSet, tilt, spare } of [jointTilt.lower, jointTilt.upper]) {
      expect(swing).toBeLessThanOrEqual(swingAsSet + 1e-9);
      expect(swingAsSet).toBeLessThanOrEqual(swing + tilt + 1e-9);
      expect(spare).toBeCloseTo(15 - swing, 9);
    }
  });

  it("asks for no tilt when the housing is set along the middle of the swing already", () => {
    const { tiltOut, tiltBack } = travel({}).jointTilt.lower;
    const [bore, lean] = [(tiltOut * Math.PI) / 180, (tiltBack * Math.PI) / 180];
    // The lower arm lies level, so that square to it is straight up.
    const { lower } = travel({ lowerHousingAxis: [-Math.tan(lean), Math.tan(bore), 1] }).jointTilt;
    expect(lower.tilt).toBeCloseTo(0, 6);
    expect(lower.swing).toBeCloseTo(lower.swingAsSet, 6);
  });

  it("notes a contact point off the ground", () => {
    expect(travel({}).notes).toEqual([]);
    expect(travel({ loadedRadius: 280 }).notes.join()).toMatch(/12.0 mm below the drawing's ground level/);
  });
});

describe("wishbone-travel, invariances", () => {
  it("keeps angles and scales lengths when everything is twice as large", () => {
    const single = travel({});
    const double = travel({
      ...changed(([fore, out, up]) => [2 * fore, 2 * out, 2 * up]),
      loadedRadius: 536,
      bump: 100,
      rebound: 80,
      step: 10,
    });
    for (const row of single.rows) {
      const same = at(double, 2 * row.travel);
      for (const name of ["camber", "toe", "kpi", "caster", "lowerSwing"] as const)
        expect(same[name]).toBeCloseTo(row[name], 8);
      expect(same.trackChange).toBeCloseTo(2 * row.trackChange, 8);
      expect(same.rollCentre).toBeCloseTo(2 * (row.rollCentre ?? 0), 6);
    }
    expect(double.lockBump).toBeCloseTo(2 * single.lockBump, 4);
  });

  it("turns toe, caster and trail round, and nothing else, when mirrored fore and aft", () => {
    const plain = travel({});
    const mirrored = travel({ ...changed(([fore, out, up]) => [-fore, out, up]), toe: -0.1 });
    for (const row of plain.rows) {
      const same = at(mirrored, row.travel);
      for (const name of ["camber", "kpi", "trackChange", "scrubRadius"] as const)
        expect(same[name]).toBeCloseTo(row[name], 9);
      for (const name of ["toe", "caster", "trail"] as const) expect(same[name]).toBeCloseTo(-row[name], 9);
    }
  });

  it("does not mind which pivot is called front", () => {
    const swapped = {
      lowerFront: points.lowerRear,
      lowerRear: points.lowerFront,
      upperFront: points.upperRear,
      upperRear: points.upperFront,
    };
    const plain = travel({});
    for (const row of travel(swapped).rows) expect(row.toe).toBeCloseTo(at(plain, row.travel).toe, 9);
  });

  it("moves only lengthwise figures when the whole corner is moved forward", () => {
    const plain = travel({});
    const moved = travel(changed(([fore, out, up]) => [fore + 1000, out, up]));
    for (const row of plain.rows) {
      expect(at(moved, row.travel).camber).toBeCloseTo(row.camber, 9);
      expect(at(moved, row.travel).trail).toBeCloseTo(row.trail, 8);
    }
  });
});

describe("wishbone-travel, failures", () => {
  it("names the travel at which the arms lock", () => {
    const { lockRebound } = travel({});
    const message = fault({ rebound: 300 })?.message;
    expect(message).toBe(
      `The arms lock at −${Math.floor(lockRebound)} mm of rebound: keep rebound at ${Math.ceil(lockRebound) - 1} mm or less, or move the points.`,
    );
    expect(fault({ rebound: Math.ceil(lockRebound) - 1 })).toBeUndefined();
    expect(fault({ rebound: Math.ceil(lockRebound) })).toMatchObject({ field: "rebound" });
  });

  it("tells a rod that locks from arms that lock", () => {
    expect(fault({ rodInner: [96, 480, 140], bump: 100 })).toMatchObject({
      field: "bump",
      message: /^The rod locks at \+\d+ mm of bump/,
    });
  });

  it.each([
    [
      "a lower joint on its pivot line",
      { lowerJoint: [50, 223, 172] },
      "lowerJoint",
      /lower arm cannot swing/,
    ],
    [
      "upper pivots in one place",
      { upperFront: points.upperRear },
      "upperJoint",
      /upper arm cannot swing.*1 mm apart/,
    ],
    ["joints upside down", { upperJoint: [-14, 553, 150] }, "upperJoint", /above 182 mm/],
    ["a rod on the steering axis", { rodOuter: [-4, 568, 294] }, "rodOuter", /steering axis/],
    ["a rod without length", { rodInner: points.rodOuter }, "rodInner", /no length/],
    [
      "a rod that points at the steering axis",
      { rodInner: [186, 574, 136] },
      "rodInner",
      /cannot hold the wheel/,
    ],
    [
      "a spring without length",
      { spring: { ...spring, moving: spring.chassis } },
      "spring.moving",
      /no length/,
    ],
    ["a housing axis without direction", { lowerHousingAxis: [0, 0, 0] }, "lowerHousingAxis", /no direction/],
    ["a table above the lower joint", { tableUp: 200 }, "tableUp", /172 mm or lower/],
    ["a point of two numbers", { lowerJoint: [1, 2] }, "lowerJoint", /three numbers in mm: fore, out, up/],
    [
      "a point out of reach",
      { wheelCentre: [0, 9000, 268] },
      "wheelCentre.1",
      /Wheel centre, out must be between -3000 and 3000 mm/,
    ],
    ["half a spring", { spring: { on: "lower" } }, "spring.chassis", /three numbers/],
    ["negative bump", { bump: -5 }, "bump", /between 0 and 400 mm/],
  ])("names the field for %s", (_, inputs, field, message) => {
    expect(fault(inputs)).toEqual({ field, message: expect.stringMatching(message) });
  });
});

describe("wishbone-travel, any input the schema lets through", () => {
  const around = (middle: Point, by: number) =>
    fc.tuple(...middle.map((value) => inRange(value - by, value + by))) as fc.Arbitrary<Point>;
  const corner = (by: number) =>
    fc.record(
      {
        ...(Object.fromEntries(
          Object.entries(points).map(([name, point]) => [name, around(point, by)]),
        ) as Record<keyof typeof points, fc.Arbitrary<Point>>),
        camber: inRange(-15, 15),
        toe: inRange(-10, 10),
        loadedRadius: inRange(50, 1000),
        bump: inRange(0, 60),
        rebound: inRange(0, 60),
        step: fc.constant(30),
        spring: fc.record({
          chassis: around(spring.chassis, by),
          moving: around(spring.moving, by),
          on: fc.constantFrom("lower", "upper", "upright"),
        }),
        lowerHousingAxis: around([0, 0, 0], 1),
        jointSwing: inRange(1, 60),
      },
      {
        requiredKeys: [
          ...(Object.keys(points) as (keyof typeof points)[]),
          "loadedRadius",
          "bump",
          "rebound",
          "step",
        ],
      },
    );

  it("has every listed result as a number", () => {
    expect(missingResultFields("wishbone-travel")).toEqual([]);
  });

  it("gives finite numbers or one named fault, never NaN, for corners near a real one", () => {
    const { worked } = runMany("wishbone-travel", corner(60), 3000);
    expect(worked).toBeGreaterThan(1600);
  });

  it("gives finite numbers or one named fault, never NaN, for points strewn about", () => {
    const { worked, faults } = runMany("wishbone-travel", corner(1200), 3000);
    expect(worked).toBeGreaterThan(20);
    expect(faults.size).toBeGreaterThan(3);
  });
});

describe("wishbone-travel, time", () => {
  it("works 41 rows in under 4 ms, the middle of fifty runs", () => {
    const definition = findCalculator("wishbone-travel");
    const inputs = definition?.inputs.parse({ ...example, bump: 50, rebound: 50, step: 2.5, spring });
    if (!definition || !inputs) throw new Error("no such calculator");
    const times = Array.from({ length: 150 }, () => {
      const started = performance.now();
      definition.compute(inputs);
      return performance.now() - started;
    });
    const settled = times.slice(100).sort((a, b) => a - b);
    expect(settled[25]).toBeLessThan(4);
  });
});

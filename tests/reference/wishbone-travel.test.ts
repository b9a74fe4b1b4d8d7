import { levenbergMarquardt } from "ml-levenberg-marquardt";
import { describe, expect, it } from "vitest";
import type { WishboneTravelResults } from "#shared/calculators/wishbone-travel/formula.ts";
import { toeAt } from "#tests/server/demo/corner-travel.ts";
import { resultsOf } from "#tests/setup/calculator.ts";

type Point = [number, number, number];

interface Geometry {
  lowerFront: Point;
  lowerRear: Point;
  lowerJoint: Point;
  upperFront: Point;
  upperRear: Point;
  upperJoint: Point;
  rodInner: Point;
  rodOuter: Point;
  wheelCentre: Point;
  camber: number;
  toe: number;
  loadedRadius: number;
}

const hillclimb: Geometry = {
  lowerFront: [236, 223, 172],
  lowerRear: [-24, 223, 172],
  lowerJoint: [6, 583, 172],
  upperFront: [156, 283, 386],
  upperRear: [-34, 283, 386],
  upperJoint: [-14, 553, 416],
  rodInner: [96, 230, 208],
  rodOuter: [96, 571, 215],
  wheelCentre: [0, 620, 268],
  camber: -1,
  toe: 0.1,
  loadedRadius: 268,
};

/** Five corners: the demo's, its rack too high, anti-dive with swept arms, a rear corner with toe rod behind, a short steep kart. */
const geometries: [string, Geometry][] = [
  ["a hillclimb corner", hillclimb],
  ["the same with its rack too high", { ...hillclimb, rodInner: [96, 230, 230] }],
  [
    "swept arms with slanted pivot lines",
    {
      lowerFront: [180, 250, 190],
      lowerRear: [-160, 235, 160],
      lowerJoint: [20, 640, 165],
      upperFront: [110, 330, 400],
      upperRear: [-170, 315, 430],
      upperJoint: [-30, 590, 455],
      rodInner: [-120, 270, 220],
      rodOuter: [-115, 610, 240],
      wheelCentre: [0, 700, 300],
      camber: -1.5,
      toe: 0.25,
      loadedRadius: 300,
    },
  ],
  [
    "a rear corner with its rod behind",
    {
      lowerFront: [300, 180, 150],
      lowerRear: [-60, 200, 155],
      lowerJoint: [-10, 600, 140],
      upperFront: [220, 260, 330],
      upperRear: [-90, 270, 325],
      upperJoint: [5, 570, 370],
      rodInner: [-150, 210, 170],
      rodOuter: [-140, 590, 160],
      wheelCentre: [0, 660, 255],
      camber: -2,
      toe: 0.4,
      loadedRadius: 255,
    },
  ],
  [
    "short steep arms",
    {
      lowerFront: [90, 200, 140],
      lowerRear: [-90, 200, 140],
      lowerJoint: [4, 395, 95],
      upperFront: [70, 225, 230],
      upperRear: [-80, 225, 240],
      upperJoint: [-8, 370, 215],
      rodInner: [70, 190, 150],
      rodOuter: [65, 380, 120],
      wheelCentre: [0, 430, 150],
      camber: 0.5,
      toe: -0.3,
      loadedRadius: 150,
    },
  ],
];

const travels = [-45, -30, -15, 0, 15, 30, 45];

/** Spindle direction from camber and toe by ISO 8855: turned out of the transverse axis by toe, then down by camber. */
function spindlePoint({ wheelCentre: [fore, out, up], camber, toe }: Geometry): Point {
  const [lean, turned] = [(camber * Math.PI) / 180, (toe * Math.PI) / 180];
  const reach = 100;
  return [
    fore + reach * Math.sin(turned) * Math.cos(lean),
    out + reach * Math.cos(turned) * Math.cos(lean),
    up - reach * Math.sin(lean),
  ];
}

const apart = (a: Point, b: Point) => Math.hypot(a[0] - b[0], a[1] - b[1], a[2] - b[2]);

/**
 * The corner as bare distances between points: which pairs keep theirs. Five points move: both joints, the rod's
 * outer end, the wheel centre and a point out on the spindle, fifteen unknowns; fourteen distances and the wheel
 * centre's height. Nothing is known of swings, frames or planes.
 */
function solveByDistances(geometry: Geometry, travel: number) {
  const fixed = geometry;
  const rest: Point[] = [
    fixed.lowerJoint,
    fixed.upperJoint,
    fixed.rodOuter,
    fixed.wheelCentre,
    spindlePoint(geometry),
  ];
  const at = (unknowns: ArrayLike<number>, index: number): Point => [
    unknowns[3 * index] ?? 0,
    unknowns[3 * index + 1] ?? 0,
    unknowns[3 * index + 2] ?? 0,
  ];
  const links: [number, Point | number][] = [
    [0, fixed.lowerFront],
    [0, fixed.lowerRear],
    [1, fixed.upperFront],
    [1, fixed.upperRear],
    [2, fixed.rodInner],
    [0, 1],
    [0, 2],
    [1, 2],
    [0, 3],
    [1, 3],
    [2, 3],
    [0, 4],
    [1, 4],
    [2, 4],
  ];
  const place = (of: (index: number) => Point, end: Point | number) =>
    typeof end === "number" ? of(end) : end;
  const atRest = (index: number) => rest[index] ?? [0, 0, 0];
  const lengths = links.map(([one, other]) => apart(atRest(one), place(atRest, other)));
  const residual = (unknowns: ArrayLike<number>, row: number) => {
    const now = (index: number) => at(unknowns, index);
    const link = links[row];
    if (!link) return now(3)[2] - geometry.wheelCentre[2] - travel;
    return apart(now(link[0]), place(now, link[1])) - (lengths[row] ?? 0);
  };
  const rows = Array.from({ length: links.length + 1 }, (_, row) => row);
  const fitted = levenbergMarquardt(
    { x: rows, y: rows.map(() => 0) },
    (unknowns) => (row) => residual(unknowns, row),
    {
      initialValues: rest.flatMap(([fore, out, up]) => [fore, out, up + travel]),
      gradientDifference: 1e-4,
      centralDifference: true,
      damping: 1e-6,
      maxIterations: 200,
      errorTolerance: 1e-18,
    },
  );
  const unknowns = fitted.parameterValues;
  return {
    worst: Math.max(...rows.map((row) => Math.abs(residual(unknowns, row)))),
    point: (index: number) => at(unknowns, index),
  };
}

const degrees = (radians: number) => (radians * 180) / Math.PI;

/** Camber, toe and the contact point from the wheel centre and the point on the spindle. */
function wheel(centre: Point, outer: Point, radius: number) {
  const reach = apart(centre, outer);
  const [fore, out, up] = [0, 1, 2].map(
    (axis) => ((outer[axis] ?? 0) - (centre[axis] ?? 0)) / reach,
  ) as Point;
  const level = Math.hypot(fore, out);
  return {
    camber: degrees(Math.atan2(-up, level)),
    toe: degrees(Math.atan2(fore, out)),
    contact: [
      centre[0] + (radius * up * fore) / level,
      centre[1] + (radius * up * out) / level,
      centre[2] - radius * level,
    ] as Point,
  };
}

const results = (geometry: object) =>
  resultsOf<WishboneTravelResults>("wishbone-travel", { ...geometry, bump: 45, rebound: 45, step: 15 });

describe("wishbone-travel against a general-purpose least-squares solver (ml-levenberg-marquardt)", () => {
  it.each(geometries)("agrees for %s at seven travels, to 0.005° and 0.01 mm", (_, geometry) => {
    const { rows } = results(geometry);
    expect(rows.map((row) => row.travel)).toEqual(travels);
    const atRest = wheel(geometry.wheelCentre, spindlePoint(geometry), geometry.loadedRadius);
    for (const row of rows) {
      const { worst, point } = solveByDistances(geometry, row.travel);
      expect(worst).toBeLessThan(1e-4);
      const [lower, upper] = [point(0), point(1)];
      const { camber, toe, contact } = wheel(point(3), point(4), geometry.loadedRadius);
      const rise = upper[2] - lower[2];
      const ground = (contact[2] - lower[2]) / rise;
      const angles = {
        camber,
        toe,
        kpi: degrees(Math.atan2(lower[1] - upper[1], rise)),
        caster: degrees(Math.atan2(lower[0] - upper[0], rise)),
      };
      const lengths = {
        trackChange: contact[1] - atRest.contact[1],
        scrubRadius: contact[1] - lower[1] - ground * (upper[1] - lower[1]),
        trail: lower[0] + ground * (upper[0] - lower[0]) - contact[0],
      };
      for (const [name, value] of Object.entries(angles)) {
        expect(Math.abs(row[name as keyof typeof angles] - value), `${name} at ${row.travel}`).toBeLessThan(
          0.005,
        );
      }
      for (const [name, value] of Object.entries(lengths)) {
        expect(Math.abs(row[name as keyof typeof lengths] - value), `${name} at ${row.travel}`).toBeLessThan(
          0.01,
        );
      }
    }
  });

  it("puts the roll centre where the contact point's own motion puts it, pivot lines along the car and toe held", () => {
    // The contact point moves square to the line to the instant centre. A rod that steers, or slanted pivot lines, part the two.
    const geometry = { ...hillclimb, toe: 0, camber: 0 };
    const step = 0.05;
    const contactAt = (travel: number) => {
      const { point } = solveByDistances(geometry, travel);
      return wheel(point(3), point(4), geometry.loadedRadius).contact;
    };
    const [below, above] = [contactAt(-step), contactAt(step)];
    const slope = -(above[1] - below[1]) / (above[2] - below[2]);
    const { rows } = results(geometry);
    const rest = rows.find((row) => row.travel === 0);
    expect(rest?.rollCentre).toBeCloseTo(-geometry.wheelCentre[1] * slope, 0);
  });

  it("gives the toe of the demo's solver, which halves its way to each joint", () => {
    const { camber: _, toe: __, loadedRadius: ___, ...points } = hillclimb;
    const { rows } = results({ ...hillclimb, camber: 0, toe: 0 });
    for (const row of rows) expect(row.toe).toBeCloseTo(toeAt(points, row.travel), 6);
  });
});

describe("wishbone-travel, common practice, no source", () => {
  const parallel = {
    lowerFront: [100, 300, 150],
    lowerRear: [-100, 300, 150],
    lowerJoint: [0, 600, 150],
    upperFront: [100, 300, 350],
    upperRear: [-100, 300, 350],
    upperJoint: [0, 600, 350],
    rodInner: [90, 300, 200],
    rodOuter: [90, 600, 200],
    wheelCentre: [0, 650, 250],
    camber: -1,
    toe: 0.2,
    loadedRadius: 250,
  };

  it("keeps camber and toe with equal parallel arms and a parallel rod", () => {
    for (const row of results(parallel).rows) {
      expect(row.camber).toBeCloseTo(-1, 9);
      expect(row.toe).toBeCloseTo(0.2, 9);
    }
  });

  it("puts the roll centre on the ground at rest with equal parallel level arms, and has no instant centre", () => {
    const rest = results(parallel).rows.find((row) => row.travel === 0);
    expect(rest?.rollCentre).toBeCloseTo(0, 9);
    expect(rest?.instantCentre).toBeNull();
  });

  it("gains negative camber in bump with a shorter upper arm", () => {
    const { gains, rows } = results({
      ...parallel,
      upperFront: [100, 400, 350],
      upperRear: [-100, 400, 350],
    });
    expect(rows.at(-1)?.camber).toBeLessThan(-1.3);
    expect(gains.camber).toBeCloseTo(0, 6);
  });
});

import { Matrix4, Vector3 } from "three";
import { describe, expect, it } from "vitest";
import type { TubeBendResults } from "#shared/calculators/tube-bend/formula.ts";
import { resultsOf } from "#tests/setup/calculator.ts";

type Point = [number, number, number];

/**
 * Bends a straight tube as a bender would, with a general-purpose matrix library (three): feed along x, turn about x,
 * bend about z. Corner points are where the straights meet.
 */
function bent({ straights, bends, rotations }: TubeBendResults, radii: number[]): Vector3[] {
  const frame = new Matrix4();
  const at = () => new Vector3().setFromMatrixPosition(frame);
  const corners = [at()];
  for (const [index, bend] of bends.entries()) {
    const angle = (bend * Math.PI) / 180;
    const setback = (radii[index] ?? 0) * Math.tan(angle / 2);
    frame.multiply(new Matrix4().makeTranslation((straights[index] ?? 0) + setback, 0, 0));
    frame.multiply(new Matrix4().makeRotationX(((rotations[index] ?? 0) * Math.PI) / 180));
    corners.push(at());
    frame.multiply(new Matrix4().makeRotationZ(angle));
    frame.multiply(new Matrix4().makeTranslation(setback, 0, 0));
  }
  frame.multiply(new Matrix4().makeTranslation(straights.at(-1) ?? 0, 0, 0));
  return [...corners, at()];
}

/** Lays the rebuilt tube on the drawn one: first straight on x, first bend in the plane of x and y. */
function inBenderFrame(points: Point[]): Vector3[] {
  const [first = new Vector3(), second = new Vector3(), third = new Vector3()] = points.map(
    (point) => new Vector3(...point),
  );
  const x = second.clone().sub(first).normalize();
  const z = x.clone().cross(third.clone().sub(second)).normalize();
  const toBender = new Matrix4().makeBasis(x, z.clone().cross(x), z).setPosition(first).invert();
  return points.map((point) => new Vector3(...point).applyMatrix4(toBender));
}

const tubes: { name: string; points: Point[]; bendRadius: number | number[] }[] = [
  {
    name: "a flat S",
    points: [
      [0, 0, 0],
      [400, 0, 0],
      [700, 300, 0],
      [1200, 300, 0],
    ],
    bendRadius: 100,
  },
  {
    name: "a hoop",
    points: [
      [0, 0, 0],
      [0, 0, 900],
      [300, 0, 1150],
      [800, 0, 1150],
      [1100, 0, 900],
      [1100, 0, 0],
    ],
    bendRadius: 150,
  },
  {
    name: "a corkscrew",
    points: [
      [10, -20, 30],
      [510, 40, 0],
      [640, 480, 210],
      [200, 700, 500],
      [-300, 350, 820],
    ],
    bendRadius: [90, 120, 75],
  },
  {
    name: "a hairpin",
    points: [
      [0, 0, 0],
      [600, 0, 0],
      [20, 90, 40],
      [500, 300, -200],
    ],
    bendRadius: [15, 60],
  },
];

describe("tube-bend, rebuilt from straights, rotations and bends", () => {
  it.each(tubes)(
    "gives back the points of $name to a millionth of a millimetre",
    ({ points, bendRadius }) => {
      const sheet = resultsOf<TubeBendResults>("tube-bend", { points, bendRadius, od: 25, wall: 2 });
      const radii = typeof bendRadius === "number" ? sheet.bends.map(() => bendRadius) : bendRadius;
      const rebuilt = bent(sheet, radii);
      const drawn = inBenderFrame(points);
      expect(rebuilt).toHaveLength(points.length);
      for (const [index, point] of rebuilt.entries()) {
        expect(point.distanceTo(drawn[index] ?? new Vector3())).toBeLessThan(1e-6);
      }
    },
  );
});

describe("tube-bend, common practice, no source", () => {
  const elbow = (inputs: object) =>
    resultsOf<TubeBendResults>("tube-bend", {
      points: [
        [0, 0, 0],
        [500, 0, 0],
        [500, 500, 0],
      ],
      bendRadius: 100,
      od: 38,
      wall: 2,
      ...inputs,
    });

  it("shortens a square corner by 2R − πR/2: the gain of the bend", () => {
    expect(elbow({}).developedLength).toBeCloseTo(1000 - 200 + 50 * Math.PI, 9);
  });

  it("turns the tube half round between bends that go opposite ways, not at all between equal ones", () => {
    const points: Point[] = [
      [0, 0, 0],
      [500, 0, 0],
      [500, 500, 0],
    ];
    expect(elbow({ points: [...points, [1000, 500, 0]] }).rotations).toEqual([0, expect.closeTo(180, 9)]);
    expect(elbow({ points: [...points, [0, 500, 0]] }).rotations).toEqual([0, expect.closeTo(0, 9)]);
  });
});

import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { TubeBendResults } from "#shared/calculators/tube-bend/formula.ts";
import { tubeBendInputs } from "#shared/calculators/tube-bend/inputs.ts";
import { bentPath, onArc } from "#shared/calculators/tube-bend/path.ts";
import { distance } from "#shared/calculators/vectors.ts";
import { inRange, runMany } from "#tests/setup/any-inputs.ts";
import { issueOf, missingResultFields, resultsOf } from "#tests/setup/calculator.ts";

type Point = [number, number, number];
const points: Point[] = [
  [0, 0, 0],
  [420, 0, 0],
  [700, 260, 0],
  [1150, 260, 180],
];
const example = { points, bendRadius: 120, od: 38, wall: 2 };
const sheet = (inputs: object) => resultsOf<TubeBendResults>("tube-bend", { ...example, ...inputs });

describe("tube-bend, limit cases", () => {
  it("takes bends that just meet, with no straight between", () => {
    const corner: Point[] = [
      [0, 0, 0],
      [300, 0, 0],
      [300, 200, 0],
      [0, 200, 0],
    ];
    expect(sheet({ points: corner, bendRadius: 100 }).straights).toEqual([200, expect.closeTo(0, 9), 200]);
  });

  it("takes a single radius in a list as one for all", () => {
    expect(sheet({ bendRadius: [120] })).toEqual(sheet({}));
  });

  it("leaves the angle as it is without springback and adds its share with", () => {
    const { bends, settings } = sheet({});
    expect(settings).toEqual(bends);
    const sprung = sheet({ springback: 9 });
    expect(sprung.settings).toEqual(bends.map((bend) => expect.closeTo(1.1 * bend, 12)));
    expect(sprung.bends).toEqual(bends);
  });

  it("leaves the allowance at both ends and measures marks from the cut end", () => {
    const plain = sheet({});
    const spare = sheet({ endAllowance: 50 });
    expect(spare.cutLength).toBeCloseTo(plain.cutLength + 100, 9);
    expect(spare.startMarks).toEqual(plain.startMarks.map((mark) => expect.closeTo(mark + 50, 9)));
    expect(spare.developedLength).toBeCloseTo(plain.developedLength, 9);
  });

  it("warns of a radius under twice the diameter, and not of one at it", () => {
    expect(sheet({ bendRadius: 75.9 }).notes.join()).toContain("less than twice the diameter (76 mm)");
    expect(sheet({ bendRadius: 76 }).notes).toEqual([]);
  });
});

describe("tube-bend, invariances", () => {
  it("keeps lengths and angles when the tube is turned and moved", () => {
    const moved = points.map(([x, y, z]): Point => [50 - y, z + 7, 3 - x]);
    const { straights, bends, rotations } = sheet({ points: moved });
    const plain = sheet({});
    expect(straights).toEqual(plain.straights.map((each) => expect.closeTo(each, 9)));
    expect(bends).toEqual(plain.bends.map((each) => expect.closeTo(each, 9)));
    expect(rotations).toEqual(plain.rotations.map((each) => expect.closeTo(each, 9)));
  });

  it("turns the rotations round, and nothing else, in a mirror", () => {
    const mirrored = sheet({ points: points.map(([x, y, z]): Point => [x, y, -z]) });
    const plain = sheet({});
    expect(mirrored.rotations).toEqual(plain.rotations.map((each) => expect.closeTo(-each, 9)));
    expect(mirrored.straights).toEqual(plain.straights.map((each) => expect.closeTo(each, 9)));
  });

  it("reads the same tube from its other end", () => {
    const back = sheet({ points: points.toReversed() });
    const plain = sheet({});
    expect(back.bends.toReversed()).toEqual(plain.bends.map((each) => expect.closeTo(each, 9)));
    expect(back.rotations[1]).toBeCloseTo(plain.rotations[1] ?? 0, 9);
    expect(back.developedLength).toBeCloseTo(plain.developedLength, 9);
  });

  it("scales every length and no angle", () => {
    const double = sheet({
      points: points.map(([x, y, z]): Point => [2 * x, 2 * y, 2 * z]),
      bendRadius: 240,
    });
    expect(double.developedLength).toBeCloseTo(2 * sheet({}).developedLength, 9);
    expect(double.bends).toEqual(sheet({}).bends.map((each) => expect.closeTo(each, 9)));
  });
});

describe("onArc", () => {
  it("runs from the start of a bend to its end, a radius from its middle", () => {
    const path = bentPath(tubeBendInputs.parse(example));
    const [bend] = path.ok ? path.value.bends : [];
    if (!bend) throw new Error("the example does not bend");
    expect(distance(onArc(bend, 0), bend.start)).toBeLessThan(1e-9);
    expect(distance(onArc(bend, 1), bend.end)).toBeLessThan(1e-9);
    expect(distance(onArc(bend, 0.4), bend.centre)).toBeCloseTo(120, 9);
  });
});

describe("tube-bend, failures", () => {
  it("names both bends and the largest radius when they overlap", () => {
    const corner: Point[] = [
      [0, 0, 0],
      [300, 0, 0],
      [300, 200, 0],
      [0, 200, 0],
    ];
    expect(issueOf("tube-bend", { ...example, points: corner, bendRadius: 110 })).toEqual({
      field: "bendRadius",
      message:
        "Bends 1 and 2 overlap: points 2 and 3 are 20.0 mm too close. Keep the radius there at 100 mm or less, or move the points apart.",
    });
  });

  it.each([
    [
      "a bend that runs past the end",
      {
        points: [
          [0, 0, 0],
          [90, 0, 0],
          [90, 500, 0],
        ],
      },
      "bendRadius",
      /Bend 1 runs past the end.*90 mm or less/,
    ],
    [
      "points in line",
      {
        points: [
          [0, 0, 0],
          [500, 0, 0],
          [900, 0, 0],
        ],
      },
      "points.1",
      /1, 2 and 3 are in line/,
    ],
    [
      "a tube that turns straight back",
      {
        points: [
          [0, 0, 0],
          [500, 0, 0],
          [0, 1, 0],
        ],
      },
      "points.1",
      /175°/,
    ],
    [
      "points in one place",
      {
        points: [
          [0, 0, 0],
          [500, 0, 0],
          [500, 0, 0],
        ],
      },
      "points.2",
      /Points 2 and 3 are in one place/,
    ],
    ["too few points", { points: points.slice(0, 2) }, "points", /at least 3 points/],
    ["a point of two numbers", { points: [[0, 0], ...points] }, "points.0", /three numbers in mm: x, y, z/],
    [
      "radii that do not fit",
      { bendRadius: [120, 120, 120] },
      "bendRadius",
      /4 points make 2 bends, but 3 radii/,
    ],
    ["a radius tighter than the tube", { bendRadius: 18 }, "bendRadius", /at least half the diameter, 19 mm/],
    ["words for a radius", { bendRadius: "big" }, "bendRadius", /a number in mm, or as a list/],
    ["a tube without a bore", { wall: 19 }, "wall", /less than half the diameter, 19 mm/],
  ])("names the field for %s", (_, inputs, field, message) => {
    expect(issueOf("tube-bend", { ...example, ...inputs })).toEqual({
      field,
      message: expect.stringMatching(message),
    });
  });
});

describe("tube-bend, any input the schema lets through", () => {
  const place = fc.tuple(inRange(-900, 900), inRange(-900, 900), inRange(-900, 900));
  const inputs = fc.record(
    {
      points: fc.array(place, { minLength: 3, maxLength: 6 }),
      bendRadius: fc.oneof(inRange(1, 300), fc.array(inRange(1, 300), { minLength: 1, maxLength: 4 })),
      od: inRange(2, 100),
      wall: inRange(0.2, 20),
      endAllowance: inRange(0, 2000),
      springback: inRange(0, 20),
    },
    { requiredKeys: ["points", "bendRadius", "od", "wall"] },
  );

  it("has every listed result as a number", () => {
    expect(missingResultFields("tube-bend")).toEqual([]);
  });

  it("gives finite numbers or one named fault, never NaN", () => {
    const { worked, faults } = runMany("tube-bend", inputs);
    expect(worked).toBeGreaterThan(1000);
    expect(faults.get("bendRadius")).toBeGreaterThan(100);
    expect(faults.get("wall")).toBeGreaterThan(100);
  });
});

import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { runCalculator } from "#shared/calculators/registry.ts";
import type { SaddleCopeResults } from "#shared/calculators/saddle-cope/formula.ts";

const example = { headerOd: 60, branchOd: 40, branchWall: 2, angle: 60, offset: 4 };

function cope(inputs: Record<string, number>): SaddleCopeResults {
  const run = runCalculator("saddle-cope", inputs);
  if (!run.ok) throw new Error(run.issue.message);
  return run.value.results as SaddleCopeResults;
}

function issue(inputs: unknown) {
  const run = runCalculator("saddle-cope", inputs);
  return run.ok ? undefined : run.issue;
}

/** Perimeter of an ellipse by the arithmetic-geometric mean: Abramowitz and Stegun, 17.6 (complete integrals). */
function ellipsePerimeter(major: number, minor: number): number {
  let [a, b] = [major, minor];
  let sum = (a * a - b * b) / 2;
  for (let power = 1; a - b > 1e-14 * a; power *= 2) {
    const c = (a - b) / 2;
    [a, b] = [(a + b) / 2, Math.sqrt(a * b)];
    sum += power * c * c;
  }
  return (2 * Math.PI * (major * major - sum)) / a;
}

/** The example as published would always be right; this keeps the helper itself honest. */
describe("ellipsePerimeter (helper)", () => {
  it("gives a circle's circumference", () => {
    expect(ellipsePerimeter(10, 10)).toBeCloseTo(20 * Math.PI, 12);
  });
});

describe("saddle-cope, common practice, no source", () => {
  const equal = cope({ headerOd: 50, branchOd: 50, branchWall: 2, angle: 90 });

  it("cuts equal tubes at 90° one radius deep, to the middle of the tube", () => {
    expect(equal.deepest).toBeCloseTo(25, 9);
    expect(equal.tipFromAxis).toBeCloseTo(0, 9);
  });

  it("puts the hole saw's centre on the squared end for equal tubes at 90°", () => {
    expect(equal.holeSaw.fromTip).toBeCloseTo(0, 9);
    expect(equal.holeSaw.diameter).toBe(50);
  });

  it("makes both sides alike at 90°, and one deep, one shallow at an angle", () => {
    expect(equal.heelDepth).toBeCloseTo(equal.toeDepth, 12);
    const angled = cope({ headerOd: 50, branchOd: 50, branchWall: 2, angle: 60 });
    expect(angled.heelDepth).toBeGreaterThan(angled.toeDepth + 10);
  });

  it("flattens the curve as the header grows", () => {
    const depths = [40, 60, 120, 1000].map(
      (headerOd) => cope({ ...example, offset: 0, angle: 90, headerOd }).deepest,
    );
    expect(depths).toEqual([...depths].sort((a, b) => b - a));
    expect(depths.at(-1)).toBeLessThan(0.5);
  });
});

describe("saddle-cope, limit cases", () => {
  it("meets a very large header as a plane cut: depth is r(1 + cos φ)/tan θ", () => {
    const { curve, weldLength } = cope({ headerOd: 2000, branchOd: 3, branchWall: 0.2, angle: 45 });
    for (const { around, depth } of curve) {
      expect(depth).toBeCloseTo(1.5 * (1 + Math.cos((around * Math.PI) / 180)), 2);
    }
    expect(weldLength).toBeCloseTo(ellipsePerimeter(1.5 * Math.SQRT2, 1.5), 2);
  });

  it("welds equal tubes at 90° along two half ellipses of r√2 and r", () => {
    const { weldLength } = cope({ headerOd: 50, branchOd: 50, branchWall: 2, angle: 90 });
    expect(weldLength).toBeCloseTo(ellipsePerimeter(25 * Math.SQRT2, 25), 3);
  });

  it("opens from the angle at the heel to its supplement at the toe", () => {
    const { curve } = cope({ ...example, offset: 0 });
    expect(curve[0]?.dihedral).toBeCloseTo(60, 9);
    expect(curve[36]?.dihedral).toBeCloseTo(120, 9);
  });

  it("takes a branch that just touches the header's side", () => {
    expect(cope({ ...example, offset: 10 }).sideDepth.at90).toBeCloseTo(0, 6);
  });

  it("forgives binary rounding in a branch that just touches", () => {
    expect(
      issue({ headerOd: 38.1, branchOd: 25.4, branchWall: 1.6, angle: 90, offset: 6.35 }),
    ).toBeUndefined();
  });

  it("runs its curve from 0 to 360 and closes it", () => {
    const { curve } = cope({ ...example, samples: 12 });
    expect(curve.map((point) => point.around)).toEqual([
      0, 30, 60, 90, 120, 150, 180, 210, 240, 270, 300, 330, 360,
    ]);
    expect(curve.at(-1)).toEqual({ ...curve[0], around: 360 });
  });

  it("wraps once round the branch with the paper's thickness", () => {
    expect(cope({ ...example, paperThickness: 0 }).templateWidth).toBeCloseTo(Math.PI * 40, 9);
    expect(cope({ ...example, paperThickness: 1 }).templateWidth).toBeCloseTo(Math.PI * 41, 9);
  });
});

describe("saddle-cope, invariances", () => {
  it("scales every length with the joint", () => {
    const single = cope({ ...example, paperThickness: 0 });
    const triple = cope({
      ...example,
      headerOd: 180,
      branchOd: 120,
      branchWall: 6,
      offset: 12,
      paperThickness: 0,
    });
    for (const name of [
      "deepest",
      "heelDepth",
      "toeDepth",
      "tipFromAxis",
      "weldLength",
      "templateWidth",
    ] as const) {
      expect(triple[name]).toBeCloseTo(3 * single[name], 6);
    }
    expect(triple.deepestAround).toBeCloseTo(single.deepestAround, 4);
  });

  it("mirrors the curve when the offset changes side", () => {
    const right = cope(example);
    const left = cope({ ...example, offset: -4 });
    expect(left.curve.map((point) => point.depth).reverse()).toEqual(
      right.curve.map((point) => expect.closeTo(point.depth, 9)),
    );
    expect(left.sideDepth.at90).toBeCloseTo(right.sideDepth.at270, 9);
  });

  it("keeps every number but the curve when the samples change", () => {
    const { curve: coarse, ...few } = cope({ ...example, samples: 8 });
    const { curve: fine, ...many } = cope({ ...example, samples: 719 });
    expect(few).toEqual(many);
    expect(fine.length - coarse.length).toBe(711);
  });

  it("keeps every listed depth between the tip and the deepest", () => {
    const { curve, deepest } = cope({ ...example, samples: 720 });
    const depths = curve.map((point) => point.depth);
    expect(Math.min(...depths)).toBeGreaterThanOrEqual(-1e-9);
    expect(Math.min(...depths)).toBeLessThan(0.01);
    expect(Math.max(...depths)).toBeLessThanOrEqual(deepest + 1e-9);
    expect(Math.max(...depths)).toBeGreaterThan(deepest - 0.01);
  });
});

describe("saddle-cope, failures", () => {
  it("names the offset and its limit when the branch runs past the header", () => {
    expect(issue({ ...example, offset: 10.5 })).toEqual({
      field: "offset",
      message: "At this offset the branch runs past the header: keep the offset within 10 mm either way.",
    });
  });

  it("names the branch when it is wider than the header", () => {
    expect(issue({ ...example, branchOd: 61, offset: 0 })).toMatchObject({
      field: "branchOd",
      message: /60 mm or less/,
    });
  });

  it("names the wall when it leaves no bore", () => {
    expect(issue({ ...example, branchWall: 20 })).toMatchObject({
      field: "branchWall",
      message: /less than half.*20 mm/,
    });
  });

  it.each([
    ["a missing input", { ...example, angle: undefined }, "angle", /as a number in °/],
    ["words for a number", { ...example, headerOd: "big" }, "headerOd", /as a number in mm/],
    ["an angle past its limits", { ...example, angle: 14.9 }, "angle", /between 15 and 90/],
    ["part of a sample", { ...example, samples: 12.5 }, "samples", /whole number/],
    ["an input it does not know", { ...example, ofset: 1 }, "ofset", /no input called "ofset"/],
    ["something that is no object", [1, 2], "inputs", /JSON object/],
    ["infinity", { ...example, headerOd: Number.POSITIVE_INFINITY }, "headerOd", /./],
  ])("names the field for %s", (_, inputs, field, message) => {
    expect(issue(inputs)).toEqual({ field, message: expect.stringMatching(message) });
  });
});

describe("saddle-cope, hand marks and notes", () => {
  it("fills the numbers in", () => {
    const { handMarks, heelDepth, toeDepth, roughCut } = cope(example);
    const text = handMarks.join(" ");
    expect(text).toContain(`heel ${Number(heelDepth.toFixed(1))} mm`);
    expect(text).toContain(`toe ${Number(toeDepth.toFixed(1))} mm`);
    expect(text).toContain("31.4 mm apart");
    expect(text).toContain("4 mm off the branch centre line, toward the 270° side");
    expect(roughCut).toContain("25 mm over");
  });

  it("says nothing of a sideways shift when there is none", () => {
    expect(cope({ ...example, offset: 0 }).handMarks.join(" ")).not.toContain("off the branch centre line");
  });
});

describe("saddle-cope, any input the schema lets through", () => {
  // fc.double crowds toward zero; a thousand even steps reach the whole range and both ends.
  const length = (min: number, max: number) =>
    fc.integer({ min: 0, max: 1000 }).map((step) => min + ((max - min) * step) / 1000);
  const shape = fc.record({
    headerOd: length(3, 2000),
    angle: length(15, 90),
    branch: length(0.1, 1.05),
    wall: length(0.02, 0.52),
    aside: length(-1.1, 1.1),
    paperThickness: length(0, 3),
    allowance: length(0, 500),
    samples: fc.integer({ min: 8, max: 720 }),
  });

  it("gives finite numbers or one named fault, never NaN", () => {
    let worked = 0;
    fc.assert(
      fc.property(shape, ({ headerOd, branch, wall, aside, ...rest }) => {
        const branchOd = headerOd * branch;
        const room = (headerOd - branchOd) / 2;
        const run = runCalculator("saddle-cope", {
          headerOd,
          branchOd,
          branchWall: branchOd * wall,
          offset: room * aside,
          ...rest,
        });
        if (!run.ok) {
          expect(["branchOd", "branchWall", "offset"]).toContain(run.issue.field);
          expect(run.issue.message).not.toMatch(/NaN|Infinity|undefined/);
          return;
        }
        worked += 1;
        expect(numbersIn(run.value.results).filter((value) => !Number.isFinite(value))).toEqual([]);
      }),
      { numRuns: 300 },
    );
    expect(worked).toBeGreaterThan(30);
  });
});

function numbersIn(value: unknown): number[] {
  if (typeof value === "number") return [value];
  if (value !== null && typeof value === "object") return Object.values(value).flatMap(numbersIn);
  return [];
}

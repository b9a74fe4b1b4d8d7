import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { SaddleCopeResults } from "#shared/calculators/saddle-cope/formula.ts";
import type { TubePieceResults } from "#shared/calculators/tube-piece/formula.ts";
import { inRange, runMany } from "#tests/setup/any-inputs.ts";
import { issueOf, missingResultFields, resultsOf } from "#tests/setup/calculator.ts";

const saddle = { kind: "saddle", headerOd: 60, angle: 60, offset: 4 };
const square = { kind: "square" };
const mitre = { kind: "mitre", turn: 90 };
const example = {
  between: 500,
  branchOd: 40,
  branchWall: 2,
  ends: [saddle, { ...saddle, angle: 90 }],
  clock: 90,
};

const piece = (inputs: object) => resultsOf<TubePieceResults>("tube-piece", { ...example, ...inputs });
const issue = (inputs: object) => issueOf("tube-piece", { ...example, ...inputs });

describe("tube-piece", () => {
  it("lists only result fields that it gives as numbers", () => {
    expect(missingResultFields("tube-piece")).toEqual([]);
  });

  it("is a plain tube between two square ends", () => {
    const { tipToTip, shortest, mass, hardEnd, strip } = piece({
      ends: [{ ...square, setback: 10 }, square],
    });
    expect(tipToTip).toBe(490);
    expect(shortest).toBe(490);
    expect(hardEnd).toBe("either");
    expect(mass).toBeCloseTo((Math.PI / 4) * (40 ** 2 - 36 ** 2) * 490 * 7850e-9, 9);
    expect(strip.curve.every(({ a, b }) => a === 0 && b === 490)).toBe(true);
  });

  it("cuts each end as the saddle cope and the mitre do", () => {
    const { ends, strip } = piece({ ends: [saddle, mitre] });
    const cope = resultsOf<SaddleCopeResults>("saddle-cope", {
      headerOd: 60,
      branchOd: 40,
      branchWall: 2,
      angle: 60,
      offset: 4,
    });
    expect(ends[0].tipFromAxis).toBeCloseTo(cope.tipFromAxis, 6);
    expect(ends[0].deepest).toBeCloseTo(cope.deepest, 6);
    expect(strip.curve.map(({ a }) => a)).toEqual(cope.curve.map(({ depth }) => expect.closeTo(depth, 6)));
    expect(ends[1]).toEqual({ tipFromAxis: expect.closeTo(-20, 9), deepest: expect.closeTo(40, 9) });
  });

  it("runs tip to tip from the joints less both tips, and leaves the allowance on", () => {
    const { tipToTip, ends, roughCut, strip } = piece({ allowance: 30 });
    expect(tipToTip).toBeCloseTo(500 - ends[0].tipFromAxis - ends[1].tipFromAxis, 9);
    expect(roughCut).toBeCloseTo(tipToTip + 30, 9);
    expect(strip.length).toBe(tipToTip);
  });

  it("cuts the deeper end first", () => {
    expect(piece({}).hardEnd).toBe("A");
    expect(piece({ ends: [square, saddle] }).hardEnd).toBe("B");
    expect(piece({ ends: [saddle, saddle] }).hardEnd).toBe("either");
  });

  it("puts B's heel at the clock, and its own 90° side a quarter turn before it", () => {
    const { strip } = piece({ ends: [square, mitre], clock: 90, samples: 72 });
    expect(strip.heelB).toBeCloseTo(strip.width / 4, 9);
    const [deepest] = [...strip.curve].sort((a, b) => a.b - b.b);
    expect(deepest?.around).toBe(90);
    // An offset toward B's 90° side makes that side shallow: with B's places running the other way it lies at 0.
    const offset = piece({
      ends: [square, { kind: "saddle", headerOd: 60, angle: 90, offset: 9 }],
      clock: 90,
    });
    const depthB = (around: number) => offset.tipToTip - (offset.strip.curve[around / 5]?.b ?? Number.NaN);
    expect(depthB(0)).toBeLessThan(depthB(180) - 5);
  });

  it("keeps its lengths when the piece is turned end for end", () => {
    const there = piece({ ends: [saddle, mitre], clock: 35 });
    const back = piece({ ends: [mitre, saddle], clock: 35 });
    expect(back.tipToTip).toBeCloseTo(there.tipToTip, 9);
    expect(back.shortest).toBeCloseTo(there.shortest, 6);
    expect(back.mass).toBeCloseTo(there.mass, 9);
  });

  it("keeps its lengths in the mirror: offsets and clock change sign", () => {
    const right = piece({ ends: [saddle, { ...saddle, offset: -6 }], clock: 50 });
    const left = piece({
      ends: [
        { ...saddle, offset: -4 },
        { ...saddle, offset: 6 },
      ],
      clock: -50,
    });
    expect(left.shortest).toBeCloseTo(right.shortest, 6);
    expect(left.mass).toBeCloseTo(right.mass, 9);
    expect([...left.strip.curve].reverse().map(({ b }) => b)).toEqual(
      right.strip.curve.map(({ b }) => expect.closeTo(b, 6)),
    );
  });

  it("repeats itself after a full turn of the clock", () => {
    expect(piece({ clock: 360 }).shortest).toBeCloseTo(piece({ clock: 0 }).shortest, 9);
    expect(piece({ clock: -90 }).strip.heelB).toBeCloseTo(piece({ clock: 270 }).strip.heelB, 9);
  });

  it("scales lengths by three and mass by twenty-seven", () => {
    const single = piece({ ends: [saddle, mitre], paperThickness: 0 });
    const triple = piece({
      between: 1500,
      branchOd: 120,
      branchWall: 6,
      ends: [{ ...saddle, headerOd: 180, offset: 12 }, mitre],
      paperThickness: 0,
    });
    expect(triple.tipToTip).toBeCloseTo(3 * single.tipToTip, 6);
    expect(triple.shortest).toBeCloseTo(3 * single.shortest, 6);
    expect(triple.mass).toBeCloseTo(27 * single.mass, 6);
  });

  it("grows and weighs more with the distance between", () => {
    const [near, far] = [piece({ between: 400 }), piece({ between: 500 })];
    expect(far.tipToTip - near.tipToTip).toBeCloseTo(100, 9);
    expect(far.mass).toBeGreaterThan(near.mass);
  });
});

describe("tube-piece, failures", () => {
  it.each([
    [
      "a saddle without its header",
      { ends: [{ kind: "saddle", angle: 60 }, square] },
      "ends.0.headerOd",
      /header's outside diameter/,
    ],
    [
      "a saddle without its angle",
      { ends: [square, { kind: "saddle", headerOd: 60 }] },
      "ends.1.angle",
      /angle between/,
    ],
    ["a mitre without its turn", { ends: [square, { kind: "mitre" }] }, "ends.1.turn", /turn/],
    [
      "a branch past its header",
      { ends: [square, { ...saddle, offset: 11 }] },
      "ends.1.offset",
      /within 10 mm/,
    ],
    [
      "a header thinner than the branch",
      { ends: [{ ...saddle, headerOd: 30 }, square] },
      "branchOd",
      /30 mm or less/,
    ],
    [
      "a wall that leaves no bore",
      { branchWall: 20, ends: [square, square] },
      "branchWall",
      /less than half.*20 mm/,
    ],
    ["one end", { ends: [square] }, "ends", /two ends/],
    ["three ends", { ends: [square, square, square] }, "ends", /two ends/],
    ["no list of ends", { ends: "square" }, "ends", /list: A, then B/],
    ["an unknown end", { ends: [{ kind: "round" }, square] }, "ends.0.kind", /saddle, square, mitre/],
    [
      "a number past its limits",
      { ends: [{ ...saddle, angle: 10 }, square] },
      "ends.0.angle",
      /between 15 and 90/,
    ],
  ])("names the field for %s", (_, inputs, field, message) => {
    expect(issue(inputs)).toEqual({ field, message: expect.stringMatching(message) });
  });

  it("says how far apart the joints must be when the cuts run into each other", () => {
    const found = issue({ between: 60 });
    expect(found).toMatchObject({
      field: "between",
      message: /run into each other: .* more than \d+(\.\d)? mm/,
    });
    const limit = Number(/more than ([\d.]+)/.exec(found?.message ?? "")?.[1]);
    expect(issue({ between: limit + 0.1 })).toBeUndefined();
    expect(issue({ between: limit - 0.1 })).toMatchObject({ field: "between" });
  });
});

describe("tube-piece, any input the schema lets through", () => {
  const end = fc.record({
    kind: fc.constantFrom("saddle", "square", "mitre"),
    headerOd: inRange(3, 2000),
    angle: inRange(15, 90),
    aside: inRange(-1.1, 1.1),
    turn: inRange(1, 150),
    setback: inRange(-100, 300),
  });

  it("gives finite numbers or one named fault", () => {
    const inputs = fc
      .record({
        ends: fc.tuple(end, end),
        between: inRange(1, 20_000),
        branch: inRange(0.2, 1.02),
        wall: inRange(0.02, 0.51),
        clock: inRange(-360, 360),
      })
      .map(({ ends, between, branch, wall, clock }) => {
        const branchOd = Math.max(3, Math.min(...ends.map(({ headerOd }) => headerOd)) * branch);
        return {
          between,
          branchOd,
          branchWall: Math.max(0.2, branchOd * wall),
          clock,
          samples: 8,
          ends: ends.map(({ aside, ...rest }) => ({
            ...rest,
            offset: (aside * (rest.headerOd - branchOd)) / 2,
          })),
        };
      });
    // A piece takes about a third of a millisecond: fewer runs than the others, to stay within three seconds.
    const { worked, faults } = runMany("tube-piece", inputs, 5000);
    expect(worked).toBeGreaterThan(300);
    for (const field of faults.keys()) {
      expect(["branchOd", "branchWall", "between", "ends.0.offset", "ends.1.offset"]).toContain(field);
    }
  });
});

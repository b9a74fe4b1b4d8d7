import { describe, expect, it } from "vitest";
import { findCalculator } from "#shared/calculators/registry.ts";
import { drawingMarkup, drawn } from "./drawn.ts";

const saddle = (angle: number, more: object = {}) => ({ kind: "saddle", headerOd: 44.5, angle, ...more });
const piece = { branchOd: 38.1, branchWall: 2.5 };
const tube = { shape: "round", od: 48.3, wall: 3, length: 1500, yield: 235, curve: "c" };
const weld = { length: 100, ultimate: 470, correlation: 0.9 };
const sheet = { thickness: 1.5, insideRadius: 2, kFactor: 0.42 };
const corner = findCalculator("wishbone-travel")?.example ?? {};
const upright = findCalculator("steering-axis")?.example ?? {};
const scales = findCalculator("corner-weights")?.example ?? {};

/** The example of each calculator, and settings at the ends of what can be asked. */
const settings: Record<string, object[]> = {
  mitre: [1, 20, 44, 45, 90, 120, 150].map((turn) => ({ od: 44.5, wall: 2.5, turn })),
  "tube-piece": [
    { ...piece, between: 120, ends: [saddle(90), saddle(90)] },
    { ...piece, between: 700, ends: [saddle(15), saddle(30, { offset: 3 })], clock: 180 },
    {
      ...piece,
      between: 300,
      ends: [
        { kind: "mitre", turn: 120 },
        { kind: "square", setback: 10 },
      ],
      clock: -200,
    },
    {
      branchOd: 500,
      branchWall: 10,
      between: 20_000,
      ends: [{ kind: "square" }, { kind: "square" }],
      clock: 360,
    },
  ],
  "tube-section": [
    { shape: "round", od: 2000, wall: 20 },
    { shape: "rectangle", width: 100, height: 50, wall: 4 },
    { shape: "rectangle", width: 40, height: 80, wall: 8, corners: "sharp" },
    { shape: "rectangle", width: 2000, height: 3, wall: 0.2 },
  ],
  strut: [
    { ...tube, length: 200, effectiveLengthFactor: 0.5 },
    { ...tube, effectiveLengthFactor: 0.7 },
    { ...tube, effectiveLengthFactor: 3, length: 30_000 },
    { ...tube, length: 1 },
  ],
  "strut-curve": [
    { curve: "a0", slenderness: 0 },
    { curve: "d", slenderness: 10 },
    { curve: "b", slenderness: 0.9 },
  ],
  "fillet-weld": [
    { ...weld, throat: 16, method: "directional", loadAngle: 45 },
    { ...weld, leg: 3, method: "directional", loadAngle: 90, length: 100_000 },
  ],
  bolt: [
    { size: "M24", pitch: 2, grade: "12.9", threadsInShear: false },
    { size: "M4", grade: "4.6", preloadFraction: 0.1 },
  ],
  "tap-drill": [{ thread: "M36x3" }, { thread: "1/4-20 UNC" }, { thread: "M1.6", engagement: 40 }],
  "sheet-bend": [
    { ...sheet, flanges: [20, 30, 60, 30, 20], angles: [90, -90, -90, 90] },
    { ...sheet, flanges: [10_000, 12], angles: [-1] },
    {
      ...sheet,
      flanges: Array(20).fill(20),
      angles: Array.from({ length: 19 }, (_, n) => (n % 4 < 2 ? 90 : -90)),
    },
  ],
  "wishbone-travel": [
    { ...corner, bump: 0, rebound: 0, tableUp: undefined, spring: undefined },
    { ...corner, upperFront: [156, 283, 416], upperRear: [-34, 283, 416], tableUp: -300 },
    { ...corner, upperFront: [156, 283, 300], upperRear: [-34, 283, 300], tableUp: 172, step: 1 },
    { ...corner, camber: 15, toe: -10, bump: 90, rebound: 70 },
    { ...corner, upperFront: [156, 283, 330], upperRear: [-34, 283, 330], rodInner: [96, 230, 214] },
  ],
  "stock-cutting": [
    { pieces: [{ length: 5, count: 100 }], stock: [{ length: 600 }], kerf: 0 },
    {
      pieces: [1500, 700, 300, 120, 60.5].map((length) => ({
        label: "A mark of the forty letters that may be",
        length,
        count: 1,
      })),
      stock: [{ length: 6000 }],
      kerf: 20,
      trim: 300,
    },
  ],
  "steering-axis": [
    { ...upright, turnedOver: true, camber: 15 },
    { ...upright, lower: { out: -600, up: 0, fore: 600 }, upper: { out: 600, up: 20, fore: -600 } },
    { ...upright, lower: { out: -25, up: -100, fore: 0 }, upper: { out: -25, up: 100, fore: 0 }, camber: 0 },
  ],
  "tube-bend": [
    {
      points: [
        [0, 0, 0],
        [1000, 0, 0],
        [1000, 0, 1000],
      ],
      bendRadius: 100,
      od: 30,
      wall: 2,
    },
    {
      points: [
        [0, 0, 0],
        [1000, 1000, -1000],
        [1000, 3000, -1000],
      ],
      bendRadius: 100,
      od: 30,
      wall: 2,
    },
    {
      points: Array.from({ length: 40 }, (_, n) => [n * 200, (n % 2) * 200, (n % 3) * 200]),
      bendRadius: 20,
      od: 20,
      wall: 2,
    },
  ],
  "corner-weights": [
    { ...scales, lf: 0, rf: 0, lr: 0, rr: 20_000, lifted: undefined },
    { ...scales, lf: 20_000, rf: 20_000, lr: 20_000, rr: 20_000, lifted: undefined },
    { ...scales, wheelbase: 12_000, frontTrack: 1000, rearTrack: 100, lifted: undefined },
    { ...scales, wheelbase: 200, frontTrack: 4000, rearTrack: 100, lifted: undefined },
  ],
  "spring-ride": [
    { cornerMass: 140, springRate: 0.1, motionRatio: 0.05, tyreRate: 1 },
    { cornerMass: 1, springRate: 5000, motionRatio: 2, tyreRate: 10_000 },
    { cornerMass: 140, springRate: 38, motionRatio: 0.59, tyreRate: 180, targetFrequency: 4 },
  ],
};

const cases = Object.entries(settings).flatMap(([id, list]) =>
  [findCalculator(id)?.example ?? {}, ...list].flatMap((inputs) =>
    (["mm", "inch"] as const).map((units) => ({ id, inputs, units })),
  ),
);

describe("drawings", () => {
  it.each(cases)("draws $id of $inputs in $units with numbers alone", ({ id, inputs, units }) => {
    expect(drawingMarkup(id, inputs, units)).not.toMatch(/NaN|Infinity|undefined|null/);
  });

  it.each(cases)("keeps $id of $inputs in $units on its sheets", ({ id, inputs, units }) => {
    for (const { title, width, height, places, words } of drawn(drawingMarkup(id, inputs, units))) {
      expect(width, title).toBeGreaterThan(0);
      for (const [x, y] of places) {
        expect(x, title).toBeGreaterThanOrEqual(-1);
        expect(x, title).toBeLessThanOrEqual(width + 1);
        expect(y, title).toBeGreaterThanOrEqual(-1);
        expect(y, title).toBeLessThanOrEqual(height + 1);
      }
      for (const word of words) {
        expect(word.left, word.text).toBeGreaterThanOrEqual(-1);
        expect(word.right, word.text).toBeLessThanOrEqual(width + 1);
        expect(word.baseline, word.text).toBeLessThanOrEqual(height);
        expect(word.baseline - word.size * 0.75, word.text).toBeGreaterThanOrEqual(-1);
      }
    }
  });

  it.each(cases)("writes no word of $id of $inputs in $units over another", ({ id, inputs, units }) => {
    for (const { words } of drawn(drawingMarkup(id, inputs, units))) {
      const meeting = words.flatMap((word, index) =>
        words
          .slice(index + 1)
          .filter(
            (other) =>
              word.left < other.right - 1 &&
              other.left < word.right - 1 &&
              Math.abs(word.baseline - other.baseline) < word.size * 0.7,
          )
          .map((other) => `${word.text} | ${other.text}`),
      );
      expect(meeting).toEqual([]);
    }
  });

  it.each(Object.keys(settings))("tells %s in words to those who do not see it", (id) => {
    for (const { title, description } of drawn(drawingMarkup(id, findCalculator(id)?.example ?? {}))) {
      expect(title).not.toBe("");
      expect(description).toMatch(/\d/);
    }
  });

  it.each([
    ["mitre", ["deepest 44.5", "90°", "45°", "heel", "toe"]],
    [
      "tube-piece",
      [
        "tip to tip 577.0",
        "shortest 551.8",
        "rough cut 602.0",
        "hard end: cut it first",
        "clock 90°",
        "B's heel",
      ],
    ],
    ["tube-section", ["wall 3.0", "R 6.0 / 3.0", "50.0"]],
    ["strut", ["effective", "Euler", "squash"]],
    ["strut-curve", ["curve c: χ 0.540", "a0", "d"]],
    ["fillet-weld", ["throat 4.2", "leg 6.0", "102.3 kN"]],
    ["bolt", ["M12 × 1.75, grade 8.8", "stress area 84.3 mm²", "thread in shear", "Tighten to 88.0 N·m"]],
    ["tap-drill", ["drill ⌀ 6.80", "M8 ⌀ 8.00", "close", "medium", "free", "minor"]],
    ["sheet-bend", ["flat 132.1", "40.0", "60.0", "90°", "38.0", "94.0"]],
    ["wishbone-travel", ["table", "72.0", "168.0", "316.0", "camber, °", "toe, °", "track change, mm"]],
    ["stock-cutting", ["2 × 1840 Rail", "mm; kerf 2.0; offcut hatched"]],
    ["steering-axis", ["kpi 7.01°", "caster 4.69°", "scrub radius 20.5", "trail 20.1", "spindle 48.8"]],
    ["tube-bend", ["first end", "1: 42.9°", "2: 47.1°"]],
    ["corner-weights", ["118.0", "112.0", "149.0", "141.0", "front 44.2 %", "cross 50.2 %"]],
    ["spring-ride", ["now 1.49 Hz", "target wants 44.1 N/mm"]],
  ])("writes the numbers of %s's example on its drawing", (id, expected) => {
    const words = drawn(drawingMarkup(id, findCalculator(id)?.example ?? {})).flatMap((each) =>
      each.words.map(({ text }) => text),
    );
    for (const text of expected) expect(words).toContain(text);
  });

  it("draws the same tube section to the scale of its sides", () => {
    const [section] = drawn(
      drawingMarkup("tube-section", {
        shape: "rectangle",
        width: 100,
        height: 50,
        wall: 4,
        corners: "sharp",
      }),
    );
    const outline = section?.places.slice(0, 4) ?? [];
    const xs = outline.map(([x]) => x);
    const ys = outline.map(([, y]) => y);
    const ratio = (Math.max(...xs) - Math.min(...xs)) / (Math.max(...ys) - Math.min(...ys));
    expect(ratio).toBeCloseTo(2, 3);
  });

  it("numbers every bend of a tube, one seen edge-on too", () => {
    const [sheet] = drawn(
      drawingMarkup("tube-bend", {
        points: [
          [0, 0, 0],
          [0, 0, 700],
          [200, 150, 1000],
          [900, 150, 1000],
          [1100, 0, 700],
          [1100, 0, 0],
        ],
        bendRadius: 120,
        od: 38,
        wall: 2,
      }),
    );
    const numbers = sheet?.words.map(({ text }) => text.split(":")[0]);
    expect(numbers).toEqual(expect.arrayContaining(["1", "2", "3", "4"]));
  });
});

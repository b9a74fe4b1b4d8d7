import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { placedWords } from "#src/features/workings/components/placed-words.ts";
import { staggered } from "#src/features/workings/components/staggered.ts";

describe("staggered", () => {
  it("keeps words that do not meet on the first row", () => {
    expect(
      staggered([
        { from: 0, to: 10 },
        { from: 10, to: 20 },
        { from: 30, to: 40 },
      ]),
    ).toEqual([0, 0, 0]);
  });

  it("never puts two that meet on one row", () => {
    const span = fc.record({ from: fc.integer({ min: 0, max: 300 }), wide: fc.integer({ min: 1, max: 60 }) });
    fc.assert(
      fc.property(fc.array(span, { maxLength: 20 }), (list) => {
        const spans = list
          .map(({ from, wide }) => ({ from, to: from + wide }))
          .sort((a, b) => a.from - b.from);
        const rows = staggered(spans);
        for (const [index, one] of spans.entries()) {
          for (const [later, other] of spans.slice(index + 1).entries()) {
            if (rows[index] === rows[index + 1 + later]) expect(other.from).toBeGreaterThanOrEqual(one.to);
          }
        }
      }),
    );
  });
});

describe("placedWords", () => {
  const sheet = { width: 300, height: 300 };
  const word = { at: [150, 150], out: [0, 1], text: "40.0", soft: false } as const;
  const farAway = [[0, 0]] as const;

  it("sets a word above its place when nothing is in the way", () => {
    const [placed] = placedWords([word], farAway, sheet);
    expect(placed?.at[1]).toBeLessThan(150);
  });

  it("takes the other side where a line runs", () => {
    const line = [
      [100, 140],
      [200, 140],
    ] as const;
    const [placed] = placedWords([word], line, sheet);
    expect(placed?.at[1]).toBeGreaterThan(150);
  });

  it("leaves out what has no room beside earlier words", () => {
    const crowd = Array.from({ length: 9 }, () => word);
    const placed = placedWords(crowd, farAway, sheet);
    expect(placed.length).toBeLessThan(crowd.length);
    expect(new Set(placed.map(({ at }) => at[1])).size).toBe(placed.length);
  });
});

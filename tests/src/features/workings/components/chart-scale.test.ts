import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { clippedBelow, niceTicks, ticksBetween } from "#src/features/workings/components/chart-scale.ts";

describe("niceTicks", () => {
  it.each([
    [100, ["0", "20", "40", "60", "80", "100"]],
    [1.08, ["0.0", "0.5", "1.0"]],
    [0.37, ["0.0", "0.1", "0.2", "0.3"]],
    [60_000, ["0", "20000", "40000", "60000"]],
  ])("divides an axis to %s at round values", (most, labels) => {
    expect(niceTicks(most).map(({ label }) => label)).toEqual(labels);
  });

  it("gives two to twelve different labels within the axis, whatever its length", () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-3, max: 1e7, noNaN: true }), (most) => {
        const ticks = niceTicks(most);
        const labels = new Set(ticks.map(({ label }) => label));
        expect(labels.size).toBe(ticks.length);
        expect(ticks.length).toBeGreaterThanOrEqual(2);
        expect(ticks.length).toBeLessThanOrEqual(12);
        expect(ticks.at(-1)?.value).toBeLessThanOrEqual(most * (1 + 1e-6));
      }),
    );
  });
});

describe("ticksBetween", () => {
  it("labels round values on both sides of 0, with a true minus", () => {
    expect(ticksBetween(-50, 50).map(({ label }) => label)).toEqual(["−50", "0", "50"]);
    expect(ticksBetween(-0.12, 0.02).map(({ label }) => label)).toEqual(["−0.10", "−0.05", "0.00"]);
  });

  it("keeps every value within the axis, evenly apart", () => {
    fc.assert(
      fc.property(
        fc.double({ min: -4000, max: 4000, noNaN: true }),
        fc.double({ min: 0.1, max: 4000, noNaN: true }),
        (low, range) => {
          const values = ticksBetween(low, low + range).map(({ value }) => value);
          expect(values.length).toBeGreaterThan(0);
          expect(Math.min(...values)).toBeGreaterThanOrEqual(low - range * 1e-6);
          expect(Math.max(...values)).toBeLessThanOrEqual(low + range * (1 + 1e-6));
          const gaps = values.slice(1).map((value, index) => value - (values[index] ?? 0));
          for (const gap of gaps) expect(gap).toBeCloseTo(gaps[0] ?? 0, 6);
        },
      ),
    );
  });
});

describe("clippedBelow", () => {
  it("ends a falling curve's missing part where it crosses the top", () => {
    const runs = clippedBelow(
      [
        { x: 0, y: 30 },
        { x: 1, y: 10 },
        { x: 2, y: 0 },
      ],
      20,
    );
    expect(runs).toEqual([
      [
        { x: 0.5, y: 20 },
        { x: 1, y: 10 },
        { x: 2, y: 0 },
      ],
    ]);
  });

  it("breaks a curve that leaves the field and comes back", () => {
    const runs = clippedBelow(
      [
        { x: 0, y: 0 },
        { x: 1, y: 4 },
        { x: 2, y: 0 },
      ],
      2,
    );
    expect(runs).toEqual([
      [
        { x: 0, y: 0 },
        { x: 0.5, y: 2 },
      ],
      [
        { x: 1.5, y: 2 },
        { x: 2, y: 0 },
      ],
    ]);
  });

  it("leaves nothing of a curve that is above all along", () => {
    expect(
      clippedBelow(
        [
          { x: 0, y: 3 },
          { x: 1, y: 4 },
        ],
        2,
      ),
    ).toEqual([]);
  });
});

import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { day, graduations, ruleScale, ruleX, spread } from "#src/components/steel-rule-layout.ts";

describe("graduations", () => {
  it("cuts January 2026 at its Mondays 5, 12, 19 and 26 (calendar)", () => {
    const scale = ruleScale(Date.UTC(2026, 0, 1), Date.UTC(2026, 0, 31));
    const weeks = graduations(scale).filter((mark) => mark.size === "week");
    expect(weeks.map((mark) => mark.label)).toEqual(["5", "12", "19", "26"]);
  });

  it("cuts 29 February in the leap year 2028 and a month at 1 March", () => {
    const scale = ruleScale(Date.UTC(2028, 1, 27), Date.UTC(2028, 2, 3));
    const marks = graduations(scale);
    const leapDay = ruleX(scale, Date.UTC(2028, 1, 29));
    expect(marks.find((mark) => mark.x === leapDay)?.size).toBe("day");
    expect(marks.filter((mark) => mark.size === "month").map((mark) => mark.label)).toEqual(["Mar 2028"]);
  });

  it("leaves the days out of a rule of three years", () => {
    const scale = ruleScale(Date.UTC(2023, 5, 1), Date.UTC(2026, 5, 1));
    expect(new Set(graduations(scale).map((mark) => mark.size))).not.toContain("day");
  });
});

describe("ruleX", () => {
  it("puts equal times at equal distances", () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 2000 }), fc.nat(1000), (days, after) => {
        const scale = ruleScale(0, days * day);
        const step = ruleX(scale, (after + 1) * day) - ruleX(scale, after * day);
        expect(step).toBeCloseTo(scale.perDay, 0);
      }),
    );
  });
});

describe("spread", () => {
  it("never lets two neighbours overlap when there is room for all", () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: 0, max: 900 }), { maxLength: 15 }), (wanted) => {
        const places = spread(
          wanted.toSorted((a, b) => a - b),
          48,
          1000,
        );
        places.forEach((place, index) => {
          const before = places[index - 1];
          if (before !== undefined) expect(place - before).toBeGreaterThanOrEqual(48);
          expect(place).toBeGreaterThanOrEqual(0);
          expect(place + 48).toBeLessThanOrEqual(1000);
        });
      }),
    );
  });

  it("leaves things where they are wanted when they are far apart", () => {
    expect(spread([10, 100, 400], 48, 1000)).toEqual([10, 100, 400]);
  });
});

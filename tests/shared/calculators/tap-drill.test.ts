import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { tappedThreads } from "#shared/calculators/tap-drill/designation.ts";
import type { TapDrillResults } from "#shared/calculators/tap-drill/formula.ts";
import { anyInputs, runMany } from "#tests/setup/any-inputs.ts";
import { issueOf, missingResultFields, resultsOf } from "#tests/setup/calculator.ts";

const tap = (thread: string, engagement = 75) =>
  resultsOf<TapDrillResults>("tap-drill", { thread, engagement });

describe("tap-drill", () => {
  it("lists only result fields that it gives as numbers", () => {
    expect(missingResultFields("tap-drill")).toEqual([]);
  });

  it.each([
    ["M10", "m10", "M10x1.5", "M 10 × 1,5", "M10X1.50", "M10*1.5"],
    ["M10x1.25", "m10x1.25", "M10 x 1.25"],
    ["1/4-20 UNC", "1/4-20", "1/4 - 20 unc", '1/4"-20 UNC'],
    ["#10-32 UNF", "10-32", "#10-32", "No. 10-32 UNF", "no10-32"],
  ])("finds %s however it is written", (designation, ...spellings) => {
    for (const written of [designation, ...spellings]) expect(tap(written).designation).toBe(designation);
  });

  it("drills to the minor diameter at 83.3 % and to the outside at nothing", () => {
    const { minor, diameter, pitch } = tap("M10");
    // 5√3/8 of the pitch is 83.33 % of 2 × 0.6495: the profile's own height.
    expect((diameter - minor) * (76.98 / pitch)).toBeCloseTo(83.33, 1);
    expect(tap("M10", 83).drill).toBeGreaterThan(minor);
  });

  it("drills larger the less the thread is to be filled", () => {
    const drills = [83, 75, 65, 50, 40].map((engagement) => tap("M8", engagement).drill);
    expect(drills).toEqual([...drills].sort((a, b) => a - b));
  });

  it("names the standard's drill near 75 % and the nearest drill made elsewhere", () => {
    expect(tap("M12", 75).standardDrill).toBe(10.2);
    expect(tap("M6", 75).standardDrill).toBe(5);
    expect(tap("M6", 60).standardDrill).toBe(5.2);
  });

  it("keeps the drill to use within half a step of the exact hole, every thread", () => {
    for (const { designation, pitch } of tappedThreads) {
      const { drill, standardDrill, standardDrillEngagement } = tap(designation);
      expect(Math.abs(standardDrill - drill)).toBeLessThan(0.25);
      expect(standardDrillEngagement - 75).toBeCloseTo(((drill - standardDrill) * 76.98) / pitch, 9);
    }
  });

  it("clears every screw, closely, more and most", () => {
    for (const { designation, diameter, clearance } of tappedThreads) {
      expect(clearance.close, designation).toBeGreaterThan(diameter);
      expect(clearance.medium, designation).toBeGreaterThan(clearance.close);
      expect(clearance.free, designation).toBeGreaterThan(clearance.medium);
    }
  });

  it("has each thread once", () => {
    expect(new Set(tappedThreads.map(({ designation }) => designation)).size).toBe(tappedThreads.length);
  });

  it.each(["M11", "M10x3", "1/4-19 UNC", "3", "pipe"])(
    "says that it does not know %s, and how to write one",
    (thread) => {
      expect(issueOf("tap-drill", { thread })).toMatchObject({
        field: "thread",
        message: expect.stringContaining(`"${thread}" is not in the tables`),
      });
    },
  );

  it.each([
    ["thread", { thread: 10 }, /as it stands on the tap/],
    ["thread", { thread: "M".repeat(41) }, /short/],
    ["engagement", { thread: "M8", engagement: 100 }, /between 40 and 83 %/],
  ])("names %s and what would be right", (field, inputs, message) => {
    expect(issueOf("tap-drill", inputs)).toEqual({ field, message: expect.stringMatching(message) });
  });

  it("gives finite numbers for any thread of its tables, and a named fault for any other text", () => {
    const known = runMany("tap-drill", anyInputs("tap-drill"));
    expect(known.worked).toBe(10_000);
    const text = fc.string({ maxLength: 40 }).map((thread) => ({ thread }));
    expect([...runMany("tap-drill", text, 1000).faults.keys()]).toEqual(["thread"]);
  });
});

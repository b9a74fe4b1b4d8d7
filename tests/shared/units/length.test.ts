import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  formatLength,
  fromInches,
  inchFraction,
  parseFigure,
  parseLength,
  toInches,
} from "#shared/units/length.ts";

const read = (text: string, units: "mm" | "inch" = "mm") => {
  const parsed = parseLength(text, units);
  return parsed.ok ? parsed.value : parsed.issue.message;
};

describe("toInches and fromInches", () => {
  it("take an inch as exactly 25.4 mm (ISO 80000-3)", () => {
    expect(toInches(25.4)).toBe(1);
    expect(fromInches(2)).toBe(50.8);
  });
});

describe("formatLength", () => {
  it("shows mm to the decimals asked and inches to two more", () => {
    expect(formatLength(38.1, "mm")).toBe("38.1 mm");
    expect(formatLength(38.1, "inch")).toBe("1.500 in");
  });

  it("never shows minus nothing", () => {
    expect(formatLength(-0.01, "mm")).toBe("0.0 mm");
  });
});

describe("inchFraction", () => {
  it.each([
    [38.1, "1 1/2"],
    [9.525, "3/8"],
    [25.4, "1"],
    [0, "0"],
    [-9.525, "−3/8"],
    [25.3, "1"],
  ])("writes %s mm as %s in", (millimetres, text) => {
    expect(inchFraction(millimetres).text).toBe(text);
  });

  it("says how far off the fraction is, at most half a division", () => {
    fc.assert(
      fc.property(fc.integer({ min: -1_000_000, max: 1_000_000 }), (micrometres) => {
        const length = micrometres / 1000;
        const { text, excess } = inchFraction(length, 64);
        expect(Math.abs(excess)).toBeLessThanOrEqual(25.4 / 128 + 1e-9);
        expect(read(text, "inch")).toBeCloseTo(length + excess, 9);
      }),
    );
  });
});

describe("parseLength", () => {
  it.each([
    ["12.5", 12.5],
    ["12,5", 12.5],
    [" -3 ", -3],
    ["−3", -3],
    ["1 in", 25.4],
    ['1-1/2"', 38.1],
    ["4 cm", 40],
    [".5", 0.5],
  ])("reads %s as %s mm", (text, millimetres) => {
    expect(read(text)).toBeCloseTo(millimetres, 12);
  });

  it("reads fractions of an inch for a person who works in inches", () => {
    expect(read("1 1/2", "inch")).toBeCloseTo(38.1, 12);
    expect(read("3/8", "inch")).toBeCloseTo(9.525, 12);
    expect(read("40 mm", "inch")).toBe(40);
  });

  it.each(["", "big", "1/0", "1.2.3", "1e3", "-", "mm"])("asks for a number when given %j", (text) => {
    expect(read(text)).toMatch(/Type a number/);
  });
});

describe("parseFigure", () => {
  it("leaves out what is no number", () => {
    expect(parseFigure("60°")).toBeUndefined();
    expect(parseFigure("60")).toBe(60);
  });
});

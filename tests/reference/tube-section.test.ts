import { describe, expect, it } from "vitest";
import type { TubeSectionResults } from "#shared/calculators/tube-section/formula.ts";
import { resultsOf } from "#tests/setup/calculator.ts";

/**
 * Rows of the published section tables to EN 10219-2 and EN 10210-2 (annex of sizes), read from stored public copies of
 * the British "Blue Book" tables: mass in kg/m, area in cm², I and It in cm⁴, radius in cm, moduli in cm³, surface in
 * m²/m. Printed to three figures.
 */
interface Row {
  size: string;
  mass: number;
  area: number;
  i: number;
  radius: number;
  w: number;
  wpl: number;
  torsion: number;
  torsionModulus: number;
  surface: number;
}

interface BoxRow extends Row {
  iMinor: number;
  radiusMinor: number;
  wMinor: number;
  wplMinor: number;
}

function row(size: string, ...n: readonly number[]): Row {
  const [
    mass = 0,
    area = 0,
    i = 0,
    radius = 0,
    w = 0,
    wpl = 0,
    torsion = 0,
    torsionModulus = 0,
    surface = 0,
  ] = n;
  return { size, mass, area, i, radius, w, wpl, torsion, torsionModulus, surface };
}

function boxRow(size: string, both: readonly number[], ...minor: readonly number[]): BoxRow {
  const [iMinor = 0, radiusMinor = 0, wMinor = 0, wplMinor = 0] = minor;
  return { ...row(size, ...both), iMinor, radiusMinor, wMinor, wplMinor };
}

/** Three printed figures leave up to half a unit of the last: 0.5 %. */
function expectPrinted(actual: number, printed: number) {
  const lastFigure = 10 ** (Math.floor(Math.log10(Math.abs(printed))) - 2);
  expect(Math.abs(actual - printed)).toBeLessThanOrEqual(0.5001 * lastFigure);
}

function expectRow(results: TubeSectionResults, printed: Row) {
  expectPrinted(results.massPerMetre, printed.mass);
  expectPrinted(results.area / 100, printed.area);
  expectPrinted(results.i / 1e4, printed.i);
  expectPrinted(results.radiusOfGyration / 10, printed.radius);
  expectPrinted(results.w / 1000, printed.w);
  expectPrinted(results.wpl / 1000, printed.wpl);
  expectPrinted(results.torsion / 1e4, printed.torsion);
  expectPrinted(results.torsionModulus / 1000, printed.torsionModulus);
  // Printed to the third decimal, however small.
  expect(Math.abs(results.surfacePerMetre - printed.surface)).toBeLessThanOrEqual(0.00051);
}

const sizes = (size: string) => size.split("x").map(Number);

describe("tube-section against published tables, round (EN 10219-2; EN 10210-2 has the same)", () => {
  it.each([
    row("33.7x3", 2.27, 2.89, 3.44, 1.09, 2.04, 2.84, 6.88, 4.08, 0.106),
    row("42.4x3", 2.91, 3.71, 7.25, 1.4, 3.42, 4.67, 14.5, 6.84, 0.133),
    row("48.3x3", 3.35, 4.27, 11, 1.61, 4.55, 6.17, 22, 9.11, 0.152),
    row("48.3x4", 4.37, 5.57, 13.8, 1.57, 5.7, 7.87, 27.5, 11.4, 0.152),
    row("60.3x4", 5.55, 7.07, 28.2, 2, 9.34, 12.7, 56.3, 18.7, 0.189),
    row("88.9x5", 10.3, 13.2, 116, 2.97, 26.2, 35.2, 233, 52.4, 0.279),
    row("168.3x10", 39, 49.7, 1560, 5.61, 186, 251, 3130, 372, 0.529),
  ])("gives $size as printed", (printed) => {
    const [od, wall] = sizes(printed.size);
    expectRow(resultsOf("tube-section", { shape: "round", od, wall }), printed);
  });
});

describe("tube-section against published tables, square", () => {
  it.each([
    row("25x25x2", 1.36, 1.74, 1.48, 0.924, 1.19, 1.47, 2.53, 1.8, 0.093),
    row("40x40x3", 3.3, 4.21, 9.32, 1.49, 4.66, 5.72, 15.8, 7.07, 0.15),
    row("50x50x5", 6.56, 8.36, 27, 1.8, 10.8, 13.7, 47.5, 16.6, 0.183),
    row("100x100x6", 17, 21.6, 311, 3.79, 62.3, 75.1, 514, 94.1, 0.379),
    // Over 6 mm the corners are rounder.
    row("100x100x8", 21.4, 27.2, 366, 3.67, 73.2, 91.1, 645, 114, 0.366),
    row("120x120x10", 31.8, 40.6, 777, 4.38, 129, 162, 1380, 203, 0.437),
  ])("gives cold-formed $size as printed (EN 10219-2)", (printed) => {
    const [side, , wall] = sizes(printed.size);
    expectRow(resultsOf("tube-section", { shape: "square", side, wall }), printed);
  });

  it.each([
    row("40x40x3.2", 3.61, 4.6, 10.2, 1.49, 5.11, 6.28, 16.5, 7.42, 0.152),
    row("50x50x5", 6.85, 8.73, 28.9, 1.82, 11.6, 14.5, 47.6, 16.7, 0.187),
    row("80x80x8", 17.5, 22.4, 189, 2.91, 47.3, 59.5, 312, 68.3, 0.299),
    row("100x100x10", 27.4, 34.9, 462, 3.64, 92.4, 116, 761, 133, 0.374),
  ])("gives hot-finished $size as printed (EN 10210-2)", (printed) => {
    const [side, , wall] = sizes(printed.size);
    expectRow(resultsOf("tube-section", { shape: "square", side, wall, corners: "hot-finished" }), printed);
  });
});

describe("tube-section against published tables, rectangle", () => {
  const coldFormed = [
    boxRow("50x25x2", [2.15, 2.74, 8.38, 1.75, 3.35, 4.26, 7.06, 3.92, 0.143], 2.81, 1.01, 2.25, 2.62),
    boxRow("60x40x3", [4.25, 5.41, 25.4, 2.17, 8.46, 10.5, 29.3, 11.2, 0.19], 13.4, 1.58, 6.72, 7.94),
    boxRow("80x40x4", [6.71, 8.55, 64.8, 2.75, 16.2, 20.9, 55.2, 18.8, 0.226], 21.5, 1.59, 10.7, 12.8),
    boxRow("100x50x4", [8.59, 10.9, 134, 3.5, 26.8, 34.1, 113, 31.3, 0.286], 44.9, 2.03, 18, 20.9),
  ];
  const hotFinished = [
    boxRow("50x30x3.2", [3.61, 4.6, 14.2, 1.76, 5.68, 7.25, 14.2, 6.8, 0.152], 6.2, 1.16, 4.13, 5),
    boxRow("60x40x5", [6.85, 8.73, 38.1, 2.09, 12.7, 16.4, 43, 15.7, 0.187], 19.5, 1.5, 9.77, 12.2),
    boxRow("100x50x10", [19.6, 24.9, 259, 3.22, 51.8, 71.2, 209, 53.6, 0.274], 78.4, 1.77, 31.4, 41.4),
  ];

  it.each([
    ...coldFormed.map((printed) => ({ ...printed, corners: "cold-formed" })),
    ...hotFinished.map((printed) => ({ ...printed, corners: "hot-finished" })),
  ])("gives $corners $size as printed (EN 10219-2, EN 10210-2)", (printed) => {
    const [height, width, wall] = sizes(printed.size);
    const { corners } = printed;
    const results = resultsOf<TubeSectionResults>("tube-section", {
      shape: "rectangle",
      height,
      width,
      wall,
      corners,
    });
    expectRow(results, printed);
    expectPrinted(results.iMinor / 1e4, printed.iMinor);
    expectPrinted(results.radiusOfGyrationMinor / 10, printed.radiusMinor);
    expectPrinted(results.wMinor / 1000, printed.wMinor);
    expectPrinted(results.wplMinor / 1000, printed.wplMinor);
  });
});

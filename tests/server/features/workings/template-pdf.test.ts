import { execFileSync } from "node:child_process";
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import sharp from "sharp";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { templatePdf } from "#server/features/workings/template-pdf.ts";
import { findCalculator, runCalculator, templateOf } from "#shared/calculators/registry.ts";
import type { SaddleCopeResults } from "#shared/calculators/saddle-cope/formula.ts";
import { type Paper, pageMargin, type Tiling, tileSheet } from "#shared/templates/tiling.ts";

/** Resolution of the rasterised pages: 20 pixels to the mm, so that a pixel is 0.05 mm. */
const resolution = 508;
const perMillimetre = resolution / 25.4;

const names = { build: "Heron, Цапля, žlutá", working: "W12 Lower wishbone", date: "1 December 2026" };
let folder: string;

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), "template-pdf-"));
});

afterAll(() => rmSync(folder, { recursive: true }));

interface Raster {
  width: number;
  height: number;
  dark(x: number, y: number): boolean;
}

interface Printed {
  tiling: Tiling;
  results: SaddleCopeResults;
  file: string;
}

async function print(
  inputs: object,
  paper: Paper,
  name: string,
  calculator = "saddle-cope",
): Promise<Printed> {
  const run = runCalculator(calculator, inputs);
  if (!run.ok) throw new Error(run.issue.message);
  const sheet = templateOf(run.value, names);
  const tiling = sheet && tileSheet(sheet.bounds, paper);
  if (!sheet || !tiling?.ok) throw new Error("no template");
  const file = join(folder, `${name}.pdf`);
  const printed = {
    sheet,
    tiling: tiling.value,
    names,
    heading: "Saddle cope",
    cautions: ["Clamp the tube."],
  };
  writeFileSync(file, await templatePdf(printed));
  return { tiling: tiling.value, results: run.value.results as SaddleCopeResults, file };
}

/** One page as grey pixels, by poppler's pdftoppm: a renderer that is not ours. */
async function rasterise(file: string, page: number): Promise<Raster> {
  const out = `${file}-${page}`;
  execFileSync("pdftoppm", [
    "-r",
    String(resolution),
    "-gray",
    "-f",
    String(page),
    "-l",
    String(page),
    "-singlefile",
    "-png",
    file,
    out,
  ]);
  const { data, info } = await sharp(`${out}.png`).greyscale().raw().toBuffer({ resolveWithObject: true });
  return {
    width: info.width,
    height: info.height,
    dark: (x, y) => (data[Math.round(y) * info.width + Math.round(x)] ?? 255) < 110,
  };
}

/** Middles of the dark runs met along a line across the page, mm. */
function darkRuns(length: number, dark: (at: number) => boolean): number[] {
  const runs: number[] = [];
  let start = -1;
  for (let at = 0; at <= length; at += 1) {
    if (at < length && dark(at)) start = start < 0 ? at : start;
    else if (start >= 0) {
      runs.push((start + at - 1) / 2 / perMillimetre);
      start = -1;
    }
  }
  return runs;
}

/** Middles of a bar's end ticks: the only ones that reach 1 mm below the bar. */
function barEnds(page: Raster, below: number): number[] {
  const row = below * perMillimetre;
  // The foot's own columns of text begin right of both bars.
  return darkRuns(page.width, (x) => page.dark(x, row)).filter((at) => at < pageMargin + 103);
}

function expectBars(page: Raster, tiling: Tiling): void {
  const bar = tiling.page.height - pageMargin - 43 + 6 + 12;
  const metric = barEnds(page, bar + 0.8);
  const inches = barEnds(page, bar + 8.8);
  expect(metric).toHaveLength(2);
  expect(inches).toHaveLength(2);
  expect(Math.abs((metric[1] ?? 0) - (metric[0] ?? 0) - 100)).toBeLessThan(0.2);
  expect(Math.abs((inches[1] ?? 0) - (inches[0] ?? 0) - 101.6)).toBeLessThan(0.2);
}

describe("templatePdf", () => {
  it.each([
    ["a4", 210, 297],
    ["letter", 215.9, 279.4],
  ] as const)("prints both check bars on %s true to 0.2 mm", async (paper, width, height) => {
    const inputs = { headerOd: 44.5, branchOd: 38.1, branchWall: 2.5, angle: 60 };
    const { file, tiling } = await print(inputs, paper, paper);
    const page = await rasterise(file, 1);
    expect(page.width / perMillimetre).toBeCloseTo(width, 0);
    expect(page.height / perMillimetre).toBeCloseTo(height, 0);
    expectBars(page, tiling);
  });

  it.each([
    ["mitre", { od: 44.5, wall: 2.5, turn: 90 }],
    ["tube-piece", findCalculator("tube-piece")?.example ?? {}],
  ])("prints both check bars of %s true to 0.2 mm, on each of its pages", async (calculator, inputs) => {
    const { file, tiling } = await print(inputs, "a4", calculator, calculator);
    for (const tile of tiling.tiles) expectBars(await rasterise(file, tile.page), tiling);
  });

  it("tells the viewer not to scale, and embeds every font it uses", async () => {
    const { file } = await print(
      { headerOd: 44.5, branchOd: 38.1, branchWall: 2.5, angle: 60 },
      "a4",
      "fonts",
    );
    expect(readFileSync(file, "latin1")).toMatch(/\/PrintScaling \/None/);
    const fonts = execFileSync("pdffonts", [file], { encoding: "utf8" }).trim().split("\n").slice(2);
    expect(fonts.length).toBeGreaterThan(2);
    for (const font of fonts) expect(font).toMatch(/\byes\s+yes\s+yes\b/);
  });

  it("carries names in other alphabets as text", async () => {
    const { file } = await print(
      { headerOd: 44.5, branchOd: 38.1, branchWall: 2.5, angle: 60 },
      "a4",
      "names",
    );
    const text = execFileSync("pdftotext", ["-layout", file, "-"], { encoding: "utf8" });
    for (const words of [
      names.build,
      names.working,
      names.date,
      "100 mm",
      "4 in",
      "Print at 100 %",
      "Clamp the tube",
      "HEEL",
      "TOE",
    ]) {
      expect(text).toContain(words);
    }
  });

  it("puts the curve together again from its tiles, to 0.2 mm", async () => {
    const { file, tiling, results } = await print(
      { headerOd: 114.3, branchOd: 88.9, branchWall: 3.2, angle: 45 },
      "a4",
      "tiles",
    );
    expect(tiling.tiles.length).toBeGreaterThan(1);
    const seen = new Set<number>();
    for (const tile of tiling.tiles) {
      const page = await rasterise(file, tile.page);
      for (const point of results.curve) {
        const x = tiling.window.x + (results.templateWidth * point.around) / 360 - tile.x;
        const y = tiling.window.y + point.depth - tile.y;
        const { window } = tiling;
        const inside =
          x > window.x + 1 &&
          x < window.x + window.width - 1 &&
          y > window.y + 1 &&
          y < window.y + window.height - 1;
        // Lines that cross the curve hide where it is.
        if (!inside || point.around % 90 === 0) continue;
        const from = (y - 1.5) * perMillimetre;
        const runs = darkRuns(3 * perMillimetre, (at) => page.dark(x * perMillimetre, from + at));
        const nearest = Math.min(...runs.map((at) => Math.abs(at - 1.5)));
        expect(nearest, `at ${point.around}° on sheet ${tile.page}`).toBeLessThan(0.2);
        seen.add(point.around);
      }
    }
    // All of them but the four quarter lines, of which the first comes twice.
    expect(seen.size).toBe(results.curve.length - 5);
  });
});

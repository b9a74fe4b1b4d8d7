import DxfParser from "dxf-parser";
import { XMLParser, XMLValidator } from "fast-xml-parser";
import { describe, expect, it } from "vitest";
import { runCalculator, templateOf } from "#shared/calculators/registry.ts";
import type { SaddleCopeResults } from "#shared/calculators/saddle-cope/formula.ts";
import { templateDxf } from "#shared/templates/dxf.ts";
import { templateSvg } from "#shared/templates/svg.ts";

const names = { build: "Heron <1> & šedá", working: 'W12 "front leg"', date: "1 December 2026" };
const inputs = { headerOd: 44.5, branchOd: 38.1, branchWall: 2.5, angle: 60, offset: 2, paperThickness: 0.2 };

function templateFor(overrides: Partial<typeof inputs> = {}) {
  const run = runCalculator("saddle-cope", { ...inputs, ...overrides });
  if (!run.ok) throw new Error(run.issue.message);
  const sheet = templateOf(run.value, names);
  if (!sheet) throw new Error("saddle-cope has no template");
  return { sheet, results: run.value.results as SaddleCopeResults };
}

/** Depth of a drawn curve at a place round the tube, straight between its points. */
function depthAt(points: readonly (readonly [number, number])[], x: number): number {
  const after = points.findIndex((point) => point[0] >= x - 1e-9);
  const [x2, y2] = points[after] ?? [Number.NaN, Number.NaN];
  const [x1, y1] = points[Math.max(0, after - 1)] ?? [x2, y2];
  return x2 === x1 ? y2 : y1 + ((y2 - y1) * (x - x1)) / (x2 - x1);
}

function expectCurve(
  points: readonly (readonly [number, number])[],
  { curve, templateWidth }: SaddleCopeResults,
  depth: "depth" | "innerDepth",
) {
  for (const point of curve) {
    expect(depthAt(points, (templateWidth * point.around) / 360)).toBeCloseTo(point[depth], 2);
  }
}

describe("templateOf saddle-cope", () => {
  const { sheet, results } = templateFor();

  it("draws the outside and the bore at their depths from the squared end", () => {
    const layer = (name: string) => sheet.lines.find((line) => line.layer === name)?.points ?? [];
    expectCurve(layer("cut"), results, "depth");
    expectCurve(layer("inside"), results, "innerDepth");
  });

  it("is once round the tube wide, heel line to heel line", () => {
    const datums = sheet.lines.filter((line) => line.layer === "datum" && line.points[0]?.[1] === 0);
    expect(datums.map((line) => line.points[0]?.[0])).toEqual([
      0,
      expect.closeTo(Math.PI * 38.3, 9),
      expect.closeTo((Math.PI * 38.3) / 2, 9),
    ]);
  });

  it("keeps every line and label within its bounds", () => {
    const { left, right, top, bottom } = sheet.bounds;
    const places = [
      ...sheet.lines.flatMap((line) => [...line.points]),
      ...sheet.labels.map((label) => label.at),
    ];
    for (const [x, y] of places) {
      expect(x).toBeGreaterThanOrEqual(left);
      expect(x).toBeLessThanOrEqual(right);
      expect(y).toBeGreaterThanOrEqual(top);
      expect(y).toBeLessThanOrEqual(bottom);
    }
  });

  it("writes no label smaller than can be read, on the smallest tube too", () => {
    const small = templateFor({ headerOd: 10, branchOd: 8, branchWall: 1, offset: 0 }).sheet;
    expect(Math.min(...small.labels.map((label) => label.size))).toBeGreaterThanOrEqual(1.4);
  });
});

describe("templateSvg", () => {
  const { sheet, results } = templateFor();
  const text = templateSvg(sheet, names);
  const svg = new XMLParser({
    ignoreAttributes: false,
    isArray: (name) => ["g", "path", "text"].includes(name),
  }).parse(text).svg;
  const paths = (id: string): string[] =>
    svg.g
      .find((group: Record<string, string>) => group["@_id"] === id)
      .path.map((each: Record<string, string>) => each["@_d"]);
  const points = (d: string) =>
    [...d.matchAll(/[ML](\S+?) ([^ML]+)/g)].map(([, x, y]) => [Number(x), Number(y)] as const);

  it("is well-formed XML with names escaped", () => {
    expect(XMLValidator.validate(text)).toBe(true);
    expect(svg.title).toContain("Heron <1> & šedá");
  });

  it("says mm, one user unit each", () => {
    const [, , width, height] = svg["@_viewBox"].split(" ");
    expect(svg["@_width"]).toBe(`${width}mm`);
    expect(svg["@_height"]).toBe(`${height}mm`);
  });

  it("draws the curve at its depths", () => {
    expectCurve(points(paths("cut")[0] ?? ""), results, "depth");
  });

  it("draws a 100 mm and a 4 in check bar", () => {
    const lengths = paths("check").map((d) => {
      const ends = points(d);
      return Math.abs((ends.at(-1)?.[0] ?? 0) - (ends[0]?.[0] ?? 0));
    });
    expect(lengths).toContainEqual(expect.closeTo(100, 6));
    expect(lengths).toContainEqual(expect.closeTo(101.6, 6));
  });
});

describe("templateDxf, read back with dxf-parser", () => {
  const { sheet, results } = templateFor();
  const text = templateDxf(sheet, names);
  const dxf = new DxfParser().parseSync(text);
  const polylines = (dxf?.entities ?? []).filter((entity) => entity.type === "POLYLINE") as unknown as {
    layer: string;
    vertices: { x: number; y: number }[];
  }[];

  it("says R12 and mm", () => {
    expect(dxf?.header).toMatchObject({ $ACADVER: "AC1009", $INSUNITS: 4 });
  });

  it("declares each layer it uses", () => {
    const layers = Object.keys(dxf?.tables.layer.layers ?? {});
    for (const entity of dxf?.entities ?? []) expect(layers).toContain(entity.layer);
  });

  it("holds the curve as a polyline in mm, y upward", () => {
    const cut = polylines.find((line) => line.layer === "CUT");
    expectCurve(
      (cut?.vertices ?? []).map(({ x, y }) => [x, -y] as const),
      results,
      "depth",
    );
  });

  it("holds the 100 mm bar", () => {
    const lengths = polylines
      .filter((line) => line.layer === "CHECK")
      .map(({ vertices }) => Math.abs((vertices.at(-1)?.x ?? 0) - (vertices[0]?.x ?? 0)));
    expect(lengths).toContainEqual(expect.closeTo(100, 6));
  });

  it("is ASCII in CRLF lines, with the signs of the trade in its own codes", () => {
    expect(text).toMatch(/^[\x20-\x7e\r\n]*$/);
    expect(text.replaceAll("\r\n", "")).not.toMatch(/[\r\n]/);
    expect(text).toContain("90%%d SIDE");
    expect(text).toContain("Heron <1> & seda");
  });
});

import DxfParser from "dxf-parser";
import { XMLValidator } from "fast-xml-parser";
import { describe, expect, it } from "vitest";
import { mitre } from "#shared/calculators/mitre/definition.ts";
import type { MitreResults } from "#shared/calculators/mitre/formula.ts";
import { runCalculator, templateOf } from "#shared/calculators/registry.ts";
import { tubePiece } from "#shared/calculators/tube-piece/definition.ts";
import type { TubePieceResults } from "#shared/calculators/tube-piece/formula.ts";
import { templateDxf } from "#shared/templates/dxf.ts";
import type { TemplateSheet } from "#shared/templates/sheet.ts";
import { templateSvg } from "#shared/templates/svg.ts";

const names = { build: "Heron", working: "W3 Cross tube", date: "1 December 2026" };

function templateFor<Results>(id: string, inputs: object) {
  const run = runCalculator(id, inputs);
  if (!run.ok) throw new Error(run.issue.message);
  const sheet = templateOf(run.value, names);
  if (!sheet) throw new Error(`${id} has no template`);
  return { sheet, results: run.value.results as Results };
}

type Places = readonly (readonly [number, number])[];

/** The y of a drawn curve at a place along the sheet, straight between its points. */
function yAt(points: Places, x: number): number {
  const after = points.findIndex((point) => point[0] >= x - 1e-3);
  const [x2, y2] = points[after] ?? [Number.NaN, Number.NaN];
  const [x1, y1] = points[Math.max(0, after - 1)] ?? [x2, y2];
  return x2 === x1 ? y2 : y1 + ((y2 - y1) * (x - x1)) / (x2 - x1);
}

/** The cut curves of the file, by a DXF reader that is not ours; mm, y downward as on the sheet. */
function cutsReadBack(sheet: TemplateSheet): Places[] {
  const dxf = new DxfParser().parseSync(templateDxf(sheet, names));
  const lines = (dxf?.entities ?? []) as unknown as {
    layer: string;
    vertices?: { x: number; y: number }[];
  }[];
  return lines
    .filter(({ layer }) => layer === "CUT")
    .map(({ vertices = [] }) => vertices.map(({ x, y }) => [x, -y] as const));
}

function expectWithin({ bounds, lines, labels }: TemplateSheet) {
  for (const [x, y] of [...lines.flatMap((line) => [...line.points]), ...labels.map((label) => label.at)]) {
    expect(x).toBeGreaterThanOrEqual(bounds.left);
    expect(x).toBeLessThanOrEqual(bounds.right);
    expect(y).toBeGreaterThanOrEqual(bounds.top);
    expect(y).toBeLessThanOrEqual(bounds.bottom);
  }
}

describe("templateOf mitre", () => {
  const { sheet, results } = templateFor<MitreResults>("mitre", { od: 44.5, wall: 2.5, turn: 75 });

  it("gives the depths r·(1 + cos φ)·tan(turn/2) once round the tube, read back from the DXF", () => {
    const [cut = []] = cutsReadBack(sheet);
    for (const around of [0, 30, 90, 135, 180, 300]) {
      const depth = 22.25 * (1 + Math.cos((around * Math.PI) / 180)) * Math.tan((37.5 * Math.PI) / 180);
      expect(yAt(cut, (Math.PI * 44.6 * around) / 360)).toBeCloseTo(depth, 2);
    }
    expect(cut.at(-1)?.[0]).toBeCloseTo(results.templateWidth, 3);
  });

  it("keeps every line and label within its bounds, and is well-formed SVG", () => {
    expectWithin(sheet);
    expect(XMLValidator.validate(templateSvg(sheet, names))).toBe(true);
  });
});

const saddle = { kind: "saddle", headerOd: 44.5 };
const piece = { between: 600, branchOd: 38.1, branchWall: 2.5, clock: 50 };

describe("templateOf tube-piece", () => {
  const { sheet, results } = templateFor<TubePieceResults>("tube-piece", {
    ...piece,
    ends: [
      { ...saddle, angle: 60 },
      { ...saddle, angle: 75, offset: 2 },
    ],
  });

  it("draws both cuts from the one datum, A downward from its squared end and B upward from its own", () => {
    const [a = [], b = []] = cutsReadBack(sheet);
    const squaredB = sheet.bounds.bottom - 6;
    for (const point of results.strip.curve) {
      const x = (results.strip.width * point.around) / 360;
      expect(yAt(a, x)).toBeCloseTo(point.a, 1);
      expect(squaredB - yAt(b, x)).toBeCloseTo(results.tipToTip - point.b, 1);
    }
  });

  it("marks B's heel where the clock puts it", () => {
    const heel = (Math.PI * 38.2 * 50) / 360;
    const datums = sheet.lines.filter((line) => line.layer === "datum").map((line) => line.points[0]?.[0]);
    expect(datums).toContainEqual(expect.closeTo(heel, 6));
    expect(sheet.labels.find(({ text }) => text === "B HEEL")?.at[0]).toBeCloseTo(heel + 1.2, 6);
  });

  it("tells how far apart the squared ends go and which to cut first", () => {
    expect(sheet.instructions.join(" ")).toContain(`${results.tipToTip.toFixed(1)} mm apart`);
    expect(sheet.instructions.join(" ")).toContain(`end ${results.hardEnd} first`);
  });

  it.each([
    { ...piece, ends: [{ kind: "square" }, { kind: "mitre", turn: 120 }], clock: -90 },
    { between: 60, branchOd: 8, branchWall: 1, ends: [{ kind: "square" }, { kind: "square" }] },
  ])("keeps every line and label of %o within its bounds", (inputs) => {
    expectWithin(templateFor("tube-piece", inputs).sheet);
  });
});

describe("steps", () => {
  it("of a tube piece fill in its lengths, the hard end first", () => {
    const { results } = templateFor<TubePieceResults>("tube-piece", tubePiece.example);
    const parsed = tubePiece.inputs.parse(tubePiece.example);
    const steps = tubePiece.steps?.(parsed, results, (length) => `${length.toFixed(1)} mm`) ?? [];
    expect(steps[0]).toContain(`${results.roughCut.toFixed(1)} mm`);
    expect(steps[2]).toContain("29.9 mm round the tube, counter-clockwise");
    expect(steps[3]).toContain("Cut end A first, the hard one");
  });

  it("of a mitre fill in the depths", () => {
    const { results } = templateFor<MitreResults>("mitre", mitre.example);
    const steps =
      mitre.steps?.(mitre.inputs.parse(mitre.example), results, (length) => length.toFixed(1)) ?? [];
    expect(steps.join(" ")).toContain("heel 44.5, both sides");
  });
});

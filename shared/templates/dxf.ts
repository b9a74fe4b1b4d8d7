import { withCheckBars } from "./check-bars.ts";
import type { Layer, SheetLabel, SheetLine, TemplateNames, TemplateSheet } from "./sheet.ts";

/** Colour numbers of the DXF reference: 7 is black or white, 8 grey, 5 blue, 3 green. */
const colours: Record<Layer | "text", number> = {
  cut: 7,
  inside: 8,
  datum: 5,
  guide: 8,
  edge: 8,
  check: 3,
  text: 7,
};

type Group = [code: number, value: string | number];

/**
 * Writes a template as DXF R12 (AC1009), the dialect that every reader takes: POLYLINE with VERTEX, LINE and TEXT, in mm,
 * y upward.
 *
 * R12 has no header variable for units that all readers honour, so the file says mm in a comment, in $INSUNITS (4) and
 * in the 100 mm check bar.
 */
export function templateDxf(sheet: TemplateSheet, names: TemplateNames): string {
  const { bounds, lines, labels } = withCheckBars(sheet);
  const groups: Group[] = [
    [999, plainText(`${names.build}: ${names.working}, ${names.date}. Units: mm`)],
    ...section("HEADER", [
      [9, "$ACADVER"],
      [1, "AC1009"],
      [9, "$INSUNITS"],
      [70, 4],
      [9, "$EXTMIN"],
      ...place(bounds.left, bounds.bottom),
      [9, "$EXTMAX"],
      ...place(bounds.right, bounds.top),
    ]),
    ...section("TABLES", [...lineTypes(), ...layers()]),
    ...section("BLOCKS", []),
    ...section("ENTITIES", [...lines.flatMap(polyline), ...labels.flatMap(text)]),
    [0, "EOF"],
  ];
  return groups.map(([code, value]) => `${String(code).padStart(3)}\r\n${value}\r\n`).join("");
}

function section(name: string, groups: Group[]): Group[] {
  return [[0, "SECTION"], [2, name], ...groups, [0, "ENDSEC"]];
}

function place(x: number, y: number, offset = 0): Group[] {
  return [
    [10 + offset, number(x)],
    [20 + offset, number(0 - y)],
    [30 + offset, "0.0"],
  ];
}

function lineTypes(): Group[] {
  return [
    [0, "TABLE"],
    [2, "LTYPE"],
    [70, 1],
    [0, "LTYPE"],
    [2, "CONTINUOUS"],
    [70, 64],
    [3, "Solid line"],
    [72, 65],
    [73, 0],
    [40, "0.0"],
    [0, "ENDTAB"],
  ];
}

function layers(): Group[] {
  const entries = Object.entries(colours).flatMap(([name, colour]): Group[] => [
    [0, "LAYER"],
    [2, name.toUpperCase()],
    [70, 0],
    [62, colour],
    [6, "CONTINUOUS"],
  ]);
  return [[0, "TABLE"], [2, "LAYER"], [70, Object.keys(colours).length], ...entries, [0, "ENDTAB"]];
}

function polyline({ layer, points }: SheetLine): Group[] {
  const name = layer.toUpperCase();
  return [
    [0, "POLYLINE"],
    [8, name],
    [66, 1],
    ...place(0, 0),
    [70, 0],
    ...points.flatMap(([x, y]): Group[] => [[0, "VERTEX"], [8, name], ...place(x, y)]),
    [0, "SEQEND"],
    [8, name],
  ];
}

const justified = { start: 0, middle: 1, end: 2 } as const;

function text({ at: [x, y], size, anchor, text: words }: SheetLabel): Group[] {
  // DXF measures capitals, the sheet the em: capitals are about 0.7 of it.
  const lines: Group[] = [
    [0, "TEXT"],
    [8, "TEXT"],
    ...place(x, y),
    [40, number(size * 0.7)],
    [1, plainText(words)],
  ];
  return anchor === "start" ? lines : [...lines, [72, justified[anchor]], ...place(x, y, 1)];
}

function number(value: number): string {
  const rounded = value.toFixed(4).replace(/0+$/, "0");
  return rounded.startsWith("-0.0") && Number(rounded) === 0 ? "0.0" : rounded;
}

/** R12 text is ASCII: signs of the trade get its codes, accents are taken off, the rest becomes a question mark. */
function plainText(words: string): string {
  return words
    .replaceAll("°", "%%d")
    .replaceAll("⌀", "%%c")
    .replaceAll("×", "x")
    .replaceAll("·", "-")
    .replace(/[–—−]/g, "-")
    .normalize("NFKD")
    .replace(/\p{Mark}/gu, "")
    .replace(/[\r\n\t]/g, " ")
    .replace(/[^\x20-\x7e]/g, "?");
}

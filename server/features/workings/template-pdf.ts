import PDFDocument from "pdfkit";
import { checkBars } from "#shared/templates/check-bars.ts";
import type { Layer, SheetLabel, SheetLine } from "#shared/templates/sheet.ts";
import type { Tile } from "#shared/templates/tiling.ts";
import type { PrintedSheet } from "./printed-sheet.ts";
import { templateFonts } from "./template-fonts.ts";
import { drawFoot, drawHead, drawNeighbours } from "./template-pdf-frame.ts";
import { write } from "./template-pdf-text.ts";

/** 1 mm in PDF points (ISO 32000-1, 8.3.2.3: 72 to the inch). */
const point = 72 / 25.4;

const pens: Record<Layer, { colour: string; width: number; dash?: [number, number] }> = {
  cut: { colour: "#000000", width: 0.35 },
  inside: { colour: "#666666", width: 0.2, dash: [2, 1.2] },
  datum: { colour: "#1c5787", width: 0.3 },
  guide: { colour: "#777777", width: 0.15, dash: [3, 1.5] },
  edge: { colour: "#333333", width: 0.15 },
  check: { colour: "#000000", width: 0.2 },
};

/**
 * Draws a template sheet on its pages at exactly 1:1, each page with names, facts, check bars and cautions.
 * Viewers are told not to scale (ISO 32000-1, table 150: PrintScaling None); the bars are there because some do.
 */
export function templatePdf(printed: PrintedSheet): Promise<Buffer> {
  const { tiling, names } = printed;
  const doc = new PDFDocument({
    autoFirstPage: false,
    margin: 0,
    info: { Title: `${names.build}: ${names.working}`, Subject: printed.heading, Creator: "Soapstone" },
  });
  for (const { name, data } of templateFonts) doc.registerFont(name, data);
  // pdfkit has no option for it; the document catalogue is where the standard puts it.
  Object.assign(catalogue(doc), { ViewerPreferences: doc.ref({ PrintScaling: "None" }) });
  const finished = collect(doc);
  for (const tile of tiling.tiles) drawPage(doc, printed, tile);
  doc.end();
  return finished;
}

function catalogue(doc: PDFKit.PDFDocument): object {
  return (doc as unknown as { _root: { data: object } })._root.data;
}

function collect(doc: PDFKit.PDFDocument): Promise<Buffer> {
  const chunks: Buffer[] = [];
  return new Promise((resolve, reject) => {
    doc.on("data", (chunk: Buffer) => chunks.push(chunk));
    doc.on("end", () => resolve(Buffer.concat(chunks)));
    doc.on("error", reject);
  });
}

function drawPage(doc: PDFKit.PDFDocument, printed: PrintedSheet, tile: Tile): void {
  const { page, window, marks, tiles } = printed.tiling;
  doc.addPage({ size: [page.width * point, page.height * point], margin: 0 });
  doc.scale(point);
  drawHead(doc, printed, tile);
  doc.save();
  doc.rect(window.x, window.y, window.width, window.height).clip();
  doc.translate(window.x - tile.x, window.y - tile.y);
  for (const line of printed.sheet.lines) drawLine(doc, line);
  for (const label of printed.sheet.labels) drawLabel(doc, label);
  for (const [x, y] of marks) drawMark(doc, x, y);
  doc.restore();
  if (tiles.length > 1) drawNeighbours(doc, printed.tiling, tile);
  const bars = checkBars(drawFoot(doc, printed, tile));
  for (const line of bars.lines) drawLine(doc, line);
  for (const label of bars.labels) drawLabel(doc, label);
}

function drawLine(doc: PDFKit.PDFDocument, { layer, points }: SheetLine): void {
  const pen = pens[layer];
  for (const [index, [x, y]] of points.entries()) {
    if (index === 0) doc.moveTo(x, y);
    else doc.lineTo(x, y);
  }
  doc.lineWidth(pen.width).lineJoin("round").strokeColor(pen.colour);
  if (pen.dash) doc.dash(pen.dash[0], { space: pen.dash[1] });
  else doc.undash();
  doc.stroke();
}

function drawLabel(doc: PDFKit.PDFDocument, { at: [x, y], text, size, anchor }: SheetLabel): void {
  write(doc, text, { x, baseline: y, size, face: "text", anchor });
}

/** Alignment cross in a ring: on both pages of a seam, to be laid one over the other. */
function drawMark(doc: PDFKit.PDFDocument, x: number, y: number): void {
  doc.undash().lineWidth(0.2).strokeColor("#1c5787");
  doc
    .moveTo(x - 4, y)
    .lineTo(x + 4, y)
    .moveTo(x, y - 4)
    .lineTo(x, y + 4)
    .stroke();
  doc.circle(x, y, 2).stroke();
}

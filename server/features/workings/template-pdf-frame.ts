import type { Point } from "#shared/templates/sheet.ts";
import { footHeight, pageMargin, type Tile, type Tiling } from "#shared/templates/tiling.ts";
import type { PrintedSheet } from "./printed-sheet.ts";
import { write, writeParagraph } from "./template-pdf-text.ts";

const soft = "#555555";

/** Build, working, date and facts over a rule, alike on every page so that a stray one can be told. */
export function drawHead(
  doc: PDFKit.PDFDocument,
  { sheet, tiling, names, heading }: PrintedSheet,
  tile: Tile,
): void {
  const [left, right] = [pageMargin, tiling.page.width - pageMargin];
  const room = right - left;
  write(doc, `${heading} · wrap template · full size`, {
    x: left,
    baseline: pageMargin + 3,
    size: 3.1,
    face: "text",
    colour: soft,
  });
  write(doc, `Sheet ${tile.page} of ${tiling.tiles.length}`, {
    x: right,
    baseline: pageMargin + 3,
    size: 3.1,
    face: "figures",
    anchor: "end",
    colour: soft,
  });
  write(doc, names.working, {
    x: left,
    baseline: pageMargin + 11.5,
    size: 7,
    face: "strong",
    room: room - 2,
  });
  write(doc, names.build, { x: left, baseline: pageMargin + 17, size: 4, face: "text", room: room - 40 });
  write(doc, names.date, { x: right, baseline: pageMargin + 17, size: 3.4, face: "figures", anchor: "end" });
  drawFacts(doc, sheet.facts, { left, right, top: pageMargin + 20 });
}

function drawFacts(
  doc: PDFKit.PDFDocument,
  facts: PrintedSheet["sheet"]["facts"],
  { left, right, top }: { left: number; right: number; top: number },
): void {
  doc.undash().lineWidth(0.5).strokeColor("#111111").moveTo(left, top).lineTo(right, top).stroke();
  const cell = (right - left) / facts.length;
  for (const [index, { label, value }] of facts.entries()) {
    const x = left + cell * index;
    write(doc, label, {
      x: x + (index === 0 ? 0 : 1.6),
      baseline: top + 4,
      size: 2.6,
      face: "text",
      colour: soft,
      room: cell - 3,
    });
    write(doc, value, {
      x: x + (index === 0 ? 0 : 1.6),
      baseline: top + 8.6,
      size: 3.4,
      face: "figures",
      room: cell - 3,
    });
    if (index > 0)
      doc
        .lineWidth(0.15)
        .strokeColor("#999999")
        .moveTo(x, top + 1.5)
        .lineTo(x, top + 9.5)
        .stroke();
  }
  doc
    .lineWidth(0.2)
    .strokeColor("#111111")
    .moveTo(left, top + 11)
    .lineTo(right, top + 11)
    .stroke();
}

/**
 * How to lay it on, the cautions, and what the check bars are for.
 *
 * @returns where the metric bar begins
 */
export function drawFoot(
  doc: PDFKit.PDFDocument,
  { sheet, tiling, cautions }: PrintedSheet,
  tile: Tile,
): Point {
  const [left, right] = [pageMargin, tiling.page.width - pageMargin];
  const top = tiling.page.height - pageMargin - footHeight + 6;
  doc.undash().lineWidth(0.2).strokeColor("#111111").moveTo(left, top).lineTo(right, top).stroke();
  const column = left + 119;
  write(doc, "Print at 100 %, not “fit to page”. Measure the bar before you cut.", {
    x: left,
    baseline: top + 5,
    size: 3.1,
    face: "strong",
    room: 115,
  });
  const seams =
    tiling.tiles.length > 1 && tile.page === 1
      ? ["Lay the ringed crosses of two sheets over each other, then tape."]
      : [];
  let below = top + 2;
  for (const words of [...sheet.instructions, ...seams]) {
    below +=
      writeParagraph(doc, words, { x: column, top: below, width: right - column, size: 2.7, face: "text" }) +
      0.7;
  }
  const strip = `Caution. ${cautions.join(" ")}`;
  writeParagraph(doc, strip, { x: left, top: top + 26, width: right - left, size: 2.5, face: "text" });
  return [left + 0.5, top + 12];
}

/** Which sheet joins at which side, in the gap between the drawing and the page's edge. */
export function drawNeighbours(doc: PDFKit.PDFDocument, { window }: Tiling, { neighbours }: Tile): void {
  const middle = { x: window.x + window.width / 2, y: window.y + window.height / 2 };
  const sides = [
    [neighbours.left, window.x - 2, middle.y, -90],
    [neighbours.right, window.x + window.width + 2, middle.y, 90],
    [neighbours.up, middle.x, window.y - 1.6, 0],
    [neighbours.down, middle.x, window.y + window.height + 3.6, 0],
  ] as const;
  for (const [page, x, y, turn] of sides) {
    if (page === undefined) continue;
    doc.save().rotate(turn, { origin: [x, y] });
    write(doc, `joins sheet ${page}`, {
      x,
      baseline: y,
      size: 2.7,
      face: "figures",
      anchor: "middle",
      colour: "#1c5787",
    });
    doc.restore();
  }
  doc.lineWidth(0.15).strokeColor("#1c5787").dash(0.6, { space: 1.2 });
  doc.rect(window.x, window.y, window.width, window.height).stroke().undash();
}

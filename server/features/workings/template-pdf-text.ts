import { type Face, fontFor } from "./template-fonts.ts";

interface Writing {
  x: number;
  baseline: number;
  /** Em height, mm. */
  size: number;
  face: Face;
  anchor?: "start" | "middle" | "end";
  colour?: string;
  /** Shrinks the text to this width, mm. */
  room?: number;
}

/** Writes one line of text on its baseline; the page's unit is mm. */
export function write(doc: PDFKit.PDFDocument, text: string, writing: Writing): void {
  const { x, baseline, size, face, anchor = "start", colour = "#111111", room } = writing;
  doc.font(fontFor(face, text)).fontSize(size);
  const natural = doc.widthOfString(text);
  const fitted = room !== undefined && natural > room ? (size * room) / natural : size;
  const width = (natural * fitted) / size;
  const left = anchor === "start" ? x : anchor === "middle" ? x - width / 2 : x - width;
  doc
    .fontSize(fitted)
    .fillColor(colour)
    .text(text, left, baseline, { baseline: "alphabetic", lineBreak: false });
}

/** Writes a paragraph within a width, and answers the height it took, mm. */
export function writeParagraph(
  doc: PDFKit.PDFDocument,
  text: string,
  { x, top, width, size, face }: { x: number; top: number; width: number; size: number; face: Face },
): number {
  doc.font(fontFor(face, text)).fontSize(size).fillColor("#111111");
  const height = doc.heightOfString(text, { width });
  // Given a height, pdfkit never breaks to a page of its own.
  doc.text(text, x, top, { width, height: height + size });
  return height;
}

import { readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";

/**
 * Fonts of the printed sheet. WOFF rather than WOFF2: pdfkit embeds blank glyphs from the latter.
 * The wide fallback has Latin, Greek, Cyrillic and more, so that a build of almost any name prints.
 */
const files = {
  text: "@fontsource/archivo/files/archivo-latin-400-normal.woff",
  strong: "@fontsource/archivo/files/archivo-latin-700-normal.woff",
  figures: "@fontsource/red-hat-mono/files/red-hat-mono-latin-500-normal.woff",
  wide: "dejavu-fonts-ttf/ttf/DejaVuSansCondensed.ttf",
  wideStrong: "dejavu-fonts-ttf/ttf/DejaVuSansCondensed-Bold.ttf",
} as const;

export type FontName = keyof typeof files;
export type Face = "text" | "strong" | "figures";

/** The files as pdfkit registers them, read once. */
export const templateFonts: readonly { name: FontName; data: Buffer }[] = Object.entries(files).map(
  ([name, file]) => ({
    name: name as FontName,
    data: readFileSync(fileURLToPath(import.meta.resolve(file))),
  }),
);

/** Basic Latin, Latin-1 and the dashes and quotes that the Latin subsets hold. */
const latin = /^[\u0020-\u007e\u00a0-\u00ff\u2013\u2014\u2018\u2019\u201c\u201d\u2026\u2212]*$/;

/** The font for this text: the face itself, or the wide one for the whole text, so that a word is never of two. */
export function fontFor(face: Face, text: string): FontName {
  if (latin.test(text)) return face;
  return face === "strong" ? "wideStrong" : "wide";
}

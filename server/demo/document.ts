import { v5 as uuidFrom } from "uuid";
import type { DocumentNode } from "#shared/document/types.ts";
import type { PhotoName } from "./photos.ts";

/** Words in a paragraph: plain, or with a mark on them. */
export type Inline = string | DocumentNode;

const namespace = "5b0f6a52-8d7c-4c4e-9a39-6f2f6f0c3b11";

/** The same id for the same key on every load, so that a reset brings back the same demo. */
export const workingId = (key: string): string => uuidFrom(key, namespace);

const inline = (words: readonly Inline[]): DocumentNode[] =>
  words.map((word) => (typeof word === "string" ? { type: "text", text: word } : word));

export const p = (...words: Inline[]): DocumentNode => ({ type: "paragraph", content: inline(words) });

export const b = (text: string): DocumentNode => ({ type: "text", text, marks: [{ type: "bold" }] });

export const i = (text: string): DocumentNode => ({ type: "text", text, marks: [{ type: "italic" }] });

/** A link to an entry of the demo, by the slugs of its build and itself. */
export const entryLink = (text: string, build: string, entry: string): DocumentNode => ({
  type: "text",
  text,
  marks: [{ type: "link", attrs: { href: `/builds/${build}/entries/${entry}` } }],
});

export const h2 = (text: string): DocumentNode => heading(2, text);
export const h3 = (text: string): DocumentNode => heading(3, text);

const heading = (level: 2 | 3, text: string): DocumentNode => ({
  type: "heading",
  attrs: { level },
  content: inline([text]),
});

const items = (lines: readonly (Inline | Inline[])[]): DocumentNode[] =>
  lines.map((line) => ({ type: "listItem", content: [p(...(Array.isArray(line) ? line : [line]))] }));

export const list = (...lines: (Inline | Inline[])[]): DocumentNode => ({
  type: "bulletList",
  content: items(lines),
});

export const steps = (...lines: (Inline | Inline[])[]): DocumentNode => ({
  type: "orderedList",
  attrs: { start: 1 },
  content: items(lines),
});

export const quote = (...words: Inline[]): DocumentNode => ({ type: "blockquote", content: [p(...words)] });

export const caution = (...words: Inline[]): DocumentNode => ({ type: "caution", content: [p(...words)] });

/** A table whose first row is its head. */
export function table(head: readonly string[], ...rows: readonly string[][]): DocumentNode {
  const cells = (type: "tableHeader" | "tableCell", texts: readonly string[]) =>
    texts.map((text) => ({ type, attrs: { colspan: 1, rowspan: 1, colwidth: null }, content: [p(text)] }));
  return {
    type: "table",
    content: [
      { type: "tableRow", content: cells("tableHeader", head) },
      ...rows.map((row) => ({ type: "tableRow", content: cells("tableCell", row) })),
    ],
  };
}

/** A photo by its name in `photos.ts`: the loader puts the stored photo's id and description in. */
export const photo = (name: PhotoName, caption: string): DocumentNode => ({
  type: "photo",
  attrs: { photoId: name, alt: "", caption },
});

export const photos = (...group: DocumentNode[]): DocumentNode => ({ type: "photoGroup", content: group });

/** A working: `key` names it among all of the demo, for the figures quoted in the prose. */
export const working = (
  key: string,
  calculator: string,
  title: string,
  inputs: Record<string, unknown>,
): DocumentNode => ({
  type: "working",
  attrs: { workingId: workingId(key), calculator, title, inputs },
});

import type { DocumentJson } from "#shared/contracts/entries.ts";
import type { DocumentNode, PhotoAttributes, RichDocument, WorkingAttributes } from "./types.ts";

/** A new entry: one empty paragraph. */
export const emptyDocument: RichDocument = { type: "doc", content: [{ type: "paragraph" }] };

const inline = new Set(["text", "hardBreak"]);

/**
 * The words of a validated document, a line for each block, with captions and titles of workings.
 * For summaries, feeds and searching.
 */
export function plainText(document: DocumentJson): string {
  const lines: string[] = [];
  for (const node of nodesIn(document as RichDocument)) {
    if (node.content?.some((child) => inline.has(child.type))) lines.push(lineOf(node.content));
    if (node.type === "photo" && node.attrs?.caption) lines.push(String(node.attrs.caption));
    if (node.type === "working" && node.attrs?.title) lines.push(String(node.attrs.title));
  }
  return lines.join("\n");
}

/** Words in a validated document, as a reader would count them: runs of characters that hold a letter or a digit. */
export function countWords(document: DocumentJson): number {
  return plainText(document).match(/\S*[\p{L}\p{N}]\S*/gu)?.length ?? 0;
}

/** The photos of a validated document in reading order, those in groups included. */
export function photosIn(document: DocumentJson): PhotoAttributes[] {
  return nodesIn(document as RichDocument)
    .filter((node) => node.type === "photo")
    .map(({ attrs = {} }) => ({
      photoId: String(attrs.photoId),
      alt: typeof attrs.alt === "string" ? attrs.alt : null,
      caption: typeof attrs.caption === "string" ? attrs.caption : "",
    }));
}

/** The workings of a validated document in reading order. */
export function workingsIn(document: DocumentJson): WorkingAttributes[] {
  return nodesIn(document as RichDocument)
    .filter((node) => node.type === "working")
    .map(({ attrs = {} }) => ({
      workingId: String(attrs.workingId),
      calculator: String(attrs.calculator),
      title: typeof attrs.title === "string" ? attrs.title : "",
      inputs: { ...(attrs.inputs as Record<string, unknown>) },
    }));
}

function nodesIn(parent: { content?: DocumentNode[] }): DocumentNode[] {
  return (parent.content ?? []).flatMap((node) => [node, ...nodesIn(node)]);
}

function lineOf(content: DocumentNode[]): string {
  return content.map((child) => (child.type === "hardBreak" ? " " : (child.text ?? ""))).join("");
}

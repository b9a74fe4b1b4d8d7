import { Node } from "@tiptap/pm/model";
import type { z } from "zod";
import { fail, ok, type Result } from "#shared/result.ts";
import { markAttributes, nodeAttributes, nodeOutline } from "./attributes.ts";
import { sizeProblem } from "./limits.ts";
import { documentSchema } from "./schema.ts";
import type { RichDocument } from "./types.ts";

/** Why a document was refused, in words for the person who wrote it. */
export interface DocumentIssue {
  message: string;
}

/**
 * Checks a document from outside: its size first, then its structure against the ProseMirror schema, then every
 * attribute and mark. ProseMirror alone would take a heading of level 9 and a `javascript:` link.
 *
 * @returns the document in its normal form (defaults filled in, nothing else in it); the first fault found otherwise
 */
export function validateDocument(json: unknown): Result<RichDocument, DocumentIssue> {
  const tooMuch = sizeProblem(json);
  if (tooMuch) return fail({ message: tooMuch });
  const structure = parseStructure(json);
  if (!structure.ok) return structure;
  const problem = attributeProblem(json);
  if (problem) return fail({ message: problem });
  return ok(structure.value);
}

function parseStructure(json: unknown): Result<RichDocument, DocumentIssue> {
  try {
    const node = Node.fromJSON(documentSchema(), json);
    if (node.type.name !== "doc") return fail({ message: "This is a part of an entry, not a whole one." });
    node.check();
    return ok(node.toJSON() as RichDocument);
  } catch (error) {
    const detail = error instanceof Error ? error.message : "";
    return fail({ message: `The entry holds something this site does not keep. ${detail}`.trim() });
  }
}

function attributeProblem(json: unknown): string | null {
  const waiting: unknown[] = [json];
  const workings = new Set<unknown>();
  for (let next = waiting.pop(); next !== undefined; next = waiting.pop()) {
    const outline = nodeOutline.safeParse(next);
    if (!outline.success) return `A block has something in it that does not belong. ${firstMessage(outline)}`;
    const { type, attrs, marks = [], content = [] } = outline.data;
    const problem =
      checked(nodeAttributes, type, attrs) ??
      marks.map((mark) => checked(markAttributes, mark.type, mark.attrs)).find((found) => found !== null);
    if (problem) return problem;
    if (type === "working") {
      const { workingId } = attrs as { workingId: string };
      if (workings.has(workingId)) return "The same working stands in this entry twice. Give one its own id.";
      workings.add(workingId);
    }
    for (const child of content) waiting.push(child);
  }
  return null;
}

function checked(known: Readonly<Record<string, z.ZodType>>, type: string, attrs: unknown): string | null {
  const schema = Object.hasOwn(known, type) ? known[type] : undefined;
  if (!schema) return `There is no "${type}" in an entry.`;
  const parsed = schema.safeParse(attrs ?? undefined);
  return parsed.success ? null : firstMessage(parsed);
}

function firstMessage(parsed: { error?: z.ZodError }): string {
  return parsed.error?.issues[0]?.message ?? "";
}

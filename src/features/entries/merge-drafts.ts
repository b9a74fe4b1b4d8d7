import { diff3Merge } from "node-diff3";
import { emptyDocument } from "#shared/document/read.ts";
import type { DocumentNode, RichDocument } from "#shared/document/types.ts";
import type { DraftContent } from "./draft-content.ts";

/** The lines that stand round two versions of the same part; an entry that still holds one is not ready for readers. */
export const mergeMarks = {
  mine: "▼ Two versions. Written here:",
  theirs: "▼ Written in the other copy:",
  end: "▲ End of the two versions. Keep what is right and delete these lines.",
} as const;

export interface MergedDraft {
  content: DraftContent;
  /** How many parts both sides had changed; both versions of each stand in the document, marked. */
  conflicts: number;
}

/**
 * Puts two changed copies of a draft together, block by block. A part changed on one side only is taken from there;
 * a part changed on both sides is kept in both versions, with marks round them. Nothing that either side wrote is lost.
 *
 * @param newId makes an id for a working that would stand in the entry twice
 */
export function mergeDrafts(
  base: DraftContent,
  mine: DraftContent,
  theirs: DraftContent,
  newId: () => string,
): MergedDraft {
  const lines = (["title", "summary"] as const).map((field) => mergeLine(field, base, mine, theirs));
  const body = mergeBlocks(base.document, mine.document, theirs.document);
  const [title, summary] = lines.map((line) => line.value);
  const blocks = withOwnWorkingIds([...lines.flatMap((line) => line.kept), ...body.blocks], newId);
  const content = {
    title: title ?? mine.title,
    summary: summary ?? mine.summary,
    stageId: mine.stageId === base.stageId ? theirs.stageId : mine.stageId,
    document: blocks.length > 0 ? { type: "doc" as const, content: blocks } : emptyDocument,
  };
  return { content, conflicts: body.conflicts + lines.filter((line) => line.kept.length > 0).length };
}

/** Whether an entry still holds two versions of a part. */
export function hasMergeMarks(document: RichDocument): boolean {
  const marks: readonly string[] = Object.values(mergeMarks);
  return document.content.some((block) => marks.includes(block.content?.[0]?.text ?? ""));
}

function mergeLine(
  field: "title" | "summary",
  base: DraftContent,
  mine: DraftContent,
  theirs: DraftContent,
): { value: string; kept: DocumentNode[] } {
  if (mine[field] === theirs[field] || theirs[field] === base[field]) return { value: mine[field], kept: [] };
  if (mine[field] === base[field]) return { value: theirs[field], kept: [] };
  const kept = theirs[field].trim() === "" ? [] : [note(`The other copy's ${field}: ${theirs[field]}`)];
  return { value: mine[field], kept };
}

function mergeBlocks(base: RichDocument, mine: RichDocument, theirs: RichDocument) {
  const regions = diff3Merge(keysOf(mine), keysOf(base), keysOf(theirs), { excludeFalseConflicts: true });
  const blocks: DocumentNode[] = [];
  let conflicts = 0;
  for (const region of regions) {
    if (region.ok) blocks.push(...blocksOf(region.ok));
    if (!region.conflict) continue;
    for (const { mine: here, theirs: there } of versionsOf(region.conflict)) {
      const two = here.length > 0 && there.length > 0 && here.join() !== there.join();
      if (two) conflicts += 1;
      blocks.push(...(two ? marked(here, there) : blocksOf(here.length > 0 ? here : there)));
    }
  }
  return { blocks, conflicts };
}

interface Versions {
  mine: string[];
  theirs: string[];
}

/**
 * A conflict as its parts. Where no block came or went they pair off, so that neighbours changed on different sides
 * are no conflict; where one side deleted what the other rewrote, the words win over their absence.
 */
function versionsOf({ a, o, b }: { a: string[]; o: string[]; b: string[] }): Versions[] {
  if (a.length !== o.length || b.length !== o.length) return [{ mine: a, theirs: b }];
  return o.map((before, index) => {
    const [mine = before, theirs = before] = [a[index], b[index]];
    if (theirs === before) return { mine: [mine], theirs: [] };
    return { mine: mine === before ? [] : [mine], theirs: [theirs] };
  });
}

function marked(mine: string[], theirs: string[]): DocumentNode[] {
  return [
    note(mergeMarks.mine),
    ...blocksOf(mine),
    note(mergeMarks.theirs),
    ...blocksOf(theirs),
    note(mergeMarks.end),
  ];
}

/** Blocks are told apart by all that is in them. */
function keysOf(document: RichDocument): string[] {
  return document.content.map((block) => JSON.stringify(block));
}

function blocksOf(keys: string[]): DocumentNode[] {
  return keys.map((key) => JSON.parse(key) as DocumentNode);
}

function note(text: string): DocumentNode {
  return { type: "paragraph", content: [{ type: "text", marks: [{ type: "bold" }], text }] };
}

function withOwnWorkingIds(blocks: DocumentNode[], newId: () => string): DocumentNode[] {
  const seen = new Set<unknown>();
  return blocks.map((block) => {
    if (block.type !== "working") return block;
    const workingId = seen.has(block.attrs?.workingId) ? newId() : block.attrs?.workingId;
    seen.add(workingId);
    return { ...block, attrs: { ...block.attrs, workingId } };
  });
}

import type { EntryDraft } from "#shared/contracts/entries.ts";
import type { RichDocument } from "#shared/document/types.ts";

/** What the builder writes: the part of a draft that is saved, merged and kept in the browser. */
export interface DraftContent {
  title: string;
  summary: string;
  stageId: string;
  document: RichDocument;
}

/** A draft as it stood at one version of the server. */
export interface DraftBase {
  version: number;
  content: DraftContent;
}

export function contentOf(draft: EntryDraft): DraftContent {
  const { title, summary, stageId, document } = draft;
  // The server keeps only documents that `validateDocument` passed.
  return { title, summary, stageId, document: document as RichDocument };
}

export function baseOf(draft: EntryDraft): DraftBase {
  return { version: draft.version, content: contentOf(draft) };
}

/** Title and summary are compared as the server keeps them: without space at their ends. */
export function sameContent(a: DraftContent, b: DraftContent): boolean {
  return (
    a.title.trim() === b.title.trim() &&
    a.summary.trim() === b.summary.trim() &&
    a.stageId === b.stageId &&
    JSON.stringify(a.document) === JSON.stringify(b.document)
  );
}

import { photosIn, plainText, workingsIn } from "#shared/document/read.ts";
import type { DraftContent } from "./draft-content.ts";
import { hasMergeMarks } from "./merge-drafts.ts";

/** What an entry still lacks before readers may have it, in words for its builder. The server asks the same. */
export function beforePublishing({ title, document }: DraftContent): string[] {
  const photos = photosIn(document);
  const untold = photos.filter(({ alt }) => alt === null).length;
  const empty = plainText(document).trim() === "" && photos.length === 0 && workingsIn(document).length === 0;
  return [
    title.trim() === "" && "Give it a title.",
    empty && "Write something: the entry is empty.",
    untold === 1 && "One photo has no description. Say what it shows, or mark it as decoration.",
    untold > 1 && `${untold} photos have no description. Say what they show, or mark them as decoration.`,
    hasMergeMarks(document) &&
      "A part stands in two versions. Keep what is right and delete the lines with ▼ and ▲.",
  ].filter((line) => line !== false);
}

import { diffComm } from "node-diff3";
import { plainText } from "#shared/document/read.ts";
import type { RichDocument } from "#shared/document/types.ts";

/** A run of words that stayed, went or came. */
export interface WordRun {
  kind: "same" | "gone" | "new";
  text: string;
}

/** A line of text; unchanged lines are one run. */
export type ComparedLine = WordRun[];

/**
 * Compares two documents line by line, and word by word where a line was changed. Workings and photos are compared by
 * their titles and captions alone.
 */
export function compareTexts(before: RichDocument, after: RichDocument): ComparedLine[] {
  const regions = diffComm(plainText(before).split("\n"), plainText(after).split("\n"));
  return regions.flatMap(({ common, buffer1, buffer2 }) => {
    if (common) return common.map((text): ComparedLine => [{ kind: "same", text }]);
    const gone = buffer1 ?? [];
    const fresh = buffer2 ?? [];
    return Array.from({ length: Math.max(gone.length, fresh.length) }, (_, index) =>
      compareLine(gone[index], fresh[index]),
    );
  });
}

function compareLine(gone: string | undefined, fresh: string | undefined): ComparedLine {
  if (gone === undefined) return [{ kind: "new", text: fresh ?? "" }];
  if (fresh === undefined) return [{ kind: "gone", text: gone }];
  return diffComm(wordsOf(gone), wordsOf(fresh)).flatMap(({ common, buffer1, buffer2 }): WordRun[] => {
    if (common) return [{ kind: "same", text: common.join("") }];
    return [
      { kind: "gone" as const, text: (buffer1 ?? []).join("") },
      { kind: "new" as const, text: (buffer2 ?? []).join("") },
    ].filter(({ text }) => text !== "");
  });
}

/** Words, and the spaces between them on their own, so that a word stays the same whatever follows it. */
function wordsOf(line: string): string[] {
  return line.match(/\S+|\s+/g) ?? [];
}

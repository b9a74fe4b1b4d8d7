import { clsx } from "clsx";
import type { RichDocument } from "#shared/document/types.ts";
import { type ComparedLine, compareTexts } from "../compare-text.ts";

interface TextChangesProps {
  before: RichDocument;
  after: RichDocument;
}

/** What was taken out and put in between two versions, word by word. */
export function TextChanges({ before, after }: TextChangesProps) {
  const lines = compareTexts(before, after);
  if (lines.every(isUnchanged)) {
    return <p className="text-ink-soft">The words are the same as now. Photos and numbers may differ.</p>;
  }
  return (
    <div className="flex max-w-measure flex-col gap-3 font-serif">
      {lines.map((line, index) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: the lines are worked out together and never reorder
        <p key={index} className={clsx(isUnchanged(line) && "text-ink-soft")}>
          {line.map((run, at) => (
            // biome-ignore lint/suspicious/noArrayIndexKey: as above
            <Run key={at} kind={run.kind} text={run.text} />
          ))}
        </p>
      ))}
    </div>
  );
}

function Run({ kind, text }: ComparedLine[number]) {
  if (kind === "gone") return <del className="bg-signal-wash text-ink decoration-signal">{text}</del>;
  if (kind === "new") return <ins className="bg-temper-wash text-ink decoration-temper">{text}</ins>;
  return text;
}

function isUnchanged(line: ComparedLine): boolean {
  return line.every(({ kind }) => kind === "same");
}

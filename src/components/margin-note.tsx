import { clsx } from "clsx";
import type { ReactNode } from "react";
import { Mark, type MarkShape } from "./mark.tsx";
import { type Tone, toneText } from "./tone.ts";

type MarginNoteProps = { tone?: Tone; shape?: MarkShape; children: ReactNode };

/** A quiet remark in the margin: "overturned in entry 9". */
export function MarginNote({ tone = "grey", shape, children }: MarginNoteProps) {
  return (
    <p className={clsx("inline-flex max-w-full items-baseline gap-1.5 text-xs leading-snug", toneText[tone])}>
      {shape ? <Mark shape={shape} className="size-3 translate-y-px" /> : null}
      <span>{children}</span>
    </p>
  );
}

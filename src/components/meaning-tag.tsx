import { clsx } from "clsx";
import type { ReactNode } from "react";
import { Mark, type MarkShape } from "./mark.tsx";
import { type Tone, toneText, toneWash } from "./tone.ts";

/** A state in a word, with its shape and its temper colour. */
export function MeaningTag({ tone, shape, children }: { tone: Tone; shape: MarkShape; children: ReactNode }) {
  return (
    <span
      className={clsx(
        "inline-flex h-7 items-center gap-1.5 rounded px-2 text-xs font-semibold whitespace-nowrap",
        toneText[tone],
        toneWash[tone],
      )}
    >
      <Mark shape={shape} className="size-3.5" />
      {children}
    </span>
  );
}

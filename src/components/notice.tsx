import { clsx } from "clsx";
import type { ReactNode } from "react";
import { Mark, type MarkShape } from "./mark.tsx";
import { type Tone, toneText, toneWash } from "./tone.ts";

export type NoticeKind = "information" | "attention" | "error" | "success";

const kinds: Record<NoticeKind, { tone: Tone; shape: MarkShape; word: string }> = {
  information: { tone: "temper", shape: "target", word: "Note" },
  attention: { tone: "straw", shape: "chisel", word: "Attention" },
  error: { tone: "signal", shape: "cross", word: "Error" },
  success: { tone: "temper", shape: "stroke", word: "Done" },
};

type NoticeProps = {
  kind?: NoticeKind;
  /** Replaces the kind's own word; keep it one that says the kind. */
  title?: ReactNode;
  children: ReactNode;
  actions?: ReactNode;
  /** `alert` interrupts a screen reader, `status` waits; leave out when it was there from the start. */
  role?: "alert" | "status";
};

export function Notice({ kind = "information", title, children, actions, role }: NoticeProps) {
  const { tone, shape, word } = kinds[kind];
  return (
    <div role={role} className={clsx("flex gap-3 rounded px-4 py-3 font-sans text-sm", toneWash[tone])}>
      <Mark shape={shape} className={clsx("mt-1 size-4", toneText[tone])} />
      <div className="min-w-0 flex-1">
        <p>
          <strong className={clsx("font-semibold", toneText[tone])}>{title ?? word}. </strong>
          {children}
        </p>
        {actions ? <div className="mt-2 flex flex-wrap gap-2">{actions}</div> : null}
      </div>
    </div>
  );
}

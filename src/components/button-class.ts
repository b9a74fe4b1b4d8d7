import { clsx } from "clsx";

export type ButtonTone = "primary" | "plain" | "quiet" | "destructive";

const tones: Record<ButtonTone, string> = {
  primary:
    "bg-temper text-on-temper hover:bg-temper-deep border-transparent border-b-[3px] border-b-temper-deep",
  plain: "bg-paper-raised text-ink border-edge border-b-[3px] hover:border-ink-soft hover:bg-grey-wash",
  quiet: "bg-transparent text-temper border-transparent hover:bg-temper-wash",
  destructive:
    "bg-signal text-on-signal hover:bg-signal-deep border-transparent border-b-[3px] border-b-signal-deep",
};

/** One look for a button whether it acts or leads somewhere. 44 px high for gloves. */
export function buttonClass(tone: ButtonTone, className?: string): string {
  return clsx(
    "inline-flex min-h-11 min-w-11 cursor-pointer items-center justify-center gap-2 rounded border px-4 py-2",
    "text-center text-sm font-semibold leading-tight no-underline transition-colors",
    "aria-disabled:cursor-not-allowed aria-disabled:opacity-70 disabled:cursor-not-allowed disabled:opacity-55",
    tones[tone],
    className,
  );
}

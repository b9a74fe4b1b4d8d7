import type { ComponentProps, MouseEvent } from "react";
import { type ButtonTone, buttonClass } from "./button-class.ts";

type ButtonProps = ComponentProps<"button"> & {
  tone?: ButtonTone;
  /** Work under way: the button keeps its place and focus but does nothing more. */
  busy?: boolean;
  /** What to say meanwhile, e.g. "Saving…". */
  busyLabel?: string;
};

export function Button({
  tone = "plain",
  busy = false,
  busyLabel,
  className,
  children,
  ...rest
}: ButtonProps) {
  const { onClick, type = "button", ...attributes } = rest;
  const handleClick = (event: MouseEvent<HTMLButtonElement>) => {
    // A disabled button would drop the focus, so a busy one stays focusable and refuses the press.
    if (busy) event.preventDefault();
    else onClick?.(event);
  };
  return (
    <button
      {...attributes}
      type={type}
      onClick={handleClick}
      aria-disabled={busy || undefined}
      aria-busy={busy || undefined}
      className={buttonClass(tone, className)}
    >
      {busy ? <BusyMark /> : null}
      {busy && busyLabel ? busyLabel : children}
    </button>
  );
}

function BusyMark() {
  return (
    <svg viewBox="0 0 16 16" className="size-4 shrink-0 animate-spin" fill="none" aria-hidden="true">
      <circle cx="8" cy="8" r="6" stroke="currentColor" strokeWidth="2" opacity="0.35" />
      <path d="M8 2a6 6 0 0 1 6 6" stroke="currentColor" strokeWidth="2.5" />
    </svg>
  );
}

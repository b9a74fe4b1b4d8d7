import { clsx } from "clsx";
import type { ReactNode } from "react";
import { Link } from "react-router";
import { type Tone, toneText } from "./tone.ts";

type NumberTagProps = {
  children: ReactNode;
  to?: string;
  tone?: Tone;
  /** Spoken instead of the bare number, e.g. "Working 12: lower wishbone". */
  label?: string;
  struck?: boolean;
};

/** W12, C7, a piece's mark: stamped figures, as a tag wired to the thing. */
export function NumberTag({ children, to, tone = "grey", label, struck }: NumberTagProps) {
  const className = clsx(
    "figures inline-flex h-6 items-center gap-1.5 rounded-r border border-current bg-paper-raised pr-2 pl-1.5",
    "text-xs font-semibold leading-none no-underline [clip-path:polygon(0.5rem_0,100%_0,100%_100%,0.5rem_100%,0_50%)]",
    toneText[tone],
    struck && "line-through",
  );
  const face = (
    <>
      <span aria-hidden="true" className="ml-1.5 size-1 rounded-full bg-current" />
      {children}
    </>
  );
  if (!to) {
    return (
      <span className={className} title={label}>
        {face}
      </span>
    );
  }
  return (
    <Link
      to={to}
      aria-label={label}
      className="group inline-flex min-h-11 items-center no-underline md:min-h-6"
    >
      <span className={clsx(className, "group-hover:bg-temper-wash")}>{face}</span>
    </Link>
  );
}

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

/** W12, C7, a piece's mark: stamped figures on a tag, with the hole for its wire. */
export function NumberTag({ children, to, tone = "grey", label, struck }: NumberTagProps) {
  const className = clsx(
    "figures inline-flex h-6 items-center gap-1.5 rounded border border-current bg-paper-raised pr-2 pl-1.5",
    "text-xs font-semibold leading-none no-underline",
    toneText[tone],
  );
  const face = (
    <>
      <span aria-hidden="true" className="size-2 rounded-full border border-current" />
      <span className={struck ? "line-through" : undefined}>{children}</span>
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

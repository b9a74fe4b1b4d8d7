import { clsx } from "clsx";
import ChevronRight from "lucide-react/icons/chevron-right";
import type { ReactNode } from "react";

type DisclosureProps = { summary: ReactNode; children: ReactNode; open?: boolean; className?: string };

/** Opens in place, without JavaScript too. */
export function Disclosure({ summary, children, open, className }: DisclosureProps) {
  return (
    <details open={open} className={clsx("group border-y border-hairline font-sans", className)}>
      <summary className="flex min-h-11 list-none items-center gap-2 py-2 font-semibold hover:text-temper [&::-webkit-details-marker]:hidden">
        <ChevronRight
          aria-hidden="true"
          className="size-4 shrink-0 transition-transform group-open:rotate-90"
        />
        {summary}
      </summary>
      <div className="pb-4 pl-6">{children}</div>
    </details>
  );
}

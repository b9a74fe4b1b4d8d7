import type { ReactNode } from "react";
import { Mark } from "./mark.tsx";

type CautionProps = { title?: string; children: ReactNode };

/** The trade's caution: a chisel cut and a punch mark on straw. Stays in view; there is nothing to dismiss. */
export function Caution({ title = "Caution", children }: CautionProps) {
  return (
    <aside
      aria-label={title}
      className="flex overflow-hidden rounded bg-straw-wash font-sans text-sm text-ink"
    >
      <div className="flex w-9 shrink-0 items-start justify-center bg-straw-fill pt-3.5 text-on-straw">
        <Mark shape="chisel" className="size-5" />
      </div>
      <div className="min-w-0 flex-1 px-4 py-3">
        <p className="font-semibold">{title}</p>
        <div className="mt-0.5 flex max-w-measure flex-col gap-1.5">{children}</div>
      </div>
    </aside>
  );
}

import { clsx } from "clsx";
import type { ReactNode } from "react";
import { Mark } from "./mark.tsx";

type CautionProps = {
  title?: string;
  /** Smaller and closer, where a page has many. */
  compact?: boolean;
  children: ReactNode;
};

/** The trade's caution: a chisel cut and a punch mark on straw. Stays in view; there is nothing to dismiss. */
export function Caution({ title = "Caution", compact = false, children }: CautionProps) {
  return (
    <aside
      aria-label={title}
      className="flex overflow-hidden rounded bg-straw-wash font-sans text-sm text-ink"
    >
      <div
        className={clsx(
          "flex shrink-0 items-start justify-center bg-straw-fill text-on-straw",
          compact ? "w-7 pt-2" : "w-9 pt-3.5",
        )}
      >
        <Mark shape="chisel" className={compact ? "size-4" : "size-5"} />
      </div>
      <div className={clsx("min-w-0 flex-1", compact ? "px-3 py-2 text-xs leading-snug" : "px-4 py-3")}>
        <p className="font-semibold">{title}</p>
        <div className={clsx("mt-0.5 flex flex-col gap-1.5", !compact && "max-w-measure")}>{children}</div>
      </div>
    </aside>
  );
}

import type { ReactNode } from "react";
import { Mark } from "./mark.tsx";

type FieldMessageProps = { id: string; kind: "error" | "help"; children: ReactNode };

/** Help or an error beside its field; tie it with aria-describedby. */
export function FieldMessage({ id, kind, children }: FieldMessageProps) {
  if (kind === "help") {
    return (
      <p id={id} className="text-xs text-ink-soft">
        {children}
      </p>
    );
  }
  return (
    <p id={id} className="flex items-start gap-1.5 text-xs font-semibold text-signal">
      <Mark shape="cross" className="mt-1 size-3" />
      <span>{children}</span>
    </p>
  );
}

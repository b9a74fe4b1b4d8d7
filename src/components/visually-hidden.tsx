import type { ReactNode } from "react";

/** Words for a screen reader where the eye has the drawing. */
export function VisuallyHidden({ children }: { children: ReactNode }) {
  return <span className="sr-only">{children}</span>;
}

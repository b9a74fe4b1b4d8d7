import type { ReactNode } from "react";

/** Says a recalculated result to a screen reader without moving the focus. Keep it mounted; change the words. */
export function LiveRegion({ children }: { children: ReactNode }) {
  return (
    <output aria-live="polite" aria-atomic="true" className="sr-only">
      {children}
    </output>
  );
}

import { clsx } from "clsx";
import type { ReactNode } from "react";

type MarginRowProps = {
  /** Number tags and margin notes that belong at this height. */
  notes: ReactNode;
  /** Lets a photo run past the text, up to 1.4 columns. */
  wide?: boolean;
  children: ReactNode;
};

/** A block of an `.entry-column` with its margin: left on a wide screen, folded above the block on a phone. */
export function MarginRow({ notes, wide = false, children }: MarginRowProps) {
  return (
    <div className={clsx("margin-row", wide && "entry-wide")}>
      <div className="margin-notes not-prose">{notes}</div>
      <div className="margin-block">{children}</div>
    </div>
  );
}

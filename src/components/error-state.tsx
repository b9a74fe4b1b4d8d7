import type { ReactNode } from "react";
import { Mark } from "./mark.tsx";

type ErrorStateProps = {
  title: string;
  children: ReactNode;
  /** An id to quote when asking for help. */
  reference?: string;
  action?: ReactNode;
};

/** Something went wrong: what, and the way on. */
export function ErrorState({ title, children, reference, action }: ErrorStateProps) {
  return (
    <div role="alert" className="flex flex-col items-start gap-3 border-y-2 border-signal py-8">
      <p className="flex items-baseline gap-2 text-lg font-semibold">
        <Mark shape="cross" className="size-4 text-signal" />
        {title}
      </p>
      <div className="max-w-measure text-ink-soft">{children}</div>
      {reference ? (
        <p className="text-xs text-ink-soft">
          Quote this when you ask for help: <span className="figures text-ink">{reference}</span>
        </p>
      ) : null}
      {action ? <div className="mt-1 flex flex-wrap gap-2">{action}</div> : null}
    </div>
  );
}

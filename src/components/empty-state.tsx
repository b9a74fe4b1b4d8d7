import type { ReactNode } from "react";

type EmptyStateProps = { title: string; children?: ReactNode; action?: ReactNode };

/** An empty list says what to do first. The drawing: a layout line waiting between two punch marks. */
export function EmptyState({ title, children, action }: EmptyStateProps) {
  return (
    <div className="flex flex-col items-start gap-3 border-y border-hairline py-8">
      <svg
        viewBox="0 0 168 24"
        className="h-6 w-42 text-edge"
        fill="none"
        stroke="currentColor"
        aria-hidden="true"
      >
        <path d="M12 4v16M4 12h16M156 4v16M148 12h16" strokeWidth="1" />
        <circle cx="12" cy="12" r="3.5" strokeWidth="1.5" />
        <circle cx="156" cy="12" r="3.5" strokeWidth="1.5" />
        <path d="M22 12h124" strokeWidth="1.5" strokeDasharray="14 4 2 4" />
      </svg>
      <p className="text-lg font-semibold">{title}</p>
      {children ? <div className="max-w-measure text-ink-soft">{children}</div> : null}
      {action ? <div className="mt-1 flex flex-wrap gap-2">{action}</div> : null}
    </div>
  );
}

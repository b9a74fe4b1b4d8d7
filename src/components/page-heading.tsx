import type { ReactNode } from "react";

type PageHeadingProps = {
  title: ReactNode;
  /** A line above the title: breadcrumbs, a number, a stage. */
  above?: ReactNode;
  /** One sentence under the title. */
  purpose?: ReactNode;
  actions?: ReactNode;
};

export function PageHeading({ title, above, purpose, actions }: PageHeadingProps) {
  return (
    <header className="mb-8 flex flex-wrap items-end justify-between gap-x-8 gap-y-5 border-b border-hairline pb-6">
      <div className="min-w-0 flex-1 basis-80">
        {above ? <div className="mb-3 text-xs text-ink-soft">{above}</div> : null}
        <h1>{title}</h1>
        {purpose ? <p className="mt-3 max-w-measure font-serif text-base text-ink-soft">{purpose}</p> : null}
      </div>
      {actions ? <div className="flex flex-wrap gap-2">{actions}</div> : null}
    </header>
  );
}

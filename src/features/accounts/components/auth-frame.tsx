import type { ReactNode } from "react";

interface AuthFrameProps {
  title: string;
  /** One sentence under the title. */
  purpose?: ReactNode;
  children: ReactNode;
  /** Beside the form on a desk, under it on a phone. */
  aside?: ReactNode;
}

/** A page with one short form. */
export function AuthFrame({ title, purpose, children, aside }: AuthFrameProps) {
  return (
    <div className="page-width py-10">
      <title>{`${title} · Soapstone`}</title>
      <meta name="robots" content="noindex" />
      <div className="grid gap-x-20 gap-y-12 lg:grid-cols-[minmax(0,27rem)_minmax(0,1fr)]">
        <div className="w-full max-w-108">
          <h1>{title}</h1>
          {purpose ? <p className="mt-3 font-serif text-base text-ink-soft">{purpose}</p> : null}
          <noscript>
            <p className="mt-6 rounded bg-straw-wash px-4 py-3">
              This form needs JavaScript. Reading does not.
            </p>
          </noscript>
          <div className="mt-8 flex flex-col gap-8">{children}</div>
        </div>
        {aside}
      </div>
    </div>
  );
}

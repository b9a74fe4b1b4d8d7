import ArrowLeft from "lucide-react/icons/arrow-left";
import ArrowRight from "lucide-react/icons/arrow-right";
import { Link } from "react-router";
import type { EntryPage } from "#shared/contracts/entries.ts";
import { paths } from "#src/lib/paths.ts";

const cell =
  "group flex min-h-24 flex-col justify-center gap-1 py-4 text-ink! no-underline! hover:bg-grey-wash sm:px-5";

/** On to the next entry of the build, or back to the one before. */
export function SeriesNav({ entry: { build, previous, next } }: { entry: EntryPage }) {
  return (
    <nav
      aria-label={`More of ${build.title}`}
      data-chrome
      className="mt-14 grid border-y border-edge font-sans sm:grid-cols-2 sm:divide-x sm:divide-hairline"
    >
      {previous ? (
        <Link
          to={paths.entry(build.slug, previous.slug)}
          rel="prev"
          className={`${cell} max-sm:order-2 max-sm:border-t max-sm:border-hairline`}
        >
          <span className="flex items-center gap-2 text-xs text-ink-soft">
            <ArrowLeft aria-hidden="true" className="size-4" />
            Before: entry {previous.number}
          </span>
          <span className="text-lg font-semibold group-hover:underline">{previous.title}</span>
        </Link>
      ) : (
        <p className="flex items-center py-4 text-sm text-ink-soft max-sm:order-2 max-sm:border-t max-sm:border-hairline sm:px-5">
          This is the first entry.
        </p>
      )}
      {next ? (
        <Link
          to={paths.entry(build.slug, next.slug)}
          rel="next"
          className={`${cell} sm:items-end sm:text-right`}
        >
          <span className="flex items-center gap-2 text-xs text-ink-soft">
            Next: entry {next.number}
            <ArrowRight aria-hidden="true" className="size-4" />
          </span>
          <span className="text-lg font-semibold group-hover:underline">{next.title}</span>
        </Link>
      ) : (
        <div className="flex flex-col justify-center py-4 text-sm text-ink-soft sm:items-end sm:px-5">
          <p>This is the latest entry.</p>
          <p>
            <Link to={paths.build(build.slug)} className="inline-flex min-h-11 items-center">
              All of {build.title}
            </Link>
          </p>
        </div>
      )}
    </nav>
  );
}

import { Link } from "react-router";
import type { EntrySummary } from "#shared/contracts/builds.ts";
import { DateStamp } from "#src/components/date-stamp.tsx";
import { StoredPhoto } from "#src/components/stored-photo.tsx";
import { paths } from "#src/lib/paths.ts";

interface EntryRowProps {
  build: string;
  entry: EntrySummary;
  now: number;
}

/** An entry in its stage: its number in the margin, what it is about, its first photo. */
export function EntryRow({ build, entry, now }: EntryRowProps) {
  return (
    <article className="group relative grid grid-cols-[1.75rem_minmax(0,1fr)] gap-x-2 py-5 sm:grid-cols-[2.25rem_minmax(0,1fr)_9rem] sm:gap-x-5">
      <p
        className="figures pt-0.5 text-lg leading-tight sm:text-right font-medium text-grey"
        aria-hidden="true"
      >
        {entry.number}
      </p>
      <div className="min-w-0">
        <h4 className="text-lg">
          <Link
            to={paths.entry(build, entry.slug)}
            className="text-ink! no-underline! after:absolute after:inset-0 group-hover:underline!"
          >
            <span className="sr-only">{`Entry ${entry.number}: `}</span>
            {entry.title}
          </Link>
        </h4>
        <p className="mt-1 max-w-measure font-serif text-base text-ink-soft">{entry.summary}</p>
        <p className="mt-1.5 text-xs text-ink-soft">
          <DateStamp at={entry.publishedAt} now={now} />
        </p>
      </div>
      {entry.photo ? (
        <div className="max-sm:hidden">
          <StoredPhoto photo={entry.photo} alt={entry.photoAlt} sizes="9rem" crop="3/2" />
        </div>
      ) : null}
    </article>
  );
}

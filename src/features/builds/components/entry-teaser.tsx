import { clsx } from "clsx";
import { Link } from "react-router";
import type { BuildSummary, EntrySummary } from "#shared/contracts/builds.ts";
import { DateStamp } from "#src/components/date-stamp.tsx";
import { StoredPhoto } from "#src/components/stored-photo.tsx";
import { paths } from "#src/lib/paths.ts";

interface EntryTeaserProps {
  entry: EntrySummary & { build: BuildSummary };
  now: number;
  /** At large, with its photo and its summary. */
  large?: boolean;
}

/** An entry among those of other builds: says whose it is. */
export function EntryTeaser({ entry, now, large = false }: EntryTeaserProps) {
  const { build } = entry;
  return (
    <article className={clsx("group relative", !large && "py-3.5")}>
      {large && entry.photo ? (
        <StoredPhoto
          photo={entry.photo}
          alt={entry.photoAlt}
          sizes="(min-width: 75rem) 42rem, (min-width: 64rem) 55vw, 100vw"
          crop="3/2"
          className="bleed mb-4"
        />
      ) : null}
      <p className="relative w-fit text-xs text-ink-soft">
        <Link to={paths.build(build.slug)}>{build.title}</Link>, entry {entry.number}
      </p>
      <h3 className={clsx("mt-0.5", large ? "text-xl" : "text-lg")}>
        <Link
          to={paths.entry(build.slug, entry.slug)}
          className="text-ink! no-underline! after:absolute after:inset-0 group-hover:underline!"
        >
          {entry.title}
        </Link>
      </h3>
      {large && entry.summary ? (
        <p className="mt-2 max-w-measure font-serif text-base text-ink-soft">{entry.summary}</p>
      ) : null}
      <p className={clsx("text-xs text-ink-soft", large ? "mt-2" : "mt-1")}>
        {build.owner.name} · <DateStamp at={entry.publishedAt} now={now} />
      </p>
    </article>
  );
}

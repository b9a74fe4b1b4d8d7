import { Link } from "react-router";
import type { BuildSummary } from "#shared/contracts/builds.ts";
import { DateStamp } from "#src/components/date-stamp.tsx";
import { PersonLink } from "#src/components/person-link.tsx";
import { StoredPhoto } from "#src/components/stored-photo.tsx";
import { paths } from "#src/lib/paths.ts";
import { buildStatusWords, counted } from "../state-words.ts";
import { StateTag } from "./state-tag.tsx";

interface BuildCardProps {
  build: BuildSummary;
  now: number;
  /** Heading level, so that the card fits the page's outline. */
  level?: 2 | 3;
  /** On its owner's own page the name is left out. */
  withOwner?: boolean;
  /** Among the first on the page: its cover is loaded at once. */
  priority?: boolean;
}

/** A build in a list: the whole card leads to it. */
export function BuildCard({ build, now, level = 2, withOwner = true, priority = false }: BuildCardProps) {
  const Heading = `h${level}` as const;
  return (
    <article className="group relative flex flex-col">
      <Cover build={build} priority={priority} />
      <div className="mt-3 flex items-start justify-between gap-3">
        <Heading className="text-lg">
          <Link
            to={paths.build(build.slug)}
            className="text-ink! no-underline! after:absolute after:inset-0 group-hover:underline!"
          >
            {build.title}
          </Link>
        </Heading>
        <StateTag state={buildStatusWords[build.status]} />
      </div>
      <p className="mt-1 font-serif text-base text-ink-soft">{build.purpose}</p>
      <div className="mt-auto flex flex-wrap items-center justify-between gap-x-4 pt-2 text-xs text-ink-soft">
        {withOwner ? (
          <span className="relative">
            <PersonLink person={build.owner} />
          </span>
        ) : null}
        <LastWritten build={build} now={now} />
      </div>
    </article>
  );
}

function Cover({ build, priority }: { build: BuildSummary; priority: boolean }) {
  if (!build.cover) {
    return (
      <div aria-hidden="true" className="plate bleed aspect-[3/2]">
        <svg
          aria-hidden="true"
          viewBox="0 0 60 40"
          className="size-full text-chalk-soft"
          fill="none"
          stroke="currentColor"
        >
          <path d="M30 6v28M10 20h40" strokeWidth="0.25" strokeDasharray="3 0.8 0.5 0.8" />
          <circle cx="30" cy="20" r="7" strokeWidth="0.5" />
          <circle cx="30" cy="20" r="5.6" strokeWidth="0.25" />
        </svg>
      </div>
    );
  }
  return (
    <StoredPhoto
      photo={build.cover}
      alt={build.coverAlt}
      sizes="(min-width: 64rem) 23rem, (min-width: 40rem) 46vw, 100vw"
      crop="3/2"
      className="bleed"
      priority={priority}
    />
  );
}

function LastWritten({ build, now }: { build: BuildSummary; now: number }) {
  if (build.lastEntryAt === null) return <p>No entries yet</p>;
  return (
    <p>
      {counted(build.entryCount, "entry", "entries")}, last <DateStamp at={build.lastEntryAt} now={now} />
    </p>
  );
}

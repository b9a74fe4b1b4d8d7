import { Link } from "react-router";
import type { WorkshopEntry } from "#shared/contracts/entries.ts";
import { DateStamp } from "#src/components/date-stamp.tsx";
import { MeaningTag } from "#src/components/meaning-tag.tsx";
import { paths } from "#src/lib/paths.ts";
import { entryStateWords } from "../state-words.ts";
import { StateTag } from "./state-tag.tsx";

interface OwnEntryRowProps {
  build: string;
  entry: WorkshopEntry;
  now: number;
}

const linkClass = "inline-flex min-h-11 items-center text-xs";

/** One own entry: what it is, how far it is, and where to go on with it. */
export function OwnEntryRow({ build, entry, now }: OwnEntryRowProps) {
  const name = entry.title || "Entry without a title";
  return (
    <li className="border-b border-hairline py-3">
      <div className="flex flex-wrap items-start justify-between gap-x-6 gap-y-1">
        <div className="min-w-0 flex-1 basis-64">
          <Link to={paths.entryEditor(entry.id)} className="font-semibold">
            {entry.number === null ? null : <span className="figures mr-2 text-xs">{entry.number}</span>}
            {name}
          </Link>
          <p className="text-xs text-ink-soft">
            <EntryMoment entry={entry} now={now} />
          </p>
        </div>
        <div className="flex flex-wrap gap-1.5">
          <StateTag state={entryStateWords[entry.state]} />
          {entry.hasUnpublishedChanges && entry.state === "public" ? (
            <MeaningTag tone="bronze" shape="file">
              Changes not published
            </MeaningTag>
          ) : null}
        </div>
      </div>
      <div className="flex flex-wrap gap-x-5">
        <Link to={paths.entryEditor(entry.id)} className={linkClass} aria-label={`Edit ${name}`}>
          Edit
        </Link>
        <Link to={paths.entryHistory(entry.id)} className={linkClass} aria-label={`History of ${name}`}>
          History
        </Link>
        {entry.state === "public" ? (
          <Link
            to={paths.entry(build, entry.slug)}
            className={linkClass}
            aria-label={`Read ${name} as readers see it`}
          >
            Read it
          </Link>
        ) : null}
      </div>
    </li>
  );
}

function EntryMoment({ entry, now }: { entry: WorkshopEntry; now: number }) {
  if (entry.state === "scheduled" && entry.scheduledAt !== null) {
    return (
      <>
        Goes public on <DateStamp at={entry.scheduledAt} now={now} withTime />
      </>
    );
  }
  if (entry.state === "public" && entry.publishedAt !== null) {
    return (
      <>
        Public since <DateStamp at={entry.publishedAt} now={now} />
      </>
    );
  }
  return (
    <>
      Last changed <DateStamp at={entry.updatedAt} now={now} />
    </>
  );
}

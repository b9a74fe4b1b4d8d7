import { Link } from "react-router";
import type { EntryPage } from "#shared/contracts/entries.ts";
import { Breadcrumbs } from "#src/components/breadcrumbs.tsx";
import { DateStamp } from "#src/components/date-stamp.tsx";
import { LinkButton } from "#src/components/link-button.tsx";
import { MarginRow } from "#src/components/margin-row.tsx";
import { NumberTag } from "#src/components/number-tag.tsx";
import { PersonLink } from "#src/components/person-link.tsx";
import { paths } from "#src/lib/paths.ts";
import { workingAnchor, workingsInOrder } from "../entry-media.ts";

/** Changes within this long after publishing are not worth telling. */
const settling = 24 * 3_600_000;

/** Where an entry stands in its build, what it is called, who wrote it and when. */
export function EntryHead({ entry, now }: { entry: EntryPage; now: number }) {
  const { build, stage } = entry;
  return (
    <header className="mb-8 sm:mb-10">
      <Breadcrumbs
        trail={[
          { label: "Builds", to: paths.builds() },
          { label: build.title, to: paths.build(build.slug) },
          { label: stage.title, to: paths.stage(build.slug, stage.id) },
        ]}
        here={`Entry ${entry.number}`}
      />
      <div className="entry-column mt-3 sm:mt-6">
        <MarginRow wide notes={<HeadNotes entry={entry} now={now} />}>
          <h1>{entry.title}</h1>
          {entry.summary ? (
            <p className="mt-4 max-w-measure text-lg leading-snug text-ink-soft">{entry.summary}</p>
          ) : null}
          <div className="mt-4 flex flex-wrap items-center gap-x-5 gap-y-2 font-sans text-sm">
            <PersonLink person={build.owner} />
            {entry.mine ? (
              <LinkButton to={paths.entryEditor(entry.id)} className="no-print">
                Edit this entry
              </LinkButton>
            ) : null}
          </div>
        </MarginRow>
      </div>
    </header>
  );
}

function HeadNotes({ entry, now }: { entry: EntryPage; now: number }) {
  const workings = workingsInOrder(entry);
  const changed = entry.updatedAt - entry.publishedAt > settling;
  return (
    <>
      <span className="figures text-lg leading-tight font-medium text-ink max-md:hidden" aria-hidden="true">
        {entry.number}
      </span>
      <Link to={paths.stage(entry.build.slug, entry.stage.id)} className="max-md:hidden">
        {entry.stage.title}
      </Link>
      <DateStamp at={entry.publishedAt} now={now} stacked />
      {changed ? (
        <span>
          Changed <DateStamp at={entry.updatedAt} />
        </span>
      ) : null}
      {workings.length > 0 ? (
        <nav
          aria-label="Workings in this entry"
          className="no-print flex flex-wrap justify-end gap-x-2 gap-y-1"
        >
          {workings.map(({ id, number, title }) => (
            <NumberTag key={id} to={`#${workingAnchor(number)}`} label={`Working ${number}: ${title}`}>
              W{number}
            </NumberTag>
          ))}
        </nav>
      ) : null}
    </>
  );
}

import { Link } from "react-router";
import type { ScheduledEntry } from "#shared/contracts/entries.ts";
import { DateStamp } from "#src/components/date-stamp.tsx";
import { paths } from "#src/lib/paths.ts";

/** What goes public by itself, the soonest first. */
export function ScheduledEntries({ entries, now }: { entries: ScheduledEntry[]; now: number }) {
  return (
    <section aria-labelledby="scheduled">
      <h2 id="scheduled" className="border-b border-edge pb-2 text-lg!">
        Scheduled
      </h2>
      {entries.length === 0 ? (
        <p className="py-3 text-ink-soft">Nothing waits for its time. Schedule an entry in its editor.</p>
      ) : (
        <ol>
          {entries.map(({ id, title, scheduledAt, build }) => (
            <li key={id} className="border-b border-hairline py-3">
              <Link to={paths.entryEditor(id)} className="font-semibold">
                {title}
              </Link>
              <p className="text-xs text-ink-soft">
                {build.title}, on <DateStamp at={scheduledAt} now={now} withTime />
              </p>
            </li>
          ))}
        </ol>
      )}
    </section>
  );
}

import { useSuspenseQuery } from "@tanstack/react-query";
import { EmptyState } from "#src/components/empty-state.tsx";
import { LinkButton } from "#src/components/link-button.tsx";
import { EntryTeaser } from "#src/features/builds/components/entry-teaser.tsx";
import { latestEntriesQuery } from "#src/features/reading/queries.ts";
import { useApi } from "#src/lib/api.ts";
import { paths } from "#src/lib/paths.ts";

const shown = 6;

/** The newest entry at large, the ones before it as a list. */
export function LatestEntries() {
  const { data, dataUpdatedAt: now } = useSuspenseQuery(latestEntriesQuery(useApi()));
  const [newest, ...before] = data.items.slice(0, shown);
  return (
    <section aria-labelledby="latest" className="mt-16">
      <h2 id="latest" className="mb-5">
        Latest entries
      </h2>
      {newest ? (
        <div className="grid gap-x-12 gap-y-6 lg:grid-cols-[minmax(0,7fr)_minmax(0,5fr)]">
          <EntryTeaser entry={newest} now={now} large />
          <ol className="divide-y divide-hairline border-y border-hairline lg:self-start">
            {before.map((entry) => (
              <li key={entry.id}>
                <EntryTeaser entry={entry} now={now} />
              </li>
            ))}
          </ol>
        </div>
      ) : (
        <EmptyState
          title="Nobody has published an entry yet"
          action={<LinkButton to={paths.newBuild()}>Start a build</LinkButton>}
        >
          <p>The first one will stand here.</p>
        </EmptyState>
      )}
    </section>
  );
}

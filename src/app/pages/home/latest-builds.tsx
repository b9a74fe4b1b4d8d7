import { useSuspenseQuery } from "@tanstack/react-query";
import { Link } from "react-router";
import { BuildCard } from "#src/features/builds/components/build-card.tsx";
import { buildsQuery } from "#src/features/reading/queries.ts";
import { useApi } from "#src/lib/api.ts";
import { paths } from "#src/lib/paths.ts";

const shown = 3;

/** The builds last written in; nothing while there is none. */
export function LatestBuilds() {
  const { data, dataUpdatedAt: now } = useSuspenseQuery(buildsQuery(useApi()));
  if (data.items.length === 0) return null;
  return (
    <section aria-labelledby="builds" className="mt-16">
      <div className="mb-5 flex flex-wrap items-baseline justify-between gap-4">
        <h2 id="builds">Builds</h2>
        <Link to={paths.builds()} className="inline-flex min-h-11 items-center text-sm">
          All builds
        </Link>
      </div>
      <ul className="grid gap-x-8 gap-y-12 sm:grid-cols-2 lg:grid-cols-3">
        {data.items.slice(0, shown).map((build) => (
          <li key={build.id} className="flex *:flex-1">
            <BuildCard build={build} now={now} level={3} />
          </li>
        ))}
      </ul>
    </section>
  );
}

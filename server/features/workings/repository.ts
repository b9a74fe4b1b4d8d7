import { eq } from "drizzle-orm";
import type { Connection } from "#server/db/client.ts";
import { builds, entries } from "#server/db/schema/builds.ts";
import { workings } from "#server/db/schema/workings.ts";

/** A kept working with the build and entry it stands in; `undefined` when there is none of this id. */
export function findPlacedWorking(connection: Connection, id: string) {
  return connection
    .select({
      working: workings,
      build: { title: builds.title, slug: builds.slug, ownerId: builds.ownerId },
      entry: { id: entries.id, state: entries.state, deletedAt: entries.deletedAt },
    })
    .from(workings)
    .innerJoin(builds, eq(builds.id, workings.buildId))
    .leftJoin(entries, eq(entries.id, workings.entryId))
    .where(eq(workings.id, id))
    .get();
}

export type PlacedWorking = NonNullable<ReturnType<typeof findPlacedWorking>>;

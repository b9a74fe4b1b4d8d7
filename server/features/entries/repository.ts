import { and, eq, inArray, isNotNull, isNull, lt, max, min, sql } from "drizzle-orm";
import type { Connection } from "#server/db/client.ts";
import {
  builds,
  entries,
  entryPhotos,
  entryRevisions,
  slugRedirects,
  stages,
} from "#server/db/schema/builds.ts";
import { photos } from "#server/db/schema/photos.ts";
import { workings } from "#server/db/schema/workings.ts";

export type EntryRow = typeof entries.$inferSelect;

/** An entry with what its rules need of its build. */
export interface OwnedEntry {
  entry: EntryRow;
  build: { id: string; slug: string; title: string; ownerId: string };
}

export function findOwnedEntry(connection: Connection, id: string): OwnedEntry | undefined {
  return connection
    .select({
      entry: entries,
      build: { id: builds.id, slug: builds.slug, title: builds.title, ownerId: builds.ownerId },
    })
    .from(entries)
    .innerJoin(builds, eq(builds.id, entries.buildId))
    .where(and(eq(entries.id, id), isNull(entries.deletedAt)))
    .get();
}

export function insertEntry(connection: Connection, entry: typeof entries.$inferInsert): void {
  connection.insert(entries).values(entry).run();
}

export function updateEntry(connection: Connection, id: string, change: Partial<EntryRow>): void {
  connection.update(entries).set(change).where(eq(entries.id, id)).run();
}

/** Raises the build's own time, by which the workshop lists builds. */
export function touchBuild(connection: Connection, id: string, now: number): void {
  connection.update(builds).set({ updatedAt: now }).where(eq(builds.id, id)).run();
}

export function stageIsOfBuild(connection: Connection, stageId: string, buildId: string): boolean {
  const found = connection
    .select({ id: stages.id })
    .from(stages)
    .where(and(eq(stages.id, stageId), eq(stages.buildId, buildId)))
    .get();
  return found !== undefined;
}

/** Every address in the build that starts this way and is, or was, an entry's. */
export function takenEntrySlugs(connection: Connection, buildId: string, start: string): Map<string, string> {
  const present = connection
    .select({ slug: entries.slug, id: entries.id })
    .from(entries)
    .where(
      and(
        eq(entries.buildId, buildId),
        sql`${entries.slug} >= ${start} and ${entries.slug} < ${`${start}~`}`,
      ),
    )
    .all();
  const former = connection
    .select({ slug: slugRedirects.slug, id: slugRedirects.targetId })
    .from(slugRedirects)
    .where(
      and(
        eq(slugRedirects.kind, "entry"),
        eq(slugRedirects.scope, buildId),
        sql`${slugRedirects.slug} >= ${start} and ${slugRedirects.slug} < ${`${start}~`}`,
      ),
    )
    .all();
  return new Map([...former, ...present].map(({ slug, id }) => [slug, id]));
}

/** Lets a public entry's old address lead to it, and the new one no longer redirect. */
export function moveEntrySlug(
  connection: Connection,
  { id, buildId, slug: from }: EntryRow,
  to: string,
  keepOld: boolean,
): void {
  connection
    .delete(slugRedirects)
    .where(and(eq(slugRedirects.kind, "entry"), eq(slugRedirects.scope, buildId), eq(slugRedirects.slug, to)))
    .run();
  if (!keepOld) return;
  connection.insert(slugRedirects).values({ kind: "entry", scope: buildId, slug: from, targetId: id }).run();
}

/** The next number in the build's series. */
export function nextEntryNumber(connection: Connection, buildId: string): number {
  const last = connection
    .select({ number: max(entries.number) })
    .from(entries)
    .where(eq(entries.buildId, buildId))
    .get();
  return (last?.number ?? 0) + 1;
}

/** Which of these photos are there, of this build, and in what state. */
export function findBuildPhotos(connection: Connection, buildId: string, ids: string[]) {
  if (ids.length === 0) return [];
  return connection
    .select({ id: photos.id, state: photos.state })
    .from(photos)
    .where(and(inArray(photos.id, ids), eq(photos.buildId, buildId)))
    .all();
}

/** Makes these the photos that readers see in the entry. */
export function setEntryPhotos(connection: Connection, entryId: string, photoIds: string[]): void {
  connection.delete(entryPhotos).where(eq(entryPhotos.entryId, entryId)).run();
  const rows = [...new Set(photoIds)].map((photoId) => ({ entryId, photoId }));
  if (rows.length > 0) connection.insert(entryPhotos).values(rows).run();
}

/** A build is public from its oldest public entry on, and listed by its newest; without any it is private. */
export function refreshBuildDates(connection: Connection, buildId: string): void {
  const dates = connection
    .select({ first: min(entries.publishedAt), last: max(entries.publishedAt) })
    .from(entries)
    .where(and(eq(entries.buildId, buildId), eq(entries.state, "public")))
    .get();
  connection
    .update(builds)
    .set({ publishedAt: dates?.first ?? null, lastEntryAt: dates?.last ?? null })
    .where(eq(builds.id, buildId))
    .run();
}

/** Removes for good the drafts that were deleted before a moment; numbers of their workings stay used up. */
export function purgeDeletedEntries(connection: Connection, before: number): void {
  const dead = connection
    .select({ id: entries.id })
    .from(entries)
    .where(and(isNotNull(entries.deletedAt), lt(entries.deletedAt, before)));
  connection.delete(entryRevisions).where(inArray(entryRevisions.entryId, dead)).run();
  connection.update(workings).set({ entryId: null }).where(inArray(workings.entryId, dead)).run();
  connection.delete(entries).where(inArray(entries.id, dead)).run();
}

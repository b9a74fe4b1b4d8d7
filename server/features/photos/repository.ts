import { and, count, eq, exists, inArray, isNotNull, isNull, lt, not, or, type SQL, sql } from "drizzle-orm";
import type { Connection } from "#server/db/client.ts";
import { users } from "#server/db/schema/accounts.ts";
import { builds, entries, entryPhotos, entryRevisions } from "#server/db/schema/builds.ts";
import { photos } from "#server/db/schema/photos.ts";

export type PhotoRow = typeof photos.$inferSelect;

export function insertPhoto(connection: Connection, photo: typeof photos.$inferInsert): void {
  connection.insert(photos).values(photo).run();
}

export function findPhoto(connection: Connection, id: string): PhotoRow | undefined {
  return connection.select().from(photos).where(eq(photos.id, id)).get();
}

export function findPhotos(connection: Connection, ids: string[]): PhotoRow[] {
  return connection.select().from(photos).where(inArray(photos.id, ids)).all();
}

/** Changes a photo, but only while it is still turned this way: a job that comes late changes nothing. */
export function updatePhotoTurned(
  connection: Connection,
  { id, rotation }: { id: string; rotation: number },
  change: Partial<PhotoRow>,
): void {
  connection
    .update(photos)
    .set(change)
    .where(and(eq(photos.id, id), eq(photos.rotation, rotation)))
    .run();
}

export function updatePhoto(connection: Connection, id: string, change: Partial<PhotoRow>): void {
  connection.update(photos).set(change).where(eq(photos.id, id)).run();
}

export function deletePhotoRow(connection: Connection, id: string): void {
  connection.delete(photos).where(eq(photos.id, id)).run();
}

export function findBuildOwner(connection: Connection, buildId: string): string | undefined {
  return connection.select({ ownerId: builds.ownerId }).from(builds).where(eq(builds.id, buildId)).get()
    ?.ownerId;
}

export function countPhotosOfBuild(connection: Connection, buildId: string): number {
  return connection.select({ n: count() }).from(photos).where(eq(photos.buildId, buildId)).get()?.n ?? 0;
}

/** Photos of a person that belong to no build: their portraits, past and present. */
export function countLoosePhotos(connection: Connection, ownerId: string): number {
  const loose = and(eq(photos.ownerId, ownerId), isNull(photos.buildId));
  return connection.select({ n: count() }).from(photos).where(loose).get()?.n ?? 0;
}

/** A photo with whether anyone may see it: in a public entry, on a published build, or as its owner's portrait. */
export function findPhotoWithSight(connection: Connection, id: string) {
  const inPublicEntry = connection
    .select({ one: sql`1` })
    .from(entryPhotos)
    .innerJoin(entries, eq(entries.id, entryPhotos.entryId))
    .where(and(eq(entryPhotos.photoId, photos.id), eq(entries.state, "public"), isNull(entries.deletedAt)));
  const row = connection
    .select({
      photo: photos,
      public: sql<number>`${or(
        exists(inPublicEntry),
        exists(coverOf(connection, isNotNull(builds.publishedAt))),
        exists(portraitOf(connection)),
      )}`,
    })
    .from(photos)
    .where(eq(photos.id, id))
    .get();
  return row && { photo: row.photo, public: Boolean(row.public) };
}

/** Covers belong to their build and portraits to their owner, so that both are found by key. */
function coverOf(connection: Connection, which?: SQL) {
  return connection
    .select({ one: sql`1` })
    .from(builds)
    .where(and(eq(builds.id, photos.buildId), eq(builds.coverPhotoId, photos.id), which));
}

function portraitOf(connection: Connection) {
  return connection
    .select({ one: sql`1` })
    .from(users)
    .where(and(eq(users.id, photos.ownerId), eq(users.avatarPhotoId, photos.id)));
}

/** True of photos that something uses: an entry, published or not, one of its revisions, a cover or a portrait. */
function used(connection: Connection) {
  const one = { one: sql`1` };
  const published = connection.select(one).from(entryPhotos).where(eq(entryPhotos.photoId, photos.id));
  const drafts = connection
    .select(one)
    .from(entries)
    .where(and(eq(entries.buildId, photos.buildId), sql`instr(${entries.document}, ${photos.id}) > 0`));
  const revisions = connection
    .select(one)
    .from(entryRevisions)
    .innerJoin(entries, eq(entries.id, entryRevisions.entryId))
    .where(
      and(eq(entries.buildId, photos.buildId), sql`instr(${entryRevisions.document}, ${photos.id}) > 0`),
    );
  return or(
    exists(published),
    exists(coverOf(connection)),
    exists(portraitOf(connection)),
    exists(drafts),
    exists(revisions),
  );
}

export function isUsed(connection: Connection, id: string): boolean {
  const found = connection
    .select({ id: photos.id })
    .from(photos)
    .where(and(eq(photos.id, id), used(connection)))
    .get();
  return found !== undefined;
}

/** Some photos older than a moment that nothing uses. */
export function findUnusedBefore(connection: Connection, before: number, most: number): string[] {
  return connection
    .select({ id: photos.id })
    .from(photos)
    .where(and(lt(photos.createdAt, before), not(sql`(${used(connection)})`)))
    .limit(most)
    .all()
    .map((each) => each.id);
}

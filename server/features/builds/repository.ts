import { and, count, desc, eq, inArray, isNotNull, type SQL, sql } from "drizzle-orm";
import type { Connection } from "#server/db/client.ts";
import { users } from "#server/db/schema/accounts.ts";
import { builds, entries, slugRedirects } from "#server/db/schema/builds.ts";
import { photos } from "#server/db/schema/photos.ts";
import { type PagePosition, pageSize } from "#server/http/paging.ts";
import type { BuildStatus } from "#shared/contracts/builds.ts";

export type BuildRow = typeof builds.$inferSelect;

/** A build with what every card of it shows beside its own columns. */
export interface BuildCardRow {
  build: BuildRow;
  owner: { handle: string; name: string; avatarPhotoId: string | null };
  entryCount: number;
}

function selectCards(connection: Connection) {
  return connection
    .select({
      build: builds,
      owner: { handle: users.handle, name: users.name, avatarPhotoId: users.avatarPhotoId },
      entryCount: sql<number>`(${publicEntryCount(connection)})`,
    })
    .from(builds)
    .innerJoin(users, eq(users.id, builds.ownerId));
}

function publicEntryCount(connection: Connection) {
  return connection
    .select({ n: count() })
    .from(entries)
    .where(and(eq(entries.buildId, builds.id), eq(entries.state, "public")));
}

export function findCards(connection: Connection, ids: string[]): BuildCardRow[] {
  return selectCards(connection).where(inArray(builds.id, ids)).all();
}

/** One page of the builds that readers see, and one row more when there is a next page. */
export function listPublicCards(
  connection: Connection,
  filter: { ownerId?: string | undefined; status?: BuildStatus | undefined; after: PagePosition | null },
): BuildCardRow[] {
  return publicCards(connection, filter).all();
}

/** The statement itself, so that a test can ask SQLite how it runs it. */
export function publicCards(
  connection: Connection,
  {
    ownerId,
    status,
    after,
  }: { ownerId?: string | undefined; status?: BuildStatus | undefined; after: PagePosition | null },
) {
  const conditions: (SQL | undefined)[] = [
    isNotNull(builds.lastEntryAt),
    ownerId === undefined ? undefined : eq(builds.ownerId, ownerId),
    status === undefined ? undefined : eq(builds.status, status),
    after ? sql`(${builds.lastEntryAt}, ${builds.id}) < (${after.at}, ${after.id})` : undefined,
  ];
  return selectCards(connection)
    .where(and(...conditions))
    .orderBy(desc(builds.lastEntryAt), desc(builds.id))
    .limit(pageSize + 1);
}

export function findPersonIdByHandle(connection: Connection, handle: string): string | undefined {
  return connection.select({ id: users.id }).from(users).where(eq(users.handle, handle)).get()?.id;
}

/** The build at an address, or the one that has moved away from it. */
export function findBuildBySlug(connection: Connection, slug: string): BuildRow | undefined {
  const present = connection.select().from(builds).where(eq(builds.slug, slug)).get();
  if (present) return present;
  return connection
    .select({ build: builds })
    .from(slugRedirects)
    .innerJoin(builds, eq(builds.id, slugRedirects.targetId))
    .where(redirectAt(slug))
    .get()?.build;
}

function redirectAt(slug: string) {
  return and(eq(slugRedirects.kind, "build"), eq(slugRedirects.scope, ""), eq(slugRedirects.slug, slug));
}

/** Every address that starts this way and is, or was, a build's. */
export function takenBuildSlugs(connection: Connection, start: string): Map<string, string> {
  const present = connection
    .select({ slug: builds.slug, id: builds.id })
    .from(builds)
    .where(sql`${builds.slug} >= ${start} and ${builds.slug} < ${`${start}~`}`)
    .all();
  const former = connection
    .select({ slug: slugRedirects.slug, id: slugRedirects.targetId })
    .from(slugRedirects)
    .where(
      and(
        eq(slugRedirects.kind, "build"),
        eq(slugRedirects.scope, ""),
        sql`${slugRedirects.slug} >= ${start} and ${slugRedirects.slug} < ${`${start}~`}`,
      ),
    )
    .all();
  return new Map([...former, ...present].map(({ slug, id }) => [slug, id]));
}

export function insertBuild(connection: Connection, build: typeof builds.$inferInsert): void {
  connection.insert(builds).values(build).run();
}

export function updateBuildRow(connection: Connection, id: string, change: Partial<BuildRow>): void {
  connection.update(builds).set(change).where(eq(builds.id, id)).run();
}

/** Lets the old address lead to the build, and the new one no longer redirect. */
export function moveBuildSlug(connection: Connection, id: string, from: string, to: string): void {
  connection.delete(slugRedirects).where(redirectAt(to)).run();
  connection.insert(slugRedirects).values({ kind: "build", scope: "", slug: from, targetId: id }).run();
}

export function photoIsOfBuild(connection: Connection, photoId: string, buildId: string): boolean {
  const found = connection
    .select({ id: photos.id })
    .from(photos)
    .where(and(eq(photos.id, photoId), eq(photos.buildId, buildId)))
    .get();
  return found !== undefined;
}

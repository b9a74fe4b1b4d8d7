import { and, asc, desc, eq, gt, isNull, lt, type SQL, sql } from "drizzle-orm";
import { alias } from "drizzle-orm/sqlite-core";
import type { Connection } from "#server/db/client.ts";
import { users } from "#server/db/schema/accounts.ts";
import { builds, entries, slugRedirects } from "#server/db/schema/builds.ts";
import { type PagePosition, pageSize } from "#server/http/paging.ts";

/** What a list needs of a public entry: no document. */
const listed = {
  id: entries.id,
  buildId: entries.buildId,
  number: entries.number,
  slug: entries.slug,
  title: entries.publishedTitle,
  summary: entries.publishedSummary,
  stageId: entries.publishedStageId,
  publishedAt: entries.publishedAt,
  updatedAt: entries.publishedUpdatedAt,
  photoId: entries.publishedPhotoId,
  photoAlt: entries.publishedPhotoAlt,
};

export type ListedRow = {
  [Key in keyof typeof listed]: (typeof listed)[Key]["_"]["notNull"] extends true
    ? (typeof listed)[Key]["_"]["data"]
    : (typeof listed)[Key]["_"]["data"] | null;
};

const isPublic = and(eq(entries.state, "public"), isNull(entries.deletedAt));

/** A build's public entries, in the order of the series. */
export function listPublicOfBuild(connection: Connection, buildId: string): ListedRow[] {
  return connection
    .select(listed)
    .from(entries)
    .where(and(eq(entries.buildId, buildId), isPublic))
    .orderBy(asc(entries.number))
    .all();
}

/** The statement of one page of public entries of all builds, newest first, and one row more. */
export function latestPublic(connection: Connection, after: PagePosition | null) {
  const older = after && sql`(${entries.publishedAt}, ${entries.id}) < (${after.at}, ${after.id})`;
  return connection
    .select(listed)
    .from(entries)
    .where(and(isPublic, older ?? undefined))
    .orderBy(desc(entries.publishedAt), desc(entries.id))
    .limit(pageSize + 1);
}

/** Every public entry's address, for the sitemap; capped at what one sitemap may hold. */
export function listPublicAddresses(connection: Connection, most: number) {
  return connection
    .select({
      build: builds.slug,
      entry: entries.slug,
      person: users.handle,
      updatedAt: entries.publishedUpdatedAt,
    })
    .from(entries)
    .innerJoin(builds, eq(builds.id, entries.buildId))
    .innerJoin(users, eq(users.id, builds.ownerId))
    .where(isPublic)
    .orderBy(desc(entries.publishedAt), desc(entries.id))
    .limit(most)
    .all();
}

/** The public entry at a present or former address of the build. */
export function findPublicEntry(connection: Connection, buildId: string, slug: string) {
  const select = () => connection.select({ ...listed, document: entries.publishedDocument }).from(entries);
  const present = select()
    .where(and(eq(entries.buildId, buildId), eq(entries.slug, slug), isPublic))
    .get();
  if (present) return present;
  return select()
    .innerJoin(slugRedirects, eq(slugRedirects.targetId, entries.id))
    .where(
      and(
        eq(slugRedirects.kind, "entry"),
        eq(slugRedirects.scope, buildId),
        eq(slugRedirects.slug, slug),
        isPublic,
      ),
    )
    .get();
}

/** The public entries before and after a number in the series. */
export function findNeighbours(connection: Connection, buildId: string, number: number) {
  const one = (where: SQL, order: SQL) =>
    connection
      .select({ number: entries.number, slug: entries.slug, title: entries.publishedTitle })
      .from(entries)
      .where(and(eq(entries.buildId, buildId), isPublic, where))
      .orderBy(order)
      .limit(1)
      .get();
  return {
    previous: one(lt(entries.number, number), desc(entries.number)),
    next: one(gt(entries.number, number), asc(entries.number)),
  };
}

/** The entries of a build in every state, for its builder: newest work first. */
export function listOwnEntries(connection: Connection, buildId: string) {
  return connection
    .select({
      id: entries.id,
      number: entries.number,
      slug: entries.slug,
      title: entries.title,
      state: entries.state,
      stageId: entries.stageId,
      updatedAt: entries.updatedAt,
      scheduledAt: entries.scheduledAt,
      publishedAt: entries.publishedAt,
      version: entries.version,
      publishedVersion: entries.publishedVersion,
    })
    .from(entries)
    .where(and(eq(entries.buildId, buildId), isNull(entries.deletedAt)))
    .orderBy(desc(entries.updatedAt), desc(entries.id))
    .all();
}

/** A person's builds, the last worked on first, with how many drafts each has. */
export function listOwnBuilds(connection: Connection, ownerId: string) {
  const hidden = alias(entries, "hidden");
  const draftCount = connection
    .select({ n: sql<number>`count(*)` })
    .from(hidden)
    .where(and(eq(hidden.buildId, builds.id), isNull(hidden.deletedAt), eq(hidden.state, "draft")));
  return connection
    .select({ id: builds.id, draftCount: sql<number>`(${draftCount})` })
    .from(builds)
    .where(eq(builds.ownerId, ownerId))
    .orderBy(desc(builds.updatedAt), desc(builds.id))
    .all();
}

/** What a person has scheduled in all their builds, the soonest first. */
export function listScheduled(connection: Connection, ownerId: string) {
  return connection
    .select({
      id: entries.id,
      title: entries.title,
      scheduledAt: entries.scheduledAt,
      buildSlug: builds.slug,
      buildTitle: builds.title,
    })
    .from(builds)
    .innerJoin(entries, eq(entries.buildId, builds.id))
    .where(and(eq(builds.ownerId, ownerId), eq(entries.state, "scheduled"), isNull(entries.deletedAt)))
    .orderBy(asc(entries.scheduledAt), asc(entries.id))
    .all();
}

import { and, desc, eq } from "drizzle-orm";
import type { Connection } from "#server/db/client.ts";
import { entryRevisions } from "#server/db/schema/builds.ts";

export type RevisionRow = typeof entryRevisions.$inferSelect;

export function findLastRevision(connection: Connection, entryId: string): RevisionRow | undefined {
  return connection
    .select()
    .from(entryRevisions)
    .where(eq(entryRevisions.entryId, entryId))
    .orderBy(desc(entryRevisions.number))
    .limit(1)
    .get();
}

export function findRevision(
  connection: Connection,
  entryId: string,
  number: number,
): RevisionRow | undefined {
  return connection
    .select()
    .from(entryRevisions)
    .where(and(eq(entryRevisions.entryId, entryId), eq(entryRevisions.number, number)))
    .get();
}

/** Newest first, without the documents. */
export function listRevisionRows(connection: Connection, entryId: string) {
  const { number, title, reason, createdAt, words } = entryRevisions;
  return connection
    .select({ number, title, reason, createdAt, words })
    .from(entryRevisions)
    .where(eq(entryRevisions.entryId, entryId))
    .orderBy(desc(entryRevisions.number))
    .all();
}

export function insertRevision(connection: Connection, revision: RevisionRow): void {
  connection.insert(entryRevisions).values(revision).run();
}

export function updateRevision(connection: Connection, id: string, change: Partial<RevisionRow>): void {
  connection.update(entryRevisions).set(change).where(eq(entryRevisions.id, id)).run();
}

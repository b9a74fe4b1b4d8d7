import { and, desc, eq, gt, inArray, ne } from "drizzle-orm";
import type { Connection } from "#server/db/client.ts";
import { accounts, sessions, users } from "#server/db/schema/accounts.ts";
import { builds } from "#server/db/schema/builds.ts";
import { photos } from "#server/db/schema/photos.ts";

export type UserRow = typeof users.$inferSelect;
export type SessionRow = typeof sessions.$inferSelect;

export function findUser(connection: Connection, id: string): UserRow | undefined {
  return connection.select().from(users).where(eq(users.id, id)).get();
}

export function findUsers(connection: Connection, ids: string[]): UserRow[] {
  return connection.select().from(users).where(inArray(users.id, ids)).all();
}

export function findUserByHandle(connection: Connection, handle: string): UserRow | undefined {
  return connection.select().from(users).where(eq(users.handle, handle)).get();
}

export function updateUser(connection: Connection, id: string, change: Partial<UserRow>): void {
  connection.update(users).set(change).where(eq(users.id, id)).run();
}

export function hasBuild(connection: Connection, personId: string): boolean {
  const build = connection.select({ id: builds.id }).from(builds).where(eq(builds.ownerId, personId)).get();
  return build !== undefined;
}

/** Whether this person uploaded this photo as a portrait. */
export function ownsPortrait(connection: Connection, personId: string, photoId: string): boolean {
  const own = and(eq(photos.id, photoId), eq(photos.ownerId, personId), eq(photos.purpose, "avatar"));
  return connection.select({ id: photos.id }).from(photos).where(own).get() !== undefined;
}

/** When a person's password was last set, in ms. */
export function passwordSetAt(connection: Connection, personId: string): number {
  const own = and(eq(accounts.userId, personId), eq(accounts.providerId, "credential"));
  const account = connection.select({ at: accounts.updatedAt }).from(accounts).where(own).get();
  return account?.at.getTime() ?? 0;
}

/** A person's live sessions, the latest used first. */
export function listSessions(connection: Connection, userId: string, now: number): SessionRow[] {
  return connection
    .select()
    .from(sessions)
    .where(and(eq(sessions.userId, userId), gt(sessions.expiresAt, new Date(now))))
    .orderBy(desc(sessions.updatedAt), desc(sessions.id))
    .all();
}

/** Ends one of a person's sessions; false when they have no such session. */
export function deleteSession(connection: Connection, userId: string, id: string): boolean {
  const own = and(eq(sessions.userId, userId), eq(sessions.id, id));
  return connection.delete(sessions).where(own).run().changes > 0;
}

export function deleteSessionsBut(connection: Connection, userId: string, keptId: string): void {
  connection
    .delete(sessions)
    .where(and(eq(sessions.userId, userId), ne(sessions.id, keptId)))
    .run();
}

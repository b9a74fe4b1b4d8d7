import { eq, sql } from "drizzle-orm";
import { v7 as uuid } from "uuid";
import type { Connection, Database } from "#server/db/client.ts";
import { accounts, users } from "#server/db/schema/accounts.ts";
import type { DemoPerson } from "./types.ts";

export function listEmails(connection: Connection): string[] {
  return connection
    .select({ email: users.email })
    .from(users)
    .all()
    .map((row) => row.email);
}

/** A person with a checked address and a password, without a letter being sent. */
export function insertPerson(
  connection: Connection,
  person: DemoPerson,
  { id, handle, passwordHash }: { id: string; handle: string; passwordHash: string },
): void {
  const at = new Date(person.since);
  const { name, email, bio, units, role } = person;
  connection
    .insert(users)
    .values({ id, name, email, emailVerified: true, createdAt: at, updatedAt: at, handle, bio, units, role })
    .run();
  connection
    .insert(accounts)
    .values({
      id: uuid(),
      accountId: id,
      providerId: "credential",
      userId: id,
      password: passwordHash,
      createdAt: at,
      updatedAt: at,
    })
    .run();
}

export function setPortrait(connection: Connection, personId: string, photoId: string): void {
  connection.update(users).set({ avatarPhotoId: photoId }).where(eq(users.id, personId)).run();
}

/**
 * Empties every table but the record of migrations, and raises the site's version so that a server that runs
 * meanwhile forgets its kept pages.
 */
export function emptyEveryTable(database: Database): void {
  const sqlite = database.$client;
  const kept = ["__drizzle_migrations", "site_version"];
  sqlite.pragma("foreign_keys = OFF");
  try {
    database.transaction((tx) => {
      const tables = tx.all<{ name: string }>(
        sql`select name from sqlite_master where type = 'table' and name not like 'sqlite_%'`,
      );
      for (const { name } of tables) {
        if (!kept.includes(name)) tx.run(sql`delete from ${sql.identifier(name)}`);
      }
      tx.run(sql`update site_version set value = value + 1`);
    });
  } finally {
    sqlite.pragma("foreign_keys = ON");
  }
}

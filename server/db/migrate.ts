import { migrate } from "drizzle-orm/better-sqlite3/migrator";
import type { Database } from "./client.ts";

/**
 * Brings the database to the present schema.
 *
 * Foreign keys are off meanwhile: the generator rebuilds tables with a PRAGMA that does nothing inside
 * the migrator's transaction, so that dropping an old parent would delete its children.
 */
export function migrateDatabase(database: Database, folder = "drizzle"): void {
  const sqlite = database.$client;
  sqlite.pragma("foreign_keys = OFF");
  migrate(database, { migrationsFolder: folder });
  sqlite.pragma("foreign_keys = ON");
  const broken = sqlite.pragma("foreign_key_check") as unknown[];
  if (broken.length > 0) throw new Error(`${broken.length} rows point at missing rows after migrating`);
}

import { mkdirSync } from "node:fs";
import { cp } from "node:fs/promises";
import { join } from "node:path";
import Sqlite from "better-sqlite3";
import { readConfig } from "#server/config/environment.ts";

/** Copies the database (whole, also while it is written to) and the photos into a folder. */
const [target] = process.argv.slice(2);
if (!target) {
  process.stderr.write("Say where to: npm run backup -- <folder>\n");
  process.exit(1);
}
const config = readConfig(process.env);
mkdirSync(target, { recursive: true });
const database = new Sqlite(config.DATABASE_FILE, { readonly: true });
await database.backup(join(target, "soapstone.db"));
database.close();
await cp(join(config.UPLOADS_DIR, "photos"), join(target, "photos"), { recursive: true, force: true });
process.stdout.write(`Backed up to ${target}\n`);

import { pino } from "pino";
import { readConfig } from "#server/config/environment.ts";
import { openDatabase } from "#server/db/client.ts";
import { migrateDatabase } from "#server/db/migrate.ts";
import { holdsOtherPeople, resetDemo } from "#server/demo/loader.ts";
import { createLocalStorage } from "#server/storage/local-storage.ts";

/** Puts the demo back as it was on the first start. Works while the server runs; signs everyone out. */
const config = readConfig(process.env);
const database = openDatabase(config.DATABASE_FILE);
migrateDatabase(database);
if (holdsOtherPeople(database) && !process.argv.includes("--delete-everything")) {
  process.stderr.write(
    "This database holds people who are not of the demo. To delete them and all they made:\n" +
      "  npm run demo:reset -- --delete-everything\n",
  );
  process.exit(1);
}
const storage = createLocalStorage(config.UPLOADS_DIR);
await resetDemo({ database, storage, log: pino({ level: config.LOG_LEVEL }), now: Date.now() });
database.$client.close();
process.stdout.write("The demo is back as it was. The server makes its pictures as soon as it runs.\n");

import { createServer } from "node:http";
import { pino } from "pino";
import { createApp } from "./app.ts";
import { readConfig } from "./config/environment.ts";
import { openDatabase } from "./db/client.ts";
import { migrateDatabase } from "./db/migrate.ts";
import { demoState, loadDemo } from "./demo/loader.ts";
import { demoPeople } from "./demo/people.ts";
import { builtClient, type ClientBuild, developmentClient } from "./http/client-build.ts";
import { createLocalStorage } from "./storage/local-storage.ts";

const config = readConfig(process.env);
const log = pino({ level: config.LOG_LEVEL });
const database = openDatabase(config.DATABASE_FILE);
migrateDatabase(database);

const server = createServer();
const development = config.NODE_ENV === "development";
const vite = development ? await startVite() : null;
const client: ClientBuild = vite ? developmentClient(vite) : await builtClient();
if (config.DEMO)
  await loadDemo({ database, storage: createLocalStorage(config.UPLOADS_DIR), log, now: Date.now() });
const { app, start, stop } = createApp({ config, database, log, clock: Date.now, client });

server.on("request", (req, res) => {
  if (!vite) return app(req, res);
  vite.middlewares(req, res, () => app(req, res));
});
server.listen(config.PORT, config.HOST, async () => {
  await start();
  announce();
});

/** Tells whoever started it where it is and, while the demo is loaded, who to sign in as. */
function announce(): void {
  const signIns = demoState(database) === "loaded" ? demoPeople : [];
  const lines = signIns.map(
    ({ email, password, what }) => `  ${email.padEnd(28)}${password.padEnd(28)}${what}`,
  );
  const demo = lines.length > 0 ? `\nDemo sign-ins:\n${lines.join("\n")}\n` : "";
  process.stdout.write(`\nSoapstone is at ${config.SITE_URL}\n${demo}`);
}

/** Compiles the client on demand; hot reload shares the one port. */
async function startVite() {
  const { createServer: createVite } = await import("vite");
  return createVite({ server: { middlewareMode: true, hmr: { server } }, appType: "custom" });
}

let stopping = false;
/** Finishes what is under way; a second signal does not wait. */
async function shutDown(): Promise<void> {
  if (stopping) process.exit(1);
  stopping = true;
  server.close();
  server.closeIdleConnections();
  await stop();
  await vite?.close();
  database.$client.close();
  process.exit(0);
}
process.on("SIGINT", shutDown);
process.on("SIGTERM", shutDown);

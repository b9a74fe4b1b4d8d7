import { existsSync } from "node:fs";
import compression from "compression";
import { eq } from "drizzle-orm";
import express, { type Express } from "express";
import type { Logger } from "pino";
import sirv from "sirv";
import type { Config } from "./config/environment.ts";
import type { Database } from "./db/client.ts";
import { siteVersion } from "./db/schema/audit.ts";
import { serveAuth, sessionMiddleware, signOutForm } from "./features/accounts/auth-http.ts";
import { schedulePurge } from "./features/entries/purge.ts";
import { feedRoutes } from "./features/feeds/routes.ts";
import { photoFiles } from "./features/photos/files.ts";
import { scheduleCleaning } from "./features/photos/jobs.ts";
import { numberFiles } from "./features/workings/number-files.ts";
import { templateFiles } from "./features/workings/template-files.ts";
import { createFeatures } from "./features.ts";
import type { ClientBuild } from "./http/client-build.ts";
import { apiRouter, inProcessCaller } from "./http/endpoints.ts";
import { AppError, handleErrors } from "./http/errors.ts";
import { createPageCache, noPageCache } from "./http/page-cache.ts";
import { pageChoices } from "./http/page-choices.ts";
import { pages } from "./http/pages.ts";
import { securityHeaders } from "./http/security-headers.ts";
import { createQueue } from "./jobs/queue.ts";
import { mailFakeRoutes } from "./mail/fake/routes.ts";
import { mailFakeFolder } from "./mail/mail.ts";
import { createLocalStorage } from "./storage/local-storage.ts";

interface AppParts {
  config: Config;
  database: Database;
  log: Logger;
  clock: () => number;
  /** Draws pages; without it the application is the API alone, which most tests want. */
  client?: ClientBuild;
}

/** Wires everything without listening. */
export function createApp({ config, database, log, clock, client }: AppParts) {
  const queue = createQueue({ database, log, clock });
  const storage = createLocalStorage(config.UPLOADS_DIR);
  const { mail, auth, photos, entries, workings, routes } = createFeatures({
    config,
    database,
    log,
    clock,
    queue,
    storage,
  });
  const development = config.NODE_ENV === "development";

  const app = express();
  app.disable("x-powered-by");
  app.set("trust proxy", config.TRUSTED_PROXIES);
  app.use(securityHeaders({ https: config.SITE_URL.startsWith("https:"), development }));
  serveStaticFiles(app);
  app.use(compression());
  app.all("/api/auth/{*any}", serveAuth(auth));
  app.post("/sign-out", signOutForm(auth));
  app.use(sessionMiddleware(auth));
  app.use(apiRouter(routes));
  app.use(templateFiles({ workings, clock }), numberFiles({ workings }));
  app.use("/api", (req, _res, next) => {
    // The page that describes the API stands at /api itself.
    if (req.path !== "/") throw new AppError("not_found", "There is no such route.");
    next();
  });
  app.use(pageChoices());
  app.use(photoFiles({ photos, storage, log }));
  app.use(feedRoutes({ source: entries.reading, siteUrl: config.SITE_URL, clock }));
  if (config.FAKES) app.use(mailFakeRoutes(mailFakeFolder(config.UPLOADS_DIR)));
  if (client) {
    const cache = development ? noPageCache : createPageCache(() => readSiteVersion(database), clock);
    const call = inProcessCaller(routes);
    app.get("/{*path}", pages({ client, call, cache, siteUrl: config.SITE_URL, fakes: config.FAKES, log }));
  }
  app.use(handleErrors(log));

  return {
    app,
    routes,
    queue,
    mail,
    async start() {
      await mail.start();
      scheduleCleaning({ queue, clock });
      schedulePurge({ queue, clock });
      queue.start();
    },
    async stop() {
      await queue.stop();
      await mail.stop();
    },
  };
}

const yearSeconds = 365 * 24 * 3600;

/**
 * Built files carry a hash of their content in their name; those of public/ do not. Both folders are listed
 * once at the start: asking the disk for every page's address would cost more than sending the page.
 */
function serveStaticFiles(app: Express): void {
  const assets = "dist/client/assets";
  if (existsSync(assets)) {
    app.use("/assets", sirv(assets, { immutable: true, maxAge: yearSeconds, brotli: true, gzip: true }));
  }
  app.use(sirv("public", { maxAge: 3600, etag: true }));
}

function readSiteVersion(database: Database): number {
  return database.select().from(siteVersion).where(eq(siteVersion.id, 1)).get()?.value ?? 0;
}

import { join } from "node:path";
import type { Logger } from "pino";
import { calculators } from "#shared/calculators/registry.ts";
import { getApiDescription } from "#shared/contracts/api-description.ts";
import { getHealth } from "#shared/contracts/health.ts";
import type { Config } from "./config/environment.ts";
import type { Database } from "./db/client.ts";
import { demoState } from "./demo/loader.ts";
import { demoPeople } from "./demo/people.ts";
import { createAuth } from "./features/accounts/auth.ts";
import { accountRoutes } from "./features/accounts/routes.ts";
import { createAccountService } from "./features/accounts/service.ts";
import { createBuildReader } from "./features/builds/reader.ts";
import { buildRoutes } from "./features/builds/routes.ts";
import { createBuildService } from "./features/builds/service.ts";
import { createStageService } from "./features/builds/stages.ts";
import { entryRoutes } from "./features/entries/routes.ts";
import { createEntryService } from "./features/entries/service.ts";
import { registerPhotoJobs } from "./features/photos/jobs.ts";
import { photoRoutes } from "./features/photos/routes.ts";
import { createPhotoService } from "./features/photos/service.ts";
import { createIncoming } from "./features/photos/upload.ts";
import { workingRoutes } from "./features/workings/routes.ts";
import { createWorkingService } from "./features/workings/service.ts";
import { type Route, route } from "./http/endpoints.ts";
import { describeApi } from "./http/openapi.ts";
import type { Queue } from "./jobs/queue.ts";
import { createMail } from "./mail/mail.ts";
import type { Storage } from "./storage/storage.ts";

interface FeatureParts {
  config: Config;
  database: Database;
  log: Logger;
  clock: () => number;
  queue: Queue;
  storage: Storage;
}

/** Makes every feature and hands each what it needs of the others: the one place where they meet. */
export function createFeatures({ config, database, log, clock, queue, storage }: FeatureParts) {
  const mail = createMail({ config, queue, log });
  const auth = createAuth({ config, database, log, sendLetter: mail.sendLetter });

  const photoParts = { database, queue, storage, clock };
  const incoming = createIncoming(join(config.UPLOADS_DIR, "incoming"));
  const photos = createPhotoService(photoParts);
  registerPhotoJobs({ ...photoParts, incoming });
  const { photoViews } = photos;

  const accounts = createAccountService({ database, clock, photoViews });
  const reader = createBuildReader({ database, photoViews });
  const entries = createEntryService({ database, clock, queue, log, builds: reader, photoViews });
  const stages = createStageService({ database, clock, reader });
  const builds = createBuildService({ database, clock, reader, publicEntries: entries.reading.ofBuild });
  const workings = createWorkingService({
    database,
    canReadEntry: (_viewer, entry) => entry.state === "public",
  });
  const demoLoaded = config.DEMO && demoState(database) === "loaded";

  const described: Route[] = [
    route(getHealth, () => ({ ok: true as const, dueJobs: queue.dueCount() })),
    ...accountRoutes(accounts, () => (demoLoaded ? [...demoPeople] : [])),
    ...buildRoutes(builds, stages),
    ...entryRoutes(entries),
    ...photoRoutes(photos, incoming),
    ...workingRoutes(workings),
  ];
  const description = describeApi({
    endpoints: [...described.map(({ endpoint }) => endpoint), getApiDescription],
    calculators,
    siteUrl: config.SITE_URL,
  });
  const routes = [...described, route(getApiDescription, () => description)];
  return { mail, auth, photos, entries, workings, routes };
}

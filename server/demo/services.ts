import { join } from "node:path";
import type { Logger } from "pino";
import type { Database } from "#server/db/client.ts";
import { createBuildReader } from "#server/features/builds/reader.ts";
import { createBuildService } from "#server/features/builds/service.ts";
import { createStageService } from "#server/features/builds/stages.ts";
import { createEntryService } from "#server/features/entries/service.ts";
import { registerPhotoJobs } from "#server/features/photos/jobs.ts";
import { createPhotoService } from "#server/features/photos/service.ts";
import { createIncoming } from "#server/features/photos/upload.ts";
import { createQueue } from "#server/jobs/queue.ts";
import type { Storage } from "#server/storage/storage.ts";

export interface DemoServiceParts {
  database: Database;
  storage: Storage;
  log: Logger;
  clock: () => number;
  /** Where uploads wait while they are decoded. */
  folder: string;
}

export type DemoServices = ReturnType<typeof createDemoServices>;

/**
 * The product's own services on a clock of their own, which is what puts entries into the past. Their queue is
 * never started: what they queue lies in the database until the server's queue takes it.
 */
export function createDemoServices({ database, storage, log, clock, folder }: DemoServiceParts) {
  const queue = createQueue({ database, log, clock });
  const photoParts = { database, queue, storage, clock };
  const photos = createPhotoService(photoParts);
  registerPhotoJobs({ ...photoParts, incoming: createIncoming(join(folder, "incoming")) });
  const reader = createBuildReader({ database, photoViews: photos.photoViews });
  const entries = createEntryService({
    database,
    clock,
    queue,
    log,
    builds: reader,
    photoViews: photos.photoViews,
  });
  const parts = { database, clock, reader };
  return {
    photos,
    builds: createBuildService({ ...parts, publicEntries: () => [] }),
    stages: createStageService(parts),
    entries,
  };
}

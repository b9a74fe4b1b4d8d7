import type { Logger } from "pino";
import type { Connection, Database } from "#server/db/client.ts";
import { AppError } from "#server/http/errors.ts";
import type { Person } from "#server/http/viewer.ts";
import type { Queue } from "#server/jobs/queue.ts";
import type { BuildSummary, StageView } from "#shared/contracts/builds.ts";
import type { PhotoView } from "#shared/contracts/photos.ts";
import { findOwnedEntry, type OwnedEntry } from "./repository.ts";

/** What entries need of builds; handed over where the server is put together. */
export interface BuildsPort {
  find(
    slug: string,
  ): { id: string; ownerId: string; createdAt: number; publishedAt: number | null } | undefined;
  summaries(ids: Iterable<string>): Map<string, BuildSummary>;
  stagesOf(buildId: string, which: "public" | "all", connection?: Connection): StageView[];
}

export interface EntryParts {
  database: Database;
  clock: () => number;
  queue: Queue;
  log: Logger;
  builds: BuildsPort;
  photoViews: (ids: Iterable<string>) => Map<string, PhotoView>;
}

/** Takes the write lock at the start: what a transaction read cannot change before it writes. */
export const writing = { behavior: "immediate" } as const;

/** The entry, when it is this person's; entries of others are answered as if there were none. */
export function findOwn(connection: Connection, viewer: Person, id: string): OwnedEntry {
  const found = findOwnedEntry(connection, id);
  if (found?.build.ownerId !== viewer.id) {
    throw new AppError("not_found", "There is no such entry in your workshop.");
  }
  return found;
}

/** Refuses an act on a version of the draft that is not the latest. */
export function checkVersion({ entry }: OwnedEntry, baseVersion: number): void {
  if (entry.version === baseVersion) return;
  throw new AppError(
    "draft_conflict",
    "This entry was changed somewhere else meanwhile. Nothing you typed is lost: merge both, or keep yours as a copy.",
  );
}

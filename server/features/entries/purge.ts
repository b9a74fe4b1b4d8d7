import { z } from "zod";
import type { EntryParts } from "./parts.ts";
import { purgeDeletedEntries } from "./repository.ts";

const dayMs = 24 * 3600_000;
const keptForMs = 30 * dayMs;

type PurgeParts = Pick<EntryParts, "database" | "queue" | "clock">;

/** Registers the daily job that removes for good what was deleted a month ago. */
export function registerPurge(parts: PurgeParts): void {
  parts.queue.register("entry.purge", z.object({}), () => {
    parts.database.transaction((tx) => purgeDeletedEntries(tx, parts.clock() - keptForMs));
    schedulePurge(parts);
  });
}

/** Queues the next day's purge; calling it again the same day changes nothing. Call it at start. */
export function schedulePurge({ queue, clock }: Pick<PurgeParts, "queue" | "clock">): void {
  const day = Math.floor(clock() / dayMs) + 1;
  queue.enqueue("entry.purge", {}, { runAt: day * dayMs, uniqueKey: `entry.purge:${day}` });
}

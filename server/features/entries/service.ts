import { createDrafts } from "./drafts.ts";
import { createHistory } from "./history.ts";
import type { EntryParts } from "./parts.ts";
import { createPublishing } from "./publishing.ts";
import { registerPurge } from "./purge.ts";
import { createReading } from "./reading.ts";
import { createWorkshop } from "./workshop.ts";

export type EntryService = ReturnType<typeof createEntryService>;

/** Everything about entries, by who does it: the builder at work, or anyone reading. Registers its jobs. */
export function createEntryService(parts: EntryParts) {
  const drafts = createDrafts(parts);
  const publishing = createPublishing(parts);
  publishing.registerJobs();
  registerPurge(parts);
  return {
    drafts,
    publishing,
    history: createHistory(parts, drafts),
    reading: createReading(parts),
    workshop: createWorkshop(parts),
  };
}

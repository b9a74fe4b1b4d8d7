import type { StageView } from "#shared/contracts/builds.ts";
import type { EntryState, WorkshopEntry } from "#shared/contracts/entries.ts";

export interface StageGroup {
  stage: StageView;
  entries: WorkshopEntry[];
}

/** What waits for the builder comes first. */
const stateOrder: EntryState[] = ["draft", "scheduled", "public", "withdrawn"];

/** Where an entry stands within its state: the next to go public first, otherwise the newest first. */
function momentOf({ state, scheduledAt, publishedAt, updatedAt }: WorkshopEntry): number {
  if (state === "scheduled") return -(scheduledAt ?? updatedAt);
  return state === "public" ? (publishedAt ?? updatedAt) : updatedAt;
}

function byStateThenMoment(a: WorkshopEntry, b: WorkshopEntry): number {
  return stateOrder.indexOf(a.state) - stateOrder.indexOf(b.state) || momentOf(b) - momentOf(a);
}

/** A build's entries by stage, in the order of the stages; with `state`, only those in it. */
export function groupEntries(
  stages: StageView[],
  entries: WorkshopEntry[],
  state: EntryState | null,
): StageGroup[] {
  const shown = entries.filter((entry) => state === null || entry.state === state).sort(byStateThenMoment);
  return stages.map((stage) => ({ stage, entries: shown.filter(({ stageId }) => stageId === stage.id) }));
}

/** How many entries are in each state. */
export function countStates(entries: WorkshopEntry[]): Record<EntryState, number> {
  const counts: Record<EntryState, number> = { draft: 0, scheduled: 0, public: 0, withdrawn: 0 };
  for (const { state } of entries) counts[state] += 1;
  return counts;
}

import type { EntrySummary, StageView } from "#shared/contracts/builds.ts";

/** A stage with its public entries, in the order they were published. */
export interface StageEntries {
  stage: StageView;
  entries: EntrySummary[];
}

/** Entries under their stages, in the maker's order of stages. Stages without entries are kept: they are the plan. */
export function entriesByStage(stages: StageView[], entries: EntrySummary[]): StageEntries[] {
  return stages.map((stage) => ({
    stage,
    entries: entries.filter((entry) => entry.stageId === stage.id).toSorted((a, b) => a.number - b.number),
  }));
}

/** Ids of the entries that are the first published in their stage: the longer ticks of the time line. */
export function firstOfStages(entries: EntrySummary[]): Set<string> {
  const first = new Map<string, EntrySummary>();
  for (const entry of entries) {
    const before = first.get(entry.stageId);
    if (!before || entry.publishedAt < before.publishedAt) first.set(entry.stageId, entry);
  }
  return new Set([...first.values()].map((entry) => entry.id));
}

import type { BuildSummary, EntrySummary } from "#shared/contracts/builds.ts";

/** A public entry as feeds need it. */
export type FeedEntry = EntrySummary & { updatedAt: number };

/** Where feeds get what they tell; the entries feature's reading side fits. */
export interface FeedSource {
  latest(cursor: undefined): { items: (FeedEntry & { build: BuildSummary })[] };
  newestOfBuild(slug: string): { build: BuildSummary; entries: FeedEntry[] } | null;
  addresses(most: number): { build: string; entry: string; person: string; updatedAt: number | null }[];
}

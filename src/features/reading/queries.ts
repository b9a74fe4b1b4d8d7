import { queryOptions } from "@tanstack/react-query";
import type { BuildStatus, getBuild, latestEntries, listBuilds } from "#shared/contracts/builds.ts";
import type { getEntry } from "#shared/contracts/entries.ts";
import type { getPerson } from "#shared/contracts/people.ts";
import type { Api } from "#src/lib/api.ts";

/** A reader may look at a page for this long before it is fetched anew; one's own changes make all of it stale. */
const staleTime = 5 * 60_000;

/** Which part of a list of builds is wanted. */
export interface BuildListQuery {
  after?: string | undefined;
  owner?: string | undefined;
  status?: BuildStatus | undefined;
}

export function buildsQuery(api: Api, query: BuildListQuery = {}) {
  return queryOptions({
    queryKey: ["builds", query],
    staleTime,
    queryFn: () => api.call<typeof listBuilds>("GET /api/builds", { query }),
  });
}

export function latestEntriesQuery(api: Api) {
  return queryOptions({
    queryKey: ["latest-entries"],
    staleTime,
    queryFn: () => api.call<typeof latestEntries>("GET /api/entries", { query: {} }),
  });
}

export function buildQuery(api: Api, build: string) {
  return queryOptions({
    queryKey: ["build", build],
    staleTime,
    queryFn: () => api.call<typeof getBuild>("GET /api/builds/:build", { params: { build } }),
  });
}

export function entryQuery(api: Api, build: string, entry: string) {
  return queryOptions({
    queryKey: ["entry", build, entry],
    staleTime,
    queryFn: () =>
      api.call<typeof getEntry>("GET /api/builds/:build/entries/:entry", { params: { build, entry } }),
  });
}

export function personQuery(api: Api, handle: string) {
  return queryOptions({
    queryKey: ["person", handle],
    staleTime,
    queryFn: () => api.call<typeof getPerson>("GET /api/people/:handle", { params: { handle } }),
  });
}

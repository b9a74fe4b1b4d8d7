import { queryOptions, useQuery } from "@tanstack/react-query";
import type { getMe, Me } from "#shared/contracts/people.ts";
import { type Api, useApi } from "./api.ts";

/** The signed-in person, or null. Every page loads it, for the header and the choice of units. */
export function meQuery(api: Api) {
  return queryOptions({
    queryKey: ["me"],
    queryFn: async () => (await api.call<typeof getMe>("GET /api/me", {})).me,
    staleTime: 5 * 60_000,
  });
}

/** Who is looking at this page; null when signed out. */
export function useViewer(): Me | null {
  return useQuery(meQuery(useApi())).data ?? null;
}

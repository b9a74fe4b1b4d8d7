import { queryOptions, useMutation, useQueryClient } from "@tanstack/react-query";
import type { BuildPage, CreateBuildBody, createBuild } from "#shared/contracts/builds.ts";
import type { createEntry, getOwnBuild, listOwnBuilds, WorkshopBuild } from "#shared/contracts/entries.ts";
import { type Api, useApi } from "#src/lib/api.ts";

/** How often a cover that is still being worked on is looked at again. */
const photoCheckMs = 1500;

/** The signed-in person's own builds and what they have scheduled. */
export function ownBuildsQuery(api: Api) {
  return queryOptions({
    queryKey: ["workshop"],
    queryFn: () => api.call<typeof listOwnBuilds>("GET /api/workshop", {}),
  });
}

export function ownBuildKey(slug: string) {
  return ["workshop", "build", slug] as const;
}

/** One own build with entries in every state. A former address answers with the present one in `slug`. */
export function ownBuildQuery(api: Api, slug: string) {
  return queryOptions({
    queryKey: ownBuildKey(slug),
    queryFn: (): Promise<WorkshopBuild> =>
      api.call<typeof getOwnBuild>("GET /api/workshop/builds/:build", { params: { build: slug } }),
    refetchInterval: ({ state }) => (state.data?.cover?.state === "processing" ? photoCheckMs : false),
  });
}

export function useCreateBuild() {
  const api = useApi();
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: (body: CreateBuildBody): Promise<BuildPage> =>
      api.call<typeof createBuild>("POST /api/builds", { body }),
    // The list of builds is longer by one, and the person is a builder from now on.
    onSuccess: () => queryClient.invalidateQueries({ refetchType: "none" }),
  });
}

/** Begins a draft in a stage; the caller opens the editor on it. */
export function useCreateEntry(build: string) {
  const api = useApi();
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: (stageId: string) =>
      api.call<typeof createEntry>("POST /api/builds/:build/entries", {
        params: { build },
        body: { stageId },
      }),
    onSuccess: () => queryClient.invalidateQueries({ queryKey: ["workshop"], refetchType: "none" }),
  });
}

import { useMutation, useQueryClient } from "@tanstack/react-query";
import type {
  createStage,
  deleteStage,
  orderStages,
  StageState,
  UpdateBuildBody,
  updateBuild,
  updateStage,
} from "#shared/contracts/builds.ts";
import type { WorkshopBuild } from "#shared/contracts/entries.ts";
import { useApi } from "#src/lib/api.ts";
import {
  withAnswer,
  withoutStage,
  withStageAdded,
  withStageChanged,
  withStagesOrdered,
} from "./own-build-changes.ts";
import { ownBuildKey } from "./queries.ts";

interface Change<Variables, Answer> {
  send: (variables: Variables) => Promise<Answer>;
  /** What the page shows until the server has answered. */
  foresee?: (build: WorkshopBuild, variables: Variables) => WorkshopBuild;
  /** What the answer makes of the page. */
  take?: (build: WorkshopBuild, answer: Answer) => WorkshopBuild;
}

/**
 * A change of one own build. It shows at once, changes go to the server one after the other, a refusal
 * puts back what was there, and when the last has come home the page is read afresh.
 */
function useOwnBuildChange<Variables, Answer>(slug: string, change: Change<Variables, Answer>) {
  const queryClient = useQueryClient();
  const queryKey = ownBuildKey(slug);
  const mutationKey = ["change-own-build", slug];
  const write = (next: (build: WorkshopBuild) => WorkshopBuild) =>
    queryClient.setQueryData<WorkshopBuild>(queryKey, (build) => build && next(build));
  return useMutation({
    mutationKey,
    scope: { id: mutationKey.join("/") },
    mutationFn: change.send,
    onMutate: async (variables) => {
      await queryClient.cancelQueries({ queryKey });
      const before = queryClient.getQueryData<WorkshopBuild>(queryKey);
      write((build) => change.foresee?.(build, variables) ?? build);
      return { before };
    },
    onSuccess: (answer) => write((build) => change.take?.(build, answer) ?? build),
    onError: (_error, _variables, context) => {
      if (context?.before) queryClient.setQueryData(queryKey, context.before);
    },
    onSettled: () => {
      // Any page may show the build, so all of them are stale; those on the screen are read again.
      if (queryClient.isMutating({ mutationKey }) === 1) void queryClient.invalidateQueries();
    },
  });
}

export function useUpdateBuild(slug: string) {
  const api = useApi();
  return useOwnBuildChange(slug, {
    send: (body: UpdateBuildBody) =>
      api.call<typeof updateBuild>("PATCH /api/builds/:build", { params: { build: slug }, body }),
    take: withAnswer,
  });
}

export function useAddStage(slug: string) {
  const api = useApi();
  return useOwnBuildChange(slug, {
    send: (body: { title: string }) =>
      api.call<typeof createStage>("POST /api/builds/:build/stages", { params: { build: slug }, body }),
    take: withStageAdded,
  });
}

export function useChangeStage(slug: string) {
  const api = useApi();
  return useOwnBuildChange(slug, {
    send: ({ id, ...body }: { id: string; title?: string; state?: StageState }) =>
      api.call<typeof updateStage>("PATCH /api/stages/:stage", { params: { stage: id }, body }),
    foresee: (build, { id, ...body }) => withStageChanged(build, id, body),
  });
}

export function useDeleteStage(slug: string) {
  const api = useApi();
  return useOwnBuildChange(slug, {
    send: (id: string) =>
      api.call<typeof deleteStage>("DELETE /api/stages/:stage", { params: { stage: id } }),
    foresee: withoutStage,
  });
}

export function useOrderStages(slug: string) {
  const api = useApi();
  return useOwnBuildChange(slug, {
    send: (stages: string[]) =>
      api.call<typeof orderStages>("PUT /api/builds/:build/stages/order", {
        params: { build: slug },
        body: { stages },
      }),
    foresee: withStagesOrdered,
  });
}

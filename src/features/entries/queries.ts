import { type QueryClient, queryOptions, useMutation, useQueryClient } from "@tanstack/react-query";
import type {
  copyDraft,
  deleteEntry,
  EntryDraft,
  getDraft,
  getRevision,
  listRevisions,
  publishEntry,
  renameEntry,
  restoreRevision,
  saveDraft,
  scheduleEntry,
  withdrawEntry,
} from "#shared/contracts/entries.ts";
import { type Api, useApi } from "#src/lib/api.ts";
import type { DraftContent } from "./draft-content.ts";

export function draftKey(id: string) {
  return ["draft", id] as const;
}

/** The builder's own copy of an entry. It is never refetched behind the editor's back. */
export function draftQuery(api: Api, id: string) {
  return queryOptions({
    queryKey: draftKey(id),
    queryFn: () => fetchDraft(api, id),
    staleTime: Number.POSITIVE_INFINITY,
    gcTime: 0,
  });
}

export function fetchDraft(api: Api, id: string): Promise<EntryDraft> {
  return api.call<typeof getDraft>("GET /api/entries/:entry/draft", { params: { entry: id } });
}

export function putDraft(
  api: Api,
  id: string,
  content: DraftContent,
  baseVersion: number,
): Promise<EntryDraft> {
  return api.call<typeof saveDraft>("PUT /api/entries/:entry/draft", {
    params: { entry: id },
    body: { ...content, baseVersion },
  });
}

export function postCopy(api: Api, id: string, content: DraftContent): Promise<EntryDraft> {
  return api.call<typeof copyDraft>("POST /api/entries/:entry/copies", {
    params: { entry: id },
    body: content,
  });
}

/** Takes in what the server answered; lists that show the entry are asked for again when they are next seen. */
export function keepDraftAnswer(queryClient: QueryClient, draft: EntryDraft): void {
  queryClient.setQueryData(draftKey(draft.id), draft);
  void queryClient.invalidateQueries({ queryKey: ["workshop"], refetchType: "none" });
  void queryClient.invalidateQueries({ queryKey: revisionsKey(draft.id), refetchType: "none" });
}

export type PublishingAct =
  | { act: "publish" }
  | { act: "schedule"; at: number | null }
  | { act: "withdraw" }
  | { act: "rename"; slug: string };

/** Publishing, the schedule, withdrawing and the address: each answers with the draft as it then is. */
export function usePublishing(entry: string, baseVersion: () => number) {
  const api = useApi();
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: (request: PublishingAct): Promise<EntryDraft> => {
      const params = { entry };
      switch (request.act) {
        case "publish":
          return api.call<typeof publishEntry>("POST /api/entries/:entry/publish", {
            params,
            body: { baseVersion: baseVersion() },
          });
        case "schedule":
          return api.call<typeof scheduleEntry>("POST /api/entries/:entry/schedule", {
            params,
            body: { baseVersion: baseVersion(), at: request.at },
          });
        case "withdraw":
          return api.call<typeof withdrawEntry>("POST /api/entries/:entry/withdraw", { params });
        case "rename":
          return api.call<typeof renameEntry>("POST /api/entries/:entry/rename", {
            params,
            body: { slug: request.slug },
          });
      }
    },
    onSuccess: (draft) => {
      keepDraftAnswer(queryClient, draft);
      // What readers see has changed too.
      void queryClient.invalidateQueries({
        predicate: ({ queryKey }) => queryKey[0] !== "draft",
        refetchType: "none",
      });
    },
  });
}

export function useDeleteDraft(entry: string) {
  const api = useApi();
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: () => api.call<typeof deleteEntry>("DELETE /api/entries/:entry", { params: { entry } }),
    onSuccess: () => queryClient.invalidateQueries({ queryKey: ["workshop"], refetchType: "none" }),
  });
}

function revisionsKey(entry: string) {
  return ["revisions", entry] as const;
}

export function revisionsQuery(api: Api, entry: string) {
  return queryOptions({
    queryKey: revisionsKey(entry),
    queryFn: async () => {
      const params = { entry };
      const { revisions } = await api.call<typeof listRevisions>("GET /api/entries/:entry/revisions", {
        params,
      });
      return revisions;
    },
    staleTime: 0,
  });
}

export function revisionQuery(api: Api, entry: string, revision: number) {
  return queryOptions({
    queryKey: [...revisionsKey(entry), revision],
    queryFn: () =>
      api.call<typeof getRevision>("GET /api/entries/:entry/revisions/:revision", {
        params: { entry, revision },
      }),
    staleTime: Number.POSITIVE_INFINITY,
  });
}

export function useRestoreRevision(entry: string) {
  const api = useApi();
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: async (revision: number) => {
      const { version } = await fetchDraft(api, entry);
      return api.call<typeof restoreRevision>("POST /api/entries/:entry/revisions/:revision/restore", {
        params: { entry, revision },
        body: { baseVersion: version },
      });
    },
    onSuccess: (draft) => keepDraftAnswer(queryClient, draft),
  });
}

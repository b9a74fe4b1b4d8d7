import { queryOptions, useMutation, useQueryClient } from "@tanstack/react-query";
import type { UpdateProfileBody, updateProfile } from "#shared/contracts/people.ts";
import type {
  endOtherSessions,
  endSession,
  listDemoSignIns,
  listSessions,
} from "#shared/contracts/sessions.ts";
import { type Api, useApi } from "#src/lib/api.ts";
import { meQuery } from "#src/lib/viewer.ts";

export function demoSignInsQuery(api: Api) {
  return queryOptions({
    queryKey: ["demo-sign-ins"],
    queryFn: async () => (await api.call<typeof listDemoSignIns>("GET /api/demo-sign-ins", {})).signIns,
    staleTime: Number.POSITIVE_INFINITY,
  });
}

export function sessionsQuery(api: Api) {
  return queryOptions({
    queryKey: ["me", "sessions"],
    queryFn: async () => (await api.call<typeof listSessions>("GET /api/me/sessions", {})).sessions,
  });
}

export function useUpdateProfile() {
  const api = useApi();
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: (body: UpdateProfileBody) => api.call<typeof updateProfile>("PATCH /api/me", { body }),
    onSuccess(me) {
      queryClient.setQueryData(meQuery(api).queryKey, me);
      // The name and the picture stand beside everything this person made.
      void queryClient.invalidateQueries({ predicate: ({ queryKey }) => queryKey[0] !== "me" });
    },
  });
}

export function useEndSession() {
  const api = useApi();
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: (session: string) =>
      api.call<typeof endSession>("DELETE /api/me/sessions/:session", { params: { session } }),
    onSettled: () => queryClient.invalidateQueries({ queryKey: sessionsQuery(api).queryKey }),
  });
}

export function useEndOtherSessions() {
  const api = useApi();
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: () => api.call<typeof endOtherSessions>("DELETE /api/me/sessions", {}),
    onSuccess: ({ sessions }) => queryClient.setQueryData(sessionsQuery(api).queryKey, sessions),
  });
}

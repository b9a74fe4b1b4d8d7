import { queryOptions, useMutation, useQueryClient } from "@tanstack/react-query";
import type { getPhoto, PhotoView, rotatePhoto } from "#shared/contracts/photos.ts";
import { type Api, useApi } from "#src/lib/api.ts";

const checkEvery = 1500;

export function photoKey(id: string) {
  return ["photo", id] as const;
}

/** A photo; asked for again while its pictures are in the making. */
export function photoQuery(api: Api, id: string) {
  return queryOptions({
    queryKey: photoKey(id),
    queryFn: (): Promise<PhotoView> =>
      api.call<typeof getPhoto>("GET /api/photos/:photo", { params: { photo: id } }),
    refetchInterval: ({ state }) => (state.data?.state === "processing" ? checkEvery : false),
  });
}

/** Turns a photo a quarter turn; the pictures are made anew on the server. */
export function useRotatePhoto(id: string) {
  const api = useApi();
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: (turn: 90 | -90) =>
      api.call<typeof rotatePhoto>("POST /api/photos/:photo/rotate", {
        params: { photo: id },
        body: { turn },
      }),
    onSuccess: (photo) => queryClient.setQueryData(photoKey(id), photo),
  });
}

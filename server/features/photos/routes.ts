import { type Route, route } from "#server/http/endpoints.ts";
import { signedIn } from "#server/http/policy.ts";
import { deletePhoto, getPhoto, rotatePhoto, uploadPhoto } from "#shared/contracts/photos.ts";
import type { PhotoService } from "./service.ts";
import type { Incoming } from "./upload.ts";
import { photoView } from "./views.ts";

/** The API of photos; the pictures themselves are served by `photoFiles`. */
export function photoRoutes(photos: PhotoService, incoming: Incoming): Route[] {
  return [
    route(
      uploadPhoto,
      (_request, { viewer, http }) => photos.upload(signedIn(viewer), http?.file, http?.body),
      incoming.receive,
    ),
    route(getPhoto, ({ params }, { viewer }) => photoView(photos.find(viewer, params.photo).photo)),
    route(rotatePhoto, ({ params, body }, { viewer }) =>
      photos.rotate(signedIn(viewer), params.photo, body.turn),
    ),
    route(deletePhoto, async ({ params }, { viewer }) => {
      await photos.remove(signedIn(viewer), params.photo);
      return { done: true as const };
    }),
  ];
}

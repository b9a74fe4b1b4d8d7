import { z } from "zod";
import { done, id } from "./common.ts";
import { endpoint } from "./endpoint.ts";

/** Widths in pixels of the pictures made from each photo. */
export const photoWidths = [480, 960, 1600] as const;

/** The limits an upload must keep; each has its own message in `server/features/photos`. */
export const photoLimits = {
  bytes: 25 * 1024 * 1024,
  pixels: 60_000_000,
  perUpload: 12,
  perBuild: 2000,
} as const;

export const photoPurpose = z.enum(["entry", "cover", "avatar"]);

const photoSource = z.object({ width: z.int(), url: z.string() });

/** A photo as a page needs it: its shape, a tiny placeholder, and the files to choose from. */
export const photoView = z.object({
  id,
  state: z.enum(["processing", "ready", "failed"]),
  /** Why it failed, for the builder. */
  failure: z.string().nullable(),
  width: z.int(),
  height: z.int(),
  rotation: z.union([z.literal(0), z.literal(90), z.literal(180), z.literal(270)]),
  /** Thumbhash (base64, about 30 bytes) of what to show until the photo has come. */
  placeholder: z.string().nullable(),
  webp: z.array(photoSource),
  avif: z.array(photoSource),
});

export type PhotoView = z.infer<typeof photoView>;

const photoParams = z.object({ photo: id });

/** Multipart: one file in the field `photo`, with the fields of `uploadPhotoFields`. */
export const uploadPhotoFields = z.object({ purpose: photoPurpose, build: id.optional() });

export const uploadPhoto = endpoint({
  method: "POST",
  path: "/api/photos",
  access: "signed_in",
  summary: "Upload a photo (multipart, field `photo`)",
  response: photoView,
  status: 201,
});

export const getPhoto = endpoint({
  method: "GET",
  path: "/api/photos/:photo",
  access: "anyone",
  summary: "A photo's shape and files",
  params: photoParams,
  response: photoView,
});

export const rotatePhoto = endpoint({
  method: "POST",
  path: "/api/photos/:photo/rotate",
  access: "signed_in",
  summary: "Turn a photo a quarter turn, without cropping",
  params: photoParams,
  body: z.object({ turn: z.union([z.literal(90), z.literal(-90)]) }),
  response: photoView,
});

export const deletePhoto = endpoint({
  method: "DELETE",
  path: "/api/photos/:photo",
  access: "signed_in",
  summary: "Delete a photo that no entry uses",
  params: photoParams,
  response: done,
});

import type { PhotoView } from "#shared/contracts/photos.ts";
import { ApiError, apiErrorFrom } from "./api.ts";

export interface PhotoUpload {
  file: File;
  purpose: "entry" | "cover" | "avatar";
  /** The build it belongs to; an avatar has none. */
  buildId?: string;
  /** Gets the part sent so far, 0 to 1. */
  onProgress?: (part: number) => void;
  signal?: AbortSignal;
}

const unreachable = "The photo did not reach the server. Check the connection and try again.";

/**
 * Sends one photo. By XMLHttpRequest, as `fetch` does not tell how much has been sent. Rejects with an
 * `ApiError`, or with an `AbortError` when `signal` ended it.
 */
export function uploadPhoto({ file, purpose, buildId, onProgress, signal }: PhotoUpload): Promise<PhotoView> {
  const form = new FormData();
  form.set("purpose", purpose);
  if (buildId) form.set("build", buildId);
  // Last, so that the server knows the fields before the bytes come.
  form.set("photo", file);
  return new Promise((resolve, reject) => {
    const request = new XMLHttpRequest();
    const stop = () => request.abort();
    request.open("POST", "/api/photos");
    request.responseType = "json";
    request.upload.addEventListener("progress", ({ loaded, total }) =>
      onProgress?.(total ? loaded / total : 0),
    );
    request.addEventListener("load", () => {
      if (request.status < 400) resolve(request.response as PhotoView);
      else reject(apiErrorFrom(request.status, request.response));
    });
    request.addEventListener("error", () => reject(new ApiError(0, "offline", unreachable)));
    request.addEventListener("abort", () =>
      reject(new DOMException("The upload was cancelled.", "AbortError")),
    );
    request.addEventListener("loadend", () => signal?.removeEventListener("abort", stop));
    signal?.addEventListener("abort", stop);
    if (signal?.aborted) reject(new DOMException("The upload was cancelled.", "AbortError"));
    else request.send(form);
  });
}

import type { PhotoView } from "#shared/contracts/photos.ts";
import { ApiError, apiErrorFrom } from "#src/lib/api.ts";

export interface UploadRequest {
  file: File;
  purpose: "entry" | "cover" | "avatar";
  /** The build's id, for photos of an entry or a cover. */
  build?: string;
  /** From 0 to 1, as the bytes go out. */
  onProgress(share: number): void;
  signal: AbortSignal;
}

/** Sends one photo. XMLHttpRequest, because fetch tells nothing of how far an upload has come. */
export function uploadPhoto({ file, purpose, build, onProgress, signal }: UploadRequest): Promise<PhotoView> {
  return new Promise((resolve, reject) => {
    const request = new XMLHttpRequest();
    request.open("POST", "/api/photos");
    request.responseType = "json";
    request.upload.onprogress = ({ loaded, total }) => onProgress(total > 0 ? loaded / total : 0);
    request.onload = () => {
      if (request.status < 400 && request.response) resolve(request.response as PhotoView);
      else reject(apiErrorFrom(request.status, request.response));
    };
    request.onerror = () =>
      reject(new ApiError(0, "offline", "The connection broke off before the photo was across."));
    request.onabort = () => reject(signal.reason);
    signal.addEventListener("abort", () => request.abort(), { once: true });
    request.send(formOf(file, purpose, build));
  });
}

function formOf(file: File, purpose: string, build: string | undefined): FormData {
  const form = new FormData();
  // The fields go first: the server reads them before it takes the file.
  form.set("purpose", purpose);
  if (build) form.set("build", build);
  form.set("photo", file);
  return form;
}

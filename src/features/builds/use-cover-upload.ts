import { useEffect, useRef, useState } from "react";
import { type PhotoView, photoLimits } from "#shared/contracts/photos.ts";
import { messageOf } from "#src/lib/form-errors.ts";
import { uploadPhoto } from "#src/lib/upload.ts";

export type CoverUpload =
  | { state: "idle" }
  | { state: "sending"; name: string; part: number }
  | { state: "failed"; name: string; message: string; retry: (() => void) | null };

const idle: CoverUpload = { state: "idle" };

/** One upload at a time; `onSent` gets the photo that the server has taken in. */
export function useCoverUpload(buildId: string, onSent: (photo: PhotoView) => Promise<unknown>) {
  const [upload, setUpload] = useState<CoverUpload>(idle);
  const running = useRef<AbortController>(null);
  useEffect(() => () => running.current?.abort(), []);

  async function send(file: File): Promise<void> {
    const { name } = file;
    if (file.size > photoLimits.bytes) {
      const message = `This photo is larger than ${photoLimits.bytes / 1024 / 1024} MB. Save a smaller copy and choose that.`;
      setUpload({ state: "failed", name, message, retry: null });
      return;
    }
    const controller = new AbortController();
    running.current = controller;
    setUpload({ state: "sending", name, part: 0 });
    try {
      const onProgress = (part: number) => setUpload({ state: "sending", name, part });
      await onSent(
        await uploadPhoto({ file, purpose: "cover", buildId, onProgress, signal: controller.signal }),
      );
      setUpload(idle);
    } catch (error) {
      if (controller.signal.aborted) setUpload(idle);
      else setUpload({ state: "failed", name, message: messageOf(error), retry: () => void send(file) });
    }
  }

  return { upload, send, cancel: () => running.current?.abort(), dismiss: () => setUpload(idle) };
}

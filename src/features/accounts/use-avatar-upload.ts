import { useEffect, useRef, useState } from "react";
import { photoLimits } from "#shared/contracts/photos.ts";
import { messageOf } from "#src/lib/form-errors.ts";
import { uploadPhoto } from "#src/lib/upload.ts";

export type AvatarUpload =
  | { state: "idle" }
  | { state: "sending"; part: number }
  | { state: "failed"; message: string };

const idle: AvatarUpload = { state: "idle" };

/** One upload at a time; `onSent` gets the id of the photo that the server has taken in. */
export function useAvatarUpload(onSent: (photoId: string) => Promise<unknown>) {
  const [upload, setUpload] = useState<AvatarUpload>(idle);
  const running = useRef<AbortController>(null);
  useEffect(() => () => running.current?.abort(), []);

  async function send(file: File): Promise<void> {
    if (file.size > photoLimits.bytes) {
      const message = `It is larger than ${photoLimits.bytes / 1024 / 1024} MB. Save a smaller copy and choose that.`;
      setUpload({ state: "failed", message });
      return;
    }
    const controller = new AbortController();
    running.current = controller;
    setUpload({ state: "sending", part: 0 });
    try {
      const onProgress = (part: number) => setUpload({ state: "sending", part });
      const photo = await uploadPhoto({ file, purpose: "avatar", onProgress, signal: controller.signal });
      await onSent(photo.id);
      setUpload(idle);
    } catch (error) {
      setUpload(controller.signal.aborted ? idle : { state: "failed", message: messageOf(error) });
    }
  }

  return { upload, send, cancel: () => running.current?.abort(), dismiss: () => setUpload(idle) };
}

import { useRef } from "react";
import type { Me } from "#shared/contracts/people.ts";
import { Avatar } from "#src/components/avatar.tsx";
import { Button } from "#src/components/button.tsx";
import { Notice } from "#src/components/notice.tsx";
import { Progress } from "#src/components/progress.tsx";
import { toasts } from "#src/components/toast-store.ts";
import { messageOf } from "#src/lib/form-errors.ts";
import { useHydrated } from "#src/lib/use-hydrated.ts";
import { useUpdateProfile } from "../queries.ts";
import { useAvatarUpload } from "../use-avatar-upload.ts";

/** The person's picture: choose, change, take away. */
export function AvatarEditor({ me }: { me: Me }) {
  const hydrated = useHydrated();
  const input = useRef<HTMLInputElement>(null);
  const update = useUpdateProfile();
  const { upload, send, cancel, dismiss } = useAvatarUpload((id) =>
    update.mutateAsync({ avatarPhotoId: id }),
  );
  const takeAway = () =>
    update.mutate(
      { avatarPhotoId: null },
      { onError: (error) => toasts.show({ kind: "error", message: messageOf(error) }) },
    );
  const { avatar } = me;
  const src = avatar?.webp[0]?.url;
  return (
    <div className="flex flex-col gap-4">
      <div className="flex flex-wrap items-center gap-4">
        <Avatar name={me.name} size="large" {...(src && { src })} />
        <input
          ref={input}
          type="file"
          accept="image/*"
          aria-label="Your picture"
          hidden
          onChange={({ currentTarget }) => {
            const [file] = currentTarget.files ?? [];
            // Emptied, so that the same file can be chosen again.
            if (file) void send(file);
            currentTarget.value = "";
          }}
        />
        <div className="flex flex-wrap gap-2">
          <Button disabled={!hydrated || upload.state === "sending"} onClick={() => input.current?.click()}>
            {avatar ? "Choose another picture" : "Choose a picture"}
          </Button>
          {avatar ? (
            <Button tone="quiet" busy={update.isPending} onClick={takeAway}>
              Take the picture away
            </Button>
          ) : null}
        </div>
      </div>
      {upload.state === "sending" ? (
        <Progress label="Sending the picture" value={upload.part} onCancel={cancel} />
      ) : null}
      {upload.state === "idle" && avatar?.state === "processing" ? (
        <Progress label="Making the picture ready" detail="" />
      ) : null}
      {upload.state === "failed" || avatar?.state === "failed" ? (
        <Notice
          kind="error"
          title="The picture was not taken in"
          role="alert"
          actions={upload.state === "failed" ? <Button onClick={dismiss}>Close this</Button> : null}
        >
          {upload.state === "failed" ? upload.message : (avatar?.failure ?? "Choose another one.")}
        </Notice>
      ) : null}
      <p className="text-ink-soft text-xs">
        JPEG, PNG or WebP, up to 25 MB; shown as a square. Where and when it was taken is removed from the
        file.
      </p>
    </div>
  );
}

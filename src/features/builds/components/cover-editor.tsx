import ImageUp from "lucide-react/icons/image-up";
import { useId, useRef } from "react";
import type { WorkshopBuild } from "#shared/contracts/entries.ts";
import type { PhotoView } from "#shared/contracts/photos.ts";
import { Button } from "#src/components/button.tsx";
import { Notice } from "#src/components/notice.tsx";
import { Progress } from "#src/components/progress.tsx";
import { toasts } from "#src/components/toast-store.ts";
import { messageOf } from "#src/lib/form-errors.ts";
import { useHydrated } from "#src/lib/use-hydrated.ts";
import { useUpdateBuild } from "../mutations.ts";
import { offerUndo } from "../offer-undo.ts";
import { type CoverUpload, useCoverUpload } from "../use-cover-upload.ts";
import { CoverAltForm } from "./cover-alt-form.tsx";
import { CoverPhoto } from "./cover-photo.tsx";

/** The build's cover: choose, describe, take away. */
export function CoverEditor({ build }: { build: WorkshopBuild }) {
  const update = useUpdateBuild(build.slug);
  const { cover, coverAlt } = build;
  const before = { coverPhotoId: cover?.id ?? null, coverAlt };
  const putBack = () =>
    update.mutate(before, { onError: (error) => toasts.show({ kind: "error", message: messageOf(error) }) });
  const { upload, send, cancel, dismiss } = useCoverUpload(build.id, async (photo: PhotoView) => {
    // The description belongs to the photo before.
    await update.mutateAsync({ coverPhotoId: photo.id, coverAlt: "" });
    if (cover) offerUndo("The cover is changed.", putBack);
  });
  const remove = () =>
    update.mutate(
      { coverPhotoId: null, coverAlt: "" },
      {
        onSuccess: () => offerUndo("The cover is taken away.", putBack),
        onError: (error) => toasts.show({ kind: "error", message: messageOf(error) }),
      },
    );
  return (
    <div className="flex flex-col gap-4">
      <CoverPhoto photo={cover} alt={coverAlt} sizes="(min-width: 64rem) 24rem, 100vw" />
      <CoverState cover={cover} />
      <UploadState upload={upload} onCancel={cancel} onDismiss={dismiss} />
      <div className="flex flex-wrap gap-2">
        <FileButton disabled={upload.state === "sending"} onChoose={(file) => void send(file)}>
          {cover ? "Choose another cover" : "Choose a cover"}
        </FileButton>
        {cover ? (
          <Button tone="quiet" onClick={remove}>
            Take the cover away
          </Button>
        ) : null}
      </div>
      <p className="text-xs text-ink-soft">
        JPEG, PNG or WebP, up to 25 MB. Where and when it was taken is removed from the file.
      </p>
      {cover ? <CoverAltForm key={cover.id} build={build} /> : null}
    </div>
  );
}

function CoverState({ cover }: { cover: PhotoView | null }) {
  if (cover?.state === "failed") {
    return (
      <Notice kind="error" role="alert">
        {cover.failure ?? "This photo could not be made ready. Choose another."}
      </Notice>
    );
  }
  if (cover?.state === "processing") return <Progress label="Making the sizes for the page" detail="" />;
  return null;
}

interface UploadStateProps {
  upload: CoverUpload;
  onCancel: () => void;
  onDismiss: () => void;
}

function UploadState({ upload, onCancel, onDismiss }: UploadStateProps) {
  if (upload.state === "sending") {
    return (
      <Progress
        label={`Sending ${upload.name}`}
        value={upload.part}
        onCancel={onCancel}
        cancelLabel="Cancel the upload"
      />
    );
  }
  if (upload.state === "idle") return null;
  const { name, message, retry } = upload;
  return (
    <Notice
      kind="error"
      role="alert"
      title={`${name} is not the cover`}
      actions={
        <>
          {retry ? <Button onClick={retry}>Send it again</Button> : null}
          <Button tone="quiet" onClick={onDismiss}>
            Leave it
          </Button>
        </>
      }
    >
      {message}
    </Notice>
  );
}

interface FileButtonProps {
  children: string;
  disabled: boolean;
  onChoose: (file: File) => void;
}

/** The system's own picker behind a button; on a phone it offers the camera too. */
function FileButton({ children, disabled, onChoose }: FileButtonProps) {
  const hydrated = useHydrated();
  const input = useRef<HTMLInputElement>(null);
  const id = useId();
  return (
    <>
      <input
        ref={input}
        id={id}
        type="file"
        accept="image/*"
        aria-label="Cover photo"
        hidden
        onChange={({ currentTarget }) => {
          const [file] = currentTarget.files ?? [];
          // Emptied, so that the same file can be chosen again.
          if (file) onChoose(file);
          currentTarget.value = "";
        }}
      />
      <Button disabled={!hydrated || disabled} onClick={() => input.current?.click()}>
        <ImageUp aria-hidden="true" className="size-5" />
        {children}
      </Button>
    </>
  );
}

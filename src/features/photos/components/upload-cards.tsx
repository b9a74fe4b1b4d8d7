import { useSyncExternalStore } from "react";
import { Button } from "#src/components/button.tsx";
import { Notice } from "#src/components/notice.tsx";
import { Progress } from "#src/components/progress.tsx";
import type { Upload, UploadQueue } from "../upload-queue.ts";

interface UploadCardsProps {
  queue: UploadQueue;
  place: string;
}

/** The photos on their way to one place of the text. */
export function UploadCards({ queue, place }: UploadCardsProps) {
  const uploads = useSyncExternalStore(queue.subscribe, queue.uploads, queue.uploads);
  const here = uploads.filter((upload) => upload.place === place);
  if (here.length === 0) return null;
  return (
    <div className="editor-block not-prose flex flex-col gap-4 border border-dashed border-edge p-4">
      {here.map((upload) => (
        <UploadCard key={upload.id} upload={upload} queue={queue} />
      ))}
    </div>
  );
}

function UploadCard({ upload, queue }: { upload: Upload; queue: UploadQueue }) {
  const { id, name, state } = upload;
  const cancel = () => queue.cancel(id);
  if (state.kind === "failed") {
    return (
      <Notice
        kind="error"
        title={name}
        role="alert"
        actions={
          <>
            {state.canRetry ? <Button onClick={() => queue.retry(id)}>Send it again</Button> : null}
            <Button onClick={cancel}>Leave it out</Button>
          </>
        }
      >
        {state.message}
      </Notice>
    );
  }
  if (state.kind === "waiting") return <Progress label={name} detail="Waiting its turn" onCancel={cancel} />;
  // All the bytes are across: the server is looking at the file.
  if (state.share >= 1) return <Progress label={name} detail="Being checked" onCancel={cancel} />;
  return <Progress label={name} value={state.share} onCancel={cancel} />;
}

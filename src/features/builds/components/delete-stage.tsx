import { useState } from "react";
import type { StageView } from "#shared/contracts/builds.ts";
import { Button } from "#src/components/button.tsx";
import { Notice } from "#src/components/notice.tsx";
import { messageOf } from "#src/lib/form-errors.ts";
import { useDeleteStage } from "../mutations.ts";
import { counted } from "../state-words.ts";

interface DeleteStageProps {
  slug: string;
  stage: StageView;
  onDeleted: (title: string) => void;
}

/** Deletes an empty stage after asking; says why one with entries stays. */
export function DeleteStage({ slug, stage: { id, title, entryCount }, onDeleted }: DeleteStageProps) {
  const [asked, setAsked] = useState(false);
  const remove = useDeleteStage(slug);
  if (asked && entryCount > 0) {
    return (
      <Notice kind="attention" role="alert" title="Not deleted">
        {title} holds {counted(entryCount, "entry", "entries")}. Move {entryCount === 1 ? "it" : "them"} to
        another stage first: open the entry and choose its stage there.
      </Notice>
    );
  }
  if (!asked) {
    return (
      <div className="border-t border-hairline pt-3">
        <Button tone="quiet" className="text-signal! hover:bg-signal-wash!" onClick={() => setAsked(true)}>
          Delete the stage…
        </Button>
      </div>
    );
  }
  return (
    <Notice
      kind={remove.isError ? "error" : "attention"}
      role="alert"
      title={remove.isError ? "Not deleted" : "Delete it"}
      actions={
        <>
          <Button onClick={() => setAsked(false)}>Keep it</Button>
          <Button
            tone="destructive"
            busy={remove.isPending}
            busyLabel="Deleting…"
            onClick={() => remove.mutate(id, { onSuccess: () => onDeleted(title) })}
          >
            Delete {title}
          </Button>
        </>
      }
    >
      {remove.isError ? messageOf(remove.error) : "No entry stands in this stage. It cannot be brought back."}
    </Notice>
  );
}

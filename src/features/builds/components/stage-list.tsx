import { useRef, useState } from "react";
import type { WorkshopBuild } from "#shared/contracts/entries.ts";
import { EmptyState } from "#src/components/empty-state.tsx";
import { LiveRegion } from "#src/components/live-region.tsx";
import { SortableList } from "#src/components/sortable-list.tsx";
import { toasts } from "#src/components/toast-store.ts";
import { messageOf } from "#src/lib/form-errors.ts";
import { useOrderStages } from "../mutations.ts";
import { counted, stageStateWords } from "../state-words.ts";
import { AddStageForm } from "./add-stage-form.tsx";
import { StageDialog } from "./stage-dialog.tsx";
import { StateTag } from "./state-tag.tsx";

/** The build's stages in the maker's own order. */
export function StageList({ build: { slug, stages } }: { build: WorkshopBuild }) {
  const [said, setSaid] = useState("");
  const list = useRef<HTMLDivElement>(null);
  const order = useOrderStages(slug);
  const reorder = (ids: string[]) =>
    order.mutate(ids, {
      onSuccess: () => setSaid("The new order is saved."),
      onError: (error) =>
        toasts.show({ kind: "error", message: `The order is as it was. ${messageOf(error)}` }),
    });
  const handleDeleted = (title: string) => {
    setSaid(`${title} is deleted.`);
    list.current?.focus();
  };
  return (
    <div ref={list} tabIndex={-1} className="flex flex-col gap-5">
      {stages.length === 0 ? (
        <EmptyState title="No stage yet">
          Stages are the parts of the build in your own order, such as frame, front suspension, steering.
          Entries stand in them. Add the first one here.
        </EmptyState>
      ) : (
        <SortableList
          label="Stages"
          onReorder={reorder}
          items={stages.map((stage) => ({
            id: stage.id,
            label: stage.title,
            content: (
              <div className="flex items-center justify-between gap-x-2 max-sm:flex-col max-sm:items-start">
                <div className="flex min-w-0 flex-col items-start gap-1">
                  <p className="max-w-full font-semibold leading-tight">{stage.title}</p>
                  <StateTag state={stageStateWords[stage.state]} />
                  <p className="text-xs text-ink-soft">
                    {stage.entryCount === 0 ? "No entry" : counted(stage.entryCount, "entry", "entries")}
                  </p>
                </div>
                <StageDialog slug={slug} stage={stage} onDeleted={handleDeleted} />
              </div>
            ),
          }))}
        />
      )}
      <AddStageForm slug={slug} onAdded={(title) => setSaid(`${title} is added at the end.`)} />
      <LiveRegion>{said}</LiveRegion>
    </div>
  );
}

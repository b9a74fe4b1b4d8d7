import { useState } from "react";
import type { EntryDraft } from "#shared/contracts/entries.ts";
import { toasts } from "#src/components/toast-store.ts";
import { ApiError } from "#src/lib/api.ts";
import { beforePublishing } from "./before-publishing.ts";
import { type PublishingAct, usePublishing } from "./queries.ts";
import type { OpenDraft } from "./use-draft.ts";

/** Publishing and its like, from the page: what is typed is saved first, and a refusal is put beside its field. */
export function usePublishingActs(draft: EntryDraft, open: OpenDraft) {
  const { autosave } = open;
  const [error, setError] = useState("");
  const [fields, setFields] = useState<Record<string, string>>({});
  const mutation = usePublishing(draft.id, () => autosave.base.version);

  /** Answers whether it was done. */
  const act = async (request: PublishingAct): Promise<boolean> => {
    setError("");
    setFields({});
    const shows = request.act === "publish" || (request.act === "schedule" && request.at !== null);
    const [lacking] = shows ? beforePublishing(autosave.content) : [];
    if (lacking) return refuse(lacking);
    await autosave.flush();
    if (shows && autosave.dirty)
      return refuse("The latest words are not saved yet, so they cannot be published.");
    try {
      const answer = await mutation.mutateAsync(request);
      autosave.accept(answer.version);
      toasts.show({ kind: "success", message: doneWords(request, draft.state === "public") });
      return true;
    } catch (thrown) {
      if (thrown instanceof ApiError) setFields(thrown.fields);
      return refuse(thrown instanceof Error ? thrown.message : "That did not work. Try again.");
    }
  };
  const refuse = (message: string) => {
    setError(message);
    return false;
  };
  const changed = draft.hasUnpublishedChanges || autosave.dirty;
  return {
    act,
    publish: () => void act({ act: "publish" }),
    canPublish: draft.state !== "public" || changed,
    publishLabel: draft.state === "public" ? "Publish the changes" : "Publish now",
    busy: mutation.isPending,
    error,
    fields,
  };
}

export type Publishing = ReturnType<typeof usePublishingActs>;

function doneWords(request: PublishingAct, wasPublic: boolean): string {
  switch (request.act) {
    case "publish":
      return wasPublic ? "The changes are public." : "The entry is public.";
    case "schedule":
      return request.at === null ? "The entry is off the schedule." : "The entry is on the schedule.";
    case "withdraw":
      return "The entry is withdrawn.";
    case "rename":
      return "The address is changed.";
  }
}

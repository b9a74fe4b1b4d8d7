import { useMutation, useQuery } from "@tanstack/react-query";
import { v4 as uuid } from "uuid";
import type { EntryDraft } from "#shared/contracts/entries.ts";
import { countWords } from "#shared/document/read.ts";
import { Button } from "#src/components/button.tsx";
import { Dialog } from "#src/components/dialog.tsx";
import { Notice } from "#src/components/notice.tsx";
import { toasts } from "#src/components/toast-store.ts";
import { useApi } from "#src/lib/api.ts";
import { contentOf } from "../draft-content.ts";
import { mergeDrafts } from "../merge-drafts.ts";
import { clockTime } from "../moments.ts";
import { fetchDraft, postCopy } from "../queries.ts";
import type { OpenDraft } from "../use-draft.ts";

interface ConflictDialogProps {
  entry: string;
  open: OpenDraft;
  onClose(): void;
  /** Gets the id of the draft that this side's words became. */
  onCopied(entryId: string): void;
}

/** Two tabs or devices changed one draft: put both together, keep this side apart, or take the other. */
export function ConflictDialog({ entry, open, onClose, onCopied }: ConflictDialogProps) {
  const api = useApi();
  const { data: latest, error } = useQuery({
    queryKey: ["draft-elsewhere", entry, open.autosave.base.version],
    queryFn: () => fetchDraft(api, entry),
    staleTime: 0,
    gcTime: 0,
  });
  const copy = useMutation({ mutationFn: () => postCopy(api, entry, open.autosave.content) });

  const merge = (other: EntryDraft) => {
    const { autosave, goOnFrom } = open;
    const merged = mergeDrafts(autosave.base.content, autosave.content, contentOf(other), uuid);
    goOnFrom(other, merged.content);
    onClose();
    toasts.show({ kind: "success", message: mergedWords(merged.conflicts) });
  };
  const keepApart = async (other: EntryDraft) => {
    const { id } = await copy.mutateAsync();
    open.goOnFrom(other, contentOf(other));
    onClose();
    onCopied(id);
  };
  const takeOther = (other: EntryDraft) => {
    open.goOnFrom(other, contentOf(other));
    onClose();
  };
  return (
    <Dialog
      open
      onOpenChange={(stays) => !stays && onClose()}
      title="This entry was changed somewhere else"
      description="Another tab or device saved it since you opened it here. Nothing is lost until you choose."
    >
      {error ? <Notice kind="error">{error.message}</Notice> : null}
      {copy.error ? (
        <Notice kind="error" role="alert">
          {copy.error.message}
        </Notice>
      ) : null}
      <dl className="grid grid-cols-2 gap-4 border-y border-hairline py-3 text-sm">
        <Side name="Here" title={open.content.title} words={countWords(open.content.document)} />
        {latest ? (
          <Side
            name={`The other, saved ${clockTime(latest.updatedAt, Date.now())}`}
            title={latest.title}
            words={countWords(latest.document)}
          />
        ) : null}
      </dl>
      <Choice
        label="Merge"
        tone="primary"
        disabled={!latest}
        onClick={() => latest && merge(latest)}
        help="Parts changed on one side are taken from there. A part changed on both stands in both versions, marked."
      />
      <Choice
        label="Keep mine as a separate draft"
        disabled={!latest}
        busy={copy.isPending}
        onClick={() => latest && void keepApart(latest).catch(() => undefined)}
        help="Your words become a new draft in this stage. This entry stays as the other side saved it."
      />
      <Choice
        label="Take the other"
        disabled={!latest}
        onClick={() => latest && takeOther(latest)}
        help="What you changed here goes. Undo brings the text back while this page stays open."
      />
    </Dialog>
  );
}

function Side({ name, title, words }: { name: string; title: string; words: number }) {
  return (
    <div>
      <dt className="text-xs font-semibold text-ink-soft">{name}</dt>
      <dd className="mt-0.5">
        {title || "No title"}, <span className="figures">{words}</span> words
      </dd>
    </div>
  );
}

interface ChoiceProps {
  label: string;
  help: string;
  tone?: "primary" | "plain";
  disabled: boolean;
  busy?: boolean;
  onClick(): void;
}

function Choice({ label, help, tone = "plain", disabled, busy = false, onClick }: ChoiceProps) {
  return (
    <div>
      <Button tone={tone} disabled={disabled} busy={busy} onClick={onClick} className="w-full">
        {label}
      </Button>
      <p className="mt-1 text-xs text-ink-soft">{help}</p>
    </div>
  );
}

function mergedWords(conflicts: number): string {
  if (conflicts === 0) return "Both are put together. No part was changed on both sides.";
  const parts = conflicts === 1 ? "One part stands" : `${conflicts} parts stand`;
  return `Both are put together. ${parts} in two versions, marked with ▼ and ▲.`;
}

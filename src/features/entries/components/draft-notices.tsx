import type { EntryDraft } from "#shared/contracts/entries.ts";
import { countWords } from "#shared/document/read.ts";
import { Button } from "#src/components/button.tsx";
import { Notice } from "#src/components/notice.tsx";
import { clockTime } from "../moments.ts";
import type { OpenDraft } from "../use-draft.ts";
import { useRecovery } from "../use-recovery.ts";

interface DraftNoticesProps {
  draft: EntryDraft;
  open: OpenDraft;
  onDecide(): void;
}

/** What the builder must know about where the words are: other tabs, words found again, a refusal. */
export function DraftNotices({ draft, open, onDecide }: DraftNoticesProps) {
  const { state, otherTabs, deviceFull } = open;
  return (
    <div className="flex flex-col gap-3 empty:hidden">
      {state.kind === "conflict" ? (
        <Notice
          kind="attention"
          title="Changed somewhere else"
          role="status"
          actions={<Button onClick={onDecide}>Choose what to do</Button>}
        >
          This entry was saved in another tab or on another device. Your words are kept on this device
          meanwhile.
        </Notice>
      ) : null}
      {state.kind === "refused" ? (
        <Notice kind="error" title="Not saved" role="alert">
          {state.message} Your words are kept on this device. Mend it, and the entry saves itself.
        </Notice>
      ) : null}
      {state.kind === "kept" ? (
        <Notice kind="attention" title="Not saved" role="status">
          {state.message} Your words are kept on this device, and it tries again by itself.
        </Notice>
      ) : null}
      {deviceFull ? (
        <Notice kind="error" title="No room on this device" role="alert">
          This browser cannot keep a copy of what you type. Leave the page open until it says “Saved”.
        </Notice>
      ) : null}
      {otherTabs.size > 0 ? (
        <Notice kind="attention" title="Open twice" role="status">
          This entry is open in another tab of this browser. Write in one of them: if both change the same
          part, you will be asked which to keep.
        </Notice>
      ) : null}
      <RecoveryNotice draft={draft} open={open} />
    </div>
  );
}

function RecoveryNotice({ draft, open }: Pick<DraftNoticesProps, "draft" | "open">) {
  const { found, putBack, drop } = useRecovery(draft, open);
  if (!found) return null;
  const words = countWords(found.content.document);
  return (
    <Notice
      kind="attention"
      title="Words found again"
      role="status"
      actions={
        <>
          <Button tone="primary" onClick={putBack}>
            Put them back
          </Button>
          <Button onClick={drop}>Throw them away</Button>
        </>
      }
    >
      This browser kept a copy from {clockTime(found.at, Date.now())} that was never saved:{" "}
      {found.content.title.trim() || "no title"}, {words} words.
    </Notice>
  );
}

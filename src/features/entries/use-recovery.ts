import { useEffect, useState } from "react";
import { v4 as uuid } from "uuid";
import type { EntryDraft } from "#shared/contracts/entries.ts";
import { sameContent } from "./draft-content.ts";
import { type KeptDraft, keepDraft, keptDrafts } from "./kept-drafts.ts";
import { mergeDrafts } from "./merge-drafts.ts";
import type { OpenDraft } from "./use-draft.ts";

/** How long other tabs have to say that they are there. */
const answerTime = 500;

/** Words of an earlier visit that never reached the server, and what may be done with them. */
export function useRecovery(draft: EntryDraft, open: OpenDraft) {
  const [found, setFound] = useState<KeptDraft | null>(null);
  const { otherTabs, tab, autosave, goOnFrom } = open;
  // Looked at again when another tab goes: what it could not save is then this tab's to offer.
  useEffect(() => {
    const timer = setTimeout(() => {
      const openTabs = new Set([tab, ...otherTabs]);
      const [newest] = keptDrafts(localStorage, draft.id, openTabs).filter((kept) => {
        const known = sameContent(kept.content, autosave.base.content);
        if (known) forget(draft.id, kept);
        return !known;
      });
      setFound(newest ?? null);
    }, answerTime);
    return () => clearTimeout(timer);
  }, [autosave, draft.id, otherTabs, tab]);

  const drop = () => {
    if (found) forget(draft.id, found);
    setFound(null);
  };
  const putBack = () => {
    if (!found) return;
    // What was typed since the page was opened is one side, the recovered words the other.
    const { content } = mergeDrafts(found.base.content, autosave.content, found.content, uuid);
    goOnFrom(draft, content);
    drop();
  };
  return { found, putBack, drop };
}

function forget(entryId: string, kept: KeptDraft): void {
  keepDraft(localStorage, entryId, { tab: kept.tab, content: null });
}

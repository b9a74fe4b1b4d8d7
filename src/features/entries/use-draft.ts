import { useQueryClient } from "@tanstack/react-query";
import { type RefObject, useCallback, useEffect, useRef, useState, useSyncExternalStore } from "react";
import { v4 as uuid } from "uuid";
import type { EntryDraft } from "#shared/contracts/entries.ts";
import type { EditorHandle } from "#src/editor/editor-handle.ts";
import { useApi } from "#src/lib/api.ts";
import { Autosave } from "./autosave.ts";
import { DraftChannel } from "./draft-channel.ts";
import { baseOf, contentOf, type DraftContent } from "./draft-content.ts";
import { keepDraft } from "./kept-drafts.ts";
import { fetchDraft, keepDraftAnswer, putDraft } from "./queries.ts";

/** The draft being written: its words, where they are saved, and who else has it open. */
export function useDraft(draft: EntryDraft, editor: RefObject<EditorHandle | null>) {
  const api = useApi();
  const queryClient = useQueryClient();
  const [tab] = useState(() => uuid());
  const [content, setContent] = useState(() => contentOf(draft));
  const [otherTabs, setOtherTabs] = useState<ReadonlySet<string>>(new Set());
  const [deviceFull, setDeviceFull] = useState(false);
  const channel = useRef<DraftChannel | null>(null);
  const [autosave] = useState(
    () =>
      new Autosave(
        {
          send: async (words, baseVersion) => {
            const saved = await putDraft(api, draft.id, words, baseVersion);
            keepDraftAnswer(queryClient, saved);
            channel.current?.announceSaved(saved.version);
            return saved;
          },
          keep: (unsaved) => {
            const kept = unsaved ? { tab, at: Date.now(), ...unsaved } : { tab, content: null };
            setDeviceFull(!keepDraft(localStorage, draft.id, kept));
          },
          now: Date.now,
        },
        baseOf(draft),
        draft.updatedAt,
      ),
  );
  const state = useSyncExternalStore(autosave.subscribe, autosave.state, autosave.state);

  const change = useCallback(
    (part: Partial<DraftContent>) => {
      const next = { ...autosave.content, ...part };
      setContent(next);
      autosave.change(next);
    },
    [autosave],
  );

  /** Goes on from another version of the server, with these words. */
  const goOnFrom = useCallback(
    (latest: EntryDraft, words: DraftContent) => {
      keepDraftAnswer(queryClient, latest);
      setContent(words);
      editor.current?.replaceDocument(words.document);
      autosave.rebase(baseOf(latest), words, latest.updatedAt);
    },
    [autosave, editor, queryClient],
  );

  /** Shows what was saved elsewhere, as long as nothing here would be lost by it. */
  const catchUp = useCallback(async () => {
    if (autosave.dirty || autosave.state().kind !== "saved") return;
    const latest = await fetchDraft(api, draft.id).catch(() => null);
    if (!latest || autosave.dirty || latest.version <= autosave.base.version) return;
    goOnFrom(latest, contentOf(latest));
  }, [api, autosave, draft.id, goOnFrom]);

  useEffect(() => {
    const opened = new DraftChannel(draft.id, tab, {
      onTabs: setOtherTabs,
      onSaved: (version) => {
        if (version > autosave.base.version) void catchUp();
      },
    });
    channel.current = opened;
    const leave = () => opened.leave();
    const comeBack = ({ persisted }: PageTransitionEvent) => persisted && opened.arrive();
    window.addEventListener("pagehide", leave);
    window.addEventListener("pageshow", comeBack);
    return () => {
      window.removeEventListener("pagehide", leave);
      window.removeEventListener("pageshow", comeBack);
      opened.close();
    };
  }, [autosave, catchUp, draft.id, tab]);

  useEffect(() => {
    autosave.resume();
    const leave = () => void autosave.flush();
    const look = () => (document.visibilityState === "hidden" ? leave() : void catchUp());
    const warn = (event: BeforeUnloadEvent) => {
      if (autosave.dirty) event.preventDefault();
    };
    window.addEventListener("blur", leave);
    window.addEventListener("online", leave);
    window.addEventListener("pagehide", leave);
    window.addEventListener("beforeunload", warn);
    document.addEventListener("visibilitychange", look);
    return () => {
      window.removeEventListener("blur", leave);
      window.removeEventListener("online", leave);
      window.removeEventListener("pagehide", leave);
      window.removeEventListener("beforeunload", warn);
      document.removeEventListener("visibilitychange", look);
      leave();
      autosave.stop();
    };
  }, [autosave, catchUp]);

  return { autosave, state, content, change, goOnFrom, otherTabs, deviceFull, tab };
}

export type OpenDraft = ReturnType<typeof useDraft>;

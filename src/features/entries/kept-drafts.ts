import type { DraftBase, DraftContent } from "./draft-content.ts";

/** What one tab had typed that the server did not have. */
export interface KeptDraft {
  tab: string;
  at: number;
  base: DraftBase;
  content: DraftContent;
}

const prefix = (entryId: string) => `soapstone:unsaved:${entryId}:`;

/**
 * Keeps what is typed in the browser, one place for each tab, so that no tab writes over another's words. It is plain
 * local storage because it must be written at once, even while the page is being closed.
 *
 * @returns false when the browser has no room or no storage, so that the person can be told
 */
export function keepDraft(
  storage: Storage,
  entryId: string,
  kept: KeptDraft | { tab: string; content: null },
): boolean {
  const key = prefix(entryId) + kept.tab;
  try {
    if (kept.content === null) storage.removeItem(key);
    else storage.setItem(key, JSON.stringify(kept));
    return true;
  } catch {
    return false;
  }
}

/** Unsaved words of earlier visits, newest first; those of tabs that are still open are left to them. */
export function keptDrafts(storage: Storage, entryId: string, openTabs: ReadonlySet<string>): KeptDraft[] {
  const found: KeptDraft[] = [];
  for (const key of Object.keys(storage)) {
    if (!key.startsWith(prefix(entryId))) continue;
    const kept = parseKept(storage.getItem(key));
    if (kept && !openTabs.has(kept.tab)) found.push(kept);
  }
  return found.sort((a, b) => b.at - a.at);
}

function parseKept(text: string | null): KeptDraft | null {
  try {
    const kept = JSON.parse(text ?? "null") as KeptDraft | null;
    const whole = kept?.content?.document?.type === "doc" && kept.base?.content?.document?.type === "doc";
    return whole ? kept : null;
  } catch {
    return null;
  }
}

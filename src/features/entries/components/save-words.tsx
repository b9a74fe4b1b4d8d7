import { Button } from "#src/components/button.tsx";
import { Mark } from "#src/components/mark.tsx";
import type { SaveState } from "../autosave.ts";
import { clockTime } from "../moments.ts";

interface SaveWordsProps {
  state: SaveState;
  onRetry(): void;
}

/** Where what was typed is now, in words. */
export function SaveWords({ state, onRetry }: SaveWordsProps) {
  const kept = state.kind === "kept" || state.kind === "refused" || state.kind === "conflict";
  return (
    <div className="flex min-w-0 flex-wrap items-center gap-x-2 text-sm">
      <output aria-live="polite" className="flex items-center gap-2">
        {kept ? <Mark shape="chisel" className="size-4 text-straw" /> : null}
        {state.kind === "saved" ? <Mark shape="stroke" className="size-4 text-temper" /> : null}
        <span className={kept ? "font-semibold" : "text-ink-soft"}>{words(state)}</span>
      </output>
      {state.kind === "kept" ? (
        <Button tone="quiet" onClick={onRetry}>
          Try now
        </Button>
      ) : null}
    </div>
  );
}

function words(state: SaveState): string {
  switch (state.kind) {
    case "saved":
      return `Saved ${clockTime(state.at, Date.now())}`;
    case "waiting":
      return "Not saved yet";
    case "saving":
      return "Saving…";
    case "kept":
    case "refused":
    case "conflict":
      return "Not saved: kept on this device";
  }
}

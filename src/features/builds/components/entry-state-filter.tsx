import { clsx } from "clsx";
import type { EntryState } from "#shared/contracts/entries.ts";
import { useHydrated } from "#src/lib/use-hydrated.ts";
import { entryStateWords } from "../state-words.ts";

interface EntryStateFilterProps {
  counts: Record<EntryState, number>;
  /** Null shows every state. */
  chosen: EntryState | null;
  onChoose: (state: EntryState | null) => void;
}

/** Narrows the list to one state; each says how many there are. */
export function EntryStateFilter({ counts, chosen, onChoose }: EntryStateFilterProps) {
  const hydrated = useHydrated();
  const states = Object.keys(counts) as EntryState[];
  const all = states.reduce((sum, state) => sum + counts[state], 0);
  const choices: { state: EntryState | null; label: string; count: number }[] = [
    { state: null, label: "All", count: all },
    ...states.map((state) => ({ state, label: entryStateWords[state].word, count: counts[state] })),
  ];
  return (
    <fieldset className="flex flex-wrap gap-x-1 gap-y-2">
      <legend className="sr-only">Show the entries that are</legend>
      {choices.map(({ state, label, count }) => (
        <button
          key={label}
          type="button"
          disabled={!hydrated}
          aria-pressed={state === chosen}
          onClick={() => onChoose(state)}
          className={clsx(
            "inline-flex min-h-11 cursor-pointer items-center gap-2 border-b-[3px] px-3 text-sm",
            state === chosen
              ? "border-temper font-semibold"
              : "border-transparent text-ink-soft hover:border-edge",
          )}
        >
          {label}
          <span className="figures text-xs">{count}</span>
        </button>
      ))}
    </fieldset>
  );
}

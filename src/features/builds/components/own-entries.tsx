import { useState } from "react";
import type { EntryState, WorkshopBuild } from "#shared/contracts/entries.ts";
import { Button } from "#src/components/button.tsx";
import { EmptyState } from "#src/components/empty-state.tsx";
import { toasts } from "#src/components/toast-store.ts";
import { messageOf } from "#src/lib/form-errors.ts";
import { useHydrated } from "#src/lib/use-hydrated.ts";
import { countStates, groupEntries, type StageGroup } from "../entry-groups.ts";
import { useCreateEntry } from "../queries.ts";
import { entryStateWords, stageStateWords } from "../state-words.ts";
import { EntryStateFilter } from "./entry-state-filter.tsx";
import { OwnEntryRow } from "./own-entry-row.tsx";
import { StateTag } from "./state-tag.tsx";

interface OwnEntriesProps {
  build: WorkshopBuild;
  now: number;
  /** Gets the id of a draft just begun. */
  onBegun: (entryId: string) => void;
}

/** The build's entries in every state, by stage. */
export function OwnEntries({ build, now, onBegun }: OwnEntriesProps) {
  const [state, setState] = useState<EntryState | null>(null);
  const { slug, stages, entries } = build;
  if (stages.length === 0) {
    return (
      <EmptyState
        title="Add a stage, then write"
        action={
          <a href="#stages" className="inline-flex min-h-11 items-center font-semibold">
            Add the first stage
          </a>
        }
      >
        An entry stands in a stage of the build. One stage is enough to begin.
      </EmptyState>
    );
  }
  const groups = groupEntries(stages, entries, state);
  const shown = state === null ? groups : groups.filter((group) => group.entries.length > 0);
  return (
    <div className="flex flex-col gap-8">
      {entries.length > 0 ? (
        <EntryStateFilter counts={countStates(entries)} chosen={state} onChoose={setState} />
      ) : null}
      {shown.map((group) => (
        <StageEntries key={group.stage.id} slug={slug} group={group} now={now} onBegun={onBegun} />
      ))}
      {shown.length === 0 && state !== null ? (
        <EmptyState title={`No entry is ${entryStateWords[state].word.toLowerCase()}`}>
          Choose another state above.
        </EmptyState>
      ) : null}
    </div>
  );
}

interface StageEntriesProps {
  slug: string;
  group: StageGroup;
  now: number;
  onBegun: (entryId: string) => void;
}

function StageEntries({ slug, group: { stage, entries }, now, onBegun }: StageEntriesProps) {
  const hydrated = useHydrated();
  const create = useCreateEntry(slug);
  const begin = () =>
    create.mutate(stage.id, {
      onSuccess: ({ id }) => onBegun(id),
      onError: (error) => toasts.show({ kind: "error", message: messageOf(error) }),
    });
  return (
    <section aria-labelledby={`stage-${stage.id}`}>
      <div className="flex flex-wrap items-center justify-between gap-x-4 gap-y-2 border-b border-edge pb-2">
        <div className="flex min-w-0 flex-wrap items-center gap-x-3 gap-y-1">
          <h3 id={`stage-${stage.id}`}>{stage.title}</h3>
          <StateTag state={stageStateWords[stage.state]} />
        </div>
        <Button
          onClick={begin}
          disabled={!hydrated}
          busy={create.isPending}
          busyLabel="Opening the editor…"
          aria-label={create.isPending ? undefined : `Write an entry in ${stage.title}`}
        >
          Write an entry
        </Button>
      </div>
      {entries.length === 0 ? (
        <p className="py-3 text-ink-soft">No entry in this stage yet.</p>
      ) : (
        <ol>
          {entries.map((entry) => (
            <OwnEntryRow key={entry.id} build={slug} entry={entry} now={now} />
          ))}
        </ol>
      )}
    </section>
  );
}

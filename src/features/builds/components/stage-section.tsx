import type { StageEntries } from "../stage-entries.ts";
import { stageStateWords } from "../state-words.ts";
import { EntryRow } from "./entry-row.tsx";
import { StateTag } from "./state-tag.tsx";

interface StageSectionProps {
  build: string;
  group: StageEntries;
  now: number;
}

/** A stage with its entries, in the order they were published. */
export function StageSection({ build, group: { stage, entries }, now }: StageSectionProps) {
  return (
    <section
      id={`stage-${stage.id}`}
      aria-labelledby={`stage-${stage.id}-title`}
      className="grid gap-x-10 border-t border-edge pt-4 lg:grid-cols-[15rem_minmax(0,1fr)]"
    >
      <header className="mb-2 flex flex-wrap items-center justify-between gap-x-4 gap-y-2 lg:sticky lg:top-4 lg:flex-col lg:items-start lg:justify-start lg:self-start lg:pt-5">
        <h3 id={`stage-${stage.id}-title`} className="text-lg">
          {stage.title}
        </h3>
        <StateTag state={stageStateWords[stage.state]} />
      </header>
      {entries.length === 0 ? (
        <p className="py-5 text-ink-soft">Nothing is written about this stage yet.</p>
      ) : (
        <ol className="divide-y divide-hairline">
          {entries.map((entry) => (
            <li key={entry.id}>
              <EntryRow build={build} entry={entry} now={now} />
            </li>
          ))}
        </ol>
      )}
    </section>
  );
}

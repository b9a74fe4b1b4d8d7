import type { BuildStatus, StageState } from "#shared/contracts/builds.ts";
import type { EntryState } from "#shared/contracts/entries.ts";
import type { MarkShape } from "#src/components/mark.tsx";
import type { Tone } from "#src/components/tone.ts";

/** How a state is said and marked: never by colour alone. */
export interface StateWord {
  word: string;
  tone: Tone;
  shape: MarkShape;
}

export const buildStatusWords: Record<BuildStatus, StateWord> = {
  planning: { word: "Planning", tone: "grey", shape: "target" },
  under_way: { word: "Under way", tone: "temper", shape: "half" },
  paused: { word: "Paused", tone: "grey", shape: "dot" },
  finished: { word: "Finished", tone: "temper", shape: "stroke" },
  abandoned: { word: "Abandoned", tone: "grey", shape: "cross" },
};

export const stageStateWords: Record<StageState, StateWord> = {
  planned: { word: "Planned", tone: "grey", shape: "target" },
  under_way: { word: "Under way", tone: "temper", shape: "half" },
  done: { word: "Done", tone: "temper", shape: "stroke" },
  being_redone: { word: "Being redone", tone: "purple", shape: "turned" },
};

export const entryStateWords: Record<EntryState, StateWord> = {
  draft: { word: "Draft", tone: "bronze", shape: "file" },
  scheduled: { word: "Scheduled", tone: "straw", shape: "half" },
  public: { word: "Public", tone: "temper", shape: "post" },
  withdrawn: { word: "Withdrawn", tone: "grey", shape: "cross" },
};

/** The options of a list to choose a state from, in the order of the words. */
export function optionsOf(words: Record<string, StateWord>): { value: string; label: string }[] {
  return Object.entries(words).map(([value, { word }]) => ({ value, label: word }));
}

/** `1 entry`, `4 entries`. */
export function counted(count: number, one: string, many: string): string {
  return `${count} ${count === 1 ? one : many}`;
}

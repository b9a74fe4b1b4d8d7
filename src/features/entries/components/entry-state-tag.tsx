import type { EntryState } from "#shared/contracts/entries.ts";
import type { MarkShape } from "#src/components/mark.tsx";
import { MeaningTag } from "#src/components/meaning-tag.tsx";
import type { Tone } from "#src/components/tone.ts";

const states: Record<EntryState, { word: string; tone: Tone; shape: MarkShape }> = {
  draft: { word: "Draft", tone: "bronze", shape: "file" },
  scheduled: { word: "Scheduled", tone: "straw", shape: "half" },
  public: { word: "Public", tone: "temper", shape: "post" },
  withdrawn: { word: "Withdrawn", tone: "grey", shape: "cross" },
};

export function EntryStateTag({ state }: { state: EntryState }) {
  const { word, tone, shape } = states[state];
  return (
    <MeaningTag tone={tone} shape={shape}>
      {word}
    </MeaningTag>
  );
}

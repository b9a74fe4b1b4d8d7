import { MeaningTag } from "#src/components/meaning-tag.tsx";
import type { StateWord } from "../state-words.ts";

export function StateTag({ state: { word, tone, shape } }: { state: StateWord }) {
  return (
    <MeaningTag tone={tone} shape={shape}>
      {word}
    </MeaningTag>
  );
}

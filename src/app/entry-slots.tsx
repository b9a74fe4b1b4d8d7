import type { WorkingAttributes } from "#shared/document/types.ts";
import { MarginRow } from "#src/components/margin-row.tsx";
import { NumberTag } from "#src/components/number-tag.tsx";
import type { DocumentSlots } from "#src/editor/document-slots.ts";
import { PhotoBlock, PhotoGroupBlock } from "#src/features/reading/components/photo-blocks.tsx";
import { useEntryMedia, workingAnchor } from "#src/features/reading/entry-media.ts";
import { Island } from "#src/lib/island.tsx";
import { useUnits } from "#src/lib/page-settings.ts";
import { paths } from "#src/lib/paths.ts";
import { workingPanel } from "./working-islands.ts";

/** A working as readers get it: the calculator itself, with the builder's numbers in it. */
function WorkingBlock({ workingId }: WorkingAttributes) {
  const working = useEntryMedia().workings[workingId];
  const units = useUnits();
  if (!working) return null;
  const anchor = workingAnchor(working.number);
  const label = `Working ${working.number}: ${working.title}`;
  return (
    <MarginRow
      wide
      notes={
        <NumberTag to={`#${anchor}`} label={label}>
          W{working.number}
        </NumberTag>
      }
    >
      <div id={anchor} className="scroll-mt-6">
        {/* The number stands in the margin. */}
        <Island
          source={workingPanel}
          props={{
            working: { ...working, number: null },
            mode: "read",
            units,
            apiBase: paths.workingApi(working.id),
          }}
        />
      </div>
    </MarginRow>
  );
}

/** How the blocks of an entry that belong to features are shown to readers. */
export const entrySlots: DocumentSlots = {
  photo: PhotoBlock,
  photoGroup: PhotoGroupBlock,
  working: WorkingBlock,
};

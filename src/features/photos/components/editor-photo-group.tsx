import { Button } from "#src/components/button.tsx";
import { BlockStrip } from "#src/editor/block-strip.tsx";
import type { PhotoGroupViewProps } from "#src/editor/block-view-props.ts";

/** Two to six photos side by side, in the editor. */
export function EditorPhotoGroup({ count, move, remove, dissolve, children }: PhotoGroupViewProps) {
  return (
    <div className="border-y border-hairline py-2">
      <BlockStrip what="row of photos" move={move} remove={remove}>
        <span className="px-2 text-xs font-semibold text-ink-soft">{count} photos side by side</span>
        <Button tone="quiet" onClick={dissolve}>
          Set one under the other
        </Button>
      </BlockStrip>
      {children}
    </div>
  );
}

import { useMemo } from "react";
import type { EntryDraft } from "#shared/contracts/entries.ts";
import { DocumentView } from "#src/editor/document-view.tsx";
import { EntryMediaProvider, entryMedia } from "#src/features/reading/entry-media.ts";
import { entrySlots } from "./entry-slots.tsx";

type OwnDocumentProps = Pick<EntryDraft, "document" | "photos" | "workings">;

/** A document of one's own as readers would see it. */
export function OwnDocument({ document, photos, workings }: OwnDocumentProps) {
  const media = useMemo(() => entryMedia({ document, photos, workings }), [document, photos, workings]);
  return (
    <div className="entry-column prose">
      <EntryMediaProvider value={media}>
        <DocumentView document={document} slots={entrySlots} />
      </EntryMediaProvider>
    </div>
  );
}

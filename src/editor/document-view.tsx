import { renderJSONContentToReactElement } from "@tiptap/static-renderer/json/react";
import { type ReactNode, useMemo } from "react";
import type { DocumentJson } from "#shared/contracts/entries.ts";
import type { DocumentMark, DocumentNode } from "#shared/document/types.ts";
import { markMapping, nodeMapping, UnknownMark, UnknownNode } from "./document-mapping.tsx";
import { type DocumentSlots, SlotsContext } from "./document-slots.ts";

interface DocumentViewProps {
  document: DocumentJson;
  /** How photos, groups and workings are shown. Keep the object's components the same between renders. */
  slots: DocumentSlots;
}

/**
 * A validated document as React elements, its blocks side by side without a wrapper. Light enough for a reader's
 * first load: no ProseMirror in it.
 */
export function DocumentView({ document, slots }: DocumentViewProps): ReactNode {
  // A renderer counts keys as it goes: one for each document keeps them, and so what a reader typed, in place.
  const blocks = useMemo(() => {
    const render = renderJSONContentToReactElement<DocumentMark, DocumentNode>({
      nodeMapping,
      markMapping,
      unhandledNode: UnknownNode,
      unhandledMark: UnknownMark,
    });
    return render({ content: document as DocumentNode });
  }, [document]);
  return <SlotsContext value={slots}>{blocks}</SlotsContext>;
}

import type { Extensions } from "@tiptap/core";
import { Placeholder } from "@tiptap/extensions";
import { ReactNodeViewRenderer } from "@tiptap/react";
import { PhotoGroupNode, PhotoNode, textNodes, WorkingNode } from "#shared/document/nodes.ts";
import { PhotoGroupNodeView, PhotoNodeView, WorkingNodeView } from "./block-views.tsx";
import { Places } from "./places.ts";
import { Shortcuts } from "./shortcuts.ts";
import { TidyBlocks } from "./tidy-blocks.ts";

/** The document's own nodes with views for those that have them, and what only the editor needs. */
export function editorExtensions(shortcuts: Parameters<typeof Shortcuts.configure>[0]): Extensions {
  return [
    ...textNodes,
    PhotoNode.extend({ addNodeView: () => ReactNodeViewRenderer(PhotoNodeView) }),
    PhotoGroupNode.extend({ addNodeView: () => ReactNodeViewRenderer(PhotoGroupNodeView) }),
    WorkingNode.extend({ addNodeView: () => ReactNodeViewRenderer(WorkingNodeView) }),
    Placeholder.configure({
      placeholder: ({ node }) => (node.type.name === "heading" ? "Heading" : "What was done, and why?"),
    }),
    Places,
    TidyBlocks,
    Shortcuts.configure(shortcuts),
  ];
}

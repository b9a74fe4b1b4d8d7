import type { Editor } from "@tiptap/core";
import { EditorContent, type UseEditorOptions, useEditor } from "@tiptap/react";
import { type ReactNode, type Ref, useEffect, useImperativeHandle, useRef, useState } from "react";
import { createPortal } from "react-dom";
import type { DocumentNode, RichDocument } from "#shared/document/types.ts";
import { LoadingState } from "#src/components/loading-state.tsx";
import { type NodeViews, NodeViewsProvider } from "./block-view-props.ts";
import { editorExtensions } from "./editor-extensions.ts";
import { createHandle, type EditorHandle, withoutBlankEnd } from "./editor-handle.ts";
import { LinkDialog } from "./link-dialog.tsx";
import { ShortcutSheet } from "./shortcut-sheet.tsx";
import { ToolRail } from "./tool-rail.tsx";
import type { Inserts, ToolContext } from "./tools.ts";
import { useKeyboardInset } from "./use-keyboard-inset.ts";

interface RichTextEditorProps {
  label: string;
  /** What the editor starts from; later changes from outside go through the handle. */
  initial: RichDocument;
  onChange(document: RichDocument): void;
  views: NodeViews;
  inserts: Inserts;
  /** Pictures that were pasted, or dropped at `at`. */
  onFiles(files: File[], at?: number): void;
  /** What stands in a place of the text until it is filled, by the place's id. */
  renderPlace(id: string): ReactNode;
  /** The nonce for the editor's own style element. */
  nonce: string;
  ref: Ref<EditorHandle>;
}

/** The entry's text with its tools. */
export function RichTextEditor(props: RichTextEditorProps) {
  const { label, initial, views, renderPlace, nonce, ref } = props;
  const latest = useRef(props);
  useEffect(() => {
    latest.current = props;
  });
  const root = useRef<HTMLDivElement>(null);
  const [dialog, setDialog] = useState<"link" | "help" | null>(null);
  const [places, setPlaces] = useState<ReadonlyMap<string, HTMLElement>>(new Map());
  const current = useRef<Editor | null>(null);
  const contextOf = (now: Editor): ToolContext => ({
    editor: now,
    inserts: latest.current.inserts,
    editLink: () => setDialog("link"),
  });
  // Made once: other options on a later render would set the editor up anew.
  const [options] = useState<UseEditorOptions>(() => ({
    injectNonce: nonce,
    content: initial as DocumentNode,
    extensions: editorExtensions({
      context: () => current.current && contextOf(current.current),
      openHelp: () => setDialog("help"),
      toRail: () => focusRail(root.current),
    }),
    editorProps: {
      attributes: {
        "aria-label": label,
        "aria-multiline": "true",
        role: "textbox",
        class: "editor-text prose",
      },
      handlePaste: (_, event) => takeFiles(event.clipboardData, (files) => latest.current.onFiles(files)),
      handleDrop: (view, event, _slice, moved) => {
        if (moved) return false;
        const at = view.posAtCoords({ left: event.clientX, top: event.clientY })?.pos;
        return takeFiles(event.dataTransfer, (files) => latest.current.onFiles(files, at));
      },
    },
    onUpdate: ({ editor: now }) => latest.current.onChange(withoutBlankEnd(now.getJSON() as RichDocument)),
  }));
  const editor = useEditor({ ...options, immediatelyRender: false });
  useEffect(() => {
    current.current = editor;
  }, [editor]);
  useImperativeHandle(ref, () => createHandle(() => current.current, setPlaces), []);
  useKeyboardInset();

  if (!editor) return <LoadingState label="The editor is being set up." lines={6} />;
  return (
    <NodeViewsProvider value={views}>
      {/* biome-ignore lint/a11y/noStaticElementInteractions: catches Escape on its way up from the tools and blocks */}
      <div ref={root} className="editor-frame" onKeyDown={(event) => backToText(event, editor)}>
        <ToolRail context={contextOf(editor)} openHelp={() => setDialog("help")} />
        <EditorContent editor={editor} className="editor-column" />
        {[...places].map(([id, element]) => createPortal(renderPlace(id), element, id))}
      </div>
      {dialog === "link" ? <LinkDialog editor={editor} onClose={() => setDialog(null)} /> : null}
      <ShortcutSheet open={dialog === "help"} onClose={() => setDialog(null)} />
    </NodeViewsProvider>
  );
}

/** Pasted or dropped pictures; anything else is left to the editor, whose schema cleans it. */
function takeFiles(data: DataTransfer | null, take: (files: File[]) => void): boolean {
  const pictures = [...(data?.files ?? [])].filter((file) => file.type.startsWith("image/") || isHeic(file));
  // A table copied from a spreadsheet comes with a picture of itself: then the words are meant.
  if (pictures.length === 0 || data?.types.includes("text/html")) return false;
  take(pictures);
  return true;
}

function isHeic(file: File): boolean {
  return /\.hei[cf]$/i.test(file.name);
}

function focusRail(root: HTMLElement | null): void {
  const stops = root?.querySelectorAll<HTMLElement>('[role="toolbar"] [data-tool][tabindex="0"]') ?? [];
  [...stops].find((stop) => stop.offsetParent !== null)?.focus();
}

/** Escape in a tool or in a block's fields puts the caret back into the text. */
function backToText(
  event: { key: string; target: EventTarget; preventDefault(): void },
  editor: Editor,
): void {
  if (event.key !== "Escape" || event.target === editor.view.dom) return;
  event.preventDefault();
  editor.commands.focus();
}

import type { Editor } from "@tiptap/core";
import { TextSelection } from "@tiptap/pm/state";
import { v4 as uuid } from "uuid";
import type { DocumentNode, RichDocument } from "#shared/document/types.ts";
import { closePlace, openPlace, placePosition } from "./places.ts";

/** What a page may do to the text from outside. */
export interface EditorHandle {
  focus(): void;
  /** Puts a block in below the caret's, and picks it. */
  insertBlock(block: DocumentNode): void;
  /** Opens a place that waits for blocks; answers its id. `at` is a position of the text. */
  openPlace(at?: number): string;
  /** Puts blocks where the place is, before it. Where the place was deleted they go to the end. */
  fillPlace(id: string, blocks: DocumentNode[]): void;
  closePlace(id: string): void;
  /** Replaces the whole text as one step that can be undone. */
  replaceDocument(document: RichDocument): void;
}

type SetPlaces = (
  change: (places: ReadonlyMap<string, HTMLElement>) => ReadonlyMap<string, HTMLElement>,
) => void;

export function createHandle(current: () => Editor | null, setPlaces: SetPlaces): EditorHandle {
  const withEditor = (run: (editor: Editor) => void) => {
    const editor = current();
    if (editor && !editor.isDestroyed) run(editor);
  };
  return {
    focus: () => withEditor((editor) => editor.commands.focus()),
    insertBlock: (block) => withEditor((editor) => insertBlock(editor, block)),
    openPlace: (at) => {
      const id = uuid();
      const element = document.createElement("div");
      element.contentEditable = "false";
      withEditor((editor) => openPlace(editor, id, element, at));
      setPlaces((places) => new Map(places).set(id, element));
      return id;
    },
    fillPlace: (id, blocks) =>
      withEditor((editor) => {
        const pos = placePosition(editor, id) ?? editor.state.doc.content.size;
        const nodes = blocks.map((block) => editor.schema.nodeFromJSON(block));
        editor.view.dispatch(editor.state.tr.insert(pos, nodes));
      }),
    closePlace: (id) => {
      withEditor((editor) => closePlace(editor, id));
      setPlaces((places) => new Map([...places].filter(([key]) => key !== id)));
    },
    replaceDocument: (next) =>
      withEditor((editor) => editor.commands.setContent(next as DocumentNode, { emitUpdate: false })),
  };
}

/** A blank paragraph at the end is there to write on; it is not part of the entry. */
export function withoutBlankEnd(document: RichDocument): RichDocument {
  const content = [...document.content];
  while (content.length > 1 && isBlank(content.at(-1))) content.pop();
  return { ...document, content };
}

function isBlank(block: DocumentNode | undefined): boolean {
  return block?.type === "paragraph" && !block.content?.length;
}

/** Puts the block below the one with the caret, or in its stead while that is an empty paragraph. */
function insertBlock(editor: Editor, block: DocumentNode): void {
  const { state } = editor;
  const { $from } = state.selection;
  const node = editor.schema.nodeFromJSON(block);
  const here = $from.depth > 0 ? $from.node(1) : null;
  const blank = here?.type.name === "paragraph" && here.content.size === 0;
  const after = $from.depth > 0 ? $from.after(1) : state.selection.to;
  const tr = blank ? state.tr.replaceWith($from.before(1), after, node) : state.tr.insert(after, node);
  const end = (blank ? $from.before(1) : after) + node.nodeSize;
  if (end >= tr.doc.content.size) tr.insert(end, state.schema.nodes.paragraph?.create() ?? []);
  tr.setSelection(TextSelection.near(tr.doc.resolve(end), 1));
  editor.view.dispatch(tr.scrollIntoView());
  editor.commands.focus();
}

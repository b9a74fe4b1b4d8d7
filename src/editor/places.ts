import { type Editor, Extension } from "@tiptap/core";
import { Plugin, PluginKey } from "@tiptap/pm/state";
import { Decoration, DecorationSet } from "@tiptap/pm/view";

/** A place in the text that waits for something, such as a photo on its way. It moves with the text, and is not saved. */
interface PlaceChange {
  open?: { id: string; pos: number; element: HTMLElement };
  close?: string;
}

const key = new PluginKey<DecorationSet>("places");

export const Places = Extension.create({
  name: "places",
  addProseMirrorPlugins: () => [
    new Plugin<DecorationSet>({
      key,
      state: {
        init: () => DecorationSet.empty,
        apply: (tr, places) => {
          const moved = places.map(tr.mapping, tr.doc);
          const change: PlaceChange | undefined = tr.getMeta(key);
          if (change?.open) {
            const { id, pos, element } = change.open;
            const spec = { id, key: id, side: 1, stopEvent: () => true, ignoreSelection: true };
            return moved.add(tr.doc, [Decoration.widget(pos, element, spec)]);
          }
          if (change?.close) return moved.remove(find(moved, change.close));
          return moved;
        },
      },
      props: { decorations: (state) => key.getState(state) },
    }),
  ],
});

/** Opens a place below the block in which the caret stands, or above it while it is empty. */
export function openPlace(editor: Editor, id: string, element: HTMLElement, at?: number): void {
  const { state } = editor;
  const $pos = at === undefined ? state.selection.$from : state.doc.resolve(at);
  const empty = $pos.depth > 0 && $pos.node(1).type.name === "paragraph" && $pos.node(1).content.size === 0;
  const beside = $pos.nodeAfter && !$pos.nodeAfter.isText ? $pos.pos + $pos.nodeAfter.nodeSize : $pos.pos;
  const below = $pos.depth === 0 ? beside : $pos.after(1);
  const pos = empty ? $pos.before(1) : below;
  editor.view.dispatch(state.tr.setMeta(key, { open: { id, pos, element } } satisfies PlaceChange));
}

/** Where a place is by now; null once it is closed or the text round it was deleted. */
export function placePosition(editor: Editor, id: string): number | null {
  const places = key.getState(editor.state);
  return (places && find(places, id)[0]?.from) ?? null;
}

export function closePlace(editor: Editor, id: string): void {
  editor.view.dispatch(editor.state.tr.setMeta(key, { close: id } satisfies PlaceChange));
}

function find(places: DecorationSet, id: string): Decoration[] {
  return places.find(undefined, undefined, (spec) => spec.id === id);
}

import { Extension } from "@tiptap/core";
import type { Node, Slice } from "@tiptap/pm/model";
import { Fragment, Slice as SliceClass } from "@tiptap/pm/model";
import { type EditorState, Plugin, type Transaction } from "@tiptap/pm/state";
import { v7 as uuid } from "uuid";
import { regroup } from "./block-commands.ts";

/**
 * Keeps the blocks of features such as the server takes them: a working has an id of its own even when it was copied,
 * and a group whose photos were cut from it holds no empty place.
 */
export const TidyBlocks = Extension.create({
  name: "tidyBlocks",
  addProseMirrorPlugins: () => [tidyBlocks()],
});

export function tidyBlocks(): Plugin {
  const ownIds = new Set<string>();
  return new Plugin({
    state: {
      init: (_, state) => collectIds(state.doc, ownIds),
      apply: (tr) => (tr.docChanged ? collectIds(tr.doc, ownIds) : ownIds),
    },
    props: {
      // What comes from another entry is a new working here; what was cut here and comes back is the same one.
      transformPasted: (slice) => withNewIds(slice, (id) => !ownIds.has(id)),
    },
    appendTransaction: (transactions, _, state) =>
      transactions.some((transaction) => transaction.docChanged) ? tidied(state) : null,
  });
}

function collectIds(doc: Node, ids: Set<string>): Set<string> {
  doc.descendants((node) => {
    if (node.type.name === "working" && node.attrs.workingId) ids.add(node.attrs.workingId);
    return !node.isTextblock;
  });
  return ids;
}

function tidied(state: EditorState): Transaction | null {
  const { tr } = state;
  const seen = new Set<unknown>();
  state.doc.forEach((node, offset) => {
    const pos = tr.mapping.map(offset);
    if (node.type.name === "working") {
      if (!node.attrs.workingId || seen.has(node.attrs.workingId))
        tr.setNodeAttribute(pos, "workingId", uuid());
      seen.add(node.attrs.workingId);
    }
    if (node.type.name === "photoGroup") tidyGroup(tr, state, node, pos);
    if (node.type.name === "photo" && !node.attrs.photoId) tr.delete(pos, pos + node.nodeSize);
  });
  return tr.docChanged ? tr : null;
}

function tidyGroup(tr: Transaction, state: EditorState, group: Node, pos: number): void {
  const photos = Array.from({ length: group.childCount }, (_, index) => group.child(index));
  const real = photos.filter((photo) => photo.attrs.photoId);
  if (real.length < photos.length) tr.replaceWith(pos, pos + group.nodeSize, regroup(state, real));
}

function withNewIds(slice: Slice, foreign: (id: string) => boolean): Slice {
  const renew = (fragment: Fragment): Fragment => {
    const nodes: Node[] = [];
    fragment.forEach((node) => {
      const fresh = node.type.name === "working" && foreign(node.attrs.workingId);
      nodes.push(
        fresh ? node.type.create({ ...node.attrs, workingId: uuid() }) : node.copy(renew(node.content)),
      );
    });
    return Fragment.from(nodes);
  };
  return new SliceClass(renew(slice.content), slice.openStart, slice.openEnd);
}

import { Fragment, type Node } from "@tiptap/pm/model";
import { type EditorState, NodeSelection, TextSelection, type Transaction } from "@tiptap/pm/state";

/** Each makes a transaction, or answers null where it has nothing to do. */
type Change = Transaction | null;

/** Swaps the node at `pos` with its neighbour, within whatever holds both. */
export function moveNode(state: EditorState, pos: number, direction: "up" | "down"): Change {
  const $pos = state.doc.resolve(pos);
  const index = $pos.index();
  const first = direction === "up" ? index - 1 : index;
  const { parent } = $pos;
  const above = parent.maybeChild(first);
  const below = parent.maybeChild(first + 1);
  if (first < 0 || !above || !below) return null;
  const swapped = parent.content.replaceChild(first, below).replaceChild(first + 1, above);
  if (!parent.type.validContent(swapped)) return null;
  const from = $pos.posAtIndex(first);
  const tr = state.tr.replaceWith(from, from + above.nodeSize + below.nodeSize, [below, above]);
  const movedTo = direction === "up" ? from : from + below.nodeSize;
  return select(tr, movedTo, state, pos).scrollIntoView();
}

/** As `moveNode`, for the block of the document in which the caret stands. */
export function moveCurrentBlock(state: EditorState, direction: "up" | "down"): Change {
  const { $from } = state.selection;
  return moveNode(state, $from.depth === 0 ? $from.pos : $from.before(1), direction);
}

/** Puts a photo into one group with the photo or group just above it. */
export function joinPhotoAbove(state: EditorState, pos: number): Change {
  const $pos = state.doc.resolve(pos);
  const photo = $pos.nodeAfter;
  const above = $pos.nodeBefore;
  const group = state.schema.nodes.photoGroup;
  if (!photo || !above || !group || $pos.depth > 0) return null;
  const members = above.type === group ? above.content : Fragment.from(above);
  const joined = members.append(Fragment.from(photo));
  if (!group.validContent(joined)) return null;
  return state.tr.replaceWith(pos - above.nodeSize, pos + photo.nodeSize, group.create(null, joined));
}

/** Puts a photo of a group on its own line below the group. */
export function takePhotoOut(state: EditorState, pos: number): Change {
  const $pos = state.doc.resolve(pos);
  const photo = $pos.nodeAfter;
  if (!photo || $pos.parent.type.name !== "photoGroup") return null;
  const rest = childrenOf($pos.parent).filter((_, index) => index !== $pos.index());
  return state.tr.replaceWith($pos.before(), $pos.after(), [...regroup(state, rest), photo]);
}

/** Takes a photo off the page; a group of two becomes the photo that is left. */
export function removePhoto(state: EditorState, pos: number): Change {
  const $pos = state.doc.resolve(pos);
  const photo = $pos.nodeAfter;
  if (!photo) return null;
  if ($pos.parent.type.name !== "photoGroup") return state.tr.delete(pos, pos + photo.nodeSize);
  const rest = childrenOf($pos.parent).filter((_, index) => index !== $pos.index());
  return state.tr.replaceWith($pos.before(), $pos.after(), regroup(state, rest));
}

/** Sets a group's photos one under the other. */
export function dissolveGroup(state: EditorState, pos: number): Change {
  const group = state.doc.nodeAt(pos);
  return group && state.tr.replaceWith(pos, pos + group.nodeSize, group.content);
}

/** Photos as a group where there are enough of them, else as they are. */
export function regroup(state: EditorState, photos: readonly Node[]): Node[] {
  const group = state.schema.nodes.photoGroup;
  const content = Fragment.from([...photos]);
  return group?.validContent(content) ? [group.create(null, content)] : [...photos];
}

function childrenOf(node: Node): Node[] {
  return Array.from({ length: node.childCount }, (_, index) => node.child(index));
}

/** Keeps what was selected selected after its block has moved. */
function select(tr: Transaction, movedTo: number, state: EditorState, movedFrom: number): Transaction {
  const { selection } = state;
  const shift = movedTo - movedFrom;
  if (selection instanceof NodeSelection) {
    return selection.from >= movedFrom
      ? tr.setSelection(NodeSelection.create(tr.doc, selection.from + shift))
      : tr;
  }
  const moved = tr.doc.nodeAt(movedTo);
  if (!moved || selection.from < movedFrom || selection.to > movedFrom + moved.nodeSize) return tr;
  return tr.setSelection(TextSelection.create(tr.doc, selection.anchor + shift, selection.head + shift));
}

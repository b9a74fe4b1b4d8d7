import { EditorState, type Transaction } from "@tiptap/pm/state";
import { describe, expect, it } from "vitest";
import { documentSchema } from "#shared/document/schema.ts";
import type { DocumentNode } from "#shared/document/types.ts";
import { validateDocument } from "#shared/document/validate.ts";
import {
  dissolveGroup,
  joinPhotoAbove,
  moveNode,
  removePhoto,
  takePhotoOut,
} from "#src/editor/block-commands.ts";
import { tidyBlocks } from "#src/editor/tidy-blocks.ts";

const id = (n: number) => `0193a5b0-0000-7000-8000-00000000000${n}`;
const photo = (n: number): DocumentNode => ({
  type: "photo",
  attrs: { photoId: id(n), alt: "", caption: "" },
});
const group = (...numbers: number[]): DocumentNode => ({ type: "photoGroup", content: numbers.map(photo) });
const line = (text: string): DocumentNode => ({ type: "paragraph", content: [{ type: "text", text }] });
const working = (n: number): DocumentNode => ({
  type: "working",
  attrs: { workingId: id(n), calculator: "saddle-cope", title: "", inputs: {} },
});

function stateWith(...content: DocumentNode[]): EditorState {
  const doc = documentSchema().nodeFromJSON({ type: "doc", content });
  return EditorState.create({ doc, plugins: [tidyBlocks()] });
}

/** The document as short words: a photo by its number, a group in brackets. */
function shape(state: EditorState): string[] {
  const words = (node: DocumentNode): string => {
    if (node.type === "photo") return String(node.attrs?.photoId).slice(-1);
    if (node.type === "photoGroup") return `[${(node.content ?? []).map(words).join(" ")}]`;
    return node.content?.[0]?.text ?? node.type;
  };
  return (state.doc.toJSON() as { content: DocumentNode[] }).content.map(words);
}

/** Runs a command on the nth block and checks that what comes of it can be saved. */
function afterwards(
  state: EditorState,
  blockOrInner: [number, number?],
  command: (state: EditorState, pos: number) => Transaction | null,
): string[] | null {
  const [block, inner] = blockOrInner;
  const start = state.doc.resolve(0).posAtIndex(block);
  const pos = inner === undefined ? start : state.doc.resolve(start + 1).posAtIndex(inner);
  const tr = command(state, pos);
  if (!tr) return null;
  const next = state.apply(tr);
  expect(validateDocument(next.doc.toJSON())).toMatchObject({ ok: true });
  return shape(next);
}

describe("moveNode", () => {
  it("swaps a block with its neighbour and stops at the ends", () => {
    const start = stateWith(line("a"), photo(1), line("b"));
    expect(afterwards(start, [1], (state, pos) => moveNode(state, pos, "up"))).toEqual(["1", "a", "b"]);
    expect(afterwards(start, [1], (state, pos) => moveNode(state, pos, "down"))).toEqual(["a", "b", "1"]);
    expect(afterwards(start, [0], (state, pos) => moveNode(state, pos, "up"))).toBeNull();
    expect(afterwards(start, [2], (state, pos) => moveNode(state, pos, "down"))).toBeNull();
  });

  it("moves a photo within its group", () => {
    const start = stateWith(group(1, 2, 3));
    expect(afterwards(start, [0, 1], (state, pos) => moveNode(state, pos, "down"))).toEqual(["[1 3 2]"]);
  });
});

describe("joinPhotoAbove", () => {
  it("makes a group of two photos, and adds to a group", () => {
    expect(afterwards(stateWith(photo(1), photo(2)), [1], joinPhotoAbove)).toEqual(["[1 2]"]);
    expect(afterwards(stateWith(group(1, 2), photo(3)), [1], joinPhotoAbove)).toEqual(["[1 2 3]"]);
  });

  it("does nothing below words or below a full group", () => {
    expect(afterwards(stateWith(line("a"), photo(1)), [1], joinPhotoAbove)).toBeNull();
    expect(afterwards(stateWith(group(1, 2, 3, 4, 5, 6), photo(7)), [1], joinPhotoAbove)).toBeNull();
  });
});

describe("takePhotoOut", () => {
  it("sets the photo below its group, and a group of two apart", () => {
    expect(afterwards(stateWith(group(1, 2, 3)), [0, 0], takePhotoOut)).toEqual(["[2 3]", "1"]);
    expect(afterwards(stateWith(group(1, 2)), [0, 0], takePhotoOut)).toEqual(["2", "1"]);
  });
});

describe("removePhoto", () => {
  it("leaves the rest of a group, or the photo that remains", () => {
    expect(afterwards(stateWith(group(1, 2, 3)), [0, 1], removePhoto)).toEqual(["[1 3]"]);
    expect(afterwards(stateWith(group(1, 2)), [0, 1], removePhoto)).toEqual(["1"]);
    expect(afterwards(stateWith(line("a"), photo(1)), [1], removePhoto)).toEqual(["a"]);
  });
});

describe("dissolveGroup", () => {
  it("sets the photos one under the other", () => {
    expect(afterwards(stateWith(line("a"), group(1, 2)), [1], dissolveGroup)).toEqual(["a", "1", "2"]);
  });
});

describe("tidyBlocks", () => {
  it("gives the second of two alike workings an id of its own", () => {
    const start = stateWith(working(1), line("a"));
    const copy = documentSchema().nodeFromJSON(working(1));
    const copied = start.apply(start.tr.insert(start.doc.content.size, copy));
    const ids = copied.doc.children
      .filter((node) => node.type.name === "working")
      .map((node) => node.attrs.workingId);
    expect(ids[0]).toBe(id(1));
    expect(new Set(ids).size).toBe(2);
    expect(validateDocument(copied.doc.toJSON())).toMatchObject({ ok: true });
  });

  it("leaves no empty place when one of two photos of a group is deleted as text", () => {
    const start = stateWith(group(1, 2), line("a"));
    const next = start.apply(start.tr.delete(1, 2));
    expect(shape(next).slice(0, 2)).toEqual(["2", "a"]);
    expect(validateDocument(next.doc.toJSON())).toMatchObject({ ok: true });
  });
});

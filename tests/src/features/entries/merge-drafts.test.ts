import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { emptyDocument, workingsIn } from "#shared/document/read.ts";
import type { DocumentNode } from "#shared/document/types.ts";
import { validateDocument } from "#shared/document/validate.ts";
import type { DraftContent } from "#src/features/entries/draft-content.ts";
import { hasMergeMarks, mergeDrafts, mergeMarks } from "#src/features/entries/merge-drafts.ts";

const line = (text: string): DocumentNode => ({ type: "paragraph", content: [{ type: "text", text }] });
const working = (workingId: string, angle: number): DocumentNode => ({
  type: "working",
  attrs: { workingId, calculator: "saddle-cope", title: "", inputs: { angle } },
});
const draft = (blocks: DocumentNode[], more: Partial<DraftContent> = {}): DraftContent => ({
  title: "Wishbones",
  summary: "",
  stageId: "s1",
  document: { type: "doc", content: blocks },
  ...more,
});
const texts = (content: DraftContent) => content.document.content.map((block) => block.content?.[0]?.text);
const newId = () => "0193a5b0-0000-7000-8000-0000000000ff";
const merge = (base: DraftContent, mine: DraftContent, theirs: DraftContent) =>
  mergeDrafts(base, mine, theirs, newId);

const one = "0193a5b0-0000-7000-8000-000000000001";

describe("mergeDrafts", () => {
  it("takes each part from the side that changed it", () => {
    const base = draft([line("a"), line("b"), line("c")]);
    const { content, conflicts } = merge(
      base,
      draft([line("a, mine"), line("b"), line("c")]),
      draft([line("a"), line("b"), line("c"), line("d, theirs")], { title: "Lower wishbones" }),
    );
    expect(texts(content)).toEqual(["a, mine", "b", "c", "d, theirs"]);
    expect(content.title).toBe("Lower wishbones");
    expect(conflicts).toBe(0);
    expect(hasMergeMarks(content.document)).toBe(false);
  });

  it("keeps both versions of a part that both changed, with marks round them", () => {
    const base = draft([line("a"), line("b")]);
    const { content, conflicts } = merge(
      base,
      draft([line("a1"), line("b")]),
      draft([line("a2"), line("b")]),
    );
    expect(texts(content)).toEqual([mergeMarks.mine, "a1", mergeMarks.theirs, "a2", mergeMarks.end, "b"]);
    expect(conflicts).toBe(1);
    expect(hasMergeMarks(content.document)).toBe(true);
  });

  it("takes neighbouring parts from the side that changed each, and marks only what both changed", () => {
    const base = draft([line("a"), line("b"), line("c")]);
    const { content, conflicts } = merge(
      base,
      draft([line("a1"), line("b"), line("c1")]),
      draft([line("a2"), line("b2"), line("c")]),
    );
    expect(texts(content)).toEqual([
      mergeMarks.mine,
      "a1",
      mergeMarks.theirs,
      "a2",
      mergeMarks.end,
      "b2",
      "c1",
    ]);
    expect(conflicts).toBe(1);
  });

  it("keeps a part that one side rewrote and the other deleted", () => {
    const base = draft([line("a"), line("b")]);
    const { content } = merge(base, draft([line("b")]), draft([line("a, better"), line("b")]));
    expect(texts(content)).toEqual(["a, better", "b"]);
  });

  it("does not call the same change on both sides a conflict", () => {
    const changed = draft([line("a1")], { title: "New" });
    expect(merge(draft([line("a")]), changed, changed)).toEqual({ content: changed, conflicts: 0 });
  });

  it("keeps the other title as a line when both changed it", () => {
    const base = draft([line("a")]);
    const { content, conflicts } = merge(
      base,
      draft([line("a")], { title: "Mine" }),
      draft([line("a")], { title: "Theirs" }),
    );
    expect(content.title).toBe("Mine");
    expect(texts(content)[0]).toContain("Theirs");
    expect(conflicts).toBe(1);
  });

  it("gives a working that both changed an id of its own, so that the entry can still be saved", () => {
    const base = draft([working(one, 70)]);
    const { content } = merge(base, draft([working(one, 71)]), draft([working(one, 72)]));
    const kept = workingsIn(content.document).map(({ workingId, inputs }) => [workingId, inputs.angle]);
    expect(kept).toEqual([
      [one, 71],
      [newId(), 72],
    ]);
    expect(validateDocument(content.document).ok).toBe(true);
  });

  it("loses no block that either side wrote, and makes a document that can be saved", () => {
    fc.assert(
      fc.property(blocks, edits, edits, (base, mineEdits, theirEdits) => {
        const mine = edited(base, mineEdits, "mine");
        const theirs = edited(base, theirEdits, "theirs");
        const { content } = merge(draft(base), draft(mine), draft(theirs));
        const merged = new Set(content.document.content.map((block) => JSON.stringify(block)));
        const before = new Set(base.map((block) => JSON.stringify(block)));
        for (const block of [...mine, ...theirs]) {
          const key = JSON.stringify(block);
          if (!before.has(key)) expect(merged).toContain(key);
        }
        for (const block of base) {
          const key = JSON.stringify(block);
          if (hasBlock(mine, key) && hasBlock(theirs, key)) expect(merged).toContain(key);
        }
        expect(validateDocument(content.document)).toMatchObject({ ok: true });
      }),
    );
  });

  it("answers the changed side when the other changed nothing", () => {
    fc.assert(
      fc.property(blocks, edits, (base, changes) => {
        const changed = draft(edited(base, changes, "changed"));
        expect(merge(draft(base), changed, draft(base))).toEqual({ content: changed, conflicts: 0 });
        expect(merge(draft(base), draft(base), changed)).toEqual({ content: changed, conflicts: 0 });
      }),
    );
  });
});

/** Blocks that differ: of two alike, one could rightly go while the other stays. */
const blocks = fc
  .uniqueArray(fc.integer({ min: 0, max: 30 }), { minLength: 1, maxLength: 8 })
  .map((numbers) => numbers.map((n) => line(`paragraph ${n}`)));
const edits = fc.array(
  fc.record({
    at: fc.nat(9),
    kind: fc.constantFrom("change", "insert", "delete" as const),
    word: fc.nat(99),
  }),
  { maxLength: 5 },
);

function edited(
  base: DocumentNode[],
  changes: { at: number; kind: string; word: number }[],
  side: string,
): DocumentNode[] {
  const result = [...base];
  for (const { at, kind, word } of changes) {
    const index = at % (result.length + 1);
    const fresh = line(`${side} ${word}`);
    if (kind === "insert") result.splice(index, 0, fresh);
    if (kind === "delete") result.splice(index, 1);
    if (kind === "change") result.splice(index, 1, fresh);
  }
  return result.length > 0 ? result : emptyDocument.content;
}

function hasBlock(list: DocumentNode[], key: string): boolean {
  return list.some((block) => JSON.stringify(block) === key);
}

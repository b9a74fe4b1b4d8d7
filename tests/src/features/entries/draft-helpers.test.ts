import { beforeEach, describe, expect, it } from "vitest";
import { emptyDocument } from "#shared/document/read.ts";
import type { RichDocument } from "#shared/document/types.ts";
import { beforePublishing } from "#src/features/entries/before-publishing.ts";
import { compareTexts } from "#src/features/entries/compare-text.ts";
import type { DraftContent } from "#src/features/entries/draft-content.ts";
import { keepDraft, keptDrafts } from "#src/features/entries/kept-drafts.ts";
import { mergeMarks } from "#src/features/entries/merge-drafts.ts";
import { localFieldValue, momentInWords, momentOfField } from "#src/features/entries/moments.ts";

const doc = (...lines: string[]): RichDocument => ({
  type: "doc",
  content: lines.map((text) => ({ type: "paragraph", content: [{ type: "text", text }] })),
});
const photo = (alt: string | null) => ({
  type: "photo",
  attrs: { photoId: "0193a5b0-0000-7000-8000-000000000001", alt, caption: "" },
});
const content = (more: Partial<DraftContent>): DraftContent => ({
  title: "Coping",
  summary: "",
  stageId: "s1",
  document: doc("Words."),
  ...more,
});

describe("beforePublishing", () => {
  it("asks for nothing when an entry has a title, words and described photos", () => {
    const document: RichDocument = {
      type: "doc",
      content: [...doc("Words.").content, photo(""), photo("A joint")],
    };
    expect(beforePublishing(content({ document }))).toEqual([]);
  });

  it("asks for a title and for words", () => {
    const lines = beforePublishing(content({ title: "  ", document: emptyDocument }));
    expect(lines).toEqual([expect.stringContaining("title"), expect.stringContaining("empty")]);
  });

  it("counts the photos of which nothing was said", () => {
    const document: RichDocument = { type: "doc", content: [photo(null), photo(null), photo("")] };
    expect(beforePublishing(content({ document }))).toEqual([
      expect.stringMatching(/^2 photos have no description/),
    ]);
  });

  it("stops an entry in which a part stands in two versions", () => {
    const document = doc(mergeMarks.mine, "a", mergeMarks.theirs, "b", mergeMarks.end);
    expect(beforePublishing(content({ document }))).toEqual([expect.stringContaining("two versions")]);
  });
});

describe("compareTexts", () => {
  it("shows which words of a line changed and leaves the others", () => {
    const lines = compareTexts(
      doc("Same.", "The arm is 42 mm long."),
      doc("Same.", "The arm is 44 mm long.", "New."),
    );
    expect(lines).toEqual([
      [{ kind: "same", text: "Same." }],
      [
        { kind: "same", text: "The arm is " },
        { kind: "gone", text: "42" },
        { kind: "new", text: "44" },
        { kind: "same", text: " mm long." },
      ],
      [{ kind: "new", text: "New." }],
    ]);
  });
});

describe("keptDrafts", () => {
  let storage: Storage;
  const base = { version: 1, content: content({}) };
  beforeEach(() => {
    storage = memoryStorage();
  });

  it("finds what closed tabs kept of this entry, newest first, and leaves open tabs theirs", () => {
    keepDraft(storage, "e1", { tab: "old", at: 1, base, content: content({ title: "old" }) });
    keepDraft(storage, "e1", { tab: "new", at: 2, base, content: content({ title: "new" }) });
    keepDraft(storage, "e1", { tab: "open", at: 3, base, content: content({ title: "open" }) });
    keepDraft(storage, "e2", { tab: "other", at: 4, base, content: content({ title: "other" }) });
    const found = keptDrafts(storage, "e1", new Set(["open"]));
    expect(found.map((kept) => kept.content.title)).toEqual(["new", "old"]);
  });

  it("forgets what has reached the server", () => {
    keepDraft(storage, "e1", { tab: "t", at: 1, base, content: content({}) });
    keepDraft(storage, "e1", { tab: "t", content: null });
    expect(keptDrafts(storage, "e1", new Set())).toEqual([]);
  });

  it("passes over what cannot be read", () => {
    storage.setItem("soapstone:unsaved:e1:t", "{half");
    storage.setItem("soapstone:unsaved:e1:u", '{"tab":"u"}');
    expect(keptDrafts(storage, "e1", new Set())).toEqual([]);
  });

  it("says when the browser has no room", () => {
    storage.setItem = () => {
      throw new DOMException("full", "QuotaExceededError");
    };
    expect(keepDraft(storage, "e1", { tab: "t", at: 1, base, content: content({}) })).toBe(false);
  });
});

describe("momentOfField", () => {
  it("gives back the minute that localFieldValue wrote", () => {
    const at = Date.UTC(2026, 6, 3, 6, 45);
    expect(momentOfField(localFieldValue(at))).toBe(at);
  });

  it("is null while nothing whole is typed", () => {
    expect([momentOfField(""), momentOfField("2026-13-01T00:00")]).toEqual([null, null]);
  });
});

describe("momentInWords", () => {
  it("gives the date and how far away it is", () => {
    const at = Date.UTC(2026, 6, 3, 12);
    expect(momentInWords(at, at - 2 * 86_400_000)).toMatch(/3 July 2026.*, in 2 days$/);
    expect(momentInWords(at, at + 5 * 60_000)).toMatch(/, 5 minutes ago$/);
  });
});

/** As the browser's, as far as it is used: keys are its own properties. */
function memoryStorage(): Storage {
  const methods = {
    getItem(this: Record<string, string>, key: string) {
      return this[key] ?? null;
    },
    setItem(this: Record<string, string>, key: string, value: string) {
      this[key] = value;
    },
    removeItem(this: Record<string, string>, key: string) {
      delete this[key];
    },
  };
  return Object.create(
    {},
    Object.fromEntries(
      Object.entries(methods).map(([name, value]) => [name, { value, enumerable: false, writable: true }]),
    ),
  ) as Storage;
}

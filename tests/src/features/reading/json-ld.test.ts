import { describe, expect, it } from "vitest";
import type { EntryPage } from "#shared/contracts/entries.ts";
import { entryJsonLd, jsonForScript } from "#src/features/reading/json-ld.ts";

const owner = { handle: "maren", name: "Maren Holt", avatar: null };
const build = {
  id: "b",
  slug: "heron",
  title: "Heron",
  purpose: "A car",
  status: "under_way" as const,
  cover: null,
  coverAlt: "",
  owner,
  entryCount: 1,
  lastEntryAt: 0,
};
const entry: EntryPage = {
  id: "e",
  number: 4,
  slug: "one-radius-deep",
  title: "One radius deep",
  summary: "",
  stageId: "s",
  publishedAt: Date.UTC(2026, 0, 11, 9),
  updatedAt: Date.UTC(2026, 0, 12, 9),
  photo: null,
  photoAlt: "",
  document: { type: "doc", content: [] },
  build,
  stage: { id: "s", title: "Frame", state: "done", entryCount: 1 },
  previous: null,
  next: null,
  mine: false,
  workings: {},
  photos: {},
};

describe("entryJsonLd", () => {
  it("describes an entry as schema.org's BlogPosting, with whole addresses and ISO 8601 dates", () => {
    // https://schema.org/BlogPosting, properties from memory
    expect(entryJsonLd(entry, "https://site.example")).toEqual({
      "@context": "https://schema.org",
      "@type": "BlogPosting",
      headline: "One radius deep",
      url: "https://site.example/builds/heron/entries/one-radius-deep",
      datePublished: "2026-01-11T09:00:00.000Z",
      dateModified: "2026-01-12T09:00:00.000Z",
      articleSection: "Frame",
      position: 4,
      author: { "@type": "Person", name: "Maren Holt", url: "https://site.example/people/maren" },
      isPartOf: { "@type": "Blog", name: "Heron", url: "https://site.example/builds/heron" },
    });
  });
});

describe("jsonForScript", () => {
  it("leaves nothing that could end the script or open a comment, and says the same", () => {
    const value = { title: "</script><script>alert(1)</script><!-- $& -->" };
    const text = jsonForScript(value);
    expect(text).not.toContain("<");
    expect(JSON.parse(text)).toEqual(value);
  });
});

import { describe, expect, it } from "vitest";
import { createPageCache } from "#server/http/page-cache.ts";

const page = (html: string) => ({ status: 200, pieces: [Buffer.from(html)] });

function setUp(most?: number) {
  const state = { version: 1, now: 0 };
  const cache = createPageCache(
    () => state.version,
    () => state.now,
    most,
    1000,
  );
  return { state, cache };
}

describe("createPageCache", () => {
  it("gives a page back while nothing public has changed", () => {
    const { cache } = setUp();
    cache.set("/a", page("a"), 1);
    expect(cache.get("/a")).toEqual(page("a"));
  });

  it("forgets a page when the site's version has risen", () => {
    const { cache, state } = setUp();
    cache.set("/a", page("a"), 1);
    state.version = 2;
    expect(cache.get("/a")).toBeUndefined();
  });

  it("does not keep what was drawn while something changed", () => {
    const { cache, state } = setUp();
    const before = cache.version();
    state.version = 2;
    cache.set("/a", page("old"), before);
    expect(cache.get("/a")).toBeUndefined();
  });

  it("draws again after its lifetime", () => {
    const { cache, state } = setUp();
    cache.set("/a", page("a"), 1);
    state.now = 1001;
    expect(cache.get("/a")).toBeUndefined();
  });

  it("lets the page longest unused go when it is full", () => {
    const { cache } = setUp(2);
    cache.set("/a", page("a"), 1);
    cache.set("/b", page("b"), 1);
    cache.get("/a");
    cache.set("/c", page("c"), 1);
    expect(cache.get("/b")).toBeUndefined();
    expect(cache.get("/a")).toEqual(page("a"));
  });
});

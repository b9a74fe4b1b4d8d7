import { QueryClient } from "@tanstack/react-query";
import type { LoaderFunctionArgs } from "react-router";
import { describe, expect, it } from "vitest";
import * as buildPage from "#src/app/pages/build-page.tsx";
import * as entryPage from "#src/app/pages/entry-page.tsx";
import { createApi } from "#src/lib/api.ts";

/** A server on which the build "kite" and its entry "rails" have been renamed. */
const api = createApi(async () => ({
  status: 200,
  body: { slug: "four-rails", build: { slug: "heron" } },
}));

async function redirectOf(load: typeof buildPage.load | typeof entryPage.load, params: object) {
  const context = { api, queryClient: new QueryClient() };
  const thrown = await load(context, { params } as LoaderFunctionArgs).then(
    () => null,
    (reason: unknown) => reason,
  );
  return thrown instanceof Response ? [thrown.status, thrown.headers.get("Location")] : thrown;
}

describe("a renamed address", () => {
  it("leads to the build's present one for good", async () => {
    expect(await redirectOf(buildPage.load, { build: "kite" })).toEqual([301, "/builds/four-rails"]);
  });

  it("leads to the entry's present one, be it the build or the entry that was renamed", async () => {
    const present = "/builds/heron/entries/four-rails";
    expect(await redirectOf(entryPage.load, { build: "kite", entry: "four-rails" })).toEqual([301, present]);
    expect(await redirectOf(entryPage.load, { build: "heron", entry: "rails" })).toEqual([301, present]);
  });

  it("is not suspected where the address is the present one", async () => {
    expect(await redirectOf(entryPage.load, { build: "heron", entry: "four-rails" })).toBeNull();
  });
});

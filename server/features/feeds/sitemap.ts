import { Readable } from "node:stream";
import { SitemapStream, streamToPromise } from "sitemap";
import { calculatorIds } from "#shared/calculators/registry.ts";
import type { FeedSource } from "./source.ts";

/** A sitemap may hold 50,000 addresses (sitemaps.org protocol); builds and people need some of them. */
const mostEntries = 40_000;

/** Every public page: the front, the bench, the builds, each build, entry and builder, with when it last changed. */
export async function writeSitemap(source: FeedSource, siteUrl: string): Promise<string> {
  const pages = new Map<string, number | null>([
    ["/", null],
    ["/builds", null],
    ["/bench", null],
    ...calculatorIds.map((id) => [`/bench/${id}`, null] as const),
  ]);
  const seen = (path: string, at: number) => pages.set(path, Math.max(pages.get(path) ?? 0, at));
  for (const { build, entry, person, updatedAt } of source.addresses(mostEntries)) {
    seen(`/builds/${build}`, updatedAt ?? 0);
    seen(`/builds/${build}/entries/${entry}`, updatedAt ?? 0);
    seen(`/people/${person}`, updatedAt ?? 0);
  }
  const items = [...pages].map(([url, at]) => ({ url, ...(at && { lastmod: new Date(at).toISOString() }) }));
  const stream = new SitemapStream({ hostname: siteUrl });
  const xml = await streamToPromise(Readable.from(items).pipe(stream));
  return xml.toString();
}

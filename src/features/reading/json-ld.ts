import type { EntryPage } from "#shared/contracts/entries.ts";
import { paths } from "#src/lib/paths.ts";

/** An entry in the vocabulary of schema.org, for search engines. */
export function entryJsonLd(entry: EntryPage, siteUrl: string): object {
  const { build } = entry;
  const picture = entry.photo?.webp.at(-1)?.url;
  return {
    "@context": "https://schema.org",
    "@type": "BlogPosting",
    headline: entry.title,
    ...(entry.summary && { description: entry.summary }),
    url: siteUrl + paths.entry(build.slug, entry.slug),
    datePublished: new Date(entry.publishedAt).toISOString(),
    dateModified: new Date(entry.updatedAt).toISOString(),
    articleSection: entry.stage.title,
    position: entry.number,
    ...(picture && { image: siteUrl + picture }),
    author: {
      "@type": "Person",
      name: build.owner.name,
      url: siteUrl + paths.person(build.owner.handle),
    },
    isPartOf: { "@type": "Blog", name: build.title, url: siteUrl + paths.build(build.slug) },
  };
}

/** JSON that can stand inside a script element: no `<` is left that could end it or open a comment. */
export function jsonForScript(value: unknown): string {
  return JSON.stringify(value).replaceAll("<", "\\u003c");
}

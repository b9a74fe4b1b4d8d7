import { Feed } from "feed";
import { createElement } from "react";
import { renderToStaticMarkup } from "react-dom/server";
import type { BuildSummary } from "#shared/contracts/builds.ts";
import type { FeedEntry } from "./source.ts";

export type FeedFormat = "atom" | "json";

/** What a feed is about, before it is written down. */
export interface FeedPlan {
  /** A permanent name, the same after every rename. */
  id: string;
  title: string;
  subtitle: string;
  /** Path of the page the feed follows, and of the feed without its ending. */
  page: string;
  self: string;
  /** When nothing is in it yet. */
  since: number;
  author: { name: string; handle: string } | null;
  entries: (FeedEntry & { build: BuildSummary })[];
}

/** When the newest change in it was made. */
export function feedUpdated({ entries, since }: FeedPlan): number {
  return entries.reduce(
    (latest, { updatedAt }) => Math.max(latest, updatedAt),
    entries.length > 0 ? 0 : since,
  );
}

/** Writes a feed as Atom (RFC 4287) or JSON Feed. */
export function writeFeed(plan: FeedPlan, format: FeedFormat, siteUrl: string): string {
  const at = (path: string) => `${siteUrl}${path}`;
  const feed = new Feed({
    id: plan.id,
    title: printable(plan.title),
    description: printable(plan.subtitle),
    link: at(plan.page),
    feedLinks: { [format]: at(`${plan.self}.${format}`) },
    updated: new Date(feedUpdated(plan)),
    generator: "Soapstone",
    ...(plan.author && { author: person(plan.author, at) }),
  });
  for (const entry of plan.entries) {
    const title = printable(entry.title);
    const link = at(`/builds/${entry.build.slug}/entries/${entry.slug}`);
    feed.addItem({
      id: `urn:uuid:${entry.id}`,
      // The writer declares Atom titles to be HTML; JSON ones are plain text.
      title: format === "atom" ? renderToStaticMarkup(title) : title,
      link,
      date: new Date(entry.updatedAt),
      published: new Date(entry.publishedAt),
      author: [person(entry.build.owner, at)],
      description: summaryHtml(entry, link, at),
    });
  }
  return format === "atom" ? feed.atom1() : feed.json1();
}

function person({ name, handle }: { name: string; handle: string }, at: (path: string) => string) {
  return { name: printable(name), link: at(`/people/${handle}`) };
}

/** The summary with the entry's first photo, escaped by the renderer. */
function summaryHtml(entry: FeedEntry, link: string, at: (path: string) => string): string {
  const picture = entry.photo?.webp.at(-1);
  return renderToStaticMarkup([
    picture &&
      createElement("img", {
        key: "photo",
        src: at(picture.url),
        alt: printable(entry.photoAlt),
        width: picture.width,
      }),
    entry.summary && createElement("p", { key: "summary" }, printable(entry.summary)),
    createElement("p", { key: "link" }, createElement("a", { href: link }, "Read the entry")),
  ]);
}

/** Without the control characters that XML 1.0 has no way to write (section 2.2). */
function printable(text: string): string {
  return [...text]
    .filter((character) => character >= " " || character === "\t" || character === "\n")
    .filter((character) => character !== "\uFFFE" && character !== "\uFFFF")
    .join("");
}

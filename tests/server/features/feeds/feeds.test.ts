import { XMLParser, XMLValidator } from "fast-xml-parser";
import { describe, expect, it } from "vitest";
import type { Person } from "#server/http/viewer.ts";
import { calculatorIds } from "#shared/calculators/registry.ts";
import {
  photoBlock,
  publish,
  publishedEntry,
  readyPhoto,
  saveOver,
  startBuild,
  startEntry,
} from "#tests/factories/content.ts";
import { jpeg } from "#tests/factories/pictures.ts";
import { type ContentBench, contentBench } from "#tests/setup/content-bench.ts";

const site = "https://diary.soapstone.example";
const awkward = 'Tubes < 2 mm & "sharp" ]]> corners\u0008';

async function twoBuilds() {
  const bench = await contentBench();
  const maren = bench.person("maren");
  const idris = bench.person("idris");
  const heron = await startBuild(bench, maren, "Heron");
  const first = await publishedEntry(bench, maren, heron, "Setting out the frame");
  bench.time.now += 60_000;
  await publishedEntry(bench, idris, await startBuild(bench, idris, "Pelican"), "Bending the main tube");
  bench.time.now += 60_000;
  await entryWithPhoto(bench, maren, heron);
  await startEntry(bench, maren, heron, "Secret draft");
  await startBuild(bench, idris, "Secret build");
  return { bench, maren, heron, first };
}

async function entryWithPhoto(
  bench: ContentBench,
  maren: Person,
  heron: Awaited<ReturnType<typeof startBuild>>,
) {
  const photo = await readyPhoto(bench, maren, heron.build, await jpeg({ width: 60, height: 40 }));
  const draft = await startEntry(bench, maren, heron, awkward);
  const document = { type: "doc", content: [photoBlock(photo.id, 'The "datum" <line>')] };
  const saved = await saveOver(bench, maren, draft, { document, summary: "Cut & fit <twice>" });
  await publish(bench, maren, saved.body);
}

interface AtomLink {
  rel?: string;
  href: string;
}

interface AtomEntry {
  id: string[];
  title: { "#text": string; type?: string }[];
  updated: string[];
  published?: string[];
  link: AtomLink[];
  author?: { name: string[] }[];
  summary?: { "#text": string; type: string }[];
  content?: unknown[];
}

interface AtomFeed extends Omit<AtomEntry, "title"> {
  title: string[];
  entry?: AtomEntry[];
}

/** Parsed by a general-purpose library, every element as a list so that none can hide a second one. */
function parseAtom(xml: string): AtomFeed {
  expect(XMLValidator.validate(xml)).toBe(true);
  const parser = new XMLParser({
    ignoreAttributes: false,
    attributeNamePrefix: "",
    parseTagValue: false,
    isArray: (name, _path, _isLeaf, isAttribute) => !isAttribute && name !== "feed",
  });
  return parser.parse(xml).feed;
}

// RFC 3339, section 5.6, as RFC 4287 section 3.3 wants it: "T" and "Z" in capitals.
const date = /^\d{4}-\d\d-\d\dT\d\d:\d\d:\d\d(\.\d+)?(Z|[+-]\d\d:\d\d)$/;

/** The element rules of RFC 4287, sections 4.1.1 (feed), 4.1.2 (entry), 4.2.6 (id) and 4.2.7 (link). */
function expectAtom(feed: AtomFeed): void {
  expectCommon(feed);
  const entries = feed.entry ?? [];
  expect(feed.author !== undefined || entries.every((entry) => entry.author !== undefined)).toBe(true);
  expect(feed.link.filter((link) => link.rel === "self")).toHaveLength(1);
  for (const entry of entries) {
    expectCommon(entry);
    expect(entry.content ?? alternates(entry)).toHaveLength(1);
    expect(entry.summary?.length ?? 0).toBeLessThanOrEqual(1);
    expect(entry.published?.[0]).toMatch(date);
    for (const author of entry.author ?? []) expect(author.name).toHaveLength(1);
  }
  const ids = [feed.id[0], ...entries.map((entry) => entry.id[0])];
  expect(new Set(ids).size).toBe(ids.length);
}

function expectCommon(element: Pick<AtomEntry, "id" | "updated" | "link"> & { title: unknown[] }): void {
  expect(element.id).toHaveLength(1);
  expect(element.title).toHaveLength(1);
  expect(element.updated).toHaveLength(1);
  expect(element.updated[0]).toMatch(date);
  expect(URL.canParse(element.id[0] ?? "")).toBe(true);
  expect(alternates(element)).toHaveLength(1);
  for (const link of element.link) expect(link.href.startsWith(`${site}/`)).toBe(true);
}

/** A link without `rel` is an alternate one (section 4.2.7.2). */
function alternates({ link }: Pick<AtomEntry, "link">): AtomLink[] {
  return link.filter(({ rel = "alternate" }) => rel === "alternate");
}

describe("GET /feed.atom", () => {
  it("keeps the element rules of RFC 4287", async () => {
    const { bench } = await twoBuilds();
    const answer = await bench.send(null, "GET", "/feed.atom");
    expect(answer.headers.get("content-type")).toBe("application/atom+xml; charset=utf-8");
    const feed = parseAtom(answer.body);
    expectAtom(feed);
    expect(feed.link).toContainEqual({ rel: "self", href: `${site}/feed.atom` });
    expect(feed.entry?.map((entry) => alternates(entry)[0]?.href)).toEqual([
      expect.stringContaining(`${site}/builds/heron/entries/tubes-2-mm-and-sharp-corners`),
      `${site}/builds/pelican/entries/bending-the-main-tube`,
      `${site}/builds/heron/entries/setting-out-the-frame`,
    ]);
    expect(feed.updated[0]).toBe(new Date(bench.time.now).toISOString());
  });

  it("carries awkward titles and summaries as escaped HTML", async () => {
    const { bench } = await twoBuilds();
    const feed = parseAtom((await bench.send(null, "GET", "/feed.atom")).body);
    const entry = feed.entry?.[0];
    expect(entry?.title[0]).toEqual({
      type: "html",
      "#text": "Tubes &lt; 2 mm &amp; &quot;sharp&quot; ]]&gt; corners",
    });
    expect(entry?.summary?.[0]?.["#text"]).toContain("<p>Cut &amp; fit &lt;twice&gt;</p>");
    expect(entry?.summary?.[0]?.["#text"]).toMatch(
      /<img src="https:\/\/diary\.soapstone\.example\/photos\/[0-9a-f-]+\/0-60\.webp" alt="The &quot;datum&quot; &lt;line&gt;"/,
    );
  });

  it("is valid while nothing is public, and tells of no draft", async () => {
    const bench = await contentBench();
    const maren = bench.person("maren");
    await startEntry(bench, maren, await startBuild(bench, maren), "Secret draft");
    const { body } = await bench.send(null, "GET", "/feed.atom");
    expectAtom(parseAtom(body));
    expect(body).not.toContain("Secret");
  });

  it("answers 304 to a reader that has it, until something is published", async () => {
    const { bench, maren, heron } = await twoBuilds();
    const first = await bench.fetchAs(null, "/feed.atom");
    const etag = first.headers.get("etag") ?? "";
    expect(first.headers.get("last-modified")).toBe(new Date(bench.time.now).toUTCString());
    // Named, as Node's fetch would otherwise ask for no-cache and never get a 304.
    const headers = { "if-none-match": etag, "cache-control": "max-age=0" };
    const again = () => bench.fetchAs(null, "/feed.atom", { headers });
    expect((await again()).status).toBe(304);
    bench.time.now += 60_000;
    await publishedEntry(bench, maren, heron, "Third");
    expect((await again()).status).toBe(200);
  });
});

describe("GET /builds/:build/feed.atom", () => {
  it("keeps the element rules of RFC 4287 with the build's entries alone", async () => {
    const { bench } = await twoBuilds();
    const feed = parseAtom((await bench.send(null, "GET", "/builds/heron/feed.atom")).body);
    expectAtom(feed);
    expect(feed.title).toEqual(["Heron"]);
    expect(feed.author?.[0]?.name).toEqual(["Maren"]);
    expect(feed.entry).toHaveLength(2);
  });

  it("keeps its ids when build and entry are renamed, and leads the old address on", async () => {
    const { bench, maren, first } = await twoBuilds();
    const ids = async (path: string) => {
      const feed = parseAtom((await bench.send(null, "GET", path)).body);
      return [feed.id[0], ...(feed.entry ?? []).map((entry) => entry.id[0])];
    };
    const before = await ids("/builds/heron/feed.atom");
    await bench.send(maren, "POST", `/api/entries/${first.id}/rename`, { slug: "datum" });
    await bench.send(maren, "PATCH", "/api/builds/heron", { slug: "crane" });
    expect(await ids("/builds/crane/feed.atom")).toEqual(before);
    const moved = await bench.fetchAs(null, "/builds/heron/feed.atom");
    expect([moved.status, moved.headers.get("location")]).toEqual([301, "/builds/crane/feed.atom"]);
  });

  it("is missing for a build that is not public, its builder included", async () => {
    const { bench, maren } = await twoBuilds();
    await startBuild(bench, maren, "Gantry");
    expect((await bench.send(maren, "GET", "/builds/gantry/feed.atom")).status).toBe(404);
    expect((await bench.send(null, "GET", "/builds/nothing/feed.json")).status).toBe(404);
  });
});

describe("GET /feed.json", () => {
  it("has what JSON Feed 1 requires, with plain titles", async () => {
    const { bench } = await twoBuilds();
    const answer = await bench.send(null, "GET", "/feed.json");
    expect(answer.headers.get("content-type")).toBe("application/feed+json; charset=utf-8");
    // jsonfeed.org, version 1: version and title are required; an item needs an id and content.
    expect(answer.body).toMatchObject({
      version: "https://jsonfeed.org/version/1",
      title: "Soapstone",
      home_page_url: `${site}/`,
      feed_url: `${site}/feed.json`,
    });
    expect(answer.body.items).toHaveLength(3);
    for (const item of answer.body.items) {
      expect(item.id).toMatch(/^urn:uuid:/);
      expect(item.content_html).toContain("Read the entry");
      expect(item.date_published).toMatch(date);
    }
    expect(answer.body.items[0].title).toBe('Tubes < 2 mm & "sharp" ]]> corners');
  });
});

describe("GET /sitemap.xml", () => {
  it("lists public builds, entries and builders, and nothing else", async () => {
    const { bench } = await twoBuilds();
    const answer = await bench.send(null, "GET", "/sitemap.xml");
    expect(answer.headers.get("content-type")).toContain("xml");
    const parser = new XMLParser({ ignoreAttributes: false, isArray: (name) => name === "url" });
    const { urlset } = parser.parse(answer.body);
    // sitemaps.org protocol: the namespace is required, addresses are absolute.
    expect(urlset["@_xmlns"]).toBe("http://www.sitemaps.org/schemas/sitemap/0.9");
    const addresses = urlset.url.map((each: { loc: string }) => each.loc.slice(site.length)).sort();
    expect(addresses).toEqual([
      "/",
      "/bench",
      ...calculatorIds.map((id) => `/bench/${id}`).toSorted(),
      "/builds",
      "/builds/heron",
      "/builds/heron/entries/setting-out-the-frame",
      expect.stringContaining("/builds/heron/entries/tubes"),
      "/builds/pelican",
      "/builds/pelican/entries/bending-the-main-tube",
      "/people/idris",
      "/people/maren",
    ]);
    const entry = urlset.url.find((each: { loc: string }) => each.loc.endsWith("/bending-the-main-tube"));
    expect(entry.lastmod).toBe(new Date(bench.time.now - 60_000).toISOString());
  });
});

describe("GET /robots.txt", () => {
  it("names the sitemap and closes what is not for reading", async () => {
    const bench = await contentBench();
    const { body } = await bench.send(null, "GET", "/robots.txt");
    expect(body.split("\n")).toEqual(
      expect.arrayContaining(["User-agent: *", "Disallow: /workshop", `Sitemap: ${site}/sitemap.xml`]),
    );
  });
});

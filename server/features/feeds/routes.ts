import { type Response, Router } from "express";
import { AppError } from "#server/http/errors.ts";
import { type FeedFormat, type FeedPlan, feedUpdated, writeFeed } from "./feed.ts";
import { writeSitemap } from "./sitemap.ts";
import type { FeedSource } from "./source.ts";

interface FeedParts {
  source: FeedSource;
  siteUrl: string;
  clock: () => number;
}

const types: Record<FeedFormat, string> = {
  atom: "application/atom+xml; charset=utf-8",
  json: "application/feed+json; charset=utf-8",
};

/** Feeds of the site and of each build, the sitemap and robots.txt: only what anyone may read. */
export function feedRoutes({ source, siteUrl, clock }: FeedParts): Router {
  const router = Router();
  const site = siteUrl.replace(/\/$/, "");

  function siteFeed(): FeedPlan {
    return {
      id: `${site}/`,
      title: "Soapstone",
      subtitle: "Diaries of builds, with the numbers left in",
      page: "/",
      self: "/feed",
      since: clock(),
      author: null,
      entries: source.latest(undefined).items,
    };
  }

  function buildFeed(slug: string): FeedPlan {
    const found = source.newestOfBuild(slug);
    if (!found) throw new AppError("not_found", "There is no such build.");
    const { build, entries } = found;
    return {
      id: `urn:uuid:${build.id}`,
      title: build.title,
      subtitle: build.purpose,
      page: `/builds/${build.slug}`,
      self: `/builds/${build.slug}/feed`,
      since: clock(),
      author: build.owner,
      entries: entries.map((entry) => ({ ...entry, build })),
    };
  }

  function send(res: Response, plan: FeedPlan, format: FeedFormat): void {
    keep(res, feedUpdated(plan));
    res.type(types[format]).send(writeFeed(plan, format, site));
  }

  for (const format of ["atom", "json"] as const) {
    router.get(`/feed.${format}`, (_req, res) => send(res, siteFeed(), format));
    router.get(`/builds/:build/feed.${format}`, (req, res) => {
      const plan = buildFeed(req.params.build);
      const address = `${plan.self}.${format}`;
      if (req.path === address) send(res, plan, format);
      else res.redirect(301, address);
    });
  }
  router.get("/sitemap.xml", async (_req, res) => {
    keep(res, null);
    res.type("application/xml; charset=utf-8").send(await writeSitemap(source, site));
  });
  router.get("/robots.txt", (_req, res) => {
    keep(res, null);
    res.type("text/plain; charset=utf-8").send(robots(site));
  });
  return router;
}

/** Express adds the ETag, and answers 304 by it. */
function keep(res: Response, lastModified: number | null): void {
  res.set("Cache-Control", "public, max-age=300");
  if (lastModified !== null) res.set("Last-Modified", new Date(lastModified).toUTCString());
}

function robots(site: string): string {
  const closed = ["/api/", "/account", "/dev/", "/workshop"].map((path) => `Disallow: ${path}`);
  return ["User-agent: *", ...closed, "", `Sitemap: ${site}/sitemap.xml`, ""].join("\n");
}

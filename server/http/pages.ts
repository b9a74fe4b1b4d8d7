import type { Request, RequestHandler, Response } from "express";
import type { Logger } from "pino";
import type { PageSettings, Transport } from "#shared/contracts/rendering.ts";
import type { ClientBuild } from "./client-build.ts";
import type { InProcessCall } from "./endpoints.ts";
import { toErrorResponse } from "./errors.ts";
import { faultPage } from "./fault-page.ts";
import { type FinishedPage, type PageCache, pageCacheKey } from "./page-cache.ts";
import type { Viewer } from "./viewer.ts";

const noncePlaceholder = "__CSP_NONCE__";

interface PageOptions {
  client: ClientBuild;
  call: InProcessCall;
  cache: PageCache;
  siteUrl: string;
  fakes: boolean;
  log: Logger;
}

/** Draws every address that no other route has taken. */
export function pages(options: PageOptions): RequestHandler {
  return async (req, res) => {
    const settings = pageSettings(req, options);
    const key = req.viewer ? null : pageCacheKey(req.originalUrl, settings);
    const version = options.cache.version();
    const kept = key ? options.cache.get(key) : undefined;
    const page = kept ?? (await drawOrTell(req, res, settings, options));
    if (!page) return;
    if (key && !kept && page.status === 200) options.cache.set(key, page, version);
    send(res, page, req.viewer);
  };
}

function pageSettings(req: Request, { siteUrl, fakes }: PageOptions): PageSettings {
  const cookies = req.headers.cookie ?? "";
  const scheme = /(?:^|; )scheme=(light|dark)/.exec(cookies)?.[1] as "light" | "dark" | undefined;
  const units = /(?:^|; )units=inch/.test(cookies) ? "inch" : "mm";
  return { siteUrl, scheme: scheme ?? "system", units, fakes };
}

/** A fault while drawing is logged, and told in plain HTML that needs nothing else to work. */
async function drawOrTell(
  req: Request,
  res: Response,
  settings: PageSettings,
  options: PageOptions,
): Promise<FinishedPage | null> {
  try {
    return await draw(req, res, settings, options);
  } catch (thrown) {
    const { status, body } = toErrorResponse(thrown, options.log);
    return finished(status, faultPage(body.error.message, body.error.id));
  }
}

/** Renders the page; answers the request itself, and returns null, when it is a redirect. */
async function draw(
  req: Request,
  res: Response,
  settings: PageSettings,
  options: PageOptions,
): Promise<FinishedPage | null> {
  const { render } = await options.client.renderer();
  const transport: Transport = async (name, call) => {
    try {
      return { status: 200, body: await options.call(name, call, { viewer: req.viewer, http: null }) };
    } catch (thrown) {
      return toErrorResponse(thrown, options.log);
    }
  };
  const request = new Request(new URL(req.originalUrl, options.siteUrl));
  const page = await render(request, transport, settings);
  if (page.kind === "redirect") {
    res.redirect(page.status, page.location);
    return null;
  }
  const template = await options.client.template(req.originalUrl);
  return finished(page.status, fill(template, page, settings, options.client));
}

/** Puts the drawn page into the template. Function replacers, as a `$` in the text means nothing then. */
function fill(
  template: string,
  page: { head: string; body: string; state: unknown; modules: string[] },
  settings: PageSettings,
  client: ClientBuild,
): string {
  const state = JSON.stringify(page.state).replaceAll("<", "\\u003c");
  const preloads = client
    .scriptsOf(page.modules)
    .map((href) => `<link rel="modulepreload" href="${href}" nonce="${noncePlaceholder}">`)
    .join("");
  return template
    .replace("__SCHEME__", settings.scheme)
    .replace("<!--head-->", () => page.head + preloads)
    .replace("<!--app-->", () => page.body)
    .replace("<!--state-->", () => state);
}

/** Cut at the nonces and encoded once, as a kept page is sent many times. */
function finished(status: number, html: string): FinishedPage {
  return { status, pieces: html.split(noncePlaceholder).map((piece) => Buffer.from(piece)) };
}

function withNonce(pieces: Buffer[], nonce: string): Buffer {
  const between = Buffer.from(nonce);
  return Buffer.concat(pieces.flatMap((piece, index) => (index === 0 ? [piece] : [between, piece])));
}

function send(res: Response, page: FinishedPage, viewer: Viewer): void {
  res.status(page.status);
  res.set("Content-Type", "text/html; charset=utf-8");
  res.set("Cache-Control", viewer ? "private, no-store" : "private, no-cache");
  const body = withNonce(page.pieces, res.locals.nonce);
  res.set("Content-Length", String(body.length));
  res.end(body);
}

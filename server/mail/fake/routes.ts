import { type Response, Router } from "express";
import { listLetters, readLetter } from "./letter-store.ts";
import { letterPage, listPage, noSuchLetterPage } from "./page.tsx";

/** Nothing runs and nothing is fetched from elsewhere; the page's own styles stand in it. */
const pagePolicy = "default-src 'none'; style-src 'unsafe-inline'; frame-src 'self'; base-uri 'none'";
/** A letter is a stranger's HTML: alone in a sandbox, whoever opens its address. */
const letterPolicy =
  "default-src 'none'; style-src 'unsafe-inline'; img-src data:; frame-ancestors 'self'; " +
  "sandbox allow-popups allow-popups-to-escape-sandbox";

/** `/dev/mail`: what the mail fake took in. Mount it only while the fakes are on. */
export function mailFakeRoutes(folder: string): Router {
  const router = Router();
  const send = (res: Response, html: string, policy = pagePolicy) => {
    res.set({ "Content-Security-Policy": policy, "Cache-Control": "no-store" });
    res.type("html").send(html);
  };

  router.get("/dev/mail", async (_req, res) => {
    send(res, listPage(await listLetters(folder)));
  });
  router.get("/dev/mail/:id", async (req, res) => {
    const letter = await readLetter(folder, req.params.id);
    if (!letter) res.status(404);
    send(res, letter ? letterPage(letter) : noSuchLetterPage());
  });
  router.get("/dev/mail/:id/html", async (req, res) => {
    const letter = await readLetter(folder, req.params.id);
    if (!letter) res.status(404);
    // The sandbox makes the letter an origin of its own, which this header of the site's would contradict.
    res.removeHeader("Origin-Agent-Cluster");
    send(res, letter?.html ?? noSuchLetterPage(), letterPolicy);
  });
  return router;
}

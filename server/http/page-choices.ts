import express, { type Request, type Response, Router } from "express";
import { z } from "zod";
import { AppError } from "./errors.ts";

const oneYear = 365 * 24 * 3_600_000;

const choices = {
  scheme: z.object({ scheme: z.enum(["system", "light", "dark"]) }),
  units: z.object({ units: z.enum(["mm", "inch"]) }),
} as const;

/**
 * `POST /scheme` and `POST /units`, open to anyone: the footer's forms, for a browser without JavaScript.
 * The choice is kept in a cookie that the page's own script may set too, and the page is shown again.
 */
export function pageChoices(): Router {
  const router = Router();
  const form = express.urlencoded({ extended: false, limit: "1kb" });
  for (const name of ["scheme", "units"] as const) {
    router.post(`/${name}`, form, (req, res) => keepChoice(req, res, name));
  }
  return router;
}

function keepChoice(req: Request, res: Response, name: keyof typeof choices): void {
  const parsed = choices[name].safeParse(req.body);
  if (!parsed.success) throw new AppError("invalid_input", "Choose one of the buttons in the footer.");
  const value = Object.values(parsed.data)[0] ?? "";
  res.cookie(name, value, { maxAge: oneYear, sameSite: "lax", path: "/" });
  res.redirect(303, pageOf(req.headers.referer));
}

/** The path of the page the form stood on; nothing of another site's address is followed. */
function pageOf(referer: string | undefined): string {
  if (!referer || !URL.canParse(referer)) return "/";
  const { pathname, search } = new URL(referer);
  return pathname.startsWith("//") ? "/" : pathname + search;
}

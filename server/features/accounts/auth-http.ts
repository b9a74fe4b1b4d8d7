import { fromNodeHeaders, toNodeHandler } from "better-auth/node";
import type { RequestHandler } from "express";
import type { Person } from "#server/http/viewer.ts";
import { type Auth, addressHeader, cookiePrefix } from "./auth.ts";

declare global {
  namespace Express {
    interface Request {
      /** The session the caller came with. */
      sessionId?: string;
    }
  }
}

/** What of better-auth is open to the outside; all else of it answers as if it were not there. */
const open = new Set([
  "/sign-up/email",
  "/sign-in/email",
  "/sign-out",
  "/send-verification-email",
  "/verify-email",
  "/request-password-reset",
  "/reset-password",
  "/change-password",
  "/change-email",
]);

const mostBytes = 32 * 1024;

/** Serves `/api/auth/{*any}`; must come before any body parser. */
export function serveAuth(auth: Auth): RequestHandler {
  const handle = toNodeHandler(auth);
  return async (req, res, next) => {
    if (!open.has(req.path.slice("/api/auth".length))) return next();
    // A length is asked for, so that nobody can pour a body in without end.
    const length = Number(req.headers["content-length"] ?? 0);
    if (length > mostBytes || req.headers["transfer-encoding"]) {
      res.status(413).json({ code: "TOO_LARGE", message: "That is more than can be sent at once." });
      return;
    }
    req.headers[addressHeader] = req.ip ?? "";
    res.set("Cache-Control", "no-store");
    await handle(req, res);
  };
}

/** `POST /sign-out`: the header's form, for a browser without JavaScript. A foreign page's form comes without the cookie. */
export function signOutForm(auth: Auth): RequestHandler {
  return async (req, res) => {
    const { headers } = await auth.api.signOut({
      headers: fromNodeHeaders(req.headers),
      returnHeaders: true,
    });
    for (const cookie of headers.getSetCookie()) res.append("Set-Cookie", cookie);
    res.redirect(303, "/");
  };
}

/** Sets `req.viewer` from the session cookie; a caller without one costs no look-up. */
export function sessionMiddleware(auth: Auth): RequestHandler {
  return async (req, res, next) => {
    req.viewer = null;
    if (!req.headers.cookie?.includes(`${cookiePrefix}.session_token=`)) return next();
    const { headers, response } = await auth.api.getSession({
      headers: fromNodeHeaders(req.headers),
      returnHeaders: true,
    });
    // A session that is extended, or gone, comes with its cookie.
    for (const cookie of headers.getSetCookie()) res.append("Set-Cookie", cookie);
    if (response) {
      req.viewer = toPerson(response.user);
      req.sessionId = response.session.id;
    }
    next();
  };
}

type AuthUser = Auth["$Infer"]["Session"]["user"];

function toPerson(user: AuthUser): Person {
  const { id, name, email, emailVerified } = user;
  return {
    id,
    handle: user.handle ?? "",
    name,
    email,
    emailVerified,
    role: user.role as Person["role"],
    units: user.units as Person["units"],
  };
}

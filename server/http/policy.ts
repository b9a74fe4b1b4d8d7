import type { Access } from "#shared/contracts/endpoint.ts";
import { AppError } from "./errors.ts";
import type { Person, Viewer } from "./viewer.ts";

/** Refuses a viewer that a route's declared access does not admit. */
export function admit(access: Access, viewer: Viewer): void {
  if (access === "anyone") return;
  if (!viewer) throw new AppError("not_signed_in", "Sign in to do this.");
  if (access === "verified" && !viewer.emailVerified) {
    throw new AppError(
      "not_verified",
      "Confirm your e-mail address first: we sent you a letter with a link.",
    );
  }
  if (access === "moderator" && viewer.role === "reader") {
    throw new AppError("not_allowed", "Only moderators can do this.");
  }
  if (access === "administrator" && viewer.role !== "administrator") {
    throw new AppError("not_allowed", "Only administrators can do this.");
  }
}

/** The viewer of a route that admits nobody signed out. */
export function signedIn(viewer: Viewer): Person {
  if (!viewer) throw new AppError("not_signed_in", "Sign in to do this.");
  return viewer;
}

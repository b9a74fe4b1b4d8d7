import type { UnitPreference } from "#shared/contracts/people.ts";

/** Who is asking: the signed-in person, or null for someone signed out. */
export interface Person {
  id: string;
  handle: string;
  name: string;
  email: string;
  emailVerified: boolean;
  role: "reader" | "moderator" | "administrator";
  units: UnitPreference;
}

export type Viewer = Person | null;

declare global {
  namespace Express {
    interface Request {
      /** Set by the session middleware before any route. */
      viewer: Viewer;
    }
  }
}

import { z } from "zod";
import { done, id, moment } from "./common.ts";
import { endpoint } from "./endpoint.ts";

/** How long a password may be, in characters. Nothing else is asked of it. */
export const passwordLimits = { least: 10, most: 128 } as const;

/** One place where a person is signed in. */
export const sessionLine = z.object({
  id,
  /** Such as "Firefox on Android". */
  device: z.string(),
  /** The network address it signed in from. */
  address: z.string().nullable(),
  since: moment,
  lastUsed: moment,
  isThisDevice: z.boolean(),
});

export type SessionLine = z.infer<typeof sessionLine>;

const sessionList = z.object({ sessions: z.array(sessionLine) });

export const listSessions = endpoint({
  method: "GET",
  path: "/api/me/sessions",
  access: "signed_in",
  summary: "Where one is signed in, the latest used first",
  response: sessionList,
});

export const endSession = endpoint({
  method: "DELETE",
  path: "/api/me/sessions/:session",
  access: "signed_in",
  summary: "Sign out one of one's own devices",
  params: z.object({ session: id }),
  response: done,
});

export const endOtherSessions = endpoint({
  method: "DELETE",
  path: "/api/me/sessions",
  access: "signed_in",
  summary: "Sign out everywhere but here",
  response: sessionList,
});

/** A sign-in of the demo, shown on the sign-in page while the demo is loaded. */
export const demoSignIn = z.object({
  name: z.string(),
  email: z.string(),
  password: z.string(),
  /** What this person is in the demo, such as "moderator". */
  what: z.string(),
});

export type DemoSignIn = z.infer<typeof demoSignIn>;

export const listDemoSignIns = endpoint({
  method: "GET",
  path: "/api/demo-sign-ins",
  access: "anyone",
  summary: "The demo's sign-ins; none when the demo is not loaded",
  response: z.object({ signIns: z.array(demoSignIn) }),
});

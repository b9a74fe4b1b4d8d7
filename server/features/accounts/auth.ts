import { type BetterAuthOptions, betterAuth } from "better-auth";
import { drizzleAdapter } from "better-auth/adapters/drizzle";
import { isAPIError } from "better-auth/api";
import type { Logger } from "pino";
import { v7 as uuid } from "uuid";
import type { Config } from "#server/config/environment.ts";
import type { Database } from "#server/db/client.ts";
import { accounts, rateLimits, sessions, users, verifications } from "#server/db/schema/accounts.ts";
import type { Letter } from "#server/mail/letter.ts";
import { freeSlug, slugFromTitle } from "#server/naming/slugs.ts";
import { unitPreference } from "#shared/contracts/people.ts";
import { authHooks } from "./auth-hooks.ts";
import { authLetters } from "./auth-letters.ts";
import { findUserByHandle } from "./repository.ts";

export interface AuthParts {
  config: Pick<Config, "SITE_URL" | "SESSION_SECRET">;
  database: Database;
  log: Logger;
  sendLetter: (to: string, letter: Letter) => void;
}

export type Auth = ReturnType<typeof createAuth>;

export const cookiePrefix = "soapstone";

/** Set by `serveAuth` from Express's own reading of the caller's address; whatever came under it is dropped. */
export const addressHeader = "x-soapstone-address";

const hour = 3600;

/** Accounts, passwords and sessions, kept by better-auth in our tables. */
export function createAuth({ config, database, log, sendLetter }: AuthParts) {
  const handleFor = (name: string) =>
    freeSlug(slugFromTitle(name, "maker"), (handle) => findUserByHandle(database, handle) !== undefined);

  return betterAuth({
    appName: "Soapstone",
    baseURL: config.SITE_URL,
    basePath: "/api/auth",
    secret: config.SESSION_SECRET,
    trustedOrigins: ownOrigins(config.SITE_URL),
    database: drizzleAdapter(database, {
      provider: "sqlite",
      usePlural: true,
      schema: { users, sessions, accounts, verifications, rateLimits },
    }),
    ...authLetters({ siteUrl: config.SITE_URL, database, sendLetter }),
    hooks: authHooks(database),
    user: {
      // An address nobody has confirmed may be mended at once; a confirmed one only from the new address.
      changeEmail: { enabled: true, updateEmailWithoutVerification: true },
      additionalFields: {
        handle: { type: "string", required: false, input: false },
        role: { type: "string", required: false, input: false },
        units: { type: [...unitPreference.options], required: false, input: false },
      },
    },
    databaseHooks: {
      user: {
        create: {
          before: async (user) => ({ data: { ...user, image: null, handle: handleFor(user.name) } }),
        },
      },
    },
    session: { expiresIn: 60 * 24 * hour, updateAge: 24 * hour },
    verification: { storeIdentifier: "hashed" },
    rateLimit: rateLimit,
    advanced: {
      cookiePrefix,
      useSecureCookies: config.SITE_URL.startsWith("https:"),
      defaultCookieAttributes: { httpOnly: true, sameSite: "lax" },
      ipAddress: { ipAddressHeaders: [addressHeader] },
      database: { generateId: () => uuid() },
      // better-auth leaves both checks out under a test environment unless told.
      disableOriginCheck: false,
      disableCSRFCheck: false,
    },
    telemetry: { enabled: false },
    onAPIError: {
      // A refusal is the caller's business; anything else is a fault of ours.
      onError: (error) =>
        log[isAPIError(error) ? "debug" : "error"]({ err: error, from: "auth" }, "auth refused"),
    },
    logger: {
      level: "warn",
      log: (level, message) => log[level === "error" ? "warn" : "debug"]({ from: "auth" }, message),
    },
  });
}

/** Per caller's address and path; kept in the database, so that several processes count together. */
const rateLimit: BetterAuthOptions["rateLimit"] = {
  enabled: true,
  storage: "database",
  window: 60,
  max: 100,
  customRules: {
    "/sign-in/email": { window: 60, max: 10 },
    "/sign-up/email": { window: 60, max: 5 },
    "/request-password-reset": { window: 60, max: 3 },
    "/send-verification-email": { window: 60, max: 3 },
    "/reset-password": { window: 60, max: 10 },
    "/change-password": { window: 60, max: 5 },
    "/change-email": { window: 60, max: 5 },
  },
};

/** The site's own origin; on the loopback also its other name, as people type either. */
function ownOrigins(siteUrl: string): string[] {
  const { origin } = new URL(siteUrl);
  const twin = origin.includes("//localhost")
    ? origin.replace("//localhost", "//127.0.0.1")
    : origin.replace("//127.0.0.1", "//localhost");
  return [...new Set([origin, twin])];
}

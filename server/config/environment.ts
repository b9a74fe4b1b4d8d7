import { randomBytes } from "node:crypto";
import { existsSync, mkdirSync, readFileSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { z } from "zod";

const flag = z.enum(["true", "false"]).transform((value) => value === "true");

/** Every variable the server reads, with its default. The README's table is made from these lines. */
const environment = z.object({
  /** production serves the built client; development compiles it as it is asked for. */
  NODE_ENV: z.enum(["production", "development", "test"]).default("production"),
  /** The one port everything is served on. */
  PORT: z.coerce.number().int().min(0).max(65535).default(3000),
  /** The address it listens on; 0.0.0.0 for every interface. */
  HOST: z.string().default("127.0.0.1"),
  /** The address people type, without a slash at the end. Links in mail and feeds start with it. */
  SITE_URL: z.url().optional(),
  /** Where uploaded photos, the database and the mail fake's letters lie. */
  UPLOADS_DIR: z.string().default("uploads"),
  /** The SQLite file; by default in the uploads folder. */
  DATABASE_FILE: z.string().optional(),
  /** Signs cookies and links. Made once and kept in the uploads folder when not given. */
  SESSION_SECRET: z.string().min(32).optional(),
  /** How many reverse proxies stand in front, so that the caller's address is read rightly. */
  TRUSTED_PROXIES: z.coerce.number().int().min(0).default(0),
  /** true runs the mail fake inside, with its page at /dev/mail. */
  FAKES: flag.default(true),
  /** The mail server; only read when FAKES is false. */
  SMTP_URL: z.string().default("smtp://127.0.0.1:2525"),
  /** The sender of every letter. */
  MAIL_FROM: z.string().default("Soapstone <diary@soapstone.example>"),
  /** true loads the demo once into an empty database. */
  DEMO: flag.default(true),
  /** fatal, error, warn, info, debug or silent. */
  LOG_LEVEL: z.enum(["fatal", "error", "warn", "info", "debug", "silent"]).default("info"),
});

export type Config = ReturnType<typeof readConfig>;

/** Parses the environment once, at start; a wrong variable stops the start with its name and reason. */
export function readConfig(variables: Record<string, string | undefined>) {
  const parsed = environment.safeParse(variables);
  if (!parsed.success) throw new Error(`The configuration is wrong.\n${z.prettifyError(parsed.error)}`);
  const values = parsed.data;
  return {
    ...values,
    SITE_URL: values.SITE_URL ?? `http://localhost:${values.PORT}`,
    DATABASE_FILE: values.DATABASE_FILE ?? join(values.UPLOADS_DIR, "soapstone.db"),
    SESSION_SECRET: values.SESSION_SECRET ?? keptSecret(values.UPLOADS_DIR),
  };
}

/** A secret made on the first start, so that sessions outlive a restart without any set-up. */
function keptSecret(folder: string): string {
  const file = join(folder, "session-secret");
  if (existsSync(file)) return readFileSync(file, "utf8");
  mkdirSync(folder, { recursive: true });
  const secret = randomBytes(32).toString("hex");
  writeFileSync(file, secret, { mode: 0o600 });
  return secret;
}

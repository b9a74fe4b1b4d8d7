import { once } from "node:events";
import { mkdtemp, rm } from "node:fs/promises";
import { createServer } from "node:http";
import type { AddressInfo } from "node:net";
import { tmpdir } from "node:os";
import { join } from "node:path";
import express from "express";
import { pino } from "pino";
import { onTestFinished } from "vitest";
import { openDatabase } from "#server/db/client.ts";
import { migrateDatabase } from "#server/db/migrate.ts";
import { createAuth } from "#server/features/accounts/auth.ts";
import { serveAuth, sessionMiddleware, signOutForm } from "#server/features/accounts/auth-http.ts";
import { accountRoutes } from "#server/features/accounts/routes.ts";
import { createAccountService } from "#server/features/accounts/service.ts";
import { apiRouter } from "#server/http/endpoints.ts";
import { handleErrors } from "#server/http/errors.ts";
import { createQueue } from "#server/jobs/queue.ts";
import { listLetters, readLetter } from "#server/mail/fake/letter-store.ts";
import { createMail, mailFakeFolder } from "#server/mail/mail.ts";
import type { DemoSignIn } from "#shared/contracts/sessions.ts";
import { Browser } from "./browser.ts";

interface AccountAppOptions {
  siteUrl?: string;
  demoSignIns?: () => DemoSignIn[];
}

/** Accounts and mail alone, over real HTTP and SMTP. */
export async function startAccountApp({ siteUrl, demoSignIns = () => [] }: AccountAppOptions = {}) {
  const uploads = await mkdtemp(join(tmpdir(), "soapstone-accounts-"));
  const server = createServer();
  server.listen(0, "127.0.0.1");
  await once(server, "listening");
  const address = `http://localhost:${(server.address() as AddressInfo).port}`;
  const config = {
    SITE_URL: siteUrl ?? address,
    SESSION_SECRET: "0123456789abcdef0123456789abcdef",
    FAKES: true,
    SMTP_URL: "",
    MAIL_FROM: "Soapstone <diary@soapstone.example>",
    UPLOADS_DIR: uploads,
  };
  const database = openDatabase(":memory:");
  migrateDatabase(database);
  const log = pino({ level: "silent" });
  const queue = createQueue({ database, log, clock: Date.now });
  const mail = createMail({ config, queue, log });
  await mail.start();
  const auth = createAuth({ config, database, log, sendLetter: mail.sendLetter });
  const accounts = createAccountService({ database, clock: Date.now, photoViews: () => new Map() });

  const app = express();
  app.all("/api/auth/{*any}", serveAuth(auth));
  app.post("/sign-out", signOutForm(auth));
  app.use(sessionMiddleware(auth));
  app.use(apiRouter(accountRoutes(accounts, demoSignIns)));
  app.use(handleErrors(log));
  server.on("request", app);

  onTestFinished(async () => {
    server.closeAllConnections();
    server.close();
    await mail.stop();
    database.$client.close();
    await rm(uploads, { recursive: true });
  });

  /** Sends what waits, and returns every letter so far, newest first. */
  async function letters() {
    await queue.runDue();
    const folder = mailFakeFolder(uploads);
    const lines = await listLetters(folder);
    const whole = await Promise.all(lines.map(({ id }) => readLetter(folder, id)));
    return whole.filter((letter) => letter !== null);
  }

  /** The token in the newest letter to an address. */
  async function tokenFor(email: string): Promise<string> {
    const letter = (await letters()).find((each) => each.to === email);
    const token = /[?&]token=([\w.%-]+)/.exec(letter?.text ?? "")?.[1];
    if (!token) throw new Error(`No letter with a token went to ${email}`);
    return decodeURIComponent(token);
  }

  const browser = () => new Browser(address, config.SITE_URL);
  return { address, auth, accounts, database, letters, tokenFor, browser };
}

export const maren = { name: "Maren Holt", email: "maren@lowbarn.example", password: "ten characters" };

type AccountApp = Awaited<ReturnType<typeof startAccountApp>>;

/** Signs up and in; verified too unless told. */
export async function signedInBrowser(
  app: AccountApp,
  person = maren,
  { verified = true }: { verified?: boolean } = {},
): Promise<Browser> {
  const browser = app.browser();
  await browser.post("/api/auth/sign-up/email", person);
  if (verified) await browser.get(`/api/auth/verify-email?token=${await app.tokenFor(person.email)}`);
  const { email, password } = person;
  await browser.post("/api/auth/sign-in/email", { email, password });
  return browser;
}

import { once } from "node:events";
import { mkdtempSync, rmSync } from "node:fs";
import type { AddressInfo } from "node:net";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { hashPassword } from "better-auth/crypto";
import { pino } from "pino";
import { v7 as uuid } from "uuid";
import { createApp } from "#server/app.ts";
import { readConfig } from "#server/config/environment.ts";
import { openDatabase } from "#server/db/client.ts";
import { migrateDatabase } from "#server/db/migrate.ts";
import { accounts, users } from "#server/db/schema/accounts.ts";
import { type KeptLetter, listLetters, readLetter } from "#server/mail/fake/letter-store.ts";
import { mailFakeFolder } from "#server/mail/mail.ts";
import { createTestClient, type TestClient } from "./test-client.ts";

interface PersonOptions {
  role?: "reader" | "moderator" | "administrator";
  verified?: boolean;
}

export type TestApp = Awaited<ReturnType<typeof createTestApp>>;

export const testPassword = "try-square-11-Dipper";

/** Once for all people of a test file: hashing is slow on purpose. */
const hashed = hashPassword(testPassword);

const started = Date.UTC(2026, 5, 1, 9);

/** The whole server on a fresh database and a port of its own, with a clock that stands until it is moved. */
export async function createTestApp() {
  const folder = mkdtempSync(join(tmpdir(), "soapstone-test-"));
  const config = readConfig({
    NODE_ENV: "test",
    UPLOADS_DIR: folder,
    DATABASE_FILE: ":memory:",
    SESSION_SECRET: "only-for-tests-only-for-tests-only",
    SITE_URL: "http://localhost:3999",
    DEMO: "false",
    LOG_LEVEL: "silent",
  });
  const database = openDatabase(":memory:");
  migrateDatabase(database);
  const clock = {
    now: started,
    advance(ms: number) {
      clock.now += ms;
    },
  };
  const parts = { config, database, log: pino({ level: "silent" }), clock: () => clock.now };
  const { app, queue, mail } = createApp(parts);
  await mail.start();
  const server = app.listen(0);
  await once(server, "listening");
  const url = `http://localhost:${(server.address() as AddressInfo).port}`;

  /** Someone with an account, signed in. The name's small letters are the handle and the address. */
  async function person(
    name: string,
    { role = "reader", verified = true }: PersonOptions = {},
  ): Promise<TestClient> {
    const handle = name.toLowerCase();
    const email = `${handle}@workshop.example`;
    const [id, at] = [uuid(), new Date(clock.now)];
    const password = await hashed;
    const row = { id, name, email, emailVerified: verified, handle, role, createdAt: at, updatedAt: at };
    database.insert(users).values(row).run();
    const account = { id: uuid(), accountId: id, providerId: "credential", userId: id, password };
    database
      .insert(accounts)
      .values({ ...account, createdAt: at, updatedAt: at })
      .run();
    const client = createTestClient(url, config.SITE_URL);
    await client.signIn(email, testPassword);
    return client;
  }

  /** What was sent by now, newest first; jobs must have run. */
  async function letters(): Promise<KeptLetter[]> {
    const mailbox = mailFakeFolder(folder);
    const lines = await listLetters(mailbox);
    const read = await Promise.all(lines.map(({ id }) => readLetter(mailbox, id)));
    return read.filter((letter) => letter !== null);
  }

  return {
    url,
    config,
    database,
    queue,
    clock,
    person,
    anyone: createTestClient(url, config.SITE_URL),
    newClient: () => createTestClient(url, config.SITE_URL),
    runJobs: () => queue.runDue(),
    letters,
    async close() {
      server.closeAllConnections();
      server.close();
      await queue.stop();
      await mail.stop();
      database.$client.close();
      rmSync(folder, { recursive: true, force: true });
    },
  };
}

import { mkdtemp, rm } from "node:fs/promises";
import { createServer } from "node:net";
import { tmpdir } from "node:os";
import { join } from "node:path";
import express from "express";
import { pino } from "pino";
import { describe, expect, it, onTestFinished } from "vitest";
import { openDatabase } from "#server/db/client.ts";
import { migrateDatabase } from "#server/db/migrate.ts";
import { jobs } from "#server/db/schema/jobs.ts";
import { createQueue } from "#server/jobs/queue.ts";
import { keepLetter, listLetters, readLetter } from "#server/mail/fake/letter-store.ts";
import { mailFakeRoutes } from "#server/mail/fake/routes.ts";
import type { Letter } from "#server/mail/letter.ts";
import { renderLetter } from "#server/mail/letters/render-letter.tsx";
import { createMail, mailFakeFolder } from "#server/mail/mail.ts";

const link = "https://soapstone.example/verify-email?token=a.b-c&x=1";
const verify: Letter = { kind: "verify_address", name: "Maren", link };
const every: Letter[] = [
  verify,
  { kind: "account_exists", name: "Maren", link, resetLink: "https://soapstone.example/forgot-password" },
  { kind: "reset_password", name: "Maren", link },
  { kind: "confirm_new_address", name: "Maren", link, newEmail: "new@x.example" },
  { kind: "address_change_asked", name: "Maren", link, newEmail: "new@x.example" },
];

async function post(change: { FAKES?: boolean; SMTP_URL?: string } = {}) {
  const uploads = await mkdtemp(join(tmpdir(), "soapstone-mail-"));
  const database = openDatabase(":memory:");
  migrateDatabase(database);
  const log = pino({ level: "silent" });
  const time = { now: Date.now() };
  const queue = createQueue({ database, log, clock: () => time.now });
  const from = "Soapstone <diary@soapstone.example>";
  const config = { FAKES: true, SMTP_URL: "", MAIL_FROM: from, UPLOADS_DIR: uploads, ...change };
  const mail = createMail({ config, queue, log });
  await mail.start();
  onTestFinished(async () => {
    await mail.stop();
    await rm(uploads, { recursive: true });
  });
  return {
    mail,
    queue,
    time,
    folder: mailFakeFolder(uploads),
    rows: () => database.select().from(jobs).all(),
  };
}

describe("createMail", () => {
  it("carries a letter over SMTP to the fake's folder, as HTML and as text", async () => {
    const { mail, queue, folder } = await post();
    mail.sendLetter("maren@lowbarn.example", { ...verify, name: "Maren <b>Höltℓ</b>" });
    expect(await listLetters(folder)).toEqual([]);
    await queue.runDue();
    const [first] = await listLetters(folder);
    expect(first).toMatchObject({ to: "maren@lowbarn.example", subject: "Soapstone: Confirm your address" });
    const letter = await readLetter(folder, first?.id ?? "");
    expect(letter?.from).toContain("diary@soapstone.example");
    expect(letter?.text).toContain("Hello Maren <b>Höltℓ</b>,");
    expect(letter?.text).toContain(link);
    expect(letter?.html).toContain("Maren &lt;b&gt;Höltℓ&lt;/b&gt;");
    expect(letter?.headers.map(({ line }) => line)).toContain("Auto-Submitted: auto-generated");
  });

  it("tries again when the mail server is down, and loses nothing", async () => {
    const closed = createServer();
    await new Promise<void>((resolve) => closed.listen(0, "127.0.0.1", resolve));
    const { port } = closed.address() as { port: number };
    await new Promise((resolve) => closed.close(resolve));
    const { mail, queue, rows } = await post({ FAKES: false, SMTP_URL: `smtp://127.0.0.1:${port}` });
    mail.sendLetter("maren@lowbarn.example", verify);
    await queue.runDue();
    const [row] = rows();
    expect(row).toMatchObject({ state: "queued", attempts: 1 });
    expect(row?.lastError).toContain("ECONNREFUSED");
    expect(row?.payload).toContain("maren@lowbarn.example");
  });
});

describe("renderLetter", () => {
  it.each(every)(
    "gives $kind a subject, its link in both bodies, and both colour schemes",
    async (letter) => {
      const { subject, html, text } = await renderLetter(letter);
      expect(subject).toMatch(/^Soapstone: \S/);
      expect(text).toContain(link);
      expect(html).toContain(`href="${link.replace("&", "&amp;")}"`);
      expect(html).toContain("prefers-color-scheme: dark");
      expect(text).not.toMatch(/\[object|undefined|<\w+>/);
    },
  );

  it("puts text past markup in a name", async () => {
    const { html } = await renderLetter({ ...verify, name: '"><script>alert(1)</script>' });
    expect(html).not.toContain("<script");
  });
});

describe("keepLetter", () => {
  it("keeps the last 200", async () => {
    const folder = await mkdtemp(join(tmpdir(), "soapstone-letters-"));
    onTestFinished(() => rm(folder, { recursive: true }));
    for (let n = 0; n < 203; n += 1) await keepLetter(folder, Buffer.from(`Subject: ${n}\r\n\r\ntext\r\n`));
    const subjects = (await listLetters(folder)).map((each) => each.subject);
    expect(subjects).toHaveLength(200);
    expect([subjects[0], subjects.at(-1)]).toEqual(["202", "3"]);
  });
});

describe("GET /dev/mail", () => {
  async function fakeSite() {
    const folder = await mkdtemp(join(tmpdir(), "soapstone-letters-"));
    const app = express().use(mailFakeRoutes(folder));
    const server = app.listen(0, "127.0.0.1");
    await new Promise((resolve) => server.once("listening", resolve));
    const { port } = server.address() as { port: number };
    onTestFinished(async () => {
      server.closeAllConnections();
      server.close();
      await rm(folder, { recursive: true });
    });
    const get = async (path: string) => {
      const response = await fetch(`http://127.0.0.1:${port}${path}`);
      return { status: response.status, text: await response.text(), headers: response.headers };
    };
    return { folder, get };
  }

  it("lists letters and shows one, with nothing of it as markup of the page", async () => {
    const { folder, get } = await fakeSite();
    const evil = "<script>alert(1)</script>";
    const raw = `To: a@x.example\r\nSubject: ${evil}\r\nContent-Type: text/html\r\n\r\n<p>hello</p>${evil}\r\n`;
    await keepLetter(folder, Buffer.from(raw));
    const [letter] = await listLetters(folder);
    for (const path of ["/dev/mail", `/dev/mail/${letter?.id}`]) {
      const { status, text } = await get(path);
      expect(status).toBe(200);
      expect(text).toContain("&lt;script&gt;");
      expect(text).not.toContain("<script");
    }
    const alone = await get(`/dev/mail/${letter?.id}/html`);
    expect(alone.text).toContain("<p>hello</p>");
    const policy = alone.headers.get("content-security-policy");
    expect(policy).toContain("sandbox");
    expect(policy).not.toContain("allow-scripts");
    expect(policy).toContain("default-src 'none'");
  });

  it("says what to do while there are none, and knows no letter outside its folder", async () => {
    const { get } = await fakeSite();
    expect((await get("/dev/mail")).text).toContain("No letters yet");
    for (const id of ["nothing", "..%2F..%2Fpackage"]) {
      expect((await get(`/dev/mail/${id}`)).status).toBe(404);
    }
  });
});

import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { verifyPassword } from "better-auth/crypto";
import { eq } from "drizzle-orm";
import { pino } from "pino";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { openDatabase } from "#server/db/client.ts";
import { migrateDatabase } from "#server/db/migrate.ts";
import { accounts, users } from "#server/db/schema/accounts.ts";
import { siteVersion } from "#server/db/schema/audit.ts";
import { builds, entries } from "#server/db/schema/builds.ts";
import { jobs } from "#server/db/schema/jobs.ts";
import { photos } from "#server/db/schema/photos.ts";
import { workings } from "#server/db/schema/workings.ts";
import { demoBuilds } from "#server/demo/builds.ts";
import { demoState, holdsOtherPeople, loadDemo, resetDemo } from "#server/demo/loader.ts";
import { demoPeople, demoSignIns } from "#server/demo/people.ts";
import { createLocalStorage } from "#server/storage/local-storage.ts";

const folder = mkdtempSync(join(tmpdir(), "soapstone-demo-test-"));
const now = Date.parse("2026-12-01T09:00:00Z");

function emptyDatabase() {
  const database = openDatabase(":memory:");
  migrateDatabase(database);
  return database;
}

function parts(database = emptyDatabase()) {
  return { database, storage: createLocalStorage(folder), log: pino({ level: "silent" }), now };
}

const stranger = {
  id: "0198c0de-0000-7000-8000-0000000000aa",
  name: "Someone Else",
  email: "someone@elsewhere.example",
  handle: "someone-else",
  createdAt: new Date(now),
  updatedAt: new Date(now),
};

afterAll(() => rmSync(folder, { recursive: true, force: true }));

// One load serves the reading tests: it decodes twenty pictures.
describe("loadDemo", () => {
  const loaded = parts();
  const { database } = loaded;
  beforeAll(() => loadDemo(loaded), 60_000);

  it("brings every entry to its state, address and date", () => {
    const rows = database
      .select({ entry: entries, build: builds.slug })
      .from(entries)
      .innerJoin(builds, eq(builds.id, entries.buildId))
      .all();
    const found = rows.map(({ entry, build }) => [
      `${build}/${entry.slug}`,
      entry.state,
      entry.publishedAt ?? entry.scheduledAt,
    ]);
    const wanted = demoBuilds.flatMap((build) =>
      build.entries.map(({ slug, state, at }) => {
        const address = `${build.slug}/${slug}`;
        if (state === "draft") return [address, "draft", null];
        if (state === "public") return [address, "public", Date.parse(at)];
        return [address, "scheduled", now + state.scheduledInDays * 24 * 3600_000];
      }),
    );
    expect(found.sort()).toEqual(wanted.sort());
  });

  it("numbers the workings of each build and shows readers those of public entries", () => {
    const rows = database.select().from(workings).all();
    expect(rows.length).toBeGreaterThanOrEqual(6);
    const open = new Set(
      database
        .select({ id: entries.id })
        .from(entries)
        .where(eq(entries.state, "public"))
        .all()
        .map(({ id }) => id),
    );
    for (const { entryId, published } of rows) expect(published !== null).toBe(open.has(entryId ?? ""));
  });

  it("gives each build a cover with its description", () => {
    for (const { coverPhotoId, coverAlt } of database.select().from(builds).all()) {
      expect(coverPhotoId).not.toBeNull();
      expect(coverAlt.length).toBeGreaterThan(20);
    }
  });

  it("queues the pictures and waits for none of them", () => {
    const states = database.select({ state: photos.state }).from(photos).all();
    expect(new Set(states.map(({ state }) => state))).toEqual(new Set(["processing"]));
    const due = database.select().from(jobs).where(eq(jobs.kind, "photo.process")).all();
    expect(due).toHaveLength(states.length);
    for (const { runAt, state } of due) {
      expect(state).toBe("queued");
      expect(runAt).toBeLessThanOrEqual(now);
    }
  });

  it("lets everyone on the list sign in, with roles as told", async () => {
    const rows = database.select().from(users).innerJoin(accounts, eq(accounts.userId, users.id)).all();
    expect(rows).toHaveLength(demoPeople.length);
    for (const { email, password } of demoSignIns()) {
      const row = rows.find((each) => each.users.email === email);
      expect(row?.users.emailVerified).toBe(true);
      expect(await verifyPassword({ hash: row?.accounts.password ?? "", password })).toBe(true);
    }
    expect(rows.filter(({ users: { role } }) => role === "moderator")).toHaveLength(1);
    expect(rows.filter(({ users: { role } }) => role === "administrator")).toHaveLength(1);
  });

  it("loads once", async () => {
    expect(demoState(database)).toBe("loaded");
    expect(await loadDemo(loaded)).toBe(false);
    expect(database.select().from(builds).all()).toHaveLength(demoBuilds.length);
  });

  it("leaves a database with other people alone", async () => {
    const other = parts();
    other.database.insert(users).values(stranger).run();
    expect(demoState(other.database)).toBe("other");
    expect(holdsOtherPeople(other.database)).toBe(true);
    expect(await loadDemo(other)).toBe(false);
    expect(other.database.select().from(builds).all()).toEqual([]);
  });
});

describe("a load that was cut short", () => {
  it("is cleared and done again", async () => {
    const half = parts();
    const [person] = demoPeople;
    half.database
      .insert(users)
      .values({ ...stranger, email: person?.email ?? "" })
      .run();
    expect(demoState(half.database)).toBe("partial");
    expect(await loadDemo(half)).toBe(true);
    expect(demoState(half.database)).toBe("loaded");
    expect(half.database.select().from(users).where(eq(users.id, stranger.id)).all()).toEqual([]);
  }, 60_000);
});

describe("resetDemo", () => {
  it("puts the demo in place of whatever was there, and makes readers' pages stale", async () => {
    const used = parts();
    used.database.insert(users).values(stranger).run();
    const before = used.database.select().from(siteVersion).get()?.value ?? 0;
    await resetDemo(used);
    expect(demoState(used.database)).toBe("loaded");
    expect(holdsOtherPeople(used.database)).toBe(false);
    expect(used.database.select().from(siteVersion).get()?.value).toBeGreaterThan(before);
    expect(used.database.$client.pragma("foreign_key_check")).toEqual([]);
  }, 60_000);
});

import { v4 as uuid } from "uuid";
import { describe, expect, it } from "vitest";
import { siteVersion } from "#server/db/schema/audit.ts";
import { entries } from "#server/db/schema/builds.ts";
import { schedulePurge } from "#server/features/entries/purge.ts";
import { latestPublic } from "#server/features/entries/reading-repository.ts";
import { findCalculator } from "#shared/calculators/registry.ts";
import {
  publish,
  publishedEntry,
  saveOver,
  startBuild,
  startEntry,
  words,
  workingBlock,
} from "#tests/factories/content.ts";
import { contentBench } from "#tests/setup/content-bench.ts";

const cope = findCalculator("saddle-cope")?.example ?? {};
const hour = 3600_000;

async function oneDraft() {
  const bench = await contentBench();
  const maren = bench.person("maren");
  const place = await startBuild(bench, maren);
  const draft = await startEntry(bench, maren, place);
  const read = (slug = draft.slug) => bench.send(null, "GET", `/api/builds/heron/entries/${slug}`);
  const act = (verb: string, body?: unknown) =>
    bench.send(maren, "POST", `/api/entries/${draft.id}/${verb}`, body);
  return { bench, maren, place, draft, read, act };
}

describe("POST /api/entries/:entry/publish", () => {
  it("shows the entry and its build to anyone", async () => {
    const { bench, maren, draft, read } = await oneDraft();
    expect((await read()).status).toBe(404);
    const answer = await publish(bench, maren, draft);
    expect(answer.body).toMatchObject({ state: "public", number: 1, publishedAt: bench.time.now });
    expect((await read()).body).toMatchObject({
      number: 1,
      title: draft.title,
      mine: false,
      stage: { title: "Frame", entryCount: 1 },
      build: { slug: "heron", entryCount: 1, lastEntryAt: bench.time.now },
    });
    expect((await bench.send(null, "GET", "/api/builds/heron")).body.entries).toHaveLength(1);
  });

  it("keeps later changes from readers until they are published", async () => {
    const { bench, maren, draft, read } = await oneDraft();
    const id = uuid();
    const first = { type: "doc", content: [workingBlock(id, cope, "First")] };
    const one = await saveOver(bench, maren, draft, { document: first });
    const shown = await publish(bench, maren, one.body);
    const second = {
      type: "doc",
      content: [workingBlock(id, cope, "Second"), ...words("Mind the heel").content],
    };
    bench.time.now += hour;
    const two = await saveOver(bench, maren, shown.body, { title: "Redone", document: second });
    expect(two.body.hasUnpublishedChanges).toBe(true);
    expect((await read()).body).toMatchObject({ title: draft.title, workings: { [id]: { title: "First" } } });
    const again = await publish(bench, maren, two.body);
    expect(again.body).toMatchObject({ hasUnpublishedChanges: false, number: 1 });
    expect((await read()).body).toMatchObject({
      title: "Redone",
      publishedAt: bench.time.now - hour,
      updatedAt: bench.time.now,
      workings: { [id]: { title: "Second", number: 1, calculator: "saddle-cope" } },
    });
  });

  it("raises the version by which finished pages are kept", async () => {
    const { bench, maren, draft } = await oneDraft();
    const version = () => bench.database.select().from(siteVersion).get()?.value ?? 0;
    const before = version();
    await publish(bench, maren, draft);
    expect(version()).toBeGreaterThan(before);
  });

  it("refuses an entry without a title, beside the title", async () => {
    const { bench, maren, place } = await oneDraft();
    const untitled = await startEntry(bench, maren, place, "");
    const answer = await publish(bench, maren, untitled);
    expect(answer.status).toBe(422);
    expect(answer.body.error.fields).toEqual({ title: "The title is missing." });
  });

  it("refuses a version that is not the latest, and people it does not belong to", async () => {
    const { bench, maren, draft, act } = await oneDraft();
    await saveOver(bench, maren, draft, { title: "Newer" });
    expect(await act("publish", { baseVersion: 1 })).toMatchObject({
      status: 409,
      body: { error: { code: "draft_conflict" } },
    });
    expect((await publish(bench, bench.person("idris"), draft)).status).toBe(404);
    const unverified = { ...maren, emailVerified: false };
    Object.assign(maren, unverified);
    expect((await act("publish", { baseVersion: 2 })).status).toBe(403);
  });

  it("numbers entries in the order they are first published", async () => {
    const { bench, maren, place, draft } = await oneDraft();
    const second = await publishedEntry(bench, maren, place, "Published first");
    expect(second.number).toBe(1);
    expect((await publish(bench, maren, draft)).body.number).toBe(2);
  });
});

describe("POST /api/entries/:entry/schedule", () => {
  it("publishes at its time and not before", async () => {
    const { bench, draft, act, read } = await oneDraft();
    const at = bench.time.now + 2 * hour;
    const answer = await act("schedule", { baseVersion: draft.version, at });
    expect(answer.body).toMatchObject({ state: "scheduled", scheduledAt: at });
    bench.time.now += hour;
    await bench.queue.runDue();
    expect((await read()).status).toBe(404);
    bench.time.now += hour;
    await bench.queue.runDue();
    expect((await read()).body).toMatchObject({ number: 1, publishedAt: at });
  });

  it("outlives a restart, and publishes once though two processes look", async () => {
    const { bench, maren, draft, act, read } = await oneDraft();
    await act("schedule", { baseVersion: 1, at: bench.time.now + hour });
    bench.time.now += 3 * hour;
    const restarted = bench.restartedQueue();
    await Promise.all([restarted.runDue(), bench.queue.runDue()]);
    expect((await read()).body.publishedAt).toBe(bench.time.now);
    const kept = await bench.send(maren, "GET", `/api/entries/${draft.id}/revisions`);
    const published = kept.body.revisions.filter((each: { reason: string }) => each.reason === "publish");
    expect(published).toHaveLength(1);
  });

  it("keeps to the time it was moved to", async () => {
    const { bench, act, read } = await oneDraft();
    await act("schedule", { baseVersion: 1, at: bench.time.now + hour });
    await act("schedule", { baseVersion: 1, at: bench.time.now + 3 * hour });
    bench.time.now += 2 * hour;
    await bench.queue.runDue();
    expect((await read()).status).toBe(404);
    bench.time.now += hour;
    await bench.queue.runDue();
    expect((await read()).status).toBe(200);
  });

  it("comes off the schedule and stays a draft", async () => {
    const { bench, act, read } = await oneDraft();
    await act("schedule", { baseVersion: 1, at: bench.time.now + hour });
    const off = await act("schedule", { baseVersion: 1, at: null });
    expect(off.body).toMatchObject({ state: "draft", scheduledAt: null });
    bench.time.now += 2 * hour;
    await bench.queue.runDue();
    expect((await read()).status).toBe(404);
  });

  it("publishes what was saved last, and puts back what lost its title meanwhile", async () => {
    const { bench, maren, draft, act, read } = await oneDraft();
    await act("schedule", { baseVersion: 1, at: bench.time.now + hour });
    const saved = await saveOver(bench, maren, draft, { title: "" });
    expect(saved.body.state).toBe("scheduled");
    bench.time.now += hour;
    await bench.queue.runDue();
    const after = await bench.send(maren, "GET", `/api/entries/${draft.id}/draft`);
    expect(after.body).toMatchObject({ state: "draft", scheduledAt: null, publishedAt: null });
    expect((await read("untitled")).status).toBe(404);
  });

  it("refuses a time that has passed and an entry that is public", async () => {
    const { bench, maren, draft, act } = await oneDraft();
    const past = await act("schedule", { baseVersion: 1, at: bench.time.now });
    expect(past.body.error.fields.at).toContain("has passed");
    await publish(bench, maren, draft);
    const shown = await act("schedule", { baseVersion: 1, at: bench.time.now + hour });
    expect(shown.status).toBe(409);
  });

  it("does nothing for a draft that was deleted meanwhile", async () => {
    const { bench, maren, draft, act } = await oneDraft();
    await act("schedule", { baseVersion: 1, at: bench.time.now + hour });
    await bench.send(maren, "DELETE", `/api/entries/${draft.id}`);
    bench.time.now += hour;
    expect(await bench.queue.runDue()).toBe(1);
    expect(bench.database.select().from(entries).get()).toMatchObject({ state: "draft", publishedAt: null });
  });
});

describe("POST /api/entries/:entry/withdraw", () => {
  it("takes the entry out of readers' sight, and its build when nothing else is public", async () => {
    const { bench, maren, draft, act, read } = await oneDraft();
    await publish(bench, maren, draft);
    expect((await act("withdraw")).body.state).toBe("withdrawn");
    expect((await read()).status).toBe(404);
    expect((await bench.send(maren, "GET", "/api/builds/heron/entries/setting-out-the-frame")).status).toBe(
      404,
    );
    expect((await bench.send(null, "GET", "/api/builds/heron")).status).toBe(404);
    const own = await bench.send(maren, "GET", "/api/workshop/builds/heron");
    expect(own.body.entries).toMatchObject([{ id: draft.id, state: "withdrawn", number: 1 }]);
  });

  it("lets it be published again under its number and first date", async () => {
    const { bench, maren, draft, act, read } = await oneDraft();
    const shown = await publish(bench, maren, draft);
    await act("withdraw");
    bench.time.now += hour;
    await publish(bench, maren, shown.body);
    expect((await read()).body).toMatchObject({ number: 1, publishedAt: bench.time.now - hour });
  });

  it("refuses what is not public", async () => {
    const { act } = await oneDraft();
    expect((await act("withdraw")).status).toBe(409);
  });
});

describe("POST /api/entries/:entry/rename", () => {
  it("lets the old address of a public entry lead to it", async () => {
    const { bench, maren, draft, act, read } = await oneDraft();
    await publish(bench, maren, draft);
    expect((await act("rename", { slug: "datum-first" })).body.slug).toBe("datum-first");
    expect((await read("setting-out-the-frame")).body.slug).toBe("datum-first");
    await bench.send(maren, "PATCH", "/api/builds/heron", { slug: "crane" });
    expect((await read("setting-out-the-frame")).body).toMatchObject({
      slug: "datum-first",
      build: { slug: "crane" },
    });
  });

  it("refuses an address that another entry of the build has or had", async () => {
    const { bench, maren, place, draft, act } = await oneDraft();
    await publish(bench, maren, draft);
    await act("rename", { slug: "datum-first" });
    const other = await startEntry(bench, maren, place, "Other");
    for (const slug of ["datum-first", "setting-out-the-frame"]) {
      const answer = await bench.send(maren, "POST", `/api/entries/${other.id}/rename`, { slug });
      expect(answer.status).toBe(409);
    }
  });
});

describe("GET /api/builds/:build/entries/:entry", () => {
  it("leads to the entries before and after, past those that are not public", async () => {
    const { bench, maren, place } = await oneDraft();
    const made = [];
    for (const title of ["One", "Two", "Three", "Four"]) {
      made.push(await publishedEntry(bench, maren, place, title));
    }
    await bench.send(maren, "POST", `/api/entries/${made[1]?.id}/withdraw`);
    const { body } = await bench.send(null, "GET", "/api/builds/heron/entries/three");
    expect(body.previous).toEqual({ number: 1, slug: "one", title: "One" });
    expect(body.next).toEqual({ number: 4, slug: "four", title: "Four" });
    expect((await bench.send(null, "GET", "/api/builds/heron/entries/four")).body.next).toBeNull();
  });

  it("tells the builder that the entry is theirs", async () => {
    const { bench, maren, draft } = await oneDraft();
    await publish(bench, maren, draft);
    const path = "/api/builds/heron/entries/setting-out-the-frame";
    expect((await bench.send(maren, "GET", path)).body.mine).toBe(true);
  });
});

describe("GET /api/entries", () => {
  it("pages through public entries of all builds, newest first", async () => {
    const bench = await contentBench();
    const maren = bench.person("maren");
    const place = await startBuild(bench, maren);
    for (let number = 1; number <= 22; number += 1) {
      bench.time.now += 1000;
      await publishedEntry(bench, maren, place, `Entry ${number}`);
    }
    await startEntry(bench, maren, place, "Draft");
    const first = await bench.send(null, "GET", "/api/entries");
    const second = await bench.send(null, "GET", `/api/entries?after=${first.body.next}`);
    const numbers = [...first.body.items, ...second.body.items].map((each) => each.number);
    expect(numbers).toEqual(Array.from({ length: 22 }, (_, index) => 22 - index));
    expect(first.body.items[0].build.slug).toBe("heron");
  });

  it("walks the index of public entries instead of sorting", async () => {
    const { database } = await contentBench();
    for (const after of [null, { at: 5, id: "01900000-0000-7000-8000-000000000000" }]) {
      const { sql, params } = latestPublic(database, after).toSQL();
      const plan = database.$client.prepare(`EXPLAIN QUERY PLAN ${sql}`).all(...params) as {
        detail: string;
      }[];
      expect(plan.map((line) => line.detail)).toEqual([
        expect.stringContaining("SEARCH entries USING INDEX entries_by_published"),
      ]);
    }
  });
});

describe("GET /api/workshop", () => {
  it("counts the drafts of the viewer's own builds", async () => {
    const { bench, maren, place } = await oneDraft();
    await publishedEntry(bench, maren, place, "Public one");
    const { body } = await bench.send(maren, "GET", "/api/workshop");
    expect(body.builds).toMatchObject([{ slug: "heron", draftCount: 1, entryCount: 1 }]);
    expect((await bench.send(bench.person("idris"), "GET", "/api/workshop")).body.builds).toEqual([]);
    expect((await bench.send(null, "GET", "/api/workshop")).status).toBe(401);
  });

  it("shows a build's drafts to its builder alone", async () => {
    const { bench, maren, draft } = await oneDraft();
    const own = await bench.send(maren, "GET", "/api/workshop/builds/heron");
    expect(own.body.entries).toMatchObject([{ id: draft.id, state: "draft" }]);
    expect((await bench.send(bench.person("idris"), "GET", "/api/workshop/builds/heron")).status).toBe(404);
  });
});

describe("schedulePurge", () => {
  it("removes a deleted draft for good after thirty days, not before", async () => {
    const { bench, maren, draft } = await oneDraft();
    const clock = () => bench.time.now;
    await bench.send(maren, "DELETE", `/api/entries/${draft.id}`);
    schedulePurge({ queue: bench.queue, clock });
    const left = () => bench.database.select().from(entries).all().length;
    for (let day = 0; day < 30; day += 1) {
      bench.time.now += 24 * hour;
      await bench.queue.runDue();
    }
    expect(left()).toBe(1);
    bench.time.now += 24 * hour;
    await bench.queue.runDue();
    expect(left()).toBe(0);
  });
});

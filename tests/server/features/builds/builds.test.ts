import { describe, expect, it } from "vitest";
import { auditLines } from "#server/db/schema/audit.ts";
import { publicCards } from "#server/features/builds/repository.ts";
import { publishedEntry, startBuild, startEntry } from "#tests/factories/content.ts";
import { type ContentBench, contentBench } from "#tests/setup/content-bench.ts";

describe("POST /api/builds", () => {
  it("starts a build that its builder alone sees", async () => {
    const bench = await contentBench();
    const maren = bench.person("maren");
    const idris = bench.person("idris");
    const { build } = await startBuild(bench, maren);
    expect(build).toMatchObject({ slug: "heron", status: "under_way", mine: true, entryCount: 0 });
    expect((await bench.send(maren, "GET", "/api/builds/heron")).status).toBe(200);
    expect((await bench.send(idris, "GET", "/api/builds/heron")).status).toBe(404);
    expect((await bench.send(null, "GET", "/api/builds/heron")).status).toBe(404);
  });

  it("turns away the signed out and those without a confirmed address", async () => {
    const bench = await contentBench();
    const tam = bench.person("tam", { emailVerified: false });
    const body = { title: "Gantry", purpose: "Lifts engines" };
    expect(await bench.send(null, "POST", "/api/builds", body)).toMatchObject({ status: 401 });
    expect(await bench.send(tam, "POST", "/api/builds", body)).toMatchObject({
      status: 403,
      body: { error: { code: "not_verified" } },
    });
  });

  it("says beside each field what is missing", async () => {
    const bench = await contentBench();
    const answer = await bench.send(bench.person("maren"), "POST", "/api/builds", {
      title: " ",
      purpose: "",
    });
    expect(answer.status).toBe(422);
    expect(answer.body.error.fields).toEqual({
      title: "The title is missing.",
      purpose: "The purpose line is missing.",
    });
  });

  it("numbers the address of a second build of the same name", async () => {
    const bench = await contentBench();
    const maren = bench.person("maren");
    await startBuild(bench, maren, "Élan & Söhne");
    const { build } = await startBuild(bench, maren, "Élan & Söhne");
    expect(build.slug).toBe("elan-and-soehne-2");
  });
});

describe("PATCH /api/builds/:build", () => {
  it("lets a renamed build be found at its old address too", async () => {
    const bench = await contentBench();
    const maren = bench.person("maren");
    await startBuild(bench, maren);
    const renamed = await bench.send(maren, "PATCH", "/api/builds/heron", { slug: "heron-mk-2" });
    expect(renamed.body.slug).toBe("heron-mk-2");
    expect((await bench.send(maren, "GET", "/api/builds/heron")).body.slug).toBe("heron-mk-2");
  });

  it("takes an old address back and stops redirecting it", async () => {
    const bench = await contentBench();
    const maren = bench.person("maren");
    await startBuild(bench, maren);
    await bench.send(maren, "PATCH", "/api/builds/heron", { slug: "crane" });
    expect((await bench.send(maren, "PATCH", "/api/builds/crane", { slug: "heron" })).body.slug).toBe(
      "heron",
    );
    expect((await bench.send(maren, "GET", "/api/builds/crane")).body.slug).toBe("heron");
  });

  it("refuses an address that another build has or had", async () => {
    const bench = await contentBench();
    const maren = bench.person("maren");
    await startBuild(bench, maren, "Heron");
    await startBuild(bench, maren, "Pelican");
    await bench.send(maren, "PATCH", "/api/builds/heron", { slug: "crane" });
    for (const slug of ["crane", "heron"]) {
      const answer = await bench.send(maren, "PATCH", "/api/builds/pelican", { slug });
      expect(answer).toMatchObject({ status: 409, body: { error: { code: "conflict" } } });
      expect(answer.body.error.fields.slug).toContain("Choose another");
    }
  });

  it("lets nobody but the builder change it", async () => {
    const bench = await contentBench();
    const maren = bench.person("maren");
    const idris = bench.person("idris");
    const place = await startBuild(bench, maren);
    const change = { title: "Mine now" };
    expect((await bench.send(idris, "PATCH", "/api/builds/heron", change)).status).toBe(404);
    await publishedEntry(bench, maren, place);
    expect((await bench.send(idris, "PATCH", "/api/builds/heron", change)).status).toBe(403);
    expect((await bench.send(null, "PATCH", "/api/builds/heron", change)).status).toBe(401);
    expect((await bench.send(maren, "GET", "/api/builds/heron")).body.title).toBe("Heron");
  });

  it("writes down who did it", async () => {
    const bench = await contentBench();
    const maren = bench.person("maren");
    const { build } = await startBuild(bench, maren);
    await bench.send(maren, "PATCH", "/api/builds/heron", { slug: "crane" });
    const lines = bench.database.select().from(auditLines).all();
    expect(lines).toContainEqual(
      expect.objectContaining({
        actorId: maren.id,
        action: "build.rename",
        subjectId: build.id,
        detail: JSON.stringify({ from: "heron", to: "crane" }),
      }),
    );
  });
});

/** So many public builds, a minute apart, the last the newest. */
async function manyBuilds(bench: ContentBench, count: number) {
  const maren = bench.person("maren");
  for (let number = 1; number <= count; number += 1) {
    bench.time.now += 60_000;
    await publishedEntry(bench, maren, await startBuild(bench, maren, `Build ${number}`));
  }
  return maren;
}

describe("GET /api/builds", () => {
  it("lists public builds by their newest entry and leaves private ones out", async () => {
    const bench = await contentBench();
    const maren = bench.person("maren");
    const heron = await startBuild(bench, maren, "Heron");
    await publishedEntry(bench, maren, heron);
    bench.time.now += 1000;
    await publishedEntry(bench, maren, await startBuild(bench, maren, "Gantry"));
    await startBuild(bench, maren, "Secret");
    bench.time.now += 1000;
    await publishedEntry(bench, maren, heron, "Second entry");
    const { body } = await bench.send(null, "GET", "/api/builds");
    expect(body.items.map((each: { slug: string }) => each.slug)).toEqual(["heron", "gantry"]);
    expect(body.items[0]).toMatchObject({ entryCount: 2, owner: { handle: "maren", name: "Maren" } });
    expect(body.next).toBeNull();
  });

  it("pages without repeating or skipping while new builds come in", async () => {
    const bench = await contentBench();
    const maren = await manyBuilds(bench, 23);
    const first = await bench.send(null, "GET", "/api/builds");
    expect(first.body.items).toHaveLength(20);
    bench.time.now += 60_000;
    await publishedEntry(bench, maren, await startBuild(bench, maren, "Latecomer"));
    const second = await bench.send(null, "GET", `/api/builds?after=${first.body.next}`);
    const slugs = [...first.body.items, ...second.body.items].map((each) => each.slug);
    expect(slugs).toEqual(Array.from({ length: 23 }, (_, index) => `build-${23 - index}`));
    expect(second.body.next).toBeNull();
  });

  it("keeps the order of builds whose entries came at the same moment", async () => {
    const bench = await contentBench();
    const maren = bench.person("maren");
    for (let number = 1; number <= 21; number += 1) {
      await publishedEntry(bench, maren, await startBuild(bench, maren, `Build ${number}`));
    }
    const first = await bench.send(null, "GET", "/api/builds");
    const second = await bench.send(null, "GET", `/api/builds?after=${first.body.next}`);
    const ids = [...first.body.items, ...second.body.items].map((each) => each.id);
    expect(new Set(ids).size).toBe(21);
  });

  it("filters by builder and by status", async () => {
    const bench = await contentBench();
    const maren = bench.person("maren");
    const idris = bench.person("idris");
    await publishedEntry(bench, maren, await startBuild(bench, maren, "Heron"));
    await publishedEntry(bench, idris, await startBuild(bench, idris, "Pelican"));
    await bench.send(idris, "PATCH", "/api/builds/pelican", { status: "paused" });
    const slugs = async (query: string) =>
      (await bench.send(null, "GET", `/api/builds?${query}`)).body.items.map(
        (each: { slug: string }) => each.slug,
      );
    expect(await slugs("owner=idris")).toEqual(["pelican"]);
    expect(await slugs("status=under_way")).toEqual(["heron"]);
    expect(await slugs("owner=nobody")).toEqual([]);
  });

  it("refuses a made-up cursor with a message", async () => {
    const bench = await contentBench();
    const answer = await bench.send(null, "GET", "/api/builds?after=nonsense");
    expect(answer).toMatchObject({ status: 422, body: { error: { code: "invalid_input" } } });
  });

  it("walks an index for each filter instead of sorting", async () => {
    const { database } = await contentBench();
    const plan = (filter: Parameters<typeof publicCards>[1]) => {
      const { sql, params } = publicCards(database, filter).toSQL();
      const lines = database.$client.prepare(`EXPLAIN QUERY PLAN ${sql}`).all(...params);
      return (lines as { detail: string }[]).map((line) => line.detail).join("\n");
    };
    const after = { at: 5, id: "01900000-0000-7000-8000-000000000000" };
    expect(plan({ after: null })).toContain("builds USING INDEX builds_by_last_entry");
    expect(plan({ after })).toContain(
      "builds USING INDEX builds_by_last_entry (last_entry_at>? AND (last_entry_at,id)<(?,?))",
    );
    expect(plan({ after, ownerId: "x" })).toContain("builds USING INDEX builds_by_owner_entry");
    expect(plan({ after, status: "paused" })).toContain("builds USING INDEX builds_by_status");
    for (const filter of [{ after: null }, { after }, { after, ownerId: "x" }]) {
      expect(plan(filter)).not.toContain("TEMP B-TREE");
      expect(plan(filter)).not.toMatch(/SCAN (?!builds USING INDEX)/);
    }
  });
});

describe("PUT /api/builds/:build/stages/order", () => {
  async function threeStages(bench: ContentBench) {
    const maren = bench.person("maren");
    const { stage } = await startBuild(bench, maren);
    const add = async (title: string) =>
      (await bench.send(maren, "POST", "/api/builds/heron/stages", { title })).body.id as string;
    return { maren, ids: [stage.id, await add("Front suspension"), await add("Steering")] };
  }

  it("puts the stages in the order given", async () => {
    const bench = await contentBench();
    const { maren, ids } = await threeStages(bench);
    const order = [ids[2], ids[0], ids[1]];
    const answer = await bench.send(maren, "PUT", "/api/builds/heron/stages/order", { stages: order });
    expect(answer.body.stages.map((each: { id: string }) => each.id)).toEqual(order);
    const page = await bench.send(maren, "GET", "/api/builds/heron");
    expect(page.body.stages.map((each: { title: string }) => each.title)).toEqual([
      "Steering",
      "Frame",
      "Front suspension",
    ]);
  });

  it("changes nothing when a stage is missing, named twice or of another build", async () => {
    const bench = await contentBench();
    const { maren, ids } = await threeStages(bench);
    const other = await startBuild(bench, maren, "Gantry");
    for (const order of [ids.slice(1), [ids[0], ids[0], ids[1]], [ids[0], ids[1], other.stage.id]]) {
      const answer = await bench.send(maren, "PUT", "/api/builds/heron/stages/order", { stages: order });
      expect(answer.status).toBe(409);
    }
    const page = await bench.send(maren, "GET", "/api/builds/heron");
    expect(page.body.stages.map((each: { id: string }) => each.id)).toEqual(ids);
  });
});

describe("PATCH /api/stages/:stage", () => {
  it("changes a stage for its builder and hides it from others", async () => {
    const bench = await contentBench();
    const maren = bench.person("maren");
    const { stage } = await startBuild(bench, maren);
    const answer = await bench.send(maren, "PATCH", `/api/stages/${stage.id}`, { state: "being_redone" });
    expect(answer.body).toMatchObject({ title: "Frame", state: "being_redone" });
    const stranger = await bench.send(bench.person("idris"), "PATCH", `/api/stages/${stage.id}`, {});
    expect(stranger.status).toBe(404);
  });
});

describe("DELETE /api/stages/:stage", () => {
  it("keeps a stage that holds an entry, and deletes it once the draft in it is deleted", async () => {
    const bench = await contentBench();
    const maren = bench.person("maren");
    const place = await startBuild(bench, maren);
    const draft = await startEntry(bench, maren, place);
    const path = `/api/stages/${place.stage.id}`;
    expect(await bench.send(maren, "DELETE", path)).toMatchObject({
      status: 409,
      body: { error: { message: "This stage holds entries. Move them to another stage first." } },
    });
    await bench.send(maren, "DELETE", `/api/entries/${draft.id}`);
    expect((await bench.send(bench.person("idris"), "DELETE", path)).status).toBe(404);
    expect((await bench.send(maren, "DELETE", path)).status).toBe(200);
    expect((await bench.send(maren, "GET", "/api/builds/heron")).body.stages).toEqual([]);
  });
});

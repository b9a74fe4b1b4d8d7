import { v4 as uuid } from "uuid";
import { describe, expect, it } from "vitest";
import { findCalculator, runCalculator } from "#shared/calculators/registry.ts";
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
const minute = 60_000;

async function oneDraft() {
  const bench = await contentBench();
  const maren = bench.person("maren");
  const place = await startBuild(bench, maren);
  const draft = await startEntry(bench, maren, place);
  const get = async () => (await bench.send(maren, "GET", `/api/entries/${draft.id}/draft`)).body;
  const revisions = async () =>
    (await bench.send(maren, "GET", `/api/entries/${draft.id}/revisions`)).body.revisions;
  return { bench, maren, place, draft, get, revisions };
}

describe("POST /api/builds/:build/entries", () => {
  it("begins a draft for the builder and for nobody else", async () => {
    const { bench, place, draft } = await oneDraft();
    expect(draft).toMatchObject({
      state: "draft",
      version: 1,
      number: null,
      slug: "setting-out-the-frame",
      hasUnpublishedChanges: false,
      document: { type: "doc", content: [{ type: "paragraph" }] },
    });
    const idris = bench.person("idris");
    const body = { stageId: place.stage.id };
    expect((await bench.send(idris, "POST", "/api/builds/heron/entries", body)).status).toBe(404);
    expect((await bench.send(null, "POST", "/api/builds/heron/entries", body)).status).toBe(401);
  });

  it("refuses a stage of another build", async () => {
    const { bench, maren } = await oneDraft();
    const other = await startBuild(bench, maren, "Gantry");
    const answer = await bench.send(maren, "POST", "/api/builds/heron/entries", { stageId: other.stage.id });
    expect(answer.status).toBe(422);
    expect(answer.body.error.fields.stageId).toContain("Choose another");
  });
});

describe("GET /api/entries/:entry/draft", () => {
  it("answers others, public entry or not, as if there were none", async () => {
    const { bench, maren, draft } = await oneDraft();
    const path = `/api/entries/${draft.id}/draft`;
    const moderator = bench.person("joan", { role: "moderator" });
    expect((await bench.send(moderator, "GET", path)).status).toBe(404);
    await publish(bench, maren, draft);
    expect((await bench.send(moderator, "GET", path)).status).toBe(404);
    expect((await bench.send(null, "GET", path)).status).toBe(401);
  });
});

describe("PUT /api/entries/:entry/draft", () => {
  it("keeps the words and raises the version by one", async () => {
    const { bench, maren, draft, get } = await oneDraft();
    const document = words("Tubes square to the datum.");
    const saved = await saveOver(bench, maren, draft, { summary: "Datum first", document });
    expect(saved.body).toMatchObject({ version: 2, summary: "Datum first", document });
    expect(await get()).toEqual(saved.body);
  });

  it("refuses a save that started from an older version, and keeps what is there", async () => {
    const { bench, maren, draft, get } = await oneDraft();
    await saveOver(bench, maren, draft, { document: words("From the bench") });
    const late = await saveOver(bench, maren, draft, { document: words("From the phone") });
    expect(late).toMatchObject({ status: 409, body: { error: { code: "draft_conflict" } } });
    expect((await get()).document).toEqual(words("From the bench"));
  });

  it("takes the same save twice without a conflict, as after a lost answer", async () => {
    const { bench, maren, draft } = await oneDraft();
    await saveOver(bench, maren, draft, { document: words("Once") });
    const again = await saveOver(bench, maren, draft, { document: words("Once") });
    expect(again).toMatchObject({ status: 200, body: { version: 2 } });
  });

  it("refuses a document that the site does not keep, saying why", async () => {
    const { bench, maren, draft } = await oneDraft();
    const link = { type: "link", attrs: { href: "javascript:alert(1)" } };
    const document = {
      type: "doc",
      content: [{ type: "paragraph", content: [{ type: "text", text: "here", marks: [link] }] }],
    };
    const answer = await saveOver(bench, maren, draft, { document });
    expect(answer.status).toBe(422);
    expect(answer.body.error.fields.document).toContain("A link must start with");
  });

  it("refuses a photo that is not of this build", async () => {
    const { bench, maren, draft } = await oneDraft();
    const document = { type: "doc", content: [{ type: "photo", attrs: { photoId: uuid() } }] };
    const answer = await saveOver(bench, maren, draft, { document });
    expect(answer.status).toBe(422);
    expect(answer.body.error.fields.document).toContain("not one of this build");
  });

  it("lets nobody but the builder save", async () => {
    const { bench, draft } = await oneDraft();
    const idris = bench.person("idris");
    expect((await saveOver(bench, idris, draft, { title: "Mine" })).status).toBe(404);
  });

  it("works a working's sum and numbers it once in the build", async () => {
    const { bench, maren, place, draft } = await oneDraft();
    const [first, second, third] = [uuid(), uuid(), uuid()];
    const blocks = (...ids: string[]) => ({ type: "doc", content: ids.map((id) => workingBlock(id, cope)) });
    const one = await saveOver(bench, maren, draft, { document: blocks(first, second) });
    expect(one.body.workings[first].number).toBe(1);
    expect(one.body.workings[second].number).toBe(2);
    const run = runCalculator("saddle-cope", cope);
    if (!run.ok) throw new Error(run.issue.message);
    expect(one.body.workings[first]).toMatchObject({
      version: run.value.version,
      results: JSON.parse(JSON.stringify(run.value.results)),
    });
    const two = await saveOver(bench, maren, one.body, { document: blocks(second) });
    expect(Object.keys(two.body.workings)).toEqual([second]);
    const other = await startEntry(bench, maren, place, "Another");
    const three = await saveOver(bench, maren, other, { document: blocks(third) });
    expect(three.body.workings[third].number).toBe(3);
    const back = await saveOver(bench, maren, two.body, { document: blocks(second, first) });
    expect(back.body.workings[first].number).toBe(1);
  });

  it("names the working that does not come out", async () => {
    const { bench, maren, draft } = await oneDraft();
    const document = { type: "doc", content: [workingBlock(uuid(), { ...cope, nonsense: 1 }, "Short arm")] };
    const answer = await saveOver(bench, maren, draft, { document });
    expect(answer.status).toBe(422);
    expect(answer.body.error.fields.document).toContain('"Short arm"');
  });

  it("refuses a working of another entry", async () => {
    const { bench, maren, place, draft } = await oneDraft();
    const document = { type: "doc", content: [workingBlock(uuid(), cope)] };
    await saveOver(bench, maren, draft, { document });
    const other = await startEntry(bench, maren, place, "Another");
    const answer = await saveOver(bench, maren, other, { document });
    expect(answer.body.error.fields.document).toContain("belongs to another entry");
  });

  it("lets the address follow the title until the entry is first published", async () => {
    const { bench, maren, draft } = await oneDraft();
    const renamed = await saveOver(bench, maren, draft, { title: "Tacking the frame" });
    expect(renamed.body.slug).toBe("tacking-the-frame");
    const shown = await publish(bench, maren, renamed.body);
    const later = await saveOver(bench, maren, shown.body, { title: "Welding the frame" });
    expect(later.body.slug).toBe("tacking-the-frame");
  });

  it("keeps an address that the builder chose for a draft", async () => {
    const { bench, maren, draft } = await oneDraft();
    const chosen = await bench.send(maren, "POST", `/api/entries/${draft.id}/rename`, { slug: "datum" });
    const saved = await saveOver(bench, maren, chosen.body, { title: "Tacking the frame" });
    expect(saved.body.slug).toBe("datum");
  });
});

describe("GET /api/entries/:entry/revisions", () => {
  it("folds saves of five minutes into one and starts a new one after", async () => {
    const { bench, maren, draft, revisions } = await oneDraft();
    const one = await saveOver(bench, maren, draft, { document: words("One") });
    bench.time.now += 4 * minute;
    const two = await saveOver(bench, maren, one.body, { document: words("One two") });
    expect(await revisions()).toMatchObject([{ number: 1, words: 2, reason: "autosave" }]);
    bench.time.now += minute;
    await saveOver(bench, maren, two.body, { document: words("One two three") });
    expect(await revisions()).toMatchObject([
      { number: 2, words: 3 },
      { number: 1, words: 2 },
    ]);
  });

  it("gives publishing a revision of its own, and never folds into it", async () => {
    const { bench, maren, draft, revisions } = await oneDraft();
    const shown = await publish(bench, maren, draft);
    await saveOver(bench, maren, shown.body, { document: words("After") });
    const reasons = (await revisions()).map((each: { reason: string }) => each.reason);
    expect(reasons).toEqual(["autosave", "publish", "autosave"]);
  });

  it("is for the builder alone", async () => {
    const { bench, maren, place } = await oneDraft();
    const shown = await publishedEntry(bench, maren, place, "Public one");
    const path = `/api/entries/${shown.id}/revisions`;
    expect((await bench.send(bench.person("idris"), "GET", path)).status).toBe(404);
    expect((await bench.send(bench.person("lise"), "GET", `${path}/1`)).status).toBe(404);
  });
});

describe("POST /api/entries/:entry/revisions/:revision/restore", () => {
  it("makes a revision the draft again and keeps what the draft said", async () => {
    const { bench, maren, draft, revisions } = await oneDraft();
    const id = uuid();
    const early = { type: "doc", content: [workingBlock(id, cope)] };
    const one = await saveOver(bench, maren, draft, { document: early });
    bench.time.now += 6 * minute;
    const two = await saveOver(bench, maren, one.body, { title: "Scrapped", document: words("All wrong") });
    const path = `/api/entries/${draft.id}/revisions`;
    const restored = await bench.send(maren, "POST", `${path}/1/restore`, { baseVersion: two.body.version });
    expect(restored.body).toMatchObject({ title: "Setting out the frame", version: 4 });
    expect(restored.body.workings[id].number).toBe(1);
    const kept = await revisions();
    expect(kept.map((each: { reason: string }) => each.reason)).toEqual(["restore", "autosave", "autosave"]);
    expect((await bench.send(maren, "GET", `${path}/2`)).body).toMatchObject({
      title: "Scrapped",
      document: words("All wrong"),
    });
  });

  it("shows a working with the inputs it had then", async () => {
    const { bench, maren, draft } = await oneDraft();
    const id = uuid();
    const block = (title: string) => ({ type: "doc", content: [workingBlock(id, cope, title)] });
    const one = await saveOver(bench, maren, draft, { document: block("Before") });
    bench.time.now += 6 * minute;
    await saveOver(bench, maren, one.body, { document: block("After") });
    const then = await bench.send(maren, "GET", `/api/entries/${draft.id}/revisions/1`);
    expect(then.body.workings[id]).toMatchObject({ number: 1, title: "Before" });
  });

  it("refuses a stale page and an unknown revision", async () => {
    const { bench, maren, draft } = await oneDraft();
    await saveOver(bench, maren, draft, { document: words("Newer") });
    const path = `/api/entries/${draft.id}/revisions`;
    expect((await bench.send(maren, "POST", `${path}/1/restore`, { baseVersion: 1 })).status).toBe(409);
    expect((await bench.send(maren, "POST", `${path}/9/restore`, { baseVersion: 2 })).status).toBe(404);
  });
});

describe("POST /api/entries/:entry/copies", () => {
  it("keeps one side of a conflict as a draft beside the original, with workings of its own", async () => {
    const { bench, maren, draft, get } = await oneDraft();
    const id = uuid();
    const mine = { type: "doc", content: [workingBlock(id, cope), ...words("Mine").content] };
    const saved = await saveOver(bench, maren, draft, { document: mine });
    const { title, summary, stageId } = draft;
    const copy = await bench.send(maren, "POST", `/api/entries/${draft.id}/copies`, {
      title,
      summary,
      stageId,
      document: mine,
    });
    expect(copy).toMatchObject({
      status: 201,
      body: { title: "Setting out the frame (copy)", slug: "setting-out-the-frame-copy", version: 1 },
    });
    const [working] = Object.values(copy.body.workings) as { id: string; number: number }[];
    expect(working?.id).not.toBe(id);
    expect(working?.number).toBe(2);
    expect(await get()).toMatchObject({
      version: 2,
      document: saved.body.document,
      workings: saved.body.workings,
    });
  });
});

describe("DELETE /api/entries/:entry", () => {
  it("deletes a draft and frees its address at once", async () => {
    const { bench, maren, place, draft } = await oneDraft();
    expect((await bench.send(maren, "DELETE", `/api/entries/${draft.id}`)).status).toBe(200);
    expect((await bench.send(maren, "GET", `/api/entries/${draft.id}/draft`)).status).toBe(404);
    expect((await startEntry(bench, maren, place)).slug).toBe("setting-out-the-frame");
  });

  it("refuses to delete what readers have seen", async () => {
    const { bench, maren, place } = await oneDraft();
    const shown = await publishedEntry(bench, maren, place, "Public one");
    await bench.send(maren, "POST", `/api/entries/${shown.id}/withdraw`);
    const answer = await bench.send(maren, "DELETE", `/api/entries/${shown.id}`);
    expect(answer).toMatchObject({ status: 409, body: { error: { code: "conflict" } } });
  });
});

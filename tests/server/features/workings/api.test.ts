import type { AddressInfo } from "node:net";
import DxfParser from "dxf-parser";
import express from "express";
import { XMLValidator } from "fast-xml-parser";
import { pino } from "pino";
import { v7 as uuid } from "uuid";
import { describe, expect, it, onTestFinished } from "vitest";
import { numberFiles } from "#server/features/workings/number-files.ts";
import { workingRoutes } from "#server/features/workings/routes.ts";
import { createWorkingService } from "#server/features/workings/service.ts";
import { templateFiles } from "#server/features/workings/template-files.ts";
import { apiRouter } from "#server/http/endpoints.ts";
import { handleErrors } from "#server/http/errors.ts";
import type { Person } from "#server/http/viewer.ts";
import { calculatorIds, runCalculator } from "#shared/calculators/registry.ts";
import { publish, saveOver, startBuild, startEntry, workingBlock } from "#tests/factories/content.ts";
import { contentBench } from "#tests/setup/content-bench.ts";

const inputs = { headerOd: 44.5, branchOd: 38.1, branchWall: 2.5, angle: 60 };

/** The workings alone, over real HTTP, on the database of a bench where builds and entries are made. */
async function shop() {
  const bench = await contentBench();
  const people = new Map<string, Person>();
  const workings = createWorkingService({
    database: bench.database,
    canReadEntry: (_viewer, entry) => entry.state === "public",
  });
  const app = express();
  app.use((req, _res, next) => {
    req.viewer = people.get(req.get("x-person") ?? "") ?? null;
    next();
  });
  app.use(
    apiRouter(workingRoutes(workings)),
    templateFiles({ workings, clock: () => Date.UTC(2026, 11, 1) }),
    numberFiles({ workings }),
  );
  app.use(handleErrors(pino({ level: "silent" })));
  const server = app.listen(0);
  onTestFinished(() => {
    server.close();
    server.closeAllConnections();
  });
  const origin = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
  const get = (path: string, viewer?: Person) => {
    if (viewer) people.set(viewer.handle, viewer);
    return fetch(origin + path, viewer ? { headers: { "x-person": viewer.handle } } : {});
  };
  const post = async (path: string, body: unknown) => {
    const headers = { "content-type": "application/json" };
    const answer = await fetch(origin + path, { method: "POST", headers, body: JSON.stringify(body) });
    return { status: answer.status, body: await answer.json() };
  };
  return { bench, get, post };
}

/** A working in a draft, and the way to publish it. */
async function keptWorking() {
  const { bench, get } = await shop();
  const maren = bench.person("maren");
  const lise = bench.person("lise");
  const place = await startBuild(bench, maren);
  const id = uuid();
  const document = { type: "doc", content: [workingBlock(id, inputs)] };
  const saved = await saveOver(bench, maren, await startEntry(bench, maren, place), { document });
  expect(saved.status).toBe(200);
  return { bench, get, maren, lise, id, draft: saved.body, publish: () => publish(bench, maren, saved.body) };
}

describe("POST /api/calculators/:calculator", () => {
  it("answers with what the calculator gives", async () => {
    const { post } = await shop();
    const run = runCalculator("saddle-cope", inputs);
    const expected = run.ok ? JSON.parse(JSON.stringify(run.value.results)) : undefined;
    expect(await post("/api/calculators/saddle-cope", inputs)).toEqual({ status: 200, body: expected });
  });

  it("answers 422 with the field and the message", async () => {
    const { post } = await shop();
    const { status, body } = await post("/api/calculators/saddle-cope", { ...inputs, angle: 95 });
    expect(status).toBe(422);
    expect(body.error).toMatchObject({
      field: "angle",
      message: expect.stringContaining("between 15 and 90"),
    });
  });

  it("slows down a program that sends sums without end", async () => {
    const { post } = await shop();
    const statuses: number[] = [];
    for (let count = 0; count < 121; count += 1) {
      statuses.push((await post("/api/calculators/saddle-cope", {})).status);
    }
    expect(statuses.slice(0, 120)).toEqual(Array(120).fill(422));
    expect(statuses[120]).toBe(429);
  });

  it("answers 404 for a calculator there is not", async () => {
    const { post } = await shop();
    expect((await post("/api/calculators/none", {})).status).toBe(404);
  });

  it("answers 422 for a list where inputs belong", async () => {
    const { post } = await shop();
    expect(await post("/api/calculators/saddle-cope", [])).toMatchObject({
      status: 422,
      body: { error: { field: "inputs" } },
    });
  });
});

describe("GET /api/calculators/:calculator/template/:format", () => {
  const query = "headerOd=44.5&branchOd=38.1&branchWall=2.5&angle=60";

  it("sends a PDF to be looked at, named after its paper", async () => {
    const { get } = await shop();
    const answer = await get(`/api/calculators/saddle-cope/template/pdf?paper=letter&${query}`);
    expect(answer.headers.get("content-type")).toBe("application/pdf");
    expect(answer.headers.get("content-disposition")).toBe(
      'inline; filename="saddle-cope-template-letter.pdf"',
    );
    const bytes = Buffer.from(await answer.arrayBuffer());
    expect(bytes.subarray(0, 5).toString()).toBe("%PDF-");
    expect(bytes.toString("latin1")).toMatch(/MediaBox \[0 0 612(\.0+)? 792(\.0+)?\]/);
  });

  it("sends SVG and DXF to be kept", async () => {
    const { get } = await shop();
    const svg = await get(`/api/calculators/saddle-cope/template/svg?${query}`);
    expect(svg.headers.get("content-type")).toBe("image/svg+xml; charset=utf-8");
    expect(svg.headers.get("content-disposition")).toBe('attachment; filename="saddle-cope-template.svg"');
    expect(XMLValidator.validate(await svg.text())).toBe(true);
    const dxf = await get(`/api/calculators/saddle-cope/template/dxf?${query}`);
    expect(dxf.headers.get("content-type")).toContain("image/vnd.dxf");
    expect(new DxfParser().parseSync(await dxf.text())?.entities.length).toBeGreaterThan(10);
  });

  it.each([
    ["an input that is words", `${query}&offset=aside`, 422, "offset"],
    ["an empty input", `${query}&offset=`, 422, "offset"],
    ["an input that is missing", "headerOd=44.5", 422, "branchOd"],
  ])("names the field for %s", async (_, search, status, field) => {
    const { get } = await shop();
    const answer = await get(`/api/calculators/saddle-cope/template/svg?${search}`);
    expect(answer.status).toBe(status);
    expect((await answer.json()).error.field).toBe(field);
  });

  it("refuses a format and a paper it does not have", async () => {
    const { get } = await shop();
    expect((await get(`/api/calculators/saddle-cope/template/gif?${query}`)).status).toBe(422);
    expect((await get(`/api/calculators/saddle-cope/template/pdf?paper=a9&${query}`)).status).toBe(422);
  });

  it("says when a template would take too many pages", async () => {
    const { get } = await shop();
    const answer = await get(
      "/api/calculators/saddle-cope/template/pdf?headerOd=2000&branchOd=1900&branchWall=10&angle=20",
    );
    expect(answer.status).toBe(422);
    expect((await answer.json()).error.message).toMatch(/would take \d+ pages/);
  });

  it("slows down whoever draws PDFs without end", async () => {
    const { get } = await shop();
    const statuses: number[] = [];
    for (let count = 0; count < 31; count += 1) {
      statuses.push((await get("/api/calculators/saddle-cope/template/pdf?headerOd=1")).status);
    }
    expect(statuses.slice(0, 30)).toEqual(Array(30).fill(422));
    expect(statuses[30]).toBe(429);
  });
});

describe("GET /api/workings/:working/template/:format", () => {
  it("keeps a draft's template to its builder", async () => {
    const { get, maren, lise, id } = await keptWorking();
    const path = `/api/workings/${id}/template/svg`;
    expect((await get(path)).status).toBe(404);
    expect((await get(path, lise)).status).toBe(404);
    expect((await get(path, maren)).status).toBe(200);
  });

  it("lets anyone have a published one, with the names of build and working on it", async () => {
    const { get, id, publish: publishIt } = await keptWorking();
    await publishIt();
    const answer = await get(`/api/workings/${id}/template/svg`);
    expect(answer.headers.get("content-disposition")).toBe('attachment; filename="heron-w1-template.svg"');
    const text = await answer.text();
    expect(text).toContain("Heron: W1 Lower front cope");
    expect(text).toContain("at 60°, offset 0 mm, 1 December 2026");
  });

  it("draws a reader's own numbers over the kept ones", async () => {
    const { get, id, publish: publishIt } = await keptWorking();
    await publishIt();
    const text = await (await get(`/api/workings/${id}/template/svg?angle=45`)).text();
    expect(text).toContain("at 45°");
    expect(text).toContain("38.1 × 2.5 on 44.5 mm");
  });

  it("shows readers the published numbers while the draft has others", async () => {
    const { bench, get, maren, id, publish: publishIt } = await keptWorking();
    const published = (await publishIt()).body;
    const document = { type: "doc", content: [workingBlock(id, { ...inputs, angle: 75 })] };
    await saveOver(bench, maren, published, { document });
    expect(await (await get(`/api/workings/${id}/template/svg`)).text()).toContain("at 60°");
  });

  it("answers 404 once its entry is withdrawn", async () => {
    const { bench, get, maren, id, draft, publish: publishIt } = await keptWorking();
    await publishIt();
    await bench.send(maren, "POST", `/api/entries/${draft.id}/withdraw`);
    expect((await get(`/api/workings/${id}/template/svg`)).status).toBe(404);
    expect((await get("/api/workings/none/template/svg")).status).toBe(404);
  });
});

describe("GET /api/calculators/:calculator/numbers/:format", () => {
  const query = "headerOd=44.5&branchOd=38.1&branchWall=2.5&angle=60";

  it("sends the whole sum as JSON", async () => {
    const { get } = await shop();
    const answer = await get(`/api/calculators/saddle-cope/numbers/json?${query}`);
    const run = runCalculator("saddle-cope", inputs);
    expect(answer.headers.get("content-disposition")).toBe('attachment; filename="saddle-cope-numbers.json"');
    expect(await answer.json()).toEqual(JSON.parse(JSON.stringify(run.ok && run.value)));
  });

  it("sends a row a number as CSV, with label and unit", async () => {
    const { get } = await shop();
    const answer = await get(`/api/calculators/saddle-cope/numbers/csv?${query}`);
    expect(answer.headers.get("content-type")).toBe("text/csv; charset=utf-8");
    const lines = (await answer.text()).split("\r\n");
    expect(lines[0]).toBe("kind,name,label,value,unit");
    expect(lines).toContain("input,angle,Angle between the axes,60,°");
    expect(lines.find((line) => line.startsWith("result,deepest,"))).toMatch(/,Deepest cut,25\.19\d*,mm$/);
  });

  it("takes a sum with lists in it", async () => {
    const { get } = await shop();
    const search = "flanges.0=20&flanges.1=30&angles.0=90&thickness=2&insideRadius=2&kFactor=0.45";
    const answer = await get(`/api/calculators/sheet-bend/numbers/json?${search}`);
    expect((await answer.json()).inputs).toMatchObject({ flanges: [20, 30], angles: [90] });
  });

  it("refuses a format it does not have and names the field at fault", async () => {
    const { get } = await shop();
    expect((await get(`/api/calculators/saddle-cope/numbers/xml?${query}`)).status).toBe(422);
    const answer = await get("/api/calculators/saddle-cope/numbers/csv?headerOd=wide");
    expect((await answer.json()).error.field).toBe("headerOd");
  });
});

describe("GET /api/workings/:working/numbers/:format", () => {
  it("keeps a draft's numbers to its builder and gives published ones to anyone", async () => {
    const { get, maren, id, publish: publishIt } = await keptWorking();
    const path = `/api/workings/${id}/numbers/json`;
    expect((await get(path)).status).toBe(404);
    expect((await get(path, maren)).status).toBe(200);
    await publishIt();
    expect((await (await get(path)).json()).inputs).toMatchObject(inputs);
  });
});

describe("GET /api/calculators", () => {
  it("lists every calculator with the words that find it", async () => {
    const { get } = await shop();
    const { items } = await (await get("/api/calculators")).json();
    expect(items.map(({ id }: { id: string }) => id)).toEqual(calculatorIds);
    expect(items[0]).toMatchObject({ id: "saddle-cope", words: expect.arrayContaining(["fishmouth"]) });
  });
});

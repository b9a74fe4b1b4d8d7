import { once } from "node:events";
import type { Server } from "node:http";
import type { AddressInfo } from "node:net";
import express from "express";
import { pino } from "pino";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { handleErrors } from "#server/http/errors.ts";
import { pageChoices } from "#server/http/page-choices.ts";

let server: Server;
let site: string;

beforeAll(async () => {
  const app = express();
  app.use(pageChoices());
  app.use(handleErrors(pino({ level: "silent" })));
  server = app.listen(0);
  await once(server, "listening");
  site = `http://localhost:${(server.address() as AddressInfo).port}`;
});

afterAll(() => {
  server.close();
});

function post(path: string, form: Record<string, string>, referer?: string) {
  return fetch(site + path, {
    method: "POST",
    body: new URLSearchParams(form),
    redirect: "manual",
    headers: referer ? { Referer: referer } : {},
  });
}

describe("POST /scheme", () => {
  it("keeps the choice in a cookie and shows the page again", async () => {
    const answer = await post("/scheme", { scheme: "dark" }, `${site}/builds?status=paused`);
    expect(answer.status).toBe(303);
    expect(answer.headers.get("location")).toBe("/builds?status=paused");
    expect(answer.headers.get("set-cookie")).toMatch(/^scheme=dark; .*SameSite=Lax/);
  });

  it("refuses a scheme there is not", async () => {
    const answer = await post("/scheme", { scheme: "sepia" });
    expect(answer.status).toBe(422);
    expect(answer.headers.get("set-cookie")).toBeNull();
  });

  it("never leads to another site", async () => {
    const answer = await post("/scheme", { scheme: "light" }, "http://elsewhere.example//evil.example/x");
    expect(answer.headers.get("location")).toBe("/");
    const other = await post("/scheme", { scheme: "light" }, "http://elsewhere.example/builds");
    expect(other.headers.get("location")).toBe("/builds");
  });
});

describe("POST /units", () => {
  it("keeps inches", async () => {
    const answer = await post("/units", { units: "inch" });
    expect(answer.headers.get("set-cookie")).toMatch(/^units=inch;/);
    expect(answer.headers.get("location")).toBe("/");
  });
});

import type { AddressInfo } from "node:net";
import express from "express";
import { pino } from "pino";
import { afterEach, describe, expect, it } from "vitest";
import { z } from "zod";
import { apiRouter, inProcessCaller, type Route, route } from "#server/http/endpoints.ts";
import { AppError, handleErrors } from "#server/http/errors.ts";
import type { Person, Viewer } from "#server/http/viewer.ts";
import { type Access, endpoint } from "#shared/contracts/endpoint.ts";

const echo = endpoint({
  method: "POST",
  path: "/api/echo/:times",
  access: "anyone",
  summary: "Repeats a word",
  params: z.object({ times: z.coerce.number().int().max(5, "Five times at most.") }),
  body: z.object({ word: z.string().min(1, "Say a word.") }),
  response: z.object({ words: z.array(z.string()) }),
  status: 201,
});

const echoRoute = route(echo, ({ params, body }) => ({
  words: Array.from({ length: params.times }, () => body.word),
  secret: "kept out by the contract",
}));

function guarded(access: Access): Route {
  const only = endpoint({
    method: "GET",
    path: `/api/${access}`,
    access,
    summary: "",
    response: z.object({}),
  });
  return route(only, () => ({}));
}

const person: Person = {
  id: "p",
  handle: "p",
  name: "P",
  email: "p@workshop.example",
  emailVerified: true,
  role: "reader",
  units: "mm",
};

const open: (() => void)[] = [];
afterEach(() => {
  for (const close of open.splice(0)) close();
});

function serve(routes: Route[], viewer: Viewer = null) {
  const app = express();
  app.use((req, _res, next) => {
    req.viewer = viewer;
    next();
  });
  app.use(apiRouter(routes));
  app.use(handleErrors(pino({ level: "silent" })));
  const server = app.listen(0);
  open.push(() => server.close());
  const { port } = server.address() as AddressInfo;
  return async (method: string, path: string, body?: string) => {
    const headers = { "Content-Type": "application/json" };
    const answer = await fetch(`http://localhost:${port}${path}`, { method, headers, body });
    return { status: answer.status, body: await answer.json() };
  };
}

describe("apiRouter", () => {
  it("parses by the contract and answers with its status and its fields alone", async () => {
    const call = serve([echoRoute]);
    const answer = await call("POST", "/api/echo/2", '{"word":"tack"}');
    expect(answer).toEqual({ status: 201, body: { words: ["tack", "tack"] } });
  });

  it("puts the message of a bad field beside its name", async () => {
    const call = serve([echoRoute]);
    const answer = await call("POST", "/api/echo/2", '{"word":""}');
    expect(answer.status).toBe(422);
    expect(answer.body.error).toMatchObject({ code: "invalid_input", fields: { word: "Say a word." } });
  });

  it("calls a body that is no JSON the caller's mistake", async () => {
    const call = serve([echoRoute]);
    expect((await call("POST", "/api/echo/2", "{")).status).toBe(422);
  });

  it("hides a fault of ours behind a number to quote", async () => {
    const broken = endpoint({
      method: "GET",
      path: "/api/broken",
      access: "anyone",
      summary: "",
      response: z.object({}),
    });
    const call = serve([
      route(broken, () => {
        throw new Error("the disk is on fire");
      }),
    ]);
    const { status, body } = await call("GET", "/api/broken");
    expect(status).toBe(500);
    expect(body.error.id).toMatch(/^[0-9a-f-]{36}$/);
    expect(JSON.stringify(body)).not.toContain("fire");
  });

  it("treats an answer that breaks its own contract as our fault, not the caller's", async () => {
    const number = endpoint({
      method: "GET",
      path: "/api/n",
      access: "anyone",
      summary: "",
      response: z.object({ n: z.number() }),
    });
    const call = serve([route(number, () => ({ n: "two" }) as unknown as { n: number })]);
    expect((await call("GET", "/api/n")).status).toBe(500);
  });

  it("does not start with two routes of one name", () => {
    expect(() => apiRouter([echoRoute, echoRoute])).toThrow("POST /api/echo/:times");
  });

  const admitted: [Access, Viewer, number][] = [
    ["anyone", null, 200],
    ["signed_in", null, 401],
    ["signed_in", { ...person, emailVerified: false }, 200],
    ["verified", { ...person, emailVerified: false }, 403],
    ["verified", person, 200],
    ["moderator", person, 403],
    ["moderator", { ...person, role: "moderator" }, 200],
    ["administrator", { ...person, role: "moderator" }, 403],
    ["administrator", { ...person, role: "administrator" }, 200],
    ["moderator", { ...person, role: "administrator" }, 200],
  ];
  it.each(admitted)("a route for %s answers %o with %i", async (access, viewer, status) => {
    const call = serve([guarded(access)], viewer);
    expect((await call("GET", `/api/${access}`)).status).toBe(status);
  });
});

describe("inProcessCaller", () => {
  it("answers as over HTTP, with the same rules", async () => {
    const call = inProcessCaller([echoRoute, guarded("signed_in")]);
    const answer = await call(
      "POST /api/echo/:times",
      { params: { times: "1" }, body: { word: "arc" } },
      { viewer: null, http: null },
    );
    expect(answer).toEqual({ words: ["arc"] });
    await expect(call("GET /api/signed_in", {}, { viewer: null, http: null })).rejects.toThrow(AppError);
  });
});

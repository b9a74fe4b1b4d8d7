import { afterEach, beforeEach, describe, expect, it } from "vitest";
import type { getMe } from "#shared/contracts/people.ts";
import { createTestApp, type TestApp } from "#tests/setup/test-app.ts";

let site: TestApp;
beforeEach(async () => {
  site = await createTestApp();
});
afterEach(() => site.close());

describe("createApp", () => {
  it("knows who is signed in, and nobody otherwise", async () => {
    const maren = await site.person("Maren");
    const { me } = await maren.call<typeof getMe>("GET /api/me", {});
    expect(me).toMatchObject({ handle: "maren", isBuilder: false });
    expect(await site.anyone.call<typeof getMe>("GET /api/me", {})).toEqual({ me: null });
  });

  it("answers an unknown route of the API as JSON", async () => {
    const answer = await site.anyone.fetch("/api/nothing-here");
    expect(answer.status).toBe(404);
    expect(await answer.json()).toMatchObject({ error: { code: "not_found" } });
  });

  it("sends a content security policy that lets no inline script run without its nonce", async () => {
    const first = (await site.anyone.fetch("/api/health")).headers.get("Content-Security-Policy") ?? "";
    const second = (await site.anyone.fetch("/api/health")).headers.get("Content-Security-Policy") ?? "";
    expect(first).toMatch(/script-src 'self' 'nonce-[\w+/=]{24}'(;|$)/);
    expect(first).not.toContain("unsafe-eval");
    expect(first).not.toBe(second);
  });
});

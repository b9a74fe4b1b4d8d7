import { describe, expect, it } from "vitest";
import { photos } from "#server/db/schema/photos.ts";
import type { SessionLine } from "#shared/contracts/sessions.ts";
import { maren, signedInBrowser, startAccountApp } from "./account-app.ts";

const lise = { name: "Lise Brandt", email: "lise@brandt.example", password: "ten characters" };

const phone = "Mozilla/5.0 (Android 15; Mobile; rv:140.0) Gecko/140.0 Firefox/140.0";

describe("GET /api/me", () => {
  it("is null for a stranger", async () => {
    const app = await startAccountApp();
    expect(await app.browser().get("/api/me")).toMatchObject({ status: 200, body: { me: null } });
  });

  it("is the signed-in person, and no builder before a first build", async () => {
    const app = await startAccountApp();
    const browser = await signedInBrowser(app);
    expect(await browser.me()).toMatchObject({
      handle: "maren-holt",
      name: "Maren Holt",
      email: maren.email,
      isBuilder: false,
      units: "mm",
      avatar: null,
    });
  });
});

describe("PATCH /api/me", () => {
  it("changes name, text and units, and answers with the whole person", async () => {
    const app = await startAccountApp();
    const browser = await signedInBrowser(app);
    const change = { name: "Maren H.", bio: "Low Barn workshop.", units: "inch" };
    const { status, body } = await browser.send("PATCH", "/api/me", change);
    expect(status).toBe(200);
    expect(body).toMatchObject({ ...change, handle: "maren-holt" });
    expect(await browser.me()).toEqual(body);
  });

  it("puts a message beside the field that is wrong, and changes nothing", async () => {
    const app = await startAccountApp();
    const browser = await signedInBrowser(app);
    const { status, body } = await browser.send("PATCH", "/api/me", { name: " ", units: "inch" });
    expect(status).toBe(422);
    expect(body).toMatchObject({ error: { fields: { name: "Display name is missing." } } });
    expect(await browser.me()).toMatchObject({ name: "Maren Holt", units: "mm" });
  });

  it("drops what is not in the contract", async () => {
    const app = await startAccountApp();
    const browser = await signedInBrowser(app);
    await browser.send("PATCH", "/api/me", { role: "administrator", emailVerified: true, handle: "boss" });
    expect(await browser.me()).toMatchObject({ role: "reader", handle: "maren-holt" });
  });

  it("takes only a portrait that the person uploaded", async () => {
    const app = await startAccountApp();
    const [browser, other] = [await signedInBrowser(app), await signedInBrowser(app, lise)];
    const owner = String((await browser.me())?.id);
    const id = "01980000-0000-7000-8000-000000000001";
    const photo = { id, ownerId: owner, purpose: "avatar", state: "ready" } as const;
    app.database
      .insert(photos)
      .values({ ...photo, width: 80, height: 80, bytes: 1, createdAt: 0 })
      .run();
    expect((await other.send("PATCH", "/api/me", { avatarPhotoId: id })).status).toBe(422);
    expect((await browser.send("PATCH", "/api/me", { avatarPhotoId: id })).status).toBe(200);
    app.database.update(photos).set({ purpose: "entry" }).run();
    expect((await browser.send("PATCH", "/api/me", { avatarPhotoId: id })).status).toBe(422);
    expect((await browser.send("PATCH", "/api/me", { avatarPhotoId: null })).status).toBe(200);
  });

  it("is for signed-in people", async () => {
    const app = await startAccountApp();
    expect((await app.browser().send("PATCH", "/api/me", { name: "x" })).status).toBe(401);
  });
});

describe("GET /api/people/:handle", () => {
  it("shows a person without address or role", async () => {
    const app = await startAccountApp();
    await app.browser().post("/api/auth/sign-up/email", maren);
    const { status, body } = await app.browser().get("/api/people/maren-holt");
    expect(status).toBe(200);
    expect(Object.keys(body as object).sort()).toEqual(["avatar", "bio", "handle", "name", "since"]);
    expect(JSON.stringify(body)).not.toContain(maren.email);
  });

  it("does not know a stranger", async () => {
    const app = await startAccountApp();
    expect((await app.browser().get("/api/people/nobody")).status).toBe(404);
  });
});

describe("the sessions of a person", () => {
  async function twoDevices() {
    const app = await startAccountApp();
    const desk = await signedInBrowser(app);
    const away = app.browser();
    const { email, password } = maren;
    await away.post("/api/auth/sign-in/email", { email, password }, { "user-agent": phone });
    const list = async () => {
      const { body } = await desk.get("/api/me/sessions");
      return (body as { sessions: SessionLine[] }).sessions;
    };
    return { app, desk, away, list };
  }

  it("GET /api/me/sessions names the devices, marks this one, and tells no token", async () => {
    const { desk, away, list } = await twoDevices();
    const sessions = await list();
    expect(sessions).toHaveLength(2);
    expect(sessions.filter((each) => each.isThisDevice)).toHaveLength(1);
    expect(sessions.find((each) => !each.isThisDevice)).toMatchObject({
      device: "Firefox on Android",
      address: "127.0.0.1",
    });
    const told = JSON.stringify(sessions);
    for (const value of [...desk.cookies.values(), ...away.cookies.values()]) {
      expect(told).not.toContain(decodeURIComponent(value).split(".")[0]);
    }
  });

  it("DELETE /api/me/sessions/:session ends that one at once", async () => {
    const { desk, away, list } = await twoDevices();
    const other = (await list()).find((each) => !each.isThisDevice);
    expect((await desk.send("DELETE", `/api/me/sessions/${other?.id}`)).status).toBe(200);
    expect(await away.me()).toBeNull();
    expect(await desk.me()).not.toBeNull();
    expect((await desk.send("DELETE", `/api/me/sessions/${other?.id}`)).status).toBe(404);
  });

  it("DELETE /api/me/sessions/:session ends nobody else's", async () => {
    const { app, desk, list } = await twoDevices();
    const stranger = await signedInBrowser(app, lise);
    for (const { id } of await list()) {
      expect((await stranger.send("DELETE", `/api/me/sessions/${id}`)).status).toBe(404);
    }
    expect(await desk.me()).not.toBeNull();
  });

  it("DELETE /api/me/sessions ends all but this one", async () => {
    const { desk, away } = await twoDevices();
    const { body } = await desk.send("DELETE", "/api/me/sessions");
    expect(body).toMatchObject({ sessions: [{ isThisDevice: true }] });
    expect(await away.me()).toBeNull();
    expect(await desk.me()).not.toBeNull();
  });
});

describe("GET /api/demo-sign-ins", () => {
  it("is empty without the demo, and passes on what the demo gives", async () => {
    const bare = await startAccountApp();
    expect((await bare.browser().get("/api/demo-sign-ins")).body).toEqual({ signIns: [] });
    const signIns = [{ name: "Tam", email: "t@x.example", password: "p", what: "reader" }];
    const demo = await startAccountApp({ demoSignIns: () => signIns });
    expect((await demo.browser().get("/api/demo-sign-ins")).body).toEqual({ signIns });
  });
});

import { createHmac, scryptSync } from "node:crypto";
import { request } from "node:http";
import { eq } from "drizzle-orm";
import { describe, expect, it } from "vitest";
import { accounts, sessions, users, verifications } from "#server/db/schema/accounts.ts";
import { maren, signedInBrowser, startAccountApp } from "./account-app.ts";

const newPassword = "a longer new one";
const signIn = "/api/auth/sign-in/email";

describe("POST /api/auth/sign-up/email", () => {
  it("makes a reader with a handle from the name, and leaves role and handle to us", async () => {
    const app = await startAccountApp();
    const { status } = await app.browser().post("/api/auth/sign-up/email", {
      ...maren,
      name: "  Maren Holt ",
      image: "https://elsewhere.example/picture.png",
    });
    expect(status).toBe(200);
    const [row] = app.database.select().from(users).all();
    expect(row).toMatchObject({ name: "Maren Holt", handle: "maren-holt", role: "reader", units: "mm" });
    expect(row).toMatchObject({ emailVerified: false, image: null });
    // RFC 9562, section 5.7: the version digit of a time-ordered UUID is 7.
    expect(row?.id).toMatch(/^[0-9a-f]{8}-[0-9a-f]{4}-7/);
  });

  it("refuses a role or a handle of the caller's own", async () => {
    const app = await startAccountApp();
    for (const extra of [{ role: "administrator" }, { handle: "somebody" }]) {
      const { status } = await app.browser().post("/api/auth/sign-up/email", { ...maren, ...extra });
      expect(status).toBe(400);
    }
    expect(app.database.select().from(users).all()).toEqual([]);
  });

  it("numbers the handle of a second person with the same name, and finds one for a name without letters", async () => {
    const app = await startAccountApp();
    for (const [name, email] of [
      ["Maren Holt", "a@x.example"],
      ["Maren Holt", "b@x.example"],
      ["★", "c@x.example"],
    ]) {
      await app.browser().post("/api/auth/sign-up/email", { name, email, password: maren.password });
    }
    const handles = app.database.select({ handle: users.handle }).from(users).all();
    expect(handles.map((each) => each.handle).sort()).toEqual(["maker", "maren-holt", "maren-holt-2"]);
  });

  it("takes ten characters and nothing shorter, and no empty or endless name", async () => {
    const app = await startAccountApp();
    const post = (change: object) => app.browser().post("/api/auth/sign-up/email", { ...maren, ...change });
    expect(await post({ password: "nine char" })).toMatchObject({
      status: 400,
      body: { code: "PASSWORD_TOO_SHORT" },
    });
    expect(await post({ name: "  " })).toMatchObject({
      status: 400,
      body: { code: "INVALID_NAME", message: "Display name is missing." },
    });
    expect(await post({ name: "x".repeat(61) })).toMatchObject({ status: 400 });
    expect(await post({ password: "ten chars!" })).toMatchObject({ status: 200 });
  });

  it("keeps the password only through scrypt, at no less than OWASP's lowest setting", async () => {
    const app = await startAccountApp();
    await app.browser().post("/api/auth/sign-up/email", maren);
    const stored = app.database.select().from(accounts).all()[0]?.password ?? "";
    const [salt = "", key = ""] = stored.split(":");
    // OWASP Password Storage Cheat Sheet (from memory): scrypt N = 2^14 needs r = 8 and p = 5 or as much
    // work; here N = 2^14, r = 16, p = 1 takes 128·N·r = 32 MiB. Worked out afresh with Node's own scrypt.
    const again = scryptSync(maren.password, salt, 64, { N: 16384, r: 16, p: 1, maxmem: 64 * 2 ** 20 });
    expect(key).toBe(again.toString("hex"));
    expect(salt).toHaveLength(32);
    expect(128 * 16384 * 16).toBeGreaterThanOrEqual(32 * 2 ** 20);
  });

  it("answers for a taken address as for a new one, and tells the owner by letter", async () => {
    const app = await startAccountApp();
    const fresh = await app.browser().post("/api/auth/sign-up/email", maren);
    const other = { ...maren, name: "Somebody Else", password: "another password" };
    const taken = await app.browser().post("/api/auth/sign-up/email", other);
    const shape = (answer: typeof fresh) => {
      const { user, ...rest } = answer.body as { user: Record<string, unknown> };
      return {
        status: answer.status,
        rest,
        fields: Object.keys(user).sort(),
        cookies: answer.headers.getSetCookie(),
      };
    };
    expect(shape(taken)).toEqual(shape(fresh));
    expect((taken.body as { user: object }).user).toMatchObject({
      name: "Somebody Else",
      email: maren.email,
    });
    expect((fresh.body as { user: object }).user).toMatchObject({ role: "reader", units: "mm" });
    const [letter] = await app.letters();
    expect(letter).toMatchObject({ to: maren.email, subject: "Soapstone: You already have an account" });
    expect(app.database.select().from(users).all()).toHaveLength(1);
    expect((await app.browser().post(signIn, { email: maren.email, password: other.password })).status).toBe(
      401,
    );
  });
});

describe("GET /api/auth/verify-email", () => {
  it("confirms the address with the token from the letter", async () => {
    const app = await startAccountApp();
    const browser = await signedInBrowser(app, maren, { verified: false });
    expect(await browser.me()).toMatchObject({ emailVerified: false });
    const token = await app.tokenFor(maren.email);
    const { status, headers } = await browser.get(
      `/api/auth/verify-email?token=${token}&callbackURL=${encodeURIComponent("/verify-email?confirmed=1")}`,
    );
    expect([status, headers.get("location")]).toEqual([302, "/verify-email?confirmed=1"]);
    expect(await browser.me()).toMatchObject({ emailVerified: true });
  });

  it("refuses a token that was tampered with, and one signed by another key", async () => {
    const app = await startAccountApp();
    const browser = await signedInBrowser(app, maren, { verified: false });
    const token = await app.tokenFor(maren.email);
    const [head, claims] = token.split(".");
    const forged = createHmac("sha256", "another key").update(`${head}.${claims}`).digest("base64url");
    for (const wrong of [`${token.slice(0, -4)}AAAA`, `${head}.${claims}.${forged}`, "rubbish", ""]) {
      const { status } = await browser.get(`/api/auth/verify-email?token=${wrong}`);
      expect(status).toBe(401);
    }
    expect(await browser.me()).toMatchObject({ emailVerified: false });
  });

  it("sends nobody to another site", async () => {
    const app = await startAccountApp();
    await app.browser().post("/api/auth/sign-up/email", maren);
    const token = await app.tokenFor(maren.email);
    for (const away of ["https://evil.example/", "//evil.example", "/\\evil.example"]) {
      const path = `/api/auth/verify-email?token=${token}&callbackURL=${encodeURIComponent(away)}`;
      expect((await app.browser().get(path)).status).toBe(403);
    }
  });
});

describe("POST /api/auth/sign-in/email", () => {
  it("sets an HTTP-only, SameSite=Lax cookie, and no Secure on plain HTTP", async () => {
    const app = await startAccountApp();
    await app.browser().post("/api/auth/sign-up/email", maren);
    const { headers } = await app.browser().post(signIn, { email: maren.email, password: maren.password });
    const [cookie = ""] = headers.getSetCookie();
    expect(cookie).toMatch(/^soapstone\.session_token=/);
    expect(cookie).toMatch(/; HttpOnly/i);
    expect(cookie).toMatch(/; SameSite=Lax/i);
    expect(cookie).not.toMatch(/; Secure/i);
  });

  it("adds Secure, and works, when the site is on https", async () => {
    const app = await startAccountApp({ siteUrl: "https://soapstone.example" });
    const browser = await signedInBrowser(app);
    expect(await browser.me()).toMatchObject({ email: maren.email });
    const { headers } = await browser.post(signIn, { email: maren.email, password: maren.password });
    const [cookie = ""] = headers.getSetCookie();
    expect(cookie).toMatch(/^__Secure-soapstone\.session_token=.*; Secure/i);
  });

  it("answers a wrong password and an unknown address alike", async () => {
    const app = await startAccountApp();
    await app.browser().post("/api/auth/sign-up/email", maren);
    const wrong = await app.browser().post(signIn, { email: maren.email, password: "not the password" });
    const unknown = await app
      .browser()
      .post(signIn, { email: "no@one.example", password: "not the password" });
    expect([wrong.status, wrong.body]).toEqual([unknown.status, unknown.body]);
    expect(wrong.status).toBe(401);
  });

  it("refuses a foreign Origin with 403, under test too", async () => {
    const app = await startAccountApp();
    const browser = await signedInBrowser(app);
    const body = { email: maren.email, password: maren.password };
    const foreign = { origin: "https://evil.example" };
    expect((await browser.post(signIn, body, foreign)).status).toBe(403);
    expect((await app.browser().post(signIn, body, foreign)).status).toBe(403);
    expect((await browser.post("/api/auth/sign-out", {}, foreign)).status).toBe(403);
    expect(await browser.me()).not.toBeNull();
  });

  it("counts tries by the caller's true address, whatever headers claim", async () => {
    const app = await startAccountApp();
    const tries: number[] = [];
    for (let number = 0; number < 11; number += 1) {
      const forged = `203.0.113.${number}`;
      const { status } = await app
        .browser()
        .post(
          signIn,
          { email: "no@one.example", password: "not the password" },
          { "x-forwarded-for": forged, "x-soapstone-address": forged, "x-real-ip": forged },
        );
      tries.push(status);
    }
    expect(tries.slice(0, 10)).toEqual(Array(10).fill(401));
    expect(tries[10]).toBe(429);
  });
});

describe("POST /api/auth/sign-out", () => {
  it("ends the session on the server, not only in the browser", async () => {
    const app = await startAccountApp();
    const browser = await signedInBrowser(app);
    const kept = new Map(browser.cookies);
    await browser.post("/api/auth/sign-out", {});
    expect(await browser.me()).toBeNull();
    for (const [name, value] of kept) browser.cookies.set(name, value);
    expect(await browser.me()).toBeNull();
  });
});

describe("POST /sign-out", () => {
  it("signs out from a plain form and leads to the front page", async () => {
    const app = await startAccountApp();
    const browser = await signedInBrowser(app);
    const kept = new Map(browser.cookies);
    const { status, headers } = await browser.send("POST", "/sign-out");
    expect([status, headers.get("location")]).toEqual([303, "/"]);
    expect(browser.cookies.size).toBe(0);
    for (const [name, value] of kept) browser.cookies.set(name, value);
    expect(await browser.me()).toBeNull();
  });
});

describe("POST /api/auth/reset-password", () => {
  it("sets the password once per token, and ends every session", async () => {
    const app = await startAccountApp();
    const browser = await signedInBrowser(app);
    await app.browser().post("/api/auth/request-password-reset", { email: maren.email });
    const stored = app.database.select().from(verifications).all();
    const token = await app.tokenFor(maren.email);
    expect(JSON.stringify(stored)).not.toContain(token);
    const reset = (password: string) =>
      app.browser().post("/api/auth/reset-password", { token, newPassword: password });
    expect((await reset(newPassword)).status).toBe(200);
    expect(await reset("yet another one")).toMatchObject({ status: 400, body: { code: "INVALID_TOKEN" } });
    expect(await browser.me()).toBeNull();
    const email = maren.email;
    expect((await app.browser().post(signIn, { email, password: maren.password })).status).toBe(401);
    expect((await app.browser().post(signIn, { email, password: newPassword })).status).toBe(200);
  });

  it("does not tell whether an address has an account", async () => {
    const app = await startAccountApp();
    await app.browser().post("/api/auth/sign-up/email", maren);
    const path = "/api/auth/request-password-reset";
    const known = await app.browser().post(path, { email: maren.email });
    const unknown = await app.browser().post(path, { email: "no@one.example" });
    expect([known.status, known.body]).toEqual([unknown.status, unknown.body]);
    expect((await app.letters()).map((letter) => letter.to)).toEqual([maren.email, maren.email]);
  });

  it("refuses a token after an hour", async () => {
    const app = await startAccountApp();
    await app.browser().post("/api/auth/sign-up/email", maren);
    await app.browser().post("/api/auth/request-password-reset", { email: maren.email });
    const [row] = app.database.select().from(verifications).all();
    const inHours = ((row?.expiresAt.getTime() ?? 0) - Date.now()) / 3600_000;
    expect(inHours).toBeGreaterThan(0.99);
    expect(inHours).toBeLessThanOrEqual(1);
    app.database
      .update(verifications)
      .set({ expiresAt: new Date(Date.now() - 1) })
      .run();
    const token = await app.tokenFor(maren.email);
    const { status } = await app.browser().post("/api/auth/reset-password", { token, newPassword });
    expect(status).toBe(400);
  });
});

describe("POST /api/auth/change-password", () => {
  it("asks for the present password and ends the other sessions", async () => {
    const app = await startAccountApp();
    const browser = await signedInBrowser(app);
    const other = app.browser();
    await other.post(signIn, { email: maren.email, password: maren.password });
    const change = (currentPassword: string) =>
      browser.post("/api/auth/change-password", { currentPassword, newPassword, revokeOtherSessions: true });
    expect((await change("not the password")).status).toBe(400);
    expect(await other.me()).not.toBeNull();
    expect((await change(maren.password)).status).toBe(200);
    expect(await other.me()).toBeNull();
    expect(await browser.me()).not.toBeNull();
  });

  it("ends the other sessions even when the caller does not ask for it", async () => {
    const app = await startAccountApp();
    const browser = await signedInBrowser(app);
    const other = app.browser();
    await other.post(signIn, { email: maren.email, password: maren.password });
    await browser.post("/api/auth/change-password", { currentPassword: maren.password, newPassword });
    expect(await other.me()).toBeNull();
  });
});

describe("POST /api/auth/change-email", () => {
  const newEmail = "maren@new.example";
  const path = "/api/auth/change-email";

  it("asks for the password", async () => {
    const app = await startAccountApp();
    const browser = await signedInBrowser(app);
    for (const password of ["not the password", undefined]) {
      expect(await browser.post(path, { newEmail, password })).toMatchObject({
        status: 400,
        body: { code: "INVALID_PASSWORD" },
      });
    }
    expect((await app.letters()).map((letter) => letter.to)).not.toContain(newEmail);
  });

  it("changes a confirmed address only from a letter to the new one, and tells the old one", async () => {
    const app = await startAccountApp();
    const browser = await signedInBrowser(app);
    expect((await browser.post(path, { newEmail, password: maren.password })).status).toBe(200);
    expect(await browser.me()).toMatchObject({ email: maren.email, emailVerified: true });
    const letters = await app.letters();
    const told = letters.find((each) => each.to === maren.email);
    expect(told).toMatchObject({ subject: "Soapstone: Your address is to be changed" });
    expect(told?.text).toContain(newEmail);
    expect(told?.text).not.toContain("verify-email");
    await app.browser().get(`/api/auth/verify-email?token=${await app.tokenFor(newEmail)}`);
    expect(await browser.me()).toMatchObject({ email: newEmail, emailVerified: true });
  });

  it("drops a pending change once the password is set anew", async () => {
    const app = await startAccountApp();
    const browser = await signedInBrowser(app);
    await browser.post(path, { newEmail, password: maren.password });
    const token = await app.tokenFor(newEmail);
    await app.browser().post("/api/auth/request-password-reset", { email: maren.email });
    const reset = await app.tokenFor(maren.email);
    // Tokens carry whole seconds: the reset comes in a later one.
    app.database
      .update(accounts)
      .set({ updatedAt: new Date(0) })
      .run();
    await new Promise((resolve) => setTimeout(resolve, 1100));
    await app.browser().post("/api/auth/reset-password", { token: reset, newPassword });
    const { headers } = await app.browser().get(`/api/auth/verify-email?token=${token}`);
    expect(headers.get("location")).toContain("error=INVALID_TOKEN");
    expect(app.database.select().from(users).all()).toMatchObject([{ email: maren.email }]);
  });

  it("mends an unconfirmed address at once and sends the letter there", async () => {
    const app = await startAccountApp();
    const browser = await signedInBrowser(app, maren, { verified: false });
    await browser.post(path, { newEmail, password: maren.password });
    expect(await browser.me()).toMatchObject({ email: newEmail, emailVerified: false });
    await app.browser().get(`/api/auth/verify-email?token=${await app.tokenFor(newEmail)}`);
    expect(await browser.me()).toMatchObject({ email: newEmail, emailVerified: true });
  });

  it("does not tell that the new address is someone else's, and does not take it", async () => {
    const app = await startAccountApp();
    const browser = await signedInBrowser(app);
    const lise = { name: "Lise Brandt", email: newEmail, password: "ten characters" };
    await app.browser().post("/api/auth/sign-up/email", lise);
    expect((await browser.post(path, { newEmail, password: maren.password })).status).toBe(200);
    expect(await browser.me()).toMatchObject({ email: maren.email });
  });
});

describe("serveAuth", () => {
  it("opens only what we use of the library", async () => {
    const app = await startAccountApp();
    const browser = await signedInBrowser(app);
    const shut = ["update-user", "delete-user", "revoke-sessions", "link-social", "sign-in/social"];
    for (const path of shut) expect((await browser.post(`/api/auth/${path}`, {})).status).toBe(404);
    expect((await browser.get("/api/auth/list-sessions")).status).toBe(404);
    expect((await browser.get("/api/auth/get-session")).status).toBe(404);
  });

  it("refuses a body of more than 32 kB, and one that does not say its length", async () => {
    const app = await startAccountApp();
    const long = { ...maren, name: "x".repeat(40_000) };
    expect((await app.browser().post("/api/auth/sign-up/email", long)).status).toBe(413);
    const url = `${app.address}/api/auth/sign-up/email`;
    const headers = { "content-type": "application/json", "transfer-encoding": "chunked" };
    const status = await new Promise((resolve) => {
      const sending = request(url, { method: "POST", headers }, (answer) => resolve(answer.statusCode));
      sending.end(JSON.stringify(maren));
    });
    expect(status).toBe(413);
  });
});

describe("sessionMiddleware", () => {
  it("takes nobody for signed in on a forged or run-out cookie", async () => {
    const app = await startAccountApp();
    const browser = await signedInBrowser(app);
    const [[name = "", value = ""] = []] = browser.cookies;
    const forger = app.browser();
    forger.cookies.set(name, `${value.slice(0, 20)}${"A".repeat(value.length - 20)}`);
    expect(await forger.me()).toBeNull();
    app.database
      .update(sessions)
      .set({ expiresAt: new Date(Date.now() - 1000) })
      .run();
    expect(await browser.me()).toBeNull();
  });

  it("sees a changed role at the next request", async () => {
    const app = await startAccountApp();
    const browser = await signedInBrowser(app);
    app.database.update(users).set({ role: "moderator" }).where(eq(users.email, maren.email)).run();
    expect(await browser.me()).toMatchObject({ role: "moderator" });
  });
});

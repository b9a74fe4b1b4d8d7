import { type APIRequestContext, expect, type Page, test } from "@playwright/test";

const someone = { name: "Edda Quill", email: "edda@workshop.example", password: "scriber-line-27-Wren" };

/** Where the newest letter to this address leads. */
async function linkInLetter(request: APIRequestContext, to: string): Promise<string> {
  let link = "";
  await expect(async () => {
    const list = await (await request.get("/dev/mail")).text();
    const [, id] = /href="(\/dev\/mail\/[^"#]+)"/.exec(list.slice(list.indexOf(to) - 2000)) ?? [];
    const letter = await (await request.get(id ?? "")).text();
    expect(letter).toContain(to);
    [link = ""] = /http:\/\/localhost:\d+\/verify-email\?token=[\w.-]+/.exec(letter) ?? [];
    expect(link).not.toBe("");
  }).toPass({ timeout: 15_000 });
  return link;
}

async function openAccount(page: Page): Promise<void> {
  await page.goto("/sign-up");
  await page.getByLabel("Display name").fill(someone.name);
  await page.getByLabel("E-mail address").fill(someone.email);
  await page.getByLabel("Password", { exact: true }).fill(someone.password);
  await page.getByRole("button", { name: "Open the account" }).click();
  await expect(page.getByText(someone.email).first()).toBeVisible();
  await page.goto(await linkInLetter(page.request, someone.email));
  await page.getByRole("button", { name: "Confirm this address" }).click();
  await expect(page.getByRole("heading", { level: 1 })).toContainText(/confirmed/i);
}

async function signIn(page: Page): Promise<void> {
  await page.goto("/sign-in?next=/workshop");
  await page.getByLabel("E-mail address").fill(someone.email);
  await page.getByLabel("Password", { exact: true }).fill(someone.password);
  await page.getByRole("button", { name: "Sign in" }).click();
  await expect(page).toHaveURL("/workshop");
}

test.setTimeout(150_000);

test("a newcomer starts a build and publishes an entry with a photo and a working; anyone reads and prints it", async ({
  page,
  browser,
  baseURL,
}) => {
  await openAccount(page);
  await signIn(page);

  await page.getByRole("link", { name: "Start a build" }).first().click();
  await page.getByLabel("Title").fill("Bench crane");
  await page.getByLabel("Purpose").fill("A small crane for the end of the bench.");
  await page.getByRole("button", { name: "Start the build" }).click();
  await page.getByLabel("A new stage").fill("Jib");
  await page.getByRole("button", { name: "Add the stage" }).click();
  await page
    .getByRole("link", { name: /Write an entry/ })
    .or(page.getByRole("button", { name: /Write an entry/ }))
    .first()
    .click();

  const text = page.getByRole("textbox", { name: "Text of the entry" });
  await expect(text).toBeVisible();
  await page.getByLabel("Title", { exact: true }).fill("The jib meets the post");
  await text.focus();
  await page.keyboard.type("The jib comes in at sixty degrees.\n");
  await page.keyboard.press("Alt+Shift+KeyW");
  await page.getByRole("dialog", { name: "Put in a working" }).waitFor();
  await page.keyboard.press("Enter");
  const angle = page.getByLabel(/^Angle between the axes/);
  await angle.fill("90");
  const chosen = page.waitForEvent("filechooser");
  await text.focus();
  await page.keyboard.press("Alt+Shift+KeyP");
  await (await chosen).setFiles("server/demo/photos/cope-angle.jpg");
  await page.getByLabel("What the photo shows").fill("The end of the jib, coped.");
  await expect(
    page
      .locator("output")
      .filter({ hasText: /^Saved \d\d:\d\d$/ })
      .first(),
  ).toBeVisible({ timeout: 20_000 });
  await page.getByRole("button", { name: "Publish", exact: true }).click();
  await expect(page.getByText("The entry is public.")).toBeVisible();

  const reader = await browser.newContext({ baseURL: baseURL ?? "", javaScriptEnabled: false });
  const reading = await reader.newPage();
  // Until its pictures are made, which may wait for those of the demo, a photo is told of in words.
  await expect(async () => {
    await reading.goto("/builds/bench-crane/entries/the-jib-meets-the-post");
    await expect(reading.getByText("The jib comes in at sixty degrees.")).toBeVisible();
    await expect(reading.getByRole("img", { name: "The end of the jib, coped." })).toBeVisible({
      timeout: 500,
    });
  }).toPass({ timeout: 60_000 });
  await expect(reading.getByText("W1").first()).toBeVisible();
  const template = await reading.getByRole("link", { name: "PDF, A4" }).getAttribute("href");
  const pdf = await reader.request.get(template ?? "");
  expect(pdf.headers()["content-type"]).toBe("application/pdf");
  expect((await pdf.body()).subarray(0, 5).toString()).toBe("%PDF-");
  await reader.close();
});

test("a forgotten password is set anew by the letter, and the old one is no use", async ({ page }) => {
  await page.goto("/forgot-password");
  await page.getByLabel("E-mail address").fill("pia@lindgren.example");
  await page.getByRole("button", { name: /letter|link|send/i }).click();
  let link = "";
  await expect(async () => {
    const list = await (await page.request.get("/dev/mail")).text();
    const ids = [...list.matchAll(/href="(\/dev\/mail\/[0-9a-f-]{36})"/g)].map((match) => match[1] ?? "");
    const letters = await Promise.all(ids.map(async (id) => (await page.request.get(id)).text()));
    const letter = letters.find((each) => each.includes("pia@lindgren.example")) ?? "";
    [link = ""] = /http:\/\/localhost:\d+\/[^"\s<>]*reset-password[^"\s<>]*/.exec(letter) ?? [];
    expect(link).not.toBe("");
  }).toPass({ timeout: 15_000 });
  await page.goto(link.replaceAll("&amp;", "&"));
  await page.getByLabel(/^New password/).fill("a-new-shim-12-Teal");
  await page
    .getByRole("button", { name: /password/i })
    .last()
    .click();
  await page.waitForURL(/sign-in|reset-password/);
  const headers = { Origin: new URL(page.url()).origin };
  const tryPassword = (password: string) =>
    page.request.post("/api/auth/sign-in/email", {
      data: { email: "pia@lindgren.example", password },
      headers,
    });
  await expect(async () => expect((await tryPassword("a-new-shim-12-Teal")).status()).toBe(200)).toPass({
    timeout: 10_000,
  });
  expect((await tryPassword("brass-shim-46-Dunlin")).status()).toBe(401);
});

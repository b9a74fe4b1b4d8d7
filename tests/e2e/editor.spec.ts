import AxeBuilder from "@axe-core/playwright";
import { type BrowserContext, expect, type Page, test } from "@playwright/test";

type Cookies = Awaited<ReturnType<BrowserContext["cookies"]>>;

const picture = "server/demo/photos/cope-90.jpg";
let cookies: Cookies;

test.beforeAll(async ({ browser, baseURL }) => {
  const context = await browser.newContext({ baseURL: baseURL ?? "" });
  const answer = await context.request.post("/api/auth/sign-in/email", {
    data: { email: "maren@lowbarn.example", password: "vee-block-71-Kestrel" },
    headers: { Origin: baseURL ?? "" },
  });
  expect(answer.ok()).toBe(true);
  cookies = await context.cookies();
  await context.close();
});

test.beforeEach(async ({ context }) => context.addCookies(cookies));

/** A draft in the first stage of a build; answers its id. */
async function beginDraft(page: Page, baseURL: string | undefined, title = ""): Promise<string> {
  const headers = { Origin: baseURL ?? "" };
  const build = await (await page.request.get("/api/workshop/builds/heron")).json();
  const data = { stageId: build.stages[0].id, title };
  const answer = await page.request.post("/api/builds/heron/entries", { data, headers });
  expect(answer.status()).toBe(201);
  return (await answer.json()).id;
}

async function openEditor(page: Page, id: string): Promise<void> {
  await page.goto(`/workshop/entries/${id}`);
  await expect(text(page)).toBeVisible();
}

const text = (page: Page) => page.getByRole("textbox", { name: "Text of the entry" });
const saveState = (page: Page) =>
  page
    .locator("output")
    .filter({ hasText: /saved|saving/i })
    .first();
const saved = (page: Page) => expect(saveState(page)).toHaveText(/^Saved \d\d:\d\d$/, { timeout: 15_000 });

async function draftOf(page: Page, id: string) {
  return (await page.request.get(`/api/entries/${id}/draft`)).json();
}

async function expectNoSideScroll(page: Page): Promise<void> {
  const over = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
  expect(over).toBeLessThanOrEqual(0);
}

/** Cuts a page off from saving; what it answers joins it up again. */
async function loseConnection(page: Page): Promise<() => Promise<void>> {
  const path = "**/api/entries/*/draft";
  await page.route(path, (route) => (route.request().method() === "PUT" ? route.abort() : route.continue()));
  return () => page.unroute(path);
}

test("an entry is written by keyboard alone, kept, and published", async ({ page, baseURL }) => {
  // On a freshly loaded demo the demo's own photos are made ready first.
  test.setTimeout(180_000);
  const id = await beginDraft(page, baseURL);
  await openEditor(page, id);
  await page.getByLabel("Title", { exact: true }).focus();
  await page.keyboard.type("A cope by keyboard");
  await text(page).focus();
  await page.keyboard.type("## Marking out\nMark the datum first.\n");
  await page.keyboard.press("Control+Shift+Digit7");
  await page.keyboard.type("Saw\nFile\n\n");
  await page.keyboard.press("Alt+Shift+KeyC");
  await page.keyboard.type("Wear a face shield.\n\n");
  await page.keyboard.press("Alt+Shift+KeyW");
  await expect(page.getByRole("dialog", { name: "Put in a working" })).toBeVisible();
  await page.keyboard.press("Enter");
  await expect(page.getByText("Deepest cut").first()).toBeVisible();
  await expect(text(page)).toBeFocused();
  const chosen = page.waitForEvent("filechooser");
  await page.keyboard.press("Alt+Shift+KeyP");
  await (await chosen).setFiles(picture);
  await expect(page.getByRole("button", { name: "Take the photo out" })).toBeVisible({ timeout: 20_000 });
  await saved(page);
  await expect(page.getByText(/^Working W\d+$/)).toBeVisible();

  await page.reload();
  await expect(page.getByLabel("Title", { exact: true })).toHaveValue("A cope by keyboard");
  await expect(text(page).getByRole("heading", { name: "Marking out" })).toBeVisible();
  await expect(text(page).locator("> ol > li")).toHaveText(["Saw", "File"]);
  await expect(text(page).locator("> aside")).toContainText("Wear a face shield.");
  await expect(text(page).getByRole("button", { name: "Take the working out" })).toBeVisible();

  await page.getByRole("button", { name: "Publish", exact: true }).click();
  await expect(page.getByRole("alert")).toContainText("no description");
  await page.getByLabel("What the photo shows").fill("A tube end coped to sit square on another.");
  await saved(page);
  const joint = page.getByRole("img", { name: "A tube end coped to sit square on another." });
  await expect(joint).toBeVisible({ timeout: 120_000 });
  await page.getByRole("button", { name: "Publish", exact: true }).click();
  await expect(page.getByText("The entry is public.")).toBeVisible();
  await page.getByRole("link", { name: "See it as readers do" }).click();
  await expect(page.getByRole("heading", { level: 1, name: "A cope by keyboard" })).toBeVisible();
  await expect(joint).toBeVisible();
});

test("Escape leads from the text to the tools and back, and arrows from tool to tool", async ({
  page,
  baseURL,
}) => {
  await openEditor(page, await beginDraft(page, baseURL));
  await text(page).focus();
  await page.keyboard.type("rivet");
  await page.keyboard.press("Shift+Home");
  await page.keyboard.press("Escape");
  await expect(page.getByRole("button", { name: "Put in a working" })).toBeFocused();
  await page.keyboard.press("ArrowDown");
  await expect(page.getByRole("button", { name: "Put in photos", exact: true })).toBeFocused();
  await page.getByRole("button", { name: "Bold" }).focus();
  await page.keyboard.press("Enter");
  await expect(text(page)).toBeFocused();
  await expect(text(page).locator("strong")).toHaveText("rivet");
  await expect(page.getByRole("button", { name: "Bold" })).toHaveAttribute("aria-pressed", "true");
  for (const keys of ["Control+KeyK", "Control+Slash"]) {
    await page.keyboard.press(keys);
    await expect(page.getByRole("dialog")).toBeVisible();
    await page.keyboard.press("Escape");
    await expect(page.getByRole("dialog")).toHaveCount(0);
    await expect(text(page)).toBeFocused();
  }
});

test("a link is refused beside its field until it leads somewhere allowed", async ({ page, baseURL }) => {
  const id = await beginDraft(page, baseURL, "Links");
  await openEditor(page, id);
  await text(page).focus();
  await page.keyboard.type("the drawing");
  await page.keyboard.press("Shift+Home");
  await page.keyboard.press("Control+KeyK");
  await page.keyboard.type("javascript:alert(1)");
  await page.keyboard.press("Enter");
  await expect(page.getByLabel("Address", { exact: true })).toHaveAttribute("aria-invalid", "true");
  await page.getByLabel("Address", { exact: true }).fill("example.org/drawing");
  await page.keyboard.press("Enter");
  await expect(text(page).getByRole("link", { name: "the drawing" })).toHaveAttribute(
    "href",
    "https://example.org/drawing",
  );
  await saved(page);
});

test("a working keeps what was typed and saves only numbers that come out", async ({ page, baseURL }) => {
  const id = await beginDraft(page, baseURL, "Numbers");
  await openEditor(page, id);
  await text(page).focus();
  await page.keyboard.press("Alt+Shift+KeyW");
  await page
    .getByRole("dialog")
    .getByRole("button", { name: /Saddle cope/ })
    .click();
  const angle = page.getByRole("textbox", { name: /^Angle/ });
  await angle.fill("70");
  await saved(page);
  expect((await draftOf(page, id)).document.content[0].attrs.inputs.angle).toBe(70);
  await angle.fill("7000");
  await expect(angle).toHaveAttribute("aria-invalid", "true");
  await page.waitForTimeout(1500);
  await expect(angle).toHaveValue("7000");
  expect((await draftOf(page, id)).document.content[0].attrs.inputs.angle).toBe(70);
});

test("photos come in side by side, are turned, and an upload that fails is tried again", async ({
  page,
  baseURL,
}) => {
  const id = await beginDraft(page, baseURL, "Photos");
  await openEditor(page, id);
  await text(page).focus();
  await page.route("**/api/photos", (route) => route.abort());
  const chosen = page.waitForEvent("filechooser");
  await page.keyboard.press("Alt+Shift+KeyG");
  await (await chosen).setFiles([picture, "server/demo/photos/cope-angle.jpg"]);
  const again = page.getByRole("button", { name: "Send it again" });
  await expect(again).toHaveCount(2);
  await page.unroute("**/api/photos");
  await again.first().click();
  await again.first().click();
  await expect(page.getByText("2 photos side by side")).toBeVisible({ timeout: 30_000 });
  await page.getByRole("checkbox", { name: "It is only decoration" }).first().check();
  await page.getByRole("button", { name: "Turn the photo to the right" }).first().click();
  await expect
    .poll(async () => {
      const { document, photos } = await draftOf(page, id);
      const [first] = document.content[0].content ?? [];
      return [document.content[0].type, first?.attrs.alt, photos[first?.attrs.photoId]?.rotation];
    })
    .toEqual(["photoGroup", "", 90]);
  await page.getByRole("button", { name: "Take the photo out" }).first().click();
  await expect(page.getByText("2 photos side by side")).toHaveCount(0);
  await expect(page.getByRole("button", { name: "Take the photo out" })).toHaveCount(1);
});

test("what is pasted from elsewhere loses its scripts and styles but not its words", async ({
  page,
  baseURL,
}) => {
  const id = await beginDraft(page, baseURL, "Pasted");
  await openEditor(page, id);
  await text(page).focus();
  await page.evaluate(() => {
    const data = new DataTransfer();
    const html =
      '<h1 onclick="alert(1)">Fit-up</h1><p style="color:red">Tack <a href="javascript:alert(1)">here</a></p><script>alert(1)</script><iframe src="https://example.org"></iframe>';
    data.setData("text/html", html);
    document.activeElement?.dispatchEvent(
      new ClipboardEvent("paste", { clipboardData: data, bubbles: true, cancelable: true }),
    );
  });
  await expect(text(page).getByRole("heading", { level: 2, name: "Fit-up" })).toBeVisible();
  await saved(page);
  const { document } = await draftOf(page, id);
  expect(document.content).toEqual([
    { type: "heading", attrs: { level: 2 }, content: [{ type: "text", text: "Fit-up" }] },
    { type: "paragraph", content: [{ type: "text", text: "Tack here" }] },
  ]);
});

test("two tabs on one draft: a warning, a choice, and nothing lost by merging", async ({
  page,
  context,
  baseURL,
}) => {
  const id = await beginDraft(page, baseURL, "Two tabs");
  await openEditor(page, id);
  await text(page).focus();
  await page.keyboard.type("First part\nSecond part");
  await saved(page);
  const other = await context.newPage();
  await openEditor(other, id);
  await expect(other.getByText("Open twice")).toBeVisible();
  await expect(page.getByText("Open twice")).toBeVisible();

  const restore = await loseConnection(other);
  await text(other).locator("p").first().click();
  await other.keyboard.press("End");
  await other.keyboard.type(" from the other tab");
  await expect(saveState(other)).toHaveText("Not saved: kept on this device");
  await page.bringToFront();
  await text(page).locator("p").first().click();
  await page.keyboard.press("End");
  await page.keyboard.type(" from the first tab");
  await text(page).locator("p").nth(1).click();
  await page.keyboard.press("End");
  await page.keyboard.type(", longer");
  await expect.poll(async () => JSON.stringify((await draftOf(page, id)).document)).toContain(", longer");
  await saved(page);
  await restore();
  await other.bringToFront();
  const choice = other.getByRole("dialog", { name: "This entry was changed somewhere else" });
  await expect(choice).toBeVisible({ timeout: 20_000 });
  await choice.getByRole("button", { name: "Merge" }).click();
  await saved(other);
  for (const words of [
    "First part from the other tab",
    "First part from the first tab",
    "Second part, longer",
  ]) {
    await expect(text(other)).toContainText(words);
  }
});

test("words that never reached the server are offered again after a crash", async ({
  page,
  context,
  baseURL,
}) => {
  const id = await beginDraft(page, baseURL, "Before the crash");
  await openEditor(page, id);
  // The whole browser, as a closing page makes one last request that a route no longer catches.
  await context.setOffline(true);
  await text(page).focus();
  await page.keyboard.type("Nine tacks, all round.");
  await expect(saveState(page)).toHaveText("Not saved: kept on this device");
  await page.close();
  await context.setOffline(false);
  const later = await context.newPage();
  await openEditor(later, id);
  await expect(later.getByText("Words found again")).toBeVisible();
  await later.getByRole("button", { name: "Put them back" }).click();
  await expect(text(later)).toContainText("Nine tacks, all round.");
  await saved(later);
  expect(JSON.stringify((await draftOf(later, id)).document)).toContain("Nine tacks, all round.");
});

test("an entry is scheduled, published, brought back from its history, and withdrawn", async ({
  page,
  baseURL,
}) => {
  const id = await beginDraft(page, baseURL, "Scheduled");
  await openEditor(page, id);
  await text(page).focus();
  await page.keyboard.type("Older words.");
  await saved(page);
  await page.getByRole("button", { name: "Publish later" }).click();
  await page.getByLabel("Date and time").fill("2001-01-01T08:00");
  await page.getByRole("button", { name: "Put it on the schedule" }).click();
  await expect(page.getByText("That time has passed.")).toBeVisible();
  const tomorrow = await page.evaluate(() => {
    const at = new Date(Date.now() + 86_400_000);
    return new Date(at.getTime() - at.getTimezoneOffset() * 60_000).toISOString().slice(0, 16);
  });
  await page.getByLabel("Date and time").fill(tomorrow);
  await page.getByRole("button", { name: "Put it on the schedule" }).click();
  await expect(page.getByText(/Published by itself on/)).toBeVisible();
  await page.getByRole("button", { name: "Take it off the schedule" }).click();
  await expect(page.getByText("Only you see it.")).toBeVisible();
  await page.getByRole("button", { name: "Publish now" }).click();
  await expect(page.getByText("The entry is public.")).toBeVisible();
  await text(page).click();
  await page.keyboard.press("Control+End");
  await page.keyboard.type(" Brazed, not welded.");
  await saved(page);
  await expect(page.getByText("Readers do not see your latest changes yet.")).toBeVisible();
  await page.getByRole("link", { name: "History" }).click();
  await expect(page.getByRole("heading", { level: 1, name: "History" })).toBeVisible();
  await page.getByRole("link", { name: /Published/ }).click();
  await page.getByRole("tab", { name: "What changed since" }).click();
  await expect(page.locator("ins")).toHaveText("Brazed, not welded.");
  await page.getByRole("button", { name: "Go back to this" }).click();
  await expect(text(page)).toContainText("Older words.");
  await expect(text(page)).not.toContainText("Brazed, not welded.");
  await page.getByRole("button", { name: "Withdraw" }).click();
  await page.getByRole("button", { name: "Withdraw the entry" }).click();
  await expect(page.getByText("Readers do not see it. They did once.")).toBeVisible();
});

test("someone else's entry is not there", async ({ browser, page, baseURL }) => {
  const id = await beginDraft(page, baseURL, "Mine");
  const context = await browser.newContext({ baseURL: baseURL ?? "" });
  const other = await context.newPage();
  await other.request.post("/api/auth/sign-in/email", {
    data: { email: "idris@pellcycles.example", password: "silver-rod-38-Lapwing" },
    headers: { Origin: baseURL ?? "" },
  });
  const answer = await other.goto(`/workshop/entries/${id}`);
  expect(answer?.status()).toBe(404);
  await expect(other.getByText("There is no such entry in your workshop.")).toBeVisible();
  await context.close();
});

for (const scheme of ["light", "dark"] as const) {
  test(`the editor and the history have no serious fault for assistive technology, ${scheme}`, async ({
    page,
    baseURL,
  }) => {
    await page.emulateMedia({ colorScheme: scheme });
    const id = await beginDraft(page, baseURL, "Checked");
    await openEditor(page, id);
    await text(page).focus();
    await page.keyboard.press("Alt+Shift+KeyW");
    await page
      .getByRole("dialog")
      .getByRole("button", { name: /Saddle cope/ })
      .click();
    await page.keyboard.press("Alt+Shift+KeyT");
    await saved(page);
    const faults = async () => {
      const { violations } = await new AxeBuilder({ page }).analyze();
      return violations
        .filter(({ impact }) => impact === "serious" || impact === "critical")
        .map((each) => `${each.id}: ${each.nodes.map((node) => node.target).join(", ")}`);
    };
    expect(await faults()).toEqual([]);
    await page.goto(`/workshop/entries/${id}/history`);
    await expect(page.getByRole("heading", { level: 1, name: "History" })).toBeVisible();
    expect(await faults()).toEqual([]);
  });
}

test.describe("on a phone", () => {
  test.use({ viewport: { width: 360, height: 740 }, hasTouch: true, isMobile: true });

  test("the tools are under the thumb and nothing runs off the screen", async ({ page, baseURL }) => {
    await openEditor(page, await beginDraft(page, baseURL, "By phone"));
    await text(page).tap();
    await page.keyboard.type("With gloves on.");
    const chosen = page.waitForEvent("filechooser");
    const photo = page.getByRole("button", { name: "Put in photos", exact: true }).filter({ visible: true });
    const box = await photo.boundingBox();
    expect(box?.y).toBeGreaterThan(650);
    expect(Math.min(box?.width ?? 0, box?.height ?? 0)).toBeGreaterThanOrEqual(44);
    await photo.tap();
    await (await chosen).setFiles(picture);
    await expect(page.getByRole("button", { name: "Take the photo out" })).toBeVisible({ timeout: 20_000 });
    await page.getByRole("button", { name: "More tools" }).tap();
    await page.getByRole("dialog").getByRole("button", { name: "Put in a table" }).tap();
    await expect(text(page).locator("table")).toBeVisible();
    await page.keyboard.type("Bar");
    await page.getByRole("button", { name: "More tools" }).tap();
    await page.getByRole("dialog").getByRole("button", { name: "Column after" }).tap();
    await expect(text(page).locator("tr").first().locator("th")).toHaveCount(4);
    await page.getByRole("button", { name: "Put in a working" }).filter({ visible: true }).tap();
    await page
      .getByRole("dialog")
      .getByRole("button", { name: /Saddle cope/ })
      .tap();
    await expect(page.getByText("Deepest cut").first()).toBeVisible();
    await expectNoSideScroll(page);
    await saved(page);
  });
});

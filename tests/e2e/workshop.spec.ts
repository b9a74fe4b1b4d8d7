import AxeBuilder from "@axe-core/playwright";
import { type BrowserContext, expect, type Page, test } from "@playwright/test";

type Cookies = Awaited<ReturnType<BrowserContext["cookies"]>>;

const widths = [1280, 360];
let cookies: Cookies;

test.beforeAll(async ({ browser, baseURL }) => {
  const context = await browser.newContext({ baseURL: baseURL ?? "" });
  const answer = await context.request.post("/api/auth/sign-in/email", {
    data: { email: "tam@okafor.example", password: "first-bead-92-Curlew" },
    headers: { Origin: baseURL ?? "" },
  });
  expect(answer.ok()).toBe(true);
  cookies = await context.cookies();
  await context.close();
});

const stages = (page: Page) => page.getByRole("list", { name: "Stages" }).getByRole("listitem");

/** Names of the stages in the order of the list. */
async function stageNames(page: Page): Promise<string[]> {
  const texts = await stages(page).locator("p:first-child").allTextContents();
  return texts.map((text) => text.trim());
}

async function addStage(page: Page, name: string): Promise<void> {
  await page.getByLabel("A new stage").fill(name);
  await page.getByRole("button", { name: "Add the stage" }).click();
  await expect(page.getByRole("button", { name: `Change ${name}` })).toBeVisible();
}

/** Starts a build by the form; its address is in the page's. */
async function startBuild(page: Page, title: string): Promise<string> {
  await page.goto("/workshop/builds/new");
  await page.getByLabel("Title").fill(title);
  await page.getByLabel("Purpose").fill("A stand for logs, with its numbers.");
  await page.getByRole("button", { name: "Start the build" }).click();
  await expect(page.getByRole("heading", { level: 1, name: title })).toBeVisible();
  return new URL(page.url()).pathname.split("/").at(-1) ?? "";
}

async function expectNoSideScroll(page: Page): Promise<void> {
  const over = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
  expect(over).toBeLessThanOrEqual(0);
}

test("the workshop sends a signed-out person to sign in and back", async ({ page }) => {
  await page.goto("/workshop");
  await expect(page).toHaveURL(/\/sign-in\?next=%2Fworkshop$/);
});

test("whoever has not confirmed the address is told so and can have the letter again", async ({
  page,
  baseURL,
}) => {
  const headers = { Origin: baseURL ?? "" };
  const person = { email: "new@workshop.example", password: "plumb-bob-44-Siskin" };
  await page.request.post("/api/auth/sign-up/email", { data: { ...person, name: "New Here" }, headers });
  await page.request.post("/api/auth/sign-in/email", { data: person, headers });
  await page.goto("/workshop");
  await expect(page.getByText("Confirm your address first")).toBeVisible();
  await expect(page.getByRole("link", { name: "Start a build" })).toHaveCount(0);
  await page.getByRole("button", { name: "Send the letter again" }).click();
  await expect(page.getByText("A new letter is on its way to new@workshop.example.")).toBeVisible();
});

for (const width of widths) {
  test.describe(`the workshop at ${width} px`, () => {
    test.use({ viewport: { width, height: 800 } });
    test.beforeEach(async ({ context }) => context.addCookies(cookies));

    test("a build is started, and what is wrong stands beside its field", async ({ page }) => {
      await page.goto("/workshop/builds/new");
      await page.getByRole("button", { name: "Start the build" }).click();
      await expect(page.getByLabel("Title")).toHaveAccessibleDescription(/The title is missing\./);
      const long = "Too long a line. ".repeat(20);
      await page.getByLabel("Title").fill(`Log stand ${width}`);
      await page.getByLabel("Purpose").fill(long);
      await page.getByRole("button", { name: "Start the build" }).click();
      await expect(page.getByLabel("Purpose")).toHaveAccessibleDescription(/at most 200 characters\.$/);
      await expect(page.getByLabel("Purpose")).toHaveValue(long);
      await page.getByLabel("Purpose").fill("Holds logs off the wet floor.");
      await page.getByRole("button", { name: "Start the build" }).click();
      await expect(page.getByRole("heading", { level: 1, name: `Log stand ${width}` })).toBeVisible();
      await expectNoSideScroll(page);
      await page.goto("/workshop");
      await expect(page.getByRole("link", { name: `Log stand ${width}`, exact: true })).toBeVisible();
      await expectNoSideScroll(page);
    });

    test("stages are added, ordered by keyboard, renamed, and kept by the server", async ({ page }) => {
      await startBuild(page, `Stages ${width}`);
      for (const name of ["Frame", "Steering", "Rear end"]) await addStage(page, name);
      expect(await stageNames(page)).toEqual(["Frame", "Steering", "Rear end"]);

      await page.getByRole("button", { name: "Move Rear end", exact: true }).focus();
      await page.keyboard.press("Space");
      await expect(page.getByText(/Rear end is (picked up at|over) place 3 of 3\./)).toBeAttached();
      await page.keyboard.press("ArrowUp");
      await expect(page.getByText("Rear end is over place 2 of 3.")).toBeAttached();
      await page.keyboard.press("Space");
      await expect.poll(() => stageNames(page)).toEqual(["Frame", "Rear end", "Steering"]);
      await expect(page.getByText("The new order is saved.")).toBeAttached();

      await page.getByRole("button", { name: "Change Steering" }).click();
      await page.getByLabel("Name").fill("");
      await page.getByRole("button", { name: "Save the stage" }).click();
      await expect(page.getByLabel("Name")).toHaveAccessibleDescription(/The stage's name is missing\./);
      await page.getByLabel("Name").fill("Steering and rack");
      await page.getByLabel("State").selectOption("Being redone");
      await page.getByRole("button", { name: "Save the stage" }).click();
      await expect(page.getByRole("dialog")).toBeHidden();
      await expect(page.getByRole("button", { name: "Change Steering and rack" })).toBeFocused();

      await page.reload();
      expect(await stageNames(page)).toEqual(["Frame", "Rear end", "Steering and rack"]);
      await expect(stages(page).nth(2)).toContainText("Being redone");
      await expectNoSideScroll(page);
    });

    test("a stage with an entry is not deleted, an empty one is", async ({ page, baseURL }) => {
      const slug = await startBuild(page, `Deleting ${width}`);
      for (const name of ["Frame", "Seat"]) await addStage(page, name);
      const own = await (await page.request.get(`/api/workshop/builds/${slug}`)).json();
      await page.request.post(`/api/builds/${slug}/entries`, {
        data: { stageId: own.stages[0].id, title: "First cuts" },
        headers: { Origin: baseURL ?? "" },
      });
      await page.reload();
      await expect(page.getByRole("link", { name: "First cuts", exact: true })).toBeVisible();

      await page.getByRole("button", { name: "Change Frame" }).click();
      await page.getByRole("button", { name: "Delete the stage…" }).click();
      await expect(page.getByRole("alert")).toContainText(
        "Frame holds 1 entry. Move it to another stage first",
      );
      await page.getByRole("button", { name: "Cancel" }).click();

      await page.getByRole("button", { name: "Change Seat" }).click();
      await page.getByRole("button", { name: "Delete the stage…" }).click();
      await page.getByRole("button", { name: "Delete Seat" }).click();
      await expect.poll(() => stageNames(page)).toEqual(["Frame"]);
      await page.reload();
      expect(await stageNames(page)).toEqual(["Frame"]);
    });

    test("a purpose that is too long is refused beside its field and stays typed", async ({ page }) => {
      await startBuild(page, `Purpose ${width}`);
      const long = "Far too long a purpose. ".repeat(12);
      await page.getByLabel("Purpose").fill(long);
      await page.getByRole("button", { name: "Save the details" }).click();
      await expect(page.getByLabel("Purpose")).toHaveAccessibleDescription(/at most 200 characters\.$/);
      await expect(page.getByLabel("Purpose")).toHaveValue(long);
      await page.getByLabel("Purpose").fill("Holds logs.");
      await page.getByRole("button", { name: "Save the details" }).click();
      await expect(page.getByText("The details are saved.")).toBeVisible();
      await page.reload();
      await expect(page.getByLabel("Purpose")).toHaveValue("Holds logs.");
    });

    test("a cover is uploaded and described", async ({ page }) => {
      await startBuild(page, `Cover ${width}`);
      await page.getByLabel("Cover photo").setInputFiles("server/demo/photos/gantry.jpg");
      await page.getByLabel("What the cover shows").fill("A gantry in a shed.");
      await page.getByRole("button", { name: "Save the description" }).click();
      await expect(page.getByRole("img", { name: "A gantry in a shed." })).toBeVisible({ timeout: 30_000 });
      await page.getByLabel("Cover photo").setInputFiles("package.json");
      await expect(page.getByRole("alert")).toContainText("package.json is not the cover");
      await expect(page.getByRole("img", { name: "A gantry in a shed." })).toBeVisible();
    });
  });
}

test.describe("one own build", () => {
  test.beforeEach(async ({ context }) => context.addCookies(cookies));

  test("an order that does not reach the server is put back with a message", async ({ page }) => {
    await startBuild(page, "Broken line");
    for (const name of ["Frame", "Seat"]) await addStage(page, name);
    await page.route("**/stages/order", (route) => route.abort());
    await page.getByRole("button", { name: "Move Seat up" }).click();
    await expect(page.getByText(/The order is as it was\. The server cannot be reached/)).toBeVisible();
    expect(await stageNames(page)).toEqual(["Frame", "Seat"]);
  });

  test("a new address takes the page along, and the old one leads to it", async ({ page }) => {
    const slug = await startBuild(page, "Moving house");
    await page.getByLabel("Last part of the address").fill("Not An Address");
    await page.getByRole("button", { name: "Change the address" }).click();
    await expect(page.getByLabel("Last part of the address")).toHaveAccessibleDescription(
      /Use small letters, digits and single hyphens\./,
    );
    await page.getByLabel("Last part of the address").fill("moved-house");
    await expect(page.getByText("Links to the old one will lead there")).toBeVisible();
    await page.getByRole("button", { name: "Change the address" }).click();
    await expect(page).toHaveURL(/\/workshop\/builds\/moved-house$/);
    await page.goto(`/workshop/builds/${slug}`);
    await expect(page).toHaveURL(/\/workshop\/builds\/moved-house$/);
  });

  test("somebody else's build is not found", async ({ page }) => {
    const answer = await page.goto("/workshop/builds/heron");
    expect(answer?.status()).toBe(404);
    await expect(page.getByRole("heading", { level: 1, name: "Nothing here" })).toBeVisible();
  });

  for (const colorScheme of ["light", "dark"] as const) {
    test(`the workshop's pages have no serious fault of access in ${colorScheme}`, async ({ page }) => {
      await page.emulateMedia({ colorScheme });
      const slug = await startBuild(page, `Checked ${colorScheme}`);
      await addStage(page, "Frame");
      for (const path of ["/workshop", "/workshop/builds/new", `/workshop/builds/${slug}`]) {
        await page.goto(path);
        const { violations } = await new AxeBuilder({ page }).analyze();
        const serious = violations.filter(({ impact }) => impact === "serious" || impact === "critical");
        expect(serious.map(({ id, nodes }) => `${id}: ${nodes[0]?.html}`)).toEqual([]);
      }
    });
  }
});

import { AxeBuilder } from "@axe-core/playwright";
import { expect, type Page, test } from "@playwright/test";

const sum = "headerOd=44.5&branchOd=38.1&branchWall=2.5&angle=60";

/** Opens the page and waits until it has come alive: what only works then is there. */
async function openAlive(page: Page, path: string): Promise<void> {
  await page.goto(path);
  await expect(page.getByRole("button", { name: "Hold these numbers to compare" })).toBeVisible();
}

/** The button is for those without JavaScript: it goes once the list answers to each key. */
async function benchIsAlive(page: Page): Promise<void> {
  await expect(page.getByLabel("What are you doing?")).toBeVisible();
  await expect(page.getByRole("button", { name: "Find" })).toHaveCount(0);
}

test.describe("the bench", () => {
  test("finds a calculator by a workshop word and opens it", async ({ page }) => {
    await page.goto("/");
    await page.getByRole("navigation", { name: "Site" }).getByRole("link", { name: "Bench" }).click();
    await benchIsAlive(page);
    await page.getByLabel("What are you doing?").fill("fishmouth");
    const list = page.getByRole("region", { name: "Joining tubes" });
    await expect(list.getByRole("link")).toHaveCount(1);
    await list.getByRole("link", { name: /Saddle cope/ }).click();
    await expect(page.getByRole("heading", { level: 1 })).toHaveText("Saddle cope");
  });

  test("says so when no calculator answers to a word, and shows all again", async ({ page }) => {
    await page.goto("/bench");
    await benchIsAlive(page);
    await page.getByLabel("What are you doing?").fill("marmalade");
    await expect(page.getByText("Nothing here for “marmalade”")).toBeVisible();
    await page.getByRole("link", { name: "Show all" }).click();
    await expect(page.getByRole("region", { name: "Bending" })).toBeVisible();
  });

  test("works a sum that is typed, says what it understood, and carries it in the address", async ({
    page,
    context,
  }) => {
    await openAlive(page, `/bench/saddle-cope?${sum}`);
    const angle = page.getByRole("textbox", { name: "Angle between the axes" });
    await expect(angle).toHaveValue("60");
    await angle.fill("90/2");
    await expect(page.getByText("= 45°")).toBeVisible();
    await expect(page).toHaveURL(/angle=45(&|$)/);
    const deepest = await page.locator("dd").first().textContent();
    const other = await context.newPage();
    await other.goto(page.url());
    await expect(other.getByRole("textbox", { name: "Angle between the axes" })).toHaveValue("45");
    await expect(other.locator("dd").first()).toHaveText(String(deepest));
    await other.goto("/bench");
    const lately = other.getByRole("region", { name: "Lately on this bench" });
    await expect(lately.getByRole("link", { name: "Saddle cope" })).toHaveAttribute("href", /angle=45/);
  });

  test("tells the limit beside the box and keeps the last good numbers", async ({ page }) => {
    await openAlive(page, `/bench/saddle-cope?${sum}`);
    const angle = page.getByRole("textbox", { name: "Angle between the axes" });
    await expect(angle).toHaveValue("60");
    await angle.fill("95");
    await expect(page.getByText("Angle between the axes must be between 15° and 90°.").first()).toBeVisible();
    await expect(angle).toHaveAttribute("aria-invalid", "true");
    await expect(angle).toHaveValue("95");
    await page.getByRole("button", { name: "Put back the first numbers" }).click();
    await expect(angle).toHaveValue("60");
    await angle.fill("50");
    await expect(page).toHaveURL(/angle=50/);
    await page.getByRole("link", { name: "Start from the example" }).click();
    await expect(page).toHaveURL(/saddle-cope$/);
    await expect(angle).toHaveValue("60");
  });

  test("holds numbers and shows what differs from them, with the change", async ({ page }) => {
    await openAlive(page, `/bench/saddle-cope?${sum}`);
    await page.getByRole("button", { name: "Hold these numbers to compare" }).click();
    await page.getByRole("textbox", { name: "Angle between the axes" }).fill("75");
    const comparison = page.getByRole("region", { name: "Comparison" });
    await expect(comparison.getByRole("row", { name: "Angle between the axes, ° 60 75 +15" })).toBeVisible();
    await expect(comparison.getByRole("row", { name: /^Deepest cut, mm 25\.2/ })).toBeVisible();
    await expect(comparison.getByRole("row", { name: /^Branch outside diameter/ })).toHaveCount(0);
  });

  test("takes one more item in a list", async ({ page }) => {
    await openAlive(page, "/bench/sheet-bend");
    const flanges = page.getByRole("group", { name: "Flanges" });
    const before = await flanges.getByRole("textbox").count();
    await flanges.getByRole("button", { name: "Add flange" }).click();
    await expect(flanges.getByRole("textbox")).toHaveCount(before + 1);
  });

  test("answers 404 for a calculator there is not", async ({ page }) => {
    const answer = await page.goto("/bench/no-such-sum");
    expect(answer?.status()).toBe(404);
    await expect(page.getByText("There is no such calculator on the bench.")).toBeVisible();
  });
});

test.describe("the bench without JavaScript", () => {
  test.use({ javaScriptEnabled: false });

  test("finds, works and answers wrong numbers", async ({ page }) => {
    await page.goto("/bench");
    await page.getByLabel("What are you doing?").fill("notch");
    await page.getByRole("button", { name: "Find" }).click();
    await page.getByRole("link", { name: /Saddle cope/ }).click();
    const angle = page.getByRole("textbox", { name: "Angle between the axes" });
    await angle.fill("90/2");
    await page.getByRole("button", { name: "Work it out" }).click();
    await expect(page).toHaveURL(/angle=90%2F2/);
    await expect(angle).toHaveValue("45");
    await expect(page.getByRole("rowheader", { name: /Inside relief/ })).toBeVisible();
    await angle.fill("steep");
    await page.getByRole("button", { name: "Work it out" }).click();
    await expect(page.getByText("Angle between the axes: type a number, such as 60 or 48/2.")).toBeVisible();
    await expect(angle).toHaveValue("steep");
  });
});

const looked = ["/bench", `/bench/saddle-cope?${sum}`, "/bench/wishbone-travel", "/bench/tube-piece", "/api"];

for (const colorScheme of ["light", "dark"] as const) {
  test.describe(`in the ${colorScheme} scheme at 360 px`, () => {
    test.use({ colorScheme, viewport: { width: 360, height: 740 } });

    for (const path of looked) {
      test(`${path} passes axe and does not scroll sideways`, async ({ page }) => {
        test.slow(path === "/api", "The whole API stands on one page.");
        await page.goto(path);
        await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
        for (const fold of await page.locator("main details").all()) {
          await fold.evaluate((element: HTMLDetailsElement) => {
            element.open = true;
          });
        }
        const { violations } = await new AxeBuilder({ page })
          .withTags(["wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22aa"])
          .analyze();
        expect(violations.map(({ id, nodes }) => `${id} ${nodes[0]?.html}`)).toEqual([]);
        const wide = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
        expect(wide).toBeLessThanOrEqual(0);
      });
    }
  });
}

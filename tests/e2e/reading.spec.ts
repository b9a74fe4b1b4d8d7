import { AxeBuilder } from "@axe-core/playwright";
import { expect, type Page, test } from "@playwright/test";

const entry = "/builds/heron/entries/a-cross-tube-set-five-millimetres-high";

/** Every kind of public page, with words that only its content has. */
const publicPages = [
  { path: "/", words: "Build diaries with the numbers left in" },
  { path: "/builds", words: "A cargo trike that leans" },
  { path: "/builds?status=finished", words: "No builds here" },
  { path: "/builds/heron", words: "Front suspension" },
  { path: entry, words: "I wanted something between the two." },
  { path: "/people/maren-holt", words: "The numbers are left in so that you can check them." },
  { path: "/builds/no-such-build", words: "Nothing here" },
];

/** Collects what the browser complains of; a page answered with 404 is told of by the browser itself. */
function listenForNoise(page: Page): string[] {
  const noise: string[] = [];
  page.on("console", (message) => {
    const expected = message.text().includes("404") && message.location().url.includes("no-such-build");
    if (["error", "warning"].includes(message.type()) && !expected) noise.push(message.text());
  });
  page.on("pageerror", (error) => noise.push(String(error)));
  return noise;
}

test.describe("without JavaScript", () => {
  test.use({ javaScriptEnabled: false });

  for (const { path, words } of publicPages) {
    test(`${path} reads`, async ({ page }) => {
      await page.goto(path);
      await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
      await expect(page.getByText(words).first()).toBeVisible();
    });
  }

  test("an entry shows its working whole: drawing, results, cautions and template", async ({ page }) => {
    await page.goto(`${entry}#w4`);
    const working = page.locator("#w4");
    await expect(working.getByRole("img").first()).toBeVisible();
    await expect(working.getByText("Deepest cut").first()).toBeVisible();
    await expect(working.getByText("11.6 mm", { exact: true }).first()).toBeVisible();
    await expect(working.getByText(/does not judge the strength/)).toBeVisible();
    const template = await working.getByRole("link", { name: "PDF, A4" }).getAttribute("href");
    const file = await page.request.get(String(template));
    expect(file.headers()["content-type"]).toContain("application/pdf");
  });

  test("the series is walked by its links", async ({ page }) => {
    await page.goto("/builds/heron");
    await page.getByRole("link", { name: "Read from the start" }).click();
    await page.locator('a[rel="next"]').click();
    await expect(page.getByRole("heading", { level: 1 })).toHaveText("One radius deep");
  });

  test("colours and units are chosen in the footer", async ({ page }) => {
    await page.goto("/builds?status=paused");
    await page.getByRole("button", { name: "Dark" }).click();
    await expect(page).toHaveURL("/builds?status=paused");
    await expect(page.locator("html")).toHaveAttribute("data-scheme", "dark");
    await page.getByRole("button", { name: "inches" }).click();
    await page.goto(entry);
    // 38 mm at 25.4 mm to the inch
    await expect(page.getByRole("textbox", { name: "Header outside diameter" })).toHaveValue("1.4961");
  });
});

for (const colorScheme of ["light", "dark"] as const) {
  test.describe(`in the ${colorScheme} scheme`, () => {
    test.use({ colorScheme });

    for (const { path } of publicPages) {
      test(`${path} has no serious fault that axe finds, and no noise`, async ({ page }) => {
        const noise = listenForNoise(page);
        await page.goto(path, { waitUntil: "networkidle" });
        const { violations } = await new AxeBuilder({ page })
          .withTags(["wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22aa", "best-practice"])
          .analyze();
        const serious = violations.filter(({ impact }) => impact === "serious" || impact === "critical");
        expect(serious.map(({ id, nodes }) => `${id}: ${nodes.map((node) => node.html).join(" ")}`)).toEqual(
          [],
        );
        expect(noise).toEqual([]);
      });
    }
  });
}

test.describe("on a phone 360 px wide", () => {
  test.use({ viewport: { width: 360, height: 760 } });

  for (const { path } of publicPages) {
    test(`${path} does not scroll sideways`, async ({ page }) => {
      await page.goto(path, { waitUntil: "networkidle" });
      const over = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
      expect(over).toBeLessThanOrEqual(0);
    });
  }

  test("the site menu opens, leads on and closes", async ({ page }) => {
    await page.goto("/", { waitUntil: "networkidle" });
    await page.locator("summary", { hasText: "Site menu" }).click();
    await page.getByRole("navigation", { name: "Site" }).getByRole("link", { name: "Builds" }).click();
    await expect(page.getByRole("heading", { level: 1, name: "Builds" })).toBeFocused();
    await expect(page.locator("header details[open]")).toHaveCount(0);
  });
});

test.describe("by keyboard", () => {
  test("the skip link comes first and leads to the content", async ({ page }) => {
    await page.goto(entry, { waitUntil: "networkidle" });
    await page.keyboard.press("Tab");
    await expect(page.getByRole("link", { name: "Skip to the content" })).toBeFocused();
    await page.keyboard.press("Enter");
    await expect(page.locator("#content")).toBeFocused();
  });

  test("the time line scrolls", async ({ page }) => {
    await page.setViewportSize({ width: 800, height: 800 });
    await page.goto("/builds/heron", { waitUntil: "networkidle" });
    const rule = page.getByRole("region", { name: "Time line of Heron" });
    await rule.focus();
    await page.keyboard.press("ArrowRight");
    await expect.poll(() => rule.evaluate((element) => element.scrollLeft)).toBeGreaterThan(0);
  });

  test("the next entry takes the focus to its heading and says its title", async ({ page }) => {
    await page.goto(entry, { waitUntil: "networkidle" });
    await page.locator('a[rel="next"]').focus();
    await page.keyboard.press("Enter");
    const heading = page.getByRole("heading", { level: 1, name: "An upright, measured on the bench" });
    await expect(heading).toBeFocused();
    await expect(page.getByRole("status").filter({ hasText: "An upright, measured" })).toHaveCount(1);
  });
});

test("a reader changes a number in place and puts the builder's back", async ({ page }) => {
  const noise = listenForNoise(page);
  await page.goto(`${entry}#w4`, { waitUntil: "networkidle" });
  const working = page.locator("#w4");
  await working.scrollIntoViewIfNeeded();
  const offset = working.getByRole("textbox", { name: "Offset" });
  const drawing = working.locator("svg").first();
  await expect(working.getByRole("button", { name: /3D/ })).toBeVisible();
  const before = await drawing.innerHTML();

  await offset.fill("0");
  // A square joint of a 25 mm branch on a 38 mm header: 19 − √(19² − 12.5²) mm deep.
  await expect(working.getByText("4.7", { exact: true }).first()).toBeVisible();
  await expect.poll(() => drawing.innerHTML()).not.toBe(before);

  await offset.fill("900");
  await expect(working.getByRole("alert").or(working.getByText("Not worked out")).first()).toBeVisible();
  await expect(offset).toHaveValue("900");

  await working.getByRole("button", { name: "Put back the builder's numbers" }).click();
  await expect(offset).toHaveValue("5");
  await expect.poll(() => drawing.innerHTML()).toBe(before);
  expect(noise).toEqual([]);
});

test("an entry says of itself what search engines and link cards need", async ({ page }) => {
  await page.goto(entry);
  const content = (selector: string) => page.locator(selector).getAttribute("content");
  await expect(page).toHaveTitle("A cross tube set five millimetres high · Heron · Soapstone");
  expect(await page.locator('link[rel="canonical"]').getAttribute("href")).toMatch(
    /^http:\/\/[^/]+\/builds\/heron\/entries\/a-cross-tube-set-five-millimetres-high$/,
  );
  expect(await content('meta[name="description"]')).toContain("The pedal tray wants a cross tube");
  expect(await content('meta[property="og:type"]')).toBe("article");
  const image = await content('meta[property="og:image"]');
  expect((await page.request.get(String(image))).headers()["content-type"]).toBe("image/webp");
  const data = await page.locator('script[type="application/ld+json"]').textContent();
  expect(JSON.parse(String(data))).toMatchObject({ "@type": "BlogPosting", position: 4 });
  const feed = await page.locator('link[type="application/atom+xml"]').getAttribute("href");
  expect((await page.request.get(String(feed))).status()).toBe(200);
});

test("reading goes on where this browser stopped", async ({ page }) => {
  await page.goto(entry, { waitUntil: "networkidle" });
  await page.goto("/builds/heron", { waitUntil: "networkidle" });
  await page.getByRole("link", { name: "Go on at entry 4" }).click();
  await expect(page).toHaveURL(entry);
});

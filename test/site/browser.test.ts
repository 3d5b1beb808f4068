/** The documentation in a real browser: every page opens without an error, every Run button runs, search leads to a function. */
import { mkdirSync } from "node:fs";
import type { Server } from "node:http";
import { type Browser, devices, type Page } from "playwright-core";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { CHROMIUM, REQUIRE_ALL } from "../_installed.js";
import { ROOT } from "../_source.js";
import { allBlocks } from "../examples/_blocks.js";
import { launchBrowser, pagePaths, serveSite } from "./_site.js";

const SCREENSHOTS = `${ROOT}.cache/screenshots/`;
/** Pages that are photographed; their names. */
const SHOWN: Readonly<Record<string, string>> = {
  "index.html": "home",
  "documents/How_red_is_this_sunset.html": "sunset",
  "documents/Quantities.html": "quantities",
  "functions/air.refractiveIndexCiddor.html": "function",
  "modules/scattering.html": "room",
  "explore.html": "explore",
};

/** Opens a page; returns what its console and network complained about. */
async function open(page: Page, url: string): Promise<string[]> {
  const complaints: string[] = [];
  page.removeAllListeners();
  page.on("console", (message) => {
    if (message.type() === "error") complaints.push(`${url}: ${message.text()}`);
  });
  page.on("pageerror", (error) => complaints.push(`${url}: ${error.message}`));
  page.on("response", (response) => {
    if (response.status() >= 400) complaints.push(`${url}: ${response.status()} ${response.url()}`);
  });
  await page.goto(url, { waitUntil: "load" });
  return complaints;
}

/** Presses every Run button of the open page; returns the blocks they belong to and what went wrong. */
async function runAll(page: Page): Promise<{ codes: string[]; errors: string[] }> {
  return page.evaluate(async () => {
    const codes: string[] = [];
    const errors: string[] = [];
    for (const bar of document.querySelectorAll<HTMLElement>(".airlight-run")) {
      const block = bar.previousElementSibling;
      codes.push(block?.querySelector("code")?.textContent?.replace(/\s/g, "") ?? "");
      if (block?.querySelector("button") === null) errors.push("a block without Copy button");
      bar.querySelector("button")?.click();
      const start = performance.now();
      while (bar.dataset.ran === undefined && performance.now() - start < 30_000)
        await new Promise((resolve) => setTimeout(resolve, 5));
      const rows = [...bar.querySelectorAll("output > div")];
      if (bar.dataset.ran === undefined) errors.push("did not end");
      if (rows.every((row) => row.textContent?.trim() === "")) errors.push("showed nothing");
      for (const row of bar.querySelectorAll(".error")) errors.push(row.textContent ?? "");
    }
    return { codes, errors };
  });
}

it("has a browser, where nothing may be skipped", () => {
  if (REQUIRE_ALL) expect(CHROMIUM).toBeDefined();
});

describe.skipIf(CHROMIUM === undefined)("the documentation in Chromium", () => {
  let browser: Browser;
  let server: Server;
  let address: string;

  beforeAll(async () => {
    ({ server, address } = await serveSite());
    browser = await launchBrowser();
    mkdirSync(SCREENSHOTS, { recursive: true });
  });
  afterAll(async () => {
    await browser?.close();
    server?.close();
  });

  it("opens every page without an error, and every block runs and shows its values", async () => {
    const faults: string[] = [];
    const blocks = new Set<string>();
    const queue = pagePaths();
    /** Reads pages until none is left; two do so side by side. */
    const reader = async (): Promise<void> => {
      const page = await browser.newPage();
      for (let path = queue.shift(); path !== undefined; path = queue.shift()) {
        faults.push(...(await open(page, address + path)));
        const { codes, errors } = await runAll(page);
        faults.push(...errors.map((error) => `${path}: ${error}`));
        for (const code of codes) blocks.add(code);
      }
      await page.close();
    };
    await Promise.all([reader(), reader()]);
    expect(faults).toEqual([]);
    const inSite = allBlocks().filter(({ where }) => /^(?:src|docs)\//.test(where));
    const missing = inSite.filter(({ code }) => !blocks.has(code.replace(/\s/g, "")));
    expect(missing.map(({ where }) => where)).toEqual([]);
  });

  it("copies a block with its imports", async () => {
    const context = await browser.newContext();
    await context.grantPermissions(["clipboard-read", "clipboard-write"]);
    const page = await context.newPage();
    await open(page, `${address}functions/air.refractiveIndexCiddor.html`);
    await page.locator("pre").first().hover();
    await page.locator("pre > button").first().click();
    const copied = await page.evaluate(() => navigator.clipboard.readText());
    expect(copied).toContain('from "airlight"');
    expect(copied).toContain("// =>");
    await context.close();
  });

  it("finds a function by search and opens it", async () => {
    const page = await browser.newPage();
    await open(page, `${address}index.html`);
    await page.locator("#tsd-search-trigger").click();
    await page.locator("#tsd-search-input").fill("refractiveIndexCiddor");
    await page.locator("#tsd-search-results a").first().click();
    await page.waitForURL(/refractiveIndexCiddor/);
    expect(await page.locator("h1").first().textContent()).toContain("refractiveIndexCiddor");
    await page.close();
  });

  it("finds functions by name, and by the words people look for", async () => {
    const page = await browser.newPage();
    await open(page, `${address}index.html`);
    await page.locator("#tsd-search-trigger").click();
    const expectFirst = async (words: string, found: string): Promise<void> => {
      await page.locator("#tsd-search-input").fill(words);
      const results = page.locator("#tsd-search-results a");
      await expect.poll(async () => (await results.allTextContents())[0]?.trim()).toBe(found);
    };
    const functions = pagePaths().flatMap(
      (path) => /^functions\/(\w+\.\w+)\.html$/.exec(path)?.[1] ?? [],
    );
    expect(functions.length).toBeGreaterThan(100);
    for (let i = 0; i < functions.length; i += 3)
      await expectFirst(functions[i]!.split(".")[1]!, functions[i]!);
    for (const [words, found] of [
      ["air mass", "path.airMassYoung"],
      ["spectrum", "colour.spectrumToXyz"],
      ["refractive index", "air.refractiveIndexCiddor"],
      ["photometer", "Correct a photometer"],
      ["sunset", "How red is this sunset"],
    ] as const)
      await expectFirst(words, found);
    await page.close();
  });

  it.each([
    ["desktop", { viewport: { width: 1280, height: 900 } }],
    ["phone", devices["Pixel 5"] ?? {}],
  ] as const)("fits a %s, in light and dark (screenshots in .cache)", async (device, settings) => {
    for (const colorScheme of ["light", "dark"] as const) {
      const context = await browser.newContext({ ...settings, colorScheme });
      const page = await context.newPage();
      for (const [path, name] of Object.entries(SHOWN)) {
        expect(await open(page, address + path)).toEqual([]);
        await page.waitForTimeout(300);
        const options = { path: `${SCREENSHOTS}${name}-${device}-${colorScheme}.png` };
        await page.screenshot({ ...options, fullPage: name === "home" || name === "explore" });
        const [wide, screen] = await page.evaluate(() => [
          document.documentElement.scrollWidth,
          window.innerWidth,
        ]);
        expect(wide, `${path} is wider than the screen`).toBeLessThanOrEqual(screen! + 1);
      }
      await context.close();
    }
  });
});

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

/** Presses every Run button of the open page; returns what went wrong. */
async function runAll(page: Page): Promise<{ ran: number; errors: string[] }> {
  return page.evaluate(async () => {
    const errors: string[] = [];
    const bars = [...document.querySelectorAll<HTMLElement>(".airlight-run")];
    for (const bar of bars) {
      bar.querySelector("button")?.click();
      const start = performance.now();
      while (bar.dataset.ran === undefined && performance.now() - start < 30_000)
        await new Promise((resolve) => setTimeout(resolve, 5));
      const rows = [...bar.querySelectorAll("output > div")].map((row) => row.textContent ?? "");
      const wrong = [...bar.querySelectorAll(".error")].map((row) => row.textContent ?? "");
      if (bar.dataset.ran === undefined) errors.push("did not end");
      if (rows.join("").trim() === "") errors.push("showed nothing");
      errors.push(...wrong);
    }
    return { ran: bars.length, errors };
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
    const page = await browser.newPage();
    const faults: string[] = [];
    const blocks = new Set<string>();
    for (const path of pagePaths()) {
      faults.push(...(await open(page, address + path)));
      const { errors } = await runAll(page);
      faults.push(...errors.map((error) => `${path}: ${error}`));
      const codes = await page.$$eval("pre:has(+ .airlight-run) > code", (all) =>
        all.map((code) => code.textContent?.trim() ?? ""),
      );
      for (const code of codes) blocks.add(code);
      const copies = await page.$$eval("pre:has(+ .airlight-run) > button", (all) => all.length);
      if (copies !== codes.length) faults.push(`${path}: a block without Copy button`);
    }
    await page.close();
    expect(faults).toEqual([]);
    const inSite = allBlocks().filter(({ where }) => /^(?:src|docs)\//.test(where));
    const missing = inSite.filter(({ code }) => !blocks.has(code.trim()));
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

/** The explore page: its numbers are the library's, its code gives what it shows, the keyboard moves it. */
import type { Server } from "node:http";
import type { Browser, Page } from "playwright-core";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { codeFor } from "../../docs/explore/codeFor.js";
import { compute, prepare, type State } from "../../docs/explore/compute.js";
import { CHROMIUM } from "../_installed.js";
import { ROOT } from "../_source.js";
import { runBlocks } from "../examples/_results.js";
import { launchBrowser, serveSite } from "./_site.js";

const START: State = { heightDeg: 30, altitudeM: 0, ozoneDu: 320, haze: 0.08, co2Ppm: 425 };
/** The start and both ends of every slider. */
const STATES: readonly State[] = [
  START,
  ...[0, 0.5, 90].map((heightDeg) => ({ ...START, heightDeg })),
  ...[5000].map((altitudeM) => ({ ...START, altitudeM })),
  ...[100, 500].map((ozoneDu) => ({ ...START, ozoneDu })),
  ...[0, 0.6].map((haze) => ({ ...START, haze })),
  ...[280, 1000].map((co2Ppm) => ({ ...START, co2Ppm })),
  { heightDeg: 0, altitudeM: 0, ozoneDu: 500, haze: 0.6, co2Ppm: 1000 },
];
const fixed = prepare();

describe("the state shown", () => {
  it("comes out of the code shown, to the last digit printed", () => {
    const blocks = STATES.map((state, i) => ({
      where: `state ${i}`,
      id: `state_${i}`,
      code: codeFor(state, compute(state, fixed)),
      strict: true,
    }));
    const results = runBlocks(blocks, `${ROOT}.cache/explore/`);
    for (const { id, where } of blocks) {
      expect(results[id]?.errors, where).toEqual([]);
      expect(results[id]?.checked, where).toBeGreaterThan(8);
    }
  });

  it("answers the sliders as nature does", () => {
    const of = (change: Partial<State>): ReturnType<typeof compute> =>
      compute({ ...START, ...change }, fixed);
    const start = of({});
    expect(of({ heightDeg: 10 }).illuminanceLx).toBeLessThan(start.illuminanceLx);
    expect(of({ altitudeM: 3000 }).irradiance).toBeGreaterThan(start.irradiance);
    expect(of({ haze: 0.3 }).irradiance).toBeLessThan(start.irradiance);
    expect(of({ ozoneDu: 500 }).depths.ozone / start.depths.ozone).toBeCloseTo(500 / 320, 12);
    expect(of({ heightDeg: 1 }).skyColours).toBeUndefined();
    expect(start.zenithColour).toMatch(/^#[0-9a-f]{4}ff$/); // blue leads
    expect(of({ altitudeM: 5000 }).zenithLuminance!).toBeLessThan(start.zenithLuminance!);
    expect(of({ co2Ppm: 1000 }).refractivity).toBeGreaterThan(start.refractivity);
    expect(of({ heightDeg: 0 }).colourTemperatureK ?? 0).toBeLessThan(start.colourTemperatureK!);
  });
});

describe.skipIf(CHROMIUM === undefined)("the page in Chromium", () => {
  let browser: Browser;
  let server: Server;
  let page: Page;
  beforeAll(async () => {
    const served = await serveSite();
    server = served.server;
    browser = await launchBrowser();
    page = await browser.newPage();
    await page.goto(`${served.address}explore.html`);
  });
  afterAll(async () => {
    await browser?.close();
    server?.close();
  });

  const code = (): Promise<string> =>
    page.locator("#code div").evaluateAll((lines) => lines.map((l) => l.textContent).join(""));

  it("shows the start", async () => {
    expect(await code()).toBe(codeFor(START, compute(START, fixed)));
  });

  it("moves by keyboard alone, from slider to slider", async () => {
    await page.locator("#heightDeg").focus();
    await page.keyboard.press("ArrowLeft");
    await page.keyboard.press("Tab");
    await page.keyboard.press("ArrowRight");
    const state = { ...START, heightDeg: 29.5, altitudeM: 50 };
    expect(await code()).toBe(codeFor(state, compute(state, fixed)));
    expect(await page.locator('output[for="heightDeg"]').textContent()).toBe("29.5°");
    expect(await page.locator("#heightDeg").getAttribute("aria-valuetext")).toBe("29.5°");
    expect(page.url()).toContain("heightDeg=29.5&altitudeM=50");
    await page.keyboard.press("End");
    expect(await code()).toContain("const altitudeM = 5000;");
  });

  it("selects the code where there is no clipboard", async () => {
    await page.evaluate(() => {
      navigator.clipboard.writeText = () => Promise.reject(new Error("none"));
    });
    await page.locator("#copy").click();
    expect(await page.locator("#copied").textContent()).toContain("Ctrl C");
    const selected = await page.evaluate(() => String(getSelection()));
    expect(selected.trimEnd()).toBe((await code()).trimEnd());
  });

  it("opens at the state of its address, and goes back to the start", async () => {
    await page.goto(`${page.url().split("#")[0]}#heightDeg=3&haze=0.3`);
    const state = { ...START, heightDeg: 3, haze: 0.3 };
    await page.reload();
    expect(await code()).toBe(codeFor(state, compute(state, fixed)));
    await page.locator("button[type=reset]").click();
    await page.waitForFunction(() =>
      document.querySelector("#code")!.textContent!.includes("90 - 30"),
    );
    expect(await code()).toBe(codeFor(START, compute(START, fixed)));
  });
});

/**
 * Time of one change on the explore page in Chromium: from the slider's event through the library, drawing and layout.
 * The page is built anew; dist must be there. Exit code 1 if more than one change in twenty breaks the promise of 16 ms.
 */
import { pathToFileURL } from "node:url";
import { writeExplorePage } from "../../docs/site/explorePage.js";
import { CHROMIUM } from "../_installed.js";
import { ROOT } from "../_source.js";
import { launchBrowser } from "../site/_site.js";

const CHANGES = 500;
const PROMISE_MS = 16;

/** How long a reader looks at the page before the first change. */
const READING_MS = 1500;

/** In the page: moves the sliders in turn, one change a frame as a hand does, forces layout after each, and returns the milliseconds. */
async function measure(changes: number): Promise<number[]> {
  const sliders = [...document.querySelectorAll<HTMLInputElement>("input[type=range]")];
  const times: number[] = [];
  for (let i = 0; i < changes; i++) {
    await new Promise(requestAnimationFrame);
    const slider = sliders[i % sliders.length]!;
    const [low, high] = [Number(slider.min), Number(slider.max)];
    slider.value = String(low + ((i * 0.618034) % 1) * (high - low));
    const start = performance.now();
    slider.dispatchEvent(new Event("input", { bubbles: true }));
    document.body.getBoundingClientRect();
    times.push(performance.now() - start);
  }
  return times;
}

if (CHROMIUM === undefined) {
  console.log("explore page: skipped, there is no Chromium");
} else {
  const folder = `${ROOT}.cache/explore-page/`;
  await writeExplorePage(folder);
  const browser = await launchBrowser();
  const page = await browser.newPage();
  await page.goto(pathToFileURL(`${folder}explore.html`).href);
  await page.waitForTimeout(READING_MS);
  const times = (await page.evaluate(measure, CHANGES)).sort((a, b) => a - b);
  await browser.close();
  const at = (share: number): number => times[Math.floor(share * (CHANGES - 1))]!;
  const kept = at(0.95) < PROMISE_MS; // the rest wait for the browser itself, or for a busy machine
  const [first, middle, late, last] = [at(0), at(0.5), at(0.95), at(1)].map(
    (ms) => `${ms.toFixed(1)} ms`,
  );
  console.log(
    `explore page, one change in Chromium: fastest ${first}, median ${middle}, 95 % within ${late}, slowest ${last}; promise ${PROMISE_MS} ms ${kept ? "kept" : "BROKEN"}`,
  );
  process.exitCode = kept ? 0 : 1;
}

/** Small apps made of the installed package: a Vite app, a Rollup app, and a page with plain script modules. */
import {
  createReadStream,
  existsSync,
  mkdirSync,
  readdirSync,
  readFileSync,
  writeFileSync,
} from "node:fs";
import { createServer } from "node:http";
import type { AddressInfo } from "node:net";
import { join } from "node:path";
import { nodeResolve } from "@rollup/plugin-node-resolve";
import { rollup } from "rollup";
import { build } from "vite";
import { describe, expect, inject, it } from "vitest";
import { CHROMIUM } from "../_installed.js";
import { launchBrowser } from "../site/_site.js";

const consumer = inject("consumer");
const { exports } = JSON.parse(
  readFileSync(join(consumer, "node_modules/airlight/package.json"), "utf8"),
);

/** The app: one number and one colour, written into the page. */
const MAIN = `import { airColumn, airMassYoung, rayleighOpticalDepth } from "airlight";
import { srgbHex } from "airlight/colour";
const column = airColumn({ pressurePa: 101325, altitudeM: 0, latitudeDeg: 45, co2Ppm: 425 });
const share = Math.exp(-rayleighOpticalDepth(500, column) * airMassYoung(60));
document.querySelector("#out").textContent = share.toFixed(4) + " " + srgbHex([1, 0.5, 0]);
`;
const SHOWN = "0.7515 #ff8000";
/** Bytes the whole app may take: three functions, the standard profile among them, and no spectral table. */
const MOST_BYTES = 10_000;

const page = (script: string): string =>
  `<!doctype html><html lang="en"><head><title>app</title><link rel="icon" href="data:,"></head><body><p id="out"></p>${script}</body></html>`;

/** Makes a folder in the consumer with the given files. */
function app(name: string, files: Readonly<Record<string, string>>): string {
  const folder = join(consumer, name);
  mkdirSync(folder, { recursive: true });
  for (const [path, text] of Object.entries(files)) writeFileSync(join(folder, path), text);
  return folder;
}

/** What a bundle writes into its page, run without a browser. */
async function written(bundle: string): Promise<string> {
  const out = { textContent: "" };
  const none = { relList: { supports: () => true } };
  const document = {
    querySelector: () => out,
    querySelectorAll: () => [],
    createElement: () => none,
  };
  await new Function("document", "window", bundle)(document, {});
  return out.textContent;
}

/** What the page at `path` of the consumer's folder shows in Chromium, with its complaints. */
async function shown(path: string): Promise<string> {
  const types: Record<string, string> = { html: "text/html", js: "text/javascript" };
  const server = createServer((request, response) => {
    const file = join(consumer, new URL(request.url ?? "/", "http://localhost").pathname);
    const found = existsSync(file);
    const type = types[file.split(".").at(-1)!] ?? "text/plain";
    response.writeHead(found ? 200 : 404, { "content-type": type });
    if (found) createReadStream(file).pipe(response);
    else response.end();
  });
  await new Promise<void>((resolve) => server.listen(0, "127.0.0.1", resolve));
  const browser = await launchBrowser();
  try {
    const tab = await browser.newPage();
    const complaints: string[] = [];
    tab.on("console", (message) => complaints.push(message.text()));
    tab.on("pageerror", (error) => complaints.push(error.message));
    await tab.goto(`http://127.0.0.1:${(server.address() as AddressInfo).port}/${path}`);
    await tab
      .waitForFunction("document.querySelector('#out').textContent !== ''", undefined, {
        timeout: 10_000,
      })
      .catch(() => {});
    return [await tab.textContent("#out"), ...complaints].join("\n");
  } finally {
    await browser.close();
    server.close();
  }
}

describe("an app made by Vite", () => {
  const folder = app("vite-app", {
    "index.html": page('<script type="module" src="./main.ts"></script>'),
    "main.ts": MAIN.replace('#out")', '#out")!'),
  });
  it("is small and works", async () => {
    await build({
      root: folder,
      base: "./",
      logLevel: "error",
      configFile: false,
      build: { modulePreload: false },
    });
    const [file = ""] = readdirSync(join(folder, "dist/assets"));
    const bundle = readFileSync(join(folder, "dist/assets", file), "utf8");
    expect(bundle.length).toBeLessThan(MOST_BYTES);
    expect(await written(bundle)).toBe(SHOWN);
  });
  it.skipIf(CHROMIUM === undefined)("shows the same in Chromium", async () => {
    expect(await shown("vite-app/dist/index.html")).toBe(SHOWN);
  });
});

describe("an app made by Rollup", () => {
  const folder = app("rollup-app", {
    "main.js": MAIN,
    "index.html": page('<script src="./bundle.js"></script>'),
  });
  it("is small and works", async () => {
    const made = await rollup({ input: join(folder, "main.js"), plugins: [nodeResolve()] });
    const { output } = await made.write({ file: join(folder, "bundle.js"), format: "iife" });
    expect(output).toHaveLength(1);
    expect(output[0].code.length).toBeLessThan(3 * MOST_BYTES); // not minified
    expect(await written(output[0].code)).toBe(SHOWN);
  });
  it.skipIf(CHROMIUM === undefined)("shows the same in Chromium", async () => {
    expect(await shown("rollup-app/index.html")).toBe(SHOWN);
  });
});

describe("a page with script modules and an import map, without any tool", () => {
  const entries = Object.entries<{ default: string }>(exports).filter(([, to]) => to.default);
  const imports = entries.map(([path, to]) => [
    `airlight${path.slice(1)}`,
    `../node_modules/airlight/${to.default.slice(2)}`,
  ]);
  const map = JSON.stringify({ imports: Object.fromEntries(imports) });
  app("plain-page", {
    "index.html": page(
      `<script type="importmap">${map}</script><script type="module">${MAIN}</script>`,
    ),
  });
  it.skipIf(CHROMIUM === undefined)("works in Chromium", async () => {
    expect(await shown("plain-page/index.html")).toBe(SHOWN);
  });
});

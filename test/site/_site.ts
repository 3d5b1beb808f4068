/** The built documentation: its pages, a server for it, a browser to read it. */
import { createReadStream, existsSync, statSync } from "node:fs";
import { createServer, type Server } from "node:http";
import type { AddressInfo } from "node:net";
import { extname, join } from "node:path";
import { type Browser, chromium } from "playwright-core";
import { CHROMIUM } from "../_installed.js";
import { filesUnder, ROOT } from "../_source.js";

/** Folder of the site. */
export const SITE: string = join(ROOT, ".docs");

/** Paths of all pages, relative to the site. */
export function pagePaths(): string[] {
  return filesUnder(".docs", ".html").map((path) => path.slice(".docs/".length));
}

const TYPES: Readonly<Record<string, string>> = {
  ".html": "text/html; charset=utf-8",
  ".js": "text/javascript; charset=utf-8",
  ".css": "text/css; charset=utf-8",
  ".svg": "image/svg+xml",
};

/** Serves the site on a free port; resolves to the server and its address. */
export function serveSite(): Promise<{ server: Server; address: string }> {
  const server = createServer((request, response) => {
    const { pathname } = new URL(request.url ?? "/", "http://localhost");
    const path = join(SITE, decodeURIComponent(pathname === "/" ? "/index.html" : pathname));
    const found = existsSync(path) && statSync(path).isFile();
    response.writeHead(found ? 200 : 404, { "content-type": TYPES[extname(path)] ?? "text/plain" });
    if (found) createReadStream(path).pipe(response);
    else response.end();
  });
  return new Promise((resolve) => {
    server.listen(0, "127.0.0.1", () =>
      resolve({ server, address: `http://127.0.0.1:${(server.address() as AddressInfo).port}/` }),
    );
  });
}

/** Starts Chromium; to be called only where it is installed. */
export function launchBrowser(): Promise<Browser> {
  const quiet = ["--no-first-run", "--disable-background-networking", "--disable-component-update"];
  return chromium.launch({
    executablePath: CHROMIUM!,
    headless: true,
    args: ["--no-sandbox", "--disable-gpu", "--disable-quic", "--disable-sync", ...quiet],
  });
}

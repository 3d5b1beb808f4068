/** Serves the page of this folder: `npm run build`, then `node examples/browser/serve.mjs`. */
import { readFile } from "node:fs/promises";
import { createServer } from "node:http";
import { extname } from "node:path";

const ROOT = new URL("../../", import.meta.url);
const KINDS = { ".html": "text/html", ".js": "text/javascript", ".mjs": "text/javascript" };
const port = Number(process.argv[2] ?? 8180);

createServer(async (request, response) => {
  const path = new URL(request.url, "http://localhost").pathname.replace(/\/$/, "/index.html");
  try {
    if (!/^\/(dist|examples\/browser)\/[\w./-]+$/.test(path) || path.includes(".."))
      throw new Error("not served");
    const body = await readFile(new URL(`.${path}`, ROOT));
    response.writeHead(200, { "content-type": KINDS[extname(path)] ?? "application/octet-stream" });
    response.end(body);
  } catch {
    response.writeHead(path === "/index.html" ? 302 : 404, { location: "/examples/browser/" });
    response.end();
  }
}).listen(port, () => console.log(`http://localhost:${port}/examples/browser/`));

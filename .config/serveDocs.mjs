/** Serves the built documentation on localhost: node .config/serveDocs.mjs [port, 8080; 0 for any]. */
import { createReadStream, statSync } from "node:fs";
import { createServer } from "node:http";
import { extname, join, normalize, sep } from "node:path";
import { fileURLToPath } from "node:url";

const FOLDER = normalize(fileURLToPath(new URL("../.docs", import.meta.url)));
const TYPES = {
  ".html": "text/html; charset=utf-8",
  ".js": "text/javascript; charset=utf-8",
  ".css": "text/css; charset=utf-8",
  ".json": "application/json",
  ".svg": "image/svg+xml",
  ".png": "image/png",
};

/** The file a request path means, or undefined when there is none inside the folder. */
function fileOf(requestPath) {
  const path = normalize(join(FOLDER, decodeURIComponent(requestPath)));
  if (path !== FOLDER && !path.startsWith(FOLDER + sep)) return undefined;
  const stat = statSync(path, { throwIfNoEntry: false });
  if (stat?.isFile()) return path;
  return stat?.isDirectory() && statSync(join(path, "index.html"), { throwIfNoEntry: false })
    ? join(path, "index.html")
    : undefined;
}

const port = Number(process.argv[2] ?? 8080);
const server = createServer((request, response) => {
  let file;
  try {
    file = fileOf(new URL(request.url, "http://localhost").pathname);
  } catch {
    file = undefined; // a path that does not decode
  }
  if (file === undefined) {
    response.writeHead(404, { "content-type": "text/plain" }).end("not found\n");
    return;
  }
  response.writeHead(200, { "content-type": TYPES[extname(file)] ?? "application/octet-stream" });
  createReadStream(file).pipe(response);
});
server.on("error", (error) => {
  console.error(error.code === "EADDRINUSE" ? `port ${port} is taken: name another` : error.message);
  process.exitCode = 1;
});
server.listen(port, "127.0.0.1", () => {
  console.log(`Documentation on http://localhost:${server.address().port}/ (Ctrl-C ends)`);
});

/**
 * Imports every block of a folder in turn and prints, as its last line, in JSON, what went wrong in each.
 * node _runBlocks.mjs (in the folder that holds blocks.json and the blocks); Deno runs it too.
 * A block may put a picture into the page's element "#picture": each finds a fresh one, where linkedom is installed.
 */
import { readFileSync } from "node:fs";
import { difference, parsePrinted } from "./_printed.mjs";

const ids = JSON.parse(readFileSync(new URL("./blocks.json", import.meta.url), "utf8"));
const { parseHTML } = await import("linkedom").catch(() => ({}));
const results = {};
let current;

/** Called from the blocks in place of `expression; // => text`. */
globalThis.checkPrinted = (line, text, actual) => {
  const wrong = difference(parsePrinted(text), actual);
  current.checked += 1;
  if (wrong !== undefined) current.errors.push(`line ${line}: ${wrong}`);
  return actual;
};
const print = console.log;
console.log = () => {};

for (const id of ids) {
  current = { checked: 0, errors: [], picture: "" };
  results[id] = current;
  const document = parseHTML?.('<html><body><div id="picture"></div></body></html>').document;
  globalThis.document = document;
  try {
    await import(`./${id}.mjs`);
    current.picture = document?.querySelector("#picture").innerHTML ?? "";
  } catch (error) {
    current.errors.push(
      String(error?.stack ?? error)
        .split("\n")
        .slice(0, 3)
        .join(" "),
    );
  }
}
print(JSON.stringify(results));

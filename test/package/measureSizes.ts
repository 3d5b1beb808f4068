/**
 * Writes the list of public names, each with a ceiling of a tenth above its present size, to _names.ts: look at what `git diff` shows.
 * npm run sizes
 */
import { readFileSync, writeFileSync } from "node:fs";
import { reexported } from "../house/_rules.js";
import { ROOT, textOf, treeOf } from "../_source.js";
// @ts-expect-error plain JavaScript, shared with the tests
import { bundleBytes } from "./_bundle.mjs";

const file = `${ROOT}test/package/_names.ts`;
const { exports } = JSON.parse(textOf("package.json"));
let list = "";
for (const path of Object.keys(exports)) {
  if (path === "./package.json" || path === ".") continue;
  const specifier = `airlight${path.slice(1)}`;
  const values = Object.keys(await import(specifier)).sort();
  const index = `src/${path.slice(2)}/index.ts`;
  const types = reexported(treeOf(index, textOf(index))).filter((name) => !values.includes(name));
  list += `  "${path}": {\n    values: {\n`;
  for (const name of values) {
    const bytes = await bundleBytes(ROOT, specifier, [name]);
    list += `      ${name}: ${Math.ceil((bytes * 1.1) / 10) * 10},\n`;
  }
  list += `    },\n    types: [${types
    .sort()
    .map((type) => `"${type}"`)
    .join(", ")}],\n  },\n`;
}
const text = readFileSync(file, "utf8");
const start = text.indexOf("= {", text.indexOf("const PUBLIC_NAMES")) + 3;
writeFileSync(file, `${text.slice(0, start)}\n${list}};\n`);

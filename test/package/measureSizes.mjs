/**
 * Prints, for each subpath, the exported names with their bundled bytes and a ceiling of a tenth more, ready for _names.ts.
 * npm run sizes
 */
import { readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { bundleBytes } from "./_bundle.mjs";

const root = fileURLToPath(new URL("../..", import.meta.url));
const { exports } = JSON.parse(readFileSync(`${root}package.json`, "utf8"));
for (const [path, target] of Object.entries(exports)) {
  if (path === "./package.json" || path === ".") continue;
  const specifier = `airlight${path.slice(1)}`;
  const names = Object.keys(await import(specifier)).sort();
  const source = readFileSync(
    `${root}${target.types.replace("dist", "src").replace(".d.ts", ".ts")}`,
    "utf8",
  );
  const types = [...source.matchAll(/\btype (\w+)/g)].map((match) => match[1]).sort();
  console.log(`  "${path}": {\n    values: {`);
  for (const name of names) {
    const bytes = await bundleBytes(root, specifier, [name]);
    console.log(`      ${name}: ${Math.ceil((bytes * 1.1) / 10) * 10}, // ${bytes}`);
  }
  console.log(`    },\n    types: [${types.map((type) => `"${type}"`).join(", ")}],\n  },`);
}

/** Documentation settings: a chapter per room, written to .docs. */
import { readFileSync } from "node:fs";

const packageJson = JSON.parse(readFileSync(new URL("../package.json", import.meta.url), "utf8"));
const rooms = Object.keys(packageJson.exports)
  .filter((path) => path.startsWith("./") && !path.endsWith(".json"))
  .map((path) => `../src/${path.slice(2)}/index.ts`);

export default {
  name: "Airlight",
  entryPoints: ["../src/units.ts", "../src/constants.ts", "../src/budget.ts", ...rooms],
  out: "../.docs",
  readme: "../README.md",
  projectDocuments: ["../examples/paths/air-masses.md", "../examples/sky/sky.md"],
  tsconfig: "./tsconfig.docs.json",
  favicon: "./favicon.svg",
  plugin: ["./typedocSections.mjs"],
  excludeInternal: true,
  excludePrivate: true,
  sort: ["source-order"],
  includeVersion: true,
  disableSources: true,
  githubPages: false,
  treatWarningsAsErrors: true,
  validation: { notExported: true, invalidLink: true, notDocumented: true, rewrittenLink: true },
  requiredToBeDocumented: ["Variable", "Function", "Interface", "Property", "TypeAlias"],
};

/** Documentation settings: guides, a chapter per room, pages of quantities and sources, written to .docs by docs/site/build.ts. */
import { readFileSync } from "node:fs";
import { tex } from "@mdit/plugin-tex";
import temml from "temml";

const packageJson = JSON.parse(readFileSync(new URL("../package.json", import.meta.url), "utf8"));
const rooms = Object.keys(packageJson.exports)
  .filter((path) => path.startsWith("./") && !path.endsWith(".json"))
  .map((path) => `../src/${path.slice(2)}/index.ts`);
const guides = [
  "ground-spectrum",
  "photometer",
  "sunset",
  "telescope",
  "display-colour",
  "own-atmosphere",
  "trust",
].map((name) => `../.cache/site/guides/${name}.md`);

export default {
  name: "Airlight",
  entryPoints: ["../src/units.ts", "../src/constants.ts", "../src/budget.ts", ...rooms],
  projectDocuments: [
    ...guides,
    "../examples/paths/air-masses.md",
    "../examples/sky/sky.md",
    ...["quantities", "sources", "cautions"].map((name) => `../.cache/site/${name}.md`),
  ],
  out: "../.docs",
  readme: "../.cache/site/home.md",
  tsconfig: "./tsconfig.docs.json",
  favicon: "./favicon.svg",
  plugin: ["./typedocSections.mjs"],
  customCss: "../docs/site/site.css",
  customJs: "../.cache/site/run.js",
  excludeInternal: true,
  excludePrivate: true,
  sort: ["source-order"],
  groupOrder: ["Documents", "Modules", "Functions", "*"],
  includeVersion: true,
  disableSources: true,
  githubPages: false,
  treatWarningsAsErrors: true,
  searchInComments: true,
  searchInDocuments: true,
  markdownItLoader(parser) {
    parser.use(tex, {
      render: (formula, displayMode) =>
        temml.renderToString(formula, { displayMode, throwOnError: true }),
    });
  },
  validation: { notExported: true, invalidLink: true, notDocumented: true, rewrittenLink: true },
  requiredToBeDocumented: ["Variable", "Function", "Interface", "Property", "TypeAlias"],
};

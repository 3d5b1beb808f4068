/**
 * Builds the documentation into .docs: pages with their pictures, chapters, Run buttons, the explore page.
 * npm run docs (dist must be built). Exit code 1 on any warning.
 */
import { readFileSync, rmSync } from "node:fs";
import { build } from "esbuild";
import { Application } from "typedoc";
import { allBlocks } from "../../test/examples/_blocks.js";
import { runBlocks } from "../../test/examples/_results.js";
import { filesUnder, ROOT } from "../../test/_source.js";
import { writeExplorePage } from "./explorePage.js";
import { pageBlocks, withPictures, writePage } from "./pages.js";
import { attachSite } from "./plugin.js";
import { quantitiesPage } from "./quantities.js";
import { attachSearch, usesOf } from "./search.js";
import { packagesOf, scriptsOf, writeModules } from "./runnable.js";
import { sourcesPage } from "./sources.js";

const SITE = `${ROOT}.cache/site/`;
const OUT = `${ROOT}.docs/`;

/** Links to the guides that stand in examples, as .cache/site, one folder deeper than docs, must name them. */
const fromSite = (text: string): string => text.replaceAll("](../examples/", "](../../examples/");

/** Markdown pages, in .cache/site. */
function writePages(): void {
  const results = runBlocks(pageBlocks(), `${ROOT}.cache/pictures/`);
  for (const path of filesUnder("docs", ".md"))
    if (!path.startsWith("docs/rooms/"))
      writePage(SITE + path.slice("docs/".length), fromSite(withPictures(path, results)));
  writePage(`${SITE}quantities.md`, quantitiesPage());
  writePage(`${SITE}sources.md`, sourcesPage());
}

/** The script of the Run buttons, with every block in it. */
async function writeRunScript(): Promise<void> {
  await build({
    entryPoints: [`${ROOT}docs/site/run.ts`],
    outfile: `${SITE}run.js`,
    bundle: true,
    minify: true,
    format: "iife",
    target: "es2022",
    define: { SCRIPTS: JSON.stringify(scriptsOf(allBlocks())) },
  });
}

rmSync(SITE, { recursive: true, force: true });
writePages();
await writeRunScript();
const app = await Application.bootstrapWithPlugins({ options: `${ROOT}.config/typedoc.mjs` });
// without its options TypeDoc would write, and first empty, another folder
if (app.logger.hasErrors() || `${app.options.getValue("out")}/` !== OUT) process.exit(1);
attachSite(app);
attachSearch(app, usesOf(allBlocks()));
const project = await app.convert();
if (project === undefined) process.exit(1);
app.validate(project);
await app.generateOutputs(project);
const packages = [...new Set(allBlocks().flatMap(({ code }) => packagesOf(code)))];
await writeModules(packages, `${OUT}assets/modules/`);
await writeExplorePage(OUT);
const { name } = JSON.parse(readFileSync(`${ROOT}package.json`, "utf8"));
console.log(`${name}: ${packages.length} packages for the blocks, site in .docs`);
process.exitCode = app.logger.hasErrors() || app.logger.hasWarnings() ? 1 : 0;

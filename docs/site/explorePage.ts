/** The explore page: one HTML file with script and style beside it; opens from disk too. */
import { cpSync, mkdirSync } from "node:fs";
import { build } from "esbuild";
import { ROOT } from "../../test/_source.js";

/** Writes explore.html into `folder` (ending in a slash), what it needs into its assets. */
export async function writeExplorePage(folder: string): Promise<void> {
  const from = `${ROOT}docs/explore/`;
  mkdirSync(`${folder}assets`, { recursive: true });
  await build({
    entryPoints: [`${from}explore.ts`],
    outfile: `${folder}assets/explore.js`,
    bundle: true,
    minify: true,
    format: "iife",
    target: "es2022",
  });
  cpSync(`${from}explore.html`, `${folder}explore.html`);
  cpSync(`${from}explore.css`, `${folder}assets/explore.css`);
}

/** The code blocks as scripts a page can run, and the packages they import as module sources. */
import { mkdirSync, writeFileSync } from "node:fs";
import { build } from "esbuild";
import { type Block, executable } from "../../test/examples/_blocks.js";
import { ROOT } from "../../test/_source.js";

/** Packages the blocks import; a subpath of ours counts as the whole. */
export function packagesOf(code: string): string[] {
  const names = [...code.matchAll(/^\s*import\b[^;]*?["']([^"']+)["']/gm)].map((m) => m[1]!);
  return [...new Set(names.map((name) => (name.startsWith("airlight/") ? "airlight" : name)))];
}

/** Scripts by the text of their block. */
export function scriptsOf(blocks: readonly Block[]): Record<string, string> {
  return Object.fromEntries(blocks.map(({ code }) => [code.trim(), executable(code)]));
}

/** File name for the source of a package. */
export const moduleFile = (name: string): string => `${name.replace(/[^\w-]+/g, "-")}.js`;

/** Writes each package as one module, kept as text in a classic script, so that pages opened from disk can load it too. */
export async function writeModules(names: readonly string[], folder: string): Promise<void> {
  mkdirSync(folder, { recursive: true });
  for (const name of names) {
    const { outputFiles } = await build({
      stdin: {
        contents: `export * from "${name}";\nimport * as all from "${name}";\nexport default all.default;`,
        resolveDir: ROOT,
      },
      bundle: true,
      minify: true,
      write: false,
      format: "esm",
      platform: "browser",
      target: "es2022",
      logLevel: "error",
      logOverride: { "import-is-undefined": "silent" },
    });
    const source = JSON.stringify(outputFiles[0]!.text).replaceAll("</script", "<\\/script");
    const text = `(globalThis.airlightModules ??= {})[${JSON.stringify(name)}] = ${source};\n`;
    writeFileSync(folder + moduleFile(name), text);
  }
}

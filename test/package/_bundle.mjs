/** The size of an import in a consumer's bundle. Plain JavaScript: shared by the tests and the script that prints the sizes. */
import { build } from "esbuild";

/** Minified bytes of a module that imports `names` from `specifier` and keeps them; `folder` resolves the package. */
export async function bundleBytes(folder, specifier, names) {
  return (await bundleCode(folder, specifier, names)).length;
}

async function bundleCode(folder, specifier, names) {
  const list = names.join(", ");
  const contents =
    names.length === 0
      ? `import {} from "${specifier}";`
      : `export { ${list} } from "${specifier}";`;
  const { outputFiles } = await build({
    stdin: { contents, resolveDir: folder, loader: "js" },
    bundle: true,
    minify: true,
    write: false,
    format: "esm",
    platform: "neutral",
    target: "es2022",
    logLevel: "silent",
  });
  return outputFiles[0].contents;
}

/**
 * The tests of a room and the sources they use as one function, in which every literal can be changed without building again:
 * `text` becomes `(changed === n ? value : text)`. Running it registers the tests. Quicker than a test runner per change by a factor of 20.
 */
import { readFileSync } from "node:fs";
import { pathToFileURL } from "node:url";
import { build, type Plugin } from "esbuild";
import { ROOT } from "../_source.js";
import type { Nudge } from "./_literals.js";

/** Registers the tests with `vitest` (a stand-in for that package); `changed` is the number of the changed literal or -1. */
export type Register = (vitest: object, changed: number, value: number) => void;

/** Packages and Node's modules are imported once, outside the bundle, and handed in. */
type Externals = Record<string, Record<string, unknown>>;

export async function bundleTests(
  tests: readonly string[],
  nudges: readonly Nudge[],
): Promise<Register> {
  const externals: Externals = {};
  const { outputFiles } = await build({
    stdin: {
      contents: tests.map((path) => `import "./${path}";`).join("\n"),
      resolveDir: ROOT,
    },
    bundle: true,
    write: false,
    format: "iife",
    platform: "node",
    target: "node20",
    logLevel: "silent",
    ignoreAnnotations: true, // "sideEffects": false would drop the tests
    plugins: [outside(externals), changeable(nudges)],
  });
  const code = outputFiles[0]!.text;
  const run = new Function("externals", "vitest", "changed", "value", code);
  return (vitest, changed, value) => run(externals, vitest, changed, value);
}

/** Whatever is not a file of the project becomes a module that re-exports what was imported outside. */
function outside(externals: Externals): Plugin {
  return {
    name: "outside",
    setup({ onResolve, onLoad }) {
      onResolve({ filter: /^[^.]/ }, ({ path, kind }) =>
        kind === "entry-point" ? undefined : { path, namespace: "outside" },
      );
      onLoad({ filter: /.*/, namespace: "outside" }, async ({ path }) => {
        if (path === "vitest")
          return { contents: "export const { describe, it, test, expect } = vitest;" };
        const module = await import(path);
        externals[path] = module;
        const from = `externals[${JSON.stringify(path)}]`;
        const names = Object.keys(module).filter(
          (name) => /^[\w$]+$/.test(name) && name !== "default",
        );
        const head = "default" in module ? `export default ${from}.default;` : "";
        return { contents: `${head} export const { ${names.join(", ")} } = ${from};` };
      });
    },
  };
}

/** Sources with changeable literals; tests that keep knowing where they are. */
function changeable(nudges: readonly Nudge[]): Plugin {
  return {
    name: "changeable",
    setup({ onLoad }) {
      onLoad({ filter: /\.ts$/ }, ({ path }) => {
        const here = JSON.stringify(pathToFileURL(path).href);
        let text = readFileSync(path, "utf8");
        const own = [...nudges.entries()].filter(([, nudge]) => ROOT + nudge.path === path);
        for (const [n, { from, to }] of own.sort(([, a], [, b]) => b.from - a.from))
          text = `${text.slice(0, from)}(changed === ${n} ? value : ${text.slice(from, to)})${text.slice(to)}`;
        return { contents: text.replaceAll("import.meta.url", here), loader: "ts" };
      });
    },
  };
}

import { readFileSync } from "node:fs";
import { join } from "node:path";
import { describe, expect, inject, it } from "vitest";
import { exportedTypes, exportedValues, reexported } from "../house/_rules.js";
import { textOf, treeOf } from "../_source.js";
// @ts-expect-error plain JavaScript, shared with a script
import { bundleBytes } from "./_bundle.mjs";
import { PUBLIC_NAMES } from "./_names.js";

const consumer = inject("consumer");
const { exports } = JSON.parse(textOf("package.json"));
const paths = Object.keys(exports).filter((path) => path !== "." && path !== "./package.json");
const specifier = (path: string): string => `airlight${path.slice(1)}`;
const sizeOf = (from: string, ...names: string[]): Promise<number> =>
  bundleBytes(consumer, from, names);

/** Names exported at run time by the installed package. */
async function valuesOf(path: string): Promise<string[]> {
  const { default: target } = exports[path];
  return Object.keys(await import(join(consumer, "node_modules/airlight", target))).sort();
}

/** Names of the types a declaration file re-exports or declares. */
function typesOf(path: string, values: readonly string[]): string[] {
  const file = join(consumer, "node_modules/airlight", exports[path].types);
  const tree = treeOf(file, readFileSync(file, "utf8"));
  return [...reexported(tree), ...exportedTypes(tree)].filter((n) => !values.includes(n)).sort();
}

describe("the public names", () => {
  it("are listed for every subpath", () => {
    expect(Object.keys(PUBLIC_NAMES).sort()).toEqual([...paths].sort());
  });

  it.each(paths)("%s exports exactly what is listed", async (path) => {
    const listed = PUBLIC_NAMES[path];
    const values = await valuesOf(path);
    expect(values).toEqual(Object.keys(listed?.values ?? {}).sort());
    expect(typesOf(path, values)).toEqual([...(listed?.types ?? [])].sort());
  });

  it("of airlight itself are those of the rooms, units and constants", async () => {
    const rooms = paths.flatMap((path) => Object.keys(PUBLIC_NAMES[path]?.values ?? {}));
    const ground = ["src/units.ts", "src/constants.ts"].flatMap((path) =>
      exportedValues(treeOf(path, textOf(path))),
    );
    expect(await valuesOf(".")).toEqual([...rooms, ...ground].sort());
    expect(new Set(rooms).size).toBe(rooms.length);
  });
});

describe("bytes in a consumer's bundle", () => {
  it("nothing for importing nothing", async () => {
    expect(await sizeOf("airlight")).toBe(0);
    for (const path of paths) expect(await sizeOf(specifier(path)), path).toBe(0);
  });

  it("under 1000, minified, for one function without a table", async () => {
    for (const name of ["rayleighCrossSection", "spectrumToXyz"])
      expect(await sizeOf("airlight", name), name).toBeLessThan(1000);
  });

  const ceilings = paths.flatMap((path) =>
    Object.entries(PUBLIC_NAMES[path]?.values ?? {}).map(([name, most]) => ({ path, name, most })),
  );
  it.each(ceilings)(
    "$name costs at most $most, and the same through airlight",
    async ({ path, name, most }) => {
      const bytes = await sizeOf(specifier(path), name);
      expect(bytes).toBeGreaterThan(0);
      expect(bytes).toBeLessThanOrEqual(most);
      expect(bytes, "a ceiling far above the size says nothing").toBeGreaterThan(most / 1.5);
      // the same modules; their order, and with it the short names, may differ by a few bytes
      expect(Math.abs((await sizeOf("airlight", name)) - bytes)).toBeLessThan(20);
    },
  );
});

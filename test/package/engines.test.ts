/** The same numbers in Node and in Deno (another V8), function by function; other engines in test/elsewhere. */
import { spawnSync } from "node:child_process";
import { join } from "node:path";
import * as airlight from "airlight";
import { describe, expect, it } from "vitest";
// @ts-expect-error plain JavaScript: any engine runs it
import { gridOf } from "../engines/_grid.mjs";
// @ts-expect-error plain JavaScript: any engine runs it
import { tooFar, ulpBetween } from "../engines/_ulp.mjs";
import { ROOT } from "../_source.js";

const script = join(ROOT, "test/engines/_print.mjs");

/** What an engine prints. */
function numbersOf(program: string, ...args: string[]): Record<string, string[]> {
  const env = { ...process.env, DENO_NO_UPDATE_CHECK: "1", NO_COLOR: "1" };
  const options = { cwd: ROOT, encoding: "utf8", env, maxBuffer: 1e8 } as const;
  const { stdout, stderr } = spawnSync(program, [...args, script], options);
  if (!stdout.startsWith("{")) throw new Error(stderr);
  return JSON.parse(stdout);
}

describe("results on a grid of inputs", () => {
  it("cover every public function", () => {
    const functions = Object.entries(airlight).filter(([, value]) => typeof value === "function");
    const names = functions.map(([name]) => name);
    expect(Object.keys(gridOf(airlight)).sort()).toEqual(names.sort());
  });

  it("are those of Deno to the stated units in the last place", () => {
    const node = numbersOf(process.execPath);
    const flags = ["run", "--no-check", "--cached-only", "--node-modules-dir=manual"];
    const deno = numbersOf(join(ROOT, "node_modules/.bin/deno"), ...flags, "--allow-read");
    for (const [name, values] of Object.entries(node)) {
      expect(values.length, name).toBeGreaterThan(0);
      expect(values, name).not.toContain("NaN"); // infinite degrees of freedom are right
    }
    expect(tooFar(node, deno)).toEqual([]);
    expect(tooFar(node, { ...deno, airDensity: [] })).toHaveLength(1);
  });

  it("ulpBetween counts units in the last place", () => {
    expect(ulpBetween(1, 1)).toBe(0);
    expect(ulpBetween(1, 1 + 2 ** -52)).toBe(1);
    expect(ulpBetween(1000, 1000 * (1 + 3 * 2 ** -52))).toBeGreaterThan(1);
    expect(ulpBetween(1, Number.NaN)).toBe(Number.POSITIVE_INFINITY);
  });
});

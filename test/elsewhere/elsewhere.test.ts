/** The packed package in engines and compilers that are fetched for it: Bun (JavaScriptCore), newer Nodes, older TypeScripts. On demand: node test/run.mjs elsewhere */
import { spawnSync } from "node:child_process";
import { copyFileSync, mkdirSync, readFileSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { beforeAll, describe, expect, inject, it } from "vitest";
import { ROOT } from "../_source.js";
// @ts-expect-error plain JavaScript: any engine runs it
import { tooFar } from "../engines/_ulp.mjs";

const consumer = inject("consumer");
const folder = join(consumer, "engines");

/** Runs a program of a package fetched by npx, in the consumer's folder. */
function fetched(
  name: string,
  ...args: string[]
): { status: number | null; output: string; errors: string } {
  const options = { cwd: consumer, encoding: "utf8", maxBuffer: 1e8 } as const;
  const { status, stdout, stderr } = spawnSync("npx", ["-y", "-p", name, ...args], options);
  return { status, output: stdout, errors: stderr };
}

describe("numbers in other engines", () => {
  let node: Record<string, string[]>;
  beforeAll(() => {
    mkdirSync(folder, { recursive: true });
    for (const file of ["_grid.mjs", "_print.mjs"])
      copyFileSync(join(ROOT, "test/engines", file), join(folder, file));
    const options = { cwd: consumer, encoding: "utf8", maxBuffer: 1e8 } as const;
    node = JSON.parse(spawnSync(process.execPath, ["engines/_print.mjs"], options).stdout);
  });

  it.each([
    ["bun@1.4.4", "bun"],
    ["node@22", "node"],
    ["node@24", "node"],
  ])("%s agrees to the stated units in the last place", (name, program) => {
    const { output, errors } = fetched(name, program, "engines/_print.mjs");
    expect(output, errors).toMatch(/^\{/);
    expect(tooFar(node, JSON.parse(output))).toEqual([]);
  });
});

describe("older compilers, checking the declarations too", () => {
  const { exports } = JSON.parse(readFileSync(join(ROOT, "package.json"), "utf8"));
  const specifiers = Object.keys(exports)
    .filter((path) => !path.endsWith(".json"))
    .map((path) => `airlight${path.slice(1)}`);
  const code = `${specifiers.map((s, i) => `import * as m${i} from "${s}";`).join("\n")}
import { moistAir, refractiveIndexCiddor } from "airlight";
const air = moistAir({ pressurePa: 1e5, temperatureK: 293.15, relativeHumidity: 0, co2Ppm: 450 });
export const n: number = refractiveIndexCiddor(633, air);
export const everything: object[] = [${specifiers.map((_, i) => `m${i}`).join(", ")}];
`;

  it.each(
    ["5.4.5", "5.5.4", "5.6.3", "5.7.3", "5.8.3", "5.9.3"].flatMap((version) => [
      [version, "nodenext", "nodenext"] as const,
      [version, "esnext", "bundler"] as const,
    ]),
  )("TypeScript %s, module %s, resolution %s", (version, module, moduleResolution) => {
    const checks = { strict: true, noEmit: true, skipLibCheck: false, types: [] };
    const compilerOptions = {
      target: "ES2022",
      lib: ["ES2022"],
      module,
      moduleResolution,
      ...checks,
    };
    const name = `old-${version}-${module}`;
    writeFileSync(join(consumer, `${name}.ts`), code);
    const config = { compilerOptions, files: [`${name}.ts`] };
    writeFileSync(join(consumer, `${name}.json`), JSON.stringify(config));
    const { status, output, errors } = fetched(
      `typescript@${version}`,
      "tsc",
      "-p",
      `${name}.json`,
    );
    expect(output, errors).toBe("");
    expect(status, errors).toBe(0);
    writeFileSync(join(consumer, `${name}.ts`), code.replace("(633, air)", '("633", air)'));
    expect(fetched(`typescript@${version}`, "tsc", "-p", `${name}.json`).output).toContain(
      "TS2345",
    );
  });
});

import { spawnSync } from "node:child_process";
import { readFileSync, statSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { describe, expect, inject, it } from "vitest";
import { allBlocks, resultsOf, writeBlocks } from "../examples/_blocks.js";
import { filesUnder, ROOT, textOf } from "../_source.js";

const consumer = inject("consumer");
const tarball = inject("tarball");
const { exports, version } = JSON.parse(textOf("package.json"));
const paths = Object.keys(exports).filter((path) => path !== "./package.json");
const specifiers = paths.map((path) => `airlight${path.slice(1)}`);

/** Runs a command and returns its exit code and all it printed. */
function run(
  command: string,
  args: string[],
  folder = consumer,
): { code: number | null; output: string } {
  const env = {
    ...process.env,
    NO_COLOR: "1",
    DENO_NO_UPDATE_CHECK: "1",
    DENO_DIR: join(consumer, ".deno"),
  };
  const { status, stdout, stderr } = spawnSync(command, args, {
    cwd: folder,
    encoding: "utf8",
    env,
  });
  return { code: status, output: `${stdout}${stderr}` };
}
const bin = (name: string): string => join(ROOT, "node_modules/.bin", name);
const write = (name: string, text: string): void => writeFileSync(join(consumer, name), text);

describe("the packed tarball", () => {
  it("holds the built sources, package.json, licence and README, and nothing else", () => {
    const built = filesUnder("src", ".ts").flatMap((path) => {
      const name = path.replace(/^src/, "dist").replace(/\.ts$/, "");
      return [`${name}.js`, `${name}.js.map`, `${name}.d.ts`];
    });
    const whole = ["LICENSE", "README.md", "package.json", ...built];
    expect([...inject("contents")].sort()).toEqual(whole.sort());
  });

  it("is small: 600 kB packed, half of it source maps", () => {
    expect(statSync(tarball).size).toBeLessThan(600_000);
  });

  it("passes publint, strictly", () => {
    const { code, output } = run(bin("publint"), [tarball, "--strict"]);
    expect(output).not.toMatch(/Warnings|Errors/);
    expect(code, output).toBe(0);
  });

  it("has types that resolve (attw)", () => {
    const { code, output } = run(bin("attw"), [
      tarball,
      "--profile",
      "esm-only",
      "--no-emoji",
      "--format",
      "ascii",
    ]);
    expect(code, output).toBe(0);
    // once for Node's ESM, once for bundlers, per code path of package.json
    expect(output.match(/from ESM\): OK \(ESM\)/g)).toHaveLength(paths.length);
    expect(output.match(/bundler: OK/g)).toHaveLength(paths.length + 1);
  });
});

/** A script that takes every subpath apart and works out one number; `load` makes a module of a specifier. */
const script = (load: (specifier: string) => string): string => `
const modules = [${specifiers.map(load).join(", ")}];
const [root, ...rooms] = modules;
for (const room of rooms)
  for (const [name, value] of Object.entries(room))
    if (root[name] !== value) throw new Error(name + " is not the same through airlight");
const names = new Set(rooms.flatMap((room) => Object.keys(room)));
const air = root.moistAir({ pressurePa: 100000, temperatureK: 293.15, relativeHumidity: 0, co2Ppm: 450 });
console.log(names.size + " " + root.refractiveIndexCiddor(633, air).toFixed(9));
`;
const EXPECTED = /^[1-9]\d* 1\.000268244\n$/;

describe("the installed package", () => {
  it("imports from airlight and every subpath in Node", () => {
    write(
      "esm.mjs",
      script((s) => `await import("${s}")`),
    );
    const { code, output } = run(process.execPath, ["esm.mjs"]);
    expect(output).toMatch(EXPECTED);
    expect(code).toBe(0);
  });

  it("can be required in Node", () => {
    write(
      "require.cjs",
      script((s) => `require("${s}")`),
    );
    const { code, output } = run(process.execPath, ["--no-warnings", "require.cjs"]);
    expect(output).toMatch(EXPECTED);
    expect(code).toBe(0);
  });

  it("shows its package.json and nothing private", () => {
    const read = `import p from "airlight/package.json" with { type: "json" }; console.log(p.version);`;
    write("json.mjs", read);
    expect(run(process.execPath, ["--no-warnings", "json.mjs"]).output).toBe(`${version}\n`);
    for (const path of ["airlight/dist/index.js", "airlight/air/moistAir", "airlight/_exp"]) {
      write("private.mjs", `import "${path}";`);
      expect(run(process.execPath, ["private.mjs"]).output, path).toContain(
        "ERR_PACKAGE_PATH_NOT_EXPORTED",
      );
    }
  });

  const consumerCode = `${specifiers.map((s, i) => `import * as m${i} from "${s}";`).join("\n")}
import { moistAir, type MoistAir, refractiveIndexCiddor } from "airlight";
import { refractiveIndexCiddor as same } from "airlight/air";
const air: MoistAir = moistAir({ pressurePa: 1e5, temperatureK: 293.15, relativeHumidity: 0, co2Ppm: 450 });
const n: number = refractiveIndexCiddor(633, air);
export const everything: object[] = [${specifiers.map((_, i) => `m${i}`).join(", ")}];
export const equal: boolean = n === same(633, air);
`;
  const options = {
    target: "ES2022",
    lib: ["ES2022"],
    types: [],
    strict: true,
    noEmit: true,
    skipLibCheck: false,
  };
  it.each([
    ["nodenext", "nodenext"],
    ["esnext", "bundler"],
  ])("compiles for a TypeScript consumer: module %s, resolution %s", (module, moduleResolution) => {
    const files = ["consumer.ts"];
    write("consumer.ts", consumerCode);
    write(
      "tsconfig.json",
      JSON.stringify({ compilerOptions: { ...options, module, moduleResolution }, files }),
    );
    const { code, output } = run(bin("tsc"), ["-p", "."]);
    expect(output).toBe("");
    expect(code).toBe(0);
    // a wrong use must not compile: the types are really there
    write("consumer.ts", consumerCode.replace("(633, air)", '("633", air)'));
    expect(run(bin("tsc"), ["-p", "."]).output).toContain("TS2345");
  });

  it("runs and type-checks in Deno", () => {
    write(
      "main.ts",
      script((s) => `await import("npm:${s}")`).replace(
        "const [root, ...rooms] = modules",
        "const [root, ...rooms] = modules as any[]",
      ),
    );
    write("check.ts", consumerCode.replaceAll('from "airlight', 'from "npm:airlight'));
    const flags = ["--cached-only", "--node-modules-dir=manual"];
    const ran = run(bin("deno"), ["run", "--no-check", ...flags, "main.ts"]);
    expect(ran.output).toMatch(EXPECTED);
    expect(ran.code).toBe(0);
    const checked = run(bin("deno"), ["check", ...flags, "check.ts"]);
    expect(checked.code, checked.output).toBe(0);
    write("check.ts", consumerCode.replace("(633, air)", '("633", air)'));
    expect(run(bin("deno"), ["check", ...flags, "check.ts"]).code).not.toBe(0);
  });
});

describe("the code blocks of comments and pages", () => {
  it("run in Deno too, from the installed package", () => {
    const folder = `${join(consumer, "blocks")}/`;
    const blocks = allBlocks().filter(({ code }) => !code.includes("// npm install"));
    writeBlocks(folder, blocks);
    const flags = ["--cached-only", "--node-modules-dir=manual", "--allow-read"];
    const { output } = run(bin("deno"), ["run", "--no-check", ...flags, "blocks/_runBlocks.mjs"]);
    const wrong = Object.entries(resultsOf(output)).filter(([, { errors }]) => errors.length > 0);
    expect(Object.keys(resultsOf(output))).toHaveLength(blocks.length);
    expect(wrong).toEqual([]);
  });
});

describe("the source maps", () => {
  it("carry the sources they point to, by relative paths", () => {
    const map = JSON.parse(
      readFileSync(join(consumer, "node_modules/airlight/dist/air/moistAir.js.map"), "utf8"),
    );
    expect(map.sources).toEqual(["../../src/air/moistAir.ts"]);
    expect(map.sourcesContent[0]).toBe(textOf("src/air/moistAir.ts"));
  });
});

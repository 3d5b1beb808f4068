import { describe, expect, it } from "vitest";
import { filesUnder, textOf, treeOf } from "../_source.js";
import * as rules from "./_rules.js";

const trees = filesUnder("src", ".ts").map((path) => treeOf(path, textOf(path)));
const plant = (path: string, text: string): ReturnType<typeof treeOf> => treeOf(path, text);

const RULES = {
  importOrder: rules.importOrder,
  oneNamePerFile: rules.oneNamePerFile,
  shortEnough: rules.shortEnough,
  commentSections: rules.commentSections,
  pureLanguage: rules.pureLanguage,
  idleTopLevel: rules.idleTopLevel,
  britishNames: rules.britishNames,
  tablesApart: rules.tablesApart,
};

describe("the sources keep the rules of the house", () => {
  it.each(Object.entries(RULES))("%s", (_name, rule) => {
    expect(trees.length).toBeGreaterThan(10);
    expect(trees.flatMap(rule)).toEqual([]);
  });

  it("no circles of imports", () => {
    expect(rules.circles(trees)).toEqual([]);
  });
});

describe("every public name is exported", () => {
  const index = (path: string): string[] => rules.reexported(treeOf(path, textOf(path)));

  it.each(rules.ROOMS)("%s/index.ts re-exports exactly the public files of its room", (room) => {
    const own = trees.filter((t) => t.fileName.startsWith(`src/${room}/`));
    const shown = own.filter((t) => !/\/(_\w+|index)\.ts$/.test(t.fileName));
    const names = shown.flatMap((t) => [...rules.exportedValues(t), ...rules.exportedTypes(t)]);
    // a private file may hold a type that a public signature needs
    const more = own.flatMap((t) => rules.exportedTypes(t));
    const listed = index(`src/${room}/index.ts`);
    expect(listed).toEqual(expect.arrayContaining(names));
    expect([...names, ...more]).toEqual(expect.arrayContaining(listed));
  });

  it("src/index.ts and package.json name every room that has something in it", () => {
    const full = rules.ROOMS.filter((room) => index(`src/${room}/index.ts`).length > 0);
    const root = textOf("src/index.ts");
    const { exports } = JSON.parse(textOf("package.json"));
    for (const room of full) {
      expect(root).toContain(`export * from "./${room}/index.js";`);
      expect(exports[`./${room}`]).toEqual({
        types: `./dist/${room}/index.d.ts`,
        default: `./dist/${room}/index.js`,
      });
    }
    for (const file of ["units", "constants"]) expect(root).toContain(`"./${file}.js"`);
  });
});

describe("the rules find planted faults", () => {
  it.each([
    ["a room below", "src/air/x.ts", 'import { beam } from "../beam/clearBeam.js";'],
    ["a type from a room below", "src/air/x.ts", 'import type { B } from "../beam/clearBeam.js";'],
    ["an index", "src/beam/x.ts", 'import { moistAir } from "../air/index.js";'],
    ["a package", "src/air/x.ts", 'import { readFileSync } from "node:fs";'],
    ["a .ts ending", "src/units.ts", 'import { exp } from "./_exp";'],
    ["a room from the ground", "src/_numeric.ts", 'export { x } from "./air/x.js";'],
    ["uncertainty with a room", "src/uncertainty/x.ts", 'import { x } from "../air/x.js";'],
  ])("importOrder: %s", (_name, path, text) => {
    expect(rules.importOrder(plant(path, text))).toHaveLength(1);
  });

  it("circles", () => {
    const a = plant("src/air/a.ts", 'import { b } from "./b.js";');
    const b = plant("src/air/b.ts", 'import { c } from "./c.js";');
    const c = plant("src/air/c.ts", 'import { a } from "./a.js";');
    expect(rules.circles([a, b, c])).toEqual([
      "src/air/a.ts -> src/air/b.ts -> src/air/c.ts -> src/air/a.ts",
    ]);
    expect(rules.circles([a, b])).toEqual([]);
  });

  it.each([
    ["another name", "export function b(): void {}"],
    ["two functions", "export function a(): void {}\nexport function b(): void {}"],
    ["a function and a constant", "export function a(): void {}\nexport const B = 1;"],
    ["nothing", "function a(): void {}"],
  ])("oneNamePerFile: %s", (_name, text) => {
    expect(rules.oneNamePerFile(plant("src/air/a.ts", text))).toHaveLength(1);
    expect(rules.oneNamePerFile(plant("src/air/_a.ts", text))).toHaveLength(0);
  });

  it("oneNamePerFile lets a file hold types alone", () => {
    const types = plant("src/air/ray.ts", "export interface Ray {}\nexport type Beam = Ray;");
    expect(rules.oneNamePerFile(types)).toEqual([]);
  });

  it("shortEnough counts code, not comments, blanks or tables", () => {
    const body = (n: number): string => `export function a(): void {\n${"f();\n".repeat(n)}}\n`;
    expect(rules.shortEnough(plant("src/air/a.ts", body(33)))).toEqual([]);
    expect(rules.shortEnough(plant("src/air/a.ts", body(34)))).toHaveLength(1);
    const padded = body(33).replaceAll("f();\n", "f();\n\n// note\n");
    expect(rules.shortEnough(plant("src/air/a.ts", padded))).toEqual([]);
    const table = `export const T = [\n${"1, 2,\n".repeat(100)}];\n`;
    expect(rules.shortEnough(plant("src/air/a.ts", table))).toEqual([]);
    const file = "export const A = 1;\n".repeat(71);
    expect(rules.shortEnough(plant("src/air/a.ts", file))).toHaveLength(1);
  });

  const GOOD = `/**
 * Something.
 *
 * Model: m.
 * Validity: v.
 * Accuracy: a.
 * Source: s.
 *
 * @param x - a number
 * @returns a number
 * @throws RangeError
 * @example
 * import { a } from "airlight";
 * a(1); // => 1
 */
export function a(x: number): number {}
`;
  it.each([
    "Model:",
    "Validity:",
    "Accuracy:",
    "Source:",
    "@param x",
    "@returns",
    "@throws",
    "// =>",
    "import",
  ])("commentSections: %s missing", (part) => {
    expect(rules.commentSections(plant("src/air/a.ts", GOOD))).toEqual([]);
    const broken = GOOD.replace(part, "gone");
    expect(rules.commentSections(plant("src/air/a.ts", broken)).length).toBeGreaterThan(0);
  });

  it.each([
    "Math.exp(1);",
    "Math.pow(2, 3);",
    "Math.hypot(3, 4);",
    'Math["sin"](1);',
    "const y = 2 ** 3;",
    "let z = 2; z **= 2;",
    "Math.random();",
    "new Date();",
    "console.log(1);",
    "enum E { A }",
    "class C {}",
    "namespace N {}",
    "export default 1;",
    "export default function f() {}",
    "const a: any = 1;",
  ])("pureLanguage: %s", (text) => {
    expect(rules.pureLanguage(plant("src/air/a.ts", text)).length).toBeGreaterThan(0);
  });

  it("pureLanguage lets exact Math, other things' properties and _numeric.ts through", () => {
    const fine = "Math.sqrt(Math.abs(Math.PI)); a.document; const b = { process: 1 };";
    expect(rules.pureLanguage(plant("src/air/a.ts", fine))).toEqual([]);
    expect(rules.pureLanguage(plant("src/_numeric.ts", "Math.exp(1);"))).toEqual([]);
  });

  it.each([
    "let a = 1;",
    "const a = f();",
    "const a = Math.PI * 2;",
    "const a = new Float64Array([1, 2]);",
    "const a = [...b];",
    "const a = B * 2;",
    "f();",
    "for (const a of []) {}",
  ])("idleTopLevel: %s", (text) => {
    expect(rules.idleTopLevel(plant("src/air/a.ts", text))).toHaveLength(1);
  });

  it("idleTopLevel lets literals, functions and PURE calls through", () => {
    const fine = `const a = -1.5e-8; const b = [1, [2, -3]] as const; const c = { d: [1], e: "x" };
const f = (x: number): number => g(x);
const p = /* @__PURE__ */ f(1);
const m = 1e-3 * 28.9635;`;
    expect(rules.idleTopLevel(plant("src/air/a.ts", fine))).toEqual([]);
  });

  it("britishNames and tablesApart", () => {
    const names = "export function colorTemperature() {}\nexport interface PolarizedRay {}";
    expect(rules.britishNames(plant("src/colour/a.ts", names))).toHaveLength(2);
    const table = `const T = [${"1,".repeat(30)}];`;
    expect(rules.tablesApart(plant("src/air/a.ts", table))).toEqual([]);
    expect(
      rules.tablesApart(plant("src/air/a.ts", `${table}\nexport function a() {}`)),
    ).toHaveLength(1);
  });
});

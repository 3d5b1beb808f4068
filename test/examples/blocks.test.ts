import { writeFileSync } from "node:fs";
import ts from "typescript";
import { describe, expect, it } from "vitest";
import { ROOT } from "../_source.js";
import {
  allBlocks,
  type Block,
  commentBlocks,
  executable,
  importFaults,
  markdownBlocks,
  plainImports,
} from "./_blocks.js";
import { runBlocks } from "./_results.js";

const FOLDER = `${ROOT}.cache/examples/`;

/** Errors of the compiler, by file. */
function typeErrors(blocks: readonly Block[], strict: boolean): Map<string, string[]> {
  // a package without types of its own
  writeFileSync(`${FOLDER}untyped.d.ts`, 'declare module "culori";\n');
  const files = blocks.map((block) => `${FOLDER}${block.id}.ts`);
  const program = ts.createProgram([...files, `${FOLDER}untyped.d.ts`], {
    target: ts.ScriptTarget.ES2022,
    module: ts.ModuleKind.NodeNext,
    moduleResolution: ts.ModuleResolutionKind.NodeNext,
    lib: ["lib.es2022.d.ts", "lib.dom.d.ts"],
    types: [],
    strict,
    noEmit: true,
    skipLibCheck: true,
  });
  const errors = new Map<string, string[]>();
  for (const { file, messageText } of ts.getPreEmitDiagnostics(program)) {
    const id = file?.fileName.slice(FOLDER.length, -3) ?? "";
    errors.set(id, [...(errors.get(id) ?? []), ts.flattenDiagnosticMessageText(messageText, " ")]);
  }
  return errors;
}

const blocks = allBlocks();
const results = runBlocks(blocks, FOLDER);
const types = new Map(
  [true, false].flatMap((strict) => [
    ...typeErrors(
      blocks.filter((block) => block.strict === strict),
      strict,
    ),
  ]),
);

describe("every block a reader can copy", () => {
  it("is found", () => {
    expect(blocks.length).toBeGreaterThan(0);
    expect(new Set(blocks.map((block) => block.id)).size).toBe(blocks.length);
    expect(Object.keys(results)).toHaveLength(blocks.length);
    expect(types.get("")).toBeUndefined();
  });

  it.each(blocks)(
    "$where imports what it uses, compiles, runs and prints the truth",
    ({ id, where, code }) => {
      expect(importFaults(code)).toEqual([]);
      expect(types.get(id) ?? []).toEqual([]);
      expect(results[id]!.errors).toEqual([]);
      if (where.startsWith("src/")) expect(results[id]!.checked).toBeGreaterThan(0);
      const drawn = code.includes('"#picture"');
      expect(results[id]!.picture).toMatch(drawn ? /<svg[^>]* aria-label="[^"]{40,}"/ : /^$/);
    },
  );
});

describe("the extractor", () => {
  it("finds the examples of comments and pages", () => {
    const source = `/** Head. */\n\n/**\n * A.\n * @example\n * import { a } from "airlight";\n * a(\n *   1,\n * ); // => 1\n * @see b\n */\nexport function a() {}\n`;
    const [found] = commentBlocks("src/air/a.ts", source);
    expect(found?.where).toBe("src/air/a.ts:5");
    expect(found?.code).toBe('import { a } from "airlight";\na(\n  1,\n); // => 1');
    const page = "# A\n\n```sh\nnpm\n```\n\n```ts\nf();\n```\ntext\n```js\ng();\n```\n";
    expect(markdownBlocks("A.md", page).map((b) => [b.where, b.code])).toEqual([
      ["A.md:7", "f();"],
      ["A.md:11", "g();"],
    ]);
  });

  it.each([
    ["f(1); // => 2", "f(1)"],
    ["const a = f(1); // => 2", "f(1)"],
    ["console.log(f(1)); // => 2", "f(1)"],
    ["f(\n  1,\n); // => 2", "f(1)"],
  ])("%j is checked", (code, expression) => {
    const script = executable(code);
    expect(script.replace(/\s/g, "")).toContain(`"2",${expression})`.replace(/\s/g, ""));
  });

  it("refuses a printed value that belongs to no expression", () => {
    expect(() => executable("if (a) {\n  // => 3\n}")).toThrow("line 2");
    expect(() => executable("f(1);\n// => 3")).toThrow("line 2");
  });

  it("demands imports from the package, and other packages announced", () => {
    expect(importFaults("f(1);")).toHaveLength(1);
    expect(importFaults('import { a } from "./x.js";')).toHaveLength(2);
    expect(importFaults('import { a } from "airlight/air";')).toEqual([]);
    expect(importFaults('import { a } from "npm:airlight@0.1";')).toEqual([]);
    const culori = 'import { a } from "airlight";\nimport { b } from "culori";';
    expect(importFaults(culori)).toHaveLength(1);
    expect(importFaults(`// npm install airlight culori\n${culori}`)).toEqual([]);
    expect(plainImports('import { a } from "npm:airlight@0.1/air";')).toBe(
      'import { a } from "airlight/air";',
    );
  });
});

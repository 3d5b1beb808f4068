/** Code blocks of the comments and of the Markdown files, made into modules that check the values they print. */
import { copyFileSync, mkdirSync, rmSync, writeFileSync } from "node:fs";
import ts from "typescript";
import { commentOf } from "../house/_rules.js";
import { filesUnder, ROOT, textOf, treeOf, walk } from "../_source.js";

/** A block of code a reader can copy. */
export interface Block {
  /** File and line it starts at. */
  readonly where: string;
  /** Name for a file made of it. */
  readonly id: string;
  readonly code: string;
  /** Whether it is TypeScript to the letter; JavaScript leaves types open. */
  readonly strict: boolean;
}

/** What running a block found. */
export interface BlockResult {
  readonly checked: number;
  readonly errors: string[];
  /** Markup of the picture the block put into the element "#picture"; empty if none. */
  readonly picture: string;
}

const block = (path: string, line: number, code: string, strict = true): Block => ({
  where: `${path}:${line}`,
  id: `${path}-${line}`.replace(/[^\w-]/g, "_"),
  code: code.trimEnd(),
  strict,
});

/** The @example blocks of the comments of a source file. */
export function commentBlocks(path: string, text: string): Block[] {
  const tree = treeOf(path, text);
  const blocks: Block[] = [];
  for (const statement of tree.statements) {
    const comment = commentOf(tree, statement);
    for (const part of comment.split(/^@example[ \t]*\n/m).slice(1)) {
      const code = part.split(/^@(?!example)\w+/m)[0]!.replace(/^```(?:ts)?\n|```$/gm, "");
      const at = text.indexOf("@example", statement.getFullStart());
      blocks.push(
        block(path, tree.getLineAndCharacterOfPosition(at).line + 1 + blocks.length, code),
      );
    }
  }
  return blocks;
}

/** The ts and js blocks of a Markdown file. */
export function markdownBlocks(path: string, text: string): Block[] {
  const fence = /^(`{3,})(ts|typescript|js|javascript)\b.*\n([\s\S]*?)^\1[ \t]*$/gm;
  return [...text.matchAll(fence)].map((match) =>
    block(
      path,
      text.slice(0, match.index).split("\n").length,
      match[3]!,
      match[2]!.startsWith("t"),
    ),
  );
}

/** The Markdown pages: those at the top, of the documentation and of the examples. */
export function pagePaths(): string[] {
  return [
    ...filesUnder("", ".md", false),
    ...["docs", "examples"].flatMap((folder) => filesUnder(folder, ".md")),
  ];
}

/** Every block of the project. */
export function allBlocks(): Block[] {
  const sources = filesUnder("src", ".ts").flatMap((path) => commentBlocks(path, textOf(path)));
  return [...sources, ...pagePaths().flatMap((path) => markdownBlocks(path, textOf(path)))];
}

/** What is wrong with the imports of a block: it must import from the package, and name other packages in a comment "// npm install x". */
export function importFaults(code: string): string[] {
  const specifiers = [...code.matchAll(/^\s*(?:import|export)\b[^;]*?["']([^"']+)["']/gm)].map(
    (m) => m[1]!.replace(/^npm:((?:@[^/]+\/)?[^@/]+)(?:@[^/]+)?/, "$1"),
  );
  const announced = (/\/\/ npm install (.+)/.exec(code)?.[1] ?? "").split(/\s+/);
  const ours = (name: string): boolean => name === "airlight" || name.startsWith("airlight/");
  const faults = specifiers
    .filter((name) => !ours(name) && !announced.includes(name))
    .map((name) => `imports "${name}" without a line "// npm install ${name}"`);
  return specifiers.some(ours) ? faults : [...faults, "imports nothing from airlight"];
}

/** The block as it is compiled: `npm:` specifiers (Deno) become plain ones. */
export function plainImports(code: string): string {
  return code.replace(/(["'])npm:((?:@[^/"']+\/)?[^@/"']+)(?:@[^/"']+)?/g, "$1$2");
}

/** JavaScript of a block in which each `expression; // => text` hands its value to checkPrinted. Throws if a printed value has no expression. */
export function executable(code: string): string {
  const tree = treeOf("block.ts", plainImports(code));
  const text = tree.text;
  const edits: { from: number; to: number; by: string }[] = [];
  const used = new Set<number>();
  walk(tree, (node) => {
    const target = printedExpression(node);
    if (target === undefined) return;
    const rest = /^[ \t]*\/\/ ?=> ?(.*)/.exec(text.slice(node.getEnd()))?.[1];
    const line = tree.getLineAndCharacterOfPosition(node.getEnd()).line + 1;
    if (rest === undefined || used.has(line)) return;
    used.add(line);
    const [from, to] = [target.getStart(), target.getEnd()];
    const by = `checkPrinted(${line}, ${JSON.stringify(rest.trim())}, ${text.slice(from, to)})`;
    edits.push({ from, to, by });
  });
  const printed = text.split("\n").flatMap((line, i) => (/\/\/ ?=>/.test(line) ? [i + 1] : []));
  const loose = printed.filter((line) => !used.has(line));
  if (loose.length > 0)
    throw new Error(`line ${loose.join(", ")}: a printed value without expression`);
  let out = text;
  for (const { from, to, by } of edits.sort((a, b) => b.from - a.from))
    out = out.slice(0, from) + by + out.slice(to);
  const options = { target: ts.ScriptTarget.ES2022, module: ts.ModuleKind.ESNext };
  return ts.transpileModule(out, { compilerOptions: { ...options, verbatimModuleSyntax: true } })
    .outputText;
}

/** The expression whose value a comment after `node` prints: of a statement, of the last declaration, or of console.log's argument. */
function printedExpression(node: ts.Node): ts.Expression | undefined {
  if (ts.isVariableStatement(node)) return node.declarationList.declarations.at(-1)?.initializer;
  if (!ts.isExpressionStatement(node)) return undefined;
  const call = node.expression;
  const logs = ts.isCallExpression(call) && call.expression.getText() === "console.log";
  return logs && call.arguments.length === 1 ? call.arguments[0] : call;
}

/** Makes `folder` (ending in a slash) hold the blocks as they are (.ts), as scripts (.mjs), and _runBlocks.mjs that runs them. */
export function writeBlocks(folder: string, blocks: readonly Block[]): void {
  rmSync(folder, { recursive: true, force: true });
  mkdirSync(folder, { recursive: true });
  for (const { id, code } of blocks) {
    let script: string;
    try {
      script = executable(code);
    } catch (error) {
      script = `throw new Error(${JSON.stringify((error as Error).message)});`;
    }
    writeFileSync(`${folder}${id}.mjs`, script);
    // "export {}" makes a module of it
    writeFileSync(`${folder}${id}.ts`, `${plainImports(code)}\nexport {};\n`);
  }
  writeFileSync(`${folder}blocks.json`, JSON.stringify(blocks.map((block) => block.id)));
  for (const file of ["_printed.mjs", "_runBlocks.mjs"])
    copyFileSync(`${ROOT}test/examples/${file}`, folder + file);
}

/** What _runBlocks.mjs printed in its last line. */
export function resultsOf(output: string): Record<string, BlockResult> {
  return JSON.parse(output.trimEnd().split("\n").at(-1)!);
}

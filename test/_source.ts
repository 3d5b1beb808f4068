/** The sources as text and syntax trees, for the tests that read them. */
import { readdirSync, readFileSync } from "node:fs";
import { join, relative } from "node:path";
import { fileURLToPath } from "node:url";
import ts from "typescript";

/** The project's folder, with a slash at its end. */
export const ROOT: string = fileURLToPath(new URL("..", import.meta.url));

/** Paths of the files in `folder`, or anywhere under it (relative to the project) that end in `ending`, sorted. */
export function filesUnder(folder: string, ending: string, recursive = true): string[] {
  return readdirSync(ROOT + folder, { recursive, withFileTypes: true })
    .filter((entry) => entry.isFile() && entry.name.endsWith(ending))
    .map((entry) => relative(ROOT, join(entry.parentPath, entry.name)).replaceAll("\\", "/"))
    .sort();
}

/** Text of a file of the project. */
export function textOf(path: string): string {
  return readFileSync(ROOT + path, "utf8");
}

/** Syntax tree of TypeScript text. */
export function treeOf(path: string, text: string): ts.SourceFile {
  return ts.createSourceFile(path, text, ts.ScriptTarget.ES2022, true);
}

/** Calls `visit` on `node` and everything in it. */
export function walk(node: ts.Node, visit: (node: ts.Node) => void): void {
  visit(node);
  node.forEachChild((child) => walk(child, visit));
}

/** The value of a numeric literal, with a minus before it or not; undefined for anything else. */
export function numberOf(node: ts.Node): number | undefined {
  if (ts.isNumericLiteral(node)) return Number(node.getText().replaceAll("_", ""));
  const minus = ts.isPrefixUnaryExpression(node) && node.operator === ts.SyntaxKind.MinusToken;
  const inner = minus ? numberOf(node.operand) : undefined;
  return inner === undefined ? undefined : -inner;
}

/** The numeric arrays of a tree with at least `least` elements, by the name of the constant or property they belong to. */
export function numberArrays(tree: ts.SourceFile, least: number): Map<string, number[]> {
  const found = new Map<string, number[]>();
  walk(tree, (node) => {
    if (!ts.isArrayLiteralExpression(node) || node.elements.length < least) return;
    const values = node.elements.map(numberOf);
    if (values.some((value) => value === undefined)) return;
    found.set(nameAround(node), values as number[]);
  });
  return found;
}

/** Path of names that leads to `node`: TABLE, or observer.xBar for a property. */
function nameAround(node: ts.Node): string {
  const names: string[] = [];
  for (let at: ts.Node = node; !ts.isSourceFile(at); at = at.parent) {
    if (ts.isVariableDeclaration(at) || ts.isPropertyAssignment(at))
      names.unshift(at.name.getText());
    if (ts.isArrayLiteralExpression(at.parent))
      names.unshift(String(at.parent.elements.indexOf(at as ts.Expression)));
  }
  return names.join(".");
}

/** The rules of the house as functions from a syntax tree to a list of complaints, so that they can be tried on planted faults. */
import ts from "typescript";
import { numberOf, walk } from "../_source.js";

/** Rooms in order: each may import only those before it. Files of src itself come before all rooms. */
export const ROOMS: readonly string[] = [
  ...["spectrum", "air", "scattering", "absorption", "column", "path", "beam", "sky", "colour"],
  ...["retrieval", "uncertainty"],
];

const MOST_FILE_LINES = 70;
/** Collections by design, with ceilings of their own. */
const COLLECTIONS: Readonly<Record<string, number>> = { "src/_check.ts": 110 };
const MOST_FUNCTION_LINES = 35;
/** An array of this many numbers is a table: it does not count as code. */
export const TABLE_LENGTH = 24;

const base = (path: string): string => path.slice(path.lastIndexOf("/") + 1);
const isIndex = (path: string): boolean => base(path) === "index.ts";
const isPrivate = (path: string): boolean => base(path).startsWith("_");
const roomOf = (path: string): string => (path.match(/^src\/([^/]+)\//)?.[1] ?? "") as string;
const isPublic = (path: string): boolean =>
  roomOf(path) !== "" && !isIndex(path) && !isPrivate(path);

/** Text and line of a complaint. */
function complaint(tree: ts.SourceFile, node: ts.Node, text: string): string {
  const line = tree.getLineAndCharacterOfPosition(node.getStart(tree)).line + 1;
  return `${tree.fileName}:${line}: ${text}`;
}

/** Files a file imports or re-exports, as paths of the project; outside packages keep their name. */
export function importsOf(tree: ts.SourceFile, withTypes = true): string[] {
  const paths: string[] = [];
  for (const statement of tree.statements) {
    const from =
      ts.isImportDeclaration(statement) || ts.isExportDeclaration(statement)
        ? statement.moduleSpecifier
        : undefined;
    if (from === undefined || !ts.isStringLiteral(from)) continue;
    if (!withTypes && ts.isImportDeclaration(statement) && statement.importClause?.isTypeOnly)
      continue;
    if (!from.text.startsWith(".")) paths.push(from.text);
    else paths.push(new URL(from.text, `file:///${tree.fileName}`).pathname.slice(1));
  }
  return paths.map((path) => path.replace(/\.js$/, ".ts"));
}

/** Imports reach only rooms above, never an index, never a package, and end in .js. */
export function importOrder(tree: ts.SourceFile): string[] {
  const own = ROOMS.indexOf(roomOf(tree.fileName));
  const isRoot = tree.fileName === "src/index.ts";
  const complaints: string[] = [];
  for (const path of importsOf(tree)) {
    const room = ROOMS.indexOf(roomOf(path));
    const say = (text: string): void => {
      complaints.push(`${tree.fileName}: imports ${path}: ${text}`);
    };
    if (!path.startsWith("src/")) say("not a file of src");
    else if (!path.endsWith(".ts")) say("an import ends in .js");
    else if (isRoot) continue;
    else if (isIndex(path)) say("import the file itself, not an index");
    else if (room > own) say("a room imports only rooms above it");
    else if (roomOf(tree.fileName) === "uncertainty" && room >= 0 && room !== own)
      say("uncertainty knows only numbers and functions");
  }
  return complaints;
}

/** Chains of imports that come back to their start, each named once; imports of types alone leave no trace and do not count. */
export function circles(trees: readonly ts.SourceFile[]): string[] {
  const graph = new Map(trees.map((tree) => [tree.fileName, importsOf(tree, false)]));
  const done = new Set<string>();
  const found: string[] = [];
  const follow = (path: string, trail: readonly string[]): void => {
    const at = trail.indexOf(path);
    if (at >= 0) found.push([...trail.slice(at), path].join(" -> "));
    if (at >= 0 || done.has(path)) return;
    for (const next of graph.get(path) ?? []) follow(next, [...trail, path]);
    done.add(path);
  };
  for (const path of graph.keys()) follow(path, []);
  return found;
}

const isExported = (node: ts.Node): boolean =>
  ts.canHaveModifiers(node) &&
  (ts.getModifiers(node) ?? []).some((m) => m.kind === ts.SyntaxKind.ExportKeyword);

/** Names of the functions and constants a file exports itself. */
export function exportedValues(tree: ts.SourceFile): string[] {
  return tree.statements.filter(isExported).flatMap((statement) => {
    if (ts.isFunctionDeclaration(statement)) return [statement.name?.text ?? "default"];
    if (!ts.isVariableStatement(statement)) return [];
    return statement.declarationList.declarations.map((d) => d.name.getText(tree));
  });
}

/** Names of the types a file exports itself. */
export function exportedTypes(tree: ts.SourceFile): string[] {
  return tree.statements
    .filter((s) => isExported(s))
    .filter((s) => ts.isInterfaceDeclaration(s) || ts.isTypeAliasDeclaration(s))
    .map((s) => s.name.text);
}

/** Names an index re-exports. */
export function reexported(tree: ts.SourceFile): string[] {
  return tree.statements.flatMap((statement) => {
    const clause = ts.isExportDeclaration(statement) ? statement.exportClause : undefined;
    return clause && ts.isNamedExports(clause) ? clause.elements.map((e) => e.name.text) : [];
  });
}

/** A public file exports one function or one table, named after the file; or types alone. */
export function oneNamePerFile(tree: ts.SourceFile): string[] {
  if (!isPublic(tree.fileName)) return [];
  const names = exportedValues(tree);
  const wanted = base(tree.fileName).replace(/\.ts$/, "");
  if (names.length === 0 && exportedTypes(tree).length > 0) return [];
  return names.length === 1 && names[0] === wanted
    ? []
    : [
        `${tree.fileName}: exports ${names.join(", ") || "nothing"}; it should export ${wanted} alone`,
      ];
}

/** Lines that carry code, tables and comments left out. */
function codeLines(tree: ts.SourceFile, within: ts.Node): number {
  const lines = new Set<number>();
  const isTable = (node: ts.Node): boolean =>
    ts.isArrayLiteralExpression(node) &&
    node.elements.length >= TABLE_LENGTH &&
    node.elements.every((e) => numberOf(e) !== undefined);
  const visit = (node: ts.Node): void => {
    if (isTable(node)) return;
    const children = node.getChildren(tree).filter((child) => !ts.isJSDoc(child));
    if (children.length > 0) {
      for (const child of children) visit(child);
      return;
    }
    if (node.kind === ts.SyntaxKind.EndOfFileToken || node.getWidth(tree) === 0) return;
    const from = tree.getLineAndCharacterOfPosition(node.getStart(tree)).line;
    const to = tree.getLineAndCharacterOfPosition(node.getEnd()).line;
    for (let line = from; line <= to; line++) lines.add(line);
  };
  visit(within);
  return lines.size;
}

/** Files and functions are short. */
export function shortEnough(tree: ts.SourceFile): string[] {
  const complaints: string[] = [];
  const lines = codeLines(tree, tree);
  const most = COLLECTIONS[tree.fileName] ?? MOST_FILE_LINES;
  if (lines > most && !isIndex(tree.fileName))
    complaints.push(`${tree.fileName}: ${lines} lines of code, at most ${most}`);
  walk(tree, (node) => {
    if (!ts.isFunctionLike(node)) return;
    const long = codeLines(tree, node);
    if (long > MOST_FUNCTION_LINES)
      complaints.push(
        complaint(tree, node, `a function of ${long} lines, at most ${MOST_FUNCTION_LINES}`),
      );
  });
  return complaints;
}

/** The text of the comment that belongs to a statement, without its stars. */
export function commentOf(tree: ts.SourceFile, node: ts.Node): string {
  const ranges = ts.getLeadingCommentRanges(tree.text, node.getFullStart()) ?? [];
  const docs = ranges.map((r) => tree.text.slice(r.pos, r.end)).filter((t) => t.startsWith("/**"));
  const text = docs.at(-1) ?? "";
  return text.replace(/^\/\*\*|\*\/$/g, "").replace(/^[ \t]*\* ?/gm, "");
}

/** Every exported function of a public file says what it does, within what range, how well, after whom, and shows it. */
export function commentSections(tree: ts.SourceFile): string[] {
  if (!isPublic(tree.fileName)) return [];
  const complaints: string[] = [];
  for (const statement of tree.statements.filter(isExported)) {
    const comment = commentOf(tree, statement);
    const need = (pattern: RegExp, what: string): void => {
      if (!pattern.test(comment)) complaints.push(complaint(tree, statement, `no ${what}`));
    };
    need(/\S/, "doc comment");
    if (ts.isVariableStatement(statement)) need(/^Source:/m, "Source:");
    if (!ts.isFunctionDeclaration(statement)) continue;
    for (const head of ["Model", "Validity", "Accuracy", "Source"])
      need(new RegExp(`^${head}: ?\\S`, "m"), `${head}:`);
    for (const parameter of statement.parameters) {
      const name = parameter.name.getText(tree);
      need(new RegExp(`^@param ${name.replace("$", "\\$")} - \\S`, "m"), `@param ${name} - ...`);
    }
    for (const tag of ["returns", "throws"]) need(new RegExp(`^@${tag} \\S`, "m"), `@${tag}`);
    need(
      /^@example\n(?:.*\n)*?.*; \/\/ => \S/m,
      "@example with a printed value (expression; // => value)",
    );
    need(/^@example\n(?:.*\n)*?import .* from "airlight/m, '@example that imports from "airlight"');
  }
  return complaints;
}

/** What of Math is the same to the last bit in every engine, or a constant. */
const EXACT_MATH = new Set(
  "abs ceil floor fround imul max min round sign sqrt trunc PI SQRT2 SQRT1_2 LN2 LN10 LOG2E LOG10E E".split(
    " ",
  ),
);
const FORBIDDEN_GLOBALS = new Set(
  "Date performance process console fetch crypto globalThis window document require setTimeout Intl".split(
    " ",
  ),
);

/** No engine-dependent mathematics outside _numeric.ts and _exp.ts, no powers by operator, no world outside. */
export function pureLanguage(tree: ts.SourceFile): string[] {
  const complaints: string[] = [];
  const numeric = ["src/_numeric.ts", "src/_exp.ts"].includes(tree.fileName);
  const say = (node: ts.Node, text: string): void => {
    complaints.push(complaint(tree, node, text));
  };
  walk(tree, (node) => {
    if (ts.isPropertyAccessExpression(node) && node.expression.getText(tree) === "Math") {
      if (!EXACT_MATH.has(node.name.text) && !numeric)
        say(node, `Math.${node.name.text}: use _numeric.ts`);
    } else if (ts.isElementAccessExpression(node) && node.expression.getText(tree) === "Math")
      say(node, "Math by computed name");
    else if (
      node.kind === ts.SyntaxKind.AsteriskAsteriskToken ||
      node.kind === ts.SyntaxKind.AsteriskAsteriskEqualsToken
    )
      say(node, "** is slow and differs between engines: use products");
    else if (ts.isIdentifier(node) && FORBIDDEN_GLOBALS.has(node.text) && isFree(node))
      say(node, `${node.text}: functions are pure`);
    else if (ts.isEnumDeclaration(node)) say(node, "no enums");
    else if (ts.isClassLike(node)) say(node, "no classes");
    else if (ts.isModuleDeclaration(node)) say(node, "no namespaces");
    else if (ts.isExportAssignment(node)) say(node, "no default exports");
    else if (node.kind === ts.SyntaxKind.DefaultKeyword && isExported(node.parent))
      say(node, "no default exports");
    else if (node.kind === ts.SyntaxKind.AnyKeyword) say(node, "no any");
  });
  return complaints;
}

/** An identifier that stands for itself, not the name of a property. */
function isFree(node: ts.Identifier): boolean {
  const parent = node.parent;
  if (ts.isPropertyAccessExpression(parent)) return parent.expression === node;
  return !("name" in parent && parent.name === node);
}

/** Nothing is worked out when a module loads, so that whatever is not used can be dropped: literals, functions, or PURE calls. */
export function idleTopLevel(tree: ts.SourceFile): string[] {
  const complaints: string[] = [];
  for (const statement of tree.statements) {
    if (ts.isVariableStatement(statement)) {
      if (!(statement.declarationList.flags & ts.NodeFlags.Const))
        complaints.push(complaint(tree, statement, "module state: only const at top level"));
      for (const { initializer } of statement.declarationList.declarations)
        if (initializer && !isIdle(initializer, tree))
          complaints.push(
            complaint(tree, initializer, "work at top level: write the value, or /* @__PURE__ */"),
          );
    } else if (
      !ts.isImportDeclaration(statement) &&
      !ts.isExportDeclaration(statement) &&
      !ts.isFunctionDeclaration(statement) &&
      !ts.isInterfaceDeclaration(statement) &&
      !ts.isTypeAliasDeclaration(statement) &&
      !ts.isExportAssignment(statement)
    )
      complaints.push(complaint(tree, statement, "a statement at top level"));
  }
  return complaints;
}

function isIdle(node: ts.Expression, tree: ts.SourceFile): boolean {
  const idle = (inner: ts.Expression): boolean => isIdle(inner, tree);
  if (ts.isLiteralExpression(node) || ts.isFunctionLike(node)) return true;
  if (node.kind === ts.SyntaxKind.TrueKeyword || node.kind === ts.SyntaxKind.FalseKeyword)
    return true;
  if (ts.isPrefixUnaryExpression(node)) return idle(node.operand);
  if (
    ts.isAsExpression(node) ||
    ts.isSatisfiesExpression(node) ||
    ts.isParenthesizedExpression(node)
  )
    return idle(node.expression);
  if (ts.isArrayLiteralExpression(node)) return node.elements.every(idle);
  if (ts.isObjectLiteralExpression(node))
    return node.properties.every((p) => ts.isPropertyAssignment(p) && idle(p.initializer));
  if (ts.isBinaryExpression(node)) return idle(node.left) && idle(node.right);
  if (ts.isCallExpression(node) || ts.isNewExpression(node))
    return /^\s*\/\* ?[@#]__PURE__ ?\*\//.test(tree.text.slice(node.getFullStart(), node.getEnd()));
  return false;
}

/** Public names are written the British way. */
export function britishNames(tree: ts.SourceFile): string[] {
  const american =
    /color(?!im)|polariz|gray|meters|center|vapor(?!i[sz])|normaliz|(?:^|[a-z])behavior/i;
  return [...exportedValues(tree), ...exportedTypes(tree)]
    .filter((name) => american.test(name))
    .map((name) => `${tree.fileName}: ${name}: British spelling in public names`);
}

/** A table stands alone in its file: nothing else there is exported, and no function. */
export function tablesApart(tree: ts.SourceFile): string[] {
  let table = false;
  let functions = 0;
  walk(tree, (node) => {
    if (ts.isArrayLiteralExpression(node) && node.elements.length >= TABLE_LENGTH)
      table ||= node.elements.every((e) => numberOf(e) !== undefined);
    if (ts.isFunctionLike(node)) functions += 1;
  });
  // _exp.ts: reading an exported table costs half as much again in its inner loop
  if (!table || functions === 0 || tree.fileName === "src/_exp.ts") return [];
  return [`${tree.fileName}: a table and a function in one file`];
}

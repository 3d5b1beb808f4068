/** The report of the public interface: every exported name with its signature, room by room, without comments. */
import ts from "typescript";
import { textOf, treeOf } from "../_source.js";

/** Paths of the modules src/index.ts gathers, without "./" and ".js": ground files and rooms' indexes. */
function modules(): string[] {
  const gathered = textOf("src/index.ts").matchAll(/^export \* from "\.\/(.+)\.js";/gm);
  return [...gathered].map((match) => match[1]!);
}

/** Declarations of a source file as a consumer's compiler sees them, comments removed. */
function declarations(path: string): ts.SourceFile {
  const { outputText } = ts.transpileDeclaration(textOf(path), {
    fileName: path,
    compilerOptions: { removeComments: true, target: ts.ScriptTarget.ES2022 },
  });
  return treeOf(path.replace(".ts", ".d.ts"), outputText);
}

function nameOf(statement: ts.Statement): string | undefined {
  if (ts.isVariableStatement(statement))
    return statement.declarationList.declarations[0]?.name.getText();
  const { name } = statement as ts.FunctionDeclaration;
  return name?.text;
}

/** Texts of the exported statements of a file; of `names` only, if given. */
function statementsOf(path: string, names?: ReadonlySet<string>): string[] {
  const exported = declarations(path).statements.filter((statement) =>
    statement.getText().startsWith("export "),
  );
  return exported
    .filter((one) => names === undefined || names.has(nameOf(one) ?? ""))
    .map((one) => one.getText().replace(/^export (?:declare )?/, ""));
}

/** What an index re-exports: file and names. */
function reexports(room: string): [path: string, names: Set<string>][] {
  return treeOf(`src/${room}/index.ts`, textOf(`src/${room}/index.ts`))
    .statements.filter(ts.isExportDeclaration)
    .map(({ moduleSpecifier, exportClause }) => {
      const file = (moduleSpecifier as ts.StringLiteral).text.slice(2).replace(/\.js$/, ".ts");
      const { elements } = exportClause as ts.NamedExports;
      return [`src/${room}/${file}`, new Set(elements.map((element) => element.name.text))];
    });
}

/** The whole report. */
export function apiReport(): string {
  const chapters = modules().map((path) => {
    const room = path.replace(/\/index$/, "");
    const texts =
      room === path
        ? statementsOf(`src/${path}.ts`)
        : reexports(room).flatMap(([file, names]) => statementsOf(file, names));
    return `# ${room}\n\n${texts.sort().join("\n")}\n`;
  });
  return `Public interface of airlight; npm run api writes it anew.\n\n${chapters.join("\n")}`;
}

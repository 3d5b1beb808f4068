/** The public functions with the sections of their comments, for the pages of quantities and sources. */
import ts from "typescript";
import { commentOf, ROOMS } from "../../test/house/_rules.js";
import { filesUnder, textOf, treeOf } from "../../test/_source.js";

/** A public function and what its comment says. */
export interface PublicFunction {
  readonly room: string;
  readonly name: string;
  /** First sentence. */
  readonly meaning: string;
  /** What it returns, with the unit. */
  readonly returns: string;
  readonly validity: string;
  readonly accuracy: string;
  readonly source: string;
}

const oneLine = (text: string | undefined): string => (text ?? "").replace(/\s+/g, " ").trim();

/** Text of a fixed section, up to the next one or the tags. */
function section(comment: string, head: string): string {
  const end = "(?=\\n(?:Model|Validity|Accuracy|Source|Warning):|\\n\\s*\\n|\\n@|$(?![\\s\\S]))";
  return oneLine(new RegExp(`^${head}:([\\s\\S]*?)${end}`, "m").exec(comment)?.[1]);
}

/** Every public function, room by room. */
export function publicFunctions(): PublicFunction[] {
  return ROOMS.flatMap((room) =>
    filesUnder(`src/${room}`, ".ts")
      .filter((path) => !/\/(_\w+|index)\.ts$/.test(path))
      .flatMap((path) => {
        const tree = treeOf(path, textOf(path));
        return tree.statements.filter(isExportedFunction).map((statement) => {
          const comment = commentOf(tree, statement);
          return {
            room,
            name: statement.name!.text,
            meaning: oneLine(comment.split(/\n\s*\n/)[0]),
            returns: oneLine(/^@returns([\s\S]*?)(?=\n@|$(?![\s\S]))/m.exec(comment)?.[1]),
            validity: section(comment, "Validity"),
            accuracy: section(comment, "Accuracy"),
            source: section(comment, "Source"),
          };
        });
      }),
  );
}

function isExportedFunction(node: ts.Statement): node is ts.FunctionDeclaration {
  return (
    ts.isFunctionDeclaration(node) &&
    (node.modifiers ?? []).some((m) => m.kind === ts.SyntaxKind.ExportKeyword)
  );
}

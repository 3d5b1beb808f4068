/** The numeric literals of a source file that a test should miss if they changed, and how to change them. */
import ts from "typescript";
import { TABLE_LENGTH } from "../house/_rules.js";
import { numberOf, textOf, treeOf, walk } from "../_source.js";

/** One literal and its changed values: the first is the finer. */
export interface Nudge {
  readonly path: string;
  readonly line: number;
  /** Offsets of the literal in the file. */
  readonly from: number;
  readonly to: number;
  readonly text: string;
  readonly changed: readonly string[];
  /** The line of the source, trimmed. */
  readonly source: string;
}

/** All literals of a file except tables (compared number by number elsewhere) and, unless asked for, the limits given to guards. */
export function nudgesOf(path: string, withGuards: boolean): Nudge[] {
  const text = textOf(path);
  const tree = treeOf(path, text);
  const found: Nudge[] = [];
  walk(tree, (node) => {
    if (!ts.isNumericLiteral(node) || ancestors(node).some(ts.isTypeNode)) return;
    if (ts.isPropertyAssignment(node.parent) && node.parent.name === node) return;
    if (isInTable(node) || (!withGuards && isInGuard(node))) return;
    const [from, to] = [node.getStart(), node.getEnd()];
    const line = tree.getLineAndCharacterOfPosition(from).line + 1;
    const source = text.split("\n")[line - 1]!.trim();
    const literal = text.slice(from, to);
    const changed = isCounter(node) ? [String(Number(literal) + 1)] : changedValues(literal);
    found.push({ path, line, from, to, text: literal, changed, source });
  });
  return found;
}

/**
 * The literal changed by one unit in its last digit, or by 0.1 % where that unit is more; where it is less, by 0.1 % after it.
 * Beyond twelve digits (derived constants) the unit is that of the tenth.
 */
export function changedValues(literal: string): string[] {
  const value = Number(literal.replaceAll("_", ""));
  if (value === 0) return ["0.001"];
  const [mantissa, exponent = "0"] = literal.toLowerCase().replaceAll("_", "").split("e");
  const digits = mantissa!.replace(".", "").replace(/^0+/, "").length;
  const decimals = (mantissa!.split(".")[1] ?? "").length;
  const last = 10 ** (Number(exponent) - decimals);
  const unit = digits > 12 ? last * 10 ** (digits - 10) : last;
  const coarse = value * 1.001;
  const fine = value + unit;
  return unit < value * 0.000999 ? [String(fine), String(coarse)] : [String(coarse)];
}

function ancestors(node: ts.Node): ts.Node[] {
  const list: ts.Node[] = [];
  for (let at = node.parent; at !== undefined; at = at.parent) list.push(at);
  return list;
}

function isInTable(node: ts.Node): boolean {
  return ancestors(node).some(
    (at) =>
      ts.isArrayLiteralExpression(at) &&
      at.elements.length >= TABLE_LENGTH &&
      at.elements.every((e) => numberOf(e) !== undefined || ts.isArrayLiteralExpression(e)),
  );
}

function isInGuard(node: ts.Node): boolean {
  return ancestors(node).some(
    (at) =>
      ts.isCallExpression(at) &&
      /^(check|refuse)/.test(at.expression.getText()) &&
      node.parent !== at.expression,
  );
}

const BITWISE = new Set([
  ts.SyntaxKind.AmpersandToken,
  ts.SyntaxKind.BarToken,
  ts.SyntaxKind.CaretToken,
  ts.SyntaxKind.LessThanLessThanToken,
  ts.SyntaxKind.GreaterThanGreaterThanToken,
  ts.SyntaxKind.GreaterThanGreaterThanGreaterThanToken,
  ts.SyntaxKind.PercentToken,
]);

/** A literal that counts or points: a change of 0.1 % would mean nothing there. */
function isCounter(node: ts.Node): boolean {
  const text = node.getText();
  if (!/^\d+$/.test(text)) return false;
  for (let at: ts.Node = node; at.parent !== undefined; at = at.parent) {
    const parent = at.parent;
    if (ts.isElementAccessExpression(parent)) return parent.argumentExpression === at;
    if (ts.isForStatement(parent)) return parent.statement !== at;
    if (ts.isNewExpression(parent)) return true;
    if (ts.isCallExpression(parent))
      return /^zeros$|\.(at|slice|subarray|toFixed|toPrecision|toString|padStart|imul)$/.test(
        parent.expression.getText(),
      );
    if (ts.isBinaryExpression(parent)) {
      const other = (parent.left === at ? parent.right : parent.left).getText();
      if (
        BITWISE.has(parent.operatorToken.kind) ||
        /\.length$|^(i|j|k|low|high|index|count|codes?(\[.*\])?)$/.test(other)
      )
        return true;
    }
    if (ts.isStatement(parent)) return false;
  }
  return false;
}

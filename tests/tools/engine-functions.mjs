// Finds in src what may differ between engines, places or moments: the elementary functions and powers of doubles of
// the engine, locales, dates and random numbers. The library has functions of its own, so that the same call gives the
// same bits everywhere.
import { readdirSync } from "node:fs";
import { join, relative } from "node:path";
import { fileURLToPath } from "node:url";
import ts from "typescript";

const exactMembers = new Set(
  ["abs", "sqrt", "floor", "ceil", "trunc", "round", "sign", "min", "max", "fround", "imul", "clz32"].concat([
    "E",
    "LN10",
    "LN2",
    "LOG10E",
    "LOG2E",
    "PI",
    "SQRT1_2",
    "SQRT2",
  ]),
);
const forbiddenGlobals = new Set(["Intl", "Date", "Temporal", "performance", "crypto"]);

/**
 * @param {string[]} paths - TypeScript files
 * @returns {{ file: string, line: number, message: string }[]} in the order of files and lines
 */
export function findEngineFunctions(paths) {
  const program = ts.createProgram(paths, {
    target: ts.ScriptTarget.ES2022,
    lib: ["lib.es2023.d.ts"],
    module: ts.ModuleKind.ESNext,
    moduleResolution: ts.ModuleResolutionKind.Bundler,
    strict: true,
    noEmit: true,
    types: [],
  });
  const checker = program.getTypeChecker();
  const findings = [];

  for (const path of paths) {
    const source = program.getSourceFile(path);
    if (source === undefined) throw new Error(`cannot read ${path}`);
    const report = (node, message) => {
      const { line } = source.getLineAndCharacterOfPosition(node.getStart(source));
      findings.push({ file: path, line: line + 1, message });
    };
    const visit = (node) => {
      examine(node, report);
      ts.forEachChild(node, visit);
    };
    visit(source);
  }
  return findings;

  function examine(node, report) {
    if (ts.isBinaryExpression(node)) {
      const operator = node.operatorToken.kind;
      const isPower =
        operator === ts.SyntaxKind.AsteriskAsteriskToken || operator === ts.SyntaxKind.AsteriskAsteriskEqualsToken;
      if (isPower && !(isBigInt(node.left) && isBigInt(node.right))) {
        report(node, "a power of doubles; use power of numeric, or BigInt operands");
      }
    }
    if (ts.isIdentifier(node) && isReference(node)) {
      if (node.text === "Math") examineMath(node, report);
      else if (forbiddenGlobals.has(node.text)) report(node, node.text);
    }
    const name = memberName(node);
    if (name?.startsWith("toLocale") || name === "localeCompare") report(node, `${name} depends on the locale`);
    if (name === "Math" && !ts.isIdentifier(node)) report(node, "Math reached through another object");
  }

  function examineMath(node, report) {
    const { parent } = node;
    const name = parent.expression === node ? memberName(parent) : undefined;
    if (name === undefined) report(node, "Math as a value; write Math.name for a name that is allowed");
    else if (!exactMembers.has(name)) report(node, `Math.${name} may differ between engines; use numeric`);
  }

  function isBigInt(node) {
    return (checker.getTypeAtLocation(node).flags & ts.TypeFlags.BigIntLike) !== 0;
  }
}

/** The name of an accessed member, by dot or by a constant in brackets. */
function memberName(node) {
  if (ts.isPropertyAccessExpression(node)) return node.name.text;
  if (ts.isElementAccessExpression(node) && ts.isStringLiteralLike(node.argumentExpression)) {
    return node.argumentExpression.text;
  }
  if (ts.isBindingElement(node) && ts.isObjectBindingPattern(node.parent)) {
    const name = node.propertyName ?? node.name;
    return ts.isIdentifier(name) || ts.isStringLiteralLike(name) ? name.text : undefined;
  }
  return undefined;
}

/** Whether an identifier refers to a variable, rather than naming a member, a property or a type's field. */
function isReference(node) {
  const { parent } = node;
  if (ts.isPropertyAccessExpression(parent) || ts.isQualifiedName(parent)) return parent.name !== node;
  if (ts.isShorthandPropertyAssignment(parent)) return true;
  return !(
    (ts.isPropertyAssignment(parent) ||
      ts.isPropertySignature(parent) ||
      ts.isPropertyDeclaration(parent) ||
      ts.isMethodDeclaration(parent) ||
      ts.isMethodSignature(parent) ||
      ts.isBindingElement(parent)) &&
    (parent.name === node || parent.propertyName === node) &&
    parent.initializer !== node
  );
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  const folder = process.argv[2] ?? "src";
  const paths = readdirSync(folder, { recursive: true })
    .filter((name) => name.endsWith(".ts"))
    .sort()
    .map((name) => join(folder, name));
  const findings = findEngineFunctions(paths);
  for (const { file, line, message } of findings) console.log(`${relative(".", file)}:${line}: ${message}`);
  console.log(`${paths.length} files, ${findings.length} findings`);
  process.exitCode = findings.length === 0 ? 0 : 1;
}

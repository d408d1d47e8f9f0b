import { existsSync, readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import ts from "typescript";
import { type Expected, parseExpected } from "./expected-value.js";

/** One example of README.md, docs or a docstring. */
export interface Example {
  /** File and line of its first line of code. */
  readonly place: string;
  /** The code with the imports it needs, on one line before it. */
  readonly code: string;
  /** The same with each shown value turned into a check. */
  readonly checkedCode: string;
  /** What is shown, in the order of the checks: a value, or the code of the error that is thrown. */
  readonly shown: readonly Shown[];
}

export type Shown =
  | { readonly line: number; readonly value: Expected }
  | { readonly line: number; readonly throws: string };

/** The function that checked code calls as `exampleCheck(number of the check, () => value)`. */
export type ExampleCheck = (index: number, evaluate: () => unknown) => unknown;

const packageName = "gibbs-ledger";

/** Every example of the project that lies in `root`, in the order of files and lines. */
export function readExamples(root: string): Example[] {
  const documents = ["README.md", ...filesUnder(root, "docs", ".md")].filter((path) => existsSync(join(root, path)));
  const faces = readFaces(root);
  return [
    ...documents.flatMap((path) =>
      fencedBlocks(readFileSync(join(root, path), "utf8")).map(({ code, line }) => example(path, line, code, "")),
    ),
    ...filesUnder(root, "src", ".ts").flatMap((path) => docstringExamples(root, path, faces)),
  ];
}

/**
 * The ts blocks of a Markdown text, with the lines on which their code begins. A block after the line
 * `<!-- continued -->` belongs to the example before it.
 */
export function fencedBlocks(markdown: string): { code: string; line: number }[] {
  const blocks: { code: string; line: number }[] = [];
  for (const match of markdown.matchAll(/^(<!-- continued -->\n+)?```ts\n([\s\S]*?)^```/gm)) {
    const [whole, continued, code = ""] = match;
    const line = markdown.slice(0, match.index + whole.indexOf("```ts\n")).split("\n").length + 1;
    const last = blocks.at(-1);
    if (continued === undefined || last === undefined) {
      blocks.push({ code, line });
    } else {
      const nextLine = last.line + last.code.split("\n").length - 1;
      last.code += "\n".repeat(line - nextLine) + code;
    }
  }
  return blocks;
}

function docstringExamples(root: string, path: string, faces: Faces): Example[] {
  const text = readFileSync(join(root, path), "utf8");
  const examples: Example[] = [];
  for (const comment of text.matchAll(/\/\*\*[\s\S]*?\*\//g)) {
    const firstLine = text.slice(0, comment.index).split("\n").length;
    const lines = comment[0]
      .split("\n")
      .map((line) => line.replace(/^\s*(?:\/\*\*|\*\/|\* ?)/, "").replace(/\*\/$/, ""));
    lines.forEach((line, index) => {
      if (!/^@example\b/.test(line)) return;
      const end = lines.findIndex((later, position) => position > index && /^@\w+/.test(later));
      const body = lines.slice(index + 1, end === -1 ? undefined : end);
      const blocks = fencedBlocks(`${body.join("\n")}\n`);
      const found = blocks.length > 0 ? blocks : [{ code: body.join("\n"), line: 1 }];
      for (const block of found) {
        const imports = neededImports(block.code, path, text, faces);
        examples.push(example(path, firstLine + index + block.line, block.code, imports));
      }
    });
  }
  return examples;
}

/** Builds one example; the checks call {@link ExampleCheck}. */
export function example(path: string, firstLine: number, code: string, imports: string): Example {
  const source = ts.createSourceFile("example.ts", code, ts.ScriptTarget.ES2022, true);
  const shown: Shown[] = [];
  const edits: { from: number; to: number; text: string }[] = [];
  const lineAt = (position: number): number => firstLine + source.getLineAndCharacterOfPosition(position).line;

  const visit = (node: ts.Node): void => {
    const statement = ts.isExpressionStatement(node) || ts.isVariableStatement(node) || ts.isThrowStatement(node);
    const comment = statement ? shownAfter(code, node.end) : undefined;
    if (comment === undefined) {
      ts.forEachChild(node, visit);
      return;
    }
    const line = lineAt(node.getStart(source));
    const start = node.getStart(source);
    const index = shown.length;
    const throws = /^throws\s+(\S+)$/.exec(comment);
    if (throws?.[1] !== undefined) {
      shown.push({ line, throws: throws[1] });
      edits.push({
        from: start,
        to: node.end,
        text: `exampleCheck(${index}, () => { ${code.slice(start, node.end)} });`,
      });
      return;
    }
    try {
      shown.push({ line, value: parseExpected(comment) });
    } catch (error) {
      throw new Error(`${path}:${line}: ${error instanceof Error ? error.message : String(error)}`);
    }
    if (ts.isExpressionStatement(node)) {
      const { expression } = node;
      const inner = code.slice(expression.getStart(source), expression.end);
      edits.push({ from: start, to: node.end, text: `exampleCheck(${index}, () => (${inner}));` });
    } else if (ts.isVariableStatement(node)) {
      const name = node.declarationList.declarations.at(-1)?.name;
      if (name === undefined || !ts.isIdentifier(name)) throw new Error(`${path}:${line}: shows a value of no name`);
      edits.push({ from: node.end, to: node.end, text: ` exampleCheck(${index}, () => ${name.text});` });
    }
  };
  visit(source);

  const checked = edits.reduceRight(
    (text, { from, to, text: edit }) => text.slice(0, from) + edit + text.slice(to),
    code,
  );
  const [head, tail] = [`${imports}\n`, "\nexport {};\n"];
  return { place: `${path}:${firstLine}`, code: head + code + tail, checkedCode: head + checked + tail, shown };
}

/** What a comment after a statement shows: `// => value`, `// throws code`; further lines are indented by four. */
function shownAfter(code: string, end: number): string | undefined {
  const match = /^[^\S\n]*\n?[^\S\n]*\/\/ *(?:=> *(.*)|(throws \S+) *$)((?:\n[^\S\n]*\/\/ {4,}.*)*)/m.exec(
    code.slice(end),
  );
  if (match === null || match.index !== 0) return undefined;
  const further = (match[3] ?? "")
    .split("\n")
    .slice(1)
    .map((line) => line.replace(/^\s*\/\/ {4}/, ""));
  return [match[1] ?? match[2] ?? "", ...further].join("\n").trim();
}

/** For each sub-path: the names it exports. */
type Faces = ReadonlyMap<string, ReadonlySet<string>>;

function readFaces(root: string): Faces {
  const manifest: { exports: Record<string, unknown> } = JSON.parse(readFileSync(join(root, "package.json"), "utf8"));
  const faces = new Map<string, ReadonlySet<string>>();
  for (const subPath of Object.keys(manifest.exports)) {
    const room = subPath === "." ? "" : subPath.slice(2);
    const file = [`src/${room}.ts`, join("src", room, "index.ts")].find((path) => existsSync(join(root, path)));
    if (file !== undefined) faces.set(room, exportedNames(readFileSync(join(root, file), "utf8")));
  }
  return faces;
}

function exportedNames(text: string): Set<string> {
  const names = new Set<string>();
  for (const statement of ts.createSourceFile("face.ts", text, ts.ScriptTarget.ES2022).statements) {
    if (ts.isExportDeclaration(statement) && statement.exportClause && ts.isNamedExports(statement.exportClause)) {
      for (const element of statement.exportClause.elements) names.add(element.name.text);
    } else if (ts.canHaveModifiers(statement) && ts.getModifiers(statement)?.some(isExport)) {
      if (ts.isVariableStatement(statement)) {
        for (const { name } of statement.declarationList.declarations) if (ts.isIdentifier(name)) names.add(name.text);
      } else if ("name" in statement && statement.name && ts.isIdentifier(statement.name as ts.Node)) {
        names.add((statement.name as ts.Identifier).text);
      }
    }
  }
  return names;
}

function isExport(modifier: ts.Modifier): boolean {
  return modifier.kind === ts.SyntaxKind.ExportKeyword;
}

/** Imports for the free names of a docstring's example: from its room, the root, any room, or its own file. */
function neededImports(code: string, path: string, fileText: string, faces: Faces): string {
  const room = path.split("/")[1] ?? "";
  const order = [room, "", ...faces.keys()];
  const own = exportedNames(fileText);
  const bySpecifier = new Map<string, string[]>();
  for (const name of freeNames(code)) {
    const face = order.find((candidate) => faces.get(candidate)?.has(name));
    let specifier: string | undefined;
    if (face !== undefined) specifier = face === "" ? packageName : `${packageName}/${face}`;
    else if (own.has(name)) specifier = join("../..", path).replace(/\.ts$/, ".js");
    if (specifier !== undefined) bySpecifier.set(specifier, [...(bySpecifier.get(specifier) ?? []), name]);
  }
  return [...bySpecifier].map(([from, names]) => `import { ${names.join(", ")} } from "${from}";`).join(" ");
}

function freeNames(code: string): string[] {
  const source = ts.createSourceFile("example.ts", code, ts.ScriptTarget.ES2022, true);
  const declared = new Set<string>();
  const used = new Set<string>();
  const visit = (node: ts.Node): void => {
    if (ts.isIdentifier(node)) {
      const { parent } = node;
      const member =
        (ts.isPropertyAccessExpression(parent) && parent.name === node) ||
        (ts.isPropertyAssignment(parent) && parent.name === node);
      const declares =
        ((ts.isVariableDeclaration(parent) ||
          ts.isParameter(parent) ||
          ts.isFunctionDeclaration(parent) ||
          ts.isBindingElement(parent)) &&
          parent.name === node) ||
        ts.isImportSpecifier(parent) ||
        ts.isImportClause(parent) ||
        ts.isNamespaceImport(parent);
      if (declares) declared.add(node.text);
      else if (!member) used.add(node.text);
    }
    ts.forEachChild(node, visit);
  };
  visit(source);
  return [...used].filter((name) => !declared.has(name)).sort();
}

function filesUnder(root: string, folder: string, ending: string): string[] {
  if (!existsSync(join(root, folder))) return [];
  return readdirSync(join(root, folder), { recursive: true, encoding: "utf8" })
    .filter((name) => name.endsWith(ending) && !name.startsWith("api/"))
    .map((name) => join(folder, name))
    .sort();
}

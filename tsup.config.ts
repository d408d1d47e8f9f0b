import { existsSync, mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { dirname, join, posix } from "node:path";
import { transformSync } from "esbuild";
import { defineConfig } from "tsup";
import ts from "typescript";
import { jsonSchemaFiles } from "./src/exchange/json-schema.js";

// One entry for each sub-path of the exports map, named as the map names its files; rooms are folders or single files.
const manifest: { exports: Record<string, unknown> } = JSON.parse(readFileSync("package.json", "utf8"));
const entry: Record<string, string> = {};
for (const subPath of Object.keys(manifest.exports)) {
  if (subPath.endsWith(".json")) continue;
  const name = subPath === "." ? "index" : subPath.slice(2);
  const file = [`src/${name}.ts`, `src/${name}/index.ts`].find((candidate) => existsSync(candidate));
  if (file === undefined) throw new Error(`the exports map names ${subPath}, which src does not have`);
  entry[name] = file;
}

// A leaf file with an output of its own, for the bench, which measures beside the library's own logarithm.
const leaves: Record<string, string> = { "numeric/log": "src/numeric/log.ts" };

rmSync("dist", { recursive: true, force: true });

export default defineConfig({
  entry: { ...entry, ...leaves },
  format: "esm",
  splitting: true,
  sourcemap: true,
  target: "es2022",
  platform: "neutral",
  silent: true,
  onSuccess: async () => {
    writeCommonJs();
    writeDeclarations(Object.values(entry));
    writeJsonSchemas();
  },
});

/**
 * Writes each module of dist as CommonJS beside it, so that both formats are cut into the same chunks. No source maps:
 * they would hold the path of this checkout, and two checkouts would build two different packages.
 */
function writeCommonJs(): void {
  const modules = readdirSync("dist", { recursive: true, encoding: "utf8" }).filter((name) => name.endsWith(".js"));
  for (const name of modules) {
    const code = withCommonJsImports(readFileSync(join("dist", name), "utf8")).replace(
      /^\/\/# sourceMapping.*\n?/m,
      "",
    );
    const { code: commonJs } = transformSync(code, { format: "cjs", target: "es2022", sourcefile: name });
    writeFileSync(join("dist", name.replace(/\.js$/, ".cjs")), commonJs);
  }
}

/** Writes what other languages and editors read: the shape of records and collections. */
function writeJsonSchemas(): void {
  for (const [name, schema] of Object.entries(jsonSchemaFiles())) {
    writeFileSync(join("dist", name), `${JSON.stringify(schema, null, 2)}\n`);
  }
}

/**
 * Writes the declarations of all files that the entries reach, for both formats. Every export of src has an explicit
 * type (check:declarations holds it to that), so each file is declared on its own, without a type check.
 */
function writeDeclarations(entries: readonly string[]): void {
  const compilerOptions = {
    target: ts.ScriptTarget.ES2022,
    module: ts.ModuleKind.ESNext,
    strict: true,
    isolatedDeclarations: true,
    verbatimModuleSyntax: true,
  };
  const files = new Set(entries);
  for (const file of files) {
    const { outputText, diagnostics = [] } = ts.transpileDeclaration(readFileSync(file, "utf8"), {
      fileName: file,
      compilerOptions,
      reportDiagnostics: true,
    });
    const [fault] = diagnostics;
    if (fault !== undefined) throw new Error(`${file}: ${ts.flattenDiagnosticMessageText(fault.messageText, "\n")}`);
    for (const [, specifier = ""] of outputText.matchAll(/(?:from |import\()"(\.{1,2}\/[^"]+)\.js"/g)) {
      files.add(posix.join(posix.dirname(file), `${specifier}.ts`));
    }
    const path = join("dist/types", file.replace(/^src\/|\.ts$/g, ""));
    mkdirSync(dirname(path), { recursive: true });
    writeFileSync(`${path}.d.ts`, outputText);
    writeFileSync(`${path}.d.cts`, withCommonJsImports(outputText));
  }
}

/** Rewrites imports of neighbouring files for CommonJS. */
function withCommonJsImports(code: string): string {
  return code
    .replace(/^(import |(?:import|export) .* from |\} from )"(\.{1,2}\/[^"\n]+)\.js";$/gm, '$1"$2.cjs";')
    .replace(/\bimport\("(\.{1,2}\/[^"\n]+)\.js"\)/g, 'import("$1.cjs")');
}

import { execFileSync } from "node:child_process";
import { mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { buildSync } from "esbuild";
import ts from "typescript";
import type { Example } from "./examples.js";

/**
 * Runs and type-checks examples against the built package of `root`.
 *
 * @returns the faults of each example, none where it holds
 */
export function checkExamples(root: string, examples: readonly Example[]): string[][] {
  mkdirSync(join(root, ".cache/examples"), { recursive: true });
  // Beside the project's own package.json, so that the package is found by its own name.
  const folder = mkdtempSync(join(root, ".cache/examples/run-"));
  try {
    const outcomes = runExamples(root, folder, examples);
    const typeFaults = typeCheckExamples(root, folder, examples);
    return outcomes.map((faults, index) => [...faults, ...(typeFaults[index] ?? [])]);
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

function runExamples(root: string, folder: string, examples: readonly Example[]): string[][] {
  const built = join(folder, "built");
  const paths = examples.map((_, index) => join(folder, `${index}.ts`));
  examples.forEach(({ checkedCode }, index) => writeFileSync(paths[index] as string, checkedCode));
  const faults = bundleEach(root, built, paths);
  bundle(root, built, [join(root, "tests/tools/run-examples.ts")]);
  const list = examples.map(({ shown }, index) => ({ file: `${index}.mjs`, shown, fault: faults[index] }));
  writeFileSync(join(built, "examples.json"), JSON.stringify(list));
  execFileSync(process.execPath, [join(built, "run-examples.mjs"), built], { cwd: root, stdio: "pipe" });
  return JSON.parse(readFileSync(join(built, "outcomes.json"), "utf8"));
}

/** Bundles all files at once, or one by one to tell which of them fail. */
function bundleEach(root: string, built: string, paths: readonly string[]): (string | undefined)[] {
  const messageOf = (error: unknown): string => (error instanceof Error ? error.message : String(error));
  try {
    bundle(root, built, paths);
    return [];
  } catch {
    return paths.map((path) => {
      try {
        bundle(root, built, [path]);
        return undefined;
      } catch (error) {
        return messageOf(error);
      }
    });
  }
}

function bundle(root: string, built: string, paths: readonly string[]): void {
  buildSync({
    absWorkingDir: root,
    entryPoints: [...paths],
    outdir: built,
    outExtension: { ".js": ".mjs" },
    entryNames: "[name]",
    bundle: true,
    packages: "external",
    format: "esm",
    platform: "node",
    target: "node20",
    logLevel: "silent",
  });
}

function typeCheckExamples(root: string, folder: string, examples: readonly Example[]): string[][] {
  const paths = examples.map((_, index) => join(folder, `${index}.ts`));
  examples.forEach(({ code }, index) => writeFileSync(paths[index] as string, code));
  const program = ts.createProgram(paths, {
    target: ts.ScriptTarget.ES2022,
    lib: ["lib.es2023.d.ts"],
    types: ["node"],
    typeRoots: [join(root, "node_modules/@types")],
    module: ts.ModuleKind.ESNext,
    moduleResolution: ts.ModuleResolutionKind.Bundler,
    strict: true,
    exactOptionalPropertyTypes: true,
    skipLibCheck: true,
    noEmit: true,
  });
  return paths.map((path, index) => {
    const source = program.getSourceFile(path);
    const firstLine = Number(examples[index]?.place.split(":").at(-1));
    return ts.getPreEmitDiagnostics(program, source).map(({ messageText, start = 0 }) => {
      const line = firstLine + (source?.getLineAndCharacterOfPosition(start).line ?? 0) - 1;
      return `line ${line}: ${ts.flattenDiagnosticMessageText(messageText, "\n")}`;
    });
  });
}

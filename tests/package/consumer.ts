import { execFileSync } from "node:child_process";
import { mkdirSync, readFileSync, writeFileSync } from "node:fs";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";
import { inject } from "vitest";

/** The project itself. */
export const root: string = fileURLToPath(new URL("../..", import.meta.url));

/** Each sub-path of the exports map but JSON files: "", "/errors", ... */
export const subPaths: readonly string[] = Object.keys(
  (JSON.parse(readFileSync(join(root, "package.json"), "utf8")) as { exports: Record<string, unknown> }).exports,
)
  .filter((subPath) => !subPath.endsWith(".json"))
  .map((subPath) => subPath.slice(1));

/** Writes a file in the consumer's folder; returns its path. */
export function writeConsumerFile(name: string, text: string): string {
  const path = join(inject("consumer"), name);
  mkdirSync(dirname(path), { recursive: true });
  writeFileSync(path, text);
  return path;
}

/** Runs a program in the consumer's folder; returns what it printed. A failure shows what it printed too. */
export function runInConsumer(program: string, ...args: string[]): string {
  try {
    return execFileSync(program, args, { cwd: inject("consumer"), encoding: "utf8", stdio: "pipe" });
  } catch (error) {
    const { stdout = "", stderr = "" } = error as { stdout?: string; stderr?: string };
    throw new Error(`${program} ${args.join(" ")} failed:\n${stdout}${stderr}`);
  }
}

/** Writes and runs a Node script in the consumer's folder; returns the JSON that it printed. */
export function runScript(name: string, text: string): unknown {
  return JSON.parse(runInConsumer(process.execPath, writeConsumerFile(name, text)));
}

import { execFileSync } from "node:child_process";
import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import type { TestProject } from "vitest/node";

declare module "vitest" {
  interface ProvidedContext {
    /** The packed package. */
    tarball: string;
    /** A folder of its own in which the packed package is installed. */
    consumer: string;
  }
}

const root = fileURLToPath(new URL("../..", import.meta.url));

/** Builds, packs and installs the package in an empty folder, once for all package tests. */
export default function setup(project: TestProject): () => void {
  const run = (folder: string, ...command: [string, ...string[]]): string => {
    const [program, ...rest] = command;
    return execFileSync(program, rest, { cwd: folder, encoding: "utf8", stdio: ["ignore", "pipe", "inherit"] });
  };
  const folder = mkdtempSync(join(tmpdir(), "package-test-"));
  run(root, "npm", "run", "build", "--silent");
  const [packed]: { filename: string }[] = JSON.parse(
    run(root, "npm", "pack", "--json", "--ignore-scripts", "--pack-destination", folder),
  );
  if (packed === undefined) throw new Error("npm pack made no tarball");
  const tarball = join(folder, packed.filename);
  writeFileSync(join(folder, "package.json"), JSON.stringify({ name: "consumer", private: true, type: "module" }));
  run(folder, "npm", "install", "--no-audit", "--no-fund", "--prefer-offline", tarball);
  project.provide("tarball", tarball);
  project.provide("consumer", folder);
  return () => rmSync(folder, { recursive: true, force: true });
}

import { execFileSync } from "node:child_process";
import { createHash } from "node:crypto";
import { cpSync, existsSync, mkdtempSync, readdirSync, readFileSync, rmSync, symlinkSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { expect, inject, test } from "vitest";
import { root, runInConsumer } from "./consumer.js";

test("publint finds nothing in the tarball", () => {
  const tool = join(root, "node_modules/publint/src/cli.js");
  expect(runInConsumer(process.execPath, tool, inject("tarball"), "--strict")).toMatch(/All good!/);
});

test("the types of each sub-path resolve in Node and in bundlers", () => {
  const tool = join(root, "node_modules/@arethetypeswrong/cli/dist/index.js");
  const args = [tool, inject("tarball"), "--profile", "node16", "--format", "json"];
  const { problems }: { problems: object } = JSON.parse(runInConsumer(process.execPath, ...args));
  const found = Object.values(problems).flat() as { resolutionKind?: string }[];
  expect(found.filter(({ resolutionKind }) => resolutionKind !== "node10")).toEqual([]);
});

test("the tarball holds dist, the documents of the package, and nothing else", () => {
  const folder = join(inject("consumer"), "node_modules/gibbs-ledger");
  expect(readdirSync(folder).sort()).toEqual(["CHANGELOG.md", "LICENSE", "README.md", "dist", "package.json"]);
  const files = filesOf(join(folder, "dist"));
  expect(files.filter((name) => !/\.(?:js|cjs|d\.ts|d\.cts|js\.map|schema\.json)$/.test(name))).toEqual([]);
  const withPaths = files.filter((name) => readFileSync(join(folder, "dist", name), "utf8").includes(root));
  expect(withPaths).toEqual([]);
});

test("two checkouts in two folders build the same bytes", () => {
  expect(hashOfBuildIn("a")).toBe(hashOfBuildIn("another-folder"));
});

function hashOfBuildIn(name: string): string {
  const folder = mkdtempSync(join(tmpdir(), `package-test-${name}-`));
  try {
    for (const entry of ["src", "package.json", "tsconfig.json", "tsup.config.ts"]) {
      cpSync(join(root, entry), join(folder, entry), { recursive: true });
    }
    symlinkSync(join(root, "node_modules"), join(folder, "node_modules"));
    execFileSync("npm", ["run", "build", "--silent"], { cwd: folder, stdio: "pipe" });
    const dist = join(folder, "dist");
    expect(existsSync(join(dist, "index.js"))).toBe(true);
    const hash = createHash("sha256");
    for (const file of filesOf(dist)) hash.update(`${file}\n`).update(readFileSync(join(dist, file)));
    return hash.digest("hex");
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

function filesOf(folder: string): string[] {
  return readdirSync(folder, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => join(entry.parentPath, entry.name).slice(folder.length + 1))
    .sort();
}

// Compares the library with published values and writes docs/accuracy.md.
//   npm run accuracy                     regenerate the document
//   npm run accuracy -- --check          compare with the document as it stands, and change nothing
//   npm run accuracy -- --json FILE      write the rows as JSON too
import { mkdirSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { fileURLToPath, pathToFileURL } from "node:url";
import { parseArgs } from "node:util";
import { build } from "esbuild";
import { accuracyDocument } from "./document.mjs";

const root = fileURLToPath(new URL("../..", import.meta.url));
const { values } = parseArgs({ options: { json: { type: "string" }, check: { type: "boolean", default: false } } });

const topics = await readTopics();
const rows = topics.flatMap((topic) => topic.rows);
const failed = rows.filter(({ pass }) => !pass);
const text = accuracyDocument(topics);
const path = join(root, "docs/accuracy.md");

if (values.json !== undefined) writeFileSync(values.json, `${JSON.stringify(rows, null, 2)}\n`);
if (values.check) {
  if (readFileSync(path, "utf8") !== text) {
    console.error("docs/accuracy.md is not what the code computes; run npm run accuracy");
    process.exitCode = 1;
  }
} else {
  writeFileSync(path, text);
}
for (const { id, expected, computed, tolerance } of failed) {
  console.error(`${id}: expected ${expected}, computed ${computed}, tolerance ${tolerance}`);
}
console.log(`${rows.length} published values, ${failed.length} outside their tolerance`);
if (failed.length > 0 || rows.length === 0) process.exitCode = 1;

/** Bundles each tests/published/<topic>.rows.ts with the library's source, and runs it. */
async function readTopics() {
  const names = readdirSync(join(root, "tests/published"))
    .filter((name) => name.endsWith(".rows.ts"))
    .sort();
  mkdirSync(join(root, ".cache"), { recursive: true });
  const outdir = mkdtempSync(join(root, ".cache/accuracy-"));
  try {
    await build({
      entryPoints: names.map((name) => join(root, "tests/published", name)),
      outdir,
      outExtension: { ".js": ".mjs" },
      bundle: true,
      packages: "external",
      format: "esm",
      platform: "node",
      target: "node20",
      logLevel: "error",
    });
    const topics = [];
    for (const name of names) {
      const module = await import(pathToFileURL(join(outdir, name.replace(/\.ts$/, ".mjs"))).href);
      topics.push({ topic: name.replace(/\.rows\.ts$/, ""), rows: module.rows() });
    }
    return topics;
  } finally {
    rmSync(outdir, { recursive: true, force: true });
  }
}

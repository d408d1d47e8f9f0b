// Runs every check:* script of package.json, tells all that fail, and exits 1 if any did.
import { spawnSync } from "node:child_process";
import { readFileSync } from "node:fs";

const { scripts } = JSON.parse(readFileSync("package.json", "utf8"));
const names = Object.keys(scripts).filter((name) => name.startsWith("check:"));
const failed = [];
for (const name of names) {
  const started = performance.now();
  const { status, stdout, stderr } = spawnSync("npm", ["run", name, "--silent"], { encoding: "utf8" });
  const seconds = ((performance.now() - started) / 1000).toFixed(1);
  console.log(`${status === 0 ? "pass" : "FAIL"}  ${name.padEnd(20)} ${seconds.padStart(5)} s`);
  if (status !== 0) {
    failed.push(name);
    console.log(`${stdout}${stderr}`);
  }
}
console.log(failed.length === 0 ? `${names.length} checks passed` : `failed: ${failed.join(", ")}`);
process.exitCode = failed.length === 0 ? 0 : 1;

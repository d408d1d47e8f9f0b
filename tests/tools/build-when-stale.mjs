// Builds dist quietly, unless all that the exports map names is there and newer than what it is made from.
import { spawnSync } from "node:child_process";
import { readdirSync, readFileSync, statSync } from "node:fs";
import { join } from "node:path";
import { fileURLToPath } from "node:url";

const root = fileURLToPath(new URL("../..", import.meta.url));
const modified = (path) => statSync(join(root, path), { throwIfNoEntry: false })?.mtimeMs ?? 0;

const { exports } = JSON.parse(readFileSync(join(root, "package.json"), "utf8"));
const outputs = Object.values(exports)
  .flatMap((target) => leavesOf(target))
  .filter((path) => path.includes("/dist/"));
const sources = readdirSync(join(root, "src"), { recursive: true }).map((name) => join("src", name));
const inputs = ["package.json", "tsconfig.json", "tsup.config.ts", "src", ...sources];

if (Math.min(...outputs.map(modified)) < Math.max(...inputs.map(modified))) {
  const { status } = spawnSync("npm", ["run", "build", "--silent"], {
    cwd: root,
    stdio: ["ignore", "inherit", "inherit"],
  });
  process.exitCode = status ?? 1;
}

/** Every path in a part of the exports map. */
function leavesOf(target) {
  return typeof target === "string" ? [target] : Object.values(target).flatMap((inner) => leavesOf(inner));
}

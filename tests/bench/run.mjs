// Measures each case beside its reference, and prints a table.
//   npm run bench                        five processes a case
//   npm run bench -- --json FILE         writes the figures as JSON too
//   npm run bench -- --processes 1 --case tagged-call
import { spawnSync } from "node:child_process";
import { readdirSync, writeFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { parseArgs } from "node:util";
import { median } from "./median.mjs";

const { values } = parseArgs({
  options: {
    json: { type: "string" },
    processes: { type: "string", default: "5" },
    case: { type: "string", multiple: true },
  },
});
const processes = Number(values.processes);
const names = readdirSync(new URL("cases", import.meta.url))
  .map((file) => file.replace(/\.mjs$/, ""))
  .filter((name) => values.case === undefined || values.case.includes(name))
  .sort();
if (names.length === 0 || !Number.isInteger(processes) || processes < 1)
  throw new Error("no case or no process to run");

const figures = names.map((name) => {
  const runs = Array.from({ length: processes }, () => measureInFreshProcess(name));
  return {
    name,
    nanoseconds: rounded(median(runs.map((run) => run.nanoseconds))),
    reference: rounded(median(runs.map((run) => run.reference))),
    ratio: rounded(median(runs.map((run) => run.ratio))),
    processes,
    note: runs[0].note,
  };
});

console.log(`${"case".padEnd(20)} ${"ns".padStart(9)} ${"reference".padStart(9)} ${"ratio".padStart(6)}  note`);
for (const { name, nanoseconds, reference, ratio, note } of figures) {
  const columns = [String(nanoseconds).padStart(9), String(reference).padStart(9), String(ratio).padStart(6)];
  console.log(`${name.padEnd(20)} ${columns.join(" ")}  ${note}`);
}
if (values.json !== undefined) writeFileSync(values.json, `${JSON.stringify(figures, null, 2)}\n`);

function measureInFreshProcess(name) {
  const worker = fileURLToPath(new URL("measure.mjs", import.meta.url));
  const { status, stdout, stderr } = spawnSync(process.execPath, [worker, name], { encoding: "utf8" });
  if (status !== 0) throw new Error(`${name}: ${stderr}`);
  return JSON.parse(stdout);
}

function rounded(value) {
  return Number(value.toPrecision(3));
}

// Runs the examples that examples.test.ts wrote, in a Node process of their own and through the package's exports map:
// node run.mjs FOLDER. Reads FOLDER/examples.json and writes FOLDER/outcomes.json.
import { readFileSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { pathToFileURL } from "node:url";
import type { ExampleCheck, Shown } from "./examples.js";
import { differenceFrom } from "./expected-value.js";

const folder = process.argv[2] as string;
const examples: { file: string; shown: Shown[]; fault?: string }[] = JSON.parse(
  readFileSync(join(folder, "examples.json"), "utf8"),
);

console.log = () => {};

const outcomes: string[][] = [];
for (const { file, shown, fault } of examples) {
  if (fault !== undefined) {
    outcomes.push([fault]);
    continue;
  }
  const faults: string[] = [];
  const checked = new Set<number>();
  const exampleCheck: ExampleCheck = (index, evaluate) => {
    checked.add(index);
    const expected = shown[index] as Shown;
    const report = (message: string): void => void faults.push(`line ${expected.line}: ${message}`);
    if ("value" in expected) {
      const actual = evaluate();
      const difference = differenceFrom(expected.value, actual);
      if (difference !== undefined) report(difference);
      return actual;
    }
    try {
      evaluate();
    } catch (error) {
      const code = (error as { code?: unknown }).code;
      if (code !== expected.throws) report(`throws ${code ?? error}, the example shows ${expected.throws}`);
      return undefined;
    }
    report(`throws nothing, the example shows ${expected.throws}`);
    return undefined;
  };
  Object.assign(globalThis, { exampleCheck });
  try {
    await import(pathToFileURL(join(folder, file)).href);
    shown.forEach(({ line }, index) => {
      if (!checked.has(index)) faults.push(`line ${line}: is never reached`);
    });
  } catch (error) {
    faults.push(error instanceof Error ? (error.stack ?? error.message) : String(error));
  }
  outcomes.push(faults);
}
writeFileSync(join(folder, "outcomes.json"), JSON.stringify(outcomes));

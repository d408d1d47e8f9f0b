import { execFileSync } from "node:child_process";
import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, beforeAll, expect, test } from "vitest";
import { runInConsumer, writeConsumerFile } from "./consumer.js";

/** Prints the bits of results along a temperature grid: reaction, ledger and array route. */
const script = `
import { ledger, quantity, reaction, standardReactionProperties } from "gibbs-ledger";
import { compileReaction } from "gibbs-ledger/compiled";
import { referenceData } from "gibbs-ledger/data";

const subject = reaction("CO(g) + H2O(g) = CO2(g) + H2(g)", referenceData);
const temperaturesK = Float64Array.from({ length: 200 }, (_, index) => 300.125 + index * 3.3);
const results = [];
for (const temperatureK of temperaturesK) {
  const temperature = quantity(temperatureK, "K");
  const { gibbsEnergy, entropy, lnK } = standardReactionProperties(subject, { temperature });
  results.push(gibbsEnergy.value, entropy.value, lnK);
}
const gas = { moleFractions: { "CO(g)": 0.1, "H2O(g)": 0.4, "CO2(g)": 0.2, "H2(g)": 0.3 } };
results.push(ledger(subject, { temperature: quantity(427, "Cel"), pressure: quantity(25, "bar"), gas }).total.value);
results.push(...compileReaction(subject).gibbsEnergy(temperaturesK, new Float64Array(temperaturesK.length)));
const bits = new BigUint64Array(Float64Array.from(results).buffer);
console.log(Array.from(bits, (word) => word.toString(16)).join(" "));
`;

let folder: string;
let path: string;
let expected: string;

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), "package-test-runtimes-"));
  writeFileSync(join(folder, "package.json"), '{ "private": true }');
  execFileSync("npm", ["install", "--no-audit", "--no-fund", "deno@2.9.6", "bun@1.4.4"], {
    cwd: folder,
    stdio: "pipe",
  });
  path = writeConsumerFile("bits.mjs", script);
  expected = runInConsumer(process.execPath, path);
});

afterAll(() => rmSync(folder, { recursive: true, force: true }));

test("Node computes every figure", () => {
  expect(expected.trim().split(" ")).toHaveLength(200 * 3 + 1 + 200);
});

test("Deno computes the same bits", () => {
  expect(runInConsumer(join(folder, "node_modules/.bin/deno"), "run", "--node-modules-dir=manual", path)).toBe(
    expected,
  );
});

test("Bun computes the same bits", () => {
  expect(runInConsumer(join(folder, "node_modules/.bin/bun"), "run", path)).toBe(expected);
});

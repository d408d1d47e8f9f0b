import { execFileSync } from "node:child_process";
import { cpSync, mkdirSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";
import { afterAll, beforeAll, expect, test } from "vitest";

const root = fileURLToPath(new URL("../..", import.meta.url));

/** A small house in which each file but those of the first group breaks one rule. */
const files: Record<string, string> = {
  "src/errors/fault.ts": "export const fault: number = 1;",
  "src/errors/index.ts": 'export { fault } from "./fault.js";',
  "src/numeric/sum.ts": 'import { fault } from "../errors/fault.js";\nexport const sum: number = fault;',
  "src/quantity/quantity.ts": 'import { sum } from "../numeric/sum.js";\nexport const quantity: number = sum;',
  "src/quantity/schema.ts":
    'import * as z from "zod";\nimport { quantity } from "./quantity.js";\nexport const schema: unknown = [z, quantity];',
  "src/species/record.ts": "export interface SpeciesRecord { readonly label: string }",
  "src/data/steam.ts":
    'import type { SpeciesRecord } from "../species/record.js";\nexport const steam: SpeciesRecord = { label: "H2O(g)" };',
  "src/precision/digits.ts": 'import { Decimal } from "decimal.js";\nexport const digits: unknown = Decimal;',
  "src/schema.ts": 'export { schema } from "./quantity/schema.js";',
  "src/index.ts": 'export { quantity } from "./quantity/quantity.js";',

  "src/numeric/upward.ts":
    'import { quantity } from "../quantity/quantity.js";\nexport const upward: number = quantity;',
  "src/references/sideways.ts": 'import { sum } from "../numeric/sum.js";\nexport const sideways: number = sum;',
  "src/heat-capacity/upward-type.ts":
    'import type { SpeciesRecord } from "../species/record.js";\nexport type Upward = SpeciesRecord;',
  "src/quantity/by-face.ts": 'import { fault } from "../errors/index.js";\nexport const byFace: number = fault;',
  "src/attic/box.ts": 'import { fault } from "../errors/fault.js";\nexport const box: number = fault;',
  "src/formula/round.ts": 'import { trip } from "./trip.js";\nexport const round: () => unknown = () => trip;',
  "src/formula/trip.ts": 'import { round } from "./round.js";\nexport const trip: () => unknown = () => round;',
  "src/reaction/with-data.ts": 'import { steam } from "../data/steam.js";\nexport const withData: unknown = steam;',
  "src/data/computed.ts":
    'import { quantity } from "../quantity/quantity.js";\nexport const computed: number = quantity;',
  "src/reaction/with-schema.ts":
    'import { schema } from "../quantity/schema.js";\nexport const withSchema: unknown = schema;',
  "src/reaction/schema.ts":
    'import { quantity } from "../quantity/quantity.js";\nexport const wide: number = quantity;',
  "src/reaction/with-zod.ts": 'import * as z from "zod";\nexport const withZod: unknown = z;',
  "src/reaction/with-decimals.ts":
    'import { Decimal } from "decimal.js";\nexport const withDecimals: unknown = Decimal;',
  "src/reaction/with-files.ts":
    'import { readFileSync } from "node:fs";\nexport const withFiles: unknown = readFileSync;',
};

interface Violation {
  readonly from: string;
  readonly rule: { readonly name: string };
}

let folder: string;
let violations: readonly string[];

beforeAll(() => {
  mkdirSync(join(root, ".cache"), { recursive: true });
  folder = mkdtempSync(join(root, ".cache/layers-"));
  cpSync(join(root, "tsconfig.json"), join(folder, "tsconfig.json"));
  writeFileSync(join(folder, "package.json"), "{}");
  for (const [path, code] of Object.entries(files)) {
    mkdirSync(dirname(join(folder, path)), { recursive: true });
    writeFileSync(join(folder, path), `${code}\n`);
  }
  const tool = join(root, "node_modules/dependency-cruiser/bin/dependency-cruise.mjs");
  const output = execFileSync(
    process.execPath,
    [tool, "src", "--config", join(root, "tests/layers.cjs"), "--output-type", "json"],
    { cwd: folder, encoding: "utf8" },
  );
  const report: { summary: { violations: Violation[] } } = JSON.parse(output);
  violations = [...new Set(report.summary.violations.map(({ from, rule }) => `${from}: ${rule.name}`))].sort();
});

afterAll(() => rmSync(folder, { recursive: true, force: true }));

test("each planted violation is caught by its rule, and nothing else is", () => {
  expect(violations).toEqual([
    "src/attic/box.ts: no-unknown-room",
    "src/data/computed.ts: data-imports-types",
    "src/formula/round.ts: no-cycle",
    "src/heat-capacity/upward-type.ts: layer-heat-capacity",
    "src/numeric/upward.ts: layer-numeric",
    "src/quantity/by-face.ts: no-face",
    "src/reaction/schema.ts: schema-of-own-room",
    "src/reaction/with-data.ts: data-is-optional",
    "src/reaction/with-decimals.ts: decimals-in-precision",
    "src/reaction/with-files.ts: no-other-package",
    "src/reaction/with-schema.ts: schemas-apart",
    "src/reaction/with-zod.ts: zod-in-schemas",
    "src/references/sideways.ts: layer-references",
  ]);
});

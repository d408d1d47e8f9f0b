import { readFileSync } from "node:fs";
import { expect, test } from "vitest";
import { unitTable } from "../../src/quantity/units.js";

const document = readFileSync(new URL("../../docs/units.md", import.meta.url), "utf8");

test("docs/units.md lists every code under its dimension with its factor and offset, and no other", () => {
  let dimension = "";
  const found: Record<string, unknown> = {};
  for (const line of document.split("\n")) {
    const heading = /^`(\w+)`$/.exec(line);
    if (heading !== null) dimension = heading[1]!;
    const row = /^\| `([^`]+)` \| ([\d./]+) \| ([\d.]+) \|$/.exec(line);
    if (row === null) continue;
    found[row[1]!] = { dimension, factor: row[2], ...(row[3] !== "0" && { offset: row[3] }) };
  }
  expect(found).toStrictEqual(unitTable);
});

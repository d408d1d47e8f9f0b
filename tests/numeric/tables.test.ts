import { execFileSync } from "node:child_process";
import { readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { expect, test } from "vitest";
import { logarithmsHigh, offsets, reciprocals } from "../../src/numeric/log-table.js";

const path = (relative: string): string => fileURLToPath(new URL(relative, import.meta.url));

test.each(["log", "exp"])("the table of %s is what its generator writes", (name) => {
  const printed = execFileSync(process.execPath, [path(`generate-${name}-table.mjs`), "--print"], { encoding: "utf8" });
  expect(readFileSync(path(`../../src/numeric/${name}-table.ts`), "utf8")).toBe(printed);
});

test("the reduction of the logarithm is exact in every row", () => {
  for (let row = 0; row < 128; row += 1) {
    const numerator = reciprocals[row]! * 512;
    expect(Number.isInteger(numerator)).toBe(true);
    // (z - m) / c + (m / c - 1): a multiple of the grid, at most 2^53 of them.
    const grid = 2 ** (numerator % 2 === 0 ? -60 : -61);
    expect(reciprocals[row]! / 256 + Math.abs(offsets[row]!)).toBeLessThanOrEqual(2 ** 53 * grid);
    expect((1 + row / 128) * reciprocals[row]! - 1).toBe(offsets[row]);
    expect(Number.isInteger(logarithmsHigh[row]! * 2 ** 42)).toBe(true);
  }
});

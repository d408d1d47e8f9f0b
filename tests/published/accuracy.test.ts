import { readdirSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { describe, expect, test } from "vitest";
import type { RowsModule } from "./accuracy-row.js";

const folder = fileURLToPath(new URL(".", import.meta.url));
const files = readdirSync(folder).filter((name) => name.endsWith(".rows.ts"));
const topics = await Promise.all(
  files.map(async (name) => {
    const module: RowsModule = await import(/* @vite-ignore */ `${folder}${name}`);
    return { topic: name.slice(0, -".rows.ts".length), rows: module.rows() };
  }),
);

describe.each(topics)("published values: $topic", ({ rows }) => {
  test.each(rows.map((row) => [row.id, row] as const))("%s", (_, { expected, computed, tolerance, pass }) => {
    expect(Math.abs(computed - expected)).toBeLessThanOrEqual(tolerance);
    expect(pass).toBe(true);
  });
});

test("every topic is read, with rows", () => {
  expect(topics.filter(({ rows }) => rows.length > 0)).toHaveLength(files.length);
  expect(files).not.toEqual([]);
});

test("no two rows share an id, and each row names source, quantity and a tolerance above zero", () => {
  const rows = topics.flatMap((topic) => topic.rows);
  expect(new Set(rows.map(({ id }) => id)).size).toBe(rows.length);
  for (const { id, source, quantity, tolerance } of rows) {
    expect(id).toMatch(/^[A-Za-z0-9]+(?:[-.][A-Za-z0-9]+)*$/);
    expect(source).not.toBe("");
    expect(quantity).not.toBe("");
    expect(tolerance).toBeGreaterThan(0);
  }
});

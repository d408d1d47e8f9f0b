import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { expect, test } from "vitest";
import { references } from "../../src/references/bibliography.js";

test("keys stand in alphabetical order, and each entry has authors, a title and a plausible year", () => {
  const keys = Object.keys(references);
  expect(keys).toEqual([...keys].sort());
  for (const [key, { authors, title, year }] of Object.entries(references)) {
    expect(key).toMatch(/^[a-z]+\d{4}$/);
    expect(key).toContain(String(year));
    expect(authors.length * title.length).toBeGreaterThan(0);
    expect(year).toBeGreaterThan(1900);
  }
});

test("every source that a comment or document names is in the bibliography", () => {
  const files = ["src", "docs"].flatMap((folder) =>
    readdirSync(folder, { recursive: true, encoding: "utf8" }).map((name) => join(folder, name)),
  );
  const named = files
    .filter((name) => /\.(?:ts|md)$/.test(name) && !name.startsWith(join("docs", "api")))
    .flatMap((name) => [...readFileSync(name, "utf8").matchAll(/references\.([a-z]+\d{4})/g)].map(([, key]) => key));
  expect(named.length).toBeGreaterThan(10);
  expect(named.filter((key) => key === undefined || !Object.hasOwn(references, key))).toEqual([]);
});

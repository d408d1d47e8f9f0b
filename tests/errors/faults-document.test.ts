import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { expect, test } from "vitest";
import { faultCodes } from "../../src/errors/codes.js";

const document = readFileSync(new URL("../../docs/faults.md", import.meta.url), "utf8");
const rows = [...document.matchAll(/^\| `([^`]+)` \| (.+?) \| (.+?) \|$/gm)].map(([, code, when, advice]) => ({
  code,
  when,
  advice,
}));

test("docs/faults.md lists every code once, in the order of the table of codes, and no other", () => {
  expect(rows.map(({ code }) => code)).toEqual([...faultCodes]);
});

test("no line of a table is misread", () => {
  const lines = document.split("\n").filter((line) => line.startsWith("| `"));
  expect(lines).toHaveLength(rows.length);
});

test("each row says when and what to do in whole sentences", () => {
  for (const { when, advice } of rows) {
    expect(when).toMatch(/^[A-Z`].{10,}\.$/);
    expect(advice).toMatch(/^[A-Z`].{6,}\.$/);
  }
});

test("each heading holds the codes of one room", () => {
  const sections = document.split(/^## /m).slice(1);
  const rooms = sections.map((section) => new Set([...section.matchAll(/^\| `([a-z-]+)\//gm)].map(([, room]) => room)));
  expect(rooms.every(({ size }) => size === 1)).toBe(true);
  expect(new Set(rooms.flatMap((room) => [...room])).size).toBe(rooms.length);
});

test("a code is reserved exactly where no code of src reports it", () => {
  const files = readdirSync("src", { recursive: true, encoding: "utf8" }).filter(
    (name) => name.endsWith(".ts") && name !== join("errors", "codes.ts"),
  );
  const code = files
    .map((name) => readFileSync(join("src", name), "utf8").replaceAll(/\/\*[\s\S]*?\*\/|^\s*\/\/.*$/gm, ""))
    .join("\n");
  const unused = faultCodes.filter((name) => !code.includes(`"${name}"`));
  expect(rows.filter(({ when }) => when?.startsWith("Reserved:")).map((row) => row.code)).toEqual(unused);
});

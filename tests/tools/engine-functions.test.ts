import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, beforeAll, expect, test } from "vitest";
import { findEngineFunctions } from "./engine-functions.mjs";

/** Code with one use that must be found. */
const planted: readonly (readonly [what: string, code: string])[] = [
  ["an elementary function", "export const y = Math.log(2);"],
  ["a power function", "export const y = Math.pow(2, 0.5);"],
  ["a rounded root", "export const y = Math.cbrt(2) + 1;"],
  ["an elementary function in brackets", 'export const y = Math["exp"](2);'],
  ["a destructured function", "export const { sin } = Math;"],
  ["the Math object under another name", "const m = Math;\nexport const y = m;"],
  ["Math through globalThis", "export const y = globalThis.Math.log(2);"],
  ["Math out of globalThis", "export const { Math: m } = globalThis;"],
  ["a member chosen at run time", 'export const pick = (name: "abs" | "log"): unknown => Math[name];'],
  ["a power of doubles", "export const square = (x: number): number => x ** 2;"],
  ["a power of doubles in place", "let x = 2;\nx **= 3;\nexport const y = x;"],
  ["a power of mixed unknown types", "export const power = (x: any): unknown => x ** 2;"],
  ["a random number", "export const y = Math.random();"],
  ["a date", "export const y = new Date();"],
  ["the time", "export const y = Date.now();"],
  ["a formatter", 'export const y = new Intl.NumberFormat("en");'],
  ["a number in the locale's form", "export const y = (2).toLocaleString();"],
  ["upper case of the locale", 'export const y = "i".toLocaleUpperCase();'],
  ["an order of the locale", 'export const y = "a".localeCompare("b");'],
  ["a destructured locale function", 'export const { toLocaleString } = "a";'],
];

const allowed = `
    export const exact = [Math.abs(-1), Math.sqrt(2), Math.max(1, 2), Math.fround(0.1), Math.imul(2, 3), Math.PI, Math.LN2];
    export const tenToThe = (n: bigint): bigint => 10n ** n;
    export const scaled = (n: number): bigint => 10n ** BigInt(n);
    export const dated = { Date: 1, Math: 2 };
    export interface Row { readonly Date: string }
    // Math.log(2) in a comment, and in a text:
    export const text = "Math.log(2) ** 2";
`;

let folder: string;
let findings: ReturnType<typeof findEngineFunctions>;
const pathOf = (name: number | string): string => join(folder, `${name}.ts`);

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), "engine-functions-"));
  planted.forEach(([, code], index) => writeFileSync(pathOf(index), code));
  writeFileSync(pathOf("allowed"), allowed);
  findings = findEngineFunctions([...planted.map((_, index) => pathOf(index)), pathOf("allowed")]);
});

afterAll(() => rmSync(folder, { recursive: true, force: true }));

test.each(planted.map(([what, code], index) => [what, code, index] as const))("%s is found", (_, code, index) => {
  const found = findings.filter(({ file }) => file === pathOf(index));
  expect(found).toHaveLength(1);
  expect(code.split("\n")[(found[0]?.line ?? 0) - 1]).toMatch(/Math|\*\*|Date|Intl|toLocale|localeCompare/);
});

test("exact functions, constants and BigInt powers pass", () => {
  expect(findings.filter(({ file }) => file === pathOf("allowed"))).toEqual([]);
});

test("a finding says what to use instead", () => {
  expect(findings.find(({ file }) => file === pathOf(0))?.message).toBe(
    "Math.log may differ between engines; use numeric",
  );
});

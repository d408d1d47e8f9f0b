import { expect, test } from "vitest";
import { differenceFrom, parseExpected } from "./expected-value.js";

const agrees = (shown: string, actual: unknown): boolean => differenceFrom(parseExpected(shown), actual) === undefined;

test.each<[shown: string, same: unknown, other: unknown]>([
  ["-32.9", -32.9, -32.90000000000001],
  ["1e-7", 1e-7, 1.1e-7],
  ["12n", 12n, 12],
  ["true", true, 1],
  ["undefined", undefined, null],
  ['"a \\"b\\"\\n"', 'a "b"\n', "a b"],
  ["5708.0...", 5708.0132, 5708.1],
  ["5708.0...", 5708, 5707.99],
  ["-0.12…", -0.1299, -0.13],
  ["-0.12...", -0.125, 0.125],
  ["1.5...e-9", 1.57e-9, 1.57e-8],
  ["3...", 3.99, 4],
  ["[1, 2]", [1, 2], [1, 2, 3]],
  ["[1, ...]", [1, 2], [2, 1]],
  ["Float64Array [1, 2.5]", Float64Array.of(1, 2.5), [1, 2.5]],
  ['{ value: 1.0..., unit: "J/mol" }', { value: 1.04, unit: "J/mol" }, { value: 1.04, unit: "kJ/mol" }],
  ["{ a: 1 }", { a: 1 }, { a: 1, b: 2 }],
  ["{ a: 1, ... }", { a: 1, b: 2 }, { b: 2 }],
  ['{ "N2(g)": [{ x: null }] }', { "N2(g)": [{ x: null }] }, { "N2(g)": [{ x: 0 }] }],
  ["{}", {}, []],
])("%s agrees with what it shows and nothing else", (shown, same, other) => {
  expect(agrees(shown, same)).toBe(true);
  expect(agrees(shown, other)).toBe(false);
});

test.each(["about 3", "1 kJ/mol", "[1 2]", "{ a 1 }", "1.2.3", ""])("%j is not readable", (shown) => {
  expect(() => parseExpected(shown)).toThrow(/expected /);
});

import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { layOut, rule, type TextColumn } from "../../src/report/columns.js";
import { fitted, fixed, oneLine, wrap } from "../../src/report/text.js";

test.each([
  [0, 3, "0.000"],
  [-0, 3, "0.000"],
  [-0.0004, 3, "0.000"],
  [-0.0006, 3, "-0.001"],
  [-1e-300, 0, "0"],
  [12.3456, 2, "12.35"],
  [-12.3456, 2, "-12.35"],
])("fixed(%d, %d) is %s", (value, decimals, text) => {
  expect(fixed(value, decimals)).toBe(text);
});

test.each([
  [1.23456, 3, 9, "", "1.235"],
  [-1234.5678, 3, 9, "", "-1234.568"],
  [-12345.678, 3, 9, "", "-12345.68"],
  [123456789.4, 3, 9, "", "123456789"],
  [-1234567891.4, 3, 9, "", "-1.235e+9"],
  [0.0123, 3, 7, ">=", ">=0.012"],
  [1234.5678, 3, 8, ">=", ">=1234.6"],
  [1234.5678, 3, 7, ">=", ">=1235"],
  [-1.5e100, 3, 9, "", "-1.5e+100"],
])("fitted(%d, %d, %d, %j) is %s", (value, decimals, width, prefix, text) => {
  expect(fitted(value, decimals, width, prefix)).toBe(text);
});

test("a fitted number keeps to its width and its value", () => {
  fc.assert(
    fc.property(fc.double({ min: -1e250, max: 1e250, noNaN: true }), (value) => {
      const text = fitted(value, 3, 11);
      expect(text.length).toBeLessThanOrEqual(11);
      expect(Math.abs(Number(text) - value)).toBeLessThanOrEqual(Math.max(0.0006, Math.abs(value) * 0.001));
    }),
    { seed: 20261201, numRuns: 2000 },
  );
});

describe("wrap", () => {
  test("breaks at spaces and indents what follows", () => {
    expect(wrap("one two three", 7)).toEqual(["one two", "three"]);
    expect(wrap("one two three", 7, "  ")).toEqual(["one two", "  three"]);
    expect(wrap("", 7)).toEqual([""]);
  });

  test("cuts words longer than a line", () => {
    expect(wrap("abcdefghij", 4)).toEqual(["abcd", "efgh", "ij"]);
  });

  test("no line is longer than the width, and no letter is lost", () => {
    fc.assert(
      fc.property(fc.string({ maxLength: 300 }), fc.integer({ min: 5, max: 80 }), (text, width) => {
        const lines = wrap(text, width, "  ");
        for (const line of lines) expect(line.length).toBeLessThanOrEqual(width);
        expect(lines.join("").replace(/\s/g, "")).toBe(text.replace(/\s/g, ""));
      }),
      { seed: 20261202, numRuns: 1000 },
    );
  });

  test("takes line breaks and tabs for spaces", () => {
    expect(oneLine("a\r\nb\tc")).toBe("a b c");
    expect(wrap("a\nb", 80)).toEqual(["a b"]);
  });
});

test("columns are aligned, cut with an ellipsis, and end without spaces", () => {
  const columns: TextColumn[] = [
    { heading: "name", width: 5, align: "left" },
    { heading: "n", width: 3, align: "right" },
  ];
  expect(rule(columns)).toBe("---------");
  expect(layOut(columns, [["abcdefg", "1"], ["x\ny", ""], ["z"]])).toEqual([
    "name    n",
    "---------",
    "abcd…   1",
    "x y",
    "z",
  ]);
});

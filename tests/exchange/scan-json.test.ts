import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { Fault } from "../../src/errors/fault.js";
import { scanJson } from "../../src/exchange/scan-json.js";

function faultsIn(text: string): Fault[] {
  const faults: Fault[] = [];
  const isJson = scanJson(text, faults);
  expect(isJson).toBe(!faults.some(({ code }) => code === "exchange/not-json" || code === "exchange/too-deep"));
  return faults;
}

function isParsed(text: string): boolean {
  try {
    JSON.parse(text);
    return true;
  } catch {
    return false;
  }
}

const values = fc.oneof(
  fc.json({ maxDepth: 4 }),
  fc.json({ maxDepth: 4 }).map((text) => JSON.stringify(JSON.parse(text), null, "\t")),
  fc.string({ unit: "binary" }).map((text) => JSON.stringify(text)),
  fc.constantFrom('"\\u00e9\\n\\/\\"\\\\"', "-0", "1e5", "-1.25E-7", "[1,-0.5e+3]", ' \r\n\t{"a" :[ ] } ', '"\\ud800"'),
);
const pieces = fc.constantFrom(
  ...["{", "}", "[", "]", ",", ":", '"', "'", "\\", "0", "1", "-", "+", ".", "e", "u", " ", "\n", "\t", "\u0000", "/"],
  ...["null", "true", "nul", "NaN", "\uFEFF", "\u00A0", "\u2028", '""', '"a":1', "01", "1.", ".5", "\\u12", "\\x"],
);
/** Texts that are almost JSON: a piece of another is put in, or some characters are taken out. */
const nearly = fc
  .tuple(values, fc.array(fc.tuple(fc.nat(60), fc.nat(2), fc.oneof(pieces, fc.constant(""))), { maxLength: 3 }))
  .map(([text, edits]) =>
    edits.reduce((before, [place, taken, piece]) => before.slice(0, place) + piece + before.slice(place + taken), text),
  );

test("the verdict on 20,000 texts, most of them almost JSON, is that of JSON.parse", () => {
  let accepted = 0;
  fc.assert(
    fc.property(nearly, (text) => {
      const faults: Fault[] = [];
      const isJson = scanJson(text, faults);
      expect(isJson).toBe(isParsed(text));
      if (isJson) accepted += 1;
    }),
    { seed: 20270301, numRuns: 20_000 },
  );
  expect(accepted).toBeGreaterThan(4000);
  expect(accepted).toBeLessThan(16_000);
});

describe("what is no JSON is refused with line and column", () => {
  test.each<[string, string, string, string | undefined]>([
    ["", "line 1, column 1", "a value", undefined],
    ["  \n ", "line 2, column 2", "a value", undefined],
    ['{ "label": "Ar(g)", }', "line 1, column 21", "a key in double quotes", "no comma stands after the last entry"],
    ["[1, 2,\n]", "line 2, column 1", "a value", "no comma stands after the last entry"],
    ["{\n  'label': 1\n}", "line 2, column 3", "a key in double quotes", undefined],
    ["[\r\n'a']", "line 2, column 1", "a value", "texts stand in double quotes"],
    ["// note\n{}", "line 1, column 1", "a value", "JSON has no comments"],
    ["[NaN]", "line 1, column 2", "a value", "JSON has only true, false and null"],
    ["[.5]", "line 1, column 2", "a value", "a number begins with a digit or a minus sign"],
    ["[1 2]", "line 1, column 4", "a comma or ]", undefined],
    ["[01]", "line 1, column 3", "a comma or ]", undefined],
    ['{"a":1 "b":2}', "line 1, column 8", "a comma or }", undefined],
    ['{"a" 1}', "line 1, column 6", "a colon after the key", undefined],
    ['["a\nb"]', "line 1, column 4", "a character of a text", "line breaks and tabs in a text are written \\n and \\t"],
    ['["C:\\data"]', "line 1, column 5", "an escape sequence of JSON", "a backslash is written \\\\"],
    ['["a', "line 1, column 4", "a closing double quote", undefined],
    ['{"a":[1,{', "line 1, column 10", "a key in double quotes", undefined],
    ["{}\n\n{}", "line 3, column 1", "the end of the text", "a file holds one value"],
    ["[1]]", "line 1, column 4", "the end of the text", "a file holds one value"],
  ])("%j at %s", (text, place, expected, hint) => {
    const [fault, ...others] = faultsIn(text);
    expect(others).toEqual([]);
    expect(fault?.code).toBe("exchange/not-json");
    expect(fault?.message).toContain(`no JSON at ${place}: expected ${expected}, got `);
    expect(fault?.expected).toBe(expected);
    expect(fault?.hint).toBe(hint);
  });

  test("the path says in which member", () => {
    expect(faultsIn('{"species":[{"label":"Ar(g)"},{"label":Ar}]}')).toMatchObject([
      { path: ["species", 1, "label"], received: '"Ar}]}"' },
    ]);
  });

  test("an excerpt ends with the line and is short", () => {
    expect(faultsIn(`[!\n${"x".repeat(1000)}]`)[0]?.received).toBe('"!"');
    expect(faultsIn(`[${"x".repeat(1000)}]`)[0]?.received).toBe(JSON.stringify("x".repeat(20)));
  });
});

describe("keys", () => {
  test.each<[string, (string | number)[]]>([
    ['{"a":1,"a":2}', ["a"]],
    ['{"a":1,"\\u0061":2}', ["a"]],
    ['[{},{"x":{"a":1,"b":[1,2],"a":1}}]', [1, "x", "a"]],
    ['{"":0,"":0}', [""]],
  ])("%s has one twice", (text, path) => {
    expect(faultsIn(text)).toMatchObject([{ code: "exchange/duplicate-key", path }]);
  });

  test("the second place is told", () => {
    expect(faultsIn('{\n "a": 1,\n "a": 2\n}')[0]?.message).toContain("again at line 3, column 2");
  });

  test("the same key in two objects is no duplicate, nor are keys of other letters", () => {
    expect(faultsIn('[{"a":{"a":1}},{"a":1,"A":2,"á":3,"toString":4}]')).toEqual([]);
  });

  test.each(["__proto__", "constructor", "prototype"])("%s is refused, however it is written", (key) => {
    const escaped = `\\u${key.charCodeAt(0).toString(16).padStart(4, "0")}${key.slice(1)}`;
    for (const written of [key, escaped]) {
      expect(faultsIn(`{"species":[{"x":{"${written}":1}}]}`)).toMatchObject([
        { code: "input/forbidden-key", path: ["species", 0, "x", key] },
      ]);
    }
    expect(faultsIn(`["${key}"]`)).toEqual([]);
  });
});

test.each(["1e999", "-1e999", "1.8e308", `1${"0".repeat(400)}`])("the number %.20s is refused", (number) => {
  expect(faultsIn(`{"a":[0,${number}]}`)).toMatchObject([{ code: "input/not-finite", path: ["a", 1] }]);
});

test.each(["1.7976931348623157e308", "5e-324", "-0", "0.1", "123456789012345678901234567890"])(
  "the number %s is read",
  (number) => expect(faultsIn(`[${number}]`)).toEqual([]),
);

describe("texts made to exhaust", () => {
  test("100 levels are read, 101 are not", () => {
    expect(faultsIn("[".repeat(100) + "]".repeat(100))).toEqual([]);
    expect(faultsIn("[".repeat(101) + "]".repeat(101))).toMatchObject([{ code: "exchange/too-deep" }]);
    expect(faultsIn('{"a":'.repeat(101))).toMatchObject([{ code: "exchange/too-deep" }]);
  });

  test("ten million brackets are refused at once", () => {
    const [fault] = faultsIn("[".repeat(10_000_000));
    expect(fault?.code).toBe("exchange/too-deep");
    expect(fault?.path).toHaveLength(100);
  });

  test("of a hundred thousand duplicate keys a hundred are kept", () => {
    expect(faultsIn(`{${Array.from({ length: 100_000 }, () => '"a":1').join(",")}}`)).toHaveLength(100);
  });

  test.each([
    ["one long text", (size: number) => `"${"x".repeat(size)}"`],
    ["escapes", (size: number) => `"${"\\n".repeat(size / 2)}"`],
    ["a long number", (size: number) => "1".repeat(size)],
    ["spaces", (size: number) => `${" ".repeat(size)}1`],
    ["many keys", (size: number) => `{${Array.from({ length: size / 16 }, (_, i) => `"key${i}":1`).join(",")},"z":1}`],
    ["an open text", (size: number) => `"${"x".repeat(size)}`],
  ])("the time for %s grows in proportion", (_name, textOf) => {
    // Time of the processor, which other programs on the machine do not lengthen.
    const milliseconds = (size: number): number => {
      const text = textOf(size);
      const times = Array.from({ length: 3 }, () => {
        const start = process.cpuUsage();
        scanJson(text, []);
        return process.cpuUsage(start).user / 1000;
      });
      return Math.min(...times);
    };
    milliseconds(160_000);
    // Sixteen times the length; a quadratic scan would take 256 times as long.
    expect(milliseconds(2_560_000)).toBeLessThan(80 * Math.max(milliseconds(160_000), 5));
  });
});

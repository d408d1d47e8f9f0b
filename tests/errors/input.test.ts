import { describe, expect, test } from "vitest";
import type { Fault } from "../../src/errors/fault.js";
import { frozenCopy } from "../../src/errors/frozen-copy.js";
import { checkArray, checkNumber, checkObject, checkOption, checkText } from "../../src/errors/input.js";

/** What a check returns, and the faults that it collects. */
function run<T>(check: (faults: Fault[]) => T): { readonly value: T; readonly faults: readonly Fault[] } {
  const faults: Fault[] = [];
  return { value: check(faults), faults };
}

describe("checkObject", () => {
  const keys = { required: ["temperature"], optional: ["pressure"] } as const;

  test("gives back what has the keys", () => {
    const given = { temperature: 1, pressure: 2 };
    expect(run((faults) => checkObject(given, [], faults, keys))).toEqual({ value: given, faults: [] });
    expect(run((faults) => checkObject({ temperature: 1 }, [], faults, keys)).faults).toEqual([]);
  });

  test.each([undefined, null, 1, "text", true, [], () => 1, Symbol("s")])("%s is no object", (given) => {
    const { value, faults } = run((found) => checkObject(given, ["here"], found, keys));
    expect(value).toBeUndefined();
    expect(faults).toMatchObject([
      { code: "input/not-an-object", path: ["here"], expected: "an object with temperature" },
    ]);
  });

  test("collects every unknown, forbidden and missing key", () => {
    const given = JSON.parse(
      '{ "presure": 1, "__proto__": 2, "constructor": 3, "prototype": 4, "volume": 5 }',
    ) as unknown;
    const { faults } = run((found) => checkObject(given, ["a", 0], found, keys));
    expect(faults.map(({ code, path, hint }) => [code, path.join("."), hint])).toEqual([
      ["input/unknown-key", "a.0.presure", "did you mean pressure?"],
      ["input/forbidden-key", "a.0.__proto__", undefined],
      ["input/forbidden-key", "a.0.constructor", undefined],
      ["input/forbidden-key", "a.0.prototype", undefined],
      ["input/unknown-key", "a.0.volume", undefined],
      ["input/missing", "a.0.temperature", undefined],
    ]);
  });

  test("a member that is undefined, or inherited, is missing", () => {
    const inherited = Object.create({ temperature: 1 }) as unknown;
    for (const given of [{ temperature: undefined }, inherited]) {
      expect(run((faults) => checkObject(given, [], faults, keys)).faults).toMatchObject([
        { code: "input/missing", path: ["temperature"] },
      ]);
    }
  });

  test("any key stands in a map, but none that reaches a prototype", () => {
    const map = JSON.parse('{ "N2(g)": 1, "__proto__": 2 }') as unknown;
    const { faults } = run((found) => checkObject(map, [], found, { required: [], optional: "any" }));
    expect(faults.map(({ code }) => code)).toEqual(["input/forbidden-key"]);
  });

  test("a long key is cut in path and message", () => {
    const { faults } = run((found) => checkObject({ temperature: 1, ["k".repeat(1e6)]: 2 }, [], found, keys));
    expect(String(faults[0]?.path[0])).toHaveLength(80);
    expect(faults[0]?.message.length).toBeLessThan(120);
  });
});

describe("checkNumber", () => {
  test.each([0, -1, 5e-324, 1e308])("%d is a number", (given) => {
    expect(run((faults) => checkNumber(given, [], faults))).toEqual({ value: given, faults: [] });
  });

  test.each([undefined, null, "1", Number.NaN, Number.POSITIVE_INFINITY, 1n, [], {}])("%s is none", (given) => {
    const { value, faults } = run((found) => checkNumber(given, ["x"], found));
    expect(value).toBeUndefined();
    expect(faults).toMatchObject([{ code: "input/not-finite", path: ["x"] }]);
    expect(faults[0]?.hint).toBe(typeof given === "string" ? "a number, not a text" : undefined);
  });
});

test("checkText takes texts that are neither empty nor too long", () => {
  expect(run((faults) => checkText("abc", [], faults, 3))).toEqual({ value: "abc", faults: [] });
  expect(run((faults) => checkText("abcd", [], faults, 3)).faults).toMatchObject([{ code: "input/too-large" }]);
  for (const given of ["", 7, null, undefined]) {
    expect(run((faults) => checkText(given, [], faults)).faults).toMatchObject([{ code: "input/not-a-string" }]);
  }
});

test("checkOption takes one of its words and hints at the nearest", () => {
  const words = ["refuse", "continue-fit"] as const;
  expect(run((faults) => checkOption("refuse", [], faults, words))).toEqual({ value: "refuse", faults: [] });
  expect(run((faults) => checkOption("Refuse", [], faults, words)).faults).toMatchObject([
    { code: "input/unknown-option", expected: "refuse, continue-fit", hint: "did you mean refuse?" },
  ]);
  expect(run((faults) => checkOption(undefined, [], faults, words)).faults[0]).not.toHaveProperty("hint");
});

describe("checkArray", () => {
  test("takes arrays within their limit", () => {
    expect(run((faults) => checkArray([1, 2], [], faults, 2))).toEqual({ value: [1, 2], faults: [] });
    expect(run((faults) => checkArray([1, 2, 3], [], faults, 2)).faults).toMatchObject([{ code: "input/too-large" }]);
    for (const given of [undefined, null, "ab", { length: 1 }, new Float64Array(1)]) {
      expect(run((faults) => checkArray(given, [], faults)).faults).toMatchObject([{ code: "input/not-an-array" }]);
    }
  });

  test("visits holes as undefined", () => {
    const visited: unknown[] = [];
    // biome-ignore lint/suspicious/noSparseArray: a hole is what is tested
    run((faults) => checkArray([1, , 3], [], faults))?.value?.forEach((entry) => visited.push(entry));
    expect(visited).toEqual([1, undefined, 3]);
  });
});

describe("frozenCopy", () => {
  test("copies and freezes to the depth", () => {
    const given = { a: [{ b: 1 }], c: "text", d: null, e: undefined };
    const copy = frozenCopy(given);
    expect(copy).toEqual({ a: [{ b: 1 }], c: "text", d: null });
    expect([copy, copy.a, copy.a[0]].every(Object.isFrozen)).toBe(true);
    expect(Object.keys(copy)).toEqual(["a", "c", "d"]);
    given.a[0]!.b = 2;
    expect(copy.a[0]?.b).toBe(1);
  });

  test.each([1, "a", true, null, undefined])("%s is itself", (value) => {
    expect(frozenCopy(value)).toBe(value);
  });
});

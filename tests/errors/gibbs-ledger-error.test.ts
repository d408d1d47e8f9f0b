import { describe, expect, test } from "vitest";
import { faultCodes } from "../../src/errors/codes.js";
import { cut, describeReceived, type Fault } from "../../src/errors/fault.js";
import {
  fail,
  failIfAny,
  GibbsLedgerError,
  isGibbsLedgerError,
  toFaults,
} from "../../src/errors/gibbs-ledger-error.js";
import { faultsOf } from "./faults-of.js";

const fault: Fault = { code: "input/missing", path: ["conditions", "pressure"], message: "pressure is missing" };

test("codes are words joined by a slash and hyphens, each once", () => {
  expect(new Set(faultCodes).size).toBe(faultCodes.length);
  for (const code of faultCodes) expect(code).toMatch(/^[a-z-]+\/[a-z0-9-]+$/);
});

test("one fault makes a message of one line, with place and hint", () => {
  const error = new GibbsLedgerError([{ ...fault, hint: "add it" }]);
  expect(error.message).toBe("conditions.pressure: pressure is missing (add it)");
  expect([error.code, error.path, error.name]).toEqual([
    "input/missing",
    ["conditions", "pressure"],
    "GibbsLedgerError",
  ]);
  expect(error).toBeInstanceOf(Error);
});

test("several faults are listed", () => {
  const error = new GibbsLedgerError([fault, { ...fault, path: [] }]);
  expect(error.message).toBe("2 faults:\n- conditions.pressure: pressure is missing\n- pressure is missing");
});

test("the faults after the hundredth are counted", () => {
  const found = faultsOf(() => failIfAny(Array.from({ length: 250 }, () => fault)));
  expect(found).toHaveLength(100);
  expect(() => failIfAny(Array.from({ length: 250 }, () => fault))).toThrow(
    /^250 faults \(the first 100 are listed\):/,
  );
});

test("no faults, no error", () => {
  expect(() => failIfAny([])).not.toThrow();
});

test("an error is recognised by its mark, from whichever copy of the package", () => {
  const foreign = Object.assign(new Error("x"), { faults: [fault], [Symbol.for("gibbs-ledger/error")]: true });
  expect(isGibbsLedgerError(foreign)).toBe(true);
  expect(isGibbsLedgerError(foreign, "input/missing")).toBe(true);
  expect(isGibbsLedgerError(foreign, "input/too-large")).toBe(false);
  for (const value of [undefined, null, 1, "text", {}, new Error("x")]) expect(isGibbsLedgerError(value)).toBe(false);
});

test("faults are plain data", () => {
  let caught: unknown;
  try {
    fail(fault);
  } catch (error) {
    caught = error;
  }
  expect(toFaults(caught)).toEqual([fault]);
  expect(structuredClone(toFaults(caught))).toEqual([fault]);
  expect(toFaults(new Error("x"))).toEqual([]);
});

describe("a received value is described in short", () => {
  test.each<[unknown, string]>([
    [undefined, "undefined"],
    [null, "null"],
    ["a", '"a"'],
    ['a"\n', '"a\\"\\n"'],
    [-0, "-0"],
    [1.5, "1.5"],
    [10n, "10n"],
    [true, "true"],
    [() => 1, "a function"],
    [Symbol("s"), "a symbol"],
    [[1, 2], "an array of 2"],
    [{ toString: () => fail(fault) }, "an object"],
  ])("case %#", (value, text) => {
    expect(describeReceived(value)).toBe(text);
  });

  test("a long text is cut at 80 characters", () => {
    expect(describeReceived("x".repeat(1e6))).toHaveLength(80);
    expect(cut("abcdef", 4)).toBe("abc…");
    expect(cut("abcd", 4)).toBe("abcd");
  });
});

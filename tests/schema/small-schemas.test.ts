import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { faultCodes } from "../../src/errors/codes.js";
import type { Fault } from "../../src/errors/fault.js";
import { isGibbsLedgerError, toFaults } from "../../src/errors/gibbs-ledger-error.js";
import { readCollection } from "../../src/exchange/read-collection.js";
import { formula } from "../../src/formula/formula.js";
import { parseLabel } from "../../src/formula/parse-label.js";
import { rangePolicies } from "../../src/heat-capacity/range-policy.js";
import { checkFigure } from "../../src/quantity/check-figure.js";
import { checkPositiveQuantity } from "../../src/quantity/guards.js";
import { type Dimension, siUnits, unitTable } from "../../src/quantity/units.js";
import { references } from "../../src/references/bibliography.js";
import { checkSource } from "../../src/references/check-source.js";
import {
  faultSchema,
  figureSchema,
  formulaTextSchema,
  labelMapSchema,
  labelTextSchema,
  originSchema,
  positiveQuantitySchema,
  rangePolicySchema,
  sourceSchema,
  standardConditionsSchema,
} from "../../src/schema.js";
import { standardProperties } from "../../src/species/standard-properties.js";
import { randomFormula, spelled } from "../formula/grammar.js";
import { polynomialRecord } from "../species/records.js";
import { mutated } from "./mutated.js";
import { verdictsAgree } from "./verdicts.js";

const dimensions = Object.keys(siUnits) as Dimension[];
const units = Object.keys(unitTable);

function collected(check: (faults: Fault[]) => void): Fault[] {
  const faults: Fault[] = [];
  check(faults);
  return faults;
}

function faultsOfCall(call: () => unknown): readonly Fault[] {
  try {
    call();
    return [];
  } catch (error) {
    if (!isGibbsLedgerError(error)) throw error;
    return error.faults;
  }
}

describe("schema and guard give the same verdict", () => {
  test.each(dimensions)("on figures of %s", (dimension) => {
    const sound = fc.constantFrom(
      { value: 1, unit: siUnits[dimension], source: "cox1989", origin: "memory" },
      {
        value: 2.5,
        unit: siUnits[dimension],
        uncertainty: { halfWidth: 0.1, coverage: 0.95 },
        source: { text: "own" },
        origin: "page",
        where: "table 3",
      },
    );
    const words = [...units, -273.15, -273.16, -459.67, -459.68, 0, -1, 0.5, 1, 95, "page", "memory", "chase1998"];
    const share = verdictsAgree(
      mutated(sound, words),
      figureSchema(dimension),
      (value) => collected((faults) => checkFigure(value, dimension, [], faults)),
      500,
    );
    expect(share).toBeGreaterThan(0.2);
    expect(share).toBeLessThan(0.8);
  });

  test.each(dimensions)("on positive quantities of %s", (dimension) => {
    const sound = fc.constantFrom(
      { value: 1, unit: siUnits[dimension] },
      { value: 298.15, unit: siUnits[dimension], standardUncertainty: 0.5 },
    );
    const words = [...units, -273.15, -273.149999, -459.67, 0, -0, 5e-324, 1e308, 1.7e308, -1];
    const share = verdictsAgree(
      mutated(sound, words),
      positiveQuantitySchema(dimension),
      (value) => collected((faults) => checkPositiveQuantity(value, dimension, [], faults)),
      500,
    );
    expect(share).toBeGreaterThan(0.1);
    expect(share).toBeLessThan(0.8);
  });

  test("on sources", () => {
    const sound = fc.constantFrom<unknown>(...Object.keys(references), { text: "own" });
    const words = [...Object.keys(references), "nobody1900", "toString", "__proto__", { text: "own" }, "text"];
    const share = verdictsAgree(
      mutated(sound, words),
      sourceSchema,
      (value) => collected((faults) => checkSource(value, [], faults)),
      3000,
    );
    expect(share).toBeGreaterThan(0.3);
    expect(share).toBeLessThan(0.9);
  });

  const texts = fc.oneof(
    randomFormula.map((random) => spelled(random, false)),
    randomFormula.map((random) => spelled(random, true)),
    fc
      .tuple(randomFormula, fc.nat(), fc.constantFrom("", "(", ")", "^", "+", "2", "0", "·", ".", "X", "(g)", " "))
      .map(([random, place, piece]) => {
        const text = spelled(random, false);
        const at = place % (text.length + 1);
        return text.slice(0, at) + piece + text.slice(at + 1);
      }),
    fc.constantFrom<unknown>(undefined, null, 7, "", [], {}, "e^-", "(g)", "H".repeat(501), "H2O", "C(cr,graphite)"),
  );

  test("on texts of formulas", () => {
    const share = verdictsAgree(
      texts,
      formulaTextSchema,
      (value) => faultsOfCall(() => formula(value as string)),
      3000,
    );
    expect(share).toBeGreaterThan(0.3);
    expect(share).toBeLessThan(0.95);
  });

  test("on texts of labels in their one spelling", () => {
    const spellingFault = { code: "species/inconsistent", path: [], message: "another spelling" } as const;
    const share = verdictsAgree(
      texts,
      labelTextSchema,
      (value) => {
        let label: unknown;
        const faults = faultsOfCall(() => {
          ({ label } = parseLabel(value as string));
        });
        return faults.length > 0 || label === value ? faults : [spellingFault];
      },
      3000,
    );
    expect(share).toBeGreaterThan(0.05);
    expect(share).toBeLessThan(0.8);
  });

  // A property of a species is asked for a million times a second: it reads what it needs and passes over other keys.
  test("on conditions of standard properties, but for keys that nobody reads", () => {
    const record = polynomialRecord("NH3(g)", -46000, 192, [30]);
    const sound = fc.constantFrom(
      { temperature: { value: 300, unit: "K" } },
      { temperature: { value: 25, unit: "Cel" }, outsideRange: "continue-fit" },
    );
    const words = [...units, ...rangePolicies, -300, 0, 1000, 250, { value: 700, unit: "K" }];
    let [accepted, refused, passedOver] = [0, 0, 0];
    fc.assert(
      fc.property(mutated(sound, words), (value) => {
        const found = faultsOfCall(() => standardProperties(record, value as never));
        const faults = found.filter(({ code }) => code !== "species/outside-range");
        const { success, error } = standardConditionsSchema.safeParse(value);
        if (faults.length > 0) {
          expect(success).toBe(false);
          refused += 1;
        } else if (success) {
          accepted += 1;
        } else {
          for (const { code, path } of error!.issues) {
            expect(code === "unrecognized_keys" || path.includes("standardUncertainty")).toBe(true);
          }
          passedOver += 1;
        }
      }),
      { seed: 20270305, numRuns: 3000 },
    );
    expect(accepted).toBeGreaterThan(500);
    expect(refused).toBeGreaterThan(500);
    expect(passedOver).toBeGreaterThan(50);
  });
});

test("origins and policies are closed sets of words", () => {
  for (const origin of ["page", "memory"]) expect(originSchema.parse(origin)).toBe(origin);
  for (const policy of rangePolicies) expect(rangePolicySchema.parse(policy)).toBe(policy);
  for (const other of ["Page", "", "refuse ", null, undefined, 1, []]) {
    expect(originSchema.safeParse(other).success).toBe(false);
    expect(rangePolicySchema.safeParse(other).success).toBe(false);
  }
});

test("maps by label hold finite numbers, and no key reaches a prototype", () => {
  const map = { "N2(g)": 0.79, "O2(g)": -1, "": 0 };
  expect(labelMapSchema.parse(map)).toEqual(map);
  for (const value of [Number.NaN, Number.POSITIVE_INFINITY, "1", null, undefined, { value: 1 }]) {
    expect(labelMapSchema.safeParse({ "N2(g)": value }).success).toBe(false);
  }
  for (const key of ["__proto__", "constructor", "prototype"]) {
    expect(labelMapSchema.safeParse(JSON.parse(`{ "${key}": 1 }`)).success).toBe(false);
  }
  for (const other of [[], [1], null, "x", 1]) expect(labelMapSchema.safeParse(other).success).toBe(false);
});

describe("faults", () => {
  test("of a file of wrong records are accepted, through JSON too", () => {
    const faults = faultsOfCall(() => readCollection([{}, 7, { label: "Qq(g)", __proto__: null, constructor: 1 }]));
    expect(faults.length).toBeGreaterThan(10);
    for (const fault of faults) {
      expect(faultSchema.parse(fault)).toEqual(fault);
      expect(faultSchema.parse(JSON.parse(JSON.stringify(fault)))).toEqual(fault);
    }
    expect(toFaults(new Error("another")).map((fault) => faultSchema.parse(fault))).toEqual([]);
  });

  test("have a code of the table, a path and a message, and nothing else", () => {
    for (const code of faultCodes) expect(faultSchema.safeParse({ code, path: [], message: "" }).success).toBe(true);
    const fault = { code: "input/missing", path: ["terms", 0], message: "m" };
    for (const wrong of [
      { ...fault, code: "input/unheard-of" },
      { ...fault, path: "terms" },
      { ...fault, path: [-1] },
      { ...fault, path: [0.5] },
      { ...fault, message: undefined },
      { ...fault, hint: 7 },
      { ...fault, note: "" },
    ]) {
      expect(faultSchema.safeParse(wrong).success).toBe(false);
    }
  });
});

import { deepEqual, equal } from "node:assert/strict";
import fc from "fast-check";
import { expect, test, vi } from "vitest";
import { isGibbsLedgerError } from "../../src/errors/gibbs-ledger-error.js";
import { formatFormula } from "../../src/formula/format-formula.js";
import { formula } from "../../src/formula/formula.js";
import { hillFormula } from "../../src/formula/hill-formula.js";
import { parseLabel } from "../../src/formula/parse-label.js";
import { compositionOf, type RandomFormula, randomFormula, spelled } from "./grammar.js";

const settings = { seed: 20261201, numRuns: 2000 };

interface Written {
  readonly random: RandomFormula;
  readonly plain: string;
  readonly counts: Record<string, string>;
}

/** A decimal count before the H2O that ends a formula is ambiguous with plain digits by design. */
function isAmbiguous(plain: string): boolean {
  return /\.\d+H2O(?:[\^(].*)?$/.test(plain.replace(/·[\d.]+H2O/, ""));
}

function isInRange(counts: Record<string, string>): boolean {
  return Object.values(counts).every((count) => {
    const [top = "", bottom = "1"] = count.split("/");
    return Number(top) / Number(bottom) >= 1e-6 && Number(top) / Number(bottom) <= 1e12;
  });
}

const written: fc.Arbitrary<Written> = randomFormula
  .map((random) => ({ random, plain: spelled(random, false), counts: compositionOf(random) }))
  .filter(({ plain, counts }) => plain.length <= 500 && !isAmbiguous(plain) && isInRange(counts));

test("a random formula has the composition, charge and state that it was made from", () => {
  fc.assert(
    fc.property(written, ({ random, plain, counts }) => {
      const read = formula(plain);
      deepEqual({ ...read.exactCounts }, counts);
      equal(read.chargeNumber, random.chargeNumber);
      const state = read.state === undefined ? "" : `(${read.state}${read.polymorph ? `,${read.polymorph}` : ""})`;
      equal(state, random.suffix);
      for (const [symbol, count] of Object.entries(read.exactCounts)) {
        const [top = "", bottom = "1"] = count.split("/");
        // quotients of integers below 2^53 are correctly rounded
        if (Number.isSafeInteger(Number(top))) equal(read.composition[symbol], Number(top) / Number(bottom));
      }
    }),
    settings,
  );
});

test("both spellings of a random formula agree, and writing gives back what was read", () => {
  fc.assert(
    fc.property(written, ({ random, plain, counts }) => {
      const raised = spelled(random, true);
      deepEqual(formula(raised).exactCounts, counts);
      const { label } = parseLabel(plain);
      equal(parseLabel(raised).label, label);
      equal(parseLabel(label).label, label);
      equal(formatFormula(plain, { style: "ascii" }), label);
      equal(parseLabel(formatFormula(plain, { style: "unicode" })).label, label);
      deepEqual(formula(label).exactCounts, counts);
    }),
    settings,
  );
});

test("a formula in Hill order reads back to its composition", () => {
  fc.assert(
    fc.property(written, ({ plain }) => {
      const { composition } = formula(plain);
      const hill = hillFormula(composition);
      const again = formula(hill).composition;
      deepEqual(again, composition);
      equal(hillFormula(again), hill);
    }),
    settings,
  );
});

test("an ASCII dot before an integer and H2O at the end separates where no other dot comes before", () => {
  const undotted = written.map(({ plain }) => plain.replace(/[.·^].*$|\([a-z].*$/, "")).filter(isReadable);
  fc.assert(
    fc.property(undotted, fc.integer({ min: 1, max: 20 }), (body, count) => {
      const water = `${count === 1 ? "" : count}H2O`;
      deepEqual(formula(`${body}.${water}`).exactCounts, formula(`${body}·${water}`).exactCounts);
      equal(parseLabel(`${body}.${water}(s)`).formula, parseLabel(`${body}·${water}`).formula);
    }),
    settings,
  );
});

function isReadable(text: string): boolean {
  try {
    formula(`${text}·2H2O`);
    return text.length < 490;
  } catch {
    return false;
  }
}

const pieces = fc.constantFrom(
  ...[
    "H",
    "2",
    "O",
    ".",
    "·",
    "0",
    "5",
    "(",
    ")",
    "[",
    "]",
    "^",
    "+",
    "-",
    "e",
    "Fe",
    "x",
    ",",
    "g",
    "²",
    "⁻",
    "₂",
    " ",
  ],
  ...["H2O", "0.5", "(aq)", "(cr,", "III", "SO4", "Zz", "\ud83d", "−", "\0"],
);

test("any text is read or refused with a typed fault, and what is read is written and read back", () => {
  fc.assert(
    fc.property(
      fc.oneof(
        fc.array(pieces, { maxLength: 30 }).map((parts) => parts.join("")),
        fc.string(),
      ),
      (text) => {
        try {
          const { label } = parseLabel(text);
          equal(parseLabel(label).label, label);
          const { exactCounts } = formula(text);
          deepEqual(formula(label).exactCounts, exactCounts);
          deepEqual(formula(formatFormula(text, { style: "unicode" })).exactCounts, exactCounts);
        } catch (error) {
          if (!isGibbsLedgerError(error)) throw error;
          for (const fault of error.faults) {
            const column = /^column (\d+) of /.exec(fault.message)?.[1];
            if (fault.code === "formula/empty") continue;
            expect(Number(column)).toBeGreaterThanOrEqual(1);
            expect(Number(column)).toBeLessThanOrEqual(text.length + 1);
          }
        }
      },
    ),
    { ...settings, numRuns: 5000 },
  );
});

// Each grows by repeating one piece; the characters looked at are counted, not timed.
test.each([
  "H2",
  "(",
  "(H",
  "(H)",
  "(A(",
  "1",
  "H1.1",
  "H1.",
  ".5H2O",
  "·5H2O",
  "H^",
  "Zz",
  "abc",
  "(g",
  "(S)",
  "+",
  "H+1",
  "H0",
])("the characters looked at grow in proportion to the length: %s", (piece) => {
  const looked = (length: number) => {
    const text = `Fe${piece.repeat(Math.floor((length - 2) / piece.length))}`;
    const spy = vi.spyOn(String.prototype, "charAt");
    try {
      parseLabel(text);
    } catch (error) {
      if (!isGibbsLedgerError(error)) throw error;
    } finally {
      spy.mockRestore();
    }
    return spy.mock.calls.length;
  };
  const counted = vi.spyOn(String.prototype, "charAt");
  "x".charAt(0);
  expect(counted.mock.calls.length).toBe(1);
  counted.mockRestore();
  expect(looked(500)).toBeLessThanOrEqual(30 * 500);
  expect(looked(500)).toBeLessThanOrEqual(2.2 * looked(250) + 50);
});

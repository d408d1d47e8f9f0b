import { Decimal } from "decimal.js";
import fc from "fast-check";
import { expect, test } from "vitest";
import { isGibbsLedgerError, toFaults } from "../../src/errors/gibbs-ledger-error.js";
import { atomicWeights, isotopeMasses } from "../../src/formula/atomic-weights.js";
import { elementSymbols } from "../../src/formula/element-symbols.js";
import { formula } from "../../src/formula/formula.js";
import { molarMass } from "../../src/formula/molar-mass.js";

// CRC Handbook of Chemistry and Physics, W. M. Haynes (ed.), 95th edition (2014), Physical Constants of Inorganic
// Compounds, three decimals. It was printed with the weights of 2007 (M. E. Wieser, M. Berglund, Pure Appl. Chem. 81,
// 2131 (2009)), so the difference of the weights is taken out before the comparison. Origin of both: memory.
const weightsOf2007: Readonly<Record<string, number>> = {
  ...{ H: 1.00794, C: 12.0107, N: 14.0067, O: 15.9994, Na: 22.98976928, Al: 26.9815386, S: 32.065, Cl: 35.453 },
  ...{ Ca: 40.078, Fe: 55.845, Cu: 63.546, U: 238.02891 },
};

test.each([
  ["H2O", 18.015],
  ["CO2", 44.01],
  ["NH3", 17.031],
  ["NaCl", 58.443],
  ["CaCO3", 100.087],
  ["Fe2O3", 159.688],
  ["Al2O3", 101.961],
  ["CuSO4·5H2O", 249.685],
  ["UO2", 270.028],
])("%s has %f g/mol in the CRC Handbook, apart from the revision of the weights", (text, printed) => {
  const { value, unit } = molarMass(text);
  expect(unit).toBe("g/mol");
  let revision = 0;
  for (const [symbol, count] of Object.entries(formula(text).composition)) {
    revision += count * (atomicWeights[symbol as keyof typeof atomicWeights].value - weightsOf2007[symbol]!);
  }
  expect(Math.abs(revision)).toBeLessThan(0.01);
  expect(Math.abs(value - revision - printed)).toBeLessThanOrEqual(0.000501); // half a unit of the last decimal
});

// Sums by hand of the printed weights of 2021.
test.each([
  ["H2O", 18.015], // 2 x 1.0080 + 15.999
  ["CO2", 44.009], // 12.011 + 2 x 15.999
  ["CuSO4·5H2O", 249.677], // 63.546 + 32.06 + 4 x 15.999 + 5 x 18.015
  ["NaCl", 58.43976928], // 22.98976928 + 35.45
  ["Fe0.947O", 68.884215], // 0.947 x 55.845 + 15.999
])("%s weighs %f g/mol to the bit", (text, sum) => {
  expect(molarMass(text).value).toBe(sum);
});

test("deuterium and tritium weigh their isotopes", () => {
  expect(molarMass("D2O").value).toBe(20.027203555688);
  expect(molarMass("T2").value).toBe(6.03209856264);
});

test("the electrons of an ion are not counted", () => {
  expect(molarMass("SO4^2-(aq)").value).toBe(molarMass("SO4").value);
  expect(molarMass("SO4^2-(aq)").value).toBe(96.056);
});

test("a formula that has been read gives the same as its text", () => {
  const text = "KAl(SO4)2·12H2O(cr)";
  expect(molarMass(formula(text))).toEqual(molarMass(text));
  expect(molarMass(JSON.parse(JSON.stringify(formula(text))))).toEqual(molarMass(text));
});

test("the sum is exact and rounded once: against 60-digit decimals", () => {
  const Precise = Decimal.clone({ precision: 60 });
  const weights = { ...atomicWeights, ...isotopeMasses };
  const symbols = Object.keys(weights) as (keyof typeof weights)[];
  const item = fc.record({
    symbol: fc.constantFrom(...symbols),
    count: fc.integer({ min: 1, max: 99_999 }),
    decimals: fc.integer({ min: 0, max: 4 }),
  });
  fc.assert(
    fc.property(fc.array(item, { minLength: 1, maxLength: 12 }), (items) => {
      let text = "";
      let expected = new Precise(0);
      for (const { symbol, count, decimals } of items) {
        const written = new Precise(count).div(new Precise(10).pow(decimals)).toFixed();
        text += `(${symbol}3)${written}`;
        const [printed = ""] = weights[symbol].printed.split("(");
        expected = expected.plus(new Precise(printed).times(3).times(written));
      }
      expect(molarMass(text).value).toBe(Number(expected.toFixed()));
    }),
    { seed: 20261201, numRuns: 2000 },
  );
});

test("elements without a standard atomic weight are refused together", () => {
  const without = elementSymbols.filter((symbol) => !Object.hasOwn(atomicWeights, symbol));
  expect(without).toHaveLength(34);
  try {
    molarMass(without.join(""));
    expect.unreachable();
  } catch (error) {
    expect(isGibbsLedgerError(error, "formula/no-atomic-weight")).toBe(true);
    expect(toFaults(error).map(({ message }) => message.split(" ")[0])).toEqual([...without].sort());
  }
});

test.each([
  ["e^-", "formula/no-atomic-weight", []],
  ["Xx", "formula/unknown-element", []],
  [{ text: "Xx" }, "formula/unknown-element", ["text"]],
  [{}, "input/not-a-string", ["text"]],
  [null, "input/not-a-string", []],
  [18, "input/not-a-string", []],
])("%j is refused with %s", (given, code, path) => {
  try {
    molarMass(given as string);
    expect.unreachable();
  } catch (error) {
    expect(toFaults(error)[0]).toMatchObject({ code, path });
  }
});

import { Decimal } from "decimal.js";
import { expect, test } from "vitest";
import { type AtomicWeight, atomicWeights, isotopeMasses } from "../../src/formula/atomic-weights.js";
import { elementSymbols } from "../../src/formula/element-symbols.js";

const entries = Object.entries<AtomicWeight>({ ...atomicWeights, ...isotopeMasses });

test.each(entries)("value and uncertainty of %s are those printed", (_, { value, uncertainty, printed }) => {
  const [, digits = "", last = ""] = /^([\d.]+)\(([\d.]+)\)$/.exec(printed) ?? [];
  expect(value).toBe(Number(digits));
  const decimals = digits.split(".")[1]!.length;
  const expected = last.includes(".")
    ? Number(last)
    : new Decimal(last).times(new Decimal(10).pow(-decimals)).toNumber();
  expect(uncertainty).toBe(expected);
});

test("fourteen elements have an interval, and the abridged value covers it with its uncertainty", () => {
  const intervals = entries.filter(([, { interval }]) => interval !== undefined);
  const symbols = intervals.map(([symbol]) => symbol).sort();
  expect(symbols).toEqual(["Ar", "B", "Br", "C", "Cl", "H", "Li", "Mg", "N", "O", "Pb", "S", "Si", "Tl"]);
  for (const [, { value, uncertainty, interval: [lower, upper] = [0, 0] }] of intervals) {
    expect(lower).toBeLessThan(upper);
    const [a, b] = [new Decimal(value).minus(uncertainty), new Decimal(value).plus(uncertainty)];
    expect(a.lte(lower) && b.gte(upper)).toBe(true);
  }
});

test("84 elements, in the order of atomic number", () => {
  const symbols = Object.keys(atomicWeights);
  expect(symbols).toHaveLength(84);
  expect(elementSymbols.filter((symbol) => symbols.includes(symbol))).toEqual(symbols);
  expect(new Set(elementSymbols).size).toBe(118);
});

// Nuclear masses in daltons and the electron: CODATA 2022 (P. J. Mohr et al., Rev. Mod. Phys. 97, 025002 (2025)).
// The binding energy of the electron is 13.6 eV, 1.46e-8 Da. Origin: memory.
test.each([
  ["D", 2.013553212544],
  ["T", 3.01550071597],
] as const)("the mass of %s is that of its nucleus and an electron", (symbol, nucleus) => {
  const atom = nucleus + 5.485799090441e-4 - 1.46e-8;
  expect(Math.abs(isotopeMasses[symbol].value - atom)).toBeLessThan(3e-10);
});

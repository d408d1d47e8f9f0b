import { expect, test } from "vitest";
import { convertDifference, convertValue } from "../../src/quantity/convert-value.js";
import { type UnitCode, unitTable } from "../../src/quantity/units.js";
import {
  definitions,
  doubleOf,
  type Exact,
  exact,
  exactConversion,
  exactDouble,
  isNearest,
  neighbours,
  over,
  pairs,
  plus,
  randomNumbers,
  times,
  unitInLastPlace,
} from "./oracle.js";

const random = randomNumbers(20261201);
const sign = () => (random() < 0.5 ? -1 : 1);

/** Any finite double, all exponents alike. */
function anyDouble(): number {
  const word = (BigInt(Math.floor(random() * 2 ** 32)) << 32n) | BigInt(Math.floor(random() * 2 ** 32));
  const value = doubleOf(word);
  return Number.isFinite(value) ? value : anyDouble();
}

/** A value whose conversion lies as near as can be to the middle of two doubles, or on it. */
function nearHalfway(from: UnitCode, to: UnitCode): number {
  const target = (random() + 0.5) * 10 ** Math.floor(random() * 7 - 2) * sign();
  const middle = over(plus(exactDouble(target), exactDouble(neighbours(target)[1])), exact("2"));
  const { n, d } = exactConversion(middle, to, from);
  return Number((n * 10n ** 40n) / d) / 1e40;
}

/** A few bits only, so that products with few bits meet the middle exactly. */
const fewDigits = () => sign() * Math.round(random() * 1e6) * 10 ** Math.floor(random() * 9 - 6);

test("the table's factors and offsets are those of the definitions written a second time", () => {
  expect(Object.keys(definitions).sort()).toEqual(Object.keys(unitTable).sort());
  for (const [code, [dimension]] of Object.entries(definitions)) {
    expect(unitTable[code as UnitCode].dimension, code).toBe(dimension);
  }
});

test("each of 2,000 values a pair of units becomes the double nearest to the exact result", () => {
  for (const [from, to] of pairs) {
    for (let index = 0; index < 2000; index += 1) {
      const value =
        index % 4 === 0
          ? anyDouble()
          : index % 4 === 1
            ? fewDigits()
            : index % 4 === 2
              ? nearHalfway(from, to)
              : sign() * random() * 10 ** (random() * 12 - 6);
      const result = convertValue(value, from, to);
      if (!isNearest(result, exactConversion(exactDouble(value), from, to))) {
        expect.fail(`${value} ${from} gives ${result} ${to}`);
      }
    }
  }
});

test("exact halves go to the even double", () => {
  let halves = 0;
  for (let index = 0; index < 2000; index += 1) {
    // 125 times a number of 53 bits has up to seven bits more; one in 128 lies exactly between two doubles.
    const value = 2 ** 52 + Math.floor(random() * 2 ** 52);
    const product = times(exactDouble(value), exact("1000"));
    const result = convertValue(value, "kJ/mol", "J/mol");
    expect(isNearest(result, product), String(value)).toBe(true);
    if (isTie(product, result)) halves += 1;
    // Nine times an odd number is odd; above 2^53 it lies exactly between two doubles, and only integers decide.
    const odd = 2 * Math.floor((2 ** 53 / 18) * (1.01 + 0.78 * random())) + 1;
    const nineFifths = exactConversion(exactDouble(5 * odd), "K", "[degR]");
    expect(isTie(nineFifths, convertValue(5 * odd, "K", "[degR]"))).toBe(true);
    expect(isNearest(convertValue(5 * odd, "K", "[degR]"), nineFifths), String(odd)).toBe(true);
  }
  expect(halves).toBeGreaterThan(5);
});

function isTie(target: Exact, result: number): boolean {
  return neighbours(result).some((other) => {
    const middle = over(plus(exactDouble(result), exactDouble(other)), exact("2"));
    return middle.n * target.d === target.n * middle.d;
  });
}

test("subnormal numbers and the edge of the range are rounded once", () => {
  const edges = [5e-324, 1e-323, 2.2250738585072014e-308, 4.5e-320, 1.7976931348623157e308, 1.79e306, 1e290, 1e-290];
  for (const [from, to] of pairs) {
    for (const edge of edges.flatMap((value) => [value, -value])) {
      const result = convertValue(edge, from, to);
      expect(isNearest(result, exactConversion(exactDouble(edge), from, to)), `${edge} ${from} ${to}`).toBe(true);
    }
  }
});

test("there and back differs by at most one unit in the last place where the way there is normal", () => {
  for (const [from, to] of pairs) {
    const shifted = definitions[from][2] !== undefined || definitions[to][2] !== undefined;
    for (let index = 0; index < 500; index += 1) {
      const value = sign() * (random() + 0.001) * 10 ** (random() * 30 - 15);
      const there = convertValue(value, from, to);
      const back = convertValue(there, to, from);
      // Across a shift of the zero point the last place is that of the larger number on the way.
      const size = shifted ? Math.max(Math.abs(value), 459.67 * 2, Math.abs(there)) : value;
      const gap = Math.abs(back - value);
      if (!(gap <= unitInLastPlace(size))) expect.fail(`${value} ${from} by way of ${to} is ${back}`);
    }
  }
});

test("no conversion gives a negative zero", () => {
  for (const [from, to] of pairs) {
    for (const value of [0, -0, -5e-324]) {
      expect(Object.is(convertValue(value, from, to), -0), `${value} ${from} ${to}`).toBe(false);
      expect(Object.is(convertDifference(value, from, to), -0), `${value} ${from} ${to}`).toBe(false);
    }
  }
  expect(Object.is(convertValue(-0, "K", "K"), 0)).toBe(true);
});

test("differences take the factor and leave the offset", () => {
  expect(convertDifference(0.9, "[degF]", "Cel")).toBe(0.5);
  expect(convertDifference(1, "Cel", "K")).toBe(1);
  for (let index = 0; index < 2000; index += 1) {
    const value = random() * 10 ** (random() * 20 - 10);
    const result = convertDifference(value, "[degF]", "K");
    expect(isNearest(result, exactConversion(exactDouble(value), "[degF]{difference}", "K{difference}"))).toBe(true);
  }
});

test("absolute zero, as its nearest double, is absolute zero on every scale", () => {
  const zeros = { K: 0, Cel: -273.15, "[degF]": -459.67, "[degR]": 0 } as const;
  const codes = Object.keys(zeros) as (keyof typeof zeros)[];
  for (const from of codes) for (const to of codes) expect(convertValue(zeros[from], from, to)).toBe(zeros[to]);
});

test("everyday conversions have no noise", () => {
  expect(convertValue(25, "Cel", "K")).toBe(298.15);
  expect(convertValue(77, "[degF]", "Cel")).toBe(25);
  expect(convertValue(0.012, "kJ/mol", "J/mol")).toBe(12);
  expect(convertValue(1, "atm", "bar")).toBe(1.01325);
  expect(convertValue(760, "mm[Hg]", "Pa")).toBe(101325.0144354);
  expect(convertValue(1, "[psi]", "Pa")).toBe(6894.757293168362);
  expect(convertValue(1, "eV/{entity}", "kJ/mol")).toBe(96.48533212331002);
  expect(convertValue(1.8, "J/bar/mol", "cm3/mol")).toBe(18);
});

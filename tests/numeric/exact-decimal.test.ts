import { Decimal } from "decimal.js";
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { isGibbsLedgerError } from "../../src/errors/gibbs-ledger-error.js";
import {
  addDecimals,
  compareDecimals,
  decimalOf,
  decimalRatioToNumber,
  decimalToNumber,
  decimalToString,
  type ExactDecimal,
  exactDecimalOfDouble,
  multiplyDecimals,
  negateDecimal,
  powerOfTen,
  roundRatio,
  scaleDecimal,
  subtractDecimals,
} from "../../src/numeric/exact-decimal.js";
import { exactDecimal, neighbour, parts, randomPositive, seeded } from "./ulp.js";

const W = Decimal.clone({ precision: 1200, toExpNeg: -9e15, toExpPos: 9e15 });

const doubles = fc.double({ noNaN: true, noDefaultInfinity: true });
const decimals = fc.record({
  mantissa: fc.bigInt({ min: -(10n ** 25n), max: 10n ** 25n }),
  exponent: fc.integer({ min: -40, max: 40 }),
});

function other(a: ExactDecimal): Decimal {
  return new W(`${a.mantissa}e${a.exponent}`);
}

function codeOf(action: () => unknown): string | undefined {
  try {
    action();
  } catch (error) {
    return isGibbsLedgerError(error) ? error.code : "another error";
  }
  return undefined;
}

/** Whether a double is the nearest to numerator / denominator (both above zero), ties to even, by exact comparison. */
function isNearest(result: number, numerator: bigint, denominator: bigint): boolean {
  const { significand, exponent } = parts(result);
  // result = significand 2^exponent; the gap below a power of two is half as wide.
  const up = 1n << 1n;
  const down = significand === 2n ** 52n && exponent > -1074 ? 1n : 2n;
  const shift = (value: bigint, by: number): bigint => value << BigInt(by);
  // In quarters of a unit: |4 n / (d 2^exponent) - 4 significand|
  const left = exponent < 0 ? shift(4n * numerator, -exponent) : 4n * numerator;
  const right = exponent > 0 ? shift(denominator, exponent) : denominator;
  const difference = left - 4n * significand * right;
  if (difference === up * right) return significand % 2n === 0n;
  if (difference === -down * right) return significand % 2n === 0n;
  return difference < up * right && difference > -down * right;
}

describe("decimalOf", () => {
  test("reads the shortest decimal of a double", () => {
    expect(decimalOf(0.1)).toEqual({ mantissa: 1n, exponent: -1 });
    expect(decimalOf(-24.5)).toEqual({ mantissa: -245n, exponent: -1 });
    expect(decimalOf(1e-7)).toEqual({ mantissa: 1n, exponent: -7 });
    expect(decimalOf(-0)).toEqual({ mantissa: 0n, exponent: 0 });
    fc.assert(
      fc.property(doubles, (x) => {
        expect(other(decimalOf(x)).equals(new W(x))).toBe(true);
        expect(decimalToNumber(decimalOf(x))).toBe(x + 0);
      }),
      { seed: 20261201, numRuns: 2000 },
    );
  });

  test.each(["0", "-0.0", "+1.50", "12e3", "1.E+2", ".5", "-.25e-3", "8.314462618153240", "1e9999", "00012"])(
    "reads the numeral %s exactly",
    (text) => {
      expect(other(decimalOf(text)).equals(new W(text.replace(".E", "E")))).toBe(true);
    },
  );

  test.each([
    "",
    " 1",
    "1 ",
    "1e",
    "1e12345",
    ".",
    "+",
    "0x10",
    "1,5",
    "1_000",
    "NaN",
    "Infinity",
    "١",
    "1".repeat(10_001),
  ])("refuses %j", (text) => {
    expect(codeOf(() => decimalOf(text))).toBe("numeric/not-a-decimal");
  });

  test.each([Number.NaN, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY])("refuses %d", (value) => {
    expect(codeOf(() => decimalOf(value))).toBe("numeric/not-a-decimal");
    expect(codeOf(() => exactDecimalOfDouble(value))).toBe("numeric/not-a-decimal");
  });
});

test("exactDecimalOfDouble is the binary value of the double", () => {
  expect(decimalToString(exactDecimalOfDouble(0.1))).toBe("0.1000000000000000055511151231257827021181583404541015625");
  const random = seeded(111);
  for (let round = 0; round < 500; round += 1) {
    const x = randomPositive(random) * (round % 2 === 0 ? 1 : -1);
    const { significand, exponent } = parts(x);
    const value = exactDecimalOfDouble(x);
    // value 2^-exponent = significand, in whole numbers
    const top = value.exponent > 0 ? value.mantissa * 10n ** BigInt(value.exponent) : value.mantissa;
    const bottom = value.exponent < 0 ? 10n ** BigInt(-value.exponent) : 1n;
    expect(exponent < 0 ? top << BigInt(-exponent) : top).toBe(
      significand * (exponent > 0 ? bottom << BigInt(exponent) : bottom),
    );
    expect(decimalToNumber(value)).toBe(x);
  }
});

test("sums, differences, products and comparisons are exact", () => {
  fc.assert(
    fc.property(decimals, decimals, fc.bigInt({ min: -1000n, max: 1000n }), (a, b, factor) => {
      expect(other(addDecimals(a, b)).equals(other(a).plus(other(b)))).toBe(true);
      expect(other(subtractDecimals(a, b)).equals(other(a).minus(other(b)))).toBe(true);
      expect(other(multiplyDecimals(a, b)).equals(other(a).times(other(b)))).toBe(true);
      expect(other(negateDecimal(a)).equals(other(a).negated())).toBe(true);
      expect(other(scaleDecimal(a, factor)).equals(other(a).times(factor.toString()))).toBe(true);
      expect(compareDecimals(a, b)).toBe(other(a).comparedTo(other(b)));
      expect(compareDecimals(a, { mantissa: a.mantissa * 1000n, exponent: a.exponent - 3 })).toBe(0);
    }),
    { seed: 20261201, numRuns: 2000 },
  );
  expect([0, 1, 22, 399, 400, 401, 5000].every((n) => powerOfTen(n) === 10n ** BigInt(n))).toBe(true);
});

describe("roundRatio", () => {
  test("is the nearest double over the whole range", () => {
    const random = seeded(113);
    const digits = (): bigint => {
      let value = 1n;
      for (let count = Math.floor(random() * 24); count >= 0; count -= 1) {
        value = (value << 48n) + BigInt(Math.floor(random() * 2 ** 48));
      }
      return value >> BigInt(Math.floor(random() * 48));
    };
    for (let round = 0; round < 2000; round += 1) {
      const numerator = digits();
      const denominator = digits();
      const result = roundRatio(numerator, denominator);
      if (result === Number.POSITIVE_INFINITY) {
        // From half a unit above the greatest double.
        expect(numerator >= denominator * (2n ** 1024n - 2n ** 970n)).toBe(true);
      } else {
        expect(isNearest(result, numerator, denominator)).toBe(true);
      }
      expect(roundRatio(-numerator, denominator)).toBe(result === 0 ? 0 : -result);
      expect(roundRatio(numerator, -denominator)).toBe(result === 0 ? 0 : -result);
      expect(roundRatio(-numerator, -denominator)).toBe(result);
    }
  });

  test("rounds ties to even, and numbers next to a tie the right way, also among subnormals", () => {
    const random = seeded(117);
    const small = 2n ** 1200n;
    for (let round = 0; round < 1000; round += 1) {
      const x = round % 3 === 0 ? randomPositive(random) * 2 ** -1000 || 5e-324 : randomPositive(random);
      const { significand, exponent } = parts(x);
      // Halfway between x and the double above, in units of 2^-1200.
      const tie = (2n * significand + 1n) << BigInt(exponent - 1 + 1200);
      const above = neighbour(x, 1);
      expect(roundRatio(tie, small)).toBe(significand % 2n === 0n ? x : above);
      expect(roundRatio(tie * 7n - 1n, small * 7n)).toBe(x);
      expect(roundRatio(tie * 7n + 1n, small * 7n)).toBe(above);
    }
  });

  test("at the ends of the range", () => {
    expect(roundRatio(0n, -5n)).toBe(0);
    expect(roundRatio(1n, 2n ** 1074n)).toBe(5e-324);
    expect(roundRatio(1n, 2n ** 1075n)).toBe(0);
    expect(roundRatio(-1n, 2n ** 1075n)).toBe(0);
    expect(roundRatio(2n ** 60n + 1n, 2n ** 1135n)).toBe(5e-324);
    expect(roundRatio(1n, 10n ** 5000n)).toBe(0);
    expect(roundRatio(10n ** 5000n, 3n * 10n ** 4999n)).toBe(10 / 3);
    expect(roundRatio(2n ** 1024n - 2n ** 970n - 1n, 1n)).toBe(Number.MAX_VALUE);
    expect(roundRatio(2n ** 1024n - 2n ** 970n, 1n)).toBe(Number.POSITIVE_INFINITY);
    expect(roundRatio(-(10n ** 400n), 1n)).toBe(Number.NEGATIVE_INFINITY);
    expect(roundRatio(2n ** 54n - 1n, 2n ** 1076n)).toBe(2.2250738585072014e-308);
    expect(codeOf(() => roundRatio(1n, 0n))).toBe("numeric/division-by-zero");
    expect(codeOf(() => roundRatio(0n, 0n))).toBe("numeric/division-by-zero");
  });
});

test("decimals become the nearest double, as the engine's own reader of numerals does", () => {
  fc.assert(
    fc.property(
      fc.bigInt({ min: -(10n ** 20n) + 1n, max: 10n ** 20n - 1n }),
      fc.integer({ min: -345, max: 310 }),
      (m, e) => {
        expect(decimalToNumber({ mantissa: m, exponent: e })).toBe(Number(`${m}e${e}`) + 0);
      },
    ),
    { seed: 20261201, numRuns: 2000 },
  );
  expect(decimalToNumber({ mantissa: -1n, exponent: -400 })).toBe(0);
  expect(decimalToNumber({ mantissa: 1n, exponent: 400 })).toBe(Number.POSITIVE_INFINITY);
});

test("ratios of decimals are rounded once", () => {
  fc.assert(
    fc.property(decimals, decimals, (a, b) => {
      fc.pre(a.mantissa > 0n && b.mantissa > 0n);
      const difference = a.exponent - b.exponent;
      const top = difference > 0 ? a.mantissa * 10n ** BigInt(difference) : a.mantissa;
      const bottom = difference < 0 ? b.mantissa * 10n ** BigInt(-difference) : b.mantissa;
      expect(isNearest(decimalRatioToNumber(a, b), top, bottom)).toBe(true);
    }),
    { seed: 20261201, numRuns: 1000 },
  );
  expect(codeOf(() => decimalRatioToNumber(decimalOf(1), decimalOf(0)))).toBe("numeric/division-by-zero");
});

describe("decimalToString", () => {
  test.each([
    [{ mantissa: 0n, exponent: 5 }, "0"],
    [{ mantissa: -1500n, exponent: -6 }, "-0.0015"],
    [{ mantissa: 12345n, exponent: -2 }, "123.45"],
    [{ mantissa: 120n, exponent: 2 }, "12000"],
    [{ mantissa: 15n, exponent: -31 }, "1.5e-30"],
    [{ mantissa: -1n, exponent: 30 }, "-1e+30"],
  ])("%o is %s", (value, text) => {
    expect(decimalToString(value)).toBe(text);
  });

  test("is read back to the same number", () => {
    fc.assert(
      fc.property(decimals, (a) => {
        const text = decimalToString(a);
        expect(compareDecimals(decimalOf(text), a)).toBe(0);
        expect(text).not.toMatch(/^-?0\d|\.\d*0(e|$)|\.(e|$)/);
      }),
      { seed: 20261201, numRuns: 2000 },
    );
  });
});

test("the helper of these tests is exact too", () => {
  expect(exactDecimal(0.1).equals(new W("0.1000000000000000055511151231257827021181583404541015625"))).toBe(true);
});

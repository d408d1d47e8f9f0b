import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { isGibbsLedgerError } from "../../src/errors/gibbs-ledger-error.js";
import { decimalOf } from "../../src/numeric/exact-decimal.js";
import {
  addRationals,
  compareRationals,
  divideRationals,
  isZeroRational,
  multiplyRationals,
  negateRational,
  parseRational,
  type Rational,
  rational,
  rationalOfDecimal,
  rationalToNumber,
  rationalToString,
} from "../../src/numeric/rational.js";

const rationals = fc
  .tuple(fc.bigInt({ min: -(10n ** 12n), max: 10n ** 12n }), fc.bigInt({ min: 1n, max: 10n ** 12n }), fc.boolean())
  .map(([n, d, negative]) => rational(n, negative ? -d : d));

function commonDivisor(a: bigint, b: bigint): bigint {
  return b === 0n ? (a < 0n ? -a : a) : commonDivisor(b, a % b);
}

function expectReduced({ numerator, denominator }: Rational): void {
  expect(denominator > 0n).toBe(true);
  expect(commonDivisor(numerator, denominator)).toBe(1n);
}

function codeOf(action: () => unknown): string | undefined {
  try {
    action();
  } catch (error) {
    return isGibbsLedgerError(error) ? error.code : "another error";
  }
  return undefined;
}

test("arithmetic keeps the laws of a field, in lowest terms", () => {
  fc.assert(
    fc.property(rationals, rationals, rationals, (a, b, c) => {
      expect(addRationals(a, b)).toEqual(addRationals(b, a));
      expect(addRationals(addRationals(a, b), c)).toEqual(addRationals(a, addRationals(b, c)));
      expect(multiplyRationals(a, addRationals(b, c))).toEqual(
        addRationals(multiplyRationals(a, b), multiplyRationals(a, c)),
      );
      expect(isZeroRational(addRationals(a, negateRational(a)))).toBe(true);
      if (!isZeroRational(b)) expect(multiplyRationals(divideRationals(a, b), b)).toEqual(a);
      expectReduced(addRationals(a, b));
      expectReduced(multiplyRationals(a, b));
      // Cross products, by hand.
      const difference = a.numerator * b.denominator - b.numerator * a.denominator;
      expect(compareRationals(a, b)).toBe(difference < 0n ? -1 : difference > 0n ? 1 : 0);
    }),
    { seed: 20261201, numRuns: 1000 },
  );
});

test("rational reduces and carries the sign in the numerator", () => {
  expect(rational(6n, -4n)).toEqual({ numerator: -3n, denominator: 2n });
  expect(rational(0n, -7n)).toEqual({ numerator: 0n, denominator: 1n });
  expect(codeOf(() => rational(1n, 0n))).toBe("numeric/division-by-zero");
  expect(codeOf(() => divideRationals(rational(1n, 2n), rational(0n, 1n)))).toBe("numeric/division-by-zero");
});

describe("parseRational", () => {
  test.each([
    ["3/2", 3n, 2n],
    ["-6/4", -3n, 2n],
    ["+2", 2n, 1n],
    ["0.5", 1n, 2n],
    [".125", 1n, 8n],
    ["-0.10", -1n, 10n],
    ["0/5", 0n, 1n],
  ])("reads %s", (text, numerator, denominator) => {
    expect(parseRational(text)).toEqual({ numerator, denominator });
  });

  test.each(["", "1/0", "1/-2", "1.5/2", "1e3", "a", " 1", "1/", "/2", ".", "1.", "--1", "1".repeat(301)])(
    "does not read %j",
    (text) => {
      expect(parseRational(text)).toBeUndefined();
    },
  );

  test("reads back what is written", () => {
    fc.assert(
      fc.property(rationals, (a) => {
        expect(parseRational(rationalToString(a))).toEqual(a);
      }),
      { seed: 20261201, numRuns: 1000 },
    );
    expect(rationalToString(rational(3n, 2n))).toBe("3/2");
    expect(rationalToString(rational(-4n, 2n))).toBe("-2");
  });
});

test("decimals become rationals and rationals the nearest doubles", () => {
  expect(rationalOfDecimal(decimalOf("0.375"))).toEqual({ numerator: 3n, denominator: 8n });
  expect(rationalOfDecimal(decimalOf("12e2"))).toEqual({ numerator: 1200n, denominator: 1n });
  expect(rationalToNumber(rational(1n, 3n))).toBe(1 / 3);
  expect(rationalToNumber(rational(0n, -3n))).toBe(0);
  fc.assert(
    fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (x) => {
      expect(rationalToNumber(rationalOfDecimal(decimalOf(x)))).toBe(x + 0);
    }),
    { seed: 20261201, numRuns: 500 },
  );
});

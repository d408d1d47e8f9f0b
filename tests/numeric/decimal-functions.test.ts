import { Decimal } from "decimal.js";
import { describe, expect, test } from "vitest";
import { isGibbsLedgerError } from "../../src/errors/gibbs-ledger-error.js";
import { lnDecimal, sqrtDecimal } from "../../src/numeric/decimal-functions.js";
import { decimalOf, type ExactDecimal } from "../../src/numeric/exact-decimal.js";
import { seeded } from "./ulp.js";

const W = Decimal.clone({ precision: 160, toExpNeg: -9e15, toExpPos: 9e15, maxE: 9e15, minE: -9e15 });

function other(a: ExactDecimal): Decimal {
  return new W(`${a.mantissa}e${a.exponent}`);
}

/** The distance from the reference in units of the last of so many significant digits. */
function unitsOff(value: ExactDecimal, reference: Decimal, digits: number): number {
  const unit = new W(10).pow(
    reference
      .abs()
      .log(10)
      .floor()
      .plus(1 - digits),
  );
  return other(value).minus(reference).abs().div(unit).toNumber();
}

function sample(count: number, seed: number): ExactDecimal[] {
  const random = seeded(seed);
  return Array.from({ length: count }, (_, index) => {
    const mantissa = BigInt(1 + Math.floor(random() * 1e15)) * BigInt(1 + Math.floor(random() * 1e15));
    const exponent = Math.floor(random() * 80) - 70;
    if (index % 3 !== 0) return { mantissa, exponent };
    // 1 plus or minus a small rest.
    const places = 1 + Math.floor(random() * 40);
    const rest = BigInt(Math.floor(random() * 1999) - 999) || 1n;
    return { mantissa: 10n ** BigInt(places + 3) + rest, exponent: -places - 3 };
  });
}

function codeOf(action: () => unknown): string | undefined {
  try {
    action();
  } catch (error) {
    return isGibbsLedgerError(error) ? error.code : "another error";
  }
  return undefined;
}

describe("lnDecimal", () => {
  test.each([1, 5, 17, 40, 60])("has %d digits", (digits) => {
    for (const x of sample(60, digits)) {
      const result = lnDecimal(x, digits);
      expect(unitsOff(result, other(x).ln(), digits)).toBeLessThan(0.51);
      expect(result.mantissa.toString().replace("-", "").length).toBeLessThanOrEqual(digits);
    }
  });

  test("is ln 1000 to 40 digits and 0 at 1", () => {
    expect(lnDecimal(decimalOf(1000), 40)).toEqual({
      mantissa: 6907755278982137052053974364053092622803n,
      exponent: -39,
    });
    expect(lnDecimal(decimalOf("1.000"), 40).mantissa).toBe(0n);
  });

  test("keeps its digits next to powers of two and far from 1", () => {
    const texts = [
      "0.5",
      "2",
      "4",
      "1.9999999999999999999",
      "2.0000000000000001",
      "0.6666666",
      "0.6666667",
      "1.3333333",
      "1.3333334",
      "1e-9999",
      "1e9999",
      "9.999e4321",
    ];
    for (const text of texts) expect(unitsOff(lnDecimal(decimalOf(text), 45), new W(text).ln(), 45)).toBeLessThan(0.51);
  });

  test("has a thousand digits", () => {
    const wide = Decimal.clone({ precision: 1010 });
    const { mantissa, exponent } = lnDecimal(decimalOf(7), 1000);
    const difference = new wide(`${mantissa}e${exponent}`).minus(new wide(7).ln()).abs();
    expect(difference.lt(new wide("0.51e-999"))).toBe(true);
  });

  test("refuses what has no logarithm, and numbers of digits that are none", () => {
    expect(codeOf(() => lnDecimal(decimalOf(0), 10))).toBe("numeric/outside-domain");
    expect(codeOf(() => lnDecimal(decimalOf(-1), 10))).toBe("numeric/outside-domain");
    for (const digits of [0, 1.5, -3, Number.NaN, 10_001]) {
      expect(codeOf(() => lnDecimal(decimalOf(2), digits))).toBe("numeric/outside-domain");
      expect(codeOf(() => sqrtDecimal(decimalOf(2), digits))).toBe("numeric/outside-domain");
    }
  });
});

describe("sqrtDecimal", () => {
  test.each([1, 2, 17, 40])("is correctly rounded to %d digits", (digits) => {
    for (const x of sample(200, 70 + digits)) {
      const rounded = other(x).sqrt().toSignificantDigits(digits, Decimal.ROUND_HALF_UP);
      expect(other(sqrtDecimal(x, digits)).equals(rounded)).toBe(true);
    }
  });

  test("is exact for squares, and 0 at 0", () => {
    expect(other(sqrtDecimal(decimalOf("1.44"), 30)).equals("1.2")).toBe(true);
    expect(other(sqrtDecimal(decimalOf("4e-301"), 3)).equals(new W("4e-301").sqrt().toSignificantDigits(3))).toBe(true);
    expect(sqrtDecimal(decimalOf(0), 5).mantissa).toBe(0n);
    expect(codeOf(() => sqrtDecimal(decimalOf(-1), 5))).toBe("numeric/outside-domain");
  });
});

import fc from "fast-check";
import { expect, test } from "vitest";
import { divideDecimals } from "../../src/numeric/divide-decimals.js";
import { multiplyDecimals, subtractDecimals } from "../../src/numeric/exact-decimal.js";

const mantissas = fc.bigInt({ min: 1n, max: 10n ** 20n });
const exponents = fc.integer({ min: -30, max: 30 });

test("the quotient times the divisor misses the dividend by less than one unit of the last digit asked for", () => {
  fc.assert(
    fc.property(mantissas, exponents, mantissas, exponents, fc.integer({ min: 1, max: 50 }), (m, e, n, f, digits) => {
      const dividend = { mantissa: m, exponent: e };
      const divisor = { mantissa: n, exponent: f };
      const quotient = divideDecimals(dividend, divisor, digits);
      const rest = subtractDecimals(dividend, multiplyDecimals(quotient, divisor));
      // 0 <= rest < dividend 10^(1 - digits)
      expect(rest.mantissa >= 0n).toBe(true);
      const bound = { mantissa: m, exponent: e + 1 - digits };
      expect(subtractDecimals(rest, bound).mantissa < 0n).toBe(true);
    }),
    { seed: 20261201, numRuns: 2000 },
  );
  expect(divideDecimals({ mantissa: 0n, exponent: 3 }, { mantissa: 7n, exponent: 0 }, 5)).toEqual({
    mantissa: 0n,
    exponent: 0,
  });
});

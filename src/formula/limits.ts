import type { ExactDecimal } from "../numeric/exact-decimal.js";

/** The longest formula that is read, in characters. */
export const maximumFormulaLength = 500;

/** How deep brackets may lie within brackets. */
export const maximumNesting = 20;

/** The most digits of a count: room for the shortest decimal of every double from the least count on. */
export const maximumCountDigits = 24;

/** The least count of an element in a formula, 1e-6; below, a count is a slip. */
export const leastCount: ExactDecimal = { mantissa: 1n, exponent: -6 };

/** The greatest count of an element in a formula, 1e12. */
export const greatestCount: ExactDecimal = { mantissa: 1n, exponent: 12 };

/** The most digits of a charge number. */
export const maximumChargeDigits = 3;

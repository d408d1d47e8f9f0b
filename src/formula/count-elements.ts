import {
  addDecimals,
  compareDecimals,
  decimalToNumber,
  type ExactDecimal,
  multiplyDecimals,
} from "../numeric/exact-decimal.js";
import type { Draft } from "./draft.js";
import { compareInHillOrder } from "./hill-order.js";
import { greatestCount, leastCount } from "./limits.js";
import { type Reader, report } from "./reader.js";

/** How many atoms of an element a formula has, exactly and as the nearest double. */
export interface ElementCount {
  readonly symbol: string;
  readonly exact: ExactDecimal;
  readonly count: number;
}

/** Multiplies out the groups of a draft: one product for each group and each symbol. */
export function countElements(reader: Reader, draft: Draft): ElementCount[] {
  const factors: ExactDecimal[] = [];
  for (const [index, { parent, factor }] of draft.groups.entries()) {
    factors.push(index === 0 ? factor : multiplyDecimals(factors[parent]!, factor));
  }
  const sums = new Map<string, { exact: ExactDecimal; position: number }>();
  for (const { symbol, position, group, count } of draft.atoms) {
    const product = multiplyDecimals(factors[group]!, count);
    const sum = sums.get(symbol);
    if (sum === undefined) sums.set(symbol, { exact: product, position });
    else sum.exact = addDecimals(sum.exact, product);
  }
  for (const [symbol, { exact, position }] of sums) {
    if (compareDecimals(exact, leastCount) >= 0 && compareDecimals(exact, greatestCount) <= 0) continue;
    report(reader, {
      code: "formula/count-out-of-range",
      position,
      message: `the formula has ${decimalToNumber(exact)} atoms of ${symbol}`,
      expected: "a count of 1e-6 to 1e12",
    });
  }
  const hasCarbon = sums.has("C");
  return [...sums]
    .map(([symbol, { exact }]) => ({ symbol, exact, count: decimalToNumber(exact) }))
    .sort((a, b) => compareInHillOrder(a.symbol, b.symbol, hasCarbon));
}

import { divideDecimals } from "../numeric/divide-decimals.js";
import { decimalOf, type ExactDecimal, multiplyDecimals } from "../numeric/exact-decimal.js";
import { siUnitOf } from "./check-parts.js";
import { convertValue } from "./convert-value.js";
import type { Figure } from "./figure.js";
import { type UnitCode, unitEntry } from "./units.js";

/** Value of a checked figure in the coherent SI unit of its dimension. */
export function figureInSi(figure: Figure): number {
  const unit = figure.unit as UnitCode;
  return convertValue(figure.value, unit, siUnitOf(unit));
}

/**
 * Exact value of a checked figure in the coherent SI unit, for units without an offset; to 60 digits where the factor is
 * the ratio of two decimals.
 */
export function exactFigureInSi(figure: Figure): ExactDecimal {
  const [numerator, denominator] = unitEntry(figure.unit as UnitCode).factor.split("/") as [string, string?];
  const product = multiplyDecimals(decimalOf(figure.value), decimalOf(numerator));
  return denominator === undefined ? product : divideDecimals(product, decimalOf(denominator), 60);
}

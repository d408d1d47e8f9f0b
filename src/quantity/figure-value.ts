import { decimalOf, decimalToNumber, type ExactDecimal, multiplyDecimals } from "../numeric/exact-decimal.js";
import { siUnitOf } from "./check-parts.js";
import { convertValue } from "./convert-value.js";
import type { Figure } from "./figure.js";
import { type UnitCode, unitEntry } from "./units.js";

/** Value of a checked figure in the coherent SI unit of its dimension. */
export function figureInSi(figure: Figure): number {
  const unit = figure.unit as UnitCode;
  return convertValue(figure.value, unit, siUnitOf(unit));
}

/** Exact value of a checked figure in the coherent SI unit; for units whose factor is a decimal and that have no offset. */
export function exactFigureInSi(figure: Figure): ExactDecimal {
  return multiplyDecimals(decimalOf(figure.value), decimalOf(unitEntry(figure.unit as UnitCode).factor));
}

/**
 * Normal deviates by coverage: the factor between half the width of a two-sided interval and the standard deviation.
 * Evaluators who publish 95 per cent mean a factor of two.
 */
const coverageFactors: readonly (readonly [coverage: number, factor: number])[] = [
  [0.68, 1],
  [0.6827, 1],
  [0.9, 1.6449],
  [0.95, 2],
  [0.9545, 2],
  [0.99, 2.5758],
  [0.9973, 3],
];

/**
 * Standard uncertainty of a figure in the coherent SI unit, or undefined where none is published. A figure of zero
 * without one is zero by definition, as the enthalpy of formation of an element in its reference phase.
 */
export function figureStandardUncertainty(figure: Figure | undefined): number | undefined {
  if (figure === undefined) return undefined;
  if (figure.uncertainty === undefined) return figure.value === 0 ? 0 : undefined;
  const { halfWidth, coverage } = figure.uncertainty;
  const factor = coverageFactors.find(([known]) => Math.abs(known - coverage) < 5e-5)?.[1];
  if (factor === undefined) return undefined;
  const unit = figure.unit as UnitCode;
  return (halfWidth / factor) * decimalToNumber(decimalOf(unitEntry(unit).factor));
}

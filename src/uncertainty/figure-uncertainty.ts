import { decimalOf, decimalToNumber } from "../numeric/exact-decimal.js";
import type { Figure } from "../quantity/figure.js";
import { type UnitCode, unitEntry } from "../quantity/units.js";
import { uncertaintyOfInterval } from "./standard-uncertainty.js";

/**
 * Standard uncertainty of a checked figure in the coherent SI unit, or undefined where none is published. A figure of
 * zero without one is zero by definition, as the enthalpy of formation of an element in its reference phase.
 */
export function figureStandardUncertainty(figure: Figure | undefined): number | undefined {
  if (figure === undefined) return undefined;
  if (figure.uncertainty === undefined) return figure.value === 0 ? 0 : undefined;
  const { factor } = unitEntry(figure.unit as UnitCode);
  return uncertaintyOfInterval(figure.uncertainty) * decimalToNumber(decimalOf(factor));
}

import { cut } from "../errors/fault.js";
import { addDecimals, decimalOf, decimalRatioToNumber, type ExactDecimal } from "../numeric/exact-decimal.js";
import type { Figure } from "../quantity/figure.js";
import { exactFigureInSi } from "../quantity/figure-value.js";
import { type UnitCode, unitEntry } from "../quantity/units.js";

/** The longest note that a record takes. */
const longestNote = 1000;

/**
 * A figure to which an exactly known amount is added: in its own unit, rounded once. Source, origin and uncertainty
 * stay, and `where` says what was done.
 *
 * @param figure - a checked figure of molar energy or molar entropy
 * @param shift - in the coherent SI unit
 */
export function shiftFigure(figure: Figure, shift: ExactDecimal, note: ConversionNote): Figure {
  if (shift.mantissa === 0n) return figure;
  const factor = decimalOf(unitEntry(figure.unit as UnitCode).factor);
  const value = decimalRatioToNumber(addDecimals(exactFigureInSi(figure), shift), factor);
  return { ...figure, value, where: noteBefore(figure.where, note) };
}

/** The same, where there is a figure. */
export function shiftOptional(
  figure: Figure | undefined,
  shift: ExactDecimal,
  note: ConversionNote,
): Figure | undefined {
  return figure === undefined ? undefined : shiftFigure(figure, shift, note);
}

/** What a figure was converted from: the kind of conversion, and what the figure was printed for. */
export interface ConversionNote {
  readonly kind: string;
  readonly was: string;
}

/**
 * A note before what stood in `where`. One of the same kind stays: it says what the figure was printed for, and a
 * second conversion does not change that.
 */
export function noteBefore(where: string | undefined, { kind, was }: ConversionNote): string {
  const note = `${kind} ${was}`;
  if (where === undefined) return note;
  return where.includes(kind) ? where : cut(`${note}; ${where}`, longestNote);
}

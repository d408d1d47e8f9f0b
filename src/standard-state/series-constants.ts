import type { HeatCapacityForm, PublishedSeries } from "../heat-capacity/published-series.js";
import { divideDecimals } from "../numeric/divide-decimals.js";
import { addDecimals, decimalOf, decimalToNumber, type ExactDecimal, negateDecimal } from "../numeric/exact-decimal.js";
import type { PublishedGibbsFunction } from "../species/record.js";
import { type ConversionNote, noteBefore, shiftFigure } from "./convert-figure.js";

/** Digits of a shift in the unit of a coefficient, well beyond those of a double. */
const digits = 40;

/** Where a form keeps a constant, and what one unit of that coefficient is, in J/mol or J/mol/K. */
interface ConstantPlace {
  readonly index: number;
  readonly unit: "one" | "minus one" | "thousand" | "gas constant";
}

/** The coefficients that move with H or with S; none in forms without constants, which have an anchor instead. */
const constantPlaces: Readonly<
  Record<HeatCapacityForm, { readonly enthalpy: readonly ConstantPlace[]; readonly entropy: readonly ConstantPlace[] }>
> = {
  // The eighth coefficient is the formation enthalpy at 298.15 K, where it is printed.
  shomate: {
    enthalpy: [
      { index: 5, unit: "thousand" },
      { index: 7, unit: "thousand" },
    ],
    entropy: [{ index: 6, unit: "one" }],
  },
  "seven-coefficient": {
    enthalpy: [{ index: 5, unit: "gas constant" }],
    entropy: [{ index: 6, unit: "gas constant" }],
  },
  "nine-coefficient": {
    enthalpy: [{ index: 7, unit: "gas constant" }],
    entropy: [{ index: 8, unit: "gas constant" }],
  },
  // G = a + b T + ..., so that S has the constant -b.
  "gibbs-energy": { enthalpy: [{ index: 0, unit: "one" }], entropy: [{ index: 1, unit: "minus one" }] },
  "maier-kelley": { enthalpy: [], entropy: [] },
  "berman-brown": { enthalpy: [], entropy: [] },
  "five-term": { enthalpy: [], entropy: [] },
  "haas-fisher": { enthalpy: [], entropy: [] },
  polynomial: { enthalpy: [], entropy: [] },
};

/** What a record's Gibbs energy is made from, with H or S shifted; a reference point has the figures of its record. */
export function shiftGibbsFunction(
  gibbsFunction: PublishedGibbsFunction,
  property: "enthalpy" | "entropy",
  shift: ExactDecimal,
  note: ConversionNote,
): PublishedGibbsFunction {
  if (gibbsFunction.kind === "reference-point" || shift.mantissa === 0n) return gibbsFunction;
  return shiftSeries(gibbsFunction, property, shift, note);
}

/**
 * A published fit whose H or S is shifted by an exactly known amount over the whole range: the constants of its form,
 * or its anchor. A fit with neither takes them from the figures of its record.
 *
 * @param shift - J/mol for the enthalpy, J/mol/K for the entropy
 */
function shiftSeries<S extends PublishedSeries & { readonly where?: string }>(
  series: S,
  property: "enthalpy" | "entropy",
  shift: ExactDecimal,
  note: ConversionNote,
): S {
  const places = constantPlaces[series.form][property];
  const anchor = series.anchor && { ...series.anchor, [property]: shiftFigure(series.anchor[property], shift, note) };
  if (places.length === 0) return anchor === undefined ? series : { ...series, anchor };
  const intervals = series.intervals.map((interval) => ({
    ...interval,
    coefficients: interval.coefficients.map((coefficient, index) => {
      const place = places.find((each) => each.index === index);
      return place === undefined ? coefficient : shiftCoefficient(coefficient, place, shift, series);
    }),
  }));
  return { ...series, intervals, where: noteBefore(series.where, note) };
}

function shiftCoefficient(
  coefficient: number,
  { index, unit }: ConstantPlace,
  shift: ExactDecimal,
  { gasConstant, decimalShifts }: PublishedSeries,
): number {
  const inUnit = inUnitOf(unit, shift, gasConstant);
  const power = decimalShifts?.[index] ?? 0;
  const printed = { mantissa: inUnit.mantissa, exponent: inUnit.exponent + power };
  return decimalToNumber(addDecimals(decimalOf(coefficient), printed));
}

function inUnitOf(unit: ConstantPlace["unit"], shift: ExactDecimal, gasConstant: number | undefined): ExactDecimal {
  switch (unit) {
    case "one":
      return shift;
    case "minus one":
      return negateDecimal(shift);
    case "thousand":
      return { mantissa: shift.mantissa, exponent: shift.exponent - 3 };
    case "gas constant":
      return divideDecimals(shift, decimalOf(gasConstant as number), digits);
  }
}

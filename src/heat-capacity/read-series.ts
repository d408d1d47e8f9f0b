import { fail } from "../errors/gibbs-ledger-error.js";
import { divideDecimals } from "../numeric/divide-decimals.js";
import {
  addDecimals,
  decimalOf,
  type ExactDecimal,
  negateDecimal,
  subtractDecimals,
} from "../numeric/exact-decimal.js";
import { exactFigureInSi, figureInSi } from "../quantity/figure-value.js";
import { integralsAt } from "./exact-integrals.js";
import { intervalAt, type PiecewiseSeries } from "./exact-series.js";
import type { IntervalTerms } from "./form-readers.js";
import { readInterval } from "./forms.js";
import type { PublishedSeries } from "./published-series.js";

/** A temperature where H in J/mol and S in J/mol/K are known. */
export interface Anchor {
  readonly temperatureK: number;
  readonly enthalpy: ExactDecimal;
  readonly entropy: ExactDecimal;
}

/** An anchor from published figures. */
export function anchorOfFigures({ temperature, enthalpy, entropy }: NonNullable<PublishedSeries["anchor"]>): Anchor {
  return {
    temperatureK: figureInSi(temperature),
    enthalpy: exactFigureInSi(enthalpy),
    entropy: exactFigureInSi(entropy),
  };
}

/** What a series needs beside its coefficients where the form carries no constants of its own. */
export interface SeriesContext {
  readonly anchor?: Anchor | undefined;
  /** Enthalpies in J/mol of the first-order transitions inside the range, by temperature in kelvin. */
  readonly transitionEnthalpies?: ReadonlyMap<number, ExactDecimal>;
  /** Digits to which the constants are solved; the default serves every double. */
  readonly digits?: number;
}

/** Digits of solved constants: twice those of a double and some. */
export const defaultDigits = 40;

/** A fit that begins at or below this temperature may be evaluated at 298.15 K (common practice, no source). */
const highestStartK = 300;
const referenceTemperatureK = 298.15;
const zero: ExactDecimal = { mantissa: 0n, exponent: 0 };

type Constants = { readonly enthalpy: ExactDecimal; readonly entropy: ExactDecimal };

/**
 * Reads a published fit, checked before, into exact series with their constants.
 *
 * @throws GibbsLedgerError "heat-capacity/no-anchor" where the form carries no constants and none can be solved
 */
export function readSeries(published: PublishedSeries, context: SeriesContext = {}): PiecewiseSeries {
  const digits = context.digits ?? defaultDigits;
  const parts = published.intervals.map((interval) => readInterval(published, interval, digits));
  const constants = parts.map((part) => part.constants);
  const known = constants.every((pair) => pair !== undefined)
    ? constants
    : solveConstants(published, parts, context, digits);
  return {
    intervals: published.intervals.map(({ from, to }, index) => ({
      fromK: index === 0 ? startOfRange(from) : from,
      toK: to,
      terms: parts[index]!.terms,
      enthalpyConstant: known[index]!.enthalpy,
      entropyConstant: known[index]!.entropy,
    })),
    heatCapacityKnown: true,
  };
}

/** The series of a substance of which only H and S at one temperature are published. */
export function referencePoint({ temperatureK, enthalpy, entropy }: Anchor): PiecewiseSeries {
  return {
    intervals: [
      { fromK: temperatureK, toK: temperatureK, terms: [], enthalpyConstant: enthalpy, entropyConstant: entropy },
    ],
    heatCapacityKnown: false,
  };
}

/** Adds to S over the whole range, as a change of the standard pressure of a gas does. */
export function shiftEntropy(series: PiecewiseSeries, entropy: ExactDecimal): PiecewiseSeries {
  return {
    ...series,
    intervals: series.intervals.map((interval) => ({
      ...interval,
      entropyConstant: addDecimals(interval.entropyConstant, entropy),
    })),
  };
}

/** Cp, H and S at a temperature within the range, to the digits asked for. */
export function exactPropertiesAt(
  series: PiecewiseSeries,
  temperatureK: number,
  digits: number = defaultDigits,
): { readonly heatCapacity: ExactDecimal; readonly enthalpy: ExactDecimal; readonly entropy: ExactDecimal } {
  const interval = intervalAt(series, temperatureK);
  const integrals = integralsAt(interval.terms, decimalOf(temperatureK), digits);
  return {
    heatCapacity: integrals.heatCapacity,
    enthalpy: addDecimals(integrals.enthalpy, interval.enthalpyConstant),
    entropy: addDecimals(integrals.entropy, interval.entropyConstant),
  };
}

/** Lower end of the range in which a fit may be evaluated. */
export function startOfRange(fromK: number): number {
  return fromK > referenceTemperatureK && fromK <= highestStartK ? referenceTemperatureK : fromK;
}

/** From the interval of the anchor outward, H and S go on across each break, but for the enthalpy of a transition. */
function solveConstants(
  published: PublishedSeries,
  parts: readonly IntervalTerms[],
  context: SeriesContext,
  digits: number,
): Constants[] {
  const { intervals } = published;
  const anchor = context.anchor ?? noAnchor(published);
  const start = intervals.findIndex(
    ({ from, to }, index) =>
      (index === 0 ? startOfRange(from) : from) <= anchor.temperatureK && anchor.temperatureK <= to,
  );
  if (start < 0) noAnchorInside(published, anchor);
  const constants: Constants[] = [];
  constants[start] = constantsThrough(parts[start]!, anchor, digits);
  for (let index = start + 1; index < intervals.length; index += 1) {
    const point = acrossBreak(intervals[index - 1]!, parts[index - 1]!, constants[index - 1]!, context, digits, false);
    constants[index] = constantsThrough(parts[index]!, point, digits);
  }
  for (let index = start - 1; index >= 0; index -= 1) {
    const point = acrossBreak(intervals[index]!, parts[index + 1]!, constants[index + 1]!, context, digits, true);
    constants[index] = constantsThrough(parts[index]!, point, digits);
  }
  return constants;
}

function constantsThrough(part: IntervalTerms, point: Anchor, digits: number): Constants {
  const integrals = integralsAt(part.terms, decimalOf(point.temperatureK), digits);
  return {
    enthalpy: subtractDecimals(point.enthalpy, integrals.enthalpy),
    entropy: subtractDecimals(point.entropy, integrals.entropy),
  };
}

/** H and S on the far side of the upper end of an interval, from the side whose constants are known. */
function acrossBreak(
  interval: PublishedSeries["intervals"][number],
  knownPart: IntervalTerms,
  knownConstants: Constants,
  context: SeriesContext,
  digits: number,
  downward: boolean,
): Anchor {
  const temperature = decimalOf(interval.to);
  const integrals = integralsAt(knownPart.terms, temperature, digits);
  const enthalpyOfTransition = interval.endsAt === "first-order" ? transitionEnthalpy(interval.to, context) : zero;
  const jump = downward ? negateDecimal(enthalpyOfTransition) : enthalpyOfTransition;
  return {
    temperatureK: interval.to,
    enthalpy: addDecimals(addDecimals(integrals.enthalpy, knownConstants.enthalpy), jump),
    entropy: addDecimals(
      addDecimals(integrals.entropy, knownConstants.entropy),
      divideDecimals(jump, temperature, digits),
    ),
  };
}

function transitionEnthalpy(temperatureK: number, context: SeriesContext): ExactDecimal {
  return (
    context.transitionEnthalpies?.get(temperatureK) ??
    fail({
      code: "heat-capacity/no-anchor",
      path: ["series", "intervals"],
      message: `the fit ends at a first-order transition at ${temperatureK} K whose enthalpy is not given`,
      expected: `a transition at ${temperatureK} K with its enthalpy`,
    })
  );
}

function noAnchor(published: PublishedSeries): never {
  return fail({
    code: "heat-capacity/no-anchor",
    path: ["series", "anchor"],
    message: `the ${published.form} form carries no constants of integration`,
    expected: "an anchor, or the enthalpy of formation and the entropy at 298.15 K",
  });
}

function noAnchorInside({ intervals }: PublishedSeries, anchor: Anchor): never {
  return fail({
    code: "heat-capacity/no-anchor",
    path: ["series", "anchor", "temperature"],
    message: `the anchor at ${anchor.temperatureK} K lies outside the fit, ${intervals[0]!.from} K to ${intervals.at(-1)!.to} K`,
    expected: "an anchor at a temperature within the intervals",
  });
}

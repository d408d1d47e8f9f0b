import fc from "fast-check";
import type { PublishedSeries } from "../../src/heat-capacity/published-series.js";
import { type Reaction, reaction } from "../../src/reaction/index.js";
import { binary, Decimal, type ExactValues, functionNames, valuesOf } from "../heat-capacity/oracle.js";
import { randomSeries } from "../heat-capacity/random-series.js";
import { collectionOf, fitted, recordOf } from "../species/records.js";

/** One species of a random reaction: the stoichiometric number as a fraction, negative on the left. */
export interface RandomTerm {
  readonly label: string;
  readonly numerator: number;
  readonly denominator: number;
  readonly series: PublishedSeries;
}

const series: fc.Arbitrary<PublishedSeries> = fc.oneof(...Object.values(randomSeries));
const states = ["g", "l", "cr"] as const;

/** Clusters of 2 to 7 carbon atoms; the last species takes what is left, so that carbon balances. */
export const randomTerms: fc.Arbitrary<readonly RandomTerm[]> = fc
  .array(
    fc.record({
      numerator: fc.integer({ min: -5, max: 5 }).filter((n) => n !== 0),
      denominator: fc.integer({ min: 1, max: 4 }),
      series,
    }),
    { minLength: 2, maxLength: 6 },
  )
  .map((drafts) => {
    const rest = drafts.slice(0, -1).map((draft, index) => ({ ...draft, atoms: index + 2 }));
    // In twelfths of an atom, since every denominator divides 12.
    const left = -rest.reduce(
      (sum, { numerator, denominator, atoms }) => sum + (12 / denominator) * numerator * atoms,
      0,
    );
    const atoms = drafts.length + 1;
    const last = { series: drafts.at(-1)!.series, numerator: left, denominator: 12 * atoms, atoms };
    return [...rest, last].map(({ numerator, denominator, series: fit, atoms: count }) => ({
      label: `C${count}(${states[count % 3]})`,
      numerator,
      denominator,
      series: fit,
    }));
  })
  .filter((terms) => terms.at(-1)!.numerator !== 0 && !terms.every(({ numerator }) => numerator < 0));

/** The reaction of random terms in the order given. */
export function reactionOf(terms: readonly RandomTerm[], factor: string = ""): Reaction {
  const side = (isLeft: boolean): string =>
    terms
      .filter(({ numerator }) => numerator < 0 === isLeft)
      .map(({ label, numerator, denominator }) => `${Math.abs(numerator)}/${denominator}${factor} ${label}`)
      .join(" + ");
  const records = terms.map(({ label, series: fit }) => recordOf(label, { gibbsFunction: fitted(fit) }));
  return reaction(`${side(true)} = ${side(false)}`, collectionOf(...records));
}

/** Cp, H, S and G of a reaction from the textbook equations of its species' forms. */
export function exactValues(terms: readonly RandomTerm[], temperatureK: number): ExactValues {
  const temperature = binary(temperatureK);
  const values = terms.map(({ series: fit }) => valuesOf(fit, fit.intervals[0]!, temperature));
  const sums = functionNames.map((name) => {
    const sum = values.reduce((total, value, index) => {
      const { numerator, denominator } = terms[index]!;
      return total.plus(value[name].times(numerator).div(denominator));
    }, new Decimal(0));
    return [name, sum] as const;
  });
  return Object.fromEntries(sums) as unknown as ExactValues;
}

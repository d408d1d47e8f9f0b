import { negateRational, type Rational, rationalToString } from "../numeric/rational.js";

/** A label with its stoichiometric number: negative on the left. */
export interface LabelledCoefficient {
  readonly label: string;
  readonly coefficient: Rational;
}

/** An equation in the library's own spelling: ` = ` between the sides, ` + ` between the terms, no coefficient of 1. */
export function writeEquation(terms: readonly LabelledCoefficient[]): string {
  const side = (isLeft: boolean): string =>
    terms
      .filter(({ coefficient }) => coefficient.numerator < 0n === isLeft)
      .map(({ label, coefficient }) => {
        const count = rationalToString(isLeft ? negateRational(coefficient) : coefficient);
        return count === "1" ? label : `${count} ${label}`;
      })
      .join(" + ");
  return `${side(true)} = ${side(false)}`;
}

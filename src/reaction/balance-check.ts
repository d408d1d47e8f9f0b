import type { Fault } from "../errors/fault.js";
import { formula } from "../formula/formula.js";
import {
  addRationals,
  isZeroRational,
  multiplyRationals,
  negateRational,
  parseRational,
  type Rational,
  rational,
  rationalToString,
} from "../numeric/rational.js";
import { chargeNumberOf, formulaOf, type Substance } from "../species/substance.js";

/** A species with its stoichiometric number: negative on the left. */
export interface Stoichiometry {
  readonly species: Substance;
  readonly coefficient: Rational;
}

const none: Rational = { numerator: 0n, denominator: 1n };

/** Checks elements and charge exactly, and says of each what stands on either side. */
export function checkBalance(terms: readonly Stoichiometry[], faults: Fault[]): void {
  const left = new Map<string, Rational>();
  const right = new Map<string, Rational>();
  for (const { species, coefficient } of terms) {
    const isLeft = coefficient.numerator < 0n;
    const side = isLeft ? left : right;
    const count = isLeft ? negateRational(coefficient) : coefficient;
    const written = formulaOf(species);
    const counts = written === undefined ? {} : formula(written).exactCounts;
    for (const [element, text] of Object.entries(counts)) {
      add(side, element, multiplyRationals(count, parseRational(text) as Rational));
    }
    const chargeNumber = chargeNumberOf(species);
    if (chargeNumber !== 0) add(side, charge, multiplyRationals(count, rational(BigInt(chargeNumber), 1n)));
  }
  for (const key of new Set([...left.keys(), ...right.keys()])) {
    const onLeft = left.get(key) ?? none;
    const onRight = right.get(key) ?? none;
    const difference = addRationals(onLeft, negateRational(onRight));
    if (isZeroRational(difference)) continue;
    faults.push({
      code: "reaction/unbalanced",
      path: ["equation"],
      message: imbalance(key, onLeft, onRight, difference),
      received: `${rationalToString(onLeft)} on the left, ${rationalToString(onRight)} on the right`,
      expected: "the same on both sides",
    });
  }
}

const charge = "charge";

function add(side: Map<string, Rational>, key: string, count: Rational): void {
  side.set(key, addRationals(side.get(key) ?? none, count));
}

function imbalance(key: string, onLeft: Rational, onRight: Rational, difference: Rational): string {
  const counts = `${rationalToString(onLeft)} on the left, ${rationalToString(onRight)} on the right`;
  if (key === charge) return `the charge does not balance: ${counts}`;
  const shortOnRight = difference.numerator > 0n;
  const short = rationalToString(shortOnRight ? difference : negateRational(difference));
  return `${key} does not balance: ${counts}; the ${shortOnRight ? "right" : "left"} side is ${short} short`;
}

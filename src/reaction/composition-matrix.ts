import type { Rational } from "../numeric/rational.js";
import type { Participant } from "./balance-participants.js";
import { primitive } from "./null-space.js";

/** What has to be the same on both sides, and how much of it each species has. */
export interface ConservedQuantity {
  /** Symbol of an element, or `charge`. */
  readonly name: string;
  /** In the order of the species, times a common factor that makes all whole. */
  readonly amounts: readonly bigint[];
}

/** The elements, in the order in which they come up, and the charge where any species has one. */
export function conservedQuantities(species: readonly Participant[]): ConservedQuantity[] {
  const symbols = new Set(species.flatMap(({ counts }) => [...counts.keys()]));
  const elements = [...symbols].map((name) => ({
    name,
    amounts: inWholes(species.map(({ counts }) => counts.get(name))),
  }));
  const charges = species.map(({ chargeNumber }) => BigInt(chargeNumber));
  return charges.some((charge) => charge !== 0n) ? [...elements, { name: chargeName, amounts: charges }] : elements;
}

/** The name of what is not an element. */
export const chargeName = "charge";

function inWholes(counts: readonly (Rational | undefined)[]): bigint[] {
  const common = counts.reduce((product, count) => leastMultiple(product, count?.denominator ?? 1n), 1n);
  return primitive(counts.map((count) => (count === undefined ? 0n : (count.numerator * common) / count.denominator)));
}

/** A common multiple; counts are decimals, so that it stays short: the denominators divide a power of ten. */
function leastMultiple(a: bigint, b: bigint): bigint {
  return a % b === 0n ? a : b % a === 0n ? b : a * b;
}

import type { Decimal } from "decimal.js";
import { exactDecimal, neighbour, randomPositive, seeded, ulpError } from "./ulp.js";

/** The greatest error of a function over some arguments, in ulp, and where it was seen. */
export function worstError(
  computed: (x: number) => number,
  reference: (x: Decimal) => Decimal,
  sample: readonly number[],
): { ulp: number; at: number } {
  const worst = { ulp: 0, at: Number.NaN };
  for (const x of sample) {
    const ulp = ulpError(computed(x), reference(exactDecimal(x)));
    // Also where it is not a number.
    if (!(ulp <= worst.ulp)) {
      worst.ulp = ulp;
      worst.at = x;
    }
  }
  return worst;
}

/** Some numbers of a seeded generator. */
export function draw(count: number, seed: number, make: (random: () => number) => number): number[] {
  const random = seeded(seed);
  return Array.from({ length: count }, () => make(random));
}

/** Doubles above zero of every binade. */
export function anyPositive(count: number, seed: number): number[] {
  return draw(count, seed, randomPositive);
}

/** Numbers around 1, as near as the last bit; 1 itself is left out. */
export function nearOne(count: number, seed: number): number[] {
  return draw(count, seed, (random) => 1 + (random() * 2 - 1) * 2 ** (-random() * 52)).filter((x) => x !== 1 && x > 0);
}

/** Numbers of either sign around 0. */
export function nearZero(count: number, seed: number): number[] {
  return draw(count, seed, (random) => (random() * 2 - 1) * 2 ** (4 - random() * 60)).filter((x) => x !== 0);
}

/**
 * The borders between the rows of the table of logarithms and the rows' centres, and their neighbours; 1 is left
 * out.
 */
export function logarithmBorders(): number[] {
  const borders: number[] = [];
  for (let index = 256; index < 512; index += 1) {
    for (const step of [-1, 0, 1]) {
      borders.push(neighbour(index / 256, step), neighbour(index / 512, step));
    }
  }
  return borders.filter((x) => x !== 1);
}

/** Powers of two over the whole range and their neighbours; 1 is left out. */
export function powersOfTwo(): number[] {
  const found: number[] = [];
  for (let exponent = -1073; exponent < 1024; exponent += 23) {
    for (const step of [-1, 0, 1]) found.push(neighbour(2 ** exponent, step));
  }
  return found.filter((x) => x !== 1);
}

/** Where the exponential function changes from one row of its table to the next. */
export function exponentialBorders(): number[] {
  const borders: number[] = [];
  for (let index = -301; index < 300; index += 2) {
    for (const step of [-3, 3]) borders.push(neighbour(((index + 0.5) * Math.LN2) / 128, step));
  }
  return borders;
}

import { primitive } from "./null-space.js";

/** The most rays that are followed, and the most columns: pairs of rays are looked at one by one. */
const mostRays = 200;
const mostColumns = 30;

/** A solution without negative entries, and the set of its entries above zero as bits. */
interface Ray {
  readonly entries: readonly bigint[];
  readonly support: bigint;
}

/**
 * The solutions of A x = 0, x >= 0 that are no sum of others, in whole numbers without a common divisor: each solution
 * without negative entries is a sum of them. Found by taking in one row after another and joining neighbours on either
 * side of it (the double description method, `references.motzkin1953`).
 *
 * @returns undefined for more than 30 columns, and where more than 200 rays would have to be followed
 */
export function extremeRays(rows: readonly (readonly bigint[])[], width: number): bigint[][] | undefined {
  if (width > mostColumns) return undefined;
  let rays: readonly Ray[] = Array.from({ length: width }, (_value, place) => ({
    entries: Array.from({ length: width }, (_entry, at) => (at === place ? 1n : 0n)),
    support: 1n << BigInt(place),
  }));
  const left = [...rows];
  while (left.length > 0 && rays.length <= mostRays) rays = takeIn(left, rays);
  return rays.length > mostRays ? undefined : rays.map(({ entries }) => [...entries]);
}

/** Takes in the row that leaves the fewest pairs to join. */
function takeIn(left: (readonly bigint[])[], rays: readonly Ray[]): readonly Ray[] {
  const splits = left.map((row) => {
    const values = rays.map(({ entries }) => dot(row, entries));
    const above = values.filter((value) => value > 0n).length;
    return { values, pairs: above * values.filter((value) => value < 0n).length };
  });
  const place = splits.reduce((best, { pairs }, index) => (pairs < splits[best]!.pairs ? index : best), 0);
  left.splice(place, 1);
  return join(rays, splits[place]!.values);
}

/** The rays on the plane of a row, and the joints of neighbours on its two sides. */
function join(rays: readonly Ray[], values: readonly bigint[]): Ray[] {
  const on = rays.filter((_ray, index) => values[index] === 0n);
  const joints: Ray[] = [];
  for (const [i, above] of rays.entries()) {
    if (values[i]! <= 0n) continue;
    for (const [j, below] of rays.entries()) {
      if (values[j]! >= 0n) continue;
      const support = above.support | below.support;
      const areNeighbours = rays.every((ray, k) => k === i || k === j || (ray.support & ~support) !== 0n);
      if (!areNeighbours) continue;
      const entries = above.entries.map((entry, at) => values[i]! * below.entries[at]! - values[j]! * entry);
      joints.push({ entries: primitive(entries), support });
    }
  }
  return [...on, ...joints];
}

function dot(row: readonly bigint[], entries: readonly bigint[]): bigint {
  return row.reduce((sum, factor, at) => (factor === 0n ? sum : sum + factor * entries[at]!), 0n);
}

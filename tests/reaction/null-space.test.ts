import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { extremeRays } from "../../src/reaction/extreme-rays.js";
import { nullSpace, primitive, rankOf } from "../../src/reaction/null-space.js";
import { rankOfColumns } from "./random-compositions.js";

const matrices = fc.tuple(fc.integer({ min: 1, max: 7 }), fc.integer({ min: 0, max: 6 })).chain(([width, height]) =>
  fc.record({
    width: fc.constant(width),
    rows: fc.array(fc.array(fc.integer({ min: -4, max: 4 }).map(BigInt), { minLength: width, maxLength: width }), {
      minLength: height,
      maxLength: height,
    }),
  }),
);

function dot(row: readonly bigint[], vector: readonly bigint[]): bigint {
  return row.reduce((sum, entry, at) => sum + entry * vector[at]!, 0n);
}

const options = { seed: 20261201, numRuns: 2000 };

describe("the null space", () => {
  test("of known matrices", () => {
    expect(nullSpace([], 2)).toEqual([
      [1n, 0n],
      [0n, 1n],
    ]);
    expect(nullSpace([[0n, 0n]], 2)).toHaveLength(2);
    expect(nullSpace([[2n, 4n]], 2)).toEqual([[-2n, 1n]]);
    // Three equations of which the third is the sum of the others.
    const rows = [
      [1n, 1n, 1n],
      [1n, 2n, 3n],
      [2n, 3n, 4n],
    ];
    expect(nullSpace(rows, 3)).toEqual([[1n, -2n, 1n]]);
    expect(rankOf(rows, 3)).toBe(2);
  });

  test("holds exactly, has width less rank dimensions, and smallest numbers", () => {
    fc.assert(
      fc.property(matrices, ({ rows, width }) => {
        const vectors = nullSpace(rows, width);
        const rank = rankOf(rows, width);
        expect(rank).toBe(rankOfColumns(rows.map((row) => ({ label: "", amounts: row.map(Number) }))));
        expect(vectors).toHaveLength(width - rank);
        for (const vector of vectors) {
          expect(rows.every((row) => dot(row, vector) === 0n)).toBe(true);
          expect(primitive(vector)).toEqual(vector);
          // The fewest entries: the columns of all but one are independent.
          const places = vector.flatMap((entry, place) => (entry === 0n ? [] : [place]));
          const columns = rows.map((row) => places.map((place) => row[place]!));
          expect(rankOf(columns, places.length)).toBe(places.length - 1);
        }
        expect(rankOf(vectors, width)).toBe(vectors.length);
      }),
      options,
    );
  });

  test("numbers of a hundred digits stay exact", () => {
    const big = 10n ** 100n;
    const rows = [
      [big + 1n, big, 1n],
      [big, big - 1n, 7n],
    ];
    const [vector] = nullSpace(rows, 3);
    expect(rows.map((row) => dot(row, vector!))).toEqual([0n, 0n]);
  });
});

describe("extreme rays", () => {
  test("hold exactly, without negative entries, each with the fewest entries, and all of them are found", () => {
    let several = 0;
    fc.assert(
      fc.property(matrices, ({ rows, width }) => {
        const rays = extremeRays(rows, width) ?? [];
        if (rays.length > 1) several += 1;
        const found = new Set(rays.map(String));
        expect(found.size).toBe(rays.length);
        for (const ray of rays) {
          expect(rows.every((row) => dot(row, ray) === 0n)).toBe(true);
          expect(ray.every((entry) => entry >= 0n)).toBe(true);
          expect(primitive(ray)).toEqual(ray);
        }
        // By trying all sets of columns: a ray is what a set with a one-dimensional null space gives.
        for (let bits = 1; bits < 2 ** width; bits += 1) {
          const places = Array.from({ length: width }, (_value, place) => place).filter(
            (place) => Math.floor(bits / 2 ** place) % 2 === 1,
          );
          const vectors = nullSpace(
            rows.map((row) => places.map((place) => row[place]!)),
            places.length,
          );
          const [only] = vectors;
          if (vectors.length !== 1 || only === undefined) continue;
          const sign = only.every((entry) => entry > 0n) ? 1n : only.every((entry) => entry < 0n) ? -1n : 0n;
          if (sign === 0n) continue;
          const ray: bigint[] = Array<bigint>(width).fill(0n);
          places.forEach((place, at) => {
            ray[place] = sign * only[at]!;
          });
          expect(found.delete(String(ray))).toBe(true);
        }
        expect(found.size).toBe(0);
      }),
      { ...options, numRuns: 500 },
    );
    expect(several).toBeGreaterThan(100);
  });

  test("of more than 30 columns are not sought, nor more than 200 followed", () => {
    expect(extremeRays([], 30)).toHaveLength(30);
    expect(extremeRays([], 31)).toBeUndefined();
    const half = (sign: bigint): bigint[] => Array<bigint>(15).fill(sign);
    expect(extremeRays([[...half(1n), ...half(-1n)]], 30)).toBeUndefined();
  });
});

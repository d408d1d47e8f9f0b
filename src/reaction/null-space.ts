/** A matrix of whole numbers by rows, in which the row of a pivot has the common pivot there and other rows have 0. */
interface Reduced {
  readonly rows: readonly (readonly bigint[])[];
  /** Column of the pivot of each row. */
  readonly pivots: readonly number[];
  /** The pivot that all rows share. */
  readonly pivot: bigint;
}

/**
 * A basis of all x with A x = 0, exactly: whole numbers without a common divisor, one vector for each column without a
 * pivot. Each vector has the fewest entries that are not zero: no other solution lives on a part of them.
 *
 * @param rows - of whole numbers, all of one length
 * @param width - the number of columns, for a matrix without rows
 */
export function nullSpace(rows: readonly (readonly bigint[])[], width: number): bigint[][] {
  const { rows: reduced, pivots, pivot } = reduceRows(rows, width);
  const free = Array.from({ length: width }, (_value, column) => column).filter((column) => !pivots.includes(column));
  return free.map((column) => {
    const vector: bigint[] = Array<bigint>(width).fill(0n);
    vector[column] = pivot;
    for (const [index, row] of reduced.entries()) vector[pivots[index]!] = -row[column]!;
    return primitive(vector);
  });
}

/** The number of rows that are independent of each other. */
export function rankOf(rows: readonly (readonly bigint[])[], width: number): number {
  return reduceRows(rows, width).pivots.length;
}

/**
 * Gauss-Jordan elimination without fractions: each step divides by the pivot before, which leaves no remainder
 * (`references.bareiss1968`), so that entries stay as short as the minors that they are.
 */
function reduceRows(given: readonly (readonly bigint[])[], width: number): Reduced {
  const rows = given.map((row) => [...row]);
  const pivots: number[] = [];
  let pivot = 1n;
  for (let column = 0; column < width && pivots.length < rows.length; column += 1) {
    const place = pivots.length;
    const found = rows.findIndex((row, index) => index >= place && row[column] !== 0n);
    if (found < 0) continue;
    const top = rows[found]!;
    rows[found] = rows[place]!;
    rows[place] = top;
    const next = top[column]!;
    for (const [index, row] of rows.entries()) {
      if (index === place) continue;
      const factor = row[column]!;
      rows[index] = row.map((entry, at) => (next * entry - factor * top[at]!) / pivot);
    }
    pivot = next;
    pivots.push(column);
  }
  return { rows: rows.slice(0, pivots.length), pivots, pivot };
}

/** The same direction in whole numbers without a common divisor. */
export function primitive(vector: readonly bigint[]): bigint[] {
  const divisor = vector.reduce(greatestCommonDivisor, 0n);
  return divisor > 1n ? vector.map((entry) => entry / divisor) : [...vector];
}

function greatestCommonDivisor(a: bigint, b: bigint): bigint {
  let left = a < 0n ? -a : a;
  let right = b < 0n ? -b : b;
  while (right !== 0n) [left, right] = [right, left % right];
  return left;
}

/** A sum or product of two doubles as an unevaluated pair: `value` is the rounded result, `error` the exact rest. */
export interface CompensatedPair {
  readonly value: number;
  readonly error: number;
}

/** 2^27 + 1, which splits a double into two halves of 26 bits (T. J. Dekker, Numer. Math. 18, 224 (1971)). */
const splitter = 134217729;

/**
 * The rounded sum and its exact error: value + error = a + b.
 *
 * @param a - finite
 * @param b - finite, and a + b must not overflow
 * @see D. E. Knuth, The Art of Computer Programming, vol. 2, 3rd ed. (1997), section 4.2.2
 */
export function twoSum(a: number, b: number): CompensatedPair {
  const value = a + b;
  const virtual = value - a;
  return { value, error: a - (value - virtual) + (b - virtual) };
}

/**
 * The rounded product and its exact error: value + error = a b.
 *
 * Exact where |a| and |b| are below 2^996, the product does not overflow, and it is 0 or at least 2^-969 in magnitude;
 * below that the error term underflows and may be off by some 2^-1074.
 *
 * @see T. J. Dekker, Numer. Math. 18, 224 (1971)
 */
export function twoProduct(a: number, b: number): CompensatedPair {
  const value = a * b;
  const bigA = splitter * a;
  const highA = bigA - (bigA - a);
  const lowA = a - highA;
  const bigB = splitter * b;
  const highB = bigB - (bigB - b);
  const lowB = b - highB;
  return { value, error: lowA * lowB - (value - highA * highB - lowA * highB - highA * lowB) };
}

/**
 * The double nearest to the exact sum, ties to even: the same bits in whatever order the values stand. Never -0.
 *
 * @param values - finite doubles; no partial sum may overflow (magnitudes below 1e308 / length are safe)
 * @see J. R. Shewchuk, Discrete Comput. Geom. 18, 305 (1997), expansions that do not overlap
 */
export function exactSum(values: ArrayLike<number>): number {
  const partials: number[] = [];
  for (let index = 0; index < values.length; index += 1) grow(partials, values[index]!);
  return rounded(partials);
}

/**
 * The double nearest to the exact sum of products a[i] b[i], ties to even, in whatever order. Never -0.
 *
 * @param a - finite doubles
 * @param b - as many finite doubles; the products keep to the range of {@link twoProduct}, and no partial sum overflows
 */
export function exactDot(a: ArrayLike<number>, b: ArrayLike<number>): number {
  const partials: number[] = [];
  for (let index = 0; index < a.length; index += 1) {
    const { value, error } = twoProduct(a[index]!, b[index]!);
    if (error !== 0) grow(partials, error);
    grow(partials, value);
  }
  return rounded(partials);
}

/** Adds a double to an expansion: parts that do not overlap, in increasing magnitude, none of them zero. */
function grow(partials: number[], addend: number): void {
  let high = addend;
  let kept = 0;
  for (let index = 0; index < partials.length; index += 1) {
    const part = partials[index]!;
    const sum = high + part;
    const virtual = sum - high;
    const low = high - (sum - virtual) + (part - virtual);
    if (low !== 0) {
      partials[kept] = low;
      kept += 1;
    }
    high = sum;
  }
  partials.length = kept;
  if (high !== 0) partials.push(high);
}

/** Rounds an expansion once, from the greatest part down. */
function rounded(partials: readonly number[]): number {
  let index = partials.length - 1;
  if (index < 0) return 0;
  let high = partials[index]!;
  let low = 0;
  while (index > 0) {
    const before = high;
    index -= 1;
    const part = partials[index]!;
    high = before + part;
    low = part - (high - before);
    if (low !== 0) break;
  }
  // Exactly half a unit was left and more lies below in the same direction: the tie was none.
  if (index > 0 && low < 0 === partials[index - 1]! < 0) {
    const twice = low * 2;
    const next = high + twice;
    if (twice === next - high) high = next;
  }
  return high;
}

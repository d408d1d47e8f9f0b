import { twoProduct } from "../numeric/compensated.js";
import { exp } from "../numeric/exp.js";
import { log } from "../numeric/log.js";

/** Up to here the series takes few terms; above, the continued fraction does. */
const largestCentral = 0.8;

/** The series' terms that suffice up to z = 1.29. */
const seriesTerms = 18;

/** Terms of the continued fraction that suffice from z = 1.28 on. */
const fractionTerms = 160;

/** Newton's steps double the digits; none takes more than 9. */
const mostSteps = 12;

/** The square root of pi/2 as a double and its rest. */
const rootOfHalfPi = 1.2533141373155003;
const rootOfHalfPiRest = -9.164289990229583e-17;

/**
 * The half-width z, in standard deviations, of the central interval that a normal variable falls into with probability
 * c, and out of with q = 1 - c. The caller gives both: the smaller one carries the digits.
 *
 * @param c - above 0 and below 1
 * @param q - 1 - c, exactly where c > 0.8
 */
export function centralQuantile(c: number, q: number): number {
  return c <= largestCentral ? fromCentre(c) : fromTail(q);
}

/** Solves c sqrt(pi/2) = z - z^3/6 + z^5/40 - ...; concave and rising: Newton's steps from below never overshoot. */
function fromCentre(c: number): number {
  const { value: target, error } = twoProduct(c, rootOfHalfPi);
  const rest = error + c * rootOfHalfPiRest;
  // The density is nowhere higher than in the middle: a lower bound.
  let z = target;
  for (let step = 0; step < mostSteps; step += 1) {
    const next = z + (target - z + (rest + z * curvature((z * z) / 2))) * exp((z * z) / 2);
    if (!(next > z)) break;
    z = next;
  }
  return z;
}

/** u/3 - u^2/(2! 5) + u^3/(3! 7) - ..., by Horner's rule. */
function curvature(u: number): number {
  let sum = 0;
  for (let term = seriesTerms; term > 0; term -= 1) sum = (u / term) * (1 / (2 * term + 1) - sum);
  return sum;
}

/** Solves ln q = ln(2/pi)/2 - z^2/2 + ln R(z); concave and falling: Newton's steps from above never overshoot. */
function fromTail(q: number): number {
  const target = log(q) + log(rootOfHalfPi);
  // q is at most e^(-z^2/2): an upper bound.
  let z = Math.sqrt(-2 * log(q));
  for (let step = 0; step < mostSteps; step += 1) {
    const ratio = millsRatio(z);
    const next = z + (log(ratio) - (z * z) / 2 - target) * ratio;
    if (!(next < z)) break;
    z = next;
  }
  return z;
}

/** Mills' ratio (1 - Phi(z)) / phi(z) = 1/(z + 1/(z + 2/(z + 3/(z + ...)))), Laplace's continued fraction. */
function millsRatio(z: number): number {
  // What is left of the fraction is close to the root of t = z + n/t.
  let rest = (z + Math.sqrt(z * z + 4 * fractionTerms)) / 2;
  for (let term = fractionTerms; term > 0; term -= 1) rest = z + term / rest;
  return 1 / rest;
}

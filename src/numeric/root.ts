import { describeReceived } from "../errors/fault.js";
import { fail } from "../errors/gibbs-ledger-error.js";

/** Steps with interpolation; a function so awkward that these do not suffice is bisected. */
const interpolatedSteps = 60;

const buffer: ArrayBuffer = /* @__PURE__ */ new ArrayBuffer(8);
const view: DataView = /* @__PURE__ */ new DataView(buffer);

/**
 * A root of a function between two points where its signs are opposite, to the last bits and without derivatives.
 *
 * The method of Chandrupatla, inverse quadratic interpolation where it is safe and halving elsewhere; after 60 steps
 * the
 * doubles that are left are bisected by their order, so that no function takes more than 130 evaluations.
 *
 * @param f - a continuous function; one that jumps across zero gives the place of the jump
 * @param lower - finite
 * @param upper - finite; the ends may stand in either order
 * @returns of the last two neighbouring doubles the one where |f| is smaller, or a point where f is exactly 0
 * @throws GibbsLedgerError "input/not-finite" where an end is not finite; "roots/not-bracketed" where f has the same
 * sign
 * at both ends, or is not a number somewhere
 * @see T. R. Chandrupatla, Adv. Eng. Softw. 28, 145 (1997)
 */
export function findRoot(f: (x: number) => number, lower: number, upper: number): number {
  checkEnd(lower);
  checkEnd(upper);
  const evaluate = (x: number): number => {
    const value = f(x);
    return Number.isNaN(value) ? refuseNotANumber(x) : value;
  };
  // a is the newest point, b the other end of the bracket, c the point before.
  let a = upper;
  let b = lower;
  let atA = evaluate(a);
  if (atA === 0) return a + 0;
  let atB = evaluate(b);
  if (atB === 0) return b + 0;
  if (atA > 0 === atB > 0) refuseNotBracketed(lower, upper, atB, atA);
  let fraction = 0.5;
  for (let step = 0; step < interpolatedSteps; step += 1) {
    // Halves first: the distance of the ends may overflow.
    const x = fraction === 0.5 ? a * 0.5 + b * 0.5 : a + fraction * (b - a);
    if (x === a || x === b) break;
    const atX = evaluate(x);
    if (atX === 0) return x + 0;
    let c = a;
    let atC = atA;
    if (atX > 0 !== atA > 0) {
      c = b;
      atC = atB;
      b = a;
      atB = atA;
    }
    a = x;
    atA = atX;
    fraction = nextFraction(a, b, c, atA, atB, atC);
  }
  return bisectDoubles(evaluate, a, b, atA, atB);
}

/** Where between a and b to look next: by inverse quadratic interpolation if it is monotonic there, else halfway. */
function nextFraction(a: number, b: number, c: number, atA: number, atB: number, atC: number): number {
  const xi = (a - b) / (c - b);
  const phi = (atA - atB) / (atC - atB);
  if (!(phi * phi < xi && (1 - phi) * (1 - phi) < 1 - xi)) return 0.5;
  const t = (atA / (atB - atA)) * (atC / (atB - atC)) + ((c - a) / (b - a)) * (atA / (atC - atA)) * (atB / (atC - atB));
  // At least two units in the last place from either end, or the bracket would close from one side only.
  const best = Math.abs(atA) < Math.abs(atB) ? a : b;
  const least = Math.min(0.5, (Math.abs(best) * 4.440892098500626e-16) / Math.abs(b - a));
  return Number.isNaN(t) ? 0.5 : Math.min(1 - least, Math.max(least, t));
}

/** Halves the number of doubles between a and b until they are neighbours. */
function bisectDoubles(evaluate: (x: number) => number, a: number, b: number, atA: number, atB: number): number {
  let near = a;
  let far = b;
  let atNear = atA;
  let atFar = atB;
  for (;;) {
    const x = doubleAt((rank(near) + rank(far)) >> 1n);
    if (x === near || x === far) break;
    const atX = evaluate(x);
    if (atX === 0) return x + 0;
    if (atX > 0 === atNear > 0) {
      near = x;
      atNear = atX;
    } else {
      far = x;
      atFar = atX;
    }
  }
  return (Math.abs(atNear) <= Math.abs(atFar) ? near : far) + 0;
}

/** The place of a double in the order of all doubles; 0 has 0. */
function rank(x: number): bigint {
  view.setFloat64(0, Math.abs(x));
  const place = view.getBigInt64(0);
  return x < 0 ? -place : place;
}

function doubleAt(place: bigint): number {
  view.setBigInt64(0, place < 0n ? -place : place);
  const magnitude = view.getFloat64(0);
  return place < 0n ? -magnitude : magnitude;
}

function checkEnd(end: number): void {
  if (Number.isFinite(end)) return;
  fail({
    code: "input/not-finite",
    path: [],
    message: `expected a finite end of the bracket, got ${describeReceived(end)}`,
    received: describeReceived(end),
    expected: "a finite number",
  });
}

function refuseNotBracketed(lower: number, upper: number, atLower: number, atUpper: number): never {
  fail({
    code: "roots/not-bracketed",
    path: [],
    message: `the function has the same sign at ${lower} (${atLower}) and at ${upper} (${atUpper})`,
    received: `${atLower} and ${atUpper}`,
    expected: "values of opposite sign at the ends",
    hint: "choose ends on either side of the root",
  });
}

function refuseNotANumber(x: number): never {
  fail({
    code: "roots/not-bracketed",
    path: [],
    message: `the function is not a number at ${x}`,
    received: "NaN",
    expected: "a number everywhere between the ends",
  });
}

import { Decimal } from "decimal.js";

/** A private constructor of 45 digits and a wide range of exponents. */
export const D: typeof Decimal = Decimal.clone({ precision: 45, toExpNeg: -9e15, toExpPos: 9e15 });

const bits = new DataView(new ArrayBuffer(8));
const powersOfFive = new Map<number, bigint>();
const units = new Map<number, Decimal>();

function fiveTo(exponent: number): bigint {
  let power = powersOfFive.get(exponent);
  if (power === undefined) {
    power = 5n ** BigInt(exponent);
    powersOfFive.set(exponent, power);
  }
  return power;
}

/** 2^exponent to 45 digits. */
function unit(exponent: number): Decimal {
  let power = units.get(exponent);
  if (power === undefined) {
    power = new D(2).pow(exponent);
    units.set(exponent, power);
  }
  return power;
}

/** Significand and exponent of a finite double: value = significand * 2^exponent. */
export function parts(value: number): { significand: bigint; exponent: number } {
  bits.setFloat64(0, value);
  const word = bits.getBigUint64(0);
  const field = Number((word >> 52n) & 2047n);
  const fraction = word & (2n ** 52n - 1n);
  const magnitude = field === 0 ? fraction : fraction + 2n ** 52n;
  return { significand: word >> 63n === 1n ? -magnitude : magnitude, exponent: Math.max(field, 1) - 1075 };
}

/**
 * The exact value of a double, where it has more than 130 digits cut there (the constructor alone would take its
 * shortest decimal). Doubles near 1 have at most 107 digits: their distance from 1 stays exact.
 */
export function exactDecimal(value: number): Decimal {
  const { significand, exponent } = parts(value);
  if (exponent >= 0) return new D((significand << BigInt(exponent)).toString());
  // significand / 2^n = significand 5^n / 10^n
  const digits = (significand * fiveTo(-exponent)).toString();
  const surplus = Math.max(0, digits.length - 130);
  return new D(`${digits.slice(0, digits.length - surplus)}e${exponent + surplus}`);
}

/** The distance of a double from a reference in units of the reference's last place. */
export function ulpError(computed: number, reference: Decimal): number {
  const nearest = Math.abs(reference.toNumber());
  let exponent = parts(nearest).exponent;
  // Rounding may have carried the reference into the next binade.
  if (nearest > 0 && reference.abs().lt(exactDecimal(nearest)) && parts(nearest).significand === 2n ** 52n) {
    exponent = Math.max(exponent - 1, -1074);
  }
  return exactDecimal(computed).minus(reference).abs().div(unit(exponent)).toNumber();
}

/** The double next above (steps > 0) or below (steps < 0), counted in units of the last place. */
export function neighbour(value: number, steps: number): number {
  bits.setFloat64(0, value);
  bits.setBigInt64(0, bits.getBigInt64(0) + BigInt(value < 0 ? -steps : steps));
  return bits.getFloat64(0);
}

/** A seeded generator of doubles in [0, 1): Lehmer's with multiplier 48271, two draws a number. */
export function seeded(seed: number): () => number {
  let state = seed;
  const draw = (): number => {
    state = (state * 48271) % 2147483647;
    return state;
  };
  return () => (draw() + draw() / 2147483647) / 2147483648;
}

/** A double with random bits, finite and above zero; subnormals appear as often as any other binade. */
export function randomPositive(random: () => number): number {
  bits.setUint32(0, Math.floor(random() * 2047) * 1048576 + Math.floor(random() * 1048576));
  bits.setUint32(4, Math.floor(random() * 4294967296));
  const value = bits.getFloat64(0);
  return value === 0 ? Number.MIN_VALUE : value;
}

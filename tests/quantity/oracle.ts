import type { Dimension, UnitCode } from "../../src/quantity/units.js";

/** An exact fraction; the denominator is above 0. */
export interface Exact {
  readonly n: bigint;
  readonly d: bigint;
}

export function exact(text: string): Exact {
  const [whole, digits = ""] = text.replace("-", "").split(".") as [string, string?];
  const n = BigInt(whole + digits);
  return { n: text.startsWith("-") ? -n : n, d: 10n ** BigInt(digits.length) };
}
export const plus = (a: Exact, b: Exact): Exact => ({ n: a.n * b.d + b.n * a.d, d: a.d * b.d });
export const minus = (a: Exact, b: Exact): Exact => ({ n: a.n * b.d - b.n * a.d, d: a.d * b.d });
export const times = (a: Exact, b: Exact): Exact => ({ n: a.n * b.n, d: a.d * b.d });
export const over = (a: Exact, b: Exact): Exact =>
  b.n < 0n ? { n: -a.n * b.d, d: -a.d * b.n } : { n: a.n * b.d, d: a.d * b.n };
export const compare = (a: Exact, b: Exact): number => Number(a.n * b.d > b.n * a.d) - Number(a.n * b.d < b.n * a.d);
export const magnitude = (a: Exact): Exact => (a.n < 0n ? { n: -a.n, d: a.d } : a);

const bits = new DataView(new ArrayBuffer(8));

export function bitsOf(value: number): bigint {
  bits.setFloat64(0, value);
  return bits.getBigUint64(0);
}

export function doubleOf(word: bigint): number {
  bits.setBigUint64(0, word);
  return bits.getFloat64(0);
}

/** The binary value of a finite double. */
export function exactDouble(value: number): Exact {
  const word = bitsOf(Math.abs(value));
  const field = word >> 52n;
  const fraction = word & ((1n << 52n) - 1n);
  const size = field === 0n ? fraction : fraction + (1n << 52n);
  const exponent = (field === 0n ? 1n : field) - 1075n;
  const n = exponent >= 0n ? size << exponent : size;
  return { n: value < 0 ? -n : n, d: exponent >= 0n ? 1n : 1n << -exponent };
}

/** The doubles on both sides. */
export function neighbours(value: number): [below: number, above: number] {
  if (value === 0) return [-Number.MIN_VALUE, Number.MIN_VALUE];
  const word = bitsOf(value);
  const [outward, inward] = [doubleOf(word + 1n), doubleOf(word - 1n)];
  return value > 0 ? [inward, outward] : [outward, inward];
}

/** Distance to the next double away from zero. */
export function unitInLastPlace(value: number): number {
  const size = Math.abs(value);
  return doubleOf(bitsOf(size) + 1n) - size;
}

const beyondLargest: Exact = { n: (1n << 1024n) - (1n << 970n), d: 1n };

/** Whether a double is the nearest to an exact number, halves to the even one; Infinity from half a step beyond. */
export function isNearest(result: number, target: Exact): boolean {
  if (compare(magnitude(target), beyondLargest) >= 0) {
    return result === (target.n > 0n ? Number.POSITIVE_INFINITY : Number.NEGATIVE_INFINITY);
  }
  if (!Number.isFinite(result) || Object.is(result, -0)) return false;
  const error = magnitude(minus(target, exactDouble(result)));
  return neighbours(result).every((other) => {
    if (!Number.isFinite(other)) return true;
    const order = compare(error, magnitude(minus(target, exactDouble(other))));
    return order < 0 || (order === 0 && (bitsOf(result) & 1n) === 0n);
  });
}

const one = exact("1");
const kilo = exact("1000");
const milli = exact("0.001");
const micro = exact("0.000001");
const fiveNinths = over(exact("5"), exact("9"));
const calorie = exact("4.184");
// pound 0.45359237 kg, standard gravity 9.80665 m/s2, inch 0.0254 m: exact by definition
const psi = over(times(exact("0.45359237"), exact("9.80665")), times(exact("0.0254"), exact("0.0254")));
// e = 1.602176634e-19 C and NA = 6.02214076e23 mol-1: exact by definition
const electronvolt = times(times(exact("1.602176634"), exact("6.02214076")), exact("10000"));
// conventional millimetre of mercury: 13595.1 kg/m3 * 9.80665 m/s2 * 0.001 m
const mercury = times(times(exact("13595.1"), exact("9.80665")), milli);

/** Definitions written a second time, apart from the table under test: SI = (value + offset) * factor. */
export const definitions: Readonly<Record<UnitCode, readonly [Dimension, factor: Exact, offset?: Exact]>> = {
  K: ["temperature", one],
  Cel: ["temperature", one, exact("273.15")],
  "[degF]": ["temperature", fiveNinths, exact("459.67")],
  "[degR]": ["temperature", fiveNinths],
  "K{difference}": ["temperatureDifference", one],
  "Cel{difference}": ["temperatureDifference", one],
  "[degF]{difference}": ["temperatureDifference", fiveNinths],
  "[degR]{difference}": ["temperatureDifference", fiveNinths],
  Pa: ["pressure", one],
  hPa: ["pressure", exact("100")],
  kPa: ["pressure", kilo],
  MPa: ["pressure", exact("1000000")],
  GPa: ["pressure", exact("1000000000")],
  mbar: ["pressure", exact("100")],
  bar: ["pressure", exact("100000")],
  kbar: ["pressure", exact("100000000")],
  atm: ["pressure", exact("101325")],
  "[psi]": ["pressure", psi],
  "mm[Hg]": ["pressure", mercury],
  "J/mol": ["molarEnergy", one],
  "kJ/mol": ["molarEnergy", kilo],
  "cal_th/mol": ["molarEnergy", calorie],
  "kcal_th/mol": ["molarEnergy", times(kilo, calorie)],
  "eV/{entity}": ["molarEnergy", electronvolt],
  "J/mol/K": ["molarEntropy", one],
  "kJ/mol/K": ["molarEntropy", kilo],
  "cal_th/mol/K": ["molarEntropy", calorie],
  "m3/mol": ["molarVolume", one],
  "cm3/mol": ["molarVolume", micro],
  "L/mol": ["molarVolume", milli],
  "J/bar/mol": ["molarVolume", over(one, exact("100000"))],
  "kg/mol": ["molarMass", one],
  "g/mol": ["molarMass", milli],
  mol: ["amount", one],
  mmol: ["amount", milli],
  kmol: ["amount", kilo],
  kg: ["mass", one],
  g: ["mass", milli],
  "mol/kg": ["molality", one],
  "mmol/kg": ["molality", milli],
  "mol/m3": ["concentration", one],
  "mol/L": ["concentration", kilo],
  "kg/m3": ["massDensity", one],
  "g/cm3": ["massDensity", kilo],
  "kg/L": ["massDensity", kilo],
  "1": ["fraction", one],
  "%": ["fraction", exact("0.01")],
  "[ppm]": ["fraction", micro],
  V: ["electricPotential", one],
  mV: ["electricPotential", milli],
  C: ["charge", one],
  J: ["energy", one],
  kJ: ["energy", kilo],
  cal_th: ["energy", calorie],
  "kW.h": ["energy", times(kilo, exact("3600"))],
  "J/kg": ["specificEnergy", one],
  "J/g": ["specificEnergy", kilo],
  "kJ/kg": ["specificEnergy", kilo],
  "cal_th/g": ["specificEnergy", over(calorie, milli)],
  "J/kg/K": ["specificEntropy", one],
  "J/g/K": ["specificEntropy", kilo],
  "K-1": ["reciprocalTemperature", one],
  "Pa-1": ["reciprocalPressure", one],
  "bar-1": ["reciprocalPressure", over(one, exact("100000"))],
};

/** The exact result of a conversion. */
export function exactConversion(value: Exact, from: UnitCode, to: UnitCode): Exact {
  const [, factor, offset = exact("0")] = definitions[from];
  const [, factorThere, offsetThere = exact("0")] = definitions[to];
  return minus(over(times(plus(value, offset), factor), factorThere), offsetThere);
}

/** Every ordered pair of different units of one dimension. */
export const pairs: readonly (readonly [UnitCode, UnitCode])[] = (Object.keys(definitions) as UnitCode[]).flatMap(
  (from) =>
    (Object.keys(definitions) as UnitCode[])
      .filter((to) => to !== from && definitions[to][0] === definitions[from][0])
      .map((to) => [from, to] as const),
);

/** Reproducible numbers in [0, 1) with 53 bits (Weyl sequence with a mixing step). */
export function randomNumbers(seed: number): () => number {
  let state = seed >>> 0;
  const word = () => {
    state = (state + 0x9e3779b9) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 16), 0x85ebca6b);
    mixed = Math.imul(mixed ^ (mixed >>> 13), 0xc2b2ae35);
    return (mixed ^ (mixed >>> 16)) >>> 0;
  };
  return () => (word() * 2 ** 21 + (word() >>> 11)) / 2 ** 53;
}

import type { Citation } from "../references/bibliography.js";
import type { Origin } from "../references/source.js";
import type { HydrogenIsotope } from "./element-symbols.js";

/** A standard atomic weight, or the relative mass of one isotope. */
export interface AtomicWeight {
  /** The value that molar masses are made of. */
  readonly value: number;
  /** Half-width as printed: for standard atomic weights a bound with great certainty, for D and T one standard. */
  readonly uncertainty: number;
  /** Value with uncertainty in its last digits, all digits as printed. */
  readonly printed: string;
  /** Range in normal materials, where the standard atomic weight is an interval. */
  readonly interval?: readonly [lower: number, upper: number];
}

/** Where the standard atomic weights come from, and how. */
export const atomicWeightsSource: { readonly source: Citation; readonly origin: Origin } = {
  source: "prohaska2022",
  origin: "memory",
};

/** Where the masses of D and T come from, and how. */
export const isotopeMassesSource: { readonly source: Citation; readonly origin: Origin } = {
  source: "wang2021",
  origin: "memory",
};

/**
 * Masses of deuterium and tritium atoms in daltons, from the Atomic Mass Evaluation of 2020; these are the symbols D
 * and T of formulas.
 *
 * @see `references.wang2021`
 */
export const isotopeMasses: Readonly<Record<HydrogenIsotope, AtomicWeight>> = {
  D: { value: 2.014101777844, uncertainty: 1.5e-11, printed: "2.014101777844(15)" },
  T: { value: 3.01604928132, uncertainty: 8.1e-11, printed: "3.016049281320(81)" },
};

const weights = {
  H: { value: 1.008, uncertainty: 0.0002, printed: "1.0080(2)", interval: [1.00784, 1.00811] },
  He: { value: 4.002602, uncertainty: 0.000002, printed: "4.002602(2)" },
  Li: { value: 6.94, uncertainty: 0.06, printed: "6.94(6)", interval: [6.938, 6.997] },
  Be: { value: 9.0121831, uncertainty: 5e-7, printed: "9.0121831(5)" },
  B: { value: 10.81, uncertainty: 0.02, printed: "10.81(2)", interval: [10.806, 10.821] },
  C: { value: 12.011, uncertainty: 0.002, printed: "12.011(2)", interval: [12.0096, 12.0116] },
  N: { value: 14.007, uncertainty: 0.001, printed: "14.007(1)", interval: [14.00643, 14.00728] },
  O: { value: 15.999, uncertainty: 0.001, printed: "15.999(1)", interval: [15.99903, 15.99977] },
  F: { value: 18.998403162, uncertainty: 5e-9, printed: "18.998403162(5)" },
  Ne: { value: 20.1797, uncertainty: 0.0006, printed: "20.1797(6)" },
  Na: { value: 22.98976928, uncertainty: 2e-8, printed: "22.98976928(2)" },
  Mg: { value: 24.305, uncertainty: 0.002, printed: "24.305(2)", interval: [24.304, 24.307] },
  Al: { value: 26.9815384, uncertainty: 3e-7, printed: "26.9815384(3)" },
  Si: { value: 28.085, uncertainty: 0.001, printed: "28.085(1)", interval: [28.084, 28.086] },
  P: { value: 30.973761998, uncertainty: 5e-9, printed: "30.973761998(5)" },
  S: { value: 32.06, uncertainty: 0.02, printed: "32.06(2)", interval: [32.059, 32.076] },
  Cl: { value: 35.45, uncertainty: 0.01, printed: "35.45(1)", interval: [35.446, 35.457] },
  Ar: { value: 39.95, uncertainty: 0.16, printed: "39.95(16)", interval: [39.792, 39.963] },
  K: { value: 39.0983, uncertainty: 0.0001, printed: "39.0983(1)" },
  Ca: { value: 40.078, uncertainty: 0.004, printed: "40.078(4)" },
  Sc: { value: 44.955907, uncertainty: 0.000004, printed: "44.955907(4)" },
  Ti: { value: 47.867, uncertainty: 0.001, printed: "47.867(1)" },
  V: { value: 50.9415, uncertainty: 0.0001, printed: "50.9415(1)" },
  Cr: { value: 51.9961, uncertainty: 0.0006, printed: "51.9961(6)" },
  Mn: { value: 54.938043, uncertainty: 0.000002, printed: "54.938043(2)" },
  Fe: { value: 55.845, uncertainty: 0.002, printed: "55.845(2)" },
  Co: { value: 58.933194, uncertainty: 0.000003, printed: "58.933194(3)" },
  Ni: { value: 58.6934, uncertainty: 0.0004, printed: "58.6934(4)" },
  Cu: { value: 63.546, uncertainty: 0.003, printed: "63.546(3)" },
  Zn: { value: 65.38, uncertainty: 0.02, printed: "65.38(2)" },
  Ga: { value: 69.723, uncertainty: 0.001, printed: "69.723(1)" },
  Ge: { value: 72.63, uncertainty: 0.008, printed: "72.630(8)" },
  As: { value: 74.921595, uncertainty: 0.000006, printed: "74.921595(6)" },
  Se: { value: 78.971, uncertainty: 0.008, printed: "78.971(8)" },
  Br: { value: 79.904, uncertainty: 0.003, printed: "79.904(3)", interval: [79.901, 79.907] },
  Kr: { value: 83.798, uncertainty: 0.002, printed: "83.798(2)" },
  Rb: { value: 85.4678, uncertainty: 0.0003, printed: "85.4678(3)" },
  Sr: { value: 87.62, uncertainty: 0.01, printed: "87.62(1)" },
  Y: { value: 88.905838, uncertainty: 0.000002, printed: "88.905838(2)" },
  Zr: { value: 91.224, uncertainty: 0.002, printed: "91.224(2)" },
  Nb: { value: 92.90637, uncertainty: 0.00001, printed: "92.90637(1)" },
  Mo: { value: 95.95, uncertainty: 0.01, printed: "95.95(1)" },
  Ru: { value: 101.07, uncertainty: 0.02, printed: "101.07(2)" },
  Rh: { value: 102.90549, uncertainty: 0.00002, printed: "102.90549(2)" },
  Pd: { value: 106.42, uncertainty: 0.01, printed: "106.42(1)" },
  Ag: { value: 107.8682, uncertainty: 0.0002, printed: "107.8682(2)" },
  Cd: { value: 112.414, uncertainty: 0.004, printed: "112.414(4)" },
  In: { value: 114.818, uncertainty: 0.001, printed: "114.818(1)" },
  Sn: { value: 118.71, uncertainty: 0.007, printed: "118.710(7)" },
  Sb: { value: 121.76, uncertainty: 0.001, printed: "121.760(1)" },
  Te: { value: 127.6, uncertainty: 0.03, printed: "127.60(3)" },
  I: { value: 126.90447, uncertainty: 0.00003, printed: "126.90447(3)" },
  Xe: { value: 131.293, uncertainty: 0.006, printed: "131.293(6)" },
  Cs: { value: 132.90545196, uncertainty: 6e-8, printed: "132.90545196(6)" },
  Ba: { value: 137.327, uncertainty: 0.007, printed: "137.327(7)" },
  La: { value: 138.90547, uncertainty: 0.00007, printed: "138.90547(7)" },
  Ce: { value: 140.116, uncertainty: 0.001, printed: "140.116(1)" },
  Pr: { value: 140.90766, uncertainty: 0.00001, printed: "140.90766(1)" },
  Nd: { value: 144.242, uncertainty: 0.003, printed: "144.242(3)" },
  Sm: { value: 150.36, uncertainty: 0.02, printed: "150.36(2)" },
  Eu: { value: 151.964, uncertainty: 0.001, printed: "151.964(1)" },
  Gd: { value: 157.25, uncertainty: 0.03, printed: "157.25(3)" },
  Tb: { value: 158.925354, uncertainty: 0.000007, printed: "158.925354(7)" },
  Dy: { value: 162.5, uncertainty: 0.001, printed: "162.500(1)" },
  Ho: { value: 164.930329, uncertainty: 0.000005, printed: "164.930329(5)" },
  Er: { value: 167.259, uncertainty: 0.003, printed: "167.259(3)" },
  Tm: { value: 168.934219, uncertainty: 0.000005, printed: "168.934219(5)" },
  Yb: { value: 173.045, uncertainty: 0.01, printed: "173.045(10)" },
  Lu: { value: 174.9668, uncertainty: 0.0001, printed: "174.9668(1)" },
  Hf: { value: 178.486, uncertainty: 0.006, printed: "178.486(6)" },
  Ta: { value: 180.94788, uncertainty: 0.00002, printed: "180.94788(2)" },
  W: { value: 183.84, uncertainty: 0.01, printed: "183.84(1)" },
  Re: { value: 186.207, uncertainty: 0.001, printed: "186.207(1)" },
  Os: { value: 190.23, uncertainty: 0.03, printed: "190.23(3)" },
  Ir: { value: 192.217, uncertainty: 0.002, printed: "192.217(2)" },
  Pt: { value: 195.084, uncertainty: 0.009, printed: "195.084(9)" },
  Au: { value: 196.96657, uncertainty: 0.000004, printed: "196.966570(4)" },
  Hg: { value: 200.592, uncertainty: 0.003, printed: "200.592(3)" },
  Tl: { value: 204.38, uncertainty: 0.01, printed: "204.38(1)", interval: [204.382, 204.385] },
  Pb: { value: 207.2, uncertainty: 1.1, printed: "207.2(1.1)", interval: [206.14, 207.94] },
  Bi: { value: 208.9804, uncertainty: 0.00001, printed: "208.98040(1)" },
  Th: { value: 232.0377, uncertainty: 0.0004, printed: "232.0377(4)" },
  Pa: { value: 231.03588, uncertainty: 0.00001, printed: "231.03588(1)" },
  U: { value: 238.02891, uncertainty: 0.00003, printed: "238.02891(3)" },
} as const;

/** Symbol of an element with a standard atomic weight. */
export type WeighedElementSymbol = keyof typeof weights;

/**
 * Standard atomic weights of the elements 2021 of IUPAC, of the 84 elements that have one; the others have no
 * characteristic composition of isotopes in nature.
 *
 * Fourteen elements have an interval [a, b] because normal materials differ; for these the value is the one of the
 * abridged table, with its uncertainty. The other values have all published digits. The revisions of 2024 (Gd
 * 157.249(2), Lu 174.96669(5), Zr 91.222(3)) came after this table and are not used.
 *
 * The figures are from memory; a test holds them to the abridged table.
 *
 * @see `references.prohaska2022`
 * @example
 * atomicWeights.O.value; // => 15.999
 * atomicWeights.O.interval; // => [15.99903, 15.99977]
 * atomicWeights.Fe.printed; // => "55.845(2)"
 */
export const atomicWeights: Readonly<Record<WeighedElementSymbol, AtomicWeight>> = weights;

/**
 * The weight of a symbol of a formula: a standard atomic weight, or the mass of D or T.
 *
 * @returns undefined for an element without a standard atomic weight
 */
export function atomicWeightOf(symbol: string): AtomicWeight | undefined {
  if (symbol === "D" || symbol === "T") return isotopeMasses[symbol];
  return Object.hasOwn(weights, symbol) ? weights[symbol as WeighedElementSymbol] : undefined;
}

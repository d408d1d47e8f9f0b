import type { CollectionData, Label } from "../species/record.js";
import { type Participant, readParticipants, type UnbalancedEquation } from "./balance-participants.js";
import { conservedQuantities } from "./composition-matrix.js";
import { extremeRays } from "./extreme-rays.js";
import { failNotBalanceable } from "./not-balanceable.js";
import { nullSpace, rankOf } from "./null-space.js";
import { writeEquation } from "./write-equation.js";

/** An equation that balances, in the smallest whole numbers. */
export interface BalancedEquation {
  /** In the library's own spelling. */
  readonly equation: string;
  /** Exact whole stoichiometric numbers by label, negative on the left; species that take no part are left out. */
  readonly coefficients: Readonly<Record<Label, string>>;
}

/** The one way to balance an equation, up to a common factor. */
export interface UniqueBalance extends BalancedEquation {
  readonly isUnique: true;
  /** The equation alone. */
  readonly basis: readonly BalancedEquation[];
  /** What was resolved, moved or passed over. */
  readonly notes: readonly string[];
}

/** An equation that can be balanced in more than one way: none of them is chosen. */
export interface AmbiguousBalance {
  readonly isUnique: false;
  readonly equation?: undefined;
  readonly coefficients?: undefined;
  /** Independent equations; each balanced form is a sum of multiples of these, and no fewer do. */
  readonly basis: readonly BalancedEquation[];
  /** What was resolved, moved or passed over. */
  readonly notes: readonly string[];
}

/** How an equation balances. */
export type Balance = UniqueBalance | AmbiguousBalance;

/**
 * Balances an equation: the smallest whole numbers for which every element and the charge are the same on both sides,
 * by exact elimination. Fractional formulas are exact (Fe0.947O), ions and the electron `e^-` are balanced by charge,
 * and species in several states or polymorphs are species of their own.
 *
 * Coefficients in the text are passed over. A species that stands twice is taken once. A species that can take part
 * only on the other side is moved there, and the notes say so; of the two directions the one that moves fewer species
 * is taken. Where the equation balances in more than one way, `isUnique` is false, no form is chosen, and `basis` holds
 * independent equations: those with the smallest numbers in which each species stays on its side (sought among up to
 * 30 species), filled up with others where these do not suffice.
 *
 * @param equation - a text as `reaction` reads it, or names by side; at most 200 species
 * @param collection - where names are looked up; without one they are read as labels
 * @throws GibbsLedgerError "reaction/not-balanceable" where a species can take no part, naming the elements that stand
 * on one side only; "reaction/syntax", "reaction/empty", "reaction/too-long", "reaction/too-many-species"; without a
 * collection the "formula/..." codes, with one "species/not-found" and "species/ambiguous"
 * @see `references.bareiss1968`, `references.motzkin1953`
 * @example
 * balance("KMnO4 + HCl = KCl + MnCl2 + H2O + Cl2").equation;
 * // => "2 KMnO4 + 16 HCl = 2 KCl + 2 MnCl2 + 8 H2O + 5 Cl2"
 * balance({ reactants: ["Fe^2+(aq)", "MnO4^-(aq)", "H^+(aq)"], products: ["Fe^3+(aq)", "Mn^2+(aq)", "H2O(l)"] })
 *   .coefficients; // => { "Fe^2+(aq)": "-5", "MnO4^-(aq)": "-1", "H^+(aq)": "-8", ... }
 * balance("H2 + Fe2O3 = Fe + CO2"); // throws reaction/not-balanceable
 */
export function balance(equation: string | UnbalancedEquation, collection?: CollectionData): Balance {
  const { species, notes } = readParticipants(equation, collection);
  // In the order of the labels, so that the choice of a basis does not hang on how the equation is written.
  const sorted = [...species].sort((a, b) => (a.label < b.label ? -1 : 1));
  const conserved = conservedQuantities(sorted);
  const rows = conserved.map(({ amounts }) => amounts);
  const vectors = nullSpace(rows, sorted.length);
  const idle = new Set(sorted.filter((_one, place) => vectors.every((vector) => vector[place] === 0n)));
  if (idle.size > 0) {
    const [rest] = vectors.length === 1 ? forms(sorted, species, vectors) : [];
    failNotBalanceable(
      species,
      species.filter((one) => idle.has(one)),
      rest?.equation,
    );
  }
  const basis = forms(sorted, species, vectors.length === 1 ? vectors : chooseBasis(sorted, rows, vectors));
  const moved = basis.flatMap(({ equation: text, moved: labels }) =>
    labels.map((label) => (basis.length === 1 ? `${label} changes sides` : `${label} changes sides in ${text}`)),
  );
  const equations = basis.map(({ equation: text, coefficients }) => ({ equation: text, coefficients }));
  const [only] = equations;
  return equations.length === 1
    ? { isUnique: true, ...only!, basis: equations, notes: [...notes, ...moved] }
    : { isUnique: false, basis: equations, notes: [...notes, ...moved] };
}

interface Form extends BalancedEquation {
  /** Labels of the species that stand on another side than was written. */
  readonly moved: readonly Label[];
}

/** Turns solutions into equations, in the order in which the species were written. */
function forms(
  sorted: readonly Participant[],
  written: readonly Participant[],
  vectors: readonly (readonly bigint[])[],
): Form[] {
  const places = new Map(sorted.map(({ label }, place) => [label, place]));
  return vectors.map((vector) => {
    const taking = written
      .map((one) => ({ one, count: vector[places.get(one.label)!]! }))
      .filter(({ count }) => count !== 0n);
    // Positive counts stand on the left in one direction, negative ones in the other.
    const movedForward = taking.filter(({ one, count }) => count > 0n !== one.isLeft);
    const movedBackward = taking.filter(({ one, count }) => count < 0n !== one.isLeft);
    const firstStays = taking[0]!.count > 0n === taking[0]!.one.isLeft;
    const isForward =
      movedForward.length === movedBackward.length ? firstStays : movedForward.length < movedBackward.length;
    const terms = taking.map(({ one: { label }, count }) => ({
      label,
      coefficient: { numerator: isForward ? -count : count, denominator: 1n },
    }));
    const ordered = [...terms.filter(isOnLeft), ...terms.filter((term) => !isOnLeft(term))];
    return {
      equation: writeEquation(ordered),
      coefficients: Object.fromEntries(ordered.map(({ label, coefficient }) => [label, String(coefficient.numerator)])),
      moved: (isForward ? movedForward : movedBackward).map(({ one }) => one.label),
    };
  });
}

function isOnLeft({ coefficient }: { readonly coefficient: { readonly numerator: bigint } }): boolean {
  return coefficient.numerator < 0n;
}

/** As many independent solutions as the null space has dimensions, those with all species on their sides first. */
function chooseBasis(
  sorted: readonly Participant[],
  rows: readonly (readonly bigint[])[],
  vectors: readonly (readonly bigint[])[],
): bigint[][] {
  const toSides = (row: readonly bigint[]): bigint[] =>
    row.map((entry, place) => (sorted[place]!.isLeft ? entry : -entry));
  const rays = extremeRays(rows.map(toSides), sorted.length);
  if (rays === undefined) return vectors.map((vector) => [...vector]);
  const candidates = [...rays.sort(compareSizes).map(toSides), ...vectors];
  const chosen: bigint[][] = [];
  for (const candidate of candidates) {
    if (chosen.length === vectors.length) break;
    if (rankOf([...chosen, candidate], sorted.length) > chosen.length) chosen.push([...candidate]);
  }
  return chosen;
}

/** The smaller sum of coefficients first, then the fewer species, then the order of labels. */
function compareSizes(a: readonly bigint[], b: readonly bigint[]): number {
  const [sumOfA, sumOfB] = [a, b].map((entries) => entries.reduce((sum, entry) => sum + entry, 0n)) as [bigint, bigint];
  if (sumOfA !== sumOfB) return sumOfA < sumOfB ? -1 : 1;
  const [speciesInA, speciesInB] = [a, b].map((entries) => entries.filter((entry) => entry !== 0n).length) as [
    number,
    number,
  ];
  if (speciesInA !== speciesInB) return speciesInA - speciesInB;
  const place = a.findIndex((entry, at) => entry !== b[at]);
  return place < 0 ? 0 : a[place]! > b[place]! ? -1 : 1;
}

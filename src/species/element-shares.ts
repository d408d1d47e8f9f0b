import { cut, type Fault } from "../errors/fault.js";
import { formula } from "../formula/formula.js";
import {
  addRationals,
  divideRationals,
  isZeroRational,
  negateRational,
  parseRational,
  type Rational,
  rational,
} from "../numeric/rational.js";
import { isSameSource } from "../references/is-same-source.js";
import type { Source } from "../references/source.js";
import { partsOf } from "./collection-index.js";
import type { CollectionData, PhaseSequence } from "./record.js";
import { collectSequence, sequencesGiven } from "./sequences.js";
import { chargeNumberOf, formulaOf, type StableSequence, type Substance } from "./substance.js";

/** How much of the reference sequence of an element goes into a formation. */
export interface ElementShare {
  readonly element: string;
  readonly sequence: StableSequence;
  /** Stoichiometric number of the sequence's formula, negative where the element is consumed. */
  readonly coefficient: Rational;
}

const none: Rational = { numerator: 0n, denominator: 1n };

/**
 * The elements that a substance is formed from: what its formula says, and half a mole of hydrogen a charge, since
 * X -> X^z + z e^- with e^- = 1/2 H2(g) - H^+(aq). In alphabetical order; elements that cancel are left out.
 */
export function elementShares(
  substance: Substance,
  collection: CollectionData,
  elementSource: Source | undefined,
  faults: Fault[],
): ElementShare[] {
  const atoms = new Map<string, Rational>();
  const written = formulaOf(substance);
  for (const [element, count] of Object.entries(written === undefined ? {} : formula(written).exactCounts)) {
    atoms.set(element, negateRational(parseRational(count) as Rational));
  }
  const charge = chargeNumberOf(substance);
  // z e^- on the side of the products bring z atoms of hydrogen as 1/2 H2 each; H^+(aq) is zero.
  if (charge !== 0) atoms.set("H", addRationals(atoms.get("H") ?? none, rational(BigInt(charge), 1n)));
  const given = sequencesGiven(collection, faults);
  return [...atoms]
    .filter(([, count]) => !isZeroRational(count))
    .sort(([a], [b]) => (a < b ? -1 : 1))
    .flatMap(([element, count]) => {
      const places = referencePlaces(given, element, elementSource);
      const sequence = places.length === 1 ? collectSequence(collection, places[0]!, faults) : undefined;
      if (places.length !== 1) faults.push(noOneReference(given, places, element));
      if (sequence === undefined) return [];
      const atomsOfSequence = parseRational(formula(sequence.formula).exactCounts[element]!) as Rational;
      return [{ element, sequence, coefficient: divideRationals(count, atomsOfSequence) }];
    });
}

/** The sequences of an element by itself, without a state; of one source, where it has any of the element. */
function referencePlaces(
  given: readonly PhaseSequence[],
  element: string,
  elementSource: Source | undefined,
): readonly number[] {
  const all = given.flatMap(({ label }, place) => (elementOfReference(label) === element ? [place] : []));
  if (elementSource === undefined || all.length < 2) return all;
  return all.filter((place) => isSameSource(given[place]!.source, elementSource));
}

/** The element whose reference sequence a label names; undefined for other sequences. */
export function elementOfReference(label: string): string | undefined {
  const parts = partsOf(label);
  if (parts === undefined || parts.state !== undefined || parts.chargeNumber !== 0) return undefined;
  const elements = Object.keys(formula(parts.formula).exactCounts);
  return elements.length === 1 ? elements[0] : undefined;
}

function noOneReference(given: readonly PhaseSequence[], places: readonly number[], element: string): Fault {
  if (places.length === 0) {
    return {
      code: "species/no-reference",
      path: ["collection", "sequences"],
      message: `the collection does not say what the reference phase of ${element} is`,
      expected: `a sequence such as { label: "${element}", phases: [...], source, origin }`,
    };
  }
  const sources = places.map((place) => {
    const { label, source } = given[place]!;
    return `${label} of ${typeof source === "string" ? source : source.text}`;
  });
  return {
    code: "species/ambiguous",
    path: ["elementSource"],
    message: `${element} has several reference sequences: ${cut(sources.join(", "), 200)}`,
    expected: "elementSource: one of their sources",
  };
}

import { cut, type Fault } from "../errors/fault.js";
import { fail, failIfAny } from "../errors/gibbs-ledger-error.js";
import { evaluateAll, intervalOf } from "../heat-capacity/evaluate.js";
import { mergeSeries, type SeriesPlan, type WeightedSeries } from "../heat-capacity/merge.js";
import { extendSeries, policyHint, type RangePolicy, rangePolicy } from "../heat-capacity/range-policy.js";
import { rationalToNumber } from "../numeric/rational.js";
import { temperatureInKelvin } from "../quantity/guards.js";
import type { Quantity } from "../quantity/quantity.js";
import type { Source } from "../references/source.js";
import { checkConventions } from "./check-conventions.js";
import { type ElementShare, elementShares } from "./element-shares.js";
import { houseSubstance } from "./house-substance.js";
import { lnOfConstant, log10OfE } from "./ln-of-constant.js";
import type { CollectionData, Label, SpeciesRecord } from "./record.js";
import { isInRange, outsideRangeFault, type StandardConditions } from "./standard-properties.js";
import type { StableSequence, Substance } from "./substance.js";
import { phaseAt, substanceSeries } from "./substance-function.js";

/** At what temperature a formation is looked at, and which references of the elements are meant. */
export interface FormationConditions extends StandardConditions {
  /** The source whose reference sequences are taken, where a collection holds several of one element. */
  readonly elementSource?: Source;
}

/** The reference phase of an element in a formation. */
export interface ElementOfFormation {
  readonly element: string;
  /** The reference phase at the temperature. */
  readonly phase: Label;
  /** Stoichiometric number of that phase's element in the formation, per mole of what the sequence's label says. */
  readonly coefficient: number;
  /** Label of the reference sequence, such as `S2`. */
  readonly sequence: Label;
  readonly source: Source;
}

/** Properties of formation from the elements in their reference phases at the same temperature, at 1 bar, per mole. */
export interface FormationProperties {
  /** Absent where a figure at 298.15 K only takes part. */
  readonly heatCapacity?: Quantity<"molarEntropy", "J/mol/K">;
  readonly enthalpy: Quantity<"molarEnergy", "J/mol">;
  readonly entropy: Quantity<"molarEntropy", "J/mol/K">;
  readonly gibbsEnergy: Quantity<"molarEnergy", "J/mol">;
  /** Natural logarithm of the equilibrium constant of formation. */
  readonly lnK: number;
  /** Decimal logarithm of the equilibrium constant of formation. */
  readonly log10K: number;
  /** What the species is formed from. */
  readonly elements: readonly ElementOfFormation[];
  /** Labels evaluated outside their range. */
  readonly outsideRange: readonly Label[];
}

/**
 * Enthalpy, entropy and Gibbs energy of formation of a species from the elements in their reference phases at the same
 * temperature, and the logarithms of its formation constant.
 *
 * Which phase of an element is the reference at which temperature is said by the collection's `sequences` whose label is
 * an element without state (`Fe`, `H2`, `S2`), each with its source. The formation of an ion counts half a mole of H2(g)
 * for each charge, for H^+(aq) is zero at all temperatures: e^- = 1/2 H2(g) - H^+(aq).
 *
 * @param species - a record, or a stable sequence as `findSequence` returns it
 * @param conditions - temperature above 0 K, within the range of the species and of its elements
 * @param collection - with the reference sequences of the elements and the records of their phases
 * @throws GibbsLedgerError "species/no-reference" where an element has no reference sequence, "species/ambiguous" where it
 * has several, "species/outside-range", "quantity/wrong-dimension"
 * @remarks Arithmetic: within 4 eps of the sum of the absolute terms of the merged series.
 * @see `references.chase1998` `references.cox1989`
 * @example
 * import { H2O_g, referenceData } from "gibbs-ledger/data";
 * const steam = formationProperties(H2O_g, { temperature: quantity(1000, "K") }, referenceData);
 * steam.log10K; // => 10.0...
 */
export function formationProperties(
  species: SpeciesRecord | StableSequence,
  conditions: FormationConditions,
  collection: CollectionData,
): FormationProperties {
  const subject = houseSubstance(species, ["species"]);
  const temperatureK = temperatureInKelvin(conditions?.temperature);
  const policy = rangePolicy(conditions.outsideRange);
  const formation = formationOf(subject, collection, conditions.elementSource);
  const members = [subject, ...formation.shares.map(({ sequence }) => sequence)];
  const plan = formation.plans[policy] ?? makePlan(formation, policy);
  const interval = plan === undefined ? undefined : intervalOf(plan, temperatureK);
  if (plan === undefined || interval === undefined) return failRange(members, temperatureK);
  const values = evaluateAll(interval, temperatureK);
  const lnK = lnOfConstant(values.gibbsEnergy, temperatureK);
  return {
    ...(plan.heatCapacityKnown ? { heatCapacity: { value: values.heatCapacity, unit: "J/mol/K" } as const } : {}),
    enthalpy: { value: values.enthalpy, unit: "J/mol" },
    entropy: { value: values.entropy, unit: "J/mol/K" },
    gibbsEnergy: { value: values.gibbsEnergy, unit: "J/mol" },
    lnK,
    log10K: lnK * log10OfE + 0,
    elements: formation.shares.map(({ element, sequence, coefficient }) => ({
      element,
      phase: phaseAt(sequence, temperatureK).label,
      coefficient: rationalToNumber(coefficient),
      sequence: sequence.label,
      source: sequence.source,
    })),
    outsideRange: members.filter((member) => !isInRange(member, temperatureK)).map(({ label }) => label),
  };
}

/** A species with the elements it is formed from, and its merged series by range policy. */
interface Formation {
  readonly subject: Substance;
  readonly shares: readonly ElementShare[];
  readonly plans: { [P in RangePolicy]?: SeriesPlan };
}

const formations = new WeakMap<CollectionData, WeakMap<Substance, Formation>>();

/** Formations are kept by collection and species; a choice of source is rare and made anew. */
function formationOf(subject: Substance, collection: CollectionData, elementSource: Source | undefined): Formation {
  const known = elementSource === undefined ? formations.get(collection)?.get(subject) : undefined;
  if (known !== undefined) return known;
  const faults: Fault[] = [];
  const shares = elementShares(subject, collection, elementSource, faults);
  checkConventions([subject, ...shares.map(({ sequence }) => sequence)], ["species"], faults);
  failIfAny(faults);
  const formation: Formation = { subject, shares, plans: {} };
  if (elementSource === undefined) {
    const byCollection = formations.get(collection) ?? new WeakMap<Substance, Formation>();
    formations.set(collection, byCollection.set(subject, formation));
  }
  return formation;
}

function makePlan(formation: Formation, policy: RangePolicy): SeriesPlan | undefined {
  const parts: WeightedSeries[] = [
    { coefficient: { numerator: 1n, denominator: 1n }, series: substanceSeries(formation.subject) },
    ...formation.shares.map(({ coefficient, sequence }) => ({ coefficient, series: substanceSeries(sequence) })),
  ];
  const plan = mergeSeries(
    parts.map(({ coefficient, series }) => ({ coefficient, series: extendSeries(series, policy) })),
  );
  if (plan !== undefined) formation.plans[policy] = plan;
  return plan;
}

function failRange(members: readonly Substance[], temperatureK: number): never {
  const faults = members
    .filter((member) => !isInRange(member, temperatureK))
    .map((member) => outsideRangeFault(member, temperatureK, ["temperature"]));
  failIfAny(faults);
  return fail({
    code: "species/outside-range",
    path: ["temperature"],
    message: `the ranges of ${cut(members.map(({ label }) => label).join(", "), 200)} do not meet`,
    received: `${temperatureK} K`,
    hint: policyHint,
  });
}

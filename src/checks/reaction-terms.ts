import type { CollectionData, SpeciesRecord, Witness } from "../species/record.js";
import { electronLabel } from "../species/substance.js";
import { missing } from "./witness-inputs.js";

/** A species of a witness's reaction and its stoichiometric number, products positive. */
export type Term = readonly [species: SpeciesRecord, stoichiometricNumber: number];

/**
 * The species of a witness's reaction, the record itself as it was given. An electron is read by the standard-hydrogen
 * convention, e^- = 1/2 H2(g) - H^+(aq).
 */
export function termsOf(record: SpeciesRecord, witness: Witness, collection: CollectionData): Term[] {
  const entries = Object.entries(witness.reaction ?? {});
  if (entries.length === 0) return missing(record, witness.check, "a reaction");
  if (!entries.every(([, stoichiometricNumber]) => Number.isFinite(stoichiometricNumber))) {
    return missing(record, witness.check, "finite stoichiometric numbers");
  }
  const recordOf = (label: string): SpeciesRecord => {
    const found = label === record.label ? record : collection.species.find((other) => other.label === label);
    return found ?? missing(record, witness.check, `a record of ${label}`);
  };
  return entries.flatMap(([label, stoichiometricNumber]): Term[] =>
    label === electronLabel
      ? [
          [recordOf("H2(g)"), stoichiometricNumber / 2],
          [recordOf("H^+(aq)"), -stoichiometricNumber],
        ]
      : [[recordOf(label), stoichiometricNumber]],
  );
}

/** The sum of a property over a reaction. */
export function sumOver(terms: readonly Term[], property: (species: SpeciesRecord) => number): number {
  return terms.reduce((sum, [species, stoichiometricNumber]) => sum + stoichiometricNumber * property(species), 0);
}

/** Moles of gas that a reaction forms. */
export function gasesFormed(terms: readonly Term[]): number {
  return sumOver(terms, ({ state }) => (state === "g" ? 1 : 0));
}

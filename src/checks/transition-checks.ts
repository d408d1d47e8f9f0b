import { houseRecord } from "../species/house-record.js";
import type { CollectionData, SpeciesRecord, Witness } from "../species/record.js";
import { speciesPlan } from "../species/species-function.js";
import { propertiesOf } from "./properties-of.js";
import { sumOver, type Term, termsOf } from "./reaction-terms.js";
import { missing, requiredInput } from "./witness-inputs.js";

/**
 * G of the upper phase less G of the lower at the published `transitionTemperature`; J/mol. The reaction names one mole
 * of each, the lower phase with -1.
 */
export function transitionGibbsEnergy(record: SpeciesRecord, witness: Witness, collection: CollectionData): number {
  const terms = termsOf(record, witness, collection);
  return gibbsEnergyAt(terms, requiredInput(record, witness, "transitionTemperature"));
}

/** H of the upper phase less H of the lower, less the published `transitionEnthalpy`, where their ranges meet; J/mol. */
export function transitionEnthalpy(record: SpeciesRecord, witness: Witness, collection: CollectionData): number {
  const terms = termsOf(record, witness, collection);
  const temperatureK = nearestInRange(record, witness, terms);
  const computed = sumOver(terms, (species) => propertiesOf(species, temperatureK).enthalpy);
  return computed - requiredInput(record, witness, "transitionEnthalpy");
}

/**
 * The temperature at which G of both phases is equal less the published `transitionTemperature`; K. Phases often have a
 * single temperature in common: the difference of G is continued from the common temperature nearest to the published
 * one with the difference of S there, dT = (G2 - G1) / (S2 - S1).
 */
export function transitionTemperature(record: SpeciesRecord, witness: Witness, collection: CollectionData): number {
  const terms = termsOf(record, witness, collection);
  const temperatureK = nearestInRange(record, witness, terms);
  const entropy = sumOver(terms, (species) => propertiesOf(species, temperatureK).entropy);
  if (entropy === 0) return missing(record, witness.check, "phases of different entropy");
  const published = requiredInput(record, witness, "transitionTemperature");
  return temperatureK - published + gibbsEnergyAt(terms, temperatureK) / entropy;
}

function gibbsEnergyAt(terms: readonly Term[], temperatureK: number): number {
  return sumOver(terms, (species) => propertiesOf(species, temperatureK).gibbsEnergy);
}

/** The temperature in the ranges of all phases that lies nearest to the published one. */
function nearestInRange(record: SpeciesRecord, witness: Witness, terms: readonly Term[]): number {
  const plans = terms.map(([species]) => speciesPlan(houseRecord(species, [species.label]), "refuse"));
  const fromK = plans.reduce((highest, plan) => Math.max(highest, plan.fromK), 0);
  const toK = plans.reduce((lowest, plan) => Math.min(lowest, plan.toK), Number.POSITIVE_INFINITY);
  if (fromK > toK) return missing(record, witness.check, "phases whose ranges have a temperature in common");
  return Math.min(Math.max(requiredInput(record, witness, "transitionTemperature"), fromK), toK);
}

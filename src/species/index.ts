export { findSpecies, speciesCollection } from "./collection.js";
export {
  type ElementOfFormation,
  type FormationConditions,
  type FormationProperties,
  formationProperties,
} from "./formation-properties.js";
export { type Grade, type SpeciesGrade, speciesGrade } from "./grade.js";
export type {
  CollectionData,
  Label,
  PhaseSequence,
  PublishedGibbsFunction,
  SpeciesRecord,
  StateSymbol,
  Witness,
  WitnessCheckName,
  WitnessGroup,
} from "./record.js";
export { findSequence } from "./sequences.js";
export { type StandardConditions, type StandardProperties, standardProperties } from "./standard-properties.js";
export type { HydrogenElectron, StableSequence, Substance } from "./substance.js";

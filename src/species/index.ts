export { findSpecies, speciesCollection } from "./collection.js";
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
export { type StandardConditions, type StandardProperties, standardProperties } from "./standard-properties.js";

export { type FaultCode, faultCodes } from "./errors/codes.js";
export type { Fault, FaultPath } from "./errors/fault.js";
export { GibbsLedgerError, isGibbsLedgerError, toFaults } from "./errors/gibbs-ledger-error.js";
export { type Formula, formula } from "./formula/formula.js";
export { molarMass } from "./formula/molar-mass.js";
export type { RangePolicy } from "./heat-capacity/range-policy.js";
export { convert, numericalValue } from "./quantity/convert.js";
export type { Figure } from "./quantity/figure.js";
export { type FormatOptions, formatQuantity } from "./quantity/format.js";
export { parseQuantity } from "./quantity/parse.js";
export {
  type MolarEnergy,
  type MolarEntropy,
  type Pressure,
  type Quantity,
  type QuantityOptions,
  quantity,
  type Temperature,
} from "./quantity/quantity.js";
export { type Dimension, isUnitCode, type UnitCode, type UnitOf } from "./quantity/units.js";
export { affinity } from "./reaction/affinity.js";
export { type Balance, type BalancedEquation, balance } from "./reaction/balance.js";
export type { UnbalancedEquation } from "./reaction/balance-participants.js";
export { combineReactions, type ReactionPart } from "./reaction/combine-reactions.js";
export type { GasComposition, LabelMap, ReactionConditions, SolutionComposition } from "./reaction/conditions.js";
export { type Ledger, ledger } from "./reaction/ledger.js";
export type { LedgerEntry, LedgerEntryName, LedgerGroup } from "./reaction/ledger-entry.js";
export type { LedgerSum } from "./reaction/ledger-sum.js";
export { type Reaction, type ReactionTerm, reaction } from "./reaction/reaction.js";
export {
  lnReactionQuotient,
  type ReactionDirection,
  reactionDirection,
  reactionGibbsEnergy,
} from "./reaction/reaction-gibbs-energy.js";
export {
  equilibriumConstant,
  type StandardReactionConditions,
  type StandardReactionProperties,
  standardReactionGibbsEnergy,
  standardReactionProperties,
} from "./reaction/standard-reaction.js";
export type { StandardState, StandardStates } from "./reaction/standard-state.js";
export { type TemperatureSearch, temperaturesAtGibbsEnergy } from "./reaction/temperatures.js";
export { formatLedger } from "./report/format-ledger.js";
export { formatReactionTable, type ReactionTableOptions } from "./report/format-reaction-table.js";
export {
  type ElementOfFormation,
  type FormationConditions,
  type FormationProperties,
  formationProperties,
} from "./species/formation-properties.js";
export type { CollectionData, Label, PhaseSequence, SpeciesRecord } from "./species/record.js";
export { type StandardConditions, type StandardProperties, standardProperties } from "./species/standard-properties.js";
export type { HydrogenElectron, StableSequence, Substance } from "./species/substance.js";

export type { GasComposition, LabelMap, ReactionConditions } from "./conditions.js";
export {
  type Ledger,
  type LedgerEntry,
  type LedgerEntryName,
  type LedgerGroup,
  type LedgerSum,
  ledger,
} from "./ledger.js";
export { type Reaction, type ReactionTerm, reaction } from "./reaction.js";
export {
  lnReactionQuotient,
  type ReactionDirection,
  reactionDirection,
  reactionGibbsEnergy,
} from "./reaction-gibbs-energy.js";
export {
  equilibriumConstant,
  type StandardReactionConditions,
  type StandardReactionProperties,
  standardReactionGibbsEnergy,
  standardReactionProperties,
  standardReactionRoundingBound,
} from "./standard-reaction.js";
export type { StandardState, StandardStates } from "./standard-state.js";
export { type TemperatureSearch, temperaturesAtGibbsEnergy } from "./temperatures.js";

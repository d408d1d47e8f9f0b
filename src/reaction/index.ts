export { affinity } from "./affinity.js";
export { type AmbiguousBalance, type Balance, type BalancedEquation, balance, type UniqueBalance } from "./balance.js";
export type { UnbalancedEquation } from "./balance-participants.js";
export { combineReactions, type ReactionPart } from "./combine-reactions.js";
export type { GasComposition, LabelMap, ReactionConditions, SolutionComposition } from "./conditions.js";
export { type Ledger, ledger } from "./ledger.js";
export type { LedgerEntry, LedgerEntryName, LedgerGroup } from "./ledger-entry.js";
export type { LedgerSum } from "./ledger-sum.js";
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

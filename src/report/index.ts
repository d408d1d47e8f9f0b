export { caution } from "./caution.js";
export { formatLedger } from "./format-ledger.js";
export { formatReactionTable, type ReactionTableOptions } from "./format-reaction-table.js";

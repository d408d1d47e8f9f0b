import { houseReaction, type Reaction } from "../reaction/reaction.js";
import { readThrough } from "./read-through.js";

/**
 * Reads a reaction from JSON, as `JSON.stringify` wrote what `reaction` or `combineReactions` returned: terms with their
 * species, equation and notes. The terms decide; the equation is written anew from them.
 *
 * @param input - a JSON text of at most 64 MiB and 100 levels, with or without a byte order mark; or parsed JSON
 * @returns the house's own copy, checked in full and frozen
 * @throws GibbsLedgerError with every fault at once: those of `readSpecies`, "reaction/not-a-reaction",
 * "reaction/invalid", "reaction/unbalanced"; paths begin at the top of the text
 * @example
 * import { referenceData } from "gibbs-ledger/data";
 * const text = JSON.stringify(reaction("N2 + 3 H2 = 2 NH3", referenceData));
 * readReaction(text).equation; // => "N2(g) + 3 H2(g) = 2 NH3(g)"
 */
export function readReaction(input: unknown): Reaction {
  return readThrough(
    input,
    (value) => houseReaction(value as Reaction),
    (path) => (path[0] === "reaction" ? path.slice(1) : path),
  );
}

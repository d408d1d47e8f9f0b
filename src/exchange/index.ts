export { readCollection } from "./read-collection.js";
export { readReaction } from "./read-reaction.js";
export { readSpecies } from "./read-species.js";

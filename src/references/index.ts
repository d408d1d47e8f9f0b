export { type Citation, type Reference, references } from "./bibliography.js";
export type { Origin, Source } from "./source.js";

import { speciesCollection } from "../species/collection.js";
import type { CollectionData } from "../species/record.js";
import { readThrough } from "./read-through.js";

/**
 * Reads a collection from JSON: an object with `species` and perhaps `sequences`, or an array of species records.
 *
 * @param input - a JSON text of at most 64 MiB and 100 levels, with or without a byte order mark; or parsed JSON
 * @returns the house's own copy, checked in full, frozen and indexed, as `speciesCollection` returns it
 * @throws GibbsLedgerError with the faults of all records at once, at most 100: those of `readSpecies` and of
 * `speciesCollection`; the path of each begins at the top of the text, as `["species", 3, "label"]`, or in an array of
 * records with the index of the record, as `[3, "label"]`
 * @example
 * import { referenceData } from "gibbs-ledger/data";
 * const collection = readCollection(JSON.stringify(referenceData));
 * findSpecies(collection, "NH3(g)").name; // => "ammonia"
 * readCollection("[{}]"); // throws input/missing
 */
export function readCollection(input: unknown): CollectionData {
  let isArray = false;
  return readThrough(
    input,
    (value) => {
      isArray = Array.isArray(value);
      return speciesCollection((isArray ? { species: value } : value) as CollectionData);
    },
    // The guard's paths begin with "collection", and then with "species".
    (path) => path.slice(isArray ? 2 : 1),
  );
}

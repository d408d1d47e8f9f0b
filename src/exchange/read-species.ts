import { houseRecord } from "../species/house-record.js";
import type { SpeciesRecord } from "../species/record.js";
import { readThrough } from "./read-through.js";

/**
 * Reads a species record from JSON: checked in full by the rules of every function that takes a record, copied and
 * frozen. Writing is `JSON.stringify(record)`; what is read back has the same bits.
 *
 * Reads no files: hand over the text.
 *
 * @param input - a JSON text of at most 64 MiB and 100 levels, with or without a byte order mark; or parsed JSON
 * @returns the house's own copy of the record
 * @throws GibbsLedgerError with every fault at once: "exchange/not-json" (line and column in the message),
 * "exchange/duplicate-key", "exchange/too-deep", "input/too-large", "input/forbidden-key", "input/not-finite" (numbers
 * such as 1e999), and the faults of a wrong record; paths begin at the top of the text
 * @see `references.bray2017`
 * @example
 * import { Ar_g } from "gibbs-ledger/data";
 * const argon = readSpecies(JSON.stringify(Ar_g));
 * argon.name; // => "argon"
 * readSpecies('{ "label": "Ar(g)", }'); // throws exchange/not-json
 */
export function readSpecies(input: unknown): SpeciesRecord {
  return readThrough(
    input,
    (value) => houseRecord(value as SpeciesRecord),
    (path) => path,
  );
}

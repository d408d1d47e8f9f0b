import type { Fault, FaultPath } from "../errors/fault.js";
import { frozenCopy } from "../errors/frozen-copy.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkRecord } from "./check-record.js";
import type { SpeciesRecord } from "./record.js";

/** From a caller's object, and from the house's own copy, to the checked and deep-frozen copy. */
const houseRecords = new WeakMap<object, SpeciesRecord>();

/**
 * The house's own copy of a record. An object that is seen for the first time is checked in full, copied and frozen;
 * changes made to it later are not seen.
 *
 * @throws GibbsLedgerError with every fault of the record
 */
export function houseRecord(record: SpeciesRecord, path: FaultPath = []): SpeciesRecord {
  const faults: Fault[] = [];
  const house = collectHouseRecord(record, path, faults);
  failIfAny(faults);
  return house as SpeciesRecord;
}

/** Like {@link houseRecord}, but collects the faults; undefined after a fault. */
export function collectHouseRecord(record: unknown, path: FaultPath, faults: Fault[]): SpeciesRecord | undefined {
  const known = typeof record === "object" && record !== null ? houseRecords.get(record) : undefined;
  if (known !== undefined) return known;
  if (!checkRecord(record, path, faults)) return undefined;
  const house = frozenCopy(record);
  houseRecords.set(record, house);
  houseRecords.set(house, house);
  return house;
}

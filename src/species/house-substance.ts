import { describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import { frozenCopy } from "../errors/frozen-copy.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkArray, checkObject, checkText } from "../errors/input.js";
import { labelPartsOf } from "../formula/parse-label.js";
import { readFormula } from "../formula/read-formula.js";
import { checkProvenance } from "../references/check-source.js";
import { collectHouseRecord } from "./house-record.js";
import { checkJoins } from "./join-phases.js";
import type { PhaseSequence, SpeciesRecord } from "./record.js";
import { electronLabel, type HydrogenElectron, type StableSequence, type Substance } from "./substance.js";

/** From a caller's object, and from the house's own copy, to the checked and frozen copy. */
const houseSubstances = new WeakMap<object, Substance>();

/** The most phases of a sequence. */
const mostPhases = 50;

/**
 * The house's own copy of a record, a stable sequence or an electron, checked in full when it is seen for the first
 * time.
 *
 * @throws GibbsLedgerError with every fault
 */
export function houseSubstance(value: Substance, path: FaultPath = []): Substance {
  const faults: Fault[] = [];
  const house = collectHouseSubstance(value, path, faults);
  failIfAny(faults);
  return house as Substance;
}

/** Like {@link houseSubstance}, but collects the faults; undefined after a fault. */
export function collectHouseSubstance(value: unknown, path: FaultPath, faults: Fault[]): Substance | undefined {
  if (typeof value !== "object" || value === null) return collectHouseRecord(value, path, faults);
  const known = houseSubstances.get(value);
  if (known !== undefined) return known;
  const house =
    "phases" in value
      ? adoptSequence(value, path, faults)
      : "hydrogen" in value
        ? adoptElectron(value, path, faults)
        : collectHouseRecord(value, path, faults);
  if (house !== undefined) houseSubstances.set(value, house);
  return house;
}

/** The electron resolved through a record of H2(g) of the house. */
export function electronOf(hydrogen: SpeciesRecord): HydrogenElectron {
  return register(Object.freeze({ label: electronLabel, hydrogen }));
}

/** A stable sequence over records of the house, checked; undefined after a fault. */
export function sequenceOf(
  { label, source, origin }: Pick<PhaseSequence, "label" | "source" | "origin">,
  phases: readonly SpeciesRecord[],
  path: FaultPath,
  faults: Fault[],
): StableSequence | undefined {
  const before = faults.length;
  const read = readFormula(label, [...path, "label"], faults);
  if (read === undefined) return undefined;
  if (read.counts.length === 0) {
    faults.push({
      code: "species/inconsistent",
      path: [...path, "label"],
      message: `${label} has no phases`,
      received: describeReceived(label),
      expected: "a substance of elements",
    });
    return undefined;
  }
  const parts = labelPartsOf(read);
  const sequence: StableSequence = {
    label,
    formula: parts.formula,
    chargeNumber: parts.chargeNumber,
    ...(parts.state === undefined ? {} : { state: parts.state as NonNullable<StableSequence["state"]> }),
    phases: Object.freeze([...phases]),
    source: frozenCopy(source),
    origin,
  };
  phases.forEach((phase, index) => {
    if (parts.state === undefined || phase.state === parts.state) return;
    faults.push({
      code: "species/inconsistent",
      path: [...path, "phases", index],
      message: `${phase.label} is no phase of ${label}`,
      received: phase.label,
      expected: `phases of state ${parts.state}`,
    });
  });
  if (phases.length === 0) {
    faults.push({ code: "input/missing", path: [...path, "phases"], message: "a sequence has at least one phase" });
  }
  if (faults.length === before) checkJoins(sequence, path, faults);
  return faults.length === before ? register(Object.freeze(sequence)) : undefined;
}

function register<S extends Substance>(substance: S): S {
  houseSubstances.set(substance, substance);
  return substance;
}

function adoptSequence(value: object, path: FaultPath, faults: Fault[]): StableSequence | undefined {
  const before = faults.length;
  const members = checkObject(value, path, faults, {
    required: ["label", "formula", "chargeNumber", "phases", "source", "origin"],
    optional: ["state"],
  });
  if (members?.label !== undefined) checkText(members.label, [...path, "label"], faults, 500);
  if (members !== undefined) checkProvenance(members, path, faults);
  const phases =
    members?.phases === undefined ? undefined : checkArray(members.phases, [...path, "phases"], faults, mostPhases);
  const records = phases?.map((phase, index) => collectHouseRecord(phase, [...path, "phases", index], faults));
  if (faults.length > before) return undefined;
  const given = members as StableSequence;
  const house = sequenceOf(given, records as SpeciesRecord[], path, faults);
  if (house === undefined) return undefined;
  for (const key of ["formula", "chargeNumber", "state"] as const) {
    if (house[key] === given[key]) continue;
    faults.push({
      code: "species/inconsistent",
      path: [...path, key],
      message: `the label ${house.label} says ${key} ${house[key] ?? "none"}, the sequence ${describeReceived(given[key])}`,
      received: describeReceived(given[key]),
    });
  }
  return faults.length === before ? house : undefined;
}

function adoptElectron(value: object, path: FaultPath, faults: Fault[]): HydrogenElectron | undefined {
  const before = faults.length;
  const members = checkObject(value, path, faults, { required: ["label", "hydrogen"], optional: [] });
  if (members?.hydrogen === undefined) return undefined;
  const hydrogen = collectHouseRecord(members.hydrogen, [...path, "hydrogen"], faults);
  if (hydrogen !== undefined && (members.label !== electronLabel || hydrogen.label !== hydrogenLabel)) {
    faults.push({
      code: "species/inconsistent",
      path,
      message: `an electron is labelled ${electronLabel} and resolved through ${hydrogenLabel}`,
      received: describeReceived(members.label),
    });
  }
  return faults.length === before && hydrogen !== undefined ? electronOf(hydrogen) : undefined;
}

/** The gas that the standard-hydrogen convention refers to. */
export const hydrogenLabel = "H2(g)";

import { describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import { isGibbsLedgerError } from "../errors/gibbs-ledger-error.js";
import { checkArray, checkNumber, checkObject, checkOption, checkText, type Members } from "../errors/input.js";
import { parseLabel } from "../formula/parse-label.js";
import { checkSeries, seriesKeys } from "../heat-capacity/check-series.js";
import { carriesConstants } from "../heat-capacity/forms.js";
import type { PublishedSeries } from "../heat-capacity/published-series.js";
import { checkFigure, checkUncertainty } from "../quantity/check-figure.js";
import type { Dimension } from "../quantity/units.js";
import { checkProvenance, checkSource } from "../references/check-source.js";
import { checkContinuation } from "./check-continuation.js";
import type { SpeciesRecord, StateSymbol, Witness } from "./record.js";

/** IUPAC state symbols of records. */
export const stateSymbols: readonly StateSymbol[] = ["g", "l", "cr", "am", "aq", "s"];

const figureDimensions = {
  standardPressure: "pressure",
  formationEnthalpy: "molarEnergy",
  standardEntropy: "molarEntropy",
  formationGibbsEnergy: "molarEnergy",
  enthalpyAbove0K: "molarEnergy",
} as const satisfies Record<string, Dimension>;

const criticalDimensions = {
  temperature: "temperature",
  pressure: "pressure",
  acentricFactor: "fraction",
  volume: "molarVolume",
} as const satisfies Record<string, Dimension>;

const volumeDimensions = {
  molar: "molarVolume",
  thermalExpansion: "reciprocalTemperature",
  compressibility: "reciprocalPressure",
} as const satisfies Record<string, Dimension>;

/** What a label says of a record. */
const identityKeys = ["label", "formula", "chargeNumber", "state", "polymorph"];

/**
 * Checks a species record in full and collects every fault.
 *
 * @returns whether the value is a record
 */
export function checkRecord(value: unknown, path: FaultPath, faults: Fault[]): value is SpeciesRecord {
  const before = faults.length;
  const record = checkObject(value, path, faults, {
    required: ["label", "name", "formula", "chargeNumber", "state", "standardPressure", "gibbsFunction", "witnesses"],
    optional: [
      "polymorph",
      "casNumber",
      "convention",
      "formationEnthalpy",
      "standardEntropy",
      "formationGibbsEnergy",
      "enthalpyAbove0K",
      "transitions",
      "critical",
      "volume",
    ],
  });
  if (record === undefined) return false;
  for (const key of ["label", "name", "formula", "polymorph", "casNumber", "convention"] as const) {
    if (record[key] !== undefined) checkText(record[key], [...path, key], faults, 500);
  }
  if (record.chargeNumber !== undefined) checkCharge(record.chargeNumber, [...path, "chargeNumber"], faults);
  if (record.state !== undefined) checkOption(record.state, [...path, "state"], faults, stateSymbols);
  checkFigures(record, figureDimensions, path, faults);
  checkStandardPressure(record.standardPressure, [...path, "standardPressure", "value"], faults);
  if (record.gibbsFunction !== undefined) checkGibbsFunction(record, [...path, "gibbsFunction"], faults);
  if (record.transitions !== undefined) checkTransitions(record.transitions, [...path, "transitions"], faults);
  if (record.critical !== undefined) {
    checkFigureGroup(record.critical, criticalDimensions, ["temperature", "pressure"], [...path, "critical"], faults);
  }
  if (record.volume !== undefined) {
    checkFigureGroup(record.volume, volumeDimensions, ["molar"], [...path, "volume"], faults);
  }
  if (record.witnesses !== undefined) checkWitnesses(record.witnesses, [...path, "witnesses"], faults);
  const found = faults.slice(before);
  const isWrong = (key: string): boolean => found.some((fault) => fault.path[path.length] === key);
  if (!identityKeys.some(isWrong)) checkLabel(record as SpeciesRecord, path, faults);
  if (found.length === 0) checkContinuation(record as SpeciesRecord, path, faults);
  return faults.length === before;
}

function checkCharge(value: unknown, path: FaultPath, faults: Fault[]): void {
  const charge = checkNumber(value, path, faults);
  if (charge === undefined || (Number.isInteger(charge) && Math.abs(charge) <= 20)) return;
  faults.push({
    code: "species/invalid-record",
    path,
    message: `a charge number is a whole number from -20 to 20, got ${charge}`,
    received: String(charge),
    expected: "such as -2 for a doubly negative ion",
  });
}

function checkFigures(
  members: Members,
  dimensions: Readonly<Record<string, Dimension>>,
  path: FaultPath,
  faults: Fault[],
): void {
  for (const [key, dimension] of Object.entries(dimensions)) {
    if (members[key] !== undefined) checkFigure(members[key], dimension, [...path, key], faults);
  }
}

function checkStandardPressure(figure: unknown, path: FaultPath, faults: Fault[]): void {
  const value = (figure as { readonly value?: unknown } | null | undefined)?.value;
  if (typeof value !== "number" || !(value <= 0)) return;
  faults.push({
    code: "quantity/not-positive",
    path,
    message: `a standard pressure is above 0, got ${value}`,
    received: String(value),
    expected: "such as 1 bar",
  });
}

function checkFigureGroup(
  value: unknown,
  dimensions: Readonly<Record<string, Dimension>>,
  required: readonly string[],
  path: FaultPath,
  faults: Fault[],
): void {
  const optional = Object.keys(dimensions).filter((key) => !required.includes(key));
  const members = checkObject(value, path, faults, { required, optional });
  if (members !== undefined) checkFigures(members, dimensions, path, faults);
}

function checkGibbsFunction(record: Members, path: FaultPath, faults: Fault[]): void {
  const kind = (record["gibbsFunction"] as { kind?: unknown } | null)?.kind;
  if (kind === "reference-point") {
    checkObject(record["gibbsFunction"], path, faults, { required: ["kind"], optional: [] });
    requireReferenceFigures(record, "a reference point", path, faults);
    return;
  }
  const before = faults.length;
  const members = checkObject(record["gibbsFunction"], path, faults, {
    required: [...seriesKeys.required, "source", "origin"],
    optional: [...seriesKeys.optional, "where"],
  });
  if (members === undefined) return;
  if (kind !== undefined && kind !== "series") {
    checkOption(kind, [...path, "kind"], faults, ["series", "reference-point"]);
    return;
  }
  checkProvenance(members, path, faults);
  checkSeries(members, path, faults);
  if (faults.length > before) return;
  const series = members as PublishedSeries;
  if (!carriesConstants(series.form) && series.anchor === undefined) {
    requireReferenceFigures(record, `the ${series.form} form without an anchor`, path, faults);
  }
}

function requireReferenceFigures(record: Members, reason: string, path: FaultPath, faults: Fault[]): void {
  for (const key of ["formationEnthalpy", "standardEntropy"]) {
    if (record[key] !== undefined) continue;
    faults.push({
      code: "heat-capacity/no-anchor",
      path: [...path.slice(0, -1), key],
      message: `${reason} needs ${key} at 298.15 K`,
      expected: `${key} as a figure`,
    });
  }
}

function checkTransitions(value: unknown, path: FaultPath, faults: Fault[]): void {
  checkArray(value, path, faults, 100)?.forEach((entry, index) => {
    const here = [...path, index];
    const transition = checkObject(entry, here, faults, {
      required: ["temperature", "into", "enthalpy"],
      optional: [],
    });
    if (transition === undefined) return;
    if (transition.into !== undefined) checkText(transition.into, [...here, "into"], faults);
    checkFigures(transition, { temperature: "temperature", enthalpy: "molarEnergy" }, here, faults);
  });
}

function checkWitnesses(value: unknown, path: FaultPath, faults: Fault[]): void {
  checkArray(value, path, faults, 1000)?.forEach((entry, index) => {
    const here = [...path, index];
    const witness = checkObject<keyof Witness, keyof Witness>(entry, here, faults, {
      required: ["group", "kind", "check", "deviation", "tolerance", "source"],
      optional: ["against", "reaction", "over"],
    });
    if (witness === undefined) return;
    if (witness.group !== undefined) {
      checkOption(witness.group, [...here, "group"], faults, ["caloric", "formation", "critical", "volume"]);
    }
    if (witness.kind !== undefined) {
      checkOption(witness.kind, [...here, "kind"], faults, ["transcription", "physical"]);
    }
    if (witness.check !== undefined) checkText(witness.check, [...here, "check"], faults);
    for (const key of ["deviation", "tolerance"] as const) {
      if (witness[key] !== undefined) checkNumber(witness[key], [...here, key], faults);
    }
    if (witness.against !== undefined) checkAgainst(witness.against, [...here, "against"], faults);
    if (witness.reaction !== undefined) {
      const numbers = checkObject(witness.reaction, [...here, "reaction"], faults, { required: [], optional: "any" });
      for (const [label, number] of Object.entries(numbers ?? {})) {
        checkNumber(number, [...here, "reaction", label], faults);
      }
    }
    if (witness.over !== undefined) checkOver(witness.over, [...here, "over"], faults);
    if (witness.source !== undefined) checkSource(witness.source, [...here, "source"], faults);
  });
}

/** Figures of any dimension, by name. */
function checkAgainst(value: unknown, path: FaultPath, faults: Fault[]): void {
  const figures = checkObject(value, path, faults, { required: [], optional: "any" });
  for (const [name, figure] of Object.entries(figures ?? {})) {
    const members = checkObject(figure, [...path, name], faults, {
      required: ["value", "unit", "source", "origin"],
      optional: ["uncertainty", "where"],
    });
    if (members === undefined) continue;
    if (members.value !== undefined) checkNumber(members.value, [...path, name, "value"], faults);
    if (members.unit !== undefined) checkText(members.unit, [...path, name, "unit"], faults);
    if (members.uncertainty !== undefined)
      checkUncertainty(members.uncertainty, [...path, name, "uncertainty"], faults);
    checkProvenance(members, [...path, name], faults);
  }
}

function checkOver(value: unknown, path: FaultPath, faults: Fault[]): void {
  const ends = checkArray(value, path, faults, 2);
  if (ends === undefined) return;
  const [from, to] = [0, 1].map((end) => checkNumber(ends[end], [...path, end], faults));
  if (from === undefined || to === undefined || from <= to) return;
  faults.push({
    code: "species/invalid-record",
    path,
    message: `a witness speaks from ${from} K to ${to} K`,
    expected: "a lower and a higher temperature in kelvin",
  });
}

/** Checks that the label of a record says the same as its formula, charge, state and polymorph. */
export function checkLabel(record: SpeciesRecord, path: FaultPath, faults: Fault[]): void {
  try {
    const parts = parseLabel(record.label);
    const said = { formula: parts.formula, charge: parts.chargeNumber, state: parts.state, polymorph: parts.polymorph };
    const meant = {
      formula: parseLabel(record.formula).formula,
      charge: record.chargeNumber,
      state: record.state,
      polymorph: record.polymorph,
    };
    for (const key of ["formula", "charge", "state", "polymorph"] as const) {
      if (said[key] === meant[key]) continue;
      faults.push({
        code: "species/inconsistent",
        path: [...path, "label"],
        message: `the label ${record.label} says ${key} ${said[key] ?? "none"}, the record ${meant[key] ?? "none"}`,
        received: describeReceived(record.label),
      });
    }
    if (parts.label !== record.label) {
      faults.push({
        code: "species/inconsistent",
        path: [...path, "label"],
        message: `the label ${record.label} is spelled ${parts.label}`,
        received: describeReceived(record.label),
        expected: parts.label,
      });
    }
  } catch (error) {
    if (!isGibbsLedgerError(error)) throw error;
    faults.push(...error.faults.map((fault) => ({ ...fault, path: [...path, "label", ...fault.path] })));
  }
}

import { referenceData } from "../../src/data/reference-data.js";
import { formula } from "../../src/formula/formula.js";
import type { CollectionData, SpeciesRecord } from "../../src/species/record.js";
import { figure } from "../heat-capacity/random-series.js";
import { recordOf } from "../species/records.js";

/** H(298.15 K) - H(0 K) in kJ/mol, CODATA Key Values (1989), from memory; half-widths 0.02, 0.006, 0.04. */
const increments = { "C(cr,graphite)": 1.05, "S(cr,rhombic)": 4.412, "Ca(cr)": 5.736 } as const;

/** Elements without state, and the phase that is their reference at 298.15 K. */
const references = [
  ["H2", "H2(g)"],
  ["N2", "N2(g)"],
  ["O2", "O2(g)"],
  ["He", "He(g)"],
  ["Ar", "Ar(g)"],
  ["C", "C(cr,graphite)"],
  // Two moles of the solid for one of what the label says.
  ["S2", "S(cr,rhombic)"],
  ["Ca", "Ca(cr)"],
] as const;

/**
 * The gases, solids and liquids that the tests react, with reference states for all their elements: the records of the
 * reference data, and stand-ins for the element phases that have no increment of enthalpy there.
 */
export function elementCollection(records: readonly SpeciesRecord[] = referenceData.species): CollectionData {
  const species = records.map((record) => withIncrement(record));
  for (const label of Object.keys(increments)) {
    if (!species.some((record) => record.label === label)) species.push(withIncrement(recordOf(label)));
  }
  const sequences = references.map(([label, phase]) => ({
    label,
    phases: [phase],
    source: { text: "reference states for a test" },
    origin: "memory" as const,
  }));
  return { species, sequences };
}

function withIncrement(record: SpeciesRecord): SpeciesRecord {
  const increment = (increments as Readonly<Record<string, number>>)[record.label];
  if (increment === undefined || record.enthalpyAbove0K !== undefined) return record;
  return { ...record, enthalpyAbove0K: figure(increment, "kJ/mol") };
}

const elements = new Set(references.flatMap(([label]) => Object.keys(formula(label).composition)));

/** Whether all elements of a record have a reference state here. */
export function isOfTheseElements(record: SpeciesRecord): boolean {
  return Object.keys(formula(record.formula).composition).every((symbol) => elements.has(symbol));
}

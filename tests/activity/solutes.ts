import { H2_g, H2O_l } from "../../src/data/index.js";
import type { Figure } from "../../src/quantity/figure.js";
import type { CollectionData, SpeciesRecord } from "../../src/species/record.js";
import { recordOf } from "../species/records.js";

function codata(value: number, unit: string, halfWidth: number): Figure {
  return { value, unit, uncertainty: { halfWidth, coverage: 0.95 }, source: "cox1989", origin: "memory" };
}

/** A record of CODATA Key Values (1989), recalled: kJ/mol and J/mol/K at 298.15 K with their half-widths. */
function keyValues(label: string, enthalpy: number, enthalpyHalf: number, entropy: number, entropyHalf: number) {
  return recordOf(label, {
    formationEnthalpy: codata(enthalpy, "kJ/mol", enthalpyHalf),
    standardEntropy: codata(entropy, "J/mol/K", entropyHalf),
  });
}

export const hydron: SpeciesRecord = keyValues("H^+(aq)", 0, 0, 0, 0);
export const hydroxide: SpeciesRecord = keyValues("OH^-(aq)", -230.015, 0.04, -10.9, 0.2);
export const sodium: SpeciesRecord = keyValues("Na^+(aq)", -240.34, 0.06, 58.45, 0.15);
export const chloride: SpeciesRecord = keyValues("Cl^-(aq)", -167.08, 0.1, 56.6, 0.2);
export const silver: SpeciesRecord = keyValues("Ag^+(aq)", 105.79, 0.08, 73.45, 0.4);
export const silverMetal: SpeciesRecord = keyValues("Ag(cr)", 0, 0, 42.55, 0.2);
export const silverChloride: SpeciesRecord = keyValues("AgCl(cr)", -127.01, 0.05, 96.25, 0.2);

/** Dissolved sucrose, invented: a solute that takes part in nothing. */
export const sucrose: SpeciesRecord = recordOf("C12H22O11(aq)");

/** The species of the tests of solutions, with the reference data's own water and hydrogen. */
export const solutes: CollectionData = {
  species: [H2O_l, H2_g, hydron, hydroxide, sodium, chloride, silver, silverMetal, silverChloride, sucrose],
};

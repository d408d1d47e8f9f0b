import { referenceData } from "../../src/data/reference-data.js";
import { quantity } from "../../src/quantity/quantity.js";
import type { Reaction } from "../../src/reaction/reaction.js";
import { findSpecies } from "../../src/species/collection.js";
import type { SpeciesRecord } from "../../src/species/record.js";
import { standardProperties } from "../../src/species/standard-properties.js";

/** Functions of one species as tables print them; energies in kJ/mol, the rest in J/mol/K. */
export interface TableFunctions {
  readonly heatCapacity: number;
  readonly entropy: number;
  /** -(G - H(298.15 K)) / T */
  readonly gibbsFunction: number;
  /** H - H(298.15 K) */
  readonly enthalpyIncrement: number;
}

/**
 * Relative error of a fitted heat capacity. Measured on N2, H2, CO, N and O, whose heat capacities both sources take
 * from spectroscopic levels (largest 2.3e-4), and rounded up; relative errors of Cp carry over to the integrals.
 */
const fitError = 4e-4;

/** Change of R from 8.31441 to 8.31451 J/mol/K, in which the older and the newer statistical mechanics are printed. */
const gasConstantChange = 1.3e-5;

/** Heat capacities that are 5/2 R at every temperature up to 2000 K: no fit error. */
const exactHeatCapacity = new Set(["He(g)", "Ar(g)", "H(g)"]);

/**
 * 95 percent half-widths of formation enthalpies in kJ/mol whose record carries none: JANAF (Chase 1998) on its own
 * values, Robie and Hemingway (1995) on calcite; origin: memory.
 */
const formationHalfWidth: Readonly<Record<string, number>> = {
  "CH4(g)": 0.34,
  "NO(g)": 0.17,
  "NO2(g)": 0.8,
  "SO3(g)": 0.71,
  "CaCO3(cr,calcite)": 1.3,
};

/** The record of a label of the reference data. */
export function recordOf(label: string): SpeciesRecord {
  return findSpecies(referenceData, label);
}

/** The four functions of a species as the library computes them. */
export function computedFunctions(label: string, temperatureK: number): TableFunctions {
  const record = recordOf(label);
  const here = standardProperties(record, { temperature: quantity(temperatureK, "K") });
  const reference = standardProperties(record, { temperature: quantity(298.15, "K") });
  const increment = here.enthalpy.value - reference.enthalpy.value;
  return {
    heatCapacity: here.heatCapacity?.value ?? Number.NaN,
    entropy: here.entropy.value,
    gibbsFunction: here.entropy.value - increment / temperatureK,
    enthalpyIncrement: increment / 1000,
  };
}

/**
 * How far the functions of two good evaluations of a species may lie apart, rounding left out: the stated uncertainty
 * of the entropy at 298.15 K, the change of the gas constant, and the error of the fit carried through the integrals.
 */
export function spreadOfFunctions(label: string, temperatureK: number): TableFunctions {
  const { heatCapacity, entropy, gibbsFunction, enthalpyIncrement } = computedFunctions(label, temperatureK);
  const entropyAtReference = computedFunctions(label, 298.15).entropy;
  const fit = exactHeatCapacity.has(label) ? gasConstantChange : fitError;
  const entropySpread = halfWidth(recordOf(label).standardEntropy) + gasConstantChange * entropy;
  const singlet = label === "O2(g)" ? singletOxygen(temperatureK) : noSinglets;
  return {
    heatCapacity: fit * heatCapacity + singlet.heatCapacity,
    entropy: entropySpread + fit * (entropy - entropyAtReference) + singlet.entropy,
    gibbsFunction: entropySpread + fit * (gibbsFunction - entropyAtReference) + singlet.gibbsFunction,
    enthalpyIncrement: fit * enthalpyIncrement + singlet.enthalpyIncrement,
  };
}

/** Half-width of a formation enthalpy at 298.15 K in kJ/mol: the record's own, else the one listed here. */
export function formationSpread(label: string): number {
  return formationHalfWidth[label] ?? halfWidth(recordOf(label).formationEnthalpy);
}

/** Combined spread of the enthalpy and Gibbs energy of a reaction, kJ/mol; formation enthalpies of `moved` left out. */
export function spreadOfReaction(
  { terms }: Reaction,
  temperatureK: number,
  moved?: string,
): { readonly enthalpy: number; readonly gibbsEnergy: number } {
  let enthalpy = 0;
  let gibbsEnergy = 0;
  for (const { label, coefficient } of terms) {
    const weight = Math.abs(coefficient);
    const formation = label === moved ? 0 : formationSpread(label);
    const { enthalpyIncrement, gibbsFunction } = spreadOfFunctions(label, temperatureK);
    enthalpy += weight * (formation + enthalpyIncrement);
    gibbsEnergy += weight * (formation + (gibbsFunction * temperatureK) / 1000);
  }
  return { enthalpy, gibbsEnergy };
}

/** R ln 10 in kJ/mol/K: Gibbs energies over this and T are decimal logarithms of K. */
export const gasConstantTimesLn10 = 0.0191447576;

/** Words of a label joined by hyphens, for the ids of rows. */
export function slug(label: string): string {
  return label.replaceAll(/[^A-Za-z0-9.]+/g, "-").replaceAll(/^-|-$/g, "");
}

/** Two significant figures, rounded down: a tolerance is never widened by its printing. */
export function tidy(tolerance: number): number {
  const scale = 10 ** (1 - Math.floor(Math.log10(tolerance)));
  return Number((Math.floor(tolerance * scale) / scale).toPrecision(2));
}

function halfWidth(figure: SpeciesRecord["standardEntropy"]): number {
  const uncertainty = figure?.uncertainty;
  return uncertainty !== undefined && "halfWidth" in uncertainty ? uncertainty.halfWidth : 0;
}

const noSinglets: TableFunctions = { heatCapacity: 0, entropy: 0, gibbsFunction: 0, enthalpyIncrement: 0 };

/**
 * A tenth of what the a singlet state of O2 (11390 K above the triplet, two states to three) adds to its functions: the
 * evaluations of 1977 and 1989 treat the vibration and rotation of that state differently.
 */
function singletOxygen(temperatureK: number): TableFunctions {
  const share = 0.1;
  const reduced = 11390 / temperatureK;
  const population = (2 / 3) * Math.exp(-reduced);
  return {
    heatCapacity: share * 8.314 * reduced * reduced * population,
    entropy: share * 8.314 * (reduced + 1) * population,
    gibbsFunction: share * 8.314 * population,
    enthalpyIncrement: (share * 8.314 * 11390 * population) / 1000,
  };
}

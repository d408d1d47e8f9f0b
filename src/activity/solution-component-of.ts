import type { FaultPath } from "../errors/fault.js";
import { isGibbsLedgerError } from "../errors/gibbs-ledger-error.js";
import { molarMass } from "../formula/molar-mass.js";
import { decimalOf, decimalToNumber } from "../numeric/exact-decimal.js";
import { houseRecord } from "../species/house-record.js";
import type { SpeciesRecord } from "../species/record.js";
import type { SolutionComponent } from "./activity-model.js";

const components = new WeakMap<SpeciesRecord, SolutionComponent>();

/**
 * The component of a solution that a species record describes: its label, its charge number and its molar mass.
 *
 * @param record - a species record
 * @param path - where the record lies in the caller's input, for faults
 * @returns the component, frozen; without a molar mass where an element has no standard atomic weight. An ion's molar
 * mass leaves out its missing or excess electrons, as `molarMass` does; over a solution without net charge they cancel
 * @throws GibbsLedgerError with every fault of the record
 * @see `references.prohaska2022`
 * @example
 * const { chargeNumber, molarMassKgPerMol } = solutionComponentOf(H2O_l);
 * chargeNumber; // => 0
 * molarMassKgPerMol; // => 0.018015
 */
export function solutionComponentOf(record: SpeciesRecord, path: FaultPath = []): SolutionComponent {
  const house = houseRecord(record, path);
  const known = components.get(house);
  if (known !== undefined) return known;
  const { label, chargeNumber, formula } = house;
  const mass = molarMassKgPerMolOf(formula);
  const component = Object.freeze({
    label,
    chargeNumber,
    ...(mass === undefined ? {} : { molarMassKgPerMol: mass }),
  });
  components.set(house, component);
  return component;
}

function molarMassKgPerMolOf(formula: string): number | undefined {
  try {
    // The sum of published weights is a decimal: 22.98976928 g/mol are 0.02298976928 kg/mol, which its double / 1000 is not.
    const { mantissa, exponent } = decimalOf(molarMass(formula).value);
    return decimalToNumber({ mantissa, exponent: exponent - 3 });
  } catch (error) {
    if (isGibbsLedgerError(error, "formula/no-atomic-weight")) return undefined;
    throw error;
  }
}

import { avogadroConstant } from "../constants/constants.js";
import type { SpeciesRecord, Witness } from "../species/record.js";
import { optionalInput, requiredFigure, requiredInput } from "./witness-inputs.js";

/** Cubic angstroms in a cubic metre. */
const cubicAngstromM3 = 1e-30;

/**
 * Relative deviation of the molar volume of a unit cell from the record's: cubic with `cellEdgeA`, hexagonal axes with
 * `cellEdgeA` and `cellEdgeC`; `formulaUnits` a cell.
 */
export function unitCellVolume(record: SpeciesRecord, witness: Witness): number {
  const a = requiredInput(record, witness, "cellEdgeA");
  const c = optionalInput(witness, "cellEdgeC");
  const cell = c === undefined ? a * a * a : Math.sqrt(0.75) * a * a * c;
  const computed = (cell * cubicAngstromM3 * avogadroConstant.value) / requiredInput(record, witness, "formulaUnits");
  return computed / molarVolume(record, witness) - 1;
}

/** Relative deviation of `molarMass` over a measured `density` from the record's molar volume. */
export function molarVolumeFromDensity(record: SpeciesRecord, witness: Witness): number {
  const densityKgPerM3 = requiredInput(record, witness, "density") * 1000;
  return requiredInput(record, witness, "molarMass") / densityKgPerM3 / molarVolume(record, witness) - 1;
}

function molarVolume(record: SpeciesRecord, { check }: Witness): number {
  return requiredFigure(record, check, "molar volume", record.volume?.molar);
}

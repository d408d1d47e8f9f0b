import { exactDot, exactSum } from "../numeric/compensated.js";

/**
 * Molalities from mole fractions, m = x / (x(solvent) M(solvent)), in mol/kg.
 *
 * @returns one per solute; Infinity where no double holds it
 */
export function molalitiesOfMoleFractions(
  moleFractions: readonly number[],
  solventMoleFraction: number,
  solventMolarMassKgPerMol: number,
): number[] {
  const kilogramsPerMol = solventMoleFraction * solventMolarMassKgPerMol;
  return moleFractions.map((fraction) => (fraction === 0 ? 0 : fraction / kilogramsPerMol));
}

/**
 * Mass of solvent in a volume of solution, w = rho - sum of c M, in kg/m3.
 *
 * @param massDensityKgPerM3 - of the whole solution
 * @param concentrations - of the solutes in mol/m3
 * @param molarMasses - of the solutes in kg/mol, in the same order
 * @returns rounded once, and so independent of the order; 0 or less where the solutes weigh more than the solution
 */
export function solventMassConcentration(
  massDensityKgPerM3: number,
  concentrations: readonly number[],
  molarMasses: readonly number[],
): number {
  return exactDot([massDensityKgPerM3, ...concentrations], [1, ...molarMasses.map((mass) => -mass)]);
}

/** Mole fraction of the solvent from the molalities of the solutes, 1 / (1 + M sum of m). */
export function solventMoleFractionOf(molalities: readonly number[], solventMolarMassKgPerMol: number): number {
  return 1 / (1 + solventMolarMassKgPerMol * exactSum(molalities));
}

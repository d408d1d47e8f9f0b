import type { CompositionScale, SolventComponent } from "../activity/activity-model.js";
import { molalitiesOfMoleFractions, solventMassConcentration, solventMoleFractionOf } from "../activity/molalities.js";
import { solutionComponentOf } from "../activity/solution-component-of.js";
import type { Fault, FaultPath } from "../errors/fault.js";
import type { Label, SpeciesRecord } from "../species/record.js";
import type { GivenAmounts } from "./solution-amounts.js";

/** The composition of a solution on the scale of its model. */
export interface ScaledAmounts {
  readonly solventMoleFraction: number;
  readonly amounts: readonly number[];
}

/**
 * Brings a checked composition to the scale of the standard states: mole fractions and concentrations of dissolved
 * species become molalities, m = x / (x(solvent) M) and m = c / (rho - sum of c M).
 *
 * @param values - the given amounts of the solutes, in their order
 */
export function scaledAmounts(
  given: GivenAmounts,
  values: readonly number[],
  scale: CompositionScale,
  solvent: SolventComponent,
  solutes: readonly SpeciesRecord[],
  faults: Fault[],
): ScaledAmounts | undefined {
  if (given.scale === "moleFractions") {
    const solventMoleFraction = given.amounts.get(solvent.label)!;
    if (scale === "mole-fraction") return { solventMoleFraction, amounts: values };
    const amounts = molalitiesOfMoleFractions(values, solventMoleFraction, solvent.molarMassKgPerMol);
    return checkMolalities(amounts, solventMoleFraction, solutes, given.path, faults);
  }
  const amounts = given.scale === "molalities" ? values : molalitiesOf(given, values, solutes, faults);
  if (amounts === undefined) return undefined;
  const solventMoleFraction = solventMoleFractionOf(amounts, solvent.molarMassKgPerMol);
  return checkMolalities(amounts, solventMoleFraction, solutes, given.path, faults);
}

function molalitiesOf(
  { path, massDensity }: GivenAmounts,
  concentrations: readonly number[],
  solutes: readonly SpeciesRecord[],
  faults: Fault[],
): readonly number[] | undefined {
  const before = faults.length;
  const molarMasses = solutes.map((record) => {
    const { label, molarMassKgPerMol } = solutionComponentOf(record);
    if (molarMassKgPerMol === undefined) faults.push(noMolarMass(label, [...path, label]));
    return molarMassKgPerMol ?? 0;
  });
  if (faults.length > before) return undefined;
  const solventMass = solventMassConcentration(massDensity!, concentrations, molarMasses);
  if (solventMass > 0) return concentrations.map((concentration) => concentration / solventMass);
  faults.push({
    code: "conditions/invalid-density",
    path: ["solution", "density"],
    message: `at a density of ${massDensity} kg/m3 the solutes weigh at least as much as the solution`,
    received: `${massDensity} kg/m3`,
    expected: "the density of the whole solution, above the sum of c M of the solutes",
    hint: "water has 0.997 kg/L at 25 Cel; is the unit of the density or of a concentration right?",
  });
  return undefined;
}

/** The largest molality that is read, in mol/kg: even a trace of solvent in a salt is far below, and no energy overflows. */
const largestMolality = 1e12;

function checkMolalities(
  amounts: readonly number[],
  solventMoleFraction: number,
  solutes: readonly SpeciesRecord[],
  path: FaultPath,
  faults: Fault[],
): ScaledAmounts {
  amounts.forEach((amount, index) => {
    if (amount <= largestMolality) return;
    const { label } = solutes[index]!;
    faults.push({
      code: "conditions/invalid-amount",
      path: [...path, label],
      message: `the molality of ${label} is ${amount} mol/kg`,
      received: `${amount} mol/kg`,
      expected: `at most ${largestMolality} mol/kg`,
      hint: "is there enough of the solvent?",
    });
  });
  return { solventMoleFraction, amounts };
}

/** The fault of a species whose molar mass is needed and not known. */
export function noMolarMass(label: Label, path: FaultPath): Fault {
  return {
    code: "formula/no-atomic-weight",
    path,
    message: `${label} has no molar mass: an element of it has no standard atomic weight`,
    received: label,
    hint: "molalities of solutes need the molar mass of the solvent only",
  };
}

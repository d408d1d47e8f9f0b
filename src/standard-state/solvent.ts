import type { Fault } from "../errors/fault.js";
import { checkObject, checkOption, type Members } from "../errors/input.js";
import { log } from "../numeric/log.js";
import type { MassDensity, MolarMass } from "../quantity/quantity.js";
import { checkPresent } from "./pressure-change.js";

/**
 * What the standard state of a solute is counted on: an ideal solution of 1 mol/kg of solvent, of 1 mol/L, or of mole
 * fraction 1, each with the properties of infinite dilution.
 */
export type SoluteScale = "molality" | "concentration" | "mole-fraction";

/** The scales, for checks. */
export const soluteScales: readonly SoluteScale[] = ["molality", "concentration", "mole-fraction"];

/** The pure solvent. */
export interface SolventProperties {
  /** Needed where one of the scales is that of mole fractions. */
  readonly molarMass?: MolarMass;
  /** At the temperature meant; needed where one of the scales is that of concentrations. */
  readonly density?: MassDensity;
}

/** A change of the scale that standard states of solutes are counted on. */
export interface SoluteScaleChange {
  readonly from: SoluteScale;
  readonly to: SoluteScale;
  readonly solvent: SolventProperties;
}

/** Concentration of 1 mol/L in mol/m3. */
const standardConcentration = 1000;

/**
 * The logarithm of the factor by which the number of a solute's amount on the scale `to` exceeds that on the scale
 * `from` at infinite dilution, where x = M m and c = rho m with M and rho of the pure solvent.
 *
 * @returns ln((b(to) / standard) / (b(from) / standard)); undefined after a fault
 */
export function checkScaleChange(
  members: Members<"from" | "to" | "solvent">,
  faults: Fault[],
): { readonly lnFactor: number } | undefined {
  const before = faults.length;
  const scales = (["from", "to"] as const).map((key) =>
    members[key] === undefined ? undefined : checkOption(members[key], [key], faults, soluteScales),
  );
  const solvent =
    members.solvent === undefined
      ? undefined
      : checkObject(members.solvent, ["solvent"], faults, { required: [], optional: ["molarMass", "density"] });
  const molarMass = checkPresent(solvent?.molarMass, "molarMass", ["solvent", "molarMass"], faults);
  const density = checkPresent(solvent?.density, "massDensity", ["solvent", "density"], faults);
  const isChange = scales[0] !== scales[1];
  if (isChange && solvent !== undefined) {
    if (scales.includes("mole-fraction") && solvent.molarMass === undefined)
      missing("molarMass", "18.015 g/mol", faults);
    if (scales.includes("concentration") && solvent.density === undefined) missing("density", "0.997 g/cm3", faults);
  }
  if (faults.length > before) return undefined;
  const [from, to] = scales.map((scale) => lnOfScale(scale as SoluteScale, molarMass, density));
  return { lnFactor: isChange ? (to as number) - (from as number) : 0 };
}

/** ln of the number of an amount on a scale per number of its molality in mol/kg. */
function lnOfScale(scale: SoluteScale, molarMass: number | undefined, density: number | undefined): number {
  switch (scale) {
    case "molality":
      return 0;
    case "concentration":
      return density === undefined ? 0 : log(density / standardConcentration);
    case "mole-fraction":
      return molarMass === undefined ? 0 : log(molarMass);
  }
}

function missing(key: "molarMass" | "density", example: string, faults: Fault[]): void {
  faults.push({
    code: "input/missing",
    path: ["solvent", key],
    message: `the ${key} of the pure solvent is missing, which this change of scale needs`,
    expected: `${key}, such as ${example}`,
  });
}

import { describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkObject, checkOption, type Members } from "../errors/input.js";
import { exactSum } from "../numeric/compensated.js";
import type { Label, SpeciesRecord } from "../species/record.js";
import { type FormedSpecies, readFormedSpecies } from "./formed-species.js";

/** How many atoms a molecule of each gaseous element has, by symbol; elements that are no gas are left out. */
export type GaseousElements = Readonly<Record<string, number>>;

/**
 * The elements that are gases in their reference state at 298.15 K, with the atoms of their molecules. Bromine, iodine
 * and mercury are not: their reference states are Br2(l), I2(cr) and Hg(l).
 *
 * @see `references.cox1989` `references.wagman1982`
 * @example
 * gaseousElements.O; // => 2
 */
export const gaseousElements: GaseousElements = /* @__PURE__ */ Object.freeze({
  Ar: 1,
  Cl: 2,
  D: 2,
  F: 2,
  H: 2,
  He: 1,
  Kr: 1,
  N: 2,
  Ne: 1,
  O: 2,
  Rn: 1,
  T: 2,
  Xe: 1,
});

/** Atoms beyond this are no molecule of an element. */
const mostAtoms = 100;

/** What a formation is counted by, where it differs from the usual. */
export interface FormationConvention {
  /**
   * The elements that are gases, with the atoms of their molecules, in place of those at 298.15 K: above the boiling
   * point of bromine `{ ...gaseousElements, Br: 2 }`.
   */
  readonly gaseousElements?: GaseousElements;
  /**
   * What the electrons of an ion are: `"hydrogen"`, when absent, e^- = 1/2 H2(g) - H^+(aq), with H^+(aq) = 0; `"gas"`
   * the electron gas e^-(g) as an element, as in tables of gaseous ions.
   */
  readonly electron?: "hydrogen" | "gas";
}

/** Keys of a convention, for options that hold one. */
export const conventionKeys = ["gaseousElements", "electron"] as const;

/**
 * Change of the amount of gas when one mole of a species forms from the elements in their reference states:
 * n(gas) of the species less n(gas) of the elements. Of H2O(l) it is -3/2, of H2O(g) -1/2.
 *
 * An ion gives half a mole of hydrogen for each unit of positive charge: Cl^-(aq) forms as 1/2 Cl2(g) + 1/2 H2(g)
 * less H^+(aq), which is zero.
 *
 * @param species - a record, or a label with its state such as `"H2O(l)"`
 * @param convention - other gaseous elements, or the electron gas
 * @returns moles of gas per mole of species
 * @throws GibbsLedgerError "standard-state/no-state" for a label without a state, "standard-state/invalid-molecule",
 * "input/unknown-option", and those of labels and records
 * @see `references.freeman1984`
 * @example
 * formationGasChange("H2O(l)"); // => -1.5
 * formationGasChange("Cl^-(aq)"); // => -1
 * formationGasChange("HBr(g)"); // => 0.5
 */
export function formationGasChange(species: SpeciesRecord | Label, convention: FormationConvention = {}): number {
  const faults: Fault[] = [];
  const formed = readFormedSpecies(species, ["species"], faults);
  const members = checkObject(convention, ["convention"], faults, { required: [], optional: conventionKeys });
  const counted = checkConvention(members ?? {}, ["convention"], faults);
  failIfAny(faults);
  return gasChangeOf(formed as FormedSpecies, counted);
}

/** A convention with nothing left open. */
export type CountedConvention = Required<FormationConvention>;

/** The convention of the library at 298.15 K. */
export const usualConvention: CountedConvention = /* @__PURE__ */ Object.freeze({
  gaseousElements,
  electron: "hydrogen",
});

/** The same of a species that has been read, by a convention that has been checked. */
export function gasChangeOf({ atoms, chargeNumber, state }: FormedSpecies, convention: CountedConvention): number {
  const molecules = convention.gaseousElements;
  const ofElements = atoms.map(({ symbol, count }) =>
    Object.hasOwn(molecules, symbol) ? -count / molecules[symbol]! : 0,
  );
  const ofCharge = convention.electron === "gas" ? chargeNumber : chargeNumber / 2;
  return exactSum([state === "g" ? 1 : 0, ofCharge, ...ofElements]);
}

/** Checks the members of a convention and fills in what is usual. */
export function checkConvention(
  members: Members<(typeof conventionKeys)[number]>,
  path: FaultPath,
  faults: Fault[],
): CountedConvention {
  if (members.gaseousElements !== undefined) {
    checkGaseousElements(members.gaseousElements, [...path, "gaseousElements"], faults);
  }
  if (members.electron !== undefined) {
    checkOption(members.electron, [...path, "electron"], faults, ["hydrogen", "gas"]);
  }
  return { ...usualConvention, ...definedOf(members) };
}

function definedOf(members: Members<(typeof conventionKeys)[number]>): FormationConvention {
  const { gaseousElements: molecules, electron } = members as FormationConvention;
  return {
    ...(molecules === undefined ? {} : { gaseousElements: molecules }),
    ...(electron === undefined ? {} : { electron }),
  };
}

/** Checks a map from symbols to the atoms of a molecule. */
function checkGaseousElements(value: unknown, path: FaultPath, faults: Fault[]): void {
  const members = checkObject<never, string>(value, path, faults, { required: [], optional: "any" });
  for (const [symbol, atoms] of Object.entries(members ?? {})) {
    if (Number.isInteger(atoms) && (atoms as number) >= 1 && (atoms as number) <= mostAtoms) continue;
    faults.push({
      code: "standard-state/invalid-molecule",
      path: [...path, symbol],
      message: `a molecule of a gaseous element has 1 to ${mostAtoms} atoms, got ${describeReceived(atoms)}`,
      received: describeReceived(atoms),
      expected: "a whole number of atoms, such as 2 for O2",
    });
  }
}

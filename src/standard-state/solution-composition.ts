import { cut, describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import { fail, failIfAny, isGibbsLedgerError } from "../errors/gibbs-ledger-error.js";
import { checkObject, checkText } from "../errors/input.js";
import { molarMass } from "../formula/molar-mass.js";
import { parseLabel } from "../formula/parse-label.js";
import { exactDot, exactSum } from "../numeric/compensated.js";
import { convertValue } from "../quantity/convert-value.js";
import { checkPositiveQuantity, checkQuantity } from "../quantity/guards.js";
import type { Concentration, MassDensity, Molality, MolarMass, Quantity } from "../quantity/quantity.js";
import type { Label } from "../species/record.js";
import { finite } from "./finite.js";

/** The composition of a solution as it was measured: on one of three scales. */
export interface SolutionMeasured {
  /** Label of the solvent, such as `"H2O(l)"`. */
  readonly solvent: Label;
  /** Of each solute, not below 0. */
  readonly molalities?: Readonly<Record<Label, Molality>>;
  /** Of each solute, not below 0. */
  readonly concentrations?: Readonly<Record<Label, Concentration>>;
  /** Of each solute and the solvent, from 0 to 1, their sum 1 within 1e-9. */
  readonly moleFractions?: Readonly<Record<Label, number>>;
  /** Of the solution; needed for concentrations. */
  readonly density?: MassDensity;
  /** By label; absent: the molar mass of the label's formula. */
  readonly molarMasses?: Readonly<Record<Label, MolarMass>>;
}

/** The composition of a solution on every scale. */
export interface SolutionComposition {
  /** Of each solute. */
  readonly molalities: Readonly<Record<Label, Quantity<"molality", "mol/kg">>>;
  /** Of each solute; absent where no density of the solution is given. */
  readonly concentrations?: Readonly<Record<Label, Quantity<"concentration", "mol/m3">>>;
  /** Of the solvent and each solute. */
  readonly moleFractions: Readonly<Record<Label, number>>;
}

const scales = ["molalities", "concentrations", "moleFractions"] as const;
type Scale = (typeof scales)[number];

/** Largest departure of a sum of mole fractions from 1, as everywhere in the library. */
const fractionTolerance = 1e-9;

/** The most solutes that are read. */
const mostSolutes = 200;

/**
 * The composition of a solution of several solutes on the scales of molality m, concentration c and mole fraction x,
 * from one of them. The relations are exact; sums run over the solutes, M1 is the molar mass of the solvent, rho the
 * density of the solution:
 *
 *     x = m / (1/M1 + sum of m),   c = rho m / (1 + sum of m M),   m = x / (M1 x1) = c / (rho - sum of c M)
 *
 * @param measured - the solvent, the amounts on one scale, the density of the solution where concentrations are given
 * or wanted, and molar masses where those of the labels' formulas are not meant (they neglect the electrons of ions)
 * @returns molalities in mol/kg, concentrations in mol/m3 where the density is given, and mole fractions
 * @throws GibbsLedgerError with every fault at once: "input/conflicting-options" for two scales, "input/missing",
 * "standard-state/invalid-composition" for amounts below zero or fractions that do not sum to 1,
 * "standard-state/no-solvent" where the solutes leave no room for the solvent, "formula/no-atomic-weight", those of
 * quantities and labels; "quantity/overflow"
 * @remarks Arithmetic: within 8 eps relative, but for the mass of solvent in rho - sum of c M, whose rounding grows as
 * the solvent vanishes. The order of the solutes changes no bit. Standard uncertainties are not carried on.
 * @see `references.cohen2007`
 * @example
 * const brine = solutionComposition({
 *   solvent: "H2O(l)",
 *   molalities: { "Na^+(aq)": quantity(1, "mol/kg"), "Cl^-(aq)": quantity(1, "mol/kg") },
 *   density: quantity(1.036, "g/cm3"),
 * });
 * brine.concentrations?.["Na^+(aq)"]?.value; // => 978.79...
 * brine.moleFractions["Na^+(aq)"]; // => 0.0173...
 */
export function solutionComposition(measured: SolutionMeasured): SolutionComposition {
  const faults: Fault[] = [];
  const members = checkObject(measured, [], faults, {
    required: ["solvent"],
    optional: [...scales, "density", "molarMasses"],
  });
  failIfAny(members === undefined ? faults : []);
  const solvent = members?.solvent === undefined ? undefined : checkText(members.solvent, ["solvent"], faults);
  const scale = givenScale(measured, faults);
  const amounts = scale === undefined ? undefined : readAmounts(measured[scale], scale, solvent, faults);
  const density =
    members?.density === undefined
      ? undefined
      : checkPositiveQuantity(measured.density, "massDensity", ["density"], faults);
  if (scale === "concentrations" && members?.density === undefined) {
    faults.push({
      code: "input/missing",
      path: ["density"],
      message: "concentrations are turned into other scales through the density of the solution",
      expected: "density, such as 1.036 g/cm3",
    });
  }
  const masses = readMasses(members?.molarMasses, solvent, scale, amounts, faults);
  failIfAny(faults);
  const solution: Solution = {
    solvent: solvent as Label,
    labels: [...(amounts as ReadonlyMap<Label, number>).keys()].filter((label) => label !== solvent),
    masses,
    density,
  };
  return compositionOf(solution, molalitiesOf(solution, scale as Scale, amounts as ReadonlyMap<Label, number>));
}

/** What is known of a solution beside its amounts: labels of the solutes, molar masses in kg/mol, density in kg/m3. */
interface Solution {
  readonly solvent: Label;
  readonly labels: readonly Label[];
  readonly masses: ReadonlyMap<Label, number>;
  readonly density: number | undefined;
}

function givenScale(measured: SolutionMeasured, faults: Fault[]): Scale | undefined {
  const given = scales.filter((scale) => measured[scale] !== undefined);
  if (given.length === 1) return given[0];
  faults.push({
    code: given.length === 0 ? "input/missing" : "input/conflicting-options",
    path: given.length === 0 ? [] : [given[1]!],
    message: `a composition is given on one scale, got ${given.length === 0 ? "none" : given.join(" and ")}`,
    expected: `one of ${scales.join(", ")}`,
  });
  return undefined;
}

/** Amounts in coherent SI by label; the solvent is among them on the scale of mole fractions only. */
function readAmounts(
  value: unknown,
  scale: Scale,
  solvent: Label | undefined,
  faults: Fault[],
): ReadonlyMap<Label, number> {
  const given = checkObject<never, string>(value, [scale], faults, { required: [], optional: "any" });
  const amounts = new Map<Label, number>();
  const entries = Object.entries(given ?? {});
  if (entries.length > mostSolutes) {
    faults.push({
      code: "input/too-large",
      path: [scale],
      message: `at most ${mostSolutes} solutes are read, got ${entries.length}`,
      expected: `at most ${mostSolutes} solutes`,
    });
    return amounts;
  }
  const before = faults.length;
  for (const [label, amount] of entries) {
    const path = [scale, label];
    const number = readAmount(amount, scale, path, faults);
    if (number !== undefined) amounts.set(label, number);
    if (label === solvent && scale !== "moleFractions") {
      invalid(
        path,
        `${cut(label, 60)} is the solvent; only solutes have ${scale} here`,
        "the labels of solutes",
        faults,
      );
    }
  }
  if (scale === "moleFractions" && given !== undefined && faults.length === before) {
    checkFractions(amounts, solvent, faults);
  }
  return amounts;
}

function readAmount(amount: unknown, scale: Scale, path: FaultPath, faults: Fault[]): number | undefined {
  if (scale === "moleFractions") {
    if (typeof amount === "number" && amount >= 0 && amount <= 1) return amount;
    const got = describeReceived(amount);
    invalid(path, `a mole fraction is a number from 0 to 1, got ${got}`, "a number from 0 to 1", faults);
    return undefined;
  }
  const dimension = scale === "molalities" ? "molality" : "concentration";
  const number = checkQuantity(amount, dimension, path, faults);
  if (number === undefined || number >= 0) return number;
  invalid(path, `a ${dimension} is not below 0, got ${number}`, "at least 0", faults);
  return undefined;
}

function checkFractions(amounts: ReadonlyMap<Label, number>, solvent: Label | undefined, faults: Fault[]): void {
  const sum = exactSum([...amounts.values()]);
  if (solvent !== undefined && !amounts.has(solvent)) {
    const path = ["moleFractions", solvent];
    faults.push({
      code: "input/missing",
      path,
      message: `the mole fraction of the solvent ${cut(solvent, 60)} is missing`,
    });
  } else if (solvent !== undefined && amounts.get(solvent) === 0) {
    faults.push(noSolvent(["moleFractions", solvent]));
  }
  if (Math.abs(sum - 1) <= fractionTolerance) return;
  const message = `the mole fractions of the solution sum to ${sum}, not to 1`;
  invalid(["moleFractions"], message, `1 within ${fractionTolerance}`, faults);
}

function invalid(path: FaultPath, message: string, expected: string, faults: Fault[]): void {
  faults.push({ code: "standard-state/invalid-composition", path, message, expected });
}

function noSolvent(path: FaultPath): Fault {
  return {
    code: "standard-state/no-solvent",
    path,
    message: "the solutes leave nothing for the solvent",
    expected: "a solution with solvent in it",
  };
}

/** Molar masses in kg/mol: those given, and those of the labels' formulas. */
function readMasses(
  value: unknown,
  solvent: Label | undefined,
  scale: Scale | undefined,
  amounts: ReadonlyMap<Label, number> | undefined,
  faults: Fault[],
): ReadonlyMap<Label, number> {
  const masses = new Map<Label, number>();
  const labels = new Set([...(solvent === undefined ? [] : [solvent]), ...(amounts?.keys() ?? [])]);
  const given =
    value === undefined
      ? {}
      : (checkObject<never, string>(value, ["molarMasses"], faults, { required: [], optional: "any" }) ?? {});
  for (const [label, mass] of Object.entries(given)) {
    const number = checkPositiveQuantity(mass, "molarMass", ["molarMasses", label], faults);
    if (number !== undefined) masses.set(label, number);
    if (amounts === undefined || labels.has(label)) continue;
    invalid(
      ["molarMasses", label],
      `${cut(label, 60)} is no species of this solution`,
      "labels of the solution",
      faults,
    );
  }
  for (const label of labels) {
    if (Object.hasOwn(given, label)) continue;
    const mass = massOfLabel(label, label === solvent ? ["solvent"] : [scale as Scale, label], faults);
    if (mass !== undefined) masses.set(label, mass);
  }
  return masses;
}

function massOfLabel(label: Label, path: FaultPath, faults: Fault[]): number | undefined {
  try {
    const { value, unit } = molarMass(parseLabel(label).formula);
    return convertValue(value, unit, "kg/mol");
  } catch (error) {
    if (!isGibbsLedgerError(error)) throw error;
    faults.push(...error.faults.map((fault) => ({ ...fault, path: [...path, ...fault.path] })));
    return undefined;
  }
}

/** In mol/kg, in the order of the labels. */
function molalitiesOf(solution: Solution, scale: Scale, amounts: ReadonlyMap<Label, number>): number[] {
  const { solvent, labels, masses, density } = solution;
  const values = labels.map((label) => amounts.get(label)!);
  if (scale === "molalities") return values;
  if (scale === "moleFractions") {
    const perKilogram = masses.get(solvent)! * amounts.get(solvent)!;
    return values.map((value) => finite(value / perKilogram, [scale]));
  }
  const ofSolutes = exactDot(
    values,
    labels.map((label) => masses.get(label)!),
  );
  const ofSolvent = (density as number) - ofSolutes;
  if (!(ofSolvent > 0)) fail(noSolvent([scale]));
  return values.map((value) => finite(value / ofSolvent, [scale]));
}

function compositionOf(solution: Solution, molalities: readonly number[]): SolutionComposition {
  const { solvent, labels, masses, density } = solution;
  const solutes = exactSum(molalities);
  const ofSolvent = 1 / masses.get(solvent)!;
  const all = finite(ofSolvent + solutes, ["molalities"]);
  const mass =
    1 +
    exactDot(
      molalities,
      labels.map((label) => masses.get(label)!),
    );
  const fractions = [
    [solvent, ofSolvent / all] as const,
    ...labels.map((label, index) => [label, molalities[index]! / all] as const),
  ];
  return {
    molalities: Object.fromEntries(
      labels.map((label, index) => [label, { value: molalities[index]! + 0, unit: "mol/kg" } as const]),
    ),
    ...(density === undefined
      ? {}
      : {
          concentrations: Object.fromEntries(
            labels.map((label, index) => {
              const value = finite((density * molalities[index]!) / mass, ["molalities", label]);
              return [label, { value, unit: "mol/m3" } as const];
            }),
          ),
        }),
    moleFractions: Object.fromEntries(fractions.map(([label, value]) => [label, value + 0])),
  };
}

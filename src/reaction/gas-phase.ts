import { cut, describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import { fail } from "../errors/gibbs-ledger-error.js";
import { checkObject } from "../errors/input.js";
import { checkEquationOfState } from "../fugacity/check-equation-of-state.js";
import { checkFraction, checkFractionSum, fractionTolerance, unknownLabel } from "../fugacity/check-fractions.js";
import type { EquationOfState } from "../fugacity/equation-of-state.js";
import { gasComponentOf } from "../fugacity/gas-component-of.js";
import { idealGas } from "../fugacity/ideal-gas.js";
import { exactSum } from "../numeric/compensated.js";
import { checkQuantity } from "../quantity/guards.js";
import type { Label, SpeciesRecord } from "../species/record.js";
import { isRecord } from "../species/substance.js";
import type { Reaction } from "./reaction.js";

/** The composition of a gas, checked. */
export interface CheckedGas {
  readonly equationOfState: EquationOfState;
  /** Sorted by label, so that results do not depend on the order in which a composition is written. */
  readonly species: readonly SpeciesRecord[];
  readonly moleFractions: readonly number[];
  /** Where the composition stands in the conditions. */
  readonly path: FaultPath;
}

/**
 * Checks the gas of conditions against the gases of a reaction and its inerts, and collects every fault.
 *
 * @param pressurePa - undefined where the pressure is at fault
 */
export function checkGas(
  given: unknown,
  reaction: Reaction,
  inerts: readonly SpeciesRecord[],
  activities: ReadonlyMap<Label, number>,
  pressurePa: number | undefined,
  faults: Fault[],
): CheckedGas | undefined {
  const gas = checkObject(given, ["gas"], faults, {
    required: [],
    optional: ["moleFractions", "partialPressures", "equationOfState"],
  });
  if (gas === undefined) return undefined;
  const equationOfState = gas.equationOfState === undefined ? idealGas() : gas.equationOfState;
  checkEquationOfState(equationOfState, ["gas", "equationOfState"], faults);
  const inertGases = inerts.filter(({ state }) => state === "g");
  const reacting = reaction.terms.flatMap(({ species: record }) =>
    isRecord(record) && record.state === "g" ? record : [],
  );
  const species = new Map([...reacting, ...inertGases].map((record) => [record.label, record]));
  const composition = checkComposition(gas, pressurePa, faults);
  if (composition === undefined) return undefined;
  const { fractions, labels: named, path } = composition;
  const labels = [...species.keys()];
  for (const label of fractions.keys()) {
    if (!species.has(label)) {
      faults.push(unknownLabel(label, [...path, cut(label)], labels, "a gas of the reaction, or of inerts"));
    } else if (activities.has(label)) {
      faults.push({
        code: "conditions/duplicate-label",
        path: ["activities", label],
        message: `${label} is given in gas and in activities`,
        received: cut(label),
        expected: "each species once",
      });
    }
  }
  for (const { label } of inertGases) {
    if (!named.includes(label)) {
      faults.push({
        code: "conditions/missing-composition",
        path: [...path, label],
        message: `the inert ${label} has no fraction in gas`,
        expected: `a fraction of ${label}`,
      });
    }
  }
  const present = labels.filter((label) => fractions.has(label)).sort();
  return {
    equationOfState: equationOfState as EquationOfState,
    species: present.map((label) => species.get(label)!),
    moleFractions: present.map((label) => fractions.get(label)!),
    path,
  };
}

interface GivenFractions {
  /** Of those labels whose value is sound. */
  readonly fractions: ReadonlyMap<Label, number>;
  /** What the composition names, whether its value is sound or not. */
  readonly labels: readonly Label[];
  readonly path: FaultPath;
}

type FractionMembers = { readonly moleFractions?: unknown; readonly partialPressures?: unknown };

function checkComposition(
  gas: FractionMembers,
  pressurePa: number | undefined,
  faults: Fault[],
): GivenFractions | undefined {
  const given = (["moleFractions", "partialPressures"] as const).filter((key) => gas[key] !== undefined);
  if (given.length !== 1) {
    faults.push({
      code: given.length === 0 ? "conditions/missing-composition" : "conditions/duplicate-label",
      path: ["gas"],
      message: given.length === 0 ? "the gas has no composition" : "the gas has mole fractions and partial pressures",
      expected: "either moleFractions or partialPressures",
    });
    return undefined;
  }
  const key = given[0]!;
  const path: FaultPath = ["gas", key];
  const members = checkObject(gas[key], path, faults, { required: [], optional: "any" });
  if (members === undefined) return undefined;
  const before = faults.length;
  const fractions = new Map<Label, number>();
  const labels = Object.keys(members);
  for (const [label, value] of Object.entries(members)) {
    const here = [...path, cut(label)];
    const fraction =
      key === "moleFractions"
        ? checkFraction(value, here, faults)
        : fractionOfPressure(value, pressurePa, here, faults);
    if (fraction !== undefined) fractions.set(label, fraction);
  }
  if (faults.length > before) return { fractions, labels, path };
  if (key === "moleFractions") checkFractionSum(fractions.values(), path, faults);
  else if (pressurePa !== undefined) checkPressureSum(fractions.values(), pressurePa, faults);
  return { fractions, labels, path };
}

function fractionOfPressure(
  value: unknown,
  pressurePa: number | undefined,
  path: FaultPath,
  faults: Fault[],
): number | undefined {
  const before = faults.length;
  const partialPa = checkQuantity(value, "pressure", path, faults);
  if (partialPa === undefined || faults.length > before) return undefined;
  if (partialPa < 0) {
    faults.push({
      code: "conditions/invalid-fraction",
      path,
      message: "a partial pressure is not negative",
      received: `${partialPa} Pa`,
      expected: "at least 0 Pa",
    });
    return undefined;
  }
  return pressurePa === undefined ? undefined : partialPa / pressurePa;
}

/** Checks that partial pressures, as fractions of the pressure, make up the whole of it. */
export function checkPressureSum(fractions: Iterable<number>, pressurePa: number, faults: Fault[]): void {
  const sum = exactSum([...fractions]);
  if (Math.abs(sum - 1) <= fractionTolerance) return;
  faults.push({
    code: "conditions/pressure-mismatch",
    path: ["gas", "partialPressures"],
    message: `the partial pressures sum to ${sum * pressurePa} Pa, the pressure is ${pressurePa} Pa`,
    received: `${sum * pressurePa} Pa`,
    expected: `${pressurePa} Pa within a relative ${fractionTolerance}`,
    hint: "list inert gases too; nothing is renormalised",
  });
}

/** A gas at its temperature and pressure. */
export interface GasPhase {
  readonly equationOfState: string;
  readonly moleFractions: ReadonlyMap<Label, number>;
  readonly lnFugacityCoefficients: ReadonlyMap<Label, number>;
  /** Where the composition stands in the conditions. */
  readonly path: FaultPath;
  readonly notes: readonly string[];
}

/** Evaluates the equation of state of a checked gas. */
export function evaluateGas(gas: CheckedGas, temperatureK: number, pressurePa: number): GasPhase {
  const components = gas.species.map((record) => gasComponentOf(record, [...gas.path, record.label]));
  const mixture = gas.equationOfState.mixture(components, gas.path);
  const { lnFugacityCoefficients, outsideValidity } = mixture.state(temperatureK, pressurePa, gas.moleFractions);
  gas.species.forEach(({ label }, index) => {
    if (!Number.isFinite(lnFugacityCoefficients[index])) failFugacity(gas.equationOfState.name, [...gas.path, label]);
  });
  return {
    equationOfState: gas.equationOfState.name,
    moleFractions: new Map(gas.species.map(({ label }, index) => [label, gas.moleFractions[index]!])),
    lnFugacityCoefficients: new Map(gas.species.map(({ label }, index) => [label, lnFugacityCoefficients[index]!])),
    path: gas.path,
    notes: outsideValidity === undefined ? [] : [outsideValidity],
  };
}

/** An equation of state of the caller's own may give anything. */
function failFugacity(name: string, path: FaultPath): never {
  return fail({
    code: "fugacity/unphysical",
    path,
    message: `the equation of state ${describeReceived(name)} gives no finite fugacity coefficient of ${path.at(-1)}`,
    expected: "the logarithm of a fugacity coefficient for every gas",
  });
}

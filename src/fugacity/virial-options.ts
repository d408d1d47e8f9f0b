import { describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import { frozenCopy } from "../errors/frozen-copy.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkNumber, checkObject, checkOption } from "../errors/input.js";
import { type BinaryInteraction, checkBinaryInteraction } from "./binary-interaction.js";

/** A generalised correlation of the second virial coefficient. */
export type VirialCorrelation = "abbott" | "pitzer-curl" | "tsonopoulos";

/** Tsonopoulos's polar term a/Tr^6 - b/Tr^8 of one substance; b is 0 where only a dipole acts. */
export interface PolarTerm {
  readonly a: number;
  readonly b: number;
}

/** A second virial coefficient and its derivative at one temperature. */
export interface VirialCoefficient {
  /** B in m3/mol. */
  readonly value: number;
  /** dB/dT in m3/mol/K. */
  readonly temperatureDerivative: number;
}

/**
 * A caller's own second virial coefficients. Asked once for each pair and temperature, with the two labels in the
 * order of their character codes; for a pure gas both are the same.
 */
export type VirialCoefficientFunction = (
  temperatureK: number,
  firstLabel: string,
  secondLabel: string,
) => VirialCoefficient;

/** How the virial equation gets its coefficients. */
export interface VirialOptions {
  /** Default "tsonopoulos". */
  readonly correlation?: VirialCorrelation;
  /** k_ij of pairs; pairs that are not named have 0. Labels that are not in a mixture are not used there. */
  readonly binaryInteraction?: BinaryInteraction;
  /** Polar terms by label, with "tsonopoulos" only; substances that are not named have none. */
  readonly polar?: Readonly<Record<string, PolarTerm>>;
  /** The caller's coefficients in place of a correlation; excludes the three options above. */
  readonly secondVirialCoefficient?: VirialCoefficientFunction;
  /** "refuse" (default) densities beyond half the critical density, or "continue" and say so in the state. */
  readonly outsideValidity?: "refuse" | "continue";
}

/** Checked options with their defaults, frozen. */
export interface VirialSettings {
  readonly correlation: VirialCorrelation;
  readonly binaryInteraction: BinaryInteraction;
  readonly polar: Readonly<Record<string, PolarTerm>>;
  readonly secondVirialCoefficient: VirialCoefficientFunction | undefined;
  readonly outsideValidity: "refuse" | "continue";
}

/** The correlations by name. */
export const virialCorrelations: readonly VirialCorrelation[] = ["abbott", "pitzer-curl", "tsonopoulos"];

const optionNames = [
  "correlation",
  "binaryInteraction",
  "polar",
  "secondVirialCoefficient",
  "outsideValidity",
] as const;

/**
 * Checks the options of the virial equation.
 *
 * @throws GibbsLedgerError with every fault at once: "input/not-an-object", "input/unknown-key",
 * "input/unknown-option", "input/not-finite", "input/missing", "fugacity/binary-interaction",
 * "fugacity/coefficient-function", "fugacity/conflicting-options"
 */
export function checkVirialOptions(options: VirialOptions, path: FaultPath = ["options"]): VirialSettings {
  const faults: Fault[] = [];
  const given = checkObject(options, path, faults, { required: [], optional: optionNames });
  failIfAny(given === undefined ? faults : []);
  const { correlation, binaryInteraction, polar, secondVirialCoefficient, outsideValidity } = options;
  if (correlation !== undefined) checkOption(correlation, [...path, "correlation"], faults, virialCorrelations);
  if (binaryInteraction !== undefined) {
    checkBinaryInteraction(binaryInteraction, [...path, "binaryInteraction"], faults);
  }
  if (polar !== undefined) checkPolar(polar, [...path, "polar"], faults);
  if (outsideValidity !== undefined) {
    checkOption(outsideValidity, [...path, "outsideValidity"], faults, ["refuse", "continue"]);
  }
  checkTogether(options, path, faults);
  failIfAny(faults);
  return Object.freeze({
    correlation: correlation ?? "tsonopoulos",
    binaryInteraction: frozenCopy(binaryInteraction ?? {}),
    polar: frozenCopy(polar ?? {}),
    secondVirialCoefficient,
    outsideValidity: outsideValidity ?? "refuse",
  });
}

function checkPolar(value: unknown, path: FaultPath, faults: Fault[]): void {
  const terms = checkObject(value, path, faults, { required: [], optional: "any" });
  if (terms === undefined) return;
  for (const [label, term] of Object.entries(terms)) {
    const members = checkObject(term, [...path, label], faults, { required: ["a", "b"], optional: [] });
    if (members?.a !== undefined) checkNumber(members.a, [...path, label, "a"], faults);
    if (members?.b !== undefined) checkNumber(members.b, [...path, label, "b"], faults);
  }
}

function checkTogether(options: VirialOptions, path: FaultPath, faults: Fault[]): void {
  const { correlation, polar } = options;
  const coefficient: unknown = options.secondVirialCoefficient;
  if (polar !== undefined && (correlation === "abbott" || correlation === "pitzer-curl")) {
    faults.push({
      code: "fugacity/conflicting-options",
      path: [...path, "polar"],
      message: `polar terms belong to the correlation "tsonopoulos", not to "${correlation}"`,
      received: `"${correlation}"`,
      expected: '"tsonopoulos" beside polar terms',
      hint: 'leave polar out, or choose correlation: "tsonopoulos"',
    });
  }
  if (coefficient === undefined) return;
  if (typeof coefficient !== "function") {
    faults.push({
      code: "fugacity/coefficient-function",
      path: [...path, "secondVirialCoefficient"],
      message: `secondVirialCoefficient is a function, not ${describeReceived(coefficient)}`,
      received: describeReceived(coefficient),
      expected: "(temperatureK, firstLabel, secondLabel) => ({ value, temperatureDerivative })",
    });
  }
  for (const key of ["correlation", "binaryInteraction", "polar"] as const) {
    if (options[key] === undefined) continue;
    faults.push({
      code: "fugacity/conflicting-options",
      path: [...path, key],
      message: `${key} is not used beside the caller's own secondVirialCoefficient`,
      received: describeReceived(options[key]),
      expected: `either ${key} or secondVirialCoefficient`,
      hint: `leave ${key} out; the function answers for every pair`,
    });
  }
}

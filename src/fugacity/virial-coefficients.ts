import { gasConstantJPerMolK } from "../constants/constants.js";
import { describeReceived, type FaultPath } from "../errors/fault.js";
import { fail } from "../errors/gibbs-ledger-error.js";
import { interactionParameter } from "./binary-interaction.js";
import { type CompleteConstants, type PairConstants, pairConstants } from "./pair-constants.js";
import { evaluateReduced, type ReducedCoefficient, reducedCoefficient } from "./reduced-coefficient.js";
import type { PolarTerm, VirialCoefficientFunction, VirialSettings } from "./virial-options.js";

/** Second virial coefficients of every pair at one temperature: symmetric square matrices by rows. */
export interface VirialCoefficients {
  /** B_ij in m3/mol. */
  readonly values: readonly Float64Array[];
  /** dB_ij/dT in m3/mol/K. */
  readonly slopes: readonly Float64Array[];
}

/** The coefficients at a temperature in kelvin; valid until the next call. */
export type VirialCoefficientSource = (temperatureK: number) => VirialCoefficients;

interface PreparedPair {
  readonly row: number;
  readonly column: number;
  /** Pseudocritical temperature in kelvin. */
  readonly temperatureK: number;
  /** R Tc/pc in m3/mol. */
  readonly scale: number;
  readonly reduced: ReducedCoefficient;
}

/** Coefficients by a correlation; the constants of the pairs are prepared once, and a repeated temperature is free. */
export function correlationCoefficients(
  settings: VirialSettings,
  labels: readonly string[],
  constants: readonly CompleteConstants[],
): VirialCoefficientSource {
  const pairs = preparePairs(settings, labels, constants);
  const coefficients = emptyCoefficients(labels.length);
  const reduced = { value: 0, slope: 0 };
  let lastTemperatureK = 0;
  return (temperatureK) => {
    if (temperatureK === lastTemperatureK) return coefficients;
    lastTemperatureK = temperatureK;
    for (const pair of pairs) {
      evaluateReduced(pair.reduced, pair.temperatureK / temperatureK, reduced);
      const value = pair.scale * reduced.value;
      const slope = 0 - (pair.scale * reduced.slope) / temperatureK;
      setPair(coefficients, pair.row, pair.column, value, slope);
    }
    return coefficients;
  };
}

/** Coefficients by a caller's function, each answer checked. */
export function callersCoefficients(
  coefficient: VirialCoefficientFunction,
  labels: readonly string[],
  path: FaultPath,
): VirialCoefficientSource {
  return (temperatureK) => {
    // New matrices on each call: the caller's function may itself ask this mixture for a state.
    const coefficients = emptyCoefficients(labels.length);
    for (let row = 0; row < labels.length; row += 1) {
      for (let column = row; column < labels.length; column += 1) {
        const one = labels[row]!;
        const other = labels[column]!;
        const [first, second] = one <= other ? [one, other] : [other, one];
        const answer: unknown = coefficient(temperatureK, first, second);
        const { value, temperatureDerivative } = checkAnswer(answer, temperatureK, [first, second], path);
        setPair(coefficients, row, column, value, temperatureDerivative);
      }
    }
    return coefficients;
  };
}

function preparePairs(
  settings: VirialSettings,
  labels: readonly string[],
  constants: readonly CompleteConstants[],
): readonly PreparedPair[] {
  const pairs: PreparedPair[] = [];
  constants.forEach((first, row) => {
    for (let column = row; column < constants.length; column += 1) {
      const labelsOfPair = [labels[row]!, labels[column]!] as const;
      const kij = row === column ? 0 : interactionParameter(settings.binaryInteraction, ...labelsOfPair);
      // A pure gas keeps its own constants; the combining rules would give them back with a rounding error.
      const pair: PairConstants = row === column ? first : pairConstants(first, constants[column]!, kij);
      pairs.push({
        row,
        column,
        temperatureK: pair.temperatureK,
        scale: (gasConstantJPerMolK * pair.temperatureK) / pair.pressurePa,
        reduced: reducedCoefficient(settings.correlation, pair.acentricFactor, polarOf(settings, labelsOfPair)),
      });
    }
  });
  return pairs;
}

/** The mean of two polar terms; none between a polar and a nonpolar substance. */
function polarOf(settings: VirialSettings, [one, other]: readonly [string, string]): PolarTerm | undefined {
  if (!Object.hasOwn(settings.polar, one) || !Object.hasOwn(settings.polar, other)) return undefined;
  const first = settings.polar[one]!;
  const second = settings.polar[other]!;
  return { a: (first.a + second.a) / 2, b: (first.b + second.b) / 2 };
}

function emptyCoefficients(count: number): VirialCoefficients {
  const rows = () => Array.from({ length: count }, () => new Float64Array(count));
  return { values: rows(), slopes: rows() };
}

function setPair(into: VirialCoefficients, row: number, column: number, value: number, slope: number): void {
  into.values[row]![column] = value;
  into.values[column]![row] = value;
  into.slopes[row]![column] = slope;
  into.slopes[column]![row] = slope;
}

function checkAnswer(
  answer: unknown,
  temperatureK: number,
  pair: readonly [string, string],
  path: FaultPath,
): { value: number; temperatureDerivative: number } {
  if (typeof answer !== "object" || answer === null) return refuseAnswer(answer, temperatureK, pair, path);
  const { value, temperatureDerivative } = answer as { value?: unknown; temperatureDerivative?: unknown };
  if (!isFiniteNumber(value)) return refuseAnswer(value, temperatureK, pair, path, "value");
  if (!isFiniteNumber(temperatureDerivative)) {
    return refuseAnswer(temperatureDerivative, temperatureK, pair, path, "temperatureDerivative");
  }
  return { value, temperatureDerivative };
}

function isFiniteNumber(value: unknown): value is number {
  return typeof value === "number" && Number.isFinite(value);
}

function refuseAnswer(
  answer: unknown,
  temperatureK: number,
  [first, second]: readonly [string, string],
  path: FaultPath,
  key?: string,
): never {
  return fail({
    code: "fugacity/coefficient-function",
    path: first === second ? [...path, first] : [...path, first, second],
    message:
      `secondVirialCoefficient gave ${describeReceived(answer)}${key === undefined ? "" : ` as ${key}`} ` +
      `for ${first} and ${second} at ${temperatureK} K`,
    received: describeReceived(answer),
    expected: "{ value, temperatureDerivative }: finite numbers in m3/mol and m3/mol/K",
  });
}

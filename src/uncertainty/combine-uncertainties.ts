import { cut, describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import { fail, failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkArray, checkNumber, checkObject, checkText } from "../errors/input.js";
import { exactDot, exactSum } from "../numeric/compensated.js";
import { powerOfTwo } from "../numeric/double-bits.js";

/** How a result depends on one datum, in one of the places where the datum enters. */
export interface UncertaintyContribution {
  /** Name of the datum. Contributions of one datum vary together; different data are independent of each other. */
  readonly datum: string;
  /** Sensitivity: the change of the result per change of the datum, with its sign. */
  readonly sensitivity: number;
  /** Standard uncertainty of the datum, at least 0; absent where it is not known. */
  readonly standardUncertainty?: number;
}

/** What one datum contributes to the uncertainty of a result. */
export interface DatumUncertainty {
  readonly datum: string;
  /** Sum of the sensitivities to the datum. */
  readonly sensitivity: number;
  /** Sensitivity times standard uncertainty, with its sign; absent where the uncertainty is not known. */
  readonly component?: number;
  /** The part of the known variance that is due to the datum, 0 to 1; absent where the uncertainty is not known. */
  readonly varianceShare?: number;
}

/** The uncertainty of a result, and what it is made of. */
export interface CombinedUncertainty {
  /** In the unit of the result. */
  readonly standardUncertainty: number;
  /** True where a datum of unknown uncertainty makes the stated one a lower bound. */
  readonly isLowerBound: boolean;
  /** Each datum once, in the order of the contributions. */
  readonly data: readonly DatumUncertainty[];
}

/**
 * The standard uncertainty of a result by the law of propagation, u^2 = sum over data of (c u(x))^2, where c is the sum
 * of all sensitivities of the result to the datum x: what a datum adds in one place and takes away in another cancels,
 * and independent data add in quadrature. A datum of unknown uncertainty makes the result a lower bound, unless its
 * sensitivities cancel exactly.
 *
 * @param contributions - at most 10,000; one line for each place where a datum enters
 * @returns in the unit of sensitivity times standard uncertainty
 * @throws GibbsLedgerError "uncertainty/inconsistent-datum" where a datum has two standard uncertainties,
 * "quantity/negative-uncertainty", "uncertainty/overflow", and the "input/..." codes of wrong shapes
 * @remarks Arithmetic: within 2 eps, whatever the order and the number of contributions (1.1 at worst in 2,000 random
 * cases against 60 digits); sensitivities that nearly cancel are summed exactly.
 * @see `references.jcgm2008`, 5.1.2 for independent data, 5.2.2 for data that are fully correlated
 * @example
 * const { standardUncertainty } = combineUncertainties([
 *   { datum: "formation enthalpy of CO2(g)", sensitivity: 1, standardUncertainty: 0.065 },
 *   { datum: "formation enthalpy of CO(g)", sensitivity: -1, standardUncertainty: 0.085 },
 * ]);
 * standardUncertainty; // => 0.107004672795...
 */
export function combineUncertainties(contributions: readonly UncertaintyContribution[]): CombinedUncertainty {
  const data = [...gather(contributions)].map(([datum, { sensitivities, standardUncertainty }]) => {
    const sensitivity = exactSum(sensitivities);
    const component = sensitivity === 0 ? 0 : product(sensitivity, standardUncertainty);
    return { datum, sensitivity, component };
  });
  for (const { datum, sensitivity, component = 0 } of data) {
    if (!Number.isFinite(sensitivity) || !Number.isFinite(component)) failOverflow(`the share of ${cut(datum, 60)}`);
  }
  const components = data.flatMap(({ component }) => (component === undefined ? [] : [component]));
  const scale = scaleOf(components);
  const scaled = components.map((component) => component * scale);
  const variance = exactDot(scaled, scaled);
  const standardUncertainty = Math.sqrt(variance) / scale;
  if (!Number.isFinite(standardUncertainty)) failOverflow("the combined uncertainty");
  return {
    standardUncertainty,
    isLowerBound: components.length < data.length,
    data: data.map(({ datum, sensitivity, component }) => {
      if (component === undefined) return { datum, sensitivity };
      const part = component * scale;
      return {
        datum,
        sensitivity,
        component,
        varianceShare: variance === 0 ? 0 : Math.min(1, (part * part) / variance),
      };
    }),
  };
}

interface Gathered {
  readonly sensitivities: number[];
  readonly standardUncertainty: number | undefined;
}

/** Checks the contributions and brings those of one datum together. */
function gather(contributions: readonly UncertaintyContribution[]): Map<string, Gathered> {
  const faults: Fault[] = [];
  const data = new Map<string, Gathered>();
  checkArray(contributions, ["contributions"], faults)?.forEach((entry, index) => {
    const read = checkContribution(entry, ["contributions", index], faults);
    if (read === undefined) return;
    const { datum, sensitivity, standardUncertainty } = read;
    const known = data.get(datum);
    if (known === undefined) {
      data.set(datum, { sensitivities: [sensitivity], standardUncertainty });
      return;
    }
    known.sensitivities.push(sensitivity);
    if (known.standardUncertainty === standardUncertainty) return;
    const [above, here] = [known.standardUncertainty, standardUncertainty].map((u) => u ?? "unknown");
    faults.push({
      code: "uncertainty/inconsistent-datum",
      path: ["contributions", index, "standardUncertainty"],
      message: `${describeReceived(datum)} has the standard uncertainty ${above} above and ${here} here`,
      received: String(standardUncertainty),
      expected: "the same wherever the datum enters",
      hint: "put what differs into the sensitivity, or name two data",
    });
  });
  failIfAny(faults);
  return data;
}

function checkContribution(value: unknown, path: FaultPath, faults: Fault[]): UncertaintyContribution | undefined {
  const before = faults.length;
  const members = checkObject(value, path, faults, {
    required: ["datum", "sensitivity"],
    optional: ["standardUncertainty"],
  });
  if (members === undefined) return undefined;
  const { datum, sensitivity, standardUncertainty } = members;
  if (datum !== undefined) checkText(datum, [...path, "datum"], faults);
  if (sensitivity !== undefined) checkNumber(sensitivity, [...path, "sensitivity"], faults);
  if (standardUncertainty !== undefined) {
    const size = checkNumber(standardUncertainty, [...path, "standardUncertainty"], faults);
    if (size !== undefined && size < 0) {
      faults.push({
        code: "quantity/negative-uncertainty",
        path: [...path, "standardUncertainty"],
        message: `a standard uncertainty is not negative, got ${size}`,
        received: String(size),
        expected: "at least 0",
        hint: "the sign belongs to the sensitivity",
      });
    }
  }
  return faults.length === before ? (members as unknown as UncertaintyContribution) : undefined;
}

function product(sensitivity: number, standardUncertainty: number | undefined): number | undefined {
  return standardUncertainty === undefined ? undefined : sensitivity * standardUncertainty + 0;
}

/** A power of two that keeps the squares of the components within the range of doubles. */
function scaleOf(components: readonly number[]): number {
  const largest = components.reduce((most, component) => Math.max(most, Math.abs(component)), 0);
  if (largest > powerOfTwo(400)) return powerOfTwo(-600);
  return largest < powerOfTwo(-400) ? powerOfTwo(600) : 1;
}

function failOverflow(what: string): never {
  fail({
    code: "uncertainty/overflow",
    path: ["contributions"],
    message: `${what} is too large for a double`,
    expected: "at most 1.7976931348623157e+308",
  });
}

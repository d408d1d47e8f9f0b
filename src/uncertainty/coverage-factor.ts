import { describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkNumber } from "../errors/input.js";
import { centralQuantile } from "./central-quantile.js";

/**
 * Coverages that are the rounded ones of one, two and three standard deviations. Evaluators who publish 95 per cent
 * mean a factor of two.
 */
const wholeFactors: readonly (readonly [coverage: number, factor: number])[] = [
  [0.68, 1],
  [0.6827, 1],
  [0.683, 1],
  [0.95, 2],
  [0.954, 2],
  [0.9545, 2],
  [0.997, 3],
  [0.9973, 3],
];

/**
 * The factor between half the width of a two-sided interval and the standard uncertainty, for the coverage that a
 * source states: that of the normal distribution, but 1 for a stated 68 per cent (0.68, 0.683, 0.6827), 2 for "about 95
 * per cent" (0.95, 0.954, 0.9545) and 3 for 99.7 per cent (0.997, 0.9973), as evaluators use the words.
 *
 * @param coverage - probability that the interval covers the value, above 0 and below 1
 * @throws GibbsLedgerError "uncertainty/invalid-coverage", "input/not-finite"
 * @remarks The 1.96 of exactly 95 per cent is `normalQuantile(0.975)`. Accuracy: within 3 ulp, as that function.
 * @see `references.jcgm2008`, 4.3.4 and table G.1
 * @example
 * coverageFactor(0.95); // => 2
 * coverageFactor(0.99); // => 2.57582930354890...
 */
export function coverageFactor(coverage: number): number {
  const faults: Fault[] = [];
  checkCoverage(coverage, ["coverage"], faults);
  failIfAny(faults);
  return factorOf(coverage);
}

/** The factor of a checked coverage. */
export function factorOf(coverage: number): number {
  const known = wholeFactors.find(([stated]) => stated === coverage);
  return known === undefined ? centralQuantile(coverage, 1 - coverage) : known[1];
}

/** Checks that a coverage is a probability, and collects what is wrong with it. */
export function checkCoverage(value: unknown, path: FaultPath, faults: Fault[]): number | undefined {
  const coverage = checkNumber(value, path, faults);
  if (coverage === undefined || (coverage > 0 && coverage < 1)) return coverage;
  faults.push({
    code: "uncertainty/invalid-coverage",
    path,
    message: `a coverage is a probability above 0 and below 1, got ${coverage}`,
    received: describeReceived(value),
    expected: "such as 0.95 for two standard uncertainties",
    ...(coverage > 1 && coverage < 100 ? { hint: `${coverage / 100} for ${coverage} per cent` } : {}),
  });
  return undefined;
}

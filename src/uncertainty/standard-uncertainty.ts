import type { Fault } from "../errors/fault.js";
import { fail, failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkNumber, checkObject } from "../errors/input.js";
import { checkCoverage, factorOf } from "./coverage-factor.js";

/** An uncertainty as sources publish it. */
export interface CoverageInterval {
  /** Half the width of a two-sided interval, at least 0. */
  readonly halfWidth: number;
  /** Probability that the interval covers the value, above 0 and below 1. */
  readonly coverage: number;
}

/**
 * The standard uncertainty that a published interval stands for: half its width over the factor of its coverage.
 *
 * @param interval - half width in any unit, and coverage
 * @returns in the unit of the half width
 * @throws GibbsLedgerError "uncertainty/invalid-coverage", "quantity/negative-uncertainty", "uncertainty/overflow",
 * "input/not-finite", "input/missing", "input/unknown-key"
 * @see `references.jcgm2008`, 4.3.4
 * @example
 * standardUncertaintyOf({ halfWidth: 0.13, coverage: 0.95 }); // => 0.065
 */
export function standardUncertaintyOf(interval: CoverageInterval): number {
  const faults: Fault[] = [];
  const members = checkObject(interval, ["interval"], faults, { required: ["halfWidth", "coverage"], optional: [] });
  if (members?.coverage !== undefined) checkCoverage(members.coverage, ["interval", "coverage"], faults);
  if (members?.halfWidth !== undefined) {
    const halfWidth = checkNumber(members.halfWidth, ["interval", "halfWidth"], faults);
    if (halfWidth !== undefined && halfWidth < 0) {
      faults.push({
        code: "quantity/negative-uncertainty",
        path: ["interval", "halfWidth"],
        message: `half the width of an interval is not negative, got ${halfWidth}`,
        received: String(halfWidth),
        expected: "at least 0",
      });
    }
  }
  failIfAny(faults);
  return uncertaintyOfInterval(interval);
}

/** The standard uncertainty of a checked interval. */
export function uncertaintyOfInterval({ halfWidth, coverage }: CoverageInterval): number {
  const uncertainty = halfWidth / factorOf(coverage);
  if (uncertainty === Number.POSITIVE_INFINITY) {
    fail({
      code: "uncertainty/overflow",
      path: ["interval"],
      message: `the standard uncertainty of ${halfWidth} at a coverage of ${coverage} is too large for a double`,
      received: `${halfWidth} at ${coverage}`,
      expected: "at most 1.7976931348623157e+308",
    });
  }
  return uncertainty + 0;
}

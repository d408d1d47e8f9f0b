import type { Fault, FaultPath } from "../errors/fault.js";
import { checkNumber, checkObject } from "../errors/input.js";
import { checkProvenance } from "../references/check-source.js";
import { checkParts } from "./check-parts.js";
import type { Dimension } from "./units.js";

/** Checks a published figure of one dimension and collects what is wrong with it. */
export function checkFigure(value: unknown, dimension: Dimension, path: FaultPath, faults: Fault[]): void {
  const figure = checkObject(value, path, faults, {
    required: ["value", "unit", "source", "origin"],
    optional: ["uncertainty", "where"],
  });
  if (figure === undefined) return;
  if (figure.value !== undefined && figure.unit !== undefined) {
    checkParts(figure.value, figure.unit, undefined, dimension, path, faults);
  }
  checkProvenance(figure, path, faults);
  if (figure.uncertainty !== undefined) checkUncertainty(figure.uncertainty, [...path, "uncertainty"], faults);
}

/** Checks a published uncertainty: half the width of an interval, and the probability that it covers. */
export function checkUncertainty(value: unknown, path: FaultPath, faults: Fault[]): void {
  const uncertainty = checkObject(value, path, faults, { required: ["halfWidth", "coverage"], optional: [] });
  if (uncertainty === undefined) return;
  if (uncertainty.halfWidth !== undefined) {
    const halfWidth = checkNumber(uncertainty.halfWidth, [...path, "halfWidth"], faults);
    if (halfWidth !== undefined && halfWidth < 0) {
      faults.push({
        code: "quantity/negative-uncertainty",
        path: [...path, "halfWidth"],
        message: `half the width of an interval is not negative, got ${halfWidth}`,
        received: String(halfWidth),
        expected: "at least 0",
      });
    }
  }
  if (uncertainty.coverage !== undefined) {
    const coverage = checkNumber(uncertainty.coverage, [...path, "coverage"], faults);
    if (coverage !== undefined && !(coverage > 0 && coverage < 1)) {
      faults.push({
        code: "input/unknown-option",
        path: [...path, "coverage"],
        message: `a coverage is a probability between 0 and 1, got ${coverage}`,
        received: String(coverage),
        expected: "such as 0.95 for two standard uncertainties",
        ...(coverage > 1 && coverage <= 100 ? { hint: `${coverage / 100} for ${coverage} per cent` } : {}),
      });
    }
  }
}

import { referenceTemperatureK } from "../constants/constants.js";
import type { Fault, FaultPath } from "../errors/fault.js";
import { carriesConstants } from "../heat-capacity/forms.js";
import { startOfRange } from "../heat-capacity/read-series.js";
import { figureInSi } from "../quantity/figure-value.js";
import type { SpeciesRecord } from "./record.js";

/**
 * Checks that H and S of a record, otherwise sound, can be carried from where they are known through every interval:
 * the anchor lies inside the fit, and each first-order break has its enthalpy of transition.
 */
export function checkContinuation(record: SpeciesRecord, path: FaultPath, faults: Fault[]): void {
  const { gibbsFunction, transitions = [] } = record;
  if (gibbsFunction.kind !== "series" || carriesConstants(gibbsFunction.form)) return;
  const { intervals, anchor } = gibbsFunction;
  const anchorK = anchor === undefined ? referenceTemperatureK : figureInSi(anchor.temperature);
  const [fromK, toK] = [startOfRange(intervals[0]!.from), intervals.at(-1)!.to];
  if (!(anchorK >= fromK && anchorK <= toK)) {
    faults.push({
      code: "heat-capacity/no-anchor",
      path: [...path, "gibbsFunction", "anchor"],
      message: `H and S are known at ${anchorK} K, outside the fit from ${fromK} K to ${toK} K`,
      received: `${anchorK} K`,
      expected: "an anchor at a temperature within the intervals",
    });
  }
  const knownK = new Set(transitions.map(({ temperature }) => figureInSi(temperature)));
  intervals.slice(0, -1).forEach(({ to, endsAt }, index) => {
    if (endsAt !== "first-order" || knownK.has(to)) return;
    faults.push({
      code: "heat-capacity/no-anchor",
      path: [...path, "gibbsFunction", "intervals", index, "endsAt"],
      message: `a first-order transition at ${to} K has no enthalpy`,
      expected: `an entry of transitions at ${to} K with its enthalpy`,
    });
  });
}

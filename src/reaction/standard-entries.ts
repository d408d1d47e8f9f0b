import { referenceTemperatureK } from "../constants/constants.js";
import { evaluateAll, intervalOf } from "../heat-capacity/evaluate.js";
import type { SeriesPlan } from "../heat-capacity/merge.js";
import type { RangePolicy } from "../heat-capacity/range-policy.js";
import { exactSum } from "../numeric/compensated.js";
import type { Figure } from "../quantity/figure.js";
import { isSameSource } from "../references/is-same-source.js";
import type { Source } from "../references/source.js";
import type { SpeciesRecord } from "../species/record.js";
import { openingRecord, phaseAt, standardPressureShift, substancePlan } from "../species/substance-function.js";
import { figureStandardUncertainty } from "../uncertainty/figure-uncertainty.js";
import { firstOrderBreaks } from "./first-order-breaks.js";
import { type LedgerEntry, type LedgerEntryName, type LedgerGroup, tagged } from "./ledger-entry.js";
import type { ReactionTerm } from "./reaction.js";

/** The entries that lead from the elements at 298.15 K to the standard state at the temperature. */
export function standardEntries(
  { species, coefficient, label }: ReactionTerm,
  temperatureK: number,
  policy: RangePolicy,
): LedgerEntry[] {
  const plan = substancePlan(species, policy);
  const anchorK = anchorOf(substancePlan(species, "refuse"));
  const atAnchor = evaluateAll(intervalOf(plan, anchorK)!, anchorK);
  const here = evaluateAll(intervalOf(plan, temperatureK)!, temperatureK);
  const shift = standardPressureShift(species);
  const shiftEntropy = shift ?? 0;
  const jumps = firstOrderBreaks(species, anchorK, temperatureK);
  const jumpEnthalpy = exactSum(jumps.map(({ enthalpy }) => enthalpy));
  const jumpEntropy = exactSum(jumps.map(({ entropy }) => entropy));
  const { record, share } = openingRecord(species);
  const opening = { ...sourceOf(record), ...(anchorK === referenceTemperatureK ? {} : { note: `at ${anchorK} K` }) };
  const fit = sourceOf(phaseAt(species, temperatureK));
  const make = (
    group: LedgerGroup,
    entry: LedgerEntryName,
    value: number,
    rest: Partial<LedgerEntry> = {},
    uncertainty?: number,
  ): LedgerEntry => ({
    group,
    entry,
    label,
    coefficient,
    value: tagged(coefficient * value, uncertainty === undefined ? undefined : Math.abs(coefficient * uncertainty)),
    ...rest,
  });
  const ofFigure = (key: "formationEnthalpy" | "standardEntropy", factor: number) =>
    [
      { ...opening, ...secondSource(record, record[key]), datum: `${record.label} ${key}` },
      scaled(figureStandardUncertainty(record[key]), factor * share),
    ] as const;
  const entries = [
    make("formation", "formation enthalpy", atAnchor.enthalpy, ...ofFigure("formationEnthalpy", 1)),
    make(
      "formation",
      "reference entropy",
      -temperatureK * (atAnchor.entropy - shiftEntropy),
      ...ofFigure("standardEntropy", temperatureK),
    ),
    make("temperature", "sensible heat", here.enthalpy - atAnchor.enthalpy - jumpEnthalpy, fit),
    make("temperature", "heat-capacity entropy", -temperatureK * (here.entropy - atAnchor.entropy - jumpEntropy), fit),
    ...jumps.map(({ atK, enthalpy, entropy, into, standardUncertainty, source }) =>
      make(
        "temperature",
        "transition",
        enthalpy - temperatureK * entropy,
        {
          source,
          datum: `transition at ${atK} K of ${label}`,
          ...(into === undefined ? {} : { into }),
          note: `at ${atK} K`,
        },
        scaled(standardUncertainty, 1 - temperatureK / atK),
      ),
    ),
  ];
  if (shift !== undefined) {
    entries.push(make("conditions", "standard pressure", -temperatureK * shiftEntropy, {}, 0));
  }
  return entries;
}

/** 298.15 K, or the lower end of a range that lacks it. */
function anchorOf({ fromK, toK }: SeriesPlan): number {
  return referenceTemperatureK >= fromK && referenceTemperatureK <= toK ? referenceTemperatureK : fromK;
}

function scaled(uncertainty: number | undefined, factor: number): number | undefined {
  return uncertainty === undefined ? undefined : uncertainty * factor;
}

function sourceOf({ gibbsFunction, formationEnthalpy }: SpeciesRecord): { readonly source?: Source } {
  const source = gibbsFunction.kind === "series" ? gibbsFunction.source : formationEnthalpy?.source;
  return source === undefined ? {} : { source };
}

function secondSource(record: SpeciesRecord, figure: Figure | undefined): { readonly secondSource?: Source } {
  const first = sourceOf(record).source;
  return figure === undefined || isSameSource(figure.source, first) ? {} : { secondSource: figure.source };
}

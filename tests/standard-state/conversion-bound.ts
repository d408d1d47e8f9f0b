import type { PublishedSeries } from "../../src/heat-capacity/published-series.js";
import { seriesProperties } from "../../src/heat-capacity/series-properties.js";
import type { SpeciesRecord } from "../../src/species/record.js";

/** Every number of a record, by its path. */
export function numbersOf(value: unknown, path = ""): Map<string, number> {
  if (typeof value === "number") return new Map([[path, value]]);
  if (typeof value !== "object" || value === null) return new Map();
  return new Map(Object.entries(value).flatMap(([key, member]) => [...numbersOf(member, `${path}.${key}`)]));
}

/** What one unit of a coefficient is at most, in J/mol or J/mol/K. */
const units: { readonly [Form in PublishedSeries["form"]]?: number } = {
  shomate: 1000,
  "seven-coefficient": 8.4,
  "nine-coefficient": 8.4,
};

/**
 * How far a property of a record and of the converted one may lie apart by rounding: the bound of each evaluation, and
 * half a unit in the last place for each number of the fit that moved.
 */
export function conversionBound(
  before: SpeciesRecord,
  after: SpeciesRecord,
  property: "enthalpy" | "entropy",
  temperatureK: number,
): number {
  const fits = [before, after].map(({ gibbsFunction }) => gibbsFunction as PublishedSeries);
  const evaluations = fits.map((fit) => {
    const { kind, form, gasConstant, unit, powers, decimalShifts, intervals, anchor } = fit;
    const parts = { kind, form, gasConstant, unit, powers, decimalShifts, intervals, anchor };
    const given = Object.fromEntries(Object.entries(parts).filter(([, part]) => part !== undefined));
    const conditions = { temperature: { value: temperatureK, unit: "K" } } as const;
    return seriesProperties(given as unknown as PublishedSeries, conditions).roundingBounds[property];
  });
  const was = numbersOf(fits[0]);
  const unit = units[fits[0]!.form] ?? 1;
  const moved = [...numbersOf(fits[1])].filter(([path, value]) => was.get(path) !== value);
  const rounded = moved.reduce((sum, [, value]) => sum + Math.abs(value) * unit * (Number.EPSILON / 2), 0);
  return evaluations[0]! + evaluations[1]! + rounded;
}

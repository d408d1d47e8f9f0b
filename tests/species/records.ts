import { parseLabel } from "../../src/formula/parse-label.js";
import type { PublishedSeries } from "../../src/heat-capacity/published-series.js";
import type { CollectionData, SpeciesRecord, StateSymbol } from "../../src/species/record.js";
import { figure, invented } from "../heat-capacity/random-series.js";

/** An invented record of a label; without a fit it is known at 298.15 K only. */
export function recordOf(label: string, parts: Partial<SpeciesRecord> = {}): SpeciesRecord {
  const { formula, chargeNumber, state, polymorph } = parseLabel(label);
  return {
    label,
    name: `invented ${label}`,
    formula,
    chargeNumber,
    state: state as StateSymbol,
    ...(polymorph === undefined ? {} : { polymorph }),
    standardPressure: figure(1, "bar"),
    formationEnthalpy: figure(0, "kJ/mol"),
    standardEntropy: figure(200, "J/mol/K"),
    gibbsFunction: { kind: "reference-point" },
    witnesses: [],
    ...parts,
  };
}

/** The Gibbs function of an invented fit. */
export function fitted(series: PublishedSeries): SpeciesRecord["gibbsFunction"] {
  return { ...series, source: invented, origin: "memory" };
}

/** An invented record with Cp = sum of c T^n from 200 K to 3000 K and figures at 298.15 K. */
export function polynomialRecord(
  label: string,
  enthalpyJPerMol: number,
  entropyJPerMolK: number,
  coefficients: readonly number[],
  powers: readonly number[] = coefficients.map((_value, index) => index),
  parts: Partial<SpeciesRecord> = {},
): SpeciesRecord {
  return recordOf(label, {
    formationEnthalpy: figure(enthalpyJPerMol, "J/mol"),
    standardEntropy: figure(entropyJPerMolK, "J/mol/K"),
    gibbsFunction: fitted({
      kind: "series",
      form: "polynomial",
      powers,
      intervals: [{ from: 200, to: 3000, coefficients, endsAt: "fit" }],
    }),
    ...parts,
  });
}

export function collectionOf(...species: SpeciesRecord[]): CollectionData {
  return { species };
}

import type { SpeciesRecord } from "../species/record.js";

/** White phosphorus, crystal: the reference phase of the element. */
export const P_cr_white: SpeciesRecord = {
  label: "P(cr,white)",
  name: "white phosphorus",
  formula: "P",
  chargeNumber: 0,
  state: "cr",
  polymorph: "white",
  casNumber: "7723-14-0",
  standardPressure: { value: 1, unit: "bar", source: "cox1989", origin: "memory" },
  formationEnthalpy: { value: 0, unit: "kJ/mol", source: "cox1989", origin: "memory" },
  standardEntropy: {
    value: 41.09,
    unit: "J/mol/K",
    uncertainty: { halfWidth: 0.25, coverage: 0.95 },
    source: "cox1989",
    origin: "memory",
  },
  enthalpyAbove0K: {
    value: 5.360,
    unit: "kJ/mol",
    uncertainty: { halfWidth: 0.015, coverage: 0.95 },
    source: "cox1989",
    origin: "memory",
  },
  gibbsFunction: { kind: "reference-point" },
  witnesses: [
    {
      group: "caloric",
      kind: "transcription",
      check: "entropy-at-298.15-K",
      against: { standardEntropy: { value: 41.09, unit: "J/mol/K", source: "wagman1982", origin: "memory" } },
      deviation: 0,
      tolerance: 0.33,
      source: "wagman1982",
    },
    {
      group: "caloric",
      kind: "transcription",
      check: "entropy-at-298.15-K",
      against: { standardEntropy: { value: 41.077, unit: "J/mol/K", source: "chase1998", origin: "memory" } },
      deviation: 0.013,
      tolerance: 0.25,
      source: "chase1998",
    },
    {
      group: "caloric",
      kind: "transcription",
      check: "formation-enthalpy-at-0-K",
      against: {
        enthalpyAbove0K: { value: 6.197, unit: "kJ/mol", source: "cox1989", origin: "memory" },
        formationEnthalpy: { value: 316.39, unit: "kJ/mol", source: "chase1998", origin: "memory" },
        formationEnthalpyAt0K: {
          value: 75.42,
          unit: "kcal_th/mol",
          source: "chase1998",
          origin: "memory",
          where: "recalled in kcal/mol, rounded to 0.01",
        },
      },
      reaction: { "P(cr,white)": -1 },
      deviation: -4.28,
      tolerance: 37,
      source: "chase1998",
    },
  ],
};

import { referenceData } from "../../src/data/reference-data.js";
import { quantity } from "../../src/quantity/quantity.js";
import { reaction } from "../../src/reaction/reaction.js";
import { standardReactionProperties } from "../../src/reaction/standard-reaction.js";
import { type AccuracyRow, row } from "./accuracy-row.js";
import {
  computedFunctions,
  gasConstantTimesLn10,
  slug,
  spreadOfFunctions,
  spreadOfReaction,
  type TableFunctions,
  tidy,
} from "./combined-uncertainty.js";
import { type JanafColumns, janafTable } from "./janaf-table.js";

const common = {
  class: "cross source",
  source: "NIST-JANAF Thermochemical Tables, 4th ed. (1998)",
  origin: "memory",
} as const;

/** The tables print three decimals. */
const rounding = 0.0005;

/** The column log Kf was printed with R near 8.3143 J/mol/K; against 8.31446 that is 2e-5, and 3e-5 is allowed. */
const olderGasConstant = 3e-5;

/** Formation from the elements in their reference phases. */
const formation: Readonly<Record<string, string>> = {
  "H(g)": "1/2 H2(g) = H(g)",
  "N(g)": "1/2 N2(g) = N(g)",
  "O(g)": "1/2 O2(g) = O(g)",
  "C(g)": "C(cr,graphite) = C(g)",
  "H2O(g)": "H2(g) + 1/2 O2(g) = H2O(g)",
  "H2O(l)": "H2(g) + 1/2 O2(g) = H2O(l)",
  "OH(g)": "1/2 H2(g) + 1/2 O2(g) = OH(g)",
  "CO(g)": "C(cr,graphite) + 1/2 O2(g) = CO(g)",
  "CO2(g)": "C(cr,graphite) + O2(g) = CO2(g)",
  "CH4(g)": "C(cr,graphite) + 2 H2(g) = CH4(g)",
  "NH3(g)": "1/2 N2(g) + 3/2 H2(g) = NH3(g)",
  "NO(g)": "1/2 N2(g) + 1/2 O2(g) = NO(g)",
};

/**
 * Species whose formation enthalpy was evaluated anew, kJ/mol: the one JANAF printed, and the one of the data. The
 * printed log10 K is moved to the newer enthalpy, exactly, so that entropy and heat capacity are what is compared.
 */
const movedEnthalpy: Readonly<Record<string, { readonly from: number; readonly to: number }>> = {
  "NO(g)": { from: 90.291, to: 91.27131 },
  "OH(g)": { from: 38.987, to: 37.278206 },
};

const functionNames: readonly (readonly [keyof TableFunctions, string, string])[] = [
  ["heatCapacity", "Cp", "Cp in J/mol/K"],
  ["entropy", "S", "S in J/mol/K"],
  ["gibbsFunction", "G-function", "-(G - H(298.15 K))/T in J/mol/K"],
  ["enthalpyIncrement", "H-increment", "H - H(298.15 K) in kJ/mol"],
];

/** JANAF's functions and formation values beside the reference data, which follow later evaluations. */
export function rows(): AccuracyRow[] {
  return Object.entries(janafTable).flatMap(([label, columns]) =>
    columns.temperatureK.flatMap((temperatureK, index) => [
      ...functionRows(label, columns, temperatureK, index),
      ...formationRows(label, columns, temperatureK, index),
    ]),
  );
}

function functionRows(label: string, columns: JanafColumns, temperatureK: number, index: number): AccuracyRow[] {
  const computed = computedFunctions(label, temperatureK);
  const spread = spreadOfFunctions(label, temperatureK);
  return functionNames.flatMap(([name, short, words]) => {
    const expected = columns[name]?.[index];
    if (expected === undefined || expected === null) return [];
    return row({
      id: `janaf-${slug(label)}-${short}-${temperatureK}-K`,
      ...common,
      quantity: `${label} at ${temperatureK} K: ${words}`,
      expected,
      computed: computed[name],
      tolerance: tidy(rounding + spread[name]),
    });
  });
}

function formationRows(label: string, columns: JanafColumns, temperatureK: number, index: number): AccuracyRow[] {
  const equation = formation[label];
  if (equation === undefined) return [];
  const subject = reaction(equation, referenceData);
  const moved = movedEnthalpy[label];
  const computed = standardReactionProperties(subject, { temperature: quantity(temperatureK, "K") });
  const spread = spreadOfReaction(subject, temperatureK, moved === undefined ? undefined : label);
  const id = `janaf-${slug(label)}-formation`;
  const energies = [
    ["formationEnthalpy", "enthalpy", "enthalpy", computed.enthalpy.value, spread.enthalpy],
    ["formationGibbsEnergy", "gibbs-energy", "Gibbs energy", computed.gibbsEnergy.value, spread.gibbsEnergy],
  ] as const;
  const made = energies.flatMap(([name, short, words, value, half]) => {
    const expected = columns[name]?.[index];
    if (expected === undefined || expected === null) return [];
    return row({
      id: `${id}-${short}-${temperatureK}-K`,
      ...common,
      quantity: `${label} at ${temperatureK} K: formation ${words} in kJ/mol`,
      expected,
      computed: value / 1000,
      tolerance: tidy(rounding + half),
    });
  });
  const printed = columns.log10K?.[index];
  if (printed === undefined || printed === null) return made;
  const perLogarithm = gasConstantTimesLn10 * temperatureK;
  const shift = moved === undefined ? 0 : (moved.from - moved.to) / perLogarithm;
  const note = moved === undefined ? "" : `, ${printed} moved from ${moved.from} to ${moved.to} kJ/mol at 298.15 K`;
  made.push(
    row({
      id: `${id}-log10-K-${temperatureK}-K`,
      ...common,
      quantity: `${label} at ${temperatureK} K: log10 K of formation${note}`,
      expected: Number((printed + shift).toFixed(5)),
      computed: computed.log10K,
      tolerance: tidy(rounding + olderGasConstant * Math.abs(printed) + spread.gibbsEnergy / perLogarithm),
    }),
  );
  return made;
}

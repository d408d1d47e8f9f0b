import { referenceData } from "../../src/data/reference-data.js";
import { quantity } from "../../src/quantity/quantity.js";
import { reaction } from "../../src/reaction/reaction.js";
import { standardReactionProperties } from "../../src/reaction/standard-reaction.js";
import { formationProperties } from "../../src/species/formation-properties.js";
import { standardProperties } from "../../src/species/standard-properties.js";
import { type AccuracyRow, row } from "./accuracy-row.js";
import {
  computedFunctions,
  gasConstantTimesLn10,
  recordOf,
  slug,
  spreadOfFunctions,
  type TableFunctions,
  tidy,
} from "./combined-uncertainty.js";
import { type GasColumns, gasesTable } from "./gases-table.js";

const janaf = {
  class: "cross source",
  source: "NIST-JANAF Thermochemical Tables, 4th ed. (1998)",
  origin: "memory",
} as const;

/** The tables print three decimals. */
const rounding = 0.0005;

/** log10 K was printed with R near 8.3143 J/mol/K: see combined-uncertainty.ts. */
const olderGasConstant = 3e-5;

const functionNames: readonly (readonly [keyof TableFunctions, string, string])[] = [
  ["heatCapacity", "Cp", "Cp in J/mol/K"],
  ["entropy", "S", "S in J/mol/K"],
  ["gibbsFunction", "G-function", "-(G - H(298.15 K))/T in J/mol/K"],
  ["enthalpyIncrement", "H-increment", "H - H(298.15 K) in kJ/mol"],
];

/** Functions and formation properties of the gases beside JANAF, CODATA, and constants of reactions in textbooks. */
export function rows(): AccuracyRow[] {
  return [...janafRows(), ...codataRows(), ...reactionRows()];
}

function janafRows(): AccuracyRow[] {
  return Object.entries(gasesTable).flatMap(([label, columns]) =>
    columns.temperatureK.flatMap((temperatureK, index) => [
      ...functionRows(label, columns, temperatureK, index),
      ...formationRows(label, columns, temperatureK, index),
    ]),
  );
}

function functionRows(label: string, columns: GasColumns, temperatureK: number, index: number): AccuracyRow[] {
  const computed = computedFunctions(label, temperatureK);
  const spread = spreadOfFunctions(label, temperatureK);
  return functionNames.flatMap(([name, short, words]) => {
    const expected = columns[name]?.[index];
    if (expected === undefined || expected === null) return [];
    return row({
      id: `janaf-${slug(label)}-${short}-${temperatureK}-K`,
      ...janaf,
      quantity: `${label} at ${temperatureK} K: ${words}`,
      expected,
      computed: computed[name],
      tolerance: tidy(rounding + spread[name]),
    });
  });
}

function formationRows(label: string, columns: GasColumns, temperatureK: number, index: number): AccuracyRow[] {
  const printedRows = [
    ["formationEnthalpy", "enthalpy", "formation enthalpy in kJ/mol"],
    ["formationGibbsEnergy", "gibbs-energy", "formation Gibbs energy in kJ/mol"],
  ] as const;
  const log10K = columns.log10K?.[index];
  const hasAny = printedRows.some(([name]) => typeof columns[name]?.[index] === "number");
  if (!hasAny && typeof log10K !== "number") return [];
  const record = recordOf(label);
  const computed = formationProperties(record, { temperature: quantity(temperatureK, "K") }, referenceData);
  const spread = spreadOfFormation(label, columns, temperatureK);
  const id = `janaf-${slug(label)}-formation`;
  const values = { formationEnthalpy: computed.enthalpy.value, formationGibbsEnergy: computed.gibbsEnergy.value };
  const spreads = { formationEnthalpy: spread.enthalpy, formationGibbsEnergy: spread.gibbsEnergy };
  const made = printedRows.flatMap(([name, short, words]) => {
    const expected = columns[name]?.[index];
    if (expected === undefined || expected === null) return [];
    return row({
      id: `${id}-${short}-${temperatureK}-K`,
      ...janaf,
      quantity: `${label} at ${temperatureK} K: ${words}`,
      expected,
      computed: values[name] / 1000,
      tolerance: tidy(rounding + spreads[name]),
    });
  });
  if (log10K === undefined || log10K === null) return made;
  const perLogarithm = gasConstantTimesLn10 * temperatureK;
  const to = standardProperties(record, { temperature: quantity(298.15, "K") }).enthalpy.value / 1000;
  const shift = columns.movedFrom === undefined ? 0 : (columns.movedFrom - to) / perLogarithm;
  const note = columns.movedFrom === undefined ? "" : `, ${log10K} moved from ${columns.movedFrom} kJ/mol at 298.15 K`;
  made.push(
    row({
      id: `${id}-log10-K-${temperatureK}-K`,
      ...janaf,
      quantity: `${label} at ${temperatureK} K: log10 K of formation${note}`,
      expected: Number((log10K + shift).toFixed(5)),
      computed: computed.log10K,
      tolerance: tidy(rounding + olderGasConstant * Math.abs(log10K) + spread.gibbsEnergy / perLogarithm),
    }),
  );
  return made;
}

/** As `spreadOfReaction`, with the elements as the table names them; an enthalpy that was moved counts as exact. */
function spreadOfFormation(
  label: string,
  { elements, halfWidth, movedFrom }: GasColumns,
  temperatureK: number,
): { readonly enthalpy: number; readonly gibbsEnergy: number } {
  const formation = movedFrom === undefined ? halfWidth : 0;
  let enthalpy = formation;
  let gibbsEnergy = formation;
  for (const [part, number] of [[label, 1] as const, ...Object.entries(elements)]) {
    const at = recordOf(part).state === "g" ? temperatureK : 298.15;
    const spread = spreadOfFunctions(part, at);
    enthalpy += number * spread.enthalpyIncrement;
    gibbsEnergy += (number * spread.gibbsFunction * temperatureK) / 1000;
  }
  return { enthalpy, gibbsEnergy };
}

/** At 298.15 K: formation enthalpy in kJ/mol and its half-width, entropy in J/mol/K and its half-width (95 percent). */
const codataValues: Readonly<Record<string, readonly [number | null, number | null, number, number]>> = {
  "Ne(g)": [null, null, 146.328, 0.003],
  "Kr(g)": [null, null, 164.085, 0.003],
  "Xe(g)": [null, null, 169.685, 0.003],
  "F2(g)": [null, null, 202.791, 0.005],
  "Cl2(g)": [null, null, 223.081, 0.01],
  "I2(g)": [62.42, 0.08, 260.687, 0.005],
  "F(g)": [79.38, 0.3, 158.751, 0.004],
  "Cl(g)": [121.301, 0.008, 165.19, 0.004],
  "HF(g)": [null, null, 173.779, 0.003],
  "HCl(g)": [-92.31, 0.1, 186.902, 0.005],
  "HI(g)": [null, null, 206.59, 0.004],
  "S(g)": [277.17, 0.15, 167.829, 0.006],
  "S2(g)": [128.6, 0.3, 228.167, 0.01],
  "H2S(g)": [-20.6, 0.5, 205.81, 0.05],
  "Na(g)": [107.5, 0.7, 153.718, 0.003],
  "K(g)": [89, 0.8, 160.341, 0.003],
  "Mg(g)": [147.1, 0.8, 148.648, 0.003],
  "Ca(g)": [177.8, 0.8, 154.887, 0.004],
  "Al(g)": [330, 4, 164.554, 0.004],
};

function codataRows(): AccuracyRow[] {
  const common = {
    class: "cross source",
    source: "J. D. Cox, D. D. Wagman, V. A. Medvedev, CODATA Key Values for Thermodynamics (1989)",
    origin: "memory",
  } as const;
  return Object.entries(codataValues).flatMap(([label, [enthalpy, enthalpyHalfWidth, entropy, entropyHalfWidth]]) => {
    const computed = standardProperties(recordOf(label), { temperature: quantity(298.15, "K") });
    const made = [
      row({
        id: `codata-${slug(label)}-entropy`,
        ...common,
        quantity: `entropy of ${label} at 298.15 K in J/mol/K`,
        expected: entropy,
        computed: computed.entropy.value,
        tolerance: entropyHalfWidth,
      }),
    ];
    if (enthalpy === null || enthalpyHalfWidth === null) return made;
    made.push(
      row({
        id: `codata-${slug(label)}-formation-enthalpy`,
        ...common,
        quantity: `formation enthalpy of ${label} at 298.15 K in kJ/mol`,
        expected: enthalpy,
        computed: computed.enthalpy.value / 1000,
        tolerance: enthalpyHalfWidth,
      }),
    );
    return made;
  });
}

interface TextbookConstant {
  readonly id: string;
  readonly equation: string;
  readonly temperatureK: number;
  /** K as printed, for partial pressures in bar. */
  readonly printed: number;
  /** 95 percent half-widths of the formation enthalpies together, kJ/mol: Pedley, Naylor and Kirby (1986); memory. */
  readonly halfWidth: number;
  readonly where: string;
}

const cracking = { temperatureK: 750, where: "cracking of n-butane" };
const textbook: readonly TextbookConstant[] = [
  {
    id: "hydration-of-ethene",
    equation: "C2H4(g) + H2O(g) = C2H5OH(g)",
    temperatureK: 298.15,
    printed: 29.366,
    halfWidth: 0.84,
    where: "hydration of ethene",
  },
  {
    id: "butane-to-ethene",
    ...cracking,
    equation: "C4H10(g,n-butane) = C2H4(g) + C2H6(g)",
    printed: 3.856,
    halfWidth: 1.3,
  },
  {
    id: "butane-to-propene",
    ...cracking,
    equation: "C4H10(g,n-butane) = C3H6(g) + CH4(g)",
    printed: 268.4,
    halfWidth: 1.8,
  },
];

function reactionRows(): AccuracyRow[] {
  return textbook.map(({ id, equation, temperatureK, printed, halfWidth, where }) => {
    const subject = reaction(equation, referenceData);
    const computed = standardReactionProperties(subject, { temperature: quantity(temperatureK, "K") });
    return row({
      id: `smith-van-ness-abbott-${id}`,
      class: "cross source",
      source: `J. M. Smith, H. C. Van Ness, M. M. Abbott, Introduction to Chemical Engineering Thermodynamics, ${where}`,
      origin: "memory",
      quantity: `log10 K of ${equation} at ${temperatureK} K`,
      expected: Number(Math.log10(printed).toFixed(5)),
      computed: computed.log10K,
      tolerance: tidy(halfWidth / (gasConstantTimesLn10 * temperatureK)),
    });
  });
}

import { referenceData } from "../../src/data/reference-data.js";
import { quantity } from "../../src/quantity/quantity.js";
import { reaction } from "../../src/reaction/reaction.js";
import { standardReactionProperties } from "../../src/reaction/standard-reaction.js";
import { standardProperties } from "../../src/species/standard-properties.js";
import { type AccuracyRow, row } from "./accuracy-row.js";
import { formationSpread, recordOf, slug, spreadOfFunctions, spreadOfReaction, tidy } from "./combined-uncertainty.js";

const codata = "J. D. Cox, D. D. Wagman, V. A. Medvedev, CODATA Key Values for Thermodynamics (1989)";
const nbs = "D. D. Wagman et al., The NBS Tables of Chemical Thermodynamic Properties (1982)";
const robie = "R. A. Robie, B. S. Hemingway, USGS Bulletin 2131 (1995)";

/**
 * At 298.15 K: formation enthalpy in kJ/mol, its printed half-width, entropy in J/mol/K, its printed half-width (95
 * percent). A formation enthalpy that is zero by convention has no half-width and is no row.
 */
const codataValues: Readonly<Record<string, readonly [number, number | null, number, number]>> = {
  "H2(g)": [0, null, 130.68, 0.003],
  "N2(g)": [0, null, 191.609, 0.004],
  "O2(g)": [0, null, 205.152, 0.005],
  "C(cr,graphite)": [0, null, 5.74, 0.1],
  "He(g)": [0, null, 126.153, 0.002],
  "Ar(g)": [0, null, 154.846, 0.003],
  "H(g)": [217.998, 0.006, 114.717, 0.002],
  "N(g)": [472.68, 0.4, 153.301, 0.003],
  "O(g)": [249.18, 0.1, 161.059, 0.003],
  "C(g)": [716.68, 0.45, 158.1, 0.003],
  "H2O(g)": [-241.826, 0.04, 188.835, 0.01],
  "H2O(l)": [-285.83, 0.04, 69.95, 0.03],
  "CO(g)": [-110.53, 0.17, 197.66, 0.004],
  "CO2(g)": [-393.51, 0.13, 213.785, 0.01],
  "NH3(g)": [-45.94, 0.35, 192.77, 0.05],
  "SO2(g)": [-296.81, 0.2, 248.223, 0.05],
  "CaO(cr)": [-634.92, 0.9, 38.1, 0.4],
};

/** Formation enthalpy, formation Gibbs energy (kJ/mol), entropy (J/mol/K) at 298.15 K, with the digits printed. */
const nbsValues: Readonly<Record<string, readonly (string | null)[]>> = {
  "H2O(l)": ["-285.830", "-237.129", "69.91"],
  "H2O(g)": ["-241.818", "-228.572", "188.825"],
  "CO2(g)": ["-393.509", "-394.359", null],
  "CH4(g)": ["-74.81", "-50.72", null],
  "NH3(g)": ["-46.11", "-16.45", null],
  "SO2(g)": ["-296.830", null, "248.22"],
  "CaCO3(cr,calcite)": ["-1206.92", null, null],
};

const robieValues: Readonly<Record<string, readonly (string | null)[]>> = {
  "CaO(cr)": ["-635.1", null, "38.1"],
  "CaCO3(cr,calcite)": ["-1207.4", null, "91.7"],
};

const formation: Readonly<Record<string, string>> = {
  "H2O(l)": "H2(g) + 1/2 O2(g) = H2O(l)",
  "H2O(g)": "H2(g) + 1/2 O2(g) = H2O(g)",
  "CO2(g)": "C(cr,graphite) + O2(g) = CO2(g)",
  "CH4(g)": "C(cr,graphite) + 2 H2(g) = CH4(g)",
  "NH3(g)": "1/2 N2(g) + 3/2 H2(g) = NH3(g)",
};

/** Formation values and entropies at 298.15 K beside what the library evaluates from the series. */
export function rows(): AccuracyRow[] {
  const robieRows = tableRows("robie", robie, robieValues, (label) =>
    label === "CaO(cr)" ? "cross source" : "same source",
  );
  return [...codataRows(), ...tableRows("nbs", nbs, nbsValues, () => "cross source"), ...robieRows];
}

function codataRows(): AccuracyRow[] {
  return Object.entries(codataValues).flatMap(([label, [enthalpy, enthalpyHalfWidth, entropy, entropyHalfWidth]]) => {
    const common = { class: "cross source", source: codata, origin: "memory" } as const;
    const computed = standardProperties(recordOf(label), { temperature: quantity(298.15, "K") });
    const entropyRow = row({
      id: `codata-${slug(label)}-entropy`,
      ...common,
      quantity: `entropy of ${label} at 298.15 K in J/mol/K`,
      expected: entropy,
      computed: computed.entropy.value,
      tolerance: entropyHalfWidth,
    });
    if (enthalpyHalfWidth === null) return [entropyRow];
    const enthalpyRow = row({
      id: `codata-${slug(label)}-formation-enthalpy`,
      ...common,
      quantity: `formation enthalpy of ${label} at 298.15 K in kJ/mol`,
      expected: enthalpy,
      computed: computed.enthalpy.value / 1000,
      tolerance: enthalpyHalfWidth,
    });
    return [enthalpyRow, entropyRow];
  });
}

/** Rows of a table that states no uncertainty by value: half a unit of its last digit joins the spread of the data. */
function tableRows(
  name: string,
  source: string,
  values: Readonly<Record<string, readonly (string | null)[]>>,
  classOf: (label: string) => "same source" | "cross source",
): AccuracyRow[] {
  return Object.entries(values).flatMap(([label, [enthalpy, gibbsEnergy, entropy]]) => {
    const computed = standardProperties(recordOf(label), { temperature: quantity(298.15, "K") });
    const isCross = classOf(label) === "cross source";
    const made = (short: string, words: string, printed: string | null | undefined, value: number, spread: number) =>
      printed === null || printed === undefined
        ? []
        : row({
            id: `${name}-${slug(label)}-${short}`,
            class: classOf(label),
            source,
            origin: "memory",
            quantity: `${words} of ${label} at 298.15 K`,
            expected: Number(printed),
            computed: value,
            tolerance: tidy(halfUnit(printed) + (isCross ? spread : 0)),
          });
    const equation = formation[label];
    const subject = equation === undefined ? undefined : reaction(equation, referenceData);
    const entropySpread = spreadOfFunctions(label, 298.15).entropy;
    return [
      made(
        "formation-enthalpy",
        "formation enthalpy in kJ/mol",
        enthalpy,
        computed.enthalpy.value / 1000,
        formationSpread(label),
      ),
      subject === undefined
        ? []
        : made(
            "formation-gibbs-energy",
            "formation Gibbs energy in kJ/mol",
            gibbsEnergy,
            standardReactionProperties(subject, { temperature: quantity(298.15, "K") }).gibbsEnergy.value / 1000,
            spreadOfReaction(subject, 298.15).gibbsEnergy,
          ),
      made("entropy", "entropy in J/mol/K", entropy, computed.entropy.value, entropySpread),
    ].flat();
  });
}

function halfUnit(printed: string): number {
  return 0.5 * 10 ** -(printed.split(".")[1]?.length ?? 0);
}

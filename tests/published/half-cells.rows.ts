import { quantity } from "../../src/quantity/quantity.js";
import { electrodePotentialAtStandardPressure } from "../../src/standard-state/electrode-potential.js";
import { type AccuracyRow, row } from "./accuracy-row.js";
import {
  type AtReference,
  atReference,
  electronsOf,
  lastDigit,
  voltsFromAtmosphereToBar,
  voltsOf,
} from "./at-reference.js";
import { slug, tidy } from "./combined-uncertainty.js";

const cross = { class: "cross source", origin: "memory" } as const;
const handbook = "P. Vanysek, Electrochemical Series, CRC Handbook of Chemistry and Physics";
const bard = "A. J. Bard, R. Parsons, J. Jordan (eds.), Standard Potentials in Aqueous Solution (1985)";

/** Potentials that rest on other tables of thermochemical data agree no better than this, in V. */
const betweenTables = 0.002;

/** Standard potentials in V against the hydrogen electrode at 298.15 K and 1 atm, by half-reaction. */
const potentials: readonly (readonly [halfReaction: string, potential: string, source: string])[] = [
  [
    "AgCl(cr) + e^- = Ag(cr) + Cl^-(aq)",
    "0.22234",
    "R. G. Bates, V. E. Bower, J. Res. Natl. Bur. Stand. 53, 283 (1954)",
  ],
  ["AgCl(cr) + e^- = Ag(cr) + Cl^-(aq)", "0.22233", handbook],
  [
    "AgBr(cr) + e^- = Ag(cr) + Br^-(aq)",
    "0.07106",
    "H. B. Hetzer, R. A. Robinson, R. G. Bates, J. Phys. Chem. 66, 1423 (1962)",
  ],
  ["AgBr(cr) + e^- = Ag(cr) + Br^-(aq)", "0.07133", handbook],
  ["Ag^+(aq) + e^- = Ag(cr)", "0.7991", "B. B. Owen, S. R. Brinkley, J. Am. Chem. Soc. 60, 2229 (1938)"],
  ["Ag^+(aq) + e^- = Ag(cr)", "0.7996", handbook],
  ["Cl2(g) + 2 e^- = 2 Cl^-(aq)", "1.3583", handbook],
  ["I2(cr) + 2 e^- = 2 I^-(aq)", "0.5355", "G. Jones, B. B. Kaplan, J. Am. Chem. Soc. 50, 2066 (1928)"],
  ["O2(g) + 4 H^+(aq) + 4 e^- = 2 H2O(l)", "1.229", handbook],
  ["O2(g) + 2 H2O(l) + 4 e^- = 4 OH^-(aq)", "0.401", handbook],
  ["2 H2O(l) + 2 e^- = H2(g) + 2 OH^-(aq)", "-0.8277", handbook],
  ["Hg2Cl2(cr) + 2 e^- = 2 Hg(l) + 2 Cl^-(aq)", "0.26796", "G. J. Hills, D. J. G. Ives, J. Chem. Soc. 1951, 318"],
  ["Hg2Cl2(cr) + 2 e^- = 2 Hg(l) + 2 Cl^-(aq)", "0.26808", handbook],
  ["Hg2SO4(cr) + 2 e^- = 2 Hg(l) + SO4^2-(aq)", "0.61257", "W. H. Beck et al., Trans. Faraday Soc. 56, 1172 (1960)"],
  ["Hg2SO4(cr) + 2 e^- = 2 Hg(l) + SO4^2-(aq)", "0.6125", handbook],
  ["HgO(cr,red) + H2O(l) + 2 e^- = Hg(l) + 2 OH^-(aq)", "0.0977", handbook],
  ["Hg2^2+(aq) + 2 e^- = 2 Hg(l)", "0.7973", handbook],
  ["Hg2^2+(aq) + 2 e^- = 2 Hg(l)", "0.7960", bard],
  ["Hg^2+(aq) + 2 e^- = Hg(l)", "0.8535", bard],
  ["2 Hg^2+(aq) + 2 e^- = Hg2^2+(aq)", "0.9110", bard],
  ["PbSO4(cr) + 2 e^- = Pb(cr) + SO4^2-(aq)", "-0.3588", handbook],
  ["Pb^2+(aq) + 2 e^- = Pb(cr)", "-0.1262", handbook],
  ["Pb^2+(aq) + 2 e^- = Pb(cr)", "-0.1251", bard],
  ["Cu^2+(aq) + 2 e^- = Cu(cr)", "0.3419", handbook],
  ["Cu^2+(aq) + 2 e^- = Cu(cr)", "0.340", bard],
  ["Zn^2+(aq) + 2 e^- = Zn(cr)", "-0.7618", handbook],
  ["Zn^2+(aq) + 2 e^- = Zn(cr)", "-0.7626", bard],
  ["Na^+(aq) + e^- = Na(cr)", "-2.71", handbook],
  ["Na^+(aq) + e^- = Na(cr)", "-2.714", bard],
  ["Ca^2+(aq) + 2 e^- = Ca(cr)", "-2.868", handbook],
  ["Mg^2+(aq) + 2 e^- = Mg(cr)", "-2.356", bard],
  ["Fe^3+(aq) + e^- = Fe^2+(aq)", "0.771", handbook],
  ["Fe^3+(aq) + e^- = Fe^2+(aq)", "0.770", "D. O. Whittemore, D. Langmuir, J. Chem. Eng. Data 17, 288 (1972)"],
  ["S(cr,rhombic) + 2 H^+(aq) + 2 e^- = H2S(aq)", "0.142", handbook],
  ["ClO4^-(aq) + 8 H^+(aq) + 8 e^- = Cl^-(aq) + 4 H2O(l)", "1.389", handbook],
  ["ClO4^-(aq) + 8 H^+(aq) + 7 e^- = 1/2 Cl2(g) + 4 H2O(l)", "1.39", handbook],
  ["N2(g) + 8 H^+(aq) + 6 e^- = 2 NH4^+(aq)", "0.275", bard],
  ["CO2(g) + 8 H^+(aq) + 8 e^- = CH4(g) + 2 H2O(l)", "0.169", bard],
];

/** Standard potentials of whole cells in V at 298.15 K and 1 atm, with the electrons that pass. */
const cells: readonly (readonly [equation: string, electrons: number, potential: string, source: string])[] = [
  ["H2(g) + 1/2 O2(g) = H2O(l)", 2, "1.229", "textbook value of the hydrogen-oxygen cell"],
  ["H2(g) + 1/2 O2(g) = H2O(g)", 2, "1.185", "textbook value of the hydrogen-oxygen cell, water vapour"],
  ["Zn(cr) + Cu^2+(aq) = Zn^2+(aq) + Cu(cr)", 2, "1.1037", handbook],
  ["Ag(cr) + 1/2 Hg2Cl2(cr) = AgCl(cr) + Hg(l)", 1, "0.0455", "R. H. Gerke, J. Am. Chem. Soc. 44, 1684 (1922)"],
];

/** Temperature coefficients in mV/K at 298.15 K and 1 atm, with their uncertainty. */
const coefficients: readonly (readonly [equation: string, electrons: number, printed: string, source: string])[] = [
  [
    "AgCl(cr) + e^- = Ag(cr) + Cl^-(aq)",
    1,
    "-0.646",
    "R. G. Bates, V. E. Bower, J. Res. Natl. Bur. Stand. 53, 283 (1954), derivative of the equation",
  ],
  ["AgBr(cr) + e^- = Ag(cr) + Br^-(aq)", 1, "-0.499", "P. Atkins, J. de Paula, Physical Chemistry, worked example"],
  ["H2(g) + 1/2 O2(g) = H2O(l)", 2, "-0.846", "S. G. Bratsch, J. Phys. Chem. Ref. Data 18, 1 (1989)"],
  ["Zn(cr) + Cu^2+(aq) = Zn^2+(aq) + Cu(cr)", 2, "-0.104", "textbook value of the Daniell cell"],
];

/** Standard potentials and their temperature coefficients from outside the project. */
export function rows(): AccuracyRow[] {
  return [...potentialRows(), ...cellRows(), ...coefficientRows(), ...cycleRows(), ...pressureRows()];
}

function potentialRows(): AccuracyRow[] {
  return potentials.map(([halfReaction, printed, source], index) => {
    const computed = atReference(halfReaction);
    return potentialRow(
      `half-cell-${index + 1}-${slug(halfReaction)}`,
      computed,
      electronsOf(computed),
      printed,
      source,
    );
  });
}

function cellRows(): AccuracyRow[] {
  return cells.map(([equation, electrons, printed, source]) =>
    potentialRow(`cell-${slug(equation)}`, atReference(equation), electrons, printed, source),
  );
}

/** The tolerance: the combined uncertainty of the figures, at least that between tables, and the rounding. */
function potentialRow(
  id: string,
  computed: AtReference,
  electrons: number,
  printed: string,
  source: string,
): AccuracyRow {
  const combined = voltsOf(computed.spread.gibbsEnergy, electrons);
  return row({
    id,
    ...cross,
    source,
    quantity: `standard potential of ${computed.subject.equation} at 298.15 K in V, ${printed} at 1 atm brought to 1 bar`,
    expected: Number((Number(printed) + voltsFromAtmosphereToBar(computed, electrons)).toFixed(5)),
    computed: voltsOf(-computed.gibbsEnergy, electrons),
    tolerance: Number((Math.max(betweenTables, combined) + 0.5 * lastDigit(printed)).toPrecision(3)),
  });
}

function coefficientRows(): AccuracyRow[] {
  return coefficients.map(([equation, electrons, printed, source]) => {
    const computed = atReference(equation);
    const toBar = voltsFromAtmosphereToBar(computed, electrons) / 298.15;
    return row({
      id: `temperature-coefficient-${slug(equation)}`,
      ...cross,
      source,
      quantity: `temperature coefficient of ${equation} at 298.15 K in mV/K, ${printed} at 1 atm brought to 1 bar`,
      expected: Number((Number(printed) + 1000 * toBar).toFixed(5)),
      computed: 1000 * voltsOf(computed.entropy, electrons),
      tolerance: tidy(1000 * voltsOf(computed.spread.entropy, electrons) + 0.5 * lastDigit(printed)),
    });
  });
}

/** The cycle of CODATA Key Values, recomputed by hand from its enthalpies and entropies; to the digits given. */
function cycleRows(): AccuracyRow[] {
  const source = "recomputed from J. D. Cox, D. D. Wagman, V. A. Medvedev, CODATA Key Values (1989)";
  const common = { class: "same source", source, origin: "computed" } as const;
  const silverChloride = atReference("AgCl(cr) + e^- = Ag(cr) + Cl^-(aq)");
  const water = atReference("H2(g) + 1/2 O2(g) = H2O(l)");
  const silver = atReference("Ag^+(aq) + e^- = Ag(cr)");
  const chlorine = atReference("Cl2(g) + 2 e^- = 2 Cl^-(aq)");
  return [
    ["silver-chloride", "V", 0.22235, voltsOf(-silverChloride.gibbsEnergy, 1), 0.000005],
    ["silver-chloride-coefficient", "mV/K", -0.647, 1000 * voltsOf(silverChloride.entropy, 1), 0.0005],
    ["oxygen-water", "V", 1.22889, voltsOf(-water.gibbsEnergy, 2), 0.00001],
    ["thermoneutral", "V", 1.4812, voltsOf(-water.enthalpy, 2), 0.00005],
    ["silver", "V", 0.799, voltsOf(-silver.gibbsEnergy, 1), 0.0005],
    ["chlorine", "V", 1.36, voltsOf(-chlorine.gibbsEnergy, 2), 0.00005],
    ["water-ionisation", "log10 K", -14.001, atReference("H2O(l) = H^+(aq) + OH^-(aq)").log10K, 0.0005],
    ["silver-chloride-solubility", "log10 K", -9.748, atReference("AgCl(cr) = Ag^+(aq) + Cl^-(aq)").log10K, 0.0005],
  ].map(([name, unit, expected, computed, tolerance]) =>
    row({
      id: `codata-cycle-${name}`,
      ...common,
      quantity: `${name}, ${unit} at 298.15 K and 1 bar`,
      expected: expected as number,
      computed: computed as number,
      tolerance: tolerance as number,
    }),
  );
}

/** A half-cell without gas stands 0.169 mV lower at 1 bar than at 1 atm, through the hydrogen electrode. */
function pressureRows(): AccuracyRow[] {
  const halfReaction = { "AgCl(cr)": -1, "e^-": -1, "Ag(cr)": 1, "Cl^-(aq)": 1 };
  const subject = atReference("AgCl(cr) + e^- = Ag(cr) + Cl^-(aq)");
  const atBar = voltsOf(-subject.gibbsEnergy, 1);
  const step = { temperature: quantity(298.15, "K"), from: quantity(1, "bar"), to: quantity(1, "atm") };
  const atAtmosphere = electrodePotentialAtStandardPressure(quantity(atBar, "V"), halfReaction, step).value;
  return [
    row({
      id: "half-cell-from-1-bar-to-1-atm",
      ...cross,
      source: "R. D. Freeman, Bull. Chem. Thermodyn. 25, 523 (1982): the hydrogen electrode shifts by 0.169 mV",
      quantity: "what the silver-silver chloride electrode gains at 1 atm, in mV",
      expected: 0.169,
      computed: 1000 * (atAtmosphere - atBar),
      tolerance: 0.0005,
    }),
    row({
      id: "silver-chloride-electrode-at-1-atm",
      ...cross,
      source: "R. G. Bates, V. E. Bower, J. Res. Natl. Bur. Stand. 53, 283 (1954)",
      quantity: "standard potential of the silver-silver chloride electrode at 298.15 K and 1 atm in V",
      expected: 0.22234,
      computed: atAtmosphere,
      tolerance: tidy(voltsOf(subject.spread.gibbsEnergy, 1)),
    }),
  ];
}

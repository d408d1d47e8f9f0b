import { referenceData } from "../../src/data/reference-data.js";
import { type QuantityOf, quantity } from "../../src/quantity/quantity.js";
import { reaction } from "../../src/reaction/reaction.js";
import { standardReactionProperties } from "../../src/reaction/standard-reaction.js";
import type { SpeciesRecord } from "../../src/species/record.js";
import { electrodePotentialAtStandardPressure } from "../../src/standard-state/electrode-potential.js";
import { formationEnthalpyAtReference } from "../../src/standard-state/enthalpy-reference.js";
import { formationEnthalpyAtZeroKelvin } from "../../src/standard-state/formation-at-zero-kelvin.js";
import { formationIncrements } from "../../src/standard-state/formation-increments.js";
import { formationGibbsEnergyAtStandardPressure } from "../../src/standard-state/formation-pressure.js";
import { gibbsFunctionAtReference } from "../../src/standard-state/gibbs-function.js";
import { idealGasEntropyAtStandardPressure } from "../../src/standard-state/ideal-gas-pressure.js";
import { lnKAtStandardPressure } from "../../src/standard-state/ln-k-pressure.js";
import { lnKOnScale } from "../../src/standard-state/solute-scale.js";
import { solutionComposition } from "../../src/standard-state/solution-composition.js";
import { type AccuracyRow, row } from "./accuracy-row.js";
import { halfWidth } from "./at-reference.js";
import { formationSpread, recordOf, slug, tidy } from "./combined-uncertainty.js";

const nbs1982 = "D. D. Wagman et al., The NBS Tables of Chemical Thermodynamic Properties (1982)";
const technicalNote = {
  3: "D. D. Wagman et al., NBS Technical Note 270-3 (1968)",
  4: "D. D. Wagman et al., NBS Technical Note 270-4 (1969)",
  6: "V. B. Parker et al., NBS Technical Note 270-6 (1971)",
} as const;
const janaf = "M. W. Chase Jr., NIST-JANAF Thermochemical Tables, 4th edition (1998)";
const handbook = "CRC Handbook of Chemistry and Physics, Concentrative Properties of Aqueous Solutions, 20 Cel";

const fromAtmosphere = { from: quantity(1, "atm"), to: quantity(1, "bar") } as const;
const atReference = { ...fromAtmosphere, temperature: quantity(298.15, "K") } as const;
const memory = { origin: "memory" } as const;

/** Values from outside the project that the room standard-state is held to. */
export function rows(): AccuracyRow[] {
  return [
    ...formationRows(),
    ...entropyRows(),
    ...pressureRows(),
    ...zeroKelvinRows(),
    ...recordRows(),
    ...gibbsFunctionRows(),
    ...compositionRows(),
  ];
}

/**
 * Gibbs energies of formation at 298.15 K of two editions that differ by the standard pressure: kcal/mol at 1 atm,
 * kJ/mol at 1 bar, with the digits printed, and the Technical Note. Values that were evaluated anew between the
 * editions (NO3^-, Fe^3+, ...) are no such pairs.
 */
const formationTable: Readonly<Record<string, readonly [atmosphere: string, bar: string, note: 3 | 4 | 6]>> = {
  "H2O(l)": ["-56.687", "-237.129", 3],
  "H2O(g)": ["-54.634", "-228.572", 3],
  "CO(g)": ["-32.780", "-137.168", 3],
  "CO2(g)": ["-94.254", "-394.359", 3],
  "SO2(g)": ["-71.748", "-300.194", 3],
  "HCl(g)": ["-22.777", "-95.299", 3],
  "Br2(g)": ["0.751", "3.110", 3],
  "I2(g)": ["4.627", "19.327", 3],
  "CH4(g)": ["-12.13", "-50.72", 3],
  "C2H4(g)": ["16.28", "68.15", 3],
  "C2H6(g)": ["-7.86", "-32.82", 3],
  "NH3(g)": ["-3.94", "-16.45", 3],
  "N2O4(g)": ["23.38", "97.89", 3],
  "SiO2(cr,quartz)": ["-204.75", "-856.64", 3],
  "OH^-(aq)": ["-37.594", "-157.244", 3],
  "Cl^-(aq)": ["-31.372", "-131.228", 3],
  "F^-(aq)": ["-66.64", "-278.79", 3],
  "SO4^2-(aq)": ["-177.97", "-744.53", 3],
  "CO3^2-(aq)": ["-126.17", "-527.81", 3],
  "HCO3^-(aq)": ["-140.26", "-586.77", 3],
  "NH4^+(aq)": ["-18.97", "-79.31", 3],
  "Ag^+(aq)": ["18.433", "77.107", 4],
  "AgCl(cr)": ["-26.244", "-109.789", 4],
  "Hg(g)": ["7.613", "31.820", 4],
  "Cu^2+(aq)": ["15.66", "65.49", 4],
  "Zn^2+(aq)": ["-35.14", "-147.06", 4],
  "CaCO3(cr,calcite)": ["-269.80", "-1128.79", 6],
};

function formationRows(): AccuracyRow[] {
  return Object.entries(formationTable).map(([label, [atmosphere, bar, note]]) => {
    const atOneBar = formationGibbsEnergyAtStandardPressure(
      quantity(Number(atmosphere), "kcal_th/mol"),
      label,
      atReference,
    );
    return row({
      id: `nbs-1-atm-to-1-bar-formation-${slug(label)}`,
      ...memory,
      class: "same source",
      source: `${nbs1982}, and ${technicalNote[note]}`,
      quantity: `formation Gibbs energy of ${label} in kJ/mol at 298.15 K, 1 bar, from ${atmosphere} kcal/mol at 1 atm`,
      expected: Number(bar),
      computed: atOneBar.value / 1000,
      tolerance: tidy(roundingOf(bar) + 4.184 * roundingOf(atmosphere)),
    });
  });
}

/** Standard entropies at 298.15 K of the same editions, all from Technical Note 270-3: cal/mol/K and J/mol/K. */
const entropyTable: Readonly<Record<string, readonly [atmosphere: string, bar: string]>> = {
  "H2(g)": ["31.208", "130.684"],
  "O2(g)": ["49.003", "205.138"],
  "N2(g)": ["45.77", "191.61"],
  "He(g)": ["30.1244", "126.150"],
  "Ar(g)": ["36.9822", "154.843"],
  "Cl2(g)": ["53.288", "223.066"],
  "Br2(g)": ["58.641", "245.463"],
  "H(g)": ["27.391", "114.713"],
  "H2O(g)": ["45.104", "188.825"],
  "CO(g)": ["47.219", "197.674"],
  "HCl(g)": ["44.646", "186.908"],
  "CO2(g)": ["51.06", "213.74"],
};

function entropyRows(): AccuracyRow[] {
  return Object.entries(entropyTable).map(([label, [atmosphere, bar]]) =>
    row({
      id: `nbs-1-atm-to-1-bar-entropy-${slug(label)}`,
      ...memory,
      class: "same source",
      source: `${nbs1982}, and ${technicalNote[3]}`,
      quantity: `entropy of ${label} in J/mol/K at 298.15 K, 1 bar, from ${atmosphere} cal/mol/K at 1 atm`,
      expected: Number(bar),
      computed: idealGasEntropyAtStandardPressure(quantity(Number(atmosphere), "cal_th/mol/K"), fromAtmosphere).value,
      tolerance: tidy(roundingOf(bar) + 4.184 * roundingOf(atmosphere)),
    }),
  );
}

function pressureRows(): AccuracyRow[] {
  const gasConstant = 8.31446261815324;
  const sackurTetrode = idealGasEntropyAtStandardPressure(
    quantity(-1.16487052358 * gasConstant, "J/mol/K"),
    fromAtmosphere,
  );
  const potential = electrodePotentialAtStandardPressure(
    quantity(0, "V"),
    { "AgCl(cr)": -1, "e^-": -1, "Ag(cr)": 1, "Cl^-(aq)": 1 },
    atReference,
  );
  return [
    row({
      id: "standard-pressure-entropy-of-a-gas",
      ...memory,
      class: "cross source",
      source: `${nbs1982}, introduction`,
      quantity: "entropy of a gas at 1 bar less that at 1 atm, J/mol/K",
      expected: 0.1094,
      computed: idealGasEntropyAtStandardPressure(quantity(0, "J/mol/K"), fromAtmosphere).value,
      tolerance: 0.00005, // printed to 0.0001
    }),
    row({
      id: "standard-pressure-sackur-tetrode",
      ...memory,
      class: "cross source",
      source: "E. Tiesinga et al., CODATA Recommended Values: 2018, Sackur-Tetrode constant at 101.325 kPa and 100 kPa",
      quantity: "Sackur-Tetrode constant at 100 kPa from that at 101.325 kPa, in units of R",
      expected: -1.15170753706,
      computed: sackurTetrode.value / gasConstant,
      tolerance: 1e-11, // both printed to 1e-11
    }),
    row({
      id: "standard-pressure-half-cell",
      ...memory,
      class: "cross source",
      source: "R. D. Freeman, J. Chem. Educ. 62, 681 (1985)",
      quantity: "potential of a half-cell without gas against hydrogen, 1 bar less 1 atm, mV at 298.15 K",
      expected: -0.169,
      computed: potential.value * 1000,
      tolerance: 0.0005,
    }),
    row({
      id: "standard-pressure-boiling-point-of-water",
      ...memory,
      class: "cross source",
      source: "W. Wagner, A. Pruss, J. Phys. Chem. Ref. Data 31, 387 (2002), 373.124 K at 1 atm, 372.756 K at 1 bar",
      quantity: "temperature at which K of H2O(l) = H2O(g) is 1, standard pressure 1 atm less 1 bar, K",
      expected: 0.368,
      computed: boilingPoint(quantity(1, "atm")) - boilingPoint(quantity(1, "bar")),
      // Rounding of both, and 1.5 percent for the ideal gas and the liquid without volume: Z of the steam is 0.985.
      tolerance: tidy(0.001 + 0.015 * 0.368),
    }),
    row({
      id: "solute-scale-water-molality-to-mole-fraction",
      ...memory,
      class: "cross source",
      source: "R. A. Robinson, R. H. Stokes, Electrolyte Solutions, 2nd edition (1959), moles in 1 kg of water",
      quantity: "factor between the constants of mole fraction and molality of one solute in water, M = 18.0153 g/mol",
      expected: 55.51,
      computed: Math.exp(
        lnKOnScale(
          0,
          { "CO2(g)": 1, "CO2(aq)": -1 },
          { from: "molality", to: "mole-fraction", solvent: { molarMass: quantity(18.0153, "g/mol") } },
        ),
      ),
      tolerance: 0.005,
    }),
  ];
}

/** Where ln K of vaporisation, brought from 1 bar to a standard pressure, is zero; by bisection. */
function boilingPoint(standardPressure: QuantityOf<"atm" | "bar">): number {
  const vaporisation = reaction("H2O(l) = H2O(g)", referenceData);
  let [low, high] = [350, 400];
  for (let step = 0; step < 60; step += 1) {
    const middle = (low + high) / 2;
    const { lnK } = standardReactionProperties(vaporisation, { temperature: quantity(middle, "K") });
    const change = { from: quantity(1, "bar"), to: standardPressure };
    if (lnKAtStandardPressure(lnK, vaporisation, change) > 0) high = middle;
    else low = middle;
  }
  return low;
}

/** H(298.15 K) - H(0 K) of the elements in kJ/mol, from their own tables: of a mole, and its atoms. */
const janafElements = {
  H: [8.467, 2],
  C: [1.051, 1],
  N: [8.67, 2],
  O: [8.683, 2],
  F: [8.825, 2],
  Mg: [4.998, 1],
  Al: [4.539, 1],
  Si: [3.217, 1],
  S: [4.412, 1],
  Cl: [9.181, 2],
  Fe: [4.507, 1],
  I: [13.198, 2],
  Hg: [9.343, 1],
} as const;

/** Formation enthalpy at 298.15 K, H(298.15 K) - H(0 K), formation enthalpy at 0 K (kJ/mol), and atoms. */
const janafZero: Readonly<
  Record<
    string,
    readonly [
      at298: number,
      increment: number,
      atZero: number,
      atoms: Partial<Record<keyof typeof janafElements, number>>,
    ]
  >
> = {
  "H2O(g)": [-241.826, 9.904, -238.921, { H: 2, O: 1 }],
  "OH(g)": [38.987, 9.172, 38.39, { H: 1, O: 1 }],
  "CO(g)": [-110.527, 8.671, -113.805, { C: 1, O: 1 }],
  "CO2(g)": [-393.522, 9.364, -393.151, { C: 1, O: 2 }],
  "CH4(g)": [-74.873, 10.024, -66.911, { C: 1, H: 4 }],
  "C2H4(g)": [52.467, 10.518, 60.986, { C: 2, H: 4 }],
  "NH3(g)": [-45.898, 10.045, -38.907, { N: 1, H: 3 }],
  "NO(g)": [90.291, 9.192, 89.775, { N: 1, O: 1 }],
  "NO2(g)": [33.095, 10.186, 35.927, { N: 1, O: 2 }],
  "O3(g)": [142.674, 10.351, 145.348, { O: 3 }],
  "SO(g)": [5.007, 8.733, 5.028, { S: 1, O: 1 }],
  "SO2(g)": [-296.842, 10.552, -294.299, { S: 1, O: 2 }],
  "SO3(g)": [-395.765, 11.697, -390.025, { S: 1, O: 3 }],
  "HF(g)": [-272.546, 8.599, -272.499, { H: 1, F: 1 }],
  "HCl(g)": [-92.312, 8.64, -92.127, { H: 1, Cl: 1 }],
  "HI(g)": [26.359, 8.657, 28.535, { H: 1, I: 1 }],
  "H(g)": [217.999, 6.197, 216.035, { H: 1 }],
  "O(g)": [249.173, 6.725, 246.79, { O: 1 }],
  "N(g)": [472.683, 6.197, 470.82, { N: 1 }],
  "C(g)": [716.67, 6.536, 711.185, { C: 1 }],
  "F(g)": [79.39, 6.518, 77.284, { F: 1 }],
  "Mg(g)": [147.1, 6.197, 145.901, { Mg: 1 }],
  "Al(g)": [329.699, 6.919, 327.32, { Al: 1 }],
  "Si(g)": [450, 7.55, 445.668, { Si: 1 }],
  "S(g)": [276.98, 6.657, 274.735, { S: 1 }],
  "Cl(g)": [121.302, 6.272, 119.621, { Cl: 1 }],
  "Fe(g)": [415.471, 6.85, 413.127, { Fe: 1 }],
  "I(g)": [106.762, 6.197, 107.164, { I: 1 }],
  "Hg(g)": [61.38, 6.197, 64.526, { Hg: 1 }],
  "Al2O3(cr,corundum)": [-1675.692, 10.02, -1663.608, { Al: 2, O: 3 }],
};

function zeroKelvinRows(): AccuracyRow[] {
  return Object.entries(janafZero).map(([label, [at298, increment, atZero, atoms]]) => {
    const counts = Object.entries(atoms) as [keyof typeof janafElements, number][];
    const computed = formationEnthalpyAtReference(quantity(at298, "kJ/mol"), {
      enthalpyAbove0K: quantity(increment, "kJ/mol"),
      elements: counts.map(([symbol, count]) => {
        const [ofElement, perMole] = janafElements[symbol];
        return { amount: count / perMole, enthalpyAbove0K: quantity(ofElement, "kJ/mol") };
      }),
      from: "298.15 K",
      to: "0 K",
    });
    // Each figure is printed to 0.001 kJ/mol.
    const ofElements = counts.reduce((sum, [symbol, count]) => sum + count / janafElements[symbol][1], 0);
    return row({
      id: `janaf-formation-0-K-${slug(label)}`,
      ...memory,
      class: "same source",
      source: janaf,
      quantity: `formation enthalpy of ${label} at 0 K in kJ/mol, from ${at298} at 298.15 K and the printed increments`,
      expected: atZero,
      computed: computed.value / 1000,
      tolerance: tidy(0.0005 * (3 + ofElements)),
    });
  });
}

/**
 * Species whose formation enthalpy and increments stand in the reference data, from other evaluations (cox1989 for the
 * most part). NO, NO2, OH, C2H4, O3, SO and S are left out: later evaluations moved their formation at 298.15 K.
 */
const recordedAtZero = [
  ...["H2O(g)", "CO(g)", "CO2(g)", "CH4(g)", "NH3(g)", "SO2(g)", "SO3(g)", "HF(g)", "HCl(g)", "HI(g)"],
  ...["H(g)", "C(g)", "N(g)", "O(g)", "F(g)", "Mg(g)", "Al(g)", "Cl(g)", "Fe(g)", "I(g)"],
  "Al2O3(cr,corundum)",
] as const;

function recordRows(): AccuracyRow[] {
  return recordedAtZero.map((label) => {
    const record = recordOf(label);
    const { elements } = formationIncrements(record, referenceData);
    const ofElements = elements.map((element) => element.amount * incrementSpread(recordOf(element.label)));
    return row({
      id: `janaf-formation-0-K-of-record-${slug(label)}`,
      ...memory,
      class: "cross source",
      source: janaf,
      quantity: `enthalpy of formation of ${label} at 0 K in kJ/mol, from the figures of its record`,
      expected: janafZero[label]![2],
      computed: formationEnthalpyAtZeroKelvin(record, referenceData).value / 1000,
      // The stated uncertainties at 298.15 K and of the increments, and the rounding of what is compared with.
      tolerance: tidy(
        ofElements.reduce((sum, part) => sum + part, formationSpread(label) + incrementSpread(record) + 0.0005),
      ),
    });
  });
}

/** Half-width of H(298.15 K) - H(0 K) of a record in kJ/mol, or its rounding. */
function incrementSpread({ enthalpyAbove0K }: SpeciesRecord): number {
  return Math.max(halfWidth(enthalpyAbove0K) / 1000, 0.0005);
}

/** S(298.15 K) in J/mol/K and H(298.15 K) - H(0 K) in kJ/mol of JANAF, -(G - H(0 K))/T in cal/mol/K at 1 atm. */
const gibbsFunctions: Readonly<Record<string, readonly [entropy: number, increment: number, calories: number]>> = {
  "H2(g)": [130.68, 8.467, 24.42],
  "N2(g)": [191.609, 8.67, 38.82],
  "H2O(g)": [188.834, 9.904, 37.17],
};

function gibbsFunctionRows(): AccuracyRow[] {
  return Object.entries(gibbsFunctions).map(([label, [entropy, increment, calories]]) => {
    const atOneBar = gibbsFunctionAtReference(quantity(entropy, "J/mol/K"), {
      temperature: quantity(298.15, "K"),
      enthalpyAbove0K: quantity(increment, "kJ/mol"),
      from: "298.15 K",
      to: "0 K",
    });
    const back = { from: quantity(1, "bar"), to: quantity(1, "atm") };
    return row({
      id: `lewis-randall-gibbs-function-from-0-K-${slug(label)}`,
      ...memory,
      class: "cross source",
      source: "G. N. Lewis, M. Randall, K. S. Pitzer, L. Brewer, Thermodynamics, 2nd edition (1961)",
      quantity: `-(G - H(0 K))/T of ${label} in cal/mol/K at 298.15 K, 1 atm, from S and H - H(0 K) of JANAF at 1 bar`,
      expected: calories,
      computed: idealGasEntropyAtStandardPressure(atOneBar, back).value / 4.184,
      // Rounding of the table, of S and of the increment over T.
      tolerance: tidy(0.005 + (0.0005 + 0.5 / 298.15) / 4.184),
    });
  });
}

/** Solutions of 10 percent by mass: solute, molality in mol/kg, concentration in mol/L, density in g/cm3. */
const solutions: readonly (readonly [solute: string, molality: number, concentration: number, density: number])[] = [
  ["NaCl(aq)", 1.901, 1.832, 1.0707],
  ["KCl(aq)", 1.49, 1.426, 1.0633],
  ["H2SO4(aq)", 1.133, 1.087, 1.0661],
  ["C12H22O11(aq)", 0.325, 0.303, 1.0381],
];

function compositionRows(): AccuracyRow[] {
  return solutions.map(([solute, molality, concentration, density]) => {
    const { concentrations } = solutionComposition({
      solvent: "H2O(l)",
      molalities: { [solute]: quantity(molality, "mol/kg") },
      density: quantity(density, "g/cm3"),
    });
    return row({
      id: `handbook-concentration-${slug(solute)}`,
      ...memory,
      class: "same source",
      source: handbook,
      quantity: `concentration of ${solute} in mol/L, from ${molality} mol/kg and ${density} g/cm3`,
      expected: concentration,
      computed: concentrations![solute]!.value / 1000,
      tolerance: tidy(0.0005 + concentration * (0.0005 / molality + 0.00005 / density)),
    });
  });
}

/** Half a unit of the last printed place. */
function roundingOf(printed: string): number {
  return 0.5 * 10 ** -(printed.split(".")[1]?.length ?? 0);
}

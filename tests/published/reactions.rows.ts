import { faradayConstant } from "../../src/constants/constants.js";
import { referenceData } from "../../src/data/reference-data.js";
import { virial } from "../../src/fugacity/virial.js";
import { quantity } from "../../src/quantity/quantity.js";
import { reaction } from "../../src/reaction/reaction.js";
import { reactionGibbsEnergy } from "../../src/reaction/reaction-gibbs-energy.js";
import { standardReactionProperties } from "../../src/reaction/standard-reaction.js";
import { temperaturesAtGibbsEnergy } from "../../src/reaction/temperatures.js";
import { formulaOf } from "../../src/species/substance.js";
import { type AccuracyRow, row } from "./accuracy-row.js";
import { gasConstantTimesLn10, slug, spreadOfReaction, tidy } from "./combined-uncertainty.js";

const cross = { class: "cross source", origin: "memory" } as const;
const moranShapiro = "M. J. Moran, H. N. Shapiro, Fundamentals of Engineering Thermodynamics, Table A-27";
const janafSums = "sum of log10 Kf of the NIST-JANAF Thermochemical Tables, 4th ed. (1998)";
const atkins = "P. W. Atkins, J. de Paula, Physical Chemistry, sum over its data section";
const larsonDodge = "A. T. Larson, R. L. Dodge, J. Am. Chem. Soc. 45, 2918 (1923)";
const hillWinter = "K. J. Hill, E. R. S. Winter, J. Phys. Chem. 60, 1361 (1956), p/atm = 4.137e7 exp(-20474 K/T)";

/** log10 of 1 atm over 1 bar, from the definitions; added to log10 K at 1 atm for each mole of gas formed. */
const log10OfAtmosphereInBar = Math.log10(1.01325);

/** JANAF's log Kf, and the tables made from it, were printed with R near 8.3143 J/mol/K. */
const olderGasConstant = 3e-5;

/** Equilibrium constants, temperatures of equilibrium and Gibbs energies of reactions from outside the project. */
export function rows(): AccuracyRow[] {
  return [
    ...moranShapiroRows(),
    ...janafSumRows(),
    ...ammoniaRows(),
    ...calciteRows(),
    ...turningTemperatureRows(),
    ...textbookRows(),
    ...cellRows(),
  ];
}

/**
 * log10 K from the tables of 1971 at 1 atm, by temperature in K; the column headed 298 is for 298.15 K. JANAF of 1971
 * had NO at 90.29 kJ/mol; the reference data have 91.271, and the row is moved by the difference.
 */
const tableA27: Readonly<Record<string, Readonly<Record<string, number>>>> = {
  "H2(g) = 2 H(g)": { 1200: -13.414, 1400: -10.63, 1600: -8.532 },
  "O2(g) = 2 O(g)": { 500: -45.88, 1000: -19.614, 1400: -12.054, 1600: -9.684, 1800: -7.836, 2000: -6.356 },
  "N2(g) = 2 N(g)": { 298.15: -159.6, 1000: -43.056, 1200: -34.754, 1400: -28.812, 1800: -20.874 },
  "1/2 O2(g) + 1/2 N2(g) = NO(g)": {
    298.15: -15.171,
    500: -8.783,
    1000: -4.062,
    1200: -3.275,
    1400: -2.712,
    1600: -2.29,
    1800: -1.962,
    2000: -1.699,
  },
  "H2O(g) = H2(g) + 1/2 O2(g)": { 298.15: -40.048, 500: -22.886, 1400: -6.347, 1600: -5.18, 1800: -4.27 },
  "CO2(g) = CO(g) + 1/2 O2(g)": {
    298.15: -45.066,
    500: -25.025,
    1000: -10.221,
    1200: -7.764,
    1400: -6.014,
    1600: -4.706,
    1800: -3.693,
    2000: -2.884,
  },
  "CO2(g) + H2(g) = CO(g) + H2O(g)": {
    298.15: -5.018,
    500: -2.139,
    1000: -0.159,
    1200: 0.135,
    1400: 0.333,
    1600: 0.474,
    2000: 0.656,
  },
};

/** log10 K at 1 bar by temperature in K. */
const janafCombinations: Readonly<Record<string, Readonly<Record<string, number>>>> = {
  "CO(g) + H2O(g) = CO2(g) + H2(g)": { 298.15: 5.018, 1000: 0.158, 1500: -0.412, 2000: -0.659 },
  "CH4(g) + H2O(g) = CO(g) + 3 H2(g)": { 298.15: -24.911, 500: -10.068, 1000: 1.419 },
  "1/2 N2(g) + 3/2 H2(g) = NH3(g)": { 298.15: 2.867, 500: -0.501, 2000: -4.687 },
  "C(cr,graphite) + CO2(g) = 2 CO(g)": { 500: -8.787, 1000: 0.243, 2000: 4.589 },
  "SO2(g) + 1/2 O2(g) = SO3(g)": { 298.15: 12.419, 1000: 0.257 },
  "2 H2(g) + O2(g) = 2 H2O(g)": { 298.15: 80.094, 500: 45.768, 1500: 11.448, 2000: 7.08 },
};

function moranShapiroRows(): AccuracyRow[] {
  return Object.entries(tableA27).flatMap(([equation, values]) => {
    const subject = reaction(equation, referenceData);
    const molesOfGas = subject.terms.reduce((sum, { coefficient }) => sum + coefficient, 0);
    const isNitricOxide = equation.endsWith("NO(g)");
    // the entries of 2 H, 2 O and 2 N are even: a printed log10 Kf, doubled with its rounding
    const rounding = equation.includes("= 2 ") ? 0.001 : 0.0005;
    return Object.entries(values).map(([key, printed]) => {
      const temperatureK = Number(key);
      const perLogarithm = gasConstantTimesLn10 * temperatureK;
      const moved = isNitricOxide ? (90.29 - 91.27131) / perLogarithm : 0;
      const spread = spreadOfReaction(subject, temperatureK, isNitricOxide ? "NO(g)" : undefined).gibbsEnergy;
      const note = isNitricOxide ? ", NO moved from 90.29 to 91.271 kJ/mol at 298.15 K" : "";
      return row({
        id: `moran-shapiro-${slug(equation)}-${key}-K`,
        ...cross,
        source: moranShapiro,
        quantity: `log10 K of ${equation} at ${key} K, ${printed} at 1 atm brought to 1 bar${note}`,
        expected: Number((printed + molesOfGas * log10OfAtmosphereInBar + moved).toFixed(5)),
        computed: log10K(equation, temperatureK),
        tolerance: tidy(rounding + olderGasConstant * Math.abs(printed) + spread / perLogarithm),
      });
    });
  });
}

function janafSumRows(): AccuracyRow[] {
  return Object.entries(janafCombinations).flatMap(([equation, values]) => {
    const subject = reaction(equation, referenceData);
    const summands = subject.terms.filter(({ species }) => !["H2", "O2", "N2", "C"].includes(formulaOf(species)!));
    const rounding = summands.reduce((sum, { coefficient }) => sum + 0.0005 * Math.abs(coefficient), 0);
    return Object.entries(values).map(([key, printed]) => {
      const temperatureK = Number(key);
      const spread = spreadOfReaction(subject, temperatureK).gibbsEnergy / (gasConstantTimesLn10 * temperatureK);
      return row({
        id: `janaf-sum-${slug(equation)}-${key}-K`,
        ...cross,
        source: janafSums,
        quantity: `log10 K of ${equation} at ${key} K`,
        expected: printed,
        computed: log10K(equation, temperatureK),
        tolerance: tidy(rounding + olderGasConstant * Math.abs(printed) + spread),
      });
    });
  });
}

/** A measured equilibrium of ammonia, at which the Gibbs energy of the reaction is to vanish. */
function ammoniaRows(): AccuracyRow[] {
  const equation = "1/2 N2(g) + 3/2 H2(g) = NH3(g)";
  const subject = reaction(equation, referenceData);
  const fraction = 0.0385;
  const gibbsEnergy = reactionGibbsEnergy(subject, {
    temperature: quantity(400, "Cel"),
    pressure: quantity(10, "atm"),
    gas: {
      moleFractions: { "N2(g)": (1 - fraction) / 4, "H2(g)": (3 * (1 - fraction)) / 4, "NH3(g)": fraction },
      equationOfState: virial(),
    },
  });
  // rounding of the fraction, 0.00005: d(ln Q)/dy = 1/y + 2/(1 - y)
  const rounding = 0.0083145 * 673.15 * 0.00005 * (1 / fraction + 2 / (1 - fraction));
  return [
    row({
      id: "larson-dodge-ammonia-400-Cel-10-atm",
      ...cross,
      source: larsonDodge,
      quantity: "Gibbs energy of ammonia synthesis in kJ/mol at 3.85 % NH3 measured at equilibrium, 400 Cel, 10 atm",
      expected: 0,
      computed: gibbsEnergy.value / 1000,
      tolerance: tidy(spreadOfReaction(subject, 673.15).gibbsEnergy + rounding),
    }),
  ];
}

/** Decomposition pressures of calcite and the temperature at which the pressure is 1 atm. */
function calciteRows(): AccuracyRow[] {
  const equation = "CaCO3(cr,calcite) = CaO(cr) + CO2(g)";
  const subject = reaction(equation, referenceData);
  const pressures = [900, 1000, 1100, 1150].map((temperatureK) =>
    row({
      id: `hill-winter-calcite-pressure-${temperatureK}-K`,
      ...cross,
      source: hillWinter,
      quantity: `log10 of the pressure of CO2 over calcite in bar at ${temperatureK} K`,
      expected: Number((Math.log10(4.137e7 * 1.01325) - (20474 / temperatureK) * Math.LOG10E).toFixed(5)),
      computed: log10K(equation, temperatureK),
      tolerance: tidy(spreadOfReaction(subject, temperatureK).gibbsEnergy / (gasConstantTimesLn10 * temperatureK)),
    }),
  );
  const atOneAtmosphere = temperaturesAtGibbsEnergy(subject, {
    between: [quantity(900, "K"), quantity(1200, "K")],
    conditions: { pressure: quantity(1, "atm"), gas: { moleFractions: { "CO2(g)": 1 } } },
  });
  return [
    ...pressures,
    row({
      id: "hill-winter-calcite-temperature-1-atm",
      ...cross,
      source: hillWinter,
      quantity: "temperature in K at which CO2 over calcite has 1 atm",
      expected: 1167.4, // 20474 / ln(4.137e7)
      computed: atOneAtmosphere[0]?.value ?? Number.NaN,
      tolerance: tidy(spreadInTemperature(equation, 1167.4)),
    }),
  ];
}

/** Temperatures at which K is 1: textbooks' round figures, and the same coefficients evaluated by another program. */
function turningTemperatureRows(): AccuracyRow[] {
  const cases = [
    ["boudouard", "C(cr,graphite) + CO2(g) = 2 CO(g)", 973, 973.1393832621676],
    ["steam-reforming", "CH4(g) + H2O(g) = CO(g) + 3 H2(g)", 890, 891.8831381782608],
    ["SO2-oxidation", "SO2(g) + 1/2 O2(g) = SO3(g)", 1050, 1052.6230904411775],
  ] as const;
  return cases.flatMap(([name, equation, textbook, evaluated]) => {
    const found = temperaturesAtGibbsEnergy(reaction(equation, referenceData), {
      between: [quantity(600, "K"), quantity(1500, "K")],
    });
    const common = {
      quantity: `temperature in K at which K of ${equation} is 1`,
      computed: found[0]?.value ?? Number.NaN,
    };
    return [
      row({
        id: `turning-temperature-${name}-textbooks`,
        ...common,
        ...cross,
        source: "common practice, no source; a round figure",
        expected: textbook,
        tolerance: tidy(5 + spreadInTemperature(equation, textbook)),
      }),
      row({
        id: `turning-temperature-${name}-evaluated`,
        ...common,
        class: "identity",
        origin: "computed",
        source: "the same nine-coefficient sets in a separate program of doubles",
        expected: evaluated,
        // 4 eps of terms of some 1e6 J/mol over an entropy of some 150 J/mol/K, once in each program
        tolerance: 1e-11,
      }),
    ];
  });
}

/** At 298.15 K: equation, Gibbs energy and enthalpy in kJ/mol, digits behind the point. */
const textbookEnergies: readonly (readonly [
  name: string,
  equation: string,
  gibbs: number,
  enthalpy: number,
  digits: number,
])[] = [
  ["ammonia-synthesis", "N2(g) + 3 H2(g) = 2 NH3(g)", -32.9, -92.22, 1],
  ["liquid-water", "H2(g) + 1/2 O2(g) = H2O(l)", -237.13, -285.83, 2],
  ["steam", "H2(g) + 1/2 O2(g) = H2O(g)", -228.57, -241.82, 2],
  ["carbon-dioxide", "C(cr,graphite) + O2(g) = CO2(g)", -394.36, -393.51, 2],
  ["carbon-monoxide", "C(cr,graphite) + 1/2 O2(g) = CO(g)", -137.17, -110.53, 2],
  ["methane", "C(cr,graphite) + 2 H2(g) = CH4(g)", -50.72, -74.81, 2],
  ["carbon-monoxide-combustion", "CO(g) + 1/2 O2(g) = CO2(g)", -257.19, -282.98, 2],
  ["water-gas-shift", "CO(g) + H2O(g) = CO2(g) + H2(g)", -28.62, -41.16, 2],
  ["water-gas", "C(cr,graphite) + H2O(g) = CO(g) + H2(g)", 91.4, 131.29, 2],
  ["boudouard", "C(cr,graphite) + CO2(g) = 2 CO(g)", 120.02, 172.45, 2],
  ["methanation", "CO(g) + 3 H2(g) = CH4(g) + H2O(g)", -142.12, -206.1, 2],
  ["carbon-dioxide-methanation", "CO2(g) + 4 H2(g) = CH4(g) + 2 H2O(g)", -113.5, -164.94, 2],
  ["methane-combustion", "CH4(g) + 2 O2(g) = CO2(g) + 2 H2O(l)", -817.9, -890.36, 2],
  ["SO2-oxidation", "2 SO2(g) + O2(g) = 2 SO3(g)", -141.74, -197.78, 2],
  ["NO-oxidation", "2 NO(g) + O2(g) = 2 NO2(g)", -70.48, -114.14, 2],
  ["calcite-decomposition", "CaCO3(cr,calcite) = CaO(cr) + CO2(g)", 130.4, 178.3, 1],
  ["ammonia-combustion", "4 NH3(g) + 3 O2(g) = 2 N2(g) + 6 H2O(l)", -1356.98, -1530.54, 2],
  ["vaporization-of-water", "H2O(l) = H2O(g)", 8.56, 44.01, 2],
];

function textbookRows(): AccuracyRow[] {
  return textbookEnergies.flatMap(([name, equation, gibbs, enthalpy, digits]) => {
    const subject = reaction(equation, referenceData);
    const spread = spreadOfReaction(subject, 298.15);
    const computed = standardReactionProperties(subject, { temperature: quantity(298.15, "K") });
    // each summand is rounded to the digits printed
    const rounding =
      0.5 * 10 ** -digits * subject.terms.reduce((sum, { coefficient }) => sum + Math.abs(coefficient), 0);
    const common = { ...cross, source: atkins };
    return [
      row({
        id: `textbook-${name}-gibbs-energy`,
        ...common,
        quantity: `Gibbs energy of ${equation} at 298.15 K in kJ/mol`,
        expected: gibbs,
        computed: computed.gibbsEnergy.value / 1000,
        tolerance: tidy(rounding + spread.gibbsEnergy),
      }),
      row({
        id: `textbook-${name}-enthalpy`,
        ...common,
        quantity: `enthalpy of ${equation} at 298.15 K in kJ/mol`,
        expected: enthalpy,
        computed: computed.enthalpy.value / 1000,
        tolerance: tidy(rounding + spread.enthalpy),
      }),
    ];
  });
}

/** Potentials of the hydrogen-oxygen cell, two electrons, from Gibbs energy, entropy and enthalpy. */
function cellRows(): AccuracyRow[] {
  const twoFaradays = 2 * faradayConstant.value;
  const at = (equation: string) =>
    standardReactionProperties(reaction(equation, referenceData), { temperature: quantity(298.15, "K") });
  const liquid = at("H2(g) + 1/2 O2(g) = H2O(l)");
  const vapour = at("H2(g) + 1/2 O2(g) = H2O(g)");
  const source = "electrochemistry textbooks; S. G. Bratsch, J. Phys. Chem. Ref. Data 18, 1 (1989)";
  // 0.04 kJ/mol on the formation of water is 0.2 mV; 0.04 J/mol/K on entropies is 0.2 microvolts per kelvin
  const voltage = 0.0005 + 0.0002;
  return [
    ["liquid-water", "potential in V, liquid water", 1.229, -liquid.gibbsEnergy.value, voltage],
    ["water-vapour", "potential in V, water vapour", 1.185, -vapour.gibbsEnergy.value, voltage],
    ["temperature-coefficient", "temperature coefficient in V/K, liquid water", -0.000846, liquid.entropy.value, 7e-7],
    ["thermoneutral", "thermoneutral potential in V, liquid water", 1.481, -liquid.enthalpy.value, voltage],
  ].map(([name, words, expected, energy, tolerance]) =>
    row({
      id: `hydrogen-oxygen-cell-${name}`,
      ...cross,
      source,
      quantity: `standard hydrogen-oxygen cell at 298.15 K: ${words}`,
      expected: Number(expected),
      computed: Number(energy) / twoFaradays,
      tolerance: Number(tolerance),
    }),
  );
}

function log10K(equation: string, temperatureK: number): number {
  return standardReactionProperties(reaction(equation, referenceData), { temperature: quantity(temperatureK, "K") })
    .log10K;
}

/** What the spread of the Gibbs energy makes of a temperature of equilibrium: spread over entropy. */
function spreadInTemperature(equation: string, temperatureK: number): number {
  const subject = reaction(equation, referenceData);
  const { entropy } = standardReactionProperties(subject, { temperature: quantity(temperatureK, "K") });
  return spreadOfReaction(subject, temperatureK).gibbsEnergy / (Math.abs(entropy.value) / 1000);
}

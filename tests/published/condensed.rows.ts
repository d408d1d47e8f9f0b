import { referenceData } from "../../src/data/reference-data.js";
import { quantity } from "../../src/quantity/quantity.js";
import { reaction } from "../../src/reaction/reaction.js";
import { standardReactionProperties } from "../../src/reaction/standard-reaction.js";
import { formationProperties } from "../../src/species/formation-properties.js";
import type { SpeciesRecord } from "../../src/species/record.js";
import { findSequence } from "../../src/species/sequences.js";
import { standardProperties } from "../../src/species/standard-properties.js";
import { type AccuracyRow, row } from "./accuracy-row.js";
import { gasConstantTimesLn10, recordOf, slug, tidy } from "./combined-uncertainty.js";

const cross = { class: "cross source", origin: "memory" } as const;
const scale1990 = "International Temperature Scale of 1990, Metrologia 27, 3 (1990), defining fixed points";
const secondaryPoints = "R. E. Bedford et al., Metrologia 33, 133 (1996), secondary reference points";
const janaf = "NIST-JANAF Thermochemical Tables, 4th ed. (1998)";
const ironSystem = "L. J. Swartzendruber, Bull. Alloy Phase Diagrams 3, 161 (1982)";
const turkdogan = "E. T. Turkdogan, Physical Chemistry of High Temperature Technology (1980), table of Gibbs energies";
const robie = "R. A. Robie, B. S. Hemingway, USGS Bulletin 2131 (1995)";
const huebner = "J. S. Huebner, in Research Techniques for High Pressure and High Temperature (1971)";

/** Transitions, formation at 298.15 K and Gibbs energies over temperature of condensed phases. */
export function rows(): AccuracyRow[] {
  return [
    ...transitionRows(),
    ...entropyRows(),
    ...heatCapacityRows(),
    ...formationRows(),
    ...sulfurDioxideRows(),
    ...lineRows(),
    ...bufferRows(),
  ];
}

/**
 * Temperatures in K at which G of two phases is equal. The tolerance: rounding of the published value where it is a
 * fixed point; else what scale and evaluation leave open, for the tables of JANAF on the scale of 1968 and of older
 * measurements. A mole of the upper phase forms from `moles` of the lower.
 */
const transitions: readonly (readonly [
  lower: string,
  upper: string,
  temperatureK: number,
  tolerance: number,
  source: string,
  moles?: number,
])[] = [
  ["Ag(cr)", "Ag(l)", 1234.93, 0.01, scale1990],
  ["Al(cr)", "Al(l)", 933.473, 0.01, scale1990],
  ["Cu(cr)", "Cu(l)", 1357.77, 0.01, scale1990],
  ["Zn(cr)", "Zn(l)", 692.677, 0.01, scale1990],
  ["Pb(cr)", "Pb(l)", 600.612, 0.01, secondaryPoints],
  ["H2O(cr)", "H2O(l)", 273.15, 0.05, "ice point, common practice"],
  ["Mg(cr)", "Mg(l)", 923, 0.5, janaf],
  ["Si(cr)", "Si(l)", 1685, 3, janaf],
  ["Na(cr)", "Na(l)", 370.98, 0.2, janaf],
  ["K(cr)", "K(l)", 336.35, 0.3, janaf],
  ["Ca(cr,alpha)", "Ca(cr,beta)", 716, 1, janaf],
  ["Ca(cr,beta)", "Ca(l)", 1115, 1, janaf],
  ["S(cr,rhombic)", "S(cr,monoclinic)", 368.3, 0.5, janaf],
  ["S(cr,monoclinic)", "S(l)", 388.36, 0.5, janaf],
  ["Fe(cr,alpha)", "Fe(cr,gamma)", 1185, 2.5, ironSystem],
  ["Fe(cr,gamma)", "Fe(cr,delta)", 1667, 2.5, ironSystem],
  ["Fe(cr,delta)", "Fe(l)", 1811, 2.5, ironSystem],
  ["SiO2(cr,alpha-quartz)", "SiO2(cr,beta-quartz)", 848, 5, "C. N. Fenner, Am. J. Sci. 36, 331 (1913)"],
  // the vapour of the reference element reaches 1 bar; liquid and gas come from different sources
  ["S(l)", "S2(g)", 882.117, 0.3, janaf, 2],
  ["Na(l)", "Na(g)", 1170.525, 0.3, janaf],
  ["K(l)", "K(g)", 1039.54, 0.3, janaf],
  ["Mg(l)", "Mg(g)", 1366.104, 0.3, janaf],
  ["Ca(l)", "Ca(g)", 1773.658, 0.3, janaf],
  ["Br2(l)", "Br2(g)", 332.503, 0.3, janaf],
];

function transitionRows(): AccuracyRow[] {
  return transitions.map(([lower, upper, published, tolerance, source, moles = 1]) =>
    row({
      id: `transition-temperature-${slug(lower)}-${slug(upper)}`,
      ...cross,
      source,
      quantity: `temperature in K at which ${lower} and ${upper} have one Gibbs energy at 1 bar`,
      expected: published,
      computed: temperatureOfEquality(recordOf(lower), recordOf(upper), published, moles),
      tolerance,
    }),
  );
}

/** From the temperature that both ranges have next to the published one, with the difference of the entropies there. */
function temperatureOfEquality(lower: SpeciesRecord, upper: SpeciesRecord, nearK: number, moles: number): number {
  const temperatureK = Math.max(Math.min(nearK, endOf(lower)), startOf(upper));
  const [below, above] = [lower, upper].map((record) =>
    standardProperties(record, { temperature: quantity(temperatureK, "K") }),
  );
  const gibbsEnergy = above!.gibbsEnergy.value - moles * below!.gibbsEnergy.value;
  return temperatureK + gibbsEnergy / (above!.entropy.value - moles * below!.entropy.value);
}

function intervalsOf({ gibbsFunction }: SpeciesRecord): readonly { readonly from: number; readonly to: number }[] {
  return gibbsFunction.kind === "series" ? gibbsFunction.intervals : [{ from: 298.15, to: 298.15 }];
}

function startOf(record: SpeciesRecord): number {
  return intervalsOf(record)[0]!.from;
}

function endOf(record: SpeciesRecord): number {
  return intervalsOf(record).at(-1)!.to;
}

/** S in J/mol/K at 298.15 K of CODATA Key Values (1989), with half-widths; the fits are not anchored in them. */
const codataEntropies: Readonly<Record<string, readonly [entropy: number, halfWidth: number]>> = {
  "S(cr,rhombic)": [32.054, 0.05],
  "Mg(cr)": [32.67, 0.1],
  "Ca(cr,alpha)": [41.59, 0.4],
  "Al(cr)": [28.3, 0.1],
  "Si(cr)": [18.81, 0.08],
  "Na(cr)": [51.3, 0.2],
  "K(cr)": [64.68, 0.2],
  "Cu(cr)": [33.15, 0.08],
  "Zn(cr)": [41.63, 0.15],
  "Ag(cr)": [42.55, 0.2],
  "Pb(cr)": [64.8, 0.3],
  "Hg(l)": [75.9, 0.12],
  "SiO2(cr,alpha-quartz)": [41.46, 0.2],
};

function entropyRows(): AccuracyRow[] {
  return Object.entries(codataEntropies).map(([label, [entropy, halfWidth]]) =>
    row({
      id: `codata-${slug(label)}-entropy`,
      ...cross,
      source: "CODATA Key Values for Thermodynamics (1989)",
      quantity: `entropy of ${label} at 298.15 K in J/mol/K`,
      expected: entropy,
      computed: at(label, 298.15).entropy.value,
      tolerance: halfWidth,
    }),
  );
}

/**
 * Cp in J/mol/K at 298.15 K of JANAF (1998). Two good measurements of a heat capacity near room temperature lie within
 * half a per cent of each other; the fits of minerals are good to one per cent (both common practice, no source).
 */
const janafHeatCapacities: Readonly<Record<string, readonly [heatCapacity: number, share: number]>> = {
  "S(cr,rhombic)": [22.698, 0.005],
  "Al2O3(cr,corundum)": [79.015, 0.01],
  "Mg(cr)": [24.897, 0.005],
  "MgO(cr)": [37.238, 0.01],
  "Ca(cr,alpha)": [25.929, 0.005],
  "Si(cr)": [20, 0.005],
  "SiO2(cr,alpha-quartz)": [44.602, 0.005],
  "NaCl(cr)": [50.509, 0.005],
  "KCl(cr)": [51.286, 0.01],
  "Fe(cr,alpha)": [25.094, 0.005],
  "Fe3O4(cr,magnetite)": [147.235, 0.005],
  "Hg(l)": [27.978, 0.005],
};

function heatCapacityRows(): AccuracyRow[] {
  return Object.entries(janafHeatCapacities).map(([label, [heatCapacity, share]]) =>
    row({
      id: `janaf-${slug(label)}-heat-capacity`,
      ...cross,
      source: janaf,
      quantity: `Cp of ${label} at 298.15 K in J/mol/K`,
      expected: heatCapacity,
      computed: at(label, 298.15).heatCapacity!.value,
      tolerance: tidy(share * heatCapacity),
    }),
  );
}

/**
 * Formation Gibbs energy and enthalpy in kJ/mol at 298.15 K as printed, and half-widths (95 percent) of the entropies of
 * compound and elements together in J/mol/K: of CODATA or USGS 2131, added up. Formation enthalpies differ between the
 * sources: the printed Gibbs energy is moved by the difference, so that the row compares entropies, those of the
 * elements among them.
 */
const formations: readonly (readonly [
  label: string,
  source: string,
  gibbsEnergy: number,
  enthalpy: number,
  digits: number,
  entropyHalfWidth: number,
])[] = [
  ["MgO(cr)", janaf, -568.945, -601.241, 3, 0.25],
  ["SiO2(cr,alpha-quartz)", janaf, -856.443, -910.857, 3, 0.29],
  ["Al2O3(cr,corundum)", janaf, -1582.275, -1675.692, 3, 0.31],
  ["NaCl(cr)", janaf, -384.024, -411.12, 3, 0.4],
  ["KCl(cr)", janaf, -408.761, -436.684, 3, 0.4],
  ["Fe3O4(cr,magnetite)", janaf, -1017.438, -1120.894, 3, 0.8],
  ["Fe2O3(cr,hematite)", robie, -744.4, -826.2, 1, 0.5],
  ["MgCO3(cr,magnesite)", robie, -1029.5, -1113.3, 1, 0.4],
  ["Mg(OH)2(cr,brucite)", robie, -833.5, -924.5, 1, 0.3],
  ["Ca(OH)2(cr,portlandite)", robie, -897.5, -985.2, 1, 0.8],
  ["Al2O3(cr,corundum)", robie, -1582.3, -1675.7, 1, 0.31],
  ["NaCl(cr)", robie, -384.2, -411.3, 1, 0.4],
  ["KCl(cr)", robie, -408.6, -436.5, 1, 0.4],
];

function formationRows(): AccuracyRow[] {
  return formations.map(([label, source, gibbsEnergy, enthalpy, digits, entropyHalfWidth]) => {
    const computed = formation(label, 298.15);
    const moved = gibbsEnergy + computed.enthalpy.value / 1000 - enthalpy;
    return row({
      id: `${source === janaf ? "janaf" : "usgs-2131"}-${slug(label)}-formation-gibbs-energy`,
      ...cross,
      source,
      quantity: `formation Gibbs energy of ${label} at 298.15 K in kJ/mol, ${gibbsEnergy} moved from a formation enthalpy of ${enthalpy} to the one used here`,
      expected: Number(moved.toFixed(4)),
      computed: computed.gibbsEnergy.value / 1000,
      // both printed values are rounded
      tolerance: tidy(10 ** -digits + 0.29815 * entropyHalfWidth),
    });
  });
}

/**
 * Formation of SO2(g) in JANAF: Gibbs energy in kJ/mol by temperature in K, on either side of the transitions of
 * sulfur. Half-widths of CODATA: 0.2 kJ/mol, 0.05 J/mol/K of SO2, 0.05 of S, 0.005 of O2; and Cp of SO2, whose two
 * evaluations part by 0.2 J/mol/K, carried through the integrals.
 */
const sulfurDioxide: Readonly<Record<string, number>> = {
  298.15: -300.125,
  500: -300.871,
  1000: -288.725,
  1500: -252.342,
};

function sulfurDioxideRows(): AccuracyRow[] {
  return Object.entries(sulfurDioxide).map(([key, gibbsEnergy]) => {
    const temperatureK = Number(key);
    const spreadOfHeatCapacity = 0.0002 * (temperatureK * Math.log(temperatureK / 298.15) - (temperatureK - 298.15));
    return row({
      id: `janaf-SO2-formation-gibbs-energy-${key}-K-through-the-phases-of-sulfur`,
      ...cross,
      source: janaf,
      quantity: `formation Gibbs energy of SO2(g) at ${key} K in kJ/mol, from the reference phase of sulfur there`,
      expected: gibbsEnergy,
      computed: formation("SO2(g)", temperatureK).gibbsEnergy.value / 1000,
      tolerance: tidy(0.0005 + 0.2 + 0.000105 * temperatureK + spreadOfHeatCapacity),
    });
  });
}

/**
 * Formation Gibbs energies as straight lines A + B T in kJ/mol, and where they hold in K. A line stands for a curve and
 * for older measurements: 4 kJ (1 kcal) for a mole of the compound, or of the gas consumed where that is more (common
 * practice, no source).
 */
const lines: readonly (readonly [
  label: string,
  a: number,
  b: number,
  between: readonly number[],
  molesOfGas: number,
])[] = [
  ["MgO(cr)", -601.2, 0.1076, [400, 600, 900], 0.5],
  ["SiO2(cr)", -904.8, 0.1734, [700, 1200, 1600], 1],
  ["Al2O3(cr,corundum)", -1682.9, 0.3232, [950, 1300, 1600], 1.5],
  ["Fe0.947O(cr,wustite)", -263.7, 0.06435, [900, 1300, 1600], 0.5],
  ["Fe3O4(cr,magnetite)", -1103.1, 0.3074, [500, 1000, 1500], 2],
  ["Fe2O3(cr,hematite)", -815, 0.2511, [500, 1000, 1500], 1.5],
  ["NaCl(cr)", -411.6, 0.0931, [400, 700, 1000], 0.5],
  ["KCl(cr)", -438.5, 0.0987, [400, 700, 1000], 0.5],
];

function lineRows(): AccuracyRow[] {
  return lines.flatMap(([label, a, b, temperatures, molesOfGas]) =>
    temperatures.map((temperatureK) =>
      row({
        id: `turkdogan-${slug(label)}-${temperatureK}-K`,
        ...cross,
        source: turkdogan,
        quantity: `formation Gibbs energy of ${label} at ${temperatureK} K in kJ/mol, from the line ${a} + ${b} T/K`,
        expected: Number((a + b * temperatureK).toFixed(3)),
        computed: formation(label, temperatureK).gibbsEnergy.value / 1000,
        tolerance: 4 * Math.max(1, molesOfGas),
      }),
    ),
  );
}

/** log10 of the fugacity of oxygen in bar over two solids, A - B K/T; buffers are reproduced to 0.2 (common practice). */
const buffers: readonly (readonly [
  name: string,
  equation: string,
  a: number,
  b: number,
  temperatures: readonly number[],
])[] = [
  ["hematite-magnetite", "6 Fe2O3(cr,hematite) = 4 Fe3O4(cr,magnetite) + O2(g)", 14.41, 24912, [900, 1200, 1400]],
  ["iron-wustite", "2 Fe0.947O(cr,wustite) = 1.894 Fe(cr) + O2(g)", 6.57, 27215, [1000, 1300, 1600]],
  ["iron-magnetite", "1/2 Fe3O4(cr,magnetite) = 3/2 Fe(cr) + O2(g)", 8.99, 29260, [700, 800]],
];

function bufferRows(): AccuracyRow[] {
  return buffers.flatMap(([name, equation, a, b, temperatures]) => {
    const subject = reaction(equation, referenceData);
    return temperatures.map((temperatureK) =>
      row({
        id: `huebner-${name}-${temperatureK}-K`,
        ...cross,
        source: huebner,
        quantity: `log10 of the fugacity of oxygen in bar of the ${name} buffer at ${temperatureK} K`,
        expected: Number((a - b / temperatureK).toFixed(4)),
        computed: standardReactionProperties(subject, { temperature: quantity(temperatureK, "K") }).log10K,
        // the spread of the formation enthalpies used, 0.8 kJ/mol of wustite and 2 kJ/mol of half a magnetite
        tolerance: tidy(0.2 + (name === "hematite-magnetite" ? 0 : 2 / (gasConstantTimesLn10 * temperatureK))),
      }),
    );
  });
}

function at(label: string, temperatureK: number) {
  return standardProperties(recordOf(label), { temperature: quantity(temperatureK, "K") });
}

function formation(label: string, temperatureK: number) {
  const isSequence = referenceData.sequences!.some((sequence) => sequence.label === label);
  const subject = isSequence ? findSequence(referenceData, label) : recordOf(label);
  return formationProperties(subject, { temperature: quantity(temperatureK, "K") }, referenceData);
}

import type { JanafColumns } from "./janaf-table.js";

/** What JANAF prints on a gas, and what a comparison of formation properties needs besides. */
export interface GasColumns extends JanafColumns {
  /** The elements, as the phases in which they are the reference below the first transition, with their numbers. */
  readonly elements: Readonly<Record<string, number>>;
  /** Half-width (95 percent) of the formation enthalpy in kJ/mol: JANAF's own, or that of the record's source. */
  readonly halfWidth: number;
  /** JANAF's formation enthalpy at 298.15 K in kJ/mol, where the record follows a later evaluation. */
  readonly movedFrom?: number;
}

/**
 * M. W. Chase Jr., NIST-JANAF Thermochemical Tables, 4th edition, J. Phys. Chem. Ref. Data Monograph 9 (1998);
 * standard pressure 1 bar; origin: memory. As in janaf-table.ts, a cell stands here where it agreed with the redundancies
 * of its own table.
 */
export const gasesTable: Readonly<Record<string, GasColumns>> = {
  "C2H2(g)": {
    temperatureK: [298.15, 500, 1000],
    elements: { "C(cr,graphite)": 2, "H2(g)": 1 },
    halfWidth: 0.7,
    movedFrom: 226.731,
    log10K: [-36.651, -20.628, -8.859],
  },
  "C2H4(g)": {
    temperatureK: [298.15, 500, 1000],
    elements: { "C(cr,graphite)": 2, "H2(g)": 2 },
    halfWidth: 0.29,
    heatCapacity: [42.886, 62.477, 93.899],
    entropy: [null, 246.215, 300.408],
    gibbsFunction: [null, null, 249.742],
    enthalpyIncrement: [null, 10.668, 50.665],
    formationEnthalpy: [52.467, 46.641, 38.183],
    formationGibbsEnergy: [68.421, 80.933, 119.122],
    log10K: [-11.987, -8.455, -6.222],
  },
  "CH2O(g)": {
    temperatureK: [298.15],
    elements: { "C(cr,graphite)": 1, "H2(g)": 1, "O2(g)": 0.5 },
    halfWidth: 0.5,
    movedFrom: -115.897,
    heatCapacity: [35.387],
  },
  "HCN(g)": {
    temperatureK: [298.15],
    elements: { "H2(g)": 0.5, "C(cr,graphite)": 1, "N2(g)": 0.5 },
    halfWidth: 8.4,
    movedFrom: 135.143,
    heatCapacity: [35.857],
    log10K: [-21.851],
  },
  "N2O(g)": {
    temperatureK: [298.15],
    elements: { "N2(g)": 1, "O2(g)": 0.5 },
    halfWidth: 0.8,
    movedFrom: 82.048,
    heatCapacity: [38.617],
  },
  "F2(g)": {
    temperatureK: [298.15],
    elements: {},
    halfWidth: 0,
    heatCapacity: [31.302],
    entropy: [202.789],
  },
  "Cl2(g)": {
    temperatureK: [298.15, 500, 1000, 2000],
    elements: {},
    halfWidth: 0,
    heatCapacity: [33.949, 36.064, 37.438, 38.428],
    entropy: [223.079, 241.228, 266.764, 293.033],
    gibbsFunction: [null, 227.02, 241.202, 261.279],
    enthalpyIncrement: [null, 7.104, 25.562, 63.512],
  },
  "Br2(g)": {
    temperatureK: [298.15],
    elements: { "Br2(l)": 1 },
    halfWidth: 0.11,
    log10K: [-0.544],
  },
  "I2(g)": {
    temperatureK: [298.15],
    elements: { "I2(cr)": 1 },
    halfWidth: 0.08,
    heatCapacity: [36.887],
    entropy: [260.685],
    formationEnthalpy: [62.421],
    formationGibbsEnergy: [19.325],
    log10K: [-3.386],
  },
  "Br(g)": {
    temperatureK: [298.15],
    elements: { "Br2(l)": 0.5 },
    halfWidth: 0.12,
    heatCapacity: [20.786],
    entropy: [175.017],
    formationEnthalpy: [111.86],
    formationGibbsEnergy: [82.362],
    log10K: [-14.429],
  },
  "I(g)": {
    temperatureK: [298.15],
    elements: { "I2(cr)": 0.5 },
    halfWidth: 0.04,
    entropy: [180.786],
    formationEnthalpy: [106.762],
    formationGibbsEnergy: [70.174],
    log10K: [-12.294],
  },
  "HF(g)": {
    temperatureK: [298.15, 500, 1000],
    elements: { "H2(g)": 0.5, "F2(g)": 0.5 },
    halfWidth: 0.8,
    heatCapacity: [29.138, 29.172, 30.169],
    entropy: [173.78],
    formationEnthalpy: [-272.546, -272.799],
    formationGibbsEnergy: [-274.646, -276],
    log10K: [48.117, 28.834],
  },
  "HCl(g)": {
    temperatureK: [298.15, 500, 1000, 2000],
    elements: { "H2(g)": 0.5, "Cl2(g)": 0.5 },
    halfWidth: 0.1,
    heatCapacity: [29.136, 29.304, 31.628, 35.6],
    entropy: [186.901, 201.989, 222.903, 246.246],
    gibbsFunction: [null, 190.205, 201.857, 218.769],
    enthalpyIncrement: [null, 5.892, 21.046, 54.953],
    formationEnthalpy: [-92.312, -92.913, -94.388, -95.59],
    formationGibbsEnergy: [-95.3, -97.166, -100.799, -106.631],
    log10K: [16.696, 10.151, 5.265, 2.785],
  },
  "HI(g)": {
    temperatureK: [298.15],
    elements: { "H2(g)": 0.5, "I2(cr)": 0.5 },
    halfWidth: 0.14,
    heatCapacity: [29.156],
    entropy: [206.589],
    formationEnthalpy: [26.359],
    formationGibbsEnergy: [1.56],
    log10K: [-0.273],
  },
  "S(g)": {
    temperatureK: [298.15],
    elements: { "S(cr,rhombic)": 1 },
    halfWidth: 0.25,
    heatCapacity: [23.674],
    entropy: [167.828],
    formationEnthalpy: [276.98],
    formationGibbsEnergy: [236.5],
    log10K: [-41.434],
  },
  "S2(g)": {
    temperatureK: [298.15],
    elements: { "S(cr,rhombic)": 2 },
    halfWidth: 0.3,
    entropy: [228.165],
    formationEnthalpy: [128.6],
    formationGibbsEnergy: [79.687],
    log10K: [-13.961],
  },
  "SO(g)": {
    temperatureK: [298.15],
    elements: { "S(cr,rhombic)": 1, "O2(g)": 0.5 },
    halfWidth: 1.3,
    heatCapacity: [30.173],
    entropy: [221.944],
    formationEnthalpy: [5.007],
    formationGibbsEnergy: [-21.026],
    log10K: [3.684],
  },
  "H2S(g)": {
    temperatureK: [298.15, 500, 1000],
    elements: { "H2(g)": 1, "S(cr,rhombic)": 1 },
    halfWidth: 0.5,
    formationEnthalpy: [-20.502, -27.762, -90.024],
    formationGibbsEnergy: [-33.329, -40.179, -41.184],
    log10K: [5.839, 4.198, 2.151],
  },
  "COS(g)": {
    temperatureK: [298.15],
    elements: { "C(cr,graphite)": 1, "O2(g)": 0.5, "S(cr,rhombic)": 1 },
    halfWidth: 0.8,
    movedFrom: -138.407,
    log10K: [29.016],
  },
};

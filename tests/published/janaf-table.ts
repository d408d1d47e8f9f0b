/** A species' columns: one value a temperature, null or no value where the cell is not used. */
export interface JanafColumns {
  readonly temperatureK: readonly number[];
  /** J/mol/K */
  readonly heatCapacity?: readonly (number | null)[];
  /** J/mol/K */
  readonly entropy?: readonly (number | null)[];
  /** -(G - H(298.15 K)) / T in J/mol/K */
  readonly gibbsFunction?: readonly (number | null)[];
  /** H - H(298.15 K) in kJ/mol */
  readonly enthalpyIncrement?: readonly (number | null)[];
  /** kJ/mol */
  readonly formationEnthalpy?: readonly (number | null)[];
  /** kJ/mol */
  readonly formationGibbsEnergy?: readonly (number | null)[];
  readonly log10K?: readonly (number | null)[];
}

/**
 * M. W. Chase Jr., NIST-JANAF Thermochemical Tables, 4th edition, J. Phys. Chem. Ref. Data Monograph 9 (1998);
 * standard pressure 1 bar; origin: memory.
 *
 * A cell stands here where it agreed with the redundancies of its own table: -(G - H)/T with S and H, the formation
 * functions with those of the elements, log10 K with the Gibbs energy. Cells left out are listed in README.md.
 */
export const janafTable: Readonly<Record<string, JanafColumns>> = {
  "N2(g)": {
    temperatureK: [298.15, 500, 1000, 1500, 2000],
    heatCapacity: [29.124, 29.58, 32.697, 34.843, 35.971],
    entropy: [191.609, 206.739, 228.17, 241.88, 252.074],
    gibbsFunction: [null, 194.917, 206.708, 216.277, 224.006],
    enthalpyIncrement: [null, 5.911, 21.463, 38.405, 56.137],
  },
  "H2(g)": {
    temperatureK: [298.15, 500, 1000, 1500, 2000],
    heatCapacity: [28.836, 29.26, 30.205, 32.298, 34.28],
    entropy: [130.68, 145.737, 166.216, 178.846, 188.418],
    gibbsFunction: [null, 133.973, 145.536, 154.652, 161.943],
    enthalpyIncrement: [null, 5.882, 20.68, 36.29, 52.951],
  },
  "O2(g)": {
    temperatureK: [298.15, 500, 1000, 1500, 2000],
    heatCapacity: [29.376, 31.091, 34.87, 36.544, 37.741],
    entropy: [205.147, 220.693, 243.578, 258.068, 268.748],
    gibbsFunction: [null, 208.524, 220.875, 231.002, 239.16],
    enthalpyIncrement: [null, 6.084, 22.703, 40.599, 59.175],
  },
  "C(cr,graphite)": {
    temperatureK: [298.15, 500, 1000, 1500, 2000],
    heatCapacity: [null, 14.623, 21.61],
    entropy: [5.74, 11.662, 24.457, 33.718, 40.771],
    gibbsFunction: [null, 6.932, 12.662, 18.216, 23.008],
    enthalpyIncrement: [null, 2.365, 11.795, 23.253, 35.525],
  },
  "H(g)": {
    temperatureK: [298.15, 500, 1000, 1500, 2000],
    heatCapacity: [20.786, 20.786, 20.786, 20.786, 20.786],
    entropy: [114.716, 125.463, 139.871, 148.299, 154.278],
    gibbsFunction: [null, 117.071, 125.282, null, 136.591],
    enthalpyIncrement: [null, 4.196, 14.589, 24.982, 35.375],
    formationEnthalpy: [217.999, 219.254, 222.248, 224.836, 226.898],
    formationGibbsEnergy: [203.278, 192.957, 165.485, 136.522, 106.76],
    log10K: [-35.613, -20.158, -8.644, -4.754, -2.788],
  },
  "N(g)": {
    temperatureK: [298.15, 500, 1000, 1500, 2000],
    heatCapacity: [20.786, 20.786, 20.786, 20.786, 20.79],
    entropy: [153.3, 164.047, 178.454, null, 192.863],
    gibbsFunction: [null, 155.655, 163.866, null, 175.175],
    enthalpyIncrement: [null, 4.196, 14.589, null, 35.375],
    formationEnthalpy: [472.683, 473.923, 476.54, 478.462, 479.99],
    formationGibbsEnergy: [455.54, 443.584, 412.171, null, 346.339],
    log10K: [-79.809, -46.341, -21.53, -13.216, -9.045],
  },
  "O(g)": {
    temperatureK: [298.15, 500, 1000, 2000],
    heatCapacity: [21.911, 21.257, 20.915, 20.826],
    entropy: [161.058, 172.197, 186.79, 201.247],
    gibbsFunction: [null, 163.511, 171.93, 183.391],
    enthalpyIncrement: [null, 4.343, 14.86, 35.713],
    formationEnthalpy: [249.173, 250.474, 252.682, 255.299],
    formationGibbsEnergy: [231.736, 219.549, 187.681, 121.552],
    log10K: [-40.599, -22.936, -9.803, -3.175],
  },
  "C(g)": {
    temperatureK: [298.15, 500, 1000],
    heatCapacity: [20.838, 20.804, 20.791],
    entropy: [158.1, 168.863, 183.278],
    enthalpyIncrement: [null, 4.202, 14.6],
    formationEnthalpy: [716.67, 718.507, 719.475],
    formationGibbsEnergy: [671.244, null, 560.654],
    log10K: [-117.599, null, -29.286],
  },
  "He(g)": {
    temperatureK: [298.15],
    heatCapacity: [20.786],
    entropy: [126.152],
  },
  "Ar(g)": {
    temperatureK: [298.15, 500, 1000, 1500, 2000],
    heatCapacity: [20.786, 20.786, 20.786, 20.786, 20.786],
    entropy: [154.845, 165.591, 179.999, 188.427, 194.407],
    gibbsFunction: [null, 157.2, 165.41],
    enthalpyIncrement: [null, 4.196, 14.589, 24.982, 35.375],
  },
  "H2O(g)": {
    temperatureK: [298.15, 500, 1000, 1500, 2000],
    heatCapacity: [33.59, 35.226],
    entropy: [188.834, 206.534, 232.738],
    gibbsFunction: [null, 192.685, 206.738, 218.52],
    enthalpyIncrement: [null, 6.925, 26],
    formationEnthalpy: [-241.826, -243.826, -247.857],
    formationGibbsEnergy: [-228.582, -219.051, -192.59, -164.376, -135.528],
    log10K: [40.047, 22.884, 10.06, 5.724, 3.54],
  },
  "H2O(l)": {
    temperatureK: [298.15],
    heatCapacity: [75.351],
    entropy: [69.95],
    formationEnthalpy: [-285.83],
    formationGibbsEnergy: [-237.141],
    log10K: [41.546],
  },
  "OH(g)": {
    temperatureK: [1000],
    heatCapacity: [30.676],
    log10K: [-1.222],
  },
  "CO(g)": {
    temperatureK: [298.15, 500, 1000, 1500, 2000],
    heatCapacity: [29.142, 29.794, 33.183, 35.217, 36.25],
    entropy: [197.653, 212.831, 234.538, 248.426, 258.714],
    gibbsFunction: [null, 200.968, 212.848, 222.526, 230.342],
    enthalpyIncrement: [null, 5.931, 21.69, 38.85, 56.744],
    formationEnthalpy: [-110.527, -110.003, -111.983, -115.229, -118.896],
    formationGibbsEnergy: [-137.163, -155.414, -200.275, -243.74, -286.034],
    log10K: [24.03, 16.236, 10.461, 8.488, 7.47],
  },
  "CO2(g)": {
    temperatureK: [298.15, 500, 1000, 1500, 2000],
    heatCapacity: [37.129, 44.627, 54.308, 58.379, 60.35],
    entropy: [213.795, 234.901, 269.299, 292.199, 309.293],
    gibbsFunction: [null, 218.29, 235.901, 251.062, 263.574],
    enthalpyIncrement: [null, 8.305, 33.397, 61.705, 91.439],
    formationEnthalpy: [-393.522, -393.666, -394.623, -395.668, -396.784],
    formationGibbsEnergy: [-394.389, -394.939, -395.886, -396.288, -396.333],
    log10K: [69.095, 41.259, 20.679, 13.8, 10.351],
  },
  "CH4(g)": {
    temperatureK: [298.15, 500, 1000],
    formationEnthalpy: [-74.873, -80.802],
    formationGibbsEnergy: [-50.768, -32.741, 19.492],
    log10K: [8.894, 3.42, -1.018],
  },
  "NH3(g)": {
    temperatureK: [298.15, 500, 1000, 2000],
    entropy: [192.774, 212.659],
    gibbsFunction: [null, 197.021, 213.849],
    formationEnthalpy: [-45.898, -49.857, -55.013],
    formationGibbsEnergy: [-16.367, 4.8, 61.91, 179.447],
    log10K: [2.867, -0.501, -3.234, -4.687],
  },
  "NO(g)": {
    temperatureK: [298.15, 500, 1000, 2000],
    heatCapacity: [null, 30.486, 33.987],
    entropy: [null, 226.263, 248.536, 273.128],
    enthalpyIncrement: [null, 6.059, 22.229, 57.859],
    log10K: [-15.172, -8.784, -4.062, -1.699],
  },
  "SO2(g)": {
    temperatureK: [298.15, 500, 1000],
    entropy: [248.212, 270.495],
    gibbsFunction: [null, 252.979, 271.339],
  },
};

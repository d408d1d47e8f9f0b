import type { PublishedInterval, PublishedSeries } from "../../src/heat-capacity/published-series.js";

/** A metal whose solid and liquid Gibbs energies meet at the melting point. */
export interface Metal {
  readonly symbol: string;
  /** Printed by the same source, to 0.01 K. */
  readonly meltingPointK: number;
  /** S at 298.15 K in J/mol/K, of CODATA Key Values (1989), to 0.01 J/mol/K. */
  readonly entropy298: number;
  readonly solid: PublishedSeries;
  readonly liquid: PublishedSeries;
}

const interval = (from: number, to: number, coefficients: readonly number[]): PublishedInterval => ({
  from,
  to,
  coefficients,
  endsAt: "fit",
});

const gibbsEnergy = (powers: readonly number[], intervals: readonly PublishedInterval[]): PublishedSeries => ({
  kind: "series",
  form: "gibbs-energy",
  powers,
  intervals,
});

/**
 * A. T. Dinsdale, Calphad 15, 317 (1991), from memory: the phase stable at 298.15 K and the liquid, up to the end of
 * the interval after melting. Both go on beyond the melting point, which is where they are compared. The order of the
 * powers is ours.
 */
export const metals: readonly Metal[] = [
  {
    symbol: "Al",
    meltingPointK: 933.47,
    entropy298: 28.3,
    solid: gibbsEnergy(
      [2, 3, -1, -9],
      [
        interval(298.15, 700, [-7976.15, 137.093038, -24.3671976, -0.001884662, -8.77664e-7, 74092, 0]),
        interval(700, 933.47, [-11276.24, 223.048446, -38.5844296, 0.018531982, -5.764227e-6, 74092, 0]),
        interval(933.47, 2900, [-11278.378, 188.684153, -31.748192, 0, 0, 0, -1.230524e28]),
      ],
    ),
    liquid: gibbsEnergy(
      [2, 3, -1, 7],
      [
        interval(298.15, 700, [3028.879, 125.251171, -24.3671976, -0.001884662, -8.77664e-7, 74092, 7.9337e-20]),
        interval(700, 933.47, [-271.211, 211.206579, -38.5844296, 0.018531982, -5.764227e-6, 74092, 7.9337e-20]),
        interval(933.47, 2900, [-795.996, 177.430179, -31.748192, 0, 0, 0, 0]),
      ],
    ),
  },
  {
    symbol: "Cu",
    meltingPointK: 1357.77,
    entropy298: 33.15,
    solid: gibbsEnergy(
      [2, 3, -1, -9],
      [
        interval(298.15, 1357.77, [-7770.458, 130.485235, -24.112392, -0.00265684, 1.29223e-7, 52478, 0]),
        interval(1357.77, 3200, [-13542.026, 183.803828, -31.38, 0, 0, 0, 3.64167e29]),
      ],
    ),
    liquid: gibbsEnergy(
      [2, 3, -1, 7],
      [
        interval(298.15, 1357.77, [5194.277, 120.973331, -24.112392, -0.00265684, 1.29223e-7, 52478, -5.8489e-21]),
        interval(1357.77, 3200, [-46.545, 173.881484, -31.38, 0, 0, 0, 0]),
      ],
    ),
  },
  {
    symbol: "Ag",
    meltingPointK: 1234.93,
    entropy298: 42.55,
    solid: gibbsEnergy(
      [2, 3, -1, -9],
      [
        interval(298.15, 1234.93, [-7209.512, 118.202013, -23.8463314, -0.001790585, -3.98587e-7, -12011, 0]),
        interval(1234.93, 3000, [-15095.252, 190.266404, -33.472, 0, 0, 0, 1.411773e29]),
      ],
    ),
    liquid: gibbsEnergy(
      [2, 3, -1, 7],
      [
        interval(298.15, 1234.93, [3815.564, 109.310992, -23.8463314, -0.001790585, -3.98587e-7, -12011, -1.034e-20]),
        interval(1234.93, 3000, [-3587.111, 180.964657, -33.472, 0, 0, 0, 0]),
      ],
    ),
  },
  {
    symbol: "Zn",
    meltingPointK: 692.68,
    entropy298: 41.63,
    solid: gibbsEnergy(
      [2, 3, -9],
      [
        interval(298.15, 692.68, [-7285.787, 118.470069, -23.701314, -0.001712034, -1.264963e-6, 0]),
        interval(692.68, 1700, [-11070.559, 172.34566, -31.38, 0, 0, 4.70514e26]),
      ],
    ),
    liquid: gibbsEnergy(
      [2, 3, 7],
      [
        interval(298.15, 692.68, [-128.574, 108.177079, -23.701314, -0.001712034, -1.264963e-6, -3.5896e-19]),
        interval(692.68, 1700, [-3620.391, 161.608594, -31.38, 0, 0, 0]),
      ],
    ),
  },
  {
    symbol: "Pb",
    meltingPointK: 600.61,
    entropy298: 64.8,
    solid: gibbsEnergy(
      [2, 3, -9],
      [
        interval(298.15, 600.61, [-7650.085, 101.700244, -24.5242231, -0.00365895, -2.4395e-7, 0]),
        interval(600.61, 1200, [-10531.095, 154.243182, -32.4913959, 0.00154613, 0, 8.05448e25]),
      ],
    ),
    liquid: gibbsEnergy(
      [2, 3, 7],
      [
        interval(298.15, 600.61, [-2977.961, 93.949561, -24.5242231, -0.00365895, -2.4395e-7, -6.019e-19]),
        interval(600.61, 1200, [-5677.958, 146.176046, -32.4913959, 0.00154613, 0, 0]),
      ],
    ),
  },
  {
    symbol: "Sn",
    meltingPointK: 505.08,
    entropy298: 51.18,
    solid: gibbsEnergy(
      [2, 3, -1, -9],
      [
        interval(100, 250, [-7958.517, 122.765451, -25.858, 0.00051185, -3.192767e-6, 18440, 0]),
        interval(250, 505.08, [-5855.135, 65.443315, -15.961, -0.0188702, 3.121167e-6, -61960, 0]),
        interval(505.08, 800, [2524.724, 4.005269, -8.2590486, -0.016814429, 2.623131e-6, -1081244, -1.2307e25]),
      ],
    ),
    liquid: gibbsEnergy(
      [2, 3, -1, 7],
      [
        interval(100, 250, [-855.425, 108.677684, -25.858, 0.00051185, -3.192767e-6, 18440, 1.47031e-18]),
        interval(250, 505.08, [1247.957, 51.355548, -15.961, -0.0188702, 3.121167e-6, -61960, 1.47031e-18]),
        interval(505.08, 800, [9496.311, -9.809113, -8.2590486, -0.016814429, 2.623131e-6, -1081244, 0]),
      ],
    ),
  },
  {
    symbol: "Si",
    meltingPointK: 1687,
    entropy298: 18.81,
    solid: gibbsEnergy(
      [2, 3, -1, -9],
      [
        interval(298.15, 1687, [-8162.609, 137.236859, -22.8317533, -0.001912904, -3.552e-9, 176667, 0]),
        interval(1687, 3600, [-9457.642, 167.281367, -27.196, 0, 0, 0, -4.20369e30]),
      ],
    ),
    liquid: gibbsEnergy(
      [2, 3, -1, 7],
      [
        interval(298.15, 1687, [42533.751, 107.13742, -22.8317533, -0.001912904, -3.552e-9, 176667, 2.09307e-21]),
        interval(1687, 3600, [40370.523, 137.722299, -27.196, 0, 0, 0, 0]),
      ],
    ),
  },
  {
    symbol: "Mg",
    meltingPointK: 923,
    entropy298: 32.67,
    solid: gibbsEnergy(
      [2, 3, -1, -9],
      [
        interval(298.15, 923, [-8367.34, 143.675547, -26.1849782, 0.0004858, -1.393669e-6, 78950, 0]),
        interval(923, 3000, [-14130.185, 204.716215, -34.3088, 0, 0, 0, 1.038192e28]),
      ],
    ),
    liquid: gibbsEnergy(
      [2, 3, -1, 7],
      [
        interval(298.15, 923, [-165.097, 134.838617, -26.1849782, 0.0004858, -1.393669e-6, 78950, -8.0176e-20]),
        interval(923, 3000, [-5439.869, 195.324057, -34.3088, 0, 0, 0, 0]),
      ],
    ),
  },
];

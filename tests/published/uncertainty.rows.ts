import { combineUncertainties } from "../../src/uncertainty/combine-uncertainties.js";
import { normalQuantile } from "../../src/uncertainty/normal-quantile.js";
import { standardUncertaintyOf } from "../../src/uncertainty/standard-uncertainty.js";
import { type AccuracyRow, row } from "./accuracy-row.js";

const cross = { class: "cross source", origin: "memory" } as const;
const guide = "Guide to the Expression of Uncertainty in Measurement, JCGM 100:2008";
const wichura = "M. J. Wichura, Appl. Stat. 37, 477 (1988), values for checking an implementation";
const tables = "percentage points of the normal distribution as tables print them; common practice, no source";
const codata = "E. Tiesinga et al., CODATA Recommended Values 2018, Rev. Mod. Phys. 93, 025010 (2021)";

/** Quantiles and coverage factors, and uncertainties that others have combined. */
export function rows(): AccuracyRow[] {
  return [...quantileRows(), ...guideRows(), ...constantRows()];
}

function quantileRows(): AccuracyRow[] {
  const published: [source: string, id: string, probability: number, quantile: number][] = [
    [wichura, "0.25", 0.25, -0.6744897501960817],
    [wichura, "0.001", 0.001, -3.090232306167814],
    [wichura, "1e-20", 1e-20, -9.262340089798408],
    [tables, "0.95", 0.95, 1.644853626951473],
    [tables, "0.975", 0.975, 1.959963984540054],
    [tables, "0.99", 0.99, 2.326347874040841],
    [tables, "0.995", 0.995, 2.575829303548901],
  ];
  return published.map(([source, id, probability, expected]) =>
    row({
      ...cross,
      id: `normal-quantile-${id}`,
      source,
      quantity: `quantile of the normal distribution at ${id}`,
      expected,
      computed: normalQuantile(probability),
      // Half a unit of the 15th decimal, and 3 units in the last place of a double.
      tolerance: 5e-16 + 3 * Number.EPSILON * Math.abs(expected),
    }),
  );
}

function guideRows(): AccuracyRow[] {
  const factors: [percent: string, factor: number][] = [
    ["68.27", 1],
    ["90", 1.645],
    ["95", 1.96],
    ["95.45", 2],
    ["99", 2.576],
    ["99.73", 3],
  ];
  const resistors = Array.from({ length: 10 }, (_value, index) => index);
  const inSeries = (datum: (index: number) => string): number =>
    combineUncertainties(resistors.map((index) => ({ datum: datum(index), sensitivity: 1, standardUncertainty: 0.1 })))
      .standardUncertainty;
  const examples: [id: string, quantity: string, expected: number, rounding: number, computed: number][] = [
    [
      "resistor",
      "4.3.4: standard uncertainty in microohm, 129 at 99 per cent",
      50,
      0.5,
      standardUncertaintyOf({ halfWidth: 129, coverage: 0.99 }),
    ],
    [
      "mass-standard",
      "4.3.3: standard uncertainty in microgram, 240 at three standard deviations",
      80,
      0.5,
      standardUncertaintyOf({ halfWidth: 240, coverage: 0.9973 }),
    ],
    [
      "even-odds",
      "4.3.5: standard uncertainty in mm, 0.04 at 50 per cent",
      0.06,
      0.005,
      standardUncertaintyOf({ halfWidth: 0.04, coverage: 0.5 }),
    ],
    ["one-standard", "5.2.2: ten resistors calibrated with one standard, ohm", 1, 0.005, inSeries(() => "standard")],
    [
      "independent",
      "5.2.2: ten resistors as if independent, ohm",
      0.32,
      0.005,
      inSeries((index) => `resistor ${index}`),
    ],
    [
      "end-gauge",
      "H.1: combined standard uncertainty of an end gauge in nm",
      32,
      0.5,
      combineUncertainties(
        [25, 9.7, 2.9, 16.6].map((u, index) => ({ datum: `input ${index}`, sensitivity: 1, standardUncertainty: u })),
      ).standardUncertainty,
    ],
  ];
  return [
    ...factors.map(([percent, expected]) =>
      row({
        ...cross,
        id: `coverage-factor-${percent}`,
        source: `${guide}, table G.1`,
        quantity: `coverage factor of exactly ${percent} per cent`,
        expected,
        computed: normalQuantile(0.5 + Number(percent) / 200),
        tolerance: 5e-4,
      }),
    ),
    ...examples.map(([id, quantity, expected, tolerance, computed]) =>
      row({ ...cross, id: `uncertainty-guide-${id}`, source: guide, quantity, expected, computed, tolerance }),
    ),
  ];
}

/**
 * Constants that are products of powers of the fine-structure constant and the Rydberg constant, with h, e and c exact:
 * relative uncertainties as printed, in parts of 1e10. Powers add before they are squared.
 */
function constantRows(): AccuracyRow[] {
  // alpha = 7.2973525693(11)e-3, Rydberg constant 10973731.568160(21) per m.
  const relative = { alpha: 1.1e-12 / 7.2973525693e-3, rydberg: 2.1e-5 / 10973731.56816 };
  const derived: [id: string, name: string, alphas: number[], rydbergs: number[], printed: number][] = [
    ["permeability", "vacuum magnetic permeability, alpha", [1], [], 1.5],
    ["bohr-radius", "Bohr radius, alpha / R", [1], [-1], 1.5],
    ["electron-mass", "electron mass, R / alpha^2", [-1, -1], [1], 3],
    ["electron-radius", "classical electron radius, alpha^2 times the Bohr radius", [2, 1], [-1], 4.5],
    ["thomson", "Thomson cross section, square of the classical electron radius", [4, 2], [-2], 9.1],
  ];
  return derived.map(([id, name, alphas, rydbergs, expected]) => {
    const power = Math.abs(alphas.reduce((sum, one) => sum + one, 0));
    return row({
      ...cross,
      id: `relative-uncertainty-${id}`,
      source: codata,
      quantity: `relative standard uncertainty of the ${name}, in 1e-10`,
      expected,
      computed:
        1e10 *
        combineUncertainties([
          ...alphas.map((sensitivity) => ({ datum: "alpha", sensitivity, standardUncertainty: relative.alpha })),
          ...rydbergs.map((sensitivity) => ({ datum: "R", sensitivity, standardUncertainty: relative.rydberg })),
        ]).standardUncertainty,
      // The last digit of the printed uncertainty of alpha, 11(0.5), and that of the result.
      tolerance: 0.05 + power * 1e10 * relative.alpha * (0.5 / 11),
    });
  });
}

import { avogadroConstant, boltzmannConstant, gasConstant, planckConstant } from "../../src/constants/constants.js";
import { quantity } from "../../src/quantity/quantity.js";
import { standardProperties } from "../../src/species/standard-properties.js";
import { type AccuracyRow, row } from "./accuracy-row.js";
import { recordOf } from "./combined-uncertainty.js";

const codata = "CODATA recommended values of the fundamental physical constants: 2018";

/** Atoms without low electronic levels: atomic weight (IUPAC 2021), statistical weight of the ground state. */
const atoms = [
  { label: "He(g)", mass: 4.002602, weight: 1, to: 5000 },
  { label: "Ar(g)", mass: 39.95, weight: 1, to: 5000 },
  { label: "H(g)", mass: 1.008, weight: 2, to: 5000 },
] as const;

/** The Sackur-Tetrode constant, and the entropies of monatomic gases that follow from it. */
export function rows(): AccuracyRow[] {
  return [...constantRows(), ...atoms.flatMap(entropyRows)];
}

function constantRows(): AccuracyRow[] {
  // relative standard uncertainty of the atomic mass constant in 2018: 3e-10, and 1.5 of it in the logarithm
  return [
    row({
      id: "sackur-tetrode-constant-100-kPa",
      class: "cross source",
      source: codata,
      origin: "memory",
      quantity: "Sackur-Tetrode constant at 1 K and 100 kPa, from the library's constants",
      expected: -1.15170753706,
      computed: sackurTetrode(100000),
      tolerance: 9e-10,
    }),
    row({
      id: "sackur-tetrode-constant-101325-Pa",
      class: "cross source",
      source: codata,
      origin: "memory",
      quantity: "Sackur-Tetrode constant at 1 K and 101.325 kPa, from the library's constants",
      expected: -1.16487052358,
      computed: sackurTetrode(101325),
      tolerance: 9e-10,
    }),
  ];
}

function entropyRows({ label, mass, weight, to }: (typeof atoms)[number]): AccuracyRow[] {
  return [298.15, 1000, 3000, to].map((temperatureK) => {
    const units = -1.15170753706 + 1.5 * Math.log(mass) + 2.5 * Math.log(temperatureK) + Math.log(weight);
    const expected = Number((gasConstant.value * units).toFixed(5));
    return row({
      id: `sackur-tetrode-${label.slice(0, -3)}-${temperatureK}-K`,
      class: "cross source",
      source: "Sackur-Tetrode equation with the constant of CODATA 2018 and IUPAC atomic weights of 2021",
      origin: "computed",
      quantity: `entropy of ${label} at ${temperatureK} K and 1 bar in J/mol/K`,
      expected,
      computed: standardProperties(recordOf(label), { temperature: quantity(temperatureK, "K") }).entropy.value,
      // the coefficients carry R of 1986, 8.314510 in place of 8.314463: 5.7e-6; atomic weights as rounded: 0.0005
      tolerance: Number((5.7e-6 * expected + 0.0005).toPrecision(2)),
    });
  });
}

/** ln[(2 pi m k T / h^2)^(3/2) k T / p] + 5/2 with m the atomic mass constant and T = 1 K. */
function sackurTetrode(pressurePa: number): number {
  const k = boltzmannConstant.value;
  const h = planckConstant.value;
  // the molar mass constant of 2018 is 0.99999999965(30) g/mol
  const massKg = (1e-3 / avogadroConstant.value) * (1 - 3.5e-10);
  return 2.5 + 1.5 * Math.log((2 * Math.PI * massKg * k) / (h * h)) + Math.log(k / pressurePa);
}

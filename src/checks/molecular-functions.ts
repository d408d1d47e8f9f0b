import { gasConstantJPerMolK } from "../constants/constants.js";
import { exp } from "../numeric/exp.js";
import { log } from "../numeric/log.js";
import { type HinderedRotor, hinderedRotorLevels } from "./hindered-rotor.js";
import type { MolecularConstants } from "./molecular-constants.js";

/** Entropy at 1 bar and enthalpy above the lowest level of an ideal gas. */
export interface MolecularFunctions {
  /** J/mol/K at 1 bar */
  readonly entropy: number;
  /** H(T) - H(0 K) in J/mol */
  readonly enthalpy: number;
}

/** Second radiation constant hc/k in cm K, CODATA 2018 (exact constants, rounded). */
const secondRadiationConstant = 1.438776877;
/** Sackur-Tetrode constant at 1 K, 100 kPa and 1 u, CODATA 2018. */
const sackurTetrodeConstant = -1.15170753706;
/** Levels above this many kT do not count in a double. */
const highestLevel = 45;

/** A logarithm of a partition function and the energy that goes with it, both per kT. */
interface Part {
  readonly lnPartition: number;
  readonly energy: number;
}

/**
 * Ideal-gas functions from molecular constants: Sackur-Tetrode translation; atoms by their levels; diatomic molecules
 * by direct sums over vibrational and rotational levels (Hill and Van Vleck for doublet Pi states); other molecules as
 * rigid rotors with the first quantum correction, harmonic oscillators at the fundamentals, and internal rotors in
 * cosine potentials of their own.
 *
 * Nuclear spin is left out. Each electronic level of a diatomic molecule above the ground level shares its rotation
 * and vibration.
 *
 * @param constants - of one molecule
 * @param temperatureK - above 0 K
 * @remarks Harmonic oscillators at the fundamentals give too low an entropy where vibrations are anharmonic: at
 * 1000 K by 0.2 J/mol/K for H2O, 0.3 for SO2, 0.7 for CH4 and 0.8 for NH3.
 * @see `references.mcquarrie2000`
 */
export function molecularFunctions(constants: MolecularConstants, temperatureK: number): MolecularFunctions {
  const parts =
    constants.diatomic === undefined
      ? [
          electronic(constants, temperatureK),
          rotational(constants, temperatureK),
          vibrational(constants, temperatureK),
          ...(constants.rotors ?? []).map((rotor) => torsional(rotor, temperatureK)),
        ]
      : [electronic(constants, temperatureK), diatomicPart(constants, constants.diatomic, temperatureK)];
  const translation = sackurTetrodeConstant + 2.5 * log(temperatureK) + 1.5 * log(constants.molarMass);
  let entropy = translation;
  let enthalpy = 2.5;
  for (const { lnPartition, energy } of parts) {
    entropy += lnPartition + energy;
    enthalpy += energy;
  }
  return { entropy: gasConstantJPerMolK * entropy, enthalpy: gasConstantJPerMolK * temperatureK * enthalpy };
}

type Level = readonly [wavenumber: number, degeneracy: number];

function electronic({ levels }: MolecularConstants, temperatureK: number): Part {
  return sumOfLevels(
    levels.map(({ wavenumber, degeneracy }) => [wavenumber, degeneracy]),
    temperatureK,
  );
}

function rotational({ rotation, symmetryNumber }: MolecularConstants, temperatureK: number): Part {
  if (rotation.length === 0) return { lnPartition: 0, energy: 0 };
  const reduced = rotation.map((constant) => (secondRadiationConstant * constant) / temperatureK);
  if (reduced.length === 1) {
    const x = reduced[0]!;
    const correction = 1 + x / 3 + (x * x) / 15;
    return {
      lnPartition: log(correction / (x * symmetryNumber)),
      energy: 1 - (x / 3 + (2 * x * x) / 15) / correction,
    };
  }
  const [a, b, c] = reduced as [number, number, number];
  const shift = (2 * (a + b + c) - (a * b) / c - (b * c) / a - (c * a) / b) / 12;
  return {
    lnPartition: log((Math.sqrt(Math.PI / (a * b * c)) * (1 + shift)) / symmetryNumber),
    energy: 1.5 - shift / (1 + shift),
  };
}

function vibrational({ vibrations }: MolecularConstants, temperatureK: number): Part {
  let lnPartition = 0;
  let energy = 0;
  for (const { wavenumber, degeneracy } of vibrations) {
    const x = (secondRadiationConstant * wavenumber) / temperatureK;
    const factor = exp(-x);
    lnPartition -= degeneracy * log(1 - factor);
    energy += (degeneracy * x * factor) / (1 - factor);
  }
  return { lnPartition, energy };
}

function torsional(rotor: HinderedRotor, temperatureK: number): Part {
  const energies = hinderedRotorLevels(rotor, (highestLevel * temperatureK) / secondRadiationConstant);
  const weight = 1 / rotor.symmetryNumber;
  return sumOfLevels(
    energies.map((energy) => [energy, weight]),
    temperatureK,
  );
}

function diatomicPart(
  { rotation, vibrations }: MolecularConstants,
  diatomic: NonNullable<MolecularConstants["diatomic"]>,
  temperatureK: number,
): Part {
  const { anharmonicity, rotationVibration, centrifugalDistortion, rotationWeights, spinOrbit } = diatomic;
  const highest = (highestLevel * temperatureK) / secondRadiationConstant;
  const harmonic = vibrations[0]!.wavenumber;
  const levels: Level[] = [];
  let below = -1;
  for (let v = 0; ; v += 1) {
    const vibration = harmonic * v - anharmonicity * v * (v + 1);
    const constant = rotation[0]! - rotationVibration * (v + 0.5);
    if (vibration <= below || constant <= 0 || vibration > highest) break;
    below = vibration;
    const rotor =
      spinOrbit === undefined
        ? singletLevels(constant, centrifugalDistortion, rotationWeights, highest - vibration)
        : doubletLevels(constant, centrifugalDistortion, spinOrbit, highest - vibration);
    for (const [wavenumber, degeneracy] of rotor) levels.push([vibration + wavenumber, degeneracy]);
  }
  return sumOfLevels(levels, temperatureK);
}

function singletLevels(
  constant: number,
  distortion: number,
  weights: readonly [even: number, odd: number],
  highest: number,
): Level[] {
  const levels: Level[] = [];
  let below = -1;
  for (let j = 0; ; j += 1) {
    const square = j * (j + 1);
    const level = constant * square - distortion * square * square;
    if (level <= below || level > highest) return levels;
    below = level;
    levels.push([level, (2 * j + 1) * weights[(j % 2) as 0 | 1]]);
  }
}

/** Hill and Van Vleck's levels of a doublet Pi state, each doubled by the two orientations of the orbital momentum. */
function doubletLevels(constant: number, distortion: number, spinOrbit: number, highest: number): Level[] {
  const ratio = spinOrbit / constant;
  // J = 1/2 occurs in the doublet-Pi-1/2 component alone.
  const levels: Level[] = [[-0.5 * constant * (ratio - 2), 4]];
  let below = Number.NEGATIVE_INFINITY;
  for (let k = 2; ; k += 1) {
    const square = k * k - 1;
    const middle = constant * square - distortion * square * square;
    const half = 0.5 * constant * Math.sqrt(4 * k * k + ratio * (ratio - 4));
    if (middle - half <= below || middle - half > highest) return levels;
    below = middle - half;
    levels.push([middle - half, 4 * k], [middle + half, 4 * k]);
  }
}

/** ln of the partition function and the mean energy over kT, relative to the lowest level. */
function sumOfLevels(levels: readonly Level[], temperatureK: number): Part {
  const lowest = levels.reduce((least, [wavenumber]) => Math.min(least, wavenumber), Number.POSITIVE_INFINITY);
  let partition = 0;
  let moment = 0;
  for (const [wavenumber, degeneracy] of levels) {
    const x = (secondRadiationConstant * (wavenumber - lowest)) / temperatureK;
    const weight = degeneracy * exp(-x);
    partition += weight;
    moment += weight * x;
  }
  return { lnPartition: log(partition), energy: moment / partition };
}

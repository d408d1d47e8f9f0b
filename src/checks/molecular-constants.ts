import type { SpeciesRecord, Witness } from "../species/record.js";
import type { HinderedRotor } from "./hindered-rotor.js";
import { unsoundConstants } from "./unsound-constants.js";
import { missing, optionalInput, requiredInput } from "./witness-inputs.js";

/** Constants of one molecule, energies as wavenumbers in cm-1. */
export interface MolecularConstants {
  /** g/mol */
  readonly molarMass: number;
  readonly symmetryNumber: number;
  /** Electronic levels above the ground level, which comes first with energy 0. */
  readonly levels: readonly { readonly wavenumber: number; readonly degeneracy: number }[];
  /** None of an atom, one of a linear molecule, three of any other. */
  readonly rotation: readonly number[];
  readonly vibrations: readonly { readonly wavenumber: number; readonly degeneracy: number }[];
  /** Internal rotors, each by itself, in place of a torsional vibration. */
  readonly rotors?: readonly HinderedRotor[];
  /** Present for diatomic molecules, whose levels are summed one by one. */
  readonly diatomic?: {
    readonly anharmonicity: number;
    readonly rotationVibration: number;
    readonly centrifugalDistortion: number;
    /** Weights of even and odd rotational levels by nuclear spin, in place of a symmetry number. */
    readonly rotationWeights: readonly [even: number, odd: number];
    /** Spin-orbit constant of a doublet Pi ground state. */
    readonly spinOrbit?: number;
  };
}

/** Gram per mole times square angstrom times cm-1: h / (8 pi^2 c) in these units, CODATA 2018. */
const rotationFactor = 16.857629206;

/**
 * Reads the molecular constants among the figures that a witness compares with.
 *
 * Names: `molarMass`, `symmetryNumber`; `level0Degeneracy`, `level1`, `level1Degeneracy`, ...; `rotation1` to
 * `rotation3`, or `bondLength` with `atomicMass1` and `atomicMass2`; `vibration1`, `vibration1Degeneracy`, ...; of a
 * diatomic molecule also `anharmonicity`, `rotationVibration`, `centrifugalDistortion`,
 * `evenRotationWeight` and `oddRotationWeight`, `spinOrbit`; of an internal rotor `rotor1Barrier`, `rotor1Constant`,
 * `rotor1Fold`, `rotor1SymmetryNumber`, .... A degeneracy or symmetry number that is not given is 1.
 *
 * @throws GibbsLedgerError "checks/no-inputs"
 */
export function readMolecularConstants(record: SpeciesRecord, witness: Witness): MolecularConstants {
  const unsound = unsoundConstants(witness);
  if (unsound.length > 0) {
    return missing(record, witness.check, `constants that a molecule may have, unlike ${unsound.join(", ")}`);
  }
  const molarMass = requiredInput(record, witness, "molarMass") * 1000;
  const symmetryNumber = optionalInput(witness, "symmetryNumber") ?? 1;
  const levels = [
    { wavenumber: 0, degeneracy: optionalInput(witness, "level0Degeneracy") ?? 1 },
    ...numbered(witness, "level"),
  ];
  const vibrations = numbered(witness, "vibration");
  const bondLength = optionalInput(witness, "bondLength");
  const rotation = bondLength === undefined ? rotations(witness) : [fromBondLength(record, witness, bondLength)];
  if (rotation.length === 2) return missing(record, witness.check, "none, one or three rotational constants");
  const anharmonicity = optionalInput(witness, "anharmonicity");
  const rotors = internalRotors(record, witness);
  const base = { molarMass, symmetryNumber, levels, rotation, vibrations, ...(rotors.length === 0 ? {} : { rotors }) };
  if (anharmonicity === undefined) return base;
  if (rotation.length !== 1 || vibrations.length !== 1) {
    return missing(record, witness.check, "one rotational constant and one vibration of a diatomic molecule");
  }
  const spinOrbit = optionalInput(witness, "spinOrbit");
  return {
    ...base,
    diatomic: {
      anharmonicity,
      rotationVibration: requiredInput(record, witness, "rotationVibration"),
      centrifugalDistortion: requiredInput(record, witness, "centrifugalDistortion"),
      rotationWeights: [
        optionalInput(witness, "evenRotationWeight") ?? 1 / symmetryNumber,
        optionalInput(witness, "oddRotationWeight") ?? 1 / symmetryNumber,
      ],
      ...(spinOrbit === undefined ? {} : { spinOrbit }),
    },
  };
}

function numbered(witness: Witness, name: string): { wavenumber: number; degeneracy: number }[] {
  const found: { wavenumber: number; degeneracy: number }[] = [];
  for (let index = 1; ; index += 1) {
    const wavenumber = optionalInput(witness, `${name}${index}`);
    if (wavenumber === undefined) return found;
    found.push({ wavenumber, degeneracy: optionalInput(witness, `${name}${index}Degeneracy`) ?? 1 });
  }
}

function internalRotors(record: SpeciesRecord, witness: Witness): HinderedRotor[] {
  const found: HinderedRotor[] = [];
  for (let index = 1; ; index += 1) {
    const barrier = optionalInput(witness, `rotor${index}Barrier`);
    if (barrier === undefined) return found;
    found.push({
      barrier,
      constant: requiredInput(record, witness, `rotor${index}Constant`),
      fold: requiredInput(record, witness, `rotor${index}Fold`),
      symmetryNumber: optionalInput(witness, `rotor${index}SymmetryNumber`) ?? 1,
    });
  }
}

function rotations(witness: Witness): number[] {
  return [1, 2, 3]
    .map((index) => optionalInput(witness, `rotation${index}`))
    .filter((value): value is number => value !== undefined);
}

/** Rotational constant of a diatomic molecule: h / (8 pi^2 c mu r^2). */
function fromBondLength(record: SpeciesRecord, witness: Witness, bondLength: number): number {
  const first = requiredInput(record, witness, "atomicMass1") * 1000;
  const second = requiredInput(record, witness, "atomicMass2") * 1000;
  const reducedMass = (first * second) / (first + second);
  return rotationFactor / (reducedMass * bondLength * bondLength);
}

import type { Witness } from "../species/record.js";
import { optionalInput } from "./witness-inputs.js";

/** Bounds of molecular constants in coherent SI units, cm-1 and angstrom. */
interface Bounds {
  readonly name: RegExp;
  readonly least: number;
  readonly most: number;
  readonly whole?: true;
}

/** Wider than any molecule's; narrow enough that the sums over levels end. */
const bounds: readonly Bounds[] = [
  { name: /^(molarMass|atomicMass[12])$/, least: 1e-7, most: 10 },
  { name: /^(symmetryNumber|rotor\d+SymmetryNumber|(level|vibration)\d+Degeneracy)$/, least: 1, most: 1000 },
  { name: /^(even|odd)RotationWeight$/, least: 0, most: 1000 },
  { name: /^level\d+$/, least: 0, most: 1e6 },
  { name: /^rotation[123]$/, least: 0.005, most: 1000 },
  { name: /^bondLength$/, least: 0.1, most: 100 },
  { name: /^vibration\d+$/, least: 10, most: 10000 },
  { name: /^anharmonicity$/, least: -1000, most: 1000 },
  { name: /^rotationVibration$/, least: -100, most: 100 },
  { name: /^centrifugalDistortion$/, least: -1, most: 1 },
  { name: /^spinOrbit$/, least: -20000, most: 20000 },
  { name: /^rotor\d+Barrier$/, least: 0, most: 20000 },
  { name: /^rotor\d+Constant$/, least: 0.1, most: 1000 },
  { name: /^rotor\d+Fold$/, least: 1, most: 12, whole: true },
];

/** Names of the molecular constants among a witness's figures whose values no molecule has. */
export function unsoundConstants(witness: Witness): string[] {
  return Object.keys(witness.against ?? {}).filter((key) => {
    const rule = bounds.find(({ name }) => name.test(key));
    if (rule === undefined) return false;
    const value = optionalInput(witness, key) as number;
    return !(value >= rule.least && value <= rule.most && (rule.whole === undefined || Number.isInteger(value)));
  });
}

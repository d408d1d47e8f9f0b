import { expect, test } from "vitest";
import { computeWitness } from "../../src/checks/witness-checks.js";
import { C2H6_g, N2_g, NO_g, referenceData } from "../../src/data/index.js";
import type { SpeciesRecord } from "../../src/species/record.js";
import { faultsOf } from "../errors/faults-of.js";

/** Anything, as plain JavaScript may pass it. */
// biome-ignore lint/suspicious/noExplicitAny: the subject of this table is what types forbid
type Anything = any;

/** The witness of statistical mechanics with constants exchanged, or taken out where the value is undefined. */
function run(record: SpeciesRecord, changes: Readonly<Record<string, number | undefined>>): unknown {
  const witness: Anything = structuredClone(
    record.witnesses.find(({ check }) => check === "statistical-mechanics-entropy"),
  );
  for (const [name, value] of Object.entries(changes)) {
    if (value === undefined) delete witness.against[name];
    else witness.against[name] = { unit: "1", ...witness.against[name], value, source: "huber1979", origin: "memory" };
  }
  return computeWitness(record, witness, referenceData);
}

test.each<[string, SpeciesRecord, Readonly<Record<string, number | undefined>>, string]>([
  ["no mass", C2H6_g, { molarMass: undefined }, "molarMass"],
  ["a mass of 0", C2H6_g, { molarMass: 0 }, "molarMass"],
  ["a negative mass", C2H6_g, { molarMass: -30 }, "molarMass"],
  ["a symmetry number of 0", C2H6_g, { symmetryNumber: 0 }, "symmetryNumber"],
  ["a rotational constant of 0", C2H6_g, { rotation1: 0 }, "rotation1"],
  ["a negative rotational constant", C2H6_g, { rotation3: -1 }, "rotation3"],
  ["two rotational constants of three", C2H6_g, { rotation2: undefined }, "rotational constants"],
  ["a vibration of 0", C2H6_g, { vibration1: 0 }, "vibration1"],
  ["a degeneracy of 0", C2H6_g, { vibration6Degeneracy: 0 }, "vibration6Degeneracy"],
  ["two at once", C2H6_g, { vibration1: -5, rotation1: 0 }, "rotation1, vibration1"],
  ["a rotor without constant", C2H6_g, { rotor1Constant: undefined }, "rotor1Constant"],
  ["a rotor without fold", C2H6_g, { rotor1Fold: undefined }, "rotor1Fold"],
  ["a rotor's constant of 0", C2H6_g, { rotor1Constant: 0 }, "rotor1Constant"],
  ["a negative barrier", C2H6_g, { rotor1Barrier: -1 }, "rotor1Barrier"],
  ["half a fold", C2H6_g, { rotor1Fold: 1.5 }, "rotor1Fold"],
  ["a rotor's symmetry number of 0", C2H6_g, { rotor1SymmetryNumber: 0 }, "rotor1SymmetryNumber"],
  ["a diatomic molecule without its constant", N2_g, { rotation1: undefined }, "one rotational constant"],
  ["a level below the ground", N2_g, { level1: -5 }, "level1"],
  ["a negative bond length", NO_g, { bondLength: -1 }, "bondLength"],
  ["an atom of no mass in a bond", NO_g, { atomicMass1: 0 }, "atomicMass1"],
])("%s", (_, record, changes, said) => {
  const [fault] = faultsOf(() => run(record, changes));
  expect(fault).toMatchObject({
    code: "checks/no-inputs",
    path: [record.label, "witnesses", "statistical-mechanics-entropy"],
    message: expect.stringContaining(said),
  });
});

test("the same with its own constants is computed", () => {
  for (const record of [C2H6_g, N2_g, NO_g]) expect(Math.abs(run(record, {}) as number)).toBeLessThan(0.6);
});

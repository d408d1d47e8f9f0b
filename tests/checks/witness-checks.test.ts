import { describe, expect, test } from "vitest";
import { molecularFunctions } from "../../src/checks/molecular-functions.js";
import { computeWitness, recomputeWitnesses } from "../../src/checks/witness-checks.js";
import { CaCO3_cr_calcite, CO2_g, H2O_l, N2_g, NH3_g, NO_g, referenceData } from "../../src/data/index.js";
import { isGibbsLedgerError } from "../../src/errors/gibbs-ledger-error.js";
import type { SpeciesRecord, Witness } from "../../src/species/record.js";

/** The record with one coefficient of its fit multiplied. */
function withCoefficient(record: SpeciesRecord, interval: number, index: number, factor: number): SpeciesRecord {
  const copy = structuredClone(record);
  if (copy.gibbsFunction.kind !== "series") throw new Error("no series");
  (copy.gibbsFunction.intervals[interval]!.coefficients as number[])[index]! *= factor;
  return copy;
}

const failing = (record: SpeciesRecord): string[] =>
  recomputeWitnesses(record, referenceData)
    .filter(({ confirms }) => !confirms)
    .map(({ witness }) => witness.check);

function witnessOf(record: SpeciesRecord, check: Witness["check"]): Witness {
  return record.witnesses.find((witness) => witness.check === check) as Witness;
}

describe("mutations are caught", () => {
  for (const record of [N2_g, CO2_g, NH3_g, NO_g]) {
    test.each([0, 1, 2, 3, 4, 5, 6, 7, 8])(`${record.label}: one part in a thousand of coefficient %d`, (index) => {
      for (const interval of [0, 1]) {
        expect(failing(withCoefficient(record, interval, index, 1.001))).toContain("closure-at-breaks");
      }
    });
  }

  test("constants shifted alike in both intervals leave the closure alone and fail at 298.15 K", () => {
    let shifted = structuredClone(CO2_g);
    for (const interval of [0, 1]) {
      if (shifted.gibbsFunction.kind !== "series") throw new Error("no series");
      const coefficients = shifted.gibbsFunction.intervals[interval]!.coefficients as number[];
      coefficients[7]! += 5;
      coefficients[8]! += 0.01;
    }
    shifted = structuredClone(shifted);
    const checks = failing(shifted);
    expect(checks).not.toContain("closure-at-breaks");
    expect(checks).toContain("entropy-at-298.15-K");
    expect(checks).toContain("enthalpy-at-298.15-K");
  });

  test("a formation enthalpy of calcite that is 4 kJ/mol off fails its decomposition pressure", () => {
    const copy = structuredClone(CaCO3_cr_calcite);
    (copy.formationEnthalpy as { value: number }).value += 4;
    expect(failing(copy)).toContain("equilibrium-pressure");
  });

  test("a critical volume with two digits exchanged fails the critical compressibility", () => {
    const copy = structuredClone(N2_g);
    (copy.critical!.volume as { value: number }).value = 98.2;
    expect(failing(copy)).toContain("critical-compressibility");
  });

  test("a critical pressure 10 per cent off fails the boiling point", () => {
    const copy = structuredClone(NO_g);
    (copy.critical!.pressure as { value: number }).value *= 1.1;
    expect(failing(copy)).toContain("acentric-factor-from-boiling-point");
  });

  test("a molar volume 1 per cent off fails unit cell and density", () => {
    for (const record of [CaCO3_cr_calcite, H2O_l]) {
      const copy = structuredClone(record);
      (copy.volume!.molar as { value: number }).value *= 1.01;
      expect(failing(copy).some((check) => check.includes("volume"))).toBe(true);
    }
  });
});

describe("molecular functions", () => {
  const gas = { symmetryNumber: 1, levels: [{ wavenumber: 0, degeneracy: 1 }], rotation: [], vibrations: [] };

  // J. D. Cox, D. D. Wagman, V. A. Medvedev, CODATA Key Values (1989), from memory; printed to 0.001 J/mol/K.
  test.each([
    ["He", 4.002602, 126.153],
    ["Ne", 20.1797, 146.328],
    ["Ar", 39.948, 154.846],
    ["Kr", 83.798, 164.085],
    ["Xe", 131.293, 169.685],
  ])("entropy of %s at 298.15 K", (_, molarMass, entropy) => {
    expect(molecularFunctions({ ...gas, molarMass }, 298.15).entropy).toBeCloseTo(entropy, 2);
  });

  test("a Boltzmann electron gas has 20.979 J/mol/K at 298.15 K and 1 bar", () => {
    const electron = { ...gas, molarMass: 5.485799e-4, levels: [{ wavenumber: 0, degeneracy: 2 }] };
    expect(molecularFunctions(electron, 298.15).entropy).toBeCloseTo(20.979, 3);
  });

  test("H(T) and S(T) belong together: dH = T dS at constant pressure", () => {
    const constants = {
      ...gas,
      molarMass: 18.015,
      symmetryNumber: 2,
      rotation: [27.877, 14.512, 9.285],
      vibrations: [1594.75, 3657.05, 3755.93].map((wavenumber) => ({ wavenumber, degeneracy: 1 })),
    };
    const diatomic = {
      ...gas,
      molarMass: 17.007,
      rotation: [18.9108],
      vibrations: [{ wavenumber: 3737.761, degeneracy: 1 }],
      diatomic: {
        anharmonicity: 84.8813,
        rotationVibration: 0.7242,
        centrifugalDistortion: 0.001938,
        rotationWeights: [1, 1] as const,
        spinOrbit: -139.21,
      },
    };
    for (const molecule of [constants, diatomic]) {
      for (const temperatureK of [300, 700, 1500]) {
        const step = 0.01;
        const above = molecularFunctions(molecule, temperatureK + step);
        const below = molecularFunctions(molecule, temperatureK - step);
        const ratio = (above.enthalpy - below.enthalpy) / (temperatureK * (above.entropy - below.entropy));
        expect(ratio).toBeCloseTo(1, 6);
      }
    }
  });
});

describe("inputs", () => {
  test.each([
    "closure-at-breaks",
    "critical-compressibility",
    "tabulated-entropy",
    "statistical-mechanics-entropy",
    "reaction-enthalpy",
    "unit-cell-volume",
  ] as const)("%s reports what it lacks", (check) => {
    const witness: Witness = {
      group: "caloric",
      kind: "transcription",
      check,
      deviation: 0,
      tolerance: 1,
      source: { text: "none" },
    };
    const record = structuredClone(CaCO3_cr_calcite);
    expect(() => computeWitness(record, witness, referenceData)).toThrow();
    try {
      computeWitness(record, witness, referenceData);
    } catch (error) {
      expect(isGibbsLedgerError(error, "checks/no-inputs")).toBe(true);
    }
  });

  test("a check that nobody knows is a fault, not a crash", () => {
    const witness = { ...witnessOf(N2_g, "closure-at-breaks"), check: "constructor" } as unknown as Witness;
    try {
      computeWitness(N2_g, witness, referenceData);
      expect.unreachable();
    } catch (error) {
      expect(isGibbsLedgerError(error, "checks/no-inputs")).toBe(true);
    }
  });

  test("a reaction partner that the collection lacks is a fault", () => {
    const witness = witnessOf(CaCO3_cr_calcite, "equilibrium-pressure");
    try {
      computeWitness(CaCO3_cr_calcite, witness, { species: [CO2_g] });
      expect.unreachable();
    } catch (error) {
      expect(isGibbsLedgerError(error, "checks/no-inputs")).toBe(true);
      expect((error as Error).message).toContain("CaO(cr)");
    }
  });
});

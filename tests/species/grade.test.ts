import { expect, test } from "vitest";
import { Ar_g, C_g, CaCO3_cr_calcite, H2O_l, N2_g, NH3_g } from "../../src/data/index.js";
import { speciesGrade } from "../../src/species/grade.js";
import type { SpeciesRecord, Witness } from "../../src/species/record.js";

const witness: Witness = {
  group: "caloric",
  kind: "transcription",
  check: "closure-at-breaks",
  deviation: 0,
  tolerance: 1,
  over: [200, 6000],
  source: "mcbride2002",
};
const withWitnesses = (...witnesses: Witness[]): SpeciesRecord => ({ ...N2_g, witnesses });

test("grades of records of the reference data", () => {
  expect(speciesGrade(Ar_g)).toEqual({ caloric: "A", critical: "A" });
  expect(speciesGrade(NH3_g)).toEqual({ caloric: "B", formation: "A", critical: "A" });
  expect(speciesGrade(C_g)).toEqual({ caloric: "A", formation: "B" });
  expect(speciesGrade(H2O_l)).toEqual({ caloric: "B", formation: "A", volume: "A" });
  expect(speciesGrade(CaCO3_cr_calcite)).toEqual({ caloric: "B", formation: "A", volume: "A" });
});

test("a group without witnesses has no grade", () => {
  expect(speciesGrade(withWitnesses())).toEqual({});
});

test("one transcription witness is not enough for B", () => {
  expect(speciesGrade(withWitnesses(witness))).toEqual({ caloric: "C" });
  expect(speciesGrade(withWitnesses(witness, witness))).toEqual({ caloric: "B" });
});

test("a physical witness counts where it speaks over the range", () => {
  expect(speciesGrade(withWitnesses({ ...witness, kind: "physical", over: [298.15, 1000] })).caloric).toBe("A");
  expect(speciesGrade(withWitnesses({ ...witness, kind: "physical", over: [298.15, 500] })).caloric).toBe("C");
  expect(speciesGrade(withWitnesses({ ...witness, kind: "physical", over: [600, 1000] })).caloric).toBe("C");
});

test("a witness whose deviation exceeds its tolerance does not count", () => {
  expect(speciesGrade(withWitnesses({ ...witness, deviation: 2 }, witness)).caloric).toBe("C");
  expect(speciesGrade(withWitnesses({ ...witness, deviation: -2 }))).toEqual({});
});

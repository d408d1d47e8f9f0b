import { describe, expect, test } from "vitest";
import { computeWitness, recomputeWitnesses } from "../../src/checks/witness-checks.js";
import { referenceData } from "../../src/data/index.js";
import { quantity } from "../../src/quantity/quantity.js";
import { speciesGrade } from "../../src/species/grade.js";
import type { SpeciesRecord, Witness } from "../../src/species/record.js";
import { standardProperties } from "../../src/species/standard-properties.js";

const gases = referenceData.species.filter(({ state }) => state === "g");

function failing(record: SpeciesRecord): string[] {
  return recomputeWitnesses(record, referenceData)
    .filter(({ confirms }) => !confirms)
    .map(({ witness }) => witness.check);
}

/** The record with what a function does to the coefficients of each interval. */
function changed(record: SpeciesRecord, change: (coefficients: number[], interval: number) => void): SpeciesRecord {
  const copy = structuredClone(record);
  if (copy.gibbsFunction.kind !== "series") throw new Error("no series");
  copy.gibbsFunction.intervals.forEach((interval, index) => {
    change(interval.coefficients as number[], index);
  });
  return copy;
}

/** Fits in multiples of R with two intervals, whose breaks close to the digits printed. */
const closing = gases.filter(
  ({ gibbsFunction }) =>
    gibbsFunction.kind === "series" && gibbsFunction.form !== "shomate" && gibbsFunction.intervals.length === 2,
);

/** Atoms have coefficients below the digits of the others, for their heat capacity is 5/2 R over wide ranges. */
const molecules = closing.filter(({ formula }) => !/^[A-Z][a-z]?$/.test(formula));

describe("a coefficient wrong by a thousandth is found by the closure of the fit", () => {
  test.each(molecules.map((record) => [record.label, record] as const))("%s", (_, record) => {
    const closure = record.witnesses.find(({ check }) => check === "closure-at-breaks") as Witness;
    const { gibbsFunction } = record;
    if (gibbsFunction.kind !== "series") throw new Error("no series");
    gibbsFunction.intervals.forEach(({ coefficients }, interval) => {
      coefficients.forEach((_value, index) => {
        const wrong = changed(record, (numbers, at) => {
          if (at === interval) numbers[index]! *= 1.001;
        });
        const step = Math.abs(computeWitness(wrong, closure, referenceData));
        expect(step, `coefficient ${index} of interval ${interval}`).toBeGreaterThan(closure.tolerance);
      });
    });
  });
});

describe("a formation enthalpy 10 kJ/mol off is found by the physical witness", () => {
  const graded = gases.filter((record) => speciesGrade(record).formation === "A" && closing.includes(record));
  test.each(graded.map((record) => [record.label, record] as const))("%s", (_, record) => {
    const wrong = changed(record, (numbers) => {
      numbers[numbers.length - 2]! += 10000 / 8.31451;
    });
    const physical = record.witnesses.filter(({ group, kind }) => group === "formation" && kind === "physical");
    const found = physical.some((witness) => failing({ ...wrong, witnesses: [witness] }).length > 0);
    expect(found).toBe(true);
  });
});

describe("what the set holds", () => {
  test("the heat capacity is 5/2 R or more, and falls nowhere below", () => {
    for (const record of gases) {
      if (record.gibbsFunction.kind !== "series") continue;
      const { intervals } = record.gibbsFunction;
      for (const temperatureK of [intervals[0]!.from, 298.15, 1000, intervals.at(-1)!.to]) {
        if (temperatureK > intervals.at(-1)!.to) continue;
        const { heatCapacity } = standardProperties(record, { temperature: quantity(temperatureK, "K") });
        // Fits of atoms wind about 5/2 R by their own error.
        expect(heatCapacity!.value, `${record.label} at ${temperatureK} K`).toBeGreaterThan(20.7);
      }
    }
  });

  test("entropy rises with temperature everywhere in the range", () => {
    for (const record of gases) {
      if (record.gibbsFunction.kind !== "series") continue;
      const { intervals } = record.gibbsFunction;
      const [from, to] = [intervals[0]!.from, intervals.at(-1)!.to];
      let below = Number.NEGATIVE_INFINITY;
      for (let step = 0; step <= 40; step += 1) {
        const temperatureK = from + ((to - from) * step) / 40;
        const { entropy } = standardProperties(record, { temperature: quantity(temperatureK, "K") });
        expect(entropy.value, `${record.label} at ${temperatureK} K`).toBeGreaterThan(below);
        below = entropy.value;
      }
    }
  });

  test("a bond energy is the same from either side of a cycle", () => {
    const enthalpy = (label: string): number =>
      standardProperties(referenceData.species.find((record) => record.label === label)!, {
        temperature: quantity(298.15, "K"),
      }).enthalpy.value;
    const [hydrogen, ethyne, ethynyl] = ["H(g)", "C2H2(g)", "C2H(g)"].map(enthalpy) as [number, number, number];
    const bond = ethynyl + hydrogen - ethyne;
    // J. Berkowitz, G. B. Ellison, D. Gutman (1994), from memory: 132.8 +- 0.7 kcal/mol
    expect(Math.abs(bond / 4184 - 132.8)).toBeLessThan(0.7);
  });
});

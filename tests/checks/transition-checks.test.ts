import { describe, expect, test } from "vitest";
import { computeWitness, recomputeWitnesses } from "../../src/checks/witness-checks.js";
import { Al_cr, Al_l, Fe_l, H2O_cr, referenceData, S_cr_monoclinic, S_l } from "../../src/data/index.js";
import { figureInSi } from "../../src/quantity/figure-value.js";
import type { CollectionData, SpeciesRecord, Witness } from "../../src/species/record.js";
import { figure } from "../heat-capacity/random-series.js";
import { collectionOf, fitted, recordOf } from "../species/records.js";

/** A constant heat capacity from one temperature to another, through H in J/mol and S in J/mol/K at `anchorK`. */
function constantHeatCapacity(
  label: string,
  heatCapacity: number,
  [fromK, toK]: readonly [number, number],
  [anchorK, enthalpy, entropy]: readonly [number, number, number],
): SpeciesRecord {
  return recordOf(label, {
    gibbsFunction: fitted({
      kind: "series",
      form: "polynomial",
      powers: [0],
      intervals: [{ from: fromK, to: toK, coefficients: [heatCapacity], endsAt: "fit" }],
      anchor: {
        temperature: figure(anchorK, "K"),
        enthalpy: figure(enthalpy, "J/mol"),
        entropy: figure(entropy, "J/mol/K"),
      },
    }),
  });
}

/** Fusion of a substance of ours: 6 kJ/mol and 15 J/mol/K at 400 K. */
const solid = constantHeatCapacity("Ar(cr)", 20, [298.15, 400], [400, 1000, 50]);
const liquid = constantHeatCapacity("Ar(l)", 30, [400, 600], [400, 7000, 65]);
const invented = collectionOf(solid, liquid);

function witnessOf(check: Witness["check"], against: Readonly<Record<string, readonly [number, string]>>): Witness {
  const figures = Object.entries(against).map(([name, [value, unit]]) => [
    name,
    { value, unit, source: { text: "invented" }, origin: "memory" },
  ]);
  return {
    group: "formation",
    kind: "physical",
    check,
    against: Object.fromEntries(figures),
    reaction: { "Ar(cr)": -1, "Ar(l)": 1 },
    deviation: 0,
    tolerance: 1,
    source: { text: "invented" },
  };
}

const at = (temperature: number): Readonly<Record<string, readonly [number, string]>> => ({
  transitionTemperature: [temperature, "K"],
});

describe("an invented fusion with round figures", () => {
  test("G is equal at the temperature of fusion", () => {
    expect(computeWitness(liquid, witnessOf("transition-gibbs-energy", at(400)), invented)).toBeCloseTo(0, 9);
  });

  test("the enthalpy of fusion less a published one, in the unit of the figure", () => {
    const witness = witnessOf("transition-enthalpy", { ...at(400), transitionEnthalpy: [5.9, "kJ/mol"] });
    expect(computeWitness(liquid, witness, invented)).toBeCloseTo(100, 9);
  });

  test("the temperature of equality less a published one, on either side of the range and in Celsius", () => {
    expect(computeWitness(liquid, witnessOf("transition-temperature", at(400)), invented)).toBeCloseTo(0, 9);
    expect(computeWitness(liquid, witnessOf("transition-temperature", at(403)), invented)).toBeCloseTo(-3, 9);
    expect(computeWitness(liquid, witnessOf("transition-temperature", at(398)), invented)).toBeCloseTo(2, 9);
    const celsius = witnessOf("transition-temperature", { transitionTemperature: [126.85, "Cel"] });
    expect(computeWitness(liquid, celsius, invented)).toBeCloseTo(0, 9);
  });

  test("150 J/mol more of the liquid move the equality by 150/15 K", () => {
    const copy = constantHeatCapacity("Ar(l)", 30, [400, 600], [400, 7150, 65]);
    const collection = collectionOf(solid, copy);
    expect(computeWitness(copy, witnessOf("transition-temperature", at(400)), collection)).toBeCloseTo(10, 9);
    expect(computeWitness(copy, witnessOf("transition-gibbs-energy", at(400)), collection)).toBeCloseTo(150, 9);
  });
});

describe("what a check lacks is a fault", () => {
  const lacking: readonly (readonly [string, () => unknown, string])[] = [
    [
      "no temperature",
      () => computeWitness(liquid, witnessOf("transition-gibbs-energy", {}), invented),
      "transitionTemperature",
    ],
    [
      "no enthalpy",
      () => computeWitness(liquid, witnessOf("transition-enthalpy", at(400)), invented),
      "transitionEnthalpy",
    ],
    [
      "ranges apart",
      () => {
        const far = constantHeatCapacity("Ar(l)", 30, [500, 600], [500, 9000, 120]);
        return computeWitness(far, witnessOf("transition-temperature", at(400)), collectionOf(solid, far));
      },
      "a temperature in common",
    ],
    [
      "no change of entropy",
      () => {
        const witness = { ...witnessOf("transition-temperature", at(400)), reaction: { "Ar(cr)": 0, "Ar(l)": 0 } };
        return computeWitness(liquid, witness, invented);
      },
      "phases of different entropy",
    ],
    [
      "no such phase",
      () => computeWitness(liquid, witnessOf("transition-temperature", at(400)), collectionOf(liquid)),
      "a record of Ar(cr)",
    ],
  ];

  test.each(lacking)("%s", (_, call, words) => {
    expect(call).toThrow(
      expect.objectContaining({ code: "checks/no-inputs", message: expect.stringContaining(words) }),
    );
  });
});

describe("mutations of the reference data are caught", () => {
  const failing = (record: SpeciesRecord, ...others: SpeciesRecord[]): string[] => {
    const changed = [record, ...others];
    const collection: CollectionData = {
      ...referenceData,
      species: referenceData.species.map((one) => changed.find(({ label }) => label === one.label) ?? one),
    };
    return recomputeWitnesses(record, collection)
      .filter(({ confirms }) => !confirms)
      .map(({ witness }) => witness.check);
  };

  const changed = (record: SpeciesRecord, interval: number, index: number, factor: number): SpeciesRecord => {
    const copy = structuredClone(record);
    if (copy.gibbsFunction.kind !== "series") throw new Error("no series");
    (copy.gibbsFunction.intervals[interval]!.coefficients as number[])[index]! *= factor;
    return copy;
  };

  test("one part in ten thousand of a, b or c of liquid aluminium", () => {
    for (const index of [1, 2]) {
      expect(failing(changed(Al_l, 0, index, 1.0001))).toContain("transition-temperature");
    }
    // a is small beside the enthalpy of fusion: one part in a thousand of it is 0.8 J/mol
    expect(failing(changed(Al_l, 0, 0, 1.001))).toContain("transition-temperature");
  });

  test("one part in ten thousand of the solid's coefficients", () => {
    for (const index of [0, 1, 2]) {
      expect(failing(changed(Al_cr, 1, index, 1.0001)).length).toBeGreaterThan(0);
    }
  });

  test("the constants of H and S of liquid iron, of ice and of liquid sulfur", () => {
    expect(failing(changed(Fe_l, 0, 7, 1.01))).toContain("transition-enthalpy");
    expect(failing(changed(Fe_l, 0, 8, 1.0001))).toContain("transition-gibbs-energy");
    expect(failing(changed(H2O_cr, 0, 7, 1.0001))).toContain("transition-enthalpy");
    expect(failing(changed(S_l, 0, 1, 1.0001))).toContain("transition-temperature");
  });

  test("twice the coefficient of T^2 of monoclinic sulfur, the other recollection, fails by far", () => {
    const checks = failing(changed(S_cr_monoclinic, 0, 3, 2));
    expect(checks).toContain("transition-enthalpy");
    expect(checks).toContain("transition-temperature");
  });
});

test("the transitions of the records stand where G is equal, and every phase they name exists", () => {
  const labels = new Map(referenceData.species.map((record) => [record.label, record]));
  for (const record of referenceData.species) {
    for (const { into, temperature, enthalpy } of record.transitions ?? []) {
      expect(labels.has(into), `${record.label} into ${into}`).toBe(true);
      expect(figureInSi(temperature)).toBeGreaterThan(0);
      expect(figureInSi(enthalpy)).toBeGreaterThan(0);
    }
  }
});

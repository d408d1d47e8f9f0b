import { describe, expect, test } from "vitest";
import { quantity } from "../../src/quantity/quantity.js";
import {
  type CollectionData,
  findSequence,
  type StableSequence,
  speciesCollection,
  standardProperties,
} from "../../src/species/index.js";
import { placesOf } from "../errors/faults-of.js";
import { figure } from "../heat-capacity/random-series.js";
import { alpha, delta, gamma, ironData, liquid, sequence, solidIron } from "./iron.js";
import { polynomialRecord, recordOf } from "./records.js";

const iron = findSequence(ironData, "Fe(cr)");
const at = (temperatureK: number) => ({ temperature: quantity(temperatureK, "K") });
const withSequences = (...sequences: CollectionData["sequences"] & object): CollectionData => ({
  ...ironData,
  sequences,
});

describe("a stable sequence", () => {
  test.each([
    [298.15, alpha],
    [1184.999, alpha],
    [1185, alpha],
    [1185.001, gamma],
    [1667, gamma],
    [1667.001, delta],
    [1811, delta],
  ])("at %d K is the phase that is stable there", (temperatureK, phase) => {
    expect(standardProperties(iron, at(temperatureK))).toEqual(standardProperties(phase, at(temperatureK)));
  });

  test("over all states of an element meets the liquid in the point that the ranges share", () => {
    const whole = findSequence(ironData, "Fe");
    expect(whole.state).toBeUndefined();
    expect(standardProperties(whole, at(1811))).toEqual(standardProperties(delta, at(1811)));
    expect(standardProperties(whole, at(2500))).toEqual(standardProperties(liquid, at(2500)));
  });

  test("counts the atoms that its label says", () => {
    const solid = polynomialRecord("S(cr,rhombic)", 0, 32, [22], [0], {
      transitions: [{ temperature: figure(800, "K"), into: "S2(g)", enthalpy: figure(50, "kJ/mol") }],
    });
    const gas = polynomialRecord("S2(g)", 128_600, 228.2, [33], [0]);
    const data = { species: [solid, gas], sequences: [sequence("S2", "S(cr,rhombic)", "S2(g)")] };
    const reference = findSequence(data, "S2");
    expect(standardProperties(reference, at(500)).entropy.value).toBe(
      2 * standardProperties(solid, at(500)).entropy.value,
    );
    expect(standardProperties(reference, at(900)).entropy).toEqual(standardProperties(gas, at(900)).entropy);
  });

  test("is the same after JSON", () => {
    const copy: StableSequence = JSON.parse(JSON.stringify(iron));
    expect(standardProperties(copy, at(1500))).toEqual(standardProperties(iron, at(1500)));
  });

  test("outside its range is refused, or continued by name", () => {
    expect(placesOf(() => standardProperties(iron, at(1900)))).toEqual(["species/outside-range at temperature"]);
    const beyond = standardProperties(iron, { ...at(1900), outsideRange: "constant-heat-capacity" });
    expect(beyond.heatCapacity).toEqual(standardProperties(delta, at(1811)).heatCapacity);
    expect(beyond.outsideRange).toEqual(["Fe(cr)"]);
  });
});

describe("faults of sequences", () => {
  const places = (data: CollectionData): readonly string[] => placesOf(() => speciesCollection(data));

  test("a phase that the collection lacks", () => {
    expect(places(withSequences(sequence("Fe(cr)", "Fe(cr,alpha)", "Fe(cr,epsilon)")))).toEqual([
      "species/not-found at collection.sequences.0.phases.1",
    ]);
  });

  test("neighbours that nothing joins", () => {
    expect(places(withSequences(sequence("Fe(cr)", "Fe(cr,alpha)", "Fe(cr,delta)")))).toEqual([
      "species/no-join at collection.sequences.0.phases.1",
    ]);
  });

  test("a join outside the range of a phase", () => {
    const early = { ...alpha, transitions: [{ ...alpha.transitions![0]!, temperature: figure(900, "K") }] };
    expect(places({ ...ironData, species: [early, gamma, delta], sequences: [solidIron] })).toEqual([
      "species/no-join at collection.sequences.0.phases.1",
    ]);
  });

  test("phases of another substance or state", () => {
    expect(places(withSequences(sequence("FeO(cr)", "Fe(cr,alpha)")))).toEqual([
      "species/inconsistent at collection.sequences.0.phases.0",
    ]);
    expect(places(withSequences(sequence("Fe(l)", "Fe(cr,alpha)")))).toEqual([
      "species/inconsistent at collection.sequences.0.phases.0",
    ]);
    const half = recordOf("O2(g)");
    expect(places({ species: [half], sequences: [sequence("O3", "O2(g)")] })).toEqual([
      "species/inconsistent at collection.sequences.0.phases.0",
    ]);
  });

  test("no phase, no label, several at once", () => {
    expect(places(withSequences(sequence("Fe(cr)"), sequence("Zz(cr)", "Fe(cr,alpha)")))).toEqual([
      "input/missing at collection.sequences.0.phases",
      "formula/unknown-element at collection.sequences.1.label",
    ]);
  });

  test("a label that the collection has not", () => {
    expect(placesOf(() => findSequence(ironData, "Ni(cr)"))).toEqual(["species/not-found at "]);
    expect(placesOf(() => findSequence({ species: [] }, "Ni(cr)"))).toEqual(["species/not-found at "]);
  });

  test("a sequence from elsewhere that contradicts its label", () => {
    const wrong = { ...JSON.parse(JSON.stringify(iron)), chargeNumber: 2, state: "l" };
    expect(placesOf(() => standardProperties(wrong, at(500)))).toEqual([
      "species/inconsistent at species.chargeNumber",
      "species/inconsistent at species.state",
    ]);
  });
});

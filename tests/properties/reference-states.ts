import fc from "fast-check";
import { Ar_g, He_g, referenceData } from "../../src/data/index.js";
import { idealGas } from "../../src/fugacity/ideal-gas.js";
import { virial } from "../../src/fugacity/virial.js";
import { type RangePolicy, rangePolicies } from "../../src/heat-capacity/range-policy.js";
import { type Reaction, type ReactionConditions, reaction } from "../../src/reaction/index.js";
import type { SpeciesRecord } from "../../src/species/record.js";
import { stateOf } from "../../src/species/substance.js";

/** Equations with gases, solids and a liquid, all of whose gases have critical constants where `real` is set. */
const equations = [
  { text: "N2 + 3 H2 = 2 NH3", real: true },
  { text: "CO + H2O(g) = CO2 + H2", real: true },
  { text: "CH4 + H2O(g) = CO + 3 H2", real: true },
  { text: "C(s) + CO2 = 2 CO", real: true },
  { text: "CaCO3(s) = CaO(s) + CO2", real: true },
  { text: "2 SO2 + O2 = 2 SO3", real: false },
  { text: "NO + ½ O2 = NO2", real: false },
  { text: "½ N2 + O = NO", real: false },
].map(({ text, real }) => ({ subject: reaction(text, referenceData), real }));

/** The reactions that the states are of. */
export const referenceSubjects: readonly Reaction[] = equations.map(({ subject }) => subject);

const models = [undefined, idealGas(), virial({ correlation: "abbott", outsideValidity: "continue" })];

/** A reaction with the conditions it is looked at in. */
export interface ReferenceState {
  readonly subject: Reaction;
  readonly conditions: ReactionConditions;
}

/** Random states: temperature, pressure, composition with inerts, model, and activities in place of the gas phase. */
export const referenceStates: fc.Arbitrary<ReferenceState> = fc
  .record({
    equation: fc.constantFrom(...equations),
    temperatureK: fc.double({ min: 300, max: 1200, noNaN: true }),
    lnPressure: fc.double({ min: -5, max: 3, noNaN: true }),
    weights: fc.array(fc.integer({ min: 1, max: 1_000_000 }), { minLength: 6, maxLength: 6 }),
    inerts: fc.constantFrom<readonly SpeciesRecord[]>([], [Ar_g], [He_g, Ar_g]),
    model: fc.constantFrom(...models),
    isGiven: fc.boolean(),
    outsideRange: fc.constantFrom<RangePolicy | undefined>(undefined, ...rangePolicies),
  })
  .map(({ equation, temperatureK, lnPressure, weights, inerts, model, isGiven, outsideRange }) => {
    const { subject } = equation;
    const gases = subject.terms.filter(({ species }) => stateOf(species) === "g").map(({ label }) => label);
    const labels = [...gases, ...inerts.map(({ label }) => label)];
    const total = weights.slice(0, labels.length).reduce((sum, weight) => sum + weight, 0);
    const moleFractions = Object.fromEntries(labels.map((label, index) => [label, weights[index]! / total]));
    const activities = Object.fromEntries(subject.terms.map(({ label }, index) => [label, weights[index]! / 1000]));
    const usesModel = model !== undefined && (equation.real || model.name === "idealGas") && !inerts.includes(He_g);
    const conditions: ReactionConditions = {
      temperature: { value: temperatureK, unit: "K" },
      pressure: { value: Math.exp(lnPressure), unit: "bar" },
      ...(outsideRange === undefined ? {} : { outsideRange }),
      ...(isGiven
        ? { activities }
        : { gas: { moleFractions, ...(usesModel ? { equationOfState: model } : {}) }, inerts }),
    };
    return { subject, conditions };
  });

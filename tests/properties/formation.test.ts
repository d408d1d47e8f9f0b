import fc from "fast-check";
import { expect, test } from "vitest";
import { referenceData } from "../../src/data/index.js";
import { quantity } from "../../src/quantity/quantity.js";
import { reaction, standardReactionProperties } from "../../src/reaction/index.js";
import { findSequence, formationProperties, type SpeciesRecord, type StableSequence } from "../../src/species/index.js";

/** Reactions with gases, solids that change phase, liquids and metals, and the range that their species share. */
const equations: readonly (readonly [equation: string, fromK: number, toK: number])[] = [
  ["CO + H2O(g) = CO2 + H2", 200, 6000],
  ["C2H4(g) + H2 = C2H6(g)", 200, 6000],
  ["2 SO2(g) + O2 = 2 SO3(g)", 298.15, 1000],
  ["Fe3O4(cr,magnetite) + 4 CO = 3 Fe(cr) + 4 CO2", 298.15, 1800],
  ["CaCO3(cr,calcite) = CaO(cr) + CO2", 298.15, 1200],
  ["2 H2S(g) + SO2 = 2 H2O(g) + 3 S(cr)", 298.15, 388],
];

const cases = equations.map(([equation, fromK, toK]) => ({ subject: reaction(equation, referenceData), fromK, toK }));

test("a reaction is the sum of the formations of its species, in G, H and S: the elements cancel", () => {
  fc.assert(
    fc.property(
      fc.constantFrom(...cases),
      fc.double({ min: 0, max: 1, noNaN: true }),
      ({ subject, fromK, toK }, share) => {
        const conditions = { temperature: quantity(fromK + share * (toK - fromK), "K") };
        const whole = standardReactionProperties(subject, conditions);
        const formations = subject.terms.map(({ coefficient, species }) => ({
          coefficient,
          formation: formationProperties(species as SpeciesRecord | StableSequence, conditions, referenceData),
        }));
        for (const key of ["gibbsEnergy", "enthalpy", "entropy"] as const) {
          const parts = formations.map(({ coefficient, formation }) => coefficient * formation[key].value);
          const scale = parts.reduce((sum, part) => sum + Math.abs(part), key === "entropy" ? 1000 : 1e6);
          const sum = parts.reduce((total, part) => total + part, 0);
          expect(Math.abs(sum - whole[key].value)).toBeLessThan(1e-13 * scale);
        }
      },
    ),
    { seed: 20_261_201, numRuns: 500 },
  );
});

test("a stable sequence of a compound or element forms as its phases do", () => {
  const iron = findSequence(referenceData, "Fe(cr)");
  for (const temperatureK of [298.15, 900, 1184, 1184.5, 1500, 1700]) {
    const { gibbsEnergy, enthalpy } = formationProperties(
      iron,
      { temperature: quantity(temperatureK, "K") },
      referenceData,
    );
    expect([gibbsEnergy.value, enthalpy.value]).toEqual([0, 0]);
  }
});

import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { idealSolution } from "../../src/activity/ideal-solution.js";
import { gasConstantJPerMolK } from "../../src/constants/constants.js";
import { H2O_l, referenceData } from "../../src/data/index.js";
import {
  affinity,
  lnReactionQuotient,
  reaction,
  reactionDirection,
  reactionGibbsEnergy,
  standardReactionProperties,
} from "../../src/reaction/index.js";
import { solutes } from "../activity/solutes.js";
import { placesOf } from "../errors/faults-of.js";
import { collectionOf, recordOf } from "../species/records.js";

const synthesis = reaction("N2 + 3 H2 = 2 NH3", referenceData);
const at = (ammonia: number, temperatureK: number = 700) => {
  const rest = (1 - ammonia) / 4;
  return {
    temperature: { value: temperatureK, unit: "K" },
    pressure: { value: 50, unit: "bar" },
    gas: { moleFractions: { "N2(g)": rest, "H2(g)": 3 * rest, "NH3(g)": ammonia } },
  } as const;
};
const fractions = fc.double({ min: 1e-6, max: 0.999, noNaN: true });
const runs = { seed: 20261201, numRuns: 300 };

describe("the affinity of a reaction", () => {
  test("is the negative of its Gibbs energy, exactly, and RT (ln K - ln Q)", () => {
    fc.assert(
      fc.property(fractions, fc.double({ min: 300, max: 1500, noNaN: true }), (ammonia, temperatureK) => {
        const conditions = at(ammonia, temperatureK);
        const { value, unit } = affinity(synthesis, conditions);
        expect(unit).toBe("J/mol");
        expect(value).toBe(0 - reactionGibbsEnergy(synthesis, conditions).value);
        const { lnK, enthalpy } = standardReactionProperties(synthesis, conditions);
        const direct = gasConstantJPerMolK * temperatureK * (lnK - lnReactionQuotient(synthesis, conditions));
        // Rounding relative to the enthalpy, which G is a difference of
        expect(Math.abs(value - direct)).toBeLessThan(1e-12 * Math.abs(enthalpy.value));
      }),
      runs,
    );
  });

  test("is positive where the reaction runs forward, negative where it runs back (De Donder's inequality)", () => {
    fc.assert(
      fc.property(fractions, (ammonia) => {
        const { direction } = reactionDirection(synthesis, at(ammonia));
        const sign = Math.sign(affinity(synthesis, at(ammonia)).value);
        expect(sign).toBe({ forward: 1, reverse: -1 }[direction as "forward" | "reverse"]);
      }),
      runs,
    );
  });

  test("is -dG/d xi: the slope of the Gibbs energy of the whole mixture along its extent", () => {
    // n(N2) = 1 - xi, n(H2) = 3 - 3 xi, n(NH3) = 2 xi; G = sum of n RT ln(y p / p0) + xi dG(standard)
    const conditions = at(0.2);
    const extent = 1 / 3; // 2 xi / (4 - 2 xi) = 0.2
    const thermal = gasConstantJPerMolK * 700;
    const standard = standardReactionProperties(synthesis, conditions).gibbsEnergy.value;
    const total = (xi: number): number => {
      const amounts = [1 - xi, 3 - 3 * xi, 2 * xi];
      const sum = 4 - 2 * xi;
      return amounts.reduce((energy, n) => energy + n * thermal * Math.log((n / sum) * 50), xi * standard);
    };
    const slope = (total(extent + 1e-5) - total(extent - 1e-5)) / 2e-5;
    // The step of 1e-5 leaves an error of its square times the third derivative, and rounding 1e-11 / 1e-5.
    expect(Math.abs(affinity(synthesis, conditions).value + slope)).toBeLessThan(1e-3);
  });

  test("is zero, and no negative zero, at equilibrium", () => {
    const isomers = reaction("C2H5OH(g) = CH3OCH3(g)", collectionOf(recordOf("C2H5OH(g)"), recordOf("CH3OCH3(g)")));
    const { value } = affinity(isomers, {
      temperature: { value: 298.15, unit: "K" },
      pressure: { value: 3, unit: "bar" },
      gas: { moleFractions: { "C2H5OH(g)": 0.5, "CH3OCH3(g)": 0.5 } },
    });
    expect(value).toBe(0);
  });

  test("reverses its sign exactly with the equation, in solution too", () => {
    const conditions = {
      temperature: { value: 25, unit: "Cel" },
      pressure: { value: 1, unit: "bar" },
      solution: {
        solvent: "H2O(l)",
        molalities: { "Ag^+(aq)": 1e-3, "Cl^-(aq)": 2e-3 },
        activityModel: idealSolution(),
      },
      inerts: [H2O_l],
    } as const;
    const forward = affinity(reaction("AgCl(cr) = Ag^+(aq) + Cl^-(aq)", solutes), conditions).value;
    const back = affinity(reaction("Ag^+(aq) + Cl^-(aq) = AgCl(cr)", solutes), conditions).value;
    expect(forward).toBeLessThan(0);
    expect(back).toBe(-forward);
  });

  test("refuses what the Gibbs energy refuses", () => {
    expect(placesOf(() => affinity(synthesis, { ...at(0.2), gas: { moleFractions: {} } }))).toEqual([
      "conditions/fractions-do-not-sum at gas.moleFractions",
    ]);
    expect(placesOf(() => affinity("N2 = 2 N" as never, at(0.2)))).toEqual(["reaction/not-a-reaction at reaction"]);
  });
});

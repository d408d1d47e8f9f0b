import { describe, expect, test } from "vitest";
import { computeWitness } from "../../src/checks/witness-checks.js";
import { C2H4_g, referenceData } from "../../src/data/index.js";
import { isGibbsLedgerError } from "../../src/errors/gibbs-ledger-error.js";
import { quantity } from "../../src/quantity/quantity.js";
import { reaction } from "../../src/reaction/reaction.js";
import { standardReactionProperties } from "../../src/reaction/standard-reaction.js";
import type { Witness } from "../../src/species/record.js";

/** Hydrogenation of ethene, with the enthalpy 0 to compare with, at a temperature in kelvin if one is given. */
function hydrogenation(temperatureK?: number): Witness {
  const common = { source: "kistiakowsky1935", origin: "memory" } as const;
  return {
    group: "formation",
    kind: "physical",
    check: "reaction-enthalpy",
    against: {
      reactionEnthalpy: { value: 0, unit: "J/mol", ...common },
      ...(temperatureK === undefined ? {} : { temperature: { value: temperatureK, unit: "K", ...common } }),
    },
    reaction: { "C2H4(g)": -1, "H2(g)": -1, "C2H6(g)": 1 },
    deviation: 0,
    tolerance: 1,
    source: "kistiakowsky1935",
  };
}

describe("the enthalpy of a reaction in a witness", () => {
  const subject = reaction("C2H4(g) + H2(g) = C2H6(g)", referenceData);

  test.each([298.15, 355, 1000])("at %d K is that of the reaction", (temperatureK) => {
    const { enthalpy } = standardReactionProperties(subject, { temperature: quantity(temperatureK, "K") });
    const computed = computeWitness(C2H4_g, hydrogenation(temperatureK), referenceData);
    // Three enthalpies near 1e5 J/mol are summed: some 1e-10 J/mol of rounding.
    expect(Math.abs(computed - enthalpy.value)).toBeLessThan(1e-9);
  });

  test("without a temperature is that at 298.15 K", () => {
    expect(computeWitness(C2H4_g, hydrogenation(), referenceData)).toBe(
      computeWitness(C2H4_g, hydrogenation(298.15), referenceData),
    );
  });

  test("outside the range of a species is a fault", () => {
    const attempt = (): number => computeWitness(C2H4_g, hydrogenation(100), referenceData);
    expect(attempt).toThrow();
    try {
      attempt();
    } catch (error) {
      expect(isGibbsLedgerError(error, "species/outside-range")).toBe(true);
    }
  });
});

import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { faradayConstantCPerMol } from "../../src/constants/constants.js";
import { referenceData } from "../../src/data/index.js";
import { quantity } from "../../src/quantity/quantity.js";
import { reaction } from "../../src/reaction/reaction.js";
import { standardReactionProperties } from "../../src/reaction/standard-reaction.js";
import { formationProperties } from "../../src/species/formation-properties.js";
import type { SpeciesRecord } from "../../src/species/record.js";
import { isRecord } from "../../src/species/substance.js";

const temperature = quantity(298.15, "K");
const gibbsEnergy = (equation: string): number =>
  standardReactionProperties(reaction(equation, referenceData), { temperature }).gibbsEnergy.value;

/** Half-reactions with one electron or two: oxidised side, electrons, reduced side. */
const halfReactions: readonly (readonly [oxidised: string, electrons: number, reduced: string])[] = [
  ["AgCl(cr)", 1, "Ag(cr) + Cl^-(aq)"],
  ["AgBr(cr)", 1, "Ag(cr) + Br^-(aq)"],
  ["Ag^+(aq)", 1, "Ag(cr)"],
  ["Fe^3+(aq)", 1, "Fe^2+(aq)"],
  ["Cu^2+(aq)", 2, "Cu(cr)"],
  ["Zn^2+(aq)", 2, "Zn(cr)"],
  ["Hg2Cl2(cr)", 2, "2 Hg(l) + 2 Cl^-(aq)"],
  ["PbSO4(cr)", 2, "Pb(cr) + SO4^2-(aq)"],
  ["2 H^+(aq)", 2, "H2(g)"],
  ["I2(cr)", 2, "2 I^-(aq)"],
  ["Ca^2+(aq)", 2, "Ca(cr)"],
];

/** Reactions between solutes, pure phases and gases, no electrons. */
const reactions: readonly string[] = [
  "H2O(l) = H^+(aq) + OH^-(aq)",
  "CO2(aq) + H2O(l) = H^+(aq) + HCO3^-(aq)",
  "HCO3^-(aq) = H^+(aq) + CO3^2-(aq)",
  "NH4^+(aq) = NH3(aq) + H^+(aq)",
  "H3PO4(aq) = 3 H^+(aq) + PO4^3-(aq)",
  "CaF2(cr) = Ca^2+(aq) + 2 F^-(aq)",
  "CaSO4·2H2O(cr) = Ca^2+(aq) + SO4^2-(aq) + 2 H2O(l)",
  "Al(OH)3(cr) + 3 H^+(aq) = Al^3+(aq) + 3 H2O(l)",
  "CH3COOH(aq) = H^+(aq) + CH3COO^-(aq)",
  "Zn(cr) + Cu^2+(aq) = Zn^2+(aq) + Cu(cr)",
  "Hg(l) + Hg^2+(aq) = Hg2^2+(aq)",
];

describe("cycles of the reference data close", () => {
  test("the potential of a cell is the difference of its half-cells, in any pairing", () => {
    const index = fc.nat(halfReactions.length - 1);
    fc.assert(
      fc.property(index, index, (left, right) => {
        fc.pre(left !== right);
        const [leftOxidised, leftElectrons, leftReduced] = halfReactions[left]!;
        const [rightOxidised, rightElectrons, rightReduced] = halfReactions[right]!;
        const times = (count: number, side: string): string => Array.from({ length: count }, () => side).join(" + ");
        const cell = `${times(leftElectrons, rightOxidised)} + ${times(rightElectrons, leftReduced)} = ${times(
          leftElectrons,
          rightReduced,
        )} + ${times(rightElectrons, leftOxidised)}`;
        const half = (oxidised: string, electrons: number, reduced: string): number =>
          -gibbsEnergy(`${oxidised} + ${electrons} e^- = ${reduced}`) / (electrons * faradayConstantCPerMol);
        const difference =
          half(rightOxidised, rightElectrons, rightReduced) - half(leftOxidised, leftElectrons, leftReduced);
        const whole = -gibbsEnergy(cell) / (leftElectrons * rightElectrons * faradayConstantCPerMol);
        expect(Math.abs(whole - difference)).toBeLessThan(1e-12);
      }),
      { seed: 20, numRuns: 200 },
    );
  });

  test.each(reactions)("%s: the Gibbs energies of formation add up to that of the reaction", (equation) => {
    const { terms } = reaction(equation, referenceData);
    const sum = terms.reduce(
      (total, { coefficient, species }) =>
        total +
        coefficient * formationProperties(species as SpeciesRecord, { temperature }, referenceData).gibbsEnergy.value,
      0,
    );
    expect(terms.every(({ species }) => isRecord(species))).toBe(true);
    expect(Math.abs(sum - gibbsEnergy(equation))).toBeLessThan(1e-6);
  });

  test("the hydrogen electrode and the formation of the hydrogen ion are zero", () => {
    expect(gibbsEnergy("2 H^+(aq) + 2 e^- = H2(g)")).toBe(0);
    const ion = referenceData.species.find(({ label }) => label === "H^+(aq)") as SpeciesRecord;
    const { enthalpy, entropy, gibbsEnergy: formation } = formationProperties(ion, { temperature }, referenceData);
    expect([enthalpy.value, entropy.value, formation.value]).toEqual([0, 0, 0]);
  });

  test("reversing a half-reaction changes the sign of its Gibbs energy and no digit", () => {
    for (const [oxidised, electrons, reduced] of halfReactions) {
      const forward = gibbsEnergy(`${oxidised} + ${electrons} e^- = ${reduced}`);
      const backward = gibbsEnergy(`${reduced} = ${oxidised} + ${electrons} e^-`);
      expect(forward + backward).toBe(0);
    }
  });
});

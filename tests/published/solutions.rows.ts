import { idealSolution } from "../../src/activity/ideal-solution.js";
import { faradayConstantCPerMol, gasConstantJPerMolK } from "../../src/constants/constants.js";
import { H2O_l, referenceData } from "../../src/data/index.js";
import { virial } from "../../src/fugacity/virial.js";
import { quantity } from "../../src/quantity/quantity.js";
import type { LabelMap, Reaction, ReactionConditions } from "../../src/reaction/index.js";
import { reaction, reactionGibbsEnergy, temperaturesAtGibbsEnergy } from "../../src/reaction/index.js";
import { chloride, hydroxide, silver, silverChloride, solutes, sucrose } from "../activity/solutes.js";
import { type AccuracyRow, row } from "./accuracy-row.js";

/** Values from outside that solutions in the conditions of a reaction are held to. */
export function rows(): AccuracyRow[] {
  return [...equilibriumRows(), ...nernstRows(), ...colligativeRows()];
}

const activityModel = idealSolution();
const thermal = gasConstantJPerMolK * 298.15;

/** Gibbs energy at 25 degrees Celsius and 1 bar with solutes of given molality in water. */
function energyAt(subject: Reaction, molalities: LabelMap): number {
  const hasWater = subject.terms.some(({ label }) => label === "H2O(l)");
  const conditions: ReactionConditions = {
    temperature: quantity(298.15, "K"),
    pressure: quantity(1, "bar"),
    solution: { solvent: "H2O(l)", molalities, activityModel },
    inerts: hasWater ? [] : [H2O_l],
  };
  return reactionGibbsEnergy(subject, conditions).value;
}

/** 95 per cent half-widths of enthalpies and entropies, added up, as a difference of log10 K at 298.15 K. */
function spread(...records: readonly (typeof chloride)[]): number {
  const energies = records.map(({ formationEnthalpy, standardEntropy }) => {
    const enthalpy = (formationEnthalpy?.uncertainty?.halfWidth ?? 0) * 1000;
    return enthalpy + 298.15 * (standardEntropy?.uncertainty?.halfWidth ?? 0);
  });
  return energies.reduce((sum, energy) => sum + energy, 0) / (thermal * Math.LN10);
}

/** Where the Gibbs energy vanishes, from its value at dilute molalities: log10 Q = -G / (RT ln 10) further on. */
function equilibriumRows(): AccuracyRow[] {
  const ionisation = reaction("H2O(l) = H^+(aq) + OH^-(aq)", solutes);
  const dissolution = reaction("AgCl(cr) = Ag^+(aq) + Cl^-(aq)", solutes);
  const log10K = (subject: Reaction, molalities: LabelMap, log10Q: number): number =>
    log10Q - energyAt(subject, molalities) / (thermal * Math.LN10);
  const pKw = -log10K(ionisation, { "H^+(aq)": 1e-7, "OH^-(aq)": 1e-7 }, -14);
  const pKs = -log10K(dissolution, { "Ag^+(aq)": 1e-5, "Cl^-(aq)": 1e-5 }, -10);
  const ofWater = spread(hydroxide, H2O_l);
  const ofChloride = spread(silver, chloride, silverChloride);
  const cross = { class: "cross source", origin: "memory" } as const;
  return [
    row({
      id: "solution-pH-of-pure-water",
      ...cross,
      source: "W. L. Marshall, E. U. Franck, J. Phys. Chem. Ref. Data 10, 295 (1981): pKw 13.995 at 25 Cel",
      quantity: "pH of pure water at 298.15 K as an ideal solution, figures of CODATA (1989)",
      expected: 6.998,
      computed: pKw / 2,
      tolerance: 0.0005 + ofWater / 2,
    }),
    row({
      id: "solution-solubility-of-silver-chloride",
      ...cross,
      source: "handbook values of the solubility product of AgCl at 25 Cel: 1.77e-10, pKs 9.75",
      quantity: "log10 of the solubility of AgCl in mol/kg of water at 298.15 K, figures of CODATA (1989)",
      expected: -4.875,
      computed: -pKs / 2,
      tolerance: 0.0025 + ofChloride / 2,
    }),
  ];
}

/** The Nernst slope, with the electron of the standard-hydrogen convention. */
function nernstRows(): AccuracyRow[] {
  const deposition = reaction("Ag^+(aq) + e^- = Ag(cr)", solutes);
  const potential = (molality: number): number =>
    -energyAt(deposition, { "Ag^+(aq)": molality }) / faradayConstantCPerMol;
  return [
    row({
      id: "solution-nernst-slope",
      class: "identity",
      origin: "memory",
      source: "electrochemistry textbooks: RT ln 10 / F = 59.16 mV at 25 Cel",
      quantity: "potential of Ag+/Ag at 0.01 less that at 0.001 mol/kg, 298.15 K, in mV",
      expected: 59.16,
      computed: (potential(0.01) - potential(0.001)) * 1000,
      tolerance: 0.005,
    }),
  ];
}

/** Boiling point and freezing point of water over 0.01 mol/kg of an inert solute. */
function colligativeRows(): AccuracyRow[] {
  // The constants are limits of infinite dilution; 0.01 mol/kg is within 0.02 per cent of it.
  const molality = 0.01;
  const shift = (subject: Reaction, fromK: number, toK: number, rest: Partial<ReactionConditions>): number => {
    const turnsAt = (amount: number): number => {
      const [turn] = temperaturesAtGibbsEnergy(subject, {
        between: [quantity(fromK, "K"), quantity(toK, "K")],
        conditions: {
          pressure: quantity(1, "atm"),
          solution: { solvent: "H2O(l)", molalities: { "C12H22O11(aq)": amount }, activityModel },
          inerts: [sucrose],
          outsideRange: "constant-heat-capacity",
          ...rest,
        },
      });
      return turn?.value ?? Number.NaN;
    };
    return (turnsAt(molality) - turnsAt(0)) / molality;
  };
  const evaporation = reaction("H2O(l) = H2O(g)", referenceData);
  const fusion = reaction("H2O(cr) = H2O(l)", referenceData);
  const steam = { moleFractions: { "H2O(g)": 1 }, equationOfState: virial() };
  return [
    row({
      id: "solution-boiling-point-elevation-of-water",
      class: "cross source",
      origin: "memory",
      source: "CRC Handbook of Chemistry and Physics, ebullioscopic constants: 0.513 K kg/mol",
      quantity:
        "rise of the boiling point of water at 1 atm over molality, 0.01 mol/kg, in K kg/mol; steam by virial()",
      expected: 0.513,
      computed: shift(evaporation, 370, 376, { gas: steam }),
      tolerance: 0.0005,
    }),
    row({
      id: "solution-freezing-point-depression-of-water",
      class: "cross source",
      origin: "memory",
      source: "CRC Handbook of Chemistry and Physics, cryoscopic constants: 1.86 K kg/mol",
      quantity: "fall of the freezing point of water over molality, 0.01 mol/kg, in K kg/mol",
      expected: 1.86,
      computed: -shift(fusion, 270, 274, {}),
      tolerance: 0.005,
    }),
  ];
}

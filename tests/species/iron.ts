import type { CollectionData, PhaseSequence, SpeciesRecord } from "../../src/species/record.js";
import { figure, invented } from "../heat-capacity/random-series.js";
import { fitted, polynomialRecord, recordOf } from "./records.js";

/** Three solid phases and the liquid of an element, with invented figures: the second join has a published enthalpy. */
export const alpha: SpeciesRecord = polynomialRecord("Fe(cr,alpha)", 0, 27.3, [20, 0.012], [0, 1], {
  transitions: [{ temperature: figure(1185, "K"), into: "Fe(cr,gamma)", enthalpy: figure(1.01, "kJ/mol") }],
});

export const gamma: SpeciesRecord = recordOf("Fe(cr,gamma)", {
  gibbsFunction: fitted({
    kind: "series",
    form: "polynomial",
    powers: [0, 1],
    intervals: [{ from: 1100, to: 1700, coefficients: [24, 0.008], endsAt: "fit" }],
    anchor: { temperature: figure(1185, "K"), enthalpy: figure(28, "kJ/mol"), entropy: figure(68, "J/mol/K") },
  }),
  transitions: [
    {
      temperature: figure(1667, "K"),
      into: "Fe(cr,delta)",
      enthalpy: { ...figure(0.85, "kJ/mol"), uncertainty: { halfWidth: 0.1, coverage: 0.95 } },
    },
  ],
});

export const delta: SpeciesRecord = recordOf("Fe(cr,delta)", {
  gibbsFunction: fitted({
    kind: "series",
    form: "polynomial",
    powers: [0, 1],
    intervals: [{ from: 1600, to: 1811, coefficients: [25, 0.01], endsAt: "fit" }],
    anchor: { temperature: figure(1667, "K"), enthalpy: figure(46, "kJ/mol"), entropy: figure(80, "J/mol/K") },
  }),
});

/** Begins where delta ends, in the one point that the two share. */
export const liquid: SpeciesRecord = recordOf("Fe(l)", {
  gibbsFunction: fitted({
    kind: "series",
    form: "polynomial",
    powers: [0],
    intervals: [{ from: 1811, to: 3000, coefficients: [46], endsAt: "fit" }],
    anchor: { temperature: figure(1811, "K"), enthalpy: figure(66, "kJ/mol"), entropy: figure(91, "J/mol/K") },
  }),
});

export const sequence = (label: string, ...phases: string[]): PhaseSequence => ({
  label,
  phases,
  source: invented,
  origin: "memory",
});

export const solidIron: PhaseSequence = sequence("Fe(cr)", "Fe(cr,alpha)", "Fe(cr,gamma)", "Fe(cr,delta)");

export const oxygen: SpeciesRecord = polynomialRecord("O2(g)", 0, 205.15, [29, 0.003], [0, 1]);
export const ironOxide: SpeciesRecord = polynomialRecord("FeO(cr)", -272_000, 60.75, [48, 0.008], [0, 1]);

export const ironData: CollectionData = {
  species: [alpha, gamma, delta, liquid, oxygen, ironOxide],
  sequences: [
    solidIron,
    sequence("Fe", "Fe(cr,alpha)", "Fe(cr,gamma)", "Fe(cr,delta)", "Fe(l)"),
    sequence("O2", "O2(g)"),
  ],
};

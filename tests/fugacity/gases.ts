import type { CriticalConstants, GasComponent } from "../../src/fugacity/equation-of-state.js";
import type { Figure } from "../../src/quantity/figure.js";
import type { SpeciesRecord } from "../../src/species/record.js";

/** Critical constants as printed: K, bar, cm3/mol. */
export interface PrintedConstants {
  readonly temperature: number;
  readonly pressure: number;
  readonly acentricFactor?: number;
  readonly volume?: number;
}

// B. E. Poling, J. M. Prausnitz, J. P. O'Connell, The Properties of Gases and Liquids, 5th ed. (2001), Appendix A,
// recalled from memory.
const poling = {
  "N2(g)": { temperature: 126.2, pressure: 33.98, acentricFactor: 0.037, volume: 90.1 },
  "Ar(g)": { temperature: 150.86, pressure: 48.98, acentricFactor: -0.002, volume: 74.57 },
  "O2(g)": { temperature: 154.58, pressure: 50.43, acentricFactor: 0.021, volume: 73.37 },
  "CH4(g)": { temperature: 190.56, pressure: 45.99, acentricFactor: 0.011, volume: 98.6 },
  "CO2(g)": { temperature: 304.12, pressure: 73.74, acentricFactor: 0.225, volume: 94.07 },
  "H2O(g)": { temperature: 647.14, pressure: 220.64, acentricFactor: 0.344, volume: 55.95 },
  "NH3(g)": { temperature: 405.4, pressure: 113.53, acentricFactor: 0.257, volume: 72.47 },
} as const satisfies Record<string, PrintedConstants>;

export type GasLabel = keyof typeof poling;

/** A gas as a record: formation figures are invented, critical constants recalled. */
export function recordOf(label: string, printed?: PrintedConstants): SpeciesRecord {
  return {
    label,
    name: "a gas of the tests",
    formula: label.slice(0, label.indexOf("(")),
    chargeNumber: 0,
    state: "g",
    standardPressure: figure(1, "bar"),
    formationEnthalpy: figure(0, "J/mol"),
    standardEntropy: figure(200, "J/mol/K"),
    gibbsFunction: { kind: "reference-point" },
    ...(printed === undefined ? {} : { critical: criticalOf(printed) }),
    witnesses: [],
  };
}

export function gas(label: GasLabel): SpeciesRecord {
  return recordOf(label, poling[label]);
}

export function componentOf(label: string, printed: PrintedConstants): GasComponent {
  const { temperature, pressure, acentricFactor, volume } = printed;
  const critical: CriticalConstants = {
    temperatureK: temperature,
    pressurePa: pressure * 1e5,
    ...(acentricFactor === undefined ? {} : { acentricFactor }),
    ...(volume === undefined ? {} : { volumeM3PerMol: volume / 1e6 }),
  };
  return { label, critical };
}

export function component(label: GasLabel): GasComponent {
  return componentOf(label, poling[label]);
}

function criticalOf(printed: PrintedConstants): NonNullable<SpeciesRecord["critical"]> {
  return {
    temperature: figure(printed.temperature, "K"),
    pressure: figure(printed.pressure, "bar"),
    ...(printed.acentricFactor === undefined ? {} : { acentricFactor: figure(printed.acentricFactor, "1") }),
    ...(printed.volume === undefined ? {} : { volume: figure(printed.volume, "cm3/mol") }),
  };
}

function figure(value: number, unit: string): Figure {
  return {
    value,
    unit,
    source: { text: "invented, or Poling, Prausnitz, O'Connell (2001), Appendix A" },
    origin: "memory",
  };
}

import { describe, expect, test } from "vitest";
import { N2_g, referenceData } from "../../src/data/index.js";
import { quantity } from "../../src/quantity/quantity.js";
import {
  convertEnthalpyReference,
  convertStandardPressure,
  electrodePotentialAtStandardPressure,
  formationEnthalpyAtReference,
  formationEnthalpyAtZeroKelvin,
  formationEntropyAtStandardPressure,
  formationGasChange,
  formationGibbsEnergyAtStandardPressure,
  formationIncrements,
  gibbsFunctionAtReference,
  idealGasEntropyAtStandardPressure,
  idealGasGibbsEnergyAtStandardPressure,
  lnKAtStandardPressure,
  lnKFromGibbsFunction,
  lnKOnScale,
  solutionComposition,
  standardGibbsEnergyOnScale,
} from "../../src/standard-state/index.js";
import { faultsOf } from "../errors/faults-of.js";

/** Anything, as plain JavaScript may pass it. */
// biome-ignore lint/suspicious/noExplicitAny: the subject of this table is what types forbid
type Anything = any;

interface Row {
  readonly name: string;
  readonly call: () => unknown;
  readonly code: string;
  readonly path: string;
  readonly hint?: string;
}

const step = { from: quantity(1, "atm"), to: quantity(1, "bar") };
const change = { ...step, temperature: quantity(298.15, "K") };
const entropy = quantity(191.5, "J/mol/K");
const energy = quantity(-237, "kJ/mol");
const huge = "x".repeat(1_000_000);
const prototype: Anything = JSON.parse('{ "__proto__": 1 }');
const scales = { from: "molality", to: "concentration", solvent: { density: quantity(1, "kg/L") } } as const;
const elements: Anything = { enthalpyAbove0K: energy, elements: [], from: "0 K", to: "298.15 K" };

const pressures: Row[] = [
  {
    name: "entropy as a bare number",
    call: () => idealGasEntropyAtStandardPressure(191.5 as Anything, step),
    code: "quantity/not-a-quantity",
    path: "entropy",
    hint: "quantity(191.5",
  },
  {
    name: "entropy of an energy",
    call: () => idealGasEntropyAtStandardPressure(energy as Anything, step),
    code: "quantity/wrong-dimension",
    path: "entropy.unit",
  },
  {
    name: "pressures of null",
    call: () => idealGasEntropyAtStandardPressure(entropy, null as Anything),
    code: "input/not-an-object",
    path: "",
  },
  {
    name: "pressures in an array",
    call: () => idealGasEntropyAtStandardPressure(entropy, [1, 2] as Anything),
    code: "input/not-an-object",
    path: "",
  },
  {
    name: "one pressure",
    call: () => idealGasEntropyAtStandardPressure(entropy, { from: step.from } as Anything),
    code: "input/missing",
    path: "to",
  },
  {
    name: "vacuum",
    call: () => idealGasEntropyAtStandardPressure(entropy, { ...step, to: quantity(0, "Pa") }),
    code: "quantity/not-positive",
    path: "to.value",
  },
  {
    name: "gauge pressure",
    call: () => idealGasEntropyAtStandardPressure(entropy, { ...step, from: { value: -0.2, unit: "bar" } }),
    code: "quantity/not-positive",
    path: "from.value",
  },
  {
    name: "key of the prototype",
    call: () => idealGasEntropyAtStandardPressure(entropy, prototype),
    code: "input/forbidden-key",
    path: "__proto__",
  },
  {
    name: "misspelt key",
    call: () => idealGasGibbsEnergyAtStandardPressure(energy, { ...change, temprature: 300 } as Anything),
    code: "input/unknown-key",
    path: "temprature",
    hint: "temperature",
  },
  {
    name: "no temperature",
    call: () => idealGasGibbsEnergyAtStandardPressure(energy, step as Anything),
    code: "input/missing",
    path: "temperature",
  },
  {
    name: "energy too large for a double",
    call: () => idealGasGibbsEnergyAtStandardPressure(energy, { ...change, temperature: quantity(1.7e308, "K") }),
    code: "quantity/overflow",
    path: "gibbsEnergy",
  },
  {
    name: "species without a state",
    call: () => formationGibbsEnergyAtStandardPressure(energy, "H2O", change),
    code: "standard-state/no-state",
    path: "species",
  },
  {
    name: "species of null",
    call: () => formationGibbsEnergyAtStandardPressure(energy, null as Anything, change),
    code: "input/not-an-object",
    path: "species",
  },
  {
    name: "huge label",
    call: () => formationGibbsEnergyAtStandardPressure(energy, huge, change),
    code: "formula/too-long",
    path: "species",
  },
  {
    name: "volume of a gas",
    call: () =>
      formationGibbsEnergyAtStandardPressure(energy, "H2O(g)", { ...change, molarVolume: quantity(24, "L/mol") }),
    code: "standard-state/volume-of-gas",
    path: "molarVolume",
  },
  {
    name: "volume of a condensed phase in an entropy",
    call: () =>
      formationEntropyAtStandardPressure(entropy, "H2O(l)", {
        ...step,
        molarVolume: quantity(18, "cm3/mol"),
      } as Anything),
    code: "input/unknown-key",
    path: "molarVolume",
  },
  {
    name: "molecule of no atoms",
    call: () => formationEntropyAtStandardPressure(entropy, "H2O(l)", { ...step, gaseousElements: { O: 0 } }),
    code: "standard-state/invalid-molecule",
    path: "gaseousElements.O",
  },
  {
    name: "gaseous elements in an array",
    call: () => formationGasChange("H2O(l)", { gaseousElements: ["H", "O"] as Anything }),
    code: "input/not-an-object",
    path: "convention.gaseousElements",
  },
  {
    name: "convention of null",
    call: () => formationGasChange("H2O(l)", null as Anything),
    code: "input/not-an-object",
    path: "convention",
  },
  {
    name: "ln K of text",
    call: () => lnKAtStandardPressure("3" as Anything, { "N2(g)": 1 }, step),
    code: "input/not-finite",
    path: "lnK",
    hint: "not a text",
  },
  {
    name: "stoichiometry of an equation",
    call: () => lnKAtStandardPressure(3, "N2 = 2 N" as Anything, step),
    code: "input/not-an-object",
    path: "stoichiometry",
  },
  {
    name: "stoichiometry of an array",
    call: () => lnKAtStandardPressure(3, [1, -1] as Anything, step),
    code: "input/not-an-object",
    path: "stoichiometry",
  },
  {
    name: "number of a prototype",
    call: () => lnKAtStandardPressure(3, prototype, step),
    code: "input/forbidden-key",
    path: "stoichiometry.__proto__",
  },
  {
    name: "terms of nothing",
    call: () => lnKAtStandardPressure(3, { terms: [null] } as Anything, step),
    code: "input/not-an-object",
    path: "stoichiometry.terms.0",
  },
  {
    name: "too many terms",
    call: () =>
      lnKAtStandardPressure(3, { terms: new Array(201).fill({ label: "N2(g)", coefficient: 1 }) } as Anything, step),
    code: "input/too-large",
    path: "stoichiometry.terms",
  },
  {
    name: "half-reaction without electrons",
    call: () => electrodePotentialAtStandardPressure(quantity(0.8, "V"), { "Ag^+(aq)": -1, "Ag(cr)": 1 }, change),
    code: "standard-state/no-electrons",
    path: "halfReaction",
  },
  {
    name: "potential in kilojoules",
    call: () => electrodePotentialAtStandardPressure(energy as Anything, { "e^-": -1, "Ag(cr)": 1 }, change),
    code: "quantity/wrong-dimension",
    path: "potential.unit",
  },
];

const records: Row[] = [
  {
    name: "record by label",
    call: () => convertStandardPressure("N2(g)" as Anything, step.from),
    code: "input/not-an-object",
    path: "record",
  },
  {
    name: "record with a hole",
    call: () => convertStandardPressure({ ...N2_g, witnesses: undefined } as Anything, step.from),
    code: "input/missing",
    path: "record.witnesses",
  },
  {
    name: "pressure by name",
    call: () => convertStandardPressure(N2_g, "1 atm" as Anything),
    code: "quantity/not-a-quantity",
    path: "pressure",
    hint: "parseQuantity",
  },
  {
    name: "reference as a quantity",
    call: () => convertEnthalpyReference(N2_g, referenceData, quantity(0, "K") as Anything),
    code: "input/unknown-option",
    path: "reference",
  },
  {
    name: "collection of null",
    call: () => convertEnthalpyReference(N2_g, null as Anything, "0 K"),
    code: "input/not-an-object",
    path: "collection",
  },
  {
    name: "collection without sequences",
    call: () => formationIncrements(N2_g, { species: [N2_g] }),
    code: "species/no-reference",
    path: "collection.sequences",
  },
  {
    name: "options of text",
    call: () => formationIncrements(N2_g, { species: [N2_g] }, "cox1989" as Anything),
    code: "input/not-an-object",
    path: "options",
  },
  {
    name: "record of undefined",
    call: () => formationEnthalpyAtZeroKelvin(undefined as Anything, referenceData),
    code: "input/not-an-object",
    path: "record",
  },
];

const references: Row[] = [
  {
    name: "change of null",
    call: () => formationEnthalpyAtReference(energy, null as Anything),
    code: "input/not-an-object",
    path: "",
  },
  {
    name: "elements by name",
    call: () => formationEnthalpyAtReference(energy, { ...elements, elements: { O: 4.34 } }),
    code: "input/not-an-array",
    path: "elements",
  },
  {
    name: "element without amount",
    call: () => formationEnthalpyAtReference(energy, { ...elements, elements: [{ enthalpyAbove0K: energy }] }),
    code: "input/missing",
    path: "elements.0.amount",
  },
  {
    name: "reference without a space",
    call: () => formationEnthalpyAtReference(energy, { ...elements, from: "0K" }),
    code: "input/unknown-option",
    path: "from",
  },
  {
    name: "Gibbs function as an energy",
    call: () => gibbsFunctionAtReference(energy as Anything, { ...elements, temperature: change.temperature }),
    code: "quantity/wrong-dimension",
    path: "gibbsFunction.unit",
  },
  {
    name: "zero kelvin in a Gibbs function",
    call: () =>
      gibbsFunctionAtReference(entropy, {
        temperature: quantity(0, "K"),
        enthalpyAbove0K: energy,
        from: "0 K",
        to: "298.15 K",
      }),
    code: "quantity/not-positive",
    path: "temperature.value",
  },
  {
    name: "ln K of nothing",
    call: () => lnKFromGibbsFunction(undefined as Anything),
    code: "input/not-an-object",
    path: "",
  },
];

const solutions: Row[] = [
  {
    name: "unknown scale",
    call: () => lnKOnScale(1, { "NH3(aq)": 1 }, { ...scales, to: "mole fraction" as Anything }),
    code: "input/unknown-option",
    path: "to",
    hint: "mole-fraction",
  },
  {
    name: "solvent by name",
    call: () => lnKOnScale(1, { "NH3(aq)": 1 }, { ...scales, solvent: "H2O(l)" as Anything }),
    code: "input/not-an-object",
    path: "solvent",
  },
  {
    name: "density of zero",
    call: () => lnKOnScale(1, { "NH3(aq)": 1 }, { ...scales, solvent: { density: quantity(0, "kg/m3") } }),
    code: "quantity/not-positive",
    path: "solvent.density.value",
  },
  {
    name: "scale of a Gibbs energy without temperature",
    call: () => standardGibbsEnergyOnScale(energy, scales as Anything),
    code: "input/missing",
    path: "temperature",
  },
  {
    name: "composition of null",
    call: () => solutionComposition(null as Anything),
    code: "input/not-an-object",
    path: "",
  },
  {
    name: "solvent of a number",
    call: () => solutionComposition({ solvent: 18 as Anything, molalities: {} }),
    code: "input/not-a-string",
    path: "solvent",
  },
  {
    name: "misspelt scale",
    call: () => solutionComposition({ solvent: "H2O(l)", molalites: {} } as Anything),
    code: "input/unknown-key",
    path: "molalites",
    hint: "molalities",
  },
  {
    name: "too many solutes",
    call: () =>
      solutionComposition({
        solvent: "H2O(l)",
        molalities: Object.fromEntries(
          Array.from({ length: 201 }, (_each, n) => [`C${n + 2}(aq)`, quantity(0, "mol/kg")]),
        ),
      }),
    code: "input/too-large",
    path: "molalities",
  },
  {
    name: "molar mass of a label that is none",
    call: () => solutionComposition({ solvent: huge, molalities: {} }),
    code: "input/too-large",
    path: "solvent",
  },
];

describe.each([
  ["pressures", pressures],
  ["records", records],
  ["references", references],
  ["solutions", solutions],
])("%s", (_topic, rows) => {
  test.each(rows.map((row) => [row.name, row] as const))("%s", (_name, { call, code, path, hint }) => {
    const faults = faultsOf(call);
    const found = faults.find((fault) => fault.code === code && fault.path.join(".") === path);
    expect(faults.map((fault) => `${fault.code} at ${fault.path.join(".")}`)).toContain(`${code} at ${path}`);
    if (hint !== undefined) expect(found?.hint).toContain(hint);
    for (const { message, received, expected } of faults) {
      expect(message.length).toBeGreaterThan(0);
      expect(message.length).toBeLessThanOrEqual(500);
      expect(message).not.toContain("\n");
      expect(received?.length ?? 0).toBeLessThanOrEqual(250);
      expect(expected?.length ?? 0).toBeLessThanOrEqual(500);
    }
  });
});

describe("no result is NaN, infinite or a negative zero", () => {
  /** Every number in a result, however deep. */
  function numbersIn(value: unknown): number[] {
    if (typeof value === "number") return [value];
    return typeof value === "object" && value !== null ? Object.values(value).flatMap(numbersIn) : [];
  }

  const sizes = [5e-324, 1e-300, 1e-3, 1, 101325, 1e300, 1.7e308];

  test.each(sizes.flatMap((from) => sizes.map((to) => [from, to] as const)))("from %d Pa to %d Pa", (from, to) => {
    const far = { from: quantity(from, "Pa"), to: quantity(to, "Pa") };
    const there = { ...far, temperature: quantity(1000, "K") };
    const zero = quantity(0, "J/mol");
    const numbers = numbersIn([
      idealGasEntropyAtStandardPressure(quantity(0, "J/mol/K"), far),
      idealGasGibbsEnergyAtStandardPressure(zero, there),
      formationGibbsEnergyAtStandardPressure(zero, "C(cr,graphite)", there),
      formationGibbsEnergyAtStandardPressure(zero, "SO4^2-(aq)", there),
      formationEntropyAtStandardPressure(quantity(0, "J/mol/K"), "H2O(l)", far),
      lnKAtStandardPressure(0, { "N2(g)": -1, "H2(g)": -3, "NH3(g)": 2 }, far),
      electrodePotentialAtStandardPressure(quantity(0, "V"), { "H^+(aq)": -2, "e^-": -2, "H2(g)": 1 }, there),
      convertStandardPressure(
        { ...N2_g, standardPressure: { ...N2_g.standardPressure, value: from, unit: "Pa" } },
        far.to,
      ),
    ]);
    expect(numbers.length).toBeGreaterThan(30);
    for (const number of numbers) {
      expect(Number.isFinite(number)).toBe(true);
      expect(Object.is(number, -0)).toBe(false);
    }
  });
});

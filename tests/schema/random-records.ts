import fc from "fast-check";
import { heatCapacityForms } from "../../src/heat-capacity/forms.js";
import type { Figure } from "../../src/quantity/figure.js";
import { type Dimension, isUnitCode, unitCodesOf } from "../../src/quantity/units.js";
import type { Source } from "../../src/references/source.js";
import type { SpeciesRecord, Witness } from "../../src/species/record.js";
import { figure, randomSeries } from "../heat-capacity/random-series.js";
import { fitted, recordOf } from "../species/records.js";

const sources: fc.Arbitrary<Source> = fc.oneof(
  fc.constantFrom<Source>("cox1989", "chase1998", "mcbride2002"),
  fc.string({ unit: "grapheme", minLength: 1, maxLength: 20 }).map((text) => ({ text })),
);

/** Doubles as tables print them, and doubles with all their bits. */
const numbers = fc.oneof(
  fc.double({ noNaN: true, noDefaultInfinity: true }),
  fc.double({ min: 0.001, max: 1e6, noNaN: true }),
  fc.integer({ min: -1_000_000, max: 1_000_000 }).map((value) => value / 1000),
);

/** Figures of a dimension, above absolute zero where there is one. */
function figuresOf(dimension: Dimension, values: fc.Arbitrary<number> = numbers): fc.Arbitrary<Figure> {
  return fc
    .record(
      {
        value: values,
        unit: fc.constantFrom(...unitCodesOf(dimension)),
        source: sources,
        origin: fc.constantFrom("page" as const, "memory" as const),
        uncertainty: fc.record({
          halfWidth: fc.double({ min: 0, max: 10, noNaN: true }),
          coverage: fc.double({ min: 0.01, max: 0.99, noNaN: true }),
        }),
        where: fc.string({ minLength: 1, maxLength: 10 }),
      },
      { requiredKeys: ["value", "unit", "source", "origin"] },
    )
    .map((made) => (isUnitCode(made.unit, "temperature") ? { ...made, value: Math.abs(made.value) } : made));
}

const positive = fc.double({ min: 1e-3, max: 1e3, noNaN: true });

const witnesses: fc.Arbitrary<Witness> = fc.record(
  {
    group: fc.constantFrom("caloric" as const, "formation" as const, "critical" as const, "volume" as const),
    kind: fc.constantFrom("transcription" as const, "physical" as const),
    check: fc.constantFrom("closure-at-breaks" as const, "reaction-enthalpy" as const),
    against: fc.dictionary(fc.string({ minLength: 1, maxLength: 5 }), figuresOf("molarEnergy"), { maxKeys: 2 }),
    reaction: fc.constantFrom({ "NH3(g)": 2, "H2(g)": -3, "N2(g)": -1 }, {}),
    deviation: numbers,
    tolerance: numbers,
    over: fc.tuple(fc.integer({ min: 1, max: 500 }), fc.integer({ min: 500, max: 5000 })),
    source: sources,
  },
  { requiredKeys: ["group", "kind", "check", "deviation", "tolerance", "source"] },
);

const gibbsFunctions: fc.Arbitrary<SpeciesRecord["gibbsFunction"]> = fc.oneof(
  { weight: 1, arbitrary: fc.constant({ kind: "reference-point" as const }) },
  { weight: 4, arbitrary: fc.constantFrom(...heatCapacityForms).chain((form) => randomSeries[form].map(fitted)) },
);

const transitions = fc.array(
  fc.record({
    temperature: figuresOf("temperature", positive),
    into: fc.constantFrom("NH3(l)", "Fe(cr,gamma)"),
    enthalpy: figuresOf("molarEnergy"),
  }),
  { maxLength: 2 },
);

const optionalParts = fc.record(
  {
    name: fc.string({ unit: "grapheme", minLength: 1, maxLength: 30 }),
    casNumber: fc.constant("7664-41-7"),
    convention: fc.string({ minLength: 1, maxLength: 30 }),
    formationGibbsEnergy: figuresOf("molarEnergy"),
    enthalpyAbove0K: figuresOf("molarEnergy"),
    standardPressure: figuresOf("pressure", positive),
    formationEnthalpy: figuresOf("molarEnergy"),
    standardEntropy: figuresOf("molarEntropy"),
    transitions,
    critical: fc.record(
      {
        temperature: figuresOf("temperature", positive),
        pressure: figuresOf("pressure", positive),
        acentricFactor: figuresOf("fraction"),
        volume: figuresOf("molarVolume", positive),
      },
      { requiredKeys: ["temperature", "pressure"] },
    ),
    volume: fc.record(
      {
        molar: figuresOf("molarVolume", positive),
        thermalExpansion: figuresOf("reciprocalTemperature"),
        compressibility: figuresOf("reciprocalPressure"),
      },
      { requiredKeys: ["molar"] },
    ),
    witnesses: fc.array(witnesses, { maxLength: 3 }),
  },
  { requiredKeys: [] },
);

/** Sound records, invented, with all that a record may have; anchors stand within the fits. */
export const randomRecords: fc.Arbitrary<SpeciesRecord> = fc
  .tuple(fc.constantFrom("NH3(g)", "Fe(cr,gamma)", "SO4^2-(aq)", "H2O(l)"), optionalParts, gibbsFunctions)
  .map(([label, parts, gibbsFunction]) =>
    recordOf(label, { standardPressure: figure(1, "atm"), ...(parts as Partial<SpeciesRecord>), gibbsFunction }),
  );

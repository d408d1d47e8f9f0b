import { gasConstant } from "../../src/constants/constants.js";
import { referenceData } from "../../src/data/reference-data.js";
import type { PublishedSeries } from "../../src/heat-capacity/published-series.js";
import { type SeriesProperties, seriesProperties } from "../../src/heat-capacity/series-properties.js";
import { quantity } from "../../src/quantity/quantity.js";
import { findSpecies } from "../../src/species/collection.js";
import { standardProperties } from "../../src/species/standard-properties.js";
import { type Metal, metals } from "../heat-capacity/metals.js";
import { bermanBrown, corundum, type Mineral, mineral, minerals } from "../heat-capacity/minerals.js";
import { type AccuracyRow, row } from "./accuracy-row.js";

const dinsdale = "A. T. Dinsdale, Calphad 15, 317 (1991)";
const codata = "J. D. Cox, D. D. Wagman, V. A. Medvedev, CODATA Key Values for Thermodynamics (1989)";
const bulletin = "R. A. Robie, B. S. Hemingway, USGS Bulletin 2131 (1995), heat capacity at 298.15 K";
const janaf = "M. W. Chase, NIST-JANAF Thermochemical Tables, 4th ed. (1998)";
const ditmars = "D. A. Ditmars, S. Ishihara, S. S. Chang et al., J. Res. Natl. Bur. Stand. 87, 159 (1982)";
const hillWinter = "K. J. Hill, E. R. S. Winter, J. Phys. Chem. 60, 1361 (1956), p/atm = 4.137e7 exp(-20474 K/T)";
const halsteadMoore = "P. E. Halstead, A. E. Moore, J. Chem. Soc. 3873 (1957)";

/** Relative error of drop and scanning calorimetry, which the fits rest on (common practice, no source). */
const calorimetry = 0.01;

const same = { class: "same source", origin: "memory" } as const;
const cross = { class: "cross source", origin: "memory" } as const;

/** The published forms that are tested against their own sources, each with coefficients of its own. */
export function rows(): AccuracyRow[] {
  return [
    ...metals.flatMap(metalRows),
    ...minerals.flatMap(mineralRows),
    ...corundumRows(),
    ...bermanBrownRows(),
    ...calciteRows(),
    portlanditeRow(),
  ];
}

function at(series: PublishedSeries, temperatureK: number): SeriesProperties {
  return seriesProperties(series, { temperature: quantity(temperatureK, "K") });
}

function continued(series: PublishedSeries, temperatureK: number): SeriesProperties {
  return seriesProperties(series, { temperature: quantity(temperatureK, "K"), outsideRange: "continue-fit" });
}

/** G is relative to the element itself: H is 0 at 298.15 K, S as evaluated, and solid and liquid meet in melting. */
function metalRows({ symbol, meltingPointK, entropy298, solid, liquid }: Metal): AccuracyRow[] {
  const reference = at(solid, 298.15);
  const [before, after] = [meltingPointK - 50, meltingPointK + 50];
  return [
    row({
      id: `gibbs-energy-${symbol}-enthalpy-298.15-K`,
      ...same,
      source: dinsdale,
      quantity: `enthalpy of ${symbol}(cr) at 298.15 K in J/mol, by definition`,
      expected: 0,
      computed: reference.enthalpy.value,
      // a to 0.001 J/mol, the coefficient of 1/T to 1 J K/mol and twice over T in H, the others less
      tolerance: 0.004,
    }),
    row({
      id: `gibbs-energy-${symbol}-entropy-298.15-K`,
      ...cross,
      source: codata,
      quantity: `entropy of ${symbol}(cr) at 298.15 K in J/mol/K`,
      expected: entropy298,
      computed: reference.entropy.value,
      tolerance: 0.005, // printed to 0.01, and adopted by the source
    }),
    row({
      id: `gibbs-energy-${symbol}-melting-point`,
      ...same,
      source: dinsdale,
      quantity: `temperature in K at which ${symbol}(cr) and ${symbol}(l) have one Gibbs energy`,
      expected: meltingPointK,
      computed: bisected((T) => at(solid, T).gibbsEnergy.value - at(liquid, T).gibbsEnergy.value, before, after),
      // printed to 0.01 K; a to 0.001 J/mol and b to 1e-6 J/mol/K twice, over 8 J/mol/K: 0.0004 K
      tolerance: 0.0054,
    }),
  ];
}

/** The zero of a rising function between two arguments. */
function bisected(rising: (x: number) => number, from: number, to: number): number {
  let [low, high] = [from, to];
  for (let step = 0; step < 60; step += 1) {
    const middle = (low + high) / 2;
    if (rising(middle) < 0) low = middle;
    else high = middle;
  }
  return low;
}

function mineralRows({ name, heatCapacity298, series }: Mineral): AccuracyRow[] {
  return [
    row({
      id: `five-term-${name}-heat-capacity-298.15-K`,
      ...same,
      source: bulletin,
      quantity: `heat capacity of ${name} at 298.15 K in J/mol/K`,
      expected: heatCapacity298,
      computed: at(series, 298.15).heatCapacity.value,
      tolerance: 0.05, // printed to 0.1
    }),
  ];
}

/** The heat capacity standard, measured to 0.1 per cent, beside two fits to earlier measurements. */
function corundumRows(): AccuracyRow[] {
  const measured = { 298.15: 79.01, 400: 96.08, 600: 112.55, 800: 120.14, 1000: 124.77, 1200: 128.25 };
  const fits = { "five-term": corundum, "berman-brown": bermanBrown.corundum };
  return Object.entries(fits).flatMap(([form, series]) =>
    Object.entries(measured).map(([temperature, expected]) =>
      row({
        id: `${form}-corundum-heat-capacity-${temperature}-K`,
        ...cross,
        source: ditmars,
        quantity: `heat capacity of corundum at ${temperature} K in J/mol/K, by the ${form} fit`,
        expected,
        computed: at(series, Number(temperature)).heatCapacity.value,
        tolerance: Number((calorimetry * expected).toFixed(2)),
      }),
    ),
  );
}

/** Two more minerals of Berman (1988) beside heat capacities of other sources. */
function bermanBrownRows(): AccuracyRow[] {
  const beside = [
    { name: "forsterite", series: bermanBrown.forsterite, expected: 118.6, source: bulletin },
    { name: "periclase", series: bermanBrown.periclase, expected: 37.238, source: janaf },
  ];
  return beside.map(({ name, series, expected, source }) =>
    row({
      id: `berman-brown-${name}-heat-capacity-298.15-K`,
      ...cross,
      source,
      quantity: `heat capacity of ${name} at 298.15 K in J/mol/K, by the berman-brown fit`,
      expected,
      computed: at(series, 298.15).heatCapacity.value,
      tolerance: Number((calorimetry * expected).toFixed(2)),
    }),
  );
}

/** Decomposition of calcite by the fits of Berman (1988), with carbon dioxide of the reference data. */
function calciteRows(): AccuracyRow[] {
  return [1000, 1100].map((temperatureK) => {
    const calcite = at(bermanBrown.calcite, temperatureK).gibbsEnergy.value;
    const lime = at(bermanBrown.lime, temperatureK).gibbsEnergy.value;
    const change = lime + gasEnergy("CO2(g)", temperatureK) - calcite;
    return row({
      id: `berman-brown-calcite-log10-K-${temperatureK}-K`,
      ...cross,
      source: hillWinter,
      quantity: `log10 K of calcite = CaO + CO2 at ${temperatureK} K, by the berman-brown fits`,
      expected: Number((Math.log10(4.137e7 * 1.01325) - 20474 / (temperatureK * Math.LN10)).toFixed(4)),
      computed: -change / (gasConstant.value * temperatureK * Math.LN10),
      tolerance: Number((enthalpyUncertainty / (gasConstant.value * temperatureK * Math.LN10)).toFixed(3)),
    });
  });
}

/** Decomposition of portlandite by its five-term fit; lime of Berman (1988), water vapour of the reference data. */
function portlanditeRow(): AccuracyRow {
  const standardPressures = (T: number): number => gasConstant.value * T * Math.log(1.01325);
  const portlandite = (T: number): number => continued(mineral("portlandite"), T).gibbsEnergy.value;
  const change = (T: number): number =>
    portlandite(T) - at(bermanBrown.lime, T).gibbsEnergy.value - gasEnergy("H2O(g)", T) - standardPressures(T);
  return row({
    id: "five-term-portlandite-decomposition",
    ...cross,
    source: halsteadMoore,
    quantity: "temperature in K at which portlandite = CaO + H2O(g) at 1 atm, the fit continued beyond its 700 K",
    expected: 785.15, // 512 degrees Celsius
    computed: bisected(change, 600, 990),
    tolerance: 13, // 1.7 kJ/mol over an entropy of 134 J/mol/K
  });
}

/**
 * Half-width (95 per cent) of the enthalpy of either decomposition in J/mol, after Robie and Hemingway (1995), from
 * memory: 1.3 kJ/mol for the carbonate or hydroxide, 0.9 for lime, and 0.5 J/mol/K of entropy.
 */
const enthalpyUncertainty = 1700;

function gasEnergy(label: string, temperatureK: number): number {
  const record = findSpecies(referenceData, label);
  return standardProperties(record, { temperature: quantity(temperatureK, "K") }).gibbsEnergy.value;
}

import type { HeatCapacityForm, PublishedSeries } from "../../src/heat-capacity/published-series.js";
import type { Figure } from "../../src/quantity/figure.js";

/** A mineral of R. A. Robie, B. S. Hemingway, USGS Bulletin 2131 (1995). */
export interface Mineral {
  readonly name: string;
  /** Printed to 0.1 J/mol/K. */
  readonly heatCapacity298: number;
  readonly series: PublishedSeries;
}

const bulletin2131 = { text: "R. A. Robie, B. S. Hemingway, USGS Bulletin 2131 (1995)" };
const bulletin1452 = { text: "R. A. Robie, B. S. Hemingway, J. R. Fisher, USGS Bulletin 1452 (1978)" };
const berman1988 = { text: "R. G. Berman, J. Petrology 29, 445 (1988), Tables 2 and 3" };

type Figures = Omit<Figure, "value" | "unit">;

function seriesOf(
  form: HeatCapacityForm,
  to: number,
  coefficients: readonly number[],
  [enthalpy, entropy]: readonly [number, number],
  figures: Figures,
): PublishedSeries {
  return {
    kind: "series",
    form,
    intervals: [{ from: 298.15, to, coefficients, endsAt: "fit" }],
    anchor: {
      temperature: { value: 298.15, unit: "K", ...figures },
      enthalpy: { value: enthalpy, unit: "kJ/mol", ...figures },
      entropy: { value: entropy, unit: "J/mol/K", ...figures },
    },
  };
}

function fiveTerm(
  name: string,
  heatCapacity298: number,
  to: number,
  coefficients: readonly number[],
  anchor: readonly [number, number],
): Mineral {
  const figures = { source: bulletin2131, origin: "memory" } as const;
  return { name, heatCapacity298, series: seriesOf("five-term", to, coefficients, anchor, figures) };
}

/** From memory; enthalpies of formation and entropies at 298.15 K behind the coefficients. */
export const minerals: readonly Mineral[] = [
  fiveTerm("quartz", 44.6, 844, [81.145, 0.01828, -1.81e5, -698.46, 5.406e-6], [-910.7, 41.46]),
  fiveTerm("forsterite", 118.6, 1800, [87.36, 0.08717, -3.699e6, 843.6, -2.237e-5], [-2173, 94.1]),
  fiveTerm("calcite", 83.5, 1200, [99.715, 0.02692, -2.1576e6, 0, 0], [-1207.4, 91.7]),
  fiveTerm("magnesite", 76.1, 1000, [81.119, 0.052254, -1.832e6, 0, 0], [-1113.3, 65.1]),
  fiveTerm("dolomite", 157.5, 1000, [547.88, -0.16759, 2.84e6, -6547.9, 7.708e-5], [-2324.5, 155.2]),
  fiveTerm("andalusite", 122.6, 2000, [277.31, -0.006588, -1.9141e6, -2265.6, 0], [-2589.9, 91.4]),
  fiveTerm("kyanite", 121.6, 2000, [279.42, -0.007124, -2.0556e6, -2289.4, 0], [-2593.8, 82.8]),
  fiveTerm("halite", 50.5, 1073, [45.151, 0.017974, 0, 0, 0], [-411.3, 72.1]),
  fiveTerm("portlandite", 87.5, 700, [186.7, -0.02191, 0, -1600, 0], [-985.2, 83.4]),
];

/** The five-term fit of one of the minerals. */
export function mineral(name: string): PublishedSeries {
  const found = minerals.find((entry) => entry.name === name);
  if (found === undefined) throw new Error(`no mineral ${name}`);
  return found.series;
}

const corundumOf1978 = [157.36, 7.1899e-4, -1.8969e6, -988.04, 0];

/** Corundum of the older bulletin, in the same form. */
export const corundum: PublishedSeries = seriesOf("five-term", 1800, corundumOf1978, [-1675.7, 50.92], {
  source: bulletin1452,
  origin: "memory",
});

const berman: Figures = { source: berman1988, origin: "memory" };

/** Minerals of Berman (1988), from memory; the upper end of 1700 K is ours. */
export const bermanBrown = {
  corundum: seriesOf("berman-brown", 1700, [155.02, -828.4, -3.8614e6, 4.0908e8], [-1675.7, 50.82], berman),
  calcite: seriesOf("berman-brown", 1700, [178.19, -1657.7, -4.827e5, 1.666e8], [-1206.8193, 91.725], berman),
  lime: seriesOf("berman-brown", 1700, [58.79, -133.9, -1.1471e6, 1.0298e8], [-635.09, 37.75], berman),
  forsterite: seriesOf("berman-brown", 1700, [238.64, -2001.3, 0, -1.1624e8], [-2174.42, 94.01], berman),
  periclase: seriesOf("berman-brown", 1700, [61.11, -296.2, -6.212e5, 5.84e6], [-601.5, 26.951], berman),
} as const satisfies Record<string, PublishedSeries>;

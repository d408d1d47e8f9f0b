import fc from "fast-check";
import type { HeatCapacityForm, PublishedSeries } from "../../src/heat-capacity/published-series.js";
import type { Figure } from "../../src/quantity/figure.js";

export const invented = { text: "invented for a test" };

/** An invented figure. */
export function figure(value: number, unit: string): Figure {
  return { value, unit, source: invented, origin: "memory" };
}

/** A random temperature in kelvin with all bits of a double in use. */
export const temperaturesK: fc.Arbitrary<number> = fc.double({ min: 200, max: 3000, noNaN: true });

/** Ten printed digits, as tables have them, of either sign; now and then exactly zero. */
const mantissas: fc.Arbitrary<number> = fc.oneof(
  { weight: 9, arbitrary: fc.integer({ min: 1_000_000_000, max: 9_999_999_999 }) },
  { weight: 9, arbitrary: fc.integer({ min: -9_999_999_999, max: -1_000_000_000 }) },
  { weight: 2, arbitrary: fc.constant(0) },
);

/** Coefficients of c T^n whose terms are of one size about 1000 K, so that they cancel now and then. */
function coefficientsOf(exponents: readonly number[]): fc.Arbitrary<number[]> {
  return fc
    .tuple(...exponents.map(() => mantissas))
    .map((values) => values.map((value, index) => Number(`${value}e${Math.round(-9 - 3 * exponents[index]!)}`)));
}

const between = { from: 200, to: 3000, endsAt: "fit" } as const;

function seriesOf(
  form: HeatCapacityForm,
  exponents: readonly number[],
  rest: Partial<PublishedSeries>,
): fc.Arbitrary<PublishedSeries> {
  return coefficientsOf(exponents).map((coefficients) => ({
    kind: "series",
    form,
    ...rest,
    intervals: [{ ...between, coefficients }],
  }));
}

const anchors = fc
  .tuple(fc.integer({ min: 2000, max: 30_000 }), mantissas, mantissas)
  .map(([temperature, enthalpy, entropy]) => ({
    temperature: figure(temperature / 10, "K"),
    enthalpy: figure(enthalpy / 1e6, "J/mol"),
    entropy: figure(entropy / 1e9, "J/mol/K"),
  }));

const allPowers = [-9, -3, -2, -1.5, -1, -0.5, 0, 0.5, 1, 1.5, 2, 3, 4, 5, 7, 9.5, 20];

const polynomials = fc
  .tuple(fc.subarray(allPowers, { minLength: 1 }), anchors)
  .chain(([powers, anchor]) => seriesOf("polynomial", powers, { powers, anchor }));

const maierKelleys = fc
  .tuple(anchors, fc.constantFrom("J/mol/K" as const, "cal_th/mol/K" as const), fc.boolean())
  .chain(([anchor, unit, isShifted]) =>
    seriesOf("maier-kelley", isShifted ? [0, 0, -4] : [0, 1, -2], {
      anchor,
      unit,
      ...(isShifted ? { decimalShifts: [0, 3, -6] } : {}),
    }),
  );

/** An anchored form whose terms in Cp have these powers, in joules or calories. */
function anchoredForm(form: HeatCapacityForm, exponents: readonly number[]): fc.Arbitrary<PublishedSeries> {
  return fc
    .tuple(anchors, fc.constantFrom("J/mol/K" as const, "cal_th/mol/K" as const))
    .chain(([anchor, unit]) => seriesOf(form, exponents, { anchor, unit }));
}

const gibbsPowers = [-20, -9, -3, -1.5, -1, -0.5, 0.5, 1.5, 2, 3, 4, 5, 6, 7, 9.5, 20];

/** Coefficients of G are of the size of those of Cp times 1000 K; some as printed under a heading with powers of ten. */
const gibbsEnergies = fc
  .tuple(fc.oneof(fc.constant([2, 3, -1]), fc.subarray(gibbsPowers)), fc.boolean())
  .chain(([powers, isShifted]) => {
    const shifts = powers.map((n) => (isShifted ? Math.min(30, Math.max(-30, Math.round(3 * (n - 1)))) : 0));
    const printed = powers.map((n, index) => n - 1 - shifts[index]! / 3);
    const decimalShifts = isShifted ? { decimalShifts: [0, 0, 0, ...shifts] } : {};
    return seriesOf("gibbs-energy", [-1, 0, 0, ...printed], { powers, ...decimalShifts });
  });

/** Random fits of each form over one interval from 200 K to 3000 K. */
export const randomSeries: Readonly<Record<HeatCapacityForm, fc.Arbitrary<PublishedSeries>>> = {
  shomate: seriesOf("shomate", [0, 0, 0, 0, 0, 0, 0], {}),
  "seven-coefficient": seriesOf("seven-coefficient", [0, 1, 2, 3, 4, -1, 0], { gasConstant: 8.31451 }),
  "nine-coefficient": seriesOf("nine-coefficient", [-2, -1, 0, 1, 2, 3, 4, -1, 0], { gasConstant: 8.31451 }),
  "gibbs-energy": gibbsEnergies,
  "maier-kelley": maierKelleys,
  "berman-brown": anchoredForm("berman-brown", [0, -0.5, -2, -3]),
  "five-term": anchoredForm("five-term", [0, 1, -2, -0.5, 2]),
  "haas-fisher": anchoredForm("haas-fisher", [0, 1, -2, 2, -0.5]),
  polynomial: polynomials,
};

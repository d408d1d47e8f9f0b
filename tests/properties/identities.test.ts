import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { gasConstantJPerMolK } from "../../src/constants/constants.js";
import { CaCO3_cr_calcite, CaO_cr, CO2_g, referenceData } from "../../src/data/index.js";
import { gasComponentOf } from "../../src/fugacity/gas-component-of.js";
import { idealGas } from "../../src/fugacity/ideal-gas.js";
import { virial } from "../../src/fugacity/virial.js";
import { volumeWork } from "../../src/fugacity/volume-work.js";
import { seriesProperties } from "../../src/heat-capacity/series-properties.js";
import {
  ledger,
  type ReactionConditions,
  reaction,
  reactionGibbsEnergy,
  standardReactionGibbsEnergy,
} from "../../src/reaction/index.js";
import { standardProperties } from "../../src/species/standard-properties.js";
import { figure, randomSeries, temperaturesK } from "../heat-capacity/random-series.js";
import { recordOf } from "../species/records.js";
import { referenceStates } from "./reference-states.js";

const runs = { seed: 20261201, numRuns: 600 };
const anyForm = fc.oneof(...Object.values(randomSeries));

/** Derivative by central differences of fourth order. */
function slope(f: (x: number) => number, x: number, step: number): number {
  return (8 * (f(x + step) - f(x - step)) - (f(x + 2 * step) - f(x - 2 * step))) / (12 * step);
}

describe("random fits of every form", () => {
  /** Properties as functions of T, and an allowance for the noise and the truncation of a difference quotient. */
  const functions = (series: Parameters<typeof seriesProperties>[0]) => {
    const at = (value: number) => seriesProperties(series, { temperature: { value, unit: "K" } });
    const bounds = (temperatureK: number) => at(temperatureK).roundingBounds;
    return { at, bounds };
  };
  const within = fc.double({ min: 250, max: 2700, noNaN: true });
  const relativeStep = 1e-3;

  /**
   * Of f = sum of terms, a difference quotient with step h errs by the rounding of f over h and by h^4 f''''' / 30;
   * with powers from -21 to 21 the latter is at most (21..25) h^4/(30 T^5) of the absolute terms, 6.4e6/30 1e-12 / T.
   */
  const allowed = (bound: number, temperatureK: number): number =>
    (bound / temperatureK) * (1 / relativeStep) + ((bound / (4 * Number.EPSILON)) * 3e-7) / temperatureK;

  test("dG/dT = -S", () => {
    fc.assert(
      fc.property(anyForm, within, (series, temperatureK) => {
        const { at, bounds } = functions(series);
        const derivative = slope((value) => at(value).gibbsEnergy.value, temperatureK, relativeStep * temperatureK);
        const error = Math.abs(derivative + at(temperatureK).entropy.value);
        expect(error).toBeLessThanOrEqual(allowed(bounds(temperatureK).gibbsEnergy, temperatureK));
      }),
      runs,
    );
  });

  test("dH/dT = Cp", () => {
    fc.assert(
      fc.property(anyForm, within, (series, temperatureK) => {
        const { at, bounds } = functions(series);
        const derivative = slope((value) => at(value).enthalpy.value, temperatureK, relativeStep * temperatureK);
        const error = Math.abs(derivative - at(temperatureK).heatCapacity.value);
        expect(error).toBeLessThanOrEqual(allowed(bounds(temperatureK).enthalpy, temperatureK));
      }),
      runs,
    );
  });

  test("dS/dT = Cp/T", () => {
    fc.assert(
      fc.property(anyForm, within, (series, temperatureK) => {
        const { at, bounds } = functions(series);
        const derivative = slope((value) => at(value).entropy.value, temperatureK, relativeStep * temperatureK);
        const error = Math.abs(derivative - at(temperatureK).heatCapacity.value / temperatureK);
        expect(error).toBeLessThanOrEqual(allowed(bounds(temperatureK).entropy, temperatureK));
      }),
      runs,
    );
  });

  test("d(G/T)/d(1/T) = H", () => {
    fc.assert(
      fc.property(anyForm, within, (series, temperatureK) => {
        const { at, bounds } = functions(series);
        const reciprocal = 1 / temperatureK;
        const derivative = slope((x) => at(1 / x).gibbsEnergy.value * x, reciprocal, relativeStep * reciprocal);
        const error = Math.abs(derivative - at(temperatureK).enthalpy.value);
        expect(error).toBeLessThanOrEqual(2 * temperatureK * allowed(bounds(temperatureK).gibbsEnergy, temperatureK));
      }),
      runs,
    );
  });

  test("H - G = T S", () => {
    fc.assert(
      fc.property(anyForm, temperaturesK, (series, temperatureK) => {
        const { enthalpy, gibbsEnergy, entropy, roundingBounds } = functions(series).at(temperatureK);
        const error = Math.abs(enthalpy.value - gibbsEnergy.value - temperatureK * entropy.value);
        const { enthalpy: ofH, gibbsEnergy: ofG, entropy: ofS } = roundingBounds;
        expect(error).toBeLessThanOrEqual(ofH + ofG + 2 * temperatureK * ofS);
      }),
      runs,
    );
  });
});

test("G of a pure phase falls with temperature and is concave", () => {
  fc.assert(
    fc.property(
      fc.constantFrom(...referenceData.species.filter(({ gibbsFunction }) => gibbsFunction.kind !== "reference-point")),
      fc.double({ min: 310, max: 1190, noNaN: true }),
      fc.double({ min: 0.5, max: 10, noNaN: true }),
      (record, temperatureK, step) => {
        const at = (value: number): number =>
          standardProperties(record, { temperature: { value, unit: "K" }, outsideRange: "constant-heat-capacity" })
            .gibbsEnergy.value;
        const [below, here, above] = [temperatureK - step, temperatureK, temperatureK + step].map(at) as [
          number,
          number,
          number,
        ];
        expect(above).toBeLessThan(here);
        expect(below + above).toBeLessThan(2 * here);
      },
    ),
    { seed: 20261202, numRuns: 1000 },
  );
});

describe("pressure", () => {
  const calcination = reaction("CaCO3(s) = CaO(s) + CO2", referenceData);
  const pure = { "CO2(g)": 1 };
  const conditionsAt = (temperatureK: number, pressurePa: number, rest: object = {}): ReactionConditions => ({
    temperature: { value: temperatureK, unit: "K" },
    pressure: { value: pressurePa, unit: "Pa" },
    gas: { moleFractions: pure, ...rest },
  });

  test("of an ideal gas: G(p) - G(1 bar) = RT ln(p / 1 bar) per mole of gas", () => {
    const synthesis = reaction("N2 + 3 H2 = 2 NH3", referenceData);
    fc.assert(
      fc.property(
        fc.double({ min: 300, max: 2000, noNaN: true }),
        fc.double({ min: -10, max: 10, noNaN: true }),
        (temperatureK, lnP) => {
          const at = (pressurePa: number): number =>
            reactionGibbsEnergy(synthesis, {
              ...conditionsAt(temperatureK, pressurePa),
              gas: { moleFractions: { "N2(g)": 0.25, "H2(g)": 0.5, "NH3(g)": 0.25 } },
            }).value;
          const pressurePa = 1e5 * Math.exp(lnP);
          const expected = -2 * gasConstantJPerMolK * temperatureK * Math.log(pressurePa / 1e5);
          expect(Math.abs(at(pressurePa) - at(1e5) - expected)).toBeLessThan(
            1e-15 * (Math.abs(at(1e5)) + Math.abs(expected)) * 8 + 1e-9,
          );
        },
      ),
      runs,
    );
  });

  test.each([
    ["ideal gas", idealGas()],
    ["virial", virial()],
  ])("dG/dp = V, %s with condensed phases", (_name, equationOfState) => {
    fc.assert(
      fc.property(
        fc.double({ min: 400, max: 1190, noNaN: true }),
        fc.double({ min: 11, max: 14, noNaN: true }),
        (temperatureK, lnPa) => {
          const pressurePa = Math.exp(lnPa);
          const energy = (value: number): number =>
            reactionGibbsEnergy(calcination, conditionsAt(temperatureK, value, { equationOfState })).value;
          const step = 1e-3 * pressurePa;
          const gas = equationOfState.mixture([gasComponentOf(CO2_g)]).state(temperatureK, pressurePa, [1]).molarVolume;
          const work = (record: typeof CaO_cr): number =>
            (volumeWork(record, temperatureK, pressurePa + step)! -
              volumeWork(record, temperatureK, pressurePa - step)!) /
            (2 * step);
          const volume = gas + work(CaO_cr) - work(CaCO3_cr_calcite);
          // RT ln p is differenced with an error of h^4 / (5 p^5); G of 1e6 J/mol carries 1e-9 J/mol of rounding.
          expect(Math.abs(slope(energy, pressurePa, step) - volume)).toBeLessThan(1e-9 * volume + 4e-9 / step);
        },
      ),
      { ...runs, numRuns: 300 },
    );
  });

  test("dV-work/dp = V of a condensed phase, with expansion and compressibility", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1, max: 100, noNaN: true }),
        fc.double({ min: 0, max: 1e-4, noNaN: true }),
        fc.double({ min: 0, max: 1e-10, noNaN: true }),
        fc.double({ min: 200, max: 2000, noNaN: true }),
        fc.double({ min: 1e6, max: 1e9, noNaN: true }),
        (molar, expansion, compressibility, temperatureK, pressurePa) => {
          const record = recordOf("W(cr)", {
            volume: {
              molar: figure(molar, "cm3/mol"),
              thermalExpansion: figure(expansion, "K-1"),
              compressibility: figure(compressibility, "Pa-1"),
            },
          });
          const volume =
            molar * 1e-6 * (1 + expansion * (temperatureK - 298.15)) * (1 - compressibility * (pressurePa - 1e5));
          const derivative = slope((p) => volumeWork(record, temperatureK, p)!, pressurePa, 1e-2 * pressurePa);
          expect(Math.abs(derivative - volume)).toBeLessThan(1e-12 * molar * 1e-6 * 20);
        },
      ),
      runs,
    );
  });
});

test("the total of a ledger equals the direct route within 1e-12 of its largest entry", () => {
  fc.assert(
    fc.property(referenceStates, ({ subject, conditions }) => {
      const account = ledger(subject, conditions);
      const largest = Math.max(...account.entries.map(({ value }) => Math.abs(value.value)));
      expect(Math.abs(account.total.value - account.directGibbsEnergy.value)).toBeLessThanOrEqual(1e-12 * largest);
      expect(account.directGibbsEnergy.value).toBe(reactionGibbsEnergy(subject, conditions).value);
    }),
    { seed: 20261203, numRuns: 2000 },
  );
});

test("G at conditions less the standard G is RT ln Q", () => {
  fc.assert(
    fc.property(referenceStates, ({ subject, conditions }) => {
      const { lnReactionQuotient, directGibbsEnergy, temperature } = ledger(subject, conditions);
      const { outsideRange } = conditions;
      const standard = standardReactionGibbsEnergy(subject, {
        temperature,
        ...(outsideRange === undefined ? {} : { outsideRange }),
      });
      const expected = standard.value + gasConstantJPerMolK * temperature.value * lnReactionQuotient;
      expect(directGibbsEnergy.value).toBe(expected);
    }),
    { seed: 20261204, numRuns: 500 },
  );
});

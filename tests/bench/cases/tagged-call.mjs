import { convert, quantity, standardReactionGibbsEnergy } from "gibbs-ledger";
import { log } from "../../../dist/numeric/log.js";
import { mergedCoefficients, temperaturesK, waterGasShift } from "../water-gas-shift.mjs";

export const note =
  "standardReactionGibbsEnergy, four units mixed, results kept; reference: the same operations on raw doubles";

const units = ["K", "Cel", "[degF]", "[degR]"];

export function prepare() {
  const temperatures = temperaturesK.map((value, index) => convert(quantity(value, "K"), units[index % 4]));
  const values = temperatures.map(({ value }) => value);
  const scales = temperatures.map(({ unit }) => units.indexOf(unit));
  return {
    perCall: temperatures.length,
    subject() {
      const results = new Array(temperatures.length);
      for (let index = 0; index < temperatures.length; index += 1) {
        results[index] = standardReactionGibbsEnergy(waterGasShift, { temperature: temperatures[index] });
      }
      return results[3].value + results[198].value;
    },
    reference() {
      const results = new Array(temperatures.length);
      for (let index = 0; index < values.length; index += 1) {
        results[index] = gibbsEnergy(kelvinOf(values[index], scales[index]));
      }
      return results[3] + results[198];
    },
  };
}

/** Kelvin from a raw double on a scale by number, rounded as the library rounds it. */
function kelvinOf(value, scale) {
  switch (scale) {
    case 0:
      return value;
    case 1: {
      const sum = value + 273.15;
      const back = sum - value;
      return sum + (value - (sum - back) + (273.15 - back) + 2.2737367544323207e-14);
    }
    case 2:
      return ninths(value, 459.67, -1.5916157281026246e-14);
    default:
      return ninths(value, 0, 0);
  }
}

function ninths(value, zero, zeroLow) {
  const sum = value + zero;
  const back = sum - value;
  const quotient = sum * (5 / 9);
  const remainder = 4 * sum - 8 * quotient + (sum - quotient);
  return quotient + (remainder + 5 * (value - (sum - back) + (zero - back) + zeroLow)) * (1 / 9);
}

const [below, above] = mergedCoefficients.map(([a1, a2, a3, a4, a5, a6, a7, a8, a9]) => ({
  constant: a2 + a8,
  linear: a3 - a9,
  square: -a4 / 2,
  cube: -a5 / 6,
  fourth: -a6 / 12,
  fifth: -a7 / 20,
  inverse: -a1 / 2,
  inverseSquare: 0,
  logarithm: a2,
  linearLogarithm: -a3,
}));

/** The same operations in the same order as the library's evaluation of a merged series. */
function gibbsEnergy(t) {
  const c = t <= 1000 ? below : above;
  const r = 1 / t;
  return (
    log(t) * (c.logarithm + t * c.linearLogarithm) +
    (c.constant +
      t * (c.linear + t * (c.square + t * (c.cube + t * (c.fourth + t * c.fifth)))) +
      r * (c.inverse + r * c.inverseSquare))
  );
}

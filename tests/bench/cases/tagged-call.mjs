import { convert, quantity, standardReactionGibbsEnergy } from "gibbs-ledger";
import { log } from "../../../dist/numeric/log.js";
import { mergedCoefficients, temperaturesK, waterGasShift } from "../water-gas-shift.mjs";

export const note = "standardReactionGibbsEnergy, four units mixed; reference: the same sum on kelvin doubles";

export function prepare() {
  const units = ["K", "Cel", "[degF]", "[degR]"];
  const temperatures = temperaturesK.map((value, index) => convert(quantity(value, "K"), units[index % 4]));
  const results = new Array(temperatures.length).fill(undefined);
  const referenceResults = new Array(temperatures.length).fill(0);
  return {
    perCall: temperatures.length,
    subject() {
      for (let index = 0; index < temperatures.length; index += 1) {
        results[index] = standardReactionGibbsEnergy(waterGasShift, { temperature: temperatures[index] });
      }
      return results[3].value + results[998].value;
    },
    reference() {
      for (let index = 0; index < temperaturesK.length; index += 1) {
        referenceResults[index] = gibbsEnergy(temperaturesK[index]);
      }
      return referenceResults[3] + referenceResults[998];
    },
  };
}

const [below, above] = mergedCoefficients.map(([a1, a2, a3, a4, a5, a6, a7, a8, a9]) => ({
  inverse: -a1 / 2,
  constant: a2 + a8,
  logarithm: a2,
  linear: a3 - a9,
  linearLogarithm: -a3,
  square: -a4 / 2,
  cube: -a5 / 6,
  fourth: -a6 / 12,
  fifth: -a7 / 20,
}));

function gibbsEnergy(temperature) {
  const c = temperature <= 1000 ? below : above;
  const lnT = log(temperature);
  const higher = temperature * (c.cube + temperature * (c.fourth + temperature * c.fifth));
  const powers = temperature * (c.linear + c.linearLogarithm * lnT + temperature * (c.square + higher));
  return c.constant + c.logarithm * lnT + powers + c.inverse / temperature;
}

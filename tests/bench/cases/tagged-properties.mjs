import { quantity, standardReactionProperties } from "gibbs-ledger";
import { log } from "../../../dist/numeric/log.js";
import { mergedCoefficients, temperaturesK, waterGasShift } from "../water-gas-shift.mjs";

export const note = "standardReactionProperties; reference: the same four sums and logarithms on kelvin doubles";

const gasConstant = 8.31446261815324;

export function prepare() {
  const temperatures = temperaturesK.map((value) => quantity(value, "K"));
  const results = new Array(temperatures.length).fill(undefined);
  const referenceResults = new Array(temperatures.length).fill(undefined);
  return {
    perCall: temperatures.length,
    subject() {
      for (let index = 0; index < temperatures.length; index += 1) {
        results[index] = standardReactionProperties(waterGasShift, { temperature: temperatures[index] });
      }
      return results[3].entropy.value + results[198].log10K;
    },
    reference() {
      for (let index = 0; index < temperaturesK.length; index += 1) {
        referenceResults[index] = properties(temperaturesK[index]);
      }
      return referenceResults[3].entropy + referenceResults[198].log10K;
    },
  };
}

function properties(temperature) {
  const [a1, a2, a3, a4, a5, a6, a7, a8, a9] = mergedCoefficients[temperature <= 1000 ? 0 : 1];
  const lnT = log(temperature);
  const inverse = 1 / temperature;
  const t2 = temperature * temperature;
  const t3 = t2 * temperature;
  const t4 = t2 * t2;
  const heatCapacity = (a1 * inverse + a2) * inverse + a3 + a4 * temperature + a5 * t2 + a6 * t3 + a7 * t4;
  const sensible = a3 + (a4 / 2) * temperature + (a5 / 3) * t2 + (a6 / 4) * t3 + (a7 / 5) * t4;
  const enthalpy = -a1 * inverse + a2 * lnT + temperature * sensible + a8;
  const entropyOfPowers = a4 * temperature + (a5 / 2) * t2 + (a6 / 3) * t3 + (a7 / 4) * t4;
  const entropy = (-(a1 / 2) * inverse - a2) * inverse + a3 * lnT + entropyOfPowers + a9;
  const gibbsEnergy = enthalpy - temperature * entropy;
  const lnK = -gibbsEnergy / (gasConstant * temperature);
  return { heatCapacity, enthalpy, entropy, gibbsEnergy, lnK, log10K: lnK * Math.LOG10E };
}

import { compileReaction } from "gibbs-ledger/compiled";
import { speciesParts, waterGasShift } from "../water-gas-shift.mjs";

export const note =
  "1e6 rising temperatures by compileReaction; reference: a loop over species with Math.log, Math.pow";

export function prepare() {
  const length = 1e6;
  const stride = 1000;
  const temperaturesK = Float64Array.from({ length }, (_, index) => 300 + index * 0.0017);
  const out = new Float64Array(length);
  // The reference takes every thousandth temperature, over the same range: a full round of it would take seconds.
  const someK = temperaturesK.filter((_, index) => index % stride === 0);
  const someOut = new Float64Array(someK.length);
  const compiled = compileReaction(waterGasShift);
  return {
    perCall: length,
    referencePerCall: someK.length,
    subject() {
      compiled.gibbsEnergy(temperaturesK, out);
      return out[17 * stride] + out[900 * stride];
    },
    reference() {
      for (let index = 0; index < someK.length; index += 1) someOut[index] = gibbsEnergy(someK[index]);
      return someOut[17] + someOut[900];
    },
  };
}

function gibbsEnergy(temperature) {
  let sum = 0;
  for (const { coefficient, gasConstant, intervals } of speciesParts) {
    const { coefficients: a } = intervals.find(({ to }) => temperature <= to);
    const enthalpy =
      -a[0] * Math.pow(temperature, -1) +
      a[1] * Math.log(temperature) +
      a[2] * temperature +
      (a[3] / 2) * Math.pow(temperature, 2) +
      (a[4] / 3) * Math.pow(temperature, 3) +
      (a[5] / 4) * Math.pow(temperature, 4) +
      (a[6] / 5) * Math.pow(temperature, 5) +
      a[7];
    const entropy =
      (-a[0] / 2) * Math.pow(temperature, -2) -
      a[1] * Math.pow(temperature, -1) +
      a[2] * Math.log(temperature) +
      a[3] * temperature +
      (a[4] / 2) * Math.pow(temperature, 2) +
      (a[5] / 3) * Math.pow(temperature, 3) +
      (a[6] / 4) * Math.pow(temperature, 4) +
      a[8];
    sum += coefficient * gasConstant * (enthalpy - temperature * entropy);
  }
  return sum;
}

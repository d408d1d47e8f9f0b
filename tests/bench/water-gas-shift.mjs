// The reaction of the cases, CO + H2O = CO2 + H2, and its arithmetic written out by hand for the references: nine
// printed coefficients an interval, Cp/R = a1/T^2 + a2/T + a3 + a4 T + a5 T^2 + a6 T^3 + a7 T^4.
import { reaction } from "gibbs-ledger";
import { CO_g, CO2_g, H2_g, H2O_g } from "gibbs-ledger/data";

const parts = [
  [-1, CO_g],
  [-1, H2O_g],
  [1, CO2_g],
  [1, H2_g],
];

export const waterGasShift = reaction("CO(g) + H2O(g) = CO2(g) + H2(g)", {
  species: parts.map(([, record]) => record),
});

/** Stoichiometric numbers with the printed intervals and coefficients. */
export const speciesParts = parts.map(([coefficient, { gibbsFunction }]) => ({
  coefficient,
  gasConstant: gibbsFunction.gasConstant,
  intervals: gibbsFunction.intervals,
}));

/** Gibbs-energy coefficients of the reaction in J/mol and its powers of T, summed over species: below, above 1000 K. */
export const mergedCoefficients = [0, 1].map((index) => {
  const sums = new Array(9).fill(0);
  for (const { coefficient, gasConstant, intervals } of speciesParts) {
    if (intervals[0].to !== 1000) throw new Error("the references break at 1000 K");
    intervals[index].coefficients.forEach((value, position) => {
      sums[position] += coefficient * gasConstant * value;
    });
  }
  return sums;
});

/** 200 temperatures in kelvin from 298 K to 2000 K, in an order that jumps. */
export const temperaturesK = Array.from({ length: 200 }, (_, index) => 298.15 + ((index * 37) % 200) * 8.5);

import { Decimal } from "decimal.js";
import { exactDecimal, neighbour } from "../numeric/ulp.js";

/** 60 digits are asked for; in the tail of the middle branch up to 10 are lost. */
const P: typeof Decimal = Decimal.clone({ precision: 80, toExpNeg: -9e15, toExpPos: 9e15 });
const inverseRootOfTwoPi = new P(1).div(P.acos(-1).times(2).sqrt());

/** The distance of a quantile from the exact one of a probability, in units in the last place of the quantile. */
export function quantileErrorInUlp(quantile: number, probability: Decimal): number {
  const z = exactDecimal(Math.abs(quantile));
  const density = new P(z).times(z).div(-2).exp().times(inverseRootOfTwoPi);
  const p = new P(probability);
  const tail = p.lt(0.5) ? p : new P(1).minus(p);
  const distance = upperTail(new P(z), density).minus(tail).div(density).abs();
  return distance.div(neighbour(Math.abs(quantile), 1) - Math.abs(quantile)).toNumber();
}

/** 1 - Phi(z): by the series of odd powers up to z = 6, above by Laplace's continued fraction with 400 terms. */
function upperTail(z: Decimal, density: Decimal): Decimal {
  if (z.lt(6)) {
    let term = z;
    let sum = z;
    for (let odd = 3; term.gt(sum.times(1e-75)); odd += 2) {
      term = term.times(z).times(z).div(odd);
      sum = sum.plus(term);
    }
    return new P(0.5).minus(density.times(sum));
  }
  let rest = z;
  for (let term = 400; term > 0; term -= 1) rest = z.plus(new P(term).div(rest));
  return density.div(rest);
}

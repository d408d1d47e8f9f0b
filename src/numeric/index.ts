export {
  type CompensatedPair,
  exactDot,
  exactSum,
  twoProduct,
  twoSum,
} from "./compensated.js";
export { lnDecimal, sqrtDecimal } from "./decimal-functions.js";
export { divideDecimals } from "./divide-decimals.js";
export {
  addDecimals,
  compareDecimals,
  decimalOf,
  decimalRatioToNumber,
  decimalToNumber,
  decimalToString,
  type ExactDecimal,
  exactDecimalOfDouble,
  multiplyDecimals,
  negateDecimal,
  powerOfTen,
  roundRatio,
  scaleDecimal,
  subtractDecimals,
} from "./exact-decimal.js";
export { exp } from "./exp.js";
export { expm1 } from "./expm1.js";
export { log } from "./log.js";
export { log1p } from "./log1p.js";
export { log10 } from "./log10.js";
export { power } from "./power.js";
export {
  addRationals,
  compareRationals,
  divideRationals,
  isZeroRational,
  multiplyRationals,
  negateRational,
  parseRational,
  type Rational,
  rational,
  rationalOfDecimal,
  rationalToNumber,
  rationalToString,
} from "./rational.js";
export { findRoot } from "./root.js";

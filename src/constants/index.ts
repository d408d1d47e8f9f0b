export {
  type FaradayConstantYear,
  faradayConstantByAdjustment,
  type GasConstantYear,
  gasConstantByAdjustment,
} from "./codata-adjustments.js";
export type { Constant } from "./constant.js";
export {
  atmospherePa,
  avogadroConstant,
  boltzmannConstant,
  elementaryCharge,
  faradayConstant,
  faradayConstantCPerMol,
  gasConstant,
  gasConstantJPerMolK,
  planckConstant,
  referenceTemperature,
  referenceTemperatureK,
  speedOfLight,
  standardAtmosphere,
  standardPressure,
  standardPressurePa,
  thermochemicalCalorie,
  thermochemicalCalorieJ,
  zeroCelsius,
  zeroCelsiusK,
} from "./constants.js";

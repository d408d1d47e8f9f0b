export {
  type DigitsConditions,
  evaluateToDigits,
  type PreciseReactionProperties,
  type PreciseValue,
} from "./evaluate-to-digits.js";

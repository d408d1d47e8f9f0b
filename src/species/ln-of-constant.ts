import { gasConstantJPerMolK } from "../constants/constants.js";

/** ln K = -G / RT, G in J/mol. */
export function lnOfConstant(gibbsEnergy: number, temperatureK: number): number {
  return -gibbsEnergy / (gasConstantJPerMolK * temperatureK) + 0;
}

/** 1 / ln 10 */
export const log10OfE: number = Math.LOG10E;

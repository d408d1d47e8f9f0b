import type { Fault } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import type { Formula } from "./formula.js";
import { type FormulaRead, readFormula } from "./read-formula.js";

/** Reads a formula that is given as text or as the plain data of one; of the data the text decides. */
export function readGivenFormula(given: Formula | string): FormulaRead {
  const faults: Fault[] = [];
  const read = isData(given) ? readFormula(given.text, ["text"], faults) : readFormula(given, [], faults);
  failIfAny(faults);
  return read as FormulaRead;
}

function isData(given: Formula | string): given is Formula {
  return typeof given === "object" && given !== null;
}

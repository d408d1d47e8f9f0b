export { type FaultCode, faultCodes } from "./codes.js";
export type { Fault, FaultPath } from "./fault.js";
export { GibbsLedgerError, isGibbsLedgerError, toFaults } from "./gibbs-ledger-error.js";

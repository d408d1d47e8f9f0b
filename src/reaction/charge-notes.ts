import { exactDot } from "../numeric/compensated.js";
import type { SpeciesRecord } from "../species/record.js";

/** Net charge over the charge of either sign that still counts as none: the rounding of printed molalities. */
const chargeTolerance = 1e-6;

/**
 * A note where the charges of a solution do not balance, |sum of z m| > 1e-6 sum of |z| m. It is no fault: an ion may
 * have been left to `activities`, or a spectator be of no interest.
 */
export function chargeNotes(solutes: readonly SpeciesRecord[], molalities: readonly number[]): readonly string[] {
  const charges = solutes.map(({ chargeNumber }) => chargeNumber);
  const net = exactDot(charges, molalities);
  const gross = exactDot(charges.map(Math.abs), molalities);
  if (!(Math.abs(net) > chargeTolerance * gross)) return [];
  const [positive, negative] = [(gross + net) / 2, (gross - net) / 2].map((value) => Number(value.toPrecision(6)));
  return [
    `the charges of the solution do not balance: ${positive} mol/kg of positive and ${negative} mol/kg of negative charge`,
  ];
}

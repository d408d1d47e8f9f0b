import { describeReceived } from "../errors/fault.js";
import { fail } from "../errors/gibbs-ledger-error.js";
import { centralQuantile } from "./central-quantile.js";

/**
 * The number z that a standard normal variable falls below with a given probability: Phi(z) = p.
 *
 * @param probability - above 0 and below 1
 * @returns from -38.5 to 8.3; exactly 0 at 1/2, and exactly opposite at p and 1 - p where both are doubles
 * @throws GibbsLedgerError "numeric/outside-domain"
 * @remarks Accuracy: within 3 ulp (2.2 at worst in 24,000 random and constructed cases against 60 digits).
 * @see `references.abramowitz1964`, 26.2.11 and 26.2.14
 * @example
 * normalQuantile(0.975); // => 1.9599639845400...
 * normalQuantile(0.5); // => 0
 */
export function normalQuantile(probability: number): number {
  if (!(typeof probability === "number" && probability > 0 && probability < 1)) {
    fail({
      code: "numeric/outside-domain",
      path: ["probability"],
      message: `expected a probability above 0 and below 1, got ${describeReceived(probability)}`,
      received: describeReceived(probability),
      expected: "a number above 0 and below 1",
    });
  }
  if (probability === 0.5) return 0;
  return probability < 0.5
    ? -centralQuantile(1 - 2 * probability, 2 * probability)
    : centralQuantile(2 * probability - 1, 2 * (1 - probability));
}

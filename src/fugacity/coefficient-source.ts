import type { Fault, FaultPath } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import type { GasComponent } from "./equation-of-state.js";
import type { CompleteConstants } from "./pair-constants.js";
import { refuseBareLabels } from "./refuse-bare-labels.js";
import { callersCoefficients, correlationCoefficients, type VirialCoefficientSource } from "./virial-coefficients.js";
import type { VirialSettings } from "./virial-options.js";

/**
 * Where the virial equation gets its coefficients from for given, checked components.
 *
 * @param constants - of each component, completed as far as they are known
 * @throws GibbsLedgerError "fugacity/missing-critical-constants" for every component that lacks them,
 * "conditions/unknown-label"
 */
export function coefficientSource(
  settings: VirialSettings,
  components: readonly GasComponent[],
  constants: readonly (CompleteConstants | undefined)[],
  path: FaultPath,
): VirialCoefficientSource {
  const { secondVirialCoefficient, binaryInteraction, polar } = settings;
  const labels = components.map(({ label }) => label);
  if (secondVirialCoefficient !== undefined) return callersCoefficients(secondVirialCoefficient, labels, path);
  const faults: Fault[] = [];
  components.forEach(({ label, critical }, index) => {
    if (constants[index] === undefined) faults.push(missingConstants(label, critical, path));
  });
  refuseBareLabels({ binaryInteraction, polar }, labels, faults);
  failIfAny(faults);
  return correlationCoefficients(settings, labels, constants as readonly CompleteConstants[]);
}

function missingConstants(label: string, critical: GasComponent["critical"], path: FaultPath): Fault {
  const missing = critical === undefined ? "critical constants" : "an acentric factor";
  return {
    code: "fugacity/missing-critical-constants",
    path: [...path, label],
    message: `${label} lacks ${missing}, which the correlation of the second virial coefficient needs`,
    expected: "critical temperature, critical pressure and acentric factor",
    hint: "add them to the record, or give secondVirialCoefficient, or use idealGas()",
  };
}

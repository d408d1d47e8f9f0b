import type { Fault } from "../errors/fault.js";
import type { VirialSettings } from "./virial-options.js";

/**
 * Finds parameters that stand under a bare formula, such as `N2`, where a component of the mixture is `N2(g)`: they
 * would be passed over in silence. Other labels that are not in the mixture are allowed, so that one set of
 * parameters serves many mixtures. Collects "conditions/unknown-label".
 */
export function refuseBareLabels(
  { binaryInteraction, polar }: Pick<VirialSettings, "binaryInteraction" | "polar">,
  labels: readonly string[],
  faults: Fault[],
): void {
  const inner = Object.values(binaryInteraction).flatMap((row) => Object.keys(row));
  report("binaryInteraction", new Set([...Object.keys(binaryInteraction), ...inner]), labels, faults);
  report("polar", new Set(Object.keys(polar)), labels, faults);
}

function report(option: string, given: ReadonlySet<string>, labels: readonly string[], faults: Fault[]): void {
  for (const bare of given) {
    if (labels.includes(bare)) continue;
    const label = labels.find((candidate) => candidate.startsWith(`${bare}(`));
    if (label === undefined) continue;
    faults.push({
      code: "conditions/unknown-label",
      path: ["options", option, bare],
      message: `${bare} is no label of a component`,
      received: bare,
      expected: labels.join(", "),
      hint: `did you mean "${label}"?`,
    });
  }
}

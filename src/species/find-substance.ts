import { describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import { collectSpecies } from "./collection.js";
import { indexOf, partsOf, recordOfLabel } from "./collection-index.js";
import { electronOf, hydrogenLabel } from "./house-substance.js";
import type { CollectionData } from "./record.js";
import { collectSequence, sequencesGiven } from "./sequences.js";
import { electronLabel, type StableSequence, type Substance } from "./substance.js";

/**
 * What a name in an equation stands for: the electron, a species of the collection, or one of its stable sequences
 * (`Fe(cr)`, and `Fe(s)` for it). Collects the faults; undefined after one.
 */
export function collectSubstance(
  collection: CollectionData,
  name: unknown,
  path: FaultPath,
  faults: Fault[],
): Substance | undefined {
  if (typeof name !== "string") return collectSpecies(collection, name, path, faults);
  if (electronNames.includes(name)) return collectElectron(collection, path, faults);
  if (electronSlips.includes(name)) {
    faults.push({
      code: "species/not-found",
      path,
      message: `there is no species ${describeReceived(name)}`,
      received: name,
      expected: electronLabel,
      hint: `the electron is written ${electronLabel}`,
    });
    return undefined;
  }
  if (indexOf(collection).byLabel.has(name)) return collectSpecies(collection, name, path, faults);
  const before = faults.length;
  const sequence = sequenceNamed(collection, name, faults);
  return sequence !== undefined || faults.length > before ? sequence : collectSpecies(collection, name, path, faults);
}

const electronNames: readonly string[] = [electronLabel, "e⁻", "e^−"];

/** What is written for the electron by mistake. */
const electronSlips: readonly string[] = ["e", "e-", "e−"];

function collectElectron(collection: CollectionData, path: FaultPath, faults: Fault[]): Substance | undefined {
  const hydrogen = recordOfLabel(collection, hydrogenLabel);
  if (hydrogen !== undefined) return electronOf(hydrogen);
  faults.push({
    code: "species/not-found",
    path,
    message: `the electron is resolved through ${hydrogenLabel}, which the collection does not hold`,
    received: electronLabel,
    expected: `a collection with ${hydrogenLabel}`,
  });
  return undefined;
}

/** Sequences with a state; those without are references of elements and named in no equation. */
function sequenceNamed(collection: CollectionData, name: string, faults: Fault[]): StableSequence | undefined {
  const given = sequencesGiven(collection, faults);
  const asked = given.length === 0 ? undefined : partsOf(name);
  if (asked?.state === undefined || asked.polymorph !== undefined) return undefined;
  const place = given.findIndex(({ label }) => {
    const parts = partsOf(label);
    return (
      parts?.state !== undefined &&
      parts.formula === asked.formula &&
      parts.chargeNumber === asked.chargeNumber &&
      (parts.state === asked.state || (asked.state === "s" && parts.state !== "l"))
    );
  });
  return place < 0 ? undefined : collectSequence(collection, place, faults);
}

import { describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import { checkObject } from "../errors/input.js";

/**
 * Binary interaction parameters k_ij by two labels. One order suffices; a pair given in both orders has one value.
 *
 * @example
 * const binaryInteraction: BinaryInteraction = { "N2(g)": { "CH4(g)": 0.03 } };
 * virial({ binaryInteraction }).name; // => "virial"
 */
export type BinaryInteraction = Readonly<Record<string, Readonly<Record<string, number>>>>;

const anyLabel = { required: [], optional: "any" } as const;

/**
 * Checks binary interaction parameters: numbers between -1 and 1, no pair of a component with itself, no pair with
 * two values. Collects "fugacity/binary-interaction", "input/not-an-object", "input/forbidden-key".
 */
export function checkBinaryInteraction(value: unknown, path: FaultPath, faults: Fault[]): void {
  const rows = checkObject(value, path, faults, anyLabel);
  if (rows === undefined) return;
  for (const [first, row] of Object.entries(rows)) {
    const entries = checkObject(row, [...path, first], faults, anyLabel);
    if (entries === undefined) continue;
    for (const [second, parameter] of Object.entries(entries)) {
      const expected = whatIsWrong(first, second, parameter, rows as Readonly<Record<string, unknown>>);
      if (expected === undefined) continue;
      faults.push({
        code: "fugacity/binary-interaction",
        path: [...path, first, second],
        message: `the interaction parameter of ${first} and ${second} is ${describeReceived(parameter)}: ${expected}`,
        received: describeReceived(parameter),
        expected,
      });
    }
  }
}

/** k_ij of a pair, from either order; 0 where none is given. */
export function interactionParameter(parameters: BinaryInteraction, first: string, second: string): number {
  return own(own(parameters, first), second) ?? own(own(parameters, second), first) ?? 0;
}

function whatIsWrong(
  first: string,
  second: string,
  parameter: unknown,
  rows: Readonly<Record<string, unknown>>,
): string | undefined {
  if (!(typeof parameter === "number" && parameter > -1 && parameter < 1)) return "a number between -1 and 1";
  if (first === second) return "a pair of two different components";
  const reverse = own(rows, second);
  const other = typeof reverse === "object" && reverse !== null ? own(reverse as typeof rows, first) : undefined;
  if (other === undefined || other === parameter) return undefined;
  return `one value a pair; the other order has ${describeReceived(other)}`;
}

function own<T>(record: Readonly<Record<string, T>> | undefined, key: string): T | undefined {
  return record !== undefined && Object.hasOwn(record, key) ? record[key] : undefined;
}

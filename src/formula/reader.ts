import type { FaultCode } from "../errors/codes.js";
import { cut, describeReceived, type Fault, type FaultPath } from "../errors/fault.js";

/** The state of reading one formula from left to right. */
export interface Reader {
  readonly text: string;
  readonly path: FaultPath;
  readonly faults: Fault[];
  /** Index of the next character. */
  position: number;
  /** Set by a fault after which nothing more can be read. */
  stopped: boolean;
}

/** What is wrong with a formula at one place. */
export interface Slip {
  readonly code: FaultCode;
  /** Index of the character that is wrong; the column of the message is one more. */
  readonly position: number;
  readonly message: string;
  readonly expected?: string;
  readonly hint?: string;
}

/** Collects a fault with its column and goes on reading. */
export function report(reader: Reader, slip: Slip): void {
  const { code, position, message, expected, hint } = slip;
  const received = describeReceived(reader.text);
  reader.faults.push({
    code,
    path: reader.path,
    message: `column ${position + 1} of ${received}: ${message}`,
    received,
    ...(expected === undefined ? {} : { expected }),
    ...(hint === undefined ? {} : { hint: cut(hint, 240) }),
  });
}

/** Collects a fault with its column and ends the reading. */
export function stop(reader: Reader, slip: Slip): void {
  report(reader, slip);
  reader.stopped = true;
}

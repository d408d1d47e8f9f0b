import { cut, describeReceived, type Fault, type FaultPath, maximumFaults } from "../errors/fault.js";

/** An array or object that the scan stands in. */
export interface Frame {
  /** The keys that were seen; undefined in an array. */
  readonly keys?: Set<string>;
  /** Key or index of the member that is being read. */
  place: string | number;
}

/** A walk over a JSON text, from left to right. */
export interface Scan {
  readonly text: string;
  readonly faults: Fault[];
  /** From the outside in. */
  readonly frames: Frame[];
  position: number;
  /** Counted from 1. */
  line: number;
  /** Position of the first character of the line. */
  lineStart: number;
  /** Whether the text is not JSON, so that reading on means nothing. */
  stopped: boolean;
}

/** The path of the member that is being read. */
export function pathOf(scan: Scan): FaultPath {
  return scan.frames.map(({ place }) => (typeof place === "string" ? cut(place) : place));
}

/** Line and column of a position on the line that is being read, in words. */
export function placeOf(scan: Scan, position: number): string {
  return `line ${scan.line}, column ${position - scan.lineStart + 1}`;
}

/** Collects a fault, as long as an error has room for it: a text may hold millions. */
export function collect(scan: Scan, fault: Fault): void {
  if (scan.faults.length < maximumFaults) scan.faults.push(fault);
}

/** Ends the scan: what stands at a position cannot stand there in JSON. */
export function stopAt(scan: Scan, position: number, expected: string, hint?: string): void {
  scan.stopped = true;
  scan.position = position;
  const found = position < scan.text.length ? describeReceived(excerpt(scan.text, position)) : "the end of the text";
  collect(scan, {
    code: "exchange/not-json",
    path: pathOf(scan),
    message: `no JSON at ${placeOf(scan, position)}: expected ${expected}, got ${found}`,
    received: found,
    expected,
    ...(hint === undefined ? {} : { hint }),
  });
}

/** A few characters, up to the end of the line. */
function excerpt(text: string, position: number): string {
  const part = text.slice(position, position + 20);
  const end = part.slice(1).search(/[\r\n]/);
  return end < 0 ? part : part.slice(0, end + 1);
}

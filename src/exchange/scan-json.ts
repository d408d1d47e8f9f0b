import { cut, describeReceived, type Fault } from "../errors/fault.js";
import { forbiddenKeys } from "../errors/input.js";
import { maximumJsonDepth } from "./limits.js";
import { collect, type Frame, pathOf, placeOf, type Scan, stopAt } from "./scan.js";
import { scanPlainValue, scanText } from "./scan-token.js";

/** What may stand next. */
type Awaited = "value" | "first-value" | "key" | "first-key" | "colon" | "next" | "nothing";

/**
 * Walks over a JSON text once and collects what parsing alone would not tell: where it is no JSON, keys that stand
 * twice in one object, keys that reach a prototype, numbers that no double holds. The time grows in proportion to the
 * length, and the depth is limited, so that no text exhausts the stack.
 *
 * @returns whether the text is JSON
 */
export function scanJson(text: string, faults: Fault[]): boolean {
  const scan: Scan = { text, faults, frames: [], position: 0, line: 1, lineStart: 0, stopped: false };
  let awaited: Awaited = "value";
  for (;;) {
    skipSpace(scan);
    if (awaited === "nothing" && scan.position === text.length) return true;
    awaited = step(scan, awaited);
    if (scan.stopped) return false;
  }
}

function skipSpace(scan: Scan): void {
  const { text } = scan;
  for (;;) {
    const next = text.charAt(scan.position);
    if (next !== " " && next !== "\n" && next !== "\r" && next !== "\t") return;
    scan.position += 1;
    if (next === "\n") {
      scan.line += 1;
      scan.lineStart = scan.position;
    }
  }
}

/** Reads one token; returns what may stand after it. */
function step(scan: Scan, awaited: Awaited): Awaited {
  const next = scan.text.charAt(scan.position);
  switch (awaited) {
    case "first-value":
      return next === "]" ? close(scan) : readValue(scan, next);
    case "value":
      return readValue(scan, next);
    case "first-key":
      return next === "}" ? close(scan) : readKey(scan, next);
    case "key":
      return readKey(scan, next);
    case "colon":
      if (next !== ":") stopAt(scan, scan.position, "a colon after the key");
      scan.position += 1;
      return "value";
    case "next":
      return readOn(scan, next);
    case "nothing":
      stopAt(scan, scan.position, "the end of the text", "a file holds one value");
      return "nothing";
  }
}

function readValue(scan: Scan, next: string): Awaited {
  if (next === "{") return open(scan, { keys: new Set(), place: "" }, "first-key");
  if (next === "[") return open(scan, { place: 0 }, "first-value");
  if (next === '"') scanText(scan);
  else scanPlainValue(scan);
  return scan.frames.length === 0 ? "nothing" : "next";
}

function open(scan: Scan, frame: Frame, awaited: Awaited): Awaited {
  if (scan.frames.length === maximumJsonDepth) {
    scan.stopped = true;
    collect(scan, {
      code: "exchange/too-deep",
      path: pathOf(scan),
      message: `at ${placeOf(scan, scan.position)} more than ${maximumJsonDepth} arrays and objects lie in each other`,
      expected: `at most ${maximumJsonDepth}`,
    });
  }
  scan.frames.push(frame);
  scan.position += 1;
  return awaited;
}

function close(scan: Scan): Awaited {
  scan.frames.pop();
  scan.position += 1;
  return scan.frames.length === 0 ? "nothing" : "next";
}

/** Reads what stands after a member: a comma, or the bracket that closes. */
function readOn(scan: Scan, next: string): Awaited {
  const frame = scan.frames.at(-1)!;
  const bracket = frame.keys === undefined ? "]" : "}";
  if (next === bracket) return close(scan);
  if (next !== ",") {
    stopAt(scan, scan.position, `a comma or ${bracket}`);
    return "nothing";
  }
  scan.position += 1;
  if (frame.keys !== undefined) return "key";
  frame.place = (frame.place as number) + 1;
  return "value";
}

function readKey(scan: Scan, next: string): Awaited {
  const start = scan.position;
  if (next !== '"') {
    stopAt(scan, start, "a key in double quotes", next === "}" ? "no comma stands after the last entry" : undefined);
    return "nothing";
  }
  scanText(scan);
  if (scan.stopped) return "nothing";
  const frame = scan.frames.at(-1)!;
  const key = JSON.parse(scan.text.slice(start, scan.position)) as string;
  frame.place = key;
  const place = placeOf(scan, start);
  if (frame.keys?.has(key)) {
    collect(scan, {
      code: "exchange/duplicate-key",
      path: pathOf(scan),
      message: `the key ${describeReceived(key)} stands twice in one object, again at ${place}`,
      received: cut(key),
      expected: "each key once",
    });
  } else if (forbiddenKeys.includes(key)) {
    collect(scan, {
      code: "input/forbidden-key",
      path: pathOf(scan),
      message: `the key ${key} at ${place} is refused`,
      received: key,
    });
  }
  frame.keys?.add(key);
  return "colon";
}

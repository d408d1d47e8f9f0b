import { cut } from "../errors/fault.js";
import { collect, pathOf, placeOf, type Scan, stopAt } from "./scan.js";

const literals = ["true", "false", "null"];
const number = /-?(?:0|[1-9][0-9]*)(?:\.[0-9]+)?(?:[eE][+-]?[0-9]+)?/y;
// All but the double quote, the backslash and control characters.
const plainCharacters = /[ !#-[\]-\uFFFF]*/y;
const escapeSequence = /\\(?:["\\/bfnrt]|u[0-9a-fA-F]{4})/y;
const wordsOfOthers = /NaN|Infinity|undefined|None|True|False/y;

/** Reads over a text in double quotes, the first of which stands at the position. */
export function scanText(scan: Scan): void {
  const { text } = scan;
  let position = scan.position + 1;
  for (;;) {
    position = endOf(plainCharacters, text, position) ?? position;
    const next = text[position];
    if (next === '"') {
      scan.position = position + 1;
      return;
    }
    const end = next === "\\" ? endOf(escapeSequence, text, position) : undefined;
    if (end === undefined) {
      stopInText(scan, position);
      return;
    }
    position = end;
  }
}

function stopInText(scan: Scan, position: number): void {
  const next = scan.text[position];
  if (next === undefined) stopAt(scan, position, "a closing double quote");
  else if (next === "\\") stopAt(scan, position, "an escape sequence of JSON", "a backslash is written \\\\");
  else stopAt(scan, position, "a character of a text", "line breaks and tabs in a text are written \\n and \\t");
}

/** Reads over a number, true, false or null. */
export function scanPlainValue(scan: Scan): void {
  const { text, position } = scan;
  const end = endOf(number, text, position);
  if (end !== undefined) {
    checkFinite(scan, text.slice(position, end));
    scan.position = end;
    return;
  }
  const literal = literals.find((word) => text.startsWith(word, position));
  if (literal === undefined) stopAt(scan, position, "a value", valueHint(text, position));
  else scan.position = position + literal.length;
}

function checkFinite(scan: Scan, token: string): void {
  if (Number.isFinite(Number(token))) return;
  collect(scan, {
    code: "input/not-finite",
    path: pathOf(scan),
    message: `${cut(token, 30)} at ${placeOf(scan, scan.position)} is too large for a double`,
    received: cut(token),
    expected: "at most 1.7976931348623157e+308",
  });
}

function valueHint(text: string, position: number): string | undefined {
  const next = text.charAt(position);
  if (next === "'") return "texts stand in double quotes";
  if (next === "/" || next === "#") return "JSON has no comments";
  if (next === "+" || next === ".") return "a number begins with a digit or a minus sign";
  if (next === "]" || next === "}") return "no comma stands after the last entry";
  return endOf(wordsOfOthers, text, position) === undefined ? undefined : "JSON has only true, false and null";
}

/** Where a match that begins at a position ends. */
function endOf(pattern: RegExp, text: string, position: number): number | undefined {
  pattern.lastIndex = position;
  return pattern.test(text) ? pattern.lastIndex : undefined;
}

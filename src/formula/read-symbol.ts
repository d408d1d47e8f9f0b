import { endOfRun, isCapital, isSmallLetter } from "./characters.js";
import { isSymbol } from "./element-symbols.js";
import { type Reader, report } from "./reader.js";

/**
 * Reads the symbol of an element, D or T: a capital letter and the small letters after it. An unknown one is reported,
 * and the reading goes on behind it.
 *
 * @param previous - the symbol directly before, without a count between
 */
export function readSymbol(reader: Reader, previous: string | undefined): string {
  const { text, position } = reader;
  const end = endOfRun(text, position + 1, isSmallLetter);
  const symbol = text.slice(position, end);
  reader.position = end;
  if (!isSymbol(symbol)) {
    const meant = elementMeant(text, symbol, end, previous);
    const echo = symbol.length <= 12 ? symbol : `${symbol.slice(0, 11)}…`;
    report(reader, {
      code: "formula/unknown-element",
      position,
      message: `there is no element ${echo}`,
      expected: "the symbol of an element, D or T",
      ...(meant === undefined ? {} : { hint: `did you mean ${meant}?` }),
    });
  }
  return symbol;
}

/** Capitals where small letters belong (`FE`, `NACL`), or letters that were run together (`Nac`). */
function elementMeant(text: string, symbol: string, end: number, previous: string | undefined): string | undefined {
  const first = symbol.charAt(0);
  const joined = previous?.length === 1 ? previous + first.toLowerCase() : "";
  if (symbol.length === 1 && isSymbol(joined)) return joined;
  const next = text.charAt(end);
  const following = first + next.toLowerCase();
  if (symbol.length === 1 && isCapital(next) && isSymbol(following)) return following;
  if (symbol.length === 2) {
    const pair = symbol.toUpperCase();
    if (pair.charAt(1) !== first && isSymbol(first) && isSymbol(pair.charAt(1))) return pair;
  }
  const start = symbol.slice(0, 2);
  return symbol.length > 2 && isSymbol(start) ? start : undefined;
}

import { endOfRun, isSmallLetter } from "./characters.js";
import { type Reader, report } from "./reader.js";

/** Reports small letters at the beginning of a symbol; the reading goes on behind them. */
export function refuseSmallLetters(reader: Reader): void {
  const { text, position } = reader;
  const end = endOfRun(text, position, isSmallLetter);
  const word = text.slice(position, end);
  reader.position = end;
  report(reader, {
    code: "formula/unknown-element",
    position,
    message: `there is no element ${word.length <= 12 ? word : `${word.slice(0, 11)}…`}`,
    expected: "the symbol of an element, D or T",
    hint: "the symbols of elements begin with a capital letter",
  });
}

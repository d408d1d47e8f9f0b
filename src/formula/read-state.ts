import { nearest } from "../errors/nearest.js";
import { aggregationStates, isAggregationState, stateMeant } from "./aggregation-states.js";
import { endOfRun, isDigit, isLetter, isSmallLetter } from "./characters.js";
import { type Reader, report, stop } from "./reader.js";
import { refuseSmallLetters } from "./small-letters.js";

/** State of aggregation and polymorph as read. */
export interface StateRead {
  readonly state: string;
  readonly polymorph?: string;
}

const greekLetters: Readonly<Record<string, string>> = {
  α: "alpha",
  β: "beta",
  γ: "gamma",
  δ: "delta",
  ε: "epsilon",
  ζ: "zeta",
  η: "eta",
  θ: "theta",
  κ: "kappa",
  λ: "lambda",
  σ: "sigma",
  τ: "tau",
  ω: "omega",
};

/** Reads the state that ends a formula, as `(aq)` or `(cr,graphite)`; undefined where the reading has stopped. */
export function readState(reader: Reader): StateRead | undefined {
  const { text, position } = reader;
  const end = text.indexOf(")", position);
  if (end < 0) {
    stop(reader, { code: "formula/syntax", position, message: "the bracket is not closed", expected: ")" });
    return undefined;
  }
  const wordEnd = endOfRun(text, position + 1, isSmallLetter);
  const word = text.slice(position + 1, wordEnd);
  if (end + 1 < text.length) {
    stopBehindState(reader, word, end + 1);
    return undefined;
  }
  const isPlainWord = wordEnd === end || text.charAt(wordEnd) === ",";
  if (!isPlainWord || !isAggregationState(word)) {
    const given = text.slice(position + 1, isPlainWord ? wordEnd : end);
    const meant = stateMeant(word) ?? nearest(word, aggregationStates);
    stop(reader, {
      code: "formula/unknown-state",
      position: position + 1,
      message: `${given.length <= 24 ? given : `${given.slice(0, 23)}…`} is no symbol for a state`,
      expected: aggregationStates.join(", "),
      ...(isPlainWord && meant !== undefined ? { hint: `write (${meant}${text.slice(wordEnd, end)})` } : {}),
    });
    return undefined;
  }
  reader.position = end + 1;
  if (wordEnd === end) return { state: word };
  return { state: word, polymorph: readPolymorph(reader, wordEnd + 1, end) };
}

function readPolymorph(reader: Reader, start: number, end: number): string {
  const { text } = reader;
  const wrong = endOfRun(text, start, (character) => isLetter(character) || isDigit(character) || character === "-");
  if (wrong < end || start === end) {
    const greek = greekLetters[text.charAt(wrong)];
    report(reader, {
      code: "formula/syntax",
      position: wrong,
      message: start === end ? "a polymorph follows the comma" : `unexpected ${text.charAt(wrong)} in a polymorph`,
      expected: "letters, digits and hyphens, as in (cr,graphite)",
      ...(greek === undefined ? {} : { hint: `spell it out: ${greek}` }),
    });
  }
  return text.slice(start, end);
}

/** Refuses what stands behind the state, or small letters where elements belong. */
function stopBehindState(reader: Reader, word: string, after: number): void {
  const { text, position } = reader;
  if (!isAggregationState(word)) {
    reader.position += 1;
    refuseSmallLetters(reader);
    reader.stopped = true;
    return;
  }
  const rest = text.slice(after);
  stop(reader, {
    code: "formula/syntax",
    position: after,
    message: "nothing follows the state",
    hint: rest.startsWith("^")
      ? `the charge stands before the state: ${text.slice(0, position)}${rest}${text.slice(position, after)}`
      : "the state ends the formula",
  });
}

/** Width of every report, in characters. */
export const reportWidth = 80;

/** A number with a fixed number of decimals, never a negative zero. */
export function fixed(value: number, decimals: number): string {
  const text = value.toFixed(decimals);
  return Number(text) === 0 ? text.replace("-", "") : text;
}

/**
 * A number in a column: with the decimals asked for, or as many as the width leaves room for; a number is never cut.
 */
export function fitted(value: number, decimals: number, width: number, prefix: string = ""): string {
  for (let shown = decimals; shown >= 0; shown -= 1) {
    const text = prefix + fixed(value, shown);
    if (text.length <= width) return text;
  }
  for (let shown = width; shown > 0; shown -= 1) {
    const text = prefix + value.toExponential(Math.min(shown, 20));
    if (text.length <= width) return text;
  }
  return prefix + value.toExponential(0);
}

/** A text without line breaks and tabs, which would break a layout. */
export function oneLine(text: string): string {
  return text.replace(/\s+/g, " ");
}

/** Breaks a text into lines at spaces; a word longer than a line is cut into pieces. */
export function wrap(text: string, width: number = reportWidth, indent: string = ""): string[] {
  const lines: string[] = [];
  let line = "";
  for (const word of oneLine(text)
    .split(" ")
    .flatMap((piece) => pieces(piece, width - indent.length))) {
    const longer = line === "" ? word : `${line} ${word}`;
    if (longer.length <= width - (lines.length === 0 ? 0 : indent.length)) {
      line = longer;
    } else {
      lines.push(line);
      line = word;
    }
  }
  lines.push(line);
  return lines.map((entry, index) => (index === 0 ? entry : indent + entry));
}

function pieces(word: string, width: number): string[] {
  const parts: string[] = [];
  for (let start = 0; start < word.length; start += width) parts.push(word.slice(start, start + width));
  return parts.length === 0 ? [""] : parts;
}

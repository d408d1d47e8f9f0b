/**
 * The candidate that a misspelt word is most likely meant to be, or undefined where none is near.
 *
 * Near means at most two single-character edits, and fewer than half the word's length; letter case counts as none.
 */
export function nearest(word: string, candidates: Iterable<string>): string | undefined {
  if (word.length > 60) return undefined;
  const limit = Math.min(2, Math.floor((word.length - 1) / 2));
  let best: string | undefined;
  let bestDistance = limit + 1;
  for (const candidate of candidates) {
    if (Math.abs(candidate.length - word.length) >= bestDistance) continue;
    const distance = editDistance(word.toLowerCase(), candidate.toLowerCase());
    if (distance < bestDistance) {
      best = candidate;
      bestDistance = distance;
    }
  }
  return best;
}

/** Levenshtein distance with two rows. */
function editDistance(a: string, b: string): number {
  let previous = Array.from({ length: b.length + 1 }, (_, index) => index);
  for (let row = 1; row <= a.length; row += 1) {
    const current = [row];
    for (let column = 1; column <= b.length; column += 1) {
      const change = a[row - 1] === b[column - 1] ? 0 : 1;
      current.push(Math.min(previous[column]! + 1, current[column - 1]! + 1, previous[column - 1]! + change));
    }
    previous = current;
  }
  return previous[b.length]!;
}

/**
 * Compares two symbols in Hill order: carbon, hydrogen, then by alphabet; without carbon all by alphabet. D and T
 * stand where the alphabet puts them.
 */
export function compareInHillOrder(a: string, b: string, hasCarbon: boolean): number {
  const first = rank(a, hasCarbon);
  const second = rank(b, hasCarbon);
  if (first !== second) return first - second;
  return a < b ? -1 : a > b ? 1 : 0;
}

function rank(symbol: string, hasCarbon: boolean): number {
  if (!hasCarbon) return 2;
  return symbol === "C" ? 0 : symbol === "H" ? 1 : 2;
}

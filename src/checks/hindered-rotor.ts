/** One internal rotor in a cosine potential of its own. */
export interface HinderedRotor {
  /** Number of equal minima in a full turn. */
  readonly fold: number;
  /** Height of the barrier in cm-1. */
  readonly barrier: number;
  /** Internal rotational constant in cm-1, of both tops against each other. */
  readonly constant: number;
  /** Orientations of the top that are the same. */
  readonly symmetryNumber: number;
}

/** Free rotation is the basis; its functions reach this far beyond the highest energy asked for. */
const spareFunctions = 12;

/**
 * Energies of a hindered rotor in cm-1, in rising order, above the bottom of the potential: the eigenvalues of
 * -F d2/dx2 + V/2 (1 - cos nx). In the free rotor's functions e^(imx) the potential joins m with m + n and m - n alone,
 * so that the matrix falls apart into n tridiagonal ones, whose eigenvalues are counted and halved in.
 *
 * @param rotor - barrier and constant in cm-1
 * @param highest - up to which energy, in cm-1
 * @see `references.mcquarrie2000`
 */
export function hinderedRotorLevels(rotor: HinderedRotor, highest: number): number[] {
  const { fold, barrier, constant } = rotor;
  const reach = Math.ceil(Math.sqrt((highest + barrier) / constant) / fold) + spareFunctions;
  const levels: number[] = [];
  for (let first = 0; first < fold; first += 1) {
    const diagonal: number[] = [];
    for (let step = -reach; step <= reach; step += 1) {
      const m = first + fold * step;
      diagonal.push(constant * m * m + barrier / 2);
    }
    levels.push(...eigenvaluesBelow(diagonal, barrier / 4, highest));
  }
  return levels.sort((a, b) => a - b);
}

/** Eigenvalues up to a limit of a tridiagonal matrix whose off-diagonal entries have one size. */
function eigenvaluesBelow(diagonal: readonly number[], offDiagonal: number, limit: number): number[] {
  const count = countBelow(diagonal, offDiagonal, limit);
  const found: number[] = [];
  for (let index = 0; index < count; index += 1) {
    // No eigenvalue is below 0, for neither the rotation nor the potential is.
    let [low, high] = [0, limit];
    for (let middle = limit / 2; middle > low && middle < high; middle = (low + high) / 2) {
      if (countBelow(diagonal, offDiagonal, middle) > index) high = middle;
      else low = middle;
    }
    found.push(high);
  }
  return found;
}

/** How many eigenvalues lie below a value: the negative pivots of the matrix less that value (Sturm). */
function countBelow(diagonal: readonly number[], offDiagonal: number, value: number): number {
  const square = offDiagonal * offDiagonal;
  let count = 0;
  let pivot = 1;
  diagonal.forEach((entry, index) => {
    const next = entry - value - (index === 0 ? 0 : square / pivot);
    // A pivot of zero is moved by less than rounding.
    pivot = next === 0 ? Number.EPSILON : next;
    if (pivot < 0) count += 1;
  });
  return count;
}

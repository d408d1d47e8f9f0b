import fc from "fast-check";

/** A species and its amounts of what is conserved: elements, then the charge. */
export interface Composition {
  readonly label: string;
  readonly amounts: readonly number[];
}

const symbols = ["C", "H", "N"];

/** Species of one to three elements, some with a charge, some with a count of halves. */
const composition: fc.Arbitrary<Composition> = fc
  .tuple(
    fc.constantFrom(0, 0, 1, 1, 2, 3),
    fc.constantFrom(0, 0, 1, 2, 4),
    fc.constantFrom(0, 0, 0, 1, 2, 2.5),
    fc.constantFrom(0, 0, 0, 0, 0, 0, 1, -1, 2),
  )
  .map(([carbon, hydrogen, nitrogen, charge]) => ({ counts: [carbon, hydrogen, nitrogen], charge }))
  .filter(({ counts }) => counts.some((count) => count > 0))
  .map(({ counts, charge }) => {
    const body = counts.map((count, index) => (count === 0 ? "" : `${symbols[index]}${count === 1 ? "" : count}`));
    const size = Math.abs(charge) === 1 ? "" : Math.abs(charge);
    const sign = charge === 0 ? "" : `^${size}${charge > 0 ? "+" : "-"}`;
    return { label: `${body.join("")}${sign}(g)`, amounts: [...counts, charge] };
  });

/** Two to eight different species on two sides. */
export const randomEquations: fc.Arbitrary<{
  readonly reactants: readonly Composition[];
  readonly products: readonly Composition[];
}> = fc
  .tuple(
    fc.uniqueArray(composition, { minLength: 2, maxLength: 8, selector: ({ label }) => label }),
    fc.integer({ min: 1, max: 7 }),
  )
  .map(([species, cut]) => {
    const place = Math.min(cut, species.length - 1);
    return { reactants: species.slice(0, place), products: species.slice(place) };
  });

/** What a sum of species has of each conserved quantity, in halves. */
export function totalsOf(species: readonly Composition[], counts: readonly bigint[]): bigint[] {
  const width = species[0]?.amounts.length ?? 0;
  return Array.from({ length: width }, (_value, row) =>
    species.reduce((sum, { amounts }, index) => sum + counts[index]! * BigInt(2 * amounts[row]!), 0n),
  );
}

/** The rank of the matrix whose columns are the amounts, by elimination modulo a prime of 61 bits. */
export function rankOfColumns(species: readonly Composition[]): number {
  const prime = 2n ** 61n - 1n;
  const modulo = (value: bigint): bigint => ((value % prime) + prime) % prime;
  let rows = species.map(({ amounts }) => amounts.map((amount) => modulo(BigInt(2 * amount))));
  let rank = 0;
  for (let column = 0; column < (rows[0]?.length ?? 0); column += 1) {
    const pivot = rows.find((row) => row[column] !== 0n);
    if (pivot === undefined) continue;
    rank += 1;
    rows = rows
      .filter((row) => row !== pivot)
      .map((row) => row.map((entry, at) => modulo(entry * pivot[column]! - pivot[at]! * row[column]!)));
  }
  return rank;
}

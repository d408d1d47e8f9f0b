import fc from "fast-check";

/** A number of a random formula: an integer, or tenths, hundredths, thousandths. */
export interface RandomNumber {
  readonly mantissa: number;
  readonly decimals: number;
}

/** A symbol or a group, with its count; undefined is an unwritten one. */
export type RandomItem =
  | { readonly symbol: string; readonly count: RandomNumber | undefined }
  | { readonly bracket: 0 | 1 | 2; readonly body: RandomBody; readonly count: RandomNumber };

export interface RandomPart {
  readonly multiplier: RandomNumber | undefined;
  readonly items: readonly RandomItem[];
}

export type RandomBody = readonly RandomPart[];

export interface RandomFormula {
  readonly body: RandomBody;
  readonly chargeNumber: number;
  readonly suffix: string;
}

const symbols = ["H", "O", "C", "N", "S", "Fe", "Na", "Cl", "Co", "U", "D", "T", "Og", "B", "He", "Si"];

const number: fc.Arbitrary<RandomNumber> = fc.oneof(
  fc.record({ mantissa: fc.integer({ min: 2, max: 24 }), decimals: fc.constant(0) }),
  fc.record({ mantissa: fc.integer({ min: 11, max: 999 }), decimals: fc.integer({ min: 1, max: 3 }) }),
);

const symbol: fc.Arbitrary<RandomItem> = fc.record({
  symbol: fc.constantFrom(...symbols),
  count: fc.option(number, { nil: undefined }),
});

const bodies = [bodyOf(symbol)];
for (let depth = 1; depth <= 3; depth += 1) {
  const group = fc.record({ bracket: fc.constantFrom<0 | 1 | 2>(0, 1, 2), body: bodies[depth - 1]!, count: number });
  bodies.push(bodyOf(fc.oneof({ arbitrary: symbol, weight: 3 }, { arbitrary: group, weight: 1 })));
}

function bodyOf(item: fc.Arbitrary<RandomItem>): fc.Arbitrary<RandomBody> {
  const items = fc.array(item, { minLength: 1, maxLength: 4 });
  const part = fc.record({ multiplier: fc.option(number, { nil: undefined }), items });
  return fc.oneof(
    { arbitrary: items.map((only) => [{ multiplier: undefined, items: only }]), weight: 3 },
    { arbitrary: fc.array(part, { minLength: 2, maxLength: 3 }), weight: 1 },
  );
}

export const randomFormula: fc.Arbitrary<RandomFormula> = fc.record({
  body: bodies[3]!,
  chargeNumber: fc.integer({ min: -12, max: 12 }),
  suffix: fc.constantFrom("", "(g)", "(aq)", "(cr,alpha)", "(cr,ice-Ih)"),
});

/** Writes a random formula with plain digits or with subscripts and superscripts. */
export function spelled(random: RandomFormula, unicode: boolean): string {
  const magnitude = Math.abs(random.chargeNumber);
  const digits = magnitude > 1 ? String(magnitude) : "";
  const sign = random.chargeNumber > 0 ? "+" : "-";
  const plain = magnitude === 0 ? "" : `^${digits}${sign}`;
  const raised =
    magnitude === 0
      ? ""
      : [...digits].map((digit) => "⁰¹²³⁴⁵⁶⁷⁸⁹"[Number(digit)]).join("") + (sign === "+" ? "⁺" : "⁻");
  return spelledBody(random.body, unicode) + (unicode ? raised : plain) + random.suffix;
}

function spelledBody(parts: RandomBody, unicode: boolean): string {
  return parts
    .map(
      ({ multiplier, items }) => numeral(multiplier, false) + items.map((item) => spelledItem(item, unicode)).join(""),
    )
    .join("·");
}

function spelledItem(item: RandomItem, unicode: boolean): string {
  const count = numeral(item.count, unicode);
  if ("symbol" in item) return item.symbol + count;
  return "([{"[item.bracket] + spelledBody(item.body, unicode) + ")]}"[item.bracket] + count;
}

function numeral(value: RandomNumber | undefined, unicode: boolean): string {
  if (value === undefined) return "";
  const digits = String(value.mantissa).padStart(value.decimals + 1, "0");
  const point = digits.length - value.decimals;
  const text = value.decimals === 0 ? digits : `${digits.slice(0, point)}.${digits.slice(point)}`;
  return unicode ? text.replace(/\d/g, (digit) => "₀₁₂₃₄₅₆₇₈₉"[Number(digit)]!) : text;
}

/** The composition of a random formula as reduced fractions, by recursion from the inside: not the parser's way. */
export function compositionOf(random: RandomFormula): Record<string, string> {
  const reduced: Record<string, string> = {};
  for (const [symbol, [numerator, denominator]] of bodyCounts(random.body)) {
    const divisor = greatestCommonDivisor(numerator, denominator);
    const below = denominator / divisor;
    reduced[symbol] = below === 1n ? String(numerator / divisor) : `${numerator / divisor}/${below}`;
  }
  return reduced;
}

type Fraction = readonly [numerator: bigint, denominator: bigint];

function bodyCounts(parts: RandomBody): Map<string, Fraction> {
  const sums = new Map<string, Fraction>();
  for (const { multiplier, items } of parts) {
    for (const item of items) {
      const inner = "symbol" in item ? new Map([[item.symbol, [1n, 1n] as Fraction]]) : bodyCounts(item.body);
      for (const [symbol, [numerator, denominator]] of inner) {
        const [a, b] = fraction(item.count);
        const [c, d] = fraction(multiplier);
        const [top, bottom] = [numerator * a * c, denominator * b * d];
        const [sumTop, sumBottom] = sums.get(symbol) ?? [0n, 1n];
        sums.set(symbol, [sumTop * bottom + top * sumBottom, sumBottom * bottom]);
      }
    }
  }
  return sums;
}

function fraction(value: RandomNumber | undefined): Fraction {
  return value === undefined ? [1n, 1n] : [BigInt(value.mantissa), 10n ** BigInt(value.decimals)];
}

function greatestCommonDivisor(a: bigint, b: bigint): bigint {
  return b === 0n ? a : greatestCommonDivisor(b, a % b);
}

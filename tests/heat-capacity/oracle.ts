import { Decimal as Shared } from "decimal.js";
import type { PublishedInterval, PublishedSeries } from "../../src/heat-capacity/published-series.js";

/** Decimals of 45 digits, apart from the shared constructor. */
export const Decimal: typeof Shared = Shared.clone({ precision: 45, defaults: true });
export type Decimal = Shared;

/** The exact value of a double; `new Decimal(x)` takes the decimal as printed instead. */
export function binary(x: number): Decimal {
  let mantissa = x;
  let halvings = 0;
  while (!Number.isInteger(mantissa)) {
    mantissa *= 2;
    halvings += 1;
  }
  return new Decimal(BigInt(mantissa).toString()).div(new Decimal(2).pow(halvings));
}

export interface ExactValues {
  readonly heatCapacity: Decimal;
  readonly enthalpy: Decimal;
  readonly entropy: Decimal;
  readonly gibbsEnergy: Decimal;
}

export const functionNames = ["heatCapacity", "enthalpy", "entropy", "gibbsEnergy"] as const;

/** T^n for n a multiple of 1/2; decimal.js would take logarithms for half-integers. */
function power(T: Decimal, n: number): Decimal {
  const below = Math.floor(n);
  return n === below ? T.pow(n) : T.pow(below).times(T.sqrt());
}

const logarithms = new Map<string, Decimal>();

/** ln T, remembered: it is the dear part of the oracle. */
function ln(T: Decimal): Decimal {
  const key = T.toString();
  const known = logarithms.get(key);
  if (known !== undefined) return known;
  const value = T.ln();
  logarithms.set(key, value);
  return value;
}

const zero = new Decimal(0);
const sum = (terms: readonly Decimal[]): Decimal => terms.reduce((total, term) => total.plus(term), zero);

/** Cp, H, S and G of one interval by the textbook equations of its form. */
export function valuesOf(series: PublishedSeries, interval: PublishedInterval, temperature: Decimal): ExactValues {
  const { heatCapacity, enthalpy, entropy } = textbook(series, interval, temperature);
  return { heatCapacity, enthalpy, entropy, gibbsEnergy: enthalpy.minus(temperature.times(entropy)) };
}

type Three = Omit<ExactValues, "gibbsEnergy">;

function textbook(series: PublishedSeries, interval: PublishedInterval, T: Decimal): Three {
  const shifts = series.decimalShifts ?? [];
  const c = interval.coefficients.map((value, index) =>
    new Decimal(value).times(new Decimal(10).pow(-(shifts[index] ?? 0))),
  );
  switch (series.form) {
    case "shomate":
      return shomate(c, T.div(1000));
    case "seven-coefficient":
      return scaled(sevenCoefficient(c, T), new Decimal(series.gasConstant!));
    case "nine-coefficient":
      return scaled(nineCoefficient(c, T), new Decimal(series.gasConstant!));
    case "gibbs-energy":
      return gibbsEnergy(c, series.powers!, T);
    case "berman-brown":
      return anchored(series, c, [0, -0.5, -2, -3], T);
    case "five-term":
      return anchored(series, c, [0, 1, -2, -0.5, 2], T);
    case "haas-fisher":
      return anchored(series, [c[0]!, c[1]!.times(2), c[2]!, c[3]!, c[4]!], [0, 1, -2, 2, -0.5], T);
    case "maier-kelley":
      return anchored(series, c, [0, 1, -2], T);
    case "polynomial":
      return anchored(series, c, series.powers!, T);
  }
}

/** T. Shomate's form: Cp = A + Bt + Ct^2 + Dt^3 + E/t^2, t in 1000 K, H in kJ/mol. */
function shomate(coefficients: readonly Decimal[], t: Decimal): Three {
  const [A, B, C, D, E, F, G] = coefficients as [Decimal, Decimal, Decimal, Decimal, Decimal, Decimal, Decimal];
  const square = t.pow(2);
  const cube = t.pow(3);
  return {
    heatCapacity: sum([A, B.times(t), C.times(square), D.times(cube), E.div(square)]),
    enthalpy: sum([
      A.times(t),
      B.times(square).div(2),
      C.times(cube).div(3),
      D.times(t.pow(4)).div(4),
      E.div(t).negated(),
      F,
    ]).times(1000),
    entropy: sum([
      A.times(ln(t)),
      B.times(t),
      C.times(square).div(2),
      D.times(cube).div(3),
      E.div(square.times(2)).negated(),
      G,
    ]),
  };
}

/** In units of R: Cp/R, H/R and S/R. */
function sevenCoefficient(coefficients: readonly Decimal[], T: Decimal): Three {
  const [a1, a2, a3, a4, a5, a6, a7] = coefficients as [Decimal, Decimal, Decimal, Decimal, Decimal, Decimal, Decimal];
  return {
    heatCapacity: sum([a1, a2.times(T), a3.times(T.pow(2)), a4.times(T.pow(3)), a5.times(T.pow(4))]),
    enthalpy: sum([
      a1,
      a2.times(T).div(2),
      a3.times(T.pow(2)).div(3),
      a4.times(T.pow(3)).div(4),
      a5.times(T.pow(4)).div(5),
      a6.div(T),
    ]).times(T),
    entropy: sum([
      a1.times(ln(T)),
      a2.times(T),
      a3.times(T.pow(2)).div(2),
      a4.times(T.pow(3)).div(3),
      a5.times(T.pow(4)).div(4),
      a7,
    ]),
  };
}

/** In units of R: Cp/R, H/R and S/R. */
function nineCoefficient(coefficients: readonly Decimal[], T: Decimal): Three {
  const [a1, a2, a3, a4, a5, a6, a7, a8, a9] = coefficients as [
    Decimal,
    Decimal,
    Decimal,
    Decimal,
    Decimal,
    Decimal,
    Decimal,
    Decimal,
    Decimal,
  ];
  return {
    heatCapacity: sum([
      a1.div(T.pow(2)),
      a2.div(T),
      a3,
      a4.times(T),
      a5.times(T.pow(2)),
      a6.times(T.pow(3)),
      a7.times(T.pow(4)),
    ]),
    enthalpy: sum([
      a1.div(T.pow(2)).negated(),
      a2.times(ln(T)).div(T),
      a3,
      a4.times(T).div(2),
      a5.times(T.pow(2)).div(3),
      a6.times(T.pow(3)).div(4),
      a7.times(T.pow(4)).div(5),
      a8.div(T),
    ]).times(T),
    entropy: sum([
      a1.div(T.pow(2)).div(2).negated(),
      a2.div(T).negated(),
      a3.times(ln(T)),
      a4.times(T),
      a5.times(T.pow(2)).div(2),
      a6.times(T.pow(3)).div(3),
      a7.times(T.pow(4)).div(4),
      a9,
    ]),
  };
}

/** From G = a + bT + cT ln T + sum of d T^n: S = -dG/dT, H = -T^2 d(G/T)/dT, Cp = -T d2G/dT2. */
function gibbsEnergy(coefficients: readonly Decimal[], powers: readonly number[], T: Decimal): Three {
  const [a, b, c, ...d] = coefficients as [Decimal, Decimal, Decimal, ...Decimal[]];
  const each = (value: (n: number, d: Decimal) => Decimal): Decimal =>
    sum(powers.map((n, index) => value(n, d[index]!)));
  const curvature = c.div(T).plus(
    each((n, d) =>
      d
        .times(n)
        .times(n - 1)
        .times(power(T, n - 2)),
    ),
  );
  const slope = sum([b, c, c.times(ln(T)), each((n, d) => d.times(n).times(power(T, n - 1)))]);
  const slopeOverT = sum([a.div(T.pow(2)).negated(), c.div(T), each((n, d) => d.times(n - 1).times(power(T, n - 2)))]);
  return {
    heatCapacity: T.times(curvature).negated(),
    enthalpy: T.pow(2).times(slopeOverT).negated(),
    entropy: slope.negated(),
  };
}

function scaled({ heatCapacity, enthalpy, entropy }: Three, by: Decimal): Three {
  return { heatCapacity: heatCapacity.times(by), enthalpy: enthalpy.times(by), entropy: entropy.times(by) };
}

/** H = H0 + integral of Cp dT and S = S0 + integral of Cp/T dT from the anchor, for one interval that holds it. */
function anchored(series: PublishedSeries, c: readonly Decimal[], powers: readonly number[], T: Decimal): Three {
  const factor = series.unit === "cal_th/mol/K" ? new Decimal("4.184") : new Decimal(1);
  const { temperature, enthalpy, entropy } = series.anchor!;
  const T0 = new Decimal(temperature.value);
  const integral = (n: number): Decimal =>
    n === -1
      ? ln(T).minus(ln(T0))
      : power(T, n + 1)
          .minus(power(T0, n + 1))
          .div(n + 1);
  return {
    heatCapacity: sum(c.map((value, index) => value.times(power(T, powers[index]!)))).times(factor),
    enthalpy: sum(c.map((value, index) => value.times(integral(powers[index]!))))
      .times(factor)
      .plus(enthalpy.value),
    entropy: sum(c.map((value, index) => value.times(integral(powers[index]! - 1))))
      .times(factor)
      .plus(entropy.value),
  };
}

import type { Figure } from "../quantity/figure.js";

/**
 * A published form of the heat capacity. Coefficients stand in the order in which they are printed.
 *
 * - `"shomate"`: A, B, C, D, E, F, G, H with t = T / 1000 K; Cp and S in J/mol/K, H in kJ/mol; H is the enthalpy of
 *   formation at 298.15 K, so that H(T) relative to the elements is A t + B t^2/2 + C t^3/3 + D t^4/4 - E/t + F.
 * - `"seven-coefficient"`: Cp/R = a1 + a2 T + a3 T^2 + a4 T^3 + a5 T^4; a6 and a7 are the constants of H/R and S/R.
 * - `"nine-coefficient"`: Cp/R = a1 T^-2 + a2 T^-1 + a3 + a4 T + a5 T^2 + a6 T^3 + a7 T^4; a8 and a9 are the constants
 *   of H/R and S/R.
 * - `"gibbs-energy"`: a, b, c, d_1, ..., d_k in J/mol with G = a + b T + c T ln T + sum of d_i T^(powers_i), as for the
 *   elements by Dinsdale (1991). G is relative to the enthalpy of the elements at 298.15 K, so that the constant of H is
 *   a and that of S is -b - c; Cp = -c - sum of n (n - 1) d T^(n - 1). Every interval has all powers, with 0 for what it
 *   lacks. For a magnetic element it is the part without magnetism.
 * - `"maier-kelley"`: Cp = a + b T + c T^-2, without constants.
 * - `"berman-brown"`: k0, k1, k2, k3 of Cp = k0 + k1 T^(-1/2) + k2 T^-2 + k3 T^-3, without constants (Berman and Brown
 *   1985).
 * - `"five-term"`: Cp = a1 + a2 T + a3 T^-2 + a4 T^(-1/2) + a5 T^2, without constants (Robie, Hemingway and Fisher
 *   1978; Robie and Hemingway 1995).
 * - `"haas-fisher"`: a, b, c, f, g of Cp = a + 2 b T + c T^-2 + f T^2 + g T^(-1/2), without constants (Haas and Fisher
 *   1976). It has the powers of `"five-term"`, but b is half of a2, and f and g stand in the other order.
 * - `"polynomial"`: Cp = sum of c_i T^(powers_i), without constants.
 */
export type HeatCapacityForm =
  | "shomate"
  | "seven-coefficient"
  | "nine-coefficient"
  | "gibbs-energy"
  | "maier-kelley"
  | "berman-brown"
  | "five-term"
  | "haas-fisher"
  | "polynomial";

/** One temperature interval of a published fit. */
export interface PublishedInterval {
  /** Lower end in kelvin. */
  readonly from: number;
  /** Upper end in kelvin; it belongs to this interval, not to the next. */
  readonly to: number;
  /** Coefficients as printed. */
  readonly coefficients: readonly number[];
  /**
   * What the upper end is: the end of one fit and beginning of the next (`"fit"`), a transition with an enthalpy of
   * its own (`"first-order"`), or a transition with none (`"continuous"`).
   */
  readonly endsAt: "fit" | "first-order" | "continuous";
}

/** A published fit: its form, its coefficients with the unit and gas constant they were printed with. */
export interface PublishedSeries {
  readonly kind: "series";
  readonly form: HeatCapacityForm;
  /** Gas constant in J/mol/K that the dimensionless coefficients were printed with. */
  readonly gasConstant?: number;
  /** Unit of the printed coefficients of forms without constants; J/mol/K when absent. */
  readonly unit?: "J/mol/K" | "cal_th/mol/K";
  /**
   * Exponents of T, multiples of 1/2 from -20 to 20, each once: of a `"polynomial"` in Cp, one a coefficient; of a
   * `"gibbs-energy"` in G, one for each coefficient after the third, none of them 0 or 1.
   */
  readonly powers?: readonly number[];
  /**
   * Powers of ten that the printed coefficients were multiplied by, one a coefficient: 3 where the heading says
   * "b x 10^3". Absent: none.
   */
  readonly decimalShifts?: readonly number[];
  /** Intervals in rising order; each begins where the one before ends. */
  readonly intervals: readonly PublishedInterval[];
  /** Fixes the constants where the form carries none of its own; absent: 298.15 K and the record's own figures. */
  readonly anchor?: { readonly temperature: Figure; readonly enthalpy: Figure; readonly entropy: Figure };
}

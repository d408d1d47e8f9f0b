import type { Figure } from "../quantity/figure.js";

/**
 * A published form of the heat capacity. Coefficients stand in the order in which they are printed.
 *
 * - `"shomate"`: A, B, C, D, E, F, G, H with t = T / 1000 K; Cp and S in J/mol/K, H in kJ/mol; H is the enthalpy of
 *   formation at 298.15 K, so that H(T) relative to the elements is A t + B t^2/2 + C t^3/3 + D t^4/4 - E/t + F.
 * - `"seven-coefficient"`: Cp/R = a1 + a2 T + a3 T^2 + a4 T^3 + a5 T^4; a6 and a7 are the constants of H/R and S/R.
 * - `"nine-coefficient"`: Cp/R = a1 T^-2 + a2 T^-1 + a3 + a4 T + a5 T^2 + a6 T^3 + a7 T^4; a8 and a9 are the constants
 *   of H/R and S/R.
 * - `"maier-kelley"`: Cp = a + b T + c T^-2, without constants.
 * - `"polynomial"`: Cp = sum of c_i T^(powers_i), without constants.
 */
export type HeatCapacityForm = "shomate" | "seven-coefficient" | "nine-coefficient" | "maier-kelley" | "polynomial";

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
  /** Exponents of T of a `"polynomial"`, one a coefficient. */
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

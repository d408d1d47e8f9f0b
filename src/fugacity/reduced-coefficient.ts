import { power } from "../numeric/power.js";
import type { PolarTerm, VirialCorrelation } from "./virial-options.js";

/**
 * A reduced second virial coefficient B pc/(R Tc) = f0 + omega f1 + polar term, as a sum of c u^n over u = Tc/T.
 * The constants of f0 and f1 are merged once per pair.
 */
export interface ReducedCoefficient {
  /** Coefficients in the order of the exponents of the correlation's kind. */
  readonly coefficients: readonly number[];
  readonly kind: "whole powers" | "Abbott's powers";
}

/** Value of the sum of c u^n, and of the sum of n c u^n: -T times the temperature derivative. */
export interface ReducedValue {
  value: number;
  slope: number;
}

/**
 * Merges a correlation with an acentric factor and a polar term.
 *
 * With Tr = T/Tc,
 * - Pitzer and Curl: f0 = 0.1445 - 0.330/Tr - 0.1385/Tr^2 - 0.0121/Tr^3,
 *   f1 = 0.073 + 0.46/Tr - 0.50/Tr^2 - 0.097/Tr^3 - 0.0073/Tr^8
 * - Tsonopoulos: f0 as above - 0.000607/Tr^8, f1 = 0.0637 + 0.331/Tr^2 - 0.423/Tr^3 - 0.008/Tr^8, f2 = a/Tr^6 - b/Tr^8
 * - Abbott: f0 = 0.083 - 0.422/Tr^1.6, f1 = 0.139 - 0.172/Tr^4.2
 *
 * @see `references.pitzer1957` `references.tsonopoulos1974` `references.smith2001`
 */
export function reducedCoefficient(
  correlation: VirialCorrelation,
  omega: number,
  polar: PolarTerm | undefined,
): ReducedCoefficient {
  switch (correlation) {
    case "abbott":
      return { kind: "Abbott's powers", coefficients: [0.083 + 0.139 * omega, -0.422, -0.172 * omega] };
    case "pitzer-curl":
      return {
        kind: "whole powers",
        coefficients: [
          0.1445 + 0.073 * omega,
          -0.33 + 0.46 * omega,
          -0.1385 - 0.5 * omega,
          -0.0121 - 0.097 * omega,
          0,
          -0.0073 * omega,
        ],
      };
    case "tsonopoulos":
      return {
        kind: "whole powers",
        coefficients: [
          0.1445 + 0.0637 * omega,
          -0.33,
          -0.1385 + 0.331 * omega,
          -0.0121 - 0.423 * omega,
          polar?.a ?? 0,
          -0.000607 - 0.008 * omega - (polar?.b ?? 0),
        ],
      };
  }
}

/** Evaluates a reduced coefficient at u = Tc/T into an object of the caller's. */
export function evaluateReduced(reduced: ReducedCoefficient, u: number, into: ReducedValue): void {
  const c = reduced.coefficients;
  if (reduced.kind === "whole powers") {
    const u2 = u * u;
    const u3 = u2 * u;
    const u6 = u3 * u3;
    const c1 = c[1]! * u;
    const c2 = c[2]! * u2;
    const c3 = c[3]! * u3;
    const c6 = c[4]! * u6;
    const c8 = c[5]! * (u6 * u2);
    into.value = c[0]! + c1 + c2 + c3 + c6 + c8;
    into.slope = c1 + 2 * c2 + 3 * c3 + 6 * c6 + 8 * c8;
  } else {
    const simple = c[1]! * power(u, 1.6);
    const correction = c[2]! * power(u, 4.2);
    into.value = c[0]! + simple + correction;
    into.slope = 1.6 * simple + 4.2 * correction;
  }
}

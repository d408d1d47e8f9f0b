/** A published source. */
export interface Reference {
  /** Authors as printed, or the institution. */
  readonly authors: string;
  /** Title, journal or series, volume, pages. */
  readonly title: string;
  /** Year of publication. */
  readonly year: number;
}

const entries = {
  chase1998: {
    authors: "M. W. Chase Jr.",
    title: "NIST-JANAF Thermochemical Tables, 4th edition, J. Phys. Chem. Ref. Data Monograph 9",
    year: 1998,
  },
  cohen2007: {
    authors: "E. R. Cohen et al.",
    title: "Quantities, Units and Symbols in Physical Chemistry, IUPAC Green Book, 3rd edition, RSC Publishing",
    year: 2007,
  },
  cox1989: {
    authors: "J. D. Cox, D. D. Wagman, V. A. Medvedev",
    title: "CODATA Key Values for Thermodynamics, Hemisphere, New York",
    year: 1989,
  },
  mcbride1993: {
    authors: "B. J. McBride, S. Gordon, M. A. Reno",
    title: "Coefficients for Calculating Thermodynamic and Transport Properties of Individual Species, NASA TM-4513",
    year: 1993,
  },
  mcbride2002: {
    authors: "B. J. McBride, M. J. Zehe, S. Gordon",
    title: "NASA Glenn Coefficients for Calculating Thermodynamic Properties of Individual Species, NASA/TP-2002-211556",
    year: 2002,
  },
} as const satisfies Record<string, Reference>;

/** The key of an entry of the bibliography. A citation that does not exist does not compile. */
export type Citation = keyof typeof entries;

/** Every source that the library cites, written out in this one place. */
export const references: Readonly<Record<Citation, Reference>> = entries;

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
  bipm2019: {
    authors: "Bureau International des Poids et Mesures",
    title: "The International System of Units (SI Brochure), 9th edition, Sevres",
    year: 2019,
  },
  bodenstein1905: {
    authors: "M. Bodenstein, W. Pohl",
    title: "Gleichgewichtsmessungen an der Kontaktschwefelsaeure, Z. Elektrochem. 11, 373",
    year: 1905,
  },
  bodenstein1922: {
    authors: "M. Bodenstein",
    title: "Bildung und Zersetzung der hoeheren Stickoxyde, Z. phys. Chem. 100, 68",
    year: 1922,
  },
  chase1998: {
    authors: "M. W. Chase Jr.",
    title: "NIST-JANAF Thermochemical Tables, 4th edition, J. Phys. Chem. Ref. Data Monograph 9",
    year: 1998,
  },
  cohen1965: {
    authors: "E. R. Cohen, J. W. M. DuMond",
    title: "Our Knowledge of the Fundamental Constants of Physics and Chemistry in 1965, Rev. Mod. Phys. 37, 537",
    year: 1965,
  },
  cohen1973: {
    authors: "E. R. Cohen, B. N. Taylor",
    title: "The 1973 Adjustment of the Fundamental Constants, J. Phys. Chem. Ref. Data 2, 663",
    year: 1973,
  },
  cohen1987: {
    authors: "E. R. Cohen, B. N. Taylor",
    title: "The 1986 Adjustment of the Fundamental Physical Constants, Rev. Mod. Phys. 59, 1121",
    year: 1987,
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
  dymond1980: {
    authors: "J. H. Dymond, E. B. Smith",
    title: "The Virial Coefficients of Pure Gases and Mixtures, Clarendon Press, Oxford",
    year: 1980,
  },
  effenberger1981: {
    authors: "H. Effenberger, K. Mereiter, J. Zemann",
    title: "Crystal Structure Refinements of Magnesite, Calcite and Others, Z. Kristallogr. 156, 233",
    year: 1981,
  },
  gillespie1930: {
    authors: "L. J. Gillespie, J. A. Beattie",
    title: "The Thermodynamic Treatment of Chemical Equilibria in Systems Composed of Real Gases I, Phys. Rev. 36, 743",
    year: 1930,
  },
  herzberg1966: {
    authors: "G. Herzberg",
    title: "Molecular Spectra and Molecular Structure III: Electronic Spectra of Polyatomic Molecules, Van Nostrand",
    year: 1966,
  },
  hill1956: {
    authors: "K. J. Hill, E. R. S. Winter",
    title: "Thermal Dissociation Pressure of Calcium Carbonate, J. Phys. Chem. 60, 1361",
    year: 1956,
  },
  holland2011: {
    authors: "T. J. B. Holland, R. Powell",
    title: "An Improved and Extended Internally Consistent Dataset, J. Metamorphic Geol. 29, 333",
    year: 2011,
  },
  huber1979: {
    authors: "K. P. Huber, G. Herzberg",
    title: "Molecular Spectra and Molecular Structure IV: Constants of Diatomic Molecules, Van Nostrand",
    year: 1979,
  },
  kell1975: {
    authors: "G. S. Kell",
    title: "Density, Thermal Expansivity and Compressibility of Liquid Water, J. Chem. Eng. Data 20, 97",
    year: 1975,
  },
  kelley1960: {
    authors: "K. K. Kelley",
    title: "Contributions to the Data on Theoretical Metallurgy XIII, U.S. Bureau of Mines Bulletin 584",
    year: 1960,
  },
  lee1975: {
    authors: "B. I. Lee, M. G. Kesler",
    title: "A Generalized Thermodynamic Correlation Based on Three-Parameter Corresponding States, AIChE J. 21, 510",
    year: 1975,
  },
  mcbride1993: {
    authors: "B. J. McBride, S. Gordon, M. A. Reno",
    title: "Coefficients for Calculating Thermodynamic and Transport Properties of Individual Species, NASA TM-4513",
    year: 1993,
  },
  mcbride2002: {
    authors: "B. J. McBride, M. J. Zehe, S. Gordon",
    title:
      "NASA Glenn Coefficients for Calculating Thermodynamic Properties of Individual Species, NASA/TP-2002-211556",
    year: 2002,
  },
  mcquarrie2000: {
    authors: "D. A. McQuarrie",
    title: "Statistical Mechanics, University Science Books",
    year: 2000,
  },
  mohr2000: {
    authors: "P. J. Mohr, B. N. Taylor",
    title: "CODATA Recommended Values of the Fundamental Physical Constants: 1998, Rev. Mod. Phys. 72, 351",
    year: 2000,
  },
  mohr2005: {
    authors: "P. J. Mohr, B. N. Taylor",
    title: "CODATA Recommended Values of the Fundamental Physical Constants: 2002, Rev. Mod. Phys. 77, 1",
    year: 2005,
  },
  mohr2008: {
    authors: "P. J. Mohr, B. N. Taylor, D. B. Newell",
    title: "CODATA Recommended Values of the Fundamental Physical Constants: 2006, Rev. Mod. Phys. 80, 633",
    year: 2008,
  },
  mohr2012: {
    authors: "P. J. Mohr, B. N. Taylor, D. B. Newell",
    title: "CODATA Recommended Values of the Fundamental Physical Constants: 2010, Rev. Mod. Phys. 84, 1527",
    year: 2012,
  },
  mohr2016: {
    authors: "P. J. Mohr, D. B. Newell, B. N. Taylor",
    title: "CODATA Recommended Values of the Fundamental Physical Constants: 2014, Rev. Mod. Phys. 88, 035009",
    year: 2016,
  },
  moore1971: {
    authors: "C. E. Moore",
    title: "Atomic Energy Levels, NSRDS-NBS 35",
    year: 1971,
  },
  nelson1945: {
    authors: "J. B. Nelson, D. P. Riley",
    title: "The Thermal Expansion of Graphite from 15 C to 800 C, Proc. Phys. Soc. 57, 477",
    year: 1945,
  },
  pittam1972: {
    authors: "D. A. Pittam, G. Pilcher",
    title: "Measurements of Heats of Combustion by Flame Calorimetry 8, J. Chem. Soc., Faraday Trans. 1 68, 2224",
    year: 1972,
  },
  pitzer1957: {
    authors: "K. S. Pitzer, R. F. Curl Jr.",
    title: "The volumetric and thermodynamic properties of fluids. III, J. Am. Chem. Soc. 79, 2369",
    year: 1957,
  },
  prausnitz1999: {
    authors: "J. M. Prausnitz, R. N. Lichtenthaler, E. Gomes de Azevedo",
    title: "Molecular Thermodynamics of Fluid-Phase Equilibria, 3rd edition, Prentice Hall",
    year: 1999,
  },
  prestonthomas1990: {
    authors: "H. Preston-Thomas",
    title: "The International Temperature Scale of 1990 (ITS-90), Metrologia 27, 3",
    year: 1990,
  },
  prohaska2022: {
    authors: "T. Prohaska et al.",
    title: "Standard Atomic Weights of the Elements 2021, Pure Appl. Chem. 94, 573",
    year: 2022,
  },
  prosen1944: {
    authors: "E. J. Prosen, R. S. Jessup, F. D. Rossini",
    title: "Heat of Formation of Carbon Dioxide, J. Res. Natl. Bur. Stand. 33, 447",
    year: 1944,
  },
  robie1995: {
    authors: "R. A. Robie, B. S. Hemingway",
    title: "Thermodynamic Properties of Minerals and Related Substances at 298.15 K, USGS Bulletin 2131",
    year: 1995,
  },
  rossini1939: {
    authors: "F. D. Rossini",
    title: "Heat and Free Energy of Formation of Water and of Carbon Monoxide, J. Res. Natl. Bur. Stand. 22, 407",
    year: 1939,
  },
  ruscic2002: {
    authors: "B. Ruscic et al.",
    title: "On the Enthalpy of Formation of Hydroxyl Radical, J. Phys. Chem. A 106, 2727",
    year: 2002,
  },
  schadow2017: {
    authors: "G. Schadow, C. J. McDonald",
    title: "The Unified Code for Units of Measure, version 2.1, Regenstrief Institute",
    year: 2017,
  },
  shimanouchi1972: {
    authors: "T. Shimanouchi",
    title: "Tables of Molecular Vibrational Frequencies, NSRDS-NBS 39",
    year: 1972,
  },
  smith2001: {
    authors: "J. M. Smith, H. C. Van Ness, M. M. Abbott",
    title: "Introduction to Chemical Engineering Thermodynamics, 6th edition, McGraw-Hill",
    year: 2001,
  },
  span1996: {
    authors: "R. Span, W. Wagner",
    title: "A New Equation of State for Carbon Dioxide, J. Phys. Chem. Ref. Data 25, 1509",
    year: 1996,
  },
  swanson1953: {
    authors: "H. E. Swanson, E. Tatge",
    title: "Standard X-Ray Diffraction Powder Patterns, NBS Circular 539, volume 1",
    year: 1953,
  },
  tiesinga2021: {
    authors: "E. Tiesinga, P. J. Mohr, D. B. Newell, B. N. Taylor",
    title: "CODATA Recommended Values of the Fundamental Physical Constants: 2018, Rev. Mod. Phys. 93, 025010",
    year: 2021,
  },
  tsonopoulos1974: {
    authors: "C. Tsonopoulos",
    title: "An empirical correlation of second virial coefficients, AIChE J. 20, 263",
    year: 1974,
  },
  wagman1982: {
    authors: "D. D. Wagman et al.",
    title: "The NBS Tables of Chemical Thermodynamic Properties, J. Phys. Chem. Ref. Data 11, Supplement 2",
    year: 1982,
  },
  wagner2002: {
    authors: "W. Wagner, A. Pruss",
    title: "The IAPWS Formulation 1995, J. Phys. Chem. Ref. Data 31, 387",
    year: 2002,
  },
  wang2021: {
    authors: "M. Wang, W. J. Huang, F. G. Kondev, G. Audi, S. Naimi",
    title: "The AME 2020 Atomic Mass Evaluation (II), Chin. Phys. C 45, 030003",
    year: 2021,
  },
} as const;

/** The key of an entry of the bibliography. A citation that does not exist does not compile. */
export type Citation = keyof typeof entries;

/** Every source that the library cites, written out in this one place. */
export const references: Readonly<Record<Citation, Reference>> = entries;

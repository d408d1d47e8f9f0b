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
  abramowitz1964: {
    authors: "M. Abramowitz, I. A. Stegun",
    title: "Handbook of Mathematical Functions, NBS Applied Mathematics Series 55",
    year: 1964,
  },
  atkins2006: {
    authors: "P. Atkins, J. de Paula",
    title: "Physical Chemistry, 8th edition, Oxford University Press",
    year: 2006,
  },
  bandura2006: {
    authors: "A. V. Bandura, S. N. Lvov",
    title: "The Ionization Constant of Water, J. Phys. Chem. Ref. Data 35, 15",
    year: 2006,
  },
  bareiss1968: {
    authors: "E. H. Bareiss",
    title: "Sylvester's Identity and Multistep Integer-Preserving Gaussian Elimination, Math. Comp. 22, 565",
    year: 1968,
  },
  bates1945: {
    authors: "R. G. Bates, S. F. Acree",
    title: "pH of Aqueous Mixtures of Potassium Dihydrogen Phosphate, J. Res. Natl. Bur. Stand. 34, 373",
    year: 1945,
  },
  bates1949: {
    authors: "R. G. Bates, G. D. Pinching",
    title: "Acidic Dissociation Constant of Ammonium Ion, J. Res. Natl. Bur. Stand. 42, 419",
    year: 1949,
  },
  bates1951: {
    authors: "R. G. Bates",
    title: "First Dissociation Constant of Phosphoric Acid from 0 to 60 C, J. Res. Natl. Bur. Stand. 47, 127",
    year: 1951,
  },
  bates1954: {
    authors: "R. G. Bates, V. E. Bower",
    title: "Standard Potential of the Silver-Silver-Chloride Electrode, J. Res. Natl. Bur. Stand. 53, 283",
    year: 1954,
  },
  bates1956: {
    authors: "R. G. Bates, V. E. Bower, E. R. Smith",
    title: "Calcium Hydroxide as a Highly Alkaline pH Standard, J. Res. Natl. Bur. Stand. 56, 305",
    year: 1956,
  },
  beck1960: {
    authors: "W. H. Beck, J. V. Dobson, W. F. K. Wynne-Jones",
    title:
      "The Potentials of the Lead Dioxide/Lead Sulphate and Mercurous Sulphate Electrodes, Trans. Faraday Soc. 56, 1172",
    year: 1960,
  },
  bedford1996: {
    authors: "R. E. Bedford, G. Bonnier, H. Maas, F. Pavese",
    title:
      "Recommended Values of Temperature on the International Temperature Scale of 1990 for a Selected Set of Secondary Reference Points, Metrologia 33, 133",
    year: 1996,
  },
  berkowitz1994: {
    authors: "J. Berkowitz, G. B. Ellison, D. Gutman",
    title: "Three Methods to Measure RH Bond Energies, J. Phys. Chem. 98, 2744",
    year: 1994,
  },
  berman1985: {
    authors: "R. G. Berman, T. H. Brown",
    title: "Heat Capacity of Minerals, Contrib. Mineral. Petrol. 89, 168",
    year: 1985,
  },
  berman1988: {
    authors: "R. G. Berman",
    title: "Internally-Consistent Thermodynamic Data for Minerals, J. Petrology 29, 445",
    year: 1988,
  },
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
  bray2017: {
    authors: "T. Bray (ed.)",
    title: "The JavaScript Object Notation (JSON) Data Interchange Format, RFC 8259",
    year: 2017,
  },
  broene1947: {
    authors: "H. H. Broene, T. De Vries",
    title: "The Thermodynamics of Aqueous Hydrofluoric Acid Solutions, J. Am. Chem. Soc. 69, 1644",
    year: 1947,
  },
  brown1977: {
    authors: "D. W. Brown, C. E. Roberson",
    title: "Solubility of Natural Fluorite at 25 C, J. Res. U.S. Geol. Survey 5, 509",
    year: 1977,
  },
  chao1973: {
    authors: "J. Chao, R. C. Wilhoit, B. J. Zwolinski",
    title: "Ideal Gas Thermodynamic Properties of Ethane and Propane, J. Phys. Chem. Ref. Data 2, 427",
    year: 1973,
  },
  chao1975: {
    authors: "J. Chao, B. J. Zwolinski",
    title: "Ideal Gas Thermodynamic Properties of Ethylene and Propylene, J. Phys. Chem. Ref. Data 4, 251",
    year: 1975,
  },
  chao1986: {
    authors: "J. Chao, K. R. Hall, K. N. Marsh, R. C. Wilhoit",
    title: "Thermodynamic Properties of Key Organic Oxygen Compounds 2, J. Phys. Chem. Ref. Data 15, 1369",
    year: 1986,
  },
  chase1998: {
    authors: "M. W. Chase Jr.",
    title: "NIST-JANAF Thermochemical Tables, 4th edition, J. Phys. Chem. Ref. Data Monograph 9",
    year: 1998,
  },
  chen1975: {
    authors: "S. S. Chen, R. C. Wilhoit, B. J. Zwolinski",
    title: "Ideal Gas Thermodynamic Properties of n-Butane and Isobutane, J. Phys. Chem. Ref. Data 4, 859",
    year: 1975,
  },
  chen1977: {
    authors: "S. S. Chen, R. C. Wilhoit, B. J. Zwolinski",
    title: "Thermodynamic Properties of Normal and Deuterated Methanols, J. Phys. Chem. Ref. Data 6, 105",
    year: 1977,
  },
  chuang1987: {
    authors: "M. C. Chuang, M. F. Foltz, C. B. Moore",
    title:
      "T1 Barrier Height, S1-T1 Intersystem Crossing Rate, and S0 Radical Dissociation Threshold for H2CO, J. Chem. Phys. 87, 3855",
    year: 1987,
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
  covington1965: {
    authors: "A. K. Covington, J. V. Dobson, W. F. K. Wynne-Jones",
    title: "Dissociation Constant of the Bisulphate Ion at 25 C, Trans. Faraday Soc. 61, 2057",
    year: 1965,
  },
  cox1989: {
    authors: "J. D. Cox, D. D. Wagman, V. A. Medvedev",
    title: "CODATA Key Values for Thermodynamics, Hemisphere, New York",
    year: 1989,
  },
  darken1946: {
    authors: "L. S. Darken, R. W. Gurry",
    title: "The System Iron-Oxygen. II, J. Am. Chem. Soc. 68, 798",
    year: 1946,
  },
  dedonder1936: {
    authors: "T. De Donder, P. Van Rysselberghe",
    title: "Thermodynamic Theory of Affinity: A Book of Principles, Stanford University Press",
    year: 1936,
  },
  dinsdale1991: {
    authors: "A. T. Dinsdale",
    title: "Calphad 15, 317 (data for pure elements)",
    year: 1991,
  },
  ditmars1982: {
    authors: "D. A. Ditmars, S. Ishihara, S. S. Chang, G. Bernstein, E. D. West",
    title:
      "Enthalpy and Heat-Capacity Standard Reference Material: Synthetic Sapphire, J. Res. Natl. Bur. Stand. 87, 159",
    year: 1982,
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
  feistel2006: {
    authors: "R. Feistel, W. Wagner",
    title: "A New Equation of State for H2O Ice Ih, J. Phys. Chem. Ref. Data 35, 1021",
    year: 2006,
  },
  fenner1913: {
    authors: "C. N. Fenner",
    title: "The Stability Relations of the Silica Minerals, Am. J. Sci. 36, 331",
    year: 1913,
  },
  flaud1989: {
    authors: "J.-M. Flaud, C. Camy-Peyret, J. W. C. Johns, B. Carli",
    title: "The Far Infrared Spectrum of H2O2, J. Chem. Phys. 91, 1504",
    year: 1989,
  },
  fletcher1970: {
    authors: "R. A. Fletcher, G. Pilcher",
    title: "Measurements of Heats of Combustion by Flame Calorimetry 6, Trans. Faraday Soc. 66, 794",
    year: 1970,
  },
  freeman1984: {
    authors: "R. D. Freeman",
    title: "Conversion of Standard Thermodynamic Data to the New Standard-State Pressure, J. Chem. Eng. Data 29, 105",
    year: 1984,
  },
  giauque1936: {
    authors: "W. F. Giauque, J. W. Stout",
    title: "The Entropy of Water and the Third Law of Thermodynamics, J. Am. Chem. Soc. 58, 1144",
    year: 1936,
  },
  gibson1985: {
    authors: "S. T. Gibson, J. P. Greene, J. Berkowitz",
    title: "Photoionization of the Amidogen Radical, J. Chem. Phys. 83, 4319",
    year: 1985,
  },
  gillespie1930: {
    authors: "L. J. Gillespie, J. A. Beattie",
    title: "The Thermodynamic Treatment of Chemical Equilibria in Systems Composed of Real Gases I, Phys. Rev. 36, 743",
    year: 1930,
  },
  gillespie1936: {
    authors: "L. J. Gillespie, L. H. D. Fraser",
    title: "The Normal Vapor Pressure of Crystalline Iodine, J. Am. Chem. Soc. 58, 2260",
    year: 1936,
  },
  grenthe1992: {
    authors: "I. Grenthe et al.",
    title: "Chemical Thermodynamics of Uranium, auxiliary data, North-Holland, Amsterdam",
    year: 1992,
  },
  haas1976: {
    authors: "J. L. Haas Jr., J. R. Fisher",
    title: "Simultaneous Evaluation and Correlation of Thermodynamic Data, Am. J. Sci. 276, 525",
    year: 1976,
  },
  hamer1972: {
    authors: "W. J. Hamer, Y.-C. Wu",
    title:
      "Osmotic Coefficients and Mean Activity Coefficients of Uni-univalent Electrolytes, J. Phys. Chem. Ref. Data 1, 1047",
    year: 1972,
  },
  harned1933: {
    authors: "H. S. Harned, R. W. Ehlers",
    title: "The Dissociation Constant of Acetic Acid from 0 to 60 C, J. Am. Chem. Soc. 55, 652",
    year: 1933,
  },
  harned1941: {
    authors: "H. S. Harned, S. R. Scholes Jr.",
    title: "The Ionization Constant of HCO3- from 0 to 50 C, J. Am. Chem. Soc. 63, 1706",
    year: 1941,
  },
  harned1943: {
    authors: "H. S. Harned, R. Davis Jr.",
    title: "The Ionization Constant of Carbonic Acid in Water, J. Am. Chem. Soc. 65, 2030",
    year: 1943,
  },
  herzberg1966: {
    authors: "G. Herzberg",
    title: "Molecular Spectra and Molecular Structure III: Electronic Spectra of Polyatomic Molecules, Van Nostrand",
    year: 1966,
  },
  hetzer1962: {
    authors: "H. B. Hetzer, R. A. Robinson, R. G. Bates",
    title: "Standard Electromotive Force of the Hydrogen-Silver Bromide Cell, J. Phys. Chem. 66, 1423",
    year: 1962,
  },
  hietanen1956: {
    authors: "S. Hietanen, L. G. Sillen",
    title: "On the Standard Potentials of Mercury and the Equilibrium Hg + Hg2+ = Hg2 2+, Ark. Kemi 10, 103",
    year: 1956,
  },
  hill1956: {
    authors: "K. J. Hill, E. R. S. Winter",
    title: "Thermal Dissociation Pressure of Calcium Carbonate, J. Phys. Chem. 60, 1361",
    year: 1956,
  },
  hills1951: {
    authors: "G. J. Hills, D. J. G. Ives",
    title: "The Hydrogen Electrode and Calomel Electrode IV, J. Chem. Soc. 1951, 318",
    year: 1951,
  },
  holland2011: {
    authors: "T. J. B. Holland, R. Powell",
    title: "An Improved and Extended Internally Consistent Dataset, J. Metamorphic Geol. 29, 333",
    year: 2011,
  },
  holley1951: {
    authors: "C. E. Holley Jr., E. J. Huber Jr.",
    title: "The Heats of Combustion of Magnesium and Aluminum, J. Am. Chem. Soc. 73, 5577",
    year: 1951,
  },
  huber1979: {
    authors: "K. P. Huber, G. Herzberg",
    title: "Molecular Spectra and Molecular Structure IV: Constants of Diatomic Molecules, Van Nostrand",
    year: 1979,
  },
  huebner1971: {
    authors: "J. S. Huebner",
    title:
      "Buffering Techniques for Hydrostatic Systems at Elevated Pressures, in Research Techniques for High Pressure and High Temperature, Springer",
    year: 1971,
  },
  hultgren1973: {
    authors: "R. Hultgren et al.",
    title: "Selected Values of the Thermodynamic Properties of the Elements, American Society for Metals",
    year: 1973,
  },
  jacox1994: {
    authors: "M. E. Jacox",
    title:
      "Vibrational and Electronic Energy Levels of Polyatomic Transient Molecules, J. Phys. Chem. Ref. Data Monograph 3",
    year: 1994,
  },
  jcgm2008: {
    authors: "Joint Committee for Guides in Metrology",
    title: "Guide to the Expression of Uncertainty in Measurement, JCGM 100:2008",
    year: 2008,
  },
  jones1928: {
    authors: "G. Jones, B. B. Kaplan",
    title: "The Normal Electrode Potential of the Iodine-Iodide Electrode, J. Am. Chem. Soc. 50, 2066",
    year: 1928,
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
  kistiakowsky1935: {
    authors: "G. B. Kistiakowsky, H. Romeyn Jr., J. R. Ruhoff, H. A. Smith, W. E. Vaughan",
    title: "Heats of Organic Reactions I. The Heat of Hydrogenation of Ethylene, J. Am. Chem. Soc. 57, 65",
    year: 1935,
  },
  kubaschewski1993: {
    authors: "O. Kubaschewski, C. B. Alcock, P. J. Spencer",
    title: "Materials Thermochemistry, 6th edition, Pergamon Press, Oxford",
    year: 1993,
  },
  laplaca1960: {
    authors: "S. J. La Placa, B. Post",
    title: "Thermal Expansion of Ice, Acta Cryst. 13, 503",
    year: 1960,
  },
  latimer1952: {
    authors: "W. M. Latimer",
    title: "The Oxidation States of the Elements and Their Potentials in Aqueous Solutions, 2nd edition, Prentice-Hall",
    year: 1952,
  },
  lee1975: {
    authors: "B. I. Lee, M. G. Kesler",
    title: "A Generalized Thermodynamic Correlation Based on Three-Parameter Corresponding States, AIChE J. 21, 510",
    year: 1975,
  },
  lees1968: {
    authors: "R. M. Lees, J. G. Baker",
    title: "Torsion-Vibration-Rotation Interactions in Methanol I, J. Chem. Phys. 48, 5299",
    year: 1968,
  },
  lemire2013: {
    authors: "R. J. Lemire et al.",
    title: "Chemical Thermodynamics of Iron, Part 1, OECD Nuclear Energy Agency, Paris",
    year: 2013,
  },
  levien1980: {
    authors: "L. Levien, C. T. Prewitt, D. J. Weidner",
    title: "Structure and Elastic Properties of Quartz at Pressure, Am. Mineral. 65, 920",
    year: 1980,
  },
  lide2004: {
    authors: "D. R. Lide (ed.)",
    title: "CRC Handbook of Chemistry and Physics, 84th edition, CRC Press",
    year: 2004,
  },
  linstrom2001: {
    authors: "P. J. Linstrom, W. G. Mallard",
    title: "The NIST Chemistry WebBook: A Chemical Data Resource on the Internet, J. Chem. Eng. Data 46, 1059",
    year: 2001,
  },
  mah1957: {
    authors: "A. D. Mah",
    title: "Heats of Formation of Alumina, Molybdenum Trioxide and Molybdenum Dioxide, J. Phys. Chem. 61, 1572",
    year: 1957,
  },
  marshall1966: {
    authors: "W. L. Marshall, R. Slusher",
    title: "Thermodynamics of Calcium Sulfate Dihydrate in Aqueous Sodium Chloride Solutions, J. Phys. Chem. 70, 4015",
    year: 1966,
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
  mcgee1973: {
    authors: "K. A. McGee, P. B. Hostetler",
    title: "Stability Constants for MgOH+ and Brucite below 100 C, Trans. Am. Geophys. Union 54, 487",
    year: 1973,
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
  morris1981: {
    authors: "M. C. Morris et al.",
    title: "Standard X-Ray Diffraction Powder Patterns, NBS Monograph 25, section 18",
    year: 1981,
  },
  motzkin1953: {
    authors: "T. S. Motzkin, H. Raiffa, G. L. Thompson, R. M. Thrall",
    title: "The Double Description Method, Contributions to the Theory of Games II, Ann. Math. Studies 28, 51",
    year: 1953,
  },
  nelson1945: {
    authors: "J. B. Nelson, D. P. Riley",
    title: "The Thermal Expansion of Graphite from 15 C to 800 C, Proc. Phys. Soc. 57, 477",
    year: 1945,
  },
  newnham1962: {
    authors: "R. E. Newnham, Y. M. de Haan",
    title: "Refinement of the alpha-Al2O3, Ti2O3, V2O3 and Cr2O3 Structures, Z. Kristallogr. 117, 235",
    year: 1962,
  },
  olofsson1975: {
    authors: "G. Olofsson, L. G. Hepler",
    title:
      "Thermodynamics of Ionization of Water over Wide Ranges of Temperature and Pressure, J. Solution Chem. 4, 127",
    year: 1975,
  },
  owen1938: {
    authors: "B. B. Owen, S. R. Brinkley Jr.",
    title:
      "The Standard Potential of the Silver Electrode and the Solubility of Silver Chloride, J. Am. Chem. Soc. 60, 2229",
    year: 1938,
  },
  palmer1992: {
    authors: "D. A. Palmer, D. J. Wesolowski",
    title:
      "Aluminum Speciation and Equilibria in Aqueous Solution II: The Solubility of Gibbsite, Geochim. Cosmochim. Acta 56, 1093",
    year: 1992,
  },
  parker1965: {
    authors: "V. B. Parker",
    title: "Thermal Properties of Aqueous Uni-univalent Electrolytes, NSRDS-NBS 2",
    year: 1965,
  },
  parker1995: {
    authors: "V. B. Parker, I. L. Khodakovskii",
    title: "Thermodynamic Properties of the Aqueous Ions (2+ and 3+) of Iron, J. Phys. Chem. Ref. Data 24, 1699",
    year: 1995,
  },
  pedley1986: {
    authors: "J. B. Pedley, R. D. Naylor, S. P. Kirby",
    title: "Thermochemical Data of Organic Compounds, 2nd edition, Chapman and Hall, London",
    year: 1986,
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
  plummer1982: {
    authors: "L. N. Plummer, E. Busenberg",
    title:
      "The Solubilities of Calcite, Aragonite and Vaterite in CO2-H2O Solutions, Geochim. Cosmochim. Acta 46, 1011",
    year: 1982,
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
  prosen1945: {
    authors: "E. J. Prosen, R. Gilmont, F. D. Rossini",
    title: "Heats of Combustion of Benzene, Toluene, Ethylbenzene and Others, J. Res. Natl. Bur. Stand. 34, 65",
    year: 1945,
  },
  robie1978: {
    authors: "R. A. Robie, B. S. Hemingway, J. R. Fisher",
    title: "Thermodynamic Properties of Minerals and Related Substances at 298.15 K, USGS Bulletin 1452",
    year: 1978,
  },
  robie1995: {
    authors: "R. A. Robie, B. S. Hemingway",
    title: "Thermodynamic Properties of Minerals and Related Substances at 298.15 K, USGS Bulletin 2131",
    year: 1995,
  },
  robinson1959: {
    authors: "R. A. Robinson, R. H. Stokes",
    title: "Electrolyte Solutions, 2nd edition, Butterworths, London",
    year: 1959,
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
  ruscic2005: {
    authors: "B. Ruscic et al.",
    title:
      "IUPAC Critical Evaluation of Thermochemical Properties of Selected Radicals I, J. Phys. Chem. Ref. Data 34, 573",
    year: 2005,
  },
  sander2015: {
    authors: "R. Sander",
    title: "Compilation of Henry's Law Constants for Water as Solvent, Atmos. Chem. Phys. 15, 4399",
    year: 2015,
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
  shock1988: {
    authors: "E. L. Shock, H. C. Helgeson",
    title:
      "Calculation of the Thermodynamic Properties of Aqueous Species: Standard Partial Molal Properties of Ions, Geochim. Cosmochim. Acta 52, 2009",
    year: 1988,
  },
  shock1990: {
    authors: "E. L. Shock, H. C. Helgeson",
    title:
      "Calculation of the Thermodynamic Properties of Aqueous Species: Organic Species, Geochim. Cosmochim. Acta 54, 915",
    year: 1990,
  },
  shock1997: {
    authors: "E. L. Shock, D. C. Sassani, M. Willis, D. A. Sverjensky",
    title: "Inorganic Species in Geologic Fluids, Geochim. Cosmochim. Acta 61, 907",
    year: 1997,
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
  stull1969: {
    authors: "D. R. Stull, E. F. Westrum Jr., G. C. Sinke",
    title: "The Chemical Thermodynamics of Organic Compounds, Wiley, New York",
    year: 1969,
  },
  suleimenov1997: {
    authors: "O. M. Suleimenov, T. M. Seward",
    title:
      "A Spectrophotometric Study of Hydrogen Sulphide Ionisation in Aqueous Solutions to 350 C, Geochim. Cosmochim. Acta 61, 5187",
    year: 1997,
  },
  swanson1953: {
    authors: "H. E. Swanson, E. Tatge",
    title: "Standard X-Ray Diffraction Powder Patterns, NBS Circular 539, volume 1",
    year: 1953,
  },
  swanson1956: {
    authors: "H. E. Swanson, N. T. Gilfrich, M. I. Cook",
    title: "Standard X-Ray Diffraction Powder Patterns, NBS Circular 539, volume 6",
    year: 1956,
  },
  swartzendruber1982: {
    authors: "L. J. Swartzendruber",
    title: "The Fe (Iron) System, Bull. Alloy Phase Diagrams 3, 161",
    year: 1982,
  },
  sweeton1970: {
    authors: "F. H. Sweeton, C. F. Baes Jr.",
    title:
      "The Solubility of Magnetite and Hydrolysis of Ferrous Ion at Elevated Temperatures, J. Chem. Thermodyn. 2, 479",
    year: 1970,
  },
  taylor1941: {
    authors: "A. H. Taylor Jr., R. H. Crist",
    title: "Rate and Equilibrium Studies on the Thermal Reaction of Hydrogen and Iodine, J. Am. Chem. Soc. 63, 1377",
    year: 1941,
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
  vanderzee1961: {
    authors: "C. E. Vanderzee, A. S. Quist",
    title: "The Third Dissociation Constant of Orthophosphoric Acid, J. Phys. Chem. 65, 118",
    year: 1961,
  },
  vanysek2004: {
    authors: "P. Vanysek",
    title: "Electrochemical Series, CRC Handbook of Chemistry and Physics, 84th edition, CRC Press",
    year: 2004,
  },
  verhoek1931: {
    authors: "F. H. Verhoek, F. Daniels",
    title: "The Dissociation Constants of Nitrogen Tetroxide and of Nitrogen Trioxide, J. Am. Chem. Soc. 53, 1250",
    year: 1931,
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
  wagner2011: {
    authors: "W. Wagner, T. Riethmann, R. Feistel, A. H. Harvey",
    title:
      "New Equations for the Sublimation Pressure and Melting Pressure of H2O Ice Ih, J. Phys. Chem. Ref. Data 40, 043103",
    year: 2011,
  },
  wang2021: {
    authors: "M. Wang, W. J. Huang, F. G. Kondev, G. Audi, S. Naimi",
    title: "The AME 2020 Atomic Mass Evaluation (II), Chin. Phys. C 45, 030003",
    year: 2021,
  },
  wechsler1984: {
    authors: "B. A. Wechsler, D. H. Lindsley, C. T. Prewitt",
    title: "Crystal Structure and Cation Distribution in Titanomagnetites, Am. Mineral. 69, 754",
    year: 1984,
  },
  weiss1968: {
    authors: "S. Weiss, G. E. Leroi",
    title: "Direct Observation of the Infrared Torsional Spectrum of C2H6, CH3CD3 and C2D6, J. Chem. Phys. 48, 962",
    year: 1968,
  },
  whittemore1972: {
    authors: "D. O. Whittemore, D. Langmuir",
    title: "Standard Electrode Potential of Fe3+ + e- = Fe2+ from 5-35 C, J. Chem. Eng. Data 17, 288",
    year: 1972,
  },
  wise1963: {
    authors: "S. S. Wise, J. L. Margrave, H. M. Feder, W. N. Hubbard",
    title:
      "Fluorine Bomb Calorimetry. V. The Heats of Formation of Silicon Tetrafluoride and Silica, J. Phys. Chem. 67, 815",
    year: 1963,
  },
  wyckoff1963: {
    authors: "R. W. G. Wyckoff",
    title: "Crystal Structures, 2nd edition, volume 1, Interscience",
    year: 1963,
  },
} as const;

/** The key of an entry of the bibliography. A citation that does not exist does not compile. */
export type Citation = keyof typeof entries;

/** Every source that the library cites, written out in this one place. */
export const references: Readonly<Record<Citation, Reference>> = entries;

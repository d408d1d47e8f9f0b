import type { CollectionData } from "../species/record.js";
import { C_g, H_g, N_g, O_g } from "./atoms.js";
import { CH4_g, CO_g, CO2_g } from "./carbon-gases.js";
import { C_cr_graphite, CaCO3_cr_calcite, CaO_cr } from "./condensed-phases.js";
import { H2_g, N2_g, O2_g } from "./elemental-gases.js";
import { NH3_g, NO_g, NO2_g } from "./nitrogen-gases.js";
import { Ar_g, He_g } from "./noble-gases.js";
import { SO2_g, SO3_g } from "./sulfur-oxides.js";
import { H2O_g, H2O_l, OH_g } from "./water.js";

/** The reference data set: every record of this folder, as plain data that functions with a collection accept. */
export const referenceData: CollectionData = {
  species: [
    H2_g,
    N2_g,
    O2_g,
    He_g,
    Ar_g,
    H_g,
    C_g,
    N_g,
    O_g,
    H2O_g,
    H2O_l,
    OH_g,
    CO_g,
    CO2_g,
    CH4_g,
    NH3_g,
    NO_g,
    NO2_g,
    SO2_g,
    SO3_g,
    C_cr_graphite,
    CaO_cr,
    CaCO3_cr_calcite,
  ],
  sequences: [],
};

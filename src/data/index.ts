export { C_g, H_g, N_g, O_g } from "./atoms.js";
export { CH4_g, CO_g, CO2_g } from "./carbon-gases.js";
export { C_cr_graphite, CaCO3_cr_calcite, CaO_cr } from "./condensed-phases.js";
export { H2_g, N2_g, O2_g } from "./elemental-gases.js";
export { NH3_g, NO_g, NO2_g } from "./nitrogen-gases.js";
export { Ar_g, He_g } from "./noble-gases.js";
export { referenceData } from "./reference-data.js";
export { SO2_g, SO3_g } from "./sulfur-oxides.js";
export { H2O_g, H2O_l, OH_g } from "./water.js";

export { K_cr, K_l, Na_cr, Na_l } from "./alkali-metals.js";
export { Ca_cr_alpha, Ca_cr_beta, Ca_l, Mg_cr, Mg_l } from "./alkaline-earth-metals.js";
export { Al_cr, Al_l, Si_cr, Si_l } from "./aluminium-silicon.js";
export {
  Br_minus_aq,
  CH3COO_minus_aq,
  Cl_minus_aq,
  ClO4_minus_aq,
  CO3_2minus_aq,
  F_minus_aq,
  H2PO4_minus_aq,
  HCO3_minus_aq,
  HPO4_2minus_aq,
  HS_minus_aq,
  HSO4_minus_aq,
  I_minus_aq,
  NO3_minus_aq,
  OH_minus_aq,
  PO4_3minus_aq,
  SO4_2minus_aq,
} from "./aqueous-anions.js";
export {
  Ag_plus_aq,
  Al_3plus_aq,
  Ca_2plus_aq,
  Cu_2plus_aq,
  Fe_2plus_aq,
  Fe_3plus_aq,
  H_plus_aq,
  Hg_2plus_aq,
  Hg2_2plus_aq,
  K_plus_aq,
  Mg_2plus_aq,
  Na_plus_aq,
  NH4_plus_aq,
  Pb_2plus_aq,
  Zn_2plus_aq,
} from "./aqueous-cations.js";
export { CH3COOH_aq, CO2_aq, H2S_aq, H3PO4_aq, HF_aq, NH3_aq } from "./aqueous-molecules.js";
export { C_g, H_g, N_g, O_g } from "./atoms.js";
export { CH4_g, CO_g, CO2_g } from "./carbon-gases.js";
export { C2H_g, CH_g, CH2_g, CH3_g, HCO_g } from "./carbon-radicals.js";
export { Br2_l, I2_cr } from "./condensed-halogens.js";
export { C_cr_graphite, CaCO3_cr_calcite, CaO_cr } from "./condensed-phases.js";
export { H2_g, N2_g, O2_g } from "./elemental-gases.js";
export { AgCl_cr, KCl_cr, NaCl_cr } from "./halides.js";
export { Br_g, Br2_g, Cl_g, Cl2_g, F_g, F2_g, I_g, I2_g } from "./halogens.js";
export { C2H2_g, C2H4_g, C2H6_g, C3H6_g, C3H8_g, C4H10_g_n_butane, C6H6_g } from "./hydrocarbons.js";
export { HBr_g, HCl_g, HF_g, HI_g } from "./hydrogen-halides.js";
export { H2O_cr } from "./ice.js";
export { Fe_cr_alpha, Fe_cr_delta, Fe_cr_gamma, Fe_l } from "./iron.js";
export { Fe0_947O_cr_wustite, Fe2O3_cr_hematite, Fe3O4_cr_magnetite } from "./iron-oxides.js";
export { Hg_l, Pb_cr, Pb_l } from "./lead-mercury.js";
export { Al_g, Ca_g, Fe_g, K_g, Mg_g, Na_g } from "./metal-atoms.js";
export {
  Al2O3_cr_corundum,
  Ca_OH_2_cr_portlandite,
  Mg_OH_2_cr_brucite,
  MgCO3_cr_magnesite,
  MgO_cr,
} from "./minerals.js";
export { CN_g, HCN_g, N2H4_g, N2O_g, N2O4_g, NH_g } from "./nitrogen-compounds.js";
export { NH3_g, NO_g, NO2_g } from "./nitrogen-gases.js";
export { Ar_g, He_g, Kr_g, Ne_g, Xe_g } from "./noble-gases.js";
export { H2O2_g, HO2_g, O3_g } from "./oxygen-radicals.js";
export { C2H5OH_g, CH2O_g, CH3OH_g } from "./oxygenated-gases.js";
export { P_cr_white } from "./phosphorus.js";
export { SiO2_cr_alpha_quartz, SiO2_cr_beta_quartz } from "./quartz.js";
export { referenceData } from "./reference-data.js";
export {
  AgBr_cr,
  Al_OH_3_cr_gibbsite,
  CaF2_cr,
  CaSO4_2H2O_cr_gypsum,
  Hg2Cl2_cr,
  Hg2SO4_cr,
  HgO_cr_red,
  PbSO4_cr,
} from "./sparingly-soluble-salts.js";
export { S_cr_monoclinic, S_cr_rhombic, S_l } from "./sulfur.js";
export { COS_g, H2S_g, S_g, S2_g, SO_g } from "./sulfur-gases.js";
export { SO2_g, SO3_g } from "./sulfur-oxides.js";
export { Ag_cr, Ag_l, Cu_cr, Cu_l, Zn_cr, Zn_l } from "./transition-metals.js";
export { H2O_g, H2O_l, OH_g } from "./water.js";

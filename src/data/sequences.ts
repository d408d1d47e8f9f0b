import type { PhaseSequence } from "../species/record.js";

/** Solids as they are stable at 1 bar, under the label without polymorph. */
export const solidSequences: readonly PhaseSequence[] = [
  { label: "Ca(cr)", phases: ["Ca(cr,alpha)", "Ca(cr,beta)"], source: "dinsdale1991", origin: "memory" },
  {
    label: "Fe(cr)",
    phases: ["Fe(cr,alpha)", "Fe(cr,gamma)", "Fe(cr,delta)"],
    source: "mcbride2002",
    origin: "memory",
  },
  { label: "S(cr)", phases: ["S(cr,rhombic)", "S(cr,monoclinic)"], source: "chase1998", origin: "memory" },
  { label: "SiO2(cr)", phases: ["SiO2(cr,alpha-quartz)", "SiO2(cr,beta-quartz)"], source: "chase1998", origin: "memory" },
];

/** Elements in their reference phases at 1 bar, under the formula that their properties are for. */
export const elementSequences: readonly PhaseSequence[] = [
  { label: "H2", phases: ["H2(g)"], source: "chase1998", origin: "memory" },
  { label: "He", phases: ["He(g)"], source: "chase1998", origin: "memory" },
  { label: "C", phases: ["C(cr,graphite)"], source: "chase1998", origin: "memory" },
  { label: "N2", phases: ["N2(g)"], source: "chase1998", origin: "memory" },
  { label: "O2", phases: ["O2(g)"], source: "chase1998", origin: "memory" },
  { label: "F2", phases: ["F2(g)"], source: "chase1998", origin: "memory" },
  { label: "Ne", phases: ["Ne(g)"], source: "chase1998", origin: "memory" },
  { label: "Na", phases: ["Na(cr)", "Na(l)", "Na(g)"], source: "chase1998", origin: "memory" },
  { label: "Mg", phases: ["Mg(cr)", "Mg(l)", "Mg(g)"], source: "chase1998", origin: "memory" },
  { label: "Al", phases: ["Al(cr)", "Al(l)"], source: "dinsdale1991", origin: "memory" },
  { label: "Si", phases: ["Si(cr)", "Si(l)"], source: "dinsdale1991", origin: "memory" },
  { label: "P", phases: ["P(cr,white)"], source: "cox1989", origin: "memory" },
  {
    label: "S2",
    phases: ["S(cr,rhombic)", "S(cr,monoclinic)", "S(l)", "S2(g)"],
    source: "chase1998",
    origin: "memory",
  },
  { label: "Cl2", phases: ["Cl2(g)"], source: "chase1998", origin: "memory" },
  { label: "Ar", phases: ["Ar(g)"], source: "chase1998", origin: "memory" },
  { label: "K", phases: ["K(cr)", "K(l)", "K(g)"], source: "chase1998", origin: "memory" },
  { label: "Ca", phases: ["Ca(cr,alpha)", "Ca(cr,beta)", "Ca(l)", "Ca(g)"], source: "chase1998", origin: "memory" },
  {
    label: "Fe",
    phases: ["Fe(cr,alpha)", "Fe(cr,gamma)", "Fe(cr,delta)", "Fe(l)"],
    source: "mcbride2002",
    origin: "memory",
  },
  { label: "Cu", phases: ["Cu(cr)", "Cu(l)"], source: "dinsdale1991", origin: "memory" },
  { label: "Zn", phases: ["Zn(cr)", "Zn(l)"], source: "dinsdale1991", origin: "memory" },
  { label: "Br2", phases: ["Br2(l)", "Br2(g)"], source: "chase1998", origin: "memory" },
  { label: "Kr", phases: ["Kr(g)"], source: "cox1989", origin: "memory" },
  { label: "Ag", phases: ["Ag(cr)", "Ag(l)"], source: "dinsdale1991", origin: "memory" },
  { label: "I2", phases: ["I2(cr)"], source: "chase1998", origin: "memory" },
  { label: "Xe", phases: ["Xe(g)"], source: "cox1989", origin: "memory" },
  { label: "Hg", phases: ["Hg(l)"], source: "dinsdale1991", origin: "memory" },
  { label: "Pb", phases: ["Pb(cr)", "Pb(l)"], source: "dinsdale1991", origin: "memory" },
];

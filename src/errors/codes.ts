/**
 * The closed table of fault codes. A code names the room and what is wrong; it never changes its meaning between
 * versions. New codes are added in the section of their room, in alphabetical order.
 */
export const faultCodes = [
  // any room
  "input/conflicting-options",
  "input/forbidden-key",
  "input/missing",
  "input/not-an-array",
  "input/not-an-object",
  "input/not-finite",
  "input/not-a-string",
  "input/too-large",
  "input/unknown-key",
  "input/unknown-option",
  // numeric
  "numeric/division-by-zero",
  "numeric/not-a-decimal",
  "numeric/outside-domain",
  // quantity
  "quantity/below-absolute-zero",
  "quantity/negative-uncertainty",
  "quantity/not-a-quantity",
  "quantity/not-finite",
  "quantity/not-positive",
  "quantity/overflow",
  "quantity/syntax",
  "quantity/unknown-unit",
  "quantity/wrong-dimension",
  // uncertainty
  "uncertainty/inconsistent-datum",
  "uncertainty/invalid-coverage",
  "uncertainty/overflow",
  // formula
  "formula/ambiguous-dot",
  "formula/charge-order",
  "formula/count-out-of-range",
  "formula/empty",
  "formula/no-atomic-weight",
  "formula/syntax",
  "formula/too-deep",
  "formula/too-long",
  "formula/unknown-element",
  "formula/unknown-state",
  "formula/zero-count",
  // heat-capacity
  "heat-capacity/coefficient-count",
  "heat-capacity/intervals",
  "heat-capacity/no-anchor",
  "heat-capacity/not-available",
  "heat-capacity/outside-range",
  "heat-capacity/overflow",
  "heat-capacity/unknown-form",
  // species
  "species/ambiguous",
  "species/duplicate-label",
  "species/inconsistent",
  "species/invalid-record",
  "species/mixed-conventions",
  "species/model-missing",
  "species/no-join",
  "species/no-reference",
  "species/not-found",
  "species/outside-range",
  // fugacity
  "fugacity/binary-interaction",
  "fugacity/coefficient-function",
  "fugacity/conflicting-options",
  "fugacity/invalid-critical-constants",
  "fugacity/missing-critical-constants",
  "fugacity/outside-validity",
  "fugacity/unphysical",
  // activity
  "activity/invalid-component",
  "activity/scale-not-served",
  "activity/unphysical",
  // standard-state
  "standard-state/charged-gas",
  "standard-state/invalid-composition",
  "standard-state/invalid-molecule",
  "standard-state/missing-enthalpy-increment",
  "standard-state/no-electrons",
  "standard-state/no-solvent",
  "standard-state/no-state",
  "standard-state/other-convention",
  "standard-state/volume-of-gas",
  // reaction
  "reaction/coefficient-out-of-range",
  "reaction/constant-out-of-range",
  "reaction/different-records",
  "reaction/empty",
  "reaction/invalid",
  "reaction/no-common-range",
  "reaction/not-a-reaction",
  "reaction/not-balanceable",
  "reaction/syntax",
  "reaction/too-long",
  "reaction/too-many-species",
  "reaction/trivial",
  "reaction/unbalanced",
  // conditions
  "conditions/duplicate-label",
  "conditions/fractions-do-not-sum",
  "conditions/invalid-amount",
  "conditions/invalid-density",
  "conditions/invalid-fraction",
  "conditions/missing-activity",
  "conditions/missing-activity-model",
  "conditions/missing-composition",
  "conditions/mixed-standard-states",
  "conditions/pressure-mismatch",
  "conditions/unknown-label",
  "conditions/zero-activity",
  // reaction: roots
  "roots/empty-range",
  "roots/not-bracketed",
  // compiled
  "compiled/length-mismatch",
  "compiled/not-a-float-array",
  "compiled/overlapping-arrays",
  // precision
  "precision/digits",
  "precision/not-available",
  // checks
  "checks/no-inputs",
  // report
  "report/no-rows",
  // exchange
  "exchange/duplicate-key",
  "exchange/not-json",
  "exchange/too-deep",
] as const;

/** One of the closed set of fault codes. */
export type FaultCode = (typeof faultCodes)[number];

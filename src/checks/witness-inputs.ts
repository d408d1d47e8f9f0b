import { describeReceived } from "../errors/fault.js";
import { fail } from "../errors/gibbs-ledger-error.js";
import type { Figure } from "../quantity/figure.js";
import { figureInSi } from "../quantity/figure-value.js";
import { isUnitCode } from "../quantity/units.js";
import type { SpeciesRecord, Witness } from "../species/record.js";

/** Units of molecules, crystals and cells that quantities need not know, with factors to the unit of the check. */
const unitsOfChecks: Readonly<Record<string, number>> = { "cm-1": 1, Ao: 1, "g/cm3": 1, "mV/K": 0.001 };

/** A figure that the witness compares with, in coherent SI units; cm-1, Ao and g/cm3 stay as printed. */
export function optionalInput(witness: Witness, name: string): number | undefined {
  const figure = witness.against?.[name];
  return figure === undefined ? undefined : numberOf(figure);
}

/**
 * The same, where the check cannot do without.
 *
 * @throws GibbsLedgerError "checks/no-inputs"
 */
export function requiredInput(record: SpeciesRecord, witness: Witness, name: string): number {
  const value = optionalInput(witness, name);
  return value ?? missing(record, witness.check, `the figure "${name}" among those it compares with`);
}

/** A figure of the record in coherent SI units, where the check cannot do without. */
export function requiredFigure(
  record: SpeciesRecord,
  check: Witness["check"],
  name: string,
  figure: Figure | undefined,
): number {
  return figure === undefined ? missing(record, check, `the record's ${name}`) : numberOf(figure);
}

/** Reports that a check lacks something. */
export function missing(record: SpeciesRecord, check: Witness["check"], what: string): never {
  return fail({
    code: "checks/no-inputs",
    path: [record.label, "witnesses", check],
    message: `the check "${check}" of ${record.label} needs ${what}`,
    expected: what,
  });
}

function numberOf(figure: Figure): number {
  if (!Number.isFinite(figure?.value)) {
    return fail({
      code: "input/not-finite",
      path: ["against"],
      message: `a check compares with a finite number, got ${describeReceived(figure?.value)}`,
      received: describeReceived(figure?.value),
    });
  }
  const factor = unitsOfChecks[figure.unit];
  if (factor !== undefined) return figure.value * factor;
  if (isUnitCode(figure.unit)) return figureInSi(figure);
  return fail({
    code: "quantity/unknown-unit",
    path: ["against"],
    message: `a check cannot read the unit "${figure.unit}"`,
    received: figure.unit,
  });
}

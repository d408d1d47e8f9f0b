import { cut, type Fault, type FaultPath } from "../errors/fault.js";
import { adapterOf, type FormAdapter, heatCapacityForms, type PowersRule } from "./forms.js";
import type { HeatCapacityForm, PublishedSeries } from "./published-series.js";

/** Collects what is wrong with the parts of a series that depend on its form. */
export function checkForm(published: PublishedSeries, path: FaultPath, faults: Fault[]): void {
  const adapter = adapterOf(published.form);
  if (adapter === undefined) {
    faults.push({
      code: "heat-capacity/unknown-form",
      path: [...path, "form"],
      message: `${cut(String(published.form))} is not a form of heat capacity that is read`,
      expected: heatCapacityForms.join(", "),
    });
    return;
  }
  if (adapter.needsGasConstant && published.gasConstant === undefined) {
    faults.push({
      code: "input/missing",
      path: [...path, "gasConstant"],
      message: `the ${published.form} form needs the gas constant it was printed with`,
      expected: "a number in J/mol/K",
      hint: "8.31451 for coefficients printed between 1986 and 2002",
    });
  }
  const powers = published.powers;
  if (adapter.powers !== undefined) checkPowers(powers, adapter.powers, path, faults);
  else if (powers !== undefined) refuseKey("powers", published.form, path, faults);
  if (adapter.carriesConstants) {
    if (published.unit !== undefined) refuseKey("unit", published.form, path, faults);
    if (published.anchor !== undefined) refuseKey("anchor", published.form, path, faults);
  }
  if (!adapter.needsGasConstant && published.gasConstant !== undefined) {
    refuseKey("gasConstant", published.form, path, faults);
  }
  const shifts = published.decimalShifts;
  const counts = coefficientCounts(adapter, powers);
  published.intervals.forEach((interval, index) => {
    const count = interval.coefficients.length;
    if (shifts !== undefined && shifts.length !== count) {
      faults.push({
        code: "heat-capacity/coefficient-count",
        path: [...path, "decimalShifts"],
        message: `interval ${index} has ${count} coefficients, decimalShifts has ${shifts.length} entries`,
        received: String(shifts.length),
        expected: String(count),
      });
    }
    if (counts === undefined || counts.includes(count)) return;
    faults.push({
      code: "heat-capacity/coefficient-count",
      path: [...path, "intervals", index, "coefficients"],
      message: `the ${published.form} form has ${counts.join(" or ")} coefficients an interval`,
      received: String(count),
      expected: counts.join(" or "),
    });
  });
}

/** Numbers of coefficients that suit; unknown while the powers that a form needs are missing. */
function coefficientCounts(
  { counts, powers: rule }: FormAdapter,
  powers: readonly number[] | undefined,
): readonly number[] | undefined {
  if (rule === undefined) return counts;
  return powers === undefined ? undefined : [rule.coefficientsBefore + powers.length];
}

function checkPowers(
  powers: readonly number[] | undefined,
  { excluded, fewest, message, expected }: PowersRule,
  path: FaultPath,
  faults: Fault[],
): void {
  const good =
    powers !== undefined &&
    powers.length >= fewest &&
    powers.every((value) => Number.isInteger(2 * value) && Math.abs(value) <= 20 && !excluded.includes(value)) &&
    new Set(powers).size === powers.length;
  if (good) return;
  faults.push({
    code: powers === undefined ? "input/missing" : "heat-capacity/unknown-form",
    path: [...path, "powers"],
    message,
    expected,
  });
}

function refuseKey(key: string, form: HeatCapacityForm, path: FaultPath, faults: Fault[]): void {
  faults.push({
    code: "input/unknown-key",
    path: [...path, key],
    message: `the ${form} form takes no ${key}`,
  });
}

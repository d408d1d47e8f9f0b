import type { Fault } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkObject } from "../errors/input.js";
import type { Ledger } from "../reaction/ledger.js";
import type { LedgerEntry, LedgerGroup } from "../reaction/ledger-entry.js";
import type { LedgerSum } from "../reaction/ledger-sum.js";
import type { Source } from "../references/source.js";
import { caution } from "./caution.js";
import { layOut, row, rule, type TextColumn } from "./columns.js";
import { fitted, fixed, wrap } from "./text.js";

const entryWidth = 21;
const energyWidth = 9;
const uncertaintyWidth = 7;

/** Width that stoichiometric numbers and sources share: numbers are never cut, sources are. */
const sharedWidth = 24;

const groups: readonly LedgerGroup[] = ["formation", "temperature", "conditions"];

/**
 * A ledger as a text table of 80 columns: entry, species, stoichiometric number, kJ/mol, standard uncertainty in
 * kJ/mol, source; three subtotals, the total, grades, notes and the caution.
 *
 * An unknown uncertainty is blank, and a sum over one prints `>=`. Two sources stand where the uncertainty comes from
 * another source than the value.
 *
 * @param account - what {@link ledger} returned
 * @throws GibbsLedgerError "input/not-an-object", "input/missing" where it is no ledger
 * @returns lines joined by line feeds, each at most 80 characters long
 * @example
 * import { referenceData } from "gibbs-ledger/data";
 * const boudouard = reaction("C(cr,graphite) + CO2(g) = 2 CO(g)", referenceData);
 * const account = ledger(boudouard, {
 *   temperature: quantity(1000, "K"),
 *   pressure: quantity(1, "bar"),
 *   gas: { moleFractions: { "CO2(g)": 0.5, "CO(g)": 0.5 } },
 * });
 * const text = formatLedger(account);
 * text.split("\n")[0]; // => "Gibbs energy of reaction, per mole of reaction as written"
 */
export function formatLedger(account: Ledger): string {
  checkAccount(account);
  const body = groups.flatMap((group) => [
    ...account.entries.filter((entry) => entry.group === group).map(entryCells),
    sumCells(group, account.subtotals[group]),
  ]);
  const columns = columnsOf(account);
  const [heading, line, ...rows] = layOut(columns, body);
  const total = { value: account.total, uncertaintyIsLowerBound: account.uncertaintyIsLowerBound };
  return [
    "Gibbs energy of reaction, per mole of reaction as written",
    ...wrap(account.equation, undefined, "  "),
    ...wrap(conditionsLine(account)),
    "",
    heading!,
    line!,
    ...rows.flatMap((text, index) => (isSum(body[index]!) ? [text, rule(columns)] : [text])),
    row(columns, sumCells("total", total)),
    "",
    ...wrap(`ln Q = ${fixed(account.lnReactionQuotient, 5)}; standard states: ${statesLine(account)}`),
    ...wrap(`grades of the data: ${gradesLine(account)}`),
    ...(account.outsideRange.length === 0 ? [] : wrap(`outside their range: ${account.outsideRange.join(", ")}`)),
    ...[...longNotes(account), ...account.notes].flatMap((note) => wrap(`note: ${note}`, undefined, "  ")),
    "",
    ...wrap(caution),
  ].join("\n");
}

function columnsOf({ entries }: Ledger): readonly TextColumn[] {
  const coefficientWidth = Math.max(4, ...entries.map(({ coefficient }) => coefficientText(coefficient).length));
  return [
    { heading: "entry", width: entryWidth, align: "left" },
    { heading: "species", width: 14, align: "left" },
    { heading: "nu", width: coefficientWidth, align: "right" },
    { heading: "kJ/mol", width: energyWidth, align: "right" },
    { heading: "u", width: uncertaintyWidth, align: "right" },
    { heading: "source", width: sharedWidth - coefficientWidth, align: "left" },
  ];
}

function checkAccount(account: unknown): void {
  const faults: Fault[] = [];
  const required = ["equation", "temperature", "pressure", "entries", "subtotals", "total"] as const;
  checkObject(account, ["account"], faults, { required, optional: "any" });
  failIfAny(faults);
}

function conditionsLine({ temperature, pressure, equationOfState, activityModel }: Ledger): string {
  const bar = Number((pressure.value / 1e5).toPrecision(7));
  const gas = equationOfState === undefined ? "" : `, gas: ${equationOfState}`;
  const solution = activityModel === undefined ? "" : `, solution: ${activityModel}`;
  return `T = ${Number(temperature.value.toPrecision(7))} K, p = ${bar} bar${gas}${solution}`;
}

function entryCells({ entry, label, coefficient, value, source, secondSource, note }: LedgerEntry): string[] {
  const sources = [source, secondSource].filter((item) => item !== undefined).map(sourceText);
  return [
    withNote({ entry, note }),
    label,
    coefficientText(coefficient),
    energyText(value.value),
    value.standardUncertainty === undefined ? "" : uncertaintyText(value.standardUncertainty),
    sources.join(", "),
  ];
}

/** What does not fit into the column stands below the table. */
function withNote({ entry, note }: { entry: string; note: string | undefined }): string {
  const texts = [`${entry} ${note ?? ""}`.trimEnd(), `${entry} ${note?.replace("at ", "") ?? ""}`];
  return texts.find((text) => text.length <= entryWidth) ?? entry;
}

function longNotes(account: Ledger): string[] {
  return account.entries
    .filter(({ entry, note }) => note !== undefined && withNote({ entry, note }) === entry)
    .map(({ entry, label, note }) => `${label}: ${entry} ${note}`);
}

/** Four digits; the equation above the table is exact. */
function coefficientText(coefficient: number): string {
  return String(Number(coefficient.toPrecision(4)));
}

function sumCells(name: string, { value, uncertaintyIsLowerBound }: LedgerSum): string[] {
  const prefix = uncertaintyIsLowerBound ? ">=" : "";
  return [name, sumMark, "", energyText(value.value), uncertaintyText(value.standardUncertainty ?? 0, prefix)];
}

function energyText(energy: number): string {
  return fitted(energy / 1000, 3, energyWidth);
}

function uncertaintyText(energy: number, prefix: string = ""): string {
  return fitted(energy / 1000, 3, uncertaintyWidth, prefix);
}

const sumMark = "sum";

function isSum(cells: readonly string[]): boolean {
  return cells[1] === sumMark;
}

function sourceText(source: Source): string {
  return typeof source === "string" ? source : source.text;
}

function statesLine({ standardStates }: Ledger): string {
  const states = new Set(Object.values(standardStates));
  return [...states].join(", ");
}

/** An element's enthalpy of formation is zero by definition and has no grade. */
function gradesLine({ grades }: Ledger): string {
  return Object.entries(grades)
    .map(([label, { caloric, formation }]) => {
      const named = { caloric, formation };
      const parts = Object.entries(named).flatMap(([group, grade]) => (grade === undefined ? [] : `${group} ${grade}`));
      return `${label} ${parts.length === 0 ? "none" : parts.join(", ")}`;
    })
    .join("; ");
}

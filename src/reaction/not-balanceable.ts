import { cut, type Fault } from "../errors/fault.js";
import { GibbsLedgerError } from "../errors/gibbs-ledger-error.js";
import type { Participant } from "./balance-participants.js";
import { chargeName, conservedQuantities } from "./composition-matrix.js";

/**
 * Throws that an equation cannot be balanced: a fault for each element, and the charge, that stands on one side only;
 * where there is none, one that names the species.
 *
 * @param idle - the species that can take no part
 * @param rest - the balanced equation of the others, where there is only one
 */
export function failNotBalanceable(
  species: readonly Participant[],
  idle: readonly Participant[],
  rest: string | undefined,
): never {
  const hint = rest === undefined ? {} : { hint: `without ${namesOf(idle)}: ${cut(rest, 300)}` };
  const oneSided = conservedQuantities(species).flatMap(({ name, amounts }): Fault[] => {
    const holders = species.filter((_one, place) => amounts[place] !== 0n);
    const signs = new Set(amounts.filter((amount) => amount !== 0n).map((amount) => amount > 0n));
    const { isLeft } = holders[0]!;
    if (signs.size > 1 || holders.some((one) => one.isOnBothSides || one.isLeft !== isLeft)) return [];
    const side = isLeft ? "left" : "right";
    return [
      {
        code: "reaction/not-balanceable",
        path: ["equation"],
        message: `${name === chargeName ? "the charge" : name} stands on the ${side} only, in ${namesOf(holders)}`,
        received: namesOf(holders),
        expected: `${name} on both sides`,
        ...(rest === undefined && name === chargeName ? { hint: "a half-reaction needs e^-" } : hint),
      },
    ];
  });
  const [first, ...others] = oneSided;
  if (first !== undefined) throw new GibbsLedgerError([first, ...others]);
  throw new GibbsLedgerError([
    {
      code: "reaction/not-balanceable",
      path: ["equation"],
      message: `no coefficients but 0 balance ${namesOf(idle)}`,
      received: namesOf(idle),
      expected: "species that the others can be made of",
      ...hint,
    },
  ]);
}

function namesOf(species: readonly Participant[]): string {
  return cut(species.map(({ label }) => label).join(", "), 120);
}

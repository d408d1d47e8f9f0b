import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { referenceData } from "../../src/data/reference-data.js";
import {
  ledger,
  lnReactionQuotient,
  type Reaction,
  type ReactionConditions,
  reaction,
  standardReactionProperties,
  standardReactionRoundingBound,
} from "../../src/reaction/index.js";
import type { SpeciesRecord } from "../../src/species/record.js";
import { functionNames } from "../heat-capacity/oracle.js";
import { temperaturesK } from "../heat-capacity/random-series.js";
import { type RandomTerm, randomTerms, reactionOf } from "../reaction/random-reactions.js";
import { referenceStates, referenceSubjects } from "./reference-states.js";

const kelvin = (value: number) => ({ temperature: { value, unit: "K" } }) as const;

/** Cp, H, S, G, ln K and log10 K as numbers. */
function numbersOf(subject: Reaction, temperatureK: number): number[] {
  const properties = standardReactionProperties(subject, kelvin(temperatureK));
  return [...functionNames.map((name) => properties[name]!.value), properties.lnK, properties.log10K];
}

/** A random permutation of the terms with the terms themselves. */
const shuffled = randomTerms.chain((terms) =>
  fc.shuffledSubarray([...terms], { minLength: terms.length }).map((other) => [terms, other] as const),
);

const reversed = (terms: readonly RandomTerm[]): RandomTerm[] =>
  terms.map((term) => ({ ...term, numerator: -term.numerator }));

describe("random reactions of random records", () => {
  const runs = { seed: 20261201, numRuns: 200 };

  test("reverse their sign exactly with the equation", () => {
    fc.assert(
      fc.property(randomTerms, temperaturesK, (terms, temperatureK) => {
        const back = numbersOf(reactionOf(reversed(terms)), temperatureK);
        expect(back).toEqual(numbersOf(reactionOf(terms), temperatureK).map((value) => 0 - value));
      }),
      runs,
    );
  });

  test("do not depend on the order of species, to the bit", () => {
    fc.assert(
      fc.property(shuffled, temperaturesK, ([terms, other], temperatureK) => {
        expect(numbersOf(reactionOf(other), temperatureK)).toEqual(numbersOf(reactionOf(terms), temperatureK));
      }),
      runs,
    );
  });

  test("scale with the equation: exactly by powers of two, else within the bounds", () => {
    fc.assert(
      fc.property(randomTerms, temperaturesK, fc.integer({ min: 2, max: 9 }), (terms, temperatureK, factor) => {
        const once = reactionOf(terms);
        const scaled = reactionOf(terms.map((term) => ({ ...term, numerator: factor * term.numerator })));
        const [one, many] = [numbersOf(once, temperatureK), numbersOf(scaled, temperatureK)];
        if ([2, 4, 8].includes(factor)) expect(many).toEqual(one.map((value) => factor * value));
        functionNames.forEach((name, index) => {
          const bound = standardReactionRoundingBound(scaled, name, kelvin(temperatureK));
          expect(Math.abs(many[index]! - factor * one[index]!)).toBeLessThanOrEqual(2 * bound);
        });
      }),
      runs,
    );
  });

  test("are the same through structuredClone and JSON, of the reaction and of its records", () => {
    fc.assert(
      fc.property(randomTerms, temperaturesK, (terms, temperatureK) => {
        const subject = reactionOf(terms);
        const expected = numbersOf(subject, temperatureK);
        expect(numbersOf(structuredClone(subject), temperatureK)).toEqual(expected);
        expect(numbersOf(JSON.parse(JSON.stringify(subject)) as Reaction, temperatureK)).toEqual(expected);
        const species = subject.terms.map((term) => structuredClone(term.species as SpeciesRecord));
        expect(numbersOf(reaction(subject.equation, { species }), temperatureK)).toEqual(expected);
      }),
      { ...runs, numRuns: 100 },
    );
  });

  test("obey Hess's law: a sum of reactions has the sum of their properties", () => {
    fc.assert(
      fc.property(randomTerms, temperaturesK, (terms, temperatureK) => {
        // Each species with its own way from carbon atoms in pairs: the ways add up to the reaction.
        const base = { label: "C2(g)", series: terms[0]!.series };
        const ways = terms
          .filter(({ label }) => label !== base.label)
          .map(({ label, numerator, denominator, series }) => {
            const atoms = Number(label[1]);
            const carbon = { ...base, numerator: -numerator * atoms, denominator: 2 * denominator };
            return reactionOf([carbon, { label, numerator, denominator, series }]);
          });
        const whole = terms.map((term) => (term.label === "C2(g)" ? { ...term, series: base.series } : term));
        const subject = reactionOf(relabelled(whole));
        functionNames.forEach((name, index) => {
          const bounds = [subject, ...ways].map((each) =>
            standardReactionRoundingBound(each, name, kelvin(temperatureK)),
          );
          const sum = ways.reduce((total, way) => total + numbersOf(way, temperatureK)[index]!, 0);
          const allowed = bounds.reduce((total, bound) => total + bound, 0);
          expect(Math.abs(numbersOf(subject, temperatureK)[index]! - sum)).toBeLessThanOrEqual(2 * allowed);
        });
      }),
      runs,
    );
  });
});

/** Carbon pairs are a gas here, whatever state they had. */
function relabelled(terms: readonly RandomTerm[]): RandomTerm[] {
  return terms.map((term) => (term.label.startsWith("C2(") ? { ...term, label: "C2(g)" } : term));
}

/** The same map with its keys in the opposite order. */
function backward(map: Readonly<Record<string, number>>): Record<string, number> {
  return Object.fromEntries(Object.entries(map).reverse());
}

/** The reference reactions written backwards, by their equation. */
const reversedReactions = new Map(
  referenceSubjects.map(({ equation }) => {
    const [left, right] = equation.split(" = ");
    return [equation, reaction(`${right} = ${left}`, referenceData)];
  }),
);

describe("reactions of the reference data at random conditions", () => {
  test("do not depend on the order of keys of a composition, nor of inerts, to the bit", () => {
    fc.assert(
      fc.property(referenceStates, ({ subject, conditions }) => {
        const { gas, inerts = [], activities, ...rest } = conditions;
        const other: ReactionConditions = {
          ...rest,
          inerts: [...inerts].reverse(),
          ...(activities === undefined ? {} : { activities: backward(activities) }),
          ...(gas?.moleFractions === undefined ? {} : { gas: { ...gas, moleFractions: backward(gas.moleFractions) } }),
        };
        expect(lnReactionQuotient(subject, other)).toBe(lnReactionQuotient(subject, conditions));
        expect(ledger(subject, other)).toEqual(ledger(subject, conditions));
      }),
      { seed: 20261202, numRuns: 500 },
    );
  });

  test("reverse ln Q and the total exactly with the equation", () => {
    fc.assert(
      fc.property(referenceStates, ({ subject, conditions }) => {
        const back = reversedReactions.get(subject.equation)!;
        expect(lnReactionQuotient(back, conditions)).toBe(0 - lnReactionQuotient(subject, conditions));
        const [there, here] = [ledger(back, conditions), ledger(subject, conditions)];
        expect(there.total.value).toBe(0 - here.total.value);
        expect(there.directGibbsEnergy.value).toBe(0 - here.directGibbsEnergy.value);
      }),
      { seed: 20261203, numRuns: 500 },
    );
  });
});

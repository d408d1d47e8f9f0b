import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { hinderedRotorLevels } from "../../src/checks/hindered-rotor.js";
import { computeWitness } from "../../src/checks/witness-checks.js";
import { C2H6_g, CH3OH_g, referenceData } from "../../src/data/index.js";
import type { Figure } from "../../src/quantity/figure.js";
import type { SpeciesRecord, Witness } from "../../src/species/record.js";

const rotor = { fold: 3, barrier: 373.2, constant: 27.647, symmetryNumber: 3 };

function physicalWitness(record: SpeciesRecord): Witness {
  return record.witnesses.find(({ check }) => check === "statistical-mechanics-entropy") as Witness;
}

function withRotor(record: SpeciesRecord, changes: Readonly<Record<string, number | undefined>>): Witness {
  const witness = structuredClone(physicalWitness(record));
  const against = witness.against as Record<string, Figure>;
  for (const [name, value] of Object.entries(changes)) {
    if (value === undefined) delete against[name];
    else against[name] = { ...(against[name] as Figure), value };
  }
  return witness;
}

describe("levels from outside", () => {
  // M. Abramowitz, I. A. Stegun, Handbook of Mathematical Functions (1964), Table 20.1, from memory: characteristic
  // values of Mathieu's equation at q = 5, printed to 8 decimals. With two folds and F = 1, V = 4 q and E = a + 2 q.
  test("characteristic values of Mathieu's equation", () => {
    const levels = hinderedRotorLevels({ fold: 2, barrier: 20, constant: 1, symmetryNumber: 1 }, 40);
    const printed = [-5.80004602, -5.7900806, 1.85818754, 2.09946045, 7.44910974];
    printed.forEach((value, index) => {
      expect(Math.abs(levels[index]! - 10 - value)).toBeLessThan(5.1e-9);
    });
  });

  // R. M. Lees, J. G. Baker, J. Chem. Phys. 48, 5299 (1968), from memory: 9.12 cm-1; the constants are printed to 0.1
  // cm-1 of the barrier, and the molecule's potential has a small sixfold part.
  test("the torsional ground level of methanol is split by 9.1 cm-1", () => {
    const [single, first, second] = hinderedRotorLevels(rotor, 1000);
    expect(second! - first!).toBeCloseTo(0, 9);
    expect(Math.abs(first! - single! - 9.12)).toBeLessThan(0.05);
  });
});

describe("laws", () => {
  const tops = fc.record({
    fold: fc.integer({ min: 1, max: 6 }),
    barrier: fc.double({ min: 0, max: 5000, noNaN: true }),
    constant: fc.double({ min: 0.5, max: 60, noNaN: true }),
    symmetryNumber: fc.constant(1),
  });

  test("without a barrier the levels are F m^2", () => {
    const levels = hinderedRotorLevels({ ...rotor, barrier: 0, constant: 2 }, 100);
    expect(levels).toHaveLength(15);
    const free = [0, 1, 1, 2, 2, 3, 3, 4, 4, 5, 5, 6, 6, 7, 7].map((m) => 2 * m * m);
    levels.forEach((level, index) => {
      expect(level).toBeCloseTo(free[index]!, 10);
    });
  });

  test("a deep well holds a harmonic oscillator, n sqrt(V F), less the shift of the fourth power", () => {
    const levels = hinderedRotorLevels({ fold: 3, barrier: 20000, constant: 1, symmetryNumber: 1 }, 1500);
    const harmonic = 3 * Math.sqrt(20000);
    // Second order of the cosine: -n^2 F / 16 in the ground level, -5 n^2 F / 16 in the next.
    expect(levels[0]).toBeCloseTo(harmonic / 2 - 9 / 16, 1);
    expect(levels[3]).toBeCloseTo(1.5 * harmonic - 45 / 16, 1);
  });

  test("a higher barrier raises every level, and the levels keep their order", () => {
    fc.assert(
      fc.property(tops, fc.double({ min: 1, max: 500, noNaN: true }), (top, more) => {
        const limit = 3000;
        const low = hinderedRotorLevels(top, limit);
        const high = hinderedRotorLevels({ ...top, barrier: top.barrier + more }, limit);
        expect(high.length).toBeLessThanOrEqual(low.length);
        high.forEach((level, index) => {
          expect(level).toBeGreaterThanOrEqual(low[index]! - 1e-9 * limit);
          if (index > 0) expect(level).toBeGreaterThanOrEqual(high[index - 1]!);
        });
      }),
      { numRuns: 60, seed: 20 },
    );
  });
});

describe("in a witness", () => {
  test("leaving the rotor out moves the entropy beyond the tolerance", () => {
    for (const record of [C2H6_g, CH3OH_g]) {
      const without = withRotor(record, { rotor1Barrier: undefined });
      expect(Math.abs(computeWitness(record, without, referenceData))).toBeGreaterThan(without.tolerance);
    }
  });

  test("the entropy of ethane from its constants is that of Chao, Wilhoit and Zwolinski (1973), 229.20 J/mol/K", () => {
    const at298 = { ...physicalWitness(C2H6_g), over: [298.15, 298.15] as const };
    const entropyByFit = 229.2211;
    expect(entropyByFit - computeWitness(C2H6_g, at298, referenceData)).toBeCloseTo(229.2, 1);
  });
});

import { readFileSync } from "node:fs";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type BalanceSystem, MOST_STEPS, solveBalance } from "../../shared-lib/equilibrium/balance/solve-balance.ts";

interface Reference {
  readonly species: readonly (readonly [number, readonly number[]])[];
  readonly totals: readonly number[];
  /** ln of each free amount, by mpmath. */
  readonly ln: readonly number[];
}

function systemOf(species: Reference["species"], totals: readonly number[]): BalanceSystem {
  const first = new Int32Array(species.length + 1);
  const part: number[] = [];
  const nu: number[] = [];
  species.forEach(([, held], s) => {
    held.forEach((count, i) => {
      if (count === 0) return;
      part.push(i);
      nu.push(count);
    });
    first[s + 1] = part.length;
  });
  return {
    components: totals.length,
    first,
    part: Int32Array.from(part),
    nu: Float64Array.from(nu),
    lnA: Float64Array.from(species, ([ln]) => ln),
    totals: Float64Array.from(totals),
  };
}

describe("mass balance", () => {
  // Outside reference: mpmath at 40 digits, by reference-balances.py beside this file.
  const references = JSON.parse(
    readFileSync(new URL("./reference-balances.json", import.meta.url), "utf8"),
  ) as readonly Reference[];

  it("agrees with a general-purpose multiprecision solver on 200 random systems to 1e-9", () => {
    expect(references).toHaveLength(200);
    let worst = 0;
    for (const { species, totals, ln } of references) {
      const found = solveBalance(systemOf(species, totals));
      ln.forEach((expected, i) => {
        worst = Math.max(worst, Math.abs((found.x[i] as number) - expected));
      });
    }
    expect(worst).toBeLessThan(1e-9);
  });

  it("ends within its bound, finite and balanced, from any start and for any constants", () => {
    const constant = fc.double({ min: -60, max: 60, noNaN: true });
    const total = fc.double({ min: -25, max: 3, noNaN: true }).map((power) => 10 ** power);
    fc.assert(
      fc.property(
        fc.array(total, { minLength: 1, maxLength: 5 }).chain((totals) =>
          fc.record({
            totals: fc.constant(totals),
            bound: fc.array(
              fc.tuple(
                constant,
                fc.array(fc.integer({ min: 0, max: 4 }), { minLength: totals.length, maxLength: totals.length }),
              ),
              { maxLength: 12 },
            ),
            start: fc.array(fc.double({ min: -90, max: 60, noNaN: true }), {
              minLength: totals.length,
              maxLength: totals.length,
            }),
          }),
        ),
        ({ totals, bound, start }) => {
          const own = totals.map((_, i): [number, number[]] => [0, totals.map((__, j) => Number(i === j))]);
          const system = systemOf([...own, ...bound.filter(([, held]) => held.some((count) => count > 0))], totals);
          const found = solveBalance(system, Float64Array.from(start));
          expect(found.steps).toBeLessThanOrEqual(3 * MOST_STEPS);
          expect(found.amounts.every(Number.isFinite)).toBe(true);
          expect(found.residual).toBeLessThan(1e-8);
        },
      ),
      { numRuns: 1000 },
    );
  });

  it("solves a dimer by the quadratic formula", () => {
    // c + 2·K·c² = t with K = 50, t = 0.3.
    const found = solveBalance(
      systemOf(
        [
          [0, [1]],
          [Math.log(50), [2]],
        ],
        [0.3],
      ),
    );
    const exact = (-1 + Math.sqrt(1 + 8 * 50 * 0.3)) / (4 * 50);
    expect(Math.exp(found.x[0] as number)).toBeCloseTo(exact, 14);
  });
});

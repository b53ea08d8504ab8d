import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { activitiesOf } from "../../shared-lib/media/activities.ts";
import { compositionOf, type MediumAmount } from "../../shared-lib/media/composition.ts";
import { hemiacetalFactor, hydrationFactor } from "../../shared-lib/media/medium-factor.ts";
import { activityOverSalt, allSalts } from "../../shared-lib/media/salts.ts";
import { allSolvents } from "../../shared-lib/media/solvents.ts";
import { hasGroups, lnGammas, prepareUnifac } from "../../shared-lib/media/unifac.ts";

fc.configureGlobal({ seed: 20261201 });

const TRAITS = { ketoAcid: false, acidicDiol: false };
const keys = allSolvents().map((solvent) => solvent.key);
const others = keys.filter((key) => key !== "water" && key !== "D2O");
const amount = fc.double({ min: 1e-3, max: 10, noNaN: true });
const kelvin = fc.double({ min: 253, max: 373, noNaN: true });
const part = fc.record({ solvent: fc.constantFrom(...keys), amount });
const mixture = fc.array(part, { minLength: 1, maxLength: 4 });

function add(rest: readonly MediumAmount[], solvent: string, mol: number) {
  return compositionOf([{ solvent, amount: mol }, ...rest], 298.15);
}

describe("compositions", () => {
  it("have fractions that add up to 1 and do not depend on the order or the scale", () => {
    fc.assert(
      fc.property(mixture, kelvin, fc.double({ min: 1e-6, max: 1e6, noNaN: true }), (parts, temperature, scale) => {
        const first = compositionOf(parts, temperature);
        const second = compositionOf(
          [...parts].reverse().map((row) => ({ ...row, amount: row.amount * scale })),
          temperature,
        );
        const sum = (of: "moleFraction" | "volumeFraction"): number =>
          first.components.reduce((total, component) => total + component[of], 0);
        expect(sum("moleFraction")).toBeCloseTo(1, 9);
        expect(sum("volumeFraction")).toBeCloseTo(1, 9);
        expect(second.volumeL / scale / first.volumeL).toBeCloseTo(1, 9);
      }),
    );
  });

  it("leave out what is no amount", () => {
    for (const wrong of [Number.NaN, -1, 0, Number.POSITIVE_INFINITY])
      expect(compositionOf([{ solvent: "water", amount: wrong }], 298.15).components).toEqual([]);
    expect(compositionOf([{ solvent: "no such solvent", amount: 1 }], 298.15).components).toEqual([]);
  });
});

describe("activities", () => {
  it("lie between 0 and 1 in every mixture from −20 to 100 °C", () => {
    fc.assert(
      fc.property(mixture, kelvin, (parts, temperature) => {
        const { activity, sd } = activitiesOf(compositionOf(parts, temperature), temperature);
        for (const value of Object.values(activity)) {
          expect(value).toBeGreaterThan(0);
          expect(value).toBeLessThanOrEqual(1);
        }
        expect(sd).toBeGreaterThanOrEqual(0);
      }),
      { numRuns: 500 },
    );
  });

  it("of water and of alcohols never fall when more is added", () => {
    const nucleophiles = allSolvents().filter((solvent) => solvent.nucleophile !== "none");
    fc.assert(
      fc.property(
        fc.constantFrom(...nucleophiles.map((solvent) => solvent.key)),
        fc.array(fc.record({ solvent: fc.constantFrom(...keys), amount }), { minLength: 1, maxLength: 2 }),
        kelvin,
        (solvent, parts, temperature) => {
          const rest = parts.filter((row) => row.solvent !== solvent);
          if (rest.length === 0) return;
          let last = 0;
          for (const mol of [0.01, 0.03, 0.1, 0.3, 1, 2, 4, 8, 20, 60]) {
            const value = activitiesOf(compositionOf([{ solvent, amount: mol }, ...rest], temperature), temperature)
              .activity[solvent] as number;
            // 0.003: a hump of a miscibility gap narrower than the grid is missed.
            expect(value).toBeGreaterThanOrEqual(last - 0.003);
            last = value;
          }
        },
      ),
      { numRuns: 300 },
    );
  });

  it("of the model obey Gibbs and Duhem: Σ x d ln γ = 0 along every path", () => {
    const modelled = keys.filter(hasGroups);
    fc.assert(
      fc.property(
        fc.uniqueArray(fc.constantFrom(...modelled), { minLength: 2, maxLength: 3 }),
        fc.array(fc.double({ min: 0.05, max: 1, noNaN: true }), { minLength: 3, maxLength: 3 }),
        kelvin,
        (solvents, weights, temperature) => {
          const x = solvents.map((_, i) => weights[i] as number);
          const total = x.reduce((sum, value) => sum + value, 0);
          const here = x.map((value) => value / total);
          const h = 1e-6;
          const shifted = (by: number): number[] => here.map((value, i) => value + (i === 0 ? by : i === 1 ? -by : 0));
          const model = prepareUnifac(solvents, temperature);
          const up = lnGammas(model, shifted(h));
          const down = lnGammas(model, shifted(-h));
          const sum = here.reduce(
            (all, value, i) => all + (value * ((up[i] as number) - (down[i] as number))) / (2 * h),
            0,
          );
          expect(Math.abs(sum)).toBeLessThan(1e-5);
        },
      ),
      { numRuns: 300 },
    );
  });

  it("are 1 for a pure solvent, by the model itself", () => {
    for (const key of keys.filter(hasGroups))
      expect(Math.abs(lnGammas(prepareUnifac([key], 298.15), [1])[0] ?? 1)).toBeLessThan(1e-12);
  });
});

describe("medium factors", () => {
  it("rise with the share of water, never above 1, with an honest spread", () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...others),
        fc.constantFrom(...others),
        fc.double({ min: 0, max: 3, noNaN: true }),
        (a, b, mol) => {
          const rest = [
            { solvent: a, amount: 1 },
            { solvent: b, amount: mol },
          ];
          let last = Number.NEGATIVE_INFINITY;
          for (const water of [0.001, 0.01, 0.05, 0.2, 0.6, 1.5, 4, 10, 40]) {
            const factor = hydrationFactor(add(rest, "water", water), 298.15, TRAITS);
            expect(factor.log10).toBeLessThanOrEqual(1e-9);
            expect(factor.log10).toBeGreaterThanOrEqual(last - 0.001);
            expect(factor.sd).toBeGreaterThan(0);
            expect(factor.sd).toBeLessThanOrEqual(0.8);
            last = factor.log10;
          }
        },
      ),
      { numRuns: 300 },
    );
  });

  it("of hemiacetals rise with the share of the alcohol", () => {
    fc.assert(
      fc.property(
        fc.constantFrom("methanol", "ethanol", "2-propanol"),
        fc.constantFrom(...others),
        (alcohol, other) => {
          if (alcohol === other) return;
          let last = Number.NEGATIVE_INFINITY;
          for (const mol of [0.01, 0.05, 0.2, 0.6, 1.5, 4, 10]) {
            const { log10 } = hemiacetalFactor(add([{ solvent: other, amount: 1 }], alcohol, mol), alcohol);
            expect(log10).toBeGreaterThan(last);
            expect(log10).toBeLessThanOrEqual(1e-9);
            last = log10;
          }
        },
      ),
    );
  });
});

describe("salts", () => {
  it("lower the activity of water the more there is of them, down to the saturated solution", () => {
    for (const salt of allSalts()) {
      let last = 1;
      for (const molality of [0.01, 0.1, 0.3, 0.6, 1, 2, 3, 5, 8, 12, 30]) {
        const value = activityOverSalt(salt, molality, 298.15);
        expect(value, `${salt.key} ${molality}`).toBeLessThanOrEqual(last + 1e-9);
        expect(value).toBeGreaterThan(0);
        last = value;
      }
    }
  });
});

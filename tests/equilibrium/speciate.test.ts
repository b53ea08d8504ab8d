import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { estimate, estimateGrid, MOST_POINTS } from "../../shared-lib/equilibrium/estimate.ts";
import { speciate } from "../../shared-lib/equilibrium/speciate.ts";
import type { CarbonylForms, Contents } from "../../shared-lib/equilibrium/types.ts";
import { compoundOf, formsIn, labelled, share } from "./compound-of.ts";

const SMILES = [
  "C=O",
  "CC=O",
  "CCC=O",
  "O=Cc1ccccc1",
  "CC(C)=O",
  "O=CC=O",
  "CC(=O)C=O",
  "O=CCCCC=O",
  "CC(=O)C(=O)O",
  "O=CC(=O)O",
  "O=CCO",
  "O=C(CO)CO",
  "O=Cc1ccncc1",
  "O=C(C(F)(F)F)C(F)(F)F",
  "O=CC(Cl)(Cl)Cl",
  "O=Cc1ccccc1C=O",
  "O=CCCCO",
  "O=C1C(=O)c2ccccc2C1=O",
  "O=Cc1ccc(C=O)cc1",
  "OC[C@@H](O)[C@@H](O)[C@H](O)[C@@H](O)C=O",
];
const SOLVENTS = [
  "water",
  "methanol",
  "ethanol",
  "2-propanol",
  "THF",
  "acetonitrile",
  "DMSO",
  "toluene",
  "1,4-dioxane",
];
const bisulfite = compoundOf("OS(=O)[O-].[Na+]", { tags: ["bisulfite"] });
const amine = compoundOf("NCc1ccccc1", { tags: ["primary amine"] });

const amount = fc.double({ min: -7, max: 1.5, noNaN: true }).map((power) => 10 ** power);
const contents: fc.Arbitrary<Contents> = fc.record({
  temperatureK: fc.double({ min: 253, max: 373, noNaN: true }),
  pH: fc.double({ min: -2, max: 16, noNaN: true }),
  solvents: fc.array(fc.record({ solvent: fc.constantFrom(...SOLVENTS), amount }), { minLength: 1, maxLength: 3 }),
  carbonyls: fc.array(fc.record({ compound: fc.constantFrom(...SMILES.map((smiles) => compoundOf(smiles))), amount }), {
    minLength: 1,
    maxLength: 3,
  }),
  solutes: fc.array(fc.record({ compound: fc.constantFrom(bisulfite, amine), amount }), { maxLength: 2 }),
});

function checkShares(forms: CarbonylForms): void {
  if (forms.outside !== undefined) {
    expect(forms.forms).toEqual([]);
    return;
  }
  let sum = 0;
  for (const { fraction } of forms.forms) {
    for (const x of [fraction.low, fraction.value, fraction.high]) expect(x >= 0 && x <= 1).toBe(true);
    expect(fraction.low).toBeLessThanOrEqual(fraction.value);
    expect(fraction.value).toBeLessThanOrEqual(fraction.high);
    sum += fraction.value;
  }
  expect(Math.abs(sum - 1)).toBeLessThan(1e-9);
}

describe("speciate", () => {
  it("gives shares within [0, 1] that add up to 1, in any vessel", () => {
    fc.assert(
      fc.property(contents, (vessel) => {
        const found = speciate(vessel);
        expect(found.carbonyls).toHaveLength(vessel.carbonyls.length);
        for (const forms of found.carbonyls) checkShares(forms);
        for (const activity of Object.values(found.activities)) expect(activity >= 0 && activity <= 1).toBe(true);
      }),
      { numRuns: 300 },
    );
  });

  it("does not mind the order of what is in the vessel, nor its size", () => {
    fc.assert(
      fc.property(contents, fc.double({ min: 0.01, max: 100, noNaN: true }), (vessel, by) => {
        const scale = <T extends { amount: number }>(rows: readonly T[]): T[] =>
          [...rows].reverse().map((row) => ({ ...row, amount: row.amount * by }));
        const turned: Contents = {
          ...vessel,
          solvents: scale(vessel.solvents),
          carbonyls: scale(vessel.carbonyls),
          solutes: scale(vessel.solutes),
        };
        const a = speciate(vessel);
        const b = speciate(turned);
        if (!a.settled || !b.settled) return;
        a.carbonyls.forEach((forms, i) => {
          const other = b.carbonyls[b.carbonyls.length - 1 - i] as CarbonylForms;
          expect(Math.abs(forms.free.value - other.free.value)).toBeLessThan(1e-6);
        });
      }),
      { numRuns: 150 },
    );
  });

  it("hydrates less, the more of the water is replaced by an organic solvent", () => {
    for (const organic of ["THF", "acetonitrile", "1,4-dioxane", "DMF"]) {
      let before = 1;
      for (const water of [55, 40, 25, 12, 4, 1]) {
        const solvents = [
          { solvent: "water", amount: water },
          { solvent: organic, amount: (55.3 - water) / 5 },
        ];
        const hydrated = share(formsIn("CC=O", { solvents }), "hydrate");
        expect(hydrated).toBeLessThanOrEqual(before + 1e-12);
        before = hydrated;
      }
    }
  });

  it("counts the water that carbonyls take from each other", () => {
    const scarce = {
      solvents: [
        { solvent: "water", amount: 1 },
        { solvent: "THF", amount: 10 },
      ],
    };
    const chloral = { compound: compoundOf("O=CC(Cl)(Cl)Cl"), amount: 0.95 };
    const propanal = { compound: compoundOf("CCC=O"), amount: 0.05 };
    const alone = speciate({ temperatureK: 298.15, solutes: [], ...scarce, carbonyls: [propanal] });
    const beside = speciate({ temperatureK: 298.15, solutes: [], ...scarce, carbonyls: [chloral, propanal] });
    const hydrated = (forms: CarbonylForms | undefined): number => (forms ? share(forms, "hydrate") : Number.NaN);
    expect(hydrated(beside.carbonyls[1])).toBeLessThan(0.5 * hydrated(alone.carbonyls[0]));
  });

  it("adds up rows of one compound to one pool", () => {
    const row = { compound: compoundOf("C=O"), amount: 2 };
    const vessel = { temperatureK: 298.15, solvents: [{ solvent: "water", amount: 40 }], solutes: [] };
    const twice = speciate({ ...vessel, carbonyls: [row, row] });
    const once = speciate({ ...vessel, carbonyls: [{ ...row, amount: 4 }] });
    expect(twice.carbonyls[0]?.free.value).toBeCloseTo(once.carbonyls[0]?.free.value as number, 12);
  });

  it("tells condensations beside the forms, and counts bisulfite and amine buffers with them", () => {
    const benzaldehyde = { compound: compoundOf("O=Cc1ccccc1"), amount: 0.05 };
    const water = [{ solvent: "water", amount: 55.3 }];
    const withAmine = speciate({
      temperatureK: 298.15,
      pH: 10,
      solvents: water,
      carbonyls: [benzaldehyde],
      solutes: [{ compound: amine, amount: 0.5 }],
    });
    const [one] = withAmine.carbonyls;
    expect(one?.free.value).toBeGreaterThan(0.9);
    expect(one?.withPartners?.free.value).toBeLessThan(0.5);
    expect(one?.cautions.join(" ")).toContain("at equilibrium it would hold");
    const withSulfite = speciate({
      temperatureK: 298.15,
      pH: 5,
      solvents: water,
      carbonyls: [benzaldehyde],
      solutes: [{ compound: bisulfite, amount: 0.5 }],
    });
    expect(withSulfite.carbonyls[0]?.free.value).toBeLessThan(0.01);
    const tris = formsIn("C=O", { pH: 8, molar: 0.01, buffer: { buffer: "Tris", molarity: 0.1 } });
    expect(labelled(tris, "Tris").value).toBeGreaterThan(0.2);
  });

  it("answers what it cannot with a reason and no forms", () => {
    expect(formsIn("CCO").outside).toContain("no aldehyde or ketone");
    expect(formsIn("CC=O", { solvents: [] }).outside).toContain("name the solvent");
    const strange = speciate({
      temperatureK: Number.NaN,
      pH: Number.POSITIVE_INFINITY,
      solvents: [
        { solvent: "water", amount: Number.NaN },
        { solvent: "no such solvent", amount: 1 },
        { solvent: "water", amount: 1 },
      ],
      carbonyls: [{ compound: compoundOf("CC=O"), amount: Number.NEGATIVE_INFINITY }],
      solutes: [{ compound: amine, amount: Number.NaN }],
    });
    checkShares(strange.carbonyls[0] as CarbonylForms);
  });
});

describe("estimate", () => {
  const query = { input: "x", mediumText: "water", medium: [{ solvent: "water", amount: 55.3 }], temperatureK: 298.15 };
  const acetaldehyde = compoundOf("CC=O", { density: 0.785 });

  it("refuses 0 K, pH 20 and more than the neat compound holds, in a sentence", () => {
    expect(estimate(acetaldehyde, { ...query, temperatureK: 0 }).outside).toContain("0 K");
    expect(estimate(acetaldehyde, { ...query, pH: 20 }).outside).toContain("pH 20");
    expect(estimate(acetaldehyde, { ...query, concentration: 200 }).outside).toContain("neat");
    expect(estimate(acetaldehyde, { ...query, concentration: -1 }).outside).toContain("not possible");
    for (const forms of [estimate(acetaldehyde, { ...query, pH: 20 }).forms]) expect(forms).toEqual([]);
  });

  it("is the same for the same question, and survives JSON", () => {
    const one = estimate(acetaldehyde, { ...query, concentration: 0.5 });
    const two = estimate(acetaldehyde, { ...query, concentration: 0.5 });
    expect(JSON.stringify(one)).toBe(JSON.stringify(two));
    expect(one.derivation.length).toBeGreaterThan(2);
    expect(one.derivation.every((line) => line.says.length > 0)).toBe(true);
  });

  it("answers a table of conditions in order, up to a bound", () => {
    const points = [5, 25, 45, 65].map((celsius) => ({ temperatureK: 273.15 + celsius }));
    const free = estimateGrid(acetaldehyde, query, points).map((answer) => answer.free.value);
    expect([...free].sort((a, b) => a - b)).toEqual(free);
    expect(
      estimateGrid(
        acetaldehyde,
        query,
        Array.from({ length: MOST_POINTS + 5 }, () => ({})),
      ),
    ).toHaveLength(MOST_POINTS);
  });
});

/** The tables of constants: what they must hold, and that fit and methods page are those of today's tables. */

import { readFile } from "node:fs/promises";
import { describe, expect, it } from "vitest";
import { renewed } from "../../scripts/fit/methods-page.mts";
import { fitPoints } from "../../scripts/fit/points.mts";
import { calibrated } from "../../scripts/fit.mts";
import { readTsv } from "../../scripts/tables/read-tsv.mts";
import coefficients from "../../shared-lib/equilibrium/constants/coefficients.json" with { type: "json" };
import { measuredParents } from "../../shared-lib/equilibrium/constants/measured.ts";
import { TERMS } from "../../shared-lib/equilibrium/constants/terms.ts";

const rows = (file: string) => readTsv(`shared-lib/constants/${file}`, []);
const unique = (values: readonly (string | undefined)[]): number => new Set(values).size;

describe("tables of constants", () => {
  it("hold as much as the methods page needs", async () => {
    expect((await rows("hydration.tsv")).length).toBeGreaterThanOrEqual(200);
    expect(
      unique((["neutral", "anion", "cation"] as const).flatMap((state) => measuredParents(state))),
    ).toBeGreaterThanOrEqual(120);
    expect((await rows("ring-chain.tsv")).length).toBeGreaterThanOrEqual(40);
    expect((await rows("enthalpy.tsv")).length).toBeGreaterThanOrEqual(30);
    expect((await rows("acidity.tsv")).length).toBeGreaterThanOrEqual(30);
    expect((await rows("kinetics.tsv")).length).toBeGreaterThanOrEqual(30);
    expect(
      unique([...(await rows("taft.tsv")), ...(await rows("hammett.tsv"))].map((row) => row.cells.group)),
    ).toBeGreaterThanOrEqual(100);
    expect((await rows("alcohol-terms.tsv")).length).toBeGreaterThanOrEqual(12);
  });

  it("give every number a source, or say that it has none", async () => {
    for (const file of [
      "hydration.tsv",
      "hemiacetal.tsv",
      "ring-chain.tsv",
      "acidity.tsv",
      "kinetics.tsv",
      "enthalpy.tsv",
    ])
      for (const row of await rows(file)) {
        expect(["source", "recalled", "derived"], row.place).toContain(row.cells.read);
        // Read somewhere, but without a reference: the note or the method must say where.
        if (row.cells.read === "source" && !row.cells.source)
          expect(`${row.cells.note}${row.cells.method}`.length, row.place).toBeGreaterThan(5);
      }
  });
});

describe("the correlation", () => {
  it("is the fit of today's tables", () => {
    const { solution } = calibrated(fitPoints().filter((point) => !point.external));
    expect(coefficients.terms).toEqual(TERMS.map((term) => term.name));
    for (const [i, value] of solution.beta.entries())
      expect(coefficients.beta[i], TERMS[i]?.name).toBeCloseTo(value, 3);
  });

  it("reaches its aims: leave-one-out RMSE of log K", () => {
    expect(coefficients.families.aliphatic.looRmse).toBeLessThanOrEqual(0.2);
    expect(coefficients.families["alpha-acyl"].looRmse).toBeLessThanOrEqual(0.4);
    expect(coefficients.families["aryl aldehyde"].looRmse).toBeLessThanOrEqual(0.15);
  });

  it("has a methods page that is up to date (npm run methods)", async () => {
    const page = await readFile(new URL("../../shared-lib/README.md", import.meta.url), "utf8");
    expect(await renewed(page)).toBe(page);
  });
});

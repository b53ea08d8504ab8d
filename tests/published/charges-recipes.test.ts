/** Published recipes' own numbers must come out consistent: figures of real procedures, by identifier (recipe-charges.tsv). */

import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { analyse } from "../advice/analyse.ts";

const rows = readFileSync(new URL("recipe-charges.tsv", import.meta.url), "utf8")
  .split("\n")
  .filter((line) => line !== "" && !line.startsWith("#"))
  .slice(1)
  .map((line) => line.split("\t") as [string, string, string, string]);

describe("figures of published recipes", () => {
  it("are at least 20", () => expect(rows.length).toBeGreaterThanOrEqual(20));

  it.each(rows)("%s: %s, %s is %s", (_, name, weighed, amount) => {
    // A name whose bracket is open holds its strength in the same bracket.
    const named = name.includes("(") ? `${name}, ` : `${name} (`;
    const { charges, findings } = analyse(`${named}${weighed}, ${amount}) was dissolved in THF (100 mL).`);
    expect(charges).toHaveLength(1);
    const mol = Number.parseFloat(amount) * (amount.endsWith("mmol") ? 1e-3 : 1);
    const total = charges[0]?.total;
    expect(total?.value).toBeCloseTo(mol, 9);
    // The weighing alone must give the published amount within 8 %: densities and assays of lots differ.
    const alone = analyse(`${named}${weighed}) was dissolved in THF (100 mL).`).charges[0]?.total?.value ?? 0;
    expect(Math.abs(alone / mol - 1)).toBeLessThan(0.08);
    expect(findings.filter(({ code }) => code.startsWith("charge/"))).toEqual([]);
  });
});

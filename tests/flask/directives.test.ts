import { describe, expect, it } from "vitest";
import { analyse } from "../advice/analyse.ts";

const NOTE = "Propanal (5.81 g, 100 mmol) was stirred in methanol (200 mL) at 20 °C.";

function lastContents(text: string) {
  const contents = analyse(text).moments.at(-1)?.contents;
  if (!contents) throw new Error("no state");
  return contents;
}

describe("what a directive says of the flask", () => {
  it("wins over temperature, pH and medium of the next step", () => {
    const text = `<!-- oxomargin: temperature 60 °C -->\n<!-- oxomargin: pH 4 -->\n<!-- oxomargin: medium water -->\n\n${NOTE}`;
    const contents = lastContents(text);
    expect(contents.temperatureK).toBeCloseTo(333.15, 2);
    expect(contents.pH).toBe(4);
    expect(contents.solvents.map(({ solvent }) => solvent)).toEqual(["water"]);
    // The volume is that of the note: 200 mL of water at 0.997 g/mL is 11.07 mol.
    expect(contents.solvents[0]?.amount).toBeCloseTo(11.07, 1);
  });

  it("leaves the step after that alone", () => {
    const text = `# A\n\n<!-- oxomargin: pH 4 -->\n\n${NOTE}\n\n# B\n\n${NOTE}\n`;
    const phs = analyse(text).moments.map(({ step, contents }) => [step, contents.pH]);
    expect(phs.filter(([, pH]) => pH === 4).map(([step]) => step)).toEqual(expect.arrayContaining([1]));
    expect(phs.filter(([step]) => step === 2).every(([, pH]) => pH === undefined)).toBe(true);
  });

  it("gives the next charge its assay, and no other", () => {
    const text =
      "<!-- oxomargin: assay 50 % -->\n\nBenzaldehyde (10.6 g) and propanal (5.81 g) were stirred in methanol (200 mL).";
    const totals = analyse(text).charges.map(({ total }) => total?.value ?? 0);
    expect(totals[0]).toBeCloseTo(0.05, 3);
    expect(totals[1]).toBeCloseTo(0.1, 3);
  });

  it("that cannot be read changes nothing", () => {
    const plain = lastContents(NOTE);
    const odd = lastContents(
      `<!-- oxomargin: pH blue -->\n<!-- oxomargin: medium moonlight -->\n<!-- oxomargin: temperature -900 °C -->\n\n${NOTE}`,
    );
    expect(odd.solvents).toEqual(plain.solvents);
    expect(odd.temperatureK).toBe(plain.temperatureK);
    expect(odd.pH).toBe(plain.pH);
  });
});

describe("a step that is no step", () => {
  it("is followed only so far", () => {
    const text = "Acetaldehyde (4.4 g, 100 mmol) was stirred in water (10 mL); ".repeat(400);
    const { moments, charges } = analyse(text);
    expect(charges.length).toBe(400);
    expect(moments.length).toBeLessThanOrEqual(200);
    expect(Math.max(...moments.map(({ contents }) => contents.carbonyls.length))).toBeLessThanOrEqual(48);
  });
});

import { describe, expect, it } from "vitest";
import { createLexicon } from "../../shared-lib/compounds/create-lexicon.ts";
import { createStructureToolkit } from "../../shared-lib/compounds/structure.ts";
import { readMedium } from "../../shared-lib/notes/read-medium.ts";
import { readNote } from "../../shared-lib/notes/read-note.ts";

const lexicon = createLexicon();
const structures = createStructureToolkit();
const read = (text: string) => readNote(text, { format: "markdown", lexicon, structures });

/** Charges as "name: amounts", in order. */
function charges(text: string): string[] {
  const reading = read(text);
  return reading.charges.map(
    (charge) => `${reading.mentions[charge.mention]?.name}: ${charge.amounts.map((amount) => amount.text).join(", ")}`,
  );
}

// The notes of these tests are invented.
describe("charges", () => {
  it.each([
    [
      "4-Nitrobenzaldehyde (1.51 g, 10.0 mmol, 1.0 equiv) was added.",
      "4-nitrobenzaldehyde: 1.51 g, 10.0 mmol, 1.0 equiv",
    ],
    ["Add 1.51 g (10.0 mmol) of 4-nitrobenzaldehyde.", "4-nitrobenzaldehyde: 1.51 g, 10.0 mmol"],
    ["10.0 mmol of 4-nitrobenzaldehyde (1.51 g) was added.", "4-nitrobenzaldehyde: 10.0 mmol, 1.51 g"],
    ["4-nitrobenzaldehyde, 1.51 g, was added.", "4-nitrobenzaldehyde: 1.51 g"],
    ["Add 37 wt% aq. formaldehyde (8.1 mL, ~100 mmol).", "formaldehyde: 37 wt%, 8.1 mL, 100 mmol"],
    ["Add benzaldehyde (0,53 g; 5 mmol).", "benzaldehyde: 0,53 g, 5 mmol"],
  ])("%s", (text, expected) => {
    expect(charges(text)).toEqual([expected]);
  });

  it("reads a table whose headings hold the units", () => {
    const table = "| what | n / mmol | m (g) |\n|---|---|---|\n| benzaldehyde | 10 | 1.06 |\n";
    expect(charges(table)).toEqual(["benzaldehyde: 10, 1.06"]);
  });

  it("gives places that hold in the file, behind list marks and CRLF", () => {
    const text = "# Title\r\n\r\n- Charge benzaldehyde (1.06 g, 10.0 mmol)\r\n";
    for (const mention of read(text).mentions) expect(text.slice(mention.start, mention.end)).toBe(mention.text);
    expect(read(text).mentions[0]?.text).toBe("benzaldehyde");
  });
});

describe("roles and boundaries", () => {
  it("takes acetone for a solvent where things are in it", () => {
    expect(read("Benzylamine (1.07 g, 10 mmol) in acetone (20 mL).").mentions.map((mention) => mention.role)).toEqual([
      "reagent",
      "solvent",
    ]);
  });

  it("passes over what is another compound: an oxime, an acetal, code", () => {
    const text =
      "Benzaldehyde oxime (1 g) and acetone diethyl acetal (2 g); cyclohexanone sodium bisulfite adduct (3 g); `benzaldehyde (1 g)`.";
    expect(read(text).mentions.filter((mention) => mention.carbonyl)).toEqual([]);
  });

  it("ends the flask at the work-up", () => {
    const reading = read(
      "Benzaldehyde (1.06 g, 10 mmol) in MeOH (10 mL) was stirred for 2 h, then extracted with EtOAc (20 mL).",
    );
    expect(reading.events.map((event) => event.kind)).toEqual(["charge", "medium", "hold", "work-up"]);
    expect(reading.media.map((medium) => medium.kind)).toEqual(["alcoholic"]);
  });

  it("names the place of a SMILES that cannot be", () => {
    const text = "Compound 2 (SMILES c1cccc1) was used.";
    const [problem] = read(text).problems;
    expect(problem?.code).toBe("reading/smiles");
    // The atom that no alternation of double bonds reaches.
    expect(problem?.start).toBe(text.indexOf("c1cccc1") + "c1ccc".length);
  });

  it("reads a block again only when its text changes", async () => {
    const { counter } = await import("../../shared-lib/notes/read-block.ts");
    const blocks = Array.from({ length: 50 }, (_, i) => `Charge benzaldehyde (1.06 g, ${i + 1} mmol).`);
    read(blocks.join("\n\n"));
    const before = counter.read;
    blocks[20] = "Charge benzaldehyde (2.12 g, 20 mmol).";
    read(blocks.join("\n\n"));
    expect(counter.read - before).toBe(1);
  });
});

describe("a medium by itself", () => {
  const shares = (text: string): Record<string, number> => {
    const medium = readMedium(text, lexicon);
    if (!medium.ok) throw new Error(medium.problem);
    const total = medium.amounts.reduce((sum, part) => sum + part.amount, 0);
    return Object.fromEntries(medium.amounts.map((part) => [part.solvent, part.amount / total]));
  };

  it("takes 9:1 MeOH/H2O by volume", () => {
    // 9 × 0.7866/32.042 against 0.99705/18.015: mole fraction of water 0.2003 (densities of the CRC Handbook).
    expect(shares("9:1 MeOH/H2O").water).toBeCloseTo(0.2003, 3);
  });

  it("takes wt% by mass", () => {
    // 50/46.068 against 50/18.015: water 0.7189.
    expect(shares("50 wt% ethanol").water).toBeCloseTo(0.7189, 3);
  });

  it("says what is wrong with an unknown one", () => {
    expect(readMedium("unobtainium", lexicon)).toMatchObject({ ok: false });
  });
});

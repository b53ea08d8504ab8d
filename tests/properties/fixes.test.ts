/**
 * Every fix on generated notes: valid edits, the finding gone, idempotent, no other charge changed.
 * The notes are an invented case; the seed is fixed so that a failure can be repeated.
 */

import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Finding } from "../../shared-lib/advice/types.ts";
import type { Analysis } from "../../shared-lib/analyze.ts";
import { analyse, applied } from "../advice/analyse.ts";

const RUNS = 2000;
const SEED = 4711;

/** Name as charged, g/mol that the writer may reckon with, density of the weighed liquid if it is one. */
const CARBONYLS = [
  { name: "Acetaldehyde", grams: 44.05 },
  { name: "Propanal", grams: 58.08 },
  { name: "Chloral hydrate", grams: 147.39 },
  { name: "Chloral hydrate", grams: 165.4 },
  { name: "Glyoxylic acid monohydrate", grams: 74.04 },
  { name: "Glyoxylic acid monohydrate", grams: 92.05 },
  { name: "Glyoxal (40 wt% in water", grams: 58.04 },
  { name: "Glyoxal (40 wt% in water", grams: 145.1 },
  { name: "Formaldehyde (37 wt% in water", grams: 30.03 },
  { name: "Formalin", grams: 81.2 },
  { name: "Formalin", grams: 30.03 },
  { name: "Benzaldehyde", grams: 106.12 },
  { name: "4-Nitrobenzaldehyde", grams: 151.12 },
  { name: "1,1,1-Trifluoroacetone", grams: 112.05 },
  { name: "Methylglyoxal (40 wt% in water", grams: 72.06 },
] as const;

const MEDIA = [
  "water (200 mL)",
  "methanol (150 mL)",
  "9:1 MeOH/H2O (100 mL)",
  "THF/water (4:1 v/v, 250 mL)",
  "THF (100 mL)",
  "ethanol (80 mL)",
  "acetonitrile (50 mL) and water (20 mL)",
] as const;

const PARTNERS = [
  "Benzylamine (10.7 g, 100 mmol, 1.0 equiv) was added.",
  "Hydroxylamine hydrochloride (6.95 g, 100 mmol, 1.0 equiv) was added.",
  "Sodium borohydride (1.89 g, 50.0 mmol, 0.50 equiv) was added at 0 °C.",
  "Phenylmagnesium bromide (1.0 M in THF, 100 mL, 100 mmol, 1.0 equiv) was added at 0 °C.",
  "Sodium cyanide (4.90 g, 100 mmol, 1.0 equiv) was added.",
  "",
] as const;

const noteOf = fc
  .record({
    carbonyl: fc.constantFrom(...CARBONYLS),
    medium: fc.constantFrom(...MEDIA),
    partner: fc.constantFrom(...PARTNERS),
    mmol: fc.constantFrom(1, 5, 12.5, 50, 80, 100, 250),
    digits: fc.constantFrom(2, 3, 4),
    slip: fc.constantFrom(1, 1, 1, 1000, 0.001),
    comma: fc.boolean(),
    equivalents: fc.boolean(),
    style: fc.constantFrom("brackets", "of", "table"),
  })
  .map(({ carbonyl, medium, partner, mmol, digits, slip, comma, equivalents, style }) => {
    const figure = (value: number) => {
      const text = Number(value.toPrecision(digits)).toString();
      return comma ? text.replace(".", ",") : text;
    };
    const mass = `${figure((carbonyl.grams * mmol * slip) / 1000)} g`;
    const amount = `${figure(mmol)} mmol`;
    const equiv = equivalents ? `${figure(mmol / 100)} equiv` : "";
    const open = carbonyl.name.includes("(") ? ", " : " (";
    const words = [mass, amount, equiv].filter(Boolean).join(", ");
    if (style === "table" && !carbonyl.name.includes("(")) {
      const header = "| Reagent | Mass | Amount | Equiv |\n| --- | --- | --- | --- |";
      return `# Trial\n\n${header}\n| ${carbonyl.name} | ${mass} | ${amount} | ${figure(mmol / 100)} |\n\nIt was stirred in ${medium}. ${partner}\n`;
    }
    if (style === "of" && !carbonyl.name.includes("("))
      return `# Trial\n\n${mass} (${amount}) of ${carbonyl.name.toLowerCase()} was dissolved in ${medium}. ${partner}\n`;
    return `# Trial\n\n${carbonyl.name}${open}${words}) was dissolved in ${medium}. ${partner}\n`;
  });

function chargesBut({ charges }: Analysis, mention: number | undefined): unknown {
  return charges
    .filter((charge) => charge.mention !== mention)
    .map(({ compound, total, form }) => [compound.id, total?.value.toPrecision(6), form?.id]);
}

function same(a: Finding, b: Finding): boolean {
  return a.code === b.code && a.mention === b.mention;
}

function isDirty(text: string): boolean {
  return text.includes("NaN") || text.includes("undefined") || text.includes("Infinity");
}

describe(`fixes on ${RUNS} generated notes (seed ${SEED})`, () => {
  it("are valid, remove their finding, leave the other charges and are idempotent", () => {
    const tried = new Map<string, number>();
    fc.assert(
      fc.property(noteOf, (text) => {
        const before = analyse(text);
        for (const finding of before.findings) {
          for (const fix of finding.fixes) {
            tried.set(finding.code, (tried.get(finding.code) ?? 0) + 1);
            const sorted = [...fix.edits].sort((a, b) => a.start - b.start || a.end - b.end);
            sorted.forEach((edit, i) => {
              expect(edit.start).toBeGreaterThanOrEqual(i > 0 ? (sorted[i - 1]?.end ?? 0) : 0);
              expect(edit.end).toBeGreaterThanOrEqual(edit.start);
              expect(edit.end).toBeLessThanOrEqual(text.length);
            });
            const after = applied(text, fix);
            expect(isDirty(after)).toBe(false);
            expect(after).not.toBe(text);
            const now = analyse(after);
            const left = now.findings.filter((other) => same(other, finding));
            expect(left, `${finding.code}: ${fix.title}\n${after}`).toEqual([]);
            expect(chargesBut(now, finding.mention), after).toEqual(chargesBut(before, finding.mention));
          }
        }
      }),
      { numRuns: RUNS, seed: SEED },
    );
    expect([...tried.keys()].sort()).toEqual(
      expect.arrayContaining([
        "charge/amounts-disagree",
        "charge/weighed-as-another-form",
        "forms/mostly-hemiacetal",
        "forms/mostly-hydrated",
      ]),
    );
  }, 240_000);
});

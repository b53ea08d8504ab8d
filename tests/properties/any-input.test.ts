/**
 * Whatever is written or asked, the analysis answers: no throw, offsets in the text, shares from 0 to 1 that add up to 1,
 * bounds around their values. `FUZZ_RUNS` sets the number of cases; a failure prints its seed.
 */

import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { analyze } from "../../shared-lib/analyze.ts";
import { createLexicon } from "../../shared-lib/compounds/create-lexicon.ts";
import { createStructureToolkit } from "../../shared-lib/compounds/structure.ts";
import type { Compound } from "../../shared-lib/compounds/types.ts";
import { estimate } from "../../shared-lib/equilibrium/estimate.ts";
import type { Settings } from "../../shared-lib/model/settings.ts";
import { readTemperature } from "../../shared-lib/notes/conditions.ts";
import { readMedium } from "../../shared-lib/notes/read-medium.ts";
import { REPORT_FORMATS, WRITERS } from "../../shared-lib/report/formats.ts";
import { toNoteReport } from "../../shared-lib/report/note-report.ts";
import { estimateProblems, fileProblems, schemaProblems } from "../terminal/valid-output.ts";

const RUNS = Number(process.env.FUZZ_RUNS ?? 400);
const lexicon = createLexicon();
const structures = createStructureToolkit();

/** Words, signs and figures of notes, whole and broken, so that random texts reach deep into the reading. */
const FRAGMENTS = (
  "acetaldehyde|Formalin|chloral hydrate|glyoxal (40 wt% in water)|PhCHO|CC(=O)C=O|acetone|MeOH|water|THF/water 4:1 (v/v)|PBS|50% aq. EtOH|" +
  "hydroxylamine hydrochloride|NaBH4|(4.4 g, 100 mmol)|(1.0 equiv)|12 mL|0 g|-5 g|1e400 mol|37 wt%|2 M|(|)|[|]|{|`|```\n|# Step\n|\n\n|- |\\||| --- |\n|<!-- oxomargin|" +
  "<!-- /oxomargin ledger -->|[in flask:|at −78 °C|at 25 °C|reflux|-400 °C|pH 7.4|pH 99|for 2 h|overnight|quenched with|was added to|in|and|to|of|; |, |. |\u0000|\uFEFF|\uD800|é|…|µL|½|\u202E|\r\n|\t|75-07-0|=|+|∞|NaN"
).split("|");

const word = fc.constantFrom(...FRAGMENTS);

/** A charge in a medium, as a note has it, so that the later stages have work; any word may stand in its place or follow. */
const sentence = fc
  .tuple(
    fc.constantFrom(
      "Acetaldehyde",
      "chloral hydrate",
      "formalin",
      "acetone",
      "CC(=O)C=O",
      "Glyoxal (40 wt% in water)",
      "benzaldehyde",
    ),
    fc.oneof({ weight: 4, arbitrary: fc.integer({ min: 1, max: 999 }) }, fc.double({ min: -1, max: 1e6, noNaN: true })),
    fc.constantFrom("g", "mg", "mL", "mmol", "mol", "equiv", "M"),
    word,
    fc.constantFrom(
      "water (20 mL)",
      "9:1 MeOH/H2O",
      "MeOH (5 mL) and water (5 mL)",
      "PBS",
      "THF",
      "50% aq. EtOH",
      "brine",
    ),
  )
  .map(([name, amount, unit, extra, medium]) => `${name} (${amount} ${unit}, 2 equiv) in ${medium} ${extra}. `);

const anyText = fc
  .array(
    fc.oneof(
      { weight: 6, arbitrary: word },
      { weight: 5, arbitrary: sentence },
      fc.string({ unit: "binary", maxLength: 12 }),
      fc.nat(99_999).map(String),
    ),
    { maxLength: 30, size: "max" },
  )
  .chain((parts) => fc.constantFrom("", " ", " ").map((between) => parts.join(between)));

const anySettings: fc.Arbitrary<Settings> = fc.record({
  basis: fc.constantFrom("charged", "free"),
  hints: fc.constantFrom("off", "notable", "all"),
  roomTemperatureC: fc.double({ min: 0, max: 40, noNaN: true }),
  neutralPH: fc.double({ min: 0, max: 14, noNaN: true }),
  boundShare: fc.double({ min: 0.01, max: 1, noNaN: true }),
  findings: fc.dictionary(
    fc.constantFrom("forms/mostly-hydrated", "__proto__", "no/such"),
    fc.constantFrom("off", "warning"),
  ),
});

function problemsOf(text: string, format: "markdown" | "plain", settings: Settings): readonly string[] {
  const analysis = analyze(text, { format, lexicon, settings, structures });
  const report = toNoteReport("a.md", text, analysis, lexicon, settings);
  const written = REPORT_FORMATS.map((name) => WRITERS[name].note({ report, text }));
  return [
    ...fileProblems(report, text),
    schemaProblems("fileReport", JSON.parse(JSON.stringify(report))),
    written.some((page) => /\bNaN %|\bInfinity %/.test(page)) ? "a figure is no number" : "",
  ].filter(Boolean);
}

describe("any note", () => {
  it("is often enough a note with carbonyls in a flask", () => {
    const texts = fc.sample(anyText, { numRuns: 200, seed: 1 });
    const full = texts.filter((text) =>
      analyze(text, { format: "plain", lexicon, structures }).moments.some(
        (moment) => moment.carbonylMentions.length > 0,
      ),
    );
    expect(full.length).toBeGreaterThan(60);
  });

  it("is read and reported in every format", () => {
    fc.assert(
      fc.property(anyText, fc.constantFrom("markdown", "plain"), anySettings, (text, format, settings) => {
        expect(problemsOf(text, format, settings)).toEqual([]);
      }),
      { numRuns: RUNS, verbose: 1 },
    );
  });

  it("is read the same twice", () => {
    fc.assert(
      fc.property(anyText, (text) => {
        const options = { format: "markdown", lexicon, structures } as const;
        expect(JSON.stringify(analyze(text, options))).toBe(JSON.stringify(analyze(text, options)));
      }),
      { numRuns: Math.ceil(RUNS / 4), verbose: 1 },
    );
  });
});

const smilesLike = fc
  .array(
    fc.constantFrom(
      ..."C C C c c1ccccc1 O =O (=O) C=O N n F Cl Br [N+](=O)[O-] ( ) = # 1 2 [ ] @ / \\ . S [nH] [13CH] %10 * [Fe] - ~".split(
        " ",
      ),
    ),
    {
      minLength: 1,
      maxLength: 14,
    },
  )
  .map((parts) => parts.join(""));

describe("any structure", () => {
  it("is refused with a reason or estimated with shares that add up to 1", () => {
    fc.assert(
      fc.property(
        smilesLike,
        fc.double({ min: 250, max: 400, noNaN: true }),
        fc.constantFrom(undefined, 0, 3, 7, 14),
        (smiles, temperatureK, pH) => {
          const reading = structures.read(smiles);
          if (!reading.ok) {
            expect(reading.problem).not.toBe("");
            return;
          }
          const compound: Compound = {
            id: reading.canonicalSmiles,
            name: smiles,
            smiles: reading.canonicalSmiles,
            formula: reading.formula,
            molarMass: reading.molarMass,
            tags: [],
            origin: "structure",
            ...(reading.carbonyl ? { carbonyl: reading.carbonyl } : {}),
          };
          const medium = readMedium("4:1 MeOH/H2O", lexicon);
          if (!medium.ok) throw new Error(medium.problem);
          const query = { input: smiles, mediumText: "4:1 MeOH/H2O", medium: medium.amounts, temperatureK };
          expect(estimateProblems(estimate(compound, pH === undefined ? query : { ...query, pH }))).toEqual([]);
        },
      ),
      { numRuns: RUNS, verbose: 1 },
    );
  });
});

describe("any words of a call", () => {
  it("name a medium or get a reason, name a temperature or nothing", () => {
    fc.assert(
      fc.property(anyText, (text) => {
        const medium = readMedium(text, lexicon);
        if (!medium.ok) expect(medium.problem).not.toBe("");
        else for (const part of medium.amounts) expect(part.amount >= 0 && Number.isFinite(part.amount)).toBe(true);
        const kelvin = readTemperature(text);
        if (kelvin !== undefined) expect(Number.isFinite(kelvin)).toBe(true);
      }),
      { numRuns: RUNS, verbose: 1 },
    );
  });
});

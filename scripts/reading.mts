/**
 * Measures the reading of notes against labelled paragraphs: `npm run reading -- DIR`.
 * DIR holds procedures.jsonl ({id, text}), labels.jsonl (carbonyl reagents with offsets, structures, roles, amounts; medium; batch) and
 * names.tsv (names with frequencies and structures). Nothing of DIR is part of the project.
 */
import { readFile } from "node:fs/promises";
import path from "node:path";
import { analyze } from "../shared-lib/analyze.ts";
import { createLexicon } from "../shared-lib/compounds/create-lexicon.ts";
import { createStructureToolkit } from "../shared-lib/compounds/structure.ts";
import type { FileReport } from "../shared-lib/model/contract.ts";
import { toFileReport } from "../shared-lib/report/file-report.ts";

interface LabelledAmount {
  readonly start: number;
  readonly end: number;
  readonly text: string;
}
interface LabelledMention {
  readonly text: string;
  readonly start: number;
  readonly end: number;
  readonly smiles: string;
  readonly role: string;
  readonly amounts: readonly LabelledAmount[];
}
interface Label {
  readonly id: string;
  readonly carbonyl_reagents: readonly LabelledMention[];
  readonly medium: { readonly kind: string; readonly main_components: readonly string[] };
  readonly hydration_relevant: boolean;
  readonly batch: number;
}

const dir = process.argv[2];
const verbose = process.argv.includes("--verbose");
if (!dir) {
  console.error("reading: name the folder with procedures.jsonl, labels.jsonl and names.tsv");
  process.exit(2);
}

const lexicon = createLexicon();
const structures = createStructureToolkit();
const lines = async (name: string): Promise<string[]> =>
  (await readFile(path.join(dir, name), "utf8")).split("\n").filter((line) => line.trim() !== "");
const texts = new Map(
  (await lines("procedures.jsonl"))
    .map((line) => JSON.parse(line) as { id: string; text: string })
    .map(({ id, text }) => [id, text]),
);
const labels = (await lines("labels.jsonl")).map((line) => JSON.parse(line) as Label);

function canonical(smiles: string | undefined): string | undefined {
  if (smiles === undefined) return undefined;
  const reading = structures.read(smiles.replaceAll(/[/\\]/g, "").replaceAll("@", ""));
  return reading.ok ? reading.canonicalSmiles : undefined;
}

const overlaps = (a: { start: number; end: number }, b: { start: number; end: number }): boolean =>
  a.start < b.end && b.start < a.end;

function report(text: string, id: string): FileReport {
  return toFileReport(id, analyze(text, { format: "markdown", lexicon, structures }));
}

interface Tally {
  hits: number;
  of: number;
}
const tallies = new Map<string, Tally>();
function count(what: string, hit: boolean): void {
  const tally = tallies.get(what) ?? { hits: 0, of: 0 };
  tally.of++;
  if (hit) tally.hits++;
  tallies.set(what, tally);
}

for (const label of labels) {
  const text = texts.get(label.id);
  if (text === undefined) continue;
  const found = report(text, label.id);
  const carbonyls = found.mentions
    .map((mention, index) => ({ ...mention, index }))
    .filter((mention) => mention.carbonyl);
  const wanted = label.carbonyl_reagents.filter((mention) => mention.role === "reagent");
  for (const mention of wanted) {
    const match = carbonyls.find((candidate) => overlaps(candidate, mention) && candidate.role === "reagent");
    count("reagents found (recall)", match !== undefined);
    count(`  batch ${label.batch}`, match !== undefined);
    if (!match) {
      if (verbose)
        console.log(
          label.id,
          "MISSED",
          mention.text,
          "|",
          carbonyls
            .filter((c) => overlaps(c, mention))
            .map((c) => c.role)
            .join(),
        );
      continue;
    }
    const same = canonical(match.smiles) === canonical(mention.smiles);
    count("structures right", same);
    if (!same && verbose) console.log(label.id, "STRUCTURE", mention.text, match.smiles, mention.smiles);
    const charge = found.charges.find((candidate) => candidate.mention === match.index);
    for (const amount of mention.amounts) {
      const tied = charge?.amounts.some((candidate) => overlaps(candidate, amount)) ?? false;
      count("amounts tied", tied);
      if (!tied && verbose)
        console.log(
          label.id,
          "AMOUNT",
          mention.text,
          amount.text,
          "| got",
          charge?.amounts.map((a) => text.slice(a.start, a.end)).join(", "),
          "|",
          text.slice(Math.max(0, mention.start - 60), mention.end + 60).replaceAll("\n", " "),
        );
    }
  }
  for (const mention of carbonyls.filter((candidate) => candidate.role === "reagent")) {
    const right = label.carbonyl_reagents.some(
      (candidate) => overlaps(candidate, mention) && candidate.role === "reagent",
    );
    count("reagents right (precision)", right);
    if (!right && verbose)
      console.log(
        label.id,
        "FALSE",
        mention.text,
        "|",
        text.slice(Math.max(0, mention.start - 70), mention.end + 40).replaceAll("\n", " "),
      );
  }
  if (label.medium.kind !== "none" && wanted.length > 0) {
    const first = carbonyls.find(
      (mention) => mention.role === "reagent" && wanted.some((candidate) => overlaps(candidate, mention)),
    );
    const step = found.charges.find((charge) => charge.mention === first?.index)?.step ?? 1;
    const media = found.media.filter((medium) => medium.step === step);
    const right = media[0]?.kind === label.medium.kind || media.some((medium) => medium.kind === label.medium.kind);
    count("medium kind", right);
    const main = label.medium.main_components[0]?.toLowerCase() ?? "";
    const smilesOf = (name: string): string | undefined => {
      const match = lexicon.find(name);
      return match && match !== "needs structures" ? match.compound.smiles : undefined;
    };
    const wantedMain = smilesOf(main);
    const same = media.some((medium) =>
      medium.components.some(({ name }) => wantedMain !== undefined && smilesOf(name) === wantedMain),
    );
    if (main !== "") count("medium main component", same);
    if ((!right || (main !== "" && !same)) && verbose)
      console.log(
        label.id,
        "MEDIUM",
        label.medium.kind,
        label.medium.main_components.join("+"),
        "| got",
        media
          .map((medium) => `${medium.kind}:${medium.components.map((component) => component.name).join("+")}`)
          .join(" ; "),
      );
  }
  if (!label.hydration_relevant)
    count(
      "irrelevant paragraphs with a finding (aim: at most 1 %)",
      found.findings.some((finding) => finding.code.startsWith("forms/")),
    );
}

const [head, ...rows] = await lines("names.tsv");
const columns = (head ?? "").split("\t");
let read = 0;
let total = 0;
for (const row of rows) {
  const cells = Object.fromEntries(row.split("\t").map((cell, i) => [columns[i], cell]));
  const weight = Number(cells.freq_pool) || 1;
  if (cells.flags?.includes("misread")) continue;
  total += weight;
  const name = cells.name ?? "";
  const match = lexicon.find(name, structures);
  if (!match || match === "needs structures") {
    if (verbose && weight > 1) console.log("NAME", name);
    continue;
  }
  read += weight;
  const same = canonical(match.compound.smiles) === canonical(cells.smiles);
  count("names that agree with the reference", same);
  if (!same && verbose) console.log("DISAGREE", name, match.compound.smiles, cells.smiles);
}
for (const [what, { hits, of }] of tallies) console.log(`${what.padEnd(58)} ${hits}/${of}  ${(hits / of).toFixed(3)}`);
console.log(`${"names read, weighted by frequency".padEnd(58)} ${read}/${total}  ${(read / total).toFixed(3)}`);

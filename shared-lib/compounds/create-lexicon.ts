/** The lexicon over the catalogue, the solvents and the buffers: one hash lookup a word, then the longest name that fits. */

import compoundTable from "../generated/compounds.json" with { type: "json" };
import formTable from "../generated/supplied-forms.json" with { type: "json" };
import { allBuffers } from "../media/buffers.ts";
import { allSolvents, type Solvent } from "../media/solvents.ts";
import type { Lexicon } from "./lexicon.ts";
import { grammarName, grammarNameAt } from "./name-grammar/names-in-text.ts";
import { isLetter, isWordCharacter, plainText } from "./normal-form.ts";
import type { ReagentTag } from "./tags.ts";
import type { Compound, NameMatch, StructureToolkit, SuppliedForm } from "./types.ts";

interface Entry {
  readonly compound: Compound;
  readonly form?: SuppliedForm;
  readonly by: NameMatch["by"];
  /** As written, for a name whose capitals matter (MeOH, PBS). */
  readonly exact?: string;
}

/** Words that make another thing of the compound named before them. */
const MASKING = new Set(
  (
    "oxime oximes hydrazone semicarbazone imine enamine acetal acetals ketal hemiacetal dimethyl diethyl cyanohydrin dehydrogenase reductase oxidase lyase " +
    "bisulfite bisulphite tosylhydrazone dinitrophenylhydrazone thiosemicarbazone diacetate resin resins polymer polymers ylide dianion enolate"
  ).split(" "),
);

const LONGEST_NAME_WORDS = 7;

/** Capitals carry the meaning of an abbreviation or a formula; a name in words may be written either way. */
function capitalsMatter(name: string): boolean {
  return /[A-Z]/.test(name) && !/[a-z]{4}/.test(name.replace(/^(?:[A-Z]{1,3}-)+/, ""));
}

/** What the first look of a word goes by: its first run of letters or digits, in lower case. */
function firstRun(text: string, at: number): string {
  let i = at;
  while (i < text.length && isWordCharacter(text[i])) i++;
  return text.slice(at, i).toLowerCase();
}

function solventTags(solvent: Solvent): readonly ReagentTag[] {
  if (solvent.kind === "alcohol") return ["alcohol"];
  if (solvent.kind === "acid") return ["acid"];
  if (solvent.kind === "ketone") return ["ketone"];
  return [];
}

const COMPOUNDS = compoundTable as unknown as readonly {
  readonly compound: Compound;
  readonly names: readonly string[];
}[];
const FORMS = formTable as unknown as readonly {
  readonly form: SuppliedForm;
  readonly usual: boolean;
  readonly names: readonly string[];
}[];

/** Names of a bottle whose words alone do not make it the supplied form ("paraformaldehyde" does; an empty list does not). */
class CatalogueLexicon implements Lexicon {
  readonly #byName = new Map<string, Entry>();
  readonly #starts = new Map<string, number>();
  readonly #byId = new Map<string, Compound>();
  readonly #bySmiles = new Map<string, Compound>();
  readonly #byCas = new Map<string, Entry>();
  readonly #forms = new Map<string, SuppliedForm[]>();

  constructor(extra: readonly { readonly compound: Compound; readonly names: readonly string[] }[]) {
    for (const { form } of FORMS) {
      const forms = this.#forms.get(form.of) ?? [];
      forms.push(form);
      this.#forms.set(form.of, forms);
    }
    const usualForms = new Map(FORMS.filter(({ usual }) => usual).map(({ form }) => [form.of, form.id]));
    const solventBySmiles = new Map(allSolvents().map((solvent) => [solvent.smiles, solvent]));
    for (const { compound, names } of [...COMPOUNDS, ...extra]) {
      const solvent = solventBySmiles.get(compound.smiles);
      const usual = usualForms.get(compound.id);
      const whole: Compound = {
        ...compound,
        ...(solvent ? { solvent: solvent.key } : {}),
        ...(usual ? { usualForm: usual } : {}),
      };
      this.#addCompound(whole, names);
    }
    this.#addSolvents(new Set(COMPOUNDS.map(({ compound }) => compound.smiles)));
    this.#addBuffers();
    for (const { form, names } of FORMS) {
      const compound = this.#byId.get(form.of);
      if (!compound) continue;
      for (const name of names) this.#addName(name, { compound, form, by: "name" });
      if (form.cas && !this.#byCas.has(form.cas)) this.#byCas.set(form.cas, { compound, form, by: "cas" });
    }
  }

  #addCompound(compound: Compound, names: readonly string[]): void {
    this.#byId.set(compound.id, compound);
    if (!this.#bySmiles.has(compound.smiles)) this.#bySmiles.set(compound.smiles, compound);
    for (const name of names) this.#addName(name, { compound, by: capitalsMatter(name) ? "abbreviation" : "name" });
    if (compound.cas) this.#byCas.set(compound.cas, { compound, by: "cas" });
  }

  #addSolvents(known: ReadonlySet<string>): void {
    for (const solvent of allSolvents()) {
      const names = [solvent.key, solvent.name, ...solvent.synonyms];
      if (known.has(solvent.smiles) && solvent.key !== "petroleum ether") {
        const compound = [...this.#byId.values()].find((candidate) => candidate.smiles === solvent.smiles);
        if (compound)
          for (const name of names)
            this.#addName(name, { compound, by: capitalsMatter(name) ? "abbreviation" : "name" });
        continue;
      }
      const compound: Compound = {
        id: solvent.key,
        name: solvent.key,
        smiles: solvent.smiles,
        formula: "",
        molarMass: solvent.molarMass,
        cas: solvent.cas,
        density: solvent.density,
        tags: solventTags(solvent),
        solvent: solvent.key,
        origin: "catalogue",
      };
      this.#addCompound(compound, names);
    }
  }

  /** A buffer is water with something in it; a common word ("phosphate", "acetate") is one only with "buffer" behind it. */
  #addBuffers(): void {
    for (const buffer of allBuffers()) {
      if (this.#byId.has(buffer.key)) continue;
      const compound: Compound = {
        id: buffer.key,
        name: buffer.key,
        smiles: "O",
        formula: "H2O",
        molarMass: 18.015,
        tags: [],
        solvent: "water",
        buffer: buffer.key,
        origin: "catalogue",
      };
      this.#byId.set(compound.id, compound);
      const own = [buffer.key, ...buffer.synonyms];
      for (const name of own) {
        if (name.length > 40) continue;
        if (capitalsMatter(name) && name.length > 2) this.#addName(name, { compound, by: "abbreviation" });
        this.#addName(`${name} buffer`, { compound, by: "name" });
        if (buffer.kind === "saturated salt" || name === "phosphate-buffered saline")
          this.#addName(name.replace(", saturated", ""), { compound, by: "name" });
      }
    }
  }

  #addName(name: string, entry: Entry): void {
    const plain = plainText(name);
    const key = plain.toLowerCase();
    if (key === "" || this.#byName.has(key)) return;
    this.#byName.set(key, capitalsMatter(name) ? { ...entry, exact: plain } : entry);
    const words = plain.split(" ").length;
    const start = firstRun(plain, 0) || plain[0] || "";
    this.#starts.set(start, Math.max(this.#starts.get(start) ?? 0, words));
  }

  #entry(plain: string): Entry | undefined {
    const entry = this.#byName.get(plain.toLowerCase());
    return entry && (entry.exact === undefined || entry.exact === plain) ? entry : undefined;
  }

  matchAt(text: string, at: number, structures?: StructureToolkit): NameMatch | "needs structures" | undefined {
    const listed = this.#listedAt(text, at);
    if (listed) return listed;
    const read = grammarNameAt(text, at);
    return read && !isMasked(text, read.end)
      ? this.#fromStructure(read.smiles, text.slice(at, read.end), at, read.end, structures)
      : undefined;
  }

  /** A compound from its structure; the catalogue's own where it holds it, so that both are one compound. */
  #fromStructure(
    smiles: string,
    name: string,
    start: number,
    end: number,
    structures: StructureToolkit | undefined,
  ): NameMatch | "needs structures" | undefined {
    if (!structures) return "needs structures";
    const reading = structures.read(smiles);
    if (!reading.ok) return undefined;
    const known = this.#bySmiles.get(reading.canonicalSmiles);
    if (known) return { start, end, compound: known, by: "grammar" };
    const { carbonyl } = reading;
    return {
      start,
      end,
      by: "grammar",
      compound: {
        id: reading.canonicalSmiles,
        name,
        smiles: reading.canonicalSmiles,
        formula: reading.formula,
        molarMass: reading.molarMass,
        tags: carbonyl ? [carbonyl.sites.some((site) => site.hydrogens > 0) ? "aldehyde" : "ketone"] : [],
        ...(carbonyl ? { carbonyl } : {}),
        origin: "name",
      },
    };
  }

  #listedAt(text: string, at: number): NameMatch | undefined {
    const words = this.#starts.get(firstRun(text, at) || (text[at] ?? ""));
    if (words === undefined) return undefined;
    for (const end of candidateEnds(text, at, Math.min(words, LONGEST_NAME_WORDS))) {
      const plain = plainText(text.slice(at, end)).replace(/ +/g, " ");
      const entry = this.#entry(plain) ?? singular(plain, (name) => this.#entry(name));
      if (entry && !isMasked(text, end)) return match(at, end, entry);
    }
    return undefined;
  }

  find(whole: string, structures?: StructureToolkit): NameMatch | "needs structures" | undefined {
    const name = plainText(whole.trim());
    const entry = this.#byCas.get(name) ?? this.#entry(name) ?? this.#byName.get(name.toLowerCase());
    if (entry) return match(0, whole.length, entry);
    const smiles = grammarName(name);
    return smiles === undefined ? undefined : this.#fromStructure(smiles, whole.trim(), 0, whole.length, structures);
  }

  compound(id: string): Compound | undefined {
    return this.#byId.get(id);
  }

  bySmiles(canonicalSmiles: string): Compound | undefined {
    return this.#bySmiles.get(canonicalSmiles);
  }

  formsOf(id: string): readonly SuppliedForm[] {
    return this.#forms.get(id) ?? [];
  }
}

function match(start: number, end: number, entry: Entry): NameMatch {
  return { start, end, compound: entry.compound, by: entry.by, ...(entry.form ? { form: entry.form } : {}) };
}

function singular(plain: string, look: (name: string) => Entry | undefined): Entry | undefined {
  return plain.length > 5 && plain.endsWith("s") ? look(plain.slice(0, -1)) : undefined;
}

/** Ends of words from the longest to the shortest reading, at most `words` words ahead. */
function candidateEnds(text: string, at: number, words: number): number[] {
  const ends: number[] = [];
  let seen = 0;
  for (let i = at; i < text.length && i - at < 160; i++) {
    const c = text[i] as string;
    if (c === "\n" && text[i + 1] === "\n") break;
    if (isWordCharacter(c) || c === ")" || c === "]") {
      const next = text[i + 1];
      if (!isWordCharacter(next)) ends.push(i + 1);
    } else if (/\s/.test(c) && ++seen >= words) break;
  }
  return ends.reverse();
}

/** Behind a hyphen these begin another name or say nothing of the compound. */
const NOT_PART = ["water", "methanol", "ethanol", "hexane", "toluene", "chloroform", "dichloromethane", "ether", "thf"];

/** The name goes on into another word: "benzaldehyde oxime", "acetone-1,3-dicarboxylate", "formaldehyde-free". */
function isMasked(text: string, end: number): boolean {
  const after = plainText(text.slice(end, end + 24)).toLowerCase();
  if (after[0] === "-" && isWordCharacter(after[1])) return !NOT_PART.some((word) => after.startsWith(word, 1));
  if (after[0] !== " " && after[0] !== "-") return false;
  // "benzofuran-2,3-dione 2-[O-…]oxime": the name goes on behind the space.
  if (/^ \d{1,2}'?-[[(]/.test(after)) return true;
  if (/^ (?:sodium|potassium) bisul/.test(after)) return true;
  let i = end + 1;
  while (i < text.length && isLetter(text[i])) i++;
  return MASKING.has(text.slice(end + 1, i).toLowerCase());
}

/** A lexicon; `extra` are a lab's own reagents, which go before the catalogue's. */
export function createLexicon(
  extra: readonly { readonly compound: Compound; readonly names: readonly string[] }[] = [],
): Lexicon {
  return new CatalogueLexicon(extra);
}

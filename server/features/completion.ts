/** Offers units after a figure; directives in a comment; elsewhere reagents, supplied forms and solvents. */

import { type CompletionItem, CompletionItemKind, type Position } from "vscode-languageserver-protocol";
import compoundTable from "../../shared-lib/generated/compounds.json" with { type: "json" };
import formTable from "../../shared-lib/generated/supplied-forms.json" with { type: "json" };
import { allSolvents } from "../../shared-lib/media/solvents.ts";
import { DIRECTIVE_WORDS } from "../../shared-lib/notes/directives.ts";
import type { OpenNote } from "../notes.ts";

const UNITS = ["mg", "g", "kg", "µL", "mL", "L", "mmol", "mol", "equiv", "wt%", "mol%", "M", "°C", "min", "h"];

interface NamedRow {
  readonly names: readonly string[];
}

const REAGENTS = compoundTable as unknown as readonly (NamedRow & {
  readonly compound: { readonly name: string; readonly formula: string };
})[];
const FORMS = formTable as unknown as readonly (NamedRow & {
  readonly form: { readonly label: string; readonly kind: string };
})[];

/** The same for every note: made once, on first need. */
let offered: readonly CompletionItem[] | undefined;

function namesOffered(): readonly CompletionItem[] {
  offered ??= [
    ...REAGENTS.map(({ compound, names }) => item(compound.name, CompletionItemKind.Constant, compound.formula, names)),
    ...FORMS.map(({ form, names }) =>
      item(form.label, CompletionItemKind.Constant, `supplied form: ${form.kind}`, names),
    ),
    ...allSolvents().map((solvent) =>
      item(solvent.name, CompletionItemKind.Value, "solvent", [solvent.key, ...solvent.synonyms]),
    ),
  ];
  return offered;
}

function item(label: string, kind: CompletionItemKind, detail: string, names: readonly string[]): CompletionItem {
  return { label, kind, detail, filterText: [label, ...names].join(" ") };
}

const DIRECTIVE = "oxomargin:";

export function completionsOf(note: OpenNote, position: Position): CompletionItem[] {
  const start = note.document.offsetAt({ line: position.line, character: 0 });
  const before = note.document.getText().slice(start, note.document.offsetAt(position));
  if (before.includes(DIRECTIVE) && !before.includes("-->"))
    return DIRECTIVE_WORDS.map((label) => ({ label, kind: CompletionItemKind.Keyword, detail: "directive" }));
  if (afterFigure(before)) return UNITS.map((label) => ({ label, kind: CompletionItemKind.Unit }));
  const own = new Map<string, CompletionItem>();
  for (const { text, compound } of note.analysis.reading.mentions)
    if (compound)
      own.set(text, { ...item(text, CompletionItemKind.Constant, compound.formula, []), sortText: ` ${text}` });
  return [...own.values(), ...namesOffered()];
}

function afterFigure(before: string): boolean {
  const trimmed = before.trimEnd();
  let end = trimmed.length;
  if (end === before.length) while (end > 0 && /[A-Za-zµ°%]/.test(trimmed[end - 1] ?? "")) end--;
  const figure = trimmed.slice(0, end).trimEnd();
  return /\d$/.test(figure);
}

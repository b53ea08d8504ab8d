/** Offers solvents, units and directives, and the names that this note already uses. */

import { type CompletionItem, CompletionItemKind, type Position } from "vscode-languageserver-protocol";
import { allSolvents } from "../../shared-lib/media/solvents.ts";
import type { OpenNote } from "../notes.ts";

const UNITS = ["mg", "g", "kg", "µL", "mL", "L", "mmol", "mol", "equiv", "wt%", "mol%", "M", "°C", "min", "h"];

/** After a figure: units. Elsewhere: solvents and the compounds of the note. */
export function completionsOf(note: OpenNote, position: Position): CompletionItem[] {
  const start = note.document.offsetAt({ line: position.line, character: 0 });
  const before = note.document.getText().slice(start, note.document.offsetAt(position));
  if (afterFigure(before)) return UNITS.map((label) => ({ label, kind: CompletionItemKind.Unit }));
  const solvents = allSolvents().map((solvent) => ({
    label: solvent.name,
    kind: CompletionItemKind.Value,
    detail: "solvent",
    filterText: [solvent.name, solvent.key, ...solvent.synonyms].join(" "),
  }));
  const own = new Map<string, CompletionItem>();
  for (const mention of note.analysis.reading.mentions)
    if (mention.compound)
      own.set(mention.text, {
        label: mention.text,
        kind: CompletionItemKind.Constant,
        detail: mention.compound.formula,
      });
  return [...own.values(), ...solvents];
}

function afterFigure(before: string): boolean {
  const trimmed = before.trimEnd();
  let end = trimmed.length;
  if (end === before.length) while (end > 0 && /[A-Za-zµ°%]/.test(trimmed[end - 1] ?? "")) end--;
  const figure = trimmed.slice(0, end).trimEnd();
  return /\d$/.test(figure);
}

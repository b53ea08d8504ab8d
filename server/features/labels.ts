/** Names that a note gives itself (labels, stock solutions): where they are defined, used, and how they are renamed. */

import type { Location, Position, Range, WorkspaceEdit } from "vscode-languageserver-protocol";
import type { Mention } from "../../shared-lib/notes/types.ts";
import type { OpenNote } from "../notes.ts";
import { holds, rangeOf } from "../ranges.ts";

/** Mentions that speak of the same compound in the same note, in order; the first one introduces it. */
function sameAs(
  note: OpenNote,
  position: Position,
): { readonly at: Mention; readonly all: readonly Mention[] } | undefined {
  const offset = note.document.offsetAt(position);
  const at = note.analysis.reading.mentions.find((mention) => holds(mention, offset));
  if (!at) return undefined;
  const key = at.compound?.id ?? at.name;
  const all = note.analysis.reading.mentions.filter((mention) => (mention.compound?.id ?? mention.name) === key);
  return { at, all: [...all].sort((a, b) => a.start - b.start) };
}

export function definitionOf(note: OpenNote, position: Position): Location | undefined {
  const first = sameAs(note, position)?.all[0];
  return first ? { uri: note.document.uri, range: rangeOf(note.document, first) } : undefined;
}

export function referencesOf(note: OpenNote, position: Position): Location[] {
  const all = sameAs(note, position)?.all ?? [];
  return all.map((mention) => ({ uri: note.document.uri, range: rangeOf(note.document, mention) }));
}

export function renameRange(note: OpenNote, position: Position): Range | undefined {
  const found = sameAs(note, position);
  return found && isLabel(found.at) ? rangeOf(note.document, found.at) : undefined;
}

export function renameOf(note: OpenNote, position: Position, newName: string): WorkspaceEdit | undefined {
  const found = sameAs(note, position);
  const name = newName.trim();
  if (!found || !isLabel(found.at) || name === "" || /[\r\n*_`<>|]/.test(name)) return undefined;
  const edits = found.all
    .filter((mention) => mention.text === found.at.text)
    .map((mention) => ({ range: rangeOf(note.document, mention), newText: name }));
  return { changes: { [note.document.uri]: edits } };
}

/** A label is a short word of the writer's own ("3a", "S1"): renaming a compound's name would change the chemistry. */
function isLabel(mention: Mention): boolean {
  return mention.text !== mention.name && /^[A-Za-z]{0,3}\d{1,3}[a-z]?'?$/.test(mention.text);
}

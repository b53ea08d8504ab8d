/** Corrections of findings, and the way to silence one. */

import {
  type CodeAction,
  CodeActionKind,
  type CodeActionParams,
  type Diagnostic,
} from "vscode-languageserver-protocol";
import { ledgerActions } from "../../shared-lib/advice/ledger/in-note.ts";
import type { Finding } from "../../shared-lib/advice/types.ts";
import type { Lexicon } from "../../shared-lib/compounds/lexicon.ts";
import type { TextEdit as OffsetEdit } from "../../shared-lib/model/contract.ts";
import { formatOf, type OpenNote } from "../notes.ts";
import { overlaps, rangeOf, spanOf } from "../ranges.ts";
import { diagnosticsOf } from "./diagnostics.ts";

/** Puts the ledger of a step into the note, or renews it. */
export const LEDGER = `${CodeActionKind.RefactorRewrite}.oxomargin.ledger`;

/** Every correction that needs no judgement, of the whole note. */
export const FIX_ALL = `${CodeActionKind.SourceFixAll}.oxomargin`;

interface CodeActionOptions {
  readonly pages: boolean;
  readonly lexicon: Lexicon;
}

export function codeActionsOf(note: OpenNote, params: CodeActionParams, options: CodeActionOptions): CodeAction[] {
  const wants = (kind: string): boolean =>
    params.context.only === undefined ||
    params.context.only.some((only) => kind === only || kind.startsWith(`${only}.`));
  const actions: CodeAction[] = [];
  if (wants(CodeActionKind.QuickFix)) actions.push(...quickFixes(note, params, options));
  if (wants(LEDGER)) actions.push(...ledgers(note, params, options.lexicon));
  if (params.context.only !== undefined && wants(FIX_ALL)) actions.push(...fixAll(note));
  return actions;
}

function quickFixes(note: OpenNote, params: CodeActionParams, options: { readonly pages: boolean }): CodeAction[] {
  const span = spanOf(note.document, params.range);
  const diagnostics = diagnosticsOf(note, options);
  const here = note.analysis.findings.flatMap((finding, index) =>
    overlaps(finding, span) ? [{ finding, diagnostic: diagnostics[index] as Diagnostic }] : [],
  );
  here.sort((a, b) => (a.diagnostic.severity ?? 0) - (b.diagnostic.severity ?? 0));
  const fixes = here.flatMap(({ finding, diagnostic }) =>
    finding.fixes.map((fix, rank) => ({
      title: fix.title,
      kind: CodeActionKind.QuickFix,
      diagnostics: [diagnostic],
      ...(fix.safe && rank === 0 ? { isPreferred: true } : {}),
      edit: { changes: { [note.document.uri]: editsOf(note, fix.edits) } },
    })),
  );
  const silences = here.map(({ finding, diagnostic }) => {
    const { title, edit } = silencing(note, finding);
    const changes = { [note.document.uri]: editsOf(note, [edit]) };
    return { title, kind: CodeActionKind.QuickFix, diagnostics: [diagnostic], edit: { changes } };
  });
  return [...fixes, ...silences];
}

function ledgers(note: OpenNote, params: CodeActionParams, lexicon: Lexicon): CodeAction[] {
  const { reading, charges, moments } = note.analysis;
  const text = note.document.getText();
  const input = { text, reading, timeline: { charges, moments }, moments, settings: note.settings.analysis, lexicon };
  return ledgerActions(input, note.document.offsetAt(params.range.start)).map((fix) => ({
    title: fix.title,
    kind: LEDGER,
    edit: { changes: { [note.document.uri]: editsOf(note, fix.edits) } },
  }));
}

function editsOf(note: OpenNote, edits: readonly OffsetEdit[]) {
  return edits.map((edit) => ({ range: rangeOf(note.document, edit), newText: edit.text }));
}

/**
 * A directive that silences a finding: on a line of its own before a paragraph (it governs the next line), else at the end of the note
 * for the whole of it: inside a list or a table a line of its own would break them.
 */
function silencing(note: OpenNote, finding: Finding): { readonly title: string; readonly edit: OffsetEdit } {
  const text = note.document.getText();
  const newLine = text.includes("\r\n") ? "\r\n" : "\n";
  const plain = formatOf(note.document) === "plain";
  const directive = (word: string): string => {
    const words = `oxomargin: ${word} ${finding.code}`;
    return plain ? words : `<!-- ${words} -->`;
  };
  const { line } = note.document.positionAt(finding.start);
  const start = note.document.offsetAt({ line, character: 0 });
  const before = text.slice(line === 0 ? 0 : note.document.offsetAt({ line: line - 1, character: 0 }), start);
  const opensBlock = before.trim() === "" && !"|-*+>".includes(text[start] ?? "");
  const here = { start, end: start, text: `${directive("silence")}${newLine}` };
  const lead = text === "" || text.endsWith("\n") ? newLine : newLine + newLine;
  const whole = { start: text.length, end: text.length, text: `${lead}${directive("silence-file")}${newLine}` };
  return opensBlock
    ? { title: `Silence “${finding.code}” here`, edit: here }
    : { title: `Silence “${finding.code}” in this note`, edit: whole };
}

/** Safe corrections of the whole note that do not touch each other. */
function fixAll(note: OpenNote): CodeAction[] {
  const taken: OffsetEdit[] = [];
  for (const finding of note.analysis.findings) {
    const fix = finding.fixes.find((candidate) => candidate.safe);
    if (fix && !fix.edits.some((edit) => taken.some((other) => overlaps(edit, other)))) taken.push(...fix.edits);
  }
  if (taken.length === 0) return [];
  const changes = { [note.document.uri]: editsOf(note, taken) };
  return [{ title: "Apply every correction that needs no judgement", kind: FIX_ALL, edit: { changes } }];
}

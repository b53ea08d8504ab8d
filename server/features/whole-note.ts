/** What is asked of a whole note: its estimates as a list, its findings for a folder check, its labels for the preview, its state. */

import { TextDocument } from "vscode-languageserver-textdocument";
import type { Analysis } from "../../shared-lib/analyze.ts";
import { cardOfMention } from "../../shared-lib/report/card/card.ts";
import type { OpenNote } from "../notes.ts";
import type { CheckReply, ListedEstimate, MarginLabel, NoteState } from "../protocol.ts";

/** Every carbonyl charge that a card can be made of, in the order of the text. */
export function listOf(note: OpenNote): ListedEstimate[] {
  const { mentions } = note.analysis.reading;
  return mentions
    .map((mention, index) => ({ mention, card: mention.carbonyl ? cardOfMention(note.analysis, index) : undefined }))
    .filter(({ card }) => card !== undefined)
    .sort((a, b) => a.mention.start - b.mention.start)
    .map(({ mention, card }) => ({
      ...note.document.positionAt(mention.start),
      name: mention.text,
      answer: card?.answer ?? "",
      conditions: card?.conditions ?? "",
    }));
}

export function checkOf(text: string, analysis: Analysis): CheckReply {
  const document = TextDocument.create("note:", "markdown", 1, text);
  return {
    findings: analysis.findings.map((finding) => ({
      code: finding.code,
      severity: finding.severity,
      message: finding.message,
      ...document.positionAt(finding.start),
    })),
    carbonyls: analysis.charges.filter((charge) => charge.compound.carbonyl).length,
  };
}

export function marginOf(text: string, analysis: Analysis): MarginLabel[] {
  const document = TextDocument.create("note:", "markdown", 1, text);
  return analysis.hints.flatMap((hint) => {
    const mention = analysis.reading.mentions[hint.mention];
    const card = cardOfMention(analysis, hint.mention);
    if (!mention) return [];
    const tip = card ? [card.answer, card.conditions, ...card.meaning].join("\n") : hint.label;
    return [{ line: document.positionAt(mention.start).line, words: mention.text, label: hint.label, tip }];
  });
}

export function stateOf(uri: string, note: OpenNote | undefined): NoteState {
  if (!note) return { uri, state: "too long", findings: 0, carbonyls: 0 };
  const { carbonyls, findings } = checkOf(note.document.getText(), note.analysis);
  const state = carbonyls > 0 || findings.length > 0 ? "assessed" : "nothing to assess";
  return { uri, state, findings: findings.length, carbonyls };
}

/** Marks each carbonyl of the note as free, bound or unknown. */

import { SemanticTokensBuilder } from "vscode-languageserver";
import type { SemanticTokens, SemanticTokensLegend } from "vscode-languageserver-protocol";
import { formsAt, momentOf } from "../../shared-lib/report/card/card.ts";
import type { OpenNote } from "../notes.ts";
import { positionOf } from "../ranges.ts";

export const LEGEND: SemanticTokensLegend = { tokenTypes: ["carbonyl"], tokenModifiers: ["free", "bound", "unknown"] };

export function semanticTokensOf(note: OpenNote): SemanticTokens {
  const builder = new SemanticTokensBuilder();
  const { mentions } = note.analysis.reading;
  const ordered = mentions
    .map((mention, index) => ({ mention, index }))
    .filter(({ mention }) => mention.carbonyl && mention.role === "reagent")
    .sort((a, b) => a.mention.start - b.mention.start);
  let last = -1;
  for (const { mention, index } of ordered) {
    const modifier = modifierOf(note, index);
    const start = positionOf(note.document, mention.start);
    const sameLine = positionOf(note.document, mention.end).line === start.line;
    if (modifier === undefined || !sameLine || mention.start < last) continue;
    builder.push(start.line, start.character, mention.end - mention.start, 0, 1 << modifier);
    last = mention.end;
  }
  return builder.build();
}

/** Index into the legend's modifiers; undefined for a mention that no vessel holds. */
function modifierOf(note: OpenNote, mention: number): number | undefined {
  const index = momentOf(note.analysis, mention);
  const moment = index === undefined ? undefined : note.analysis.moments[index];
  const forms = moment && formsAt(moment, mention);
  if (!forms) return undefined;
  if (forms.outside !== undefined) return 2;
  return 1 - forms.free.value >= note.settings.analysis.boundShare ? 1 : 0;
}

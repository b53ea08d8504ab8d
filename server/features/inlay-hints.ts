/** The margin's short labels. */

import { type InlayHint, InlayHintKind, type Range } from "vscode-languageserver-protocol";
import { cardOfMention } from "../../shared-lib/report/card/card.ts";
import { cardMarkdown } from "../../shared-lib/report/card/card-markdown.ts";
import type { OpenNote } from "../notes.ts";
import { positionOf, spanOf } from "../ranges.ts";

const LONGEST_LABEL = 24;
/** The editor cuts the hints of one line at 43 characters: two labels fit. */
const MOST_A_LINE = 2;

/** What a hint carries so that its tooltip can be made when it is looked at. */
export interface HintData {
  readonly uri: string;
  readonly mention: number;
}

export function inlayHintsOf(note: OpenNote, range: Range): InlayHint[] {
  const span = spanOf(note.document, range);
  const perLine = new Map<number, number>();
  const shown: InlayHint[] = [];
  for (const hint of note.analysis.hints) {
    if (hint.offset < span.start || hint.offset > span.end) continue;
    const position = positionOf(note.document, hint.offset);
    const count = (perLine.get(position.line) ?? 0) + 1;
    if (count > MOST_A_LINE) continue;
    perLine.set(position.line, count);
    const data: HintData = { uri: note.document.uri, mention: hint.mention };
    shown.push({ position, label: shortened(hint.label), kind: InlayHintKind.Type, paddingLeft: true, data });
  }
  return shown;
}

function shortened(label: string): string {
  return label.length <= LONGEST_LABEL ? label : `${label.slice(0, LONGEST_LABEL - 1)}…`;
}

export function resolveInlayHint(hint: InlayHint, note: OpenNote | undefined): InlayHint {
  const data = hint.data as HintData | undefined;
  const card = note && data ? cardOfMention(note.analysis, data.mention) : undefined;
  return card ? { ...hint, tooltip: { kind: "markdown", value: cardMarkdown(card) } } : hint;
}

/** The card of what the pointer rests on. */

import type { Hover, Position } from "vscode-languageserver-protocol";
import { cardOfMention } from "../../shared-lib/report/card/card.ts";
import { type CardOptions, cardMarkdown } from "../../shared-lib/report/card/card-markdown.ts";
import { cardText } from "../../shared-lib/report/card/card-text.ts";
import type { OpenNote } from "../notes.ts";
import { holds, rangeOf } from "../ranges.ts";

export interface HoverOptions extends CardOptions {
  readonly markdown: boolean;
  readonly findingsElsewhere: boolean;
}

/** The mention at an offset that a card can be made of: the mention itself, else the charge around it. */
export function carbonylMentionAt(note: OpenNote, offset: number): number | undefined {
  const { mentions, charges } = note.analysis.reading;
  const direct = mentions.findIndex((mention) => mention.carbonyl && holds(mention, offset));
  if (direct >= 0) return direct;
  return charges.find((charge) => holds(charge.span, offset) && mentions[charge.mention]?.carbonyl)?.mention;
}

export function hoverOf(note: OpenNote, position: Position, options: HoverOptions): Hover | undefined {
  const index = carbonylMentionAt(note, note.document.offsetAt(position));
  const mention = index === undefined ? undefined : note.analysis.reading.mentions[index];
  const card =
    index === undefined
      ? undefined
      : cardOfMention(note.analysis, index, { findingsElsewhere: options.findingsElsewhere });
  if (!mention || !card) return undefined;
  const value = options.markdown ? cardMarkdown(card, options) : cardText(card);
  return {
    contents: { kind: options.markdown ? "markdown" : "plaintext", value },
    range: rangeOf(note.document, mention),
  };
}

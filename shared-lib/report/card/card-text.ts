/** A card as plain text, for an editor that shows no Markdown. */

import type { DerivationLine } from "../../model/contract.ts";
import type { Card } from "./card.ts";
import { percent, percentRange } from "./share-words.ts";

/** The same content as the Markdown card, without drawings. */
export function cardText(card: Card): string {
  const forms = [...card.forms]
    .sort((a, b) => b.fraction.value - a.fraction.value)
    .map((form) => `  ${form.label}: ${percent(form.fraction.value)} (${percentRange(form.fraction)})`);
  return [
    `${card.name}: ${card.answer}`,
    card.conditions,
    ...card.meaning,
    ...card.reasons.map((line) => `- ${lineText(line)}`),
    ...(forms.length > 0 ? ["", "Forms", ...forms] : []),
    ...(card.derivation.length > 0
      ? ["", "How it was reached", ...card.derivation.map((line, n) => `${n + 1}. ${lineText(line)}`)]
      : []),
    ...card.cautions.map((caution) => `Mind: ${caution}`),
  ].join("\n");
}

function lineText(line: DerivationLine): string {
  const value = line.value === undefined ? "" : `: ${line.value}`;
  return `${line.says}${value}${line.source === undefined ? "" : ` (${line.source})`}`;
}

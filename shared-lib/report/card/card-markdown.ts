/** A card as Markdown: twelve lines hold the answer, then the forms with drawings and the whole derivation. */

import type { DerivationLine, FormShare } from "../../model/contract.ts";
import type { Card } from "./card.ts";
import { escapeMarkdown as plain } from "./escape-markdown.ts";
import { percent, percentRange, shareBar } from "./share-words.ts";

export interface CardOptions {
  /** Address of a drawing that holds all of itself (a data URI), nothing to fetch; absent for a reader that shows no images. */
  readonly image?: (smiles: string, width: number, height: number) => string | undefined;
  /** Markdown links to actions, already safe. */
  readonly actions?: readonly string[];
}

const MOST_FORMS = 6;
const LEAST_LISTED = 0.001;
const LEAST_DRAWN = 0.005;
const DRAWING = { width: 132, height: 84 };

/** The card, ready for a hover. Everything that came from a note or a table is escaped. */
export function cardMarkdown(card: Card, options: CardOptions = {}): string {
  const top = [
    `**${plain(card.name)}**: ${plain(card.answer)}  `,
    plain(card.conditions),
    "",
    ...card.meaning.map(plain),
    ...(card.reasons.length > 0 ? ["", ...card.reasons.map((line) => `- ${lineMarkdown(line)}`)] : []),
  ];
  const parts = [top.join("\n")];
  if (options.actions && options.actions.length > 0) parts.push(options.actions.join(" · "));
  if (card.forms.length > 0) parts.push(formsTable(card.forms, options));
  if (card.derivation.length > 0)
    parts.push(
      `---\n\nHow it was reached\n\n${card.derivation.map((line, n) => `${n + 1}. ${lineMarkdown(line)}`).join("\n")}`,
    );
  if (card.cautions.length > 0) parts.push(card.cautions.map((caution) => `*${plain(caution)}*`).join("\n\n"));
  return parts.join("\n\n");
}

function lineMarkdown(line: DerivationLine): string {
  const value = line.value === undefined ? "" : `: **${plain(line.value)}**`;
  const source = line.source === undefined ? "" : ` (${plain(line.source)})`;
  return `${plain(line.says)}${value}${source}`;
}

/** Largest first; a form that cannot reach a thousandth is left out. */
function formsWorthShowing(forms: readonly FormShare[]): readonly FormShare[] {
  const sorted = [...forms].sort((a, b) => b.fraction.value - a.fraction.value);
  return sorted.filter((form, rank) => rank < 2 || form.fraction.high >= LEAST_LISTED).slice(0, MOST_FORMS);
}

function formsTable(forms: readonly FormShare[], options: CardOptions): string {
  const shown = formsWorthShowing(forms);
  const drawings = shown.map((form) => drawing(form, options));
  const drawn = drawings.some((text) => text !== "");
  const head = drawn
    ? ["| Form | Structure | Share | 95 % range |", "| :-- | :-: | :-- | :-- |"]
    : ["| Form | Share | 95 % range |", "| :-- | :-- | :-- |"];
  const rows = shown.map((form, index) => {
    const structure = drawn ? ` ${drawings[index]} |` : "";
    return `| ${plain(form.label)} |${structure} ${percent(form.fraction.value)} ${shareBar(form.fraction.value)} | ${percentRange(form.fraction)} |`;
  });
  return [...head, ...rows].join("\n");
}

function drawing(form: FormShare, options: CardOptions): string {
  if (!options.image || form.smiles === undefined || form.fraction.value < LEAST_DRAWN) return "";
  const address = options.image(form.smiles, DRAWING.width, DRAWING.height);
  return address === undefined ? "" : `![${plain(form.label)}](${address})`;
}

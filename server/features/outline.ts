/** Steps and charges as the note's outline, as folds and as growing selections. */

import {
  type DocumentSymbol,
  type FoldingRange,
  type Position,
  type SelectionRange,
  SymbolKind,
} from "vscode-languageserver-protocol";
import type { Span } from "../../shared-lib/model/span.ts";
import type { OpenNote } from "../notes.ts";
import { holds, rangeOf } from "../ranges.ts";

export function symbolsOf(note: OpenNote): DocumentSymbol[] {
  const { reading } = note.analysis;
  return reading.steps.map((step) => {
    const range = rangeOf(note.document, step);
    const children = reading.charges
      .filter((charge) => charge.step === step.number && inside(charge.span, step))
      .map((charge) => chargeSymbol(note, charge));
    const name = step.title?.trim() || `Step ${step.number}`;
    return {
      name,
      kind: SymbolKind.Namespace,
      range,
      selectionRange: { start: range.start, end: range.start },
      children,
    };
  });
}

function chargeSymbol(note: OpenNote, charge: OpenNote["analysis"]["reading"]["charges"][number]): DocumentSymbol {
  const mention = note.analysis.reading.mentions[charge.mention];
  const range = rangeOf(note.document, charge.span);
  return {
    name: mention?.name || mention?.text || "charge",
    detail: charge.amounts.map((amount) => amount.text).join(", "),
    kind: SymbolKind.Variable,
    range,
    selectionRange: mention && inside(mention, charge.span) ? rangeOf(note.document, mention) : range,
  };
}

export function foldsOf(note: OpenNote): FoldingRange[] {
  return note.analysis.reading.steps.flatMap((step) => {
    const { start, end } = rangeOf(note.document, step);
    const endLine = end.character === 0 && end.line > start.line ? end.line - 1 : end.line;
    return endLine > start.line ? [{ startLine: start.line, endLine }] : [];
  });
}

/** From the amount to the mention, its charge, its step and the whole note. */
export function selectionsOf(note: OpenNote, positions: readonly Position[]): SelectionRange[] {
  const { reading } = note.analysis;
  const whole: Span = { start: 0, end: note.document.getText().length };
  return positions.map((position) => {
    const offset = note.document.offsetAt(position);
    const spans = [
      whole,
      ...reading.steps,
      ...reading.charges.map((charge) => charge.span),
      ...reading.charges.flatMap((charge) => charge.amounts),
      ...reading.mentions,
    ].filter((span) => holds(span, offset));
    return nested(note, spans, offset);
  });
}

/** Spans from the widest inwards, each within the one before. */
function nested(note: OpenNote, spans: readonly Span[], offset: number): SelectionRange {
  const chain = [...spans].sort((a, b) => b.end - b.start - (a.end - a.start));
  let outer: SelectionRange | undefined;
  let last: Span | undefined;
  for (const span of chain) {
    if (last && (!inside(span, last) || (span.start === last.start && span.end === last.end))) continue;
    outer = { range: rangeOf(note.document, span), ...(outer ? { parent: outer } : {}) };
    last = span;
  }
  return outer ?? { range: rangeOf(note.document, { start: offset, end: offset }) };
}

function inside(inner: Span, outer: Span): boolean {
  return outer.start <= inner.start && inner.end <= outer.end;
}

/** The ledger inside a note: where it stands, how it is put in and renewed. The notes stage passes over it. */

import type { TextEdit } from "../../model/contract.ts";
import type { Span } from "../../model/span.ts";
import { contextOf } from "../context.ts";
import type { AdviceContext, AdviceInput, SafeFix, StepView } from "../types.ts";
import { ledgerOf } from "./build.ts";
import { ledgerMarkdown } from "./write.ts";

const OPENING = "<!-- oxomargin ledger -->";
const CLOSING = "<!-- /oxomargin ledger -->";

/** Ledgers that stand in a text, in order, markers included. */
export function ledgersIn(text: string): readonly Span[] {
  const spans: Span[] = [];
  let at = text.indexOf(OPENING);
  while (at >= 0) {
    const close = text.indexOf(CLOSING, at);
    if (close < 0) break;
    spans.push({ start: at, end: close + CLOSING.length });
    at = text.indexOf(OPENING, close);
  }
  return spans;
}

/** A ledger belongs to the last step that begins before it. */
function stepBefore(context: AdviceContext, at: number): StepView | undefined {
  const step = context.reading.steps.findLast((row) => row.start < at);
  return context.steps.find((view) => view.number === step?.number);
}

function ledgerText(context: AdviceContext, step: StepView): string {
  const lineBreak = context.text.includes("\r\n") ? "\r\n" : "\n";
  const body = `${OPENING}\n\n${ledgerMarkdown(ledgerOf(context, step))}\n\n${CLOSING}`;
  return body.replaceAll("\n", lineBreak);
}

/** The edit that renews a ledger; undefined when it is up to date, or no step stands before it. */
export function renewal(context: AdviceContext, ledger: Span): TextEdit | undefined {
  const step = stepBefore(context, ledger.start);
  if (!step) return undefined;
  const now = ledgerText(context, step);
  return now === context.text.slice(ledger.start, ledger.end) ? undefined : { ...ledger, text: now };
}

/**
 * What can be done about the ledger at a place of a note: put one behind its step, or renew the one that is there.
 *
 * @param offset anywhere in the step
 */
export function ledgerActions(input: AdviceInput, offset: number): readonly SafeFix[] {
  const context = contextOf(input);
  const step = context.reading.steps.find((row) => offset >= row.start && offset <= row.end);
  const view = context.steps.find(({ number }) => number === step?.number);
  if (!step || !view || view.charges.length === 0) return [];
  const standing = ledgersIn(context.text).find((span) => stepBefore(context, span.start) === view);
  if (standing) {
    const edit = renewal(context, standing);
    return edit ? [{ title: "Renew the ledger of this step", edits: [edit], safe: true }] : [];
  }
  const at = endOfText(context.text, step);
  const lineBreak = context.text.includes("\r\n") ? "\r\n" : "\n";
  const text = `${lineBreak}${lineBreak}${ledgerText(context, view)}`;
  return [{ title: "Insert the ledger of this step", edits: [{ start: at, end: at, text }], safe: false }];
}

/** End of the last line of a step that is not blank. */
function endOfText(text: string, step: Span): number {
  const trimmed = text.slice(step.start, step.end).trimEnd();
  const end = step.start + trimmed.length;
  const line = text.indexOf("\n", end);
  const stop = line < 0 ? text.length : line;
  return text[stop - 1] === "\r" ? stop - 1 : stop;
}

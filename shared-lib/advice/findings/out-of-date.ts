/** What the program once wrote into the note does not hold any more. */

import { besideEdit, wordsBeside, writtenBeside } from "../fixes/beside.ts";
import { ledgersIn, renewal } from "../ledger/in-note.ts";
import type { AdviceContext, FindingRule, RawFinding } from "../types.ts";

/** Figures within this share of each other count as the same: rounding alone would otherwise speak. */
const SAME = 0.05;

function staleBeside(context: AdviceContext): readonly RawFinding[] {
  return context.carbonyls.flatMap((view) => {
    const beside = writtenBeside(context.text, view);
    if (!beside || view.forms.forms.length === 0 || sameFigures(beside.words, wordsBeside(view))) return [];
    const message = "The forms written beside this charge are out of date.";
    const fixes = [{ title: "Renew the forms beside the charge", edits: [besideEdit(context.text, view)], safe: true }];
    return [{ start: beside.start + 1, end: beside.end, mention: view.charge.mention, message, fixes }];
  });
}

/** The same words, and figures that differ by no more than rounding. */
function sameFigures(a: string, b: string): boolean {
  const left = a.split(" ");
  const right = b.split(" ");
  if (left.length !== right.length) return false;
  return left.every((word, i) => {
    const other = right[i] ?? "";
    if (word === other) return true;
    const [x, y] = [Number(word), Number(other)];
    return Number.isFinite(x) && Number.isFinite(y) && Math.abs(x - y) <= SAME * Math.max(Math.abs(x), Math.abs(y));
  });
}

function staleLedgers(context: AdviceContext): readonly RawFinding[] {
  return ledgersIn(context.text).flatMap((span) => {
    const edit = renewal(context, span);
    if (!edit) return [];
    const fixes = [{ title: "Renew the ledger of this step", edits: [edit], safe: true }];
    return [{ start: span.start, end: span.start + 4, message: "This ledger is out of date.", fixes }];
  });
}

export const outOfDate: FindingRule = {
  code: "ledger/out-of-date",
  severity: "note",
  title: "A ledger or a correction in the note does not fit the charges any more",
  page: `**Looks for** a ledger, or forms written beside a charge, that this program once put into the note, and that would read otherwise now.

**Keeps silent** when words are the same and figures differ by less than 5 %; a ledger is compared word for word.

**Corrections.** Renew it (needs no judgement: only text that the program wrote is replaced).

**Sources.** None needed.`,
  look: (context) => [...staleBeside(context), ...staleLedgers(context)],
};

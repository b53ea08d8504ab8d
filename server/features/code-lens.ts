/** One line above each step: what limits it, how much water it holds, what is free. Off by default. */

import type { CodeLens } from "vscode-languageserver-protocol";
import { solventByKey } from "../../shared-lib/media/solvents.ts";
import { percent } from "../../shared-lib/report/card/share-words.ts";
import type { OpenNote } from "../notes.ts";
import { rangeOf } from "../ranges.ts";

export function codeLensesOf(note: OpenNote, options: { readonly command?: string }): CodeLens[] {
  return note.analysis.reading.steps.flatMap((step) => {
    const says = stepLine(note, step.number);
    if (says === undefined) return [];
    const { start } = rangeOf(note.document, step);
    const command = { title: says, command: options.command ?? "", arguments: [note.document.uri, start.line] };
    return [{ range: { start, end: start }, command }];
  });
}

function stepLine(note: OpenNote, step: number): string | undefined {
  const { analysis } = note;
  const charges = analysis.charges.filter((charge) => charge.step === step && charge.total !== undefined);
  const last = analysis.moments.findLast((moment) => moment.step === step && moment.carbonylMentions.length > 0);
  if (!last) return undefined;
  const counted = charges.filter((charge) => charge.compound.solvent === undefined && (charge.total?.value ?? 0) > 0);
  const least = counted.reduce<(typeof counted)[number] | undefined>(
    (best, charge) => (!best || (charge.total?.value ?? 0) < (best.total?.value ?? 0) ? charge : best),
    undefined,
  );
  const parts: string[] = [];
  if (least?.total) parts.push(`least charged: ${least.compound.name}, ${millimoles(least.total.value)}`);
  const water = last.contents.solvents.filter((row) => solventByKey(row.solvent)?.nucleophile === "water");
  const amount = water.reduce((sum, row) => sum + row.amount, 0);
  if (amount > 0) parts.push(`water ${millimoles(amount)}`);
  last.carbonylMentions.forEach((mention, row) => {
    const forms = last.speciation.carbonyls[row];
    const name = analysis.reading.mentions[mention]?.name;
    if (forms && forms.outside === undefined && name) parts.push(`${name} ${percent(forms.free.value)} free`);
  });
  return parts.length > 0 ? parts.join(" · ") : undefined;
}

function millimoles(mol: number): string {
  const figure = mol >= 1 ? mol : mol * 1000;
  return `${Number(figure.toPrecision(3))} ${mol >= 1 ? "mol" : "mmol"}`;
}

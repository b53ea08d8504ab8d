/**
 * The correction beside a charge: ` [in flask: 54 % hydrate, 4.6 mmol free]`.
 * The notes stage passes over it; its presence says that the writer knows.
 */

import type { TextEdit } from "../../model/contract.ts";
import type { Span } from "../../model/span.ts";
import { amountText, percent } from "../figures.ts";
import type { CarbonylView } from "../types.ts";

const OPENING = " [in flask: ";

export interface WrittenBeside extends Span {
  readonly words: string;
}

/** Where something is written beside a charge: behind its closing bracket; in a table, inside the cell of its name. */
function placeBeside(text: string, view: Pick<CarbonylView, "written" | "mention">): number {
  const { span } = view.written;
  const lineStart = text.lastIndexOf("\n", span.start - 1) + 1;
  if (text.slice(lineStart, span.start).trimStart().startsWith("|")) return view.mention.end;
  let open = 0;
  for (let i = span.start; i < span.end; i += 1) {
    if (text[i] === "(") open += 1;
    else if (text[i] === ")" && open > 0) open -= 1;
  }
  let at = span.end;
  for (let i = span.end; open > 0 && i < text.length && text[i] !== "\n" && i < span.end + 200; i += 1) {
    if (text[i] === "(") open += 1;
    if (text[i] !== ")") continue;
    open -= 1;
    if (open === 0) at = i + 1;
  }
  return at;
}

/** What already stands beside a charge. */
export function writtenBeside(
  text: string,
  view: Pick<CarbonylView, "written" | "mention">,
): WrittenBeside | undefined {
  const start = placeBeside(text, view);
  if (!text.startsWith(OPENING, start)) return undefined;
  const close = text.indexOf("]", start);
  const line = text.indexOf("\n", start);
  if (close < 0 || (line >= 0 && line < close)) return undefined;
  return { start, end: close + 1, words: text.slice(start + OPENING.length, close) };
}

/** The bound forms of a charge, largest first, and what is free. */
export function wordsBeside(view: CarbonylView, factor = 1): string {
  const shares = new Map<string, number>();
  for (const { kind, fraction } of view.forms.forms) shares.set(kind, (shares.get(kind) ?? 0) + fraction.value);
  const bound = [...shares]
    .filter(([kind, share]) => kind !== "free carbonyl" && share >= 0.01)
    .toSorted(([, a], [, b]) => b - a)
    .slice(0, 2)
    .map(([kind, share]) => `${percent(share)} ${kind}`);
  const total = view.charge.total;
  const free = total
    ? `${amountText(total.value * factor * view.forms.free.value)} free`
    : `${percent(view.forms.free.value)} free`;
  return [...bound, free].join(", ");
}

/** The edit that writes or renews the correction beside a charge. */
export function besideEdit(text: string, view: CarbonylView, factor = 1): TextEdit {
  const old = writtenBeside(text, view);
  const words = `${OPENING}${wordsBeside(view, factor)}]`;
  if (old) return { start: old.start, end: old.end, text: words };
  const at = placeBeside(text, view);
  return { start: at, end: at, text: words };
}

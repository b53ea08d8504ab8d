/** What the panel's page and the extension say to each other; what comes from the page is checked before use. */

import type { CurveAxis, Curves } from "../../../server/protocol.ts";

export type ToPanel = { readonly kind: "curves"; readonly curves: Curves } | { readonly kind: "nothing" };

type Changed = Partial<Readonly<Record<CurveAxis, number>>>;

export type FromPanel = { readonly changed: Changed };

export type Heard =
  | { readonly kind: "ready" }
  | { readonly kind: "ask"; readonly axis: CurveAxis; readonly changed: Changed }
  | { readonly kind: "go"; readonly line: number }
  | { readonly kind: "save"; readonly name: string; readonly data: Uint8Array };

export const PANEL_AXES: readonly CurveAxis[] = ["water", "pH", "temperature", "concentration", "time"];

const FILES = ["forms.svg", "forms.png", "forms.csv"];
const LARGEST_FILE = 20_000_000;

/** The message, or undefined for anything that the page would not say. */
export function readFromPanel(message: unknown): Heard | undefined {
  if (typeof message !== "object" || message === null) return undefined;
  const given = message as Readonly<Record<string, unknown>>;
  if (given.kind === "ready") return { kind: "ready" };
  if (given.kind === "go" && Number.isSafeInteger(given.line))
    return { kind: "go", line: Math.max(0, given.line as number) };
  if (given.kind === "ask") {
    const axis = PANEL_AXES.find((known) => known === given.axis);
    return axis ? { kind: "ask", axis, changed: figuresOf(given.changed) } : undefined;
  }
  if (given.kind === "save") {
    const name = FILES.find((known) => known === given.name);
    const data = given.data instanceof Uint8Array ? given.data : undefined;
    return name && data && data.length <= LARGEST_FILE ? { kind: "save", name, data } : undefined;
  }
  return undefined;
}

function figuresOf(given: unknown): Changed {
  if (typeof given !== "object" || given === null) return {};
  const figures: [CurveAxis, number][] = [];
  for (const axis of PANEL_AXES) {
    const value = (given as Readonly<Record<string, unknown>>)[axis];
    if (typeof value === "number" && Number.isFinite(value)) figures.push([axis, value]);
  }
  return Object.fromEntries(figures);
}

/** What the server and our own editor client say to each other beyond the language server protocol. Plain shapes, no code. */

import type { Estimate } from "../shared-lib/model/contract.ts";

/** What our client sends at the start; another editor may send any part of it. */
export interface StartOptions {
  /** Settings for a client that answers no configuration requests. */
  readonly settings?: unknown;
  /** The client shows images in hovers. */
  readonly images?: boolean;
  /** The client runs the commands that cards and lenses link to. */
  readonly commandLinks?: boolean;
  /** The client opens `oxomargin:` addresses (pages of findings). */
  readonly pages?: boolean;
  readonly theme?: Theme;
  /** Browser only: address of the module that holds the structure toolkit. */
  readonly structuresModule?: string;
}

export type Theme = "light" | "dark" | "high contrast dark" | "high contrast light";

export const METHODS = {
  /** Request: an estimate for what the palette asked. */
  estimate: "oxomargin/estimate",
  /** Request: one note of a folder check. */
  checkText: "oxomargin/checkText",
  /** Request: what the margin says of a text, for the Markdown preview. */
  margin: "oxomargin/margin",
  /** Request: the page of a finding. */
  page: "oxomargin/page",
  /** Request: the card at a place as Markdown, for the clipboard. */
  card: "oxomargin/card",
  /** Request: curves of the forms for the panel. */
  curves: "oxomargin/curves",
  /** Request: every estimate of a note as a list. */
  list: "oxomargin/list",
  /** Request: the report of a set of notes. */
  report: "oxomargin/report",
  /** Notification, server to client: state of a note. */
  state: "oxomargin/state",
  /** Notification, client to server. */
  theme: "oxomargin/theme",
} as const;

export interface EstimateRequest {
  /** SMILES, name or CAS number. */
  readonly what: string;
  /** As written in a note; water when absent. */
  readonly medium?: string;
  /** °C, with or without the unit; 25 when absent. */
  readonly temperature?: string;
  readonly pH?: string;
  /** mol/L */
  readonly concentration?: string;
}

export type EstimateReply =
  | { readonly ok: true; readonly estimate: Estimate; readonly card: string; readonly text: string }
  | { readonly ok: false; readonly field: keyof EstimateRequest; readonly problem: string };

export interface NoteText {
  /** File name; its ending says Markdown or plain text. */
  readonly name: string;
  readonly text: string;
}

export interface ReportRequest {
  readonly notes: readonly NoteText[];
  readonly format: "html" | "markdown";
}

export interface FoundInNote {
  readonly code: string;
  readonly severity: "hint" | "note" | "warning";
  readonly message: string;
  readonly line: number;
  readonly character: number;
}

export interface CheckReply {
  readonly findings: readonly FoundInNote[];
  readonly carbonyls: number;
}

/** One label of the margin, by the line and the words it stands behind. */
export interface MarginLabel {
  readonly line: number;
  readonly words: string;
  readonly label: string;
  readonly tip: string;
}

export interface NoteState {
  readonly uri: string;
  readonly state: "assessed" | "nothing to assess" | "too long";
  readonly findings: number;
  readonly carbonyls: number;
}

export interface ListedEstimate {
  readonly line: number;
  readonly character: number;
  readonly name: string;
  readonly answer: string;
  readonly conditions: string;
}

export type CurveAxis = "water" | "pH" | "temperature" | "concentration" | "time";

export interface CurvesRequest {
  readonly uri: string;
  readonly line: number;
  readonly character: number;
  readonly axis: CurveAxis;
  /** What the sliders say; absent: as in the note. */
  readonly changed?: Partial<Readonly<Record<CurveAxis, number>>>;
}

export interface Curve {
  readonly label: string;
  readonly value: readonly number[];
  readonly low: readonly number[];
  readonly high: readonly number[];
}

export interface Curves {
  readonly title: string;
  readonly axis: CurveAxis;
  readonly axisLabel: string;
  readonly x: readonly number[];
  readonly curves: readonly Curve[];
  /** The note's own point on the axis. */
  readonly here: number;
  /** What holds for the axes that are not drawn. */
  readonly conditions: string;
  /** Present values of every axis that can be moved, with its ends. */
  readonly controls: readonly {
    readonly axis: CurveAxis;
    readonly label: string;
    readonly value: number;
    readonly low: number;
    readonly high: number;
    readonly step: number;
  }[];
  /** The step's vessel through the note's events: one row an event. */
  readonly timeline: readonly { readonly line: number; readonly says: string; readonly free?: number }[];
}

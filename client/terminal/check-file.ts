/** One note from its file to its piece of the report; runs in the main thread and in the threads of the pool alike. */

import type { FileReport, Severity } from "../../shared-lib/model/contract.ts";
import { toFileReport } from "../../shared-lib/report/file-report.ts";
import { type ReportFormat, WRITERS } from "../../shared-lib/report/formats.ts";
import { toNoteReport } from "../../shared-lib/report/note-report.ts";
import { summaryOf } from "../../shared-lib/report/summary.ts";
import { Engine } from "./engine.ts";
import { readText } from "./read-text.ts";
import { cachedPiece, keepPiece, keyOf } from "./result-cache.ts";

export interface CheckTask {
  readonly file: string;
  readonly format: ReportFormat;
  /** Folder of kept results. */
  readonly cache?: string;
}

/** What the report needs of a note: its rendered piece and its counts. */
export interface CheckedPiece {
  readonly piece: string;
  readonly summary: Readonly<Record<string, number>>;
  /** Most severe finding: 0 none, 1 hint, 2 note, 3 warning. */
  readonly worst: number;
}

export type CheckedFile = ({ readonly ok: true } & CheckedPiece) | { readonly ok: false; readonly problem: string };

export const SEVERITY_RANK: Readonly<Record<Severity, number>> = { hint: 1, note: 2, warning: 3 };

function worstOf(report: FileReport): number {
  return report.findings.reduce((worst, { severity }) => Math.max(worst, SEVERITY_RANK[severity]), 0);
}

/** A longer text is no note; its analysis would cost more than it tells. UTF-16 code units. */
const LONGEST_NOTE = 2_000_000;

let engine: Engine | undefined;

/** Why a text is not taken for a note. */
export function tooLong(text: string): string | undefined {
  if (text.length <= LONGEST_NOTE) return undefined;
  return `it has ${text.length} characters, more than the ${LONGEST_NOTE} of the longest note: split it`;
}

/** Analyses a text and renders its piece. */
export async function checkText(text: string, name: string, format: ReportFormat): Promise<CheckedPiece> {
  engine ??= new Engine();
  const analysis = await engine.analyze(text, name);
  const writer = WRITERS[format];
  const report = writer.withSteps ? toNoteReport(name, text, analysis, engine.lexicon) : toFileReport(name, analysis);
  return { piece: writer.note({ report, text }), summary: summaryOf(report), worst: worstOf(report) };
}

/** Reads and checks one file. Never throws: a note that cannot be read, or a fault of ours, is told as its problem. */
export async function checkFile({ file, format, cache }: CheckTask): Promise<CheckedFile> {
  const read = await readText(file);
  if (!read.ok) return read;
  const problem = tooLong(read.text);
  if (problem !== undefined) return { ok: false, problem };
  try {
    const key = cache === undefined ? undefined : keyOf(file, format, read.text);
    const kept = cache !== undefined && key !== undefined ? await cachedPiece(cache, key) : undefined;
    if (kept) return { ok: true, ...kept };
    const made = await checkText(read.text, file, format);
    if (cache !== undefined && key !== undefined) await keepPiece(cache, key, made);
    return { ok: true, ...made };
  } catch (error) {
    return {
      ok: false,
      problem: `a fault of the program (${error instanceof Error ? error.message : "unknown"}); please report it`,
    };
  }
}

/** `oxomargin check`: reads notes and says what is bound and what to change. */

import { readFile } from "node:fs/promises";
import { FINDINGS } from "../../shared-lib/advice/findings/list.ts";
import type { FileReport, Severity } from "../../shared-lib/model/contract.ts";
import { toFileReport } from "../../shared-lib/report/file-report.ts";
import { reportAsHtml } from "../../shared-lib/report/html.ts";
import { reportAsMarkdown } from "../../shared-lib/report/markdown.ts";
import { toSarif } from "../../shared-lib/report/sarif.ts";
import { toCheckReport } from "../../shared-lib/report/summary.ts";
import { fileAsText } from "../../shared-lib/report/text.ts";
import { Engine } from "./engine.ts";
import { findNotes } from "./find-notes.ts";
import { readAll, type Streams } from "./streams.ts";
import { UsageError } from "./usage-error.ts";
import { VERSION } from "./version.ts";

export const CHECK_FORMATS = ["text", "json", "ndjson", "sarif", "markdown", "html"] as const;
export type CheckFormat = (typeof CHECK_FORMATS)[number];
export const FAIL_ON = ["never", "hint", "note", "warning"] as const;

export interface CheckCall {
  readonly paths: readonly string[];
  readonly stdinName?: string;
  readonly format: CheckFormat;
  readonly failOn: (typeof FAIL_ON)[number];
}

const RANK: Readonly<Record<Severity, number>> = { hint: 1, note: 2, warning: 3 };

/** True when a finding stands at or above the severity that fails. */
export function fails(reports: readonly FileReport[], failOn: CheckCall["failOn"]): boolean {
  if (failOn === "never") return false;
  return reports.some((report) => report.findings.some((finding) => RANK[finding.severity] >= RANK[failOn]));
}

interface ReadNoteFile {
  readonly report: FileReport;
  readonly text: string;
}

async function* readNotes(call: CheckCall, engine: Engine, streams: Streams): AsyncGenerator<ReadNoteFile> {
  if (call.stdinName !== undefined) {
    const text = await readAll(streams.input);
    yield { text, report: toFileReport(call.stdinName, await engine.analyze(text, call.stdinName)) };
    return;
  }
  for await (const file of findNotes(call.paths, streams.warn)) {
    let text: string;
    try {
      text = await readFile(file, "utf8");
    } catch (error) {
      streams.warn(`${file}: cannot be read (${(error as NodeJS.ErrnoException).code ?? "unknown"}); left out`);
      continue;
    }
    yield { text, report: toFileReport(file, await engine.analyze(text, file)) };
  }
}

function render(format: CheckFormat, notes: readonly ReadNoteFile[]): string {
  switch (format) {
    case "json":
      return `${JSON.stringify(
        toCheckReport(
          notes.map((note) => note.report),
          VERSION,
        ),
      )}\n`;
    case "sarif":
      return `${JSON.stringify(toSarif(notes, FINDINGS, VERSION))}\n`;
    case "markdown":
      return reportAsMarkdown(notes, VERSION);
    case "html":
      return reportAsHtml(notes, VERSION);
    case "ndjson":
    case "text":
      return "";
  }
}

/** Runs the check. @returns exit status 0 or 1 @throws UsageError for input that cannot be used */
export async function check(call: CheckCall, streams: Streams): Promise<number> {
  if (call.paths.length === 0 && call.stdinName === undefined)
    throw new UsageError("check needs a file or folder, --stdin or --records");
  const engine = new Engine();
  const kept: ReadNoteFile[] = [];
  let failed = false;
  let count = 0;
  for await (const note of readNotes(call, engine, streams)) {
    count++;
    failed ||= fails([note.report], call.failOn);
    if (call.format === "ndjson") await streams.print(`${JSON.stringify(note.report)}\n`);
    else if (call.format === "text") await streams.print(fileAsText(note.report, note.text));
    else kept.push(note);
    streams.progress(`${count} notes`);
  }
  if (count === 0) streams.warn("no notes (.md, .markdown, .txt) were found");
  const whole = render(call.format, kept);
  if (whole !== "") await streams.print(whole);
  return failed ? 1 : 0;
}

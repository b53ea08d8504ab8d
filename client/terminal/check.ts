/** `oxomargin check`: reads notes and says what is bound and what to change. */

import type { Severity } from "../../shared-lib/model/contract.ts";
import { type ReportFormat, WRITERS } from "../../shared-lib/report/formats.ts";
import { addSummary } from "../../shared-lib/report/summary.ts";
import type { ReportWriter } from "../../shared-lib/report/writer.ts";
import { type CheckedPiece, checkText, SEVERITY_RANK, tooLong } from "./check-file.ts";
import { checkFiles, threadsFor } from "./check-files.ts";
import { findNotes } from "./find-notes.ts";
import { timeLeft } from "./progress.ts";
import { textOfBytes } from "./read-text.ts";
import { readAll, type Streams } from "./streams.ts";
import { UsageError } from "./usage-error.ts";
import { TABLES_VERSION, VERSION } from "./version.ts";

export interface CheckCall {
  readonly format: ReportFormat;
  readonly failOn: Severity | "never";
}

export interface CheckPathsCall extends CheckCall {
  readonly paths: readonly string[];
  readonly jobs?: number;
  readonly cache?: string;
  /** Address of the bundle's entry module. */
  readonly entry: string;
}

const VERSIONS = { program: VERSION, tables: TABLES_VERSION };

/** Puts pieces into one report on standard output, and remembers what decides the exit status. */
class ReportOut {
  readonly #writer: ReportWriter;
  readonly #streams: Streams;
  readonly #summary: Record<string, number> = {};
  #written = false;
  worst = 0;

  constructor(format: ReportFormat, streams: Streams) {
    this.#writer = WRITERS[format];
    this.#streams = streams;
  }

  async begin(): Promise<void> {
    await this.#print(this.#writer.begin(VERSIONS));
  }

  async add({ piece, summary, worst }: CheckedPiece): Promise<void> {
    addSummary(this.#summary, summary);
    this.worst = Math.max(this.worst, worst);
    if (piece === "") return;
    await this.#print(this.#written ? `${this.#writer.between}${piece}` : piece);
    this.#written = true;
  }

  async end(): Promise<void> {
    await this.#print(this.#writer.end(this.#summary, VERSIONS));
  }

  async #print(text: string): Promise<void> {
    if (text !== "") await this.#streams.print(text);
  }
}

function statusOf(worst: number, failOn: CheckCall["failOn"]): number {
  return failOn !== "never" && worst >= SEVERITY_RANK[failOn] ? 1 : 0;
}

/** Checks the note on standard input. @returns exit status @throws UsageError when it is no text */
export async function checkStdin(name: string, call: CheckCall, streams: Streams): Promise<number> {
  const read = textOfBytes(await readAll(streams.input));
  if (!read.ok) throw new UsageError(`${name}: ${read.problem}`);
  const problem = tooLong(read.text);
  if (problem !== undefined) throw new UsageError(`${name}: ${problem}`);
  const out = new ReportOut(call.format, streams);
  await out.begin();
  await out.add(await checkText(read.text, name, call.format));
  await out.end();
  return statusOf(out.worst, call.failOn);
}

/**
 * Checks files and folders. A note that cannot be used is named on standard error and left out; the rest is reported.
 *
 * @returns exit status 0, 1, or 2 when something was left out
 * @throws UsageError for a path that does not exist
 */
export async function checkPaths(call: CheckPathsCall, streams: Streams): Promise<number> {
  const found = await findNotes(call.paths, streams.warn);
  if (found.files.length === 0) streams.warn("no notes (.md, .markdown, .txt) were found");
  let leftOut = found.leftOut > 0;
  const tasks = found.files.map((file) => ({
    file,
    format: call.format,
    ...(call.cache === undefined ? {} : { cache: call.cache }),
  }));
  const out = new ReportOut(call.format, streams);
  await out.begin();
  const left = timeLeft(tasks.length);
  let done = 0;
  for await (const checked of checkFiles(tasks, threadsFor(tasks.length, call.jobs), call.entry)) {
    const file = tasks[done++]?.file;
    if (checked.ok) await out.add(checked);
    else {
      streams.warn(`${file}: left out: ${checked.problem}`);
      leftOut = true;
    }
    streams.progress(() => left(done));
  }
  streams.progress(undefined);
  await out.end();
  return leftOut ? 2 : statusOf(out.worst, call.failOn);
}

/** `oxomargin check --records`: NDJSON in, NDJSON out, one answer a line in the same order; a bad line never stops the stream. */

import { createInterface } from "node:readline";
import { toFileReport } from "../../shared-lib/report/file-report.ts";
import { Engine } from "./engine.ts";
import type { Streams } from "./streams.ts";

function recordOf(line: string): { id: unknown; text: string } | { id: unknown; error: string } {
  let value: unknown;
  try {
    value = JSON.parse(line);
  } catch {
    return { id: null, error: 'the line is no JSON: write {"id": …, "text": …}' };
  }
  if (typeof value !== "object" || value === null)
    return { id: null, error: 'the line is no object: write {"id": …, "text": …}' };
  const { id = null, text } = value as { id?: unknown; text?: unknown };
  return typeof text === "string" ? { id, text } : { id, error: '"text" must be a string' };
}

async function answer(line: string, engine: Engine): Promise<object> {
  const record = recordOf(line);
  if ("error" in record) return record;
  try {
    // Records are Markdown: plain paragraphs read the same in it.
    const analysis = await engine.analyze(record.text, "record.md");
    return { ...toFileReport(String(record.id), analysis), id: record.id };
  } catch (error) {
    return { id: record.id, error: error instanceof Error ? error.message : "the record could not be read" };
  }
}

/** Filters standard input to standard output. @returns exit status 0 */
export async function checkRecords(streams: Streams): Promise<number> {
  const engine = new Engine();
  for await (const line of createInterface({ input: streams.input, crlfDelay: Number.POSITIVE_INFINITY })) {
    if (line.trim() === "") continue;
    await streams.print(`${JSON.stringify(await answer(line, engine))}\n`);
  }
  return 0;
}

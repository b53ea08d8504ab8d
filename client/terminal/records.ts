/** `oxomargin check --records`: NDJSON in, NDJSON out, one answer a line in the same order; a bad line never stops the stream. */

import { createInterface } from "node:readline";
import { toFileReport } from "../../shared-lib/report/file-report.ts";
import { tooLong } from "./check-file.ts";
import { Engine } from "./engine.ts";
import type { Streams } from "./streams.ts";

function recordOf(line: string): { id: unknown; text: string } | { id: unknown; error: string } {
  let value: unknown;
  try {
    value = JSON.parse(line);
  } catch {
    return { id: null, error: 'the line is no JSON: write {"id": …, "text": …}' };
  }
  if (typeof value !== "object" || value === null || Array.isArray(value))
    return { id: null, error: 'the line is no object: write {"id": …, "text": …}' };
  const { id = null, text } = value as { id?: unknown; text?: unknown };
  if (id !== null && typeof id !== "string" && typeof id !== "number")
    return { id: null, error: '"id" must be a string or a number' };
  return typeof text === "string" ? { id, text } : { id, error: '"text" must be a string' };
}

/** Records are read as Markdown, in which plain paragraphs read the same; an id that ends in .txt says plain text. */
function nameOf(id: unknown): string {
  return typeof id === "string" && /\.txt$/i.test(id) ? id : "record.md";
}

async function answer(line: string, engine: Engine): Promise<object> {
  const record = recordOf(line);
  if ("error" in record) return record;
  const problem = tooLong(record.text);
  if (problem !== undefined) return { id: record.id, error: problem };
  try {
    const analysis = await engine.analyze(record.text, nameOf(record.id));
    return { id: record.id, ...toFileReport(record.id === null ? "" : String(record.id), analysis) };
  } catch (error) {
    return { id: record.id, error: error instanceof Error ? error.message : "the record could not be read" };
  }
}

/** Filters standard input to standard output. @returns exit status 0 */
export async function checkRecords(streams: Streams): Promise<number> {
  const engine = new Engine();
  for await (const line of createInterface({ input: streams.input, crlfDelay: Number.POSITIVE_INFINITY }))
    await streams.print(`${JSON.stringify(await answer(line, engine))}\n`);
  return 0;
}

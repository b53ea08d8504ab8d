/** `oxomargin fix`: the corrections that need no judgement, as a unified diff, or written. */

import { randomUUID } from "node:crypto";
import { readFile, rename, stat, writeFile } from "node:fs/promises";
import { createTwoFilesPatch } from "diff";
import type { TextEdit } from "../../shared-lib/model/contract.ts";
import { Engine } from "./engine.ts";
import { findNotes } from "./find-notes.ts";
import type { Streams } from "./streams.ts";
import { UsageError } from "./usage-error.ts";

/** The first safe fix of each finding whose edits touch none of another's; applied from the end, so that offsets hold. */
function applySafe(text: string, edits: readonly TextEdit[]): string {
  let fixed = text;
  let from = Number.POSITIVE_INFINITY;
  for (const edit of [...edits].sort((a, b) => b.start - a.start)) {
    if (edit.end > from) continue;
    fixed = fixed.slice(0, edit.start) + edit.text + fixed.slice(edit.end);
    from = edit.start;
  }
  return fixed;
}

/** Whole or not at all: written beside the file and renamed over it. */
async function replaceFile(file: string, text: string): Promise<void> {
  const beside = `${file}.${randomUUID()}.part`;
  const { mode } = await stat(file);
  await writeFile(beside, text, { mode });
  await rename(beside, file);
}

/** Prints or writes the corrections. @returns 0 */
export async function fix(paths: readonly string[], write: boolean, streams: Streams): Promise<number> {
  if (paths.length === 0) throw new UsageError("fix needs a file or folder");
  const engine = new Engine();
  for await (const file of findNotes(paths, streams.warn)) {
    const text = await readFile(file, "utf8");
    const { findings } = await engine.analyze(text, file);
    const safe = findings.flatMap((finding) => finding.fixes.find((candidate) => candidate.safe)?.edits ?? []);
    const fixed = applySafe(text, safe);
    if (fixed === text) continue;
    if (write) {
      await replaceFile(file, fixed);
      streams.warn(`${file}: corrected`);
    } else await streams.print(createTwoFilesPatch(file, file, text, fixed, "as written", "corrected", { context: 2 }));
  }
  return 0;
}

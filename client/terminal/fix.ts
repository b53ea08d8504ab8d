/** `oxomargin fix`: the corrections that need no judgement, as a unified diff, or written. */

import { randomUUID } from "node:crypto";
import { readFile, realpath, rename, rm, stat, writeFile } from "node:fs/promises";
import { createTwoFilesPatch } from "diff";
import type { Finding } from "../../shared-lib/advice/types.ts";
import type { TextEdit } from "../../shared-lib/model/contract.ts";
import { Engine } from "./engine.ts";
import { findNotes } from "./find-notes.ts";
import { readText, systemProblem } from "./read-text.ts";
import type { Streams } from "./streams.ts";

const overlap = (a: TextEdit, b: TextEdit): boolean => a.start === b.start || (a.start < b.end && b.start < a.end);

/** The first safe fix of each finding, whole, unless it touches what an earlier one changes; applied from the end, so that offsets hold. */
export function applySafeFixes(text: string, findings: readonly Finding[]): string {
  const taken: TextEdit[] = [];
  for (const finding of findings) {
    const edits = finding.fixes.find((fix) => fix.safe)?.edits ?? [];
    if (!edits.some((edit) => taken.some((other) => overlap(edit, other)))) taken.push(...edits);
  }
  taken.sort((a, b) => b.start - a.start);
  return taken.reduce((fixed, edit) => fixed.slice(0, edit.start) + edit.text + fixed.slice(edit.end), text);
}

/** Whole or not at all: written beside the file and renamed over it; a link stays a link. */
async function replaceFile(file: string, before: string, after: string): Promise<string | undefined> {
  const place = await realpath(file);
  const beside = `${place}.${randomUUID()}.part`;
  try {
    const { mode } = await stat(place);
    await writeFile(beside, after, { mode });
    if ((await readFile(place, "utf8")) !== before) {
      await rm(beside, { force: true });
      return "it changed while it was read; run fix again";
    }
    await rename(beside, place);
    return undefined;
  } catch (error) {
    await rm(beside, { force: true }).catch(() => undefined);
    return systemProblem(error).replace("read", "write");
  }
}

async function fixFile(file: string, write: boolean, engine: Engine, streams: Streams): Promise<string | undefined> {
  const read = await readText(file);
  if (!read.ok) return read.problem;
  if (read.encoding !== "utf-8") return "it is UTF-16: save it as UTF-8 to have it corrected";
  const fixed = applySafeFixes(read.text, (await engine.analyze(read.text, file)).findings);
  if (fixed === read.text) return undefined;
  if (!write) {
    await streams.print(createTwoFilesPatch(file, file, read.text, fixed, "as written", "corrected", { context: 2 }));
    return undefined;
  }
  const problem = await replaceFile(file, read.text, fixed);
  if (problem === undefined) streams.warn(`${file}: corrected`);
  return problem;
}

/** Prints or writes the corrections. @returns exit status 0, or 2 when a note was left out */
export async function fix(paths: readonly string[], write: boolean, streams: Streams): Promise<number> {
  const engine = new Engine();
  const found = await findNotes(paths, streams.warn);
  let leftOut = found.leftOut > 0;
  for (const file of found.files) {
    const problem = await fixFile(file, write, engine, streams);
    if (problem === undefined) continue;
    streams.warn(`${file}: left out: ${problem}`);
    leftOut = true;
  }
  return leftOut ? 2 : 0;
}

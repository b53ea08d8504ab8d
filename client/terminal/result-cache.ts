/**
 * Kept results, one file a note and format, named by a hash of everything that the result depends on.
 * A file is written beside its place and renamed, so a reader sees all of it or nothing; what cannot be read or written is done without.
 */

import { createHash, randomUUID } from "node:crypto";
import { mkdir, readFile, rename, rm, writeFile } from "node:fs/promises";
import path from "node:path";
import type { CheckedPiece } from "./check-file.ts";
import { TABLES_VERSION, VERSION } from "./version.ts";

/** Name of a result: it changes with the program, the tables, the format, the note's path and its text. */
export function keyOf(file: string, format: string, text: string): string {
  return createHash("sha256")
    .update(JSON.stringify([VERSION, TABLES_VERSION, format, file, text]))
    .digest("hex");
}

const fileOf = (folder: string, key: string): string => path.join(folder, key.slice(0, 2), `${key}.json`);

function isPiece(value: unknown): value is CheckedPiece & { readonly key: string } {
  if (typeof value !== "object" || value === null) return false;
  const { piece, summary, worst } = value as Partial<CheckedPiece>;
  return (
    typeof piece === "string" &&
    typeof worst === "number" &&
    typeof summary === "object" &&
    summary !== null &&
    Object.values(summary).every((count) => typeof count === "number")
  );
}

/** The kept result, unless there is none or it is damaged. */
export async function cachedPiece(folder: string, key: string): Promise<CheckedPiece | undefined> {
  try {
    const value: unknown = JSON.parse(await readFile(fileOf(folder, key), "utf8"));
    if (!isPiece(value) || value.key !== key) return undefined;
    return { piece: value.piece, summary: value.summary, worst: value.worst };
  } catch {
    return undefined;
  }
}

/** Keeps a result; a full disk or a read-only folder costs nothing but the time next run. */
export async function keepPiece(folder: string, key: string, piece: CheckedPiece): Promise<void> {
  const place = fileOf(folder, key);
  const beside = `${place}.${randomUUID()}.part`;
  try {
    await mkdir(path.dirname(place), { recursive: true });
    await writeFile(beside, JSON.stringify({ key, ...piece }));
    await rename(beside, place);
  } catch {
    await rm(beside, { force: true }).catch(() => undefined);
  }
}

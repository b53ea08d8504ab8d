/** Notes under the paths of a call: folders are walked, ignore files honoured, every real folder entered once. */

import type { Dirent, Stats } from "node:fs";
import { readdir, readFile, realpath, stat } from "node:fs/promises";
import path from "node:path";
import ignore, { type Ignore } from "ignore";
import { systemProblem } from "./read-text.ts";
import { UsageError } from "./usage-error.ts";

const NOTE = /\.(?:md|markdown|txt)$/i;
const IGNORE_FILES = [".gitignore", ".oxomarginignore"];
/** Folders that hold no notes of anybody's. */
const NEVER = new Set([".git", "node_modules"]);

export interface FoundNotes {
  /** In order of their paths, each once. */
  readonly files: readonly string[];
  /** Folders that could not be looked into. */
  readonly leftOut: number;
}

interface Rules {
  readonly folder: string;
  readonly rules: Ignore;
}

interface Walk {
  readonly files: Set<string>;
  readonly entered: Set<string>;
  leftOut: number;
  readonly warn: (message: string) => void;
}

async function ignoreOf(folder: string): Promise<Ignore | undefined> {
  const texts = await Promise.all(
    IGNORE_FILES.map((name) => readFile(path.join(folder, name), "utf8").catch(() => "")),
  );
  const rules = texts.join("\n").trim();
  return rules === "" ? undefined : ignore().add(rules);
}

/** The nearest rule that speaks of the path decides, so that a folder's own file can take back what one above says. */
function isIgnored(file: string, isFolder: boolean, all: readonly Rules[]): boolean {
  for (const { folder, rules } of [...all].reverse()) {
    const relative = path.relative(folder, file).split(path.sep).join("/");
    const { ignored, unignored } = rules.test(isFolder ? `${relative}/` : relative);
    if (ignored) return true;
    if (unignored) return false;
  }
  return false;
}

async function kindOf(file: string, entry: Dirent): Promise<"folder" | "file" | undefined> {
  let found: Dirent | Stats | undefined = entry;
  if (entry.isSymbolicLink()) found = await stat(file).catch(() => undefined);
  return found?.isDirectory() ? "folder" : found?.isFile() ? "file" : undefined;
}

async function enter(folder: string, above: readonly Rules[], walk: Walk): Promise<void> {
  const real = await realpath(folder).catch(() => folder);
  if (walk.entered.has(real)) return;
  walk.entered.add(real);
  let entries: Dirent[];
  try {
    entries = await readdir(folder, { withFileTypes: true });
  } catch (error) {
    walk.warn(`${folder}: left out: ${systemProblem(error).replace("read it", "look into it")}`);
    walk.leftOut++;
    return;
  }
  const own = await ignoreOf(folder);
  const rules = own ? [...above, { folder, rules: own }] : above;
  entries.sort((a, b) => (a.name < b.name ? -1 : 1));
  for (const entry of entries) {
    const file = path.join(folder, entry.name);
    const kind = await kindOf(file, entry);
    if (kind === "folder" && !NEVER.has(entry.name) && !isIgnored(file, true, rules)) await enter(file, rules, walk);
    if (kind === "file" && NOTE.test(entry.name) && !isIgnored(file, false, rules)) walk.files.add(file);
  }
}

/**
 * Notes under `paths`; a file that is named outright is taken whatever its ending.
 *
 * @throws UsageError for a path that does not exist
 */
export async function findNotes(paths: readonly string[], warn: (message: string) => void): Promise<FoundNotes> {
  const walk: Walk = { files: new Set(), entered: new Set(), leftOut: 0, warn };
  for (const given of paths) {
    const found = await stat(given).catch((error: unknown) => {
      throw new UsageError(
        `${given}: ${(error as NodeJS.ErrnoException).code === "ENOENT" ? "no such file or folder" : systemProblem(error)}`,
      );
    });
    if (found.isDirectory()) await enter(given, [], walk);
    else walk.files.add(given);
  }
  return { files: [...walk.files].sort((a, b) => (a < b ? -1 : 1)), leftOut: walk.leftOut };
}

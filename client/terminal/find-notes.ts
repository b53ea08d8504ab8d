/** Notes under the paths of a call: folders are walked in order of name, ignore files honoured, links followed once. */

import { readdir, readFile, realpath, stat } from "node:fs/promises";
import path from "node:path";
import ignore, { type Ignore } from "ignore";
import { UsageError } from "./usage-error.ts";

const NOTE = /\.(?:md|markdown|txt)$/i;
const IGNORE_FILES = [".gitignore", ".oxomarginignore"];
/** Folders that hold no notes of anybody's. */
const NEVER = new Set([".git", "node_modules"]);

export type Warn = (message: string) => void;

async function ignoreOf(folder: string): Promise<Ignore | undefined> {
  const texts = await Promise.all(
    IGNORE_FILES.map((name) => readFile(path.join(folder, name), "utf8").catch(() => "")),
  );
  const rules = texts.join("\n").trim();
  return rules === "" ? undefined : ignore().add(rules);
}

interface Rules {
  readonly folder: string;
  readonly rules: Ignore;
}

function isIgnored(file: string, isFolder: boolean, all: readonly Rules[]): boolean {
  return all.some(({ folder, rules }) => {
    const relative = path.relative(folder, file).split(path.sep).join("/");
    return relative !== "" && !relative.startsWith("..") && rules.ignores(isFolder ? `${relative}/` : relative);
  });
}

async function* walk(folder: string, above: readonly Rules[], seen: Set<string>, warn: Warn): AsyncGenerator<string> {
  const real = await realpath(folder).catch(() => folder);
  if (seen.has(real)) return;
  seen.add(real);
  const own = await ignoreOf(folder);
  const rules = own ? [...above, { folder, rules: own }] : above;
  let names: string[];
  try {
    names = (await readdir(folder)).sort();
  } catch (error) {
    warn(`${folder}: cannot be listed (${(error as NodeJS.ErrnoException).code ?? "unknown"}); left out`);
    return;
  }
  for (const name of names) {
    const file = path.join(folder, name);
    const found = await stat(file).catch(() => undefined);
    if (!found) continue;
    if (found.isDirectory()) {
      if (!NEVER.has(name) && !isIgnored(file, true, rules)) yield* walk(file, rules, seen, warn);
    } else if (found.isFile() && NOTE.test(name) && !isIgnored(file, false, rules)) yield file;
  }
}

/**
 * Notes under `paths`, in the order of the paths.
 *
 * @throws UsageError for a path that does not exist
 */
export async function* findNotes(paths: readonly string[], warn: Warn): AsyncGenerator<string> {
  for (const given of paths) {
    const found = await stat(given).catch(() => undefined);
    if (!found) throw new UsageError(`${given}: no such file or folder`);
    if (found.isDirectory()) yield* walk(given, [], new Set(), warn);
    else yield given;
  }
}

/** Collects the strings of the editor's side into l10n/bundle.l10n.json, the file that a translator starts from: `npm run l10n`. */

import { readdirSync, readFileSync, writeFileSync } from "node:fs";
import path from "node:path";
import { fileURLToPath } from "node:url";

export const BUNDLE = "l10n/bundle.l10n.json";

/** Every string given to `vscode.l10n.t`, as its own translation. */
export function localisedStrings(files: readonly string[]): Record<string, string> {
  const found = new Set<string>();
  for (const file of files)
    for (const [, words] of readFileSync(file, "utf8").matchAll(/l10n\.t\(\s*"([^"\n]{1,200})"/g))
      found.add(words as string);
  return Object.fromEntries([...found].sort().map((words) => [words, words]));
}

/** Source files of the editor's side. */
export function editorSources(): string[] {
  const folder = "client/editor";
  const names = readdirSync(folder, { recursive: true, encoding: "utf8" }).filter((name) => name.endsWith(".ts"));
  return names.map((name) => path.join(folder, name)).sort();
}

if (process.argv[1] === fileURLToPath(import.meta.url))
  writeFileSync(BUNDLE, `${JSON.stringify(localisedStrings(editorSources()), null, 2)}\n`);

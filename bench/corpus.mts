/** Notes to measure with: the example notes, repeated with figures of their own, so that no two are the same text. */

import { readdirSync, readFileSync } from "node:fs";
import path from "node:path";

const EXAMPLES = "media/example-notes";

const examples: readonly string[] = readdirSync(EXAMPLES)
  .filter((name) => name.endsWith(".md"))
  .sort()
  .map((name) => readFileSync(path.join(EXAMPLES, name), "utf8"));

/** Note number `i`: an example whose temperatures are left and whose first mass is its own. */
export function noteOf(i: number): string {
  const text = examples[i % examples.length] as string;
  return text.replace(/\d+(?=\.\d+ g)/, String(1 + (i % 97)));
}

/** One long note: that many examples under headings of their own, so that each has flasks of its own. */
export function longNote(sections: number): string {
  return Array.from({ length: sections }, (_, i) => noteOf(i)).join("\n");
}

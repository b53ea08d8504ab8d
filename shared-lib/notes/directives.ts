/**
 * What the writer tells the program in the note itself: an HTML comment "<!-- oxomargin: WORD ARGUMENT -->" (invisible when rendered), or in
 * plain text a line that begins with "oxomargin:". The page beside this file lists the words.
 */

import type { Directive, ReadingProblem } from "./types.ts";

/** Words and where each holds: to the end of its step, the next line, or the whole file. */
export const DIRECTIVE_WORDS = [
  "basis",
  "medium",
  "pH",
  "temperature",
  "assay",
  "step",
  "silence",
  "silence-file",
] as const;

const OPEN = "oxomargin:";

function lineEnd(text: string, at: number): number {
  const found = text.indexOf("\n", at);
  return found < 0 ? text.length : found;
}

/** The next line that holds text, from behind `at`. */
function nextLine(text: string, at: number): { start: number; end: number } {
  let start = lineEnd(text, at) + 1;
  while (start < text.length && text.slice(start, lineEnd(text, start)).trim() === "") start = lineEnd(text, start) + 1;
  return { start: Math.min(start, text.length), end: lineEnd(text, Math.min(start, text.length)) };
}

/** Reads all directives; one that is not known is a problem at its place. */
export function readDirectives(text: string): {
  readonly directives: readonly Directive[];
  readonly problems: readonly ReadingProblem[];
} {
  const directives: Directive[] = [];
  const problems: ReadingProblem[] = [];
  for (let at = text.indexOf(OPEN); at >= 0; at = text.indexOf(OPEN, at + OPEN.length)) {
    const line = text.lastIndexOf("\n", at) + 1;
    const before = text.slice(line, at).trim();
    const inComment = before.endsWith("<!--");
    if (!inComment && before !== "") continue;
    const close = inComment ? text.indexOf("-->", at) : lineEnd(text, at);
    if (close < 0) continue;
    const body = text.slice(at + OPEN.length, close).trim();
    const space = body.search(/\s/);
    const word = space < 0 ? body : body.slice(0, space);
    const argument = space < 0 ? "" : body.slice(space + 1).trim();
    const start = inComment ? text.lastIndexOf("<!--", at) : at;
    const end = inComment ? close + 3 : close;
    if (!(DIRECTIVE_WORDS as readonly string[]).includes(word)) {
      problems.push({
        start: at,
        end: close,
        code: "reading/directive",
        message: `"${word}" is no directive. Known are: ${DIRECTIVE_WORDS.join(", ")}.`,
      });
      continue;
    }
    const file = word === "silence-file" || word === "basis";
    const scope = file
      ? { start: 0, end: text.length }
      : word === "silence"
        ? nextLine(text, end)
        : { start: end, end: text.length };
    directives.push({ start, end, word: word === "silence-file" ? "silence" : word, argument, scope });
  }
  return { directives, problems };
}

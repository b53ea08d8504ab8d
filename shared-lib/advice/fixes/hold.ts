/** Adds a time to wait before the next thing is done. */

import type { TextEdit } from "../../model/contract.ts";
import { timeText } from "../figures.ts";

const LONGEST_SENTENCE = 600;

/** The edit that puts ` Hold for 2 h.` behind the sentence that holds `offset`; undefined where no sentence ends. */
export function holdAfterSentence(text: string, offset: number, seconds: number): TextEdit | undefined {
  for (let i = offset; i < Math.min(text.length, offset + LONGEST_SENTENCE); i += 1) {
    if (text[i] === "\n" && (text[i + 1] === "\n" || text[i + 1] === undefined)) return undefined;
    const next = text[i + 1];
    if (text[i] !== "." || !(next === undefined || next === " " || next === "\n" || next === "\r")) continue;
    return { start: i + 1, end: i + 1, text: ` Hold for ${timeText(seconds)}.` };
  }
  return undefined;
}

/** One way into the analysis for the tests of flask and advice: a note in, everything out. */

import { contextOf } from "../../shared-lib/advice/context.ts";
import type { AdviceInput, Finding, SafeFix } from "../../shared-lib/advice/types.ts";
import { type Analysis, analyze } from "../../shared-lib/analyze.ts";
import { createLexicon } from "../../shared-lib/compounds/create-lexicon.ts";
import { DEFAULT_SETTINGS, type Settings } from "../../shared-lib/model/settings.ts";

export const lexicon = createLexicon();

export function analyse(
  text: string,
  settings: Partial<Settings> = {},
  format: "markdown" | "plain" = "markdown",
): Analysis {
  return analyze(text, { format, lexicon, settings: { ...DEFAULT_SETTINGS, ...settings } });
}

export function inputOf(text: string, settings: Partial<Settings> = {}): AdviceInput {
  const { reading, charges, moments } = analyse(text, settings);
  return {
    text,
    reading,
    timeline: { charges, moments },
    moments,
    settings: { ...DEFAULT_SETTINGS, ...settings },
    lexicon,
  };
}

export function findingsOf(text: string, code: string, settings: Partial<Settings> = {}): readonly Finding[] {
  return analyse(text, settings).findings.filter((finding) => finding.code === code);
}

/** Title of the kind that each step is taken for. */
export function kindsOf(text: string): readonly (string | undefined)[] {
  return contextOf(inputOf(text)).steps.map((step) => step.decision.kind?.id);
}

/** The text after a fix. Edits never overlap, so they may be made from behind. */
export function applied(text: string, fix: SafeFix): string {
  return [...fix.edits]
    .sort((a, b) => b.start - a.start || b.end - a.end)
    .reduce((changed, edit) => changed.slice(0, edit.start) + edit.text + changed.slice(edit.end), text);
}

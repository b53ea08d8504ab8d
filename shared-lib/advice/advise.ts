/** Findings and hints of a note. */

import type { Severity } from "../model/contract.ts";
import type { Settings } from "../model/settings.ts";
import type { Directive } from "../notes/types.ts";
import { contextOf } from "./context.ts";
import { FINDINGS } from "./findings/list.ts";
import { hintsOf } from "./hints.ts";
import type { AdviceInput, Finding, Hint } from "./types.ts";

const BASIS_DIRECTIVE = "basis";
const SILENCE_DIRECTIVE = "silence";

/**
 * Looks at a note with every finding.
 *
 * @returns findings in the order of the text, and hints; what the settings or a directive silence is left out
 */
export function advise(input: AdviceInput): { readonly findings: readonly Finding[]; readonly hints: readonly Hint[] } {
  const context = contextOf({ ...input, settings: { ...input.settings, basis: basisOf(input) } });
  const silences = input.reading.directives.filter((directive) => directive.word === SILENCE_DIRECTIVE);
  const findings = FINDINGS.flatMap((rule) =>
    rule.look(context).flatMap((raw): Finding[] => {
      const code = raw.code ?? rule.code;
      const severity = severityOf(context.settings.findings, code, raw.severity ?? rule.severity);
      if (!severity || isSilenced(silences, code, raw.start)) return [];
      return [{ ...raw, code, severity }];
    }),
  );
  return { findings: findings.toSorted((a, b) => a.start - b.start || a.end - b.end), hints: hintsOf(context) };
}

/** The note's own directive wins over the settings. */
function basisOf({ reading, settings }: AdviceInput): Settings["basis"] {
  const said = reading.directives.findLast(({ word }) => word === BASIS_DIRECTIVE)?.argument.trim();
  return said === "free" || said === "charged" ? said : settings.basis;
}

function severityOf(
  settings: AdviceInput["settings"]["findings"],
  code: string,
  usual: Severity,
): Severity | undefined {
  const set = Object.hasOwn(settings, code) ? settings[code] : undefined;
  if (set === "off") return undefined;
  return set ?? usual;
}

/** A directive names a code or "all", and may go on with a reason. */
function isSilenced(silences: readonly Directive[], code: string, at: number): boolean {
  return silences.some(({ argument, scope }) => {
    const named = argument.trim().split(/[\s,]/, 1)[0];
    return at >= scope.start && at < scope.end && (named === code || named === "all");
  });
}

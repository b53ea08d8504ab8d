/** Findings as diagnostics. */

import { type Diagnostic, DiagnosticSeverity } from "vscode-languageserver-protocol";
import type { Severity } from "../../shared-lib/model/contract.ts";
import type { OpenNote } from "../notes.ts";
import { rangeOf } from "../ranges.ts";

/** An estimate is never an error. */
const SEVERITIES: Readonly<Record<Severity, DiagnosticSeverity>> = {
  warning: DiagnosticSeverity.Warning,
  note: DiagnosticSeverity.Information,
  hint: DiagnosticSeverity.Hint,
};

export const SOURCE = "Oxomargin";

/** Address of the page of a finding, for a client that opens it. */
export function pageAddress(code: string): string {
  return `oxomargin:/findings/${code}.md`;
}

export function diagnosticsOf(note: OpenNote, options: { readonly pages: boolean }): Diagnostic[] {
  return note.analysis.findings.map((finding) => ({
    range: rangeOf(note.document, finding),
    severity: SEVERITIES[finding.severity],
    source: SOURCE,
    code: finding.code,
    ...(options.pages ? { codeDescription: { href: pageAddress(finding.code) } } : {}),
    message: finding.message,
  }));
}

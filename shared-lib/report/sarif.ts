/** SARIF 2.1.0 (OASIS standard), for code-scanning services. */

import { FINDINGS } from "../advice/findings/list.ts";
import { lineStartsOf, placeOf } from "./line-table.ts";
import type { NoteOnFile } from "./types.ts";
import type { ReportWriter } from "./writer.ts";

const LEVEL = { hint: "note", note: "note", warning: "warning" } as const;

/** Stable over moved lines: the code and the words it speaks of, not the place. FNV-1a, 32 bit. */
function fingerprint(code: string, words: string): string {
  let hash = 0x811c9dc5;
  for (const c of `${code} ${words}`) hash = Math.imul(hash ^ (c.codePointAt(0) ?? 0), 0x01000193) >>> 0;
  return hash.toString(16).padStart(8, "0");
}

/** A path as a URI reference: each part escaped, lone surrogates replaced; an absolute path becomes a file URI. */
function uriOf(path: string): string {
  const parts = path.replaceAll("\\", "/").split("/");
  const escaped = parts.map((part) =>
    encodeURIComponent(
      part.replace(/[\uD800-\uDBFF](?![\uDC00-\uDFFF])|(?<![\uD800-\uDBFF])[\uDC00-\uDFFF]/g, "\uFFFD"),
    ),
  );
  return path.startsWith("/") ? `file://${escaped.join("/")}` : escaped.join("/");
}

function resultsOf({ report, text }: NoteOnFile): readonly object[] {
  const starts = lineStartsOf(text);
  const region = (span: { readonly start: number; readonly end: number }) => {
    const from = placeOf(starts, span.start);
    const to = placeOf(starts, span.end);
    return { startLine: from.line, startColumn: from.column, endLine: to.line, endColumn: to.column };
  };
  const artifactLocation = { uri: uriOf(report.path) };
  return report.findings.map((finding) => ({
    ruleId: finding.code,
    level: LEVEL[finding.severity],
    message: { text: finding.message },
    locations: [{ physicalLocation: { artifactLocation, region: region(finding) } }],
    partialFingerprints: { "finding/v1": fingerprint(finding.code, text.slice(finding.start, finding.end)) },
    ...(finding.fixes.length === 0
      ? {}
      : {
          fixes: finding.fixes.map((fix) => ({
            description: { text: fix.title },
            artifactChanges: [
              {
                artifactLocation,
                replacements: fix.edits.map((edit) => ({
                  deletedRegion: region(edit),
                  insertedContent: { text: edit.text },
                })),
              },
            ],
          })),
        }),
  }));
}

/** One SARIF log over all notes, with the finding's rules and the fixes that it offers. */
export const SARIF_WRITER: ReportWriter = {
  withSteps: false,
  begin: ({ program, tables }) => {
    const driver = {
      name: "oxomargin",
      version: program,
      properties: { tables },
      rules: FINDINGS.map(({ code, title, page }) => ({
        id: code,
        shortDescription: { text: title },
        help: { text: page, markdown: page },
      })),
    };
    return `{"$schema":"https://json.schemastore.org/sarif-2.1.0.json","version":"2.1.0","runs":[{"tool":${JSON.stringify({ driver })},"columnKind":"utf16CodeUnits","results":[\n`;
  },
  note: (note) =>
    resultsOf(note)
      .map((result) => JSON.stringify(result))
      .join(",\n"),
  between: ",\n",
  end: () => "\n]}]}\n",
};

/** SARIF 2.1.0 (OASIS standard), for code-scanning services. */

import type { FileReport } from "../model/contract.ts";
import { lineStartsOf, placeOf } from "./line-table.ts";

const LEVEL = { hint: "note", note: "note", warning: "warning" } as const;

/** Stable over moved lines: the code and the words it speaks of, not the place. FNV-1a, 32 bit. */
function fingerprint(code: string, words: string): string {
  let hash = 0x811c9dc5;
  for (const c of `${code} ${words}`) hash = Math.imul(hash ^ (c.codePointAt(0) ?? 0), 0x01000193) >>> 0;
  return hash.toString(16).padStart(8, "0");
}

/** One SARIF log over all files; `rules` are the codes with their titles. */
export function toSarif(
  files: readonly { readonly report: FileReport; readonly text: string }[],
  rules: readonly { readonly code: string; readonly title: string }[],
  version: string,
): object {
  return {
    $schema: "https://json.schemastore.org/sarif-2.1.0.json",
    version: "2.1.0",
    runs: [
      {
        tool: {
          driver: {
            name: "oxomargin",
            version,
            rules: rules.map(({ code, title }) => ({ id: code, shortDescription: { text: title } })),
          },
        },
        columnKind: "utf16CodeUnits",
        results: files.flatMap(({ report, text }) => {
          const starts = lineStartsOf(text);
          return report.findings.map((finding) => {
            const from = placeOf(starts, finding.start);
            const to = placeOf(starts, finding.end);
            return {
              ruleId: finding.code,
              level: LEVEL[finding.severity],
              message: { text: finding.message },
              locations: [
                {
                  physicalLocation: {
                    artifactLocation: { uri: encodeURI(report.path.replaceAll("\\", "/")) },
                    region: { startLine: from.line, startColumn: from.column, endLine: to.line, endColumn: to.column },
                  },
                },
              ],
              partialFingerprints: { "finding/v1": fingerprint(finding.code, text.slice(finding.start, finding.end)) },
            };
          });
        }),
      },
    ],
  };
}

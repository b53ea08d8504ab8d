/** The page of a finding: what it looks for, when it keeps silent, why, and its sources. */

import { FINDINGS } from "../../shared-lib/advice/findings/list.ts";

/** Markdown; one sentence for a code that this version does not know. */
export function pageOf(code: string): string {
  const rule = FINDINGS.find((candidate) => candidate.code === code);
  if (!rule) return "This version has no finding of that code.";
  return `# ${rule.title}\n\n\`${rule.code}\` · ${rule.severity}\n\n${rule.page}\n`;
}

/** Counts over files: notes read, carbonyl charges, findings by code. */

import type { FileReport } from "../model/contract.ts";

/** Counts of one file. */
export function summaryOf(file: FileReport): Record<string, number> {
  const summary: Record<string, number> = {
    files: 1,
    mentions: file.mentions.length,
    carbonylCharges: file.charges.filter((charge) => file.mentions[charge.mention]?.carbonyl).length,
    findings: file.findings.length,
  };
  for (const { code } of file.findings) summary[code] = (summary[code] ?? 0) + 1;
  return summary;
}

/** Adds counts to a sum. */
export function addSummary(sum: Record<string, number>, counts: Readonly<Record<string, number>>): void {
  for (const [key, count] of Object.entries(counts)) sum[key] = (sum[key] ?? 0) + count;
}

/** Counts over files: notes read, carbonyl charges, findings by code. */

import type { CheckReport, FileReport } from "../model/contract.ts";

/** Adds one file to the counts. */
export function addToSummary(summary: Record<string, number>, file: FileReport): void {
  const add = (key: string, by: number): void => {
    summary[key] = (summary[key] ?? 0) + by;
  };
  add("files", 1);
  add("mentions", file.mentions.length);
  add("carbonylCharges", file.charges.filter((charge) => file.mentions[charge.mention]?.carbonyl).length);
  add("findings", file.findings.length);
  for (const finding of file.findings) add(finding.code, 1);
}

/** The whole report. */
export function toCheckReport(files: readonly FileReport[], version: string): CheckReport {
  const summary: Record<string, number> = {};
  for (const file of files) addToSummary(summary, file);
  return { schema: 1, tool: { name: "oxomargin", version }, files, summary };
}

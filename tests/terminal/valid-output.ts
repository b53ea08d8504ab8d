/** Checks outputs against the contract's schema and against the rules that a schema cannot say. */

import { readFileSync } from "node:fs";
import Ajv from "ajv";
import type { CheckReport, Estimate, FileReport, FormShare, Interval } from "../../shared-lib/model/contract.ts";

const schema = JSON.parse(readFileSync(`${import.meta.dirname}/contract.schema.json`, "utf8")) as object;
const ajv = new Ajv({ allErrors: true }).addSchema(schema, "contract");

/** Problems of a value by a definition of the schema, one a line; empty when it is valid. */
export function schemaProblems(definition: "estimate" | "fileReport" | "checkReport", value: unknown): string {
  const validate = ajv.getSchema(`contract#/definitions/${definition}`);
  if (!validate) throw new Error(`no definition ${definition}`);
  return validate(value) ? "" : ajv.errorsText(validate.errors, { separator: "\n" });
}

function* intervals(value: unknown): Generator<Interval> {
  if (typeof value !== "object" || value === null) return;
  const { value: middle, low, high } = value as Partial<Interval>;
  if (typeof middle === "number" && typeof low === "number" && typeof high === "number")
    yield { value: middle, low, high };
  for (const part of Object.values(value)) yield* intervals(part);
}

/** Bounds that do not hold their value. */
export function crossedBounds(value: unknown): readonly Interval[] {
  const slack = 1e-9;
  return [...intervals(value)].filter(
    ({ value: middle, low, high }) =>
      low > middle + slack * Math.abs(middle) || high < middle - slack * Math.abs(middle),
  );
}

function sumOf(forms: readonly Pick<FormShare, "fraction">[]): number {
  return forms.reduce((sum, form) => sum + form.fraction.value, 0);
}

/** Broken rules of an estimate beyond the schema. */
export function estimateProblems(estimate: Estimate): readonly string[] {
  const problems: string[] = [];
  if (crossedBounds(estimate).length > 0) problems.push("bounds do not hold the value");
  if (estimate.outside === undefined) {
    if (Math.abs(sumOf(estimate.forms) - 1) > 1e-6) problems.push(`forms add up to ${sumOf(estimate.forms)}`);
  } else if (estimate.forms.length > 0) problems.push("outside the model, and yet forms");
  return problems;
}

/** Broken rules of a file's report beyond the schema; `text` is its note. */
export function fileProblems(report: FileReport, text: string): readonly string[] {
  const problems: string[] = [];
  const inside = (span: { readonly start: number; readonly end: number }, what: string): void => {
    if (span.start > span.end || span.end > text.length) problems.push(`${what} ${span.start}–${span.end} is no place`);
  };
  for (const mention of report.mentions) {
    inside(mention, "mention");
    if (text.slice(mention.start, mention.end) !== mention.text) problems.push(`mention text differs: ${mention.text}`);
  }
  for (const charge of report.charges) {
    if (!report.mentions[charge.mention]) problems.push("charge without mention");
    for (const amount of charge.amounts) inside(amount, "amount");
  }
  for (const medium of report.media) inside(medium, "medium");
  for (const moment of report.flask)
    for (const carbonyl of moment.carbonyls) {
      if (!report.mentions[carbonyl.mention]) problems.push("flask without mention");
      const sum = sumOf(carbonyl.forms);
      if (Math.abs(sum - 1) > 1e-6) problems.push(`forms in the flask add up to ${sum}`);
    }
  for (const finding of report.findings) {
    inside(finding, "finding");
    for (const edit of finding.fixes.flatMap((fix) => fix.edits)) inside(edit, "edit");
  }
  if (crossedBounds(report).length > 0) problems.push("bounds do not hold the value");
  return problems;
}

/** Parsed as a check report. */
export function checkReportOf(out: string): CheckReport {
  return JSON.parse(out) as CheckReport;
}

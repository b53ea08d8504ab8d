/** The outputs hold the contract that other programs read: by JSON Schema, and by the rules a schema cannot say. */

import { readFileSync } from "node:fs";
import { createRequire } from "node:module";
import Ajv, { type AnySchemaObject } from "ajv";
import { describe, expect, it } from "vitest";
import type { Estimate, FileReport } from "../../shared-lib/model/contract.ts";
import { oxomargin } from "./run-terminal.ts";
import { checkReportOf, estimateProblems, fileProblems, schemaProblems } from "./valid-output.ts";

const EXAMPLES = "media/example-notes";

describe("check --format json", () => {
  it("is a CheckReport over the example notes, with every offset in its note and every share summing to 1", async () => {
    const { status, out } = await oxomargin(["check", EXAMPLES, "--format", "json"]);
    expect(status).toBe(0);
    const report = checkReportOf(out);
    expect(schemaProblems("checkReport", report)).toBe("");
    expect(report.files.length).toBeGreaterThanOrEqual(5);
    for (const file of report.files) expect(fileProblems(file, readFileSync(file.path, "utf8")), file.path).toEqual([]);
    expect(report.summary.files).toBe(report.files.length);
    expect(report.summary.findings).toBe(report.files.reduce((sum, file) => sum + file.findings.length, 0));
  });

  it("carries the steps with their kinds and ledgers beside the contract's fields", async () => {
    const { out } = await oxomargin(["check", `${EXAMPLES}/1-dilute-in-water.md`, "--format", "json"]);
    const [file] = JSON.parse(out).files as [{ steps: { kind?: { id: string }; ledger: { rows: unknown[] } }[] }];
    expect(file.steps.some((step) => step.kind?.id === "oxime" && step.ledger.rows.length >= 2)).toBe(true);
  });
});

describe("check --format ndjson", () => {
  it("is one FileReport a line, in path order", async () => {
    const { out } = await oxomargin(["check", EXAMPLES, "--format", "ndjson"]);
    const reports = out
      .trimEnd()
      .split("\n")
      .map((line) => JSON.parse(line) as FileReport);
    for (const report of reports) expect(schemaProblems("fileReport", report)).toBe("");
    const paths = reports.map((report) => report.path);
    expect(paths).toEqual([...paths].sort());
  });
});

describe("estimate --format json", () => {
  const calls: readonly (readonly string[])[] = [
    ["CC=O"],
    ["acetaldehyde", "--in", "9:1 MeOH/H2O", "--at", "40 °C", "--conc", "0.5"],
    ["50-00-0", "--in", "water", "--pH", "9"],
    ["O=Cc1ccccn1", "--in", "THF/water 4:1 (v/v)", "--at", "0"],
    ["pyruvic acid", "--pH", "1"],
    ["CC(C)=O", "--correlation-only"],
    ["FC(F)(F)C(=O)C(F)(F)F", "--in", "50 wt% ethanol"],
    ["CC(=O)OCC"],
  ];
  it.each(calls.map((args) => ({ call: args.join(" "), args })))("is an Estimate for $call", async ({ args }) => {
    const { status, out, err } = await oxomargin(["estimate", ...args, "--format", "json"]);
    expect(err).toBe("");
    expect(status).toBe(0);
    const estimate = JSON.parse(out) as Estimate;
    expect(schemaProblems("estimate", estimate)).toBe("");
    expect(estimateProblems(estimate)).toEqual([]);
  });

  it("says why an ester has no estimate", async () => {
    const { out } = await oxomargin(["estimate", "CC(=O)OCC", "--format", "json"]);
    const estimate = JSON.parse(out) as Estimate;
    expect(estimate.forms).toEqual([]);
    expect(estimate.outside).toMatch(/ester|aldehyde|ketone/);
  });

  it("answers a range with an estimate for each of its points", async () => {
    const { out } = await oxomargin(["estimate", "CC=O", "--at", "0..50/5", "--pH", "7", "--format", "json"]);
    const { estimates } = JSON.parse(out) as { estimates: Estimate[] };
    expect(estimates.map((one) => Math.round(one.temperature - 273.15))).toEqual([0, 10, 20, 30, 40, 50]);
    for (const one of estimates) expect(schemaProblems("estimate", one)).toBe("");
    // Hydration of an aldehyde gives off heat, so its diol falls as the flask warms (common practice, no source).
    const free = estimates.map((one) => one.free.value);
    expect(free).toEqual([...free].sort((a, b) => a - b));
  });
});

describe("check --format sarif", () => {
  it("holds the public schema of SARIF 2.1.0", async () => {
    const require = createRequire(import.meta.url);
    const root = require.resolve("@microsoft/jest-sarif").replace(/index\.js$/, "");
    const schema = JSON.parse(readFileSync(`${root}schemas/sarif-2.1.0-rtm.5.json`, "utf8")) as AnySchemaObject;
    const ajv = new Ajv({
      strict: false,
      validateFormats: false,
      meta: false,
      unicodeRegExp: false,
      validateSchema: false,
    });
    const validate = ajv.compile({ ...schema, $schema: undefined, id: undefined, $id: "sarif" });
    const { out } = await oxomargin(["check", EXAMPLES, "--format", "sarif"]);
    const log = JSON.parse(out);
    expect(validate(log) ? "" : ajv.errorsText(validate.errors)).toBe("");
    expect(log.runs[0].results.length).toBeGreaterThan(5);
    expect(validate({ ...log, runs: [{ results: "none" }] })).toBe(false);
  });
});

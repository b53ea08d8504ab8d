#!/usr/bin/env node
/** The `oxomargin` command. The same module is the entry of the pool's threads, which call `checkInThread`. */

import { isMainThread } from "node:worker_threads";
import type { CheckedFile, CheckTask } from "./check-file.ts";
import type { Streams } from "./streams.ts";
import { UsageError } from "./usage-error.ts";

/** One note, in a thread of the pool. */
export async function checkInThread(task: CheckTask): Promise<CheckedFile> {
  return (await import("./check-file.ts")).checkFile(task);
}

async function runCheck(args: readonly string[], streams: Streams): Promise<number> {
  const { jobsOf, oneOf, readOptions } = await import("./options.ts");
  const { values, positionals } = readOptions("check", args);
  if (values.help) return printHelp("check", streams);
  if (values.records) {
    if (positionals.length > 0) throw new UsageError("--records reads standard input and takes no path");
    return (await import("./records.ts")).checkRecords(streams);
  }
  const { REPORT_FORMATS } = await import("../../shared-lib/report/formats.ts");
  const format = oneOf("--format", values.format ?? "text", REPORT_FORMATS);
  const failOn = oneOf("--fail-on", values["fail-on"] ?? "never", ["never", "hint", "note", "warning"] as const);
  const jobs = jobsOf(values.jobs);
  const { checkPaths, checkStdin } = await import("./check.ts");
  if (values.stdin) {
    if (values.name === undefined) throw new UsageError("--stdin needs --name NAME.md: the ending says the format");
    if (positionals.length > 0) throw new UsageError("--stdin reads standard input and takes no path");
    return checkStdin(values.name, { format, failOn }, streams);
  }
  if (positionals.length === 0) throw new UsageError("check needs a file or folder, --stdin or --records");
  const call = { paths: positionals, format, failOn, entry: import.meta.url };
  return checkPaths(
    {
      ...call,
      ...(jobs === undefined ? {} : { jobs }),
      ...(values.cache === undefined ? {} : { cache: values.cache }),
    },
    streams,
  );
}

async function runEstimate(args: readonly string[], streams: Streams): Promise<number> {
  const { oneOf, readOptions } = await import("./options.ts");
  const { values, positionals } = readOptions("estimate", args);
  if (values.help) return printHelp("estimate", streams);
  const [what, ...more] = positionals;
  if (what === undefined || more.length > 0)
    throw new UsageError("estimate needs one SMILES, name or CAS number; put quotes round a name with spaces");
  const format = oneOf("--format", values.format ?? "text", ["text", "json"]);
  const { estimateCommand } = await import("./estimate.ts");
  return estimateCommand(
    {
      what,
      medium: values.in ?? "water",
      temperature: values.at ?? "25",
      ...(values.pH === undefined ? {} : { pH: values.pH }),
      ...(values.conc === undefined ? {} : { concentration: values.conc }),
      format,
      correlationOnly: values["correlation-only"] ?? false,
    },
    streams,
  );
}

async function runFix(args: readonly string[], streams: Streams): Promise<number> {
  const { readOptions } = await import("./options.ts");
  const { values, positionals } = readOptions("fix", args);
  if (values.help) return printHelp("fix", streams);
  if (positionals.length === 0) throw new UsageError("fix needs a file or folder");
  return (await import("./fix.ts")).fix(positionals, values.write ?? false, streams);
}

async function runServe(args: readonly string[], streams: Streams): Promise<number> {
  const { readOptions } = await import("./options.ts");
  const { values } = readOptions("serve", args);
  if (values.help) return printHelp("serve", streams);
  if (!values.stdio) throw new UsageError("serve needs --stdio");
  await import("../../server/start-node.ts");
  // The server ends the process itself when its editor goes.
  return new Promise<number>(() => {});
}

async function printHelp(
  command: "check" | "estimate" | "fix" | "serve" | undefined,
  streams: Streams,
): Promise<number> {
  await streams.print((await import("./help.ts")).helpOf(command));
  return 0;
}

/** Runs one call. @returns the exit status @throws UsageError */
async function run([command, ...args]: readonly string[], streams: Streams): Promise<number> {
  switch (command) {
    case "check":
      return runCheck(args, streams);
    case "estimate":
      return runEstimate(args, streams);
    case "fix":
      return runFix(args, streams);
    case "serve":
      return runServe(args, streams);
    case "--version": {
      const { TABLES_VERSION, VERSION } = await import("./version.ts");
      await streams.print(`${VERSION} (tables ${TABLES_VERSION})\n`);
      return 0;
    }
    case "--help":
    case "-h":
    case "help":
      return printHelp(undefined, streams);
    case undefined:
      await printHelp(undefined, streams);
      return 2;
    default:
      throw new UsageError(`"${command}" is no call: check, estimate, fix or serve; see oxomargin --help`);
  }
}

async function main(): Promise<void> {
  const streams = (await import("./streams.ts")).processStreams();
  try {
    process.exitCode = await run(process.argv.slice(2), streams);
  } catch (error) {
    const said = error instanceof Error ? error.message : String(error);
    streams.warn(
      error instanceof UsageError ? said : `a fault of the program (${said}); please report it with the call`,
    );
    process.exitCode = 2;
  }
}

if (isMainThread) await main();

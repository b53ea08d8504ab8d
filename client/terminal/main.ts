#!/usr/bin/env node
/** The `oxomargin` command. */

import { parseArgs } from "node:util";
import { CHECK_FORMATS, type CheckFormat, FAIL_ON } from "./check.ts";
import { processStreams, type Streams } from "./streams.ts";
import { UsageError } from "./usage-error.ts";
import { VERSION } from "./version.ts";

const HELP = `oxomargin ${VERSION}: which form the aldehydes and ketones of a reaction note take, and what that does to the charge

  oxomargin check PATH… [--format ${CHECK_FORMATS.join("|")}] [--fail-on ${FAIL_ON.join("|")}]
  oxomargin check --stdin --name NAME.md
  oxomargin check --records              NDJSON {"id", "text"} in, one answer a line out
  oxomargin estimate WHAT [--in MEDIUM] [--at TEMP] [--pH X] [--conc C] [--format text|json] [--correlation-only]
  oxomargin fix PATH… [--write]          the corrections that need no judgement, as a diff or written
  oxomargin serve --stdio                the language server

WHAT is a SMILES, a name or a CAS number; MEDIUM as in a note: water, "9:1 MeOH/H2O", "50 wt% ethanol", PBS.
Exit status: 0 nothing at or above --fail-on, 1 something was, 2 the call or an input could not be used.
`;

const OPTIONS = {
  format: { type: "string" },
  "fail-on": { type: "string" },
  jobs: { type: "string" },
  stdin: { type: "boolean" },
  name: { type: "string" },
  records: { type: "boolean" },
  in: { type: "string" },
  at: { type: "string" },
  pH: { type: "string" },
  conc: { type: "string" },
  "correlation-only": { type: "boolean" },
  write: { type: "boolean" },
  stdio: { type: "boolean" },
  help: { type: "boolean", short: "h" },
  version: { type: "boolean" },
} as const;

function oneOf<T extends string>(option: string, value: string, allowed: readonly T[]): T {
  const found = allowed.find((candidate) => candidate === value);
  if (found === undefined) throw new UsageError(`${option} must be one of ${allowed.join(", ")}, not "${value}"`);
  return found;
}

/** "--at -20" means minus twenty: a value that begins with a dash and a digit is joined to its option. */
function joinNegative(argv: readonly string[]): string[] {
  const joined: string[] = [];
  for (const argument of argv) {
    const option = joined.at(-1);
    if (/^-\d/.test(argument) && option !== undefined && /^--[a-zA-Z]+$/.test(option))
      joined[joined.length - 1] = `${option}=${argument}`;
    else joined.push(argument);
  }
  return joined;
}

function parse(argv: readonly string[]) {
  try {
    return parseArgs({ args: joinNegative(argv), options: OPTIONS, allowPositionals: true });
  } catch (error) {
    throw new UsageError(error instanceof Error ? error.message : "the call cannot be read");
  }
}

/** Runs one call. @returns the exit status */
async function run(argv: readonly string[], streams: Streams): Promise<number> {
  const { values, positionals } = parse(argv);
  const [command, ...rest] = positionals;
  if (values.version) {
    await streams.print(`${VERSION}\n`);
    return 0;
  }
  if (values.help || command === undefined) {
    await streams.print(HELP);
    return command === undefined && !values.help ? 2 : 0;
  }
  switch (command) {
    case "check": {
      if (values.records) return (await import("./records.ts")).checkRecords(streams);
      const { check } = await import("./check.ts");
      if (values.stdin && values.name === undefined)
        throw new UsageError("--stdin needs --name NAME.md: the ending says the format");
      return check(
        {
          paths: rest,
          ...(values.stdin ? { stdinName: values.name as string } : {}),
          format: oneOf<CheckFormat>("--format", values.format ?? "text", CHECK_FORMATS),
          failOn: oneOf("--fail-on", values["fail-on"] ?? "never", FAIL_ON),
        },
        streams,
      );
    }
    case "estimate": {
      const [what, ...more] = rest;
      if (what === undefined || more.length > 0)
        throw new UsageError("estimate needs one SMILES, name or CAS number; put quotes round a name with spaces");
      const { estimateCommand } = await import("./estimate.ts");
      return estimateCommand(
        {
          what,
          medium: values.in ?? "water",
          temperature: values.at ?? "25",
          ...(values.pH === undefined ? {} : { pH: values.pH }),
          ...(values.conc === undefined ? {} : { concentration: values.conc }),
          format: oneOf("--format", values.format ?? "text", ["text", "json"]),
          correlationOnly: values["correlation-only"] ?? false,
        },
        streams,
      );
    }
    case "fix":
      return (await import("./fix.ts")).fix(rest, values.write ?? false, streams);
    case "serve":
      if (!values.stdio) throw new UsageError("serve needs --stdio");
      await import("../../server/start-node.ts");
      return new Promise<number>(() => {});
    default:
      throw new UsageError(`"${command}" is no command: check, estimate, fix or serve`);
  }
}

const streams = processStreams();
try {
  process.exitCode = await run(process.argv.slice(2), streams);
} catch (error) {
  streams.warn(error instanceof Error ? error.message : String(error));
  if (!(error instanceof UsageError) && error instanceof Error && process.env.OXOMARGIN_DEBUG)
    process.stderr.write(`${error.stack}\n`);
  process.exitCode = 2;
}

/** Options of each call, read strictly: an option that a call does not have is refused, not passed over. */

import { type ParseArgsConfig, parseArgs } from "node:util";
import type { Command } from "./help.ts";
import { UsageError } from "./usage-error.ts";

const HELP = { help: { type: "boolean", short: "h" } } as const;

export const OPTIONS = {
  check: {
    ...HELP,
    format: { type: "string" },
    "fail-on": { type: "string" },
    jobs: { type: "string" },
    cache: { type: "string" },
    stdin: { type: "boolean" },
    name: { type: "string" },
    records: { type: "boolean" },
  },
  estimate: {
    ...HELP,
    in: { type: "string" },
    at: { type: "string" },
    pH: { type: "string" },
    conc: { type: "string" },
    format: { type: "string" },
    "correlation-only": { type: "boolean" },
  },
  fix: { ...HELP, write: { type: "boolean" } },
  serve: { ...HELP, stdio: { type: "boolean" } },
} as const satisfies Record<Command, ParseArgsConfig["options"]>;

/** `--at -5` and `--pH -1` read as an option and its value, as they are meant. */
function withNegativeValues(args: readonly string[]): readonly string[] {
  const joined: string[] = [];
  for (const arg of args) {
    const option = joined.at(-1);
    if (/^-\d/.test(arg) && option !== undefined && /^--(?:at|pH)$/.test(option))
      joined[joined.length - 1] = `${option}=${arg}`;
    else joined.push(arg);
  }
  return joined;
}

/** Options and paths of a call. @throws UsageError naming the option and how to see those there are */
export function readOptions<C extends Command>(command: C, args: readonly string[]) {
  try {
    return parseArgs({ args: [...withNegativeValues(args)], options: OPTIONS[command], allowPositionals: true });
  } catch (error) {
    const said = error instanceof Error ? (error.message.split(". ")[0] ?? "") : "the call cannot be read";
    throw new UsageError(`${said}; see oxomargin ${command} --help`);
  }
}

/** One of the words allowed. @throws UsageError */
export function oneOf<T extends string>(option: string, value: string, allowed: readonly T[]): T {
  const found = allowed.find((candidate) => candidate === value);
  if (found === undefined) throw new UsageError(`${option} must be one of ${allowed.join(", ")}, not "${value}"`);
  return found;
}

/** A number of threads. @throws UsageError */
export function jobsOf(value: string | undefined): number | undefined {
  if (value === undefined) return undefined;
  const jobs = Number(value);
  if (!/^\d+$/.test(value) || jobs < 1 || jobs > 64)
    throw new UsageError(`--jobs must be a whole number from 1 to 64, not "${value}"`);
  return jobs;
}

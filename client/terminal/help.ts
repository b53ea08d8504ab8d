/** What `--help` prints, for the command as a whole and for each call. */

import { REPORT_FORMATS } from "../../shared-lib/report/formats.ts";
import { TABLES_VERSION, VERSION } from "./version.ts";

const STATUS = `Exit status: 0 nothing at or above --fail-on, 1 something was, 2 the call or an input could not be used
(the message on standard error names it and the mend).
`;

const MAIN = `oxomargin ${VERSION} (tables ${TABLES_VERSION})
Tells which form the aldehydes and ketones of a reaction note take in its flask, and what that does to the charge.

  oxomargin check PATH…        read notes, say what is bound and what to change
  oxomargin estimate WHAT      one compound in one medium
  oxomargin fix PATH…          the corrections that need no judgement, as a diff or written
  oxomargin serve --stdio      the language server, for any editor

  oxomargin CALL --help        more about a call
  oxomargin --version          versions of the program and of its tables

${STATUS}`;

const CHECK = `oxomargin check PATH… [options]
oxomargin check --stdin --name NAME.md [options]
oxomargin check --records

PATH is a note (.md, .markdown, .txt) or a folder, which is walked; .gitignore and .oxomarginignore are honoured.

  --format F       ${REPORT_FORMATS.join(", ")} (text)
                   ndjson: one note a line; csv: the ledgers for a spreadsheet; html, markdown: one page to file
  --fail-on S      never, hint, note or warning: exit status 1 when a finding is at least that (never)
  --jobs N         threads, 1 to 64 (as many as the machine runs at once, from 400 notes on)
  --cache FOLDER   keep results there and use them while nothing changed; the folder may be deleted at any time
  --stdin          read one note from standard input; the ending of --name says its format
  --records        read NDJSON {"id": …, "text": …} from standard input and answer each line with one line, in order;
                   a line that cannot be read is answered {"id": …, "error": …}

${STATUS}`;

const ESTIMATE = `oxomargin estimate WHAT [options]

WHAT is a SMILES, a name or a CAS number; put quotes round it.

  --in MEDIUM          as in a note: water, MeOH, "9:1 MeOH/H2O", "50 wt% ethanol", PBS (water)
  --at TEMP            25, "40 °C", 298K, rt (25)
  --pH X               neutral when absent
  --conc C             mol/L of the compound (dilute when absent)
  --format F           text or json (text)
  --correlation-only   leave measured constants out

--at, --pH and --conc also take a range, LOW..HIGH or LOW..HIGH/STEPS: then a table over it is printed.
`;

const FIX = `oxomargin fix PATH… [--write]

Prints a unified diff of the corrections that need no judgement; --write applies them, each file whole or not at all.
`;

const SERVE = `oxomargin serve --stdio

Runs the language server on standard input and output.
`;

export const COMMANDS = ["check", "estimate", "fix", "serve"] as const;
export type Command = (typeof COMMANDS)[number];

const PAGES: Readonly<Record<Command, string>> = { check: CHECK, estimate: ESTIMATE, fix: FIX, serve: SERVE };

/** The page of a call, or the first page. */
export function helpOf(command: Command | undefined): string {
  return command ? PAGES[command] : MAIN;
}

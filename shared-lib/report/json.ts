/** The contract's JSON: one document, or one line a note. */

import type { ReportWriter } from "./writer.ts";

/** `CheckReport`, schema 1; every file with its steps. */
export const JSON_WRITER: ReportWriter = {
  withSteps: true,
  begin: ({ program, tables }) =>
    `{"schema":1,"tool":${JSON.stringify({ name: "oxomargin", version: program, tables })},"files":[\n`,
  note: ({ report }) => JSON.stringify(report),
  between: ",\n",
  end: (summary) => `\n],"summary":${JSON.stringify(summary)}}\n`,
};

/** One `FileReport` a line. */
export const NDJSON_WRITER: ReportWriter = {
  withSteps: false,
  begin: () => "",
  note: ({ report }) => `${JSON.stringify(report)}\n`,
  between: "",
  end: () => "",
};

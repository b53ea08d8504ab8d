/** The formats of a report by the names that a call gives them. */

import { CSV_WRITER } from "./csv.ts";
import { HTML_WRITER } from "./html.ts";
import { JSON_WRITER, NDJSON_WRITER } from "./json.ts";
import { MARKDOWN_WRITER } from "./markdown.ts";
import { SARIF_WRITER } from "./sarif.ts";
import { TEXT_WRITER } from "./text.ts";
import type { ReportWriter } from "./writer.ts";

export const REPORT_FORMATS = ["text", "json", "ndjson", "sarif", "markdown", "html", "csv"] as const;
export type ReportFormat = (typeof REPORT_FORMATS)[number];

export const WRITERS: Readonly<Record<ReportFormat, ReportWriter>> = {
  text: TEXT_WRITER,
  json: JSON_WRITER,
  ndjson: NDJSON_WRITER,
  sarif: SARIF_WRITER,
  markdown: MARKDOWN_WRITER,
  html: HTML_WRITER,
  csv: CSV_WRITER,
};

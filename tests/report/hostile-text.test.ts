/** Text of a note is shown, never obeyed: no element, link, script, terminal control or spreadsheet formula of it gets through. */

import MarkdownIt from "markdown-it";
import { describe, expect, it } from "vitest";
import { analyze } from "../../shared-lib/analyze.ts";
import { createLexicon } from "../../shared-lib/compounds/create-lexicon.ts";
import { CSV_WRITER } from "../../shared-lib/report/csv.ts";
import { HTML_WRITER } from "../../shared-lib/report/html.ts";
import { MARKDOWN_WRITER } from "../../shared-lib/report/markdown.ts";
import { toNoteReport } from "../../shared-lib/report/note-report.ts";
import { TEXT_WRITER } from "../../shared-lib/report/text.ts";
import { writeWhole } from "../../shared-lib/report/writer.ts";

const HOSTILE: readonly string[] = [
  "<script>alert(1)</script>",
  "<img src=x onerror=alert(1)>",
  '"><svg/onload=alert(1)>',
  "' onmouseover='alert(1)",
  "[see](javascript:alert(1))",
  "![x](https://example.org/x.png)",
  "<https://example.org>",
  "https://example.org/x www.example.org",
  "&lt;script&gt;alert(1)&lt;/script&gt;",
  "</td></tr></table><iframe src=x>",
  "| --- | </section>",
  "`code` ```js\nalert(1)\n```",
  "\u001b]0;title\u0007\u001b[31mred",
  "\u202Etxt.exe",
  "=HYPERLINK(1)",
  "--><!--",
  "</style><style>*{background:url(https://example.org)}",
];

const lexicon = createLexicon();
const versions = { program: "0.0.0", tables: "test" };
const markdown = new MarkdownIt({ html: true, linkify: true });
/** Elements that our own pages may hold. */
const OWN_ELEMENTS =
  /^(?:!doctype|html|head|meta|title|style|body|main|section|footer|h[1-6]|p|table|caption|thead|tbody|tr|th|td|ul|ol|li|div|span|strong|code|br|svg|defs|pattern|line|rect)$/;

function noteWith(hostile: string): { readonly text: string; readonly name: string } {
  const text = `# Oxime ${hostile}\n\nAcetaldehyde (${hostile}) (4.41 g, 100 mmol, 1.0 equiv) and hydroxylamine hydrochloride (6.95 g, 100 mmol) in water (50 mL) ${hostile} at 25 °C.\n`;
  return { text, name: `${hostile}.md` };
}

function pageIn(writer: typeof HTML_WRITER, hostile: string): string {
  const { text, name } = noteWith(hostile);
  const report = toNoteReport(name, text, analyze(text, { format: "markdown", lexicon }), lexicon);
  // The worst case for a writer: hostile words wherever words of a note or a table can stand.
  const [mention, ...rest] = report.mentions;
  const mentions = mention ? [{ ...mention, text: hostile, name: hostile }, ...rest] : [];
  const findings = report.findings.map((finding) => ({ ...finding, message: `${finding.message} ${hostile}` }));
  const steps = report.steps.map((step) => ({ ...step, title: hostile }));
  return writeWhole(writer, [{ report: { ...report, mentions, findings, steps }, text }], { files: 1 }, versions);
}

describe.each(HOSTILE.map((hostile) => ({ hostile })))("$hostile", ({ hostile }) => {
  it("opens no element and no attribute of its own in HTML", () => {
    const page = pageIn(HTML_WRITER, hostile);
    for (const [tag, name = ""] of page.matchAll(/<\/?([a-z!][a-z0-9]*)[^>]*>/gi)) {
      expect(name.toLowerCase()).toMatch(OWN_ELEMENTS);
      expect(tag).not.toMatch(/\son\w+\s*=|javascript:|src\s*=|href\s*=/i);
    }
    expect(page.match(/<style>/g)).toHaveLength(1);
    expect(page).not.toMatch(/<script/i);
    expect(page).not.toContain("\u001b");
  });

  it("makes no link, image or HTML in Markdown", () => {
    const page = markdown.render(pageIn(MARKDOWN_WRITER, hostile));
    expect(page).not.toMatch(/<(?:a|img|script|svg|iframe|style|section)[\s>/]/i);
  });

  it("does not steer the terminal", () => {
    // biome-ignore lint/suspicious/noControlCharactersInRegex: control characters are what must not be there
    expect(pageIn(TEXT_WRITER, hostile)).not.toMatch(/[\u0000-\u0008\u000b-\u001f\u007f-\u009f\u202a-\u202e]/);
  });

  it("begins no cell of the CSV with a formula", () => {
    for (const line of pageIn(CSV_WRITER, hostile).split("\r\n")) expect(line).not.toMatch(/(?:^|,)"?[=+@]/);
  });
});

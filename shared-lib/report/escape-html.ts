/** Text of a note inside HTML. */

const NAMED: Readonly<Record<string, string>> = {
  "&": "&amp;",
  "<": "&lt;",
  ">": "&gt;",
  '"': "&quot;",
  "'": "&#39;",
};

/** Inert in elements and in quoted attributes; characters that HTML does not allow become the replacement character. */
export function escapeHtml(text: string): string {
  let out = "";
  for (const c of text) {
    const code = c.codePointAt(0) as number;
    const forbidden =
      (code < 0x20 && code !== 0x09 && code !== 0x0a && code !== 0x0d) || (code >= 0xd800 && code <= 0xdfff);
    out += forbidden ? "\uFFFD" : (NAMED[c] ?? c);
  }
  return out;
}

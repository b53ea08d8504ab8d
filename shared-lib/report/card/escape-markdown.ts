/** Text that came from a note or a table, made inert inside Markdown: no link, image, HTML, emphasis or table cell comes of it. */

const SPECIAL = new Set("\\`*_{}[]<>#|~!&$^".split(""));

/**
 * One line of plain text as Markdown that shows exactly that text.
 *
 * Line breaks become spaces; a colon before a slash, a dot after `www` and an @ are escaped too, so that no renderer makes a link of an address.
 */
export function escapeMarkdown(text: string): string {
  let out = "";
  for (let i = 0; i < text.length; i++) {
    const char = text[i] as string;
    if (char === "\n" || char === "\r" || char === "\t") out += " ";
    else if (char < " ") continue;
    else if (SPECIAL.has(char) || linksHere(text, i, char)) out += `\\${char}`;
    else out += char;
  }
  return out;
}

function linksHere(text: string, at: number, char: string): boolean {
  if (char === "@") return true;
  if (char === ":") return text[at + 1] === "/";
  return char === "." && text.slice(Math.max(0, at - 3), at).toLowerCase() === "www";
}

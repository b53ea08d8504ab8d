/** What the program itself has written into a note is passed over when the note is read: else it would read its own figures as charges. */

const BESIDE = "[in flask: ";
const LONGEST_BESIDE = 200;
const LEDGER_OPENING = "<!-- oxomargin ledger";
const LEDGER_CLOSING = "<!-- /oxomargin ledger -->";

/**
 * The same text, of the same length, with corrections beside charges and ledgers blanked out; line breaks stay.
 * Time is linear in the text.
 */
export function withoutOwnWords(text: string): string {
  if (!text.includes(BESIDE) && !text.includes(LEDGER_OPENING)) return text;
  const parts: string[] = [];
  const lastClosing = text.lastIndexOf(LEDGER_CLOSING);
  let from = 0;
  let beside = text.indexOf(BESIDE);
  let ledger = text.indexOf(LEDGER_OPENING);
  while (beside >= 0 || ledger >= 0) {
    const at = beside < 0 || (ledger >= 0 && ledger < beside) ? ledger : beside;
    const end = endOf(text, at, lastClosing);
    parts.push(text.slice(from, at), blank(text.slice(at, end)));
    from = end;
    // Each is sought again only once it is passed, so that the time stays linear.
    if (beside >= 0 && beside < from) beside = text.indexOf(BESIDE, from);
    if (ledger >= 0 && ledger < from) ledger = text.indexOf(LEDGER_OPENING, from);
  }
  parts.push(text.slice(from));
  return parts.join("");
}

/** An opening without its closing hides no more than itself. */
function endOf(text: string, at: number, lastClosing: number): number {
  if (text.startsWith(LEDGER_OPENING, at)) {
    const close = at < lastClosing ? text.indexOf(LEDGER_CLOSING, at) : -1;
    return close < 0 ? at + LEDGER_OPENING.length : close + LEDGER_CLOSING.length;
  }
  const line = text.slice(at, at + LONGEST_BESIDE).split("\n", 1)[0] ?? "";
  const close = line.indexOf("]");
  return at + (close < 0 ? BESIDE.length : close + 1);
}

function blank(words: string): string {
  return words.replace(/[^\r\n]/g, " ");
}

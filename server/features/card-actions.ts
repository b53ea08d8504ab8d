/** Links of a card to commands of our own client. Arguments are places in the note, never its text. */

import type { Position } from "vscode-languageserver-protocol";
import type { OpenNote } from "../notes.ts";

export const OPEN_PANEL = "oxomargin.openPanel";
export const COPY_CARD = "oxomargin.copyCard";

/** Commands that a card may link to; the client trusts these alone. */
export const CARD_COMMANDS: readonly string[] = [OPEN_PANEL, COPY_CARD];

export function cardActions(note: OpenNote, position: Position): string[] {
  const place = encodeURIComponent(JSON.stringify([note.document.uri, position.line, position.character]));
  return [`[Plot the forms](command:${OPEN_PANEL}?${place})`, `[Copy as Markdown](command:${COPY_CARD}?${place})`];
}

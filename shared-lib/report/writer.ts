/** A report format, written note by note, so that an archive of any size never stands in memory at once. */

import type { NoteOnFile, Versions } from "./types.ts";

export interface ReportWriter {
  /** True when the notes must carry their steps. */
  readonly withSteps: boolean;
  begin(versions: Versions): string;
  /** A note; "" when there is nothing to write of it. */
  note(note: NoteOnFile): string;
  /** Between two notes that write something. */
  readonly between: string;
  end(summary: Readonly<Record<string, number>>, versions: Versions): string;
}

/** A whole report of notes that are all at hand. */
export function writeWhole(
  writer: ReportWriter,
  notes: readonly NoteOnFile[],
  summary: Readonly<Record<string, number>>,
  versions: Versions,
): string {
  const pieces = notes.map((note) => writer.note(note)).filter((piece) => piece !== "");
  return `${writer.begin(versions)}${pieces.join(writer.between)}${writer.end(summary, versions)}`;
}

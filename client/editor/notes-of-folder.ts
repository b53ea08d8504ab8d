/** The notes of the workspace, read through the editor, so that virtual folders work too. */

import * as vscode from "vscode";

const NOTES_GLOB = "**/*.{md,markdown,txt}";
const LEFT_OUT = "**/node_modules/**";
const MOST_NOTES = 5_000;
const LONGEST_NOTE = 2_000_000;

/** Addresses of all notes, in path order. */
export async function notesOfFolder(token: vscode.CancellationToken): Promise<readonly vscode.Uri[]> {
  const found = await vscode.workspace.findFiles(NOTES_GLOB, LEFT_OUT, MOST_NOTES, token);
  return [...found].sort((a, b) => a.path.localeCompare(b.path));
}

/** Text of a note, or undefined for one that cannot be read or is too long. */
export async function textOfNote(uri: vscode.Uri): Promise<string | undefined> {
  try {
    const bytes = await vscode.workspace.fs.readFile(uri);
    return bytes.length > LONGEST_NOTE ? undefined : new TextDecoder().decode(bytes);
  } catch {
    return undefined;
  }
}

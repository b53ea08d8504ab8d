/** Palette: writes a report of every note of the workspace as HTML or Markdown. */

import * as vscode from "vscode";
import { METHODS, type NoteText } from "../../../server/protocol.ts";
import { notesOfFolder, textOfNote } from "../notes-of-folder.ts";
import type { Server } from "../server.ts";

export function registerExportReport(server: Server): vscode.Disposable {
  return vscode.commands.registerCommand("oxomargin.exportReport", async () => {
    const folder = vscode.workspace.workspaceFolders?.[0]?.uri;
    const target = await vscode.window.showSaveDialog({
      ...(folder ? { defaultUri: vscode.Uri.joinPath(folder, "carbonyl-forms.html") } : {}),
      filters: { HTML: ["html"], Markdown: ["md"] },
    });
    if (!target) return;
    const title = vscode.l10n.t("Oxomargin: writing the report");
    await vscode.window.withProgress(
      { location: vscode.ProgressLocation.Notification, title, cancellable: true },
      (_, token) => write(server, target, token),
    );
  });
}

async function write(server: Server, target: vscode.Uri, token: vscode.CancellationToken): Promise<void> {
  const notes: NoteText[] = [];
  for (const uri of await notesOfFolder(token)) {
    const text = await textOfNote(uri);
    if (text !== undefined && uri.toString() !== target.toString())
      notes.push({ name: vscode.workspace.asRelativePath(uri), text });
    if (token.isCancellationRequested) return;
  }
  const format = target.path.endsWith(".md") ? "markdown" : "html";
  const report = await server.request<string>(METHODS.report, { notes, format }, token);
  await vscode.workspace.fs.writeFile(target, new TextEncoder().encode(report));
}

/** Palette: reads every note of the workspace, with progress and a way to stop, and fills the view. */

import * as vscode from "vscode";
import type { FolderView } from "../folder-view.ts";

export function registerCheckFolder(view: FolderView): vscode.Disposable {
  return vscode.commands.registerCommand("oxomargin.checkFolder", () =>
    vscode.window.withProgress(
      {
        location: vscode.ProgressLocation.Notification,
        title: vscode.l10n.t("Oxomargin: reading notes"),
        cancellable: true,
      },
      async (progress, token) => {
        await view.fill(progress, token);
        await vscode.commands.executeCommand("oxomargin.folder.focus");
      },
    ),
  );
}

/** Palette: opens one of the bundled example notes as an unsaved copy, so that trying things changes nothing of the extension. */

import * as vscode from "vscode";

/** File names of media/example-notes, put in by the build: a browser cannot list a folder of an extension. */
declare const EXAMPLE_NOTES: readonly string[];

export function registerExamples(context: vscode.ExtensionContext): vscode.Disposable[] {
  const folder = vscode.Uri.joinPath(context.extensionUri, "media", "example-notes");
  return [
    vscode.commands.registerCommand("oxomargin.openExample", async (wanted?: string) => {
      const name =
        wanted && EXAMPLE_NOTES.includes(wanted)
          ? wanted
          : await vscode.window.showQuickPick(EXAMPLE_NOTES, { title: vscode.l10n.t("Example note") });
      if (name === undefined) return;
      const bytes = await vscode.workspace.fs.readFile(vscode.Uri.joinPath(folder, name));
      const language = name.endsWith(".txt") ? "plaintext" : "markdown";
      const document = await vscode.workspace.openTextDocument({ language, content: new TextDecoder().decode(bytes) });
      await vscode.window.showTextDocument(document);
    }),
  ];
}

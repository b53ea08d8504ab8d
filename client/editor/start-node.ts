/** The extension in the desktop and remote host: the server is a Node process over IPC. */

import type * as vscode from "vscode";
import { Uri } from "vscode";
import { LanguageClient, TransportKind } from "vscode-languageclient/node";
import { activateWith, type Extension } from "./extension.ts";
import { clientOptions } from "./start-options.ts";

export function activate(context: vscode.ExtensionContext): Extension {
  const module = Uri.joinPath(context.extensionUri, "dist", "server-node.mjs").fsPath;
  return activateWith(
    context,
    () =>
      new LanguageClient(
        "oxomargin",
        "Oxomargin",
        { run: { module, transport: TransportKind.ipc }, debug: { module, transport: TransportKind.ipc } },
        clientOptions({}),
      ),
  );
}

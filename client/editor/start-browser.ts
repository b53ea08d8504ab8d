/** The extension in the browser: the server is a Web Worker. */

import type * as vscode from "vscode";
import { Uri } from "vscode";
import { LanguageClient } from "vscode-languageclient/browser";
import { activateWith, type Extension } from "./extension.ts";
import { clientOptions } from "./start-options.ts";

export function activate(context: vscode.ExtensionContext): Extension {
  const address = (file: string): string => Uri.joinPath(context.extensionUri, "dist", file).toString(true);
  return activateWith(
    context,
    () =>
      new LanguageClient(
        "oxomargin",
        "Oxomargin",
        new Worker(address("server-worker.js")),
        clientOptions({ structuresModule: address("structures.mjs") }),
      ),
  );
}

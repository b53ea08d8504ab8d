/** Sends the laboratory's own reagents file to the server, at the start and whenever it changes. */

import * as vscode from "vscode";
import { METHODS } from "../../server/protocol.ts";
import type { Server } from "./server.ts";

const USUAL_NAME = "oxomargin-reagents.json";
const LONGEST = 4_000_000;

export function watchReagents(server: Server): vscode.Disposable {
  const setting = (): string =>
    vscode.workspace.getConfiguration("oxomargin").get<string>("reagentsFile") || USUAL_NAME;
  const send = async (): Promise<void> => {
    for (const folder of vscode.workspace.workspaceFolders ?? []) {
      const text = await read(vscode.Uri.joinPath(folder.uri, setting()));
      if (text !== undefined) return await server.notify(METHODS.reagents, { text });
    }
    await server.notify(METHODS.reagents, { text: null });
  };
  const watcher = vscode.workspace.createFileSystemWatcher(`**/${USUAL_NAME}`);
  void send();
  return vscode.Disposable.from(
    watcher,
    watcher.onDidChange(send),
    watcher.onDidCreate(send),
    watcher.onDidDelete(send),
    vscode.workspace.onDidChangeConfiguration((event) => {
      if (event.affectsConfiguration("oxomargin.reagentsFile")) void send();
    }),
  );
}

async function read(uri: vscode.Uri): Promise<string | undefined> {
  try {
    const bytes = await vscode.workspace.fs.readFile(uri);
    return bytes.length > LONGEST ? undefined : new TextDecoder().decode(bytes);
  } catch {
    return undefined;
  }
}

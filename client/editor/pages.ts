/** Read-only pages under `oxomargin:` — the page of a finding, and texts that a command shows. */

import * as vscode from "vscode";
import { METHODS } from "../../server/protocol.ts";
import type { Server } from "./server.ts";

const SCHEME = "oxomargin";
const shown = new Map<string, string>();
const changed = new vscode.EventEmitter<vscode.Uri>();

export function registerPages(server: Server): vscode.Disposable {
  const provider: vscode.TextDocumentContentProvider = {
    onDidChange: changed.event,
    async provideTextDocumentContent(uri) {
      const known = shown.get(uri.path);
      if (known !== undefined) return known;
      const prefix = "/findings/";
      if (!uri.path.startsWith(prefix) || !uri.path.endsWith(".md")) return "";
      return await server.request<string>(METHODS.page, { code: uri.path.slice(prefix.length, -".md".length) });
    },
  };
  return vscode.workspace.registerTextDocumentContentProvider(SCHEME, provider);
}

/** Shows Markdown in an editor beside the note, as text that can be selected and copied. */
export async function showPage(name: string, markdown: string): Promise<void> {
  const uri = vscode.Uri.from({ scheme: SCHEME, path: `/${name}.md` });
  shown.set(uri.path, markdown);
  changed.fire(uri);
  await vscode.commands.executeCommand("markdown.showPreviewToSide", uri);
}

/** Palette: every estimate of the note as a list to read and jump from; and a card as Markdown on the clipboard. */

import * as vscode from "vscode";
import { type ListedEstimate, METHODS } from "../../../server/protocol.ts";
import type { Server } from "../server.ts";

/** Kind of the server's action that puts in or renews a ledger. */
const LEDGER_KIND = "refactor.rewrite.oxomargin.ledger";

export function registerList(server: Server): vscode.Disposable[] {
  return [
    vscode.commands.registerTextEditorCommand("oxomargin.listEstimates", (editor) => void list(server, editor)),
    vscode.commands.registerTextEditorCommand("oxomargin.insertLedger", () =>
      vscode.commands.executeCommand("editor.action.codeAction", { kind: LEDGER_KIND, apply: "first" }),
    ),
    vscode.commands.registerCommand("oxomargin.copyCard", async (uri?: string, line?: number, character?: number) => {
      const place = placeOf(uri, line, character);
      const card = place ? await server.request<string>(METHODS.card, place) : "";
      if (card === "")
        return void vscode.window.showInformationMessage(vscode.l10n.t("No aldehyde or ketone is charged here."));
      await vscode.env.clipboard.writeText(card);
    }),
  ];
}

/** The place that a link names, else the cursor. */
export function placeOf(uri?: unknown, line?: unknown, character?: unknown) {
  if (typeof uri === "string" && typeof line === "number")
    return { uri, line, character: typeof character === "number" ? character : 0 };
  const editor = vscode.window.activeTextEditor;
  if (!editor) return undefined;
  const { active } = editor.selection;
  return { uri: editor.document.uri.toString(), line: active.line, character: active.character };
}

async function list(server: Server, editor: vscode.TextEditor): Promise<void> {
  const found = await server.request<ListedEstimate[]>(METHODS.list, { uri: editor.document.uri.toString() });
  if (found.length === 0)
    return void vscode.window.showInformationMessage(vscode.l10n.t("No aldehyde or ketone is charged in this note."));
  const rows = found.map((row) => ({
    label: row.name,
    description: row.answer,
    detail: `${vscode.l10n.t("line {0}", row.line + 1)} · ${row.conditions}`,
    row,
  }));
  const chosen = await vscode.window.showQuickPick(rows, {
    title: vscode.l10n.t("Estimates of this note"),
    matchOnDescription: true,
  });
  if (!chosen) return;
  const place = new vscode.Position(chosen.row.line, chosen.row.character);
  editor.selection = new vscode.Selection(place, place);
  editor.revealRange(new vscode.Range(place, place), vscode.TextEditorRevealType.InCenterIfOutsideViewport);
  await vscode.window.showTextDocument(editor.document, editor.viewColumn);
}

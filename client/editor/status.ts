/** The state of the note in the editor's language status: assessed, nothing to assess, too long. */

import * as vscode from "vscode";
import { METHODS, type NoteState } from "../../server/protocol.ts";
import type { Server } from "./server.ts";
import { NOTES } from "./start-options.ts";

const MOST_KEPT = 200;

export function registerStatus(server: Server): vscode.Disposable {
  const states = new Map<string, NoteState>();
  const item = vscode.languages.createLanguageStatusItem("oxomargin.state", NOTES);
  item.name = "Oxomargin";
  item.command = { title: vscode.l10n.t("Show estimates"), command: "oxomargin.listEstimates" };
  const show = (): void => {
    const uri = vscode.window.activeTextEditor?.document.uri.toString();
    const state = uri === undefined ? undefined : states.get(uri);
    item.busy = uri !== undefined && state === undefined;
    item.text = wordsOf(state);
    item.severity =
      state?.state === "too long" ? vscode.LanguageStatusSeverity.Warning : vscode.LanguageStatusSeverity.Information;
  };
  server.on<NoteState>(METHODS.state, (state) => {
    if (states.size >= MOST_KEPT) states.clear();
    states.set(state.uri, state);
    show();
  });
  show();
  return vscode.Disposable.from(item, vscode.window.onDidChangeActiveTextEditor(show));
}

function wordsOf(state: NoteState | undefined): string {
  if (!state) return "Oxomargin";
  if (state.state === "too long") return vscode.l10n.t("Oxomargin: note too long to assess");
  if (state.state === "nothing to assess") return vscode.l10n.t("Oxomargin: no aldehyde or ketone charged");
  return vscode.l10n.t("Oxomargin: {0} carbonyls, {1} findings", state.carbonyls, state.findings);
}

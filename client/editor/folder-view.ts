/** The view of what needs attention across the notes of the workspace. */

import * as vscode from "vscode";
import { type CheckReply, type FoundInNote, METHODS } from "../../server/protocol.ts";
import { notesOfFolder, textOfNote } from "./notes-of-folder.ts";
import type { Server } from "./server.ts";

interface NoteRow {
  readonly kind: "note";
  readonly uri: vscode.Uri;
  readonly findings: readonly FoundInNote[];
}

interface FindingRow {
  readonly kind: "finding";
  readonly uri: vscode.Uri;
  readonly finding: FoundInNote;
}

type Row = NoteRow | FindingRow;

const ICONS: Readonly<Record<FoundInNote["severity"], string>> = {
  warning: "warning",
  note: "info",
  hint: "lightbulb",
};

export class FolderView implements vscode.TreeDataProvider<Row> {
  readonly #server: Server;
  readonly #changed = new vscode.EventEmitter<void>();
  readonly onDidChangeTreeData = this.#changed.event;
  #notes: readonly NoteRow[] = [];
  #view: vscode.TreeView<Row> | undefined;

  constructor(server: Server) {
    this.#server = server;
  }

  register(): vscode.Disposable {
    this.#view = vscode.window.createTreeView("oxomargin.folder", { treeDataProvider: this, showCollapseAll: true });
    return vscode.Disposable.from(this.#view, this.#changed);
  }

  /** Reads the notes one after another; those that cannot be read are left out and counted. */
  async fill(
    progress: vscode.Progress<{ message?: string; increment?: number }>,
    token: vscode.CancellationToken,
  ): Promise<void> {
    const uris = await notesOfFolder(token);
    const rows: NoteRow[] = [];
    let unread = 0;
    for (const uri of uris) {
      if (token.isCancellationRequested) break;
      progress.report({ message: vscode.workspace.asRelativePath(uri), increment: 100 / uris.length });
      const reply = await this.#check(uri, token);
      if (!reply) unread++;
      else if (reply.findings.length > 0) rows.push({ kind: "note", uri, findings: reply.findings });
    }
    this.#notes = rows;
    this.#changed.fire();
    this.#say(uris.length, unread, token.isCancellationRequested);
  }

  #say(read: number, unread: number, stopped: boolean): void {
    const count = this.#notes.reduce((sum, note) => sum + note.findings.length, 0);
    if (!this.#view) return;
    const parts = [vscode.l10n.t("{0} findings in {1} of {2} notes", count, this.#notes.length, read)];
    if (unread > 0) parts.push(vscode.l10n.t("{0} could not be read", unread));
    if (stopped) parts.push(vscode.l10n.t("stopped before the end"));
    this.#view.message = parts.join("; ");
  }

  async #check(uri: vscode.Uri, token: vscode.CancellationToken): Promise<CheckReply | undefined> {
    const text = await textOfNote(uri);
    if (text === undefined) return undefined;
    return await this.#server
      .request<CheckReply>(METHODS.checkText, { name: uri.toString(), text }, token)
      .catch(() => undefined);
  }

  getChildren(row?: Row): Row[] {
    if (!row) return [...this.#notes];
    if (row.kind === "finding") return [];
    return row.findings.map((finding) => ({ kind: "finding", uri: row.uri, finding }));
  }

  getTreeItem(row: Row): vscode.TreeItem {
    if (row.kind === "note") {
      const item = new vscode.TreeItem(row.uri, vscode.TreeItemCollapsibleState.Expanded);
      item.description = String(row.findings.length);
      item.iconPath = vscode.ThemeIcon.File;
      return item;
    }
    const { finding } = row;
    const item = new vscode.TreeItem(finding.message);
    item.description = vscode.l10n.t("line {0}", finding.line + 1);
    item.tooltip = `${finding.message}\n${finding.code}`;
    item.iconPath = new vscode.ThemeIcon(ICONS[finding.severity]);
    const place = new vscode.Position(finding.line, finding.character);
    const selection = new vscode.Range(place, place);
    item.command = { title: vscode.l10n.t("Open"), command: "vscode.open", arguments: [row.uri, { selection }] };
    return item;
  }
}

/** The speciation panel: one webview that follows the cursor. All figures come from the server; the page only draws. */

import * as vscode from "vscode";
import { type CurveAxis, type Curves, METHODS } from "../../../server/protocol.ts";
import { placeOf } from "../commands/list-estimates.ts";
import type { Server } from "../server.ts";
import { panelHtml } from "./panel-html.ts";
import { type FromPanel, readFromPanel, type ToPanel } from "./panel-messages.ts";

type Place = NonNullable<ReturnType<typeof placeOf>>;

export function registerPanel(context: vscode.ExtensionContext, server: Server): vscode.Disposable[] {
  let open: Panel | undefined;
  const show = (uri?: string, line?: number, character?: number): void => {
    const place = placeOf(uri, line, character);
    if (!place) return;
    open ??= new Panel(context.extensionUri, server, () => {
      open = undefined;
    });
    open.follow(place, true);
  };
  return [
    vscode.commands.registerCommand("oxomargin.openPanel", show),
    vscode.window.onDidChangeTextEditorSelection(({ textEditor, selections }) => {
      const active = selections[0]?.active;
      const { uri, languageId } = textEditor.document;
      if (!open || !active || (languageId !== "markdown" && languageId !== "plaintext")) return;
      open.follow({ uri: uri.toString(), line: active.line, character: active.character }, false);
    }),
  ];
}

const FOLLOW_DELAY = 150;

class Panel {
  readonly #view: vscode.WebviewPanel;
  readonly #server: Server;
  #place: Place | undefined;
  #axis: CurveAxis = "water";
  #changed: FromPanel["changed"] = {};
  #waiting: ReturnType<typeof setTimeout> | undefined;

  constructor(extension: vscode.Uri, server: Server, closed: () => void) {
    this.#server = server;
    const media = vscode.Uri.joinPath(extension, "media", "panel");
    const dist = vscode.Uri.joinPath(extension, "dist");
    this.#view = vscode.window.createWebviewPanel(
      "oxomargin.panel",
      vscode.l10n.t("Forms in the flask"),
      { viewColumn: vscode.ViewColumn.Beside, preserveFocus: true },
      { enableScripts: true, localResourceRoots: [media, dist], retainContextWhenHidden: false },
    );
    this.#view.webview.html = panelHtml(this.#view.webview, { media, dist });
    this.#view.webview.onDidReceiveMessage((message: unknown) => void this.#hear(message));
    this.#view.onDidDispose(() => {
      clearTimeout(this.#waiting);
      closed();
    });
  }

  follow(place: Place, atOnce: boolean): void {
    if (this.#place?.uri !== place.uri || this.#place.line !== place.line) this.#changed = {};
    this.#place = place;
    clearTimeout(this.#waiting);
    this.#waiting = setTimeout(() => void this.#draw(), atOnce ? 0 : FOLLOW_DELAY);
  }

  async #draw(): Promise<void> {
    if (!this.#place) return;
    const request = { ...this.#place, axis: this.#axis, changed: this.#changed };
    const curves = await this.#server.request<Curves | null>(METHODS.curves, request);
    const message: ToPanel = curves ? { kind: "curves", curves } : { kind: "nothing" };
    await this.#view.webview.postMessage(message);
  }

  async #hear(message: unknown): Promise<void> {
    const heard = readFromPanel(message);
    if (!heard) return;
    if (heard.kind === "save") return await save(heard.name, heard.data);
    if (heard.kind === "go" && this.#place) return await reveal(this.#place.uri, heard.line);
    if (heard.kind === "ask") {
      this.#axis = heard.axis;
      this.#changed = heard.changed;
    }
    await this.#draw();
  }
}

async function reveal(uri: string, line: number): Promise<void> {
  const place = new vscode.Position(line, 0);
  await vscode.window.showTextDocument(vscode.Uri.parse(uri), {
    viewColumn: vscode.ViewColumn.One,
    selection: new vscode.Range(place, place),
  });
}

async function save(name: string, data: Uint8Array): Promise<void> {
  const folder = vscode.workspace.workspaceFolders?.[0]?.uri;
  const target = await vscode.window.showSaveDialog(folder ? { defaultUri: vscode.Uri.joinPath(folder, name) } : {});
  if (target) await vscode.workspace.fs.writeFile(target, data);
}

/** What both hosts share: starts the server lazily and registers commands, views, pages and the preview. */

import * as vscode from "vscode";
import type { BaseLanguageClient } from "vscode-languageclient";
import { METHODS } from "../../server/protocol.ts";
import { registerCheckFolder } from "./commands/check-folder.ts";
import { registerEstimate } from "./commands/estimate.ts";
import { registerExamples } from "./commands/examples.ts";
import { registerExportReport } from "./commands/export-report.ts";
import { registerList } from "./commands/list-estimates.ts";
import { FolderView } from "./folder-view.ts";
import { registerPages } from "./pages.ts";
import { registerPanel } from "./panel/panel.ts";
import { createPreview } from "./preview/preview.ts";
import type { Server } from "./server.ts";
import { themeNow } from "./start-options.ts";
import { registerStatus } from "./status.ts";

/** What the editor takes from `activate`: the plugin of its Markdown preview. */
export interface Extension {
  extendMarkdownIt: ReturnType<typeof createPreview>["extendMarkdownIt"];
  /** For tests of the hosts: resolves when the server answers. */
  readonly ready: Promise<void>;
}

export function activateWith(context: vscode.ExtensionContext, create: () => BaseLanguageClient): Extension {
  const server = createServer(create);
  const ready = server.start();
  const folder = new FolderView(server);
  const preview = createPreview(server);
  context.subscriptions.push(
    { dispose: () => void server.stop() },
    vscode.window.onDidChangeActiveColorTheme(() => void server.notify(METHODS.theme, themeNow())),
    vscode.commands.registerCommand("oxomargin.restartServer", () => server.restart()),
    registerStatus(server),
    registerPages(server),
    folder.register(),
    ...registerEstimate(context, server),
    ...registerList(server),
    registerCheckFolder(folder),
    registerExportReport(server),
    ...registerExamples(context),
    ...registerPanel(context, server),
    preview,
  );
  return { extendMarkdownIt: preview.extendMarkdownIt, ready };
}

/** The client with the few calls that the rest of the extension makes; a request before the start waits for it. */
function createServer(create: () => BaseLanguageClient): Server {
  let client = create();
  let starting: Promise<void> | undefined;
  const listeners: { method: string; handler: (params: unknown) => void }[] = [];
  const start = (): Promise<void> => {
    starting ??= client.start().then(() => {
      for (const { method, handler } of listeners) client.onNotification(method, (params: unknown) => handler(params));
    });
    return starting;
  };
  return {
    start,
    stop: () => client.stop(),
    async restart() {
      await client.stop().catch(() => undefined);
      client = create();
      starting = undefined;
      await start();
    },
    async request(method, params, token) {
      await start();
      return await client.sendRequest(method, params, token);
    },
    async notify(method, params) {
      await start();
      await client.sendNotification(method, params);
    },
    on: (method, handler) => void listeners.push({ method, handler: handler as (params: unknown) => void }),
  };
}

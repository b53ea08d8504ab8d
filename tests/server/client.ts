/** A language client of the tests' own: talks to the wired server over two in-memory streams, as an editor does. */

import { PassThrough } from "node:stream";
import { createConnection, ProposedFeatures } from "vscode-languageserver/node";
import {
  type ClientCapabilities,
  createProtocolConnection,
  type InitializeResult,
  type ProtocolConnection,
  type PublishDiagnosticsParams,
  StreamMessageReader,
  StreamMessageWriter,
} from "vscode-languageserver-protocol/node";
import type { StartOptions } from "../../server/protocol.ts";
import { wire } from "../../server/wire.ts";

export interface TestClient {
  readonly connection: ProtocolConnection;
  readonly initialized: InitializeResult;
  /** The last diagnostics that were pushed for a note. */
  pushed(uri: string): PublishDiagnosticsParams | undefined;
  open(uri: string, text: string, languageId?: string): void;
  /** Replaces a span of the text as the client has it. */
  edit(uri: string, start: number, end: number, text: string): void;
  text(uri: string): string;
  request<R>(method: string, params: unknown): Promise<R>;
  /** Waits until the condition holds, at most two seconds. */
  until(condition: () => boolean): Promise<void>;
  close(): void;
}

export const FULL_CLIENT: ClientCapabilities = {
  general: { positionEncodings: ["utf-8", "utf-16"] },
  textDocument: {
    hover: { contentFormat: ["markdown", "plaintext"] },
    publishDiagnostics: { codeDescriptionSupport: true, versionSupport: true },
    rename: { prepareSupport: true },
  },
  workspace: { inlayHint: { refreshSupport: true } },
};

export async function startClient(
  capabilities: ClientCapabilities = FULL_CLIENT,
  initializationOptions: StartOptions = { settings: { displayDelay: 0 } },
): Promise<TestClient> {
  const up = new PassThrough();
  const down = new PassThrough();
  wire(createConnection(ProposedFeatures.all, new StreamMessageReader(up), new StreamMessageWriter(down)), {
    loadStructures: async () => (await import("../../shared-lib/compounds/structure.ts")).createStructureToolkit(),
  });
  const connection = createProtocolConnection(new StreamMessageReader(down), new StreamMessageWriter(up));
  const diagnostics = new Map<string, PublishDiagnosticsParams>();
  const texts = new Map<string, { text: string; version: number }>();
  connection.onNotification("textDocument/publishDiagnostics", (params: PublishDiagnosticsParams) => {
    diagnostics.set(params.uri, params);
  });
  connection.onRequest("workspace/inlayHint/refresh", () => null);
  connection.onRequest("client/registerCapability", () => null);
  connection.listen();
  const initialized: InitializeResult = await connection.sendRequest("initialize", {
    processId: null,
    rootUri: null,
    capabilities,
    initializationOptions,
  });
  await connection.sendNotification("initialized", {});
  return {
    connection,
    initialized,
    pushed: (uri) => diagnostics.get(uri),
    open(uri, text, languageId = "markdown") {
      texts.set(uri, { text, version: 1 });
      void connection.sendNotification("textDocument/didOpen", { textDocument: { uri, languageId, version: 1, text } });
    },
    edit(uri, start, end, inserted) {
      const known = texts.get(uri) ?? { text: "", version: 0 };
      const range = { start: positionAt(known.text, start), end: positionAt(known.text, end) };
      const text = known.text.slice(0, start) + inserted + known.text.slice(end);
      const version = known.version + 1;
      texts.set(uri, { text, version });
      void connection.sendNotification("textDocument/didChange", {
        textDocument: { uri, version },
        contentChanges: [{ range, text: inserted }],
      });
    },
    text: (uri) => texts.get(uri)?.text ?? "",
    request: (method, params) => connection.sendRequest(method, params),
    async until(condition) {
      const end = Date.now() + 5_000;
      while (!condition()) {
        if (Date.now() > end) throw new Error("the server did not answer in time");
        await new Promise((done) => setTimeout(done, 10));
      }
    },
    close: () => connection.dispose(),
  };
}

/** Written apart from the server's own conversion, so that the two check each other. Line ends are LF, CRLF and CR. */
export function positionAt(text: string, offset: number): { line: number; character: number } {
  const before = text.slice(0, offset);
  const lines = before.split(/\r\n|\n|\r/);
  // An offset between CR and LF stands at the end of the line before the pair.
  return { line: lines.length - 1, character: (lines[lines.length - 1] ?? "").length };
}

export function offsetAt(text: string, position: { line: number; character: number }): number {
  let at = 0;
  for (let line = 0; line < position.line; line++) {
    const match = /\r\n|\n|\r/.exec(text.slice(at));
    if (!match) return text.length;
    at += match.index + match[0].length;
  }
  return at + position.character;
}

/** The language server as the rest of the extension sees it. */

import type { CancellationToken } from "vscode";

export interface Server {
  start(): Promise<void>;
  stop(): Promise<void>;
  restart(): Promise<void>;
  request<R>(method: string, params: unknown, token?: CancellationToken): Promise<R>;
  notify(method: string, params: unknown): Promise<void>;
  /** Call before the start. */
  on<P>(method: string, handler: (params: P) => void): void;
}

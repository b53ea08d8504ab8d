/** A fault in one handler is logged with its place and answered with nothing; the other handlers go on. */

import { type CancellationToken, LSPErrorCodes, ResponseError } from "vscode-languageserver";

export type Guard = <P, R>(
  name: string,
  nothing: R,
  answer: (params: P, token?: CancellationToken) => Promise<R> | R,
) => (params: P, token?: CancellationToken) => Promise<R | ResponseError<never>>;

/** @param log takes one message with the stack */
export function createGuard(log: (message: string) => void): Guard {
  return (name, nothing, answer) => async (params, token) => {
    if (token?.isCancellationRequested) return new ResponseError<never>(LSPErrorCodes.RequestCancelled, "cancelled");
    try {
      return await answer(params, token);
    } catch (error) {
      log(
        `${name} failed and was answered with nothing: ${error instanceof Error ? (error.stack ?? error.message) : String(error)}`,
      );
      return nothing;
    }
  };
}

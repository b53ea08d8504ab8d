/** What the client can do, in the few facts that change an answer. */

import type { ClientCapabilities } from "vscode-languageserver-protocol";
import type { StartOptions } from "./protocol.ts";

export interface ClientAbilities {
  readonly markdownHover: boolean;
  readonly images: boolean;
  readonly commandLinks: boolean;
  readonly pages: boolean;
  readonly pullsDiagnostics: boolean;
  readonly refreshesDiagnostics: boolean;
  readonly refreshesHints: boolean;
  readonly answersConfiguration: boolean;
  readonly registersConfiguration: boolean;
}

/** A client that says nothing can do nothing beyond the plainest protocol. */
export function abilitiesOf(client: ClientCapabilities, start: StartOptions): ClientAbilities {
  const { textDocument, workspace } = client;
  const codeDescriptions =
    textDocument?.publishDiagnostics?.codeDescriptionSupport === true ||
    textDocument?.diagnostic?.codeDescriptionSupport === true;
  return {
    markdownHover: textDocument?.hover?.contentFormat?.includes("markdown") ?? false,
    images: start.images === true,
    commandLinks: start.commandLinks === true,
    pages: start.pages === true && codeDescriptions,
    pullsDiagnostics: textDocument?.diagnostic !== undefined,
    refreshesDiagnostics: workspace?.diagnostics?.refreshSupport === true,
    refreshesHints: workspace?.inlayHint?.refreshSupport === true,
    answersConfiguration: workspace?.configuration === true,
    registersConfiguration: workspace?.didChangeConfiguration?.dynamicRegistration === true,
  };
}

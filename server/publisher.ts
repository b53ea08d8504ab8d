/** Shows findings a little after the last keystroke, and again when something outside the text changed. */

import type { Connection, TextDocuments } from "vscode-languageserver";
import type { TextDocument } from "vscode-languageserver-textdocument";
import type { ClientAbilities } from "./abilities.ts";
import type { Configuration } from "./configuration.ts";
import { diagnosticsOf } from "./features/diagnostics.ts";
import { stateOf } from "./features/whole-note.ts";
import type { Guard } from "./guard.ts";
import type { OpenNote } from "./notes.ts";
import { METHODS } from "./protocol.ts";

export interface Publisher {
  /** After the delay of the settings; a later call for the same note takes its place. */
  later(uri: string): void;
  clear(uri: string): void;
  /** Runs `first`, then shows every open note anew. */
  refresh(first: () => void): void;
}

interface Parts {
  readonly connection: Connection;
  readonly documents: TextDocuments<TextDocument>;
  readonly noteAt: (uri: string) => Promise<OpenNote | undefined>;
  readonly configuration: Configuration;
  readonly abilities: () => ClientAbilities;
  readonly guard: Guard;
}

export function createPublisher({ connection, documents, noteAt, configuration, abilities, guard }: Parts): Publisher {
  const waiting = new Map<string, ReturnType<typeof setTimeout>>();
  const seen = new Set<string>();

  const show = guard("showing findings", undefined, async (uri: string): Promise<undefined> => {
    waiting.delete(uri);
    const document = documents.get(uri);
    if (!document) return;
    const version = document.version;
    const note = await noteAt(uri);
    if (documents.get(uri)?.version !== version) return;
    if (!abilities().pullsDiagnostics) {
      const diagnostics = note ? diagnosticsOf(note, { pages: abilities().pages }) : [];
      void connection.sendDiagnostics({ uri, version, diagnostics });
    }
    void connection.sendNotification(METHODS.state, stateOf(uri, note));
  });

  const later = (uri: string): void => {
    clearTimeout(waiting.get(uri));
    const first = !seen.has(uri);
    seen.add(uri);
    void configuration.of(uri).then(({ displayDelay }) => {
      clearTimeout(waiting.get(uri));
      waiting.set(
        uri,
        setTimeout(() => void show(uri), first ? 0 : displayDelay),
      );
    });
  };

  return {
    later,
    clear(uri) {
      clearTimeout(waiting.get(uri));
      waiting.delete(uri);
      seen.delete(uri);
      if (!abilities().pullsDiagnostics) void connection.sendDiagnostics({ uri, diagnostics: [] });
    },
    refresh(first) {
      first();
      for (const uri of documents.keys()) void show(uri);
      if (abilities().refreshesHints) connection.languages.inlayHint.refresh();
      if (abilities().pullsDiagnostics && abilities().refreshesDiagnostics) connection.languages.diagnostics.refresh();
    },
  };
}
